//===- Mill.cpp - A foreign dialect with reference semantics ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Mill.h"

#include "mlir/IR/Builders.h"
#include "mlir/IR/DialectImplementation.h"
#include "llvm/ADT/TypeSwitch.h"

using namespace mill;

#include "MillDialect.cpp.inc"
#define GET_TYPEDEF_CLASSES
#include "MillTypes.cpp.inc"
#define GET_OP_CLASSES
#include "Mill.cpp.inc"

void MillDialect::initialize() {
  addTypes<
#define GET_TYPEDEF_LIST
#include "MillTypes.cpp.inc"
      >();
  addOperations<
#define GET_OP_LIST
#include "Mill.cpp.inc"
      >();
}
