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

bool lull::isBareWord(StringRef text) {
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
  // P9: a state that there is.
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
