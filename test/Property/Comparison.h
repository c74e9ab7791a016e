//===- Comparison.h - Before and after --------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_COMPARISON_H
#define LULL_TEST_PROPERTY_COMPARISON_H

#include "Pipeline.h"

namespace lull::property {

/// What became of the windows of one family.
struct Tally {
  unsigned windows = 0;
  unsigned filled = 0;
  std::int64_t pulses = 0;
};

/// Holds one function of the output against the scheduled one and against what
/// was invented.
class Comparison {
public:
  Comparison(const RandomDevice &device, const Invented &invented,
             const Expectation &expectation, Tally &tally)
      : device(device), invented(invented), expectation(expectation),
        tally(tally) {}

  void checkScheduled(const ReadProgram &scheduled, SchedulePolicy policy);
  void checkProtected(const ReadProgram &scheduled, const ReadProgram &written);

private:
  void checkTight(const ReadProgram &program);
  void checkKept(const ReadProgram &scheduled, const ReadProgram &written);
  bool checkSite(int site, const ReadProgram &scheduled,
                 const ReadProgram &written);
  void checkFilled(const Window &window, const Played &expected);
  size_t collect(Window &window, size_t pulses, const ReadProgram &written,
                 llvm::ArrayRef<size_t> row, size_t next);

  const RandomDevice &device;
  const Invented &invented;
  const Expectation &expectation;
  Tally &tally;
};

/// Compares all functions of a case.
void compare(const Case &example, const Options &options,
             mlir::ModuleOp scheduled, mlir::ModuleOp written, Tally &tally);

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_COMPARISON_H
