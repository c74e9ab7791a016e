//===- Fraction.cpp - Exact fractions -------------------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Fraction.h"

#include "lull/Timing/Fault.h"

#include "llvm/Support/ErrorHandling.h"

#include <limits>
#include <utility>

using namespace lull;

namespace {

__extension__ typedef __int128 Wide;
__extension__ typedef unsigned __int128 UnsignedWide;

/// Numerator and denominator.
using Parts = std::pair<std::int64_t, std::int64_t>;

UnsignedWide commonDivisor(UnsignedWide a, UnsignedWide b) {
  while (b != 0) {
    UnsignedWide rest = a % b;
    a = b;
    b = rest;
  }
  return a;
}

/// Lowest terms with a positive denominator, if they fit. Two products of
/// 64-bit numbers and their sum fit in 128 bits, so callers need not check.
std::optional<Parts> reduce(Wide numerator, Wide denominator) {
  if (denominator == 0)
    return std::nullopt;
  bool negative = (numerator < 0) != (denominator < 0);
  UnsignedWide n = numerator < 0 ? -UnsignedWide(numerator) : numerator;
  UnsignedWide d = denominator < 0 ? -UnsignedWide(denominator) : denominator;
  UnsignedWide divisor = commonDivisor(n, d);
  n /= divisor;
  d /= divisor;
  constexpr UnsignedWide most = std::numeric_limits<std::int64_t>::max();
  if (d > most || n > most + (negative ? 1 : 0))
    return std::nullopt;
  return Parts(std::int64_t(negative ? -Wide(n) : Wide(n)), std::int64_t(d));
}

} // namespace

llvm::Expected<Fraction> Fraction::make(std::int64_t numerator,
                                        std::int64_t denominator) {
  if (denominator == 0)
    return fault("fraction {}/0 has no value", numerator);
  std::optional<Parts> parts = reduce(numerator, denominator);
  if (!parts)
    return fault("fraction {}/{} does not fit in 64 bits", numerator,
                 denominator);
  return Fraction(parts->first, parts->second);
}

Fraction Fraction::of(std::int64_t numerator, std::int64_t denominator) {
  std::optional<Parts> parts = reduce(numerator, denominator);
  if (!parts)
    llvm::report_fatal_error("a constant is not a fraction of 64 bits");
  return Fraction(parts->first, parts->second);
}

std::string Fraction::str() const {
  return den == 1 ? fmt::format("{}", num) : fmt::format("{}/{}", num, den);
}

std::optional<Fraction> Fraction::plus(Fraction other) const {
  std::optional<Parts> parts = reduce(
      Wide(num) * other.den + Wide(other.num) * den, Wide(den) * other.den);
  if (!parts)
    return std::nullopt;
  return Fraction(parts->first, parts->second);
}

std::optional<Fraction> Fraction::minus(Fraction other) const {
  std::optional<Parts> parts = reduce(
      Wide(num) * other.den - Wide(other.num) * den, Wide(den) * other.den);
  if (!parts)
    return std::nullopt;
  return Fraction(parts->first, parts->second);
}

std::optional<Fraction> Fraction::times(Fraction other) const {
  std::optional<Parts> parts =
      reduce(Wide(num) * other.num, Wide(den) * other.den);
  if (!parts)
    return std::nullopt;
  return Fraction(parts->first, parts->second);
}

std::optional<Fraction> Fraction::over(Fraction other) const {
  std::optional<Parts> parts =
      reduce(Wide(num) * other.den, Wide(den) * other.num);
  if (!parts)
    return std::nullopt;
  return Fraction(parts->first, parts->second);
}

Fraction Fraction::modulo(std::int64_t period) const {
  Wide whole = Wide(period) * den;
  Wide rest = whole > 0 ? num % whole : -1;
  if (rest < 0)
    rest += whole;
  if (rest < 0 || rest > std::numeric_limits<std::int64_t>::max())
    llvm::report_fatal_error("a fraction modulo a period is beyond 64 bits");
  // Still in lowest terms, as only a multiple of the denominator was added.
  return Fraction(std::int64_t(rest), den);
}

int Fraction::compare(Fraction other) const {
  Wide left = Wide(num) * other.den;
  Wide right = Wide(other.num) * den;
  return left < right ? -1 : left > right;
}
