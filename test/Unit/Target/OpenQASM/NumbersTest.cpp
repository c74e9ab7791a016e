//===- NumbersTest.cpp - Numbers, durations, and their values -------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

#include "llvm/ADT/StringExtras.h"

#include <cmath>

using namespace lull;
using namespace lull::qasm;

namespace {

TokenKind kindOf(llvm::StringRef text) {
  Tokens read(text);
  EXPECT_EQ(read.listener.lines, Lines()) << text.str();
  if (read.tokens.size() != 1) {
    ADD_FAILURE() << text.str() << " is " << read.tokens.size() << " tokens";
    return TokenKind::Error;
  }
  EXPECT_EQ(read.tokens.front().text, text);
  return read.tokens.front().kind;
}

IntegerLiteral integer(llvm::StringRef text) { return {{SMLoc()}, text}; }

std::string decimal(const llvm::APInt &value) {
  return llvm::toString(value, 10, /*Signed=*/false);
}

TEST(NumbersTest, Kinds) {
  for (llvm::StringRef text : {"0", "12", "1_000", "007", "0b1_01", "0B1",
                               "0o17", "0xfF_0", "0XA", "0x1e3"})
    EXPECT_EQ(kindOf(text), TokenKind::Integer) << text.str();
  for (llvm::StringRef text :
       {".5", "1.", "1.5", "1e3", "1E3", "1.5e-3", "1.e+2", ".5e1", "1_0.2_5"})
    EXPECT_EQ(kindOf(text), TokenKind::Float) << text.str();
  for (llvm::StringRef text :
       {"1dt", "1ns", "1us", "1\u00b5s", "1\u03bcs", "1ms", "1s", "1.5 us",
        "1e3\t \tns", ".5s", "1_000 dt"})
    EXPECT_EQ(kindOf(text), TokenKind::Duration) << text.str();
  for (llvm::StringRef text : {"1im", "2.5 im"})
    EXPECT_EQ(kindOf(text), TokenKind::Imaginary) << text.str();
}

TEST(NumbersTest, UnitsStandOnTheSameLineAndAlone) {
  EXPECT_EQ(Tokens("1\nns").tokens.size(), 2u);
  EXPECT_EQ(Tokens("1 /**/ ns").tokens.size(), 2u);
  EXPECT_EQ(Tokens("1 nsx").tokens.size(), 2u);
  EXPECT_EQ(Tokens("1 s_").tokens.size(), 2u);
  // Binary and the like take none.
  EXPECT_EQ(Tokens("0b1 ns").tokens.size(), 2u);
  EXPECT_EQ(Tokens("0:3").tokens.size(), 3u);
}

TEST(NumbersTest, OthersAreReportedAsAWhole) {
  for (llvm::StringRef text :
       {"1_", "1__0", "0b", "0b2", "0b12", "0o8", "0xg", "0x_1", "1e", "1e+",
        "1a", "1.5.2", "1.5_", "1nsx", "1\u03c0", "0b1ns", "1._5", "0x1.5"}) {
    Tokens read(text);
    EXPECT_EQ(read.listener.lines,
              Lines{"1:1: error: '" + text.str() +
                    "' is neither a number nor a duration"});
    ASSERT_EQ(read.tokens.size(), 1u) << text.str();
    EXPECT_TRUE(read.tokens.front().is(TokenKind::Error));
  }
}

TEST(NumbersTest, IntegersOfAnySize) {
  EXPECT_EQ(integer("0").value(), llvm::APInt(1, 0));
  EXPECT_EQ(integer("1").value(), llvm::APInt(1, 1));
  EXPECT_EQ(decimal(integer("1_000").value()), "1000");
  EXPECT_EQ(decimal(integer("0b1010").value()), "10");
  EXPECT_EQ(decimal(integer("0o17").value()), "15");
  EXPECT_EQ(decimal(integer("0xFf").value()), "255");
  EXPECT_EQ(integer("255").value().getBitWidth(), 8u);
  EXPECT_EQ(integer("256").value().getBitWidth(), 9u);
  // 2^300, by shifting.
  llvm::APInt power = llvm::APInt::getOneBitSet(301, 300);
  EXPECT_EQ(integer(decimal(power)).value(), power);
  EXPECT_EQ(integer("0x1" + std::string(75, '0')).value(), power);
  llvm::APInt large = llvm::APInt::getAllOnes(13000);
  EXPECT_EQ(integer(decimal(large)).value(), large);

  EXPECT_EQ(integer("9223372036854775807").small(), INT64_MAX);
  EXPECT_EQ(integer("9223372036854775808").small(), std::nullopt);
  EXPECT_EQ(integer("0").small(), 0);
}

TEST(NumbersTest, TooManyDigits) {
  std::string most(Lexer::MostDigits, '1');
  EXPECT_EQ(kindOf(most), TokenKind::Integer);
  for (std::string text : {most + "1", "0." + most, most + "1 ns"})
    EXPECT_EQ(
        Tokens("\n" + text).listener.lines,
        Lines{"2:1: error: number has " +
              std::to_string(llvm::StringRef(text)
                                 .take_until([](char c) { return c == ' '; })
                                 .size()) +
              " characters when it may have 4096"});
}

TEST(NumbersTest, FloatsAreTheNearestDoubles) {
  struct {
    const char *text;
    double value;
  } cases[] = {{"1.", 1},
               {".5", 0.5},
               {"1e3", 1000},
               {"1.5e-3", 0.0015},
               {"1_0.2_5", 10.25},
               {"0.1", 0.1},
               {"3.141592653589793", 0x1.921fb54442d18p+1},
               {"1.7976931348623157e308", 0x1.fffffffffffffp+1023}};
  for (const auto &one : cases) {
    llvm::Expected<double> value = parseFloat(one.text);
    ASSERT_TRUE(bool(value)) << one.text;
    EXPECT_EQ(*value, one.value) << one.text;
  }
  EXPECT_EQ(messagesOf("const float f = 1e309;"),
            Lines{"1:17: error: number '1e309' is too large for a double"});
  EXPECT_EQ(messagesOf("x(1e99999999999999999999) q;"),
            Lines{"1:3: error: number '1e99999999999999999999' is too large "
                  "for a double"});
}

std::string durationOf(llvm::StringRef number, TimeUnit unit) {
  llvm::Expected<Duration> value =
      DurationLiteral{{SMLoc()}, number, unit}.value();
  return value ? value->str() : llvm::toString(value.takeError());
}

TEST(NumbersTest, DurationsAreExact) {
  EXPECT_EQ(durationOf("100", TimeUnit::ns), "100 ns");
  EXPECT_EQ(durationOf("1_000.5", TimeUnit::us), "1000.5 us");
  EXPECT_EQ(durationOf(".5", TimeUnit::s), "0.5 s");
  EXPECT_EQ(durationOf("1.", TimeUnit::dt), "1 dt");
  EXPECT_EQ(durationOf("1.5e3", TimeUnit::ns), "1500 ns");
  EXPECT_EQ(durationOf("15E-3", TimeUnit::us), "0.015 us");
  EXPECT_EQ(durationOf("1.25e+1", TimeUnit::ms), "12.5 ms");
  EXPECT_EQ(durationOf("0.1e1", TimeUnit::dt), "1 dt");
  EXPECT_EQ(durationOf("0.1", TimeUnit::dt),
            "'0.1 dt' is not a whole number of dt");
  EXPECT_EQ(durationOf("1e65", TimeUnit::ns),
            "exponent of '1e65' is not between -64 and 64");
  EXPECT_EQ(durationOf("1e-99999999999", TimeUnit::ns),
            "exponent of '1e-99999999999' is not between -64 and 64");
}

TEST(NumbersTest, DurationsInPrograms) {
  Reading reading("delay[1.5 \u00b5s] $0; delay[20dt] $0;");
  ASSERT_EQ(reading.messages(), Lines());
  const auto &first = *llvm::cast<Delay>(reading.statements()[0]);
  const auto &literal = *llvm::cast<DurationLiteral>(first.duration);
  EXPECT_EQ(literal.number, "1.5");
  EXPECT_EQ(literal.unit, TimeUnit::us);
  EXPECT_EQ(reading.tree(), "delay[1.5us] $0\ndelay[20dt] $0\n");
}

} // namespace
