//===- Functions.cpp - One body for every function of a module --*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Transforms/Functions.h"

#include "lull/Analysis/Devices.h"

#include "mlir/IR/SymbolTable.h"
#include "mlir/IR/Threading.h"
#include "mlir/Interfaces/FunctionInterfaces.h"

using namespace lull;
using namespace mlir;

Remarks::Remarks(Operation *function, StringRef pass)
    : listening(function->getContext()->getRemarkEngine()), pass(pass) {
  if (auto name =
          function->getAttrOfType<StringAttr>(SymbolTable::getSymbolAttrName()))
    this->function = name.getValue();
}

void Remarks::flush() {
  for (Entry &entry : entries) {
    auto options =
        remark::RemarkOpts::name(entry.name).category(pass).function(function);
    auto emit = [&] {
      switch (entry.kind) {
      case remark::RemarkKind::RemarkPassed:
        return remark::passed(entry.loc, options);
      case remark::RemarkKind::RemarkMissed:
        return remark::missed(entry.loc, options);
      default:
        return remark::analysis(entry.loc, options);
      }
    };
    auto remark = emit();
    // The text is no format string: whatever braces it has are its own.
    remark << remark::add("{0}", entry.text);
    for (Metric &metric : entry.metrics)
      remark << remark::metric(metric.key, metric.value);
  }
  entries.clear();
}

LogicalResult lull::forEachTimedFunction(
    ModuleOp module, AnalysisManager manager, StringRef pass,
    llvm::function_ref<LogicalResult(Operation *, AnalysisManager, Remarks &)>
        body) {
  struct Job {
    Operation *function;
    AnalysisManager manager;
    Remarks remarks;
    LogicalResult result;
  };
  // W31: time passes in functions only.
  Operation *stray = nullptr;
  module.walk<WalkOrder::PreOrder>([&](Operation *op) {
    if (isa<FunctionOpInterface>(op))
      return WalkResult::skip();
    if (isa<TimedOpInterface>(op))
      stray = op;
    return stray ? WalkResult::interrupt() : WalkResult::advance();
  });
  if (stray)
    return stray->emitError("is a timed operation outside of any function");
  std::vector<Job> jobs;
  // Nesting changes the manager: before any thread runs.
  for (Operation *function : timedFunctions(module))
    jobs.push_back(
        {function, manager.nest(function), Remarks(function, pass), success()});
  // W7: something to do.
  if (jobs.empty())
    module.emitWarning() << pass
                         << " found no function with timed operations here";
  // Every function is looked at, whatever happens to the others: which errors a
  // user sees must not depend on threads.
  parallelForEach(module.getContext(), jobs, [&](Job &job) {
    job.result = body(job.function, job.manager, job.remarks);
  });
  for (Job &job : jobs)
    job.remarks.flush();
  return failure(
      llvm::any_of(jobs, [](const Job &job) { return failed(job.result); }));
}
