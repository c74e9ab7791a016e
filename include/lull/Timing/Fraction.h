//===- Fraction.h - Exact fractions -----------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Exact fractions of 64-bit integers, for the clock (dt = 2/9 ns), for phases
// (fractions of pi) and for instants (fractions of a window). Nothing here
// rounds: an operation whose exact result does not fit says so.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_FRACTION_H
#define LULL_TIMING_FRACTION_H

#include "llvm/ADT/Hashing.h"
#include "llvm/Support/Error.h"

#include <cstdint>
#include <optional>
#include <string>

namespace lull {

/// An exact fraction in lowest terms with a positive denominator.
class Fraction {
public:
  constexpr Fraction() = default;
  /// A whole number.
  constexpr Fraction(std::int64_t whole) : num(whole) {}

  /// `numerator / denominator`, reduced. Fails on a zero denominator and on
  /// values that do not fit after reduction (such as 1 / INT64_MIN).
  static llvm::Expected<Fraction> make(std::int64_t numerator,
                                       std::int64_t denominator);
  /// The same for constants known to be sound; the denominator is positive.
  static Fraction of(std::int64_t numerator, std::int64_t denominator);

  std::int64_t numerator() const { return num; }
  std::int64_t denominator() const { return den; }
  bool isWhole() const { return den == 1; }
  bool isZero() const { return num == 0; }
  double toDouble() const { return double(num) / double(den); }

  /// `3`, `-1/2`.
  std::string str() const;

  /// Exact arithmetic; nothing if the result does not fit.
  std::optional<Fraction> plus(Fraction other) const;
  std::optional<Fraction> minus(Fraction other) const;
  std::optional<Fraction> times(Fraction other) const;
  /// Nothing also if `other` is zero.
  std::optional<Fraction> over(Fraction other) const;

  /// This modulo `period` (a positive whole number), in [0, period). The one
  /// operation without a way to say that the result does not fit: `period`
  /// times the denominator must be within 64 bits, or the program is ended.
  Fraction modulo(std::int64_t period) const;

  /// Exact comparison, by cross multiplication in 128 bits.
  int compare(Fraction other) const;
  friend bool operator==(Fraction a, Fraction b) {
    return a.num == b.num && a.den == b.den;
  }
  friend bool operator!=(Fraction a, Fraction b) { return !(a == b); }
  friend bool operator<(Fraction a, Fraction b) { return a.compare(b) < 0; }
  friend bool operator<=(Fraction a, Fraction b) { return a.compare(b) <= 0; }
  friend bool operator>(Fraction a, Fraction b) { return a.compare(b) > 0; }
  friend bool operator>=(Fraction a, Fraction b) { return a.compare(b) >= 0; }
  friend llvm::hash_code hash_value(Fraction f) {
    return llvm::hash_combine(f.num, f.den);
  }

private:
  constexpr Fraction(std::int64_t numerator, std::int64_t denominator)
      : num(numerator), den(denominator) {}

  std::int64_t num = 0;
  std::int64_t den = 1;
};

} // namespace lull

#endif // LULL_TIMING_FRACTION_H
