//===- StatementTest.cpp - Every kind of statement ------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

TEST(StatementTest, Includes) {
  EXPECT_EQ(treeOf("include \"stdgates.inc\";"), "include stdgates.inc");
  EXPECT_EQ(treeOf("include 'a/b.inc';"), "include a/b.inc");
  EXPECT_EQ(treeOf("include \"01\";"), "include 01");
  EXPECT_EQ(messagesOf("include stdgates;"),
            Lines{"1:9: error: expected the name of a file in quotes, found "
                  "'stdgates'"});
  EXPECT_EQ(messagesOf("box { include \"a\"; }"),
            Lines{"1:7: error: include not at global scope"});
}

TEST(StatementTest, Registers) {
  EXPECT_EQ(treeOf("qubit q; qubit[2] r; bit c; bit[2 * n] d;"),
            "declare qubit q\ndeclare qubit[2] r\ndeclare bit c\n"
            "declare bit[(* 2 n)] d");
  EXPECT_EQ(treeOf("qreg q[2]; creg c[3]; qreg r; creg d;"),
            "declare qubit[2] q\ndeclare bit[3] c\ndeclare qubit r\n"
            "declare bit d");
  EXPECT_EQ(oldTreeOf("qreg q[2];creg c[3];"),
            "declare qubit[2] q\ndeclare bit[3] c");
  EXPECT_EQ(messagesOf("OPENQASM 2.0; qreg q;"),
            Lines{"1:21: error: expected '[', found ';'"});
  EXPECT_EQ(messagesOf("qubit[2] q = 1;"),
            Lines{"1:11: error: expected ';', found '='"});
  EXPECT_EQ(messagesOf("if (a) { qubit q; } box { qreg r[2]; creg c[2]; }"),
            (Lines{"1:10: error: declaration of qubits not at global scope",
                   "1:27: error: declaration of qubits not at global scope"}));
}

TEST(StatementTest, Variables) {
  EXPECT_EQ(treeOf("int[32] i; uint u = 3; float[64] f = 0.5; angle[20] a = pi;"
                   "bool b = true; duration d = 100ns; stretch s;"
                   "bit[4] c = \"0101\"; bit m = measure $0;"),
            "declare int[32] i\ndeclare uint u = 3\n"
            "declare float[64] f = 0.5\ndeclare angle[20] a = pi\n"
            "declare bool b = true\ndeclare duration d = 100ns\n"
            "declare stretch s\ndeclare bit[4] c = \"0101\"\n"
            "declare bit m = (measure $0)");
  EXPECT_EQ(treeOf("const int n = 3;\nconst duration d = 2 * e;"),
            "declare const int n = 3\ndeclare const duration d = (* 2 e)");
  EXPECT_EQ(treeOf("input angle[32] theta; output bit[2] c;"),
            "declare input angle[32] theta\ndeclare output bit[2] c");
  struct {
    const char *text, *message;
  } cases[] = {
      {"const int n;",
       "1:12: error: expected '=' and the value of the constant, found ';'"},
      {"const qubit q;",
       "1:7: error: expected a classical type, found 'qubit'"},
      {"input x;", "1:7: error: expected a classical type, found 'x'"},
      {"input int x = 1;", "1:12: error: expected ';', found '='"},
      {"stretch a = 1ns;", "1:10: error: expected ';', found '='"},
      {"int in = 1;",
       "1:5: error: expected a name to declare, found the keyword 'in'"},
      {"int 3;", "1:5: error: expected a name to declare, found '3'"},
      {"int a, b;", "1:6: error: expected ';', found ','"},
      {"bool[2] b;", "1:5: error: expected a name to declare, found '['"},
      {"box { input int n; }", "1:7: error: input not at global scope"},
  };
  for (const auto &one : cases)
    EXPECT_EQ(messagesOf(one.text), Lines{one.message}) << one.text;
}

TEST(StatementTest, Aliases) {
  EXPECT_EQ(treeOf("let a = q[0:1] ++ r ++ s[{0, -1}];"),
            "let a = q[0:1] r s[{0, (- 1)}]");
  EXPECT_EQ(messagesOf("let a q;"),
            Lines{"1:7: error: expected '=' after the name of the alias, found "
                  "'q'"});
  EXPECT_EQ(messagesOf("let a = 1;"),
            Lines{"1:9: error: expected qubits or bits, found '1'"});
}

TEST(StatementTest, Assignments) {
  EXPECT_EQ(treeOf("c = 1; c[0] = d[1]; n += 2; b = c == 1;"),
            "assign c = 1\nassign c[0] = d[1]\nassign n += 2\n"
            "assign b = (== c 1)");
  for (const char *op :
       {"+", "-", "*", "/", "%", "**", "&", "|", "^", "<<", ">>"})
    EXPECT_EQ(treeOf(std::string("a ") + op + "= b;"),
              std::string("assign a ") + op + "= b");
  EXPECT_EQ(messagesOf("a ~= b;"), Lines{"1:3: error: '~=' is not supported"});
  EXPECT_EQ(messagesOf("a[0:1] b;"),
            Lines{"1:8: error: expected '=', found 'b'"});
}

TEST(StatementTest, GateDefinitions) {
  EXPECT_EQ(treeOf("gate g q {}\n"
                   "gate h(a, b,) q, r, { U(a, b, 0) q; cx q, r; }\n"
                   "gate k() q { barrier q; inv @ x q; }"),
            "gate g q {}\n"
            "gate h(a, b) q r {\n  call U(a, b, 0) q\n  call cx q r\n}\n"
            "gate k q {\n  barrier q\n  call inv @ x q\n}");
  EXPECT_EQ(oldTreeOf("gate u2(phi,lambda) q { U(pi/2,phi,lambda) q; }"),
            "gate u2(phi, lambda) q {\n  call U((/ pi 2), phi, lambda) q\n}");
  EXPECT_EQ(oldTreeOf("opaque pulse(a) q, r; opaque idle q;"),
            "opaque pulse(a) q r\nopaque idle q");
  EXPECT_EQ(messagesOf("gate g { }"),
            Lines{"1:8: error: expected a qubit of the gate, found '{'"});
  EXPECT_EQ(messagesOf("gate g(a q { x q; }"),
            (Lines{"1:10: error: expected ')', found 'q'",
                   "1:7: note: to match this '('"}));
  EXPECT_EQ(messagesOf("gate g(2) q { x q; }"),
            Lines{"1:8: error: expected a parameter, found '2'"});
  EXPECT_EQ(messagesOf("gate measure q { }"),
            Lines{"1:6: error: expected the name of the gate, found the "
                  "keyword 'measure'"});
  EXPECT_EQ(messagesOf("box { gate g q { } }"),
            Lines{"1:7: error: definition of a gate not at global scope"});
}

TEST(StatementTest, GateCalls) {
  EXPECT_EQ(
      treeOf("x q; cx q[0], $1,; U(pi, 0, -pi/2) q; g() q; rz(a)[250ns] q;"
             "x[20dt] q; gphase(pi); gphase(a) q; CX q, r;"),
      "call x q\ncall cx q[0] $1\ncall U(pi, 0, (/ (- pi) 2)) q\n"
      "call g q\ncall rz(a)[250ns] q\ncall x[20dt] q\n"
      "call gphase(pi)\ncall gphase(a) q\ncall CX q r");
  EXPECT_EQ(oldTreeOf("U(0,0,pi) q[0]; CX q[0],r; u1 (-3*pi/8) t;"),
            "call U(0, 0, pi) q[0]\ncall CX q[0] r\n"
            "call u1((/ (* (- 3) pi) 8)) t");
  struct {
    const char *text, *message;
  } cases[] = {
      {"x;", "1:2: error: expected the qubits of 'x', found ';'"},
      {"x q r;", "1:4: error: expected ';', found 'r'"},
      {"x q,, r;", "1:5: error: expected a qubit, found ','"},
      {"x 2;", "1:3: error: expected a qubit, found '2'"},
      {"x q", "1:4: error: expected ';', found the end of the file"},
      {"x measure;",
       "1:3: error: expected a qubit, found the keyword 'measure'"},
      {"rz(1);", "1:1: error: subroutines are not supported: inline 'rz' "
                 "before import, or name its qubits if it is a gate"},
      {"x -> q;", "1:3: error: expected a qubit, found '->'"},
  };
  for (const auto &one : cases)
    EXPECT_EQ(messagesOf(one.text), Lines{one.message}) << one.text;
}

TEST(StatementTest, Modifiers) {
  EXPECT_EQ(treeOf("ctrl @ x q, r;\nctrl(2) @ negctrl(n) @ inv @ pow(1/2) @ "
                   "rz(pi) a, b, c, d;\ninv @x q;\nctrl @ gphase(a) q;\n"
                   "inv @ gphase(a);"),
            "call ctrl @ x q r\n"
            "call ctrl(2) @ negctrl(n) @ inv @ pow((/ 1 2)) @ rz(pi) a b c d\n"
            "call inv @ x q\ncall ctrl @ gphase(a) q\ncall inv @ gphase(a)");
  Reading reading("negctrl @ inv @ x q, r;");
  const auto &call = *llvm::cast<GateCall>(reading.statements()[0]);
  ASSERT_EQ(call.modifiers.size(), 2u);
  EXPECT_EQ(reading.listener.place(call.modifiers[1].loc), "1:11");
  EXPECT_EQ(reading.listener.place(call.gate.loc), "1:17");
  EXPECT_EQ(messagesOf("ctrl x q;"),
            Lines{"1:6: error: expected '@' after 'ctrl', found 'x'"});
  EXPECT_EQ(messagesOf("pow @ x q;"),
            Lines{"1:5: error: expected '(' after 'pow', found '@'"});
  EXPECT_EQ(messagesOf("inv @ reset q;"),
            Lines{"1:7: error: expected the name of a gate, found the keyword "
                  "'reset'"});
  EXPECT_EQ(messagesOf("inv @ x;"),
            Lines{"1:8: error: expected the qubits of 'x', found ';'"});
}

TEST(StatementTest, Directives) {
  EXPECT_EQ(treeOf("barrier; barrier q, r[0:1], $2; reset q; reset $0;"),
            "barrier\nbarrier q r[0:1] $2\nreset q\nreset $0");
  EXPECT_EQ(
      treeOf("delay[100ns] q; delay[2*g] $0, $1; delay[0dt]; nop q; nop;"),
      "delay[100ns] q\ndelay[(* 2 g)] $0 $1\ndelay[0dt]\nnop q\nnop");
  EXPECT_EQ(messagesOf("reset;"),
            Lines{"1:6: error: expected the qubits to reset, found ';'"});
  EXPECT_EQ(messagesOf("delay q;"),
            Lines{"1:7: error: expected '[', found 'q'"});
  EXPECT_EQ(messagesOf("delay[10ns q;"),
            (Lines{"1:12: error: expected ']', found 'q'",
                   "1:6: note: to match this '['"}));
}

TEST(StatementTest, Measures) {
  EXPECT_EQ(treeOf("measure q -> c; c[0] = measure q[0]; measure $1;"),
            "measure q -> c\nmeasure q[0] -> c[0]\nmeasure $1");
  EXPECT_EQ(oldTreeOf("measure q[0]->c[0];"), "measure q[0] -> c[0]");
  EXPECT_EQ(messagesOf("c += measure q;"),
            Lines{"1:6: error: expected an expression, found 'measure'"});
  EXPECT_EQ(messagesOf("c = measure;"),
            Lines{"1:12: error: expected the qubits to measure, found ';'"});
  EXPECT_EQ(messagesOf("measure q ->;"),
            Lines{"1:13: error: expected the bits to set, found ';'"});
}

TEST(StatementTest, BoxesAndScopes) {
  EXPECT_EQ(treeOf("box { x q; box[d + 1us] { nop r; } }\nbox{}\n{ x q; {} }"),
            "box {\n  call x q\n  box[(+ d 1us)] {\n    nop r\n  }\n}\nbox {}\n"
            "scope {\n  call x q\n  scope {}\n}");
  EXPECT_EQ(messagesOf("box x q;"),
            Lines{"1:5: error: expected '{', found 'x'"});
  EXPECT_EQ(messagesOf("box {\n x q;\n"),
            (Lines{"3:1: error: expected '}', found the end of the file",
                   "1:5: note: to match this '{'"}));
}

TEST(StatementTest, Conditions) {
  EXPECT_EQ(treeOf("if (c == 1) x q; else { y q; z q; }"),
            "if (== c 1) {\n  call x q\n} else {\n  call y q\n  call z q\n}");
  EXPECT_EQ(treeOf("if (!a) {} else if (b) x q; else if (c) {y q;} else z q;"),
            "if (! a) {} else if b {\n  call x q\n} else if c {\n  call y q\n} "
            "else {\n  call z q\n}");
  // An else belongs to the nearest if.
  EXPECT_EQ(treeOf("if (a) if (b) x q; else y q;"),
            "if a {\n  if b {\n    call x q\n  } else {\n    call y q\n  }\n}");
  EXPECT_EQ(oldTreeOf("if(c==5) measure q[0] -> c[0];\nif(c==0) x q;"),
            "if (== c 5) {\n  measure q[0] -> c[0]\n}\n"
            "if (== c 0) {\n  call x q\n}");
  for (llvm::StringRef condition : {"c", "c+1==2", "1==c", "c==d", "c==1==1"})
    EXPECT_EQ(messagesOf(("OPENQASM 2.0;\nif(" + condition + ") x q;").str()),
              Lines{"2:4: error: condition is not of the form register == "
                    "integer that OpenQASM 2.0 has"});
  EXPECT_EQ(messagesOf("if a x q;"),
            Lines{"1:4: error: expected '(' after 'if', found 'a'"});
  EXPECT_EQ(messagesOf("if (a = 1) x q; else y q;"),
            (Lines{"1:7: error: expected ')', found '='",
                   "1:4: note: to match this '('"}));
  EXPECT_EQ(messagesOf("if (a) }"), (Lines{"1:8: error: expected a statement, "
                                           "found '}'"}));
  EXPECT_EQ(messagesOf("else x q;"),
            Lines{"1:1: error: expected a statement, found 'else'"});
}

TEST(StatementTest, ConditionsOfAnySize) {
  // 2^300, as generated files have it.
  std::string digits = "2037035976334486086268445688409378161051468393665936"
                       "250636140449354381299763336706183397376";
  Reading reading("OPENQASM 2.0; if (c == " + digits + ") x q[0];");
  ASSERT_EQ(reading.messages(), Lines());
  const auto &branch = llvm::cast<If>(reading.statements()[0])->branches[0];
  const auto &chain = *llvm::cast<Chain>(branch.condition);
  EXPECT_EQ(llvm::cast<IntegerLiteral>(chain.rest[0].operand)->value(),
            llvm::APInt::getOneBitSet(301, 300));
}

TEST(StatementTest, Loops) {
  EXPECT_EQ(treeOf("for int i in [0:3] x q[i];\n"
                   "for uint[8] j in [0:2:n] { y q; }\n"
                   "for int k in {1, 2 * n,} {}\nfor bit b in c x q;"),
            "for int i in [0:3] {\n  call x q[i]\n}\n"
            "for uint[8] j in [0:2:n] {\n  call y q\n}\n"
            "for int k in [{1, (* 2 n)}] {}\nfor bit b in c {\n  call x q\n}");
  EXPECT_EQ(messagesOf("for i in [0:3] x q;"),
            Lines{"1:5: error: expected a classical type, found 'i'"});
  EXPECT_EQ(messagesOf("for int i = 1 { x q; }"),
            Lines{"1:11: error: expected 'in', found '='"});
  EXPECT_EQ(messagesOf("for int i in [3] { x q; }"),
            Lines{"1:15: error: expected a range such as 0:3"});
}

TEST(StatementTest, AnnotationsStayWithTheNextStatement) {
  EXPECT_EQ(treeOf("@lull.keep  a b \n@other\nx q;\ny q;\n"
                   "box {\n@in.box\nx q; }"),
            "@lull.keep 'a b'\n@other\ncall x q\ncall y q\n"
            "box {\n  @in.box\n  call x q\n}");
  Reading reading("\n @a\n x q;");
  const Stmt &call = *reading.statements()[0];
  ASSERT_EQ(call.annotations.size(), 1u);
  EXPECT_EQ(reading.listener.place(call.annotations[0].name.loc), "2:2");
  EXPECT_EQ(messagesOf("x q;\n@a\n@b"),
            Lines{"3:1: error: annotation without a statement"});
  EXPECT_EQ(messagesOf("box {\n@a\n}"),
            Lines{"2:1: error: annotation without a statement"});
}

TEST(StatementTest, PragmasAreKeptAsTheyAre) {
  EXPECT_EQ(treeOf("pragma  lull.x {;} // y \n#pragma z\npragma\nx q;"),
            "pragma 'lull.x {;} // y'\npragma 'z'\npragma ''\ncall x q");
}

TEST(StatementTest, EveryStatementHasItsPlace) {
  Reading reading("  x q;\n inv @ x q;\n c = 1;\n c = measure q;\n{ y q; }");
  const char *const places[] = {"1:3", "2:2", "3:2", "4:2", "5:1"};
  ASSERT_EQ(reading.statements().size(), 5u);
  for (size_t i = 0; i < 5; ++i)
    EXPECT_EQ(reading.listener.place(reading.statements()[i]->loc), places[i]);
}

TEST(StatementTest, OtherStarts) {
  for (llvm::StringRef start : {"1", ")", "]", "-", "$0", "\"a\"", "in"})
    EXPECT_EQ(
        messagesOf((start + " q;\nx q;").str()),
        Lines{"1:1: error: expected a statement, found '" + start.str() + "'"});
}

} // namespace
