//===- Time.h - Exact durations and the device clock ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// A duration is what a program says: a decimal with a unit of seconds, or a
// number of dt. It is exact and keeps its unit. The clock turns it into ticks
// (whole multiples of dt), the only time that schedules compute with, or says
// by how much it misses. Seconds as a float appear in physics only.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_TIME_H
#define LULL_TIMING_TIME_H

#include "lull/Timing/Fraction.h"

#include "llvm/ADT/StringRef.h"

#include <cstdint>
#include <optional>
#include <string>

namespace lull {

/// A time or a span of time in whole multiples of the device's dt.
using Ticks = std::int64_t;

/// The unit a duration is written in.
enum class TimeUnit : std::uint8_t {
  /// No statement at all. A required property that still has it was lost on
  /// the way (a generic form without it, an old bytecode); verifiers refuse it.
  Missing,
  /// The program leaves the duration to the device.
  Unset,
  dt,
  ns,
  us,
  ms,
  s,
};

/// `ns` for TimeUnit::ns and so on; empty for Missing and Unset.
llvm::StringRef spell(TimeUnit unit);
/// The inverse; accepts `us` and both spellings of the micro sign with s.
std::optional<TimeUnit> parseTimeUnit(llvm::StringRef text);

/// An exact duration `amount * 10^-decimals unit`, 16 bytes. Trailing zeros are
/// dropped, so that equal text has equal representation; `1 us` and `1000 ns`
/// are different texts of the same length (compare them through a Clock).
class Duration {
public:
  /// Missing.
  constexpr Duration() = default;
  static constexpr Duration unset() { return Duration(0, 0, TimeUnit::Unset); }
  static constexpr Duration ticks(Ticks count) {
    return Duration(count, 0, TimeUnit::dt);
  }
  /// Reads `number` (an optional minus, digits, an optional point with digits;
  /// no exponent) in `unit`. Fails on other characters, on values that need
  /// more than 18 digits, and on a fraction of a dt.
  static llvm::Expected<Duration> parse(llvm::StringRef number, TimeUnit unit);
  /// Reads a whole text such as `35.5 ns`, `160dt`, `unset`.
  static llvm::Expected<Duration> parse(llvm::StringRef text);
  /// Rebuilds a stored duration; fails if it is not one that parse() makes.
  static llvm::Expected<Duration> make(std::int64_t amount, unsigned decimals,
                                       TimeUnit unit);

  std::int64_t amount() const { return value; }
  unsigned decimals() const { return scale; }
  TimeUnit unit() const { return kind; }

  bool isMissing() const { return kind == TimeUnit::Missing; }
  /// Whether it states a time (neither Missing nor Unset).
  bool isSet() const { return kind > TimeUnit::Unset; }
  bool isNegative() const { return value < 0; }

  /// `35.5 ns`, `160 dt`, `unset`; empty for Missing.
  std::string str() const;
  /// The number alone: `35.5`.
  std::string number() const;

  friend bool operator==(const Duration &a, const Duration &b) {
    return a.value == b.value && a.scale == b.scale && a.kind == b.kind;
  }
  friend bool operator!=(const Duration &a, const Duration &b) {
    return !(a == b);
  }
  friend llvm::hash_code hash_value(const Duration &d) {
    return llvm::hash_combine(d.value, d.scale, unsigned(d.kind));
  }

private:
  constexpr Duration(std::int64_t value, std::uint8_t scale, TimeUnit kind)
      : value(value), scale(scale), kind(kind) {}

  std::int64_t value = 0;
  std::uint8_t scale = 0;
  TimeUnit kind = TimeUnit::Missing;
};

/// The clock of a device: dt as an exact fraction of a unit of seconds.
class Clock {
public:
  /// One nanosecond.
  Clock() = default;
  /// `dt` in `unit`; fails unless dt is positive, the unit is one of seconds,
  /// and dt in seconds has a numerator and denominator of 64 bits.
  static llvm::Expected<Clock> make(Fraction dt, TimeUnit unit);

  /// dt as it was written: a fraction and its unit.
  Fraction dt() const { return step; }
  TimeUnit unit() const { return kind; }
  /// `2/9 ns`.
  std::string str() const;

  /// Ticks of a set duration. Fails if it is off the clock (naming the two
  /// nearest multiples of dt), negative, or beyond 64 bits.
  llvm::Expected<Ticks> toTicks(const Duration &duration) const;
  /// Seconds of a number of ticks, for physics and for display.
  double toSeconds(Ticks ticks) const;
  /// `160 dt (35.556 ns)`: exact ticks, and a rounded reading aid in the unit
  /// that dt is written in.
  std::string describe(Ticks ticks) const;

  friend bool operator==(const Clock &a, const Clock &b) {
    return a.seconds == b.seconds;
  }

private:
  Fraction step = Fraction(1);
  TimeUnit kind = TimeUnit::ns;
  /// dt in seconds, exact.
  Fraction seconds = Fraction::of(1, 1000000000);
};

/// The largest multiple of `step` at or below `tick`, and the smallest at or
/// above it. `step` is positive; both are exact for negative ticks too. Where
/// there is no such multiple in 64 bits, the least or the greatest tick.
Ticks alignDown(Ticks tick, Ticks step);
Ticks alignUp(Ticks tick, Ticks step);

} // namespace lull

#endif // LULL_TIMING_TIME_H
