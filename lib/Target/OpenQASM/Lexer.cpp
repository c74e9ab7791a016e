//===- Lexer.cpp - Text to tokens -----------------------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Lexer.h"

#include "Letters.h"

#include "llvm/ADT/StringExtras.h"
#include "llvm/Support/ConvertUTF.h"

#include <fmt/format.h>

#include <algorithm>
#include <optional>

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Characters
//===----------------------------------------------------------------------===//

namespace {

struct Character {
  std::uint32_t codePoint;
  size_t length;
};

bool isAscii(char c) { return static_cast<unsigned char>(c) < 0x80; }

/// Control bytes without the tab, and DEL.
bool isControl(char c) {
  return (static_cast<unsigned char>(c) < 0x20 && c != '\t') || c == '\x7F';
}

/// The character at `place`; nothing if it is not UTF-8.
std::optional<Character> decode(const char *place, const char *end) {
  const auto *from = reinterpret_cast<const llvm::UTF8 *>(place);
  const auto *next = from;
  llvm::UTF32 codePoint = 0;
  if (llvm::convertUTF8Sequence(
          &next, reinterpret_cast<const llvm::UTF8 *>(end), &codePoint,
          llvm::strictConversion) != llvm::conversionOK)
    return std::nullopt;
  return Character{codePoint, size_t(next - from)};
}

std::string describeStray(const char *place, const char *end) {
  unsigned byte = static_cast<unsigned char>(*place);
  if (isControl(*place))
    return fmt::format("unexpected byte 0x{:02X}", byte);
  if (std::optional<Character> character = decode(place, end))
    return fmt::format("unexpected character '{}' (U+{:04X})",
                       llvm::StringRef(place, character->length).str(),
                       character->codePoint);
  return fmt::format("byte 0x{:02X} is not UTF-8", byte);
}

} // namespace

size_t Lexer::nameCharacter(const char *place) const {
  if (place == end)
    return 0;
  if (isAscii(*place))
    return llvm::isAlnum(*place) || *place == '_';
  std::optional<Character> character = decode(place, end);
  return character && isLetter(character->codePoint) ? character->length : 0;
}

bool Lexer::startsName(const char *place) const {
  return nameCharacter(place) > 0 && !llvm::isDigit(*place);
}

/// Whether a statement may start at the token being read: then `@name` is an
/// annotation and no part of a modifier, and `pragma` is a pragma and no name.
bool Lexer::startsStatement() const {
  switch (last) {
  case TokenKind::Semicolon:
  case TokenKind::LeftBrace:
  case TokenKind::RightBrace:
    return true;
  default:
    return startsLine;
  }
}

const char *Lexer::lineEnd() const {
  llvm::StringRef rest(at, end - at);
  size_t length = rest.find_first_of("\r\n");
  return length == llvm::StringRef::npos ? end : at + length;
}

bool Lexer::checkText(const char *begin) {
  for (const char *place = begin; place != at;) {
    size_t length = 1;
    if (isControl(*place)) {
      length = 0;
    } else if (!isAscii(*place)) {
      std::optional<Character> character = decode(place, at);
      length = character ? character->length : 0;
    }
    if (length == 0) {
      reporter.error(llvm::SMLoc::getFromPointer(place),
                     describeStray(place, at));
      return false;
    }
    place += length;
  }
  return true;
}

//===----------------------------------------------------------------------===//
// Tokens
//===----------------------------------------------------------------------===//

Lexer::Lexer(llvm::StringRef source, Reporter &reporter)
    : at(source.begin()), end(source.end()), reporter(reporter),
      start(source.begin()) {
  // The byte order mark, which some editors write.
  if (source.starts_with("\xEF\xBB\xBF"))
    at += 3;
}

Token Lexer::next() {
  Token token = scan();
  last = token.kind;
  startsLine = false;
  count += !token.is(TokenKind::End);
  return token;
}

Token Lexer::finish(TokenKind kind) {
  return {kind, startsLine, llvm::StringRef(start, at - start)};
}

Token Lexer::fail(llvm::SMLoc loc, std::string text) {
  reporter.error(loc, std::move(text));
  return finish(TokenKind::Error);
}

void Lexer::skipBlanks() {
  for (; !atEnd(); ++at) {
    if (*at == '\n' || *at == '\r')
      startsLine = true;
    else if (*at != ' ' && *at != '\t')
      return;
  }
}

/// Skips the comment that starts here. Returns false if it has no end.
bool Lexer::skipComment() {
  if (peek(1) == '/') {
    at = lineEnd();
    return true;
  }
  llvm::StringRef rest(at + 2, end - at - 2);
  size_t length = rest.find("*/");
  if (length == llvm::StringRef::npos) {
    at = end;
    return false;
  }
  startsLine |= rest.take_front(length).find('\n') != llvm::StringRef::npos;
  at += length + 4;
  return true;
}

Token Lexer::scan() {
  while (true) {
    skipBlanks();
    start = at;
    if (atEnd())
      return finish(TokenKind::End);
    if (*at != '/' || (peek(1) != '/' && peek(1) != '*'))
      break;
    if (!skipComment())
      return fail(llvm::SMLoc::getFromPointer(start), "comment has no end");
  }

  if (llvm::isDigit(*at) || (*at == '.' && llvm::isDigit(peek(1))))
    return number();
  if (startsName(at))
    return word();
  switch (*at) {
  case '"':
  case '\'':
    return string(*at);
  case '$':
    return physicalQubit();
  case '@':
    if (startsName(at + 1) && startsStatement())
      return line(TokenKind::Annotation);
    return mark();
  case '#': {
    llvm::StringRef rest(at, end - at);
    if (rest.starts_with("#pragma") && nameCharacter(at + 7) == 0)
      return line(TokenKind::Pragma);
    // A keyword that stands in subroutines only.
    if (rest.starts_with("#dim")) {
      ++at;
      return word();
    }
    return stray();
  }
  default:
    return mark();
  }
}

Token Lexer::word() {
  while (size_t length = nameCharacter(at))
    at += length;
  if (llvm::StringRef(start, at - start) == "pragma" && startsStatement())
    return line(TokenKind::Pragma);
  return finish(TokenKind::Word);
}

Token Lexer::physicalQubit() {
  ++at;
  while (llvm::isDigit(peek()))
    ++at;
  bool good = at - start > 1 && nameCharacter(at) == 0 && peek() != '$';
  while (nameCharacter(at) > 0 || peek() == '$')
    at += std::max<size_t>(nameCharacter(at), 1);
  if (good)
    return finish(TokenKind::PhysicalQubit);
  return fail(llvm::SMLoc::getFromPointer(start),
              quote(llvm::StringRef(start, at - start)) +
                  " is not a physical qubit such as $0");
}

Token Lexer::string(char quote) {
  const char *begin = ++at;
  while (!atEnd() && *at != quote && *at != '\n' && *at != '\r')
    ++at;
  if (peek() != quote)
    return fail(llvm::SMLoc::getFromPointer(start),
                "string has no end on its line");
  llvm::StringRef inside(begin, at - begin);
  bool isText = checkText(begin);
  ++at;
  if (!isText)
    return finish(TokenKind::Error);
  bool isBits = !inside.empty() && llvm::isDigit(inside.front()) &&
                llvm::isDigit(inside.back()) && !inside.contains("__") &&
                inside.find_first_not_of("01_") == llvm::StringRef::npos;
  return finish(isBits ? TokenKind::Bits : TokenKind::String);
}

Token Lexer::line(TokenKind kind) {
  at = lineEnd();
  if (!checkText(start))
    return finish(TokenKind::Error);
  return finish(kind);
}

Token Lexer::mark() {
  // Longer ones first.
  static constexpr TokenKind marks[] = {
      TokenKind::StarStarEqual,
      TokenKind::LessLessEqual,
      TokenKind::GreaterGreaterEqual,
      TokenKind::Arrow,
      TokenKind::Concatenate,
      TokenKind::StarStar,
      TokenKind::AmpersandAmpersand,
      TokenKind::BarBar,
      TokenKind::EqualEqual,
      TokenKind::ExclamationEqual,
      TokenKind::LessEqual,
      TokenKind::GreaterEqual,
      TokenKind::LessLess,
      TokenKind::GreaterGreater,
      TokenKind::PlusEqual,
      TokenKind::MinusEqual,
      TokenKind::StarEqual,
      TokenKind::SlashEqual,
      TokenKind::PercentEqual,
      TokenKind::AmpersandEqual,
      TokenKind::BarEqual,
      TokenKind::CaretEqual,
      TokenKind::TildeEqual,
      TokenKind::At,
      TokenKind::Tilde,
      TokenKind::Exclamation,
      TokenKind::Plus,
      TokenKind::Minus,
      TokenKind::Star,
      TokenKind::Slash,
      TokenKind::Percent,
      TokenKind::Ampersand,
      TokenKind::Bar,
      TokenKind::Caret,
      TokenKind::Less,
      TokenKind::Greater,
      TokenKind::Equal,
  };
  // The most frequent ones, none of which starts a longer one.
  static constexpr TokenKind single[] = {
      TokenKind::LeftParen,    TokenKind::RightParen, TokenKind::LeftBracket,
      TokenKind::RightBracket, TokenKind::LeftBrace,  TokenKind::RightBrace,
      TokenKind::Comma,        TokenKind::Semicolon,  TokenKind::Colon};
  size_t which = llvm::StringRef("()[]{},;:").find(*at);
  if (which != llvm::StringRef::npos) {
    ++at;
    return finish(single[which]);
  }
  llvm::StringRef rest(at, end - at);
  for (TokenKind kind : marks) {
    if (rest.starts_with(spell(kind))) {
      at += spell(kind).size();
      return finish(kind);
    }
  }
  return stray();
}

/// One error for a run of bytes that start no token.
Token Lexer::stray() {
  std::string text = describeStray(at, end);
  if (isAscii(*at) && !isControl(*at)) {
    llvm::StringRef rest(at, end - at);
    at += std::min(rest.find_first_not_of(*at), rest.size());
    return fail(llvm::SMLoc::getFromPointer(start), std::move(text));
  }
  while (!atEnd() && *at != '\n' && *at != '\r' &&
         (isAscii(*at) ? isControl(*at) : nameCharacter(at) == 0))
    ++at;
  return fail(llvm::SMLoc::getFromPointer(start), std::move(text));
}

bool Lexer::skipBlock() {
  for (size_t open = 1; !atEnd(); ++at) {
    open += *at == '{';
    open -= *at == '}';
    startsLine |= *at == '\n';
    if (open == 0) {
      ++at;
      last = TokenKind::RightBrace;
      return true;
    }
  }
  return false;
}
