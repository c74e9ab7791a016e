//===- ProtectTest.cpp - What lull-protect keeps and makes ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Random programs on random devices through the whole pipeline. What comes out
// is read anew, operation by operation, and held against what was invented.
//
//===----------------------------------------------------------------------===//

#include "Comparison.h"

#include "lull/Sequence/Catalogue.h"

#include <fmt/format.h>
#include <gtest/gtest.h>

#include <cstdlib>

using namespace lull;
using namespace lull::property;

namespace {

class ProtectProperty : public testing::Test {
protected:
  static void SetUpTestSuite() { context = makeContext(); }
  static void TearDownTestSuite();

  static void check(const Case &example, const Options &options, Tally &tally);

  static std::unique_ptr<mlir::MLIRContext> context;
  static std::map<std::string, Tally> tallies;
};

std::unique_ptr<mlir::MLIRContext> ProtectProperty::context;
std::map<std::string, Tally> ProtectProperty::tallies;

} // namespace

void ProtectProperty::TearDownTestSuite() {
  context.reset();
  fmt::print("{:14} {:>8} {:>9} {:>6} {:>9}\n", "family", "windows",
             "protected", "left", "pulses");
  for (const auto &[family, tally] : tallies)
    fmt::print("{:14} {:8} {:9} {:6} {:9}\n", family, tally.windows,
               tally.filled, tally.windows - tally.filled, tally.pulses);
}

static std::string print(mlir::ModuleOp module) {
  std::string text;
  llvm::raw_string_ostream(text) << module;
  return text;
}

void ProtectProperty::check(const Case &example, const Options &options,
                            Tally &tally) {
  SCOPED_TRACE(
      fmt::format("device {} with {}", example.device.name, options.str()));
  auto scheduled = example.parse(context.get());
  ASSERT_TRUE(scheduled) << example.text();
  mlir::OwningOpRef<mlir::ModuleOp> written(scheduled->clone());
  ASSERT_TRUE(runSchedule(*scheduled, options)) << example.text();
  ASSERT_TRUE(runProtect(*written, options)) << example.text();
  compare(example, options, *scheduled, *written, tally);
  std::string once = print(*written);
  ASSERT_TRUE(runProtect(*written, options));
  EXPECT_EQ(print(*written), once) << "a second run changes something";
  if (HasFailure())
    fmt::print("{}{}\n", example.text(), once);
}

TEST_F(ProtectProperty, KeepsProgramsUnderEveryFamily) {
  // For a longer search.
  const char *wanted = std::getenv("LULL_PROPERTY_ROUNDS");
  const unsigned rounds = wanted ? unsigned(std::atoi(wanted)) : 11;
  for (const Family &family : catalogue()) {
    Tally &tally = tallies[family.stem.str()];
    for (llvm::StringRef name : family.examples)
      for (unsigned round = 0; round != rounds * numMeans; ++round) {
        Random random(round);
        RandomDevice device = makeDevice(random, Means(round % numMeans),
                                         fmt::format("device{}", round));
        // Other programs for each member.
        for (char letter : name)
          random = Random(random.within(0, 1 << 30) + letter);
        std::optional<Options> options =
            inventOptions(random, device, name.str(), {});
        if (!options)
          continue;
        check({device, {}, inventFunctions(random, device, 3)}, *options,
              tally);
        if (HasFailure())
          return;
      }
    EXPECT_GT(tally.filled, 200u) << family.stem.str();
    EXPECT_GT(tally.windows - tally.filled, 200u) << family.stem.str();
  }
}

TEST_F(ProtectProperty, KeepsProgramsUnderSequencesOfTheirOwn) {
  Tally &tally = tallies["(user's own)"];
  for (unsigned round = 0; round != 400; ++round) {
    Random random(1000 + round);
    RandomDevice device = makeDevice(random, Means(round % numMeans),
                                     fmt::format("device{}", 1000 + round));
    std::vector<UserSequence> own;
    for (const char *name : {"@first", "@second", "@third"})
      own.push_back(inventSequence(random, device, name));
    const std::string &name = random.of(own).name;
    std::optional<Options> options = inventOptions(random, device, name, own);
    if (!options)
      continue;
    check({device, own, inventFunctions(random, device, 3)}, *options, tally);
    if (HasFailure())
      return;
  }
  EXPECT_GT(tally.filled, 1000u);
}

/// No pulse at all without a sequence, but for the program's own wishes.
TEST_F(ProtectProperty, FillsOnlyWhatIsWished) {
  Tally &tally = tallies["(wishes only)"];
  for (unsigned round = 0; round != 240; ++round) {
    Random random(2000 + round);
    RandomDevice device = makeDevice(random, Means(round % numMeans),
                                     fmt::format("device{}", 2000 + round));
    Options options;
    options.sequence = "none";
    check({device, {}, inventFunctions(random, device, 3)}, options, tally);
    if (HasFailure())
      return;
  }
  EXPECT_GT(tally.filled, 50u);
  EXPECT_GT(tally.windows, 10 * tally.filled);
}
