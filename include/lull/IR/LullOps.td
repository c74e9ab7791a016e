//===- LullOps.td - Operations of programs -----------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLOPS
#define LULL_IR_LULLOPS

include "lull/IR/LullAttrs.td"
include "lull/IR/LullInterfaces.td"
include "lull/IR/LullProperties.td"
include "lull/IR/LullTypes.td"
include "mlir/Interfaces/SideEffectInterfaces.td"
include "mlir/IR/OpAsmInterface.td"

def Lull_QubitResource : Resource<"::lull::QubitResource">;

class Lull_Op<string mnemonic, list<Trait> traits = []>
    : Op<Lull_Dialect, mnemonic, traits>;

/// An operation that takes time. All of them read and write their qubits.
class Lull_TimedOp<string mnemonic, list<string> methods = [],
                   list<Trait> traits = []>
    : Lull_Op<mnemonic, traits # [
        DeclareOpInterfaceMethods<TimedOpInterface, methods>]> {
  let hasVerifier = 1;
}

/// A qubit operand. Operations that Lull itself puts into foreign programs take
/// any type.
class Lull_QubitArg<Constraint type = Lull_QubitType>
    : Arg<type, "", [MemRead<Lull_QubitResource>, MemWrite<Lull_QubitResource>]>;

def Lull_QubitOp : Lull_Op<"qubit", [Pure,
    DeclareOpInterfaceMethods<OpAsmOpInterface, ["getAsmResultNames"]>]> {
  let summary = "a handle of a site";
  let description = [{
    Names the qubit at one site of the device. Two of them with one number are
    the same qubit.

    Example: `%q0 = lull.qubit 0`
  }];
  let arguments = (ins I64Attr:$site);
  let results = (outs Lull_QubitType:$qubit);
  let assemblyFormat = "custom<Site>($site) attr-dict";
  let hasVerifier = 1;
}

def Lull_GateOp : Lull_TimedOp<"gate", ["getListedName"]> {
  let summary = "a gate by the name under which the device lists it";
  let description = [{
    Acts on its qubits in the order of the gate's definition, with angles in
    radians or as exact multiples of pi. Without `for` the duration is left to
    the device (`lull-set-durations`).

    Example:
    ```mlir
    lull.gate h %q0
    lull.gate rz(1/2 pi) %q0 for 0 dt
    lull.gate cx %q0, %q1 for 1600 dt
    ```
  }];
  let arguments = (ins StrAttr:$gate, Lull_AnglesProp:$angles,
                       Lull_QubitArg<Variadic<Lull_QubitType>>:$qubits,
                       Lull_DurationProp:$duration);
  let assemblyFormat = [{
    custom<GateCall>($gate, $angles) $qubits `` custom<For>($duration) attr-dict
  }];
  let builders = [OpBuilder<(ins "::mlir::StringAttr":$gate,
      "::llvm::ArrayRef<::lull::Angle>":$angles, "::mlir::ValueRange":$qubits,
      "::lull::Duration":$duration)>];
}

def Lull_MeasureOp : Lull_TimedOp<"measure", ["getListedName"], [
    DeclareOpInterfaceMethods<OpAsmOpInterface, ["getAsmResultNames"]>]> {
  let summary = "a measurement in the computational basis";
  let description = "Example: `%m = lull.measure %q1 for 4000 dt`";
  let arguments = (ins Lull_QubitArg<>:$qubit, Lull_DurationProp:$duration);
  let results = (outs I1:$bit);
  let assemblyFormat = "$qubit `` custom<For>($duration) attr-dict";
}

def Lull_ResetOp : Lull_TimedOp<"reset", ["getListedName"]> {
  let summary = "a reset to the ground state";
  let description = "Example: `lull.reset %q1 for 3600 dt`";
  let arguments = (ins Lull_QubitArg<>:$qubit, Lull_DurationProp:$duration);
  let assemblyFormat = "$qubit `` custom<For>($duration) attr-dict";
}

def Lull_BarrierOp : Lull_TimedOp<"barrier"> {
  let summary = "its qubits wait for each other";
  let description = [{
    Takes no time: what follows on any of its qubits starts no earlier than the
    last end before it on all of them.

    Example: `lull.barrier %q0, %q1`
  }];
  let arguments = (ins Lull_QubitArg<Variadic<Lull_QubitType>>:$qubits);
  let assemblyFormat = "$qubits attr-dict";
}

def Lull_DelayOp : Lull_TimedOp<"delay", ["getCarrier"]> {
  let summary = "a wait that the program asks for";
  let description = [{
    The program's own: no pass fills or moves it unless told to. On several
    qubits it begins at their latest clock and ends on all of them together.

    Example: `lull.delay %q1 for 40 ns`
  }];
  let arguments = (ins Lull_QubitArg<Variadic<AnyType>>:$qubits,
                       Lull_DurationProp:$duration);
  let results = (outs Variadic<AnyType>:$carried);
  let assemblyFormat = [{
    custom<Waiting>($qubits, type($qubits), type($carried))
    `` custom<For>($duration) attr-dict
  }];
}

def Lull_IdleOp : Lull_TimedOp<"idle", ["getCarrier", "getWindowState",
                                        "getWindowPlan", "setWindowPlan"]> {
  let summary = "slack that the schedule found";
  let description = [{
    A window in which the qubit waits: ours to fill. It says what the qubit
    holds and, once decided, the plan for it.

    Example:
    ```mlir
    lull.idle %q0 for 4180 dt live
    lull.idle %q0 for 4180 dt live plan "xy8" repeats 2
    ```
  }];
  let arguments = (ins Lull_QubitArg<AnyType>:$qubit, Lull_DurationProp:$duration,
                       Lull_WindowStateAttr:$state,
                       OptionalAttr<Lull_PlanAttr>:$plan);
  let results = (outs Optional<AnyType>:$carried);
  let assemblyFormat = [{
    custom<Waiting>($qubit, type($qubit), type($carried))
    `` custom<For>($duration) custom<State>($state)
    `` custom<Plan>($plan) attr-dict
  }];
  let builders = [OpBuilder<(ins "::mlir::Value":$qubit,
      "::lull::Duration":$duration, "::lull::WindowState":$state,
      CArg<"bool", "false">:$carry)>];
}

def Lull_PulseOp : Lull_TimedOp<"pulse", ["getCarrier", "getPulsePhase",
                                          "isLastPulse"]> {
  let summary = "a decoupling pulse, not yet in the device's operations";
  let description = [{
    R_phase(pi) = exp(-i pi/2 (cos phase X + sin phase Y)) with the phase as an
    exact multiple of pi. `last` stands on the last pulse of a window, where
    frame changes must have summed to zero. `lull-native` replaces it.

    Example: `lull.pulse %q0 about 1/2 pi for 160 dt last`
  }];
  let arguments = (ins Lull_QubitArg<AnyType>:$qubit, Lull_AngleProp:$phase,
                       Lull_DurationProp:$duration, UnitAttr:$last);
  let results = (outs Optional<AnyType>:$carried);
  let assemblyFormat = [{
    custom<Waiting>($qubit, type($qubit), type($carried))
    `about` custom<Phase>($phase) `` custom<For>($duration)
    (`last` $last^)? attr-dict
  }];
  let builders = [OpBuilder<(ins "::mlir::Value":$qubit,
      "::lull::Fraction":$phase, "::lull::Duration":$duration, "bool":$last,
      CArg<"bool", "false">:$carry)>];
}

#endif // LULL_IR_LULLOPS
