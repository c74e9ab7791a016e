//===- Token.cpp - The words and marks of OpenQASM ------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Token.h"

#include "llvm/Support/ErrorHandling.h"

using namespace lull::qasm;

llvm::StringRef lull::qasm::spell(TokenKind kind) {
  switch (kind) {
  case TokenKind::End:
    return "the end of the file";
  case TokenKind::Error:
    return "an error";
  case TokenKind::Word:
    return "a name";
  case TokenKind::PhysicalQubit:
    return "a physical qubit";
  case TokenKind::Integer:
    return "an integer";
  case TokenKind::Float:
    return "a number";
  case TokenKind::Duration:
    return "a duration";
  case TokenKind::Imaginary:
    return "an imaginary number";
  case TokenKind::String:
    return "a string";
  case TokenKind::Bits:
    return "a string of bits";
  case TokenKind::Annotation:
    return "an annotation";
  case TokenKind::Pragma:
    return "a pragma";
  case TokenKind::LeftParen:
    return "(";
  case TokenKind::RightParen:
    return ")";
  case TokenKind::LeftBracket:
    return "[";
  case TokenKind::RightBracket:
    return "]";
  case TokenKind::LeftBrace:
    return "{";
  case TokenKind::RightBrace:
    return "}";
  case TokenKind::Comma:
    return ",";
  case TokenKind::Semicolon:
    return ";";
  case TokenKind::Colon:
    return ":";
  case TokenKind::At:
    return "@";
  case TokenKind::Arrow:
    return "->";
  case TokenKind::Concatenate:
    return "++";
  case TokenKind::Tilde:
    return "~";
  case TokenKind::Exclamation:
    return "!";
  case TokenKind::Plus:
    return "+";
  case TokenKind::Minus:
    return "-";
  case TokenKind::Star:
    return "*";
  case TokenKind::Slash:
    return "/";
  case TokenKind::Percent:
    return "%";
  case TokenKind::StarStar:
    return "**";
  case TokenKind::Ampersand:
    return "&";
  case TokenKind::Bar:
    return "|";
  case TokenKind::Caret:
    return "^";
  case TokenKind::AmpersandAmpersand:
    return "&&";
  case TokenKind::BarBar:
    return "||";
  case TokenKind::EqualEqual:
    return "==";
  case TokenKind::ExclamationEqual:
    return "!=";
  case TokenKind::Less:
    return "<";
  case TokenKind::LessEqual:
    return "<=";
  case TokenKind::Greater:
    return ">";
  case TokenKind::GreaterEqual:
    return ">=";
  case TokenKind::LessLess:
    return "<<";
  case TokenKind::GreaterGreater:
    return ">>";
  case TokenKind::Equal:
    return "=";
  case TokenKind::PlusEqual:
    return "+=";
  case TokenKind::MinusEqual:
    return "-=";
  case TokenKind::StarEqual:
    return "*=";
  case TokenKind::SlashEqual:
    return "/=";
  case TokenKind::PercentEqual:
    return "%=";
  case TokenKind::StarStarEqual:
    return "**=";
  case TokenKind::AmpersandEqual:
    return "&=";
  case TokenKind::BarEqual:
    return "|=";
  case TokenKind::CaretEqual:
    return "^=";
  case TokenKind::TildeEqual:
    return "~=";
  case TokenKind::LessLessEqual:
    return "<<=";
  case TokenKind::GreaterGreaterEqual:
    return ">>=";
  }
  llvm_unreachable("all kinds are handled");
}

std::string lull::qasm::quote(llvm::StringRef text) {
  constexpr size_t most = 40;
  if (text.size() <= most)
    return "'" + text.str() + "'";
  size_t length = most;
  // Not within a character of UTF-8.
  while (length > 0 && (text[length] & 0xC0) == 0x80)
    --length;
  return "'" + text.take_front(length).str() + "...'";
}

std::string lull::qasm::describe(const Token &token) {
  if (token.is(TokenKind::End) || token.is(TokenKind::Error))
    return spell(token.kind).str();
  return quote(token.text);
}
