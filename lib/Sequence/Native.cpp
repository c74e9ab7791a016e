//===- Native.cpp - Pulses in the operations that a device has --*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Native.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/STLExtras.h"

#include <limits>

using namespace lull;

namespace {

using Entries = llvm::SmallVector<const OperationEntry *, 8>;

/// What could make a pulse on one site, in the order of the device's list.
struct Means {
  Entries pulses, halves, equatorial, frames;
  /// Entries that would do, were they native.
  Entries notNative, notNativeFrames;
};

Means meansOn(const Device &device, SiteId site) {
  Means means;
  for (const Device::NamedEntries *named : device.playing()) {
    // The line for this site, or else the one for any.
    const OperationEntry *entry = device.find(named, site);
    if (!entry)
      continue;
    const Action &plays = entry->plays;
    bool isHalf = plays.turn == Fraction::of(1, 2);
    switch (plays.kind) {
    case Action::Kind::None:
      break;
    case Action::Kind::Frame:
      (entry->native ? means.frames : means.notNativeFrames).push_back(entry);
      break;
    case Action::Kind::Equatorial:
      (entry->native ? means.equatorial : means.notNative).push_back(entry);
      break;
    case Action::Kind::Rotation:
      if (!isHalf && plays.turn != Fraction(1))
        break;
      if (!entry->native)
        means.notNative.push_back(entry);
      else
        (isHalf ? means.halves : means.pulses).push_back(entry);
      break;
    }
  }
  return means;
}

std::string spellAngle(Fraction angle) {
  return angle.isZero() ? "0" : angle.str() + " pi";
}

/// `a pi pulse of phase 0 ('x') and a half turn of phase 0 ('sx')`.
std::string spellRotations(const Means &means) {
  llvm::SmallVector<std::string, 4> parts;
  for (const OperationEntry *entry : means.pulses)
    parts.push_back(fmt::format("a pi pulse of phase {} ('{}')",
                                spellAngle(entry->plays.phase), entry->name));
  for (const OperationEntry *entry : means.halves)
    parts.push_back(fmt::format("a half turn of phase {} ('{}')",
                                spellAngle(entry->plays.phase), entry->name));
  std::string text;
  for (auto [index, part] : llvm::enumerate(parts)) {
    if (index != 0)
      text += index + 1 == parts.size() ? " and " : ", ";
    text += part;
  }
  return text;
}

llvm::Error cannotPlay(const Device &device, SiteId site, Fraction phase,
                       const Means &means) {
  std::string has = spellRotations(means), lacks;
  auto addNotNative = [&](const Entries &entries) {
    if (!entries.empty())
      lacks += fmt::format(" ('{}' is not native)", entries.front()->name);
  };
  if (!has.empty()) {
    lacks = "no frame change";
    addNotNative(means.notNativeFrames);
  } else {
    lacks = "no pi pulse or half turn";
    addNotNative(means.notNative);
    if (!means.frames.empty())
      has = fmt::format("a frame change ('{}')", means.frames.front()->name);
  }
  return fault("device '{}' cannot play a pi pulse of phase {} on site {}: it "
               "has {}{}{}",
               device.name().str(), spellAngle(phase), site, has,
               has.empty() ? "" : " but ", lacks);
}

/// Two half turns, the second on the grid if the first is, and the least gap
/// behind it: to the hardware they are two pulses.
llvm::Error setTwoHalves(NativePulse &pulse, const Device &device) {
  Ticks half = pulse.entry->duration, step = device.step(), next = 0;
  if (__builtin_add_overflow(half, device.leastGap(), &next) ||
      next > std::numeric_limits<Ticks>::max() / 2 - step)
    return fault("two half turns ('{}') of {} dt do not fit 64 bits",
                 pulse.entry->name, half);
  pulse.count = 2;
  pulse.second = alignUp(next, step);
  pulse.width = pulse.second + half;
  return llvm::Error::success();
}

} // namespace

llvm::Expected<NativePulse> lull::nativePulse(const Device &device, SiteId site,
                                              Fraction phase) {
  if (!device.hasSite(site))
    return fault("device '{}' has no site {}", device.name().str(), site);
  phase = phase.modulo(2);
  Means means = meansOn(device, site);

  NativePulse pulse;
  auto take = [&](const Entries &entries, bool samePhase) {
    pulse.entry = nullptr;
    for (const OperationEntry *entry : entries)
      if ((!samePhase || entry->plays.phase == phase) &&
          (!pulse.entry || entry->duration < pulse.entry->duration))
        pulse.entry = entry;
    pulse.width = pulse.entry ? pulse.entry->duration : 0;
    return pulse.entry != nullptr;
  };
  auto setFrame = [&]() -> llvm::Error {
    std::optional<Fraction> frame = phase.minus(pulse.entry->plays.phase);
    if (!frame)
      return fault("a frame change from phase {} to phase {} does not fit 64 "
                   "bits",
                   spellAngle(pulse.entry->plays.phase), spellAngle(phase));
    pulse.frame = frame->modulo(2);
    pulse.frameEntry = means.frames.front();
    return llvm::Error::success();
  };

  if (take(means.pulses, /*samePhase=*/true))
    return pulse;
  if (take(means.equatorial, /*samePhase=*/false)) {
    pulse.parameters = {Fraction(1), phase};
    return pulse;
  }
  bool framed = !means.frames.empty();
  if (framed && take(means.pulses, /*samePhase=*/false)) {
    if (llvm::Error error = setFrame())
      return std::move(error);
    return pulse;
  }
  if (take(means.halves, /*samePhase=*/true)) {
    if (llvm::Error error = setTwoHalves(pulse, device))
      return std::move(error);
    return pulse;
  }
  if (framed && take(means.halves, /*samePhase=*/false)) {
    if (llvm::Error error = setTwoHalves(pulse, device))
      return std::move(error);
    if (llvm::Error error = setFrame())
      return std::move(error);
    return pulse;
  }
  return cannotPlay(device, site, phase, means);
}
