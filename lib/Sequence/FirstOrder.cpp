//===- FirstOrder.cpp - What a sequence cancels to first order ------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/FirstOrder.h"

#include "llvm/Support/MathExtras.h"

#include <cmath>

using namespace lull;

using Vector3 = std::array<double, 3>;
using Matrix3 = std::array<Vector3, 3>;

/// What counts as zero for a sum of terms of order one.
static constexpr double Negligible = 1e-9;

static constexpr Matrix3 Identity3 = {{{1, 0, 0}, {0, 1, 0}, {0, 0, 1}}};

static Matrix3 multiply3(const Matrix3 &left, const Matrix3 &right) {
  Matrix3 result{};
  for (size_t i = 0; i < 3; ++i)
    for (size_t j = 0; j < 3; ++j)
      for (size_t k = 0; k < 3; ++k)
        result[i][j] += left[i][k] * right[k][j];
  return result;
}

static void add(Matrix3 &sum, double factor, const Matrix3 &term) {
  for (size_t i = 0; i < 3; ++i)
    for (size_t j = 0; j < 3; ++j)
      sum[i][j] += factor * term[i][j];
}

/// The axis of a pulse; exact for X, Y, -X, -Y, so that their sums are too.
static Vector3 axisOf(Fraction phase) {
  if (phase.denominator() <= 2) {
    static constexpr Vector3 Axes[] = {
        {1, 0, 0}, {0, 1, 0}, {-1, 0, 0}, {0, -1, 0}};
    Fraction turn = phase.modulo(2);
    return Axes[turn.numerator() * (2 / turn.denominator())];
  }
  double angle = phase.toDouble() * llvm::numbers::pi;
  return {std::cos(angle), std::sin(angle), 0};
}

/// parallel m m^T + perpendicular (1 - m m^T) + cross [m]x: the rotation about
/// m by theta with (1, cos theta, sin theta), and averages of it.
static Matrix3 about(const Vector3 &m, double parallel, double perpendicular,
                     double cross) {
  Matrix3 result{};
  for (size_t i = 0; i < 3; ++i) {
    for (size_t j = 0; j < 3; ++j)
      result[i][j] = (parallel - perpendicular) * m[i] * m[j];
    result[i][i] += perpendicular;
    size_t next = (i + 1) % 3, last = (i + 2) % 3;
    result[i][next] -= cross * m[last];
    result[i][last] += cross * m[next];
  }
  return result;
}

static bool isSame(const Instant &a, const Instant &b) {
  return a.exact && b.exact ? *a.exact == *b.exact : a.value == b.value;
}

/// How much of pulses back to back lies before their instant. What would lie
/// outside the window is moved inside.
static double shareBefore(const Instant &instant, Anchor anchor) {
  if (instant.value <= 0)
    return 0;
  return anchor == Anchor::End || instant.value >= 1 ? 1 : 0.5;
}

static bool isZero(const Vector3 &v) {
  for (double component : v)
    if (!(std::abs(component) < Negligible))
      return false;
  return true;
}

FirstOrder lull::firstOrder(const Sequence &sequence) {
  // Row a of `frame` is the toggled s_a = U^dagger s_a U, U being the product
  // of the pulses so far. With pulses of width w the integral over the window
  // is exactly linear in w, average + w slope: free intervals shrink by the
  // widths, and a square pulse contributes w times the average of its turn.
  FirstOrder result;
  Matrix3 frame = Identity3, average{}, slope{};
  double previous = 0;
  size_t count = sequence.size();
  for (size_t first = 0, last; first < count; first = last) {
    const Instant &instant = sequence.instants[first];
    last = first + 1;
    while (last < count && isSame(instant, sequence.instants[last]))
      ++last;
    double width = last - first;
    double before = shareBefore(instant, sequence.anchor) * width;

    add(average, instant.value - previous, frame);
    add(slope, -before, frame);
    for (size_t i = first; i < last; ++i) {
      Vector3 axis = axisOf(sequence.phases[i]);
      // The mean of cos theta over 0..pi is 0, that of sin theta 2/pi.
      Matrix3 during =
          multiply3(about(axis, 1, 0, 2 / llvm::numbers::pi), frame);
      add(slope, 1, during);
      for (size_t j = 0; j < 3; ++j) {
        result.detuningInPulse[j] += during[2][j];
        for (size_t k = 0; k < 3; ++k)
          result.overRotation[j] += axis[k] * frame[k][j];
      }
      frame = multiply3(about(axis, 1, -1, 0), frame);
    }
    add(slope, before - width, frame);
    previous = instant.value;
  }
  add(average, 1 - previous, frame);

  for (size_t a = 0; a < 3; ++a) {
    result.removed[a] = isZero(average[a]);
    result.removedFiniteWidth[a] = result.removed[a] && isZero(slope[a]);
  }
  return result;
}
