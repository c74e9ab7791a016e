//===- Reading.h - A text, its tree, and what was said about it -*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_UNIT_TARGET_OPENQASM_READING_H
#define LULL_TEST_UNIT_TARGET_OPENQASM_READING_H

#include "lull/Target/OpenQASM/Lexer.h"
#include "lull/Target/OpenQASM/Parser.h"
#include "lull/Target/OpenQASM/Printer.h"

#include "llvm/Support/MemoryBuffer.h"
#include "llvm/Support/SourceMgr.h"

#include "gtest/gtest.h"

#include <string>
#include <vector>

namespace lull::qasm {

using Lines = std::vector<std::string>;

/// Keeps the messages as lines: `2:7: error: expected ';', found 'x'`.
class Listener {
public:
  explicit Listener(llvm::StringRef source)
      : reporter([this](const Message &message) { take(message); }) {
    sources.AddNewSourceBuffer(llvm::MemoryBuffer::getMemBufferCopy(source),
                               llvm::SMLoc());
  }

  llvm::StringRef text() const {
    return sources.getMemoryBuffer(1)->getBuffer();
  }
  std::string place(llvm::SMLoc loc) const {
    auto [line, column] = sources.getLineAndColumn(loc, 1);
    return std::to_string(line) + ":" + std::to_string(column);
  }

  llvm::SourceMgr sources;
  Reporter reporter;
  Lines lines;

private:
  void take(const Message &message) {
    lines.push_back(place(message.loc) +
                    (message.isError ? ": error: " : ": warning: ") +
                    message.text);
    for (const Note &note : message.notes)
      lines.push_back(place(note.loc) + ": note: " + note.text);
  }
};

/// Parses a text on construction.
class Reading {
public:
  explicit Reading(llvm::StringRef source, ParseOptions options = {})
      : listener(source),
        result(parse(listener.text(), arena, listener.reporter, options)) {}

  const Lines &messages() const { return listener.lines; }
  unsigned errors() const { return listener.reporter.errors(); }
  llvm::ArrayRef<const Stmt *> statements() const {
    return result.program.statements;
  }
  /// The tree without the line of the version.
  std::string tree() const {
    llvm::StringRef text = printed = print(result.program);
    return text.split('\n').second.str();
  }

  Listener listener;
  Arena arena;
  ParseResult result;

private:
  mutable std::string printed;
};

/// The tree of a text of version 3 without a fault, without the last newline.
inline std::string treeOf(llvm::StringRef source) {
  Reading reading(source);
  EXPECT_EQ(reading.messages(), Lines()) << source.str();
  return llvm::StringRef(reading.tree()).rtrim('\n').str();
}

/// The same of version 2.
inline std::string oldTreeOf(llvm::StringRef source) {
  return treeOf(("OPENQASM 2.0;\n" + source).str());
}

inline Lines messagesOf(llvm::StringRef source) {
  return Reading(source).messages();
}

/// All tokens of a text and what the lexer said.
struct Tokens {
  explicit Tokens(llvm::StringRef source) : listener(source) {
    Lexer lexer(listener.text(), listener.reporter);
    for (Token token = lexer.next(); !token.is(TokenKind::End);
         token = lexer.next())
      tokens.push_back(token);
    counted = lexer.tokensRead();
  }

  Listener listener;
  std::vector<Token> tokens;
  size_t counted = 0;
};

} // namespace lull::qasm

#endif // LULL_TEST_UNIT_TARGET_OPENQASM_READING_H
