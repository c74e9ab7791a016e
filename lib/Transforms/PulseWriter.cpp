//===- PulseWriter.cpp - Pulses written as the device's operations --*- C++
//-*-===//
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
  openFrames += int(!target.isZero()) - int(!open.frame.isZero());
  open.frame = target;
  open.entry = entry;
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

Value PulseWriter::play(Location loc, Value qubit, SiteId site,
                        const NativePulse &pulse, bool last) {
  const HostInterface *host = hostOf(qubit.getType());
  OpenFrame &open = frames[site];
  // In time order Rz(-f), pulse, Rz(f): the frame stands f behind meanwhile.
  Fraction behind = Fraction(0).minus(pulse.frame)->modulo(2);
  const OperationEntry *frameEntry =
      pulse.frameEntry ? pulse.frameEntry : open.entry;
  qubit = changeFrame(loc, qubit, open, behind, frameEntry);
  SmallVector<Angle, 2> angles;
  for (Fraction parameter : pulse.parameters)
    angles.push_back(Angle::ofPi(parameter));
  Duration length = Duration::ticks(pulse.entry->duration);
  StringAttr name = nameOf(pulse.entry);
  qubit = host->buildGate(builder, loc, name, angles, qubit, length);
  if (pulse.count == 2) {
    if (Ticks pause = pulse.second - pulse.entry->duration)
      qubit = host->buildDelay(builder, loc, qubit, Duration::ticks(pause));
    qubit = host->buildGate(builder, loc, name, angles, qubit, length);
  }
  return last ? changeFrame(loc, qubit, open, 0, frameEntry) : qubit;
}
