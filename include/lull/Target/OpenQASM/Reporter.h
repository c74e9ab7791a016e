//===- Reporter.h - Where the messages about a program go -------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Lexer and parser say where and what; whoever called them decides how it is
// shown. Locations are pointers into the buffers of an llvm::SourceMgr.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_REPORTER_H
#define LULL_TARGET_OPENQASM_REPORTER_H

#include "llvm/ADT/ArrayRef.h"
#include "llvm/Support/SMLoc.h"

#include <functional>
#include <string>
#include <utility>
#include <vector>

namespace lull::qasm {

/// A second place that a message speaks of.
struct Note {
  llvm::SMLoc loc;
  std::string text;
};

/// One error or warning: a clause in lower case without a final period.
struct Message {
  bool isError = true;
  llvm::SMLoc loc;
  std::string text;
  std::vector<Note> notes;
};

/// Passes messages on, and counts the errors. What comes after the last error
/// that it takes becomes one `too many errors`, then nothing.
class Reporter {
public:
  using Sink = std::function<void(const Message &)>;
  static constexpr unsigned MostErrors = 20;

  explicit Reporter(Sink sink) : sink(std::move(sink)) {}

  void error(llvm::SMLoc loc, std::string text, std::vector<Note> notes = {});
  void warning(llvm::SMLoc loc, std::string text, std::vector<Note> notes = {});

  /// The number of errors passed on, without `too many errors`.
  unsigned errors() const { return count; }
  /// Whether it has said `too many errors`: nothing more need be read.
  bool exhausted() const { return full; }

private:
  Sink sink;
  unsigned count = 0;
  bool full = false;
};

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_REPORTER_H
