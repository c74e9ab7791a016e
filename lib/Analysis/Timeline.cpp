//===- Timeline.cpp - When the operations of a function start ---*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Timeline.h"

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/Report.h"
#include "lull/Timing/Schedulers.h"

using namespace lull;
using namespace mlir;

/// The devices that a pass on an ancestor has looked up, if one has.
static const Devices *cachedDevices(Operation *function,
                                    AnalysisManager &manager) {
  for (Operation *at = function->getParentOp(); at; at = at->getParentOp())
    if (auto cached = manager.getCachedParentAnalysis<Devices>(at))
      return &cached->get();
  return nullptr;
}

Timeline::Timeline(Operation *function, AnalysisManager &manager) {
  const Devices *devices = cachedDevices(function, manager);
  if (!devices) {
    function->emitError("timed without the devices of its module");
    return;
  }
  const Device *device = devices->require(function);
  if (!device)
    return;
  FailureOr<TimedProgram> result = TimedProgram::read(function, *device);
  if (failed(result))
    return;
  if (std::optional<Violation> violation =
          scheduleAsap(result->problem(), asap)) {
    report(*result, *violation);
    return;
  }
  program = std::move(*result);
  length = makespan(program->problem(), asap);
}
