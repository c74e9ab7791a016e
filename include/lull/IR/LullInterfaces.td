//===- LullInterfaces.td - What passes see -----------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLINTERFACES
#define LULL_IR_LULLINTERFACES

include "mlir/IR/OpBase.td"

def TimedOpInterface : OpInterface<"TimedOpInterface"> {
  let cppNamespace = "::lull";
  let description = [{
    An operation that takes time on qubits. Passes see operations only through
    this interface, so a host dialect takes part by implementing it (or by
    attaching an external model) and HostInterface on its dialect.

    Reference semantics: the operation has qubit operands and no carriers.
    Value semantics: for each qubit operand the operation has a result that
    carries the qubit on, which `getCarrier` names.
  }];
  let methods = [
    InterfaceMethod<"What the operation is.",
      "::lull::OperationKind", "getOperationKind">,
    InterfaceMethod<[{
        The name under which a device lists the operation. Null for barriers,
        delays, idles and pulses, whose duration no device gives.
      }], "::mlir::StringAttr", "getListedName", (ins), "", [{ return {}; }]>,
    InterfaceMethod<[{
        Appends the qubit operands in the order of the operation's meaning
        (control before target).
      }], "void", "collectQubits",
      (ins "::llvm::SmallVectorImpl<::mlir::OpOperand *> &":$qubits)>,
    InterfaceMethod<[{
        The result that carries the qubit of the `index`-th collected operand
        on; null if the operand is a reference.
      }], "::mlir::Value", "getCarrier", (ins "unsigned":$index), "",
      [{ return {}; }]>,
    InterfaceMethod<[{
        The duration; `unset` if the program leaves it to the device.
      }], "::lull::Duration", "getDuration">,
    InterfaceMethod<[{
        Sets the duration, to a whole number of dt. Never called on barriers.
      }], "void", "setDuration", (ins "::lull::Duration":$duration)>,
    InterfaceMethod<[{
        For idles: what the qubit holds. Default: the attribute `lull.state`,
        and `live` without one, which is always safe.
      }], "::lull::WindowState", "getWindowState", (ins), "",
      [{ return ::lull::detail::windowStateOf($_op); }]>,
    InterfaceMethod<[{
        For idles: the plan, or null. Default: the attribute `lull.plan`.
      }], "::lull::PlanAttr", "getWindowPlan", (ins), "",
      [{ return ::lull::detail::windowPlanOf($_op); }]>,
    InterfaceMethod<[{
        For idles: sets the plan, or removes it if null.
      }], "void", "setWindowPlan", (ins "::lull::PlanAttr":$plan), "",
      [{ ::lull::detail::setWindowPlanOf($_op, plan); }]>,
    InterfaceMethod<[{
        For pulses: the phase in units of pi. Null-like (missing) otherwise.
      }], "::lull::Angle", "getPulsePhase", (ins), "",
      [{ return {}; }]>,
    InterfaceMethod<[{
        For pulses: whether it is the last pulse of its window.
      }], "bool", "isLastPulse", (ins), "",
      [{ return false; }]>,
  ];
}

#endif // LULL_IR_LULLINTERFACES
