//===- NativeTest.cpp - Pulses in a device's operations ---------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Native.h"

#include "gtest/gtest.h"

#include <array>
#include <cmath>
#include <complex>
#include <limits>

using namespace lull;

namespace {

//===----------------------------------------------------------------------===//
// Matrices of the conventions in Action, sharing no code with the library.
//===----------------------------------------------------------------------===//

using Complex = std::complex<double>;
using Matrix = std::array<std::array<Complex, 2>, 2>;

Matrix times(const Matrix &a, const Matrix &b) {
  Matrix product{};
  for (int row = 0; row != 2; ++row)
    for (int column = 0; column != 2; ++column)
      for (int inner = 0; inner != 2; ++inner)
        product[row][column] += a[row][inner] * b[inner][column];
  return product;
}

/// exp(-i theta/2 (cos phi X + sin phi Y)).
Matrix equatorialMatrix(double theta, double phi) {
  Complex c = std::cos(theta / 2), s(0, -std::sin(theta / 2));
  return {{{c, s * std::polar(1.0, -phi)}, {s * std::polar(1.0, phi), c}}};
}

/// exp(-i a Z/2).
Matrix frameMatrix(double a) {
  return {{{std::polar(1.0, -a / 2), 0}, {0, std::polar(1.0, a / 2)}}};
}

/// |Tr(A^dagger B)| / 2: one if they are equal up to a global phase.
double overlap(const Matrix &a, const Matrix &b) {
  Complex trace = 0;
  for (int row = 0; row != 2; ++row)
    for (int column = 0; column != 2; ++column)
      trace += std::conj(a[row][column]) * b[row][column];
  return std::abs(trace) / 2;
}

double radians(Fraction f) { return M_PI * f.toDouble(); }

/// What the hardware does, operation by operation in time.
Matrix played(const NativePulse &pulse) {
  double theta, phi;
  if (pulse.entry->plays.kind == Action::Kind::Equatorial) {
    EXPECT_EQ(pulse.parameters.size(), 2u);
    theta = radians(pulse.parameters[0]);
    phi = radians(pulse.parameters[1]);
  } else {
    EXPECT_TRUE(pulse.parameters.empty());
    theta = radians(pulse.entry->plays.turn);
    phi = radians(pulse.entry->plays.phase);
  }
  Matrix result = frameMatrix(-radians(pulse.frame));
  for (unsigned i = 0; i != pulse.count; ++i)
    result = times(equatorialMatrix(theta, phi), result);
  return times(frameMatrix(radians(pulse.frame)), result);
}

TEST(NativeMatrices, Conventions) {
  // Written out from the definitions: Rx(pi) = -iX, Ry(pi) = -iY, and the order
  // Rz(-pi/2), X, Rz(pi/2) in time is Y.
  Matrix x = equatorialMatrix(M_PI, 0), y = equatorialMatrix(M_PI, M_PI / 2);
  EXPECT_NEAR(std::abs(x[0][1] - Complex(0, -1)), 0, 1e-12);
  EXPECT_NEAR(std::abs(y[0][1] - Complex(-1)), 0, 1e-12);
  EXPECT_NEAR(std::abs(y[1][0] - Complex(1)), 0, 1e-12);
  EXPECT_NEAR(overlap(x, y), 0, 1e-12);
}

//===----------------------------------------------------------------------===//
// Devices
//===----------------------------------------------------------------------===//

class Builder {
public:
  Builder() : device("oak", Clock()) {
    for (SiteId number : {0, 3}) {
      Site site;
      site.number = number;
      add(device.addSite(site));
    }
    add(device.setGrid(8, 0));
  }

  Builder &entry(llvm::StringRef name, Action plays, Ticks duration,
                 bool native = true, std::vector<SiteId> sites = {}) {
    OperationEntry entry;
    entry.name = name.str();
    entry.plays = plays;
    entry.duration = duration;
    entry.native = native;
    for (SiteId site : sites)
      entry.on.push_back({site});
    add(device.addOperation(std::move(entry)));
    return *this;
  }
  Builder &rotation(llvm::StringRef name, Fraction turn, Fraction phase,
                    Ticks duration, bool native = true,
                    std::vector<SiteId> sites = {}) {
    return entry(name, Action::rotation(turn, phase), duration, native,
                 std::move(sites));
  }
  Builder &frame(llvm::StringRef name = "rz", bool native = true) {
    return entry(name, Action::frame(), 0, native);
  }

  Device device;

private:
  void add(llvm::Error error) {
    if (error)
      ADD_FAILURE() << llvm::toString(std::move(error));
  }
};

const Fraction Half = Fraction::of(1, 2);
const Fraction ThreeHalves = Fraction::of(3, 2);

std::vector<Fraction> phases() {
  return {0,
          Half,
          1,
          ThreeHalves,
          Fraction::of(1, 6),
          Fraction::of(2, 5),
          Fraction::of(7, 9),
          Fraction::of(11, 6),
          Fraction::of(1999, 1000)};
}

NativePulse mustPlay(const Device &device, Fraction phase, SiteId site = 3) {
  llvm::Expected<NativePulse> pulse = nativePulse(device, site, phase);
  if (!pulse) {
    ADD_FAILURE() << llvm::toString(pulse.takeError());
    return {};
  }
  EXPECT_EQ(pulse->frameEntry != nullptr, !pulse->frame.isZero());
  EXPECT_LE(Fraction(0), pulse->frame);
  EXPECT_LT(pulse->frame, Fraction(2));
  EXPECT_TRUE(pulse->entry->native);
  Matrix wanted = equatorialMatrix(M_PI, radians(phase));
  EXPECT_NEAR(overlap(played(*pulse), wanted), 1, 1e-12)
      << "phase " << phase.str();
  return *pulse;
}

std::string errorOf(const Device &device, Fraction phase, SiteId site = 3) {
  llvm::Expected<NativePulse> pulse = nativePulse(device, site, phase);
  if (pulse)
    return "no error";
  return llvm::toString(pulse.takeError());
}

//===----------------------------------------------------------------------===//
// Tests
//===----------------------------------------------------------------------===//

TEST(Native, PiPulseAndFrame) {
  Builder b;
  b.rotation("x", 1, 0, 160).frame();
  for (Fraction phase : phases()) {
    NativePulse pulse = mustPlay(b.device, phase);
    EXPECT_EQ(pulse.entry->name, "x");
    EXPECT_EQ(pulse.count, 1u);
    EXPECT_EQ(pulse.width, 160);
    EXPECT_EQ(pulse.frame, phase);
    if (!phase.isZero()) {
      EXPECT_EQ(pulse.frameEntry->name, "rz");
    }
  }
  // A hardware phase other than 0: the frame is the difference.
  Builder y;
  y.rotation("y", 1, Half, 160).frame();
  for (Fraction phase : phases())
    mustPlay(y.device, phase);
  EXPECT_EQ(mustPlay(y.device, 0).frame, ThreeHalves);
  EXPECT_EQ(mustPlay(y.device, 1).frame, Half);
}

TEST(Native, HalfTurnsAndFrame) {
  Builder b;
  b.rotation("sx", Half, 0, 36).frame();
  for (Fraction phase : phases()) {
    NativePulse pulse = mustPlay(b.device, phase);
    EXPECT_EQ(pulse.entry->name, "sx");
    EXPECT_EQ(pulse.count, 2u);
    // On a grid of 8, the second half starts at 40 at the earliest.
    EXPECT_EQ(pulse.second, 40);
    EXPECT_EQ(pulse.width, 76);
    EXPECT_EQ(pulse.frame, phase);
  }
}

TEST(Native, HalfTurnsOnTheGridTouch) {
  Builder b;
  b.rotation("sx", Half, 0, 32);
  NativePulse pulse = mustPlay(b.device, 0);
  EXPECT_EQ(pulse.second, 32);
  EXPECT_EQ(pulse.width, 64);
}

TEST(Native, FixedPulsesOnly) {
  Builder two;
  two.rotation("x", 1, 0, 160).rotation("y", 1, Half, 160);
  EXPECT_EQ(mustPlay(two.device, 0).entry->name, "x");
  EXPECT_EQ(mustPlay(two.device, Half).entry->name, "y");
  EXPECT_EQ(errorOf(two.device, 1),
            "device 'oak' cannot play a pi pulse of phase 1 pi on site 3: it "
            "has a pi pulse of phase 0 ('x') and a pi pulse of phase 1/2 pi "
            "('y') but no frame change");

  Builder four;
  four.rotation("x", 1, 0, 160)
      .rotation("y", 1, Half, 160)
      .rotation("xm", -1, 0, 160)
      .rotation("ym", 1, ThreeHalves, 160);
  EXPECT_EQ(mustPlay(four.device, 0).entry->name, "x");
  EXPECT_EQ(mustPlay(four.device, Half).entry->name, "y");
  EXPECT_EQ(mustPlay(four.device, 1).entry->name, "xm");
  EXPECT_EQ(mustPlay(four.device, ThreeHalves).entry->name, "ym");
  for (Fraction phase : phases())
    if (phase.denominator() > 2) {
      EXPECT_NE(errorOf(four.device, phase), "no error");
    }
}

TEST(Native, PhasesAreModuloAWholeTurn) {
  Builder b;
  b.rotation("y", 1, Half, 160);
  EXPECT_EQ(mustPlay(b.device, Fraction::of(5, 2)).entry->name, "y");
  EXPECT_EQ(mustPlay(b.device, Fraction::of(-3, 2)).entry->name, "y");
}

TEST(Native, Equatorial) {
  for (bool frame : {false, true}) {
    Builder b;
    b.entry("prx", Action::equatorial(), 50);
    if (frame)
      b.frame();
    for (Fraction phase : phases()) {
      NativePulse pulse = mustPlay(b.device, phase);
      EXPECT_EQ(pulse.entry->name, "prx");
      ASSERT_EQ(pulse.parameters.size(), 2u);
      EXPECT_EQ(pulse.parameters[0], Fraction(1));
      EXPECT_EQ(pulse.parameters[1], phase);
      EXPECT_EQ(pulse.frameEntry, nullptr);
      EXPECT_EQ(pulse.width, 50);
    }
  }
}

/// Every means of the header's list is passed over for the one before it, even
/// a shorter one.
TEST(Native, OrderOfPreference) {
  Builder b;
  b.rotation("sxm", Half, 1, 1).frame();
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "sxm");
  b.rotation("sx", Half, 0, 2);
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "sx");
  b.rotation("y", 1, Half, 30);
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "y");
  b.entry("prx", Action::equatorial(), 40);
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "prx");
  b.rotation("x", 1, 0, 50);
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "x");
  EXPECT_EQ(mustPlay(b.device, 0).frameEntry, nullptr);
}

TEST(Native, ShortestThenFirst) {
  Builder b;
  b.rotation("long", 1, 0, 60)
      .rotation("short", 1, 0, 40)
      .rotation("later", 1, 0, 40)
      .rotation("other", 1, Half, 30)
      .frame("rz")
      .frame("p");
  EXPECT_EQ(mustPlay(b.device, 0).entry->name, "short");
  NativePulse framed = mustPlay(b.device, 1);
  EXPECT_EQ(framed.entry->name, "other");
  EXPECT_EQ(framed.frameEntry->name, "rz");
}

/// An entry for one site hides the one of its name for any site, there only.
TEST(Native, SitesOfTheirOwn) {
  Builder b;
  b.rotation("x", 1, 0, 100)
      .rotation("x", 1, 0, 160, /*native=*/true, {3})
      .rotation("y", 1, Half, 70, /*native=*/true, {0});
  EXPECT_EQ(mustPlay(b.device, 0, 3).width, 160);
  EXPECT_EQ(mustPlay(b.device, 0, 0).width, 100);
  EXPECT_EQ(mustPlay(b.device, Half, 0).width, 70);
  EXPECT_EQ(errorOf(b.device, Half, 3),
            "device 'oak' cannot play a pi pulse of phase 1/2 pi on site 3: it "
            "has a pi pulse of phase 0 ('x') but no frame change");
}

TEST(Native, Errors) {
  Builder x;
  x.rotation("x", 1, 0, 160);
  mustPlay(x.device, 0);
  EXPECT_EQ(errorOf(x.device, Half),
            "device 'oak' cannot play a pi pulse of phase 1/2 pi on site 3: it "
            "has a pi pulse of phase 0 ('x') but no frame change");
  EXPECT_EQ(errorOf(x.device, 0, 1), "device 'oak' has no site 1");

  Builder sx;
  sx.rotation("sx", Half, 0, 160).frame("rz", /*native=*/false);
  EXPECT_EQ(mustPlay(sx.device, 0).count, 2u);
  EXPECT_EQ(errorOf(sx.device, Half),
            "device 'oak' cannot play a pi pulse of phase 1/2 pi on site 3: it "
            "has a half turn of phase 0 ('sx') but no frame change ('rz' is "
            "not native)");

  Builder none;
  EXPECT_EQ(errorOf(none.device, 0),
            "device 'oak' cannot play a pi pulse of phase 0 on site 3: it has "
            "no pi pulse or half turn");
  none.frame();
  EXPECT_EQ(errorOf(none.device, 0),
            "device 'oak' cannot play a pi pulse of phase 0 on site 3: it has "
            "a frame change ('rz') but no pi pulse or half turn");
  none.rotation("third", Fraction::of(1, 3), 0, 8)
      .rotation("x", 1, 0, 160, /*native=*/false);
  EXPECT_EQ(errorOf(none.device, 0),
            "device 'oak' cannot play a pi pulse of phase 0 on site 3: it has "
            "a frame change ('rz') but no pi pulse or half turn ('x' is not "
            "native)");
}

TEST(Native, NothingOverflows) {
  Ticks huge = std::numeric_limits<Ticks>::max() - 1;
  Builder half;
  half.rotation("sx", Half, 0, huge);
  EXPECT_EQ(errorOf(half.device, 0),
            "two half turns ('sx') of 9223372036854775806 dt do not fit 64 "
            "bits");
  Builder odd;
  odd.rotation("x", 1, Fraction::of(1, 4000000007), 8).frame();
  EXPECT_EQ(errorOf(odd.device, Fraction::of(1, 4000000009)),
            "a frame change from phase 1/4000000007 pi to phase 1/4000000009 "
            "pi does not fit 64 bits");
}

} // namespace
