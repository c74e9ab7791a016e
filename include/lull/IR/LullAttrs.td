//===- LullAttrs.td - Attributes of the lull dialect -------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLATTRS
#define LULL_IR_LULLATTRS

include "lull/IR/LullDialect.td"
include "mlir/IR/AttrTypeBase.td"
include "mlir/IR/EnumAttr.td"

//===----------------------------------------------------------------------===//
// Windows
//===----------------------------------------------------------------------===//

def Lull_Basis : I32EnumAttrCase<"Basis", 0, "basis">;
def Lull_Live : I32EnumAttrCase<"Live", 1, "live">;
def Lull_Spent : I32EnumAttrCase<"Spent", 2, "spent">;
def Lull_WindowState : I32EnumAttr<"WindowState", "what a waiting qubit holds",
    [Lull_Basis, Lull_Live, Lull_Spent]> {
  let cppNamespace = "::lull";
  let genSpecializedAttr = 0;
}
def Lull_WindowStateAttr
    : EnumAttr<Lull_Dialect, Lull_WindowState, "state"> {
  let summary = "what a waiting qubit holds";
  let description = [{
    `basis`: a computational basis state, as after start, reset or measurement;
    dephasing cannot harm it and pulses would. `live`: a state that matters.
    `spent`: never used again except to be measured or reset.
  }];
  let assemblyFormat = "`<` $value `>`";
}

def Lull_PlanAttr : AttrDef<Lull_Dialect, "Plan"> {
  let mnemonic = "plan";
  let summary = "the decision for one window";
  let description = [{
    A sequence (a name of the catalogue such as "xy8", or the symbol of a
    `lull.sequence`), how often it is repeated in the window, and whether every
    second repeat has the signs of all its pulses flipped.

    Example: `#lull.plan<"xy8" repeats 2 alternating>`, `#lull.plan<@mine>`.
  }];
  let parameters = (ins "::mlir::Attribute":$sequence, "unsigned":$repeats,
                        "bool":$alternating);
  let hasCustomAssemblyFormat = 1;
  let genVerifyDecl = 1;
  let extraClassDeclaration = [{
    /// The most repeats that a plan may have.
    static constexpr unsigned mostRepeats = 10000;
  }];
}

//===----------------------------------------------------------------------===//
// The device
//===----------------------------------------------------------------------===//

def Lull_DurationAttr : AttrDef<Lull_Dialect, "Duration"> {
  let mnemonic = "duration";
  let summary = "an exact duration";
  let description = [{
    A decimal with a unit of seconds (ns, us, ms, s) or a whole number of dt.
    Example: `#lull.duration<35.5 ns>`.
  }];
  let parameters = (ins "::lull::Duration":$value);
  let hasCustomAssemblyFormat = 1;
  let genVerifyDecl = 1;
}

def Lull_FractionAttr : AttrDef<Lull_Dialect, "Fraction"> {
  let mnemonic = "fraction";
  let summary = "an exact fraction in lowest terms";
  let parameters = (ins "::lull::Fraction":$value);
  let hasCustomAssemblyFormat = 1;
}

def Lull_ClockAttr : AttrDef<Lull_Dialect, "Clock"> {
  let mnemonic = "clock";
  let summary = "the length of dt, an exact fraction of a unit of seconds";
  let description = "Example: `#lull.clock<2/9 ns>`.";
  let parameters = (ins "::lull::Fraction":$dt, "::lull::TimeUnit":$unit);
  let hasCustomAssemblyFormat = 1;
  let genVerifyDecl = 1;
}

def Lull_ActionAttr : AttrDef<Lull_Dialect, "Action"> {
  let mnemonic = "action";
  let summary = "what an operation of the device does to one qubit";
  let description = [{
    `rotation(T pi, P pi)`: the fixed rotation R_P(T) = exp(-i T/2 (cos P X +
    sin P Y)); an x is `rotation(1 pi, 0 pi)`, an x with negative amplitude is
    `rotation(-1 pi, 0 pi)`. `equatorial`: the same with both angles as
    parameters of the operation, turn first. `frame`: Rz of the parameter,
    in software.
  }];
  let parameters = (ins "::lull::Action":$value);
  let hasCustomAssemblyFormat = 1;
}

#endif // LULL_IR_LULLATTRS
