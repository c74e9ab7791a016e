//===- Problem.cpp - Operations to be scheduled ---------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Problem.h"

#include "llvm/ADT/STLExtras.h"

#include <algorithm>

using namespace lull;

llvm::StringRef lull::spell(OperationKind kind) {
  switch (kind) {
  case OperationKind::Gate:
    return "gate";
  case OperationKind::Measure:
    return "measure";
  case OperationKind::Reset:
    return "reset";
  case OperationKind::Barrier:
    return "barrier";
  case OperationKind::Delay:
    return "delay";
  case OperationKind::Idle:
    return "idle";
  case OperationKind::Pulse:
    return "pulse";
  }
  return "";
}

void Problem::reserve(size_t operations, size_t occupations) {
  kinds.reserve(operations);
  durations.reserve(operations);
  offsets.reserve(operations + 1);
  operands.reserve(occupations);
}

ResourceId Problem::addResource() {
  others.push_back(resources);
  return resources++;
}

OpId Problem::add(OperationKind kind, Ticks duration,
                  llvm::ArrayRef<ResourceId> occupies) {
  OpId op = size();
  kinds.push_back(kind);
  durations.push_back(duration);
  operands.insert(operands.end(), occupies.begin(), occupies.end());
  offsets.push_back(operands.size());
  return op;
}

bool Problem::isQubit(ResourceId resource) const {
  return resource < resources &&
         !std::binary_search(others.begin(), others.end(), resource);
}

std::vector<std::pair<OpId, OpId>> Problem::orderByAfter() const {
  std::vector<std::pair<OpId, OpId>> result(orders);
  auto earlier = [](std::pair<OpId, OpId> a, std::pair<OpId, OpId> b) {
    return std::pair(a.second, a.first) < std::pair(b.second, b.first);
  };
  // Whoever walks a program adds them in this order.
  if (!llvm::is_sorted(result, earlier))
    llvm::sort(result, earlier);
  return result;
}

std::vector<Violation> Problem::check() const {
  using Rule = Violation::Rule;
  std::vector<Violation> violations;
  auto report = [&](Rule rule, OpId op) -> Violation & {
    Violation violation;
    violation.rule = rule;
    violation.op = op;
    violations.push_back(violation);
    return violations.back();
  };

  // The last operation that occupied each resource.
  std::vector<OpId> stamp(resources, NoOp);
  std::vector<std::pair<OpId, OpId>> edges = orderByAfter();
  auto edge = edges.begin();
  for (OpId op = 0, last = size(); op != last; ++op) {
    if (durations[op] < 0)
      report(Rule::NegativeDuration, op).found = durations[op];
    else if (kinds[op] == OperationKind::Barrier && durations[op] != 0)
      report(Rule::BarrierTakesTime, op).found = durations[op];
    for (ResourceId resource : occupied(op)) {
      if (resource >= resources) {
        report(Rule::UnknownResource, op).resource = resource;
        continue;
      }
      // Q4: no site twice.
      if (stamp[resource] == op)
        report(Rule::ResourceTwice, op).resource = resource;
      stamp[resource] = op;
    }
    for (; edge != edges.end() && edge->second == op; ++edge)
      if (edge->first >= op)
        report(Rule::OrderBackward, op).other = edge->first;
  }
  // What is left leads to operations that do not exist.
  for (; edge != edges.end(); ++edge)
    report(Rule::OrderBackward, edge->second).other = edge->first;
  return violations;
}
