//===- Families.h - How catalogue members are made --------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The formulas behind the catalogue's rows. Each checks its orders itself, so
// that a row cannot be called past the checks.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_SEQUENCE_FAMILIES_H
#define LULL_LIB_SEQUENCE_FAMILIES_H

#include "lull/Sequence/Catalogue.h"

namespace lull {

using Orders = llvm::ArrayRef<unsigned>;

/// That `name` would have more than MostPulses pulses.
llvm::Error tooManyPulses(llvm::StringRef name);

/// A family of one member: a word of X, Y, -X, -Y separated by single spaces,
/// its instants by `formula`.
llvm::Expected<Sequence> fixedWord(llvm::StringRef stem, Orders orders,
                                   llvm::StringRef word,
                                   llvm::StringRef formula);
/// X^n, its instants by `formula`.
llvm::Expected<Sequence> uniform(llvm::StringRef stem, Orders orders,
                                 llvm::StringRef formula);

llvm::Expected<Sequence> concatenated(Orders orders);
llvm::Expected<Sequence> concatenatedOneAxis(Orders orders);
llvm::Expected<Sequence> quadratic(Orders orders);
llvm::Expected<Sequence> knillTwenty(Orders orders);
llvm::Expected<Sequence> universallyRobust(Orders orders);
llvm::Expected<Sequence> walsh(Orders orders);

} // namespace lull

#endif // LULL_LIB_SEQUENCE_FAMILIES_H
