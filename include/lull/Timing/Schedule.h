//===- Schedule.h - Start times, and what follows from them -----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_SCHEDULE_H
#define LULL_TIMING_SCHEDULE_H

#include "lull/Timing/Problem.h"

#include "llvm/ADT/STLFunctionalExtras.h"

#include <vector>

namespace lull {

/// A solution: the start of each operation in ticks from the program's start.
struct Schedule {
  std::vector<Ticks> start;
};

/// Whether a schedule is legal: every operation has a start at or after 0, no
/// two operations overlap on a resource or run there against program order
/// (the only overlap rule in the project), and order edges hold. Violations in
/// order of operations; empty if legal.
std::vector<Violation> verify(const Problem &problem, const Schedule &schedule);

/// The end of the last operation; 0 for an empty problem. The schedule is
/// legal.
Ticks makespan(const Problem &problem, const Schedule &schedule);

/// The total slack of each operation: how many ticks it can start later than in
/// the ASAP schedule without moving the end of the program. Zero exactly on
/// critical operations. Both schedules belong to `problem`.
std::vector<Ticks> totalSlack(const Problem &problem, const Schedule &asap,
                              const Schedule &alap);

/// A longest chain of operations that determines the makespan, in time order:
/// each starts when the one before it ends. Among equals, the smallest numbers.
std::vector<OpId> criticalPath(const Problem &problem, const Schedule &asap);

/// Why a qubit waits.
enum class GapReason : std::uint8_t {
  /// The operation after the gap waits for `cause`, busy on `causeQubit`.
  WaitsForOperation,
  /// The operation after the gap is a barrier, which waits for `cause` on
  /// `causeQubit`.
  WaitsAtBarrier,
  /// The operation after the gap waits for `cause` by an order edge; no
  /// `causeQubit`.
  WaitsForOrder,
  /// The operation before the gap could not be later, since `cause` needs it on
  /// `causeQubit`, or by an order edge if that is NoResource (in schedules that
  /// are as late as possible).
  NeededEarly,
  /// Nothing before the gap, and the first operation is not needed sooner.
  StartOfProgram,
  /// Nothing after the gap.
  EndOfProgram,
  /// The schedule chose it; no operation forces it.
  Chosen,
};

/// A stretch of time in which a qubit waits between two of its operations, or
/// before its first, or after its last until the end of the program.
struct Gap {
  ResourceId qubit = NoResource;
  Ticks start = 0;
  Ticks length = 0;
  OpId before = NoOp;
  OpId after = NoOp;
  GapReason reason = GapReason::Chosen;
  OpId cause = NoOp;
  ResourceId causeQubit = NoResource;
};

/// Calls `visit` for each gap of positive length of each qubit that has an
/// operation: first those before an operation, by operation and then by its
/// order of qubits, then those at the end, by qubit. Linear in the problem.
void forEachGap(const Problem &problem, const Schedule &schedule,
                llvm::function_ref<void(const Gap &)> visit);

} // namespace lull

#endif // LULL_TIMING_SCHEDULE_H
