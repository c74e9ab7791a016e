//===- PlacementTest.cpp - Pulses on the clock grid -------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "PlacementReference.h"

#include <limits>

using namespace lull;
using namespace lull::reference;

namespace {

constexpr Ticks Largest = std::numeric_limits<Ticks>::max();

GridWindow makeWindow(Ticks length, Ticks step, Ticks start = 0,
                      Ticks gap = 0) {
  GridWindow window;
  window.start = start;
  window.length = length;
  window.step = step;
  window.leastGap = gap;
  return window;
}

Placement mustPlace(const Sequence &sequence, const std::vector<Ticks> &widths,
                    const GridWindow &window) {
  llvm::Expected<Placement> placement = place(sequence, widths, window);
  if (!placement) {
    ADD_FAILURE() << llvm::toString(placement.takeError());
    return {};
  }
  checkPlacement(*placement, sequence, widths, window);
  return *placement;
}

Placement mustPlace(const std::vector<Instant> &instants, Ticks width,
                    const GridWindow &window) {
  return mustPlace(makeSequence(instants),
                   std::vector<Ticks>(instants.size(), width), window);
}

std::string errorOf(const Sequence &sequence, const std::vector<Ticks> &widths,
                    const GridWindow &window) {
  llvm::Expected<Placement> placement = place(sequence, widths, window);
  if (placement)
    return "no error";
  return llvm::toString(placement.takeError());
}

using Starts = std::vector<Ticks>;

/// Computed by hand: the ideal starts are on the grid.
TEST(Placement, IdealOnTheGrid) {
  Placement cpmg = mustPlace(centred(2), 32, makeWindow(1024, 8));
  EXPECT_EQ(cpmg.starts, (Starts{240, 752}));
  EXPECT_EQ(cpmg.residual, 0);
  EXPECT_EQ(cpmg.displacement, 0);
  EXPECT_TRUE(cpmg.mirror);

  Placement eight = mustPlace(centred(8), 32, makeWindow(1024, 16));
  EXPECT_EQ(eight.starts, (Starts{48, 176, 304, 432, 560, 688, 816, 944}));
  EXPECT_EQ(eight.residual, 0);
  EXPECT_EQ(eight.displacement, 0);
  EXPECT_TRUE(eight.mirror);
}

/// Computed by hand: ideal starts 146 2/3, 480 and 813 1/3.
TEST(Placement, OddNumber) {
  Placement placement = mustPlace(centred(3), 40, makeWindow(1000, 4));
  EXPECT_EQ(placement.starts, (Starts{148, 480, 812}));
  EXPECT_EQ(placement.residual, 0);
  EXPECT_NEAR(placement.displacement, 32. / 9, 1e-12);
  EXPECT_TRUE(placement.mirror);

  // The middle of the window is off the grid of a pulse of 36: starts s must
  // have s_1 - s_2 + s_3 = 482 for a zero residual, but are multiples of 4.
  // From 148 2/3, 482 and 815 1/3 the residuals 4 (by 480) and -4 (by 484) cost
  // the same moves; the earlier pulses are taken.
  Placement off = mustPlace(centred(3), 36, makeWindow(1000, 4));
  EXPECT_EQ(off.residual, 4);
  EXPECT_EQ(off.starts, (Starts{148, 480, 816}));
}

/// For an even number of equal pulses the switching function is -1 on intervals
/// whose length is a multiple of the step, so the least |residual| is
/// |T - 2 g round(T / 2g)|.
TEST(Placement, LeastResidualOfEvenNumbers) {
  for (int count : {2, 4}) {
    Placement placement = mustPlace(centred(count), 36, makeWindow(1000, 16));
    EXPECT_EQ(std::abs(placement.residual), 8);
  }
  for (int count : {2, 4, 8, 20})
    for (Ticks length = 990; length != 1060; ++length) {
      Placement placement =
          mustPlace(centred(count), 20, makeWindow(length, 16, length));
      Ticks rest = length % 32;
      EXPECT_EQ(std::abs(placement.residual), std::min(rest, 32 - rest))
          << count << " pulses, length " << length;
    }
}

/// Ideal starts 232 and 732 on a grid of 16 (by hand): 224 or 240, 736 or 720;
/// a residual of +-8 needs a distance of 496 or 504, that is 496. Of 240, 736
/// (displacements 8, 4) and 224, 720 (-8, -12) the former is nearer.
TEST(Placement, ResidualComesFirst) {
  Placement placement = mustPlace(centred(2), 36, makeWindow(1000, 16));
  EXPECT_EQ(placement.starts, (Starts{240, 736}));
  EXPECT_EQ(placement.residual, 8);
  EXPECT_EQ(placement.displacement, 64 + 16);
  EXPECT_FALSE(placement.mirror);
}

/// The rounded Uhrig instants are balanced already in these two windows.
TEST(Placement, Uhrig) {
  Placement four = mustPlace(uhrig(4), 32, makeWindow(1024, 16));
  EXPECT_EQ(four.starts, (Starts{80, 336, 656, 912}));
  EXPECT_EQ(four.residual, 0);
  EXPECT_TRUE(four.mirror);
  Placement six = mustPlace(uhrig(6), 32, makeWindow(2048, 16));
  EXPECT_EQ(six.starts, (Starts{80, 368, 784, 1232, 1648, 1936}));
  EXPECT_EQ(six.residual, 0);
  EXPECT_TRUE(six.mirror);
}

/// An odd number of pulses that are mirror images of each other has a residual
/// of zero whatever the rounding, so it is always reached if the middle one can
/// sit in the middle.
TEST(Placement, OddNumbersInTheMiddleAreBalanced) {
  for (int count : {1, 3, 5, 7, 21})
    for (Ticks length = 1040; length < 1400; length += 8) {
      // The middle pulse starts at (length - 32) / 2, a multiple of 4.
      for (bool irrational : {false, true}) {
        Placement placement =
            mustPlace(irrational ? uhrig(count) : centred(count), 32,
                      makeWindow(length, 4));
        EXPECT_EQ(placement.residual, 0) << count << ", " << length;
        EXPECT_TRUE(placement.mirror) << count << ", " << length;
      }
    }
}

/// By hand: one pulse in the middle of two grid points takes the earlier,
/// though the residuals are opposite. Two pulses of ideal starts 22 and 66,
/// each in the middle of two grid points, must be 44 apart: 20, 64 and 24, 68
/// are equally good, and neither is its own mirror image.
TEST(Placement, TiesGoToTheEarliest) {
  EXPECT_EQ(mustPlace(centred(1), 10, makeWindow(34, 8)).starts, (Starts{8}));
  Placement two = mustPlace(
      {Instant::at(Fraction::of(1, 4)), Instant::at(Fraction::of(3, 4))}, 0,
      makeWindow(88, 4, 0));
  EXPECT_EQ(two.starts, (Starts{20, 64}));
}

/// The grid is that of the device, not of the window.
TEST(Placement, AbsoluteGrid) {
  Placement placement = mustPlace(centred(2), 32, makeWindow(1024, 16, 5));
  EXPECT_EQ(placement.starts, (Starts{235, 747}));
  EXPECT_EQ(mustPlace(centred(2), 32, makeWindow(1024, 16, -11)).starts,
            placement.starts);
}

TEST(Placement, Ends) {
  std::vector<Instant> trailing;
  for (int k = 1; k <= 4; ++k)
    trailing.push_back(Instant::at(Fraction::of(k, 4)));
  Placement placement = mustPlace(makeSequence(trailing, Anchor::End),
                                  {32, 32, 32, 32}, makeWindow(1024, 16));
  EXPECT_EQ(placement.starts, (Starts{224, 480, 736, 992}));
  EXPECT_EQ(placement.residual, 0);
  EXPECT_EQ(placement.displacement, 0);
}

TEST(Placement, Nothing) {
  Placement placement = mustPlace(makeSequence({}), {}, makeWindow(10, 4, 3));
  EXPECT_TRUE(placement.starts.empty());
  EXPECT_EQ(placement.residual, 10);
  EXPECT_TRUE(placement.mirror);
}

TEST(Placement, LeastWindow) {
  EXPECT_EQ(leastWindow({}, makeWindow(0, 8, 3)), 0);
  EXPECT_EQ(leastWindow({30}, makeWindow(0, 8, 3)), 35);
  EXPECT_EQ(leastWindow({30}, makeWindow(0, 8, -3)), 33);
  EXPECT_EQ(leastWindow({160, 160, 160, 160}, makeWindow(0, 8)), 640);
  // 0, 32 (30 + 3 is 33, so 40), 40 + 33 is 73, so 80.
  EXPECT_EQ(leastWindow({30, 30, 30}, makeWindow(0, 8, 0, 3)), 110);
  EXPECT_EQ(leastWindow({Largest, 1}, makeWindow(0, 1)), Largest);
  EXPECT_EQ(leastWindow({1, 1}, makeWindow(0, 1, 0, Largest)), Largest);
  EXPECT_EQ(leastWindow({1, 1}, makeWindow(0, Largest, 1)), Largest);
}

TEST(Placement, TightestWindow) {
  std::vector<Ticks> widths(5, 30);
  GridWindow window = makeWindow(0, 8, 3, 3);
  window.length = leastWindow(widths, window);
  Placement placement = mustPlace(makeSequence(uhrig(5)), widths, window);
  EXPECT_EQ(placement.starts, (Starts{5, 45, 85, 125, 165}));
  --window.length;
  EXPECT_NE(errorOf(makeSequence(uhrig(5)), widths, window), "no error");
}

TEST(Placement, LongWindows) {
  // Exact up to 2^53 ticks: these ideal starts are on the grid.
  Ticks length = Ticks(1) << 50;
  Placement placement = mustPlace(centred(2), 32, makeWindow(length, 16));
  EXPECT_EQ(placement.starts, (Starts{length / 4 - 16, length / 4 * 3 - 16}));
  EXPECT_EQ(placement.displacement, 0);
  // Mirror images stay so even where a double is coarser than a tick.
  std::vector<Ticks> widths(20, 32);
  GridWindow window = makeWindow(length * 8, 1);
  llvm::Expected<Placement> long20 =
      place(makeSequence(uhrig(20)), widths, window);
  ASSERT_TRUE(bool(long20)) << llvm::toString(long20.takeError());
  EXPECT_TRUE(long20->mirror);
  EXPECT_EQ(residualByIntervals(long20->starts, widths, window.length), 0);
}

TEST(Placement, Errors) {
  Sequence four = makeSequence(centred(4));
  EXPECT_EQ(errorOf(four, {160, 160, 160, 160}, makeWindow(500, 8)),
            "window of 500 dt is too short: 4 pulses need 640 dt on a grid of "
            "8 dt");
  EXPECT_EQ(errorOf(makeSequence(centred(1)), {30}, makeWindow(34, 8, 3)),
            "window of 34 dt is too short: 1 pulse needs 35 dt on a grid of 8 "
            "dt");
  EXPECT_EQ(errorOf(four, {Largest, 1, 1, 1}, makeWindow(500, 8)),
            "window of 500 dt is too short: 4 pulses need more than "
            "9223372036854775807 dt on a grid of 8 dt");
  EXPECT_EQ(errorOf(four, {1, 1, 1}, makeWindow(500, 8)),
            "got 3 pulse widths when sequence 'test' has 4 pulses");
  EXPECT_EQ(errorOf(four, {1, 1, -1, 1}, makeWindow(500, 8)),
            "width of pulse 3 is -1 dt when it should not be negative");
  EXPECT_EQ(errorOf(four, {1, 1, 1, 1}, makeWindow(500, 0)),
            "grid step is 0 dt when it should be at least 1 dt");
  EXPECT_EQ(errorOf(four, {1, 1, 1, 1}, makeWindow(500, 1, 0, -2)),
            "least gap is -2 dt when it should not be negative");
  EXPECT_EQ(errorOf(four, {1, 1, 1, 1}, makeWindow(-5, 1)),
            "window is -5 dt long when it should not be negative");
  EXPECT_EQ(errorOf(four, {1, 1, 1, 1}, makeWindow(Largest, 1)),
            "window of 9223372036854775807 dt is too long: pulses are placed "
            "in windows of at most 9007199254740992 dt");
  EXPECT_EQ(errorOf(makeSequence({Instant::at(1.5)}), {1}, makeWindow(9, 1)),
            "instant 1 is 1.5 when it should be between 0 and 1");
  EXPECT_EQ(
      errorOf(makeSequence({Instant::at(std::nan(""))}), {1}, makeWindow(9, 1)),
      "instant 1 is nan when it should be between 0 and 1");
  EXPECT_EQ(errorOf(makeSequence({Instant::at(0.5), Instant::at(0.25)}), {1, 1},
                    makeWindow(9, 1)),
            "instant 2 is 0.25 when it should not be before 0.5");
  Sequence uneven = four;
  uneven.phases.pop_back();
  EXPECT_EQ(errorOf(uneven, {1, 1, 1, 1}, makeWindow(500, 1)),
            "sequence 'test' has 3 phases and 4 instants");
}

} // namespace
