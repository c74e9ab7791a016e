//===- PublishedTest.cpp - Tests of words and instants --------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Words, phases and instants against the papers named, from memory of them, or
// against their definitions computed in another way.
//
//===----------------------------------------------------------------------===//

#include "NamedSequence.h"

#include "lull/Sequence/Net.h"

#include <cmath>
#include <string>
#include <utility>

using namespace lull;
using namespace lull::test;

namespace {

//===----------------------------------------------------------------------===//
// Words
//===----------------------------------------------------------------------===//

TEST(PublishedTest, Words) {
  struct Row {
    const char *name, *word;
  };
  const Row rows[] = {
      {"hahn", "X"},               // Hahn 1950
      {"cp-3", "X X X"},           // Carr and Purcell 1954
      {"cpmg-4", "X X X X"},       // Meiboom and Gill 1958
      {"xy4", "X Y X Y"},          // Maudsley 1986
      {"xy4-trailing", "X Y X Y"}, // Viola, Knill and Lloyd 1999
      {"xy4-signed", "X Y -X -Y"}, // no source
      {"xy8", "X Y X Y Y X Y X"},  // Gullion et al. 1990
      {"xy16", "X Y X Y Y X Y X -X -Y -X -Y -Y -X -Y -X"}, // the same
      {"edd", "X Y X Y Y X Y X"},      // Viola and Knill 2003
      {"qdd-2-2", "Y Y X Y Y X Y Y"},  // West, Fong and Lidar 2010
      {"signed-x4", "X -X -X X"},      // Genov et al. 2017, UR4
      {"ur-8", "X Y -Y -X -X -Y Y X"}, // the same
  };
  for (const Row &row : rows)
    EXPECT_EQ(spellWord(named(row.name)), row.word) << row.name;
}

/// Genov, Schraft, Vitanov and Halfmann 2017, table of phases.
TEST(PublishedTest, UniversallyRobustPhases) {
  struct Row {
    std::vector<int> numerators;
    int denominator;
  };
  const Row rows[] = {
      {{0, 1, 1, 0}, 1},
      {{0, 2, 0, 0, 2, 0}, 3},
      {{0, 1, 3, 2, 2, 3, 1, 0}, 2},
      {{0, 4, 2, 4, 0, 0, 4, 2, 4, 0}, 5},
      {{0, 1, 3, 0, 4, 3, 3, 4, 0, 3, 1, 0}, 3},
      {{0, 6, 4, 8, 4, 6, 0, 0, 6, 4, 8, 4, 6, 0}, 7},
      {{0, 1, 3, 6, 2, 7, 5, 4, 4, 5, 7, 2, 6, 3, 1, 0}, 4},
      {{0, 8, 6, 12, 8, 12, 6, 8, 0, 0, 8, 6, 12, 8, 12, 6, 8, 0}, 9},
      {{0, 1, 3, 6, 0, 5, 1, 8, 6, 5, 5, 6, 8, 1, 5, 0, 6, 3, 1, 0}, 5},
  };
  for (const Row &row : rows)
    EXPECT_EQ(named("ur-" + std::to_string(row.numerators.size())).phases,
              fractions(row.numerators, row.denominator))
        << row.numerators.size();
}

/// Souza, Alvarez and Suter 2011: pi/6 + phi, phi, pi/2 + phi, phi, pi/6 + phi
/// for phi = 0, pi/2, 0, pi/2.
TEST(PublishedTest, KnillPhases) {
  EXPECT_EQ(named("kdd-20").phases, fractions({1, 0, 3, 0, 1, 4, 3, 6, 3, 4,
                                               1, 0, 3, 0, 1, 4, 3, 6, 3, 4},
                                              6));
}

/// The word at k/4^level, k = 1, ..., with I where nothing is and Z for two
/// pulses.
std::string slotWord(const Sequence &sequence, unsigned slots) {
  std::string word(slots, 'I');
  for (size_t i = 0; i < sequence.size(); ++i) {
    std::optional<Fraction> slot = sequence.instants[i].exact->times(slots);
    EXPECT_TRUE(slot && slot->isWhole());
    char &letter = word[slot->numerator() - 1];
    if (letter != 'I') {
      // The pulse of the inner block acts first.
      EXPECT_EQ(letter, 'Y');
      EXPECT_EQ(spellPhase(sequence.phases[i]), "X");
      letter = 'Z';
    } else {
      letter = spellPhase(sequence.phases[i])[0];
    }
  }
  return word;
}

/// C_level by the recursion, as the letters at the end of each slot, not
/// merged.
std::vector<std::string> concatenatedSlots(unsigned level) {
  if (level == 0)
    return {""};
  std::vector<std::string> result;
  for (char pulse : {'X', 'Y', 'X', 'Y'}) {
    std::vector<std::string> block = concatenatedSlots(level - 1);
    block.back() += pulse;
    result.insert(result.end(), block.begin(), block.end());
  }
  return result;
}

char mergedLetter(const std::string &pulses) {
  bool x = false, y = false;
  for (char pulse : pulses)
    (pulse == 'X' ? x : y) ^= true;
  return x ? (y ? 'Z' : 'X') : (y ? 'Y' : 'I');
}

/// Khodjasteh and Lidar 2005.
TEST(PublishedTest, ConcatenatedWords) {
  EXPECT_EQ(slotWord(named("cdd-1"), 4), "XYXY");
  EXPECT_EQ(slotWord(named("cdd-2"), 16), "XYXZXYXIXYXZXYXI");
  EXPECT_EQ(named("cdd-2").anchor, Anchor::Centre);
  EXPECT_EQ(named("cdd-3").anchor, Anchor::End);
  for (unsigned level = 1; level <= 6; ++level) {
    std::string expected;
    size_t naive = 0;
    for (const std::string &pulses : concatenatedSlots(level)) {
      naive += pulses.size();
      expected += mergedLetter(pulses);
    }
    Sequence sequence = named("cdd-" + std::to_string(level));
    EXPECT_EQ(slotWord(sequence, 1u << (2 * level)), expected) << level;
    if (level == 3) {
      EXPECT_EQ(naive, 84u);
      EXPECT_EQ(expected.size(), 64u);
      EXPECT_EQ(llvm::StringRef(expected).count('I'), 4u);
      EXPECT_EQ(llvm::StringRef(expected).count('Z'), 8u);
    }
  }
}

/// The flips of the Thue-Morse function by its definition, the parity of ones.
TEST(PublishedTest, ConcatenatedOnOneAxis) {
  for (unsigned level = 1; level <= 10; ++level) {
    std::vector<Fraction> flips;
    unsigned slots = 1u << level;
    for (unsigned slot = 1; slot < slots; ++slot)
      if (__builtin_parity(slot) != __builtin_parity(slot - 1))
        flips.push_back(over(slot, slots));
    EXPECT_EQ(exactInstants(named("cdd-axis-" + std::to_string(level))), flips);
  }
}

//===----------------------------------------------------------------------===//
// Instants
//===----------------------------------------------------------------------===//

TEST(PublishedTest, RegularInstants) {
  EXPECT_EQ(exactInstants(named("hahn")), fractions({1}, 2));
  EXPECT_EQ(exactInstants(named("cpmg-4")), fractions({1, 3, 5, 7}, 8));
  EXPECT_EQ(exactInstants(named("xy4")), fractions({1, 3, 5, 7}, 8));
  EXPECT_EQ(exactInstants(named("xy4-trailing")), fractions({1, 2, 3, 4}, 4));
  EXPECT_EQ(exactInstants(named("edd")),
            fractions({1, 2, 3, 4, 5, 6, 7, 8}, 8));
  EXPECT_EQ(exactInstants(named("pdd-3")), fractions({1, 2, 3}, 4));
  EXPECT_EQ(exactInstants(named("udd-1")), fractions({1}, 2));
  EXPECT_EQ(exactInstants(named("udd-2")), fractions({1, 3}, 4));
  EXPECT_EQ(exactInstants(named("qdd-2-2")),
            fractions({1, 3, 4, 6, 10, 12, 13, 15}, 16));
}

/// Uhrig 2007: sin^2(pi j/(2n+2)). The decimals for n = 4 follow from
/// sin(18 degrees) = (sqrt 5 - 1)/4 and sin(54 degrees) = (sqrt 5 + 1)/4.
TEST(PublishedTest, UhrigInstants) {
  Sequence four = named("udd-4");
  double root = std::sqrt(5.0);
  double inner = (3 - root) / 8, outer = (5 - root) / 8;
  EXPECT_NEAR(four.instants[0].value, inner, 1e-15);
  EXPECT_NEAR(four.instants[0].value, 0.0954915028, 1e-10);
  EXPECT_NEAR(four.instants[1].value, outer, 1e-15);
  EXPECT_NEAR(four.instants[1].value, 0.3454915028, 1e-10);
  for (unsigned n : {1u, 2u, 3u, 4u, 5u, 8u, 11u, 100u, 10000u}) {
    Sequence sequence = named("udd-" + std::to_string(n));
    for (unsigned j = 1; j <= n; ++j) {
      double x = sequence.instants[j - 1].value;
      // Half-angle form, to differ from the library.
      EXPECT_NEAR(x, (1 - std::cos(Pi * j / (n + 1))) / 2, 1e-15);
      if (2 * j > n) {
        EXPECT_EQ(x, 1 - sequence.instants[n - j].value) << n << ' ' << j;
      }
    }
  }
  // Exact where the sine squared is rational.
  EXPECT_EQ(named("udd-5").instants[1].exact, over(1, 4));
  EXPECT_EQ(named("udd-5").instants[2].exact, over(1, 2));
  EXPECT_EQ(named("udd-5").instants[3].exact, over(3, 4));
  EXPECT_FALSE(named("udd-5").instants[0].exact.has_value());
}

/// West, Fong and Lidar 2010: Uhrig's instants within Uhrig's intervals.
TEST(PublishedTest, QuadraticInstants) {
  for (auto [inner, outer] : {std::pair(2, 4), {4, 2}, {4, 4}, {6, 8}}) {
    Sequence sequence =
        named("qdd-" + std::to_string(inner) + "-" + std::to_string(outer));
    auto uhrig = [](int j, int n) {
      return (1 - std::cos(Pi * j / (n + 1))) / 2;
    };
    size_t next = 0;
    for (int i = 0; i <= outer; ++i) {
      double lower = uhrig(i, outer), upper = uhrig(i + 1, outer);
      for (int j = 1; j <= inner; ++j, ++next) {
        EXPECT_EQ(spellPhase(sequence.phases[next]), "Y");
        EXPECT_NEAR(sequence.instants[next].value,
                    lower + (upper - lower) * uhrig(j, inner), 1e-14);
      }
      if (i < outer) {
        EXPECT_EQ(spellPhase(sequence.phases[next]), "X");
        EXPECT_NEAR(sequence.instants[next++].value, upper, 1e-15);
      }
    }
    EXPECT_EQ(next, sequence.size());
    for (size_t i = 0; i < next / 2; ++i)
      EXPECT_EQ(sequence.instants[next - 1 - i].value,
                1 - sequence.instants[i].value);
  }
}

/// Walsh functions as products of Rademacher functions sgn sin(2^j pi x), j the
/// place (from 1) of each one in the Paley index. Hayes et al. 2011.
TEST(PublishedTest, WalshFlips) {
  for (unsigned sequency = 1; sequency <= 70; ++sequency) {
    unsigned paley = sequency ^ (sequency >> 1);
    constexpr int slots = 128;
    auto value = [&](int slot) {
      double x = (slot + 0.5) / slots;
      bool isNegative = false;
      for (int j = 1; j <= 7; ++j)
        if ((paley >> (j - 1)) & 1)
          isNegative ^= std::sin(std::ldexp(Pi, j) * x) < 0;
      return isNegative;
    };
    std::vector<Fraction> flips;
    for (int slot = 1; slot < slots; ++slot)
      if (value(slot) != value(slot - 1))
        flips.push_back(over(slot, slots));
    EXPECT_EQ(flips.size(), sequency);
    if (sequency % 2 == 1)
      flips.push_back(1);
    Sequence sequence = named("walsh-" + std::to_string(sequency));
    EXPECT_EQ(exactInstants(sequence), flips) << sequency;
    EXPECT_EQ(sequence.anchor,
              sequency % 2 == 1 ? Anchor::End : Anchor::Centre);
  }
}

/// Cywinski et al. 2008 and Hayes et al. 2011 name these coincidences.
TEST(PublishedTest, WalshMembersOfOtherFamilies) {
  for (auto [walsh, other] : {std::pair("walsh-2", "cpmg-2"),
                              {"walsh-4", "cpmg-4"},
                              {"walsh-8", "cpmg-8"},
                              {"walsh-10", "cdd-axis-4"}})
    EXPECT_EQ(exactInstants(named(walsh)), exactInstants(named(other)))
        << walsh;
  for (auto [walsh, other] : {std::pair("walsh-1", "hahn"),
                              {"walsh-3", "pdd-3"},
                              {"walsh-5", "cdd-axis-3"}}) {
    llvm::Expected<Sequence> closed = close(named(other));
    ASSERT_TRUE(bool(closed)) << other;
    EXPECT_EQ(exactInstants(named(walsh)), exactInstants(*closed)) << walsh;
  }
}

TEST(PublishedTest, FormulasAndAnchors) {
  llvm::Expected<std::vector<Instant>> trailing =
      instantsByFormula("trailing", 3);
  ASSERT_TRUE(bool(trailing));
  EXPECT_EQ((*trailing)[0].exact, over(1, 3));
  EXPECT_EQ(anchorOf(*trailing), Anchor::End);
  EXPECT_EQ(anchorOf({}), Anchor::Centre);
  EXPECT_EQ(anchorOf({Instant::at(0.5), Instant::at(1.0)}), Anchor::End);
  EXPECT_EQ(anchorOf({Instant::at(0.9999999999)}), Anchor::Centre);

  auto message = [](llvm::StringRef formula, unsigned count) -> std::string {
    llvm::Expected<std::vector<Instant>> instants =
        instantsByFormula(formula, count);
    return instants ? "accepted" : llvm::toString(instants.takeError());
  };
  EXPECT_EQ(message("uhrig", 10000), "accepted");
  EXPECT_EQ(message("uhrig", 10001),
            "10001 pulses are out of range: a sequence has from 1 to 10000");
  EXPECT_EQ(message("centred", 0),
            "0 pulses are out of range: a sequence has from 1 to 10000");
  EXPECT_EQ(message("Uhrig", 4), "unknown instants 'Uhrig': known are centred, "
                                 "trailing, spread, uhrig");
}

} // namespace
