//===- UseDevice.cpp - lull-use-device --------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/IR/DeviceBuilder.h"
#include "lull/Transforms/DemoDevices.h"
#include "lull/Transforms/Passes.h"

#include "mlir/IR/OperationSupport.h"
#include "mlir/Parser/Parser.h"
#include "llvm/Support/MemoryBuffer.h"
#include "llvm/Support/SourceMgr.h"

namespace lull {
#define GEN_PASS_DEF_LULLUSEDEVICE
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct UseDevicePass : public lull::impl::LullUseDeviceBase<UseDevicePass> {
  using LullUseDeviceBase::LullUseDeviceBase;

  LogicalResult initialize(MLIRContext *context) override;
  void runOnOperation() override;

private:
  /// The text's one device.
  FailureOr<OwningOpRef<ModuleOp>> parse(llvm::SourceMgr &source);
  FailureOr<OwningOpRef<ModuleOp>> read();
  /// Puts the device into the module unless the same is there.
  FailureOr<DeviceOp> link(DeviceOp device);
  FailureOr<DeviceOp> findByName();
};

} // namespace

LogicalResult UseDevicePass::initialize(MLIRContext *context) {
  // W17: one of the two.
  if (file.empty() && name.empty())
    return emitError(UnknownLoc::get(context))
           << "lull-use-device needs a file or the name of a device";
  if (!file.empty() && !name.empty())
    return emitError(UnknownLoc::get(context))
           << "lull-use-device takes a file or a name, not both";
  return success();
}

FailureOr<OwningOpRef<ModuleOp>> UseDevicePass::parse(llvm::SourceMgr &source) {
  // The diagnostics of the file need its text while they are printed.
  SourceMgrDiagnosticHandler handler(source, &getContext());
  auto parsed = parseSourceFile<ModuleOp>(source, ParserConfig(&getContext()));
  if (!parsed)
    return failure();
  SmallVector<DeviceOp> found(parsed->getOps<DeviceOp>());
  // W19: one device.
  if (found.size() == 1) {
    // W27: and nothing else, which would be dropped in silence.
    for (Operation &op : *parsed->getBody())
      if (!isa<DeviceOp>(op))
        return op.emitError("has no place in a device file, which holds one "
                            "lull.device");
    return parsed;
  }
  InFlightDiagnostic diag = parsed->emitError("holds ")
                            << found.size()
                            << " devices when it should hold one";
  for (DeviceOp device : found)
    diag.attachNote(device.getLoc()) << "a device is here";
  return diag;
}

FailureOr<OwningOpRef<ModuleOp>> UseDevicePass::read() {
  auto buffer = llvm::MemoryBuffer::getFileOrSTDIN(file);
  // W18: a file.
  if (!buffer)
    return getOperation().emitError("cannot open the device file '")
           << file << "': " << buffer.getError().message();
  llvm::SourceMgr source;
  source.AddNewSourceBuffer(std::move(*buffer), SMLoc());
  return parse(source);
}

FailureOr<DeviceOp> UseDevicePass::link(DeviceOp device) {
  ModuleOp module = getOperation();
  Operation *there = module.lookupSymbol(device.getSymName());
  if (!there) {
    OpBuilder builder(module.getBodyRegion());
    return cast<DeviceOp>(builder.clone(*device));
  }
  // W21: the same device.
  if (OperationEquivalence::isEquivalentTo(
          there, device, OperationEquivalence::IgnoreLocations))
    return cast<DeviceOp>(there);
  InFlightDiagnostic diag = there->emitError("@")
                            << device.getSymName()
                            << " is in the module already and differs from "
                               "the device to be used";
  diag.attachNote(device.getLoc()) << "the device to be used";
  return diag;
}

FailureOr<DeviceOp> UseDevicePass::findByName() {
  ModuleOp module = getOperation();
  Operation *there = module.lookupSymbol(name);
  if (auto device = dyn_cast_or_null<DeviceOp>(there))
    return device;
  if (const DemoDevice *demo = findDemoDevice(name)) {
    llvm::SourceMgr source;
    source.AddNewSourceBuffer(
        llvm::MemoryBuffer::getMemBuffer(demo->text, (name + " (built in)")),
        SMLoc());
    FailureOr<OwningOpRef<ModuleOp>> parsed = parse(source);
    if (failed(parsed))
      return failure();
    return link(*(*parsed)->getOps<DeviceOp>().begin());
  }
  // W20: a device.
  InFlightDiagnostic diag = module.emitError("unknown device '")
                            << name << "': built in are ";
  llvm::interleaveComma(demoDevices(), diag,
                        [&](const DemoDevice &demo) { diag << demo.name; });
  return diag;
}

void UseDevicePass::runOnOperation() {
  FailureOr<DeviceOp> device = failure();
  if (!file.empty()) {
    FailureOr<OwningOpRef<ModuleOp>> parsed = read();
    if (succeeded(parsed))
      device = link(*(*parsed)->getOps<DeviceOp>().begin());
  } else {
    device = findByName();
  }
  if (failed(device))
    return signalPassFailure();
  auto symbol = FlatSymbolRefAttr::get(device->getSymNameAttr());
  for (Operation *function : timedFunctions(getOperation())) {
    // One that runs on another device says so, itself or by its module.
    FlatSymbolRefAttr named;
    if (!deviceHolder(function, named))
      function->setAttr(LullDialect::deviceAttrName, symbol);
  }
}
