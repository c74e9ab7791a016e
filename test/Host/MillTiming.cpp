//===- MillTiming.cpp - Lull's interfaces for mill --------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "MillTiming.h"

#include "Mill.h"

#include "lull/IR/Dialect.h"
#include "lull/IR/Interfaces.h"

using namespace lull;
using namespace mlir;

//===----------------------------------------------------------------------===//
// Operations
//===----------------------------------------------------------------------===//

namespace {

// What each operation is, and the name under which a device lists it.
template <typename OpTy> constexpr OperationKind kindOf = OperationKind::Gate;
template <>
constexpr OperationKind kindOf<mill::ReadOp> = OperationKind::Measure;
template <> constexpr OperationKind kindOf<mill::PrepOp> = OperationKind::Reset;
template <>
constexpr OperationKind kindOf<mill::SyncOp> = OperationKind::Barrier;
template <> constexpr OperationKind kindOf<mill::WaitOp> = OperationKind::Delay;
template <> constexpr OperationKind kindOf<mill::SlackOp> = OperationKind::Idle;
template <> constexpr OperationKind kindOf<mill::HushOp> = OperationKind::Idle;

template <typename OpTy> constexpr StringLiteral nameOf = "";
template <> constexpr StringLiteral nameOf<mill::XOp> = "x";
template <> constexpr StringLiteral nameOf<mill::HOp> = "h";
template <> constexpr StringLiteral nameOf<mill::RzOp> = "rz";
template <> constexpr StringLiteral nameOf<mill::CnotOp> = "cx";
template <> constexpr StringLiteral nameOf<mill::ReadOp> = "measure";
template <> constexpr StringLiteral nameOf<mill::PrepOp> = "reset";

/// One model for all of them. What it leaves out (carriers, state and plan of
/// an idle, pulses) has defaults that suit reference semantics.
template <typename OpTy>
struct Timing : public TimedOpInterface::ExternalModel<Timing<OpTy>, OpTy> {
  OperationKind getOperationKind(Operation *) const { return kindOf<OpTy>; }

  StringAttr getListedName(Operation *op) const {
    if (nameOf<OpTy>.empty())
      return {};
    return StringAttr::get(op->getContext(), nameOf<OpTy>);
  }

  void collectQubits(Operation *op,
                     SmallVectorImpl<OpOperand *> &qubits) const {
    // A device lists `cx` with the control first; mill has it last.
    if (auto cnot = dyn_cast<mill::CnotOp>(op)) {
      qubits.push_back(&cnot.getControlMutable());
      qubits.push_back(&cnot.getTargetMutable());
      return;
    }
    for (OpOperand &operand : op->getOpOperands())
      qubits.push_back(&operand);
  }

  Duration getDuration(Operation *op) const {
    if constexpr (kindOf<OpTy> == OperationKind::Barrier)
      return Duration::ticks(0);
    else if (std::optional<int64_t> ticks = cast<OpTy>(op).getTicks())
      return Duration::ticks(*ticks);
    return Duration::unset();
  }

  void setDuration(Operation *op, Duration duration) const {
    if constexpr (kindOf<OpTy> != OperationKind::Barrier)
      cast<OpTy>(op).setTicks(duration.amount());
  }
};

template <typename... OpTys> void attachTiming(MLIRContext &context) {
  (OpTys::template attachInterface<Timing<OpTys>>(context), ...);
}

//===----------------------------------------------------------------------===//
// The dialect
//===----------------------------------------------------------------------===//

struct MillHost : public HostInterface {
  using HostInterface::HostInterface;

  bool isQubit(Type type) const override { return isa<mill::QubitType>(type); }

  std::optional<SiteId> getSite(Value qubit) const override {
    if (auto op = qubit.getDefiningOp<mill::QubitOp>())
      return op.getPlace();
    return std::nullopt;
  }

  Value buildGate(OpBuilder &builder, Location loc, StringAttr name,
                  ArrayRef<Angle> angles, Value qubit,
                  Duration duration) const override {
    IntegerAttr ticks = ticksOf(builder, duration);
    if (name == nameOf<mill::XOp> && angles.empty()) {
      mill::XOp::create(builder, loc, qubit, ticks);
      return qubit;
    }
    if (name == nameOf<mill::RzOp> && angles.size() == 1) {
      mill::RzOp::create(builder, loc,
                         builder.getF64FloatAttr(angles[0].value()), qubit,
                         ticks);
      return qubit;
    }
    emitError(loc) << "mill has no operation that plays '" << name.getValue()
                   << "' with " << angles.size() << " angles";
    return {};
  }

  Value buildDelay(OpBuilder &builder, Location loc, Value qubit,
                   Duration duration) const override {
    mill::WaitOp::create(builder, loc, qubit, ticksOf(builder, duration));
    return qubit;
  }

  Value buildIdle(OpBuilder &builder, Location loc, Value qubit,
                  Duration duration, WindowState state) const override {
    auto op =
        mill::SlackOp::create(builder, loc, qubit, ticksOf(builder, duration));
    // Where the interface's default reads it.
    op->setAttr(LullDialect::stateAttrName,
                WindowStateAttr::get(builder.getContext(), state));
    return qubit;
  }

private:
  static IntegerAttr ticksOf(OpBuilder &builder, Duration duration) {
    return builder.getI64IntegerAttr(duration.amount());
  }
};

} // namespace

void mill::registerTiming(DialectRegistry &registry) {
  registry.addExtension(+[](MLIRContext *context, MillDialect *dialect) {
    attachTiming<XOp, HOp, RzOp, CnotOp, PrepOp, ReadOp, SyncOp, WaitOp,
                 SlackOp, HushOp>(*context);
    dialect->addInterfaces<MillHost>();
  });
}
