//===- Functions.h - One body for every function of a module ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_FUNCTIONS_H
#define LULL_TRANSFORMS_FUNCTIONS_H

#include "mlir/IR/BuiltinOps.h"
#include "mlir/IR/Remarks.h"
#include "mlir/Pass/AnalysisManager.h"

#include <string>
#include <vector>

namespace lull {

/// Remarks of one function, kept until all functions are done: the engine is
/// not safe with threads, and the order shall be that of the program.
class Remarks {
public:
  Remarks(mlir::Operation *function, llvm::StringRef pass);

  /// Whether anybody listens. If not, do not make remarks.
  bool wanted() const { return listening; }

  /// A remark: its kind, its name (a literal), the words, and numbers by key.
  struct Metric {
    llvm::StringLiteral key;
    std::string value;
  };
  void passed(mlir::Location loc, llvm::StringLiteral name, std::string text,
              std::vector<Metric> metrics = {}) {
    add(mlir::remark::RemarkKind::RemarkPassed, loc, name, std::move(text),
        std::move(metrics));
  }
  void missed(mlir::Location loc, llvm::StringLiteral name, std::string text,
              std::vector<Metric> metrics = {}) {
    add(mlir::remark::RemarkKind::RemarkMissed, loc, name, std::move(text),
        std::move(metrics));
  }
  void analysis(mlir::Location loc, llvm::StringLiteral name, std::string text,
                std::vector<Metric> metrics = {}) {
    add(mlir::remark::RemarkKind::RemarkAnalysis, loc, name, std::move(text),
        std::move(metrics));
  }

  /// Hands all remarks to the engine.
  void flush();

private:
  struct Entry {
    mlir::remark::RemarkKind kind;
    mlir::Location loc;
    llvm::StringLiteral name;
    std::string text;
    std::vector<Metric> metrics;
  };
  void add(mlir::remark::RemarkKind kind, mlir::Location loc,
           llvm::StringLiteral name, std::string text,
           std::vector<Metric> metrics) {
    entries.push_back({kind, loc, name, std::move(text), std::move(metrics)});
  }

  bool listening;
  llvm::StringRef pass;
  llvm::StringRef function;
  std::vector<Entry> entries;
};

/// Runs `body` on every function of the module that has timed operations, in
/// parallel where the context allows it, with the function's own analyses.
/// Warns if there is none (the usual sign of wrong nesting). Fails if any body
/// does. Needs the analysis Devices of the module to be cached.
llvm::LogicalResult forEachTimedFunction(
    mlir::ModuleOp module, mlir::AnalysisManager manager, llvm::StringRef pass,
    llvm::function_ref<llvm::LogicalResult(mlir::Operation *function,
                                           mlir::AnalysisManager manager,
                                           Remarks &remarks)>
        body);

} // namespace lull

#endif // LULL_TRANSFORMS_FUNCTIONS_H
