//===- Time.cpp - Exact durations and the device clock --------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Time.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/StringExtras.h"

#include <limits>

using namespace lull;

namespace {

__extension__ typedef unsigned __int128 Wide;

constexpr Ticks mostTicks = std::numeric_limits<Ticks>::max();
/// Digits of an amount, and of it behind the point, so that every amount and
/// every power of ten fits in 64 bits.
constexpr unsigned mostDigits = 18;
constexpr llvm::StringLiteral units = "dt, ns, us, ms or s";

std::int64_t powerOfTen(unsigned exponent) {
  std::int64_t result = 1;
  while (exponent-- > 0)
    result *= 10;
  return result;
}

bool isSeconds(TimeUnit unit) {
  return unit >= TimeUnit::ns && unit <= TimeUnit::s;
}

/// The negative decimal exponent of a unit of seconds: 9 for ns.
unsigned exponentOf(TimeUnit unit) {
  return 3 * (unsigned(TimeUnit::s) - unsigned(unit));
}

Wide commonDivisor(Wide a, Wide b) {
  while (b != 0) {
    Wide rest = a % b;
    a = b;
    b = rest;
  }
  return a;
}

/// Drops what a decimal number does not need: `35.500` to `35.5`.
std::string trimZeros(std::string text) {
  if (text.find('.') == std::string::npos)
    return text;
  text.erase(text.find_last_not_of('0') + 1);
  if (text.back() == '.')
    text.pop_back();
  return text;
}

/// `whole + rest / divisor` for a message, where 0 < rest < divisor; `about`
/// stands before it where digits are left out.
std::string spellMixed(Wide whole, Wide rest, Wide divisor) {
  double part = double(rest) / double(divisor);
  std::string digits;
  unsigned places = 3;
  // As many as it takes not to look like a whole number.
  for (; places <= mostDigits; ++places) {
    digits = fmt::format("{:.{}f}", part, places);
    if (digits.front() == '0' &&
        digits.find_first_not_of("0.") != std::string::npos)
      break;
  }
  if (places > mostDigits)
    return fmt::format("about {}", std::uint64_t(whole) + (part > 0.5));
  Wide scaled = 0;
  bool exact =
      !__builtin_mul_overflow(rest, Wide(powerOfTen(places)), &scaled) &&
      scaled % divisor == 0;
  return fmt::format("{}{}{}", exact ? "" : "about ", std::uint64_t(whole),
                     trimZeros(digits).substr(1));
}

} // namespace

llvm::StringRef lull::spell(TimeUnit unit) {
  switch (unit) {
  case TimeUnit::Missing:
  case TimeUnit::Unset:
    return "";
  case TimeUnit::dt:
    return "dt";
  case TimeUnit::ns:
    return "ns";
  case TimeUnit::us:
    return "us";
  case TimeUnit::ms:
    return "ms";
  case TimeUnit::s:
    return "s";
  }
  return "";
}

std::optional<TimeUnit> lull::parseTimeUnit(llvm::StringRef text) {
  for (TimeUnit unit :
       {TimeUnit::dt, TimeUnit::ns, TimeUnit::us, TimeUnit::ms, TimeUnit::s})
    if (text == spell(unit))
      return unit;
  // The micro sign and the Greek letter, in UTF-8.
  if (text == "\xC2\xB5s" || text == "\xCE\xBCs")
    return TimeUnit::us;
  return std::nullopt;
}

//===----------------------------------------------------------------------===//
// Duration
//===----------------------------------------------------------------------===//

llvm::Expected<Duration> Duration::parse(llvm::StringRef number,
                                         TimeUnit unit) {
  if (unit <= TimeUnit::Unset || unit > TimeUnit::s)
    return fault("'{}' has no unit ({})", number.str(), units.str());

  llvm::StringRef rest = number;
  bool negative = rest.consume_front("-");
  llvm::StringRef whole = rest.take_while(llvm::isDigit);
  rest = rest.drop_front(whole.size());
  bool point = rest.consume_front(".");
  // T5: decimal.
  if (whole.empty() || (point && rest.empty()) ||
      !llvm::all_of(rest, llvm::isDigit) || (!point && !rest.empty()))
    return fault("'{}' is not a decimal number", number.str());

  whole = whole.ltrim('0');
  llvm::StringRef behind = rest.rtrim('0');
  llvm::StringRef leading = whole.empty() ? behind.ltrim('0') : behind;
  // T7: digits that fit 64 bits.
  if (behind.size() > mostDigits || whole.size() + leading.size() > mostDigits)
    return fault("'{}' needs more than {} digits", number.str(), mostDigits);
  // T6: whole.
  if (unit == TimeUnit::dt && !behind.empty())
    return fault("'{} dt' is not a whole number of dt", number.str());

  std::int64_t amount = 0;
  for (llvm::StringRef digits : {whole, behind})
    for (char digit : digits)
      amount = 10 * amount + (digit - '0');
  return Duration(negative ? -amount : amount, behind.size(), unit);
}

llvm::Expected<Duration> Duration::parse(llvm::StringRef text) {
  llvm::StringRef trimmed = text.trim();
  if (trimmed == "unset")
    return unset();
  size_t last = trimmed.find_last_of("0123456789.");
  if (last == llvm::StringRef::npos)
    return fault("'{}' is not a duration such as 35.5 ns", text.str());
  llvm::StringRef number = trimmed.take_front(last + 1);
  llvm::StringRef name = trimmed.drop_front(last + 1).ltrim();
  std::optional<TimeUnit> unit = parseTimeUnit(name);
  if (unit)
    return parse(number, *unit);
  // Which of the two parts is the better to complain about.
  llvm::Expected<Duration> reading = parse(number, TimeUnit::s);
  if (!reading)
    return reading.takeError();
  // T4: a unit.
  if (name.empty())
    return fault("'{}' has no unit ({})", number.str(), units.str());
  return fault("'{}' is not a unit of time ({})", name.str(), units.str());
}

llvm::Expected<Duration> Duration::make(std::int64_t amount, unsigned decimals,
                                        TimeUnit unit) {
  if (unit == TimeUnit::Unset && amount == 0 && decimals == 0)
    return unset();
  if (unit <= TimeUnit::Unset || unit > TimeUnit::s)
    return fault("amount {} with {} decimals has no unit of time (number {})",
                 amount, decimals, unsigned(unit));
  std::int64_t limit = powerOfTen(mostDigits);
  if (decimals > mostDigits || amount >= limit || amount <= -limit)
    return fault("amount {} with {} decimals needs more than {} digits", amount,
                 decimals, mostDigits);
  if (decimals > 0 && amount % 10 == 0)
    return fault("amount {} with {} decimals has a trailing zero", amount,
                 decimals);
  if (decimals > 0 && unit == TimeUnit::dt)
    return fault("amount {} with {} decimals is not a whole number of dt",
                 amount, decimals);
  return Duration(amount, decimals, unit);
}

std::string Duration::number() const {
  if (!isSet())
    return "";
  std::uint64_t magnitude =
      value < 0 ? -std::uint64_t(value) : std::uint64_t(value);
  std::string digits = fmt::format("{:0{}}", magnitude, scale + 1);
  if (scale > 0)
    digits.insert(digits.size() - scale, ".");
  return (value < 0 ? "-" : "") + digits;
}

std::string Duration::str() const {
  if (kind == TimeUnit::Unset)
    return "unset";
  return isSet() ? fmt::format("{} {}", number(), spell(kind).str()) : "";
}

//===----------------------------------------------------------------------===//
// Clock
//===----------------------------------------------------------------------===//

llvm::Expected<Clock> Clock::make(Fraction dt, TimeUnit unit) {
  // D4: a unit of seconds.
  if (!isSeconds(unit))
    return fault("dt is given in '{}' when it should be in ns, us, ms or s",
                 spell(unit).str());
  // D3: positive.
  if (dt <= Fraction(0))
    return fault("dt is {} {} when it should be positive", dt.str(),
                 spell(unit).str());
  std::optional<Fraction> seconds =
      dt.over(Fraction(powerOfTen(exponentOf(unit))));
  // D5: exact in seconds.
  if (!seconds)
    return fault("dt of {} {} is not a fraction of 64 bits in seconds",
                 dt.str(), spell(unit).str());
  Clock clock;
  clock.step = dt;
  clock.kind = unit;
  clock.seconds = *seconds;
  return clock;
}

std::string Clock::str() const {
  return fmt::format("{} {}", step.str(), spell(kind).str());
}

llvm::Expected<Ticks> Clock::toTicks(const Duration &duration) const {
  if (!duration.isSet())
    return fault("duration is {} when it should be a time",
                 duration.isMissing() ? "missing" : "unset");
  // T1: not negative.
  if (duration.isNegative())
    return fault("duration {} is negative", duration.str());
  if (duration.unit() == TimeUnit::dt)
    return duration.amount();

  // amount / 10^decimals / 10^exponent / (dt in seconds), reduced before it is
  // multiplied: the upper two factors always fit in 128 bits.
  Wide up[] = {Wide(duration.amount()), Wide(seconds.denominator())};
  Wide down[] = {Wide(powerOfTen(duration.decimals())),
                 Wide(powerOfTen(exponentOf(duration.unit()))),
                 Wide(seconds.numerator())};
  for (Wide &above : up) {
    for (Wide &below : down) {
      Wide divisor = commonDivisor(above, below);
      above /= divisor;
      below /= divisor;
    }
  }
  Wide dividend = up[0] * up[1];
  Wide divisor = down[0] * down[1]; // at most 10^27
  // A divisor beyond 128 bits is beyond the dividend too: less than one tick.
  // Any divisor above the dividend then serves, as only digits depend on it.
  bool tiny = __builtin_mul_overflow(divisor, down[2], &divisor);
  if (tiny)
    divisor = ~Wide(0);
  Wide whole = dividend / divisor;
  Wide rest = dividend % divisor;
  // T8: in 64 bits.
  if (whole > Wide(mostTicks) - (rest != 0))
    return fault("duration {} does not fit in 64 bits of dt ({})",
                 duration.str(), str());
  // T3: a whole number of ticks.
  if (rest == 0)
    return Ticks(whole);
  return fault("{} is not a whole number of dt ({}): it is {} dt, between {} "
               "and {}",
               duration.str(), str(),
               tiny ? "less than 1" : spellMixed(whole, rest, divisor),
               describe(Ticks(whole)), describe(Ticks(whole) + 1));
}

double Clock::toSeconds(Ticks ticks) const {
  return double(ticks) * double(seconds.numerator()) /
         double(seconds.denominator());
}

std::string Clock::describe(Ticks ticks) const {
  // Three places, or as many as tell one tick from the next.
  unsigned places = 3;
  for (double tick = step.toDouble() * 1e3; tick < 1 && places < mostDigits;
       tick *= 10)
    ++places;
  double aid =
      double(ticks) * double(step.numerator()) / double(step.denominator());
  return fmt::format("{} dt ({} {})", ticks,
                     trimZeros(fmt::format("{:.{}f}", aid, places)),
                     spell(kind).str());
}

//===----------------------------------------------------------------------===//
// Grid
//===----------------------------------------------------------------------===//

Ticks lull::alignDown(Ticks tick, Ticks step) {
  Ticks rest = tick % step;
  if (rest < 0)
    rest += step;
  Ticks result;
  return __builtin_sub_overflow(tick, rest, &result)
             ? std::numeric_limits<Ticks>::min()
             : result;
}

Ticks lull::alignUp(Ticks tick, Ticks step) {
  Ticks rest = tick % step;
  if (rest == 0)
    return tick;
  Ticks result;
  return __builtin_add_overflow(tick, rest < 0 ? -rest : step - rest, &result)
             ? mostTicks
             : result;
}
