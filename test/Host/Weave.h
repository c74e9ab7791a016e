//===- Weave.h - A foreign dialect with value semantics ---------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_HOST_WEAVE_H
#define LULL_TEST_HOST_WEAVE_H

#include "lull/IR/Interfaces.h"

#include "mlir/Bytecode/BytecodeOpInterface.h"
#include "mlir/IR/BuiltinTypes.h"
#include "mlir/IR/Dialect.h"
#include "mlir/IR/OpImplementation.h"

#include "WeaveDialect.h.inc"

#define GET_TYPEDEF_CLASSES
#include "WeaveTypes.h.inc"

#define GET_OP_CLASSES
#include "Weave.h.inc"

#endif // LULL_TEST_HOST_WEAVE_H
