//===- ThreadingTest.cpp - The same with and without threads ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Pipeline.h"

#include "mlir/IR/Remarks.h"
#include "mlir/Parser/Parser.h"
#include "mlir/Pass/PassManager.h"

#include <fmt/format.h>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

namespace {

/// Writes every remark into a text.
class Listener final : public mlir::remark::detail::MLIRRemarkStreamerBase {
public:
  explicit Listener(std::string &text) : stream(text) {}

  void streamOptimizationRemark(
      const mlir::remark::detail::Remark &remark) override {
    remark.print(stream, /*printLocation=*/true);
    stream << '\n';
  }

private:
  llvm::raw_string_ostream stream;
};

/// All that a run says and makes.
struct Outcome {
  std::string module;
  std::string remarks;
  std::string diagnostics;
  bool succeeded = false;
};

Outcome runOnce(llvm::StringRef text, const Options &options, bool threads) {
  Outcome outcome;
  std::unique_ptr<mlir::MLIRContext> context = makeContext(threads);
  mlir::ScopedDiagnosticHandler listen(
      context.get(), [&](mlir::Diagnostic &diagnostic) {
        llvm::raw_string_ostream(outcome.diagnostics)
            << diagnostic.getLocation() << ": " << diagnostic << '\n';
        return mlir::success();
      });
  mlir::remark::RemarkCategories categories;
  categories.passed = categories.missed = categories.analysis = ".*";
  EXPECT_TRUE(mlir::succeeded(mlir::remark::enableOptimizationRemarks(
      *context, std::make_unique<Listener>(outcome.remarks),
      std::make_unique<mlir::remark::RemarkEmittingPolicyAll>(), categories)));
  auto module = mlir::parseSourceString<mlir::ModuleOp>(
      text, mlir::ParserConfig(context.get()));
  if (!module) {
    ADD_FAILURE() << outcome.diagnostics;
    return outcome;
  }
  mlir::PassManager manager(context.get());
  ProtectOptions to;
  options.apply(to);
  buildProtectPipeline(manager, to);
  outcome.succeeded = mlir::succeeded(manager.run(*module));
  llvm::raw_string_ostream(outcome.module) << *module;
  return outcome;
}

size_t count(llvm::StringRef text, llvm::StringRef what) {
  return text.count(what);
}

/// A module with some functions on each of two devices.
std::string manyFunctions(unsigned seed, unsigned functions, Means means) {
  Random random(seed);
  std::string text;
  for (const char *name : {"left", "right"}) {
    RandomDevice device = makeDevice(random, means, name);
    text += device.text();
    for (unsigned i = 0; i != functions; ++i)
      text += inventProgram(random, device, fmt::format("{}{}", name, i)).text;
  }
  return text;
}

void expectSame(const Outcome &once, const Outcome &again) {
  EXPECT_EQ(once.succeeded, again.succeeded);
  EXPECT_EQ(once.module, again.module);
  EXPECT_EQ(once.remarks, again.remarks);
  EXPECT_EQ(once.diagnostics, again.diagnostics);
}

TEST(ThreadingTest, SameModuleAndRemarks) {
  std::string text = manyFunctions(1, 60, Means::XFrame);
  Options options;
  options.sequence = "xy4";
  Outcome once = runOnce(text, options, /*threads=*/false);
  ASSERT_TRUE(once.succeeded) << once.diagnostics;
  EXPECT_GT(count(once.remarks, "Protected"), 200u);
  EXPECT_GT(count(once.remarks, "Left"), 200u);
  // One for each function, however many pulses it has.
  EXPECT_EQ(count(once.remarks, "Length |"), 120u);
  for (int again = 0; again != 4; ++again)
    expectSame(once, runOnce(text, options, /*threads=*/true));
}

/// Every function says what is wrong with it, whoever is first; the others are
/// done all the same.
TEST(ThreadingTest, SameErrors) {
  Random random(2);
  std::string text = makeDevice(random, Means::XFrame, "device").text();
  // The first site of a device is 0, 1 or 2.
  std::string site = text.substr(text.find("lull.site ") + 10, 1);
  constexpr unsigned functions = 40;
  for (unsigned i = 0; i != functions; ++i)
    text +=
        fmt::format("func.func @f{}() attributes {{lull.device = @device}} {{\n"
                    "  %q = lull.qubit {}\n"
                    "  lull.idle %q for 9000 dt live {{lull.protect = {}}}\n"
                    "  return\n}}\n",
                    i, site, i % 2 ? "@missing" : "\"none\"");
  Options options;
  options.sequence = "xy8";
  Outcome once = runOnce(text, options, /*threads=*/false);
  EXPECT_FALSE(once.succeeded);
  EXPECT_EQ(count(once.diagnostics, "unknown sequence @missing"), functions / 2)
      << once.diagnostics;
  EXPECT_EQ(count(once.remarks, "Left |"), functions / 2);
  for (int again = 0; again != 4; ++again)
    expectSame(once, runOnce(text, options, /*threads=*/true));
}

} // namespace
