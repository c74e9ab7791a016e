//===- LexerTest.cpp - Text to tokens -------------------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

using Kind = TokenKind;

struct Seen {
  Kind kind;
  std::string text;
  bool operator==(const Seen &other) const {
    return kind == other.kind && text == other.text;
  }
};

void PrintTo(const Seen &seen, std::ostream *os) {
  *os << spell(seen.kind).str() << " <" << seen.text << ">";
}

std::vector<Seen> seen(llvm::StringRef source) {
  Tokens read(source);
  EXPECT_EQ(read.listener.lines, Lines()) << source.str();
  std::vector<Seen> result;
  for (const Token &token : read.tokens)
    result.push_back({token.kind, token.text.str()});
  return result;
}

Lines said(llvm::StringRef source) { return Tokens(source).listener.lines; }

TEST(LexerTest, MarksTakeTheLongestMatch) {
  const Kind marks[] = {Kind::LeftParen,
                        Kind::RightParen,
                        Kind::LeftBracket,
                        Kind::RightBracket,
                        Kind::LeftBrace,
                        Kind::RightBrace,
                        Kind::Comma,
                        Kind::Semicolon,
                        Kind::Colon,
                        Kind::At,
                        Kind::Arrow,
                        Kind::Concatenate,
                        Kind::Tilde,
                        Kind::Exclamation,
                        Kind::Plus,
                        Kind::Minus,
                        Kind::Star,
                        Kind::Slash,
                        Kind::Percent,
                        Kind::StarStar,
                        Kind::Ampersand,
                        Kind::Bar,
                        Kind::Caret,
                        Kind::AmpersandAmpersand,
                        Kind::BarBar,
                        Kind::EqualEqual,
                        Kind::ExclamationEqual,
                        Kind::Less,
                        Kind::LessEqual,
                        Kind::Greater,
                        Kind::GreaterEqual,
                        Kind::LessLess,
                        Kind::GreaterGreater,
                        Kind::Equal,
                        Kind::PlusEqual,
                        Kind::MinusEqual,
                        Kind::StarEqual,
                        Kind::SlashEqual,
                        Kind::PercentEqual,
                        Kind::StarStarEqual,
                        Kind::AmpersandEqual,
                        Kind::BarEqual,
                        Kind::CaretEqual,
                        Kind::TildeEqual,
                        Kind::LessLessEqual,
                        Kind::GreaterGreaterEqual};
  for (Kind kind : marks) {
    std::string text = spell(kind).str();
    EXPECT_EQ(seen(text), (std::vector<Seen>{{kind, text}}));
    EXPECT_EQ(seen("a" + text + "b"),
              (std::vector<Seen>{
                  {Kind::Word, "a"}, {kind, text}, {Kind::Word, "b"}}));
  }
  EXPECT_EQ(seen("***="), (std::vector<Seen>{{Kind::StarStar, "**"},
                                             {Kind::StarEqual, "*="}}));
  EXPECT_EQ(seen("->-"),
            (std::vector<Seen>{{Kind::Arrow, "->"}, {Kind::Minus, "-"}}));
}

TEST(LexerTest, NamesAreMadeOfLetters) {
  for (llvm::StringRef name :
       {"q", "_", "_0", "CX", "q1_a", "\u03c0", "\u03c4", "\u2107",
        "\u00e9t\u00e9", "\u4e2d", "\U00010400", "qreg"})
    EXPECT_EQ(seen(name), (std::vector<Seen>{{Kind::Word, name.str()}}));
  // A subscript is no letter, nor are signs and spaces beyond ASCII.
  EXPECT_EQ(said("\u03b8\u2081x"),
            Lines{"1:3: error: unexpected character '\u2081' (U+2081)"});
  EXPECT_EQ(said("a \u201cb\u201d"),
            (Lines{"1:3: error: unexpected character '\u201c' (U+201C)",
                   "1:7: error: unexpected character '\u201d' (U+201D)"}));
  EXPECT_EQ(said("a\u00a0b"),
            Lines{"1:2: error: unexpected character '\u00a0' (U+00A0)"});
}

TEST(LexerTest, PhysicalQubitsAreOneToken) {
  EXPECT_EQ(seen("$12,$0"), (std::vector<Seen>{{Kind::PhysicalQubit, "$12"},
                                               {Kind::Comma, ","},
                                               {Kind::PhysicalQubit, "$0"}}));
  EXPECT_EQ(said("$"),
            Lines{"1:1: error: '$' is not a physical qubit such as $0"});
  EXPECT_EQ(said(" $a;"),
            Lines{"1:2: error: '$a' is not a physical qubit such as $0"});
  EXPECT_EQ(said("$1a"),
            Lines{"1:1: error: '$1a' is not a physical qubit such as $0"});
}

TEST(LexerTest, StringsAndBits) {
  EXPECT_EQ(seen("\"a b.inc\" 'c'"),
            (std::vector<Seen>{{Kind::String, "\"a b.inc\""},
                               {Kind::String, "'c'"}}));
  EXPECT_EQ(seen("\"01_01\""), (std::vector<Seen>{{Kind::Bits, "\"01_01\""}}));
  for (llvm::StringRef other :
       {"\"\"", "\"_01\"", "\"01_\"", "\"0__1\"", "\"012\"", "\"// no\""})
    EXPECT_EQ(seen(other), (std::vector<Seen>{{Kind::String, other.str()}}));
  EXPECT_EQ(said("x \"ab\ny"),
            Lines{"1:3: error: string has no end on its line"});
  EXPECT_EQ(said("\""), Lines{"1:1: error: string has no end on its line"});
  EXPECT_EQ(said("\"a\xff\""), Lines{"1:3: error: byte 0xFF is not UTF-8"});
  EXPECT_EQ(said(llvm::StringRef("\"a\0b\"", 5)),
            Lines{"1:3: error: unexpected byte 0x00"});
}

TEST(LexerTest, CommentsAreSkipped) {
  EXPECT_EQ(seen("// a\nb/* c\n*/d/**/e"),
            (std::vector<Seen>{
                {Kind::Word, "b"}, {Kind::Word, "d"}, {Kind::Word, "e"}}));
  EXPECT_EQ(seen("//"), std::vector<Seen>());
  // They do not nest.
  EXPECT_EQ(seen("/* /* */ a */"),
            (std::vector<Seen>{
                {Kind::Word, "a"}, {Kind::Star, "*"}, {Kind::Slash, "/"}}));
  // Any bytes may stand in them.
  EXPECT_EQ(seen("// \xff\xfe \x01\n/* \xff */a"),
            (std::vector<Seen>{{Kind::Word, "a"}}));
  EXPECT_EQ(said("a\n  /* b\n"), Lines{"2:3: error: comment has no end"});
  EXPECT_EQ(said("/*/"), Lines{"1:1: error: comment has no end"});
}

TEST(LexerTest, AnnotationsAndPragmasTakeTheirLine) {
  EXPECT_EQ(seen("@lull.keep a // b\r\nx"),
            (std::vector<Seen>{{Kind::Annotation, "@lull.keep a // b"},
                               {Kind::Word, "x"}}));
  EXPECT_EQ(seen("a;@b c"), (std::vector<Seen>{{Kind::Word, "a"},
                                               {Kind::Semicolon, ";"},
                                               {Kind::Annotation, "@b c"}}));
  // Behind a modifier there is none, with or without a blank.
  for (llvm::StringRef text : {"inv @x", "inv @ x"})
    EXPECT_EQ(seen(text),
              (std::vector<Seen>{
                  {Kind::Word, "inv"}, {Kind::At, "@"}, {Kind::Word, "x"}}));
  EXPECT_EQ(seen("pragma a {\n#pragma"),
            (std::vector<Seen>{{Kind::Pragma, "pragma a {"},
                               {Kind::Pragma, "#pragma"}}));
  EXPECT_EQ(seen("x pragma"),
            (std::vector<Seen>{{Kind::Word, "x"}, {Kind::Word, "pragma"}}));
  EXPECT_EQ(seen("pragmas"), (std::vector<Seen>{{Kind::Word, "pragmas"}}));
  EXPECT_EQ(said("pragma \xc3("), Lines{"1:8: error: byte 0xC3 is not UTF-8"});
}

TEST(LexerTest, BytesThatAreNoText) {
  EXPECT_EQ(said(llvm::StringRef("a\0\0b", 4)),
            Lines{"1:2: error: unexpected byte 0x00"});
  EXPECT_EQ(said("\x1b"), Lines{"1:1: error: unexpected byte 0x1B"});
  EXPECT_EQ(said("a \x7f"), Lines{"1:3: error: unexpected byte 0x7F"});
  EXPECT_EQ(said("\xff\xff\xff a"),
            Lines{"1:1: error: byte 0xFF is not UTF-8"});
  // Overlong, a surrogate, beyond Unicode, cut off.
  EXPECT_EQ(said("\xc0\xaf"), Lines{"1:1: error: byte 0xC0 is not UTF-8"});
  EXPECT_EQ(said("\xed\xa0\x80"), Lines{"1:1: error: byte 0xED is not UTF-8"});
  EXPECT_EQ(said("\xf5\x80\x80\x80"),
            Lines{"1:1: error: byte 0xF5 is not UTF-8"});
  EXPECT_EQ(said("a\xcf"), Lines{"1:2: error: byte 0xCF is not UTF-8"});
  EXPECT_EQ(said("?? `"),
            (Lines{"1:1: error: unexpected character '?' (U+003F)",
                   "1:4: error: unexpected character '`' "
                   "(U+0060)"}));
}

TEST(LexerTest, LinesAndColumns) {
  Tokens read("\xEF\xBB\xBF a\r\n\tb /* c\n */ d\n\ne");
  ASSERT_EQ(read.tokens.size(), 4u);
  const char *const places[] = {"1:5", "2:2", "3:5", "5:1"};
  for (size_t i = 0; i < 4; ++i) {
    EXPECT_EQ(read.listener.place(read.tokens[i].loc()), places[i]);
    EXPECT_TRUE(read.tokens[i].startsLine);
  }
  EXPECT_FALSE(Tokens("a b").tokens[1].startsLine);
}

TEST(LexerTest, EndIsTheEndForever) {
  Listener listener("a");
  Lexer lexer(listener.text(), listener.reporter);
  EXPECT_TRUE(lexer.next().is(Kind::Word));
  for (int i = 0; i < 3; ++i) {
    Token token = lexer.next();
    EXPECT_TRUE(token.is(Kind::End));
    EXPECT_EQ(token.loc().getPointer(), listener.text().end());
  }
  EXPECT_EQ(lexer.tokensRead(), 1u);
}

TEST(LexerTest, ReadsUpToTheEndOfAPartOfABuffer) {
  // Whatever follows the last byte is not looked at.
  llvm::StringRef whole = "12ns\"ab\"/*c*/$1@bc**=\u03c0";
  for (size_t length = 0; length <= whole.size(); ++length) {
    Listener part(whole.take_front(length)), other("");
    Lexer exact(part.text(), part.reporter);
    Lexer within(whole.take_front(length), other.reporter);
    while (true) {
      Token a = exact.next(), b = within.next();
      EXPECT_EQ(a.kind, b.kind) << length;
      EXPECT_EQ(a.text, b.text) << length;
      if (a.is(Kind::End) || b.is(Kind::End))
        break;
    }
  }
}

TEST(LexerTest, SkipsBlocksOfOtherLanguages) {
  Listener listener("{ \"{ ' \xff }} \n} next");
  Lexer lexer(listener.text(), listener.reporter);
  EXPECT_TRUE(lexer.next().is(Kind::LeftBrace));
  EXPECT_TRUE(lexer.skipBlock());
  EXPECT_EQ(lexer.next().text, "}");
  EXPECT_EQ(lexer.next().text, "next");
  EXPECT_FALSE(lexer.skipBlock());
  EXPECT_EQ(listener.lines, Lines());
}

TEST(TokenTest, QuotesAreShort) {
  EXPECT_EQ(quote("abc"), "'abc'");
  EXPECT_EQ(quote(std::string(40, 'a')), "'" + std::string(40, 'a') + "'");
  EXPECT_EQ(quote(std::string(41, 'a')), "'" + std::string(40, 'a') + "...'");
  // Not cut within a character.
  EXPECT_EQ(quote(std::string(39, 'a') + "\u03c0\u03c0"),
            "'" + std::string(39, 'a') + "...'");
}

} // namespace
