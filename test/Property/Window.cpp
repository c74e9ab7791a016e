//===- Window.cpp - What was put into one window ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Window.h"

#include "lull/IR/Ops.h"

#include <array>
#include <cmath>
#include <complex>
#include <functional>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

//===----------------------------------------------------------------------===//
// Matrices
//===----------------------------------------------------------------------===//

using Complex = std::complex<double>;
using Matrix = std::array<std::array<Complex, 2>, 2>;

static constexpr double Pi = 3.14159265358979323846;

/// exp(-i T/2 (cos P X + sin P Y)), both in units of pi.
static Matrix rotation(double turn, double phase) {
  double c = std::cos(turn * Pi / 2), s = std::sin(turn * Pi / 2);
  Complex offDiagonal = Complex(0, -s) * std::polar(1.0, -phase * Pi);
  return {{{c, offDiagonal}, {-std::conj(offDiagonal), c}}};
}

/// exp(-i A/2 Z).
static Matrix frameChange(double angle) {
  return {{{std::polar(1.0, -angle * Pi / 2), 0},
           {0, std::polar(1.0, angle * Pi / 2)}}};
}

static Matrix times(const Matrix &left, const Matrix &right) {
  Matrix result{};
  for (int i = 0; i < 2; ++i)
    for (int j = 0; j < 2; ++j)
      result[i][j] = left[i][0] * right[0][j] + left[i][1] * right[1][j];
  return result;
}

static void expectIdentity(const Matrix &net) {
  EXPECT_NEAR(std::abs(net[0][1]), 0, 1e-10);
  EXPECT_NEAR(std::abs(net[1][0]), 0, 1e-10);
  EXPECT_NEAR(std::abs(net[0][0] - net[1][1]), 0, 1e-10);
  EXPECT_NEAR(std::abs(net[0][0]), 1, 1e-10);
}

//===----------------------------------------------------------------------===//
// Insertions
//===----------------------------------------------------------------------===//

namespace {

/// Plays what was inserted into one window.
class Playback {
public:
  Playback(const Window &window, const RandomDevice &device)
      : window(window), device(device) {}

  std::vector<Pulse> run();

private:
  void play(const ReadOp &op, const Entry &entry);
  void rotate(const ReadOp &op, bool isHalf, Fraction axis);
  Fraction angle(const ReadOp &op, size_t index) const {
    return llvm::cast<GateOp>(op.op).getAngles().angles[index].multiple();
  }

  const Window &window;
  const RandomDevice &device;
  Matrix net = frameChange(0);
  Fraction frame = 0;
  std::vector<Pulse> pulses;
  bool halfOpen = false;
};

} // namespace

void Playback::rotate(const ReadOp &op, bool isHalf, Fraction axis) {
  EXPECT_EQ(op.start % device.step, 0) << "a pulse is off the grid";
  // Behind a frame change Rz(f), a pulse of hardware phase p acts as one of
  // phase p - f (McKay et al. 2017, from memory).
  Fraction phase = turnedBack(axis, frame);
  if (halfOpen) {
    Pulse &pulse = pulses.back();
    EXPECT_TRUE(isHalf && pulse.phase == phase) << "half turns do not match";
    EXPECT_GE(op.start, pulse.start + pulse.width) << "half turns overlap";
    pulse.width = op.start + op.duration - pulse.start;
    halfOpen = false;
    return;
  }
  if (!pulses.empty()) {
    const Pulse &last = pulses.back();
    EXPECT_GE(op.start, last.start + last.width + device.gap)
        << "the least gap is not kept";
  }
  pulses.push_back({op.start, op.duration, phase});
  halfOpen = isHalf;
}

void Playback::play(const ReadOp &op, const Entry &entry) {
  EXPECT_TRUE(entry.native) << entry.name << " is not native";
  EXPECT_EQ(op.duration, entry.duration) << "of " << entry.name;
  switch (entry.plays) {
  case Entry::Plays::Nothing:
    ADD_FAILURE() << entry.name << " is no pulse";
    return;
  case Entry::Plays::Rotation:
    net = times(rotation(entry.turn.toDouble(), entry.phase.toDouble()), net);
    return rotate(op, entry.isHalf(), entry.axis());
  case Entry::Plays::Equatorial:
    net =
        times(rotation(angle(op, 0).toDouble(), angle(op, 1).toDouble()), net);
    EXPECT_EQ(angle(op, 0), Fraction(1));
    return rotate(op, /*isHalf=*/false, angle(op, 1));
  case Entry::Plays::Frame:
    net = times(frameChange(angle(op, 0).toDouble()), net);
    EXPECT_FALSE(angle(op, 0).isZero()) << "a frame change of nothing";
    frame = turned(frame, angle(op, 0));
    return;
  }
}

std::vector<Pulse> Playback::run() {
  std::int64_t now = window.start;
  for (const ReadOp *op : window.inserted) {
    EXPECT_EQ(op->start, now) << "the window has a hole";
    now += op->duration;
    if (op->kind == "delay") {
      EXPECT_GT(op->duration, 0) << "a delay of nothing";
      continue;
    }
    const Entry *entry =
        op->kind == "gate" ? device.find(op->name, {window.site}) : nullptr;
    if (!entry) {
      ADD_FAILURE() << "a '" << op->kind.str() << "' in a window";
      continue;
    }
    play(*op, *entry);
  }
  EXPECT_EQ(now, window.start + window.length);
  EXPECT_FALSE(halfOpen) << "one half turn too few";
  EXPECT_TRUE(frame.isZero()) << "the frame stays " << frame.str() << " pi off";
  expectIdentity(net);
  return std::move(pulses);
}

std::vector<Pulse> property::checkInsertion(const Window &window,
                                            const RandomDevice &device) {
  return Playback(window, device).run();
}

//===----------------------------------------------------------------------===//
// Residuals
//===----------------------------------------------------------------------===//

std::int64_t property::twiceResidual(const Window &window,
                                     llvm::ArrayRef<Pulse> pulses) {
  std::int64_t integral = 0, sign = 1, last = 2 * window.start;
  for (const Pulse &pulse : pulses) {
    std::int64_t centre = 2 * pulse.start + pulse.width;
    integral += sign * (centre - last);
    sign = -sign;
    last = centre;
  }
  return integral + sign * (2 * (window.start + window.length) - last);
}

std::int64_t property::leastLength(std::int64_t start,
                                   llvm::ArrayRef<std::int64_t> widths,
                                   const RandomDevice &device) {
  std::int64_t now = start;
  for (size_t i = 0; i < widths.size(); ++i)
    now = device.aligned(now + (i ? device.gap : 0)) + widths[i];
  return now - start;
}

/// From the residual to what it should be, in half ticks.
static double twiceMiss(const Window &window, llvm::ArrayRef<Pulse> pulses,
                        double imbalance) {
  return std::abs(double(twiceResidual(window, pulses)) -
                  2 * imbalance * double(window.length));
}

/// The smallest miss of all placements; none if there are more than some
/// thousands.
static std::optional<double> searched(const Window &window,
                                      llvm::ArrayRef<Pulse> pulses,
                                      double imbalance,
                                      const RandomDevice &device) {
  constexpr int most = 4000;
  int tried = 0;
  double best = std::numeric_limits<double>::infinity();
  std::vector<Pulse> placed(pulses.begin(), pulses.end());
  std::vector<std::int64_t> widths;
  for (const Pulse &pulse : pulses)
    widths.push_back(pulse.width);
  std::function<void(size_t, std::int64_t)> place = [&](size_t index,
                                                        std::int64_t from) {
    if (tried > most)
      return;
    if (index == placed.size()) {
      ++tried;
      best = std::min(best, twiceMiss(window, placed, imbalance));
      return;
    }
    // What is left must fit behind.
    for (std::int64_t start = device.aligned(from);
         leastLength(start, llvm::ArrayRef(widths).drop_front(index), device) <=
             window.start + window.length - start &&
         tried <= most;
         start += device.step) {
      placed[index].start = start;
      place(index + 1, start + widths[index] + device.gap);
    }
  };
  place(0, window.start);
  if (tried > most)
    return std::nullopt;
  return best;
}

void property::checkResidual(const Window &window, llvm::ArrayRef<Pulse> pulses,
                             double imbalance, const RandomDevice &device) {
  if (pulses.empty())
    return;
  // The instants have small denominators or are balanced: two misses differ by
  // far more, or by nothing.
  constexpr double Rounding = 1e-6;
  double found = twiceMiss(window, pulses, imbalance);
  bool equal = llvm::all_of(
      pulses, [&](const Pulse &p) { return p.width == pulses[0].width; });
  std::int64_t count = std::int64_t(pulses.size()), step = device.step;
  if (equal && count % 2 == 0) {
    // Between pulse 1 and 2, 3 and 4, ... the sign is minus, and these times
    // are multiples of the step: the residual is T - 2 S with S one. S is at
    // least what the pulses need; at most, all slack is in these times.
    double minus = (1 - imbalance) / 2 * double(window.length);
    std::int64_t units = std::int64_t(minus) / step;
    std::int64_t pitch = device.aligned(pulses[0].width + device.gap);
    std::int64_t slack =
        window.start + window.length -
        (device.aligned(window.start) + (count - 1) * pitch + pulses[0].width);
    std::int64_t least = count / 2 * pitch, most = least + slack / step * step;
    double best = std::numeric_limits<double>::infinity();
    for (std::int64_t near : {units, units + 1})
      best = std::min(
          best, std::abs(minus - double(std::clamp(near * step, least, most))));
    EXPECT_NEAR(found, 4 * best, Rounding)
        << "in a window of " << window.length;
  }
  if (count > 6)
    return;
  if (std::optional<double> best = searched(window, pulses, imbalance, device))
    EXPECT_NEAR(found, *best, Rounding) << "in a window of " << window.length;
}
