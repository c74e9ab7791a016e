//===- Net.cpp - What the pulses of a sequence multiply to ----------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Net.h"

#include "lull/Timing/Fault.h"

#include "llvm/Support/MathExtras.h"

#include <cmath>
#include <limits>

using namespace lull;

//===----------------------------------------------------------------------===//
// By the alternating sum
//===----------------------------------------------------------------------===//

static std::string spellAngle(Fraction angle) {
  if (angle.isZero())
    return "0";
  if (angle == Fraction(1))
    return "pi";
  return angle.str() + " pi";
}

std::string Net::str() const {
  switch (kind) {
  case Kind::Identity:
    return "identity";
  case Kind::FrameRotation:
    return "a rotation about z by " + spellAngle(angle);
  case Kind::Pulse:
    return "a pi pulse of phase " + spellAngle(angle);
  }
  llvm_unreachable("all kinds are handled");
}

/// An angle modulo 2, unless twice its denominator does not fit.
static std::optional<Fraction> wrap(Fraction angle) {
  if (angle.denominator() > std::numeric_limits<std::int64_t>::max() / 2)
    return std::nullopt;
  return angle.modulo(2);
}

llvm::Expected<Net> lull::netBySum(llvm::ArrayRef<Fraction> phases) {
  Fraction sum = 0;
  for (size_t i = 0; i < phases.size(); ++i) {
    std::optional<Fraction> next = wrap(phases[i]);
    if (next)
      next = i % 2 == 0 ? sum.plus(*next) : sum.minus(*next);
    if (next)
      next = wrap(*next);
    if (!next)
      return fault("the common denominator of the first {} phases does not fit "
                   "64 bits",
                   i + 1);
    sum = *next;
  }

  if (phases.size() % 2 == 1)
    return Net{Net::Kind::Pulse, sum};
  if (sum.isWhole())
    return Net{Net::Kind::Identity, 0};
  // -2 sum modulo 2 is 2 (1 - (sum modulo 1)).
  std::optional<Fraction> angle = Fraction(1).minus(sum.modulo(1));
  if (angle)
    angle = angle->times(2);
  if (!angle)
    return fault("twice the angle {} does not fit 64 bits", sum.str());
  return Net{Net::Kind::FrameRotation, *angle};
}

llvm::Expected<Sequence> lull::close(const Sequence &sequence) {
  llvm::Expected<Net> net = netBySum(sequence.phases);
  if (!net)
    return net.takeError();
  switch (net->kind) {
  case Net::Kind::Identity:
    return sequence;
  case Net::Kind::FrameRotation:
    return fault("the {} pulses of '{}' leave {}, which no further pulse "
                 "undoes",
                 sequence.size(), sequence.name, net->str());
  case Net::Kind::Pulse:
    break;
  }
  // Of the two phases that close it, net and net + pi, the first one continues
  // a train of equal pulses, whose detuning errors then cancel in pairs.
  Sequence result = sequence;
  result.phases.push_back(net->angle);
  result.instants.push_back(Instant::at(Fraction(1)));
  result.anchor = Anchor::End;
  return result;
}

//===----------------------------------------------------------------------===//
// By matrices
//===----------------------------------------------------------------------===//

Matrix2 lull::identity2() { return {1, 0, 0, 1}; }

Matrix2 lull::multiply(const Matrix2 &left, const Matrix2 &right) {
  return {left[0] * right[0] + left[1] * right[2],
          left[0] * right[1] + left[1] * right[3],
          left[2] * right[0] + left[3] * right[2],
          left[2] * right[1] + left[3] * right[3]};
}

Matrix2 lull::rotationXY(double theta, double phi) {
  using Complex = std::complex<double>;
  double cosine = std::cos(theta / 2);
  Complex minusISine(0, -std::sin(theta / 2));
  return {cosine, minusISine * std::polar(1.0, -phi),
          minusISine * std::polar(1.0, phi), cosine};
}

Matrix2 lull::rotationZ(double a) {
  return {std::polar(1.0, -a / 2), 0, 0, std::polar(1.0, a / 2)};
}

Matrix2 lull::product(llvm::ArrayRef<Fraction> phases) {
  Matrix2 result = identity2();
  for (Fraction phase : phases)
    result = multiply(
        rotationXY(llvm::numbers::pi, phase.toDouble() * llvm::numbers::pi),
        result);
  return result;
}

double lull::distanceUpToPhase(const Matrix2 &a, const Matrix2 &b) {
  std::complex<double> trace = 0;
  for (size_t i = 0; i < 4; ++i)
    trace += std::conj(a[i]) * b[i];
  return 1 - std::abs(trace) / 2;
}
