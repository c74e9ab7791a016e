//===- References.cpp - References, their indices, and lists of them ------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

using namespace lull::qasm;

const Reference *Parser::reference(StringRef what) {
  if (at(TokenKind::PhysicalQubit)) {
    Token read = token;
    if (!needs(Version::V3_0, read.loc(), read.text))
      return nullptr;
    advance();
    return arena.make(Reference{{read.loc()}, read.text, {}});
  }
  std::optional<Name> name = expectName(what);
  if (!name)
    return nullptr;
  std::optional<ArrayRef<Index>> read = indices();
  if (!read)
    return nullptr;
  return arena.make(Reference{{name->loc}, name->text, *read});
}

std::optional<ArrayRef<Index>> Parser::indices() {
  if (!at(TokenKind::LeftBracket))
    return ArrayRef<Index>();
  llvm::SmallVector<Index, 1> read;
  while (at(TokenKind::LeftBracket)) {
    std::optional<Index> one = index();
    if (!one)
      return std::nullopt;
    read.push_back(*one);
  }
  return arena.copy(read);
}

std::optional<Index> Parser::index() {
  SMLoc open = token.loc();
  Level level(*this);
  if (tooDeep(open))
    return std::nullopt;
  advance();
  Index read = {open, false, {}};
  if (at(TokenKind::LeftBrace)) {
    std::optional<Index> inside = set();
    if (!inside)
      return std::nullopt;
    read.isSet = true;
    read.items = inside->items;
  } else {
    llvm::SmallVector<Selector, 1> items;
    if (!list(TokenKind::RightBracket, [&] {
          std::optional<Selector> item = selector();
          if (item)
            items.push_back(*item);
          return item.has_value();
        }))
      return std::nullopt;
    read.items = arena.copy(items);
  }
  if (!expectClosing(TokenKind::RightBracket, open))
    return std::nullopt;
  return read;
}

std::optional<Index> Parser::set() {
  SMLoc open = token.loc();
  if (!needs(Version::V3_0, open, "{"))
    return std::nullopt;
  advance();
  ++openSets;
  llvm::SmallVector<Selector, 4> items;
  if (!list(TokenKind::RightBrace, [&] {
        const Expr *element = expression();
        items.push_back({false, element, nullptr, nullptr});
        return element != nullptr;
      }))
    return std::nullopt;
  if (!at(TokenKind::RightBrace)) {
    expectClosing(TokenKind::RightBrace, open);
    return std::nullopt;
  }
  --openSets;
  advance();
  return Index{open, true, arena.copy(items)};
}

std::optional<Selector> Parser::selector() {
  auto atEnd = [&] {
    return at(TokenKind::RightBracket) || at(TokenKind::Comma);
  };
  Selector read;
  if (!at(TokenKind::Colon) && !(read.first = expression()))
    return std::nullopt;
  if (!at(TokenKind::Colon))
    return read;
  if (!needs(Version::V3_0, token.loc(), ":"))
    return std::nullopt;
  advance();
  read.isRange = true;
  if (!at(TokenKind::Colon) && !atEnd() && !(read.last = expression()))
    return std::nullopt;
  if (!accept(TokenKind::Colon))
    return read;
  // Three parts: the one in the middle is the step.
  read.step = read.last;
  read.last = nullptr;
  if (!atEnd() && !(read.last = expression()))
    return std::nullopt;
  return read;
}

std::optional<ArrayRef<const Reference *>> Parser::operands() {
  if (at(TokenKind::Semicolon))
    return ArrayRef<const Reference *>();
  llvm::SmallVector<const Reference *, 4> read;
  if (!list(TokenKind::Semicolon, [&] {
        read.push_back(reference("a qubit"));
        return read.back() != nullptr;
      }))
    return std::nullopt;
  return arena.copy(read);
}
