//===- Native.cpp - lull-native ---------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/ProgramReader.h"
#include "lull/IR/QubitSites.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"
#include "lull/Transforms/PulseWriter.h"

namespace lull {
#define GEN_PASS_DEF_LULLNATIVE
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct NativePass : public lull::impl::LullNativeBase<NativePass> {
  using LullNativeBase::LullNativeBase;

  void runOnOperation() override;
};

/// Plays the pulses of one function.
class NativeWriter {
public:
  NativeWriter(Operation *function, const Device &device)
      : function(function), device(device), sites(function),
        builder(function->getContext()), writer(builder, device) {}

  LogicalResult run();

private:
  LogicalResult play(TimedOpInterface pulse, SiteId site);
  /// Closes the frames of an operation's sites before it.
  LogicalResult closeBefore(TimedOpInterface op, ArrayRef<SiteId> on);

  Operation *function;
  const Device &device;
  QubitSites sites;
  OpBuilder builder;
  PulseWriter writer;
  SmallVector<OpOperand *, 4> operands;
};

} // namespace

LogicalResult NativeWriter::play(TimedOpInterface pulse, SiteId site) {
  llvm::Expected<const NativePulse *> native =
      writer.resolve(site, pulse.getPulsePhase().multiple().modulo(2));
  if (!native)
    return pulse->emitError(llvm::toString(native.takeError()));
  // W15: as long as the device plays it.
  llvm::Expected<Ticks> length = device.clock().toTicks(pulse.getDuration());
  if (!length)
    return pulse->emitError(llvm::toString(length.takeError()));
  if (*length != (*native)->width)
    return pulse->emitError("lasts ")
           << *length << " dt when '" << (*native)->entry->name
           << "' plays it in " << (*native)->width << " dt on site " << site;
  operands.clear();
  pulse.collectQubits(operands);
  builder.setInsertionPoint(pulse);
  Value qubit = writer.play(pulse->getLoc(), operands.front()->get(), site,
                            **native, pulse.isLastPulse());
  if (!qubit)
    return failure();
  if (Value carrier = pulse.getCarrier(0)) {
    carrier.replaceAllUsesWith(qubit);
    sites.carryOn(carrier, qubit);
  }
  pulse->erase();
  return success();
}

LogicalResult NativeWriter::closeBefore(TimedOpInterface op,
                                        ArrayRef<SiteId> on) {
  operands.clear();
  op.collectQubits(operands);
  builder.setInsertionPoint(op);
  for (auto [site, operand] : llvm::zip(on, operands)) {
    Value qubit = writer.close(op->getLoc(), operand->get(), site);
    if (!qubit)
      return failure();
    operand->set(qubit);
  }
  return success();
}

LogicalResult NativeWriter::run() {
  SmallVector<SiteId, 4> on;
  FailureOr<Block *> body = ProgramReader(function, device).body();
  if (failed(body))
    return failure();
  for (Operation &op : llvm::make_early_inc_range(**body)) {
    auto timed = dyn_cast<TimedOpInterface>(op);
    if (!timed && failed(ProgramReader::requireUntimed(&op)))
      return failure();
    if (!timed)
      continue;
    OperationKind kind = timed.getOperationKind();
    // Most operations are neither pulses nor carry qubits on, and most of the
    // time no frame is open.
    if (kind != OperationKind::Pulse && !writer.anyOpen() &&
        op.getNumResults() == 0)
      continue;
    if (failed(sites.read(timed, device, on)) ||
        failed(ProgramReader::requireOneQubit(timed, on.size())))
      return failure();
    if (kind == OperationKind::Pulse) {
      if (failed(play(timed, on.front())))
        return failure();
    } else if (kind != OperationKind::Delay && kind != OperationKind::Idle) {
      // A frame passes through a wait, but not through anything else.
      if (writer.anyOpen() && failed(closeBefore(timed, on)))
        return failure();
    }
  }
  return writer.requireClosed();
}

void NativePass::runOnOperation() {
  const Devices &devices = getAnalysis<Devices>();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *function, AnalysisManager, Remarks &) -> LogicalResult {
        const Device *device = devices.require(function);
        return failure(!device ||
                       failed(NativeWriter(function, *device).run()));
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
