//===- PulseWriter.h - Pulses as operations ---------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_PULSEWRITER_H
#define LULL_TRANSFORMS_PULSEWRITER_H

#include "lull/IR/Interfaces.h"
#include "lull/Sequence/Native.h"

#include "mlir/IR/Builders.h"

#include <memory>

namespace lull {

/// Writes pulses in the operations that a device has, with the frame changes
/// that they need. Frame changes between the pulses of a window are merged: the
/// frame stands off the program's from one pulse to the next and is closed by
/// the last. For one function, one thread.
class PulseWriter {
public:
  PulseWriter(mlir::OpBuilder &builder, const Device &device)
      : builder(builder), device(device) {}

  /// How the device plays a pulse of this phase (units of pi) on a site.
  llvm::Expected<const NativePulse *> resolve(SiteId site, Fraction phase);

  /// Writes one pulse on a qubit at the builder's place; returns the qubit from
  /// there on, or null if the host could not build it and said so. `last`
  /// closes the frame.
  mlir::Value play(mlir::Location loc, mlir::Value qubit, SiteId site,
                   const NativePulse &pulse, bool last);

  /// Whether any site's frame stands off the program's.
  bool anyOpen() const { return openFrames != 0; }
  /// Emits an error at the pulse that left a frame open, for each that is open
  /// at the end of the program; fails if there is one.
  llvm::LogicalResult requireClosed() const;
  /// Closes the frame of a site, if it is open, at the builder's place; null as
  /// above.
  mlir::Value close(mlir::Location loc, mlir::Value qubit, SiteId site);

private:
  /// A frame that differs from the program's, open between two pulses.
  struct OpenFrame {
    /// What has been added, in units of pi, in [0, 2).
    Fraction frame = 0;
    const OperationEntry *entry = nullptr;
    /// The last place where it was changed.
    std::optional<mlir::Location> changed;
  };

  /// Changes the frame so that it is `target` off the program's.
  mlir::Value changeFrame(mlir::Location loc, mlir::Value qubit,
                          OpenFrame &open, Fraction target,
                          const OperationEntry *entry);
  mlir::StringAttr nameOf(const OperationEntry *entry);

  mlir::OpBuilder &builder;
  const Device &device;
  llvm::DenseMap<SiteId, OpenFrame> frames;
  int openFrames = 0;
  llvm::DenseMap<const OperationEntry *, mlir::StringAttr> names;
  /// By site and by the phase's numerator and denominator.
  llvm::DenseMap<std::pair<SiteId, std::pair<std::int64_t, std::int64_t>>,
                 std::unique_ptr<NativePulse>>
      pulses;
};

} // namespace lull

#endif // LULL_TRANSFORMS_PULSEWRITER_H
