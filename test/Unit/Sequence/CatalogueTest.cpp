//===- CatalogueTest.cpp - Tests of the published sequences ---------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "NamedSequence.h"

#include "lull/Sequence/Net.h"

#include <set>
#include <string>

using namespace lull;
using namespace lull::test;

namespace {

/// What findSequence says about a wrong name.
std::string refusal(llvm::StringRef name) {
  llvm::Expected<Sequence> sequence = findSequence(name);
  if (sequence)
    return "accepted";
  return llvm::toString(sequence.takeError());
}

//===----------------------------------------------------------------------===//
// Every member
//===----------------------------------------------------------------------===//

TEST(CatalogueTest, EveryExampleIsSound) {
  std::set<std::string> stems;
  for (const Family &family : catalogue()) {
    EXPECT_TRUE(stems.insert(family.stem.str()).second) << family.stem.str();
    EXPECT_FALSE(family.source.empty()) << family.stem.str();
    EXPECT_EQ(family.range.empty(), family.orders == 0) << family.stem.str();
    ASSERT_FALSE(family.examples.empty()) << family.stem.str();
    for (llvm::StringRef name : family.examples) {
      EXPECT_TRUE(name.starts_with(family.stem));
      Sequence sequence = named(name);
      EXPECT_EQ(sequence.name, name.str());
      ASSERT_GT(sequence.size(), 0u) << name.str();
      ASSERT_EQ(sequence.instants.size(), sequence.size()) << name.str();
      double previous = 0;
      for (size_t i = 0; i < sequence.size(); ++i) {
        EXPECT_GE(sequence.phases[i], Fraction(0)) << name.str();
        EXPECT_LT(sequence.phases[i], Fraction(2)) << name.str();
        const Instant &instant = sequence.instants[i];
        EXPECT_GE(instant.value, previous) << name.str();
        EXPECT_LE(instant.value, 1) << name.str();
        if (instant.exact) {
          EXPECT_EQ(instant.value, instant.exact->toDouble()) << name.str();
        }
        previous = instant.value;
      }
      EXPECT_EQ(sequence.anchor, previous == 1 ? Anchor::End : Anchor::Centre)
          << name.str();

      llvm::Expected<Sequence> closed = close(sequence);
      ASSERT_TRUE(bool(closed)) << name.str();
      EXPECT_EQ(closed->size(), sequence.size() + sequence.size() % 2);
      EXPECT_NEAR(distanceUpToPhase(product(closed->phases), identity2()), 0,
                  1e-12)
          << name.str();
    }
  }
}

TEST(CatalogueTest, TheTrapsAreRemarkedOn) {
  for (const Family &family : catalogue())
    if (family.stem == "xy4-signed")
      EXPECT_TRUE(family.remark.starts_with("a trap"));
    else if (family.stem == "pdd")
      EXPECT_TRUE(family.remark.contains("does not refocus"));
    else if (family.stem == "cdd")
      EXPECT_TRUE(family.remark.contains("frame change"));
    else if (family.stem == "cp" || family.stem == "cpmg")
      EXPECT_TRUE(family.remark.contains("stored state"));
}

TEST(CatalogueTest, NumbersOfPulses) {
  struct Row {
    const char *name;
    size_t size;
  };
  const Row rows[] = {
      {"hahn", 1},        {"cp-3", 3},       {"cpmg-8", 8},
      {"pdd-5", 5},       {"xy4", 4},        {"xy8", 8},
      {"edd", 8},         {"xy16", 16},      {"kdd-20", 20},
      {"udd-7", 7},       {"ur-14", 14},     {"signed-x4", 4},
      {"cdd-1", 4},       {"cdd-2", 16},     {"cdd-3", 68},
      {"cdd-axis-1", 1},  {"cdd-axis-2", 2}, {"cdd-axis-3", 5},
      {"cdd-axis-4", 10}, {"qdd-2-2", 8},    {"qdd-2-4", 14},
      {"qdd-4-2", 14},    {"qdd-4-4", 24},   {"walsh-1", 2},
      {"walsh-2", 2},     {"walsh-5", 6},    {"walsh-10", 10},
  };
  for (const Row &row : rows)
    EXPECT_EQ(named(row.name).size(), row.size) << row.name;
}

//===----------------------------------------------------------------------===//
// Wrong names
//===----------------------------------------------------------------------===//

TEST(CatalogueTest, RefusesUnknownNames) {
  EXPECT_EQ(refusal("foo"),
            "unknown sequence 'foo': known are hahn, cp-N, cpmg-N, signed-x4, "
            "pdd-N, xy4, xy4-trailing, xy4-signed, xy8, edd, xy16, cdd-N, "
            "cdd-axis-N, udd-N, qdd-N-M, kdd-20, ur-N, walsh-N");
  for (const char *name : {"", "-", "XY8", "UDD-4", "xy", "xy80", "xy8x",
                           "udd4", " xy8", "kdd", "kdd-5", "hahn2", "cdda-1"})
    EXPECT_TRUE(llvm::StringRef(refusal(name)).starts_with("unknown sequence"))
        << name << ": " << refusal(name);
}

TEST(CatalogueTest, RefusesWrongOrders) {
  struct Row {
    const char *name, *message;
  };
  const Row rows[] = {
      {"xy4-3",
       "number of orders in 'xy4-3' is 1 when it should be 0, as in 'xy4'"},
      {"xy4-",
       "number of orders in 'xy4-' is 1 when it should be 0, as in 'xy4'"},
      {"xy4-trailing-2", "number of orders in 'xy4-trailing-2' is 1 when it "
                         "should be 0, as in 'xy4-trailing'"},
      {"udd",
       "number of orders in 'udd' is 0 when it should be 1, as in 'udd-2'"},
      {"udd-", "order '' of 'udd' is not a whole number"},
      {"udd-04x", "order '04x' of 'udd' is not a whole number"},
      {"udd-04", "order '04' of 'udd' has a leading zero"},
      {"udd-+4", "order '+4' of 'udd' is not a whole number"},
      {"udd- 4", "order ' 4' of 'udd' is not a whole number"},
      {"udd-4.0", "order '4.0' of 'udd' is not a whole number"},
      {"udd-4-4",
       "number of orders in 'udd-4-4' is 2 when it should be 1, as in 'udd-2'"},
      {"udd--4",
       "number of orders in 'udd--4' is 2 when it should be 1, as in 'udd-2'"},
      {"udd-4-",
       "number of orders in 'udd-4-' is 2 when it should be 1, as in 'udd-2'"},
      {"qdd-2",
       "number of orders in 'qdd-2' is 1 when it should be 2, as in 'qdd-2-2'"},
      {"qdd-2-", "order '' of 'qdd' is not a whole number"},
      {"cdd-axis",
       "number of orders in 'cdd-axis' is 0 when it should be 1, as in "
       "'cdd-axis-1'"},
      {"cpmg-signed", "order 'signed' of 'cpmg' is not a whole number"},
      {"ur-3",
       "order 3 of 'ur' is out of range: it takes an even number from 4"},
      {"ur-2",
       "order 2 of 'ur' is out of range: it takes an even number from 4"},
      {"qdd-2-3",
       "order 3 of 'qdd' is out of range: it takes an even number from 2"},
      {"udd-0", "order 0 of 'udd' is out of range: it takes a number from 1"},
      {"udd-10001", "'udd-10001' has more than 10000 pulses"},
      {"ur-10002", "'ur-10002' has more than 10000 pulses"},
      {"udd-4294967300", "'udd-4294967300' has more than 10000 pulses"},
      {"cpmg-99999999999999999999999",
       "'cpmg-99999999999999999999999' has more than 10000 pulses"},
      {"cdd-7", "'cdd-7' has more than 10000 pulses"},
      {"cdd-axis-14", "'cdd-axis-14' has more than 10000 pulses"},
      {"qdd-100-100", "'qdd-100-100' has more than 10000 pulses"},
      {"walsh-10001", "'walsh-10001' has more than 10000 pulses"},
  };
  for (const Row &row : rows)
    EXPECT_EQ(refusal(row.name), row.message);
}

/// Order 0 suits no family, and the message says what the table says.
TEST(CatalogueTest, RangesInMessagesAreThoseOfTheTable) {
  for (const Family &family : catalogue()) {
    std::vector<unsigned> zeros(family.orders, 0);
    if (family.orders > 0) {
      llvm::Expected<Sequence> zero = family.make(zeros);
      ASSERT_FALSE(bool(zero)) << family.stem.str();
      EXPECT_EQ(llvm::toString(zero.takeError()),
                "order 0 of '" + family.stem.str() +
                    "' is out of range: it takes " + family.range.str());
    }
    // A direct call is checked like a name.
    zeros.push_back(4);
    llvm::Expected<Sequence> many = family.make(zeros);
    ASSERT_FALSE(bool(many)) << family.stem.str();
    llvm::consumeError(many.takeError());
  }
}

TEST(CatalogueTest, TheLargestMembers) {
  for (const char *name :
       {"cpmg-10000", "pdd-10000", "udd-10000", "ur-10000", "cdd-6",
        "cdd-axis-13", "qdd-98-100", "walsh-9999", "walsh-10000"}) {
    Sequence sequence = named(name);
    EXPECT_GT(sequence.size(), 3000u) << name;
    EXPECT_LE(sequence.size(), MostPulses) << name;
    for (size_t i = 1; i < sequence.size(); ++i)
      ASSERT_LE(sequence.instants[i - 1].value, sequence.instants[i].value);
  }
}

} // namespace
