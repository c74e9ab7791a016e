//===- PlacementReference.h - Placement, done slowly ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// What place() is tested against: trying every placement, and dynamic
// programming where that is too many. Shares no code with the search.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_UNIT_SEQUENCE_PLACEMENTREFERENCE_H
#define LULL_TEST_UNIT_SEQUENCE_PLACEMENTREFERENCE_H

#include "lull/Sequence/Placement.h"

#include "llvm/Support/Error.h"

#include "gtest/gtest.h"

#include <algorithm>
#include <cmath>
#include <map>
#include <numeric>

namespace lull {
namespace reference {

__extension__ typedef __int128 Wide;

inline Sequence makeSequence(std::vector<Instant> instants,
                             Anchor anchor = Anchor::Centre) {
  Sequence sequence;
  sequence.name = "test";
  sequence.phases.assign(instants.size(), Fraction(0));
  sequence.instants = std::move(instants);
  sequence.anchor = anchor;
  return sequence;
}

/// x_k = (k-1/2)/n (Carr-Purcell 1954, from memory).
inline std::vector<Instant> centred(int count) {
  std::vector<Instant> instants;
  for (int k = 1; k <= count; ++k)
    instants.push_back(Instant::at(Fraction::of(2 * k - 1, 2 * count)));
  return instants;
}

/// x_k = sin^2(pi k / (2n+2)) (Uhrig 2007, from memory).
inline std::vector<Instant> uhrig(int count) {
  std::vector<Instant> instants;
  for (int k = 1; k <= count; ++k)
    instants.push_back(
        Instant::at(std::pow(std::sin(M_PI * k / (2.0 * count + 2)), 2)));
  return instants;
}

/// Ideal starts and the imbalance of the sequence in units of 1 / scale tick.
struct Ideals {
  std::int64_t scale = 1;
  std::vector<std::int64_t> starts;
  Wide own = 0;
};

/// All instants exact: a scale that makes them whole. Otherwise what the header
/// promises: nearest 2^-20 tick as seen from the middle of the window, with
/// mirror images rounded to mirror images, and no imbalance below 2n of these.
inline Ideals idealStarts(const Sequence &sequence,
                          const std::vector<Ticks> &widths, Ticks length) {
  Ideals ideals;
  size_t count = widths.size();
  bool exact = true;
  std::int64_t scale = 2;
  for (const Instant &instant : sequence.instants) {
    exact &= instant.exact.has_value();
    if (exact)
      scale = std::lcm(scale, 2 * instant.exact->denominator());
  }
  ideals.scale = exact ? scale : std::int64_t(2) << 20;
  // Interval by interval, as the definition says; once more in floating point.
  Wide last = 0;
  double plainOwn = 0, plainLast = 0;
  int sign = 1;
  for (size_t i = 0; i != count; ++i) {
    const Instant &instant = sequence.instants[i];
    std::int64_t place;
    if (exact) {
      place = ideals.scale * length / instant.exact->denominator() *
              instant.exact->numerator();
      if (length * ideals.scale % instant.exact->denominator())
        ADD_FAILURE() << "scale is wrong";
    } else {
      size_t j = count - 1 - i;
      double x = instant.value, y = 1 - sequence.instants[j].value;
      // The earlier of two images decides for both.
      bool images = std::abs(x - y) < 1e-12;
      double inner = images ? (i <= j ? x : 1 - sequence.instants[j].value) : x;
      place = (length << 20) +
              2 * std::int64_t(
                      std::round((inner - 0.5) * double(length) * 1048576.0));
    }
    ideals.starts.push_back(place -
                            widths[i] * ideals.scale /
                                (sequence.anchor == Anchor::End ? 1 : 2));
    ideals.own += sign * (place - last);
    plainOwn += sign * (instant.value - plainLast);
    last = place;
    plainLast = instant.value;
    sign = -sign;
  }
  ideals.own += sign * (Wide(length) * ideals.scale - last);
  plainOwn += sign * (1 - plainLast);
  // In parts of 2^-20 tick.
  double parts = double(ideals.own) / double(ideals.scale) * 1048576;
  double rounding = exact ? 0 : double(count);
  EXPECT_NEAR(parts, plainOwn * double(length) * 1048576,
              rounding + 1e-9 * double(length) * 1048576);
  if (!exact && std::abs(parts) <= 2 * double(count))
    ideals.own = 0;
  return ideals;
}

/// How far a residual is from the imbalance of the sequence.
inline Wide missOf(const Ideals &ideals, Ticks residual) {
  Wide miss = Wide(residual) * ideals.scale - ideals.own;
  return miss < 0 ? -miss : miss;
}

inline Wide costOf(const Ideals &ideals, const std::vector<Ticks> &starts) {
  Wide cost = 0;
  for (size_t i = 0; i != starts.size(); ++i) {
    Wide miss = Wide(starts[i]) * ideals.scale - ideals.starts[i];
    cost += miss * miss;
  }
  return cost;
}

/// Interval by interval, as the definition says, in half ticks.
inline Ticks residualByIntervals(const std::vector<Ticks> &starts,
                                 const std::vector<Ticks> &widths,
                                 Ticks length) {
  Ticks sum = 0, last = 0, sign = 1;
  for (size_t i = 0; i != starts.size(); ++i) {
    Ticks flip = 2 * starts[i] + widths[i];
    sum += sign * (flip - last);
    last = flip;
    sign = -sign;
  }
  sum += sign * (2 * length - last);
  EXPECT_EQ(sum % 2, 0);
  return sum / 2;
}

inline bool isMirror(const std::vector<Ticks> &starts,
                     const std::vector<Ticks> &widths, Ticks length) {
  for (size_t i = 0, n = starts.size(); i != n; ++i)
    if (widths[i] != widths[n - 1 - i] ||
        starts[n - 1 - i] != length - widths[i] - starts[i])
      return false;
  return true;
}

/// Whatever the optimum, a placement must be one, and describe itself.
inline void checkPlacement(const Placement &placement, const Sequence &sequence,
                           const std::vector<Ticks> &widths,
                           const GridWindow &window) {
  const std::vector<Ticks> &starts = placement.starts;
  ASSERT_EQ(starts.size(), widths.size());
  Ticks free = 0;
  for (size_t i = 0; i != starts.size(); ++i) {
    EXPECT_EQ((window.start + starts[i]) % window.step, 0) << "pulse " << i;
    EXPECT_GE(starts[i], free) << "pulse " << i;
    free = starts[i] + widths[i] + window.leastGap;
  }
  if (!starts.empty())
    EXPECT_LE(starts.back() + widths.back(), window.length);
  EXPECT_EQ(placement.residual,
            residualByIntervals(starts, widths, window.length));
  EXPECT_EQ(placement.residual, residualOf(starts, widths, window.length));
  EXPECT_EQ(placement.mirror, isMirror(starts, widths, window.length));
  Ideals ideals = idealStarts(sequence, widths, window.length);
  double scale = double(ideals.scale);
  double cost = double(costOf(ideals, starts)) / scale / scale;
  EXPECT_NEAR(placement.displacement, cost, 1e-9 * (1 + cost));
}

struct Optimum {
  bool exists = false;
  /// From the residual to the imbalance.
  Wide miss = 0;
  Wide cost = 0;
  /// By Exhaustive only.
  bool mirror = false;
  std::vector<Ticks> starts;
  /// The earliest with the same miss and cost, mirror symmetric or not.
  std::vector<Ticks> earliest;
};

/// Every placement, one after the other.
class Exhaustive {
public:
  Exhaustive(const Sequence &sequence, const std::vector<Ticks> &widths,
             const GridWindow &window)
      : widths(widths), window(window),
        ideals(idealStarts(sequence, widths, window.length)) {}

  Optimum find() {
    place(0);
    return best;
  }

private:
  void place(Ticks from) {
    size_t index = starts.size();
    if (index == widths.size()) {
      Wide miss =
          missOf(ideals, residualByIntervals(starts, widths, window.length));
      bool mirror = isMirror(starts, widths, window.length);
      auto key = std::make_tuple(miss, costOf(ideals, starts), !mirror, starts);
      if (!best.exists || std::make_pair(miss, std::get<1>(key)) <
                              std::make_pair(best.miss, best.cost))
        best.earliest = starts; // The first of its kind, as they come in order.
      if (!best.exists || key < std::make_tuple(best.miss, best.cost,
                                                !best.mirror, best.starts))
        best = {true, miss, std::get<1>(key), mirror, starts, best.earliest};
      return;
    }
    for (Ticks start = from; start + widths[index] <= window.length; ++start) {
      if ((window.start + start) % window.step != 0)
        continue;
      starts.push_back(start);
      place(start + widths[index] + window.leastGap);
      starts.pop_back();
    }
  }

  const std::vector<Ticks> &widths;
  GridWindow window;
  Ideals ideals;
  std::vector<Ticks> starts;
  Optimum best;
};

/// The smallest miss, then the smallest cost, over all placements: the
/// least cost of the first k pulses with the k-th at or before a grid point,
/// for every alternating sum of starts.
inline Optimum byProgramming(const Sequence &sequence,
                             const std::vector<Ticks> &widths,
                             const GridWindow &window) {
  Ideals ideals = idealStarts(sequence, widths, window.length);
  Ticks first = 0;
  while ((window.start + first) % window.step != 0)
    ++first;
  int points = 0;
  while (first + points * window.step + widths.back() <= window.length)
    ++points;
  const Wide None = Wide(1) << 120;
  // Alternating sums of grid indices that do not decrease stay in +-points.
  auto at = [&](int point, int sum) {
    return size_t(point) * size_t(2 * points + 1) + size_t(sum + points);
  };
  std::vector<Wide> before, now;
  Ticks spacing = 0;
  for (size_t k = 0; k != widths.size(); ++k) {
    now.assign(at(points, 0), None);
    for (int point = 0; point < points; ++point) {
      Ticks start = first + point * window.step;
      Wide miss = Wide(start) * ideals.scale - ideals.starts[k];
      int own = k % 2 ? point : -point;
      for (int sum = -points; sum <= points; ++sum) {
        Wide &cell = now[at(point, sum)];
        if (k == 0) {
          if (sum == own)
            cell = miss * miss;
        } else if (point >= spacing && std::abs(sum - own) <= points) {
          Wide rest = before[at(point - int(spacing), sum - own)];
          if (rest < None)
            cell = rest + miss * miss;
        }
        if (point > 0 && k + 1 != widths.size())
          cell = std::min(cell, now[at(point - 1, sum)]);
      }
    }
    spacing = (widths[k] + window.leastGap + window.step - 1) / window.step;
    before.swap(now);
  }
  // -sum over k of (-1)^k (2 start_k + width_k) +- length.
  Ticks fixed = widths.size() % 2 ? -window.length : window.length;
  for (size_t k = 0; k != widths.size(); ++k)
    fixed += (k % 2 ? -1 : 1) * (2 * first + widths[k]);
  Optimum best;
  for (int point = 0; point < points; ++point)
    for (int sum = -points; sum <= points; ++sum) {
      Wide cost = before[at(point, sum)];
      if (cost == None)
        continue;
      Wide miss = missOf(ideals, fixed - 2 * window.step * sum);
      if (!best.exists || miss < best.miss ||
          (miss == best.miss && cost < best.cost))
        best = {true, miss, cost, false, {}, {}};
    }
  return best;
}

} // namespace reference
} // namespace lull

#endif // LULL_TEST_UNIT_SEQUENCE_PLACEMENTREFERENCE_H
