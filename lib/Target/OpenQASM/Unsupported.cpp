//===- Unsupported.cpp - What is outside the subset -----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Nothing of the language is skipped in silence: each construct that is not
// read is reported once, where it starts, and then skipped as a whole.
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

#include <fmt/format.h>

using namespace lull::qasm;

bool Parser::unsupportedKeyword() const {
  switch (keyword) {
  case Keyword::Array:
  case Keyword::Break:
  case Keyword::Cal:
  case Keyword::Complex:
  case Keyword::Continue:
  case Keyword::Def:
  case Keyword::Defcal:
  case Keyword::Defcalgrammar:
  case Keyword::End:
  case Keyword::Extern:
  case Keyword::Return:
  case Keyword::Switch:
  case Keyword::While:
    return true;
  default:
    return false;
  }
}

Stmt *Parser::unsupported() {
  SMLoc loc = token.loc();
  std::string text = describe(token);
  switch (keyword) {
  case Keyword::Cal:
  case Keyword::Defcal:
  case Keyword::Defcalgrammar:
    return calibration();
  case Keyword::Def:
  case Keyword::Extern:
    advance();
    error(loc, fmt::format("subroutines are not supported: inline {} before "
                           "import",
                           at(TokenKind::Word) ? describe(token) : text));
    break;
  case Keyword::Return:
    error(loc, "subroutines are not supported: 'return' stands in them only");
    break;
  case Keyword::Array:
  case Keyword::Complex:
    error(loc, fmt::format("run-time classical values are not supported (only "
                           "compile-time constants): {}",
                           text));
    break;
  default:
    error(loc, fmt::format("run-time control flow is not supported: {}", text));
    break;
  }
  // The lines of a header may start with what else starts a statement.
  skipWithElse(/*resume=*/false);
  return nullptr;
}

/// The text of a calibration is of another language: its braces are all that is
/// known of it.
Stmt *Parser::calibration() {
  SMLoc loc = token.loc();
  if (options.ignoreCalibrations)
    reporter.warning(loc, fmt::format("{} ignored", describe(token)));
  else
    error(loc, "calibration text is not supported: give durations in the "
               "device file (--ignore-calibrations skips it with a warning)");
  skipped = true;
  while (!at(TokenKind::LeftBrace) && !at(TokenKind::Semicolon) &&
         !at(TokenKind::RightBrace) && !at(TokenKind::End))
    advance();
  if (!at(TokenKind::LeftBrace)) {
    accept(TokenKind::Semicolon);
    return nullptr;
  }
  SMLoc open = token.loc();
  if (!lexer.skipBlock()) {
    // Otherwise it has been reported already.
    if (options.ignoreCalibrations)
      error(open, "calibration text has no end");
    advance();
    noteEnd();
    return nullptr;
  }
  advance();
  return nullptr;
}

/// Reports a call of what is no function of the language. Returns false.
bool Parser::unsupportedCall(Name function, bool isStatement) {
  if (function.text == "real" || function.text == "imag")
    return error(function.loc, "complex numbers are not supported");
  return error(
      function.loc,
      fmt::format("subroutines are not supported: inline {} before "
                  "import{}",
                  quote(function.text),
                  isStatement ? ", or name its qubits if it is a gate" : ""));
}
