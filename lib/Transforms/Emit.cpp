//===- Emit.cpp - lull-emit -------------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/ProgramReader.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"
#include "lull/Transforms/Plans.h"
#include "lull/Transforms/PulseWriter.h"

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
  Emitter(Operation *function, const Device &device, bool native,
          Remarks &remarks)
      : device(device), native(native), remarks(remarks),
        reader(function, device), plans(device, function),
        builder(function->getContext()), writer(builder, device) {}

  LogicalResult run();

private:
  LogicalResult emit(PlanAttr plan);
  /// Replaces the idle that was read last.
  LogicalResult rewrite(const Player &player, const Placement &placement);
  void remark(PlanAttr plan, const Player &player, const Placement &placement);

  const Device &device;
  bool native;
  Remarks &remarks;
  ProgramReader reader;
  Plans plans;
  OpBuilder builder;
  PulseWriter writer;
  /// The pulses of the window at hand, if they are to be native.
  SmallVector<const NativePulse *> natives;
};

} // namespace

LogicalResult Emitter::rewrite(const Player &player,
                               const Placement &placement) {
  TimedOpInterface idle = reader.step().op;
  Value qubit = reader.step().operands.front()->get();
  const HostInterface *host = hostOf(qubit.getType());
  bool carry = host->hasValueSemantics();
  SiteId site = reader.site(reader.step().qubits.front());
  Location loc = idle->getLoc();
  builder.setInsertionPoint(idle);
  const Sequence &sequence = player.sequence();
  ArrayRef<Ticks> widths = player.widths();
  Ticks now = 0;
  auto wait = [&](Ticks until) {
    if (until > now && qubit)
      qubit =
          host->buildDelay(builder, loc, qubit, Duration::ticks(until - now));
    now = until;
  };
  for (size_t i = 0; i < sequence.size(); ++i) {
    wait(placement.starts[i]);
    bool last = i + 1 == sequence.size();
    if (!qubit)
      break;
    if (natives.empty()) {
      auto pulse = PulseOp::create(builder, loc, qubit, sequence.phases[i],
                                   Duration::ticks(widths[i]), last, carry);
      qubit = carry ? pulse.getCarried() : qubit;
    } else {
      qubit = writer.play(loc, qubit, site, *natives[i], last);
    }
    now += widths[i];
  }
  wait(reader.step().duration);
  // The host could not build what was asked for, and said so.
  if (!qubit)
    return failure();
  if (Value carrier = idle.getCarrier(0)) {
    carrier.replaceAllUsesWith(qubit);
    reader.carryOn(reader.step().qubits.front(), carrier, qubit);
  }
  idle->erase();
  return success();
}

void Emitter::remark(PlanAttr plan, const Player &player,
                     const Placement &placement) {
  const ProgramReader::Step &step = reader.step();
  SiteId site = reader.site(step.qubits.front());
  size_t pulses = player.sequence().size();
  remarks.passed(
      TimedOpInterface(step.op)->getLoc(), "Protected",
      fmt::format("window of {} on site {} protected by {}: {} pulses, "
                  "residual {} dt",
                  device.clock().describe(step.duration), site,
                  player.sequence().name, pulses, placement.residual),
      {{"Site", std::to_string(site)},
       {"Start", std::to_string(step.start)},
       {"Length", std::to_string(step.duration)},
       {"Repeats", std::to_string(plan.getRepeats())},
       {"Pulses", std::to_string(pulses)},
       {"Residual", std::to_string(placement.residual)}});
}

LogicalResult Emitter::emit(PlanAttr plan) {
  const ProgramReader::Step &step = reader.step();
  TimedOpInterface idle = step.op;
  SiteId site = reader.site(step.qubits.front());
  llvm::Expected<Player *> player = plans.player(plan, site);
  if (!player)
    return idle->emitError(llvm::toString(player.takeError()));
  llvm::Expected<const Placement *> placement =
      (*player)->place(plans.window(step.start, step.duration));
  // W13, W14: pulses that fit.
  if (!placement)
    return idle->emitError("the plan '")
           << (*player)->sequence().name << "' on site " << site
           << " does not fit: " << llvm::toString(placement.takeError());
  natives.clear();
  if (native)
    for (Fraction phase : (*player)->sequence().phases) {
      llvm::Expected<const NativePulse *> pulse = writer.resolve(site, phase);
      if (!pulse)
        return idle->emitError(llvm::toString(pulse.takeError()));
      natives.push_back(*pulse);
    }
  if (remarks.wanted())
    remark(plan, **player, **placement);
  return rewrite(**player, **placement);
}

LogicalResult Emitter::run() {
  FailureOr<Block *> body = reader.body();
  if (failed(body))
    return failure();
  for (Operation &op : llvm::make_early_inc_range(**body)) {
    FailureOr<bool> timed = reader.read(&op);
    if (failed(timed))
      return failure();
    if (!*timed || reader.step().kind != OperationKind::Idle)
      continue;
    if (PlanAttr plan = TimedOpInterface(reader.step().op).getWindowPlan())
      if (failed(emit(plan)))
        return failure();
  }
  return success();
}

void EmitPass::runOnOperation() {
  const Devices &devices = getAnalysis<Devices>();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *function, AnalysisManager,
          Remarks &remarks) -> LogicalResult {
        const Device *device = devices.require(function);
        return failure(
            !device ||
            failed(Emitter(function, *device, native, remarks).run()));
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
