//===- PrinterImpl.h - The walk that prints a tree --------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_TARGET_OPENQASM_PRINTERIMPL_H
#define LULL_LIB_TARGET_OPENQASM_PRINTERIMPL_H

#include "lull/Target/OpenQASM/Syntax.h"

#include "llvm/Support/raw_ostream.h"

namespace lull::qasm {

/// Statements are in Printer.cpp, expressions in ExpressionPrinter.cpp.
class Printer {
public:
  explicit Printer(llvm::raw_ostream &os) : os(os) {}

  void print(const Expr &expr);
  void print(const Body &body);

private:
  void print(const TypeName &type);
  void print(const Chain &chain, size_t links);
  void print(const Index &index);
  void print(const Selector &selector);
  void print(const Stmt &stmt);
  void print(const GateCall &call);
  void print(const If &conditional);
  void print(const For &loop);
  void printHead(const Declaration &declaration);
  void printGate(const Name &name, ArrayRef<Name> parameters,
                 ArrayRef<Name> qubits);
  void print(ArrayRef<const Reference *> operands);
  void printBraces(const Body &body);
  llvm::raw_ostream &line();

  llvm::raw_ostream &os;
  unsigned depth = 0;
  /// Within an expression statements stand on one line.
  bool inExpression = false;
};

} // namespace lull::qasm

#endif // LULL_LIB_TARGET_OPENQASM_PRINTERIMPL_H
