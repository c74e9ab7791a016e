//===- Native.h - Pulses in the operations that a device has ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// How a device plays R_phi(pi) on one site. In order of preference: an entry
// that is this rotation (a negative rotation counts as phase + pi), a general
// equatorial rotation, a pi pulse of another phase between frame changes, two
// half turns of the same phase, two half turns between frame changes. A pulse
// with a program phase phi played by one of hardware phase p needs the frame
// changes Rz(-(phi - p)) before and Rz(phi - p) after it (in time order);
// within a window neighbouring frame changes are merged and they sum to zero.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_NATIVE_H
#define LULL_SEQUENCE_NATIVE_H

#include "lull/Sequence/Sequence.h"
#include "lull/Timing/Device.h"

#include "llvm/ADT/SmallVector.h"

namespace lull {

/// How one pi pulse of a given phase is played on a given site.
struct NativePulse {
  /// The entry that makes the rotation: one pi pulse or two half turns.
  const OperationEntry *entry = nullptr;
  /// One or two; two half turns start `second` ticks apart, on the grid and
  /// with the least gap between them.
  unsigned count = 1;
  Ticks second = 0;
  /// From the start of the first to the end of the last, in ticks.
  Ticks width = 0;
  /// Parameters of the entry in units of pi: none for a fixed rotation,
  /// (turn, phase) for an equatorial one.
  llvm::SmallVector<Fraction, 2> parameters;
  /// phi - p in units of pi, in [0, 2): zero if no frame change is needed.
  Fraction frame = 0;
  /// The entry that changes the frame; nullptr if none is needed.
  const OperationEntry *frameEntry = nullptr;
};

/// Resolves a pulse of `phase` (units of pi) on `site`. Fails naming what the
/// device lacks (a pulse, a frame change) and what it has.
llvm::Expected<NativePulse> nativePulse(const Device &device, SiteId site,
                                        Fraction phase);

} // namespace lull

#endif // LULL_SEQUENCE_NATIVE_H
