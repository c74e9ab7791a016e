//===- lull-opt.cpp - Lull's passes on IR files -----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Registration/Registration.h"

#include "mlir/InitAllDialects.h"
#include "mlir/InitAllPasses.h"
#include "mlir/Tools/mlir-opt/MlirOptMain.h"

int main(int argc, char **argv) {
  mlir::registerAllPasses();
  lull::registerPasses();
  mlir::DialectRegistry registry;
  mlir::registerAllDialects(registry);
  lull::registerDialects(registry);
  return mlir::asMainReturnCode(
      mlir::MlirOptMain(argc, argv, "Lull optimizer driver\n", registry));
}
