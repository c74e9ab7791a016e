//===- Violation.h - What is wrong with a problem or schedule ---*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_VIOLATION_H
#define LULL_TIMING_VIOLATION_H

#include "lull/Timing/Time.h"

#include <cstdint>
#include <limits>

namespace lull {

/// An operation of a problem, by its place in program order.
using OpId = std::uint32_t;
/// A qubit or another resource of a problem, by number.
using ResourceId = std::uint32_t;
inline constexpr OpId NoOp = std::numeric_limits<OpId>::max();
inline constexpr ResourceId NoResource = std::numeric_limits<ResourceId>::max();

/// A broken rule, with the numbers and without words.
struct Violation {
  enum class Rule : std::uint8_t {
    /// Input: `found` is the duration.
    NegativeDuration,
    /// Input: `found` is the duration of the barrier.
    BarrierTakesTime,
    /// Input: `resource` was never added.
    UnknownResource,
    /// Input: `resource` stands twice among what `op` occupies.
    ResourceTwice,
    /// Input: an order edge from `other` to `op` that points backward.
    OrderBackward,
    /// Solution: `op` has no start time; `found` start times, `limit` wanted.
    StartMissing,
    /// Solution: `op` starts at `found`, before 0.
    StartNegative,
    /// Solution: on `resource`, `op` starts at `found`, before `other`, which
    /// precedes it, has ended at `limit`.
    Overlap,
    /// Solution: `op` starts at `found`, before `other`, which it must follow
    /// by an order edge, has ended at `limit`.
    OrderBroken,
    /// Either: the end of `op` is beyond 64 bits; it starts at `found` and
    /// takes `limit`.
    Overflow,
  };
  Rule rule;
  OpId op = NoOp;
  OpId other = NoOp;
  ResourceId resource = NoResource;
  Ticks found = 0;
  Ticks limit = 0;
};

} // namespace lull

#endif // LULL_TIMING_VIOLATION_H
