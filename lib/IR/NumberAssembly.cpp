//===- NumberAssembly.cpp - Numbers, angles and plans as text ---*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Assembly.h"

#include "mlir/IR/Builders.h"
#include "llvm/ADT/StringExtras.h"

#include <cmath>

using namespace lull;
using namespace mlir;

/// Whether a number is next. The parser has no way to ask for a float without
/// insisting; its own complaint would not say what was wanted.
static bool isNumberNext(AsmParser &parser) {
  return llvm::isDigit(*parser.getCurrentLocation().getPointer());
}

/// Reads a whole number whose minus, if any, has been read.
static ParseResult parseWhole(AsmParser &parser, bool negative,
                              int64_t &value) {
  SMLoc loc = parser.getCurrentLocation();
  if (!isNumberNext(parser))
    return parser.emitError(loc) << "expected a whole number";
  if (parser.parseInteger(value))
    return failure();
  value = negative ? -value : value;
  return success();
}

/// Reads a decimal number as text. MLIR's parser offers floats as doubles only,
/// so the digits of one are taken from the source between two locations.
static ParseResult parseDecimal(AsmParser &parser, std::string &text) {
  // Asking for an integer first would eat the minus of `-0.5` for good.
  bool negative = succeeded(parser.parseOptionalMinus());
  SMLoc start = parser.getCurrentLocation();
  if (!isNumberNext(parser))
    return parser.emitError(start)
           << "expected a duration such as 64 dt or 35.5 ns";
  APInt whole;
  OptionalParseResult integer = parser.parseOptionalInteger(whole);
  if (integer.has_value()) {
    if (failed(*integer))
      return failure();
    llvm::SmallString<24> digits;
    whole.toString(digits, 10, /*Signed=*/true);
    text = (negative ? "-" : "") + digits.str().str();
    return success();
  }
  double rounded = 0;
  if (parser.parseFloat(rounded))
    return failure();
  const char *begin = start.getPointer();
  StringRef spelled(begin, parser.getCurrentLocation().getPointer() - begin);
  // The next token may follow at once, and so may a comment.
  spelled = spelled.take_while([](char c) {
    return llvm::isAlnum(c) || c == '.' || c == '+' || c == '-';
  });
  text = (negative ? "-" : "") + spelled.str();
  return success();
}

/// Turns an error of a plain room into one at `loc`.
static ParseResult emitFault(AsmParser &parser, SMLoc loc, llvm::Error error) {
  return parser.emitError(loc) << llvm::toString(std::move(error));
}

/// P6: exact arithmetic on multiples of pi needs room below 64 bits.
static ParseResult checkMultiple(AsmParser &parser, SMLoc loc,
                                 Fraction multiple) {
  if (Angle::isSound(multiple))
    return success();
  return parser.emitError(loc) << "multiple " << multiple.str()
                               << " of pi goes beyond " << Angle::mostTerm;
}

ParseResult lull::parseDuration(AsmParser &parser, Duration &value) {
  SMLoc loc = parser.getCurrentLocation();
  std::string number;
  StringRef unitText;
  if (parseDecimal(parser, number))
    return failure();
  SMLoc unitLoc = parser.getCurrentLocation();
  if (parser.parseOptionalKeyword(&unitText))
    return parser.emitError(unitLoc)
           << "expected a unit after " << number << ": dt, ns, us, ms or s";
  // T4: a unit that there is.
  std::optional<TimeUnit> unit = parseTimeUnit(unitText);
  if (!unit)
    return parser.emitError(unitLoc)
           << "unknown unit '" << unitText << "': expected dt, ns, us, ms or s";
  // T5, T6, T7: a number that fits it.
  llvm::Expected<Duration> parsed = Duration::parse(number, *unit);
  if (!parsed)
    return emitFault(parser, loc, parsed.takeError());
  value = *parsed;
  return success();
}

/// Reads what follows the numerator of a fraction.
static ParseResult parseDenominator(AsmParser &parser, SMLoc loc,
                                    int64_t numerator, Fraction &value) {
  int64_t denominator = 1;
  if (succeeded(parser.parseOptionalSlash()) &&
      parseWhole(parser, /*negative=*/false, denominator))
    return failure();
  // P4, D5: a zero below the line.
  llvm::Expected<Fraction> made = Fraction::make(numerator, denominator);
  if (!made)
    return emitFault(parser, loc, made.takeError());
  value = *made;
  return success();
}

ParseResult lull::parseFraction(AsmParser &parser, Fraction &value) {
  SMLoc loc = parser.getCurrentLocation();
  bool negative = succeeded(parser.parseOptionalMinus());
  int64_t numerator = 0;
  return failure(parseWhole(parser, negative, numerator) ||
                 parseDenominator(parser, loc, numerator, value));
}

ParseResult lull::parsePhase(AsmParser &parser, Fraction &value) {
  SMLoc loc = parser.getCurrentLocation();
  bool negative = succeeded(parser.parseOptionalMinus());
  if (succeeded(parser.parseOptionalKeyword("pi"))) {
    value = negative ? -1 : 1;
    return success();
  }
  int64_t numerator = 0;
  if (parseWhole(parser, negative, numerator) ||
      parseDenominator(parser, loc, numerator, value) ||
      parser.parseKeyword("pi"))
    return failure();
  return checkMultiple(parser, loc, value);
}

ParseResult lull::parseAngle(AsmParser &parser, Angle &value) {
  SMLoc loc = parser.getCurrentLocation();
  bool negative = succeeded(parser.parseOptionalMinus());
  if (succeeded(parser.parseOptionalKeyword("pi"))) {
    value = Angle::ofPi(negative ? -1 : 1);
    return success();
  }
  if (!isNumberNext(parser))
    return parser.emitError(loc) << "expected an angle such as 0.5 or 1/2 pi";
  int64_t whole = 0;
  OptionalParseResult integer = parser.parseOptionalInteger(whole);
  if (!integer.has_value()) {
    double real = 0;
    if (parser.parseFloat(real))
      return failure();
    // P4: decimals of pi would be rounded.
    if (succeeded(parser.parseOptionalKeyword("pi")))
      return parser.emitError(loc)
             << "a multiple of pi is written as a fraction, such as 1/2 pi";
    value = Angle::radians(negative ? -real : real);
    return success();
  }
  if (failed(*integer))
    return failure();
  whole = negative ? -whole : whole;
  Fraction multiple;
  if (parseDenominator(parser, loc, whole, multiple))
    return failure();
  if (succeeded(parser.parseOptionalKeyword("pi"))) {
    value = Angle::ofPi(multiple);
    return checkMultiple(parser, loc, multiple);
  }
  if (!multiple.isWhole())
    return parser.emitError(loc) << "expected 'pi' after the fraction";
  // P5: a double has 53 bits.
  if (std::int64_t(double(whole)) != whole || std::abs(double(whole)) > 0x1p53)
    return parser.emitError(loc)
           << "angle " << whole << " does not fit a double exactly";
  // A zero keeps its sign.
  value = Angle::radians(negative ? -std::abs(double(whole)) : double(whole));
  return success();
}

ParseResult lull::parsePlanBody(AsmParser &parser, PlanAttr &plan) {
  SMLoc loc = parser.getCurrentLocation();
  std::string name;
  StringAttr symbol;
  Attribute sequence;
  if (succeeded(parser.parseOptionalString(&name)))
    sequence = parser.getBuilder().getStringAttr(name);
  else if (succeeded(parser.parseOptionalSymbolName(symbol)))
    sequence = FlatSymbolRefAttr::get(symbol);
  else
    return parser.emitError(loc)
           << "expected a sequence: a name such as \"xy8\" or a symbol";
  int64_t repeats = 1;
  SMLoc repeatsLoc = parser.getCurrentLocation();
  if (succeeded(parser.parseOptionalKeyword("repeats"))) {
    repeatsLoc = parser.getCurrentLocation();
    if (parser.parseInteger(repeats))
      return failure();
  }
  // P11: a number that a plan may have.
  if (repeats < 1 || repeats > PlanAttr::mostRepeats)
    return parser.emitError(repeatsLoc)
           << "a plan repeats its sequence " << repeats
           << " times when it should be 1 to " << PlanAttr::mostRepeats;
  bool alternating = succeeded(parser.parseOptionalKeyword("alternating"));
  plan = PlanAttr::getChecked([&] { return parser.emitError(loc); },
                              parser.getContext(), sequence, unsigned(repeats),
                              alternating);
  return success(plan != nullptr);
}

void lull::printPlanBody(AsmPrinter &printer, PlanAttr plan) {
  printer << plan.getSequence();
  if (plan.getRepeats() != 1)
    printer << " repeats " << plan.getRepeats();
  if (plan.getAlternating())
    printer << " alternating";
}
