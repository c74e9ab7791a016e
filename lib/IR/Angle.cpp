//===- Angle.cpp - Angles of gates, exact where they can be -----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Angle.h"

#include <fmt/format.h>

#include <cmath>

using namespace lull;

double Angle::value() const {
  if (isExact())
    return multiple().toDouble() * 3.14159265358979323846;
  return llvm::bit_cast<double>(bits);
}

std::string Angle::str() const {
  if (isMissing())
    return "missing";
  if (isExact())
    return multiple().str() + " pi";
  return spellReal(value());
}

std::string lull::spellReal(double value) {
  std::string text = fmt::format("{}", value);
  if (!std::isfinite(value))
    return text;
  size_t exponent = text.find('e');
  if (text.find('.') == std::string::npos)
    text.insert(exponent == std::string::npos ? text.size() : exponent, ".0");
  return text;
}
