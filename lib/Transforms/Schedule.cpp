//===- Schedule.cpp - lull-schedule -----------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/Report.h"
#include "lull/Analysis/Timeline.h"
#include "lull/Analysis/WindowStates.h"
#include "lull/Timing/Schedulers.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"

#include <fmt/format.h>

namespace lull {
#define GEN_PASS_DEF_LULLSCHEDULE
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct SchedulePass : public lull::impl::LullScheduleBase<SchedulePass> {
  using LullScheduleBase::LullScheduleBase;

  void runOnOperation() override;

private:
  LogicalResult makeTight(const Timeline &timeline, Remarks &remarks);
};

/// Writes the gaps of one function as idles.
class GapWriter {
public:
  GapWriter(const TimedProgram &program, const WindowStates &states,
            Remarks &remarks)
      : program(program), states(states), remarks(remarks),
        builder(program.function()->getContext()) {}

  void write(const Gap &gap);
  /// Whether a host could not build an idle and said so.
  bool anyFailed() const { return failed; }

private:
  void writeBefore(TimedOpInterface after, const Gap &gap);
  void writeAtEnd(const Gap &gap);
  Value buildIdle(Location loc, Value qubit, const Gap &gap,
                  WindowState state) {
    return hostOf(qubit.getType())
        ->buildIdle(builder, loc, qubit, Duration::ticks(gap.length), state);
  }
  void remark(Location loc, const Gap &gap, WindowState state);

  const TimedProgram &program;
  const WindowStates &states;
  Remarks &remarks;
  OpBuilder builder;
  /// The operation that gaps end at, its qubit operands, and the one reached:
  /// the gaps before one operation come in the order of its qubits, and a
  /// barrier may have thousands.
  OpId current = NoOp;
  SmallVector<OpOperand *, 4> operands;
  size_t index = 0;
  bool failed = false;
};

} // namespace

void GapWriter::writeBefore(TimedOpInterface after, const Gap &gap) {
  if (current != gap.after) {
    current = gap.after;
    operands.clear();
    after.collectQubits(operands);
    index = 0;
  }
  ArrayRef<ResourceId> qubits = program.problem().occupied(gap.after);
  while (qubits[index] != gap.qubit)
    ++index;
  WindowState state = states.before(gap.after, index);
  remark(after->getLoc(), gap, state);
  builder.setInsertionPoint(after);
  Value next = buildIdle(after->getLoc(), operands[index]->get(), gap, state);
  if (!next) {
    failed = true;
    return;
  }
  operands[index]->set(next);
}

void GapWriter::writeAtEnd(const Gap &gap) {
  WindowState state = states.atEnd(gap.qubit);
  Location loc = TimedOpInterface(program.op(gap.before))->getLoc();
  remark(loc, gap, state);
  Value qubit = program.lastValue(gap.qubit);
  Block &block = program.function()->getRegion(0).front();
  if (block.mightHaveTerminator())
    builder.setInsertionPoint(block.getTerminator());
  else
    builder.setInsertionPointToEnd(&block);
  // In value semantics, whatever returns the qubit returns the later one.
  SmallVector<OpOperand *> uses;
  if (hostOf(qubit.getType())->hasValueSemantics())
    for (OpOperand &use : qubit.getUses())
      uses.push_back(&use);
  Value next = buildIdle(loc, qubit, gap, state);
  failed |= !next;
  for (OpOperand *use : uses)
    if (next)
      use->set(next);
}

void GapWriter::remark(Location loc, const Gap &gap, WindowState state) {
  if (!remarks.wanted())
    return;
  remarks.analysis(loc, "Wait",
                   fmt::format("site {} waits {} from {} dt ({}): it {}",
                               program.site(gap.qubit),
                               program.device().clock().describe(gap.length),
                               gap.start, stringifyWindowState(state).str(),
                               describe(program, gap)),
                   {{"Site", std::to_string(program.site(gap.qubit))},
                    {"Start", std::to_string(gap.start)},
                    {"Length", std::to_string(gap.length)}});
}

void GapWriter::write(const Gap &gap) {
  if (gap.after == NoOp)
    writeAtEnd(gap);
  else
    writeBefore(program.op(gap.after), gap);
}

LogicalResult SchedulePass::makeTight(const Timeline &timeline,
                                      Remarks &remarks) {
  const TimedProgram &program = timeline.read();
  const Problem &problem = program.problem();
  Schedule chosen;
  if (std::optional<Violation> violation = schedule(problem, policy, chosen)) {
    report(program, *violation);
    return failure();
  }
  // The one place where a scheduler is not believed.
  if (failed(report(program, verify(problem, chosen))))
    return failure();
  WindowStates states(program, liveAtStart, spentAtEnd);
  GapWriter writer(program, states, remarks);
  unsigned gaps = 0;
  forEachGap(problem, chosen, [&](const Gap &gap) {
    writer.write(gap);
    ++gaps;
  });
  if (writer.anyFailed())
    return failure();
  if (remarks.wanted())
    remarks.analysis(
        program.function()->getLoc(), "Length",
        fmt::format("takes {}; the critical path has {} of {} operations; {} "
                    "waits written",
                    program.device().clock().describe(timeline.end()),
                    criticalPath(problem, timeline.schedule()).size(),
                    problem.size(), gaps),
        {{"Length", std::to_string(timeline.end())},
         {"Waits", std::to_string(gaps)}});
  return success();
}

void SchedulePass::runOnOperation() {
  getAnalysis<Devices>();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *, AnalysisManager manager, Remarks &remarks) {
        const Timeline &timeline = manager.getAnalysis<Timeline>();
        return timeline.isValid() ? makeTight(timeline, remarks) : failure();
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
