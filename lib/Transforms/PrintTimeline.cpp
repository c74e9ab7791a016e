//===- PrintTimeline.cpp - lull-print-timeline ------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/Report.h"
#include "lull/Analysis/Timeline.h"
#include "lull/Timing/Schedulers.h"
#include "lull/Transforms/Passes.h"

#include "mlir/IR/SymbolTable.h"

#include <fmt/format.h>

namespace lull {
#define GEN_PASS_DEF_LULLPRINTTIMELINE
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct PrintTimelinePass
    : public lull::impl::LullPrintTimelineBase<PrintTimelinePass> {
  using LullPrintTimelineBase::LullPrintTimelineBase;

  void runOnOperation() override;

private:
  LogicalResult print(const Timeline &timeline);
};

} // namespace

static std::string spellSites(const TimedProgram &program, OpId id) {
  std::string text;
  for (ResourceId qubit : program.problem().occupied(id))
    text += fmt::format("{}{}", text.empty() ? "" : ", ", program.site(qubit));
  return text;
}

LogicalResult PrintTimelinePass::print(const Timeline &timeline) {
  const TimedProgram &program = timeline.read();
  const Problem &problem = program.problem();
  Schedule alap;
  if (std::optional<Violation> violation = scheduleAlap(problem, alap)) {
    report(program, *violation);
    return failure();
  }
  std::vector<Ticks> slack = totalSlack(problem, timeline.schedule(), alap);
  std::vector<bool> critical(problem.size());
  for (OpId id : criticalPath(problem, timeline.schedule()))
    critical[id] = true;
  raw_ostream &out = llvm::outs();
  if (auto name = program.function()->getAttrOfType<StringAttr>(
          SymbolTable::getSymbolAttrName()))
    out << "@" << name.getValue() << ": ";
  out << program.device().clock().describe(timeline.end()) << " on device "
      << program.device().name() << "\n";
  out << fmt::format("{:>12} {:>12} {:>12}  {:8}  {:10}  {}\n", "start", "end",
                     "slack", "", "operation", "sites");
  for (OpId id = 0; id < problem.size(); ++id)
    out << fmt::format("{:>12} {:>12} {:>12}  {:8}  {:10}  {}\n",
                       timeline.start(id),
                       timeline.start(id) + problem.duration(id), slack[id],
                       critical[id] ? "critical" : "",
                       nameOf(program.op(id)).str(), spellSites(program, id));
  return success();
}

void PrintTimelinePass::runOnOperation() {
  getAnalysis<Devices>();
  SmallVector<Operation *> functions = timedFunctions(getOperation());
  // W7: what was to be seen is not there.
  if (functions.empty())
    getOperation().emitWarning()
        << getArgument() << " found no function with timed operations here";
  // One after the other: they share one output.
  bool anyFailed = false;
  for (Operation *function : functions) {
    const Timeline &timeline = getChildAnalysis<Timeline>(function);
    anyFailed |= !timeline.isValid() || failed(print(timeline));
  }
  if (anyFailed)
    return signalPassFailure();
  markAllAnalysesPreserved();
}
