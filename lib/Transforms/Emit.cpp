//===- Emit.cpp - lull-emit -------------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/Timeline.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"
#include "lull/Transforms/Plans.h"

#include <fmt/format.h>

namespace lull {
#define GEN_PASS_DEF_LULLEMIT
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct EmitPass : public lull::impl::LullEmitBase<EmitPass> {
  using LullEmitBase::LullEmitBase;

  void runOnOperation() override;
};

/// Emits the planned windows of one function.
class Emitter {
public:
  Emitter(const Timeline &timeline, Remarks &remarks)
      : program(timeline.read()), timeline(timeline), remarks(remarks),
        plans(program.device(), program.function()),
        builder(program.function()->getContext()) {}

  LogicalResult emit(OpId id);

private:
  /// Replaces the idle; `placement` holds the starts.
  void rewrite(TimedOpInterface idle, const Player &player,
               const Placement &placement, Ticks length);
  void remark(OpId id, PlanAttr plan, const Player &player,
              const Placement &placement);

  const TimedProgram &program;
  const Timeline &timeline;
  Remarks &remarks;
  Plans plans;
  OpBuilder builder;
};

} // namespace

void Emitter::rewrite(TimedOpInterface idle, const Player &player,
                      const Placement &placement, Ticks length) {
  SmallVector<OpOperand *, 1> operands;
  idle.collectQubits(operands);
  Value qubit = operands.front()->get();
  const HostInterface *host = hostOf(qubit.getType());
  bool carry = host->hasValueSemantics();
  Location loc = idle->getLoc();
  builder.setInsertionPoint(idle);
  const Sequence &sequence = player.sequence();
  ArrayRef<Ticks> widths = player.widths();
  Ticks now = 0;
  auto wait = [&](Ticks until) {
    if (until > now)
      qubit =
          host->buildDelay(builder, loc, qubit, Duration::ticks(until - now));
    now = until;
  };
  for (size_t i = 0; i < sequence.size(); ++i) {
    wait(placement.starts[i]);
    auto pulse = PulseOp::create(builder, loc, qubit, sequence.phases[i],
                                 Duration::ticks(widths[i]),
                                 i + 1 == sequence.size(), carry);
    if (carry)
      qubit = pulse.getCarried();
    now += widths[i];
  }
  wait(length);
  if (Value carrier = idle.getCarrier(0))
    carrier.replaceAllUsesWith(qubit);
  idle->erase();
}

void Emitter::remark(OpId id, PlanAttr plan, const Player &player,
                     const Placement &placement) {
  const Clock &clock = program.device().clock();
  SiteId site = program.site(program.problem().occupied(id)[0]);
  Ticks length = program.problem().duration(id);
  remarks.passed(
      program.op(id)->getLoc(), "Protected",
      fmt::format("window of {} on site {} protected by {}: {} pulses, "
                  "residual {} dt",
                  clock.describe(length), site, player.sequence().name,
                  player.sequence().size(), placement.residual),
      {{"Site", std::to_string(site)},
       {"Start", std::to_string(timeline.start(id))},
       {"Length", std::to_string(length)},
       {"Repeats", std::to_string(plan.getRepeats())},
       {"Pulses", std::to_string(player.sequence().size())},
       {"Residual", std::to_string(placement.residual)}});
}

LogicalResult Emitter::emit(OpId id) {
  TimedOpInterface idle = program.op(id);
  PlanAttr plan = idle.getWindowPlan();
  if (!plan)
    return success();
  const Problem &problem = program.problem();
  SiteId site = program.site(problem.occupied(id)[0]);
  llvm::Expected<Player *> player = plans.player(plan, site);
  if (!player)
    return idle->emitError(llvm::toString(player.takeError()));
  Ticks length = problem.duration(id);
  llvm::Expected<const Placement *> placement =
      (*player)->place(plans.window(timeline.start(id), length));
  if (!placement)
    return idle->emitError("the plan '")
           << (*player)->sequence().name << "' on site " << site
           << " does not fit: " << llvm::toString(placement.takeError());
  if (remarks.wanted())
    remark(id, plan, **player, **placement);
  rewrite(idle, **player, **placement, length);
  return success();
}

void EmitPass::runOnOperation() {
  getAnalysis<Devices>();
  LogicalResult result =
      forEachTimedFunction(getOperation(), getAnalysisManager(), getArgument(),
                           [&](Operation *, AnalysisManager manager,
                               Remarks &remarks) -> LogicalResult {
                             const Timeline &timeline =
                                 manager.getAnalysis<Timeline>();
                             if (!timeline.isValid())
                               return failure();
                             const Problem &problem = timeline.read().problem();
                             Emitter emitter(timeline, remarks);
                             for (OpId id = 0; id < problem.size(); ++id)
                               if (problem.kind(id) == OperationKind::Idle &&
                                   failed(emitter.emit(id)))
                                 return failure();
                             return success();
                           });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
