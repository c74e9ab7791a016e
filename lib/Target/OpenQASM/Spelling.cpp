//===- Spelling.cpp - How the enumerations of the tree are written --------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Syntax.h"

#include "llvm/Support/ErrorHandling.h"

using namespace lull::qasm;

StringRef lull::qasm::spell(Version version) {
  switch (version) {
  case Version::V2_0:
    return "2.0";
  case Version::V3_0:
    return "3.0";
  case Version::V3_1:
    return "3.1";
  case Version::V3_2:
    return "3.2";
  }
  llvm_unreachable("all versions are handled");
}

StringRef lull::qasm::spell(TypeName::Kind kind) {
  switch (kind) {
  case TypeName::Kind::Qubit:
    return "qubit";
  case TypeName::Kind::Bit:
    return "bit";
  case TypeName::Kind::Bool:
    return "bool";
  case TypeName::Kind::Int:
    return "int";
  case TypeName::Kind::UInt:
    return "uint";
  case TypeName::Kind::Float:
    return "float";
  case TypeName::Kind::Angle:
    return "angle";
  case TypeName::Kind::Duration:
    return "duration";
  case TypeName::Kind::Stretch:
    return "stretch";
  }
  llvm_unreachable("all types are handled");
}

StringRef lull::qasm::spell(Unary::Op op) {
  switch (op) {
  case Unary::Op::Negate:
    return "-";
  case Unary::Op::Not:
    return "!";
  case Unary::Op::BitNot:
    return "~";
  }
  llvm_unreachable("all operators are handled");
}

StringRef lull::qasm::spell(BinaryOp op) {
  switch (op) {
  case BinaryOp::Or:
    return "||";
  case BinaryOp::And:
    return "&&";
  case BinaryOp::BitOr:
    return "|";
  case BinaryOp::BitXor:
    return "^";
  case BinaryOp::BitAnd:
    return "&";
  case BinaryOp::Equal:
    return "==";
  case BinaryOp::NotEqual:
    return "!=";
  case BinaryOp::Less:
    return "<";
  case BinaryOp::LessEqual:
    return "<=";
  case BinaryOp::Greater:
    return ">";
  case BinaryOp::GreaterEqual:
    return ">=";
  case BinaryOp::ShiftLeft:
    return "<<";
  case BinaryOp::ShiftRight:
    return ">>";
  case BinaryOp::Add:
    return "+";
  case BinaryOp::Subtract:
    return "-";
  case BinaryOp::Multiply:
    return "*";
  case BinaryOp::Divide:
    return "/";
  case BinaryOp::Modulo:
    return "%";
  case BinaryOp::Power:
    return "**";
  }
  llvm_unreachable("all operators are handled");
}

StringRef lull::qasm::spell(Function function) {
  switch (function) {
  case Function::Arccos:
    return "arccos";
  case Function::Arcsin:
    return "arcsin";
  case Function::Arctan:
    return "arctan";
  case Function::Ceiling:
    return "ceiling";
  case Function::Cos:
    return "cos";
  case Function::Exp:
    return "exp";
  case Function::Floor:
    return "floor";
  case Function::Ln:
    return "ln";
  case Function::Log:
    return "log";
  case Function::Mod:
    return "mod";
  case Function::Popcount:
    return "popcount";
  case Function::Pow:
    return "pow";
  case Function::Rotl:
    return "rotl";
  case Function::Rotr:
    return "rotr";
  case Function::Sin:
    return "sin";
  case Function::Sizeof:
    return "sizeof";
  case Function::Sqrt:
    return "sqrt";
  case Function::Tan:
    return "tan";
  }
  llvm_unreachable("all functions are handled");
}

StringRef lull::qasm::spell(Modifier::Kind kind) {
  switch (kind) {
  case Modifier::Kind::Ctrl:
    return "ctrl";
  case Modifier::Kind::NegCtrl:
    return "negctrl";
  case Modifier::Kind::Inv:
    return "inv";
  case Modifier::Kind::Pow:
    return "pow";
  }
  llvm_unreachable("all modifiers are handled");
}
