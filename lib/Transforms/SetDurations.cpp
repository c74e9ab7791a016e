//===- SetDurations.cpp - lull-set-durations --------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/IR/QubitSites.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"

namespace lull {
#define GEN_PASS_DEF_LULLSETDURATIONS
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

struct SetDurationsPass
    : public lull::impl::LullSetDurationsBase<SetDurationsPass> {
  using LullSetDurationsBase::LullSetDurationsBase;

  void runOnOperation() override;

private:
  LogicalResult setAll(Operation *function, const Device &device);
};

/// Whether the device gives this operation its duration.
bool isListed(OperationKind kind) {
  return kind == OperationKind::Gate || kind == OperationKind::Measure ||
         kind == OperationKind::Reset;
}

} // namespace

LogicalResult SetDurationsPass::setAll(Operation *function,
                                       const Device &device) {
  QubitSites sites(function);
  DenseMap<StringAttr, const Device::NamedEntries *> byName;
  SmallVector<SiteId, 4> on;
  bool anyFailed = false;
  function->walk([&](TimedOpInterface op) {
    if (failed(sites.read(op, device, on))) {
      anyFailed = true;
      return WalkResult::interrupt();
    }
    if (!isListed(op.getOperationKind()) ||
        (op.getDuration().isSet() && !replace))
      return WalkResult::advance();
    StringAttr name = op.getListedName();
    auto [place, isNew] = byName.try_emplace(name);
    if (isNew)
      place->second = device.named(name);
    const OperationEntry *entry =
        place->second ? device.find(place->second, on) : nullptr;
    // W6: an entry.
    if (!entry) {
      anyFailed = true;
      op->emitError(llvm::toString(device.require(name, on).takeError()));
      return WalkResult::advance();
    }
    op.setDuration(Duration::ticks(entry->duration));
    return WalkResult::advance();
  });
  return failure(anyFailed);
}

void SetDurationsPass::runOnOperation() {
  const Devices &devices = getAnalysis<Devices>();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *function, AnalysisManager, Remarks &) -> LogicalResult {
        const Device *device = devices.require(function);
        return failure(!device || failed(setAll(function, *device)));
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
