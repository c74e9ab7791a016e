//===- Ops.h - Operations of the lull dialect -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_OPS_H
#define LULL_IR_OPS_H

#include "lull/IR/Attributes.h"
#include "lull/IR/Dialect.h"
#include "lull/IR/Interfaces.h"
#include "lull/IR/Properties.h"

#include "mlir/Bytecode/BytecodeOpInterface.h"
#include "mlir/IR/BuiltinTypes.h"
#include "mlir/IR/OpImplementation.h"
#include "mlir/IR/RegionKindInterface.h"
#include "mlir/IR/SymbolTable.h"
#include "mlir/Interfaces/SideEffectInterfaces.h"

namespace lull {

/// What timed operations read and write: the state of their qubits.
struct QubitResource : public mlir::SideEffects::Resource::Base<QubitResource> {
  llvm::StringRef getName() final { return "qubit"; }
};

} // namespace lull

#define GET_OP_CLASSES
#include "lull/IR/LullOps.h.inc"

#define GET_OP_CLASSES
#include "lull/IR/LullDeviceOps.h.inc"

#endif // LULL_IR_OPS_H
