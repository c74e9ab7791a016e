//===- Interfaces.h - TimedOpInterface and HostInterface --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// What a compiler's own dialect implements so that the passes run on it without
// conversion (docs/HowTo.md walks through it). Lull's own dialect implements
// both like any other host.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_INTERFACES_H
#define LULL_IR_INTERFACES_H

#include "lull/IR/Angle.h"
#include "lull/IR/Attributes.h"
#include "lull/Timing/Problem.h"

#include "mlir/IR/Builders.h"
#include "mlir/IR/DialectInterface.h"
#include "mlir/IR/OpDefinition.h"

namespace lull::detail {
// Defaults of TimedOpInterface: the attributes `lull.state` and `lull.plan`.
WindowState windowStateOf(mlir::Operation *op);
PlanAttr windowPlanOf(mlir::Operation *op);
void setWindowPlanOf(mlir::Operation *op, PlanAttr plan);
} // namespace lull::detail

#include "lull/IR/LullInterfaces.h.inc"

namespace lull {

/// How Lull reads and writes a dialect's qubits. Builders return the value to
/// be used for the qubit from there on: the same one in reference semantics,
/// the new result in value semantics; null after having emitted an error if the
/// dialect cannot say it, and the pass fails. They may build several operations
/// (constants, say), of dialects that are loaded: `dependentDialects` of the
/// host's own dialect sees to that. They are called for different functions
/// from several threads at once.
class HostInterface : public mlir::DialectInterface::Base<HostInterface> {
public:
  HostInterface(mlir::Dialect *dialect) : Base(dialect) {}

  /// Whether values of this type (of the dialect) are qubits.
  virtual bool isQubit(mlir::Type type) const = 0;

  /// The site of a qubit that no timed operation carries on: the result of
  /// whatever introduces it. Nothing if the IR does not say. (Block arguments
  /// are read from `lull.site` and never asked for.)
  virtual std::optional<SiteId> getSite(mlir::Value qubit) const = 0;

  /// An operation of the device on one qubit: a pulse or a frame change, by the
  /// name under which the device lists it.
  virtual mlir::Value buildGate(mlir::OpBuilder &builder, mlir::Location loc,
                                mlir::StringAttr name,
                                llvm::ArrayRef<Angle> angles, mlir::Value qubit,
                                Duration duration) const = 0;

  /// A wait that is to stay. Default: `lull.delay` on the host's qubit.
  virtual mlir::Value buildDelay(mlir::OpBuilder &builder, mlir::Location loc,
                                 mlir::Value qubit, Duration duration) const;

  /// A window, by the operation that is built last. A host with an idle of its
  /// own writes the state where its getWindowState reads it. Default:
  /// `lull.idle` on the host's qubit.
  virtual mlir::Value buildIdle(mlir::OpBuilder &builder, mlir::Location loc,
                                mlir::Value qubit, Duration duration,
                                WindowState state) const;

  /// Whether the dialect's operations carry qubits on as results. Decides what
  /// the default builders and `lull.pulse` give, and whether what returns a
  /// qubit must return the one behind its last wait.
  virtual bool hasValueSemantics() const { return false; }
};

/// The host that a type belongs to; null if its dialect is none or the type is
/// not a qubit of it.
const HostInterface *hostOf(mlir::Type type);

} // namespace lull

#endif // LULL_IR_INTERFACES_H
