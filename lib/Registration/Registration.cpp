//===- Registration.cpp - Everything of Lull, for a tool --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Registration/Registration.h"

#include "lull/IR/Dialect.h"
#include "lull/Transforms/Passes.h"

#include "mlir/IR/DialectRegistry.h"

void lull::registerDialects(mlir::DialectRegistry &registry) {
  registry.insert<LullDialect>();
}

void lull::registerPasses() {
  registerLullPasses();
  registerProtectPipeline();
}
