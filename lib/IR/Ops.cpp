//===- Ops.cpp - Operations of programs -------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Ops.h"

#include "lull/IR/Assembly.h"
#include "lull/Timing/Fault.h"

#include "mlir/IR/DialectImplementation.h"
#include "llvm/ADT/DenseSet.h"

#include <cmath>

using namespace lull;
using namespace mlir;

#define GET_OP_CLASSES
#include "lull/IR/LullOps.cpp.inc"

//===----------------------------------------------------------------------===//
// Verifiers, by the constraints of docs/Spec.md
//===----------------------------------------------------------------------===//

/// P2: a property among the discardable attributes would be ignored.
static LogicalResult verifyNoStray(Operation *op, ArrayRef<StringRef> names) {
  if (op->getDiscardableAttrDictionary().empty())
    return success();
  for (StringRef name : names)
    if (op->hasAttr(name) && !op->getInherentAttr(name))
      return op->emitOpError()
             << "'" << name
             << "' is a property and has no effect among the attributes";
  return success();
}

/// T1, P1: a duration that got lost, or runs backward.
static LogicalResult verifyDuration(Operation *op, Duration duration,
                                    bool required) {
  if (failed(verifyNoStray(op, {"duration"})))
    return failure();
  if (duration.isMissing())
    return op->emitOpError("the property 'duration' is missing");
  // T2: these have no duration but their own.
  if (required && !duration.isSet())
    return op->emitOpError("needs a duration: for 64 dt, for 35.5 ns");
  if (duration.isNegative())
    return op->emitOpError() << "duration " << duration.str() << " is negative";
  return success();
}

/// Q1, Q2: at least one qubit, none twice.
static LogicalResult verifyQubits(Operation *op, OperandRange qubits) {
  if (qubits.empty())
    return op->emitOpError("acts on no qubit");
  if (qubits.size() == 1)
    return success();
  if (qubits.size() == 2 && qubits[0] != qubits[1])
    return success();
  llvm::SmallDenseMap<Value, unsigned, 8> seen;
  for (auto [index, qubit] : llvm::enumerate(qubits)) {
    auto [place, isNew] = seen.try_emplace(qubit, index);
    if (!isNew)
      return op->emitOpError()
             << "qubit " << index << " is the same as qubit " << place->second;
  }
  return success();
}

/// S1, S2: what carries qubits on has their types and their number.
static LogicalResult verifyCarried(Operation *op, TypeRange qubits,
                                   TypeRange carried) {
  if (carried.empty())
    return success();
  if (qubits.size() != carried.size())
    return op->emitOpError() << "carries " << carried.size()
                             << " qubits on when it takes " << qubits.size();
  for (auto [index, pair] : llvm::enumerate(llvm::zip(qubits, carried)))
    if (std::get<0>(pair) != std::get<1>(pair))
      return op->emitOpError()
             << "carries qubit " << index << " on as " << std::get<1>(pair)
             << " when it should be " << std::get<0>(pair);
  return success();
}

static void collectOperands(MutableArrayRef<OpOperand> operands,
                            SmallVectorImpl<OpOperand *> &qubits) {
  for (OpOperand &operand : operands)
    qubits.push_back(&operand);
}

//===----------------------------------------------------------------------===//
// QubitOp
//===----------------------------------------------------------------------===//

LogicalResult QubitOp::verify() {
  // Q6: not negative.
  if (int64_t site = getSite(); site < 0)
    return emitOpError() << "site " << site << " is negative";
  return success();
}

void QubitOp::getAsmResultNames(OpAsmSetValueNameFn setNameFn) {
  setNameFn(getQubit(), "q" + std::to_string(int64_t(getSite())));
}

//===----------------------------------------------------------------------===//
// GateOp
//===----------------------------------------------------------------------===//

void GateOp::build(OpBuilder &, OperationState &state, StringAttr gate,
                   ArrayRef<Angle> angles, ValueRange qubits,
                   Duration duration) {
  state.addOperands(qubits);
  Properties &properties = state.getOrAddProperties<Properties>();
  properties.gate = gate;
  properties.angles.stated = true;
  properties.angles.angles.assign(angles.begin(), angles.end());
  properties.duration = duration;
}

LogicalResult GateOp::verify() {
  if (failed(verifyDuration(*this, getDuration(), /*required=*/false)) ||
      failed(verifyNoStray(*this, {"angles"})) ||
      failed(verifyQubits(*this, getQubits())))
    return failure();
  // P8: a name.
  if (getGate().empty())
    return emitOpError("has an empty name");
  const AngleList &angles = getAngles();
  if (!angles.stated)
    return emitOpError("the property 'angles' is missing");
  for (auto [index, angle] : llvm::enumerate(angles.angles)) {
    // P5: finite.
    if (angle.isMissing())
      return emitOpError() << "angle " << index << " is missing";
    if (!std::isfinite(angle.value()))
      return emitOpError() << "angle " << index << ", " << angle.str()
                           << ", is not a finite number";
    // P6: room for sums.
    if (angle.isExact() && !Angle::isSound(angle.multiple()))
      return emitOpError() << "angle " << index << ", " << angle.str()
                           << ", goes beyond " << Angle::mostTerm;
  }
  return success();
}

OperationKind GateOp::getOperationKind() { return OperationKind::Gate; }
StringAttr GateOp::getListedName() { return getGateAttr(); }
void GateOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}

//===----------------------------------------------------------------------===//
// MeasureOp, ResetOp
//===----------------------------------------------------------------------===//

LogicalResult MeasureOp::verify() {
  return verifyDuration(*this, getDuration(), /*required=*/false);
}
OperationKind MeasureOp::getOperationKind() { return OperationKind::Measure; }
StringAttr MeasureOp::getListedName() {
  return StringAttr::get(getContext(), "measure");
}
void MeasureOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}
void MeasureOp::getAsmResultNames(OpAsmSetValueNameFn setNameFn) {
  setNameFn(getBit(), "m");
}

LogicalResult ResetOp::verify() {
  return verifyDuration(*this, getDuration(), /*required=*/false);
}
OperationKind ResetOp::getOperationKind() { return OperationKind::Reset; }
StringAttr ResetOp::getListedName() {
  return StringAttr::get(getContext(), "reset");
}
void ResetOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}

//===----------------------------------------------------------------------===//
// BarrierOp, DelayOp
//===----------------------------------------------------------------------===//

LogicalResult BarrierOp::verify() { return verifyQubits(*this, getQubits()); }
OperationKind BarrierOp::getOperationKind() { return OperationKind::Barrier; }
void BarrierOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}

Duration BarrierOp::getDuration() { return Duration::ticks(0); }
void BarrierOp::setDuration(Duration) {}

LogicalResult DelayOp::verify() {
  if (failed(verifyDuration(*this, getDuration(), /*required=*/true)) ||
      failed(verifyQubits(*this, getQubits())))
    return failure();
  return verifyCarried(*this, getQubits().getTypes(), getCarried().getTypes());
}
OperationKind DelayOp::getOperationKind() { return OperationKind::Delay; }
void DelayOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}
Value DelayOp::getCarrier(unsigned index) {
  // The operation may be one that is yet to be refused.
  return index < getCarried().size() ? Value(getCarried()[index]) : Value();
}

//===----------------------------------------------------------------------===//
// IdleOp
//===----------------------------------------------------------------------===//

void IdleOp::build(OpBuilder &builder, OperationState &state, Value qubit,
                   Duration duration, WindowState windowState, bool carry) {
  state.addOperands(qubit);
  if (carry)
    state.addTypes(qubit.getType());
  Properties &properties = state.getOrAddProperties<Properties>();
  properties.duration = duration;
  properties.state = WindowStateAttr::get(builder.getContext(), windowState);
}

LogicalResult IdleOp::verify() {
  if (failed(verifyDuration(*this, getDuration(), /*required=*/true)))
    return failure();
  return verifyCarried(*this, getQubit().getType(), (*this)->getResultTypes());
}
OperationKind IdleOp::getOperationKind() { return OperationKind::Idle; }
void IdleOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}
Value IdleOp::getCarrier(unsigned) { return getCarried(); }
WindowState IdleOp::getWindowState() { return getState(); }
PlanAttr IdleOp::getWindowPlan() { return getPlanAttr(); }
void IdleOp::setWindowPlan(PlanAttr plan) { setPlanAttr(plan); }

//===----------------------------------------------------------------------===//
// PulseOp
//===----------------------------------------------------------------------===//

void PulseOp::build(OpBuilder &builder, OperationState &state, Value qubit,
                    Fraction phase, Duration duration, bool last, bool carry) {
  state.addOperands(qubit);
  if (carry)
    state.addTypes(qubit.getType());
  Properties &properties = state.getOrAddProperties<Properties>();
  properties.phase = Angle::ofPi(phase);
  properties.duration = duration;
  if (last)
    properties.last = builder.getUnitAttr();
}

LogicalResult PulseOp::verify() {
  if (failed(verifyDuration(*this, getDuration(), /*required=*/true)) ||
      failed(verifyNoStray(*this, {"phase"})))
    return failure();
  if (getPhase().isMissing())
    return emitOpError("the property 'phase' is missing");
  // P7: exact.
  if (!getPhase().isExact())
    return emitOpError() << "phase " << getPhase().str()
                         << " is not an exact multiple of pi";
  // P6: room for sums.
  if (!Angle::isSound(getPhase().multiple()))
    return emitOpError() << "phase " << getPhase().str() << " goes beyond "
                         << Angle::mostTerm;
  return verifyCarried(*this, getQubit().getType(), (*this)->getResultTypes());
}
OperationKind PulseOp::getOperationKind() { return OperationKind::Pulse; }
void PulseOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectOperands((*this)->getOpOperands(), qubits);
}
Value PulseOp::getCarrier(unsigned) { return getCarried(); }
Angle PulseOp::getPulsePhase() { return getPhase(); }
bool PulseOp::isLastPulse() { return getLast(); }
