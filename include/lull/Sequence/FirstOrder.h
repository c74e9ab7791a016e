//===- FirstOrder.h - What a sequence cancels to first order ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Average Hamiltonian to first order in the toggling frame, computed from the
// phases and instants (not a table): which couplings ideal pulses remove,
// which of them stay removed when pulses have a width, and how over-rotations
// and detunings during pulses add up. Definitions: docs/Physics.md.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_FIRSTORDER_H
#define LULL_SEQUENCE_FIRSTORDER_H

#include "lull/Sequence/Sequence.h"

#include <array>

namespace lull {

struct FirstOrder {
  /// For sx, sy, sz: whether the toggling-frame average over the window is zero
  /// with ideal pulses at their instants.
  std::array<bool, 3> removed{};
  /// The same when each pulse is square with a small width, sz acting during
  /// pulses too, pulses placed by the sequence's anchor.
  std::array<bool, 3> removedFiniteWidth{};
  /// Sum of the toggled pulse axes; pi eps/2 times this is the generator left
  /// by an over-rotation theta = pi (1 + eps).
  std::array<double, 3> overRotation{};
  /// Integral of the toggled sz over the pulses, per pulse width (x, y, z).
  std::array<double, 3> detuningInPulse{};
};

FirstOrder firstOrder(const Sequence &sequence);

} // namespace lull

#endif // LULL_SEQUENCE_FIRSTORDER_H
