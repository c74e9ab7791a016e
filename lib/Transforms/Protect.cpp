//===- Protect.cpp - The pipeline lull-protect ------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Transforms/Passes.h"

#include "mlir/Pass/PassManager.h"
#include "mlir/Pass/PassRegistry.h"

using namespace lull;
using namespace mlir;

void lull::buildProtectPipeline(OpPassManager &manager,
                                const ProtectOptions &options) {
  // Without either, the module must hold its device already.
  if (!options.file.empty() || !options.device.empty()) {
    LullUseDeviceOptions use;
    use.file = options.file;
    use.name = options.device;
    manager.addPass(createLullUseDevice(use));
  }
  LullSetDurationsOptions durations;
  durations.replace = options.replace;
  manager.addPass(createLullSetDurations(durations));

  LullScheduleOptions schedule;
  schedule.policy = options.policy;
  schedule.liveAtStart = options.liveAtStart;
  schedule.spentAtEnd = options.spentAtEnd;
  manager.addPass(createLullSchedule(schedule));

  LullAssignOptions assign;
  assign.sequence = options.sequence;
  assign.repeats = options.repeats;
  assign.spacing = options.spacing;
  assign.alternating = options.alternating;
  assign.leastWindow = options.leastWindow;
  assign.alsoBasis = options.alsoBasis;
  assign.alsoSpent = options.alsoSpent;
  manager.addPass(createLullAssign(assign));

  // The same as emitting and lull-native, without writing every pulse twice;
  // lull-native remains for pulses that the program had already.
  LullEmitOptions emit;
  emit.native = options.native;
  manager.addPass(createLullEmit(emit));
  if (options.native)
    manager.addPass(createLullNative());
}

void lull::registerProtectPipeline() {
  PassPipelineRegistration<ProtectOptions>(
      "lull-protect",
      "Schedule, decide, place, emit and play: all passes with the options of "
      "all of them",
      buildProtectPipeline);
}
