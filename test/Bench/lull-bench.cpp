//===- lull-bench.cpp - How long the passes take, as ratios -----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Times the whole of `lull-protect` with XY4 on a generated program against the
// time that MLIR takes to parse the pipeline's own textual output, both in this
// process; then how time and memory grow with the program. Machines are noisy,
// so nothing here passes or fails: read the ratios.
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Ops.h"
#include "lull/Registration/Registration.h"
#include "lull/Transforms/Passes.h"

#include "mlir/Dialect/Func/IR/FuncOps.h"
#include "mlir/IR/Verifier.h"
#include "mlir/Parser/Parser.h"
#include "mlir/Pass/PassInstrumentation.h"
#include "mlir/Pass/PassManager.h"

#include <fmt/format.h>

#include <algorithm>
#include <chrono>
#include <fstream>
#include <malloc.h>
#include <map>
#include <random>

using namespace lull;
using namespace mlir;

namespace {

using Seconds = double;

Seconds now() {
  return std::chrono::duration<double>(
             std::chrono::steady_clock::now().time_since_epoch())
      .count();
}

/// Bytes that the heap has in use.
size_t heapInUse() {
  struct mallinfo2 info = mallinfo2();
  return info.uordblks + info.hblkhd;
}

/// A figure of /proc/self/status in bytes.
size_t statusBytes(const std::string &key) {
  std::ifstream status("/proc/self/status");
  std::string word;
  size_t kilobytes = 0;
  while (status >> word)
    if (word == key + ":" && status >> kilobytes)
      return kilobytes * 1024;
  return 0;
}

void resetPeak() { std::ofstream("/proc/self/clear_refs") << "5"; }

/// A line of sites with one duration for all gates of a kind.
void buildBenchDevice(OpBuilder &builder, int64_t qubits, ModuleOp module) {
  std::string text = "lull.device @bench clock 2/9 ns step 8 dt {\n";
  for (int64_t i = 0; i < qubits; ++i)
    text += fmt::format("lull.site {}\n", i);
  for (int64_t i = 0; i + 1 < qubits; ++i)
    text += fmt::format("lull.coupler {}, {}\n", i, i + 1);
  text += "lull.operation x for 160 dt native plays rotation(1 pi, 0 pi)\n"
          "lull.operation y for 160 dt native plays rotation(1 pi, 1/2 pi)\n"
          "lull.operation h for 160 dt\nlull.operation sx for 160 dt\n"
          "lull.operation rz for 0 dt native plays frame\n"
          "lull.operation cx on any pair for 1600 dt\n}\n";
  auto parsed = parseSourceString<ModuleOp>(text, module.getContext());
  builder.clone(**parsed->getOps<DeviceOp>().begin());
}

/// 70 % one-qubit gates, 30 % two-qubit gates on random neighbours.
OwningOpRef<ModuleOp> makeProgram(MLIRContext &context, int64_t qubits,
                                  int64_t gates) {
  OpBuilder builder(&context);
  Location loc = builder.getUnknownLoc();
  OwningOpRef<ModuleOp> module = ModuleOp::create(builder, loc);
  builder.setInsertionPointToEnd(module->getBody());
  buildBenchDevice(builder, qubits, *module);
  auto function = func::FuncOp::create(builder, loc, "program",
                                       builder.getFunctionType({}, {}));
  function->setAttr(LullDialect::deviceAttrName,
                    FlatSymbolRefAttr::get(&context, "bench"));
  builder.setInsertionPointToEnd(function.addEntryBlock());
  SmallVector<Value> lines;
  for (int64_t i = 0; i < qubits; ++i)
    lines.push_back(QubitOp::create(builder, loc, QubitType::get(&context), i));
  std::mt19937_64 random(20261201);
  StringAttr singles[] = {
      builder.getStringAttr("x"), builder.getStringAttr("h"),
      builder.getStringAttr("sx"), builder.getStringAttr("rz")};
  StringAttr cx = builder.getStringAttr("cx");
  for (int64_t i = 0; i < gates; ++i) {
    if (random() % 10 < 3) {
      size_t at = random() % (qubits - 1);
      Value pair[] = {lines[at], lines[at + 1]};
      if (random() % 2)
        std::swap(pair[0], pair[1]);
      GateOp::create(builder, loc, cx, ArrayRef<Angle>(), ValueRange(pair),
                     Duration::unset());
      continue;
    }
    size_t kind = random() % 4;
    SmallVector<Angle, 1> angles;
    if (kind == 3)
      angles.push_back(Angle::radians(double(random() % 100000) * 1e-5));
    GateOp::create(builder, loc, singles[kind], angles,
                   ValueRange(lines[random() % qubits]), Duration::unset());
  }
  func::ReturnOp::create(builder, loc);
  return module;
}

/// Adds up the time of each pass and of the verifier between them.
struct PassTimes : public PassInstrumentation {
  explicit PassTimes(std::map<std::string, Seconds> &times) : times(times) {}
  void runBeforePass(Pass *, Operation *) override { start = now(); }
  void runAfterPass(Pass *pass, Operation *) override {
    times[pass->getArgument().str()] += now() - start;
  }
  std::map<std::string, Seconds> &times;
  Seconds start = 0;
};

struct Figures {
  Seconds pipeline = 0;
  Seconds parse = 0;
  size_t operations = 0;
  size_t newHeap = 0;
  size_t peak = 0;
  std::map<std::string, Seconds> passes;
};

Figures measure(int64_t qubits, int64_t gates, bool verify) {
  DialectRegistry registry;
  registry.insert<func::FuncDialect>();
  registerDialects(registry);
  MLIRContext context(registry, MLIRContext::Threading::DISABLED);
  context.loadAllAvailableDialects();
  OwningOpRef<ModuleOp> module = makeProgram(context, qubits, gates);

  Figures result;
  PassManager manager(&context);
  manager.enableVerifier(verify);
  ProtectOptions options;
  buildProtectPipeline(manager, options);
  manager.addInstrumentation(std::make_unique<PassTimes>(result.passes));
  malloc_trim(0);
  size_t heap = heapInUse(), resident = statusBytes("VmRSS");
  resetPeak();
  Seconds start = now();
  if (failed(manager.run(*module)))
    std::exit(1);
  result.pipeline = now() - start;
  result.peak = statusBytes("VmHWM") - resident;
  result.newHeap = heapInUse() - heap;

  std::string text;
  llvm::raw_string_ostream stream(text);
  module->print(stream, OpPrintingFlags().useLocalScope().assumeVerified());
  module->walk([&](Operation *) { ++result.operations; });
  module = nullptr;
  start = now();
  OwningOpRef<ModuleOp> parsed = parseSourceString<ModuleOp>(text, &context);
  result.parse = now() - start;
  if (!parsed)
    std::exit(1);
  return result;
}

Figures best(int64_t qubits, int64_t gates, int runs, bool verify) {
  Figures kept;
  for (int i = 0; i < runs; ++i) {
    Figures figures = measure(qubits, gates, verify);
    if (i == 0 || figures.pipeline < kept.pipeline) {
      figures.parse = i ? std::min(figures.parse, kept.parse) : figures.parse;
      kept = figures;
    } else {
      kept.parse = std::min(kept.parse, figures.parse);
    }
  }
  return kept;
}

} // namespace

int main(int argc, char **argv) {
  int64_t gates = argc > 1 ? std::atoll(argv[1]) : 1000000;
  int64_t qubits = argc > 2 ? std::atoll(argv[2]) : 1000;
  int runs = argc > 3 ? std::atoi(argv[3]) : 3;
  if (gates < 10 || qubits < 2 || runs < 1) {
    fmt::print(stderr, "usage: lull-bench [GATES [QUBITS [RUNS]]]\n");
    return 2;
  }
  Figures small = best(qubits, gates / 10, runs, /*verify=*/false);
  Figures full = best(qubits, gates, runs, /*verify=*/false);
  Figures verified = best(qubits, gates, 1, /*verify=*/true);
  fmt::print("lull-protect, xy4, {} gates on {} qubits, best of {}\n", gates,
             qubits, runs);
  for (auto &[pass, seconds] : full.passes)
    fmt::print("  {:20} {:6.3f} of parsing the output\n", pass,
               seconds / full.parse);
  fmt::print("  {:20} {:6.3f} of parsing the output ({:.2f} s of {:.2f} s, "
             "{} operations)\n",
             "whole pipeline", full.pipeline / full.parse, full.pipeline,
             full.parse, full.operations);
  fmt::print("  {:20} {:6.3f} with the verifier after every pass\n", "",
             verified.pipeline / verified.parse);
  fmt::print("  ten times the gates take {:.2f} times as long\n",
             full.pipeline / small.pipeline);
  fmt::print("  peak memory added is {:.2f} of the new operations' ({} MB)\n",
             double(full.peak) / double(full.newHeap), full.newHeap >> 20);
  return 0;
}
