//===- FractionTest.cpp - Exact fractions ---------------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Fraction.h"

#include "gtest/gtest.h"

#include <limits>

using namespace lull;

namespace {

constexpr std::int64_t Least = std::numeric_limits<std::int64_t>::min();
constexpr std::int64_t Most = std::numeric_limits<std::int64_t>::max();

std::string failure(llvm::Expected<Fraction> fraction) {
  if (fraction)
    return "none: " + fraction->str();
  return llvm::toString(fraction.takeError());
}

std::string spell(std::optional<Fraction> fraction) {
  return fraction ? fraction->str() : "nothing";
}

TEST(FractionTest, MakeReduces) {
  EXPECT_EQ(llvm::cantFail(Fraction::make(6, 4)).str(), "3/2");
  EXPECT_EQ(llvm::cantFail(Fraction::make(6, -4)).str(), "-3/2");
  EXPECT_EQ(llvm::cantFail(Fraction::make(-6, -4)).str(), "3/2");
  EXPECT_EQ(llvm::cantFail(Fraction::make(0, -7)).str(), "0");
  EXPECT_EQ(llvm::cantFail(Fraction::make(0, -7)).denominator(), 1);
  EXPECT_EQ(llvm::cantFail(Fraction::make(12, 4)).str(), "3");
  EXPECT_TRUE(Fraction::of(12, 4).isWhole());
  EXPECT_FALSE(Fraction::of(12, 5).isWhole());
  EXPECT_EQ(Fraction::of(2, 9).toDouble(), 2.0 / 9.0);
}

TEST(FractionTest, MakeAtTheEndsOf64Bits) {
  EXPECT_EQ(llvm::cantFail(Fraction::make(Least, 1)).numerator(), Least);
  EXPECT_EQ(llvm::cantFail(Fraction::make(Least, Least)), Fraction(1));
  EXPECT_EQ(llvm::cantFail(Fraction::make(Least, 2)).numerator(), Least / 2);
  EXPECT_EQ(llvm::cantFail(Fraction::make(2, Least)).str(),
            "-1/4611686018427387904");
  EXPECT_EQ(llvm::cantFail(Fraction::make(Most, Most)), Fraction(1));
  EXPECT_EQ(failure(Fraction::make(1, 0)), "fraction 1/0 has no value");
  EXPECT_EQ(failure(Fraction::make(1, Least)),
            "fraction 1/-9223372036854775808 does not fit in 64 bits");
  EXPECT_EQ(failure(Fraction::make(Least, -1)),
            "fraction -9223372036854775808/-1 does not fit in 64 bits");
}

// Against the rules of school, in integers that cannot overflow.
TEST(FractionTest, SmallFractionsObeyTheRules) {
  for (int a = -5; a <= 5; ++a) {
    for (int b = 1; b <= 6; ++b) {
      for (int c = -5; c <= 5; ++c) {
        for (int d = 1; d <= 6; ++d) {
          Fraction x = Fraction::of(a, b), y = Fraction::of(c, d);
          auto equals = [](std::optional<Fraction> got, int n, int m) {
            return got && got->numerator() * m == got->denominator() * n &&
                   got->denominator() > 0;
          };
          EXPECT_TRUE(equals(x.plus(y), a * d + c * b, b * d));
          EXPECT_TRUE(equals(x.minus(y), a * d - c * b, b * d));
          EXPECT_TRUE(equals(x.times(y), a * c, b * d));
          if (c == 0) {
            EXPECT_EQ(x.over(y), std::nullopt);
          } else {
            EXPECT_TRUE(equals(x.over(y), a * d, b * c));
          }
          EXPECT_EQ(x == y, a * d == c * b);
          EXPECT_EQ(x != y, a * d != c * b);
          EXPECT_EQ(x < y, a * d < c * b);
          EXPECT_EQ(x <= y, a * d <= c * b);
          EXPECT_EQ(x > y, a * d > c * b);
          EXPECT_EQ(x >= y, a * d >= c * b);
          if (x == y) {
            EXPECT_EQ(hash_value(x), hash_value(y));
          }
        }
      }
    }
  }
}

TEST(FractionTest, ResultsThatDoNotFitAreNothing) {
  EXPECT_EQ(spell(Fraction(Most).plus(1)), "nothing");
  EXPECT_EQ(spell(Fraction(Least).minus(1)), "nothing");
  EXPECT_EQ(spell(Fraction(0).minus(Least)), "nothing");
  EXPECT_EQ(spell(Fraction(Most).times(2)), "nothing");
  EXPECT_EQ(spell(Fraction(1).over(Least)), "nothing");
  EXPECT_EQ(spell(Fraction::of(1, Most).times(Fraction::of(1, 2))), "nothing");
  EXPECT_EQ(spell(Fraction(1).over(0)), "nothing");
  // Both intermediate products are at the ends of what they may be.
  EXPECT_EQ(spell(Fraction::of(Least, Most).minus(Fraction::of(Least, Most))),
            "0");
  EXPECT_EQ(spell(Fraction::of(Most, 2).times(Fraction::of(2, Most))), "1");
  EXPECT_EQ(spell(Fraction(Least).plus(Most)), "-1");
  EXPECT_EQ(spell(Fraction(Least).over(Least)), "1");
}

TEST(FractionTest, ComparesWhereDoublesCannot) {
  Fraction low = Fraction::of(Most - 1, Most);
  EXPECT_EQ(low.toDouble(), 1.0);
  EXPECT_LT(low, Fraction(1));
  EXPECT_LT(Fraction::of(Least, Most), Fraction(-1));
  EXPECT_EQ(Fraction::of(Most - 2, Most - 1).compare(low), -1);
  EXPECT_EQ(low.compare(Fraction::of(Most - 2, Most - 1)), 1);
}

TEST(FractionTest, ModuloIsInRangeAndDiffersByWholePeriods) {
  for (int n = -30; n <= 30; ++n) {
    for (int d = 1; d <= 7; ++d) {
      for (int period = 1; period <= 3; ++period) {
        Fraction rest = Fraction::of(n, d).modulo(period);
        EXPECT_GE(rest, Fraction(0));
        EXPECT_LT(rest, Fraction(period));
        Fraction away = *Fraction::of(n, d).minus(rest);
        EXPECT_TRUE(away.over(period)->isWhole()) << n << "/" << d;
      }
    }
  }
  EXPECT_EQ(Fraction::of(-1, 2).modulo(2).str(), "3/2");
  EXPECT_EQ(Fraction(Least).modulo(3).str(), "1"); // -2^63 = 1 (mod 3)
  EXPECT_EQ(Fraction(-1).modulo(Most).str(), "9223372036854775806");
}

} // namespace
