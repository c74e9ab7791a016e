//===- NetTest.cpp - Tests of net rotations and closing -------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "NamedSequence.h"

#include "lull/Sequence/Net.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <random>

using namespace lull;
using namespace lull::test;

namespace {

/// The largest difference between the entries of two matrices.
double difference(const Matrix2 &a, const Matrix2 &b) {
  double largest = 0;
  for (size_t i = 0; i < 4; ++i)
    largest = std::max(largest, std::abs(a[i] - b[i]));
  return largest;
}

Matrix2 scaled(std::complex<double> factor, Matrix2 matrix) {
  for (std::complex<double> &entry : matrix)
    entry *= factor;
  return matrix;
}

/// The rotation that a Net stands for.
Matrix2 matrixOf(const Net &net) {
  double angle = net.angle.toDouble() * Pi;
  switch (net.kind) {
  case Net::Kind::Identity:
    return identity2();
  case Net::Kind::FrameRotation:
    return rotationZ(angle);
  case Net::Kind::Pulse:
    return rotationXY(Pi, angle);
  }
  return {};
}

//===----------------------------------------------------------------------===//
// Matrices
//===----------------------------------------------------------------------===//

TEST(MatrixTest, RotationsAreTheTextbookOnes) {
  using namespace std::complex_literals;
  // exp(-i pi/2 Y) = -i Y, with Y = ((0, -i), (i, 0)).
  EXPECT_LT(difference(rotationXY(Pi, Pi / 2), {0, -1, 1, 0}), 1e-15);
  // exp(-i pi/2 X) = -i X.
  EXPECT_LT(difference(rotationXY(Pi, 0), {0, -1i, -1i, 0}), 1e-15);
  // exp(-i pi/4 Z).
  double r = std::sqrt(0.5);
  EXPECT_LT(difference(rotationZ(Pi / 2), {r - r * 1i, 0, 0, r + r * 1i}),
            1e-15);
}

TEST(MatrixTest, FrameChangesTurnTheAxis) {
  for (double phi : {0.3, 1.7, 4.0})
    for (double theta : {0.2, Pi / 2, Pi, 5.0}) {
      Matrix2 turned = multiply(
          rotationZ(phi), multiply(rotationXY(theta, 0), rotationZ(-phi)));
      EXPECT_LT(difference(turned, rotationXY(theta, phi)), 1e-15);
      EXPECT_LT(
          difference(rotationXY(-theta, phi), rotationXY(theta, phi + Pi)),
          1e-15);
    }
}

TEST(MatrixTest, TwoPulsesTurnTheFrame) {
  for (double a : {0.0, 0.4, 2.0})
    for (double b : {0.0, 1.1, 5.0})
      EXPECT_LT(difference(multiply(rotationXY(Pi, b), rotationXY(Pi, a)),
                           scaled(-1, rotationZ(2 * (b - a)))),
                1e-15);
}

TEST(MatrixTest, DistanceIgnoresTheGlobalPhaseOnly) {
  Matrix2 x = rotationXY(Pi, 0), y = rotationXY(Pi, Pi / 2);
  EXPECT_NEAR(distanceUpToPhase(x, scaled(std::polar(1.0, 0.7), x)), 0, 1e-15);
  EXPECT_NEAR(distanceUpToPhase(x, y), 1, 1e-15);
  EXPECT_NEAR(distanceUpToPhase(identity2(), x), 1, 1e-15);
  // 1 - |Tr Rz(a)|/2 = 1 - |cos(a/2)|.
  EXPECT_NEAR(distanceUpToPhase(identity2(), rotationZ(1.0)), 1 - std::cos(0.5),
              1e-15);
}

//===----------------------------------------------------------------------===//
// Nets
//===----------------------------------------------------------------------===//

TEST(NetTest, SmallWords) {
  struct Row {
    std::vector<Fraction> phases;
    const char *net;
  };
  const Row rows[] = {
      {{}, "identity"},
      {{0}, "a pi pulse of phase 0"},
      {{1}, "a pi pulse of phase pi"},
      {{over(3, 2)}, "a pi pulse of phase 3/2 pi"},
      {{0, 0}, "identity"},
      {{0, 1}, "identity"},
      // R_b R_a = -Rz(2(b - a)).
      {{0, over(1, 2)}, "a rotation about z by pi"},
      {{0, over(1, 4)}, "a rotation about z by 1/2 pi"},
      {{over(1, 4), 0}, "a rotation about z by 3/2 pi"},
      {{0, over(7, 4)}, "a rotation about z by 3/2 pi"},
      {{over(1, 3), over(4, 3)}, "identity"},
      {{over(1, 6), 0, over(1, 2)}, "a pi pulse of phase 2/3 pi"},
      {{0, over(1, 2), 0}, "a pi pulse of phase 3/2 pi"},
  };
  for (const Row &row : rows) {
    llvm::Expected<Net> net = netBySum(row.phases);
    ASSERT_TRUE(bool(net));
    EXPECT_EQ(net->str(), row.net);
    EXPECT_NEAR(distanceUpToPhase(matrixOf(*net), product(row.phases)), 0,
                1e-14)
        << row.net;
  }
}

/// Souza, Alvarez and Suter 2011 (from memory): the five pulses make a pi pulse
/// of phase phi and a rotation by -Pi/3 about z.
TEST(NetTest, KnillsFivePulses) {
  for (Fraction phi : {Fraction(0), over(1, 2), over(2, 7)}) {
    std::vector<Fraction> phases;
    for (Fraction shift :
         {over(1, 6), Fraction(0), over(1, 2), Fraction(0), over(1, 6)})
      phases.push_back(*shift.plus(phi));
    llvm::Expected<Net> net = netBySum(phases);
    ASSERT_TRUE(bool(net));
    EXPECT_EQ(net->kind, Net::Kind::Pulse);
    EXPECT_EQ(net->angle, *phi.plus(over(5, 6)));
    Matrix2 published =
        multiply(rotationZ(-Pi / 3), rotationXY(Pi, phi.toDouble() * Pi));
    EXPECT_NEAR(distanceUpToPhase(published, product(phases)), 0, 1e-14);
  }
}

/// n even: (-1)^(n/2) Rz(-2a), with its sign. Derived by hand.
TEST(NetTest, SignsOfTheProducts) {
  struct Row {
    const char *name;
    double sign;
  };
  for (const Row &row : {Row{"xy4", -1}, Row{"xy8", 1}, Row{"xy16", 1},
                         Row{"edd", 1}, Row{"ur-6", -1}, Row{"ur-8", 1},
                         Row{"kdd-20", -1}, Row{"cpmg-2", -1}}) {
    llvm::Expected<Sequence> sequence = findSequence(row.name);
    ASSERT_TRUE(bool(sequence)) << row.name;
    EXPECT_LT(
        difference(product(sequence->phases), scaled(row.sign, identity2())),
        1e-13)
        << row.name;
  }
}

TEST(NetTest, TheSumAgreesWithTheProductOnTheCatalogue) {
  for (const Family &family : catalogue())
    for (llvm::StringRef name : family.examples) {
      llvm::Expected<Sequence> sequence = findSequence(name);
      ASSERT_TRUE(bool(sequence)) << name.str();
      llvm::Expected<Net> net = netBySum(sequence->phases);
      ASSERT_TRUE(bool(net)) << name.str();
      EXPECT_NEAR(distanceUpToPhase(matrixOf(*net), product(sequence->phases)),
                  0, 1e-12)
          << name.str();
    }
}

TEST(NetTest, TheSumAgreesWithTheProductOnRandomPhases) {
  std::mt19937 random(20240611);
  auto below = [&](unsigned limit) { return unsigned(random() % limit); };
  unsigned identities = 0, rotations = 0, pulses = 0;
  for (unsigned trial = 0; trial < 5000; ++trial) {
    std::vector<Fraction> phases;
    // Small denominators make nets that are the identity common enough.
    std::int64_t denominator = 1 + below(trial % 2 == 0 ? 3 : 60);
    for (unsigned i = 0, count = below(40); i < count; ++i)
      phases.push_back(over(int(below(600)) - 300, denominator));
    llvm::Expected<Net> net = netBySum(phases);
    ASSERT_TRUE(bool(net));
    EXPECT_GE(net->angle, Fraction(0));
    EXPECT_LT(net->angle, Fraction(2));
    ASSERT_NEAR(distanceUpToPhase(matrixOf(*net), product(phases)), 0, 1e-11)
        << "trial " << trial;
    bool isIdentity = distanceUpToPhase(identity2(), product(phases)) < 1e-9;
    EXPECT_EQ(net->kind == Net::Kind::Identity, isIdentity);
    EXPECT_EQ(net->kind == Net::Kind::Pulse, phases.size() % 2 == 1);
    ++(net->kind == Net::Kind::Identity        ? identities
       : net->kind == Net::Kind::FrameRotation ? rotations
                                               : pulses);
  }
  EXPECT_GT(identities, 300u);
  EXPECT_GT(rotations, 300u);
  EXPECT_GT(pulses, 300u);
}

TEST(NetTest, RefusesDenominatorsBeyond64Bits) {
  constexpr std::int64_t big = std::numeric_limits<std::int64_t>::max();
  llvm::Expected<Net> sum =
      netBySum({over(1, 4294967311), over(1, 4294967357)});
  ASSERT_FALSE(bool(sum));
  EXPECT_EQ(llvm::toString(sum.takeError()),
            "the common denominator of the first 2 phases does not fit 64 "
            "bits");
  // In [0, 2) this is beyond 64 bits.
  llvm::Expected<Net> one = netBySum({over(-1, big)});
  ASSERT_FALSE(bool(one));
  llvm::consumeError(one.takeError());
  // Multiples of 2 pi are harmless.
  llvm::Expected<Net> turns = netBySum({big - 1, over(-big, 2)});
  ASSERT_TRUE(bool(turns));
  EXPECT_EQ(turns->str(), "a rotation about z by pi");
}

//===----------------------------------------------------------------------===//
// Closing
//===----------------------------------------------------------------------===//

TEST(CloseTest, LeavesAnIdentityAlone) {
  llvm::Expected<Sequence> xy8 = findSequence("xy8");
  ASSERT_TRUE(bool(xy8));
  llvm::Expected<Sequence> closed = close(*xy8);
  ASSERT_TRUE(bool(closed));
  EXPECT_EQ(closed->phases, xy8->phases);
  EXPECT_EQ(closed->anchor, Anchor::Centre);
}

TEST(CloseTest, AddsOnePulseAtTheEnd) {
  llvm::Expected<Sequence> hahn = findSequence("hahn");
  ASSERT_TRUE(bool(hahn));
  llvm::Expected<Sequence> closed = close(*hahn);
  ASSERT_TRUE(bool(closed));
  EXPECT_EQ(spellWord(*closed), "X X");
  EXPECT_EQ(closed->instants[0].exact, over(1, 2));
  EXPECT_EQ(closed->instants[1].exact, Fraction(1));
  EXPECT_EQ(closed->anchor, Anchor::End);
}

TEST(CloseTest, ContinuesATrainOfEqualPulses) {
  Sequence train{"train",
                 {1, 1, 1},
                 {Instant::at(0.2), Instant::at(0.5), Instant::at(0.8)},
                 Anchor::Centre};
  llvm::Expected<Sequence> closed = close(train);
  ASSERT_TRUE(bool(closed));
  EXPECT_EQ(spellWord(*closed), "-X -X -X -X");
}

TEST(CloseTest, ClosesAnyOddWord) {
  std::mt19937 random(7);
  for (unsigned trial = 0; trial < 500; ++trial) {
    Sequence sequence;
    size_t count = 1 + 2 * (random() % 10);
    for (size_t k = 1; k <= count; ++k) {
      sequence.phases.push_back(over(random() % 24, 12));
      sequence.instants.push_back(Instant::at(over(2 * k - 1, 2 * count)));
    }
    llvm::Expected<Sequence> closed = close(sequence);
    ASSERT_TRUE(bool(closed));
    EXPECT_EQ(closed->size(), count + 1);
    EXPECT_NEAR(distanceUpToPhase(product(closed->phases), identity2()), 0,
                1e-12);
  }
}

TEST(CloseTest, RefusesAnEvenWordThatDoesNotAddUp) {
  Sequence open{"open",
                {0, over(1, 4)},
                {Instant::at(over(1, 4)), Instant::at(over(3, 4))},
                Anchor::Centre};
  llvm::Expected<Sequence> closed = close(open);
  ASSERT_FALSE(bool(closed));
  EXPECT_EQ(llvm::toString(closed.takeError()),
            "the 2 pulses of 'open' leave a rotation about z by 1/2 pi, which "
            "no further pulse undoes");
}

} // namespace
