//===- ProblemTest.cpp - Operations to be scheduled -----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Problem.h"

#include "gtest/gtest.h"

#include <limits>

using namespace lull;

namespace {

using Rule = Violation::Rule;
using Edges = std::vector<std::pair<OpId, OpId>>;

void expectViolation(const Violation &got, Rule rule, OpId op, OpId other,
                     ResourceId resource, Ticks found) {
  EXPECT_EQ(int(got.rule), int(rule));
  EXPECT_EQ(got.op, op);
  EXPECT_EQ(got.other, other);
  EXPECT_EQ(got.resource, resource);
  EXPECT_EQ(got.found, found);
}

TEST(ProblemTest, KindsHaveNames) {
  EXPECT_EQ(spell(OperationKind::Gate), "gate");
  EXPECT_EQ(spell(OperationKind::Measure), "measure");
  EXPECT_EQ(spell(OperationKind::Reset), "reset");
  EXPECT_EQ(spell(OperationKind::Barrier), "barrier");
  EXPECT_EQ(spell(OperationKind::Delay), "delay");
  EXPECT_EQ(spell(OperationKind::Idle), "idle");
  EXPECT_EQ(spell(OperationKind::Pulse), "pulse");
}

TEST(ProblemTest, KeepsWhatItIsGiven) {
  Problem problem;
  problem.reserve(3, 4);
  ResourceId a = problem.addQubit();
  ResourceId lineout = problem.addResource();
  ResourceId b = problem.addQubit();
  EXPECT_EQ(problem.numResources(), 3u);
  EXPECT_TRUE(problem.isQubit(a));
  EXPECT_FALSE(problem.isQubit(lineout));
  EXPECT_TRUE(problem.isQubit(b));
  EXPECT_FALSE(problem.isQubit(3));
  EXPECT_FALSE(problem.isQubit(NoResource));

  EXPECT_EQ(problem.add(OperationKind::Gate, 40, {b, a}), 0u);
  EXPECT_EQ(problem.add(OperationKind::Barrier, 0, {}), 1u);
  EXPECT_EQ(problem.add(OperationKind::Measure, 700, {a, lineout}), 2u);
  EXPECT_EQ(problem.size(), 3u);
  EXPECT_EQ(problem.kind(2), OperationKind::Measure);
  EXPECT_EQ(problem.duration(2), 700);
  EXPECT_EQ(problem.occupied(0), (llvm::ArrayRef<ResourceId>{b, a}));
  EXPECT_TRUE(problem.occupied(1).empty());
  EXPECT_EQ(problem.occupied(2), (llvm::ArrayRef<ResourceId>{a, lineout}));
  EXPECT_EQ(problem.occupationsBefore(0), 0u);
  EXPECT_EQ(problem.occupationsBefore(1), 2u);
  EXPECT_EQ(problem.occupationsBefore(2), 2u);
  EXPECT_EQ(problem.occupationsBefore(3), 4u);
  EXPECT_TRUE(problem.check().empty());
}

TEST(ProblemTest, OrderSortsByFollower) {
  Problem problem;
  for (int i = 0; i < 4; ++i)
    problem.add(OperationKind::Gate, 1, {});
  problem.addOrder(2, 3);
  problem.addOrder(1, 2);
  problem.addOrder(0, 3);
  EXPECT_EQ(problem.order().vec(), (Edges{{2, 3}, {1, 2}, {0, 3}}));
  EXPECT_EQ(problem.orderByAfter(), (Edges{{1, 2}, {0, 3}, {2, 3}}));
  EXPECT_TRUE(problem.check().empty());
}

TEST(ProblemTest, EmptyIsSound) { EXPECT_TRUE(Problem().check().empty()); }

TEST(ProblemTest, CheckFindsEverythingInOrder) {
  Problem problem;
  ResourceId a = problem.addQubit(), b = problem.addQubit();
  problem.add(OperationKind::Gate, 0, {a, b});       // 0: fine
  problem.add(OperationKind::Gate, -7, {a});         // 1
  problem.add(OperationKind::Barrier, 5, {a, b});    // 2
  problem.add(OperationKind::Gate, 1, {a, 2, b});    // 3: no resource 2
  problem.add(OperationKind::Gate, -1, {b, a, b});   // 4: twice over
  problem.add(OperationKind::Barrier, -2, {a});      // 5: one complaint
  problem.add(OperationKind::Gate, 1, {NoResource}); // 6
  problem.add(OperationKind::Gate, 1, {a, b});       // 7: fine
  problem.addOrder(0, 9);                            // nowhere
  problem.addOrder(5, 1);
  problem.addOrder(7, 7);
  problem.addOrder(0, 7);

  std::vector<Violation> got = problem.check();
  ASSERT_EQ(got.size(), 10u);
  expectViolation(got[0], Rule::NegativeDuration, 1, NoOp, NoResource, -7);
  expectViolation(got[1], Rule::OrderBackward, 1, 5, NoResource, 0);
  expectViolation(got[2], Rule::BarrierTakesTime, 2, NoOp, NoResource, 5);
  expectViolation(got[3], Rule::UnknownResource, 3, NoOp, 2, 0);
  expectViolation(got[4], Rule::NegativeDuration, 4, NoOp, NoResource, -1);
  expectViolation(got[5], Rule::ResourceTwice, 4, NoOp, b, 0);
  expectViolation(got[6], Rule::NegativeDuration, 5, NoOp, NoResource, -2);
  expectViolation(got[7], Rule::UnknownResource, 6, NoOp, NoResource, 0);
  expectViolation(got[8], Rule::OrderBackward, 7, 7, NoResource, 0);
  expectViolation(got[9], Rule::OrderBackward, 9, 0, NoResource, 0);
}

} // namespace
