//===- Placement.h - Pulses on the clock grid -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Where the pulses of a sequence really go. Starts lie on absolute multiples of
// the device's step, pulses do not overlap and keep the least gap, all lie in
// the window. Among these placements the chosen one has the residual nearest to
// the sequence's own imbalance, then the smallest sum of squared displacements
// of the pulse centres from their ideal places, then mirror symmetry, then the
// earliest pulses (the lexicographically smallest starts).
//
// The imbalance is the residual of pulses without width at the instants x_k of
// a window of T: T ((-1)^n - sum over k of (-1)^k 2 x_k). It is zero for almost
// all sequences of the catalogue, but T/3 for pdd-2.
//
// The search is exact (docs/Rationale.md says how), not a heuristic. Only
// instants without a small common denominator are rounded first: their distance
// from the middle of the window to the nearest 2^-20 tick, or to 2^-53 of a
// window beyond 2^33 ticks. Then an imbalance of at most 2n such parts of a
// tick counts as none.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_PLACEMENT_H
#define LULL_SEQUENCE_PLACEMENT_H

#include "lull/Sequence/Sequence.h"
#include "lull/Timing/Time.h"

#include "llvm/ADT/ArrayRef.h"

#include <vector>

namespace lull {

/// The longest window in which pulses are placed, in ticks: positions in it are
/// exact in a double as well.
inline constexpr Ticks LongestWindow = Ticks(1) << 53;

/// A window and the grid it lies on, in ticks.
struct GridWindow {
  /// Absolute start; only its remainder by `step` matters.
  Ticks start = 0;
  Ticks length = 0;
  Ticks step = 1;
  Ticks leastGap = 0;
};

struct Placement {
  /// Start of each pulse, relative to the start of the window.
  std::vector<Ticks> starts;
  /// The integral of the switching function over the window, with flips at the
  /// pulse centres: sum of + and - intervals, in ticks. Zero: static detuning
  /// is refocused exactly. The plain integral: the imbalance of the sequence is
  /// part of it.
  Ticks residual = 0;
  /// Sum of squared displacements of the pulse centres, in ticks^2.
  double displacement = 0;
  /// Whether the starts and widths are mirror symmetric in the window.
  bool mirror = false;
};

/// Places `sequence` with pulse widths `widths` (one a pulse, >= 0). Fails if
/// the pulses do not fit, with the window's length and what they need; also on
/// unsound input, on windows beyond 2^53 ticks and on more than 2^18 pulses.
llvm::Expected<Placement> place(const Sequence &sequence,
                                llvm::ArrayRef<Ticks> widths,
                                const GridWindow &window);

/// The shortest window that starts at `grid.start` (its length does not matter)
/// and holds pulses of these widths on the grid with the least gap between
/// them; the largest Ticks if that does not fit 64 bits.
Ticks leastWindow(llvm::ArrayRef<Ticks> widths, const GridWindow &grid);

/// The residual of any starts (relative to the window): (-1)^n length minus the
/// sum over k of (-1)^k (2 start_k + width_k), k from 1 to n.
Ticks residualOf(llvm::ArrayRef<Ticks> starts, llvm::ArrayRef<Ticks> widths,
                 Ticks length);

} // namespace lull

#endif // LULL_SEQUENCE_PLACEMENT_H
