//===- Parser.cpp - Tokens, recovery, the program -------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "ParserImpl.h"

#include <fmt/format.h>

using namespace lull::qasm;

ParseResult lull::qasm::parse(StringRef source, Arena &arena,
                              Reporter &reporter, const ParseOptions &options) {
  return Parser(source, arena, reporter, options).parse();
}

Parser::Parser(StringRef source, Arena &arena, Reporter &reporter,
               const ParseOptions &options)
    : arena(arena), reporter(reporter), options(options),
      lexer(source, reporter) {
  if (options.version) {
    program.version = *options.version;
    versionKnown = true;
  }
  advance();
}

ParseResult Parser::parse() {
  llvm::SmallVector<const Stmt *, 0> statements;
  if (!at(Keyword::OpenQasm) || versionLine()) {
    while (!at(TokenKind::End)) {
      if (at(TokenKind::RightBrace)) {
        error(token.loc(), "'}' without a '{'");
        while (accept(TokenKind::RightBrace)) {
        }
        continue;
      }
      if (const Stmt *read = statement())
        statements.push_back(read);
    }
  }
  program.statements = arena.copy(statements);
  return {program, lexer.tokensRead()};
}

/// Reads `OPENQASM 3.0;`. Without a version there is no telling what the rest
/// means: returns false.
bool Parser::versionLine() {
  SMLoc loc = token.loc();
  advance();
  if (!at(TokenKind::Integer) && !at(TokenKind::Float))
    return unexpected("a version such as 3.0");
  std::optional<Version> version;
  if (token.text == "3")
    version = Version::V3_2;
  for (Version known :
       {Version::V2_0, Version::V3_0, Version::V3_1, Version::V3_2})
    if (token.text == spell(known))
      version = known;
  if (!version)
    return error(token.loc(), fmt::format("unsupported OpenQASM version {} "
                                          "(supported are 2.0, 3.0 to 3.2)",
                                          token.text.str()));
  if (options.version && *options.version != *version)
    return error(token.loc(),
                 fmt::format("version is {} when it should be {}, that of the "
                             "program that includes this file",
                             spell(*version).str(),
                             spell(*options.version).str()));
  advance();
  program.versionLoc = loc;
  versionKnown = true;
  setVersion(*version);
  if (!expectEnd())
    skipStatement(true);
  return true;
}

//===----------------------------------------------------------------------===//
// Tokens
//===----------------------------------------------------------------------===//

void Parser::advance() {
  previous = token;
  // Whoever has seen enough errors waits for no more tokens.
  if (reporter.exhausted())
    token = {TokenKind::End, true, StringRef(token.text.end(), 0)};
  else
    token = lexer.next();
  classify();
}

void Parser::classify() {
  keyword = Keyword::None;
  later = nullptr;
  if (!at(TokenKind::Word))
    return;
  const KeywordEntry *entry = findKeyword(token.text);
  if (!entry)
    return;
  if (entry->since > program.version) {
    later = entry;
    return;
  }
  keyword = entry->keyword;
  usesVersion3 |= entry->since > Version::V2_0;
}

void Parser::setVersion(Version to) {
  program.version = to;
  // The current token was read under another one.
  classify();
}

bool Parser::accept(TokenKind kind) {
  if (!at(kind))
    return false;
  advance();
  return true;
}

bool Parser::expect(TokenKind kind, StringRef where) {
  if (accept(kind))
    return true;
  return unexpected(fmt::format("'{}' {}", spell(kind).str(), where.str()));
}

bool Parser::expectClosing(TokenKind kind, SMLoc open) {
  if (accept(kind))
    return true;
  return error(token.loc(),
               fmt::format("expected '{}', found {}", spell(kind).str(),
                           describe(token)),
               {{open, fmt::format("to match this '{}'", *open.getPointer())}});
}

bool Parser::expectEnd() {
  if (accept(TokenKind::Semicolon))
    return true;
  // Where it is missing, which may be lines before what was found.
  return error(previous.endLoc(),
               fmt::format("expected ';', found {}", describe(token)));
}

std::optional<Name> Parser::expectName(StringRef what) {
  if (at(TokenKind::Word) && at(Keyword::None)) {
    Name name = {token.loc(), token.text};
    advance();
    return name;
  }
  if (!at(Keyword::None))
    error(token.loc(), fmt::format("expected {}, found the keyword {}",
                                   what.str(), describe(token)));
  else
    unexpected(what);
  return std::nullopt;
}

bool Parser::list(TokenKind end, llvm::function_ref<bool()> item) {
  do {
    if (!item())
      return false;
  } while (accept(TokenKind::Comma) && !at(end));
  return true;
}

//===----------------------------------------------------------------------===//
// Errors
//===----------------------------------------------------------------------===//

bool Parser::error(SMLoc loc, std::string text, std::vector<Note> notes) {
  // The lexer has spoken of an error token.
  if (at(TokenKind::Error))
    return false;
  if (suspect) {
    const KeywordEntry *entry = suspect;
    suspect = nullptr;
    needs(entry->since, suspectLoc, entry->text);
    lastError = loc.getPointer();
    return false;
  }
  if (lastError == loc.getPointer())
    return false;
  lastError = loc.getPointer();
  reporter.error(loc, std::move(text), std::move(notes));
  return false;
}

bool Parser::unexpected(StringRef what) {
  return error(token.loc(), fmt::format("expected {}, found {}", what.str(),
                                        describe(token)));
}

bool Parser::needs(Version least, SMLoc loc, StringRef what) {
  if (program.version >= least)
    return true;
  return error(loc,
               fmt::format("{} needs OpenQASM {}, and this is {}", quote(what),
                           spell(least).str(), spell(program.version).str()));
}

bool Parser::needsGlobalScope(SMLoc loc, StringRef what) {
  if (levels == 0)
    return true;
  return error(loc, fmt::format("{} not at global scope", what.str()));
}

bool Parser::tooDeep(SMLoc loc) {
  if (levels <= MostLevels)
    return false;
  if (!saidTooDeep)
    error(loc, fmt::format("nested deeper than {}", MostLevels));
  saidTooDeep = true;
  return true;
}

//===----------------------------------------------------------------------===//
// Recovery
//===----------------------------------------------------------------------===//

/// Whether a line begins here that can only be a statement of its own.
bool Parser::startsStatement() const {
  if (!token.startsLine)
    return false;
  switch (keyword) {
  case Keyword::Barrier:
  case Keyword::Box:
  case Keyword::Creg:
  case Keyword::Delay:
  case Keyword::For:
  case Keyword::Gate:
  case Keyword::If:
  case Keyword::Include:
  case Keyword::Let:
  case Keyword::Nop:
  case Keyword::Opaque:
  case Keyword::Qreg:
  case Keyword::Qubit:
  case Keyword::Reset:
    return true;
  default:
    return false;
  }
}

void Parser::skipBraces() {
  size_t open = 0;
  do {
    open += at(TokenKind::LeftBrace);
    open -= at(TokenKind::RightBrace);
    advance();
  } while (open > 0 && !at(TokenKind::End));
  noteEnd();
}

/// The braces that the end of the file leaves open are part of the trouble that
/// made us skip to it.
void Parser::noteEnd() {
  if (at(TokenKind::End))
    lastError = token.loc().getPointer();
}

void Parser::skipStatement(bool resume) {
  skipped = true;
  while (true) {
    switch (token.kind) {
    case TokenKind::End:
      noteEnd();
      return;
    case TokenKind::Semicolon:
      while (accept(TokenKind::Semicolon)) {
      }
      return;
    case TokenKind::RightBrace:
      if (openSets == 0)
        return;
      --openSets;
      advance();
      break;
    case TokenKind::LeftBrace: {
      // Those of a set, an array or a durationof, not of a body.
      bool isValue = openSets > 0 || previous.is(TokenKind::LeftBracket) ||
                     previous.is(TokenKind::LeftParen) ||
                     previous.is(TokenKind::Equal) || previous.text == "in";
      skipBraces();
      if (isValue || at(TokenKind::End))
        break;
      accept(TokenKind::Semicolon);
      return;
    }
    default:
      if (resume && startsStatement())
        return;
      advance();
      break;
    }
  }
}

void Parser::skipWithElse(bool resume) {
  skipStatement(resume);
  while (at(Keyword::Else)) {
    advance();
    skipStatement(resume);
  }
}
