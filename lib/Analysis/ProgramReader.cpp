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
#include "lull/Timing/Fault.h"

#include "mlir/Interfaces/CallInterfaces.h"

using namespace lull;
using namespace mlir;

static LogicalResult emitStale(Operation *user) {
  return user->emitError("takes a qubit value that an earlier operation has "
                         "carried on");
}

FailureOr<ResourceId> ProgramReader::qubitOf(Value value, Operation *user) {
  if (auto known = byValue.find(value); known != byValue.end()) {
    if (known->second != NoResource)
      return known->second;
    // S3: not used up.
    return emitStale(user);
  }
  std::optional<SiteId> site = originOf(value, function);
  // Q7, Q3: a known site of the device.
  if (!site)
    return emitUnknownSite(user, value);
  if (!target->hasSite(*site))
    return emitNoSite(user, *site, *target);
  auto [place, isNew] = bySite.try_emplace(*site, numQubits());
  if (isNew) {
    sites.push_back(*site);
    values.push_back(value);
    clocks.push_back(0);
    handedIn.push_back(false);
  }
  if (isa<BlockArgument>(value))
    handedIn[place->second] = true;
  return byValue[value] = place->second;
}

FailureOr<Ticks> ProgramReader::durationOf(TimedOpInterface op) {
  if (last.kind == OperationKind::Barrier)
    return Ticks(0);
  Duration duration = op.getDuration();
  if (duration.unit() == TimeUnit::dt && !duration.isNegative())
    return duration.amount();
  // W5: a duration.
  if (!duration.isSet())
    return op->emitError("'")
           << nameOf(op)
           << (op.getListedName()
                   ? "' has no duration: state one, or run lull-set-durations "
                     "first"
                   : "' has no duration");
  // T1, T3, T8: on the clock.
  llvm::Expected<Ticks> ticks = target->clock().toTicks(duration);
  if (!ticks)
    return op->emitError(llvm::toString(ticks.takeError()));
  return *ticks;
}

void ProgramReader::carryOn(ResourceId qubit, Value from, Value to) {
  if (from == to)
    return;
  byValue[from] = NoResource;
  byValue[to] = qubit;
  values[qubit] = to;
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
  if (failed(requireOneQubit(op, last.qubits.size())) ||
      failed(followOutcomes(op)))
    return failure();
  FailureOr<Ticks> duration = durationOf(op);
  if (failed(duration))
    return failure();
  last.duration = *duration;
  Ticks end = 0;
  // T9: an end in 64 bits.
  if (__builtin_add_overflow(last.start, last.duration, &end)) {
    emitOverflow(op, last.start, last.duration);
    return failure();
  }
  bool carries = op->getNumResults() != 0;
  for (auto [index, qubit] : llvm::enumerate(last.qubits)) {
    clocks[qubit] = end;
    if (Value carrier = carries ? op.getCarrier(index) : Value())
      carryOn(qubit, last.operands[index]->get(), carrier);
  }
  return success();
}

LogicalResult ProgramReader::requireOneQubit(TimedOpInterface op,
                                             size_t count) {
  OperationKind kind = op.getOperationKind();
  // Q8: a window is one qubit's, and so is a pulse.
  if (count == 1 ||
      (kind != OperationKind::Idle && kind != OperationKind::Pulse))
    return success();
  return op->emitError("'")
         << nameOf(op) << "' acts on " << counted(count, "qubit")
         << " when it should act on 1";
}

LogicalResult ProgramReader::followOutcomes(Operation *op) {
  bool timed = isa<TimedOpInterface>(op);
  // Most operations take qubits only and give nothing. What is used inside of
  // an operation counts as used by it.
  auto takesOutcome = [&](Operation *at) {
    return llvm::any_of(at->getOperands(), [&](Value operand) {
      return outcomes.contains(operand);
    });
  };
  bool depends = false;
  if (!outcomes.empty())
    depends = op->getNumRegions() == 0
                  ? takesOutcome(op)
                  : op->walk([&](Operation *inner) {
                        return takesOutcome(inner) ? WalkResult::interrupt()
                                                   : WalkResult::advance();
                      }).wasInterrupted();
  // W28: an outcome is there when its operation ends, which the timing rule
  // does not know.
  if (timed && depends)
    return op->emitError("depends on the outcome of an operation: it cannot be "
                         "scheduled yet");
  if (op->getNumResults() == 0)
    return success();
  for (OpResult result : op->getResults()) {
    if (result.getType() != lastType) {
      lastType = result.getType();
      lastIsQubit = hostOf(lastType);
    }
    if ((timed || depends) && !lastIsQubit)
      outcomes.insert(result);
  }
  return success();
}

LogicalResult ProgramReader::requireUntimed(Operation *op) {
  if (op->getNumRegions() == 0)
    return success();
  Operation *inner = nullptr;
  op->walk([&](Operation *at) {
    bool takesQubit = llvm::any_of(at->getOperandTypes(),
                                   [](Type type) { return hostOf(type); });
    if (!isa<TimedOpInterface>(at) && !takesQubit)
      return WalkResult::advance();
    inner = at;
    return WalkResult::interrupt();
  });
  // W3: no time and no qubits in regions.
  if (!inner)
    return success();
  InFlightDiagnostic diag =
      op->emitError("operations on qubits in a region cannot be scheduled yet");
  diag.attachNote(inner->getLoc()) << "an operation on a qubit is here";
  return diag;
}

LogicalResult ProgramReader::requireUntimedCalls(Operation *op) {
  SmallVector<Operation *> pending = {op};
  while (!pending.empty()) {
    Operation *timed = nullptr;
    pending.pop_back_val()->walk([&](Operation *at) {
      if (isa<TimedOpInterface>(at)) {
        timed = at;
        return WalkResult::interrupt();
      }
      if (auto call = dyn_cast<CallOpInterface>(at))
        if (Operation *callee = call.resolveCallable();
            callee && callees.insert(callee).second)
          pending.push_back(callee);
      return WalkResult::advance();
    });
    if (!timed)
      continue;
    // W30: how long it takes here, and on which qubits, is unknown.
    callees.clear();
    InFlightDiagnostic diag =
        op->emitError("calls a function with timed operations, which cannot "
                      "be scheduled yet");
    diag.attachNote(timed->getLoc()) << "a timed operation is here";
    return diag;
  }
  return success();
}

LogicalResult ProgramReader::readOther(Operation *op) {
  if (failed(requireUntimed(op)) || failed(followOutcomes(op)))
    return failure();
  if ((op->getNumRegions() || isa<CallOpInterface>(op)) &&
      failed(requireUntimedCalls(op)))
    return failure();
  // What a terminator hands on is not acted on, but must be there to hand on.
  if (op->hasTrait<OpTrait::IsTerminator>())
    return success(llvm::none_of(op->getOperands(), [&](Value operand) {
      auto known = byValue.find(operand);
      return known != byValue.end() && known->second == NoResource &&
             failed(emitStale(op));
    }));
  for (Value operand : op->getOperands()) {
    if (operand.getType() != lastType) {
      lastType = operand.getType();
      lastIsQubit = hostOf(lastType);
    }
    // W4: nothing unknown happens to a qubit.
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
  // W2: one block.
  if (region.hasOneBlock())
    return &region.front();
  return function->emitError("has ")
         << region.getBlocks().size()
         << " blocks: unstructured control flow cannot be scheduled";
}
