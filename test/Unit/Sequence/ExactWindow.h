//===- ExactWindow.h - A window by exact propagation, for tests -*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// A window of length 1 with square pulses, propagated exactly as a product of
// SU(2) rotations. Shares no code with the library beyond the sequence as data.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_UNIT_SEQUENCE_EXACTWINDOW_H
#define LULL_TEST_UNIT_SEQUENCE_EXACTWINDOW_H

#include "NamedSequence.h"

#include <array>
#include <cmath>
#include <vector>

namespace lull::test {

using Vector = std::array<double, 3>;

/// cosine - i (x X + y Y + z Z).
struct Spin {
  double cosine = 1;
  Vector sine{};

  Spin inverse() const { return {cosine, {-sine[0], -sine[1], -sine[2]}}; }
};

inline Spin operator*(const Spin &u, const Spin &v) {
  const Vector &a = u.sine, &b = v.sine;
  Spin result;
  result.cosine =
      u.cosine * v.cosine - (a[0] * b[0] + a[1] * b[1] + a[2] * b[2]);
  for (size_t i = 0; i < 3; ++i) {
    size_t j = (i + 1) % 3, k = (i + 2) % 3;
    result.sine[i] =
        u.cosine * b[i] + v.cosine * a[i] + a[j] * b[k] - a[k] * b[j];
  }
  return result;
}

/// exp(-i time/2 (field . sigma)).
inline Spin evolve(const Vector &field, double time) {
  double size = std::hypot(field[0], field[1], field[2]);
  if (size == 0)
    return {};
  double sine = std::sin(size * time / 2) / size;
  return {std::cos(size * time / 2),
          {field[0] * sine, field[1] * sine, field[2] * sine}};
}

/// A stretch of time with a constant drive.
struct Stretch {
  double length = 0;
  /// In rad per window; zero between pulses.
  Vector drive{};
};

/// The stretches of a window. Pulses of width `width` lie on their instants by
/// their centres, or by their ends in a sequence anchored so; equal instants
/// share that point as one block. Each pulse turns by pi (1 + overRotation).
inline std::vector<Stretch> stretches(const Sequence &sequence, double width,
                                      double overRotation) {
  std::vector<Stretch> result;
  double now = 0;
  for (size_t i = 0; i < sequence.size();) {
    double instant = sequence.instants[i].value;
    size_t end = i;
    while (end < sequence.size() && sequence.instants[end].value == instant)
      ++end;
    double block = (end - i) * width;
    double start =
        sequence.anchor == Anchor::End ? instant - block : instant - block / 2;
    result.push_back({start - now, {}});
    for (; i < end; ++i) {
      double phase = sequence.phases[i].toDouble() * Pi;
      double rate = Pi * (1 + overRotation) / width;
      result.push_back(
          {width, {rate * std::cos(phase), rate * std::sin(phase), 0}});
    }
    now = start + block;
  }
  result.push_back({1 - now, {}});
  return result;
}

/// The window's propagator with a constant coupling (field . sigma)/2 on top of
/// the pulses, relative to the window without coupling and over-rotation.
inline Spin windowError(const Sequence &sequence, double width,
                        double overRotation, const Vector &field) {
  Spin ideal, actual;
  for (const Stretch &stretch : stretches(sequence, width, 0))
    ideal = evolve(stretch.drive, stretch.length) * ideal;
  for (const Stretch &stretch : stretches(sequence, width, overRotation)) {
    Vector total = stretch.drive;
    for (size_t i = 0; i < 3; ++i)
      total[i] += field[i];
    actual = evolve(total, stretch.length) * actual;
  }
  return ideal.inverse() * actual;
}

/// 1 - |Tr(ideal^dagger actual)|^2 / 4, without cancellation.
inline double infidelity(const Spin &error) {
  const Vector &s = error.sine;
  return s[0] * s[0] + s[1] * s[1] + s[2] * s[2];
}

} // namespace lull::test

#endif // LULL_TEST_UNIT_SEQUENCE_EXACTWINDOW_H
