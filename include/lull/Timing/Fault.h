//===- Fault.h - Errors of the plain rooms ----------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// The plain rooms (Timing, Sequence, Physics) report bad input as llvm::Error
// with one sentence in LLVM's style: lower case, no period, with the numbers.
// Whoever knows the source location (IR, Target) turns it into a diagnostic.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_FAULT_H
#define LULL_TIMING_FAULT_H

#include "llvm/Support/Error.h"

#include <fmt/format.h>

#include <cstdint>
#include <string>
#include <utility>

namespace lull {

/// Makes an error from a format string. The text is one clause without a final
/// period, so that it can stand behind `error: `.
template <typename... Args>
llvm::Error fault(fmt::format_string<Args...> format, Args &&...args) {
  return llvm::createStringError(
      llvm::inconvertibleErrorCode(),
      fmt::format(format, std::forward<Args>(args)...));
}

/// `1 site`, `2 sites`.
inline std::string counted(std::uint64_t count, llvm::StringRef noun) {
  return fmt::format("{} {}{}", count, noun.str(), count == 1 ? "" : "s");
}

} // namespace lull

#endif // LULL_TIMING_FAULT_H
