//===- Sequence.h - A decoupling sequence as data ---------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// A sequence is phases x instants: for dephasing the instants alone decide what
// noise is left, the phases alone decide how pulse errors add up. Everything
// that is done with sequences (check, price, place, emit) reads this one form.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_SEQUENCE_H
#define LULL_SEQUENCE_SEQUENCE_H

#include "lull/Timing/Fraction.h"

#include <optional>
#include <string>
#include <vector>

namespace lull {

/// A place in a window as a fraction of its length, in [0, 1].
struct Instant {
  double value = 0;
  /// The same exactly, unless irrational (as Uhrig's are).
  std::optional<Fraction> exact;

  static Instant at(Fraction f) { return {f.toDouble(), f}; }
  static Instant at(double x) { return {x, std::nullopt}; }
};

/// Which point of a finite pulse lies on its instant. One answer for the whole
/// sequence: mixing centres and ends unbalances it by half a pulse, and leaves
/// a ZZ phase between neighbours.
enum class Anchor : std::uint8_t {
  Centre,
  /// For sequences with a pulse at the very end of the window.
  End,
};

/// Pi pulses about axes in the xy plane, in time order.
struct Sequence {
  /// As a user spells it: `xy8`, `udd-4`.
  std::string name;
  /// The axis of each pulse in units of pi, in [0, 2): 0 is X, 1/2 is Y, 1 is
  /// -X, 3/2 is -Y.
  std::vector<Fraction> phases;
  /// Where each pulse ideally is; as many as phases, not decreasing. Equal
  /// neighbours are pulses back to back.
  std::vector<Instant> instants;
  Anchor anchor = Anchor::Centre;

  size_t size() const { return phases.size(); }
};

/// The sequence `repeats` times (>= 1), each in an equal share of the window.
/// With `alternateSigns` every second repeat has all phases shifted by pi.
/// Fails if an exact instant does not fit 64 bits.
llvm::Expected<Sequence> repeat(const Sequence &sequence, unsigned repeats,
                                bool alternateSigns = false);

/// `X Y -X -Y`, and `2/3` (in units of pi) for other phases.
std::string spellPhase(Fraction phase);
std::string spellWord(const Sequence &sequence);

} // namespace lull

#endif // LULL_SEQUENCE_SEQUENCE_H
