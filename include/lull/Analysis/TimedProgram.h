//===- TimedProgram.h - A function as a scheduling problem ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_TIMEDPROGRAM_H
#define LULL_ANALYSIS_TIMEDPROGRAM_H

#include "lull/IR/Interfaces.h"
#include "lull/Timing/Device.h"
#include "lull/Timing/Problem.h"

#include "mlir/Support/LLVM.h"

#include <vector>

namespace lull {

/// The timed operations of one function, numbered in program order, and the
/// scheduling problem that they are. Qubits are resources, one a site.
class TimedProgram {
public:
  /// Reads a function: one block, every operation on a qubit a timed one, every
  /// qubit of known site on the device, every duration known and on the clock.
  /// Emits an error where that is not so. Linear.
  static mlir::FailureOr<TimedProgram> read(mlir::Operation *function,
                                            const Device &device);

  mlir::Operation *function() const { return root; }
  const Device &device() const { return *target; }
  const Problem &problem() const { return input; }

  TimedOpInterface op(OpId id) const { return ops[id]; }
  /// The site of a qubit.
  SiteId site(ResourceId qubit) const { return sites[qubit]; }
  /// Whether the function receives the qubit as an argument.
  bool isHandedIn(ResourceId qubit) const { return handedIn[qubit]; }
  /// The value that stands for the qubit at the end of the function.
  mlir::Value lastValue(ResourceId qubit) const { return last[qubit]; }

private:
  mlir::Operation *root = nullptr;
  const Device *target = nullptr;
  Problem input;
  std::vector<TimedOpInterface> ops;
  std::vector<SiteId> sites;
  std::vector<bool> handedIn;
  std::vector<mlir::Value> last;
};

} // namespace lull

#endif // LULL_ANALYSIS_TIMEDPROGRAM_H
