//===- ProgramReader.cpp - A function's operations, one by one --*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/ProgramReader.h"

#include "lull/Analysis/Report.h"
#include "lull/IR/QubitSites.h"

using namespace lull;
using namespace mlir;

FailureOr<ResourceId> ProgramReader::qubitOf(Value value, Operation *user) {
  if (auto known = byValue.find(value); known != byValue.end()) {
    if (known->second != NoResource)
      return known->second;
    return user->emitError("takes a qubit value that an earlier operation has "
                           "carried on");
  }
  std::optional<SiteId> site = originOf(value, function);
  if (!site)
    return emitUnknownSite(user, value);
  if (!target->hasSite(*site))
    return emitNoSite(user, *site, *target);
  auto [place, isNew] = bySite.try_emplace(*site, numQubits());
  if (isNew) {
    sites.push_back(*site);
    values.push_back(value);
    clocks.push_back(0);
  }
  return byValue[value] = place->second;
}

FailureOr<Ticks> ProgramReader::durationOf(TimedOpInterface op) {
  if (last.kind == OperationKind::Barrier)
    return Ticks(0);
  Duration duration = op.getDuration();
  if (duration.unit() == TimeUnit::dt && !duration.isNegative())
    return duration.amount();
  if (!duration.isSet())
    return op->emitError("'")
           << nameOf(op)
           << "' has no duration: write one with 'for', or run "
              "lull-set-durations first";
  llvm::Expected<Ticks> ticks = target->clock().toTicks(duration);
  if (!ticks)
    return op->emitError(llvm::toString(ticks.takeError()));
  return *ticks;
}

void ProgramReader::carryOn(ResourceId qubit, Value value) {
  if (value == values[qubit])
    return;
  byValue[values[qubit]] = NoResource;
  byValue[value] = qubit;
  values[qubit] = value;
}

LogicalResult ProgramReader::readTimed(TimedOpInterface op) {
  last.op = op;
  last.kind = op.getOperationKind();
  last.start = 0;
  last.operands.clear();
  last.qubits.clear();
  op.collectQubits(last.operands);
  for (OpOperand *operand : last.operands) {
    FailureOr<ResourceId> qubit = qubitOf(operand->get(), op);
    if (failed(qubit))
      return failure();
    last.qubits.push_back(*qubit);
    last.start = std::max(last.start, clocks[*qubit]);
  }
  FailureOr<Ticks> duration = durationOf(op);
  if (failed(duration))
    return failure();
  last.duration = *duration;
  Ticks end = 0;
  if (__builtin_add_overflow(last.start, last.duration, &end)) {
    emitOverflow(op, last.start, last.duration);
    return failure();
  }
  bool carries = op->getNumResults() != 0;
  for (auto [index, qubit] : llvm::enumerate(last.qubits)) {
    clocks[qubit] = end;
    if (Value carrier = carries ? op.getCarrier(index) : Value())
      carryOn(qubit, carrier);
  }
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

FailureOr<bool> ProgramReader::read(Operation *op) {
  auto timed = dyn_cast<TimedOpInterface>(op);
  if (failed(timed ? readTimed(timed) : readOther(op)))
    return failure();
  return bool(timed);
}

FailureOr<Block *> ProgramReader::body() {
  Region &region = function->getRegion(0);
  if (region.hasOneBlock())
    return &region.front();
  return function->emitError("has ")
         << region.getBlocks().size()
         << " blocks: unstructured control flow cannot be scheduled";
}
