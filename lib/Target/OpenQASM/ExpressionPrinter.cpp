//===- ExpressionPrinter.cpp - Expressions as text, for tests -------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "PrinterImpl.h"

#include "lull/Target/OpenQASM/Printer.h"

#include "llvm/ADT/StringExtras.h"
#include "llvm/Support/ErrorHandling.h"

#include <utility>

using namespace lull::qasm;

void Printer::print(const Expr &expr) {
  switch (expr.kind) {
  case Expr::Kind::Integer:
    os << llvm::cast<IntegerLiteral>(expr).text;
    return;
  case Expr::Kind::Float:
    os << llvm::cast<FloatLiteral>(expr).text;
    return;
  case Expr::Kind::Boolean:
    os << (llvm::cast<BooleanLiteral>(expr).value ? "true" : "false");
    return;
  case Expr::Kind::Bits:
    os << '"' << llvm::cast<BitsLiteral>(expr).digits << '"';
    return;
  case Expr::Kind::Duration: {
    const auto &literal = llvm::cast<DurationLiteral>(expr);
    os << literal.number << lull::spell(literal.unit);
    return;
  }
  case Expr::Kind::Reference: {
    const auto &reference = llvm::cast<Reference>(expr);
    os << reference.name;
    for (const Index &index : reference.indices)
      print(index);
    return;
  }
  case Expr::Kind::Unary: {
    const auto &unary = llvm::cast<Unary>(expr);
    os << '(' << spell(unary.op) << ' ';
    print(*unary.operand);
    os << ')';
    return;
  }
  case Expr::Kind::Chain: {
    const auto &chain = llvm::cast<Chain>(expr);
    print(chain, chain.rest.size());
    return;
  }
  case Expr::Kind::Call: {
    const auto &call = llvm::cast<Call>(expr);
    os << '(' << spell(call.function);
    for (const Expr *argument : call.arguments) {
      os << ' ';
      print(*argument);
    }
    os << ')';
    return;
  }
  case Expr::Kind::Cast: {
    const auto &cast = llvm::cast<Cast>(expr);
    os << "(cast ";
    print(cast.type);
    os << ' ';
    print(*cast.operand);
    os << ')';
    return;
  }
  case Expr::Kind::DurationOf: {
    bool outside = std::exchange(inExpression, true);
    os << "(durationof";
    printBraces(llvm::cast<DurationOf>(expr).body);
    os << ')';
    inExpression = outside;
    return;
  }
  case Expr::Kind::Measurement:
    os << "(measure ";
    print(*llvm::cast<Measurement>(expr).qubits);
    os << ')';
    return;
  }
  llvm_unreachable("all expressions are handled");
}

/// The first so many links: `((a - b) + c)` as `(+ (- a b) c)`. Not by
/// recursion, as a chain may be of any length.
void Printer::print(const Chain &chain, size_t links) {
  for (size_t i = links; i > 0; --i)
    os << '(' << spell(chain.rest[i - 1].op) << ' ';
  print(*chain.first);
  for (size_t i = 0; i < links; ++i) {
    os << ' ';
    print(*chain.rest[i].operand);
    os << ')';
  }
}

void Printer::print(const Index &index) {
  os << (index.isSet ? "[{" : "[");
  llvm::interleaveComma(index.items, os,
                        [&](const Selector &item) { print(item); });
  os << (index.isSet ? "}]" : "]");
}

void Printer::print(const Selector &selector) {
  if (selector.first)
    print(*selector.first);
  if (!selector.isRange)
    return;
  os << ':';
  if (selector.step) {
    print(*selector.step);
    os << ':';
  }
  if (selector.last)
    print(*selector.last);
}

void Printer::print(const TypeName &type) {
  os << spell(type.kind);
  if (!type.width)
    return;
  os << '[';
  print(*type.width);
  os << ']';
}

std::string lull::qasm::print(const Expr &expression) {
  std::string text;
  llvm::raw_string_ostream os(text);
  Printer(os).print(expression);
  return text;
}
