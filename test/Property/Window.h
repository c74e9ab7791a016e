//===- Window.h - What was put into one window ------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_WINDOW_H
#define LULL_TEST_PROPERTY_WINDOW_H

#include "Program.h"

#include "llvm/ADT/ArrayRef.h"

namespace lull::property {

/// A pi pulse as it is played: one rotation, or two half turns.
struct Pulse {
  std::int64_t start = 0;
  std::int64_t width = 0;
  /// About which axis the program sees it, frame changes taken into account.
  Fraction phase = 0;
};

/// A window of the scheduled program and what it became.
struct Window {
  int site = 0;
  std::int64_t start = 0;
  std::int64_t length = 0;
  /// Operations that take the place of the idle, all on `site`.
  std::vector<const ReadOp *> inserted;
};

/// Checks that the insertion is sound by itself: on the grid, apart, inside,
/// closed in its frame, the identity by matrix product. Returns its pulses.
std::vector<Pulse> checkInsertion(const Window &window,
                                  const RandomDevice &device);

/// Twice the integral of the switching function with flips at the pulse
/// centres: from its definition.
std::int64_t twiceResidual(const Window &window, llvm::ArrayRef<Pulse> pulses);

/// Checks that no placement has a residual nearer to the imbalance of the
/// sequence (a part of the window), where that is known or can be searched.
void checkResidual(const Window &window, llvm::ArrayRef<Pulse> pulses,
                   double imbalance, const RandomDevice &device);

/// The shortest window at this start that holds pulses of these widths.
std::int64_t leastLength(std::int64_t start,
                         llvm::ArrayRef<std::int64_t> widths,
                         const RandomDevice &device);

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_WINDOW_H
