//===- Printer.cpp - A tree as text, for tests ----------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Printer.h"

#include "PrinterImpl.h"

#include "llvm/ADT/StringExtras.h"
#include "llvm/Support/ErrorHandling.h"

using namespace lull::qasm;

//===----------------------------------------------------------------------===//
// Statements
//===----------------------------------------------------------------------===//

/// Starts a line, or goes on with the one of the expression.
llvm::raw_ostream &Printer::line() {
  if (inExpression)
    return os << ' ';
  return os.indent(2 * depth);
}

void Printer::print(const Body &body) {
  for (const Stmt *stmt : body) {
    for (const Annotation &annotation : stmt->annotations) {
      line() << '@' << annotation.name.text;
      if (!annotation.text.empty())
        os << " '" << annotation.text << '\'';
      os << (inExpression ? ";" : "\n");
    }
    line();
    print(*stmt);
    os << (inExpression ? ";" : "\n");
  }
}

void Printer::printBraces(const Body &body) {
  os << " {";
  if (!body.empty()) {
    os << (inExpression ? "" : "\n");
    ++depth;
    print(body);
    --depth;
    line();
  }
  os << '}';
}

void Printer::print(ArrayRef<const Reference *> operands) {
  for (const Reference *operand : operands) {
    os << ' ';
    print(*operand);
  }
}

void Printer::printHead(const Declaration &declaration) {
  os << "declare ";
  switch (declaration.role) {
  case Declaration::Role::Variable:
    break;
  case Declaration::Role::Constant:
    os << "const ";
    break;
  case Declaration::Role::Input:
    os << "input ";
    break;
  case Declaration::Role::Output:
    os << "output ";
    break;
  }
  print(declaration.type);
  os << ' ' << declaration.name.text;
}

void Printer::printGate(const Name &name, ArrayRef<Name> parameters,
                        ArrayRef<Name> qubits) {
  os << name.text;
  if (!parameters.empty()) {
    os << '(';
    llvm::interleaveComma(parameters, os,
                          [&](const Name &one) { os << one.text; });
    os << ')';
  }
  for (const Name &qubit : qubits)
    os << ' ' << qubit.text;
}

void Printer::print(const GateCall &call) {
  os << "call ";
  for (const Modifier &modifier : call.modifiers) {
    os << spell(modifier.kind);
    if (modifier.argument) {
      os << '(';
      print(*modifier.argument);
      os << ')';
    }
    os << " @ ";
  }
  os << call.gate.text;
  if (!call.arguments.empty()) {
    os << '(';
    llvm::interleaveComma(call.arguments, os,
                          [&](const Expr *argument) { print(*argument); });
    os << ')';
  }
  if (call.duration) {
    os << '[';
    print(*call.duration);
    os << ']';
  }
  print(call.operands);
}

void Printer::print(const If &conditional) {
  StringRef word = "if ";
  for (const If::Branch &branch : conditional.branches) {
    os << word;
    print(*branch.condition);
    printBraces(branch.body);
    word = " else if ";
  }
  if (conditional.otherwise.empty())
    return;
  os << " else";
  printBraces(conditional.otherwise);
}

void Printer::print(const For &loop) {
  os << "for ";
  print(loop.type);
  os << ' ' << loop.variable.text << " in ";
  if (loop.indices)
    print(*loop.indices);
  else
    print(*loop.values);
  printBraces(loop.body);
}

void Printer::print(const Stmt &stmt) {
  switch (stmt.kind) {
  case Stmt::Kind::Include:
    os << "include " << llvm::cast<Include>(stmt).file.text;
    return;
  case Stmt::Kind::Pragma:
    os << "pragma '" << llvm::cast<Pragma>(stmt).text << '\'';
    return;
  case Stmt::Kind::Declaration: {
    const auto &declaration = llvm::cast<Declaration>(stmt);
    printHead(declaration);
    if (declaration.value) {
      os << " = ";
      print(*declaration.value);
    }
    return;
  }
  case Stmt::Kind::Alias: {
    const auto &alias = llvm::cast<Alias>(stmt);
    os << "let " << alias.name.text << " =";
    print(alias.parts);
    return;
  }
  case Stmt::Kind::Assignment: {
    const auto &assignment = llvm::cast<Assignment>(stmt);
    os << "assign ";
    print(*assignment.target);
    os << ' ' << (assignment.op ? spell(*assignment.op) : "") << "= ";
    print(*assignment.value);
    return;
  }
  case Stmt::Kind::GateDefinition: {
    const auto &gate = llvm::cast<GateDefinition>(stmt);
    os << "gate ";
    printGate(gate.name, gate.parameters, gate.qubits);
    printBraces(gate.body);
    return;
  }
  case Stmt::Kind::OpaqueGate: {
    const auto &gate = llvm::cast<OpaqueGate>(stmt);
    os << "opaque ";
    printGate(gate.name, gate.parameters, gate.qubits);
    return;
  }
  case Stmt::Kind::GateCall:
    print(llvm::cast<GateCall>(stmt));
    return;
  case Stmt::Kind::Barrier:
    os << "barrier";
    print(llvm::cast<Barrier>(stmt).operands);
    return;
  case Stmt::Kind::Reset:
    os << "reset ";
    print(*llvm::cast<Reset>(stmt).qubits);
    return;
  case Stmt::Kind::Measure: {
    const auto &measure = llvm::cast<Measure>(stmt);
    os << "measure ";
    print(*measure.qubits);
    if (measure.target) {
      os << " -> ";
      print(*measure.target);
    }
    return;
  }
  case Stmt::Kind::Delay: {
    const auto &delay = llvm::cast<Delay>(stmt);
    os << "delay[";
    print(*delay.duration);
    os << ']';
    print(delay.operands);
    return;
  }
  case Stmt::Kind::Nop:
    os << "nop";
    print(llvm::cast<Nop>(stmt).operands);
    return;
  case Stmt::Kind::Box: {
    const auto &box = llvm::cast<Box>(stmt);
    os << "box";
    if (box.duration) {
      os << '[';
      print(*box.duration);
      os << ']';
    }
    printBraces(box.body);
    return;
  }
  case Stmt::Kind::Scope:
    os << "scope";
    printBraces(llvm::cast<Scope>(stmt).body);
    return;
  case Stmt::Kind::If:
    print(llvm::cast<If>(stmt));
    return;
  case Stmt::Kind::For:
    print(llvm::cast<For>(stmt));
    return;
  }
  llvm_unreachable("all statements are handled");
}

//===----------------------------------------------------------------------===//
// The whole
//===----------------------------------------------------------------------===//

std::string lull::qasm::print(const Program &program) {
  std::string text;
  llvm::raw_string_ostream os(text);
  os << "version " << spell(program.version)
     << (program.versionLoc.isValid() ? "" : " assumed") << '\n';
  Printer(os).print(program.statements);
  return text;
}
