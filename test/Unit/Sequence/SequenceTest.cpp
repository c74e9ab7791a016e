//===- SequenceTest.cpp - Tests of repeats and spelling -------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "NamedSequence.h"

#include <cstdint>
#include <limits>

using namespace lull;
using namespace lull::test;

namespace {

Sequence pair() {
  return {"pair",
          {0, over(1, 2)},
          {Instant::at(over(1, 4)), Instant::at(0.7)},
          Anchor::Centre};
}

TEST(SequenceTest, SpellsPhases) {
  EXPECT_EQ(spellPhase(0), "X");
  EXPECT_EQ(spellPhase(over(1, 2)), "Y");
  EXPECT_EQ(spellPhase(1), "-X");
  EXPECT_EQ(spellPhase(over(3, 2)), "-Y");
  EXPECT_EQ(spellPhase(over(2, 3)), "2/3");
  EXPECT_EQ(spellPhase(over(1, 4)), "1/4");
}

TEST(SequenceTest, SpellsWords) {
  EXPECT_EQ(spellWord(pair()), "X Y");
  EXPECT_EQ(spellWord({"", {1, over(5, 3), over(3, 2)}, {}, {}}), "-X 5/3 -Y");
  EXPECT_EQ(spellWord({}), "");
}

TEST(SequenceTest, RepeatsInEqualShares) {
  llvm::Expected<Sequence> thrice = repeat(pair(), 3);
  ASSERT_TRUE(bool(thrice));
  EXPECT_EQ(thrice->name, "pair x3");
  EXPECT_EQ(spellWord(*thrice), "X Y X Y X Y");
  EXPECT_EQ(thrice->anchor, Anchor::Centre);
  ASSERT_EQ(thrice->instants.size(), 6u);
  EXPECT_EQ(thrice->instants[0].exact, over(1, 12));
  EXPECT_EQ(thrice->instants[2].exact, over(5, 12));
  EXPECT_EQ(thrice->instants[4].exact, over(3, 4));
  EXPECT_DOUBLE_EQ(thrice->instants[4].value, 0.75);
  // What is not exact stays so, at (k + x)/3.
  for (unsigned k = 0; k < 3; ++k) {
    EXPECT_FALSE(thrice->instants[2 * k + 1].exact);
    EXPECT_DOUBLE_EQ(thrice->instants[2 * k + 1].value, (k + 0.7) / 3);
  }
}

TEST(SequenceTest, ReversesTheAxesOfEverySecondRepeat) {
  llvm::Expected<Sequence> thrice = repeat(pair(), 3, /*alternateSigns=*/true);
  ASSERT_TRUE(bool(thrice));
  EXPECT_EQ(thrice->name, "pair x3 alternating");
  EXPECT_EQ(spellWord(*thrice), "X Y -X -Y X Y");

  Sequence others{"others",
                  {over(3, 2), over(5, 3), over(1, 3)},
                  {Instant::at(over(1, 4)), Instant::at(over(1, 2)),
                   Instant::at(over(3, 4))},
                  Anchor::Centre};
  llvm::Expected<Sequence> twice = repeat(others, 2, /*alternateSigns=*/true);
  ASSERT_TRUE(bool(twice));
  EXPECT_EQ(spellWord(*twice), "-Y 5/3 1/3 Y 2/3 4/3");
}

TEST(SequenceTest, RepeatingOnceChangesNothing) {
  llvm::Expected<Sequence> once = repeat(pair(), 1, /*alternateSigns=*/true);
  ASSERT_TRUE(bool(once));
  EXPECT_EQ(once->name, "pair");
  EXPECT_EQ(spellWord(*once), "X Y");
  EXPECT_EQ(once->instants[0].exact, over(1, 4));
}

TEST(SequenceTest, RepeatsKeepAPulseAtTheEndOfTheWindow) {
  llvm::Expected<Sequence> edd = findSequence("edd");
  ASSERT_TRUE(bool(edd));
  llvm::Expected<Sequence> twice = repeat(*edd, 2);
  ASSERT_TRUE(bool(twice));
  EXPECT_EQ(twice->anchor, Anchor::End);
  EXPECT_EQ(twice->instants[7].exact, over(1, 2));
  EXPECT_EQ(twice->instants[15].exact, Fraction(1));
  EXPECT_EQ(anchorOf(twice->instants), Anchor::End);
}

/// Gullion, Baker and Conradi 1990 build XY16 so, from memory.
TEST(SequenceTest, Xy16IsXy8WithAlternateSigns) {
  llvm::Expected<Sequence> xy8 = findSequence("xy8");
  llvm::Expected<Sequence> xy16 = findSequence("xy16");
  ASSERT_TRUE(bool(xy8));
  ASSERT_TRUE(bool(xy16));
  llvm::Expected<Sequence> twice = repeat(*xy8, 2, /*alternateSigns=*/true);
  ASSERT_TRUE(bool(twice));
  EXPECT_EQ(twice->phases, xy16->phases);
  for (size_t i = 0; i < 16; ++i)
    EXPECT_EQ(twice->instants[i].exact, xy16->instants[i].exact) << i;
}

TEST(SequenceTest, RefusesBadRepeats) {
  llvm::Expected<Sequence> none = repeat(pair(), 0);
  ASSERT_FALSE(bool(none));
  EXPECT_EQ(llvm::toString(none.takeError()),
            "'pair' is repeated 0 times when it should be at least once");

  llvm::Expected<Sequence> most = repeat(pair(), MostPulses / 2);
  ASSERT_TRUE(bool(most));
  EXPECT_EQ(most->size(), MostPulses);
  llvm::Expected<Sequence> more = repeat(pair(), MostPulses / 2 + 1);
  ASSERT_FALSE(bool(more));
  EXPECT_EQ(llvm::toString(more.takeError()),
            "2 pulses of 'pair', 5001 times, are more than 10000");
  llvm::Expected<Sequence> singles = repeat(named("hahn"), MostPulses + 1);
  ASSERT_FALSE(bool(singles));
  llvm::consumeError(singles.takeError());
  llvm::Expected<Sequence> huge =
      repeat(pair(), std::numeric_limits<unsigned>::max());
  ASSERT_FALSE(bool(huge));
  llvm::consumeError(huge.takeError());
}

TEST(SequenceTest, RefusesInstantsAndPhasesBeyond64Bits) {
  constexpr std::int64_t big = std::numeric_limits<std::int64_t>::max();
  Sequence late{"late", {0}, {Instant::at(over(big - 1, big))}, Anchor::Centre};
  llvm::Expected<Sequence> twice = repeat(late, 2);
  ASSERT_FALSE(bool(twice));
  EXPECT_NE(llvm::toString(twice.takeError()).find("does not fit 64 bits"),
            std::string::npos);

  Sequence odd{
      "odd", {over(big - 1, big)}, {Instant::at(over(1, 2))}, Anchor::Centre};
  ASSERT_TRUE(bool(repeat(odd, 2)));
  llvm::Expected<Sequence> turned = repeat(odd, 2, /*alternateSigns=*/true);
  ASSERT_FALSE(bool(turned));
  EXPECT_NE(llvm::toString(turned.takeError()).find("does not fit 64 bits"),
            std::string::npos);
}

} // namespace
