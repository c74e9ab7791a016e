//===- Pipeline.cpp - The passes, run in this process -----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Pipeline.h"

#include "lull/Registration/Registration.h"

#include "mlir/Parser/Parser.h"
#include "mlir/Pass/PassManager.h"

#include <fmt/format.h>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

std::unique_ptr<mlir::MLIRContext> property::makeContext(bool threads) {
  mlir::DialectRegistry registry;
  registry.insert<mlir::func::FuncDialect>();
  registerDialects(registry);
  return std::make_unique<mlir::MLIRContext>(
      registry, threads ? mlir::MLIRContext::Threading::ENABLED
                        : mlir::MLIRContext::Threading::DISABLED);
}

std::string Case::text() const {
  std::string text = device.text();
  for (const UserSequence &sequence : own)
    text += sequence.text;
  for (const Invented &function : functions)
    text += function.text;
  return text;
}

mlir::OwningOpRef<mlir::ModuleOp>
Case::parse(mlir::MLIRContext *context) const {
  return mlir::parseSourceString<mlir::ModuleOp>(text(),
                                                 mlir::ParserConfig(context));
}

std::vector<Invented> property::inventFunctions(Random &random,
                                                const RandomDevice &device,
                                                unsigned count) {
  std::vector<Invented> functions;
  for (unsigned i = 0; i != count; ++i)
    functions.push_back(
        inventProgram(random, device, fmt::format("program{}", i)));
  return functions;
}

static bool run(mlir::ModuleOp module,
                llvm::function_ref<void(mlir::PassManager &)> fill) {
  std::string said;
  mlir::ScopedDiagnosticHandler listen(module.getContext(),
                                       [&](mlir::Diagnostic &diagnostic) {
                                         said += diagnostic.str() + "\n";
                                         return mlir::success();
                                       });
  mlir::PassManager manager(module.getContext());
  fill(manager);
  bool succeeded = mlir::succeeded(manager.run(module));
  EXPECT_TRUE(succeeded) << said;
  return succeeded;
}

bool property::runSchedule(mlir::ModuleOp module, const Options &options) {
  return run(module, [&](mlir::PassManager &manager) {
    manager.addPass(createLullSetDurations());
    LullScheduleOptions schedule;
    schedule.policy = options.policy;
    schedule.spentAtEnd = options.spentAtEnd;
    manager.addPass(createLullSchedule(schedule));
  });
}

bool property::runProtect(mlir::ModuleOp module, const Options &options) {
  return run(module, [&](mlir::PassManager &manager) {
    ProtectOptions to;
    options.apply(to);
    buildProtectPipeline(manager, to);
  });
}
