//===- LullDialect.td - The lull dialect -------------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLDIALECT
#define LULL_IR_LULLDIALECT

include "mlir/IR/DialectBase.td"

def Lull_Dialect : Dialect {
  let name = "lull";
  let cppNamespace = "::lull";
  let summary = "Quantum programs with exact durations, and the waits in them";
  let description = [{
    Operations with exact durations act on handles of physical qubits. A handle
    (`!lull.qubit`) stands for one site of a device; operations act on it in
    program order and have memory effects on it, so nothing generic reorders or
    drops them. Start times are not stored: an operation starts as soon as all
    its qubits are free (docs/Spec.md gives the timing rule and every numbered
    constraint).

    Attributes of this dialect on other operations:
    - `lull.device = @name` on a function: the device that it runs on;
    - `lull.site = 3 : i64` on a function argument: the site of that qubit;
    - `lull.protect = "xy8"` on any timed operation: the user's wish for the
      waits that end at this operation (a sequence's name, the symbol of a
      `lull.sequence`, a `#lull.plan`, or "none");
    - `lull.state` and `lull.plan` on a foreign idle operation: what `lull.idle`
      keeps in its own attributes.
  }];
  let useDefaultTypePrinterParser = 1;
  let useDefaultAttributePrinterParser = 1;
  let hasOperationAttrVerify = 1;
  let hasRegionArgAttrVerify = 1;
  let extraClassDeclaration = [{
    void registerAttributes();

    /// Names of the discardable attributes above.
    static constexpr ::llvm::StringLiteral deviceAttrName = "lull.device";
    static constexpr ::llvm::StringLiteral siteAttrName = "lull.site";
    static constexpr ::llvm::StringLiteral protectAttrName = "lull.protect";
    static constexpr ::llvm::StringLiteral stateAttrName = "lull.state";
    static constexpr ::llvm::StringLiteral planAttrName = "lull.plan";
  }];
}

#endif // LULL_IR_LULLDIALECT
