//===- ParserImpl.h - The recursive descent ---------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// One class over several files: Parser.cpp (tokens, recovery, the program),
// Statements.cpp, Declarations.cpp, Gates.cpp, Control.cpp, Unsupported.cpp,
// ExpressionParser.cpp, References.cpp. A function that reads a part of a
// statement returns nothing once it, or one that it called, has reported an
// error; statement() then skips what is left of the statement. No function
// looks at more than the current token.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_TARGET_OPENQASM_PARSERIMPL_H
#define LULL_LIB_TARGET_OPENQASM_PARSERIMPL_H

#include "Keywords.h"

#include "lull/Target/OpenQASM/Lexer.h"
#include "lull/Target/OpenQASM/Parser.h"

#include "llvm/ADT/STLFunctionalExtras.h"
#include "llvm/ADT/SmallVector.h"

namespace lull::qasm {

class Parser {
public:
  Parser(StringRef source, Arena &arena, Reporter &reporter,
         const ParseOptions &options);
  ParseResult parse();

private:
  //===--------------------------------------------------------------------===//
  // Tokens (Parser.cpp)
  //===--------------------------------------------------------------------===//

  void advance();
  void classify();
  void setVersion(Version to);
  bool at(TokenKind kind) const { return token.is(kind); }
  bool at(Keyword which) const { return keyword == which; }
  bool accept(TokenKind kind);
  /// Reads a mark; `where` goes on the message: `after the condition`.
  bool expect(TokenKind kind, StringRef where);
  /// Reads the mark that closes the one at `open`.
  bool expectClosing(TokenKind kind, SMLoc open);
  /// Reads the `;` of a statement.
  bool expectEnd();
  std::optional<Name> expectName(StringRef what);
  /// Reads items with commas between them, and maybe one behind them, up to
  /// `end`, which it does not read.
  bool list(TokenKind end, llvm::function_ref<bool()> item);

  /// Reports an error, unless there is one at that place already or the current
  /// token is one. Returns false, for the caller to return.
  bool error(SMLoc loc, std::string text, std::vector<Note> notes = {});
  /// `expected WHAT, found 'x'`, at the current token.
  bool unexpected(StringRef what);
  /// Reports what is not in the version at hand; returns whether it is.
  bool needs(Version least, SMLoc loc, StringRef what);
  /// Reports a statement that is not at global scope; returns whether it is.
  bool needsGlobalScope(SMLoc loc, StringRef what);

  /// One more level of nesting, as long as it lives.
  struct Level {
    explicit Level(Parser &parser) : parser(parser) { ++parser.levels; }
    ~Level() { --parser.levels; }
    Parser &parser;
  };
  /// Reports that there is one level too many; returns whether there is.
  bool tooDeep(SMLoc loc);

  /// Skips the rest of a statement: its `;`, or its braces. A line that starts
  /// with a keyword starts the next statement if `resume` is set.
  void skipStatement(bool resume);
  /// The same of an `if` or what may end with one: its branches too.
  void skipWithElse(bool resume);
  void skipBraces();
  void noteEnd();
  bool startsStatement() const;

  bool versionLine();

  //===--------------------------------------------------------------------===//
  // Statements (Statements.cpp)
  //===--------------------------------------------------------------------===//

  /// Reads a statement with its annotations; nullptr if there is none to keep.
  const Stmt *statement();
  Stmt *bareStatement();
  Stmt *keywordStatement();
  /// Reads the braces and what stands between.
  std::optional<Body> block();
  /// Reads braces, or one statement.
  std::optional<Body> body();
  Stmt *include();
  Stmt *pragma();
  Stmt *barrier();
  Stmt *reset();
  Stmt *measure();
  Stmt *delay();
  Stmt *nop();
  Annotation annotation();

  // Declarations.cpp
  Stmt *declaration(Declaration::Role role);
  Stmt *oldRegister(TypeName::Kind kind);
  Stmt *qubits();
  Stmt *alias();
  std::optional<TypeName> type();
  std::optional<TypeName::Kind> typeKeyword() const;

  // Gates.cpp
  Stmt *gateDefinition();
  Stmt *opaqueGate();
  bool gateHeader(Name &name, ArrayRef<Name> &parameters,
                  ArrayRef<Name> &qubits, TokenKind end);
  Stmt *modifiedGate();
  std::optional<Modifier> modifier();
  /// Statements that start with a name: calls of gates, and assignments.
  Stmt *named();
  /// `duration` is what was read of the call already, if anything.
  Stmt *gateCall(SMLoc loc, ArrayRef<Modifier> modifiers, Name gate,
                 const Expr *duration);
  Stmt *assignment(Name name, ArrayRef<Index> indices);
  bool isOwnGate(const KeywordEntry &entry) const;

  // Control.cpp
  Stmt *ifStatement();
  Stmt *forStatement();
  Stmt *box();
  Stmt *scope();

  // Unsupported.cpp
  bool unsupportedKeyword() const;
  /// Reports a construct outside the subset, and skips all of it. Requires
  /// unsupportedKeyword(). Returns nullptr.
  Stmt *unsupported();
  Stmt *calibration();
  bool unsupportedCall(Name function, bool isStatement);

  //===--------------------------------------------------------------------===//
  // Expressions (ExpressionParser.cpp)
  //===--------------------------------------------------------------------===//

  const Expr *expression() { return binary(1); }
  const Expr *binary(unsigned least);
  const Expr *unary();
  const Expr *power();
  const Expr *primary();
  const Expr *parenthesized();
  const Expr *literal();
  const Expr *durationOf();
  const Expr *cast();
  const Expr *call(Name function);
  /// Reads `(a, b)`, maybe without anything inside.
  std::optional<ArrayRef<const Expr *>> arguments();
  /// Reads `[d]` of a delay or box.
  const Expr *designator();
  /// Reads an expression, or `measure q`.
  const Expr *firstValue();

  // References.cpp
  const Reference *reference(StringRef what);
  std::optional<ArrayRef<Index>> indices();
  std::optional<Index> index();
  /// Reads `{0, 2}`.
  std::optional<Index> set();
  std::optional<Selector> selector();
  /// Reads references up to the `;`, maybe none.
  std::optional<ArrayRef<const Reference *>> operands();

  //===--------------------------------------------------------------------===//

  Arena &arena;
  Reporter &reporter;
  const ParseOptions &options;
  Lexer lexer;

  Token token;
  Token previous;
  /// Of the current token, in the version at hand.
  Keyword keyword = Keyword::None;
  /// Of the current token, if it is one in a later version only.
  const KeywordEntry *later = nullptr;

  Program program;
  /// Whether the version is none of our guessing.
  bool versionKnown = false;
  /// Whether there was a keyword that version 2 does not have.
  bool usesVersion3 = false;
  unsigned levels = 0;
  /// Whether the outermost statement has been found to be too deep.
  bool saidTooDeep = false;

  /// Braces of sets that the current statement has open.
  unsigned openSets = 0;
  /// Whether the current statement, in error, has been skipped.
  bool skipped = false;
  const char *lastError = nullptr;
  /// Of the current statement: what it starts with if that is a keyword in a
  /// later version, which then explains any error.
  const KeywordEntry *suspect = nullptr;
  SMLoc suspectLoc;
  /// Gates of the program whose names are keywords in later versions.
  llvm::SmallVector<Keyword, 1> ownGates;
};

} // namespace lull::qasm

#endif // LULL_LIB_TARGET_OPENQASM_PARSERIMPL_H
