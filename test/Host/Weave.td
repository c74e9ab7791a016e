//===- Weave.td - A foreign dialect with value semantics ---*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_HOST_WEAVE
#define LULL_TEST_HOST_WEAVE

include "lull/IR/LullAttrs.td"
include "lull/IR/LullInterfaces.td"
include "mlir/IR/AttrTypeBase.td"
include "mlir/IR/DialectBase.td"
include "mlir/IR/OpBase.td"

// Stands for a compiler that is written with Lull in mind: its operations
// implement the interface themselves. Each consumes qubits and gives them back,
// with classical operands and results anywhere among them.

def Weave_Dialect : Dialect {
  let name = "weave";
  let cppNamespace = "::weave";
  let summary = "Gates that consume qubits and give them back";
  let useDefaultTypePrinterParser = 1;
  // Angles are operands: gates that Lull asks for bring constants along.
  let dependentDialects = ["::mlir::arith::ArithDialect",
                           "::lull::LullDialect"];
}

def Weave_StrandType : TypeDef<Weave_Dialect, "Strand"> {
  let mnemonic = "strand";
  let summary = "a qubit between two operations";
  let builderCall = "::weave::StrandType::get($_builder.getContext())";
}

class Weave_Op<string mnemonic, list<Trait> traits = []>
    : Op<Weave_Dialect, mnemonic, traits>;

def Weave_SpinOp : Weave_Op<"spin"> {
  let summary = "the qubit at a site, as the program finds it";
  let arguments = (ins I64Attr:$site);
  let results = (outs Weave_StrandType:$strand);
  let assemblyFormat = "$site attr-dict";
}

class Weave_TimedOp<string mnemonic, list<string> methods>
    : Weave_Op<mnemonic, [DeclareOpInterfaceMethods<TimedOpInterface,
                                                    methods>]>;

def Weave_ApplyOp : Weave_TimedOp<"apply", ["getListedName", "getCarrier"]> {
  let summary = "a gate by name, on operands in the order of its definition";
  let arguments = (ins StrAttr:$gate, Variadic<AnyType>:$inputs,
                       OptionalAttr<Lull_DurationAttr>:$lasts);
  let results = (outs Variadic<Weave_StrandType>:$strands);
  let assemblyFormat = [{
    $gate `(` $inputs `)` (`lasts` $lasts^)? attr-dict
    `:` functional-type($inputs, $strands)
  }];
  let hasVerifier = 1;
}

def Weave_LookOp : Weave_TimedOp<"look", ["getListedName", "getCarrier"]> {
  let summary = "a measurement; the bit comes before the qubit";
  let arguments = (ins Weave_StrandType:$strand,
                       OptionalAttr<Lull_DurationAttr>:$lasts);
  let results = (outs I1:$bit, Weave_StrandType:$next);
  let assemblyFormat = "$strand (`lasts` $lasts^)? attr-dict";
}

def Weave_FreshOp : Weave_TimedOp<"fresh", ["getListedName", "getCarrier"]> {
  let summary = "a reset";
  let arguments = (ins Weave_StrandType:$strand,
                       OptionalAttr<Lull_DurationAttr>:$lasts);
  let results = (outs Weave_StrandType:$next);
  let assemblyFormat = "$strand (`lasts` $lasts^)? attr-dict";
}

def Weave_KnotOp : Weave_TimedOp<"knot", ["getCarrier"]> {
  let summary = "a barrier";
  let arguments = (ins Variadic<Weave_StrandType>:$strands);
  let results = (outs Variadic<Weave_StrandType>:$next);
  let assemblyFormat = [{
    $strands attr-dict `:` functional-type($strands, $next)
  }];
}

def Weave_PeekOp : Weave_Op<"peek"> {
  let summary = "acts on a qubit without the interface";
  let arguments = (ins Weave_StrandType:$strand);
  let assemblyFormat = "$strand attr-dict";
}

#endif // LULL_TEST_HOST_WEAVE
