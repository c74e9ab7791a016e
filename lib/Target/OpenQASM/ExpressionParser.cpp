//===- ExpressionParser.cpp - Expressions, by precedence ------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

#include "llvm/ADT/StringSwitch.h"

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Operators
//===----------------------------------------------------------------------===//

namespace {

struct Operator {
  /// The precedence, from 1; 0 for what is no binary operator. A power, which
  /// binds tighter than a sign, is none of these: see Parser::power.
  unsigned level = 0;
  BinaryOp op = BinaryOp::Or;
  Version since = Version::V3_0;
};

} // namespace

static Operator operatorOf(TokenKind kind, Version version) {
  switch (kind) {
  case TokenKind::BarBar:
    return {1, BinaryOp::Or, Version::V3_0};
  case TokenKind::AmpersandAmpersand:
    return {2, BinaryOp::And, Version::V3_0};
  case TokenKind::Bar:
    return {3, BinaryOp::BitOr, Version::V3_0};
  case TokenKind::Caret:
    // A power in version 2.
    if (version == Version::V2_0)
      return {};
    return {4, BinaryOp::BitXor, Version::V3_0};
  case TokenKind::Ampersand:
    return {5, BinaryOp::BitAnd, Version::V3_0};
  case TokenKind::EqualEqual:
    return {6, BinaryOp::Equal, Version::V2_0};
  case TokenKind::ExclamationEqual:
    return {6, BinaryOp::NotEqual, Version::V3_0};
  case TokenKind::Less:
    return {7, BinaryOp::Less, Version::V3_0};
  case TokenKind::LessEqual:
    return {7, BinaryOp::LessEqual, Version::V3_0};
  case TokenKind::Greater:
    return {7, BinaryOp::Greater, Version::V3_0};
  case TokenKind::GreaterEqual:
    return {7, BinaryOp::GreaterEqual, Version::V3_0};
  case TokenKind::LessLess:
    return {8, BinaryOp::ShiftLeft, Version::V3_0};
  case TokenKind::GreaterGreater:
    return {8, BinaryOp::ShiftRight, Version::V3_0};
  case TokenKind::Plus:
    return {9, BinaryOp::Add, Version::V2_0};
  case TokenKind::Minus:
    return {9, BinaryOp::Subtract, Version::V2_0};
  case TokenKind::Star:
    return {10, BinaryOp::Multiply, Version::V2_0};
  case TokenKind::Slash:
    return {10, BinaryOp::Divide, Version::V2_0};
  case TokenKind::Percent:
    return {10, BinaryOp::Modulo, Version::V3_0};
  default:
    return {};
  }
}

/// Reads operators of at least the precedence `least`.
const Expr *Parser::binary(unsigned least) {
  const Expr *left = unary();
  while (left) {
    Operator found = operatorOf(token.kind, program.version);
    unsigned level = found.level;
    if (level == 0 || level < least)
      return left;
    llvm::SmallVector<Chain::Link, 2> rest;
    while (found.level == level) {
      SMLoc loc = token.loc();
      if (!needs(found.since, loc, token.text))
        return nullptr;
      advance();
      const Expr *operand = binary(level + 1);
      if (!operand)
        return nullptr;
      rest.push_back({found.op, loc, operand});
      found = operatorOf(token.kind, program.version);
    }
    left = arena.make(Chain{{left->loc}, left, arena.copy(rest)});
  }
  return nullptr;
}

const Expr *Parser::unary() {
  Unary::Op op;
  switch (token.kind) {
  case TokenKind::Minus:
    op = Unary::Op::Negate;
    break;
  case TokenKind::Exclamation:
    op = Unary::Op::Not;
    break;
  case TokenKind::Tilde:
    op = Unary::Op::BitNot;
    break;
  default:
    return power();
  }
  SMLoc loc = token.loc();
  Level level(*this);
  if (tooDeep(loc) ||
      (op != Unary::Op::Negate && !needs(Version::V3_0, loc, token.text)))
    return nullptr;
  advance();
  const Expr *operand = unary();
  if (!operand)
    return nullptr;
  return arena.make(Unary{{loc}, op, operand});
}

/// `-a ** b` is `-(a ** b)`, `a ** -b ** c` is `a ** (-(b ** c))`.
const Expr *Parser::power() {
  const Expr *base = primary();
  if (!base)
    return nullptr;
  bool isVersion2 = program.version == Version::V2_0;
  SMLoc loc = token.loc();
  if (at(TokenKind::StarStar)) {
    if (!needs(Version::V3_0, loc, "**"))
      return nullptr;
  } else if (!at(TokenKind::Caret) || !isVersion2) {
    return base;
  }
  Level level(*this);
  if (tooDeep(loc))
    return nullptr;
  advance();
  const Expr *exponent = unary();
  if (!exponent)
    return nullptr;
  Chain::Link link = {BinaryOp::Power, loc, exponent};
  return arena.make(
      Chain{{base->loc}, base, arena.copy(ArrayRef<Chain::Link>(link))});
}

//===----------------------------------------------------------------------===//
// Operands
//===----------------------------------------------------------------------===//

const Expr *Parser::primary() {
  switch (token.kind) {
  case TokenKind::LeftParen:
    return parenthesized();
  case TokenKind::PhysicalQubit:
    return reference("an expression");
  case TokenKind::Word:
    break;
  default:
    return literal();
  }

  switch (keyword) {
  case Keyword::None:
  case Keyword::Pow:
    break;
  case Keyword::True:
  case Keyword::False: {
    bool value = at(Keyword::True);
    SMLoc loc = token.loc();
    advance();
    return arena.make(BooleanLiteral{{loc}, value});
  }
  case Keyword::DurationOf:
    return durationOf();
  case Keyword::Complex:
  case Keyword::Array:
    unsupported();
    return nullptr;
  default:
    if (typeKeyword())
      return cast();
    unexpected("an expression");
    return nullptr;
  }

  Name name = {token.loc(), token.text};
  bool isKeyword = !at(Keyword::None);
  advance();
  if (at(TokenKind::LeftParen))
    return call(name);
  if (isKeyword) {
    unexpected("'(' after 'pow'");
    return nullptr;
  }
  std::optional<ArrayRef<Index>> read = indices();
  if (!read)
    return nullptr;
  return arena.make(Reference{{name.loc}, name.text, *read});
}

const Expr *Parser::literal() {
  Token read = token;
  SMLoc loc = read.loc();
  switch (read.kind) {
  case TokenKind::Integer:
    advance();
    return arena.make(IntegerLiteral{{loc}, read.text});
  case TokenKind::Float: {
    llvm::Expected<double> value = parseFloat(read.text);
    if (!value) {
      error(loc, llvm::toString(value.takeError()));
      return nullptr;
    }
    advance();
    return arena.make(FloatLiteral{{loc}, read.text, *value});
  }
  case TokenKind::Duration: {
    if (!needs(Version::V3_0, loc, read.text))
      return nullptr;
    advance();
    size_t digits = read.text.find_last_of("0123456789.") + 1;
    return arena.make(
        DurationLiteral{{loc},
                        read.text.take_front(digits),
                        *parseTimeUnit(read.text.drop_front(digits).ltrim())});
  }
  case TokenKind::Bits:
    if (!needs(Version::V3_0, loc, read.text))
      return nullptr;
    advance();
    return arena.make(BitsLiteral{{loc}, read.text.drop_front().drop_back()});
  case TokenKind::Imaginary:
    error(loc, "complex numbers are not supported");
    return nullptr;
  default:
    unexpected("an expression");
    return nullptr;
  }
}

const Expr *Parser::parenthesized() {
  SMLoc open = token.loc();
  Level level(*this);
  if (tooDeep(open))
    return nullptr;
  advance();
  const Expr *inside = expression();
  if (!inside || !expectClosing(TokenKind::RightParen, open))
    return nullptr;
  return inside;
}

const Expr *Parser::durationOf() {
  SMLoc loc = token.loc();
  advance();
  SMLoc open = token.loc();
  if (!expect(TokenKind::LeftParen, "after 'durationof'"))
    return nullptr;
  std::optional<Body> body = block();
  if (!body || !expectClosing(TokenKind::RightParen, open))
    return nullptr;
  return arena.make(DurationOf{{loc}, *body});
}

const Expr *Parser::cast() {
  SMLoc loc = token.loc();
  std::optional<TypeName> to = type();
  if (!to)
    return nullptr;
  if (!at(TokenKind::LeftParen)) {
    unexpected("'(' after the type to cast to");
    return nullptr;
  }
  const Expr *operand = parenthesized();
  if (!operand)
    return nullptr;
  return arena.make(Cast{{loc}, *to, operand});
}

static std::optional<Function> findFunction(StringRef name, Version version) {
  return llvm::StringSwitch<std::optional<Function>>(name)
      .Case("arccos", Function::Arccos)
      .Case("arcsin", Function::Arcsin)
      .Case("arctan", Function::Arctan)
      .Case("ceiling", Function::Ceiling)
      .Case("cos", Function::Cos)
      .Case("exp", Function::Exp)
      .Case("floor", Function::Floor)
      .Case("ln", version == Version::V2_0 ? std::optional(Function::Ln)
                                           : std::nullopt)
      .Case("log", Function::Log)
      .Case("mod", Function::Mod)
      .Case("popcount", Function::Popcount)
      .Case("pow", Function::Pow)
      .Case("rotl", Function::Rotl)
      .Case("rotr", Function::Rotr)
      .Case("sin", Function::Sin)
      .Case("sizeof", Function::Sizeof)
      .Case("sqrt", Function::Sqrt)
      .Case("tan", Function::Tan)
      .Default(std::nullopt);
}

const Expr *Parser::call(Name name) {
  std::optional<Function> function = findFunction(name.text, program.version);
  if (!function) {
    unsupportedCall(name, /*isStatement=*/false);
    return nullptr;
  }
  std::optional<ArrayRef<const Expr *>> read = arguments();
  if (!read)
    return nullptr;
  return arena.make(Call{{name.loc}, *function, *read});
}

std::optional<ArrayRef<const Expr *>> Parser::arguments() {
  SMLoc open = token.loc();
  Level level(*this);
  if (tooDeep(open))
    return std::nullopt;
  advance();
  llvm::SmallVector<const Expr *, 4> read;
  if (!at(TokenKind::RightParen) && !list(TokenKind::RightParen, [&] {
        read.push_back(expression());
        return read.back() != nullptr;
      }))
    return std::nullopt;
  if (!expectClosing(TokenKind::RightParen, open))
    return std::nullopt;
  return arena.copy(read);
}

const Expr *Parser::designator() {
  SMLoc open = token.loc();
  if (!at(TokenKind::LeftBracket)) {
    unexpected("'['");
    return nullptr;
  }
  Level level(*this);
  if (tooDeep(open))
    return nullptr;
  advance();
  const Expr *inside = expression();
  if (!inside || !expectClosing(TokenKind::RightBracket, open))
    return nullptr;
  return inside;
}

const Expr *Parser::firstValue() {
  if (!at(Keyword::Measure))
    return expression();
  SMLoc loc = token.loc();
  advance();
  const Reference *qubits = reference("the qubits to measure");
  if (!qubits)
    return nullptr;
  return arena.make(Measurement{{loc}, qubits});
}
