//===- Assembly.cpp - Custom directives of programs -------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Assembly.h"

#include "lull/IR/Dialect.h"

#include "mlir/IR/Builders.h"
#include "llvm/ADT/StringExtras.h"

using namespace lull;
using namespace mlir;

//===----------------------------------------------------------------------===//
// Shared by attributes and operations
//===----------------------------------------------------------------------===//

/// Reads a decimal number as text. MLIR's parser offers floats as doubles only,
/// so the digits of one are taken from the source between two locations.
static ParseResult parseDecimal(AsmParser &parser, std::string &text) {
  // Asking for an integer first would eat the minus of `-0.5` for good.
  bool negative = succeeded(parser.parseOptionalMinus());
  SMLoc start = parser.getCurrentLocation();
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
  spelled = spelled.take_until([](char c) { return llvm::isSpace(c); });
  text = (negative ? "-" : "") + spelled.str();
  return success();
}

/// Turns an error of a plain room into one at `loc`.
static ParseResult emitFault(AsmParser &parser, SMLoc loc, llvm::Error error) {
  return parser.emitError(loc) << llvm::toString(std::move(error));
}

/// Exact arithmetic on multiples of pi needs room below 64 bits.
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
  std::optional<TimeUnit> unit = parseTimeUnit(unitText);
  if (!unit)
    return parser.emitError(unitLoc)
           << "unknown unit '" << unitText << "': expected dt, ns, us, ms or s";
  llvm::Expected<Duration> parsed = Duration::parse(number, *unit);
  if (!parsed)
    return emitFault(parser, loc, parsed.takeError());
  value = *parsed;
  return success();
}

ParseResult lull::parseFraction(AsmParser &parser, Fraction &value) {
  SMLoc loc = parser.getCurrentLocation();
  bool negative = succeeded(parser.parseOptionalMinus());
  int64_t numerator = 0, denominator = 1;
  if (parser.parseInteger(numerator))
    return failure();
  if (succeeded(parser.parseOptionalSlash()) &&
      parser.parseInteger(denominator))
    return failure();
  llvm::Expected<Fraction> made =
      Fraction::make(negative ? -numerator : numerator, denominator);
  if (!made)
    return emitFault(parser, loc, made.takeError());
  value = *made;
  return success();
}

ParseResult lull::parsePhase(AsmParser &parser, Fraction &value) {
  SMLoc loc = parser.getCurrentLocation();
  if (succeeded(parser.parseOptionalKeyword("pi"))) {
    value = 1;
    return success();
  }
  if (parseFraction(parser, value) || parser.parseKeyword("pi"))
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
  int64_t numerator = 0, denominator = 1;
  OptionalParseResult integer = parser.parseOptionalInteger(numerator);
  if (!integer.has_value()) {
    double real = 0;
    if (parser.parseFloat(real))
      return failure();
    if (succeeded(parser.parseOptionalKeyword("pi")))
      return parser.emitError(loc)
             << "a multiple of pi is written as a fraction, such as 1/2 pi";
    value = Angle::radians(negative ? -real : real);
    return success();
  }
  if (failed(*integer))
    return failure();
  bool fraction = succeeded(parser.parseOptionalSlash());
  if (fraction && parser.parseInteger(denominator))
    return failure();
  if (failed(parser.parseOptionalKeyword("pi"))) {
    if (fraction)
      return parser.emitError(loc) << "expected 'pi' after the fraction";
    value = Angle::radians(negative ? -double(numerator) : double(numerator));
    return success();
  }
  llvm::Expected<Fraction> multiple =
      Fraction::make(negative ? -numerator : numerator, denominator);
  if (!multiple)
    return emitFault(parser, loc, multiple.takeError());
  value = Angle::ofPi(*multiple);
  return checkMultiple(parser, loc, *multiple);
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
  unsigned repeats = 1;
  if (succeeded(parser.parseOptionalKeyword("repeats")) &&
      parser.parseInteger(repeats))
    return failure();
  bool alternating = succeeded(parser.parseOptionalKeyword("alternating"));
  plan =
      PlanAttr::getChecked([&] { return parser.emitError(loc); },
                           parser.getContext(), sequence, repeats, alternating);
  return success(plan != nullptr);
}

void lull::printPlanBody(AsmPrinter &printer, PlanAttr plan) {
  printer << plan.getSequence();
  if (plan.getRepeats() != 1)
    printer << " repeats " << plan.getRepeats();
  if (plan.getAlternating())
    printer << " alternating";
}

//===----------------------------------------------------------------------===//
// Programs
//===----------------------------------------------------------------------===//

ParseResult lull::parseFor(OpAsmParser &parser, Duration &value) {
  if (succeeded(parser.parseOptionalKeyword("for")))
    return parseDuration(parser, value);
  value = Duration::unset();
  return success();
}

void lull::printFor(OpAsmPrinter &printer, Operation *, const Duration &value) {
  if (!value.isSet())
    return;
  printer << " for ";
  if (value.unit() == TimeUnit::dt)
    printer << value.amount() << " dt";
  else
    printer << value.str();
}

/// Whether MLIR's lexer reads `text` as one bare identifier.
static bool isBareWord(StringRef text) {
  return !text.empty() && (llvm::isAlpha(text[0]) || text[0] == '_') &&
         llvm::all_of(text, [](char c) {
           return llvm::isAlnum(c) || c == '_' || c == '$' || c == '.';
         });
}

static ParseResult parseWord(OpAsmParser &parser, StringAttr &word) {
  std::string text;
  if (parser.parseKeywordOrString(&text))
    return failure();
  word = parser.getBuilder().getStringAttr(text);
  return success();
}

static void printWord(OpAsmPrinter &printer, StringAttr word) {
  if (isBareWord(word.getValue()))
    printer << word.getValue();
  else
    printer << word;
}

ParseResult lull::parseGateCall(OpAsmParser &parser, StringAttr &gate,
                                AngleList &angles) {
  angles.stated = true;
  if (parseWord(parser, gate))
    return failure();
  if (failed(parser.parseOptionalLParen()))
    return success();
  return failure(parser.parseCommaSeparatedList([&] {
    return parseAngle(parser, angles.angles.emplace_back());
  }) || parser.parseRParen());
}

void lull::printGateCall(OpAsmPrinter &printer, Operation *, StringAttr gate,
                         const AngleList &angles) {
  printWord(printer, gate);
  if (angles.angles.empty())
    return;
  printer << '(';
  llvm::interleaveComma(angles.angles, printer,
                        [&](const Angle &angle) { printer << angle.str(); });
  printer << ')';
}

ParseResult lull::parseName(OpAsmParser &parser, StringAttr &name) {
  return parseWord(parser, name);
}

void lull::printName(OpAsmPrinter &printer, Operation *, StringAttr name) {
  printWord(printer, name);
}

ParseResult lull::parseState(OpAsmParser &parser, WindowStateAttr &state) {
  StringRef word;
  SMLoc loc = parser.getCurrentLocation();
  if (parser.parseOptionalKeyword(&word))
    return parser.emitError(loc)
           << "expected what the qubit holds: basis, live or spent";
  std::optional<WindowState> value = symbolizeWindowState(word);
  if (!value)
    return parser.emitError(loc)
           << "unknown state '" << word << "': expected basis, live or spent";
  state = WindowStateAttr::get(parser.getContext(), *value);
  return success();
}

void lull::printState(OpAsmPrinter &printer, Operation *,
                      WindowStateAttr state) {
  printer << stringifyWindowState(state.getValue());
}

ParseResult lull::parsePlan(OpAsmParser &parser, PlanAttr &plan) {
  if (failed(parser.parseOptionalKeyword("plan")))
    return success();
  return parsePlanBody(parser, plan);
}

void lull::printPlan(OpAsmPrinter &printer, Operation *, PlanAttr plan) {
  if (!plan)
    return;
  printer << " plan ";
  printPlanBody(printer, plan);
}

ParseResult lull::parsePhase(OpAsmParser &parser, Angle &phase) {
  Fraction multiple;
  if (parsePhase(static_cast<AsmParser &>(parser), multiple))
    return failure();
  phase = Angle::ofPi(multiple);
  return success();
}

void lull::printPhase(OpAsmPrinter &printer, Operation *, const Angle &phase) {
  printer << phase.str();
}

ParseResult lull::parseWaiting(OpAsmParser &parser,
                               SmallVectorImpl<QubitOperand> &qubits,
                               SmallVectorImpl<Type> &types,
                               SmallVectorImpl<Type> &carried) {
  if (parser.parseOperandList(qubits))
    return failure();
  if (failed(parser.parseOptionalColon())) {
    types.assign(qubits.size(), QubitType::get(parser.getContext()));
    return success();
  }
  if (parser.parseTypeList(types))
    return failure();
  return failed(parser.parseOptionalArrow()) ? success()
                                             : parser.parseTypeList(carried);
}

void lull::printWaiting(OpAsmPrinter &printer, Operation *, OperandRange qubits,
                        TypeRange types, TypeRange carried) {
  printer << qubits;
  if (carried.empty() && llvm::all_of(types, llvm::IsaPred<QubitType>))
    return;
  printer << " : " << types;
  if (!carried.empty())
    printer << " -> " << carried;
}

ParseResult lull::parseWaiting(OpAsmParser &parser, QubitOperand &qubit,
                               Type &type, Type &carried) {
  if (parser.parseOperand(qubit))
    return failure();
  if (failed(parser.parseOptionalColon())) {
    type = QubitType::get(parser.getContext());
    return success();
  }
  if (parser.parseType(type))
    return failure();
  return failed(parser.parseOptionalArrow()) ? success()
                                             : parser.parseType(carried);
}

void lull::printWaiting(OpAsmPrinter &printer, Operation *, Value qubit,
                        Type type, Type carried) {
  printer << qubit;
  if (!carried && isa<QubitType>(type))
    return;
  printer << " : " << type;
  if (carried)
    printer << " -> " << carried;
}

ParseResult lull::parseSite(OpAsmParser &parser, IntegerAttr &site) {
  int64_t number = 0;
  if (parser.parseInteger(number))
    return failure();
  site = parser.getBuilder().getI64IntegerAttr(number);
  return success();
}

void lull::printSite(OpAsmPrinter &printer, Operation *, IntegerAttr site) {
  printer << site.getInt();
}
