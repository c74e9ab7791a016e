//===- Pipeline.h - The passes, run in this process -------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_PIPELINE_H
#define LULL_TEST_PROPERTY_PIPELINE_H

#include "Expectation.h"

namespace lull::property {

/// A context with the dialects of the programs.
std::unique_ptr<mlir::MLIRContext> makeContext(bool threads = false);

/// A device, sequences and programs that run on it.
struct Case {
  RandomDevice device;
  std::vector<UserSequence> own;
  std::vector<Invented> functions;

  std::string text() const;
  mlir::OwningOpRef<mlir::ModuleOp> parse(mlir::MLIRContext *context) const;
};

std::vector<Invented>
inventFunctions(Random &random, const RandomDevice &device, unsigned count);

/// Durations and idles only.
bool runSchedule(mlir::ModuleOp module, const Options &options);
/// The whole of lull-protect.
bool runProtect(mlir::ModuleOp module, const Options &options);

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_PIPELINE_H
