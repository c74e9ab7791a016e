//===- Lexer.h - Text to tokens ---------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_LEXER_H
#define LULL_TARGET_OPENQASM_LEXER_H

#include "lull/Target/OpenQASM/Reporter.h"
#include "lull/Target/OpenQASM/Token.h"

namespace lull::qasm {

/// Reads a buffer once, from front to back, a token at a time; tokens point
/// into the buffer. What is no token is reported once and handed on as an Error
/// token.
class Lexer {
public:
  /// The most characters that a number may have, so that reading its value
  /// takes no time to speak of: more than 13,000 bits.
  static constexpr size_t MostDigits = 4096;

  Lexer(llvm::StringRef source, Reporter &reporter);

  /// The next token; End, again and again, behind the last one.
  Token next();

  /// Behind a `{`: skips to behind its `}`, whatever stands between (text of
  /// another language). Returns whether there is one.
  bool skipBlock();

  /// How many tokens next() has read, without End.
  size_t tokensRead() const { return count; }

private:
  Token scan();
  void skipBlanks();
  bool skipComment();
  Token finish(TokenKind kind);
  Token fail(llvm::SMLoc loc, std::string text);
  Token word();
  Token physicalQubit();
  Token string(char quote);
  /// To the end of the line.
  Token line(TokenKind kind);
  Token mark();
  Token stray();

  // Numbers.cpp
  Token number();
  bool digits(unsigned radix);
  bool decimal(bool &isFloat);
  bool suffix(llvm::StringRef text);

  bool atEnd() const { return at == end; }
  /// The byte so many behind the next one; 0 beyond the end.
  char peek(size_t ahead = 0) const {
    return size_t(end - at) > ahead ? at[ahead] : '\0';
  }
  /// The length in bytes of the letter or digit here that may go on a name; 0
  /// if there is none.
  size_t nameCharacter(const char *place) const;
  bool startsName(const char *place) const;
  bool startsStatement() const;
  const char *lineEnd() const;
  /// Reports the first byte from `begin` to `at` that is no text.
  bool checkText(const char *begin);

  const char *at;
  const char *end;
  Reporter &reporter;
  size_t count = 0;
  /// Of the token being read: where it starts, whether it is first on its line.
  const char *start;
  bool startsLine = true;
  TokenKind last = TokenKind::Semicolon;
};

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_LEXER_H
