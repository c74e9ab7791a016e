//===- TimeTest.cpp - Exact durations and the device clock ----------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Time.h"

#include "gtest/gtest.h"

#include <limits>
#include <random>

using namespace lull;

namespace {

constexpr Ticks Least = std::numeric_limits<Ticks>::min();
constexpr Ticks Most = std::numeric_limits<Ticks>::max();

template <typename T> std::string failure(llvm::Expected<T> result) {
  return result ? "none" : llvm::toString(result.takeError());
}

Duration read(llvm::StringRef text) {
  llvm::Expected<Duration> duration = Duration::parse(text);
  if (duration)
    return *duration;
  ADD_FAILURE() << llvm::toString(duration.takeError());
  return Duration();
}

Clock clockOf(Fraction dt, TimeUnit unit) {
  return llvm::cantFail(Clock::make(dt, unit));
}

Clock twoNinths() { return clockOf(Fraction::of(2, 9), TimeUnit::ns); }

TEST(TimeUnitTest, SpellingsAreInverse) {
  for (TimeUnit unit :
       {TimeUnit::dt, TimeUnit::ns, TimeUnit::us, TimeUnit::ms, TimeUnit::s})
    EXPECT_EQ(parseTimeUnit(spell(unit)), unit);
  EXPECT_EQ(parseTimeUnit("\u00b5s"), TimeUnit::us);
  EXPECT_EQ(parseTimeUnit("\u03bcs"), TimeUnit::us);
  EXPECT_EQ(spell(TimeUnit::us), "us");
  for (llvm::StringRef other : {"", "NS", "ps", "min", "n s", "\u00b5"})
    EXPECT_EQ(parseTimeUnit(other), std::nullopt) << other.str();
  EXPECT_EQ(spell(TimeUnit::Missing), "");
  EXPECT_EQ(spell(TimeUnit::Unset), "");
}

TEST(DurationTest, ParsesExactly) {
  struct {
    const char *text;
    std::int64_t amount;
    unsigned decimals;
    TimeUnit unit;
    const char *printed;
  } cases[] = {
      {"35.50 ns", 355, 1, TimeUnit::ns, "35.5 ns"},
      {"0.0 ns", 0, 0, TimeUnit::ns, "0 ns"},
      {"-0.00us", 0, 0, TimeUnit::us, "0 us"},
      {"64dt", 64, 0, TimeUnit::dt, "64 dt"},
      {"64 dt", 64, 0, TimeUnit::dt, "64 dt"},
      {"2.0 dt", 2, 0, TimeUnit::dt, "2 dt"},
      {"35.5ns", 355, 1, TimeUnit::ns, "35.5 ns"},
      {"  7\t ms ", 7, 0, TimeUnit::ms, "7 ms"},
      {"007.25 s", 725, 2, TimeUnit::s, "7.25 s"},
      {"100 ns", 100, 0, TimeUnit::ns, "100 ns"},
      {"-3 dt", -3, 0, TimeUnit::dt, "-3 dt"},
      {"-0.05 us", -5, 2, TimeUnit::us, "-0.05 us"},
      {"1 \u00b5s", 1, 0, TimeUnit::us, "1 us"},
      {"999999999999999999 dt", 999999999999999999, 0, TimeUnit::dt,
       "999999999999999999 dt"},
      {"0.000000000000000001 s", 1, 18, TimeUnit::s, "0.000000000000000001 s"},
      {"12345678.9012345678 ns", 123456789012345678, 10, TimeUnit::ns,
       "12345678.9012345678 ns"},
      // Zeros need no digits, neither in front nor behind.
      {"0000000000000000000000001.500000000000000000000000 ns", 15, 1,
       TimeUnit::ns, "1.5 ns"},
  };
  for (const auto &c : cases) {
    Duration d = read(c.text);
    EXPECT_EQ(d.amount(), c.amount) << c.text;
    EXPECT_EQ(d.decimals(), c.decimals) << c.text;
    EXPECT_EQ(d.unit(), c.unit) << c.text;
    EXPECT_EQ(d.str(), c.printed);
    EXPECT_EQ(read(d.str()), d);
    EXPECT_EQ(llvm::cantFail(Duration::parse(d.number(), d.unit())), d);
    EXPECT_EQ(
        llvm::cantFail(Duration::make(d.amount(), d.decimals(), d.unit())), d);
    EXPECT_EQ(d.isNegative(), c.amount < 0);
    EXPECT_TRUE(d.isSet());
  }
}

TEST(DurationTest, UnsetAndMissing) {
  EXPECT_EQ(read("unset"), Duration::unset());
  EXPECT_EQ(Duration::unset().str(), "unset");
  EXPECT_FALSE(Duration::unset().isSet());
  EXPECT_FALSE(Duration::unset().isMissing());
  EXPECT_TRUE(Duration().isMissing());
  EXPECT_FALSE(Duration().isSet());
  EXPECT_EQ(Duration().str(), "");
  EXPECT_NE(Duration(), Duration::unset());
  EXPECT_NE(Duration::unset(), Duration::ticks(0));
  EXPECT_EQ(sizeof(Duration), 16u);
}

TEST(DurationTest, TextsThatDifferAreDifferent) {
  EXPECT_NE(read("1 us"), read("1000 ns"));
  EXPECT_NE(read("1 us"), read("1 ns"));
  EXPECT_EQ(read("1.0 us"), read("1us"));
  EXPECT_EQ(hash_value(read("1.0 us")), hash_value(read("1us")));
}

TEST(DurationTest, RefusesWithTheText) {
  std::pair<const char *, const char *> cases[] = {
      {"1e3 ns", "'1e3' is not a decimal number"},
      {"1e3", "'1e3' is not a decimal number"},
      {".5 ns", "'.5' is not a decimal number"},
      {"5. ns", "'5.' is not a decimal number"},
      {"+5 ns", "'+5' is not a decimal number"},
      {"--5 ns", "'--5' is not a decimal number"},
      {"1.2.3 ns", "'1.2.3' is not a decimal number"},
      {"1 2 ns", "'1 2' is not a decimal number"},
      {"0x10 dt", "'0x10' is not a decimal number"},
      {"1_000 dt", "'1_000' is not a decimal number"},
      {"1.5 dt", "'1.5 dt' is not a whole number of dt"},
      {"1000000000000000000 dt",
       "'1000000000000000000' needs more than 18 digits"},
      {"1234567890.123456789 ns",
       "'1234567890.123456789' needs more than 18 digits"},
      {"0.0000000000000000001 s",
       "'0.0000000000000000001' needs more than 18 digits"},
      {"35.5", "'35.5' has no unit (dt, ns, us, ms or s)"},
      {"35.5 minutes", "'minutes' is not a unit of time (dt, ns, us, ms or s)"},
      {"ns", "'ns' is not a duration such as 35.5 ns"},
      {"", "'' is not a duration such as 35.5 ns"},
      {"Unset", "'Unset' is not a duration such as 35.5 ns"},
  };
  for (auto [text, message] : cases)
    EXPECT_EQ(failure(Duration::parse(text)), message);
  EXPECT_EQ(failure(Duration::parse("1e3", TimeUnit::ns)),
            "'1e3' is not a decimal number");
  EXPECT_EQ(failure(Duration::parse("", TimeUnit::ns)),
            "'' is not a decimal number");
  EXPECT_EQ(failure(Duration::parse("5", TimeUnit::Unset)),
            "'5' has no unit (dt, ns, us, ms or s)");
}

TEST(DurationTest, MakeRefusesWhatParseDoesNotMake) {
  EXPECT_EQ(failure(Duration::make(350, 1, TimeUnit::ns)),
            "amount 350 with 1 decimals has a trailing zero");
  EXPECT_EQ(failure(Duration::make(0, 2, TimeUnit::ns)),
            "amount 0 with 2 decimals has a trailing zero");
  EXPECT_EQ(failure(Duration::make(15, 1, TimeUnit::dt)),
            "amount 15 with 1 decimals is not a whole number of dt");
  EXPECT_EQ(failure(Duration::make(1, 19, TimeUnit::s)),
            "amount 1 with 19 decimals needs more than 18 digits");
  EXPECT_EQ(failure(Duration::make(Least, 0, TimeUnit::s)),
            "amount -9223372036854775808 with 0 decimals needs more than 18 "
            "digits");
  EXPECT_EQ(failure(Duration::make(1, 0, TimeUnit::Unset)),
            "amount 1 with 0 decimals has no unit of time (number 1)");
  EXPECT_EQ(failure(Duration::make(0, 0, TimeUnit::Missing)),
            "amount 0 with 0 decimals has no unit of time (number 0)");
  EXPECT_EQ(failure(Duration::make(1, 0, TimeUnit(7))),
            "amount 1 with 0 decimals has no unit of time (number 7)");
  EXPECT_EQ(llvm::cantFail(Duration::make(0, 0, TimeUnit::Unset)),
            Duration::unset());
}

TEST(DurationTest, PrintsTheLeastTick) {
  EXPECT_EQ(Duration::ticks(Least).str(), "-9223372036854775808 dt");
}

TEST(ClockTest, MakeAndPrint) {
  EXPECT_EQ(Clock().str(), "1 ns");
  EXPECT_EQ(twoNinths().str(), "2/9 ns");
  EXPECT_TRUE(clockOf(Fraction::of(1, 1000), TimeUnit::us) == Clock());
  EXPECT_FALSE(twoNinths() == Clock());
  EXPECT_EQ(failure(Clock::make(0, TimeUnit::ns)),
            "dt is 0 ns when it should be positive");
  EXPECT_EQ(failure(Clock::make(Fraction::of(-1, 2), TimeUnit::us)),
            "dt is -1/2 us when it should be positive");
  EXPECT_EQ(failure(Clock::make(1, TimeUnit::dt)),
            "dt is given in 'dt' when it should be in ns, us, ms or s");
  EXPECT_EQ(failure(Clock::make(Fraction::of(1, Most), TimeUnit::ns)),
            "dt of 1/9223372036854775807 ns is not a fraction of 64 bits in "
            "seconds");
}

TEST(ClockTest, TicksOnTheClock) {
  std::pair<const char *, Ticks> cases[] = {
      {"0 ns", 0},     {"2 ns", 9},   {"1 us", 4500},     {"1 s", 4500000000},
      {"0.002 us", 9}, {"64 dt", 64}, {"8 ms", 36000000}, {"35.56 us", 160020},
  };
  for (auto [text, ticks] : cases)
    EXPECT_EQ(llvm::cantFail(twoNinths().toTicks(read(text))), ticks) << text;
  EXPECT_EQ(llvm::cantFail(twoNinths().toTicks(Duration::ticks(Most))), Most);
  // The largest that fits, and factors that need 128 bits on the way:
  // 10^18 - 1 of 1/9 ns, written in milliseconds.
  Clock ninth = clockOf(Fraction::of(1, 9), TimeUnit::ms);
  EXPECT_EQ(llvm::cantFail(ninth.toTicks(read("999999999999999999 ms"))),
            8999999999999999991);
}

TEST(ClockTest, OffTheClockNamesTheNeighbours) {
  EXPECT_EQ(failure(twoNinths().toTicks(read("35.5 ns"))),
            "35.5 ns is not a whole number of dt (2/9 ns): it is 159.75 dt, "
            "between 159 dt (35.333 ns) and 160 dt (35.556 ns)");
  EXPECT_EQ(failure(twoNinths().toTicks(read("1 ns"))),
            "1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between "
            "4 dt (0.889 ns) and 5 dt (1.111 ns)");
  // 1/3 has no last digit.
  EXPECT_EQ(failure(clockOf(3, TimeUnit::ns).toTicks(read("100 ns"))),
            "100 ns is not a whole number of dt (3 ns): it is about 33.333 dt, "
            "between 33 dt (99 ns) and 34 dt (102 ns)");
  // Never shown as the whole number that it is not.
  EXPECT_EQ(failure(Clock().toTicks(read("2.9999999 ns"))),
            "2.9999999 ns is not a whole number of dt (1 ns): it is 2.9999999 "
            "dt, between 2 dt (2 ns) and 3 dt (3 ns)");
  EXPECT_EQ(failure(Clock().toTicks(read("0.000000000000000001 ns"))),
            "0.000000000000000001 ns is not a whole number of dt (1 ns): it is "
            "0.000000000000000001 dt, between 0 dt (0 ns) and 1 dt (1 ns)");
  // A divisor beyond 128 bits: 10^27 * (2^63 - 1).
  EXPECT_EQ(
      failure(
          clockOf(Most, TimeUnit::s).toTicks(read("0.000000000000000001 ns"))),
      "0.000000000000000001 ns is not a whole number of dt "
      "(9223372036854775807 s): it is less than 1 dt, between 0 dt (0 s) "
      "and 1 dt (9223372036854775808 s)");
}

TEST(ClockTest, RefusesWhatHasNoTicks) {
  EXPECT_EQ(failure(Clock().toTicks(Duration::ticks(-3))),
            "duration -3 dt is negative");
  EXPECT_EQ(failure(Clock().toTicks(read("-0.5 ns"))),
            "duration -0.5 ns is negative");
  EXPECT_EQ(failure(Clock().toTicks(Duration::unset())),
            "duration is unset when it should be a time");
  EXPECT_EQ(failure(Clock().toTicks(Duration())),
            "duration is missing when it should be a time");
  EXPECT_EQ(failure(twoNinths().toTicks(read("10000000000 s"))),
            "duration 10000000000 s does not fit in 64 bits of dt (2/9 ns)");
  // 2^63 - 1 is 49 times the first number; 2^64 - 1 is 51 times the third.
  Clock fine = clockOf(Fraction::of(1, 49), TimeUnit::ns);
  EXPECT_EQ(llvm::cantFail(fine.toTicks(read("188232082384791343 ns"))), Most);
  EXPECT_EQ(failure(fine.toTicks(read("188232082384791344 ns"))),
            "duration 188232082384791344 ns does not fit in 64 bits of dt "
            "(1/49 ns)");
  EXPECT_EQ(failure(clockOf(Fraction::of(2, 51), TimeUnit::ns)
                        .toTicks(read("361700864190383365 ns"))),
            "duration 361700864190383365 ns does not fit in 64 bits of dt "
            "(2/51 ns)");
}

// Against a search over all ticks, in integers that cannot overflow.
TEST(ClockTest, AgreesWithASearch) {
  std::mt19937 random(20240611);
  unsigned onClock = 0, offClock = 0;
  for (int round = 0; round < 3000; ++round) {
    std::int64_t num = 1 + random() % 9, den = 1 + random() % 9;
    std::int64_t amount = random() % 400;
    unsigned decimals = random() % 3;
    bool micro = random() % 4 == 0;
    std::string digits = std::to_string(amount);
    while (digits.size() <= decimals)
      digits.insert(0, "0");
    if (decimals)
      digits.insert(digits.size() - decimals, ".");
    Duration d = read(digits + (micro ? " us" : " ns"));
    Clock clock = clockOf(Fraction::of(num, den), TimeUnit::ns);
    // t dt = amount / 10^decimals ns, both times den * 10^decimals.
    std::int64_t scale = decimals == 0 ? 1 : decimals == 1 ? 10 : 100;
    std::int64_t wanted = amount * den * (micro ? 1000 : 1);
    Ticks t = 0;
    while (t * num * scale < wanted)
      ++t;
    llvm::Expected<Ticks> got = clock.toTicks(d);
    if (t * num * scale == wanted) {
      ++onClock;
      ASSERT_TRUE(bool(got)) << llvm::toString(got.takeError());
      EXPECT_EQ(*got, t);
      EXPECT_DOUBLE_EQ(clock.toSeconds(t),
                       double(amount) / double(scale) / (micro ? 1e6 : 1e9));
    } else {
      ++offClock;
      std::string message = failure(std::move(got));
      std::string between =
          "between " + clock.describe(t - 1) + " and " + clock.describe(t);
      EXPECT_NE(message.find(between), std::string::npos) << message;
    }
  }
  EXPECT_GT(onClock, 500u);
  EXPECT_GT(offClock, 500u);
}

TEST(ClockTest, Describes) {
  EXPECT_EQ(twoNinths().describe(160), "160 dt (35.556 ns)");
  EXPECT_EQ(twoNinths().describe(9), "9 dt (2 ns)");
  EXPECT_EQ(twoNinths().describe(0), "0 dt (0 ns)");
  EXPECT_EQ(twoNinths().describe(-9), "-9 dt (-2 ns)");
  // A tick of 0.00002 ns shows.
  EXPECT_EQ(clockOf(Fraction::of(1, 50000), TimeUnit::ns).describe(1),
            "1 dt (0.00002 ns)");
  EXPECT_DOUBLE_EQ(twoNinths().toSeconds(4500), 1e-6);
}

TEST(GridTest, AlignsDownAndUp) {
  for (Ticks step : {1, 2, 3, 8}) {
    for (Ticks tick = -20; tick <= 20; ++tick) {
      Ticks below = tick, above = tick;
      while (below % step != 0)
        --below;
      while (above % step != 0)
        ++above;
      EXPECT_EQ(alignDown(tick, step), below);
      EXPECT_EQ(alignUp(tick, step), above);
    }
  }
  // 2^63 = 2 (mod 3).
  EXPECT_EQ(alignDown(Most, 3), Most - 1);
  EXPECT_EQ(alignUp(Most, 3), Most);
  EXPECT_EQ(alignUp(Least, 3), Least + 2);
  EXPECT_EQ(alignDown(Least, 3), Least);
  EXPECT_EQ(alignDown(Least, 8), Least);
  EXPECT_EQ(alignUp(Most - 7, 8), Most - 7);
}

} // namespace
