//===- WindowStates.h - What waiting qubits hold ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_WINDOWSTATES_H
#define LULL_ANALYSIS_WINDOWSTATES_H

#include "lull/Analysis/TimedProgram.h"

#include <vector>

namespace lull {

/// What gates do to computational basis states, by their standard names.
enum class BasisAction : std::uint8_t {
  /// Not known to keep any: the outcome counts as a state that matters.
  Unknown,
  /// Diagonal (z, s, t, rz, p, cz, cp, ...): every qubit keeps what it has, and
  /// Z errors pass through to the same qubit.
  Diagonal,
  /// One qubit, basis states to basis states (x, y).
  Flip,
  /// All but the last qubit are controls; the last is flipped (cx, ccx).
  ControlledFlip,
  /// The two qubits exchange what they have (swap, iswap).
  Exchange,
};
BasisAction basisAction(llvm::StringRef gate);
/// The same by what the device says that the operation plays; Unknown for
/// Action::Kind::None too, where the name must tell.
BasisAction basisAction(const Action &plays);

/// What each qubit holds just before each operation on it and at the end, by a
/// dataflow over the whole function: forward whether it is in a basis state,
/// backward whether it will only be measured or reset. At the start qubits are
/// in a basis state, except those that the function receives, or all of them if
/// `liveAtStart`; at the end they are still wanted, unless `spentAtEnd`.
class WindowStates {
public:
  WindowStates(const TimedProgram &program, bool liveAtStart, bool spentAtEnd);

  /// What the `index`-th qubit of operation `after` holds while it waits for
  /// that operation.
  WindowState before(OpId after, size_t index) const {
    return stateOf(facts[first[after] + index]);
  }
  /// What the qubit holds at the end of the function.
  WindowState atEnd(ResourceId qubit) const { return stateOf(end[qubit]); }

private:
  struct Facts {
    bool basis : 1;
    bool spent : 1;
  };
  static WindowState stateOf(Facts facts);
  BasisAction actionOf(OpId id) const;
  void forward(bool liveAtStart);
  void backward(bool spentAtEnd);

  const TimedProgram &program;
  /// By operation and, in it, by qubit; `first[op]` is where op's begin.
  std::vector<Facts> facts;
  std::vector<std::uint32_t> first;
  /// By qubit.
  std::vector<Facts> end;
  std::vector<BasisAction> actions;
};

} // namespace lull

#endif // LULL_ANALYSIS_WINDOWSTATES_H
