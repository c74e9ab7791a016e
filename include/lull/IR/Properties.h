//===- Properties.h - Durations and angles as properties --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Conversions that the properties of LullProperties.td are made of: to and from
// attributes (the generic form) and bytecode.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_PROPERTIES_H
#define LULL_IR_PROPERTIES_H

#include "lull/IR/Angle.h"
#include "lull/Timing/Time.h"

#include "mlir/Bytecode/BytecodeImplementation.h"
#include "mlir/IR/Attributes.h"
#include "mlir/IR/Diagnostics.h"

namespace lull {

using EmitError = llvm::function_ref<mlir::InFlightDiagnostic()>;

/// In the generic form a duration is a string: "160 dt", "35.5 ns", "unset".
mlir::Attribute toAttribute(mlir::MLIRContext *context, const Duration &value);
llvm::LogicalResult fromAttribute(Duration &value, mlir::Attribute attribute,
                                  EmitError emitError);

/// In the generic form an exact angle is a string ("1/2 pi"), another a float.
mlir::Attribute toAttribute(mlir::MLIRContext *context, const Angle &value);
llvm::LogicalResult fromAttribute(Angle &value, mlir::Attribute attribute,
                                  EmitError emitError);

/// In the generic form the angles are an array of the above.
mlir::Attribute toAttribute(mlir::MLIRContext *context, const AngleList &value);
llvm::LogicalResult fromAttribute(AngleList &value, mlir::Attribute attribute,
                                  EmitError emitError);

void writeProperty(mlir::DialectBytecodeWriter &writer, const Duration &value);
llvm::LogicalResult readProperty(mlir::DialectBytecodeReader &reader,
                                 Duration &value);
void writeProperty(mlir::DialectBytecodeWriter &writer, const Angle &value);
llvm::LogicalResult readProperty(mlir::DialectBytecodeReader &reader,
                                 Angle &value);
void writeProperty(mlir::DialectBytecodeWriter &writer, const AngleList &value);
llvm::LogicalResult readProperty(mlir::DialectBytecodeReader &reader,
                                 AngleList &value);

} // namespace lull

#endif // LULL_IR_PROPERTIES_H
