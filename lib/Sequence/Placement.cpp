//===- Placement.cpp - Pulses on the clock grid -----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The method. Push all pulses to the left: they then start at `packed` places.
// Any placement is start_k = packed_k + step z_k with whole numbers
// 0 <= z_1 <= ... <= z_n <= top, where `top` is the slack of the window in
// steps. The residual depends on the alternating sum of the z alone, which
// takes every value of a known range; so its best value (or two, equally far
// from the sequence's own imbalance) is known before any search. What is left
// is least squares over such z with a given alternating sum, which
// GridSearch.cpp solves exactly in a few passes over the pulses.
//
// A mirror-symmetric placement is fixed by its first half. Its cost is that of
// the half with averaged ideals (plus a constant) and its alternating sum twice
// that of the half (plus a constant): the same problem, solved by the same
// code. It is taken if its cost is the best one.
//
// All costs are whole numbers: ideal starts and the imbalance are counted in
// units of 1/scale tick, where `scale` makes them whole. Instants without a
// small common denominator are first rounded to 2^-20 tick as seen from the
// middle of the window, so that mirror images round to mirror images. What
// rounding alone can do to the imbalance is taken for none: else it would
// decide between placements that are equally good.
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Placement.h"

#include "GridSearch.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/STLExtras.h"

#include <cmath>
#include <limits>
#include <numeric>

using namespace lull;

namespace {

/// Window lengths times `scale` stay within this, so that squares of
/// displacements, summed over all pulses, fit 128 bits.
constexpr std::int64_t LongestScaled = std::int64_t(1) << 54;
static_assert(LongestWindow == LongestScaled / 2);
constexpr size_t MostPlaced = size_t(1) << 18;

/// One problem of placement in whole numbers.
struct Setting {
  llvm::ArrayRef<Ticks> widths;
  GridWindow window;
  /// Starts with all pulses pushed to the left.
  llvm::SmallVector<Ticks, 16> packed;
  /// How far all of them can move, in steps.
  std::int64_t top = 0;
  /// Units a tick; even.
  std::int64_t scale = 2;
  /// Ideal starts minus packed ones, in units.
  llvm::SmallVector<std::int64_t, 16> ideal;
  /// The sequence's own imbalance, in units.
  std::int64_t own = 0;

  size_t size() const { return widths.size(); }
  GridProblem problem() const {
    // Without slack the step does not matter, and may be huge.
    return {ideal, top ? window.step * scale : 2, top};
  }
  Int128 costOf(llvm::ArrayRef<std::int64_t> levels) const;
};

Int128 Setting::costOf(llvm::ArrayRef<std::int64_t> levels) const {
  Int128 cost = 0;
  for (auto [level, place] : llvm::zip_equal(levels, ideal)) {
    Int128 miss = Int128(level) * window.step * scale - place;
    cost += miss * miss;
  }
  return cost;
}

Ticks firstGridPoint(const GridWindow &grid) {
  Ticks rest = grid.start % grid.step;
  if (rest < 0)
    rest += grid.step;
  return rest == 0 ? 0 : grid.step - rest;
}

/// Where the pulses start when all are pushed to the left; returns the end of
/// the last, or nothing beyond 64 bits.
std::optional<Ticks> pack(llvm::ArrayRef<Ticks> widths, const GridWindow &grid,
                          llvm::SmallVectorImpl<Ticks> &packed) {
  packed.clear();
  Ticks start = firstGridPoint(grid), end = 0, pitch = 0, pitchOf = -1;
  for (Ticks width : widths) {
    if (!packed.empty() && __builtin_add_overflow(start, pitch, &start))
      return std::nullopt;
    packed.push_back(start);
    if (__builtin_add_overflow(start, width, &end))
      return std::nullopt;
    if (width == pitchOf || packed.size() == widths.size())
      continue;
    if (__builtin_add_overflow(width, grid.leastGap, &pitch))
      return std::nullopt;
    if (Ticks rest = pitch % grid.step)
      if (__builtin_add_overflow(pitch, grid.step - rest, &pitch))
        return std::nullopt;
    pitchOf = width;
  }
  return end;
}

llvm::Error checkInput(const Sequence &sequence, llvm::ArrayRef<Ticks> widths,
                       const GridWindow &window) {
  size_t count = sequence.instants.size();
  if (sequence.phases.size() != count)
    return fault("sequence '{}' has {} phases and {} instants", sequence.name,
                 sequence.phases.size(), count);
  if (widths.size() != count)
    return fault("got {} pulse widths when sequence '{}' has {} pulses",
                 widths.size(), sequence.name, count);
  if (count > MostPlaced)
    return fault("sequence '{}' has {} pulses when at most {} can be placed",
                 sequence.name, count, MostPlaced);
  if (window.step < 1)
    return fault("grid step is {} dt when it should be at least 1 dt",
                 window.step);
  if (window.leastGap < 0)
    return fault("least gap is {} dt when it should not be negative",
                 window.leastGap);
  if (window.length < 0)
    return fault("window is {} dt long when it should not be negative",
                 window.length);
  if (window.length > LongestWindow)
    return fault("window of {} dt is too long: pulses are placed in windows of "
                 "at most {} dt",
                 window.length, LongestWindow);
  for (auto [index, width] : llvm::enumerate(widths))
    if (width < 0)
      return fault("width of pulse {} is {} dt when it should not be negative",
                   index + 1, width);
  double last = 0;
  for (auto [index, instant] : llvm::enumerate(sequence.instants)) {
    if (!(instant.value >= 0 && instant.value <= 1) ||
        (instant.exact && (*instant.exact < 0 || Fraction(1) < *instant.exact)))
      return fault("instant {} is {} when it should be between 0 and 1",
                   index + 1, instant.value);
    if (instant.value < last)
      return fault("instant {} is {} when it should not be before {}",
                   index + 1, instant.value, last);
    last = instant.value;
  }
  return llvm::Error::success();
}

/// The common denominator of the instants, if they are exact and it is small
/// enough.
std::optional<std::int64_t> commonDenominator(llvm::ArrayRef<Instant> instants,
                                              Ticks length) {
  std::int64_t limit = LongestScaled / 2 / std::max<Ticks>(length, 1);
  std::int64_t common = 1;
  for (const Instant &instant : instants) {
    if (!instant.exact)
      return std::nullopt;
    std::int64_t denominator = instant.exact->denominator();
    if (common % denominator == 0)
      continue;
    std::int64_t factor = denominator / std::gcd(common, denominator);
    if (factor > limit / common)
      return std::nullopt;
    common *= factor;
  }
  return common;
}

/// An instant minus one half. Two instants that are mirror images but for
/// rounding get exactly opposite values.
double fromMiddle(llvm::ArrayRef<Instant> instants, size_t index) {
  constexpr double Rounding = 1e-12;
  double here = instants[index].value - 0.5;
  double there = instants[instants.size() - 1 - index].value - 0.5;
  return std::abs(here + there) < Rounding ? (here - there) / 2 : here;
}

/// Sets the scale, the ideal starts and the imbalance.
void setIdeal(Setting &setting, const Sequence &sequence) {
  Ticks length = setting.window.length;
  llvm::SmallVector<std::int64_t, 16> places;
  std::int64_t negligible = 0;
  if (auto common = commonDenominator(sequence.instants, length)) {
    setting.scale = 2 * *common;
    for (const Instant &instant : sequence.instants)
      places.push_back(setting.scale / instant.exact->denominator() *
                       instant.exact->numerator() * length);
  } else {
    // A double is no finer than 2^-53 of the window anyway.
    std::int64_t parts = std::int64_t(1) << 20;
    while (parts > 1 && length > LongestScaled / 2 / parts)
      parts /= 2;
    setting.scale = 2 * parts;
    // Rounding shifts a place by a unit, and twice that counts; as much again
    // for the errors of the instants themselves.
    negligible = 4 * std::int64_t(setting.size());
    for (size_t i = 0, e = setting.size(); i != e; ++i)
      places.push_back(parts * length +
                       2 * std::llround(fromMiddle(sequence.instants, i) *
                                        double(length) * double(parts)));
  }
  // The residual of pulses without width.
  llvm::SmallVector<Ticks, 16> none(places.size(), 0);
  setting.own = residualOf(places, none, setting.scale * length);
  if (std::abs(setting.own) <= negligible)
    setting.own = 0;
  std::int64_t before =
      sequence.anchor == Anchor::Centre ? setting.scale / 2 : setting.scale;
  for (auto [place, width, packed] :
       llvm::zip_equal(places, setting.widths, setting.packed))
    setting.ideal.push_back(place - width * before - packed * setting.scale);
}

/// The alternating sums of z with the residual nearest to the imbalance: one,
/// or two on either side of it.
llvm::SmallVector<std::int64_t, 2> bestSums(const Setting &setting) {
  // scale residual - own = atZero - 2 scale step sum.
  Int128 atZero =
      Int128(setting.scale) *
          residualOf(setting.packed, setting.widths, setting.window.length) -
      setting.own;
  Int128 stride = Int128(2) * setting.scale * setting.window.step;
  SumRange range = sumRange(setting.size(), setting.top);
  auto clamped = [&](Int128 sum) {
    return std::int64_t(
        std::clamp<Int128>(sum, Int128(range.least), Int128(range.most)));
  };
  Int128 down = atZero / stride;
  if (down * stride > atZero)
    --down;
  std::int64_t low = clamped(down), high = clamped(down + 1);
  auto miss = [&](std::int64_t sum) {
    Int128 difference = atZero - stride * sum;
    return difference < 0 ? -difference : difference;
  };
  if (low == high || miss(low) < miss(high))
    return {low};
  if (miss(high) < miss(low))
    return {high};
  return {low, high};
}

/// The best mirror-symmetric placement with this alternating sum, if there is
/// any.
std::optional<GridLevels> searchMirror(const Setting &setting,
                                       std::int64_t sum) {
  size_t count = setting.size(), half = count / 2;
  std::int64_t top = setting.top, unit = setting.problem().unit;
  for (size_t i = 0; i != count; ++i)
    if (setting.widths[i] != setting.widths[count - 1 - i])
      return std::nullopt;
  // The mirror image of a grid point must be one, for pulses of every width;
  // then the image of z_k is top - z_k.
  Ticks first = setting.packed.front(), step = setting.window.step;
  for (Ticks width : setting.widths)
    if ((setting.window.length - width - 2 * first) % step != 0)
      return std::nullopt;
  std::optional<std::int64_t> halfSum;
  if (count % 2) {
    if (top % 2 || sum != -top / 2)
      return std::nullopt;
  } else {
    std::int64_t twice = sum - (half % 2 ? top : 0);
    SumRange range = sumRange(half, top / 2);
    if (twice % 2 || twice / 2 < range.least || twice / 2 > range.most)
      return std::nullopt;
    halfSum = twice / 2;
  }
  // Twice the average ideals, hence twice the unit.
  llvm::SmallVector<std::int64_t, 16> ideal;
  for (size_t i = 0; i != half; ++i)
    ideal.push_back(setting.ideal[i] + unit * top -
                    setting.ideal[count - 1 - i]);
  GridLevels levels = searchGrid({ideal, 2 * unit, top / 2}, halfSum);
  if (count % 2)
    levels.push_back(top / 2);
  for (size_t i = half; i-- != 0;)
    levels.push_back(top - levels[i]);
  return levels;
}

bool isMirror(llvm::ArrayRef<Ticks> starts, llvm::ArrayRef<Ticks> widths,
              Ticks length) {
  for (size_t i = 0, j = starts.size(); i < j--; ++i)
    if (widths[i] != widths[j] || starts[j] != length - widths[i] - starts[i])
      return false;
  return true;
}

/// A placement with the residual nearest to the imbalance.
struct Candidate {
  std::vector<Ticks> starts;
  Int128 cost;
  bool mirror;

  Candidate(const Setting &setting, llvm::ArrayRef<std::int64_t> levels)
      : starts(setting.packed.begin(), setting.packed.end()),
        cost(setting.costOf(levels)) {
    for (auto [start, level] : llvm::zip_equal(starts, levels))
      start += level * setting.window.step;
    mirror = isMirror(starts, setting.widths, setting.window.length);
  }

  bool betterThan(const Candidate &other) const {
    if (cost != other.cost)
      return cost < other.cost;
    if (mirror != other.mirror)
      return mirror;
    return starts < other.starts;
  }
};

Candidate findBest(const Setting &setting) {
  std::optional<Candidate> best;
  auto offer = [&](Candidate offered) {
    if (!best || offered.betterThan(*best))
      best = std::move(offered);
  };
  for (std::int64_t sum : bestSums(setting)) {
    Candidate earliest(setting, searchGrid(setting.problem(), sum));
    bool mirror = earliest.mirror;
    offer(std::move(earliest));
    if (mirror)
      continue;
    if (std::optional<GridLevels> levels = searchMirror(setting, sum))
      offer(Candidate(setting, *levels));
  }
  return std::move(*best);
}

} // namespace

Ticks lull::leastWindow(llvm::ArrayRef<Ticks> widths, const GridWindow &grid) {
  llvm::SmallVector<Ticks, 16> packed;
  return pack(widths, grid, packed).value_or(std::numeric_limits<Ticks>::max());
}

Ticks lull::residualOf(llvm::ArrayRef<Ticks> starts,
                       llvm::ArrayRef<Ticks> widths, Ticks length) {
  // After the last pulse the switching function is (-1)^n.
  Ticks residual = starts.size() % 2 ? -length : length;
  int sign = 1;
  for (auto [start, width] : llvm::zip_equal(starts, widths)) {
    residual += sign * (2 * start + width);
    sign = -sign;
  }
  return residual;
}

llvm::Expected<Placement> lull::place(const Sequence &sequence,
                                      llvm::ArrayRef<Ticks> widths,
                                      const GridWindow &window) {
  if (llvm::Error error = checkInput(sequence, widths, window))
    return std::move(error);
  if (widths.empty())
    return Placement{{}, window.length, 0, true};
  Setting setting;
  setting.widths = widths;
  setting.window = window;
  std::optional<Ticks> needed = pack(widths, window, setting.packed);
  if (!needed || *needed > window.length)
    return fault(
        "window of {} dt is too short: {} pulse{} {}{} dt on a grid "
        "of {} dt",
        window.length, widths.size(), widths.size() == 1 ? " needs" : "s need",
        needed ? "" : "more than ",
        needed.value_or(std::numeric_limits<Ticks>::max()), window.step);
  setting.top = (window.length - *needed) / window.step;
  setIdeal(setting, sequence);

  Candidate best = findBest(setting);
  Placement placement;
  placement.residual = residualOf(best.starts, widths, window.length);
  placement.displacement =
      double(best.cost) / (double(setting.scale) * double(setting.scale));
  placement.mirror = best.mirror;
  placement.starts = std::move(best.starts);
  return placement;
}
