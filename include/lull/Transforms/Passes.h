//===- Passes.h - The passes ------------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_PASSES_H
#define LULL_TRANSFORMS_PASSES_H

#include "lull/Timing/Schedulers.h"

#include "mlir/IR/BuiltinOps.h"
#include "mlir/Pass/Pass.h"
#include "mlir/Pass/PassOptions.h"

namespace lull {

#define GEN_PASS_DECL
#include "lull/Transforms/Passes.h.inc"

#define GEN_PASS_REGISTRATION
#include "lull/Transforms/Passes.h.inc"

/// Options of the pipeline `lull-protect`: those of its passes.
struct ProtectOptions : mlir::PassPipelineOptions<ProtectOptions> {
  Option<std::string> file{*this, "file",
                           llvm::cl::desc("File that holds the device")};
  Option<std::string> device{
      *this, "device",
      llvm::cl::desc("Name of a built-in demo device, or of the device in the "
                     "module")};
  Option<bool> replace{
      *this, "replace",
      llvm::cl::desc("Replace durations that the program states"),
      llvm::cl::init(false)};
  Option<SchedulePolicy> policy{
      *this, "policy", llvm::cl::desc("When operations start"),
      llvm::cl::init(SchedulePolicy::ASAP),
      llvm::cl::values(
          clEnumValN(SchedulePolicy::ASAP, "asap", "as soon as possible"),
          clEnumValN(SchedulePolicy::ALAP, "alap", "as late as possible"))};
  Option<bool> liveAtStart{
      *this, "live-at-start",
      llvm::cl::desc("Qubits hold states that matter when the function starts"),
      llvm::cl::init(false)};
  Option<bool> spentAtEnd{
      *this, "spent-at-end",
      llvm::cl::desc("Qubits are not used after the function ends"),
      llvm::cl::init(false)};
  Option<std::string> sequence{
      *this, "sequence",
      llvm::cl::desc("Sequence for the windows: a name such as xy8, or "
                     "@symbol; none protects only the windows with a wish or "
                     "a plan"),
      llvm::cl::init("xy4")};
  Option<unsigned> repeats{
      *this, "repeats",
      llvm::cl::desc("How often the sequence is repeated in a window"),
      llvm::cl::init(1)};
  Option<std::string> spacing{
      *this, "spacing",
      llvm::cl::desc("Repeat as often as pulses stay this far apart on "
                     "average")};
  Option<bool> alternating{
      *this, "alternating",
      llvm::cl::desc("Flip the signs of all pulses in every second repeat"),
      llvm::cl::init(false)};
  Option<std::string> leastWindow{
      *this, "least-window",
      llvm::cl::desc("Leave shorter windows, such as '500 ns'")};
  Option<bool> alsoBasis{*this, "also-basis",
                         llvm::cl::desc("Protect windows in a basis state too"),
                         llvm::cl::init(false)};
  Option<bool> alsoSpent{*this, "also-spent",
                         llvm::cl::desc("Protect windows of spent qubits too"),
                         llvm::cl::init(false)};
  Option<bool> native{
      *this, "native",
      llvm::cl::desc("Play the pulses with the operations of the device"),
      llvm::cl::init(true)};
};

/// Adds the passes of `lull-protect`.
void buildProtectPipeline(mlir::OpPassManager &manager,
                          const ProtectOptions &options);
void registerProtectPipeline();

} // namespace lull

#endif // LULL_TRANSFORMS_PASSES_H
