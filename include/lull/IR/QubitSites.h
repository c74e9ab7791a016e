//===- QubitSites.h - Which site a qubit value stands for -------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_QUBITSITES_H
#define LULL_IR_QUBITSITES_H

#include "lull/IR/Interfaces.h"

#include "llvm/ADT/DenseMap.h"

namespace lull {

/// The site of a qubit value that no timed operation carries on: by its host,
/// or by the argument attribute `lull.site` of `function`. Nothing if the
/// program does not say.
std::optional<SiteId> originOf(mlir::Value qubit, mlir::Operation *function);

/// Emits why the site of `qubit`, which `user` takes, is unknown.
mlir::InFlightDiagnostic emitUnknownSite(mlir::Operation *user,
                                         mlir::Value qubit);
/// Emits that a device does not have a site.
mlir::InFlightDiagnostic emitNoSite(mlir::Operation *at, SiteId site,
                                    const Device &device);

/// Follows qubits through the operations of a function, in program order.
class QubitSites {
public:
  explicit QubitSites(mlir::Operation *function) : function(function) {}

  /// The sites of an operation's qubits, in its order; then carries them on.
  void read(TimedOpInterface op,
            llvm::SmallVectorImpl<std::optional<SiteId>> &sites);
  /// The same, all of them on `device`; emits an error if that is not so.
  llvm::LogicalResult read(TimedOpInterface op, const Device &device,
                           llvm::SmallVectorImpl<SiteId> &sites);

  /// Says that `to` stands for what `from` stood for, since the caller has
  /// replaced an operation that was read.
  void carryOn(mlir::Value from, mlir::Value to) {
    auto place = known.find(from);
    if (from == to || place == known.end())
      return;
    std::optional<SiteId> site = place->second;
    known.erase(place);
    known[to] = site;
  }

private:
  mlir::Operation *function;
  llvm::DenseMap<mlir::Value, std::optional<SiteId>> known;
  llvm::SmallVector<mlir::OpOperand *, 4> operands;
  llvm::SmallVector<std::optional<SiteId>, 4> scratch;
};

} // namespace lull

#endif // LULL_IR_QUBITSITES_H
