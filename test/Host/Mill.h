//===- Mill.h - A foreign dialect with reference semantics ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_HOST_MILL_H
#define LULL_TEST_HOST_MILL_H

#include "mlir/Bytecode/BytecodeOpInterface.h"
#include "mlir/IR/BuiltinTypes.h"
#include "mlir/IR/Dialect.h"
#include "mlir/IR/OpImplementation.h"

#include "MillDialect.h.inc"

#define GET_TYPEDEF_CLASSES
#include "MillTypes.h.inc"

#define GET_OP_CLASSES
#include "Mill.h.inc"

#endif // LULL_TEST_HOST_MILL_H
