//===- GridSearch.cpp - Least squares on a grid -----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Why this is exact. Write z by its levels: U_t = {k : z_k > t}, t = 0..top-1.
// As z does not decrease, every U_t is a suffix of 1..n. The cost is a constant
// plus the sum over t of w_t(U_t), where an element k weighs
// unit (unit (2t+1) - 2 ideal_k): the levels choose their suffixes one by one,
// and since weights grow with t the best suffixes are nested by themselves. The
// alternating sum is (-1)^n times the number of levels whose suffix has an odd
// size. A multiplier lambda on the sum is the same as ideals
// ideal_k - lambda (-1)^k, so it keeps the levels independent. Where lambda
// makes options of a level equal, each level takes either, so every sum from
// the smallest to the largest is reached: there is no duality gap, and some
// lambda has the wanted sum among its optima. Those optima, restricted to the
// sum, are all optima of the constrained problem.
//
// For one lambda, the real problem is isotonic regression by pooling neighbours
// (Ayer and others 1955). All squares have the same weight, so the whole-number
// optima are its roundings: a run of equal values r goes to the nearest level,
// and if r = t + 1/2, any suffix of the run whose own mean is r may go up. Such
// a suffix changes the sum (by one) iff its size is odd. The lambda at which
// anything changes are sums of ideals and half units, hence whole numbers.
//
//===----------------------------------------------------------------------===//

#include "GridSearch.h"

#include <algorithm>

using namespace lull;

namespace {

/// `Wide` holds 8 n (largest ideal + unit * (top + 1)).
template <typename Wide> class Search {
public:
  explicit Search(const GridProblem &problem)
      : ideal(problem.ideal), unit(problem.unit), top(problem.top) {}

  GridLevels find(std::optional<std::int64_t> sum);

private:
  /// Neighbours with the same value in the real problem.
  struct Run {
    unsigned begin, end;
    /// Of the shifted ideals.
    Wide sum;
    /// Rounded, halves down.
    std::int64_t level = 0;
    /// How many elements at the end of the run may rise by one at no cost and
    /// change the alternating sum: the smallest such number, 0 if none.
    unsigned rising = 0;

    unsigned size() const { return end - begin; }
  };

  /// (-1)^k, counting from 1 as the formulas do.
  static int sign(unsigned index) { return index % 2 ? 1 : -1; }
  Wide shifted(unsigned index) const {
    return index % 2 ? ideal[index] - lambda : ideal[index] + lambda;
  }

  void solveAt(Wide multiplier);
  void round(Run &run);
  std::optional<Wide> guess(std::int64_t sum);
  GridLevels pick(std::int64_t sum) const;

  llvm::ArrayRef<std::int64_t> ideal;
  std::int64_t unit, top;

  Wide lambda = 0;
  llvm::SmallVector<Run, 16> runs;
  llvm::SmallVector<Wide, 16> steps;
  /// The alternating sum with all halves rounded down, and the smallest and
  /// largest over all optima at `lambda`.
  std::int64_t base = 0, least = 0, most = 0;
};

template <typename Wide> void Search<Wide>::solveAt(Wide multiplier) {
  lambda = multiplier;
  runs.clear();
  for (unsigned i = 0, e = ideal.size(); i != e; ++i) {
    Run run{i, i + 1, shifted(i)};
    while (!runs.empty()) {
      const Run &last = runs.back();
      if (Int128(last.sum) * run.size() < Int128(run.sum) * last.size())
        break;
      run.begin = last.begin;
      run.sum += last.sum;
      runs.pop_back();
    }
    runs.push_back(run);
  }
  base = least = most = 0;
  for (Run &run : runs) {
    round(run);
    // Odd runs alternate in sign, so partial sums stay within [-top, top].
    if (run.size() % 2)
      base += sign(run.begin) * run.level;
    if (run.rising)
      ++(sign(run.end - 1) > 0 ? most : least);
  }
  least = base - least;
  most = base + most;
}

template <typename Wide> void Search<Wide>::round(Run &run) {
  Wide period = Wide(2) * run.size() * unit;
  Wide numerator = 2 * run.sum - Wide(run.size()) * unit;
  // The level is numerator / period, rounded up; outside [0, top] it is not
  // even computed.
  if (numerator <= -period) {
    run.level = 0;
    return;
  }
  if (numerator > Wide(top - 1) * period) {
    run.level = top;
    return;
  }
  Wide quotient = numerator / period, rest = numerator % period;
  run.level = std::int64_t(quotient) + (rest > 0);
  if (rest != 0)
    return;
  Wide excess = 0;
  for (unsigned i = run.end; i-- != run.begin;) {
    excess += 2 * shifted(i) - (Wide(2) * run.level + 1) * unit;
    if (excess == 0 && (run.end - i) % 2) {
      run.rising = run.end - i;
      return;
    }
  }
}

/// A multiplier at which the sum may be the wanted one: exact as long as no run
/// is longer than one and none meets a bound on the way.
template <typename Wide>
std::optional<Wide> Search<Wide>::guess(std::int64_t sum) {
  bool up = sum > most;
  steps.clear();
  for (const Run &run : runs) {
    if (run.size() % 2 == 0)
      continue;
    Wide half = Wide(run.size()) * unit;
    if ((sign(run.begin) > 0) == up) {
      std::int64_t level = run.level + (run.rising != 0);
      if (level < top)
        steps.push_back((2 * Wide(level) + 1) * half / 2 - run.sum);
    } else if (run.level > 0) {
      steps.push_back(run.sum - (2 * Wide(run.level) - 1) * half / 2);
    }
  }
  if (steps.empty())
    return std::nullopt;
  std::int64_t missing = (up ? sum - most : least - sum) - 1;
  auto nth = steps.begin() + missing % std::int64_t(steps.size());
  std::nth_element(steps.begin(), nth, steps.end());
  Wide step = *nth + Wide(missing / std::int64_t(steps.size())) * unit;
  return up ? lambda - step : lambda + step;
}

/// The lexicographically smallest optimum at `lambda` with this sum: as few
/// rising ends as possible, the rightmost ones, each as short as possible.
template <typename Wide> GridLevels Search<Wide>::pick(std::int64_t sum) const {
  GridLevels levels(ideal.size());
  std::int64_t missing = sum - base;
  for (const Run &run : llvm::reverse(runs)) {
    unsigned rising = 0;
    if (missing != 0 && run.rising &&
        (sign(run.end - 1) > 0) == (missing > 0)) {
      rising = run.rising;
      missing -= sign(run.end - 1);
    }
    for (unsigned i = run.begin; i != run.end; ++i)
      levels[i] = run.level + (run.end - i <= rising);
  }
  return levels;
}

template <typename Wide>
GridLevels Search<Wide>::find(std::optional<std::int64_t> sum) {
  solveAt(0);
  if (!sum)
    return pick(base);
  std::int64_t largest = 0;
  for (std::int64_t value : ideal)
    largest = std::max(largest, value < 0 ? -value : value);
  // Beyond this nothing changes any more.
  Wide high = Wide(ideal.size()) * (largest + Wide(unit) * (top + 1));
  Wide low = -high;
  // The sum falls with lambda. Guesses mostly hit; bisection bounds the number
  // of rounds when they do not.
  for (bool bisect = false; *sum < least || *sum > most; bisect = !bisect) {
    if (*sum > most)
      high = lambda - 1;
    else
      low = lambda + 1;
    std::optional<Wide> next;
    if (!bisect)
      next = guess(*sum);
    if (!next || *next < low || *next > high)
      next = low + (high - low) / 2;
    solveAt(*next);
  }
  return pick(*sum);
}

} // namespace

GridLevels lull::searchGrid(const GridProblem &problem,
                            std::optional<std::int64_t> sum) {
  if (problem.top == 0)
    return GridLevels(problem.ideal.size(), 0);
  std::int64_t largest = 0;
  for (std::int64_t value : problem.ideal)
    largest = std::max(largest, value < 0 ? -value : value);
  Int128 size = Int128(8) * problem.ideal.size() *
                (largest + Int128(problem.unit) * (problem.top + 1));
  if (size < (Int128(1) << 62))
    return Search<std::int64_t>(problem).find(sum);
  return Search<Int128>(problem).find(sum);
}
