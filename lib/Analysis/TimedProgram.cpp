//===- TimedProgram.cpp - A function as a scheduling problem ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/TimedProgram.h"

#include "lull/Analysis/Report.h"
#include "lull/IR/QubitSites.h"

using namespace lull;
using namespace mlir;

namespace lull {

/// Reads one function into a TimedProgram.
class ProgramReader {
public:
  ProgramReader(Operation *function, const Device &device) {
    program.root = function;
    program.target = &device;
  }

  FailureOr<TimedProgram> run();

private:
  LogicalResult readTimed(TimedOpInterface op);
  LogicalResult readOther(Operation *op);
  FailureOr<Ticks> durationOf(TimedOpInterface op);
  /// The resource of a qubit value that `user` takes.
  FailureOr<ResourceId> qubitOf(Value value, Operation *user);

  TimedProgram program;
  DenseMap<Value, ResourceId> byValue;
  DenseMap<SiteId, ResourceId> bySite;
  SmallVector<OpOperand *, 4> operands;
  SmallVector<ResourceId, 4> qubits;
  /// The last type looked at and whether it is a qubit: types come in runs.
  Type lastType;
  bool lastIsQubit = false;
};

} // namespace lull

FailureOr<ResourceId> ProgramReader::qubitOf(Value value, Operation *user) {
  if (auto known = byValue.find(value); known != byValue.end()) {
    if (known->second != NoResource)
      return known->second;
    return user->emitError("takes a qubit value that an earlier operation has "
                           "carried on");
  }
  std::optional<SiteId> site = originOf(value, program.root);
  if (!site)
    return emitUnknownSite(user, value);
  if (!program.target->hasSite(*site))
    return emitNoSite(user, *site, *program.target);
  auto [place, isNew] = bySite.try_emplace(*site, 0);
  if (isNew) {
    place->second = program.input.addQubit();
    program.sites.push_back(*site);
    program.last.push_back(value);
  }
  return byValue[value] = place->second;
}

FailureOr<Ticks> ProgramReader::durationOf(TimedOpInterface op) {
  if (op.getOperationKind() == OperationKind::Barrier)
    return Ticks(0);
  Duration duration = op.getDuration();
  if (duration.unit() == TimeUnit::dt && !duration.isNegative())
    return duration.amount();
  if (!duration.isSet())
    return op->emitError("'")
           << nameOf(op)
           << "' has no duration: write one with 'for', or run "
              "lull-set-durations first";
  llvm::Expected<Ticks> ticks = program.target->clock().toTicks(duration);
  if (!ticks)
    return op->emitError(llvm::toString(ticks.takeError()));
  return *ticks;
}

LogicalResult ProgramReader::readTimed(TimedOpInterface op) {
  operands.clear();
  qubits.clear();
  op.collectQubits(operands);
  for (OpOperand *operand : operands) {
    FailureOr<ResourceId> qubit = qubitOf(operand->get(), op);
    if (failed(qubit))
      return failure();
    qubits.push_back(*qubit);
  }
  for (unsigned i = 0; i < qubits.size(); ++i) {
    Value carrier = op.getCarrier(i);
    if (!carrier)
      continue;
    byValue[operands[i]->get()] = NoResource;
    byValue[carrier] = qubits[i];
    program.last[qubits[i]] = carrier;
  }
  FailureOr<Ticks> duration = durationOf(op);
  if (failed(duration))
    return failure();
  program.input.add(op.getOperationKind(), *duration, qubits);
  program.ops.push_back(op);
  return success();
}

LogicalResult ProgramReader::readOther(Operation *op) {
  if (op->getNumRegions()) {
    Operation *inner = nullptr;
    op->walk([&](TimedOpInterface timed) {
      inner = timed;
      return WalkResult::interrupt();
    });
    if (inner) {
      InFlightDiagnostic diag =
          op->emitError("timed operations in a region cannot be scheduled yet");
      diag.attachNote(inner->getLoc()) << "a timed operation is here";
      return diag;
    }
  }
  if (op->hasTrait<OpTrait::IsTerminator>())
    return success();
  for (Value operand : op->getOperands()) {
    if (operand.getType() != lastType) {
      lastType = operand.getType();
      lastIsQubit = hostOf(lastType);
    }
    if (lastIsQubit)
      return op->emitError("acts on a qubit but is no timed operation: what it "
                           "does and how long it takes is unknown");
  }
  return success();
}

FailureOr<TimedProgram> ProgramReader::run() {
  Operation *function = program.root;
  Region &body = function->getRegion(0);
  if (!body.hasOneBlock())
    return function->emitError("has ")
           << body.getBlocks().size()
           << " blocks: unstructured control flow cannot be scheduled";
  Block &block = body.front();
  for (Operation &op : block) {
    auto timed = dyn_cast<TimedOpInterface>(op);
    if (failed(timed ? readTimed(timed) : readOther(&op)))
      return failure();
  }
  if (failed(report(program, program.input.check())))
    return failure();
  return std::move(program);
}

FailureOr<TimedProgram> TimedProgram::read(Operation *function,
                                           const Device &device) {
  return ProgramReader(function, device).run();
}
