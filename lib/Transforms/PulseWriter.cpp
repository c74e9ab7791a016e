//===- PulseWriter.cpp - Pulses as operations -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Transforms/PulseWriter.h"

using namespace lull;
using namespace mlir;

StringAttr PulseWriter::nameOf(const OperationEntry *entry) {
  StringAttr &name = names[entry];
  if (!name)
    name = builder.getStringAttr(entry->name);
  return name;
}

llvm::Expected<const NativePulse *> PulseWriter::resolve(SiteId site,
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

Value PulseWriter::changeFrame(Location loc, Value qubit, OpenFrame &open,
                               Fraction target, const OperationEntry *entry) {
  // Both are in [0, 2) with denominators of sound phases: the sum fits.
  Fraction change = shortest(*target.minus(open.frame));
  // W29: a frame change that the program can write.
  if (!Angle::isSound(change)) {
    emitError(loc) << "needs a frame change by " << change.str()
                   << " pi, which goes beyond " << Angle::mostTerm;
    return {};
  }
  openFrames += int(!target.isZero()) - int(!open.frame.isZero());
  open.frame = target;
  open.entry = entry;
  open.changed = loc;
  if (change.isZero())
    return qubit;
  return hostOf(qubit.getType())
      ->buildGate(builder, loc, nameOf(entry), {Angle::ofPi(change)}, qubit,
                  Duration::ticks(0));
}

Value PulseWriter::close(Location loc, Value qubit, SiteId site) {
  auto open = frames.find(site);
  if (open == frames.end() || open->second.frame.isZero())
    return qubit;
  return changeFrame(loc, qubit, open->second, 0, open->second.entry);
}

LogicalResult PulseWriter::requireClosed() const {
  if (!anyOpen())
    return success();
  std::vector<SiteId> open;
  for (const auto &[site, frame] : frames)
    if (!frame.frame.isZero())
      open.push_back(site);
  llvm::sort(open);
  // W26: the program's frame is its own again where the window ends.
  for (SiteId site : open) {
    const OpenFrame &frame = frames.find(site)->second;
    emitError(*frame.changed)
        << "leaves the frame of site " << site << " off by "
        << frame.frame.str()
        << " pi at the end of the program: the last pulse of a window says "
           "'last'";
  }
  return failure();
}

Value PulseWriter::play(Location loc, Value qubit, SiteId site,
                        const NativePulse &pulse, bool last) {
  const HostInterface *host = hostOf(qubit.getType());
  OpenFrame &open = frames[site];
  // In time order Rz(-f), pulse, Rz(f): the frame stands f behind meanwhile.
  Fraction behind = Fraction(0).minus(pulse.frame)->modulo(2);
  const OperationEntry *frameEntry =
      pulse.frameEntry ? pulse.frameEntry : open.entry;
  SmallVector<Angle, 2> angles;
  for (Fraction parameter : pulse.parameters)
    angles.push_back(Angle::ofPi(parameter));
  Duration length = Duration::ticks(pulse.entry->duration);
  StringAttr name = nameOf(pulse.entry);
  qubit = changeFrame(loc, qubit, open, behind, frameEntry);
  // Null where the host could not build what was asked for, and said so.
  for (unsigned turn = 0; qubit && turn < pulse.count; ++turn) {
    Ticks pause = turn ? pulse.second - pulse.entry->duration : 0;
    if (pause)
      qubit = host->buildDelay(builder, loc, qubit, Duration::ticks(pause));
    if (qubit)
      qubit = host->buildGate(builder, loc, name, angles, qubit, length);
  }
  return qubit && last ? changeFrame(loc, qubit, open, 0, frameEntry) : qubit;
}
