//===- TimedProgram.cpp - A function as a scheduling problem ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/TimedProgram.h"

#include "lull/Analysis/ProgramReader.h"
#include "lull/Analysis/Report.h"

using namespace lull;
using namespace mlir;

FailureOr<TimedProgram> TimedProgram::read(Operation *function,
                                           const Device &device) {
  ProgramReader reader(function, device);
  FailureOr<Block *> body = reader.body();
  if (failed(body))
    return failure();
  TimedProgram program;
  program.root = function;
  program.target = &device;
  // No reserve: to count the operations is to walk the list, which costs more
  // than the copies of growth.
  for (Operation &op : **body) {
    FailureOr<bool> timed = reader.read(&op);
    if (failed(timed))
      return failure();
    if (!*timed)
      continue;
    const ProgramReader::Step &step = reader.step();
    while (program.input.numResources() < reader.numQubits())
      program.input.addQubit();
    program.input.add(step.kind, step.duration, step.qubits);
    program.ops.push_back(step.op);
  }
  for (ResourceId qubit = 0; qubit < reader.numQubits(); ++qubit) {
    program.sites.push_back(reader.site(qubit));
    program.handedIn.push_back(reader.isHandedIn(qubit));
    program.last.push_back(reader.value(qubit));
  }
  if (failed(report(program, program.input.check())))
    return failure();
  return std::move(program);
}
