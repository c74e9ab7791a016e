//===- Letters.h - The letters that names are made of -----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_LIB_TARGET_OPENQASM_LETTERS_H
#define LULL_LIB_TARGET_OPENQASM_LETTERS_H

#include <cstdint>

namespace lull::qasm {

/// Whether a code point beyond ASCII is a letter: of the general category Lu,
/// Ll, Lt, Lm, Lo or Nl, as the language says.
bool isLetter(std::uint32_t codePoint);

} // namespace lull::qasm

#endif // LULL_LIB_TARGET_OPENQASM_LETTERS_H
