//===- SchedulersTest.cpp - Schedulers against others' rules --------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Schedulers.h"

#include "llvm/ADT/STLExtras.h"

#include "gtest/gtest.h"

#include <algorithm>
#include <random>

using namespace lull;

namespace {

using Kind = OperationKind;
using Rule = Violation::Rule;
using Starts = std::vector<Ticks>;

/// A problem of `qubits` qubits, numbered from 0.
Problem withQubits(unsigned qubits) {
  Problem problem;
  while (qubits-- > 0)
    problem.addQubit();
  return problem;
}

Schedule solve(const Problem &problem, SchedulePolicy policy) {
  EXPECT_TRUE(problem.check().empty());
  Schedule result;
  EXPECT_FALSE(schedule(problem, policy, result).has_value());
  EXPECT_TRUE(verify(problem, result).empty());
  return result;
}
Schedule asap(const Problem &problem) {
  return solve(problem, SchedulePolicy::ASAP);
}
Schedule alap(const Problem &problem) {
  return solve(problem, SchedulePolicy::ALAP);
}

//===----------------------------------------------------------------------===//
// OpenQASM 3 live specification, sections "Delays" and "Barrier", our reading
// of them: x takes 10, cx 40; implicit waits as early as possible.
//===----------------------------------------------------------------------===//

TEST(OpenQasmTimingTest, GatesWaitForAllTheirQubits) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Gate, 40, {0, 1});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 50}));
}

TEST(OpenQasmTimingTest, BarrierAlignsItsQubits) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Barrier, 0, {0, 1});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 10}));
}

TEST(OpenQasmTimingTest, DelayOnSeveralQubitsIsOneOperation) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Delay, 20, {0, 1});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 30}));
}

TEST(OpenQasmTimingTest, DelayOfNothingAlignsLikeABarrier) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Delay, 0, {0, 1});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 10}));
}

TEST(OpenQasmTimingTest, DelaysOnSingleQubitsAreIndependent) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Delay, 20, {0});
  p.add(Kind::Delay, 20, {1});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 0, 20}));
}

TEST(OpenQasmTimingTest, BarrierLeavesOtherQubitsAlone) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Barrier, 0, {0});
  p.add(Kind::Gate, 10, {1});
  EXPECT_EQ(asap(p).start, (Starts{0, 10, 0}));
}

//===----------------------------------------------------------------------===//
// Random programs, against longest paths by relaxation over all pairs
//===----------------------------------------------------------------------===//

struct Reference {
  Starts early, late;
  Ticks length = 0;
};

/// Whether `b` has to wait for `a`, which stands before it.
bool precedes(const Problem &p, OpId a, OpId b) {
  for (ResourceId resource : p.occupied(a))
    if (llvm::is_contained(p.occupied(b), resource))
      return true;
  return llvm::is_contained(p.order(), std::pair(a, b));
}

Reference relax(const Problem &p) {
  Reference result;
  OpId n = p.size();
  result.early.assign(n, 0);
  for (bool changed = true; changed;) {
    changed = false;
    for (OpId b = 0; b < n; ++b) {
      for (OpId a = 0; a < b; ++a) {
        Ticks least = result.early[a] + p.duration(a);
        if (result.early[b] < least && precedes(p, a, b)) {
          result.early[b] = least;
          changed = true;
        }
      }
    }
  }
  for (OpId a = 0; a < n; ++a)
    result.length = std::max(result.length, result.early[a] + p.duration(a));
  for (OpId a = 0; a < n; ++a)
    result.late.push_back(result.length - p.duration(a));
  for (bool changed = true; changed;) {
    changed = false;
    for (OpId a = 0; a < n; ++a) {
      for (OpId b = a + 1; b < n; ++b) {
        Ticks most = result.late[b] - p.duration(a);
        if (result.late[a] > most && precedes(p, a, b)) {
          result.late[a] = most;
          changed = true;
        }
      }
    }
  }
  return result;
}

Problem randomProblem(std::mt19937 &random) {
  Problem p;
  unsigned resources = 1 + random() % 6;
  for (unsigned i = 0; i < resources; ++i)
    random() % 6 == 0 ? p.addResource() : p.addQubit();
  unsigned operations = random() % 25;
  for (OpId op = 0; op < operations; ++op) {
    std::vector<ResourceId> occupied;
    for (unsigned wanted = random() % 4; wanted > 0; --wanted) {
      ResourceId resource = random() % resources;
      if (!llvm::is_contained(occupied, resource))
        occupied.push_back(resource);
    }
    // Few lengths, so that there are ties.
    bool barrier = random() % 5 == 0;
    p.add(barrier ? Kind::Barrier : Kind::Gate,
          barrier ? 0 : 5 * (random() % 4), occupied);
  }
  for (unsigned edges = random() % 4; operations > 1 && edges > 0; --edges) {
    OpId after = 1 + random() % (operations - 1);
    p.addOrder(random() % after, after);
  }
  return p;
}

/// Gaps and operations fill the program on every qubit, and each gap's reason
/// is true.
void checkGaps(const Problem &p, const Schedule &s, SchedulePolicy policy,
               Ticks length) {
  Starts filled(p.numResources(), 0);
  std::vector<bool> used(p.numResources(), false);
  for (OpId op = 0; op < p.size(); ++op) {
    for (ResourceId resource : p.occupied(op)) {
      filled[resource] += p.duration(op);
      used[resource] = true;
    }
  }
  auto end = [&](OpId op) { return s.start[op] + p.duration(op); };
  auto occupies = [&](OpId op, ResourceId resource) {
    return llvm::is_contained(p.occupied(op), resource);
  };
  forEachGap(p, s, [&](const Gap &gap) {
    ASSERT_TRUE(p.isQubit(gap.qubit));
    ASSERT_GT(gap.length, 0);
    filled[gap.qubit] += gap.length;
    EXPECT_EQ(gap.start, gap.before == NoOp ? 0 : end(gap.before));
    EXPECT_EQ(gap.start + gap.length,
              gap.after == NoOp ? length : s.start[gap.after]);
    switch (gap.reason) {
    case GapReason::WaitsForOperation:
    case GapReason::WaitsAtBarrier:
      EXPECT_EQ(gap.reason == GapReason::WaitsAtBarrier,
                p.kind(gap.after) == Kind::Barrier);
      EXPECT_NE(gap.causeQubit, gap.qubit);
      EXPECT_TRUE(occupies(gap.cause, gap.causeQubit));
      EXPECT_TRUE(occupies(gap.after, gap.causeQubit));
      EXPECT_EQ(end(gap.cause), s.start[gap.after]);
      break;
    case GapReason::WaitsForOrder:
      EXPECT_TRUE(
          llvm::is_contained(p.order(), std::pair(gap.cause, gap.after)));
      EXPECT_EQ(end(gap.cause), s.start[gap.after]);
      break;
    case GapReason::NeededEarly:
      EXPECT_TRUE(precedes(p, gap.before, gap.cause));
      EXPECT_EQ(s.start[gap.cause], end(gap.before));
      break;
    case GapReason::StartOfProgram:
      EXPECT_EQ(gap.before, NoOp);
      break;
    case GapReason::EndOfProgram:
      EXPECT_EQ(gap.after, NoOp);
      return;
    case GapReason::Chosen:
      ADD_FAILURE() << "something always forces a gap here";
    }
    // As early as possible, it is always the operation behind that waits.
    if (policy == SchedulePolicy::ASAP) {
      EXPECT_LE(gap.reason, GapReason::WaitsForOrder);
    }
  });
  for (ResourceId resource = 0; resource < p.numResources(); ++resource) {
    if (p.isQubit(resource) && used[resource]) {
      EXPECT_EQ(filled[resource], length);
    }
  }
}

/// Every start that is moved into the operation before it is found.
unsigned checkMoves(const Problem &p, Schedule s) {
  unsigned moves = 0;
  for (OpId op = 0; op < p.size(); ++op) {
    for (OpId before = 0; before < op; ++before) {
      if (s.start[before] + p.duration(before) != s.start[op] ||
          !precedes(p, before, op))
        continue;
      --s.start[op];
      EXPECT_TRUE(llvm::any_of(verify(p, s), [&](const Violation &v) {
        return v.op == op &&
               (v.rule == Rule::Overlap || v.rule == Rule::OrderBroken) &&
               v.found == s.start[op] && v.limit == s.start[op] + 1;
      }));
      ++s.start[op];
      ++moves;
    }
  }
  return moves;
}

TEST(RandomProgramTest, AgreesWithLongestPaths) {
  std::mt19937 random(7);
  unsigned moves = 0;
  for (int round = 0; round < 2000; ++round) {
    Problem p = randomProblem(random);
    Reference reference = relax(p);
    Schedule early = asap(p), late = alap(p);
    ASSERT_EQ(early.start, reference.early);
    ASSERT_EQ(late.start, reference.late);
    EXPECT_EQ(makespan(p, early), reference.length);
    EXPECT_EQ(makespan(p, late), p.size() ? reference.length : 0);
    Starts slack = totalSlack(p, early, late);
    for (OpId op = 0; op < p.size(); ++op)
      EXPECT_EQ(slack[op], reference.late[op] - reference.early[op]);

    checkGaps(p, early, SchedulePolicy::ASAP, reference.length);
    checkGaps(p, late, SchedulePolicy::ALAP, reference.length);
    moves += checkMoves(p, early) + checkMoves(p, late);

    std::vector<OpId> path = criticalPath(p, early);
    ASSERT_EQ(path.empty(), p.size() == 0);
    Ticks now = 0;
    for (size_t i = 0; i < path.size(); ++i) {
      EXPECT_EQ(early.start[path[i]], now);
      EXPECT_EQ(slack[path[i]], 0);
      if (i > 0) {
        EXPECT_TRUE(precedes(p, path[i - 1], path[i]));
      }
      now += p.duration(path[i]);
    }
    EXPECT_EQ(now, reference.length);
  }
  EXPECT_GT(moves, 10000u);
}

} // namespace
