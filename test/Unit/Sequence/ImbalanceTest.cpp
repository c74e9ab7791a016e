//===- ImbalanceTest.cpp - Sequences that are not balanced ----------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// A sequence keeps the balance of its instants. Expected numbers are worked out
// by hand from the definition of the switching function.
//
//===----------------------------------------------------------------------===//

#include "NamedSequence.h"
#include "PlacementReference.h"

#include "lull/Sequence/Net.h"

using namespace lull;
using namespace lull::reference;
using namespace lull::test;

namespace {

using Starts = std::vector<Ticks>;

Placement mustPlace(const Sequence &sequence, Ticks width, Ticks length,
                    Ticks step) {
  GridWindow window;
  window.length = length;
  window.step = step;
  std::vector<Ticks> widths(sequence.size(), width);
  llvm::Expected<Placement> placement = place(sequence, widths, window);
  if (!placement) {
    ADD_FAILURE() << llvm::toString(placement.takeError());
    return {};
  }
  return *placement;
}

Sequence atFractions(const std::vector<Fraction> &instants) {
  std::vector<Instant> made;
  for (Fraction instant : instants)
    made.push_back(Instant::at(instant));
  return makeSequence(made);
}

/// Minus lasts from 400 to 800 of 1200. Odd widths put both ideal starts half a
/// tick off the grid, the same way, so the earlier pair is taken.
TEST(Imbalance, Pdd2IsNotCpmg2) {
  Sequence pdd = named("pdd-2");
  for (Ticks width = 0; width <= 40; ++width) {
    Placement placement = mustPlace(pdd, width, 1200, 1);
    Ticks before = (width + 1) / 2;
    EXPECT_EQ(placement.starts, (Starts{400 - before, 800 - before})) << width;
    EXPECT_EQ(placement.residual, 400) << width;
    EXPECT_EQ(placement.displacement, width % 2 ? 0.5 : 0) << width;
    EXPECT_EQ(placement.mirror, width % 2 == 0) << width;
  }
  EXPECT_EQ(mustPlace(named("cpmg-2"), 20, 1200, 1).starts, (Starts{290, 890}));
}

/// On a grid of g the two are a multiple of g apart, the nearest to 400.
TEST(Imbalance, Pdd2OnCoarseGrids) {
  Sequence pdd = named("pdd-2");
  for (Ticks step : {2, 4, 7, 8, 16, 25, 32, 48})
    for (Ticks width = 0; width <= 40; ++width) {
      Placement placement = mustPlace(pdd, width, 1200, step);
      Ticks rest = 400 % step, off = std::min(rest, step - rest);
      EXPECT_EQ(std::abs(placement.residual - 400), 2 * off)
          << "width " << width << ", step " << step;
      ASSERT_EQ(placement.starts.size(), 2u);
      for (size_t k : {0, 1})
        EXPECT_LE(
            std::abs(2 * placement.starts[k] + width - 800 * (Ticks(k) + 1)),
            2 * step)
            << "width " << width << ", step " << step;
    }
}

/// On a grid of 32 the distances 384 and 416 are equally far from 400. 416, 800
/// and 384, 800 are displaced by 16 once, all others by more.
TEST(Imbalance, TiesOnEitherSide) {
  Placement placement = mustPlace(named("pdd-2"), 0, 1200, 32);
  EXPECT_EQ(placement.starts, (Starts{384, 800}));
  EXPECT_EQ(placement.residual, 368);
  EXPECT_EQ(placement.displacement, 256);
}

TEST(Imbalance, OthersOnTheGrid) {
  Placement pdd = mustPlace(named("pdd-4"), 10, 1000, 5);
  EXPECT_EQ(pdd.starts, (Starts{195, 395, 595, 795}));
  EXPECT_EQ(pdd.residual, 200);
  EXPECT_EQ(pdd.displacement, 0);

  Placement early =
      mustPlace(atFractions({over(1, 10), over(1, 5)}), 20, 1000, 10);
  EXPECT_EQ(early.starts, (Starts{90, 190}));
  EXPECT_EQ(early.residual, 800);
  EXPECT_EQ(early.displacement, 0);

  // An odd number: 250 of plus, 750 of minus.
  Placement one = mustPlace(atFractions({over(1, 4)}), 20, 1000, 20);
  EXPECT_EQ(one.starts, (Starts{240}));
  EXPECT_EQ(one.residual, -500);
}

/// Pulses of different widths by their ends have centres that are off by half
/// of the difference. That is repaired, the imbalance is not: the instants
/// leave 200 - 200 + 400 - 200.
TEST(Imbalance, ByTheInstantsNotByTheWidths) {
  Sequence sequence =
      atFractions({over(1, 5), over(2, 5), over(4, 5), Fraction(1)});
  sequence.anchor = Anchor::End;
  GridWindow window;
  window.length = 1000;
  std::vector<Ticks> widths = {20, 40, 20, 40};
  llvm::Expected<Placement> placement = place(sequence, widths, window);
  ASSERT_TRUE(bool(placement)) << llvm::toString(placement.takeError());
  EXPECT_EQ(placement->residual, 200);
  checkPlacement(*placement, sequence, widths, window);
}

/// The second sequence has no small common denominator, so that it is rounded.
/// Residuals are even.
TEST(Imbalance, LongWindows) {
  for (int bits : {20, 33, 40, 53}) {
    Ticks length = Ticks(1) << bits;
    Sequence odd = atFractions({over(333333, 1000000), over(666667, 1000003)});
    for (const Sequence &sequence : {named("pdd-2"), odd}) {
      Placement placement = mustPlace(sequence, 10, length, 1);
      double own =
          double(length) *
          (1 - 2 * (sequence.instants[1].value - sequence.instants[0].value));
      EXPECT_NEAR(double(placement.residual), own, 1 + 1e-15 * double(length))
          << bits;
    }
  }
}

/// The sum of + and - intervals in a window of length 1.
double imbalance(const Sequence &sequence) {
  double sum = 0, last = 0;
  int sign = 1;
  for (const Instant &instant : sequence.instants) {
    sum += sign * (instant.value - last);
    last = instant.value;
    sign = -sign;
  }
  return sum + sign * (1 - last);
}

/// The same of exact instants.
Fraction exactImbalance(const Sequence &sequence) {
  std::optional<Fraction> sum = Fraction(0);
  Fraction last = 0;
  bool plus = true;
  auto add = [&](Fraction end) {
    std::optional<Fraction> interval = end.minus(last);
    if (sum && interval)
      sum = plus ? sum->plus(*interval) : sum->minus(*interval);
    else
      sum = std::nullopt;
    last = end;
    plus = !plus;
  };
  for (Fraction instant : exactInstants(sequence))
    add(instant);
  add(1);
  EXPECT_TRUE(sum) << sequence.name << " needs more than 64 bits";
  return sum.value_or(-1);
}

TEST(Imbalance, OfTheCatalogue) {
  unsigned exact = 0, irrational = 0, unbalanced = 0;
  for (const Family &family : catalogue())
    for (llvm::StringRef name : family.examples) {
      Sequence sequence = named(name);
      bool isUnbalanced = family.stem == "pdd" && sequence.size() % 2 == 0;
      // Of n + 1 equal intervals one is left.
      Fraction expected =
          isUnbalanced ? over(1, std::int64_t(sequence.size()) + 1) : 0;
      unbalanced += isUnbalanced;
      EXPECT_NEAR(imbalance(sequence), expected.toDouble(), 1e-13)
          << name.str();
      if (llvm::all_of(sequence.instants,
                       [](const Instant &i) { return i.exact.has_value(); })) {
        EXPECT_EQ(exactImbalance(sequence), expected) << name.str();
        ++exact;
      } else {
        ++irrational;
      }
    }
  EXPECT_GT(exact, 25u);
  EXPECT_GT(irrational, 5u);
  EXPECT_EQ(unbalanced, 2u);
}

/// An even number of equal pulses in an even window: the residual is even, so
/// any error of rounding that were taken for an imbalance would show.
TEST(Imbalance, BalancedOnesStaySo) {
  std::vector<std::string> names = {"udd-1001", "udd-10000", "qdd-98-100"};
  for (const Family &family : catalogue())
    for (llvm::StringRef name : family.examples)
      if (name != "pdd-2" && name != "pdd-4")
        names.push_back(name.str());
  for (const std::string &name : names) {
    llvm::Expected<Sequence> sequence = close(named(name));
    ASSERT_TRUE(bool(sequence)) << llvm::toString(sequence.takeError());
    for (int bits : {20, 33, 34, 40, 53})
      EXPECT_EQ(mustPlace(*sequence, 10, Ticks(1) << bits, 1).residual, 0)
          << name << " in 2^" << bits;
  }
}

} // namespace
