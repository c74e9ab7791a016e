//===- Problem.h - Operations to be scheduled -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The vocabulary of scheduling. Input properties (Problem): the kind of each
// operation, its duration, the resources that it occupies, the order. Solution
// property (Schedule): the start time of each operation. `check` says whether
// the input is complete, `verify` whether a solution is legal; both return
// violations without words, which Analysis/Report turns into diagnostics.
// Operations go by number, not by pointer, so that all of this runs without IR.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_PROBLEM_H
#define LULL_TIMING_PROBLEM_H

#include "lull/Timing/Time.h"
#include "lull/Timing/Violation.h"

#include "llvm/ADT/ArrayRef.h"

#include <cstdint>
#include <utility>
#include <vector>

namespace lull {

/// What an operation is, which decides its duration and what may happen to it.
/// What it occupies is a property of its own (see Problem::add).
enum class OperationKind : std::uint8_t {
  Gate,
  Measure,
  Reset,
  /// Takes no time; its qubits wait for each other.
  Barrier,
  /// A wait that the program asks for.
  Delay,
  /// Slack that a schedule found.
  Idle,
  /// A decoupling pulse that is not yet in the device's own operations.
  Pulse,
};
llvm::StringRef spell(OperationKind kind);

/// Operations in program order. Two operations that occupy the same resource
/// run in that order and never overlap; this is the only source of order
/// besides addOrder.
class Problem {
public:
  void reserve(size_t operations, size_t occupations);

  /// Adds a qubit, which is a resource.
  ResourceId addQubit() { return resources++; }
  /// Adds a resource that is not a qubit (a shared readout line, say): occupied
  /// like one, but nobody waits on it and it has no gaps.
  ResourceId addResource();

  /// Adds an operation at the end. It occupies each of `occupies` for all of
  /// its duration, exclusively.
  OpId add(OperationKind kind, Ticks duration,
           llvm::ArrayRef<ResourceId> occupies);
  /// `after` may start only when `before` has ended, whatever they occupy
  /// (a condition on a measured bit). Requires before < after.
  void addOrder(OpId before, OpId after) { orders.emplace_back(before, after); }

  OpId size() const { return OpId(kinds.size()); }
  ResourceId numResources() const { return resources; }
  bool isQubit(ResourceId resource) const;

  OperationKind kind(OpId op) const { return kinds[op]; }
  Ticks duration(OpId op) const { return durations[op]; }
  llvm::ArrayRef<ResourceId> occupied(OpId op) const {
    return llvm::ArrayRef<ResourceId>(operands).slice(
        offsets[op], offsets[op + 1] - offsets[op]);
  }
  /// The number of all resources occupied by the operations before `op`: where
  /// an array with an element for each (operation, resource) has those of `op`.
  /// Also for op == size().
  size_t occupationsBefore(OpId op) const { return offsets[op]; }
  /// Pairs (before, after) of addOrder.
  llvm::ArrayRef<std::pair<OpId, OpId>> order() const { return orders; }
  /// The same, ascending by `after` and then by `before`.
  std::vector<std::pair<OpId, OpId>> orderByAfter() const;

  /// Whether the input is complete and sound: durations not negative, barriers
  /// of no duration, resources known and none twice in an operation, order
  /// edges forward (and to operations that exist). In order of operations;
  /// empty if all is well.
  std::vector<Violation> check() const;

private:
  std::vector<OperationKind> kinds;
  std::vector<Ticks> durations;
  std::vector<std::uint32_t> offsets = {0};
  std::vector<ResourceId> operands;
  std::vector<std::pair<OpId, OpId>> orders;
  /// Numbers of the resources that are not qubits, ascending.
  std::vector<ResourceId> others;
  ResourceId resources = 0;
};

} // namespace lull

#endif // LULL_TIMING_PROBLEM_H
