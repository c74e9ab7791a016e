//===- Assembly.h - Custom directives of the assembly format ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Parsers and printers that the assemblyFormat of LullOps.td and
// LullDeviceOps.td names in custom<...>. A printer that may print nothing
// prints its own leading space.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_ASSEMBLY_H
#define LULL_IR_ASSEMBLY_H

#include "lull/IR/Attributes.h"

#include "mlir/IR/BuiltinAttributes.h"
#include "mlir/IR/OpImplementation.h"

namespace lull {

using mlir::AsmParser;
using mlir::AsmPrinter;
using mlir::OpAsmParser;
using mlir::OpAsmPrinter;
using mlir::Operation;
using mlir::ParseResult;
using mlir::Type;

/// Whether MLIR's lexer reads `text` as one bare identifier.
bool isBareWord(llvm::StringRef text);

// Shared by attributes and operations.
ParseResult parseDuration(AsmParser &parser, Duration &value);
/// A whole number, `a/b`; no decimals.
ParseResult parseFraction(AsmParser &parser, Fraction &value);
/// `1/2 pi`, `pi`, `0.5`, `-3.0e-2`.
ParseResult parseAngle(AsmParser &parser, Angle &value);
/// An exact multiple of pi only.
ParseResult parsePhase(AsmParser &parser, Fraction &value);
/// The sequence and repeats of a plan, without its brackets.
ParseResult parsePlanBody(AsmParser &parser, PlanAttr &plan);
void printPlanBody(AsmPrinter &printer, PlanAttr plan);
/// `rotation(1 pi, 0 pi)`, `equatorial`, `frame`.
ParseResult parseAction(AsmParser &parser, Action &action);
void printAction(AsmPrinter &printer, const Action &action);

// Programs.
ParseResult parseFor(OpAsmParser &parser, Duration &value);
void printFor(OpAsmPrinter &printer, Operation *op, const Duration &value);
ParseResult parseGateCall(OpAsmParser &parser, mlir::StringAttr &gate,
                          AngleList &angles);
void printGateCall(OpAsmPrinter &printer, Operation *op, mlir::StringAttr gate,
                   const AngleList &angles);
ParseResult parseState(OpAsmParser &parser, WindowStateAttr &state);
void printState(OpAsmPrinter &printer, Operation *op, WindowStateAttr state);
ParseResult parsePlan(OpAsmParser &parser, PlanAttr &plan);
void printPlan(OpAsmPrinter &printer, Operation *op, PlanAttr plan);
ParseResult parsePhase(OpAsmParser &parser, Angle &phase);
void printPhase(OpAsmPrinter &printer, Operation *op, const Angle &phase);
/// Qubit operands, followed by ` : types -> carried types` unless all of them
/// are `!lull.qubit` and nothing is carried.
using QubitOperand = OpAsmParser::UnresolvedOperand;
ParseResult parseWaiting(OpAsmParser &parser,
                         llvm::SmallVectorImpl<QubitOperand> &qubits,
                         llvm::SmallVectorImpl<Type> &types,
                         llvm::SmallVectorImpl<Type> &carried);
void printWaiting(OpAsmPrinter &printer, Operation *op,
                  mlir::OperandRange qubits, mlir::TypeRange types,
                  mlir::TypeRange carried);
ParseResult parseWaiting(OpAsmParser &parser, QubitOperand &qubit, Type &type,
                         Type &carried);
void printWaiting(OpAsmPrinter &printer, Operation *op, mlir::Value qubit,
                  Type type, Type carried);
ParseResult parseSite(OpAsmParser &parser, mlir::IntegerAttr &site);
void printSite(OpAsmPrinter &printer, Operation *op, mlir::IntegerAttr site);

// Devices and sequences.
ParseResult parseGrid(OpAsmParser &parser, ClockAttr &clock, DurationAttr &step,
                      DurationAttr &gap);
void printGrid(OpAsmPrinter &printer, Operation *op, ClockAttr clock,
               DurationAttr step, DurationAttr gap);
ParseResult parseCalibration(OpAsmParser &parser, DurationAttr &t1,
                             DurationAttr &ramsey, DurationAttr &echo,
                             mlir::FloatAttr &error);
void printCalibration(OpAsmPrinter &printer, Operation *op, DurationAttr t1,
                      DurationAttr ramsey, DurationAttr echo,
                      mlir::FloatAttr error);
ParseResult parseReal(OpAsmParser &parser, mlir::FloatAttr &value);
void printReal(OpAsmPrinter &printer, Operation *op, mlir::FloatAttr value);
ParseResult parseName(OpAsmParser &parser, mlir::StringAttr &name);
void printName(OpAsmPrinter &printer, Operation *op, mlir::StringAttr name);
ParseResult parseOn(OpAsmParser &parser, mlir::DenseI64ArrayAttr &on,
                    mlir::IntegerAttr &arity);
void printOn(OpAsmPrinter &printer, Operation *op, mlir::DenseI64ArrayAttr on,
             mlir::IntegerAttr arity);
ParseResult parseLength(OpAsmParser &parser, DurationAttr &duration);
void printLength(OpAsmPrinter &printer, Operation *op, DurationAttr duration);
ParseResult parsePlays(OpAsmParser &parser, ActionAttr &action);
void printPlays(OpAsmPrinter &printer, Operation *op, ActionAttr action);
ParseResult parseShare(OpAsmParser &parser, FractionAttr &share);
void printShare(OpAsmPrinter &printer, Operation *op, FractionAttr share);
ParseResult parseFractions(OpAsmParser &parser, mlir::ArrayAttr &fractions);
void printFractions(OpAsmPrinter &printer, Operation *op,
                    mlir::ArrayAttr fractions);
ParseResult parseInstants(OpAsmParser &parser, mlir::ArrayAttr &instants,
                          mlir::StringAttr &formula);
void printInstants(OpAsmPrinter &printer, Operation *op,
                   mlir::ArrayAttr instants, mlir::StringAttr formula);

} // namespace lull

#endif // LULL_IR_ASSEMBLY_H
