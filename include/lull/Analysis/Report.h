//===- Report.h - Violations in words ---------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_REPORT_H
#define LULL_ANALYSIS_REPORT_H

#include "lull/Analysis/TimedProgram.h"
#include "lull/Timing/Schedule.h"

namespace lull {

/// Emits a violation as an error at its operation, with a note at the other
/// one. The only place that words violations.
void report(const TimedProgram &program, const Violation &violation);

/// Emits that the end of an operation is beyond 64 bits.
void emitOverflow(mlir::Operation *op, Ticks start, Ticks duration);

/// Emits all of them; fails if there are any.
llvm::LogicalResult report(const TimedProgram &program,
                           llvm::ArrayRef<Violation> violations);

/// Why a qubit waits, in words: `waits for 'cx' on site 3`.
std::string describe(const TimedProgram &program, const Gap &gap);

/// What an operation is called in messages: the name under which the device
/// lists it, else its kind.
llvm::StringRef nameOf(TimedOpInterface op);

} // namespace lull

#endif // LULL_ANALYSIS_REPORT_H
