//===- Comparison.cpp - Before and after ------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Comparison.h"

#include "lull/IR/Ops.h"

#include "mlir/IR/OperationSupport.h"

#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

static bool isSame(const ReadOp &a, const ReadOp &b) {
  return a.sites == b.sites && a.start == b.start &&
         mlir::OperationEquivalence::isEquivalentTo(
             a.op, b.op, mlir::OperationEquivalence::ignoreValueEquivalence,
             /*markEquivalent=*/nullptr,
             mlir::OperationEquivalence::IgnoreLocations);
}

void Comparison::checkTight(const ReadProgram &program) {
  std::int64_t makespan = invented.makespan();
  for (const auto &[site, row] : program.bySite) {
    std::int64_t now = 0;
    for (size_t index : row) {
      EXPECT_EQ(program.ops[index].start, now) << "a hole on site " << site;
      now = program.ops[index].start + program.ops[index].duration;
    }
    EXPECT_EQ(now, makespan) << "at the end of site " << site;
  }
}

void Comparison::checkScheduled(const ReadProgram &scheduled,
                                SchedulePolicy policy) {
  std::vector<std::int64_t> starts =
      policy == SchedulePolicy::ASAP ? invented.asap() : invented.alap();
  int next = 0;
  for (const ReadOp &op : scheduled.ops) {
    if (op.tag < 0) {
      EXPECT_EQ(op.kind, "idle");
      EXPECT_GT(op.duration, 0);
      continue;
    }
    ASSERT_EQ(op.tag, next++);
    const InventedOp &known = invented.ops[op.tag];
    EXPECT_EQ(op.start, starts[op.tag]) << "of operation " << op.tag;
    EXPECT_EQ(op.kind, known.kind);
    EXPECT_EQ(op.sites, known.sites);
  }
  EXPECT_EQ(next, int(invented.ops.size()));
  checkTight(scheduled);
}

/// Every operation of the program but idles, in order, as it was.
void Comparison::checkKept(const ReadProgram &scheduled,
                           const ReadProgram &written) {
  auto next = written.ops.begin();
  for (const ReadOp &op : scheduled.ops) {
    if (op.kind == "idle")
      continue;
    while (next != written.ops.end() && (next->tag < 0 || next->kind == "idle"))
      ++next;
    ASSERT_NE(next, written.ops.end()) << "operation " << op.tag << " is gone";
    EXPECT_EQ(next->tag, op.tag);
    EXPECT_TRUE(isSame(op, *next)) << "operation " << op.tag << " has changed";
    ++next;
  }
  for (; next != written.ops.end(); ++next)
    EXPECT_TRUE(next->tag < 0 || next->kind == "idle");
}

/// Gathers what was put into a window: until its time is over, its pulses are
/// played and its frame is closed. Returns where its site goes on.
size_t Comparison::collect(Window &window, size_t pulses,
                           const ReadProgram &written,
                           llvm::ArrayRef<size_t> row, size_t next) {
  std::int64_t left = window.length;
  size_t halves = 2 * pulses;
  Fraction frame = 0;
  for (; next < row.size(); ++next) {
    const ReadOp &op = written.ops[row[next]];
    if (op.tag >= 0 || op.kind == "idle" ||
        (left == 0 && halves == 0 && frame.isZero()))
      break;
    left -= op.duration;
    if (const Entry *entry = device.find(op.name, {window.site})) {
      if (entry->plays == Entry::Plays::Frame)
        frame = turned(
            frame, llvm::cast<GateOp>(op.op).getAngles().angles[0].multiple());
      else
        halves -= std::min<size_t>(halves, entry->isHalf() ? 1 : 2);
    }
    window.inserted.push_back(&op);
  }
  return next;
}

void Comparison::checkFilled(const Window &window, const Played &expected) {
  std::vector<Pulse> pulses = checkInsertion(window, device);
  std::vector<Fraction> phases;
  for (const Pulse &pulse : pulses) {
    phases.push_back(pulse.phase);
    EXPECT_EQ(pulse.width, device.pulseWidth(window.site, pulse.phase));
    EXPECT_GE(pulse.start, window.start);
    EXPECT_LE(pulse.start + pulse.width, window.start + window.length);
  }
  EXPECT_TRUE(phases == expected.phases)
      << "other pulses than asked for: " << phases.size() << " when it should "
      << "be " << expected.phases.size();
  checkResidual(window, pulses, expected.imbalance, device);
  tally.pulses += std::int64_t(pulses.size());
}

bool Comparison::checkSite(int site, const ReadProgram &scheduled,
                           const ReadProgram &written) {
  llvm::ArrayRef<size_t> before = scheduled.bySite.at(site);
  llvm::ArrayRef<size_t> after = written.bySite.at(site);
  size_t next = 0;
  for (size_t i = 0; i < before.size(); ++i) {
    if (next >= after.size())
      return false;
    const ReadOp &op = scheduled.ops[before[i]];
    const ReadOp &here = written.ops[after[next]];
    if (op.kind != "idle") {
      if (here.tag != op.tag)
        return false;
      ++next;
      continue;
    }
    ++tally.windows;
    // The wish is on the idle or, if it has none, on the operation that ends
    // the wait.
    Wish wish;
    if (op.tag >= 0)
      wish = invented.ops[op.tag].wish;
    const ReadOp *end =
        i + 1 < before.size() ? &scheduled.ops[before[i + 1]] : nullptr;
    if (wish.sequence.empty() && end && end->tag >= 0 && end->kind != "idle")
      wish = invented.ops[end->tag].wish;
    Window window{site, op.start, op.duration, {}};
    auto idle = llvm::cast<IdleOp>(op.op);
    llvm::StringRef state = stringifyWindowState(idle.getState());
    Played expected = expectation.pulses(window, state, wish);
    if (here.kind == "idle") {
      EXPECT_TRUE(expected.phases.empty())
          << "a window of " << op.duration << " dt is left";
      EXPECT_TRUE(isSame(op, here)) << "an idle that is left has changed";
      ++next;
      continue;
    }
    EXPECT_FALSE(expected.phases.empty())
        << "a window of " << op.duration << " dt (" << state.str()
        << ") should be left";
    next = collect(window, expected.phases.size(), written, after, next);
    checkFilled(window, expected);
    ++tally.filled;
  }
  return next == after.size();
}

void Comparison::checkProtected(const ReadProgram &scheduled,
                                const ReadProgram &written) {
  checkTight(written);
  checkKept(scheduled, written);
  ASSERT_EQ(scheduled.bySite.size(), written.bySite.size());
  for (const auto &[site, row] : scheduled.bySite)
    EXPECT_TRUE(checkSite(site, scheduled, written))
        << "site " << site << " holds other operations than before";
}

void property::compare(const Case &example, const Options &options,
                       mlir::ModuleOp scheduled, mlir::ModuleOp written,
                       Tally &tally) {
  Expectation expectation(example.device, options, example.own);
  for (const Invented &function : example.functions) {
    SCOPED_TRACE("function " + function.name);
    auto read = [&](mlir::ModuleOp module) {
      return readProgram(module.lookupSymbol<mlir::func::FuncOp>(function.name),
                         function);
    };
    ReadProgram before = read(scheduled), after = read(written);
    Comparison comparison(example.device, function, expectation, tally);
    comparison.checkScheduled(before, options.policy);
    comparison.checkProtected(before, after);
  }
}
