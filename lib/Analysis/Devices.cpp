//===- Devices.cpp - The devices of a module, converted once ----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"

#include "mlir/Interfaces/FunctionInterfaces.h"

using namespace lull;
using namespace mlir;

SmallVector<Operation *> lull::timedFunctions(Operation *root) {
  SmallVector<Operation *> functions;
  root->walk<WalkOrder::PreOrder>([&](Operation *op) {
    if (!isa<FunctionOpInterface>(op))
      return WalkResult::advance();
    bool timed = op->walk([](TimedOpInterface) {
                     return WalkResult::interrupt();
                   }).wasInterrupted();
    if (timed)
      functions.push_back(op);
    return WalkResult::skip();
  });
  return functions;
}

Devices::Devices(Operation *module) {
  // Many functions, few devices.
  DenseMap<std::pair<Operation *, StringAttr>, DeviceOp> resolved;
  auto resolve = [&](Operation *holder, FlatSymbolRefAttr symbol) {
    Operation *scope = SymbolTable::getNearestSymbolTable(holder);
    auto [place, isNew] = resolved.try_emplace({scope, symbol.getAttr()});
    if (isNew)
      place->second = resolveDevice(holder, symbol);
    return place->second;
  };
  for (Operation *function : timedFunctions(module)) {
    FlatSymbolRefAttr symbol;
    Operation *holder = deviceHolder(function, symbol);
    if (!holder)
      continue;
    DeviceOp op = resolve(holder, symbol);
    // A2: a device that there is.
    if (!op) {
      function->emitError("unknown device ") << symbol;
      reported.insert(function);
      continue;
    }
    auto [place, isNew] = byOp.try_emplace(op);
    if (isNew)
      if (FailureOr<Device> device = buildDevice(op); succeeded(device))
        place->second = std::make_unique<Device>(std::move(*device));
    if (place->second)
      byFunction[function] = place->second.get();
    else
      reported.insert(function);
  }
}

const Device *Devices::require(Operation *function) const {
  if (const Device *device = byFunction.lookup(function))
    return device;
  // W1: a device.
  if (!reported.contains(function))
    function->emitError("runs on no device: name one by the attribute "
                        "'lull.device' or with lull-use-device");
  return nullptr;
}
