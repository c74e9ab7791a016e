//===- Weave.cpp - A foreign dialect with value semantics -------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Weave.h"

#include "lull/IR/Dialect.h"

#include "mlir/Dialect/Arith/IR/Arith.h"
#include "mlir/IR/Builders.h"
#include "mlir/IR/DialectImplementation.h"
#include "llvm/ADT/TypeSwitch.h"

using namespace lull;
using namespace mlir;
using namespace weave;

#include "WeaveDialect.cpp.inc"
#define GET_TYPEDEF_CLASSES
#include "WeaveTypes.cpp.inc"
#define GET_OP_CLASSES
#include "Weave.cpp.inc"

//===----------------------------------------------------------------------===//
// The dialect
//===----------------------------------------------------------------------===//

namespace {

/// Delays and idles are left to the defaults: `lull.delay` and `lull.idle` on
/// strands.
struct WeaveHost : public HostInterface {
  using HostInterface::HostInterface;

  bool isQubit(Type type) const override { return isa<StrandType>(type); }

  bool hasValueSemantics() const override { return true; }

  std::optional<SiteId> getSite(Value qubit) const override {
    if (auto op = qubit.getDefiningOp<SpinOp>())
      return op.getSite();
    return std::nullopt;
  }

  Value buildGate(OpBuilder &builder, Location loc, StringAttr name,
                  ArrayRef<Angle> angles, Value qubit,
                  Duration duration) const override {
    SmallVector<Value, 2> inputs;
    for (Angle angle : angles)
      inputs.push_back(arith::ConstantOp::create(
          builder, loc, builder.getF64FloatAttr(angle.value())));
    inputs.push_back(qubit);
    auto lasts = DurationAttr::get(builder.getContext(), duration);
    auto op =
        ApplyOp::create(builder, loc, qubit.getType(), name, inputs, lasts);
    return op.getStrands().front();
  }
};

} // namespace

void WeaveDialect::initialize() {
  addTypes<
#define GET_TYPEDEF_LIST
#include "WeaveTypes.cpp.inc"
      >();
  addOperations<
#define GET_OP_LIST
#include "Weave.cpp.inc"
      >();
  addInterfaces<WeaveHost>();
}

//===----------------------------------------------------------------------===//
// What the operations share
//===----------------------------------------------------------------------===//

static void collectStrands(Operation *op,
                           SmallVectorImpl<OpOperand *> &qubits) {
  for (OpOperand &operand : op->getOpOperands())
    if (isa<StrandType>(operand.get().getType()))
      qubits.push_back(&operand);
}

static Duration durationOf(DurationAttr lasts) {
  return lasts ? lasts.getValue() : Duration::unset();
}

template <typename OpTy> static void setLasts(OpTy op, Duration duration) {
  op.setLastsAttr(DurationAttr::get(op.getContext(), duration));
}

//===----------------------------------------------------------------------===//
// ApplyOp
//===----------------------------------------------------------------------===//

LogicalResult ApplyOp::verify() {
  size_t taken =
      llvm::count_if(getInputs().getTypes(), llvm::IsaPred<StrandType>);
  if (taken == getStrands().size())
    return success();
  return emitOpError() << "takes " << taken << " strands and gives back "
                       << getStrands().size();
}

OperationKind ApplyOp::getOperationKind() { return OperationKind::Gate; }
StringAttr ApplyOp::getListedName() { return getGateAttr(); }
void ApplyOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectStrands(*this, qubits);
}
Value ApplyOp::getCarrier(unsigned index) { return getStrands()[index]; }
Duration ApplyOp::getDuration() { return durationOf(getLastsAttr()); }
void ApplyOp::setDuration(Duration duration) { setLasts(*this, duration); }

//===----------------------------------------------------------------------===//
// LookOp, FreshOp, KnotOp
//===----------------------------------------------------------------------===//

OperationKind LookOp::getOperationKind() { return OperationKind::Measure; }
StringAttr LookOp::getListedName() {
  return StringAttr::get(getContext(), "measure");
}
void LookOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectStrands(*this, qubits);
}
Value LookOp::getCarrier(unsigned) { return getNext(); }
Duration LookOp::getDuration() { return durationOf(getLastsAttr()); }
void LookOp::setDuration(Duration duration) { setLasts(*this, duration); }

OperationKind FreshOp::getOperationKind() { return OperationKind::Reset; }
StringAttr FreshOp::getListedName() {
  return StringAttr::get(getContext(), "reset");
}
void FreshOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectStrands(*this, qubits);
}
Value FreshOp::getCarrier(unsigned) { return getNext(); }
Duration FreshOp::getDuration() { return durationOf(getLastsAttr()); }
void FreshOp::setDuration(Duration duration) { setLasts(*this, duration); }

OperationKind KnotOp::getOperationKind() { return OperationKind::Barrier; }
void KnotOp::collectQubits(SmallVectorImpl<OpOperand *> &qubits) {
  collectStrands(*this, qubits);
}
Value KnotOp::getCarrier(unsigned index) { return getNext()[index]; }
Duration KnotOp::getDuration() { return Duration::ticks(0); }
void KnotOp::setDuration(Duration) {}
