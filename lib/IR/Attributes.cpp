//===- Attributes.cpp - Attributes of the lull dialect ----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Attributes.h"

#include "lull/IR/Assembly.h"
#include "lull/IR/Dialect.h"

#include "mlir/IR/Builders.h"
#include "mlir/IR/DialectImplementation.h"
#include "llvm/ADT/TypeSwitch.h"

using namespace lull;
using namespace mlir;

using EmitError = llvm::function_ref<InFlightDiagnostic()>;

#include "lull/IR/LullEnums.cpp.inc"
#define GET_ATTRDEF_CLASSES
#include "lull/IR/LullAttrs.cpp.inc"

void LullDialect::registerAttributes() {
  addAttributes<
#define GET_ATTRDEF_LIST
#include "lull/IR/LullAttrs.cpp.inc"
      >();
}

//===----------------------------------------------------------------------===//
// PlanAttr
//===----------------------------------------------------------------------===//

LogicalResult PlanAttr::verify(EmitError emitError, Attribute sequence,
                               unsigned repeats, bool alternating) {
  // P10: a name or a symbol.
  if (!isa_and_nonnull<StringAttr, FlatSymbolRefAttr>(sequence))
    return emitError() << "the sequence of a plan is a name or a symbol, not "
                       << sequence;
  // P11: at least once.
  if (repeats == 0 || repeats > mostRepeats)
    return emitError() << "a plan repeats its sequence " << repeats
                       << " times when it should be 1 to " << mostRepeats;
  return success();
}

Attribute PlanAttr::parse(AsmParser &parser, Type) {
  PlanAttr plan;
  if (parser.parseLess() || parsePlanBody(parser, plan) ||
      parser.parseGreater())
    return {};
  return plan;
}

void PlanAttr::print(AsmPrinter &printer) const {
  printer << '<';
  printPlanBody(printer, *this);
  printer << '>';
}

//===----------------------------------------------------------------------===//
// DurationAttr, FractionAttr, ClockAttr, ActionAttr
//===----------------------------------------------------------------------===//

LogicalResult DurationAttr::verify(EmitError emitError, Duration value) {
  if (!value.isSet())
    return emitError() << "expected a duration such as 35.5 ns or 160 dt";
  return success();
}

Attribute DurationAttr::parse(AsmParser &parser, Type) {
  Duration value;
  if (parser.parseLess() || parseDuration(parser, value) ||
      parser.parseGreater())
    return {};
  return parser.getChecked<DurationAttr>(parser.getContext(), value);
}

void DurationAttr::print(AsmPrinter &printer) const {
  printer << '<' << getValue().str() << '>';
}

Attribute FractionAttr::parse(AsmParser &parser, Type) {
  Fraction value;
  if (parser.parseLess() || parseFraction(parser, value) ||
      parser.parseGreater())
    return {};
  return FractionAttr::get(parser.getContext(), value);
}

void FractionAttr::print(AsmPrinter &printer) const {
  printer << '<' << getValue().str() << '>';
}

LogicalResult ClockAttr::verify(EmitError emitError, Fraction dt,
                                TimeUnit unit) {
  // D3, D4, D5: a clock that ticks.
  if (llvm::Expected<Clock> clock = Clock::make(dt, unit); !clock)
    return emitError() << llvm::toString(clock.takeError());
  return success();
}

Attribute ClockAttr::parse(AsmParser &parser, Type) {
  Fraction dt;
  StringRef unitText;
  SMLoc loc;
  if (parser.parseLess() || parseFraction(parser, dt))
    return {};
  loc = parser.getCurrentLocation();
  if (parser.parseKeyword(&unitText))
    return {};
  std::optional<TimeUnit> unit = parseTimeUnit(unitText);
  if (!unit) {
    parser.emitError(loc) << "unknown unit '" << unitText
                          << "': expected ns, us, ms or s";
    return {};
  }
  if (parser.parseGreater())
    return {};
  return parser.getChecked<ClockAttr>(parser.getContext(), dt, *unit);
}

void ClockAttr::print(AsmPrinter &printer) const {
  printer << '<' << getDt().str() << ' ' << spell(getUnit()) << '>';
}

Attribute ActionAttr::parse(AsmParser &parser, Type) {
  Action value;
  if (parser.parseLess() || parseAction(parser, value) || parser.parseGreater())
    return {};
  return ActionAttr::get(parser.getContext(), value);
}

void ActionAttr::print(AsmPrinter &printer) const {
  printer << '<';
  printAction(printer, getValue());
  printer << '>';
}
