//===- VersionTest.cpp - What depends on the version ----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

Version versionOf(llvm::StringRef source) {
  Reading reading(source);
  EXPECT_EQ(reading.messages(), Lines()) << source.str();
  return reading.result.program.version;
}

TEST(VersionTest, VersionLines) {
  EXPECT_EQ(versionOf("OPENQASM 2.0;"), Version::V2_0);
  EXPECT_EQ(versionOf("OPENQASM 3.0;"), Version::V3_0);
  EXPECT_EQ(versionOf("// a\n\nOPENQASM 3.1;"), Version::V3_1);
  EXPECT_EQ(versionOf("OPENQASM 3.2;"), Version::V3_2);
  // All of it.
  EXPECT_EQ(versionOf("OPENQASM 3;"), Version::V3_2);
  Reading stated("\nOPENQASM 3.0;");
  EXPECT_EQ(stated.listener.place(stated.result.program.versionLoc), "2:1");
  Reading absent("x q;");
  EXPECT_EQ(absent.result.program.version, Version::V3_2);
  EXPECT_FALSE(absent.result.program.versionLoc.isValid());
  EXPECT_EQ(print(stated.result.program), "version 3.0\n");
  EXPECT_EQ(print(absent.result.program), "version 3.2 assumed\ncall x q\n");
}

TEST(VersionTest, OtherVersionsAreRefused) {
  // What follows is not read: nobody knows what it means.
  for (llvm::StringRef version : {"1", "1.0", "2", "2.1", "3.3", "3.9", "4.0"})
    EXPECT_EQ(messagesOf(("OPENQASM " + version + ";\n)(").str()),
              Lines{"1:10: error: unsupported OpenQASM version " +
                    version.str() + " (supported are 2.0, 3.0 to 3.2)"});
  EXPECT_EQ(messagesOf("OPENQASM x;"),
            Lines{"1:10: error: expected a version such as 3.0, found 'x'"});
  EXPECT_EQ(messagesOf("x q;\nOPENQASM 3.0;"),
            Lines{"2:1: error: version line is not the first statement"});
  EXPECT_EQ(messagesOf("OPENQASM 3.0\nqubit q;"),
            Lines{"1:13: error: expected ';', found 'qubit'"});
}

TEST(VersionTest, OldHeaderMeansVersionTwo) {
  Reading reading("include \"qelib1.inc\";\nqreg bit[2];\nrz(2^3) bit[0];");
  EXPECT_EQ(reading.messages(),
            Lines{"1:1: warning: no version line, but qelib1.inc is included: "
                  "read as OpenQASM 2.0"});
  EXPECT_EQ(reading.errors(), 0u);
  EXPECT_EQ(reading.result.program.version, Version::V2_0);
  EXPECT_EQ(reading.tree(), "include qelib1.inc\ndeclare qubit[2] bit\n"
                            "call rz((** 2 3)) bit[0]\n");
  // Not if the version is stated, or the text is none of version 2.
  EXPECT_EQ(versionOf("OPENQASM 3.0;include \"qelib1.inc\";"), Version::V3_0);
  EXPECT_EQ(versionOf("qubit q;\ninclude \"qelib1.inc\";"), Version::V3_2);
}

TEST(VersionTest, IncludedFilesHaveTheVersionOfTheirProgram) {
  ParseOptions options;
  options.version = Version::V2_0;
  Reading reading("gate box a { rz(a ^ 2) a; }", options);
  EXPECT_EQ(reading.messages(), Lines());
  EXPECT_EQ(reading.tree(), "gate box a {\n  call rz((** a 2)) a\n}\n");
  EXPECT_EQ(Reading("OPENQASM 2.0;", options).messages(), Lines());
  EXPECT_EQ(Reading("OPENQASM 3.0;", options).messages(),
            Lines{"1:10: error: version is 3.0 when it should be 2.0, that of "
                  "the program that includes this file"});
}

TEST(VersionTest, KeywordsOfVersionThreeAreNamesInTwo) {
  EXPECT_EQ(oldTreeOf("qreg in[1]; gate box a { } opaque delay(t) q;\n"
                      "box in[0]; delay(100) in; nop in; let in;"),
            "declare qubit[1] in\ngate box a {}\nopaque delay(t) q\n"
            "call box in[0]\ncall delay(100) in\ncall nop in\ncall let in");
}

TEST(VersionTest, StatementsOfVersionThreeSaySoInTwo) {
  struct {
    const char *text, *what;
  } cases[] = {{"qubit[2] q;", "qubit"},
               {"bit[2] c;", "bit"},
               {"for int i in [0:3] { x q; }", "for"},
               {"let a = q[0:1];", "let"},
               {"box { x q; }", "box"},
               {"delay[100] q;", "delay"},
               {"ctrl @ x q, r;", "ctrl"},
               {"const int n = 1;", "const"},
               {"def f(int a) { return 1; }", "def"},
               {"else x q;", "else"}};
  for (const auto &one : cases)
    EXPECT_EQ(messagesOf(std::string("OPENQASM 2.0;\n") + one.text + "\nx q;"),
              Lines{"2:1: error: '" + std::string(one.what) +
                    "' needs OpenQASM 3.0, and this is 2.0"});
  struct {
    const char *text, *message;
  } marks[] = {{"x $0;", "2:3: error: '$0'"},
               {"c = measure q;", "2:3: error: '='"},
               {"x q[0:1];", "2:6: error: ':'"},
               {"x q[{0}];", "2:5: error: '{'"},
               {"rz(1)[5] q;", "2:6: error: '['"},
               {"x[5] q;", "2:2: error: '['"},
               {"rz(5ns) q;", "2:4: error: '5ns'"},
               {"rz(\"01\") q;", "2:4: error: '\"01\"'"}};
  for (const auto &one : marks)
    EXPECT_EQ(messagesOf(std::string("OPENQASM 2.0;\n") + one.text),
              Lines{std::string(one.message) +
                    " needs OpenQASM 3.0, and this is 2.0"});
  // A gate of that name is no sign of another version.
  EXPECT_EQ(messagesOf("OPENQASM 2.0;\ngate box a { }\nbox q r;"),
            Lines{"3:6: error: expected ';', found 'r'"});
}

TEST(VersionTest, LaterKeywords) {
  EXPECT_EQ(treeOf("OPENQASM 3.2; nop q;"), "nop q");
  for (llvm::StringRef version : {"3.0", "3.1"})
    EXPECT_EQ(messagesOf(("OPENQASM " + version + ";\nnop q;").str()),
              Lines{"2:1: error: 'nop' needs OpenQASM 3.2, and this is " +
                    version.str()});
  EXPECT_EQ(messagesOf("OPENQASM 3.0;\nswitch (a) { case 1 { } }\nx q"),
            (Lines{"2:1: error: 'switch' needs OpenQASM 3.1, and this is 3.0",
                   "3:4: error: expected ';', found the end of the file"}));
  EXPECT_EQ(messagesOf("OPENQASM 3.1;\nswitch (a) { case 1 { } }"),
            Lines{"2:1: error: run-time control flow is not supported: "
                  "'switch'"});
  // Before they were keywords they were names.
  EXPECT_EQ(treeOf("OPENQASM 3.0; gate nop a { } nop q; x switch;"),
            "gate nop a {}\ncall nop q\ncall x switch");
}

TEST(VersionTest, EveryKeywordIsKnown) {
  // The keywords of the grammar of version 3, from memory; each is refused as a
  // name of a variable.
  for (const char *word : {"OPENQASM", "include",    "defcalgrammar",
                           "def",      "cal",        "defcal",
                           "gate",     "extern",     "box",
                           "let",      "break",      "continue",
                           "if",       "else",       "end",
                           "return",   "for",        "while",
                           "in",       "switch",     "case",
                           "default",  "nop",        "input",
                           "output",   "const",      "readonly",
                           "mutable",  "qreg",       "qubit",
                           "creg",     "bool",       "bit",
                           "int",      "uint",       "float",
                           "angle",    "complex",    "array",
                           "void",     "duration",   "stretch",
                           "inv",      "pow",        "ctrl",
                           "negctrl",  "durationof", "delay",
                           "reset",    "measure",    "barrier",
                           "true",     "false",      "#dim"})
    EXPECT_EQ(messagesOf(std::string("int ") + word + ";"),
              Lines{"1:5: error: expected a name to declare, found the keyword "
                    "'" +
                    std::string(word) + "'"});
  for (const char *word : {"OPENQASM", "include", "qreg", "creg", "gate",
                           "opaque", "if", "barrier", "measure", "reset"})
    EXPECT_EQ(messagesOf("OPENQASM 2.0;\nqreg " + std::string(word) + "[1];"),
              Lines{"2:6: error: expected a name for the register, found the "
                    "keyword '" +
                    std::string(word) + "'"});
}

} // namespace
