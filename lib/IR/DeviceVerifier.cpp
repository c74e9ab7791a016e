//===- DeviceVerifier.cpp - A function against its device -------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/DeviceBuilder.h"
#include "lull/IR/QubitSites.h"

#include "llvm/ADT/DenseSet.h"

using namespace lull;
using namespace mlir;

namespace {

/// What depends on the device, over one function.
class Verifier {
public:
  Verifier(Operation *function, const Device &device)
      : function(function), device(device), sites(function) {}

  LogicalResult run();

private:
  /// Errors after which the rest is not reported.
  static constexpr unsigned mostErrors = 10;

  void checkOp(TimedOpInterface op);
  InFlightDiagnostic error(Operation *op) {
    ++errors;
    return op->emitError();
  }

  Operation *function;
  const Device &device;
  QubitSites sites;
  SmallVector<std::optional<SiteId>, 4> on;
  /// Sites that the device lacks, each said once.
  llvm::DenseSet<SiteId> missing;
  unsigned errors = 0;
};

} // namespace

void Verifier::checkOp(TimedOpInterface op) {
  sites.read(op, on);
  bool known = true;
  for (std::optional<SiteId> site : on) {
    known &= site && device.hasSite(*site);
    // Q3: a site of the device.
    if (site && !device.hasSite(*site) && missing.insert(*site).second) {
      ++errors;
      emitNoSite(op, *site, device);
    }
  }
  if (known && on.size() == 2) {
    SiteId first = *on[0], second = *on[1];
    // Q4, Q5: two sites, and coupled if a gate is to act on them.
    if (first == second)
      error(op) << "both qubits are on site " << first;
    else if (op.getOperationKind() == OperationKind::Gate &&
             !device.coupled(first, second))
      error(op) << "sites " << first << " and " << second << " of device '"
                << device.name() << "' are not coupled";
  }
  if (known && on.size() > 2) {
    llvm::SmallDenseSet<SiteId, 8> seen;
    // Q4: the same for more of them.
    for (std::optional<SiteId> site : on)
      if (!seen.insert(*site).second)
        error(op) << "acts twice on site " << *site;
  }
  // T3, T8: on the clock, as every number of dt is.
  Duration duration = op.getDuration();
  if (!duration.isSet() || duration.unit() == TimeUnit::dt)
    return;
  if (llvm::Expected<Ticks> ticks = device.clock().toTicks(duration); !ticks)
    error(op) << llvm::toString(ticks.takeError());
}

LogicalResult Verifier::run() {
  function->walk<WalkOrder::PreOrder>([&](Operation *op) {
    if (auto timed = dyn_cast<TimedOpInterface>(op))
      checkOp(timed);
    return errors < mostErrors ? WalkResult::advance()
                               : WalkResult::interrupt();
  });
  return failure(errors);
}

LogicalResult lull::verifyAgainstDevice(Operation *function,
                                        const Device &device) {
  return Verifier(function, device).run();
}
