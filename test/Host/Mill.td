//===- Mill.td - A foreign dialect with reference semantics *- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_HOST_MILL
#define LULL_TEST_HOST_MILL

include "mlir/IR/AttrTypeBase.td"
include "mlir/IR/DialectBase.td"
include "mlir/IR/OpBase.td"

// Stands for a compiler that has never heard of Lull: nothing of Lull is
// included here, in Mill.h or in Mill.cpp. MillTiming.cpp attaches the
// interfaces from outside.

def Mill_Dialect : Dialect {
  let name = "mill";
  let cppNamespace = "::mill";
  let summary = "Gates as operations of their own on handles of qubits";
  let useDefaultTypePrinterParser = 1;
}

def Mill_QubitType : TypeDef<Mill_Dialect, "Qubit"> {
  let mnemonic = "qubit";
  let summary = "a handle of a qubit";
  let builderCall = "::mill::QubitType::get($_builder.getContext())";
}

class Mill_Op<string mnemonic> : Op<Mill_Dialect, mnemonic>;

def Mill_QubitOp : Mill_Op<"qubit"> {
  let summary = "the qubit at a place of the chip";
  let arguments = (ins I64Attr:$place);
  let results = (outs Mill_QubitType:$qubit);
  let assemblyFormat = "$place attr-dict";
}

/// Mill counts time in dt: an i64 attribute, absent where nobody has decided.
class Mill_OneQubitOp<string mnemonic> : Mill_Op<mnemonic> {
  let arguments = (ins Mill_QubitType:$qubit, OptionalAttr<I64Attr>:$ticks);
  let assemblyFormat = "$qubit (`takes` $ticks^)? attr-dict";
}

def Mill_XOp : Mill_OneQubitOp<"x">;
def Mill_HOp : Mill_OneQubitOp<"h">;
def Mill_PrepOp : Mill_OneQubitOp<"prep">;
def Mill_WaitOp : Mill_OneQubitOp<"wait">;
def Mill_SlackOp : Mill_OneQubitOp<"slack">;

def Mill_RzOp : Mill_Op<"rz"> {
  let arguments = (ins F64Attr:$angle, Mill_QubitType:$qubit,
                       OptionalAttr<I64Attr>:$ticks);
  let assemblyFormat = "`(` $angle `)` $qubit (`takes` $ticks^)? attr-dict";
}

def Mill_CnotOp : Mill_Op<"cnot"> {
  let summary = "takes the target first, against the custom of the trade";
  let arguments = (ins Mill_QubitType:$target, Mill_QubitType:$control,
                       OptionalAttr<I64Attr>:$ticks);
  let assemblyFormat = [{
    $target `if` $control (`takes` $ticks^)? attr-dict
  }];
}

def Mill_ReadOp : Mill_OneQubitOp<"read"> {
  let results = (outs I1:$bit);
}

def Mill_SyncOp : Mill_Op<"sync"> {
  let arguments = (ins Variadic<Mill_QubitType>:$qubits);
  let assemblyFormat = "$qubits attr-dict";
}

def Mill_TuneOp : Mill_Op<"tune"> {
  let summary = "acts on a qubit, and nobody has told Lull how";
  let arguments = (ins Mill_QubitType:$qubit);
  let assemblyFormat = "$qubit attr-dict";
}

def Mill_HushOp : Mill_Op<"hush"> {
  let summary = "claims to be a window on any number of qubits, which is wrong";
  let arguments = (ins Variadic<Mill_QubitType>:$qubits,
                       OptionalAttr<I64Attr>:$ticks);
  let assemblyFormat = "$qubits (`takes` $ticks^)? attr-dict";
}

#endif // LULL_TEST_HOST_MILL
