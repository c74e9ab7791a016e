//===- Declarations.cpp - Declarations and types --------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Types
//===----------------------------------------------------------------------===//

std::optional<TypeName::Kind> Parser::typeKeyword() const {
  switch (keyword) {
  case Keyword::Angle:
    return TypeName::Kind::Angle;
  case Keyword::Bit:
    return TypeName::Kind::Bit;
  case Keyword::Bool:
    return TypeName::Kind::Bool;
  case Keyword::Duration:
    return TypeName::Kind::Duration;
  case Keyword::Float:
    return TypeName::Kind::Float;
  case Keyword::Int:
    return TypeName::Kind::Int;
  case Keyword::Stretch:
    return TypeName::Kind::Stretch;
  case Keyword::UInt:
    return TypeName::Kind::UInt;
  default:
    return std::nullopt;
  }
}

/// Reads a classical type.
std::optional<TypeName> Parser::type() {
  if (at(Keyword::Array) || at(Keyword::Complex)) {
    unsupported();
    return std::nullopt;
  }
  std::optional<TypeName::Kind> kind = typeKeyword();
  if (!kind) {
    unexpected("a classical type");
    return std::nullopt;
  }
  TypeName read = {token.loc(), *kind, nullptr};
  advance();
  bool hasWidth = *kind != TypeName::Kind::Bool &&
                  *kind != TypeName::Kind::Duration &&
                  *kind != TypeName::Kind::Stretch;
  if (hasWidth && at(TokenKind::LeftBracket) && !(read.width = designator()))
    return std::nullopt;
  return read;
}

//===----------------------------------------------------------------------===//
// Declarations
//===----------------------------------------------------------------------===//

Stmt *Parser::declaration(Declaration::Role role) {
  using Role = Declaration::Role;
  SMLoc loc = token.loc();
  bool isOutside = role == Role::Input || role == Role::Output;
  if (isOutside && !needsGlobalScope(loc, token.text))
    return nullptr;
  if (role != Role::Variable)
    advance();
  std::optional<TypeName> what = type();
  if (!what)
    return nullptr;
  std::optional<Name> name = expectName("a name to declare");
  if (!name)
    return nullptr;

  const Expr *value = nullptr;
  bool mayHaveValue = !isOutside && what->kind != TypeName::Kind::Stretch;
  if (mayHaveValue && accept(TokenKind::Equal)) {
    value = firstValue();
    if (!value)
      return nullptr;
  }
  if (role == Role::Constant && !value) {
    unexpected("'=' and the value of the constant");
    return nullptr;
  }
  if (!expectEnd())
    return nullptr;
  return arena.make(Declaration{{loc}, role, *what, *name, value});
}

Stmt *Parser::qubits() {
  SMLoc loc = token.loc();
  if (!needsGlobalScope(loc, "declaration of qubits"))
    return nullptr;
  TypeName what = {loc, TypeName::Kind::Qubit, nullptr};
  advance();
  if (at(TokenKind::LeftBracket) && !(what.width = designator()))
    return nullptr;
  std::optional<Name> name = expectName("a name for the qubits");
  if (!name || !expectEnd())
    return nullptr;
  return arena.make(
      Declaration{{loc}, Declaration::Role::Variable, what, *name, nullptr});
}

/// `qreg q[2];`, `creg c[2];`.
Stmt *Parser::oldRegister(TypeName::Kind kind) {
  SMLoc loc = token.loc();
  if (kind == TypeName::Kind::Qubit &&
      !needsGlobalScope(loc, "declaration of qubits"))
    return nullptr;
  TypeName what = {loc, kind, nullptr};
  advance();
  std::optional<Name> name = expectName("a name for the register");
  if (!name)
    return nullptr;
  // Version 3 lets the size out.
  bool needsSize = program.version == Version::V2_0;
  if ((needsSize || at(TokenKind::LeftBracket)) && !(what.width = designator()))
    return nullptr;
  if (!expectEnd())
    return nullptr;
  return arena.make(
      Declaration{{loc}, Declaration::Role::Variable, what, *name, nullptr});
}

Stmt *Parser::alias() {
  SMLoc loc = token.loc();
  advance();
  std::optional<Name> name = expectName("a name for the alias");
  if (!name || !expect(TokenKind::Equal, "after the name of the alias"))
    return nullptr;
  llvm::SmallVector<const Reference *, 2> parts;
  do {
    parts.push_back(reference("qubits or bits"));
    if (!parts.back())
      return nullptr;
  } while (accept(TokenKind::Concatenate));
  if (!expectEnd())
    return nullptr;
  return arena.make(Alias{{loc}, *name, arena.copy(parts)});
}
