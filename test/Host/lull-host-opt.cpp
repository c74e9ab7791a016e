//===- lull-host-opt.cpp - Lull's passes on foreign dialects ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Mill.h"
#include "MillTiming.h"
#include "Weave.h"

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
  registry.insert<mill::MillDialect, weave::WeaveDialect>();
  mill::registerTiming(registry);
  return mlir::asMainReturnCode(
      mlir::MlirOptMain(argc, argv, "Lull on foreign dialects\n", registry));
}
