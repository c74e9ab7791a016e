//===- Program.h - Programs as the test knows them --------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Two views of a function: what was invented, and what is read from the IR.
// Operations are told apart by a number of the test's own that each of them
// carries (`tag`); what the passes insert has none.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_PROGRAM_H
#define LULL_TEST_PROPERTY_PROGRAM_H

#include "RandomDevice.h"

#include "mlir/Dialect/Func/IR/FuncOps.h"

#include <map>

namespace lull::property {

/// What is asked for: a sequence by name or symbol, or nothing.
struct Wish {
  /// Empty: no wish. `none`, `xy8`, `@mine`.
  std::string sequence;
  /// Zero: as the options say.
  unsigned repeats = 0;
  bool alternating = false;
};

/// One invented operation.
struct InventedOp {
  std::string kind;
  std::string name;
  std::vector<int> sites;
  std::int64_t duration = 0;
  /// How the program states the duration; empty if it leaves it to the device.
  std::string stated;
  Wish wish;
};

struct Invented {
  std::string name;
  std::string text;
  /// By tag.
  std::vector<InventedOp> ops;

  /// Start times by the timing rule, and mirrored in time.
  std::vector<std::int64_t> asap() const;
  std::vector<std::int64_t> alap() const;
  std::int64_t makespan() const;
};

Invented inventProgram(Random &random, const RandomDevice &device,
                       std::string name);

/// One timed operation as it stands in the IR, with the start that follows.
struct ReadOp {
  mlir::Operation *op = nullptr;
  /// `gate`, `measure`, `idle` ...
  llvm::StringRef kind;
  /// Of a gate.
  llvm::StringRef name;
  std::vector<int> sites;
  std::int64_t duration = 0;
  std::int64_t start = 0;
  /// -1 if it has none.
  int tag = -1;
};

struct ReadProgram {
  std::vector<ReadOp> ops;
  /// Numbers of operations by site, in order.
  std::map<int, std::vector<size_t>> bySite;
  std::map<int, std::int64_t> end;
};

/// Reads a function. Durations in dt only, but for those of tagged operations,
/// which are known.
ReadProgram readProgram(mlir::func::FuncOp function, const Invented &invented);

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_PROGRAM_H
