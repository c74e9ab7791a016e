//===- Reporter.cpp - Where the messages about a program go ---------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Target/OpenQASM/Reporter.h"

using namespace lull::qasm;

void Reporter::error(llvm::SMLoc loc, std::string text,
                     std::vector<Note> notes) {
  if (full)
    return;
  if (count == MostErrors) {
    full = true;
    sink({true, loc, "too many errors", {}});
    return;
  }
  ++count;
  sink({true, loc, std::move(text), std::move(notes)});
}

void Reporter::warning(llvm::SMLoc loc, std::string text,
                       std::vector<Note> notes) {
  if (!full)
    sink({false, loc, std::move(text), std::move(notes)});
}
