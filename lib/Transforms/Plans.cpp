//===- Plans.cpp - Plans made ready to be played ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Transforms/Plans.h"

#include "lull/Sequence/Catalogue.h"
#include "lull/Sequence/Net.h"
#include "lull/Timing/Fault.h"

#include "mlir/IR/SymbolTable.h"

using namespace lull;
using namespace mlir;

llvm::Expected<Sequence> lull::buildSequence(SequenceOp op) {
  Sequence sequence;
  sequence.name = ("@" + op.getSymName()).str();
  for (FractionAttr phase : op.getPhases().getAsRange<FractionAttr>())
    sequence.phases.push_back(phase.getValue().modulo(2));
  if (std::optional<ArrayAttr> instants = op.getInstants()) {
    for (FractionAttr instant : instants->getAsRange<FractionAttr>())
      sequence.instants.push_back(Instant::at(instant.getValue()));
  } else {
    // U8, W10: a formula, and not too many pulses for it.
    auto instantsOrError =
        instantsByFormula(*op.getFormula(), sequence.phases.size());
    if (!instantsOrError)
      return instantsOrError.takeError();
    sequence.instants = std::move(*instantsOrError);
  }
  sequence.anchor = anchorOf(sequence.instants);
  // W10: as many pulses as a sequence of the catalogue may have.
  if (sequence.size() >= MostPulses)
    return fault("sequence {} has {} pulses when it may have {}", sequence.name,
                 sequence.size(), MostPulses - 1);
  llvm::Expected<Net> net = netBySum(sequence.phases);
  if (!net)
    return net.takeError();
  if (net->kind == Net::Kind::Identity)
    return sequence;
  // U9: the identity.
  if (!op.getClosed())
    return fault("sequence {} multiplies to {} when it should be the identity "
                 "(a sequence with an odd number of pulses may be 'closed')",
                 sequence.name, net->str());
  // U10: closed by one pulse.
  // Whether it can be closed shows here; it is closed when its repeats are
  // known, as one of the catalogue is.
  llvm::Expected<Sequence> closed = close(sequence);
  if (!closed)
    return closed.takeError();
  return sequence;
}

//===----------------------------------------------------------------------===//
// Player
//===----------------------------------------------------------------------===//

Ticks Player::least(const GridWindow &grid) {
  Ticks offset = grid.start - alignDown(grid.start, grid.step);
  auto [place, isNew] = leastByStart.try_emplace(offset);
  if (isNew)
    place->second = leastWindow(pulseWidths, grid);
  return place->second;
}

llvm::Expected<const Placement *> Player::place(const GridWindow &window) {
  Ticks offset = window.start - alignDown(window.start, window.step);
  std::unique_ptr<Placement> &entry = placed[{offset, window.length}];
  if (!entry) {
    llvm::Expected<Placement> placement =
        lull::place(*played, pulseWidths, window);
    if (!placement)
      return placement.takeError();
    entry = std::make_unique<Placement>(std::move(*placement));
  }
  return entry.get();
}

//===----------------------------------------------------------------------===//
// Plans
//===----------------------------------------------------------------------===//

llvm::Expected<const Sequence *> Plans::base(Attribute sequence) {
  std::unique_ptr<Sequence> &entry = bases[sequence];
  if (entry)
    return entry.get();
  auto keep =
      [&](llvm::Expected<Sequence> made) -> llvm::Expected<const Sequence *> {
    if (!made)
      return made.takeError();
    entry = std::make_unique<Sequence>(std::move(*made));
    return entry.get();
  };
  if (auto name = dyn_cast<StringAttr>(sequence))
    // W8, W9, W10: a member of a family of the catalogue.
    return keep(findSequence(name.getValue()));
  auto symbol = cast<FlatSymbolRefAttr>(sequence);
  auto op = SymbolTable::lookupNearestSymbolFrom<SequenceOp>(scope, symbol);
  // W11: a sequence.
  if (!op)
    return fault("unknown sequence @{}", symbol.getValue().str());
  return keep(buildSequence(op));
}

llvm::Expected<std::shared_ptr<const Sequence>> Plans::played(PlanAttr plan) {
  std::shared_ptr<const Sequence> &entry = sequences[plan];
  if (entry)
    return entry;
  llvm::Expected<const Sequence *> once = base(plan.getSequence());
  if (!once)
    return once.takeError();
  // W10: not too many pulses.
  llvm::Expected<Sequence> repeated =
      repeat(**once, plan.getRepeats(), plan.getAlternating());
  if (!repeated)
    return repeated.takeError();
  llvm::Expected<Sequence> closed = close(*repeated);
  if (!closed)
    return closed.takeError();
  return entry = std::make_shared<const Sequence>(std::move(*closed));
}

llvm::Expected<Ticks> Plans::width(SiteId site, Fraction phase) {
  auto key = std::pair(site, std::pair(phase.numerator(), phase.denominator()));
  if (auto known = widths.find(key); known != widths.end())
    return known->second;
  // W12, W16: a pulse that the device has.
  llvm::Expected<NativePulse> pulse = nativePulse(device, site, phase);
  if (!pulse)
    return pulse.takeError();
  return widths[key] = pulse->width;
}

llvm::Expected<Player *> Plans::player(PlanAttr plan, SiteId site) {
  Player *&entry = bySite[{plan, site}];
  if (entry)
    return entry;
  llvm::Expected<std::shared_ptr<const Sequence>> sequence = played(plan);
  if (!sequence)
    return sequence.takeError();
  std::vector<Ticks> pulses;
  for (Fraction phase : (*sequence)->phases) {
    llvm::Expected<Ticks> ticks = width(site, phase);
    if (!ticks)
      return ticks.takeError();
    pulses.push_back(*ticks);
  }
  std::unique_ptr<Player> &player = players[{sequence->get(), pulses}];
  if (!player)
    player = std::make_unique<Player>(*sequence, std::move(pulses));
  return entry = player.get();
}
