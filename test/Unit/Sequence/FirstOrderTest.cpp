//===- FirstOrderTest.cpp - Tests of what sequences cancel ----------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ExactWindow.h"
#include "NamedSequence.h"

#include "lull/Sequence/FirstOrder.h"
#include "lull/Sequence/Net.h"

#include <random>
#include <string>

using namespace lull;
using namespace lull::test;

namespace {

/// Centred pulses of these phases.
Sequence centred(std::vector<Fraction> phases) {
  llvm::Expected<std::vector<Instant>> instants =
      instantsByFormula("centred", phases.size());
  if (instants)
    return {"word", phases, *instants, Anchor::Centre};
  ADD_FAILURE() << llvm::toString(instants.takeError());
  return {};
}

/// `-yz` for (false, true, true).
std::string spell(const std::array<bool, 3> &removed) {
  std::string result = "---";
  for (size_t i = 0; i < 3; ++i)
    if (removed[i])
      result[i] = "xyz"[i];
  return result;
}

Sequence closed(const Sequence &sequence) {
  llvm::Expected<Sequence> result = close(sequence);
  if (result)
    return *result;
  ADD_FAILURE() << llvm::toString(result.takeError());
  return sequence;
}

/// All examples of the catalogue, closed ones too, and words of odd phases.
std::vector<Sequence> manySequences() {
  std::vector<Sequence> result;
  for (const Family &family : catalogue())
    for (llvm::StringRef name : family.examples) {
      result.push_back(named(name));
      if (result.back().size() % 2 == 1)
        result.push_back(closed(result.back()));
    }
  std::mt19937 random(99);
  for (size_t count = 1; count <= 12; ++count) {
    Sequence sequence;
    sequence.name = "random";
    for (size_t k = 1; k <= count; ++k) {
      sequence.phases.push_back(over(random() % 34, 17));
      sequence.instants.push_back(Instant::at(
          (k - 0.5 + 0.4 * (random() % 1000 / 1000.0 - 0.5)) / count));
    }
    result.push_back(sequence);
  }
  return result;
}

//===----------------------------------------------------------------------===//
// Known values
//===----------------------------------------------------------------------===//

/// The papers of each row say what their sequence is for; the entries for
/// finite widths are derived, and checked below by exact propagation.
TEST(FirstOrderTest, AxesRemoved) {
  struct Row {
    const char *name, *ideal, *finiteWidth;
  };
  const Row rows[] = {
      {"hahn", "-yz", "---"},       {"cp-2", "-yz", "-yz"},
      {"cpmg-4", "-yz", "-yz"},     {"cpmg-8", "-yz", "-yz"},
      {"cpmg-3", "-yz", "---"},     {"signed-x4", "-yz", "-yz"},
      {"pdd-3", "-yz", "---"},      {"pdd-4", "---", "---"},
      {"xy4", "xyz", "--z"},        {"xy4-trailing", "xyz", "--z"},
      {"xy4-signed", "xyz", "xy-"}, {"xy8", "xyz", "xyz"},
      {"edd", "xyz", "xyz"},        {"xy16", "xyz", "xyz"},
      {"cdd-1", "xyz", "--z"},      {"cdd-2", "xyz", "---"},
      {"cdd-axis-1", "-yz", "---"}, {"cdd-axis-2", "-yz", "-yz"},
      {"cdd-axis-4", "-yz", "-yz"}, {"udd-3", "-yz", "---"},
      {"udd-4", "-yz", "-yz"},      {"udd-6", "-yz", "-yz"},
      {"qdd-2-2", "xyz", "xyz"},    {"qdd-2-4", "xyz", "xyz"},
      {"qdd-4-4", "xyz", "xyz"},    {"kdd-20", "xyz", "--z"},
      {"ur-4", "-yz", "-yz"},       {"ur-6", "--z", "--z"},
      {"ur-8", "--z", "--z"},       {"ur-10", "--z", "--z"},
      {"ur-12", "--z", "--z"},      {"ur-20", "--z", "--z"},
      {"walsh-2", "-yz", "-yz"},    {"walsh-6", "-yz", "-yz"},
      {"walsh-1", "-yz", "-yz"},    {"walsh-5", "-yz", "-yz"},
  };
  for (const Row &row : rows) {
    FirstOrder order = firstOrder(named(row.name));
    EXPECT_EQ(spell(order.removed), row.ideal) << row.name;
    EXPECT_EQ(spell(order.removedFiniteWidth), row.finiteWidth) << row.name;
  }
}

TEST(FirstOrderTest, SignAlternationLosesZ) {
  FirstOrder order = firstOrder(centred({0, 1, 0, 1}));
  EXPECT_EQ(spell(order.removed), "-yz");
  EXPECT_FALSE(order.removedFiniteWidth[2]);
  // 4/pi for each pair.
  EXPECT_NEAR(std::abs(order.detuningInPulse[1]), 8 / Pi, 1e-12);
}

TEST(FirstOrderTest, NoPulsesRemoveNothing) {
  FirstOrder order = firstOrder({});
  EXPECT_EQ(spell(order.removed), "---");
  EXPECT_EQ(spell(order.removedFiniteWidth), "---");
}

TEST(FirstOrderTest, OverRotations) {
  struct Row {
    const char *name;
    Vector sum;
  };
  const Row rows[] = {
      {"cpmg-2", {2, 0, 0}},
      {"cpmg-8", {8, 0, 0}},
      {"signed-x4", {}},
      {"xy4", {}},
      {"xy8", {}},
      {"edd", {}},
      {"xy16", {}},
      {"kdd-20", {}},
      {"ur-4", {}},
      {"ur-6", {}},
      {"ur-14", {}},
      {"udd-4", {4, 0, 0}},
      {"qdd-2-2", {2, 2, 0}},
      {"qdd-4-4", {4, 4, 0}},
      {"xy4-signed", {2, -2, 0}},
  };
  for (const Row &row : rows)
    for (size_t i = 0; i < 3; ++i)
      EXPECT_NEAR(firstOrder(named(row.name)).overRotation[i], row.sum[i],
                  1e-12)
          << row.name << " component " << i;

  // The signs of ur-4 on Uhrig's instants.
  Sequence udd = named("udd-4");
  udd.phases = named("signed-x4").phases;
  for (double component : firstOrder(udd).overRotation)
    EXPECT_EQ(component, 0);
}

TEST(FirstOrderTest, DetuningInPulses) {
  auto size = [](const Sequence &sequence) {
    const Vector &v = firstOrder(sequence).detuningInPulse;
    return std::hypot(v[0], v[1], v[2]);
  };
  EXPECT_NEAR(size(centred({0, 0})), 0, 1e-12);
  EXPECT_NEAR(size(centred({0, 1})), 4 / Pi, 1e-12);
  for (const char *name : {"hahn", "cpmg-3", "pdd-5", "udd-3"})
    EXPECT_NEAR(size(named(name)), 2 / Pi, 1e-12) << name;
  for (const char *name : {"xy4", "xy8", "edd", "xy16", "ur-4", "ur-6", "ur-10",
                           "qdd-2-2", "qdd-2-4", "signed-x4"})
    EXPECT_NEAR(size(named(name)), 0, 1e-12) << name;
  // Both 4/pi, on x and on y.
  EXPECT_GT(size(named("xy4-signed")), 1);
}

TEST(FirstOrderTest, ALongSequenceIsStillExactEnough) {
  FirstOrder order = firstOrder(named("udd-10000"));
  EXPECT_EQ(spell(order.removedFiniteWidth), "-yz");
  EXPECT_EQ(order.overRotation[0], 10000);
}

//===----------------------------------------------------------------------===//
// Against other ways to compute the same
//===----------------------------------------------------------------------===//

/// The integral of the toggled s_a by slicing each stretch of time.
Vector sliced(const Sequence &sequence, double width, size_t a, bool pulsesOnly,
              unsigned slices) {
  Vector sum{};
  Spin now;
  for (const Stretch &stretch : stretches(sequence, width, 0)) {
    bool isFree = stretch.drive == Vector{};
    double step = stretch.length / slices;
    for (unsigned i = 0; i < slices; ++i) {
      Spin middle = evolve(stretch.drive, step / 2) * now;
      // middle^dagger s_a middle; as a Spin, s_a is 0 - i (i s_a).
      Spin axis{0, {}};
      axis.sine[a] = 1;
      Spin toggled = middle.inverse() * axis * middle;
      if (!isFree || !pulsesOnly)
        for (size_t b = 0; b < 3; ++b)
          sum[b] += step * toggled.sine[b];
      now = evolve(stretch.drive, step / 2) * middle;
    }
  }
  return sum;
}

TEST(FirstOrderTest, AgreesWithSlicedTime) {
  for (const Sequence &sequence : manySequences()) {
    // Narrow enough not to overlap in udd-8 or cdd-3.
    double width = 1e-3;
    FirstOrder order = firstOrder(sequence);
    Vector detuning = sliced(sequence, width, 2, /*pulsesOnly=*/true, 1500);
    for (size_t b = 0; b < 3; ++b)
      EXPECT_NEAR(order.detuningInPulse[b], detuning[b] / width, 1e-4)
          << sequence.name;
  }
}

/// To first order a coupling field s_a/2 during the window leaves the generator
/// (field/2) integral of the toggled s_a: its derivative by differences.
Vector coupled(const Sequence &sequence, double width, size_t a) {
  constexpr double h = 1e-5;
  Vector field{};
  field[a] = h;
  Vector up = windowError(sequence, width, 0, field).sine;
  field[a] = -h;
  Vector down = windowError(sequence, width, 0, field).sine;
  Vector result;
  for (size_t b = 0; b < 3; ++b)
    result[b] = (up[b] - down[b]) / h;
  return result;
}

TEST(FirstOrderTest, AgreesWithExactPropagation) {
  unsigned removed = 0, lost = 0;
  for (const Sequence &sequence : manySequences()) {
    FirstOrder order = firstOrder(sequence);
    for (size_t a = 0; a < 3; ++a) {
      // Linear in the width, so that any two widths tell the whole line.
      constexpr double narrow = 1e-3, wide = 2e-3;
      Vector one = coupled(sequence, narrow, a);
      Vector two = coupled(sequence, wide, a);
      Vector ideal, slope;
      for (size_t b = 0; b < 3; ++b) {
        ideal[b] = 2 * one[b] - two[b];
        slope[b] = (two[b] - one[b]) / narrow;
      }
      bool isRemoved = std::hypot(ideal[0], ideal[1], ideal[2]) < 1e-7;
      bool isFlat = std::hypot(slope[0], slope[1], slope[2]) < 1e-4;
      EXPECT_EQ(order.removed[a], isRemoved) << sequence.name << ' ' << a;
      EXPECT_EQ(order.removedFiniteWidth[a], isRemoved && isFlat)
          << sequence.name << ' ' << a << ": slope " << slope[0] << ' '
          << slope[1] << ' ' << slope[2];
      removed += isRemoved && isFlat;
      lost += isRemoved && !isFlat;
    }
    constexpr double h = 1e-5;
    Vector up = windowError(sequence, 1e-3, h, {}).sine;
    Vector down = windowError(sequence, 1e-3, -h, {}).sine;
    for (size_t b = 0; b < 3; ++b)
      EXPECT_NEAR(Pi / 2 * order.overRotation[b], (up[b] - down[b]) / (2 * h),
                  1e-5)
          << sequence.name;
  }
  EXPECT_GT(removed, 20u);
  EXPECT_GT(lost, 10u);
}

//===----------------------------------------------------------------------===//
// Orders of the errors, by exact propagation of catalogue members
//===----------------------------------------------------------------------===//

/// p in 1 - F ~ C error^p, from two errors of ratio 2.
double slope(const Sequence &sequence, double overRotation, double detuning) {
  double width = 0.1 / sequence.size();
  double large =
      infidelity(windowError(sequence, width, overRotation, {0, 0, detuning}));
  double small = infidelity(
      windowError(sequence, width, overRotation / 2, {0, 0, detuning / 2}));
  return std::log2(large / small);
}

/// Genov, Schraft, Vitanov and Halfmann 2017 for UR, Souza, Alvarez and Suter
/// 2011 for KDD; exponents also from a computation with 110 digits.
TEST(FirstOrderTest, OrdersOfOverRotation) {
  struct Row {
    const char *name;
    double exponent;
  };
  for (const Row &row :
       {Row{"hahn", 2}, Row{"cpmg-2", 2}, Row{"udd-4", 2}, Row{"xy4", 4},
        Row{"xy8", 6}, Row{"edd", 6}, Row{"kdd-20", 12}, Row{"qdd-2-2", 2},
        Row{"ur-6", 6}, Row{"ur-10", 10}})
    EXPECT_NEAR(slope(named(row.name), 0.02, 0), row.exponent, 0.05)
        << row.name;
  for (const char *name : {"signed-x4", "xy16", "ur-4", "ur-8", "ur-12"})
    EXPECT_LT(infidelity(windowError(named(name), 1e-3, 0.02, {})), 1e-25)
        << name;
  // XY4: 24.35 eps^4.
  EXPECT_NEAR(infidelity(windowError(named("xy4"), 1e-3, 1e-3, {})) / 1e-12,
              24.35, 0.01);
}

TEST(FirstOrderTest, OrdersOfDetuning) {
  struct Row {
    const char *name;
    double exponent;
  };
  for (const Row &row :
       {Row{"hahn", 2}, Row{"cpmg-2", 4}, Row{"ur-4", 6}, Row{"udd-4", 4},
        Row{"xy4", 4}, Row{"xy8", 8}, Row{"edd", 8}, Row{"xy16", 10},
        Row{"qdd-2-2", 4}, Row{"ur-6", 8}, Row{"ur-8", 10}})
    EXPECT_NEAR(slope(named(row.name), 0, 0.5), row.exponent, 0.05) << row.name;
  EXPECT_NEAR(slope(centred({0, 1}), 0, 0.5), 2, 0.05);
  // A larger error, for it to be above the noise of double precision.
  EXPECT_NEAR(slope(named("ur-10"), 0, 1.5), 12, 0.1);
}

} // namespace
