//===- Angle.h - Angles of gates, exact where they can be -------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_ANGLE_H
#define LULL_IR_ANGLE_H

#include "lull/Timing/Fraction.h"

#include "llvm/ADT/SmallVector.h"
#include "llvm/ADT/bit.h"

#include <cstdint>

namespace lull {

/// An angle: an exact multiple of pi, or a double in radians. 16 bytes.
class Angle {
public:
  /// Missing: a required property that was lost; verifiers refuse it.
  constexpr Angle() = default;
  static Angle ofPi(Fraction multiple) {
    return Angle(multiple.numerator(), multiple.denominator());
  }
  /// The largest numerator and denominator of an exact angle that programs may
  /// have, so that sums of two never leave 64 bits.
  static constexpr std::int64_t mostTerm = 1000000000;
  static bool isSound(Fraction multiple) {
    return multiple.denominator() <= mostTerm &&
           multiple.numerator() <= mostTerm &&
           multiple.numerator() >= -mostTerm;
  }
  static Angle radians(double value) {
    return Angle(llvm::bit_cast<std::int64_t>(value), 0);
  }

  bool isMissing() const { return den < 0; }
  /// Whether it is an exact multiple of pi.
  bool isExact() const { return den > 0; }
  /// The multiple of pi; only if exact.
  Fraction multiple() const { return Fraction::of(bits, den); }
  /// In radians (an exact one rounded to double).
  double value() const;

  /// `1/2 pi`, `0.5`, `1.0e-7`; reads back to the same angle.
  std::string str() const;

  friend bool operator==(Angle a, Angle b) {
    return a.bits == b.bits && a.den == b.den;
  }
  friend bool operator!=(Angle a, Angle b) { return !(a == b); }
  friend llvm::hash_code hash_value(Angle a) {
    return llvm::hash_combine(a.bits, a.den);
  }

private:
  constexpr Angle(std::int64_t bits, std::int64_t den) : bits(bits), den(den) {}

  /// The numerator, or the bits of the double if `den` is zero.
  std::int64_t bits = 0;
  std::int64_t den = -1;
};

/// A double in decimal, shortest form that reads back to the same double, with
/// the point that MLIR's lexer wants: `0.5`, `3.0`, `1.0e-7`.
std::string spellReal(double value);

/// The angles of a gate; `stated` is false only if the property was lost.
struct AngleList {
  bool stated = false;
  llvm::SmallVector<Angle, 1> angles;

  friend bool operator==(const AngleList &a, const AngleList &b) {
    return a.stated == b.stated && a.angles == b.angles;
  }
  friend bool operator!=(const AngleList &a, const AngleList &b) {
    return !(a == b);
  }
  friend llvm::hash_code hash_value(const AngleList &list) {
    return llvm::hash_combine(list.stated,
                              llvm::hash_combine_range(list.angles));
  }
};

} // namespace lull

#endif // LULL_IR_ANGLE_H
