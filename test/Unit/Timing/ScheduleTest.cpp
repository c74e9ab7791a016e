//===- ScheduleTest.cpp - Schedules, and what follows from them -----------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Schedulers.h"

#include "gtest/gtest.h"

#include <limits>

using namespace lull;

namespace {

using Kind = OperationKind;
using Rule = Violation::Rule;
using Starts = std::vector<Ticks>;

constexpr Ticks Most = std::numeric_limits<Ticks>::max();

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

/// A gap in one line: `q1 10+30 0>3 reason cause@qubit`.
std::vector<std::string> gapsOf(const Problem &problem,
                                const Schedule &schedule) {
  const char *reasons[] = {"operation", "barrier", "order", "needed",
                           "start",     "end",     "chosen"};
  auto name = [](std::uint32_t number) {
    return number == NoOp ? std::string("-") : std::to_string(number);
  };
  std::vector<std::string> result;
  forEachGap(problem, schedule, [&](const Gap &gap) {
    result.push_back("q" + name(gap.qubit) + " " + std::to_string(gap.start) +
                     "+" + std::to_string(gap.length) + " " + name(gap.before) +
                     ">" + name(gap.after) + " " + reasons[int(gap.reason)] +
                     " " + name(gap.cause) + "@" + name(gap.causeQubit));
  });
  return result;
}

using Lines = std::vector<std::string>;

//===----------------------------------------------------------------------===//
// Schedulers
//===----------------------------------------------------------------------===//

TEST(ScheduleTest, EmptyProblems) {
  Problem p;
  EXPECT_EQ(makespan(p, asap(p)), 0);
  EXPECT_TRUE(alap(p).start.empty());
  EXPECT_TRUE(criticalPath(p, asap(p)).empty());
  EXPECT_TRUE(gapsOf(withQubits(3), Schedule()).empty());
}

TEST(ScheduleTest, LateSchedulesKeepTheLength) {
  Problem p = withQubits(3);
  p.add(Kind::Gate, 10, {0});    // 0
  p.add(Kind::Gate, 30, {1});    // 1
  p.add(Kind::Gate, 40, {0, 1}); // 2
  p.add(Kind::Gate, 5, {2});     // 3
  p.add(Kind::Barrier, 0, {2});  // 4
  p.add(Kind::Gate, 7, {});      // 5: occupies nothing
  EXPECT_EQ(asap(p).start, (Starts{0, 0, 30, 0, 5, 0}));
  EXPECT_EQ(alap(p).start, (Starts{20, 0, 30, 65, 70, 63}));
  EXPECT_EQ(totalSlack(p, asap(p), alap(p)), (Starts{20, 0, 0, 65, 65, 63}));
  EXPECT_EQ(criticalPath(p, asap(p)), (std::vector<OpId>{1, 2}));
}

TEST(ScheduleTest, ResourcesOtherThanQubitsSerialise) {
  Problem p = withQubits(2);
  ResourceId readout = p.addResource();
  p.add(Kind::Measure, 50, {0, readout});
  p.add(Kind::Measure, 50, {1, readout});
  EXPECT_EQ(asap(p).start, (Starts{0, 50}));
  // No gap of the readout itself.
  EXPECT_EQ(gapsOf(p, asap(p)),
            (Lines{"q1 0+50 ->1 operation 0@2", "q0 50+50 0>- end -@-"}));
}

TEST(ScheduleTest, OrderEdgesHold) {
  Problem p = withQubits(3);
  p.add(Kind::Measure, 50, {0});
  p.add(Kind::Gate, 10, {1});
  p.add(Kind::Gate, 10, {1});
  p.add(Kind::Gate, 80, {2});
  p.addOrder(0, 2);
  EXPECT_EQ(asap(p).start, (Starts{0, 0, 50, 0}));
  EXPECT_EQ(alap(p).start, (Starts{20, 60, 70, 0}));
  EXPECT_EQ(gapsOf(p, asap(p)),
            (Lines{"q1 10+40 1>2 order 0@-", "q0 50+30 0>- end -@-",
                   "q1 60+20 2>- end -@-"}));
}

TEST(ScheduleTest, EndsBeyond64BitsAreRefused) {
  Problem p = withQubits(1);
  p.add(Kind::Delay, Most - 5, {0});
  p.add(Kind::Gate, 5, {0});
  EXPECT_EQ(alap(p).start, (Starts{0, Most - 5}));
  p.add(Kind::Gate, 1, {0});
  for (SchedulePolicy policy : {SchedulePolicy::ASAP, SchedulePolicy::ALAP}) {
    Schedule result;
    std::optional<Violation> violation = schedule(p, policy, result);
    ASSERT_TRUE(violation.has_value());
    EXPECT_EQ(violation->rule, Rule::Overflow);
    EXPECT_EQ(violation->op, 2u);
    EXPECT_EQ(violation->found, Most);
    EXPECT_EQ(violation->limit, 1);
  }
}

TEST(ScheduleTest, VerifySaysWhatIsWrong) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Gate, 40, {0, 1});
  p.add(Kind::Gate, 10, {1});
  p.addOrder(0, 2);
  auto only = [&](Starts starts) {
    std::vector<Violation> all = verify(p, Schedule{std::move(starts)});
    EXPECT_EQ(all.size(), 1u);
    return all.empty() ? Violation() : all.front();
  };
  EXPECT_TRUE(verify(p, {{0, 15, 60}}).empty());

  Violation v = only({0, 10});
  EXPECT_EQ(v.rule, Rule::StartMissing);
  EXPECT_EQ(std::tuple(v.op, v.found, v.limit), std::tuple(2u, 2, 3));
  v = only({-1, 10, 50});
  EXPECT_EQ(v.rule, Rule::StartNegative);
  EXPECT_EQ(std::tuple(v.op, v.found), std::tuple(0u, -1));
  v = only({0, 9, 50});
  EXPECT_EQ(v.rule, Rule::Overlap);
  EXPECT_EQ(std::tuple(v.op, v.other, v.resource, v.found, v.limit),
            std::tuple(1u, 0u, 0u, 9, 10));
  v = only({0, 10, Most - 9});
  EXPECT_EQ(v.rule, Rule::Overflow);
  EXPECT_EQ(std::tuple(v.op, v.found, v.limit), std::tuple(2u, Most - 9, 10));
  // Apart, but the wrong way round, and before what it must follow.
  std::vector<Violation> all = verify(p, {{20, 30, 5}});
  ASSERT_EQ(all.size(), 2u);
  EXPECT_EQ(all[0].rule, Rule::Overlap);
  EXPECT_EQ(all[1].rule, Rule::OrderBroken);
  EXPECT_EQ(std::tuple(all[1].op, all[1].other, all[1].found, all[1].limit),
            std::tuple(2u, 0u, 5, 30));
}

//===----------------------------------------------------------------------===//
// Gaps
//===----------------------------------------------------------------------===//

TEST(GapTest, ReasonsOfEarlySchedules) {
  Problem p = withQubits(4);
  p.add(Kind::Gate, 10, {0});         // 0: 0 to 10
  p.add(Kind::Gate, 30, {1});         // 1: 0 to 30
  p.add(Kind::Gate, 40, {0, 1});      // 2: 30 to 70
  p.add(Kind::Gate, 5, {2});          // 3: 0 to 5
  p.add(Kind::Barrier, 0, {2, 3, 1}); // 4: at 70
  p.add(Kind::Gate, 10, {2, 3});      // 5: 70 to 80
  EXPECT_EQ(gapsOf(p, asap(p)),
            (Lines{"q0 10+20 0>2 operation 1@1", "q2 5+65 3>4 barrier 2@1",
                   "q3 0+70 ->4 barrier 2@1", "q0 70+10 2>- end -@-",
                   "q1 70+10 4>- end -@-"}));
}

TEST(GapTest, ReasonsOfLateSchedules) {
  Problem p = withQubits(3);
  p.add(Kind::Gate, 10, {0, 1}); // 0: 0 to 10, for 1
  p.add(Kind::Gate, 50, {1});    // 1: 10 to 60
  p.add(Kind::Gate, 20, {0});    // 2: 40 to 60
  p.add(Kind::Measure, 15, {2}); // 3: 15 to 30, for 4
  p.add(Kind::Gate, 30, {});     // 4: 30 to 60
  p.add(Kind::Gate, 5, {2});     // 5: 55 to 60
  p.addOrder(3, 4);
  EXPECT_EQ(alap(p).start, (Starts{0, 10, 40, 15, 30, 55}));
  EXPECT_EQ(gapsOf(p, alap(p)),
            (Lines{"q0 10+30 0>2 needed 1@1", "q2 0+15 ->3 start -@-",
                   "q2 30+25 3>5 needed 4@-"}));
  // Nothing holds either end of this one.
  EXPECT_EQ(gapsOf(p, {{0, 10, 35, 10, 30, 40}})[0], "q0 10+25 0>2 needed 1@1");
  EXPECT_EQ(gapsOf(p, {{0, 10, 35, 10, 30, 40}})[2], "q2 25+15 3>5 chosen -@-");
}

TEST(GapTest, TheFirstOfSeveralCausesInTheOrderOfQubits) {
  Problem p = withQubits(3);
  p.add(Kind::Gate, 10, {0});
  p.add(Kind::Gate, 10, {1});
  p.add(Kind::Gate, 10, {2, 1, 0});
  EXPECT_EQ(gapsOf(p, asap(p)), (Lines{"q2 0+10 ->2 operation 1@1"}));
}

TEST(GapTest, TheFirstOfSeveralNeedsQubitsBeforeOrder) {
  Problem p = withQubits(4);
  p.add(Kind::Measure, 10, {0, 1});
  p.add(Kind::Gate, 50, {2});
  p.add(Kind::Gate, 50, {3});
  p.add(Kind::Gate, 5, {0});
  p.addOrder(0, 2);
  p.addOrder(0, 1);
  EXPECT_EQ(gapsOf(p, alap(p))[2], "q0 10+45 0>3 needed 1@-");
  p.add(Kind::Gate, 50, {1});
  EXPECT_EQ(gapsOf(p, alap(p))[2], "q0 10+45 0>3 needed 4@1");

  Problem q = withQubits(3);
  q.add(Kind::Gate, 10, {0, 2, 1});
  q.add(Kind::Gate, 50, {1});
  q.add(Kind::Gate, 50, {2});
  q.add(Kind::Gate, 5, {0});
  EXPECT_EQ(gapsOf(q, alap(q)), (Lines{"q0 10+45 0>3 needed 2@2"}));
}

TEST(CriticalPathTest, TheSmallestNumbersAmongEquals) {
  Problem p = withQubits(2);
  p.add(Kind::Gate, 10, {1});      // 0
  p.add(Kind::Gate, 10, {0});      // 1
  p.add(Kind::Barrier, 0, {0, 1}); // 2
  p.add(Kind::Gate, 10, {0});      // 3
  p.add(Kind::Gate, 10, {1});      // 4
  EXPECT_EQ(criticalPath(p, asap(p)), (std::vector<OpId>{0, 2, 3}));
  p.add(Kind::Gate, 0, {0, 1}); // 5: also ends the program
  EXPECT_EQ(criticalPath(p, asap(p)), (std::vector<OpId>{0, 2, 3}));
}

} // namespace
