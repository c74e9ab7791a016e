//===- Control.cpp - Conditions, loops, boxes and scopes ------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

using namespace lull::qasm;

/// Whether this is `register == integer`, the only condition of version 2.
static bool isRegisterTest(const Expr *condition) {
  const auto *chain = llvm::dyn_cast<Chain>(condition);
  return chain && chain->rest.size() == 1 &&
         chain->rest.front().op == BinaryOp::Equal &&
         llvm::isa<Reference>(chain->first) &&
         llvm::isa<IntegerLiteral>(chain->rest.front().operand);
}

Stmt *Parser::ifStatement() {
  SMLoc loc = token.loc();
  llvm::SmallVector<If::Branch, 1> branches;
  Body otherwise;
  // Read flat, however many branches there are.
  while (true) {
    advance();
    SMLoc open = token.loc();
    if (!expect(TokenKind::LeftParen, "after 'if'"))
      return nullptr;
    const Expr *condition = expression();
    if (!condition)
      return nullptr;
    if (program.version == Version::V2_0 && !isRegisterTest(condition)) {
      error(condition->loc, "condition is not of the form register == integer "
                            "that OpenQASM 2.0 has");
      return nullptr;
    }
    if (!expectClosing(TokenKind::RightParen, open))
      return nullptr;
    std::optional<Body> then = body();
    if (!then)
      return nullptr;
    branches.push_back({condition, *then});
    if (!at(Keyword::Else))
      break;
    advance();
    if (at(Keyword::If))
      continue;
    std::optional<Body> last = body();
    if (!last)
      return nullptr;
    otherwise = *last;
    break;
  }
  return arena.make(If{{loc}, arena.copy(branches), otherwise});
}

Stmt *Parser::forStatement() {
  SMLoc loc = token.loc();
  advance();
  std::optional<TypeName> what = type();
  if (!what)
    return nullptr;
  std::optional<Name> variable = expectName("the variable of the loop");
  if (!variable)
    return nullptr;
  if (!at(Keyword::In)) {
    unexpected("'in'");
    return nullptr;
  }
  advance();

  std::optional<Index> over;
  const Expr *values = nullptr;
  if (at(TokenKind::LeftBracket)) {
    SMLoc inside = token.endLoc();
    over = index();
    if (over && (over->isSet || over->items.size() != 1 ||
                 !over->items.front().isRange)) {
      error(inside, "expected a range such as 0:3");
      return nullptr;
    }
  } else if (at(TokenKind::LeftBrace)) {
    over = set();
  } else {
    values = expression();
  }
  if (!over && !values)
    return nullptr;
  std::optional<Body> repeated = body();
  if (!repeated)
    return nullptr;
  return arena.make(For{{loc}, *what, *variable, over, values, *repeated});
}

Stmt *Parser::box() {
  SMLoc loc = token.loc();
  advance();
  const Expr *duration = nullptr;
  if (at(TokenKind::LeftBracket) && !(duration = designator()))
    return nullptr;
  std::optional<Body> inside = block();
  if (!inside)
    return nullptr;
  return arena.make(Box{{loc}, duration, *inside});
}

Stmt *Parser::scope() {
  SMLoc loc = token.loc();
  std::optional<Body> inside = block();
  if (!inside)
    return nullptr;
  return arena.make(Scope{{loc}, *inside});
}
