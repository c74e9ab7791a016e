//===- Statements.cpp - Statements and the simple ones among them ---------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

#include "llvm/Support/SaveAndRestore.h"

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Any statement
//===----------------------------------------------------------------------===//

const Stmt *Parser::statement() {
  llvm::SmallVector<Annotation, 2> annotations;
  while (at(TokenKind::Annotation))
    annotations.push_back(annotation());
  if (!annotations.empty() &&
      (at(TokenKind::End) || at(TokenKind::RightBrace))) {
    error(annotations.back().name.loc, "annotation without a statement");
    return nullptr;
  }

  skipped = false;
  openSets = 0;
  suspect = nullptr;
  if (levels == 0)
    saidTooDeep = false;
  size_t before = lexer.tokensRead();
  bool isIf = at(Keyword::If);
  Stmt *read = bareStatement();
  suspect = nullptr;
  if (read) {
    read->annotations = arena.copy(annotations);
    return read;
  }
  if (!skipped && isIf)
    skipWithElse(true);
  else if (!skipped)
    skipStatement(true);
  // Whatever happened, the next one starts further on.
  if (lexer.tokensRead() == before && !at(TokenKind::RightBrace))
    advance();
  return nullptr;
}

Annotation Parser::annotation() {
  // The text of a token that ends its line: `@word text`.
  StringRef text = token.text.drop_front().rtrim();
  StringRef name =
      text.take_until([](char c) { return c == ' ' || c == '\t'; });
  Annotation read = {{token.loc(), name}, text.drop_front(name.size()).ltrim()};
  advance();
  return read;
}

Stmt *Parser::bareStatement() {
  switch (token.kind) {
  case TokenKind::Word:
    return at(Keyword::None) ? named() : keywordStatement();
  case TokenKind::Pragma:
    return pragma();
  case TokenKind::LeftBrace:
    return scope();
  default:
    unexpected("a statement");
    return nullptr;
  }
}

Stmt *Parser::keywordStatement() {
  switch (keyword) {
  case Keyword::OpenQasm:
    error(token.loc(), "version line is not the first statement");
    return nullptr;
  case Keyword::Include:
    return include();
  case Keyword::Qreg:
    return oldRegister(TypeName::Kind::Qubit);
  case Keyword::Creg:
    return oldRegister(TypeName::Kind::Bit);
  case Keyword::Qubit:
    return qubits();
  case Keyword::Angle:
  case Keyword::Bit:
  case Keyword::Bool:
  case Keyword::Duration:
  case Keyword::Float:
  case Keyword::Int:
  case Keyword::Stretch:
  case Keyword::UInt:
    return declaration(Declaration::Role::Variable);
  case Keyword::Const:
    return declaration(Declaration::Role::Constant);
  case Keyword::Input:
    return declaration(Declaration::Role::Input);
  case Keyword::Output:
    return declaration(Declaration::Role::Output);
  case Keyword::Let:
    return alias();
  case Keyword::Gate:
    return gateDefinition();
  case Keyword::Opaque:
    return opaqueGate();
  case Keyword::Ctrl:
  case Keyword::Inv:
  case Keyword::NegCtrl:
  case Keyword::Pow:
    return modifiedGate();
  case Keyword::Barrier:
    return barrier();
  case Keyword::Reset:
    return reset();
  case Keyword::Measure:
    return measure();
  case Keyword::Delay:
    return delay();
  case Keyword::Nop:
    return nop();
  case Keyword::Box:
    return box();
  case Keyword::If:
    return ifStatement();
  case Keyword::For:
    return forStatement();
  default:
    if (unsupportedKeyword())
      return unsupported();
    unexpected("a statement");
    return nullptr;
  }
}

//===----------------------------------------------------------------------===//
// Bodies
//===----------------------------------------------------------------------===//

std::optional<Body> Parser::block() {
  SMLoc open = token.loc();
  if (!at(TokenKind::LeftBrace)) {
    unexpected("'{'");
    return std::nullopt;
  }
  Level level(*this);
  // The error is said; what is around the block may still be sound.
  if (tooDeep(open)) {
    skipBraces();
    return Body();
  }
  // A statement within a statement, by way of durationof.
  llvm::SaveAndRestore keepSets(openSets);
  llvm::SaveAndRestore keepSuspect(suspect);
  llvm::SaveAndRestore keepSkipped(skipped);
  advance();
  llvm::SmallVector<const Stmt *, 4> statements;
  while (!at(TokenKind::RightBrace) && !at(TokenKind::End))
    if (const Stmt *read = statement())
      statements.push_back(read);
  expectClosing(TokenKind::RightBrace, open);
  return arena.copy(statements);
}

std::optional<Body> Parser::body() {
  if (at(TokenKind::LeftBrace))
    return block();
  Level level(*this);
  if (tooDeep(token.loc())) {
    skipStatement(true);
    return std::nullopt;
  }
  if (at(TokenKind::RightBrace) || at(TokenKind::End)) {
    unexpected("a statement");
    return std::nullopt;
  }
  llvm::SaveAndRestore keepSkipped(skipped);
  llvm::SmallVector<const Stmt *, 1> statements;
  if (const Stmt *read = statement())
    statements.push_back(read);
  return arena.copy(statements);
}

//===----------------------------------------------------------------------===//
// Simple statements
//===----------------------------------------------------------------------===//

Stmt *Parser::include() {
  SMLoc loc = token.loc();
  if (!needsGlobalScope(loc, "include"))
    return nullptr;
  advance();
  if (!at(TokenKind::String) && !at(TokenKind::Bits)) {
    unexpected("the name of a file in quotes");
    return nullptr;
  }
  Name file = {token.loc(), token.text.drop_front().drop_back()};
  if (!versionKnown && !usesVersion3 && file.text == "qelib1.inc") {
    reporter.warning(loc, "no version line, but qelib1.inc is included: read "
                          "as OpenQASM 2.0");
    versionKnown = true;
    setVersion(Version::V2_0);
  }
  advance();
  if (!expectEnd())
    return nullptr;
  return arena.make(Include{{loc}, file});
}

Stmt *Parser::pragma() {
  StringRef text = token.text;
  text.consume_front("#");
  Stmt *read = arena.make(Pragma{
      {token.loc()}, text.drop_front(StringRef("pragma").size()).trim()});
  advance();
  return read;
}

Stmt *Parser::barrier() {
  SMLoc loc = token.loc();
  advance();
  std::optional<ArrayRef<const Reference *>> qubits = operands();
  if (!qubits || !expectEnd())
    return nullptr;
  return arena.make(Barrier{{loc}, *qubits});
}

Stmt *Parser::reset() {
  SMLoc loc = token.loc();
  advance();
  const Reference *qubits = reference("the qubits to reset");
  if (!qubits || !expectEnd())
    return nullptr;
  return arena.make(Reset{{loc}, qubits});
}

Stmt *Parser::measure() {
  SMLoc loc = token.loc();
  advance();
  const Reference *qubits = reference("the qubits to measure");
  if (!qubits)
    return nullptr;
  const Reference *target = nullptr;
  if (accept(TokenKind::Arrow) && !(target = reference("the bits to set")))
    return nullptr;
  if (!expectEnd())
    return nullptr;
  return arena.make(Measure{{loc}, qubits, target});
}

Stmt *Parser::delay() {
  SMLoc loc = token.loc();
  advance();
  const Expr *duration = designator();
  if (!duration)
    return nullptr;
  std::optional<ArrayRef<const Reference *>> qubits = operands();
  if (!qubits || !expectEnd())
    return nullptr;
  return arena.make(Delay{{loc}, duration, *qubits});
}

Stmt *Parser::nop() {
  SMLoc loc = token.loc();
  advance();
  std::optional<ArrayRef<const Reference *>> qubits = operands();
  if (!qubits || !expectEnd())
    return nullptr;
  return arena.make(Nop{{loc}, *qubits});
}
