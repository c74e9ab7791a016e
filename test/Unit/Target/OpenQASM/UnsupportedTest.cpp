//===- UnsupportedTest.cpp - What is outside the subset -------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

/// Each is reported once, at its place, and what follows is read.
void expectOnly(llvm::StringRef construct, llvm::StringRef message) {
  Reading reading(("x q;\n  " + construct + "\ny q;").str());
  EXPECT_EQ(reading.messages(), Lines{("2:3: error: " + message).str()})
      << construct.str();
  EXPECT_EQ(reading.tree(), "call x q\ncall y q\n") << construct.str();
}

TEST(UnsupportedTest, Subroutines) {
  for (llvm::StringRef construct :
       {"def f(int[32] a, qubit q) -> bit { if (a) { x q; } return measure q; "
        "}",
        "def f() { }", "extern f(int[32], float) -> bit[2];",
        "def f(qubit a,\nqubit b) {\nbarrier a;\n}", "f(1, c[0]);", "f() ;"}) {
    bool isCall = construct.starts_with("f");
    expectOnly(construct,
               std::string("subroutines are not supported: inline "
                           "'f' before import") +
                   (isCall ? ", or name its qubits if it is a gate" : ""));
  }
  expectOnly("return 1;",
             "subroutines are not supported: 'return' stands in them only");
  EXPECT_EQ(messagesOf("c = f(1) + g(2);"),
            Lines{"1:5: error: subroutines are not supported: inline 'f' "
                  "before import"});
}

TEST(UnsupportedTest, RunTimeControlFlow) {
  auto refused = [](llvm::StringRef word) {
    return "run-time control flow is not supported: '" + word.str() + "'";
  };
  expectOnly("while (i < 3) { x q; { } i += 1; }", refused("while"));
  expectOnly("while (i < 3) x q;", refused("while"));
  expectOnly("while (a) if (b) { x q; } else { y q; }", refused("while"));
  expectOnly("break;", refused("break"));
  expectOnly("continue;", refused("continue"));
  expectOnly("end;", refused("end"));
  expectOnly("switch (i) { case 1, 2 { x q; } default { y q; } }",
             refused("switch"));
  // The loop itself is read.
  EXPECT_EQ(messagesOf("for int i in [0:3] {\n  if (c) break;\n}"),
            Lines{"2:10: error: " + refused("break")});
}

TEST(UnsupportedTest, RunTimeValues) {
  auto refused = [](llvm::StringRef word) {
    return "run-time classical values are not supported (only compile-time "
           "constants): '" +
           word.str() + "'";
  };
  expectOnly("array[int[32], 2, 2] a = {{1, 2}, {3, 4}};", refused("array"));
  expectOnly("array[bit, 2] a;", refused("array"));
  expectOnly("complex[float[64]] z = 1.0 + 2.0im;", refused("complex"));
  EXPECT_EQ(messagesOf("const array[int, 2] a = {1, 2};\ninput complex z;"),
            (Lines{"1:7: error: " + refused("array"),
                   "2:7: error: " + refused("complex")}));
}

TEST(UnsupportedTest, Calibrations) {
  llvm::StringRef message =
      "calibration text is not supported: give durations in the device file "
      "(--ignore-calibrations skips it with a warning)";
  const llvm::StringRef constructs[] = {
      "cal { frame f = newframe(\" ' \xff $ ?, 5e9, 0.0); { } }",
      "defcal x $0 { play(d, gaussian(1.0 + 0.5im, 160dt)); }",
      "defcal rz(angle[20] theta) q -> bit { shift(q, -theta); }",
      "defcalgrammar \"tones\";"};
  for (llvm::StringRef construct : constructs) {
    expectOnly(construct, message);
    ParseOptions options;
    options.ignoreCalibrations = true;
    Reading ignored(("x q;\n  " + construct + "\ny q;").str(), options);
    EXPECT_EQ(
        ignored.messages(),
        Lines{"2:3: warning: '" +
              construct.take_until([](char c) { return c == ' '; }).str() +
              "' ignored"});
    EXPECT_EQ(ignored.errors(), 0u);
    EXPECT_EQ(ignored.tree(), "call x q\ncall y q\n");
  }
}

TEST(UnsupportedTest, CalibrationsWithoutAnEnd) {
  ParseOptions options;
  options.ignoreCalibrations = true;
  EXPECT_EQ(Reading("box {\ncal { a { }", options).messages(),
            (Lines{"2:1: warning: 'cal' ignored",
                   "2:5: error: calibration text has no end"}));
  EXPECT_EQ(messagesOf("box {\ncal { a { }").size(), 1u);
}

TEST(UnsupportedTest, WithoutAnEnd) {
  for (llvm::StringRef construct :
       {"def f() { x q;", "while (a) {", "switch (a) { case 1 { }",
        "array[int, 2] a = {1, 2", "extern f(", "def"})
    EXPECT_EQ(messagesOf(("box { " + construct).str()).size(), 1u)
        << construct.str();
}

} // namespace
