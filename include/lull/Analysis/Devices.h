//===- Devices.h - The devices of a module, converted once ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_ANALYSIS_DEVICES_H
#define LULL_ANALYSIS_DEVICES_H

#include "lull/IR/DeviceBuilder.h"

#include "mlir/IR/SymbolTable.h"

namespace lull {

/// Every device that a function in the module runs on, as a plain Device. An
/// analysis of the module, so that passes in a row share it. Reading it is safe
/// from several threads.
class Devices {
public:
  /// Converts the devices in use. What is wrong with them is emitted.
  explicit Devices(mlir::Operation *module);

  /// The device that `function` runs on. If it has none that is usable, emits
  /// why (unless that device has had its errors already) and returns null.
  const Device *require(mlir::Operation *function) const;

private:
  llvm::DenseMap<mlir::Operation *, const Device *> byFunction;
  llvm::DenseMap<mlir::Operation *, std::unique_ptr<Device>> byOp;
  /// Functions whose device is unknown or wrong, which has been said.
  llvm::DenseSet<mlir::Operation *> reported;
};

/// The functions below (or at) `root` that contain timed operations, in order.
llvm::SmallVector<mlir::Operation *> timedFunctions(mlir::Operation *root);

} // namespace lull

#endif // LULL_ANALYSIS_DEVICES_H
