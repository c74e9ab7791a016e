//===- Numbers.cpp - Numbers, durations, and their values -----------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Lexer.h"
#include "lull/Target/OpenQASM/Syntax.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/APFloat.h"
#include "llvm/ADT/StringExtras.h"

#include <algorithm>

using namespace lull;
using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Text to tokens
//===----------------------------------------------------------------------===//

/// Reads digits, single underscores between them. Returns whether there is one
/// and none is followed by an underscore without another.
bool Lexer::digits(unsigned radix) {
  bool good = false;
  for (; !atEnd(); ++at) {
    if (llvm::hexDigitValue(*at) < radix)
      good = true;
    else if (*at == '_' && good)
      good = false;
    else
      break;
  }
  return good;
}

/// Reads `1_000`, `.5`, `1.`, `1.5e-3`.
bool Lexer::decimal(bool &isFloat) {
  if (*at != '.' && !digits(10))
    return false;
  if (peek() == '.') {
    isFloat = true;
    ++at;
    // Needs digits on one side of the point.
    if ((llvm::isDigit(peek()) || at - start == 1) && !digits(10))
      return false;
  }
  if (peek() != 'e' && peek() != 'E')
    return true;
  isFloat = true;
  ++at;
  if (peek() == '+' || peek() == '-')
    ++at;
  return digits(10);
}

/// Reads a unit such as `ns` if it stands here and is not the start of a longer
/// word.
bool Lexer::suffix(llvm::StringRef text) {
  if (!llvm::StringRef(at, end - at).starts_with(text) ||
      nameCharacter(at + text.size()) > 0)
    return false;
  at += text.size();
  return true;
}

Token Lexer::number() {
  bool isFloat = false;
  bool good;
  llvm::StringRef prefix(start, std::min<size_t>(end - start, 2));
  bool isDecimal = false;
  if (prefix.equals_insensitive("0b") || prefix.equals_insensitive("0o") ||
      prefix.equals_insensitive("0x")) {
    at += 2;
    char letter = llvm::toLower(prefix.back());
    good = digits(letter == 'b' ? 2 : letter == 'o' ? 8 : 16);
  } else {
    isDecimal = true;
    good = decimal(isFloat);
  }
  llvm::SMLoc loc = llvm::SMLoc::getFromPointer(start);
  TokenKind kind = isFloat ? TokenKind::Float : TokenKind::Integer;
  size_t length = at - start;

  // A unit stands directly behind it or behind blanks, but not on the next
  // line. The micro sign and the Greek letter, in UTF-8.
  const char *behind = at;
  while (isDecimal && good && (peek() == ' ' || peek() == '\t'))
    ++at;
  if (isDecimal && good) {
    for (llvm::StringRef unit :
         {"dt", "ns", "us", "\xC2\xB5s", "\xCE\xBCs", "ms", "s"})
      if (kind != TokenKind::Duration && suffix(unit))
        kind = TokenKind::Duration;
    if (kind != TokenKind::Duration && suffix("im"))
      kind = TokenKind::Imaginary;
  }
  if (kind == TokenKind::Integer || kind == TokenKind::Float)
    at = behind;

  if (nameCharacter(at) > 0 || (peek() == '.' && llvm::isDigit(peek(1))))
    good = false;
  if (!good) {
    while (nameCharacter(at) > 0 || peek() == '.')
      at += std::max<size_t>(nameCharacter(at), 1);
    return fail(loc, quote(llvm::StringRef(start, at - start)) +
                         " is neither a number nor a duration");
  }
  if (length > MostDigits)
    return fail(loc, fmt::format("number has {} characters when it may have {}",
                                 length, MostDigits));
  return finish(kind);
}

//===----------------------------------------------------------------------===//
// Values
//===----------------------------------------------------------------------===//

static std::string withoutUnderscores(llvm::StringRef text) {
  std::string digits = text.str();
  llvm::erase(digits, '_');
  return digits;
}

llvm::APInt IntegerLiteral::value() const {
  std::string digits = withoutUnderscores(text);
  llvm::StringRef rest = digits;
  unsigned radix = 10;
  if (rest.consume_front_insensitive("0b"))
    radix = 2;
  else if (rest.consume_front_insensitive("0o"))
    radix = 8;
  else if (rest.consume_front_insensitive("0x"))
    radix = 16;
  llvm::APInt value(llvm::APInt::getBitsNeeded(rest, radix) + 1, rest, radix);
  return value.trunc(std::max(value.getActiveBits(), 1u));
}

std::optional<std::int64_t> IntegerLiteral::small() const {
  llvm::APInt exact = value();
  if (exact.getActiveBits() > 63)
    return std::nullopt;
  return std::int64_t(exact.getZExtValue());
}

llvm::Expected<double> lull::qasm::parseFloat(llvm::StringRef text) {
  llvm::APFloat value(llvm::APFloat::IEEEdouble());
  llvm::Expected<llvm::APFloat::opStatus> status = value.convertFromString(
      withoutUnderscores(text), llvm::APFloat::rmNearestTiesToEven);
  if (!status)
    return status.takeError();
  if (*status & llvm::APFloat::opOverflow)
    return fault("number {} is too large for a double", quote(text));
  return value.convertToDouble();
}

/// `1.5e-3` as `0.0015`; fails on an exponent beyond all times.
static llvm::Expected<std::string> spellPlainly(llvm::StringRef number) {
  std::string text = withoutUnderscores(number);
  auto [mantissa, power] = llvm::StringRef(text).split(
      llvm::StringRef(text).contains('e') ? 'e' : 'E');
  int exponent = 0;
  power.consume_front("+");
  if (!power.empty() &&
      (power.getAsInteger(10, exponent) || exponent < -64 || exponent > 64))
    return fault("exponent of {} is not between -64 and 64", quote(number));
  auto [whole, behind] = mantissa.split('.');
  std::string digits = (whole + behind).str();
  // Where the point stands in `digits`, which then grow to hold it.
  int point = int(whole.size()) + exponent;
  if (point < 1) {
    digits.insert(0, size_t(1 - point), '0');
    point = 1;
  }
  if (size_t(point) > digits.size())
    digits.append(point - digits.size(), '0');
  if (size_t(point) < digits.size())
    digits.insert(point, ".");
  return digits;
}

llvm::Expected<Duration> DurationLiteral::value() const {
  llvm::Expected<std::string> plain = spellPlainly(number);
  if (!plain)
    return plain.takeError();
  return Duration::parse(*plain, unit);
}
