//===- RecoveryTest.cpp - Several errors, each said once ------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

TEST(RecoveryTest, ThreeErrorsInOneFile) {
  Reading reading("qubit[2] q;\n"
                  "x q[0;\n"
                  "gate g a { y a }\n"
                  "if (c == ) { z q; } else { x q; }\n"
                  "y q;\n");
  EXPECT_EQ(reading.messages(),
            (Lines{"2:6: error: expected ']', found ';'",
                   "2:4: note: to match this '['",
                   "3:15: error: expected ';', found '}'",
                   "4:10: error: expected an expression, found ')'"}));
  EXPECT_EQ(reading.errors(), 3u);
  // What is sound is kept.
  EXPECT_EQ(reading.tree(), "declare qubit[2] q\ngate g a {}\ncall y q\n");
}

TEST(RecoveryTest, ErrorsWithinBodiesStayThere) {
  Reading reading("box {\n  x q[0;\n  y q;\n  if (a) { 1; z q; }\n}\nx q;");
  EXPECT_EQ(reading.errors(), 2u);
  EXPECT_EQ(reading.tree(),
            "box {\n  call y q\n  if a {\n    call z q\n  }\n}\ncall x q\n");
}

TEST(RecoveryTest, BracesOfSetsAreNoBodies) {
  for (llvm::StringRef broken :
       {"x q[{0, 2} r;", "x q[{0 2}];", "x q[{0, 2;", "x q[0 0], r[{1, 2}], s;",
        "x q[{durationof({y q;}) 2}];", "let a = ) q[{0}];",
        "for int i in {1 2} { x q; }", "for i in {1, 2} { x q; }",
        "delay[* durationof({x q; y q;})] q;",
        "delay[durationof({x q; y q;}) 2] q;", "c = {1, {2, 3}};"}) {
    Reading reading((broken + "\ny q;").str());
    EXPECT_EQ(reading.errors(), 1u) << broken.str();
    EXPECT_EQ(reading.tree(), "call y q\n") << broken.str();
  }
}

TEST(RecoveryTest, ALineWithAKeywordIsAStatementOfItsOwn) {
  Reading reading("x q\nbarrier q;\ny q\nz q;\nif (a) { x q; }");
  EXPECT_EQ(reading.messages(), (Lines{"1:4: error: expected ';', found "
                                       "'barrier'",
                                       "3:4: error: expected ';', found 'z'"}));
  EXPECT_EQ(reading.tree(), "barrier q\nif a {\n  call x q\n}\n");
}

TEST(RecoveryTest, ErrorsOfTheLexerAreNotRepeated) {
  EXPECT_EQ(messagesOf("x q[1__0];\ny \x01 q;\nz q;"),
            (Lines{"1:5: error: '1__0' is neither a number nor a duration",
                   "2:3: error: unexpected byte 0x01"}));
  EXPECT_EQ(messagesOf("box {\n x q; /* no end\n}\n"),
            Lines{"2:7: error: comment has no end"});
  EXPECT_EQ(messagesOf("include \"stdgates.inc;\nx q;"),
            Lines{"1:9: error: string has no end on its line"});
}

TEST(RecoveryTest, StrayBraces) {
  EXPECT_EQ(messagesOf("x q;\n}}}\ny q;\n}"),
            (Lines{"2:1: error: '}' without a '{'",
                   "4:1: error: '}' without a '{'"}));
  EXPECT_EQ(messagesOf("box {\nif (a) {\nx q;\n"),
            (Lines{"4:1: error: expected '}', found the end of the file",
                   "2:8: note: to match this '{'"}));
  EXPECT_EQ(messagesOf("x q;;;\n;y q;"),
            Lines{"1:5: error: expected a statement, found ';'"});
}

TEST(RecoveryTest, TooManyErrors) {
  std::string text;
  for (unsigned i = 0; i < Reporter::MostErrors; ++i)
    text += "x 1;\n";
  EXPECT_EQ(messagesOf(text).size(), Reporter::MostErrors);
  for (const char *more :
       {"x 1;\n", "x 1;\nx 2;\ny q[;\n?", "?", "box { x 1; "}) {
    Reading reading(text + more);
    ASSERT_EQ(reading.messages().size(), Reporter::MostErrors + 1) << more;
    EXPECT_EQ(reading.errors(), Reporter::MostErrors);
    EXPECT_NE(reading.messages().back().find(": error: too many errors"),
              std::string::npos);
  }
}

TEST(RecoveryTest, NestingThatIsTooDeepIsOneError) {
  auto nested = [](llvm::StringRef open, llvm::StringRef inside,
                   llvm::StringRef close, unsigned levels) {
    std::string text;
    for (unsigned i = 0; i < levels; ++i)
      text += open;
    text += inside;
    for (unsigned i = 0; i < levels; ++i)
      text += close;
    return text + "\ny q;";
  };
  struct {
    const char *open, *inside, *close;
    unsigned mark;
  } cases[] = {{"{", "x q;", "}", 0},
               {"box {", "x q;", "}", 4},
               {"if (a) ", "x q;", "", 0},
               {"if (a) {", "x q;", "} else { z q; }", 7},
               {"for int i in c {", "x q;", "}", 15}};
  for (const auto &one : cases) {
    EXPECT_EQ(
        messagesOf(nested(one.open, one.inside, one.close, MostLevels)).size(),
        0u)
        << one.open;
    Reading reading(nested(one.open, one.inside, one.close, MostLevels + 1));
    size_t column =
        MostLevels * llvm::StringRef(one.open).size() + one.mark + 1;
    // Without braces the statement begins behind the last condition.
    if (one.mark == 0 && *one.open == 'i')
      column += llvm::StringRef(one.open).size();
    EXPECT_EQ(reading.messages(), Lines{"1:" + std::to_string(column) +
                                        ": error: nested deeper than 256"})
        << one.open;
    EXPECT_TRUE(llvm::StringRef(reading.tree()).ends_with("\ncall y q\n"));
  }
}

TEST(RecoveryTest, EachStatementThatIsTooDeepIsAnError) {
  std::string deep = std::string(MostLevels + 1, '{') +
                     std::string(MostLevels + 1, '}') + "\n";
  EXPECT_EQ(messagesOf(deep + deep),
            (Lines{"1:257: error: nested deeper than 256",
                   "2:257: error: nested deeper than 256"}));
}

TEST(RecoveryTest, LongChainsAreNotNested) {
  std::string branches = "if (a) x q;", modifiers, sum = "const int n = 1";
  for (unsigned i = 0; i < 10000; ++i) {
    branches += " else if (a) x q;";
    modifiers += "inv @ ";
    sum += " + 1";
  }
  Reading conditions(branches);
  EXPECT_EQ(conditions.messages(), Lines());
  EXPECT_EQ(llvm::cast<If>(conditions.statements()[0])->branches.size(),
            10001u);
  Reading inverses(modifiers + "x q;");
  EXPECT_EQ(inverses.messages(), Lines());
  EXPECT_EQ(llvm::cast<GateCall>(inverses.statements()[0])->modifiers.size(),
            10000u);
  EXPECT_EQ(Reading(sum + ";").messages(), Lines());
}

} // namespace
