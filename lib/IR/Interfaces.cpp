//===- Interfaces.cpp - TimedOpInterface and HostInterface ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Interfaces.h"

#include "lull/IR/Ops.h"

using namespace lull;
using namespace mlir;

#include "lull/IR/LullInterfaces.cpp.inc"

WindowState lull::detail::windowStateOf(Operation *op) {
  auto state = op->getAttrOfType<WindowStateAttr>(LullDialect::stateAttrName);
  return state ? state.getValue() : WindowState::Live;
}

PlanAttr lull::detail::windowPlanOf(Operation *op) {
  return op->getAttrOfType<PlanAttr>(LullDialect::planAttrName);
}

void lull::detail::setWindowPlanOf(Operation *op, PlanAttr plan) {
  if (plan)
    op->setAttr(LullDialect::planAttrName, plan);
  else
    op->removeAttr(LullDialect::planAttrName);
}

Value HostInterface::buildDelay(OpBuilder &builder, Location loc, Value qubit,
                                Duration duration) const {
  SmallVector<Type, 1> carried;
  if (hasValueSemantics())
    carried.push_back(qubit.getType());
  auto op = DelayOp::create(builder, loc, carried, ValueRange(qubit), duration);
  return hasValueSemantics() ? op.getCarried().front() : qubit;
}

Value HostInterface::buildIdle(OpBuilder &builder, Location loc, Value qubit,
                               Duration duration, WindowState state) const {
  auto op =
      IdleOp::create(builder, loc, qubit, duration, state, hasValueSemantics());
  return hasValueSemantics() ? op.getCarried() : qubit;
}

const HostInterface *lull::hostOf(Type type) {
  const auto *host = type.getDialect().getRegisteredInterface<HostInterface>();
  return host && host->isQubit(type) ? host : nullptr;
}
