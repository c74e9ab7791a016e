//===- Syntax.h - What an OpenQASM program says -----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The tree of a program as it was written: names are not resolved, nothing is
// evaluated. It lives in an arena, is never changed after parsing, and points
// into the source buffer; a null pointer stands for a part that was left out.
// Its nodes are told apart with llvm::isa, cast and dyn_cast. No text nested
// deeper than MostLevels becomes a tree, and each level adds a dozen nodes to
// its height at most (one for each precedence): it may be walked by recursion.
//
// Versions 2.0 and 3 share the tree: `qreg q[2]` and `qubit[2] q` are the same
// declaration, `a ^ b` is a power in the one and an exclusive or in the other.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_SYNTAX_H
#define LULL_TARGET_OPENQASM_SYNTAX_H

#include "lull/Target/OpenQASM/Expressions.h"

namespace lull::qasm {

//===----------------------------------------------------------------------===//
// Statements
//===----------------------------------------------------------------------===//

/// `@name text`, without blanks around the text.
struct Annotation {
  Name name;
  StringRef text;
};

struct Stmt {
  enum class Kind : std::uint8_t {
    Include,
    Pragma,
    Declaration,
    Alias,
    Assignment,
    GateDefinition,
    OpaqueGate,
    GateCall,
    Barrier,
    Reset,
    Measure,
    Delay,
    Nop,
    Box,
    Scope,
    If,
    For,
  };
  Kind kind;
  SMLoc loc;
  /// Those of the lines before it.
  ArrayRef<Annotation> annotations = {};
};

/// `include "stdgates.inc";`, at global scope.
struct Include : Node<Stmt, Stmt::Kind::Include> {
  Name file;
};

/// `pragma text`, without blanks around the text.
struct Pragma : Node<Stmt, Stmt::Kind::Pragma> {
  StringRef text;
};

/// `qreg q[2];`, `qubit[2] q;`, `const int n = 3;`, `input angle a;`,
/// `bit b = measure q;`. Qubits, inputs and outputs stand at global scope only,
/// and they and stretches have no first value; constants always have one.
struct Declaration : Node<Stmt, Stmt::Kind::Declaration> {
  enum class Role : std::uint8_t { Variable, Constant, Input, Output };
  Role role;
  TypeName type;
  Name name;
  const Expr *value;
};

/// `let a = q[0:1] ++ r;`.
struct Alias : Node<Stmt, Stmt::Kind::Alias> {
  Name name;
  ArrayRef<const Reference *> parts;
};

/// `c[0] = 1;`, `n += 2;` (then `op` is Add).
struct Assignment : Node<Stmt, Stmt::Kind::Assignment> {
  const Reference *target;
  std::optional<BinaryOp> op;
  const Expr *value;
};

/// `gate g(a, b) q, r { ... }`, at global scope. What may stand in its body is
/// not checked.
struct GateDefinition : Node<Stmt, Stmt::Kind::GateDefinition> {
  Name name;
  ArrayRef<Name> parameters;
  ArrayRef<Name> qubits;
  Body body;
};

/// `opaque g(a) q;`, at global scope.
struct OpaqueGate : Node<Stmt, Stmt::Kind::OpaqueGate> {
  Name name;
  ArrayRef<Name> parameters;
  ArrayRef<Name> qubits;
};

/// `ctrl(2) @`, `inv @`. Powers have an argument, inverses have none.
struct Modifier {
  enum class Kind : std::uint8_t { Ctrl, NegCtrl, Inv, Pow };
  SMLoc loc;
  Kind kind;
  const Expr *argument;
};
StringRef spell(Modifier::Kind kind);

/// `inv @ g(a, b)[250ns] q[0], r;`; U, CX and gphase among them, the last with
/// or without operands.
struct GateCall : Node<Stmt, Stmt::Kind::GateCall> {
  ArrayRef<Modifier> modifiers;
  Name gate;
  ArrayRef<const Expr *> arguments;
  const Expr *duration;
  ArrayRef<const Reference *> operands;
};

/// `barrier q, r[0];`; without operands, of all qubits.
struct Barrier : Node<Stmt, Stmt::Kind::Barrier> {
  ArrayRef<const Reference *> operands;
};

/// `reset q;`.
struct Reset : Node<Stmt, Stmt::Kind::Reset> {
  const Reference *qubits;
};

/// `measure q -> c;`, `c = measure q;`; without a target, `measure q;`.
struct Measure : Node<Stmt, Stmt::Kind::Measure> {
  const Reference *qubits;
  const Reference *target;
};

/// `delay[100ns] q, r;`; without operands, on all qubits.
struct Delay : Node<Stmt, Stmt::Kind::Delay> {
  const Expr *duration;
  ArrayRef<const Reference *> operands;
};

/// `nop q;`.
struct Nop : Node<Stmt, Stmt::Kind::Nop> {
  ArrayRef<const Reference *> operands;
};

/// `box { ... }`, `box[1us] { ... }`.
struct Box : Node<Stmt, Stmt::Kind::Box> {
  const Expr *duration;
  Body body;
};

/// `{ ... }` alone.
struct Scope : Node<Stmt, Stmt::Kind::Scope> {
  Body body;
};

/// `if (a) ... else if (b) ... else ...`: the branches in order, and what
/// stands behind the last `else`.
struct If : Node<Stmt, Stmt::Kind::If> {
  struct Branch {
    const Expr *condition;
    Body body;
  };
  ArrayRef<Branch> branches;
  Body otherwise;
};

/// `for int i in [0:3] { ... }`, `for int i in {1, 2} ...`: over a range or a
/// set; or over the `values` that an expression has, `for bit b in c ...`.
struct For : Node<Stmt, Stmt::Kind::For> {
  TypeName type;
  Name variable;
  std::optional<Index> indices;
  const Expr *values;
  Body body;
};

//===----------------------------------------------------------------------===//
// Programs
//===----------------------------------------------------------------------===//

/// The versions of the language, oldest first. A file that says `3` may use
/// all of 3.2.
enum class Version : std::uint8_t { V2_0, V3_0, V3_1, V3_2 };
/// `2.0`.
StringRef spell(Version version);

struct Program {
  Version version = Version::V3_2;
  /// Of the version line; not valid if there is none.
  SMLoc versionLoc;
  Body statements;
};

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_SYNTAX_H
