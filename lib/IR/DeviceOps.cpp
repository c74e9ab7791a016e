//===- DeviceOps.cpp - Devices and sequences --------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Assembly.h"
#include "lull/IR/DeviceBuilder.h"
#include "lull/IR/Ops.h"

#include "mlir/IR/DialectImplementation.h"
#include "mlir/Interfaces/FunctionInterfaces.h"

using namespace lull;
using namespace mlir;

#define GET_OP_CLASSES
#include "lull/IR/LullDeviceOps.cpp.inc"

LogicalResult DeviceOp::verifyRegions() {
  // D1, D2: lines and nothing else (the other half is a trait of the lines).
  for (Operation &line : getBody().front())
    if (!isa<SiteOp, CouplerOp, OperationOp>(line)) {
      InFlightDiagnostic diag =
          line.emitOpError("has no place in a device: there are lull.site, "
                           "lull.coupler and lull.operation");
      diag.attachNote(getLoc()) << "the device";
      return diag;
    }
  // Everything else is a rule of the plain device, which names what is wrong.
  FailureOr<Device> plain = buildDevice(*this);
  if (failed(plain))
    return failure();
  // What runs on it is verified here, so that the device is converted once and
  // not for every function.
  bool sound = true;
  if (Operation *scope = (*this)->getParentOp())
    scope->walk<WalkOrder::PreOrder>([&](FunctionOpInterface function) {
      FlatSymbolRefAttr symbol;
      Operation *holder = deviceHolder(function, symbol);
      if (holder && symbol.getAttr() == getSymNameAttr() &&
          (SymbolTable::getNearestSymbolTable(holder) == scope ||
           resolveDevice(holder, symbol) == *this))
        sound &= succeeded(verifyAgainstDevice(function, *plain));
      return WalkResult::skip();
    });
  return success(sound);
}

LogicalResult OperationOp::verify() {
  int64_t arity = getArity();
  // D17: on a qubit.
  if (arity < 1 || arity > mostQubits)
    return emitOpError() << "is for " << arity
                         << " qubits when it should be for 1 to " << mostQubits;
  // D18: whole tuples.
  if (getOn().size() % arity)
    return emitOpError() << "lists " << getOn().size()
                         << " sites, which is no multiple of its " << arity
                         << " qubits";
  // D19: only a pair has another order.
  if (getSymmetric() && arity != 2)
    return emitOpError() << "is symmetric with " << arity
                         << " qubits when only pairs can be";
  // D16: a name.
  if (getLabel().empty())
    return emitOpError("has an empty name");
  return success();
}

LogicalResult SequenceOp::verify() {
  // Larger numbers say nothing that hardware could follow and would overflow
  // the exact arithmetic of repeats.
  constexpr int64_t most = 1000000;
  size_t count = getPhases().size();
  // U1: a pulse.
  if (count == 0)
    return emitOpError("has no pulses");
  // U2: one of the two.
  if (bool(getInstants()) == bool(getFormula()))
    return emitOpError("has its instants either as fractions or by a formula");
  // U3: phases within bounds.
  for (auto [index, phase] :
       llvm::enumerate(getPhases().getAsRange<FractionAttr>()))
    if (Fraction value = phase.getValue(); value.denominator() > most ||
                                           value > Fraction(most) ||
                                           value < Fraction(-most))
      return emitOpError() << "phase " << value.str() << " of pulse "
                           << index + 1 << " goes beyond " << most;
  if (!getInstants()) {
    // U11: what the custom form can write.
    if (!isBareWord(*getFormula()))
      return emitOpError() << "formula '" << *getFormula() << "' is not a word";
    return success();
  }
  // U4: as many as phases.
  if (getInstants()->size() != count)
    return emitOpError() << "has " << count << " phases and "
                         << getInstants()->size() << " instants";
  Fraction previous = 0;
  for (auto [index, instant] :
       llvm::enumerate(getInstants()->getAsRange<FractionAttr>())) {
    Fraction value = instant.getValue();
    // U5: instants within bounds.
    if (value.denominator() > most)
      return emitOpError() << "instant " << value.str() << " of pulse "
                           << index + 1 << " goes beyond 1/" << most;
    // U6: in the window.
    if (value < Fraction(0) || value > Fraction(1))
      return emitOpError() << "instant " << value.str() << " of pulse "
                           << index + 1 << " is outside the window, 0 to 1";
    // U7: in order.
    if (value < previous)
      return emitOpError() << "instant " << value.str() << " of pulse "
                           << index + 1 << " is before " << previous.str()
                           << ", the one of pulse " << index;
    previous = value;
  }
  return success();
}
