//===- Parser.h - Text to a tree --------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_PARSER_H
#define LULL_TARGET_OPENQASM_PARSER_H

#include "lull/Target/OpenQASM/Arena.h"
#include "lull/Target/OpenQASM/Reporter.h"
#include "lull/Target/OpenQASM/Syntax.h"

namespace lull::qasm {

struct ParseOptions {
  /// For an included file: the version of the program that includes it. A
  /// version line in it must then say the same.
  std::optional<Version> version;
  /// Skip `cal`, `defcal` and `defcalgrammar` with a warning, not an error.
  bool ignoreCalibrations = false;
};

/// What came of a text. The program has all statements without errors in them;
/// whether there were errors, the reporter knows.
struct ParseResult {
  Program program;
  /// How many tokens were read: each exactly once.
  size_t tokens = 0;
};

/// Parses one file. Includes are statements of the result; nothing is opened.
/// The tree lives as long as both `source` and `arena`.
ParseResult parse(StringRef source, Arena &arena, Reporter &reporter,
                  const ParseOptions &options = {});

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_PARSER_H
