//===- GridSearch.h - Least squares on a grid -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The integer problem behind Placement.cpp. Internal to this room.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_SEQUENCE_GRIDSEARCH_H
#define LULL_LIB_SEQUENCE_GRIDSEARCH_H

#include "llvm/ADT/ArrayRef.h"
#include "llvm/ADT/SmallVector.h"

#include <cstdint>
#include <optional>

namespace lull {

__extension__ typedef __int128 Int128;

/// Whole numbers 0 <= z_1 <= z_2 <= ... <= z_n <= top with the smallest sum of
/// (unit z_k - ideal_k)^2. All ideals, and unit * top, are below 2^58 in size,
/// n is at most 2^18, `unit` is positive and even.
struct GridProblem {
  llvm::ArrayRef<std::int64_t> ideal;
  std::int64_t unit = 2;
  std::int64_t top = 0;
};

using GridLevels = llvm::SmallVector<std::int64_t, 16>;

/// The values that -z_1 + z_2 - z_3 + ... takes: all whole numbers from `least`
/// to `most`.
struct SumRange {
  std::int64_t least, most;
};
inline SumRange sumRange(size_t count, std::int64_t top) {
  return count % 2 ? SumRange{-top, 0} : SumRange{0, count ? top : 0};
}

/// The optimum, of several the lexicographically smallest; with `sum`, the one
/// among the z with -z_1 + z_2 - z_3 + ... = sum, which must be in sumRange().
GridLevels searchGrid(const GridProblem &problem,
                      std::optional<std::int64_t> sum);

} // namespace lull

#endif // LULL_LIB_SEQUENCE_GRIDSEARCH_H
