//===- Expressions.h - Types and expressions of OpenQASM --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// See Syntax.h, of which this is the first half.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_EXPRESSIONS_H
#define LULL_TARGET_OPENQASM_EXPRESSIONS_H

#include "lull/Timing/Time.h"

#include "llvm/ADT/APInt.h"
#include "llvm/ADT/ArrayRef.h"
#include "llvm/ADT/StringRef.h"
#include "llvm/Support/Casting.h"
#include "llvm/Support/SMLoc.h"

#include <cstdint>
#include <optional>

namespace lull::qasm {

using llvm::ArrayRef;
using llvm::SMLoc;
using llvm::StringRef;

/// How deep expressions, blocks and unbraced bodies may be nested, all counted
/// together.
constexpr unsigned MostLevels = 256;

struct Name {
  SMLoc loc;
  StringRef text;
};

struct Expr;
struct Stmt;
struct Reference;
/// The statements between braces, or the one that stands without.
using Body = ArrayRef<const Stmt *>;

/// What every expression and every statement is made of.
template <typename Base, typename Base::Kind K> struct Node : Base {
  Node(SMLoc loc) : Base{K, loc} {}
  static bool classof(const Base *node) { return node->kind == K; }
};

//===----------------------------------------------------------------------===//
// Types
//===----------------------------------------------------------------------===//

/// `qubit`, `int[32]`, `float`.
struct TypeName {
  enum class Kind : std::uint8_t {
    Qubit,
    Bit,
    Bool,
    Int,
    UInt,
    Float,
    Angle,
    Duration,
    Stretch,
  };
  SMLoc loc;
  Kind kind = Kind::Bit;
  const Expr *width = nullptr;
};
StringRef spell(TypeName::Kind kind);

//===----------------------------------------------------------------------===//
// Expressions
//===----------------------------------------------------------------------===//

/// `loc` is where it starts; of a Chain, where its first operand starts.
struct Expr {
  enum class Kind : std::uint8_t {
    Integer,
    Float,
    Boolean,
    Bits,
    Duration,
    Reference,
    Unary,
    Chain,
    Call,
    Cast,
    DurationOf,
    Measurement,
  };
  Kind kind;
  SMLoc loc;
};

/// `12`, `1_000`, `0xFF`: never negative, of any size.
struct IntegerLiteral : Node<Expr, Expr::Kind::Integer> {
  StringRef text;
  /// The value, exactly as wide as it needs to be, read as unsigned.
  llvm::APInt value() const;
  /// The same if it fits 63 bits.
  std::optional<std::int64_t> small() const;
};

/// `1.5`, `.5`, `1e3`.
struct FloatLiteral : Node<Expr, Expr::Kind::Float> {
  StringRef text;
  double value;
};

/// The nearest double to the text of a Float token; fails if it is too large.
llvm::Expected<double> parseFloat(StringRef text);

/// `true`, `false`.
struct BooleanLiteral : Node<Expr, Expr::Kind::Boolean> {
  bool value;
};

/// `"0101"`: the digits, maybe with underscores between them.
struct BitsLiteral : Node<Expr, Expr::Kind::Bits> {
  StringRef digits;
};

/// `1.5e-3 us`.
struct DurationLiteral : Node<Expr, Expr::Kind::Duration> {
  StringRef number;
  TimeUnit unit;
  /// Exact; fails as Duration::parse does (a fraction of a dt, too many
  /// digits), and on exponents beyond 64.
  llvm::Expected<Duration> value() const;
};

/// One item of an index: an element `first`, or a range `first:last` or
/// `first:step:last`, of which any part may be missing.
struct Selector {
  bool isRange = false;
  const Expr *first = nullptr;
  const Expr *step = nullptr;
  const Expr *last = nullptr;
};

/// `[3]`, `[0:2]`, `[1, 2]`; with braces, a set: `[{0, 2}]`.
struct Index {
  SMLoc loc;
  bool isSet = false;
  ArrayRef<Selector> items;
};

/// `q`, `c[0]`, `q[0:2]`, `pi`, `$3`: qubits, bits, or any other value that has
/// a name.
struct Reference : Node<Expr, Expr::Kind::Reference> {
  StringRef name;
  ArrayRef<Index> indices;
  bool isPhysical() const { return name.starts_with("$"); }
};

/// `-a`, `!a`, `~a`.
struct Unary : Node<Expr, Expr::Kind::Unary> {
  enum class Op : std::uint8_t { Negate, Not, BitNot };
  Op op;
  const Expr *operand;
};
StringRef spell(Unary::Op op);

enum class BinaryOp : std::uint8_t {
  Or,
  And,
  BitOr,
  BitXor,
  BitAnd,
  Equal,
  NotEqual,
  Less,
  LessEqual,
  Greater,
  GreaterEqual,
  ShiftLeft,
  ShiftRight,
  Add,
  Subtract,
  Multiply,
  Divide,
  Modulo,
  Power,
};
/// As in version 3: `**` is the power.
StringRef spell(BinaryOp op);

/// `a - b + c`: operators of one precedence, to be applied from left to right,
/// as flat as it was written so that a sum of any length is one node. A power
/// has one link only, as it groups from the right.
struct Chain : Node<Expr, Expr::Kind::Chain> {
  struct Link {
    BinaryOp op;
    SMLoc loc;
    const Expr *operand;
  };
  const Expr *first;
  ArrayRef<Link> rest;
};

/// The functions that the language knows. `Ln` is that of version 2.
enum class Function : std::uint8_t {
  Arccos,
  Arcsin,
  Arctan,
  Ceiling,
  Cos,
  Exp,
  Floor,
  Ln,
  Log,
  Mod,
  Popcount,
  Pow,
  Rotl,
  Rotr,
  Sin,
  Sizeof,
  Sqrt,
  Tan,
};
StringRef spell(Function function);

/// `sin(x)`, `mod(a, b)`; how many arguments it takes is not checked.
struct Call : Node<Expr, Expr::Kind::Call> {
  Function function;
  ArrayRef<const Expr *> arguments;
};

/// `int[32](c)`.
struct Cast : Node<Expr, Expr::Kind::Cast> {
  TypeName type;
  const Expr *operand;
};

/// `durationof({ x $0; })`.
struct DurationOf : Node<Expr, Expr::Kind::DurationOf> {
  Body body;
};

/// `measure q`, as the first value of a declaration only.
struct Measurement : Node<Expr, Expr::Kind::Measurement> {
  const Reference *qubits;
};

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_EXPRESSIONS_H
