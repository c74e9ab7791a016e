//===- Net.h - What the pulses of a sequence multiply to --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_SEQUENCE_NET_H
#define LULL_SEQUENCE_NET_H

#include "lull/Sequence/Sequence.h"

#include <array>
#include <complex>

namespace lull {

/// The product of the ideal pulses, up to a global phase.
struct Net {
  enum class Kind : std::uint8_t {
    Identity,
    /// Rz(angle), an even number of pulses whose phases do not add up.
    FrameRotation,
    /// R_angle(pi), an odd number of pulses.
    Pulse,
  };
  Kind kind = Kind::Identity;
  /// In units of pi, in [0, 2).
  Fraction angle = 0;

  /// `identity`, `a rotation about z by 1/2 pi`, `a pi pulse of phase 5/6 pi`.
  std::string str() const;
};

/// The net effect by the alternating-sum rule: with a = phi_1 - phi_2 + ...,
/// an even number of pulses gives (up to sign) Rz(-2a), an odd one R_a(pi).
/// Exact. Fails if the phases' common denominator does not fit 64 bits.
llvm::Expected<Net> netBySum(llvm::ArrayRef<Fraction> phases);

/// A 2x2 complex matrix, row by row.
using Matrix2 = std::array<std::complex<double>, 4>;
Matrix2 identity2();
Matrix2 multiply(const Matrix2 &left, const Matrix2 &right);
/// R_phi(theta) = exp(-i theta/2 (cos phi X + sin phi Y)), angles in radians.
Matrix2 rotationXY(double theta, double phi);
/// Rz(a) = exp(-i a Z/2), in radians.
Matrix2 rotationZ(double a);

/// The same by matrix product, sharing no code with netBySum: the product of
/// the pulses (the first acts first).
Matrix2 product(llvm::ArrayRef<Fraction> phases);
/// 1 - |Tr(A^dagger B)| / 2: zero exactly if equal up to a global phase.
double distanceUpToPhase(const Matrix2 &a, const Matrix2 &b);

/// The sequence itself if its net is the identity. If one pulse makes it so (an
/// odd number of pulses), the sequence with that pulse at the end of the
/// window, all pulses then anchored at their ends, which keeps it balanced.
/// Fails for an even number of pulses whose phases do not add up.
llvm::Expected<Sequence> close(const Sequence &sequence);

} // namespace lull

#endif // LULL_SEQUENCE_NET_H
