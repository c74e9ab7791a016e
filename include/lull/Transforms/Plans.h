//===- Plans.h - Plans made ready to be played ------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_PLANS_H
#define LULL_TRANSFORMS_PLANS_H

#include "lull/IR/Ops.h"
#include "lull/Sequence/Native.h"
#include "lull/Sequence/Placement.h"
#include "lull/Sequence/Sequence.h"

#include <map>
#include <memory>
#include <vector>

namespace lull {

/// The plain sequence of a `lull.sequence` op, before it is closed if it asks
/// for that. Fails if it is neither the identity nor can be closed.
llvm::Expected<Sequence> buildSequence(SequenceOp op);

/// A plan on sites that play its pulses alike: what is played, how wide the
/// pulses are, and the placements asked for so far.
class Player {
public:
  Player(std::shared_ptr<const Sequence> played, std::vector<Ticks> widths)
      : played(std::move(played)), pulseWidths(std::move(widths)) {}

  /// The sequence with its repeats, closed.
  const Sequence &sequence() const { return *played; }
  llvm::ArrayRef<Ticks> widths() const { return pulseWidths; }

  /// The shortest window that holds the pulses.
  Ticks least(const GridWindow &grid);
  /// The placement in a window, which must be long enough.
  llvm::Expected<const Placement *> place(const GridWindow &window);

private:
  std::shared_ptr<const Sequence> played;
  std::vector<Ticks> pulseWidths;
  /// By the window's start modulo the step.
  llvm::DenseMap<Ticks, Ticks> leastByStart;
  /// By the same and the window's length.
  llvm::DenseMap<std::pair<Ticks, Ticks>, std::unique_ptr<Placement>> placed;
};

/// Looks up plans and keeps what it found: windows repeat, plans hardly differ.
/// For one function, one thread.
class Plans {
public:
  /// `scope`: where symbols of sequences are looked up from.
  Plans(const Device &device, mlir::Operation *scope)
      : device(device), scope(scope) {}

  /// The sequence of a plan before repeats and closing: its pulse count decides
  /// how many repeats a spacing asks for. Fails if unknown or no identity.
  llvm::Expected<const Sequence *> base(mlir::Attribute sequence);

  /// A plan as it is played on a site. Fails naming what is unknown or missing.
  llvm::Expected<Player *> player(PlanAttr plan, SiteId site);

  /// The grid of the device, for a window.
  GridWindow window(Ticks start, Ticks length) const {
    return {start, length, device.step(), device.leastGap()};
  }

private:
  llvm::Expected<std::shared_ptr<const Sequence>> played(PlanAttr plan);
  llvm::Expected<Ticks> width(SiteId site, Fraction phase);

  const Device &device;
  mlir::Operation *scope;
  llvm::DenseMap<mlir::Attribute, std::unique_ptr<Sequence>> bases;
  llvm::DenseMap<PlanAttr, std::shared_ptr<const Sequence>> sequences;
  llvm::DenseMap<std::pair<PlanAttr, SiteId>, Player *> bySite;
  std::map<std::pair<const Sequence *, std::vector<Ticks>>,
           std::unique_ptr<Player>>
      players;
  /// By site and phase.
  llvm::DenseMap<std::pair<SiteId, std::pair<std::int64_t, std::int64_t>>,
                 Ticks>
      widths;
};

} // namespace lull

#endif // LULL_TRANSFORMS_PLANS_H
