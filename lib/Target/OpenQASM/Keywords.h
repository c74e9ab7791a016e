//===- Keywords.h - The keywords of each version ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_TARGET_OPENQASM_KEYWORDS_H
#define LULL_LIB_TARGET_OPENQASM_KEYWORDS_H

#include "lull/Target/OpenQASM/Syntax.h"

namespace lull::qasm {

enum class Keyword : std::uint8_t {
  None,
  Angle,
  Array,
  Barrier,
  Bit,
  Bool,
  Box,
  Break,
  Cal,
  Case,
  Complex,
  Const,
  Continue,
  Creg,
  Ctrl,
  Def,
  Defcal,
  Defcalgrammar,
  Default,
  Delay,
  Dim,
  Duration,
  DurationOf,
  Else,
  End,
  Extern,
  False,
  Float,
  For,
  Gate,
  If,
  In,
  Include,
  Input,
  Int,
  Inv,
  Let,
  Measure,
  Mutable,
  NegCtrl,
  Nop,
  Opaque,
  OpenQasm,
  Output,
  Pow,
  Qreg,
  Qubit,
  Readonly,
  Reset,
  Return,
  Stretch,
  Switch,
  True,
  UInt,
  Void,
  While,
};

struct KeywordEntry {
  llvm::StringLiteral text;
  Keyword keyword;
  /// The first version that has it.
  Version since;
};

/// The entry of a word that is a keyword in some version; nullptr for others.
const KeywordEntry *findKeyword(StringRef text);

} // namespace lull::qasm

#endif // LULL_LIB_TARGET_OPENQASM_KEYWORDS_H
