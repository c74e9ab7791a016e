//===- Native.cpp - lull-native ---------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Native.h"
#include "lull/Analysis/Devices.h"
#include "lull/IR/QubitSites.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"

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
        builder(function->getContext()) {}

  LogicalResult run();

private:
  /// A frame that differs from the program's, open between two pulses.
  struct OpenFrame {
    /// What has been added, in units of pi, in [0, 2).
    Fraction frame = 0;
    const OperationEntry *entry = nullptr;
  };

  LogicalResult play(TimedOpInterface pulse, SiteId site);
  /// Closes the open frame of a site before `op`, one of whose operands is
  /// `qubit`.
  void closeBefore(Operation *op, OpOperand &qubit, SiteId site);
  /// Changes the frame at the insertion point so that it is `target` off the
  /// program's; returns the qubit from there on.
  Value changeFrame(Location loc, Value qubit, OpenFrame &open, Fraction target,
                    const OperationEntry *entry);
  llvm::Expected<const NativePulse *> resolve(SiteId site, Fraction phase);
  StringAttr nameOf(const OperationEntry *entry);

  Operation *function;
  const Device &device;
  QubitSites sites;
  OpBuilder builder;
  DenseMap<SiteId, OpenFrame> frames;
  DenseMap<const OperationEntry *, StringAttr> names;
  DenseMap<std::pair<SiteId, std::pair<int64_t, int64_t>>,
           std::unique_ptr<NativePulse>>
      pulses;
};

} // namespace

StringAttr NativeWriter::nameOf(const OperationEntry *entry) {
  StringAttr &name = names[entry];
  if (!name)
    name = builder.getStringAttr(entry->name);
  return name;
}

llvm::Expected<const NativePulse *> NativeWriter::resolve(SiteId site,
                                                          Fraction phase) {
  std::unique_ptr<NativePulse> &entry =
      pulses[{site, {phase.numerator(), phase.denominator()}}];
  if (!entry) {
    llvm::Expected<NativePulse> pulse = nativePulse(device, site, phase);
    if (!pulse)
      return pulse.takeError();
    entry = std::make_unique<NativePulse>(std::move(*pulse));
  }
  return entry.get();
}

/// An angle in units of pi as a frame change writes it: in (-1, 1].
static Fraction shortest(Fraction angle) {
  Fraction turned = angle.modulo(2);
  return turned > Fraction(1) ? *turned.minus(2) : turned;
}

Value NativeWriter::changeFrame(Location loc, Value qubit, OpenFrame &open,
                                Fraction target, const OperationEntry *entry) {
  Fraction change = shortest(target.minus(open.frame).value_or(0));
  open.frame = target;
  open.entry = entry;
  if (change.isZero())
    return qubit;
  return hostOf(qubit.getType())
      ->buildGate(builder, loc, nameOf(entry), {Angle::ofPi(change)}, qubit,
                  Duration::ticks(0));
}

void NativeWriter::closeBefore(Operation *op, OpOperand &qubit, SiteId site) {
  auto open = frames.find(site);
  if (open == frames.end() || open->second.frame.isZero())
    return;
  builder.setInsertionPoint(op);
  qubit.set(changeFrame(op->getLoc(), qubit.get(), open->second, 0,
                        open->second.entry));
}

LogicalResult NativeWriter::play(TimedOpInterface pulse, SiteId site) {
  llvm::Expected<const NativePulse *> resolved =
      resolve(site, pulse.getPulsePhase().multiple().modulo(2));
  if (!resolved)
    return pulse->emitError(llvm::toString(resolved.takeError()));
  const NativePulse &native = **resolved;
  Location loc = pulse->getLoc();
  if (pulse.getDuration() != Duration::ticks(native.width))
    return pulse->emitError("lasts ")
           << pulse.getDuration().str() << " when '" << native.entry->name
           << "' plays it in " << native.width << " dt on site " << site;
  SmallVector<OpOperand *, 1> operands;
  pulse.collectQubits(operands);
  Value qubit = operands.front()->get();
  const HostInterface *host = hostOf(qubit.getType());
  builder.setInsertionPoint(pulse);
  OpenFrame &open = frames[site];
  // In time order Rz(-f), pulse, Rz(f): the frame stands f behind meanwhile.
  Fraction behind = Fraction(0).minus(native.frame)->modulo(2);
  const OperationEntry *frameEntry =
      native.frameEntry ? native.frameEntry : open.entry;
  qubit = changeFrame(loc, qubit, open, behind, frameEntry);
  SmallVector<Angle, 2> angles;
  for (Fraction parameter : native.parameters)
    angles.push_back(Angle::ofPi(parameter));
  Duration length = Duration::ticks(native.entry->duration);
  StringAttr name = nameOf(native.entry);
  qubit = host->buildGate(builder, loc, name, angles, qubit, length);
  if (native.count == 2) {
    if (Ticks pause = native.second - native.entry->duration)
      qubit = host->buildDelay(builder, loc, qubit, Duration::ticks(pause));
    qubit = host->buildGate(builder, loc, name, angles, qubit, length);
  }
  if (pulse.isLastPulse())
    qubit = changeFrame(loc, qubit, open, 0, frameEntry);
  if (Value carrier = pulse.getCarrier(0))
    carrier.replaceAllUsesWith(qubit);
  pulse->erase();
  return success();
}

LogicalResult NativeWriter::run() {
  SmallVector<SiteId, 4> on;
  SmallVector<OpOperand *, 4> operands;
  Block &block = function->getRegion(0).front();
  for (Operation &op : llvm::make_early_inc_range(block)) {
    auto timed = dyn_cast<TimedOpInterface>(op);
    if (!timed)
      continue;
    if (failed(sites.read(timed, device, on)))
      return failure();
    switch (timed.getOperationKind()) {
    case OperationKind::Pulse:
      if (failed(play(timed, on.front())))
        return failure();
      continue;
    case OperationKind::Delay:
    case OperationKind::Idle:
      // A frame passes through a wait.
      continue;
    default:
      break;
    }
    if (frames.empty())
      continue;
    operands.clear();
    timed.collectQubits(operands);
    for (auto [site, operand] : llvm::zip(on, operands))
      closeBefore(&op, *operand, site);
  }
  return success();
}

void NativePass::runOnOperation() {
  const Devices &devices = getAnalysis<Devices>();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *function, AnalysisManager, Remarks &) -> LogicalResult {
        const Device *device = devices.of(function);
        if (!device) {
          devices.explain(function);
          return failure();
        }
        return NativeWriter(function, *device).run();
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
