//===- RandomDevice.h - Devices that nobody has built -----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// What the test knows about a device, kept apart from the library's model: the
// text is all that the two have in common.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_RANDOMDEVICE_H
#define LULL_TEST_PROPERTY_RANDOMDEVICE_H

#include "Random.h"

#include "lull/Timing/Fraction.h"

#include <optional>
#include <string>

namespace lull::property {

/// A sum or difference of small fractions, in [0, 2).
Fraction turned(Fraction a, Fraction b);
Fraction turnedBack(Fraction a, Fraction b);

/// One line of the table of operations.
struct Entry {
  enum class Plays { Nothing, Rotation, Equatorial, Frame };

  std::string name;
  std::int64_t duration = 0;
  /// Empty for any sites (`arity` of them).
  std::vector<std::vector<int>> on;
  unsigned arity = 1;
  bool symmetric = false;
  bool native = false;
  Plays plays = Plays::Nothing;
  /// Of a rotation, in units of pi: the turn as it is written (it may be
  /// negative) and the phase.
  Fraction turn = 0;
  Fraction phase = 0;

  /// The phase of the same rotation by a positive turn.
  Fraction axis() const { return turn < 0 ? turned(phase, 1) : phase; }
  bool isHalf() const { return turn.denominator() == 2; }
};

/// What the device makes pulses of.
enum class Means {
  XFrame,
  HalfFrame,
  XY,
  Signed,
  Equatorial,
  EquatorialFrame,
  XEquatorial,
  XYFrame,
  Halves,
  NegativeHalfFrame,
  SiteWidths,
  TiltedFrame,
};
inline constexpr int numMeans = 12;

struct RandomDevice {
  std::string name;
  Fraction dt = 1;
  std::string unit;
  std::int64_t step = 1;
  std::int64_t gap = 0;
  std::vector<int> sites;
  std::vector<std::pair<int, int>> couplers;
  std::vector<Entry> entries;
  /// About how much time a pulse takes with all that comes with it.
  std::int64_t pulseScale = 0;

  std::string text() const;
  /// The line that holds for an operation: one that lists the sites first.
  const Entry *find(llvm::StringRef label, const std::vector<int> &on) const;
  /// How long a pi pulse of this phase takes; nothing if it cannot be played.
  /// The order of preference is that of the documentation.
  std::optional<std::int64_t> pulseWidth(int site, Fraction phase) const;
  bool playsEverywhere(Fraction phase) const;
  /// The next multiple of the step.
  std::int64_t aligned(std::int64_t tick) const {
    return (tick + step - 1) / step * step;
  }
};

RandomDevice makeDevice(Random &random, Means means, std::string name);

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_RANDOMDEVICE_H
