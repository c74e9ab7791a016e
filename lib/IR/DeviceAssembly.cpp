//===- DeviceAssembly.cpp - Devices as text ---------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Assembly.h"
#include "lull/Timing/Fault.h"

#include "mlir/IR/Builders.h"

using namespace lull;
using namespace mlir;

ParseResult lull::parseAction(AsmParser &parser, Action &action) {
  SMLoc loc = parser.getCurrentLocation();
  StringRef word;
  if (succeeded(parser.parseOptionalKeyword(&word))) {
    if (word == "equatorial") {
      action = Action::equatorial();
      return success();
    }
    if (word == "frame") {
      action = Action::frame();
      return success();
    }
  }
  // D31: what a device can play.
  if (word != "rotation")
    return parser.emitError(loc)
           << "expected rotation(TURN, PHASE), equatorial or frame";
  Fraction turn, phase;
  if (parser.parseLParen() || parsePhase(parser, turn) || parser.parseComma() ||
      parsePhase(parser, phase) || parser.parseRParen())
    return failure();
  // D30: part of a turn.
  if (turn.isZero() || turn > Fraction(1) || turn < Fraction(-1))
    return parser.emitError(loc)
           << "turn is " << turn.str()
           << " pi when it should be in [-1, 1] pi and not 0";
  // A negative rotation is the positive one about the opposite axis.
  action = Action::rotation(turn, phase);
  return success();
}

void lull::printAction(AsmPrinter &printer, const Action &action) {
  switch (action.kind) {
  case Action::Kind::Rotation:
    printer << "rotation(" << action.turn.str() << " pi, " << action.phase.str()
            << " pi)";
    return;
  case Action::Kind::Equatorial:
    printer << "equatorial";
    return;
  case Action::Kind::Frame:
    printer << "frame";
    return;
  case Action::Kind::None:
    printer << "none";
    return;
  }
}

/// Reads `word DURATION` if `word` is next.
static ParseResult parseNamed(OpAsmParser &parser, StringRef word,
                              DurationAttr &duration) {
  if (failed(parser.parseOptionalKeyword(word)))
    return success();
  return parseLength(parser, duration);
}

static void printNamed(OpAsmPrinter &printer, StringRef word,
                       DurationAttr duration) {
  if (duration)
    printer << ' ' << word << ' ' << duration.getValue().str();
}

ParseResult lull::parseGrid(OpAsmParser &parser, ClockAttr &clock,
                            DurationAttr &step, DurationAttr &gap) {
  Fraction dt;
  StringRef unitText;
  if (parser.parseKeyword("clock"))
    return failure();
  SMLoc loc = parser.getCurrentLocation();
  if (parseFraction(parser, dt))
    return failure();
  SMLoc unitLoc = parser.getCurrentLocation();
  if (parser.parseKeyword(&unitText))
    return failure();
  std::optional<TimeUnit> unit = parseTimeUnit(unitText);
  // D4: a unit of seconds.
  if (!unit)
    return parser.emitError(unitLoc)
           << "unknown unit '" << unitText << "': expected ns, us, ms or s";
  clock = ClockAttr::getChecked([&] { return parser.emitError(loc); },
                                parser.getContext(), dt, *unit);
  if (!clock)
    return failure();
  return failure(parseNamed(parser, "step", step) ||
                 parseNamed(parser, "gap", gap));
}

void lull::printGrid(OpAsmPrinter &printer, Operation *, ClockAttr clock,
                     DurationAttr step, DurationAttr gap) {
  printer << " clock " << clock.getDt().str() << ' ' << spell(clock.getUnit());
  printNamed(printer, "step", step);
  printNamed(printer, "gap", gap);
}

ParseResult lull::parseCalibration(OpAsmParser &parser, DurationAttr &t1,
                                   DurationAttr &ramsey, DurationAttr &echo,
                                   FloatAttr &error) {
  if (parseNamed(parser, "t1", t1) || parseNamed(parser, "ramsey", ramsey) ||
      parseNamed(parser, "echo", echo))
    return failure();
  if (failed(parser.parseOptionalKeyword("error")))
    return success();
  return parseReal(parser, error);
}

void lull::printCalibration(OpAsmPrinter &printer, Operation *op,
                            DurationAttr t1, DurationAttr ramsey,
                            DurationAttr echo, FloatAttr error) {
  printNamed(printer, "t1", t1);
  printNamed(printer, "ramsey", ramsey);
  printNamed(printer, "echo", echo);
  if (!error)
    return;
  printer << " error ";
  printReal(printer, op, error);
}

ParseResult lull::parseReal(OpAsmParser &parser, FloatAttr &value) {
  double real = 0;
  if (parser.parseFloat(real))
    return failure();
  value = parser.getBuilder().getF64FloatAttr(real);
  return success();
}

void lull::printReal(OpAsmPrinter &printer, Operation *, FloatAttr value) {
  printer << spellReal(value.getValueAsDouble());
}

//===----------------------------------------------------------------------===//
// Which sites an operation is for
//===----------------------------------------------------------------------===//

ParseResult lull::parseOn(OpAsmParser &parser, DenseI64ArrayAttr &on,
                          IntegerAttr &arity) {
  Builder &builder = parser.getBuilder();
  int64_t count = 1;
  SmallVector<int64_t> sites;
  auto finish = [&] {
    on = builder.getDenseI64ArrayAttr(sites);
    arity = builder.getI64IntegerAttr(count);
    return success();
  };
  if (failed(parser.parseOptionalKeyword("on")))
    return finish();
  if (succeeded(parser.parseOptionalKeyword("any"))) {
    if (succeeded(parser.parseOptionalKeyword("pair")))
      count = 2;
    else if (parser.parseInteger(count))
      return failure();
    return finish();
  }
  // Single sites, or tuples in parentheses, which must be of one length.
  bool first = true;
  auto parseTuple = [&]() -> ParseResult {
    SMLoc loc = parser.getCurrentLocation();
    size_t before = sites.size();
    if (succeeded(parser.parseOptionalLParen())) {
      if (parser.parseCommaSeparatedList(
              [&] { return parser.parseInteger(sites.emplace_back()); }) ||
          parser.parseRParen())
        return failure();
    } else if (parser.parseInteger(sites.emplace_back())) {
      return failure();
    }
    int64_t length = sites.size() - before;
    // D18: tuples of one length.
    if (!first && length != count)
      return parser.emitError(loc) << "found " << counted(length, "site")
                                   << " when the first tuple has " << count;
    count = length;
    first = false;
    return success();
  };
  if (parser.parseCommaSeparatedList(parseTuple))
    return failure();
  return finish();
}

void lull::printOn(OpAsmPrinter &printer, Operation *, DenseI64ArrayAttr on,
                   IntegerAttr arity) {
  int64_t count = arity.getInt();
  ArrayRef<int64_t> sites = on.asArrayRef();
  if (sites.empty()) {
    if (count == 2)
      printer << " on any pair";
    else if (count != 1)
      printer << " on any " << count;
    return;
  }
  printer << " on ";
  for (size_t i = 0; i < sites.size(); i += count) {
    if (i)
      printer << ", ";
    if (count == 1) {
      printer << sites[i];
      continue;
    }
    printer << '(';
    llvm::interleaveComma(sites.slice(i, count), printer);
    printer << ')';
  }
}

// D32: the duration of an operation is not optional.
ParseResult lull::parseLength(OpAsmParser &parser, DurationAttr &duration) {
  Duration value;
  if (parseDuration(parser, value))
    return failure();
  duration = DurationAttr::get(parser.getContext(), value);
  return success();
}

void lull::printLength(OpAsmPrinter &printer, Operation *,
                       DurationAttr duration) {
  printer << duration.getValue().str();
}

ParseResult lull::parsePlays(OpAsmParser &parser, ActionAttr &action) {
  Action value;
  if (parseAction(parser, value))
    return failure();
  action = ActionAttr::get(parser.getContext(), value);
  return success();
}

void lull::printPlays(OpAsmPrinter &printer, Operation *, ActionAttr action) {
  printAction(printer, action.getValue());
}

ParseResult lull::parseShare(OpAsmParser &parser, FractionAttr &share) {
  Fraction value;
  if (parseFraction(parser, value))
    return failure();
  share = FractionAttr::get(parser.getContext(), value);
  return success();
}

void lull::printShare(OpAsmPrinter &printer, Operation *, FractionAttr share) {
  printer << share.getValue().str();
}

//===----------------------------------------------------------------------===//
// Sequences
//===----------------------------------------------------------------------===//

ParseResult lull::parseFractions(OpAsmParser &parser, ArrayAttr &fractions) {
  SmallVector<Attribute> values;
  auto parseOne = [&]() -> ParseResult {
    Fraction value;
    if (parseFraction(parser, value))
      return failure();
    values.push_back(FractionAttr::get(parser.getContext(), value));
    return success();
  };
  if (parser.parseCommaSeparatedList(AsmParser::Delimiter::Square, parseOne))
    return failure();
  fractions = parser.getBuilder().getArrayAttr(values);
  return success();
}

void lull::printFractions(OpAsmPrinter &printer, Operation *,
                          ArrayAttr fractions) {
  printer << '[';
  llvm::interleaveComma(fractions.getAsRange<FractionAttr>(), printer,
                        [&](FractionAttr f) { printer << f.getValue().str(); });
  printer << ']';
}

ParseResult lull::parseInstants(OpAsmParser &parser, ArrayAttr &instants,
                                StringAttr &formula) {
  StringRef word;
  if (failed(parser.parseOptionalKeyword(&word)))
    return parseFractions(parser, instants);
  formula = parser.getBuilder().getStringAttr(word);
  return success();
}

void lull::printInstants(OpAsmPrinter &printer, Operation *op,
                         ArrayAttr instants, StringAttr formula) {
  if (formula)
    printer << formula.getValue();
  else
    printFractions(printer, op, instants);
}
