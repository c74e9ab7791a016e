//===- DeviceBuilder.h - From device op to device ---------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_DEVICEBUILDER_H
#define LULL_IR_DEVICEBUILDER_H

#include "lull/IR/Ops.h"
#include "lull/Timing/Device.h"

namespace lull {

/// The plain device of a `lull.device` op; the one place that converts it. On
/// failure errors stand at the line of the device op that is wrong (none are
/// emitted if `quiet`).
mlir::FailureOr<Device> buildDevice(DeviceOp op, bool quiet = false);

/// The operation whose attribute `lull.device` says what `op` (a function,
/// say) runs on: itself or its nearest ancestor that has one; and the symbol,
/// which is to be looked up from there. Null if there is none.
mlir::Operation *deviceHolder(mlir::Operation *op,
                              mlir::FlatSymbolRefAttr &symbol);

/// The device that a symbol means at `holder`: looked up in the symbol tables
/// around it, the nearest first. Null if there is none.
DeviceOp resolveDevice(mlir::Operation *holder, mlir::FlatSymbolRefAttr symbol);

/// Whether a device can run what a function says: sites exist, pairs are
/// coupled, durations are on the clock. Emits an error at each operation that
/// breaks it, up to a few.
llvm::LogicalResult verifyAgainstDevice(mlir::Operation *function,
                                        const Device &device);

} // namespace lull

#endif // LULL_IR_DEVICEBUILDER_H
