//===- LullTypes.td - Types of the lull dialect ------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLTYPES
#define LULL_IR_LULLTYPES

include "lull/IR/LullDialect.td"
include "mlir/IR/AttrTypeBase.td"

def Lull_QubitType : TypeDef<Lull_Dialect, "Qubit"> {
  let mnemonic = "qubit";
  let summary = "a handle of one physical qubit";
  let description = [{
    A reference, not a state: two handles of one site in a function are the same
    qubit, and analyses go by site, not by SSA value.
  }];
  let builderCall = "::lull::QubitType::get($_builder.getContext())";
}

#endif // LULL_IR_LULLTYPES
