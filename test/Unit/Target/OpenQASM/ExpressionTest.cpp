//===- ExpressionTest.cpp - Expressions, by precedence --------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

using namespace lull::qasm;

namespace {

/// The tree of an expression of version 3.
std::string expr(llvm::StringRef text) {
  std::string held = treeOf(("const float v = " + text + ";").str());
  llvm::StringRef rest = held;
  EXPECT_TRUE(rest.consume_front("declare const float v = ")) << text.str();
  return rest.str();
}

/// The tree of an expression of version 2.
std::string oldExpr(llvm::StringRef text) {
  std::string held = oldTreeOf(("g(" + text + ") q;").str());
  llvm::StringRef rest = held;
  EXPECT_TRUE(rest.consume_front("call g(")) << text.str();
  EXPECT_TRUE(rest.consume_back(") q")) << text.str();
  return rest.str();
}

std::string words(const char *format, const std::string &op,
                  const std::string &other) {
  std::string result;
  for (const char *c = format; *c; ++c) {
    if (*c == '1')
      result += op;
    else if (*c == '2')
      result += other;
    else
      result += *c;
  }
  return result;
}

TEST(ExpressionTest, PrecedenceOfTheStandard) {
  // The table of operator precedence in the text of OpenQASM 3, from memory;
  // from the loosest to the tightest, without the power and the signs.
  const std::vector<std::vector<std::string>> table = {{"||"},
                                                       {"&&"},
                                                       {"|"},
                                                       {"^"},
                                                       {"&"},
                                                       {"==", "!="},
                                                       {"<", "<=", ">", ">="},
                                                       {"<<", ">>"},
                                                       {"+", "-"},
                                                       {"*", "/", "%"}};
  for (size_t i = 0; i < table.size(); ++i)
    for (const std::string &first : table[i])
      for (size_t j = 0; j < table.size(); ++j)
        for (const std::string &second : table[j])
          EXPECT_EQ(
              expr(words("a 1 b 2 c", first, second)),
              words(i < j ? "(1 a (2 b c))" : "(2 (1 a b) c)", first, second));
}

TEST(ExpressionTest, PowerIsTightestAndGroupsFromTheRight) {
  for (const char *op : {"||", "==", "+", "*"}) {
    EXPECT_EQ(expr(words("a 1 b ** c", op, "")),
              words("(1 a (** b c))", op, ""));
    EXPECT_EQ(expr(words("a ** b 1 c", op, "")),
              words("(1 (** a b) c)", op, ""));
  }
  EXPECT_EQ(expr("a ** b ** c"), "(** a (** b c))");
  EXPECT_EQ(expr("-a ** b"), "(- (** a b))");
  EXPECT_EQ(expr("a ** -b"), "(** a (- b))");
  EXPECT_EQ(expr("a ** -b ** c"), "(** a (- (** b c)))");
  EXPECT_EQ(expr("a[0] ** sin(b)"), "(** a[0] (sin b))");
}

TEST(ExpressionTest, SignsBindTighterThanOtherOperators) {
  EXPECT_EQ(expr("-a * b"), "(* (- a) b)");
  EXPECT_EQ(expr("a - -b"), "(- a (- b))");
  EXPECT_EQ(expr("!a && ~b"), "(&& (! a) (~ b))");
  EXPECT_EQ(expr("!~-a"), "(! (~ (- a)))");
  EXPECT_EQ(expr("a*-b/c"), "(/ (* a (- b)) c)");
}

TEST(ExpressionTest, ParenthesesGroup) {
  EXPECT_EQ(expr("(a + b) * c"), "(* (+ a b) c)");
  EXPECT_EQ(expr("a - (b - c)"), "(- a (- b c))");
  EXPECT_EQ(expr("((a))"), "a");
  EXPECT_EQ(expr("(-2) ** 2"), "(** (- 2) 2)");
}

TEST(ExpressionTest, ChainsAreFlat) {
  Reading reading("const int n = a + b - c + d * e;");
  const auto &declaration = *llvm::cast<Declaration>(reading.statements()[0]);
  const auto &chain = *llvm::cast<Chain>(declaration.value);
  ASSERT_EQ(chain.rest.size(), 3u);
  EXPECT_EQ(chain.rest[1].op, BinaryOp::Subtract);
  EXPECT_EQ(reading.listener.place(chain.rest[1].loc), "1:21");
  EXPECT_EQ(reading.listener.place(chain.loc), "1:15");
  EXPECT_EQ(print(chain), "(+ (- (+ a b) c) (* d e))");
}

TEST(ExpressionTest, OperandsOfAllKinds) {
  EXPECT_EQ(expr("0x1F + 1_000"), "(+ 0x1F 1_000)");
  EXPECT_EQ(expr("true && false"), "(&& true false)");
  EXPECT_EQ(expr("\"0101\""), "\"0101\"");
  EXPECT_EQ(expr("2 * \u03c0 / \u03c4"), "(/ (* 2 \u03c0) \u03c4)");
  EXPECT_EQ(expr("100ns / 4dt"), "(/ 100ns 4dt)");
  EXPECT_EQ(expr("int[32](c) == 3"), "(== (cast int[32] c) 3)");
  EXPECT_EQ(expr("bool(c[0])"), "(cast bool c[0])");
  EXPECT_EQ(expr("float[64](uint(a))"), "(cast float[64] (cast uint a))");
  EXPECT_EQ(expr("mod(a, b,)"), "(mod a b)");
  EXPECT_EQ(expr("pow(2, pow(3, 4))"), "(pow 2 (pow 3 4))");
  EXPECT_EQ(expr("durationof({x $0; cx $0, $1;}) - 2 * a"),
            "(- (durationof { call x $0; call cx $0 $1; }) (* 2 a))");
  EXPECT_EQ(expr("durationof({})"), "(durationof {})");
}

TEST(ExpressionTest, FunctionsOfTheLanguage) {
  for (const char *name : {"arccos", "arcsin", "arctan", "ceiling", "cos",
                           "exp", "floor", "log", "mod", "popcount", "pow",
                           "rotl", "rotr", "sin", "sizeof", "sqrt", "tan"})
    EXPECT_EQ(expr(words("1(a)", name, "")), words("(1 a)", name, ""));
  for (const char *name : {"sin", "cos", "tan", "exp", "ln", "sqrt"})
    EXPECT_EQ(oldExpr(words("1(a)", name, "")), words("(1 a)", name, ""));
}

TEST(ExpressionTest, IndicesOfAllKinds) {
  EXPECT_EQ(expr("a[0]"), "a[0]");
  EXPECT_EQ(expr("a[-1]"), "a[(- 1)]");
  EXPECT_EQ(expr("a[0:2]"), "a[0:2]");
  EXPECT_EQ(expr("a[0:2:6]"), "a[0:2:6]");
  EXPECT_EQ(expr("a[:]"), "a[:]");
  EXPECT_EQ(expr("a[1:]"), "a[1:]");
  EXPECT_EQ(expr("a[:n-1]"), "a[:(- n 1)]");
  EXPECT_EQ(expr("a[:2:]"), "a[:2:]");
  EXPECT_EQ(expr("a[{0, 2,}]"), "a[{0, 2}]");
  EXPECT_EQ(expr("a[0, 1:2,][3]"), "a[0, 1:2][3]");

  // In three parts the middle one is the step.
  Reading reading("const int n = a[0:2:6];");
  const auto &reference = *llvm::cast<Reference>(
      llvm::cast<Declaration>(reading.statements()[0])->value);
  const Selector &range = reference.indices[0].items[0];
  EXPECT_EQ(print(*range.first), "0");
  EXPECT_EQ(print(*range.step), "2");
  EXPECT_EQ(print(*range.last), "6");
}

TEST(ExpressionTest, VersionTwo) {
  EXPECT_EQ(oldExpr("a ^ b ^ c"), "(** a (** b c))");
  EXPECT_EQ(oldExpr("-a ^ 2 * b"), "(* (- (** a 2)) b)");
  EXPECT_EQ(oldExpr("-3*pi/8"), "(/ (* (- 3) pi) 8)");
  EXPECT_EQ(oldExpr("a + b * c - d / e"), "(- (+ a (* b c)) (/ d e))");
  EXPECT_EQ(oldExpr("0.5*(-theta)"), "(* 0.5 (- theta))");
  // In version 3 it is an exclusive or.
  EXPECT_EQ(expr("a ^ b ^ c"), "(^ (^ a b) c)");
  auto refused = [](const std::string &text, const char *column,
                    const char *op) {
    EXPECT_EQ(messagesOf("OPENQASM 2.0;\ng(" + text + ") q;"),
              Lines{std::string("2:") + column + ": error: '" + op +
                    "' needs OpenQASM 3.0, and this is 2.0"});
  };
  for (const char *op : {"**", "%", "<", "<<", "&&", "||", "|", "&", "!="})
    refused(words("a 1 b", op, ""), "5", op);
  for (const char *op : {"!", "~"})
    refused(words("1a", op, ""), "3", op);
}

TEST(ExpressionTest, Errors) {
  struct {
    const char *text, *message;
  } cases[] = {
      {"", "1:17: error: expected an expression, found ';'"},
      {"1 +", "1:20: error: expected an expression, found ';'"},
      {"* 2", "1:17: error: expected an expression, found '*'"},
      {"+2", "1:17: error: expected an expression, found '+'"},
      {"measured qubit", "1:25: error: expected ';', found 'qubit'"},
      {"box", "1:17: error: expected an expression, found 'box'"},
      {"pow", "1:20: error: expected '(' after 'pow', found ';'"},
      {"int[32]", "1:24: error: expected '(' after the type to cast to, found "
                  "';'"},
      {"2 im", "1:17: error: complex numbers are not supported"},
      {"real(a)", "1:17: error: complex numbers are not supported"},
      {"complex(a)", "1:17: error: run-time classical values are not supported "
                     "(only compile-time constants): 'complex'"},
      {"f(2)", "1:17: error: subroutines are not supported: inline 'f' before "
               "import"},
      {"ln(2)", "1:17: error: subroutines are not supported: inline 'ln' "
                "before import"},
      {"\"ab\"", "1:17: error: expected an expression, found '\"ab\"'"},
      {"a[]", "1:19: error: expected an expression, found ']'"},
      {"a[{}]", "1:20: error: expected an expression, found '}'"},
      {"durationof(x)", "1:28: error: expected '{', found 'x'"},
  };
  for (const auto &one : cases)
    EXPECT_EQ(messagesOf("const float v = " + std::string(one.text) + ";"),
              Lines{one.message})
        << one.text;
  EXPECT_EQ(messagesOf("const int n = (1 + 2;"),
            (Lines{"1:21: error: expected ')', found ';'",
                   "1:15: note: to match this '('"}));
  EXPECT_EQ(messagesOf("x(sin(1) q;"),
            (Lines{"1:10: error: expected ')', found 'q'",
                   "1:2: note: to match this '('"}));
}

TEST(ExpressionTest, NestingIsBounded) {
  auto nested = [](unsigned levels, const char *open, const char *close) {
    std::string text = "const int n = ";
    for (unsigned i = 0; i < levels; ++i)
      text += open;
    text += "1";
    for (unsigned i = 0; i < levels; ++i)
      text += close;
    return text + ";";
  };
  struct {
    const char *open, *close;
  } cases[] = {{"(", ")"},  {"-", ""},     {"sin(", ")"},  {"int(", ")"},
               {"a[", "]"}, {"1 ** ", ""}, {"1 + (", ")"}, {"int[", "](1)"}};
  for (const auto &one : cases) {
    EXPECT_EQ(messagesOf(nested(MostLevels, one.open, one.close)), Lines())
        << one.open;
    Lines lines = messagesOf(nested(MostLevels + 1, one.open, one.close));
    ASSERT_EQ(lines.size(), 1u) << one.open;
    llvm::StringRef open = one.open;
    // At the mark that goes one level too deep.
    size_t mark = open.find_first_of("([-*");
    EXPECT_EQ(lines[0],
              "1:" + std::to_string(15 + MostLevels * open.size() + mark) +
                  ": error: nested deeper than 256");
  }
}

} // namespace
