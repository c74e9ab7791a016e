//===- ProgramReader.h - Operations with their times ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_PROGRAMREADER_H
#define LULL_ANALYSIS_PROGRAMREADER_H

#include "lull/IR/Interfaces.h"
#include "lull/Timing/Device.h"
#include "lull/Timing/Problem.h"

#include "mlir/Support/LLVM.h"
#include "llvm/ADT/DenseSet.h"

#include <vector>

namespace lull {

/// Reads the operations of a function in program order and times them by the
/// timing rule: an operation starts as soon as all its qubits are free. Emits
/// an error where a program cannot be timed: an operation on a qubit that is no
/// timed one, a qubit of unknown site or of none on the device, a duration that
/// is unknown or off the clock, an end beyond 64 bits.
///
/// Keeps what it needs of the qubits only, so a pass that looks at operations
/// one by one needs no memory for the program.
class ProgramReader {
public:
  ProgramReader(mlir::Operation *function, const Device &device)
      : function(function), target(&device) {}

  /// The one block of the function; fails if there are more.
  mlir::FailureOr<mlir::Block *> body();

  /// Fails if there is an operation on a qubit in a region of `op`.
  static llvm::LogicalResult requireUntimed(mlir::Operation *op);

  /// Fails if an idle or a pulse is on another number of qubits than one.
  static llvm::LogicalResult requireOneQubit(TimedOpInterface op, size_t count);

  /// Reads the next operation in program order. True if it is a timed one, and
  /// then the step below is about it; false if it concerns no qubit.
  mlir::FailureOr<bool> read(mlir::Operation *op);

  /// The operation that was read last.
  struct Step {
    TimedOpInterface op;
    OperationKind kind = OperationKind::Gate;
    Ticks duration = 0;
    Ticks start = 0;
    llvm::SmallVector<mlir::OpOperand *, 4> operands;
    /// The qubits by number, one an operand.
    llvm::SmallVector<ResourceId, 4> qubits;
  };
  const Step &step() const { return last; }

  /// The qubits so far.
  ResourceId numQubits() const { return ResourceId(sites.size()); }
  SiteId site(ResourceId qubit) const { return sites[qubit]; }
  /// The value that stands for the qubit now.
  mlir::Value value(ResourceId qubit) const { return values[qubit]; }
  /// Whether the function receives the qubit as an argument.
  bool isHandedIn(ResourceId qubit) const { return handedIn[qubit]; }

  /// Says that `to` stands for the qubit from here on and `from` no longer
  /// does, since the caller has replaced the operation that was read last.
  void carryOn(ResourceId qubit, mlir::Value from, mlir::Value to);

private:
  llvm::LogicalResult readTimed(TimedOpInterface op);
  llvm::LogicalResult readOther(mlir::Operation *op);
  /// Fails if `op` calls, by whatever way, a function with timed operations.
  llvm::LogicalResult requireUntimedCalls(mlir::Operation *op);
  /// Notes classical values that depend on what timed operations give, and
  /// fails if a timed operation takes one.
  llvm::LogicalResult followOutcomes(mlir::Operation *op);
  mlir::FailureOr<Ticks> durationOf(TimedOpInterface op);
  mlir::FailureOr<ResourceId> qubitOf(mlir::Value value, mlir::Operation *user);

  mlir::Operation *function;
  const Device *target;
  Step last;
  std::vector<SiteId> sites;
  std::vector<mlir::Value> values;
  std::vector<Ticks> clocks;
  std::vector<bool> handedIn;
  llvm::DenseMap<mlir::Value, ResourceId> byValue;
  llvm::DenseMap<SiteId, ResourceId> bySite;
  /// Classical values that depend on what timed operations gave.
  llvm::DenseSet<mlir::Value> outcomes;
  /// Functions that are called and have been looked at.
  llvm::DenseSet<mlir::Operation *> callees;
  /// The last type looked at and whether it is a qubit: types come in runs.
  mlir::Type lastType;
  bool lastIsQubit = false;
};

} // namespace lull

#endif // LULL_ANALYSIS_PROGRAMREADER_H
