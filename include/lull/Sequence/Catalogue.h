//===- Catalogue.h - The published sequences --------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// One table of families. A user names a member as `xy8`, `udd-4`, `qdd-2-4`.
// Adding a family is one row in lib/Sequence/Catalogue.cpp and its test.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_CATALOGUE_H
#define LULL_SEQUENCE_CATALOGUE_H

#include "lull/Sequence/Sequence.h"

#include "llvm/ADT/ArrayRef.h"
#include "llvm/ADT/StringRef.h"

namespace lull {

/// The most pulses that one catalogue sequence may have; a larger order is
/// refused, since no device plays it and memory would be the limit.
inline constexpr unsigned MostPulses = 10000;

/// One family of the catalogue.
struct Family {
  /// `xy8`, or the stem of a family with orders: `udd` of `udd-4`.
  llvm::StringRef stem;
  /// How many orders follow the stem (0, 1 or 2), and what they must be, for
  /// messages: `an even number from 4`.
  unsigned orders;
  llvm::StringRef range;
  /// The published source.
  llvm::StringRef source;
  /// What a user should know before choosing it; often empty.
  llvm::StringRef remark;
  /// Members that stand for the family in lists and in tests.
  llvm::ArrayRef<llvm::StringRef> examples;
  /// Makes the member of the given orders; fails on orders out of range.
  llvm::Expected<Sequence> (*make)(llvm::ArrayRef<unsigned> orders);
};

/// All families, in the order of the documentation.
llvm::ArrayRef<Family> catalogue();

/// The sequence that a user names. The spelling is lower-case; fails on an
/// unknown family (listing what there is) and on orders out of range. What is
/// returned may have an odd number of pulses: see close().
llvm::Expected<Sequence> findSequence(llvm::StringRef name);

/// The instants formulas that a user-defined sequence may name, for `count`
/// pulses: `centred` x_k = (k-1/2)/n, `trailing` x_k = k/n (anchored at their
/// ends), `spread` x_k = k/(n+1), `uhrig` x_k = sin^2(pi k/(2n+2)).
llvm::Expected<std::vector<Instant>> instantsByFormula(llvm::StringRef formula,
                                                       unsigned count);
/// Whether a sequence with these instants is anchored at its pulses' ends: if
/// the last instant is 1.
Anchor anchorOf(llvm::ArrayRef<Instant> instants);

} // namespace lull

#endif // LULL_SEQUENCE_CATALOGUE_H
