//===- Schedulers.cpp - Algorithms that make schedules --------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Schedulers.h"

#include <algorithm>

using namespace lull;

using Edges = std::vector<std::pair<OpId, OpId>>;

std::optional<Violation> lull::scheduleAsap(const Problem &problem,
                                            Schedule &result) {
  result.start.assign(problem.size(), 0);
  // Until when each resource is busy.
  std::vector<Ticks> busy(problem.numResources(), 0);
  Edges edges = problem.orderByAfter();
  auto edge = edges.begin();
  for (OpId op = 0, last = problem.size(); op != last; ++op) {
    Ticks start = 0;
    for (ResourceId resource : problem.occupied(op))
      start = std::max(start, busy[resource]);
    for (; edge != edges.end() && edge->second == op; ++edge)
      start = std::max(start, result.start[edge->first] +
                                  problem.duration(edge->first));

    Ticks end;
    if (__builtin_add_overflow(start, problem.duration(op), &end)) {
      Violation violation;
      violation.rule = Violation::Rule::Overflow;
      violation.op = op;
      violation.found = start;
      violation.limit = problem.duration(op);
      return violation;
    }
    result.start[op] = start;
    for (ResourceId resource : problem.occupied(op))
      busy[resource] = end;
  }
  return std::nullopt;
}

std::optional<Violation> lull::scheduleAlap(const Problem &problem,
                                            Schedule &result) {
  if (std::optional<Violation> violation = scheduleAsap(problem, result))
    return violation;
  // The mirror image, from the end that ASAP found. No start falls below that
  // of ASAP, so nothing can overflow.
  Ticks total = makespan(problem, result);
  std::vector<Ticks> needed(problem.numResources(), total);
  Edges edges = problem.orderByAfter();
  std::vector<Ticks> ordered(edges.empty() ? 0 : problem.size(), total);
  auto edge = edges.rbegin();
  for (OpId op = problem.size(); op-- != 0;) {
    Ticks end = edges.empty() ? total : ordered[op];
    for (ResourceId resource : problem.occupied(op))
      end = std::min(end, needed[resource]);
    Ticks start = end - problem.duration(op);
    result.start[op] = start;
    for (ResourceId resource : problem.occupied(op))
      needed[resource] = start;
    for (; edge != edges.rend() && edge->second == op; ++edge)
      ordered[edge->first] = std::min(ordered[edge->first], start);
  }
  return std::nullopt;
}

std::optional<Violation> lull::schedule(const Problem &problem,
                                        SchedulePolicy policy,
                                        Schedule &result) {
  switch (policy) {
  case SchedulePolicy::ASAP:
    return scheduleAsap(problem, result);
  case SchedulePolicy::ALAP:
    return scheduleAlap(problem, result);
  }
  return std::nullopt;
}
