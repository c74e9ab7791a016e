//===- TamperTest.cpp - The checks see what is wrong ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

//
// The other tests of this folder are worth as much as their checks: here they
// must complain about outputs with one thing wrong in each.
//
//===----------------------------------------------------------------------===//

#include "Comparison.h"

#include "lull/IR/Ops.h"

#include <fmt/format.h>
#include <gtest/gtest-spi.h>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

namespace {

class TamperTest : public testing::Test {
protected:
  void SetUp() override {
    Random random(7);
    example.device = makeDevice(random, Means::XFrame, "device");
    example.functions = inventFunctions(random, example.device, 6);
    options.sequence = "xy8";
    context = makeContext();
    scheduled = example.parse(context.get());
    written = example.parse(context.get());
    ASSERT_TRUE(scheduled && written);
    ASSERT_TRUE(runSchedule(*scheduled, options));
    ASSERT_TRUE(runProtect(*written, options));
  }

  /// What the comparison says about the output as it is.
  std::vector<std::string> complaints() {
    testing::TestPartResultArray results;
    {
      testing::ScopedFakeTestPartResultReporter intercept(
          testing::ScopedFakeTestPartResultReporter::
              INTERCEPT_ONLY_CURRENT_THREAD,
          &results);
      Tally tally;
      compare(example, options, *scheduled, *written, tally);
    }
    std::vector<std::string> texts;
    for (int i = 0; i != results.size(); ++i)
      texts.push_back(results.GetTestPartResult(i).message());
    return texts;
  }
  void expectComplaint(llvm::StringRef about) {
    std::string all = fmt::format("{}", fmt::join(complaints(), "\n"));
    EXPECT_TRUE(llvm::StringRef(all).contains(about))
        << "no complaint about " << about.str() << " in: " << all;
  }

  /// The operations of one kind that the passes inserted or that the program
  /// had.
  template <typename Op> std::vector<Op> find(bool inserted) {
    std::vector<Op> found;
    written->walk([&](Op op) {
      if (op->hasAttr("tag") != inserted)
        found.push_back(op);
    });
    return found;
  }
  std::vector<GateOp> insertedGates(llvm::StringRef name) {
    std::vector<GateOp> gates = find<GateOp>(/*inserted=*/true);
    llvm::erase_if(gates, [&](GateOp gate) { return gate.getGate() != name; });
    return gates;
  }
  template <typename Op> static void lengthen(Op op, std::int64_t by) {
    Duration &duration = op.getProperties().duration;
    ASSERT_EQ(duration.unit(), TimeUnit::dt);
    duration = Duration::ticks(duration.amount() + by);
  }
  /// Two waits with one pulse between them.
  std::pair<DelayOp, DelayOp> aroundPulse() {
    std::vector<GateOp> pulses = insertedGates("x");
    for (GateOp pulse : pulses) {
      auto before = llvm::dyn_cast_or_null<DelayOp>(pulse->getPrevNode());
      auto after = llvm::dyn_cast_or_null<DelayOp>(pulse->getNextNode());
      if (before && after &&
          before.getProperties().duration.amount() > 2 * example.device.step &&
          after.getProperties().duration.amount() > 2 * example.device.step)
        return {before, after};
    }
    ADD_FAILURE() << "no pulse between two waits";
    return {};
  }

  std::unique_ptr<mlir::MLIRContext> context;
  Case example;
  Options options;
  mlir::OwningOpRef<mlir::ModuleOp> scheduled, written;
};

} // namespace

TEST_F(TamperTest, NothingWrong) {
  EXPECT_TRUE(complaints().empty()) << complaints().front();
}

TEST_F(TamperTest, PulseOffTheGrid) {
  ASSERT_GT(example.device.step, 1);
  auto [before, after] = aroundPulse();
  lengthen(before, 1);
  lengthen(after, -1);
  expectComplaint("off the grid");
}

TEST_F(TamperTest, PulseElsewhereOnTheGrid) {
  auto [before, after] = aroundPulse();
  lengthen(before, example.device.step);
  lengthen(after, -example.device.step);
  // Two steps more or less of minus: no longer the least residual.
  expectComplaint("in a window of");
}

TEST_F(TamperTest, InstantsOfAnotherSequence) {
  // Two times X at 1/4 and 3/4, not at 1/3 and 2/3.
  options.sequence = "cpmg-2";
  written = example.parse(context.get());
  ASSERT_TRUE(runProtect(*written, options));
  EXPECT_TRUE(complaints().empty()) << complaints().front();
  options.sequence = "pdd-2";
  expectComplaint("in a window of");
}

TEST_F(TamperTest, WindowTooLong) {
  lengthen(aroundPulse().second, 1);
  expectComplaint("at the end of site");
}

TEST_F(TamperTest, FrameTheOtherWay) {
  GateOp frame = insertedGates("rz").front();
  Angle &angle = frame.getProperties().angles.angles[0];
  angle = Angle::ofPi(turnedBack(0, angle.multiple()));
  expectComplaint("the frame stays");
}

TEST_F(TamperTest, AllFramesTheOtherWay) {
  // -Y for Y everywhere: still closed and the identity.
  for (GateOp frame : insertedGates("rz")) {
    Angle &angle = frame.getProperties().angles.angles[0];
    angle = Angle::ofPi(turnedBack(0, angle.multiple()));
  }
  expectComplaint("other pulses than asked for");
}

TEST_F(TamperTest, PulseMissing) {
  GateOp pulse = insertedGates("x").front();
  mlir::OpBuilder builder(pulse);
  DelayOp::create(builder, pulse.getLoc(), mlir::TypeRange(), pulse.getQubits(),
                  pulse.getProperties().duration);
  pulse.erase();
  expectComplaint("exceeds 1e-10");
}

TEST_F(TamperTest, OperationChanged) {
  std::vector<GateOp> gates = find<GateOp>(/*inserted=*/false);
  llvm::erase_if(gates, [](GateOp gate) { return gate.getGate() != "u3"; });
  ASSERT_FALSE(gates.empty());
  gates.front().getProperties().angles.angles[0] = Angle::radians(0.75);
  expectComplaint("has changed");
}

TEST_F(TamperTest, OperationsExchanged) {
  std::vector<GateOp> gates = find<GateOp>(/*inserted=*/false);
  ASSERT_GT(gates.size(), 2u);
  // The first ones, on different sites: only the order tells.
  gates[0]->moveAfter(gates[1]);
  EXPECT_FALSE(complaints().empty());
}

TEST_F(TamperTest, OperationGone) {
  find<GateOp>(/*inserted=*/false).back().erase();
  EXPECT_FALSE(complaints().empty());
}

TEST_F(TamperTest, WaitOfTheProgramFilled) {
  // An idle that should be left becomes a delay.
  IdleOp idle = find<IdleOp>(/*inserted=*/true).front();
  mlir::OpBuilder builder(idle);
  DelayOp::create(builder, idle.getLoc(), mlir::TypeRange(), idle.getQubit(),
                  idle.getProperties().duration);
  idle.erase();
  expectComplaint("should be left");
}

TEST_F(TamperTest, WindowForgotten) {
  // The output of a run that left what it should protect.
  written = mlir::OwningOpRef<mlir::ModuleOp>(scheduled->clone());
  expectComplaint("is left");
}
