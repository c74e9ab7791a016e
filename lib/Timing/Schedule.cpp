//===- Schedule.cpp - Start times, and what follows from them -------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Schedule.h"

#include "llvm/ADT/STLExtras.h"

#include <algorithm>
#include <limits>
#include <optional>
#include <utility>

using namespace lull;

using Edges = std::vector<std::pair<OpId, OpId>>;

//===----------------------------------------------------------------------===//
// Legality
//===----------------------------------------------------------------------===//

std::vector<Violation> lull::verify(const Problem &problem,
                                    const Schedule &schedule) {
  using Rule = Violation::Rule;
  std::vector<Violation> violations;
  auto report = [&](Rule rule, OpId op, OpId other, ResourceId resource,
                    Ticks found, Ticks limit) {
    violations.push_back({rule, op, other, resource, found, limit});
  };

  OpId last = problem.size();
  if (schedule.start.size() < last) {
    OpId given = OpId(schedule.start.size());
    report(Rule::StartMissing, given, NoOp, NoResource, given, last);
    return violations;
  }

  std::vector<Ticks> ends(last);
  // The operation that occupied each resource last, in program order.
  std::vector<OpId> holder(problem.numResources(), NoOp);
  Edges edges = problem.orderByAfter();
  auto edge = edges.begin();
  for (OpId op = 0; op != last; ++op) {
    Ticks start = schedule.start[op];
    Ticks duration = problem.duration(op);
    if (start < 0)
      report(Rule::StartNegative, op, NoOp, NoResource, start, 0);
    if (__builtin_add_overflow(start, duration, &ends[op])) {
      report(Rule::Overflow, op, NoOp, NoResource, start, duration);
      ends[op] = std::numeric_limits<Ticks>::max();
    }
    for (ResourceId resource : problem.occupied(op)) {
      OpId previous = holder[resource];
      if (previous != NoOp && start < ends[previous])
        report(Rule::Overlap, op, previous, resource, start, ends[previous]);
      holder[resource] = op;
    }
    for (; edge != edges.end() && edge->second == op; ++edge)
      if (start < ends[edge->first])
        report(Rule::OrderBroken, op, edge->first, NoResource, start,
               ends[edge->first]);
  }
  return violations;
}

//===----------------------------------------------------------------------===//
// Length and slack
//===----------------------------------------------------------------------===//

static Ticks endOf(const Problem &problem, const Schedule &schedule, OpId op) {
  return schedule.start[op] + problem.duration(op);
}

Ticks lull::makespan(const Problem &problem, const Schedule &schedule) {
  Ticks total = 0;
  for (OpId op = 0, last = problem.size(); op != last; ++op)
    total = std::max(total, endOf(problem, schedule, op));
  return total;
}

std::vector<Ticks> lull::totalSlack(const Problem &problem,
                                    const Schedule &asap,
                                    const Schedule &alap) {
  std::vector<Ticks> slack(problem.size());
  for (OpId op = 0, last = problem.size(); op != last; ++op)
    slack[op] = alap.start[op] - asap.start[op];
  return slack;
}

//===----------------------------------------------------------------------===//
// Neighbours
//===----------------------------------------------------------------------===//

/// For each operation and each resource that it occupies, the operation before
/// it there, in the order of Problem::occupationsBefore.
static std::vector<OpId> findPrevious(const Problem &problem) {
  std::vector<OpId> result;
  result.reserve(problem.occupationsBefore(problem.size()));
  std::vector<OpId> holder(problem.numResources(), NoOp);
  for (OpId op = 0, last = problem.size(); op != last; ++op)
    for (ResourceId resource : problem.occupied(op))
      result.push_back(std::exchange(holder[resource], op));
  return result;
}

/// The same for the operation after it.
static std::vector<OpId> findNext(const Problem &problem) {
  std::vector<OpId> result(problem.occupationsBefore(problem.size()));
  std::vector<OpId> holder(problem.numResources(), NoOp);
  for (OpId op = problem.size(); op-- != 0;)
    for (auto [i, resource] : llvm::enumerate(problem.occupied(op)))
      result[problem.occupationsBefore(op) + i] =
          std::exchange(holder[resource], op);
  return result;
}

//===----------------------------------------------------------------------===//
// Critical path
//===----------------------------------------------------------------------===//

std::vector<OpId> lull::criticalPath(const Problem &problem,
                                     const Schedule &asap) {
  std::vector<OpId> path;
  Ticks total = makespan(problem, asap);
  OpId current = 0;
  while (current != problem.size() && endOf(problem, asap, current) != total)
    ++current;
  if (current == problem.size())
    return path;

  std::vector<OpId> previous = findPrevious(problem);
  Edges edges = problem.orderByAfter();
  auto edge = edges.rbegin();
  // Numbers fall with every step, so this ends.
  while (current != NoOp) {
    path.push_back(current);
    OpId chosen = NoOp;
    auto consider = [&](OpId candidate) {
      if (candidate < chosen &&
          endOf(problem, asap, candidate) == asap.start[current])
        chosen = candidate;
    };
    for (size_t i = problem.occupationsBefore(current),
                end = problem.occupationsBefore(current + 1);
         i != end; ++i)
      consider(previous[i]);
    while (edge != edges.rend() && edge->second > current)
      ++edge;
    for (; edge != edges.rend() && edge->second == current; ++edge)
      consider(edge->first);
    current = chosen;
  }
  std::reverse(path.begin(), path.end());
  return path;
}

//===----------------------------------------------------------------------===//
// Gaps
//===----------------------------------------------------------------------===//

namespace {

/// Who makes an operation wait, or who needs it; `on` is NoResource where an
/// order edge does.
struct Cause {
  OpId op = NoOp;
  ResourceId on = NoResource;
};

/// Reasons belong to operations and not to qubits: the qubit of a gap is never
/// what holds up the operation behind it, nor what needs the one before it. So
/// each operation is asked once, however many qubits it has.
class GapFinder {
public:
  GapFinder(const Problem &problem, const Schedule &schedule)
      : problem(problem), schedule(schedule), previous(findPrevious(problem)),
        edges(problem.orderByAfter()) {
    findNeeded();
  }

  void run(llvm::function_ref<void(const Gap &)> visit) const;

private:
  void findNeeded();
  Cause findWaited(OpId op, Edges::const_iterator edge) const;
  void explain(Gap &gap, Cause waited) const;
  Ticks end(OpId op) const { return endOf(problem, schedule, op); }

  const Problem &problem;
  const Schedule &schedule;
  std::vector<OpId> previous;
  Edges edges;
  /// For each operation, what starts as it ends and could not without it.
  std::vector<Cause> needed;
};

} // namespace

void GapFinder::findNeeded() {
  needed.resize(problem.size());
  std::vector<OpId> next = findNext(problem);
  for (OpId op = 0, last = problem.size(); op != last; ++op) {
    for (auto [i, resource] : llvm::enumerate(problem.occupied(op))) {
      OpId follower = next[problem.occupationsBefore(op) + i];
      if (follower == NoOp || schedule.start[follower] != end(op))
        continue;
      needed[op] = {follower, resource};
      break;
    }
  }
  for (auto [before, after] : edges)
    if (needed[before].op == NoOp && schedule.start[after] == end(before))
      needed[before] = {after, NoResource};
}

/// What ends as `op` starts; `edge` is the first that leads to it, if any.
Cause GapFinder::findWaited(OpId op, Edges::const_iterator edge) const {
  Ticks start = schedule.start[op];
  for (auto [i, resource] : llvm::enumerate(problem.occupied(op))) {
    OpId holder = previous[problem.occupationsBefore(op) + i];
    if (holder != NoOp && end(holder) == start)
      return {holder, resource};
  }
  for (; edge != edges.end() && edge->second == op; ++edge)
    if (end(edge->first) == start)
      return {edge->first, NoResource};
  return {};
}

/// Sets the reason of a gap that lies before an operation.
void GapFinder::explain(Gap &gap, Cause waited) const {
  Cause cause = waited;
  if (waited.op != NoOp && waited.on == NoResource) {
    gap.reason = GapReason::WaitsForOrder;
  } else if (waited.op != NoOp) {
    gap.reason = problem.kind(gap.after) == OperationKind::Barrier
                     ? GapReason::WaitsAtBarrier
                     : GapReason::WaitsForOperation;
  } else if (gap.before == NoOp) {
    gap.reason = GapReason::StartOfProgram;
  } else {
    cause = needed[gap.before];
    gap.reason = cause.op == NoOp ? GapReason::Chosen : GapReason::NeededEarly;
  }
  gap.cause = cause.op;
  gap.causeQubit = cause.on;
}

void GapFinder::run(llvm::function_ref<void(const Gap &)> visit) const {
  std::vector<Ticks> freeAt(problem.numResources(), 0);
  std::vector<OpId> holder(problem.numResources(), NoOp);
  Ticks total = 0;
  auto edge = edges.begin();
  for (OpId op = 0, last = problem.size(); op != last; ++op) {
    Ticks start = schedule.start[op];
    total = std::max(total, end(op));
    while (edge != edges.end() && edge->second < op)
      ++edge;
    std::optional<Cause> waited;
    for (ResourceId resource : problem.occupied(op)) {
      if (start > freeAt[resource] && problem.isQubit(resource)) {
        if (!waited)
          waited = findWaited(op, edge);
        Gap gap;
        gap.qubit = resource;
        gap.start = freeAt[resource];
        gap.length = start - gap.start;
        gap.before = holder[resource];
        gap.after = op;
        explain(gap, *waited);
        visit(gap);
      }
      freeAt[resource] = end(op);
      holder[resource] = op;
    }
  }
  for (ResourceId resource = 0, last = problem.numResources(); resource != last;
       ++resource) {
    if (holder[resource] == NoOp || freeAt[resource] == total ||
        !problem.isQubit(resource))
      continue;
    Gap gap;
    gap.qubit = resource;
    gap.start = freeAt[resource];
    gap.length = total - gap.start;
    gap.before = holder[resource];
    gap.reason = GapReason::EndOfProgram;
    visit(gap);
  }
}

void lull::forEachGap(const Problem &problem, const Schedule &schedule,
                      llvm::function_ref<void(const Gap &)> visit) {
  GapFinder(problem, schedule).run(visit);
}
