//===- Gates.cpp - Gates: definitions and calls ---------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

#include <fmt/format.h>

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Definitions
//===----------------------------------------------------------------------===//

/// Reads `g(a, b) q, r` up to `end`.
bool Parser::gateHeader(Name &name, ArrayRef<Name> &parameters,
                        ArrayRef<Name> &qubits, TokenKind end) {
  const KeywordEntry *entry = later;
  std::optional<Name> read = expectName("the name of the gate");
  if (!read)
    return false;
  if (entry)
    ownGates.push_back(entry->keyword);
  name = *read;

  llvm::SmallVector<Name, 4> names;
  auto item = [&](StringRef what) {
    std::optional<Name> one = expectName(what);
    if (one)
      names.push_back(*one);
    return one.has_value();
  };
  SMLoc open = token.loc();
  if (accept(TokenKind::LeftParen)) {
    if (!at(TokenKind::RightParen) &&
        !list(TokenKind::RightParen, [&] { return item("a parameter"); }))
      return false;
    if (!expectClosing(TokenKind::RightParen, open))
      return false;
    parameters = arena.copy(names);
    names.clear();
  }
  if (!list(end, [&] { return item("a qubit of the gate"); }))
    return false;
  qubits = arena.copy(names);
  return true;
}

Stmt *Parser::gateDefinition() {
  SMLoc loc = token.loc();
  if (!needsGlobalScope(loc, "definition of a gate"))
    return nullptr;
  advance();
  Name name;
  ArrayRef<Name> parameters, qubits;
  if (!gateHeader(name, parameters, qubits, TokenKind::LeftBrace))
    return nullptr;
  std::optional<Body> body = block();
  if (!body)
    return nullptr;
  return arena.make(GateDefinition{{loc}, name, parameters, qubits, *body});
}

Stmt *Parser::opaqueGate() {
  SMLoc loc = token.loc();
  if (!needsGlobalScope(loc, "declaration of a gate"))
    return nullptr;
  advance();
  Name name;
  ArrayRef<Name> parameters, qubits;
  if (!gateHeader(name, parameters, qubits, TokenKind::Semicolon) ||
      !expectEnd())
    return nullptr;
  return arena.make(OpaqueGate{{loc}, name, parameters, qubits});
}

bool Parser::isOwnGate(const KeywordEntry &entry) const {
  return llvm::is_contained(ownGates, entry.keyword);
}

//===----------------------------------------------------------------------===//
// Calls
//===----------------------------------------------------------------------===//

std::optional<Modifier> Parser::modifier() {
  Modifier read = {token.loc(), Modifier::Kind::Ctrl, nullptr};
  switch (keyword) {
  case Keyword::NegCtrl:
    read.kind = Modifier::Kind::NegCtrl;
    break;
  case Keyword::Inv:
    read.kind = Modifier::Kind::Inv;
    break;
  case Keyword::Pow:
    read.kind = Modifier::Kind::Pow;
    break;
  default:
    break;
  }
  advance();
  if (read.kind == Modifier::Kind::Pow && !at(TokenKind::LeftParen)) {
    unexpected("'(' after 'pow'");
    return std::nullopt;
  }
  if (read.kind != Modifier::Kind::Inv && at(TokenKind::LeftParen) &&
      !(read.argument = parenthesized()))
    return std::nullopt;
  if (!expect(TokenKind::At, fmt::format("after '{}'", spell(read.kind).str())))
    return std::nullopt;
  return read;
}

Stmt *Parser::modifiedGate() {
  SMLoc loc = token.loc();
  llvm::SmallVector<Modifier, 2> modifiers;
  while (at(Keyword::Ctrl) || at(Keyword::NegCtrl) || at(Keyword::Inv) ||
         at(Keyword::Pow)) {
    std::optional<Modifier> read = modifier();
    if (!read)
      return nullptr;
    modifiers.push_back(*read);
  }
  std::optional<Name> gate = expectName("the name of a gate");
  if (!gate)
    return nullptr;
  return gateCall(loc, arena.copy(modifiers), *gate, nullptr);
}

Stmt *Parser::gateCall(SMLoc loc, ArrayRef<Modifier> modifiers, Name gate,
                       const Expr *duration) {
  ArrayRef<const Expr *> values;
  bool hasValues = at(TokenKind::LeftParen) && !duration;
  if (hasValues) {
    std::optional<ArrayRef<const Expr *>> read = arguments();
    if (!read)
      return nullptr;
    values = *read;
  }
  if (at(TokenKind::LeftBracket) && !duration) {
    if (!needs(Version::V3_0, token.loc(), "["))
      return nullptr;
    duration = designator();
    if (!duration)
      return nullptr;
  }
  std::optional<ArrayRef<const Reference *>> qubits = operands();
  if (!qubits)
    return nullptr;
  if (qubits->empty() && gate.text != "gphase") {
    if (hasValues && modifiers.empty())
      unsupportedCall(gate, /*isStatement=*/true);
    else
      unexpected("the qubits of " + quote(gate.text));
    return nullptr;
  }
  if (!expectEnd())
    return nullptr;
  return arena.make(
      GateCall{{loc}, modifiers, gate, values, duration, *qubits});
}

//===----------------------------------------------------------------------===//
// Statements that start with a name
//===----------------------------------------------------------------------===//

static bool isAssignment(TokenKind kind) {
  return kind >= TokenKind::Equal && kind <= TokenKind::GreaterGreaterEqual;
}

Stmt *Parser::named() {
  Name name = {token.loc(), token.text};
  if (later && !isOwnGate(*later)) {
    if (program.version >= Version::V3_0) {
      needs(later->since, name.loc, name.text);
      return nullptr;
    }
    // A name like any other, but if the statement is none of version 2, then
    // this is why.
    suspect = later;
    suspectLoc = name.loc;
  }
  advance();

  const Expr *duration = nullptr;
  std::optional<ArrayRef<Index>> read = indices();
  if (!read)
    return nullptr;
  if (isAssignment(token.kind))
    return assignment(name, *read);
  if (!read->empty()) {
    const Index &only = read->front();
    if (!needs(Version::V3_0, only.loc, "["))
      return nullptr;
    if (read->size() > 1 || only.isSet || only.items.size() > 1 ||
        only.items.front().isRange) {
      unexpected("'='");
      return nullptr;
    }
    duration = only.items.front().first;
  }
  return gateCall(name.loc, {}, name, duration);
}

static std::optional<BinaryOp> operatorBefore(TokenKind assignment) {
  switch (assignment) {
  case TokenKind::PlusEqual:
    return BinaryOp::Add;
  case TokenKind::MinusEqual:
    return BinaryOp::Subtract;
  case TokenKind::StarEqual:
    return BinaryOp::Multiply;
  case TokenKind::SlashEqual:
    return BinaryOp::Divide;
  case TokenKind::PercentEqual:
    return BinaryOp::Modulo;
  case TokenKind::StarStarEqual:
    return BinaryOp::Power;
  case TokenKind::AmpersandEqual:
    return BinaryOp::BitAnd;
  case TokenKind::BarEqual:
    return BinaryOp::BitOr;
  case TokenKind::CaretEqual:
    return BinaryOp::BitXor;
  case TokenKind::LessLessEqual:
    return BinaryOp::ShiftLeft;
  case TokenKind::GreaterGreaterEqual:
    return BinaryOp::ShiftRight;
  default:
    return std::nullopt;
  }
}

Stmt *Parser::assignment(Name name, ArrayRef<Index> indices) {
  SMLoc loc = token.loc();
  if (!needs(Version::V3_0, loc, token.text))
    return nullptr;
  if (at(TokenKind::TildeEqual)) {
    error(loc, "'~=' is not supported");
    return nullptr;
  }
  bool isPlain = at(TokenKind::Equal);
  std::optional<BinaryOp> op = operatorBefore(token.kind);
  advance();
  const Reference *target =
      arena.make(Reference{{name.loc}, name.text, indices});
  if (isPlain && at(Keyword::Measure)) {
    advance();
    const Reference *qubits = reference("the qubits to measure");
    if (!qubits || !expectEnd())
      return nullptr;
    return arena.make(Measure{{name.loc}, qubits, target});
  }
  const Expr *value = expression();
  if (!value || !expectEnd())
    return nullptr;
  return arena.make(Assignment{{name.loc}, target, op, value});
}
