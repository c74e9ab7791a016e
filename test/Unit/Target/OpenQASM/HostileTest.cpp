//===- HostileTest.cpp - A megabyte of anything ---------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

#include <random>

using namespace lull::qasm;

namespace {

constexpr size_t Megabyte = size_t(1) << 20;

std::string repeated(llvm::StringRef piece, size_t size = Megabyte) {
  std::string text;
  text.reserve(size + piece.size());
  while (text.size() < size)
    text += piece;
  return text;
}

/// Parses, prints, and checks that work was in proportion to the input: each
/// token once, no more than the input has bytes.
Lines survive(const std::string &source) {
  Reading reading(source);
  EXPECT_LE(reading.result.tokens, source.size());
  EXPECT_LE(reading.errors(), Reporter::MostErrors);
  EXPECT_FALSE(print(reading.result.program).empty());
  return reading.messages();
}

TEST(HostileTest, RepeatedPieces) {
  struct {
    const char *head, *piece, *message;
  } cases[] = {
      {"", "(", "1:1: error: expected a statement, found '('"},
      {"", "[", "1:1: error: expected a statement, found '['"},
      {"", "-", "1:1: error: expected a statement, found '-'"},
      {"", ";", "1:1: error: expected a statement, found ';'"},
      {"", "\"", "1:1: error: expected a statement, found '\"\"'"},
      {"", "else if ", "1:1: error: expected a statement, found 'else'"},
      {"", "}", "1:1: error: '}' without a '{'"},
      {"", "{", "1:257: error: nested deeper than 256"},
      {"", "box {", "1:1285: error: nested deeper than 256"},
      {"", "if (a)", "1:1543: error: nested deeper than 256"},
      {"", "$",
       "1:1: error: '$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$$...' is "
       "not a physical qubit such as $0"},
      {"", "?", "1:1: error: unexpected character '?' (U+003F)"},
      {"", "\xff", "1:1: error: byte 0xFF is not UTF-8"},
      {"int n = ", "(", "1:265: error: nested deeper than 256"},
      {"int n = ", "-", "1:265: error: nested deeper than 256"},
      {"int n = ", "a[", "1:522: error: nested deeper than 256"},
      {"int n = ", "int[", "1:1036: error: nested deeper than 256"},
      {"int n = ", "sin(", "1:1036: error: nested deeper than 256"},
      {"int n = ", "2**", "1:778: error: nested deeper than 256"},
      {"x ", "q[{", "1:772: error: nested deeper than 256"},
      {"", "delay[durationof({", "1:2310: error: nested deeper than 256"},
      {"def f(", "(",
       "1:1: error: subroutines are not supported: inline 'f' "
       "before import"},
      {"def f() ", "{",
       "1:1: error: subroutines are not supported: inline "
       "'f' before import"},
      {"/*", "a", "1:1: error: comment has no end"},
      {"'", "a", "1:1: error: string has no end on its line"},
      {"x ", "1",
       "1:3: error: number has 1048576 characters when it may have "
       "4096"},
      {"x q", "[0", nullptr},
      {"", "ctrl @ ", nullptr},
      {"", "gate g q { ", nullptr},
      {"", "x q[0 0]; ", nullptr},
  };
  for (const auto &one : cases) {
    Lines lines = survive(one.head + repeated(one.piece));
    ASSERT_FALSE(lines.empty()) << one.head << one.piece;
    if (one.message)
      EXPECT_EQ(lines, Lines{one.message}) << one.head << one.piece;
  }
}

TEST(HostileTest, LargeButSound) {
  std::string name = repeated("a"), greek = repeated("\u03c0");
  for (const std::string &text :
       {"x " + name + ";", name + " q;", "x " + greek + ";",
        "if (a) x q; " + repeated("else if (a) x q; "),
        repeated("ctrl @ ") + "x q;", "int n = " + repeated("2 + ") + "2;",
        "x q" + repeated("[0]") + ";", "x " + repeated("q,") + ";",
        "int n = a[{" + repeated("1,") + "}];", repeated("@a\n") + "x q;",
        repeated("pragma a\n"), repeated(" "), repeated("\r\n"),
        "// " + repeated("\xff"), "x q[1" + repeated(" ") + "];",
        repeated("cx q[0], q[1];\n")})
    EXPECT_EQ(survive(text), Lines()) << text.substr(0, 20);
}

TEST(HostileTest, DeepAndWide) {
  // All levels of precedence on each level of nesting.
  std::string open = "1||1&&1|1^1&1==1<1<<1+1*(", text = "int n = ";
  for (unsigned i = 0; i < MostLevels; ++i)
    text += open;
  text += "1" + std::string(MostLevels, ')') + ";";
  EXPECT_EQ(survive(text), Lines());
}

TEST(HostileTest, Binary) {
  std::mt19937 random(20);
  for (int round = 0; round < 20; ++round) {
    std::string text;
    for (size_t i = 0; i < 20000; ++i)
      text += char(random());
    EXPECT_FALSE(survive(text).empty());
  }
}

TEST(HostileTest, AnyOrderOfTokens) {
  const char *const pieces[] = {
      "if",      "(",          ")",       "{",     "}",      "[",
      "]",       ";",          ",",       "=",     "q",      "1",
      "else",    "for",        "int",     "in",    "->",     "-",
      "**",      ":",          "box",     "delay", "gate",   "measure",
      "let",     "++",         "$0",      "10ns",  "ctrl",   "@",
      "def",     "cal",        "\n",      "+=",    "\"a\"",  "\"01\"",
      "const",   "durationof", "barrier", "==",    "@a b\n", "pragma c\n",
      "include", "qubit",      "while",   "1__0",  "\x01"};
  std::mt19937 random(21);
  for (int round = 0; round < 3000; ++round) {
    std::string text = round % 2 ? "OPENQASM 2.0;" : "";
    for (int i = 0; i < 40; ++i)
      text += std::string(pieces[random() % std::size(pieces)]) + " ";
    survive(text);
  }
}

TEST(HostileTest, EveryTokenIsReadOnce) {
  // The parser never goes back, on sound text and on broken text.
  std::string sound = "cx q[0], q[1]; if (c == 1) { x q; } else rz(-pi/2) q;\n";
  std::string broken = "gate g(a b { x a; }\ny q[{0, 1} z;\n";
  for (const std::string &piece : {sound, broken}) {
    size_t one = Tokens(piece).counted;
    for (size_t times : {1, 2, 4, 8}) {
      std::string text;
      for (size_t i = 0; i < times; ++i)
        text += piece;
      EXPECT_EQ(Reading(text).result.tokens, times * one) << piece;
    }
  }
}

} // namespace
