//===- Keywords.cpp - The keywords of each version ------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Keywords.h"

#include "llvm/ADT/STLExtras.h"

using namespace lull::qasm;

/// In the order of their text. `gphase` is a name like that of any gate.
static constexpr KeywordEntry Entries[] = {
    {"#dim", Keyword::Dim, Version::V3_0},
    {"OPENQASM", Keyword::OpenQasm, Version::V2_0},
    {"angle", Keyword::Angle, Version::V3_0},
    {"array", Keyword::Array, Version::V3_0},
    {"barrier", Keyword::Barrier, Version::V2_0},
    {"bit", Keyword::Bit, Version::V3_0},
    {"bool", Keyword::Bool, Version::V3_0},
    {"box", Keyword::Box, Version::V3_0},
    {"break", Keyword::Break, Version::V3_0},
    {"cal", Keyword::Cal, Version::V3_0},
    {"case", Keyword::Case, Version::V3_1},
    {"complex", Keyword::Complex, Version::V3_0},
    {"const", Keyword::Const, Version::V3_0},
    {"continue", Keyword::Continue, Version::V3_0},
    {"creg", Keyword::Creg, Version::V2_0},
    {"ctrl", Keyword::Ctrl, Version::V3_0},
    {"def", Keyword::Def, Version::V3_0},
    {"default", Keyword::Default, Version::V3_1},
    {"defcal", Keyword::Defcal, Version::V3_0},
    {"defcalgrammar", Keyword::Defcalgrammar, Version::V3_0},
    {"delay", Keyword::Delay, Version::V3_0},
    {"duration", Keyword::Duration, Version::V3_0},
    {"durationof", Keyword::DurationOf, Version::V3_0},
    {"else", Keyword::Else, Version::V3_0},
    {"end", Keyword::End, Version::V3_0},
    {"extern", Keyword::Extern, Version::V3_0},
    {"false", Keyword::False, Version::V3_0},
    {"float", Keyword::Float, Version::V3_0},
    {"for", Keyword::For, Version::V3_0},
    {"gate", Keyword::Gate, Version::V2_0},
    {"if", Keyword::If, Version::V2_0},
    {"in", Keyword::In, Version::V3_0},
    {"include", Keyword::Include, Version::V2_0},
    {"input", Keyword::Input, Version::V3_0},
    {"int", Keyword::Int, Version::V3_0},
    {"inv", Keyword::Inv, Version::V3_0},
    {"let", Keyword::Let, Version::V3_0},
    {"measure", Keyword::Measure, Version::V2_0},
    {"mutable", Keyword::Mutable, Version::V3_0},
    {"negctrl", Keyword::NegCtrl, Version::V3_0},
    {"nop", Keyword::Nop, Version::V3_2},
    {"opaque", Keyword::Opaque, Version::V2_0},
    {"output", Keyword::Output, Version::V3_0},
    {"pow", Keyword::Pow, Version::V3_0},
    {"qreg", Keyword::Qreg, Version::V2_0},
    {"qubit", Keyword::Qubit, Version::V3_0},
    {"readonly", Keyword::Readonly, Version::V3_0},
    {"reset", Keyword::Reset, Version::V2_0},
    {"return", Keyword::Return, Version::V3_0},
    {"stretch", Keyword::Stretch, Version::V3_0},
    {"switch", Keyword::Switch, Version::V3_1},
    {"true", Keyword::True, Version::V3_0},
    {"uint", Keyword::UInt, Version::V3_0},
    {"void", Keyword::Void, Version::V3_0},
    {"while", Keyword::While, Version::V3_0},
};

const KeywordEntry *lull::qasm::findKeyword(StringRef text) {
  const auto *entry =
      llvm::lower_bound(Entries, text, [](const KeywordEntry &e, StringRef t) {
        return e.text < t;
      });
  if (entry == std::end(Entries) || entry->text != text)
    return nullptr;
  return entry;
}
