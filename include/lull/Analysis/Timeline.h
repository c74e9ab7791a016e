//===- Timeline.h - When the operations of a function start -----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_TIMELINE_H
#define LULL_ANALYSIS_TIMELINE_H

#include "lull/Analysis/TimedProgram.h"
#include "lull/Timing/Schedule.h"

#include "mlir/Pass/AnalysisManager.h"

#include <optional>

namespace lull {

/// The start times that follow from a function's text by the timing rule: an
/// operation starts as soon as all its qubits are free. An analysis of the
/// function; passes that move and add nothing preserve it. If the function
/// cannot be timed, errors are emitted once and the analysis is invalid.
class Timeline {
public:
  Timeline(mlir::Operation *function, mlir::AnalysisManager &manager);

  bool isValid() const { return program.has_value(); }

  // Only if valid:
  const TimedProgram &read() const { return *program; }
  const Schedule &schedule() const { return asap; }
  Ticks start(OpId id) const { return asap.start[id]; }
  Ticks end() const { return length; }

private:
  std::optional<TimedProgram> program;
  Schedule asap;
  Ticks length = 0;
};

} // namespace lull

#endif // LULL_ANALYSIS_TIMELINE_H
