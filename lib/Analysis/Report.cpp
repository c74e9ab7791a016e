//===- Report.cpp - Violations in words -------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Report.h"

#include <fmt/format.h>

using namespace lull;
using namespace mlir;

StringRef lull::nameOf(TimedOpInterface op) {
  if (StringAttr name = op.getListedName())
    return name;
  return spell(op.getOperationKind());
}

static std::string overflowText(Ticks start, Ticks duration) {
  return fmt::format("starts at {} dt and takes {} dt: its end does not fit in "
                     "64 bits",
                     start, duration);
}

void lull::emitOverflow(Operation *op, Ticks start, Ticks duration) {
  op->emitError("'") << nameOf(cast<TimedOpInterface>(op)) << "' "
                     << overflowText(start, duration);
}

void lull::report(const TimedProgram &program, const Violation &violation) {
  using Rule = Violation::Rule;
  const Clock &clock = program.device().clock();
  TimedOpInterface op = program.op(violation.op);
  InFlightDiagnostic diag = op->emitError("'") << nameOf(op) << "' ";
  auto other = [&](const Twine &text) {
    diag.attachNote(program.op(violation.other)->getLoc()) << text;
  };
  switch (violation.rule) {
  case Rule::NegativeDuration:
    diag << "takes " << violation.found << " dt, which is negative";
    return;
  case Rule::BarrierTakesTime:
    diag << "takes " << violation.found << " dt when a barrier takes no time";
    return;
  case Rule::UnknownResource:
    diag << "occupies resource " << violation.resource << ", which is unknown";
    return;
  case Rule::ResourceTwice:
    diag << "acts twice on site " << program.site(violation.resource);
    return;
  case Rule::OrderBackward:
    diag << "must follow an operation that stands after it";
    other("this one");
    return;
  case Rule::StartMissing:
    diag << "has no start time";
    return;
  case Rule::StartNegative:
    diag << "starts at " << violation.found << " dt, before the program";
    return;
  case Rule::Overlap:
    diag << "starts on site " << program.site(violation.resource) << " at "
         << clock.describe(violation.found) << " when the operation before it "
         << "ends at " << clock.describe(violation.limit);
    other("the operation before it");
    return;
  case Rule::OrderBroken:
    diag << "starts at " << clock.describe(violation.found)
         << " when what it waits for ends at "
         << clock.describe(violation.limit);
    other("it waits for this");
    return;
  case Rule::Overflow:
    diag << overflowText(violation.found, violation.limit);
    return;
  }
}

LogicalResult lull::report(const TimedProgram &program,
                           ArrayRef<Violation> violations) {
  // A broken generator breaks every operation alike; a few errors tell.
  for (const Violation &violation : violations.take_front(10))
    report(program, violation);
  return failure(!violations.empty());
}

std::string lull::describe(const TimedProgram &program, const Gap &gap) {
  auto cause = [&] {
    std::string name = "'" + nameOf(program.op(gap.cause)).str() + "'";
    if (gap.causeQubit == NoResource ||
        !program.problem().isQubit(gap.causeQubit))
      return name;
    return fmt::format("{} on site {}", name, program.site(gap.causeQubit));
  };
  switch (gap.reason) {
  case GapReason::WaitsForOperation:
    return "waits for " + cause();
  case GapReason::WaitsAtBarrier:
    return "waits at a barrier for " + cause();
  case GapReason::WaitsForOrder:
    return fmt::format("waits for the outcome of '{}'",
                       nameOf(program.op(gap.cause)).str());
  case GapReason::NeededEarly:
    return "was needed early for " + cause();
  case GapReason::StartOfProgram:
    return "waits for its first operation";
  case GapReason::EndOfProgram:
    return "waits for the end of the program";
  case GapReason::Chosen:
    return "waits because the schedule chose so";
  }
  return "waits";
}
