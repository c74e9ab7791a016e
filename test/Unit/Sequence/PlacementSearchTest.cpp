//===- PlacementSearchTest.cpp - Placement against slow search --*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "PlacementReference.h"

#include <random>

using namespace lull;
using namespace lull::reference;

namespace {

class Random {
public:
  explicit Random(unsigned seed) : engine(seed) {}
  /// From `low` to `high`, the same on every platform.
  std::int64_t operator()(std::int64_t low, std::int64_t high) {
    return low + std::int64_t(engine() % std::uint64_t(high - low + 1));
  }

private:
  std::mt19937_64 engine;
};

std::vector<Instant> randomInstants(Random &random, int count) {
  std::vector<Instant> instants;
  switch (random(0, 5)) {
  case 0:
    return centred(count);
  case 1:
    return uhrig(count);
  case 2: // trailing
    for (int k = 1; k <= count; ++k)
      instants.push_back(Instant::at(Fraction::of(k, count)));
    return instants;
  case 3: // coincident
    for (int k = 0; k != count; ++k)
      instants.push_back(Instant::at(Fraction::of(k / 2 * 2 + 1, count + 2)));
    return instants;
  case 4: { // anything exact
    std::vector<std::int64_t> parts;
    for (int k = 0; k != count; ++k)
      parts.push_back(random(0, 12));
    std::sort(parts.begin(), parts.end());
    for (std::int64_t part : parts)
      instants.push_back(Instant::at(Fraction::of(part, 12)));
    return instants;
  }
  default: { // anything
    std::vector<double> values;
    for (int k = 0; k != count; ++k)
      values.push_back(double(random(0, 1 << 30)) / double(1 << 30));
    std::sort(values.begin(), values.end());
    for (double value : values)
      instants.push_back(Instant::at(value));
    return instants;
  }
  }
}

std::vector<Ticks> randomWidths(Random &random, int count, Ticks most) {
  std::vector<Ticks> widths(count, random(0, most));
  switch (random(0, 3)) {
  case 0:
    for (Ticks &width : widths)
      width = random(0, most);
    break;
  case 1: // palindromic
    for (int k = 0; k != count; ++k)
      widths[k] = k < count - 1 - k ? random(0, most) : widths[count - 1 - k];
    for (int k = 0; k != count / 2; ++k)
      widths[count - 1 - k] = widths[k];
    break;
  default:
    break;
  }
  return widths;
}

/// All pulses on a grid of few points, so that all placements can be tried.
TEST(PlacementSearch, EqualsExhaustiveSearch) {
  Random random(20260101);
  unsigned placed = 0, refused = 0, mirrors = 0, notEarliest = 0,
           unbalanced = 0;
  for (unsigned round = 0; round != 12000; ++round) {
    int count = int(random(1, 6));
    Anchor anchor = random(0, 2) ? Anchor::Centre : Anchor::End;
    Sequence sequence = makeSequence(randomInstants(random, count), anchor);
    std::vector<Ticks> widths = randomWidths(random, count, random(0, 6));
    GridWindow window;
    window.step = random(1, 5);
    window.start = random(0, 3) ? random(0, 9) : 0;
    window.leastGap = random(0, 2) ? 0 : random(0, 5);
    Ticks least = leastWindow(widths, window);
    window.length = least - 1 + random(0, (count < 5 ? 16 : 9) * window.step);
    if (random(0, 3) == 0)
      window.length = 2 * window.step * (window.length / window.step / 2);
    SCOPED_TRACE(testing::Message()
                 << "round " << round << ", length " << window.length
                 << ", step " << window.step << ", start " << window.start);

    if (window.length < 0)
      continue;
    Optimum optimum = Exhaustive(sequence, widths, window).find();
    EXPECT_EQ(optimum.exists, window.length >= least);
    llvm::Expected<Placement> placement = place(sequence, widths, window);
    if (!placement) {
      llvm::consumeError(placement.takeError());
      EXPECT_FALSE(optimum.exists);
      ++refused;
      continue;
    }
    ASSERT_TRUE(optimum.exists);
    checkPlacement(*placement, sequence, widths, window);
    Ideals ideals = idealStarts(sequence, widths, window.length);
    EXPECT_TRUE(missOf(ideals, placement->residual) == optimum.miss);
    EXPECT_EQ(placement->mirror, optimum.mirror);
    EXPECT_EQ(placement->starts, optimum.starts);
    ++placed;
    unbalanced += ideals.own != 0;
    mirrors += optimum.mirror;
    notEarliest += optimum.earliest != optimum.starts;
    if (testing::Test::HasFailure())
      return;
  }
  // The cases must be of all kinds to mean anything.
  EXPECT_GT(placed, 8000u);
  EXPECT_GT(refused, 200u);
  EXPECT_GT(mirrors, 300u);
  EXPECT_GT(notEarliest, 20u);
  EXPECT_GT(unbalanced, 3000u);
  EXPECT_GT(placed - unbalanced, 3000u);
}

void comparePrograms(const Sequence &sequence, const std::vector<Ticks> &widths,
                     const GridWindow &window) {
  llvm::Expected<Placement> placement = place(sequence, widths, window);
  ASSERT_TRUE(bool(placement)) << llvm::toString(placement.takeError());
  checkPlacement(*placement, sequence, widths, window);
  Optimum optimum = byProgramming(sequence, widths, window);
  ASSERT_TRUE(optimum.exists);
  Ideals ideals = idealStarts(sequence, widths, window.length);
  EXPECT_TRUE(missOf(ideals, placement->residual) == optimum.miss);
  EXPECT_TRUE(costOf(ideals, placement->starts) == optimum.cost)
      << "cost is off by "
      << double(costOf(ideals, placement->starts) - optimum.cost) /
             double(ideals.scale) / double(ideals.scale);
}

/// The two references must agree before either is believed.
TEST(PlacementSearch, ReferencesAgree) {
  Random random(7);
  for (unsigned round = 0; round != 300; ++round) {
    int count = int(random(1, 5));
    Sequence sequence = makeSequence(randomInstants(random, count));
    std::vector<Ticks> widths = randomWidths(random, count, 5);
    GridWindow window;
    window.step = random(1, 4);
    window.start = random(0, 9);
    window.leastGap = random(0, 3);
    window.length = leastWindow(widths, window) + random(0, 8 * window.step);
    Optimum slow = Exhaustive(sequence, widths, window).find();
    Optimum optimum = byProgramming(sequence, widths, window);
    EXPECT_TRUE(slow.miss == optimum.miss) << "round " << round;
    EXPECT_TRUE(slow.cost == optimum.cost) << "round " << round;
  }
}

TEST(PlacementSearch, EqualsDynamicProgramming) {
  Random random(20260102);
  for (unsigned round = 0; round != 400; ++round) {
    int count = int(random(5, 12));
    Anchor anchor = random(0, 2) ? Anchor::Centre : Anchor::End;
    Sequence sequence = makeSequence(randomInstants(random, count), anchor);
    std::vector<Ticks> widths =
        randomWidths(random, count, random(0, 1) ? 40 : 9);
    GridWindow window;
    window.step = random(1, 16);
    window.start = random(0, 99);
    window.leastGap = random(0, 2) ? 0 : random(0, 20);
    window.length = leastWindow(widths, window) +
                    random(0, random(0, 1) ? 60 : 8) * window.step +
                    random(0, window.step - 1);
    SCOPED_TRACE(testing::Message() << "round " << round);
    comparePrograms(sequence, widths, window);
    if (testing::Test::HasFailure())
      return;
  }
}

/// Instants of concatenated decoupling (Khodjasteh and Lidar 2005, from
/// memory): C_l = C_{l-1} X C_{l-1} Y C_{l-1} X C_{l-1} Y, as parts of `whole`.
void concatenate(std::int64_t from, std::int64_t length, std::int64_t whole,
                 std::vector<Instant> &instants) {
  if (length == 1)
    return;
  std::int64_t share = length / 4;
  for (std::int64_t end = from + share; end <= from + length; end += share) {
    concatenate(end - share, share, whole, instants);
    instants.push_back(Instant::at(Fraction::of(end, whole)));
  }
}

TEST(PlacementSearch, CoincidentPulsesInTightWindows) {
  for (unsigned level : {2u, 3u}) {
    std::vector<Instant> instants;
    std::int64_t parts = std::int64_t(1) << (2 * level);
    concatenate(0, parts, parts, instants);
    Sequence sequence = makeSequence(instants, Anchor::End);
    ASSERT_EQ(sequence.size(), level == 2 ? 20u : 84u);
    std::vector<Ticks> widths(sequence.size(), 7);
    for (Ticks slack : {0, 1, 5, 20, 77, 200}) {
      GridWindow window;
      window.step = 4;
      window.start = 3;
      window.length = leastWindow(widths, window) + slack;
      SCOPED_TRACE(testing::Message()
                   << "level " << level << ", slack " << slack);
      comparePrograms(sequence, widths, window);
    }
  }
}

/// Blocks nested as in quadratic decoupling (West, Fong and Lidar 2010, from
/// memory), and Uhrig's, where neighbours near the ends collide.
TEST(PlacementSearch, CrowdedEnds) {
  std::vector<Instant> nested;
  std::vector<Instant> outer = uhrig(4);
  double from = 0;
  for (int block = 0; block != 5; ++block) {
    double to = block == 4 ? 1 : outer[block].value;
    for (const Instant &inner : uhrig(4))
      nested.push_back(Instant::at(from + (to - from) * inner.value));
    if (block != 4)
      nested.push_back(outer[block]);
    from = to;
  }
  for (const Sequence &sequence :
       {makeSequence(nested), makeSequence(uhrig(20)), makeSequence(uhrig(21))})
    for (Ticks step : {1, 3, 8})
      for (Ticks slack : {0, 3, 16, 50, 150, 400}) {
        std::vector<Ticks> widths(sequence.size(), 10);
        GridWindow window;
        window.step = step;
        window.start = 5;
        window.leastGap = 1;
        window.length = leastWindow(widths, window) + slack;
        SCOPED_TRACE(testing::Message() << sequence.size() << " pulses, slack "
                                        << slack << ", step " << step);
        comparePrograms(sequence, widths, window);
      }
}

/// Where pulses are far apart the optimum is known: round each, then move those
/// that lose least by it, one grid step each, until the residual is smallest.
TEST(PlacementSearch, EqualsGreedyMovesWhereThereIsRoom) {
  Random random(99);
  for (int count : {8, 100, 1000, 9999, 10000}) {
    Sequence sequence = makeSequence(centred(count));
    std::vector<Ticks> widths(count, 36);
    GridWindow window;
    window.step = 16;
    window.start = 7;
    window.length = 200 * count + random(0, 199);
    llvm::Expected<Placement> placement = place(sequence, widths, window);
    ASSERT_TRUE(bool(placement)) << llvm::toString(placement.takeError());
    checkPlacement(*placement, sequence, widths, window);

    Ideals ideals = idealStarts(sequence, widths, window.length);
    std::vector<Ticks> starts;
    std::multimap<Wide, size_t> up, down;
    for (int k = 0; k != count; ++k) {
      Ticks best = -1;
      auto miss = [&](Ticks start) {
        Wide miss = Wide(start) * ideals.scale - ideals.starts[k];
        return miss * miss;
      };
      for (Ticks start = 9 + 200 * k / 16 * 16; start < 200 * k + 320;
           start += 16)
        if (best < 0 || miss(start) < miss(best))
          best = start;
      starts.push_back(best);
      // Moving an odd pulse (the first, the third) later adds to the residual.
      (k % 2 ? down : up).emplace(miss(best + 16) - miss(best), k);
      (k % 2 ? up : down).emplace(miss(best - 16) - miss(best), k);
    }
    Ticks residual = residualByIntervals(starts, widths, window.length);
    Wide rounded = costOf(ideals, starts);
    Optimum best;
    for (int moves = -count / 2; moves <= count / 2; ++moves) {
      Wide moved = missOf(ideals, residual + 32 * moves);
      Wide cost = rounded;
      auto &order = moves < 0 ? down : up;
      auto next = order.begin();
      for (int i = 0; i != std::abs(moves); ++i)
        cost += (next++)->first;
      if (!best.exists || moved < best.miss ||
          (moved == best.miss && cost < best.cost))
        best = {true, moved, cost, false, {}, {}};
    }
    EXPECT_TRUE(missOf(ideals, placement->residual) == best.miss) << count;
    EXPECT_TRUE(costOf(ideals, placement->starts) == best.cost) << count;
  }
}

} // namespace
