//===- Dialect.h - The lull dialect -----------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_DIALECT_H
#define LULL_IR_DIALECT_H

#include "mlir/IR/BuiltinTypes.h"
#include "mlir/IR/Dialect.h"

#include "lull/IR/LullDialect.h.inc"

#define GET_TYPEDEF_CLASSES
#include "lull/IR/LullTypes.h.inc"

#endif // LULL_IR_DIALECT_H
