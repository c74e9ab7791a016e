//===- Instants.cpp - Formulas for instants -------------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Catalogue.h"

#include "lull/Timing/Fault.h"

#include "llvm/Support/MathExtras.h"

#include <cmath>

using namespace lull;

static Instant centred(std::uint64_t k, std::uint64_t n) {
  return Instant::at(Fraction::of(2 * k - 1, 2 * n));
}

static Instant trailing(std::uint64_t k, std::uint64_t n) {
  return Instant::at(Fraction::of(k, n));
}

static Instant spread(std::uint64_t k, std::uint64_t n) {
  return Instant::at(Fraction::of(k, n + 1));
}

/// Uhrig 2007. sin^2(pi k/(2n+2)) = (1 - cos(pi k/(n+1)))/2 is rational only
/// at the three places below (Niven's theorem).
static Instant uhrig(std::uint64_t k, std::uint64_t n) {
  if (3 * k == n + 1)
    return Instant::at(Fraction::of(1, 4));
  if (2 * k == n + 1)
    return Instant::at(Fraction::of(1, 2));
  if (3 * k == 2 * (n + 1))
    return Instant::at(Fraction::of(3, 4));
  // The later half mirrors the earlier one exactly.
  if (2 * k > n + 1)
    return Instant::at(1 - uhrig(n + 1 - k, n).value);
  double sine = std::sin(llvm::numbers::pi * k / (2 * n + 2));
  return Instant::at(sine * sine);
}

llvm::Expected<std::vector<Instant>>
lull::instantsByFormula(llvm::StringRef formula, unsigned count) {
  struct Formula {
    llvm::StringRef name;
    Instant (*instant)(std::uint64_t k, std::uint64_t n);
  };
  static constexpr Formula Formulas[] = {{"centred", centred},
                                         {"trailing", trailing},
                                         {"spread", spread},
                                         {"uhrig", uhrig}};
  if (count == 0 || count > MostPulses)
    return fault("{} pulses are out of range: a sequence has from 1 to {}",
                 count, MostPulses);
  for (const Formula &row : Formulas)
    if (row.name == formula) {
      std::vector<Instant> result;
      result.reserve(count);
      for (std::uint64_t k = 1; k <= count; ++k)
        result.push_back(row.instant(k, count));
      return result;
    }
  return fault("unknown instants '{}': known are centred, trailing, spread, "
               "uhrig",
               formula.str());
}

Anchor lull::anchorOf(llvm::ArrayRef<Instant> instants) {
  if (instants.empty())
    return Anchor::Centre;
  const Instant &last = instants.back();
  bool isEnd = last.exact ? *last.exact == Fraction(1) : last.value == 1;
  return isEnd ? Anchor::End : Anchor::Centre;
}
