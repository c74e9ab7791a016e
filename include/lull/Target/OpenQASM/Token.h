//===- Token.h - The words and marks of OpenQASM ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Tokens are the same in all versions of the language: what is a keyword, and
// what `^` means, is for the parser to say.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_TOKEN_H
#define LULL_TARGET_OPENQASM_TOKEN_H

#include "llvm/ADT/StringRef.h"
#include "llvm/Support/SMLoc.h"

#include <cstdint>
#include <string>

namespace lull::qasm {

enum class TokenKind : std::uint8_t {
  End,
  /// Something that the lexer has already complained about.
  Error,
  /// A name or a keyword.
  Word,
  /// `$12`.
  PhysicalQubit,
  /// `12`, `1_000`, `0x1F`.
  Integer,
  /// `1.5`, `.5`, `1.`, `1e3`.
  Float,
  /// `100ns`, `1.5 us`.
  Duration,
  /// `2im`.
  Imaginary,
  /// `"stdgates.inc"`.
  String,
  /// `"0101"`.
  Bits,
  /// `@name`, with all of its line.
  Annotation,
  /// `pragma` or `#pragma`, with all of its line.
  Pragma,

  LeftParen,
  RightParen,
  LeftBracket,
  RightBracket,
  LeftBrace,
  RightBrace,
  Comma,
  Semicolon,
  Colon,
  At,
  Arrow,
  /// `++`.
  Concatenate,

  Tilde,
  Exclamation,
  Plus,
  Minus,
  Star,
  Slash,
  Percent,
  /// `**`.
  StarStar,
  Ampersand,
  Bar,
  Caret,
  AmpersandAmpersand,
  BarBar,
  EqualEqual,
  ExclamationEqual,
  Less,
  LessEqual,
  Greater,
  GreaterEqual,
  LessLess,
  GreaterGreater,

  Equal,
  PlusEqual,
  MinusEqual,
  StarEqual,
  SlashEqual,
  PercentEqual,
  StarStarEqual,
  AmpersandEqual,
  BarEqual,
  CaretEqual,
  TildeEqual,
  LessLessEqual,
  GreaterGreaterEqual,
};

/// How a mark is written, such as `**=`; for other kinds what to call one in a
/// message, such as `a name`.
llvm::StringRef spell(TokenKind kind);

struct Token {
  TokenKind kind = TokenKind::End;
  /// Whether it is the first on its line.
  bool startsLine = true;
  /// All of it, as it stands in the source.
  llvm::StringRef text;

  llvm::SMLoc loc() const { return llvm::SMLoc::getFromPointer(text.data()); }
  /// The place behind its last byte.
  llvm::SMLoc endLoc() const {
    return llvm::SMLoc::getFromPointer(text.data() + text.size());
  }
  bool is(TokenKind other) const { return kind == other; }
};

/// The text in quotes, cut if it is long: for messages.
std::string quote(llvm::StringRef text);
/// What to call a token in a message: `'cx'`, `the end of the file`.
std::string describe(const Token &token);

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_TOKEN_H
