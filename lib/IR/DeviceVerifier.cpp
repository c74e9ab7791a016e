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

/// Constraints Q3 to Q5 and T3, over one function.
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
    if (site && !device.hasSite(*site) && missing.insert(*site).second) {
      ++errors;
      emitNoSite(op, *site, device);
    }
  }
  if (known && on.size() == 2) {
    SiteId first = *on[0], second = *on[1];
    if (first == second)
      error(op) << "both qubits are on site " << first;
    else if (op.getOperationKind() == OperationKind::Gate &&
             !device.coupled(first, second))
      error(op) << "sites " << first << " and " << second << " of device '"
                << device.name() << "' are not coupled";
  }
  // A number of dt is always on the clock.
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
