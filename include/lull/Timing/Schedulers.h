//===- Schedulers.h - Algorithms that make schedules ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_SCHEDULERS_H
#define LULL_TIMING_SCHEDULERS_H

#include "lull/Timing/Schedule.h"

#include <optional>

namespace lull {

/// Schedulers by name; the passes' option is generated from the same names.
enum class SchedulePolicy : std::uint8_t { ASAP, ALAP };

/// As soon as possible: each operation starts when all that it occupies is
/// free. This is also the timing rule of the IR (docs/Spec.md), so it times a
/// program as well as it schedules one. Linear. The problem passes check();
/// the only failure is an end beyond 64 bits.
std::optional<Violation> scheduleAsap(const Problem &problem, Schedule &result);

/// As late as possible without ending later than the ASAP schedule.
std::optional<Violation> scheduleAlap(const Problem &problem, Schedule &result);

/// By policy.
std::optional<Violation> schedule(const Problem &problem, SchedulePolicy policy,
                                  Schedule &result);

} // namespace lull

#endif // LULL_TIMING_SCHEDULERS_H
