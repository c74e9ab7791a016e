//===- Printer.h - A tree as text, for tests --------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_PRINTER_H
#define LULL_TARGET_OPENQASM_PRINTER_H

#include "lull/Target/OpenQASM/Syntax.h"

#include <string>

namespace lull::qasm {

/// One line for each statement, deeper ones indented, with operators before
/// their operands: `declare const int n = (+ 1 (* 2 3))`. The first line is the
/// version. This is no OpenQASM; it shows how a text was understood.
std::string print(const Program &program);

/// The expression alone: `(+ 1 (* 2 3))`.
std::string print(const Expr &expression);

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_PRINTER_H
