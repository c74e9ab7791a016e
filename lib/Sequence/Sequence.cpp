//===- Sequence.cpp - A decoupling sequence as data -----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Sequence.h"

#include "lull/Sequence/Catalogue.h"
#include "lull/Timing/Fault.h"

#include "llvm/ADT/StringExtras.h"

using namespace lull;

/// (block + instant) / repeats.
static llvm::Expected<Instant> placeInBlock(const Instant &instant,
                                            unsigned block, unsigned repeats) {
  if (!instant.exact)
    return Instant::at((block + instant.value) / repeats);
  std::optional<Fraction> moved = instant.exact->plus(block);
  if (moved)
    moved = moved->over(repeats);
  if (!moved)
    return fault("the instant {} in repeat {} of {} does not fit 64 bits",
                 instant.exact->str(), block + 1, repeats);
  return Instant::at(*moved);
}

/// The opposite axis: the phase (in [0, 2)) plus pi.
static llvm::Expected<Fraction> opposite(Fraction phase) {
  std::optional<Fraction> turned =
      phase < Fraction(1) ? phase.plus(1) : phase.minus(1);
  if (!turned)
    return fault("the phase {} + 1 does not fit 64 bits", phase.str());
  return *turned;
}

llvm::Expected<Sequence> lull::repeat(const Sequence &sequence,
                                      unsigned repeats, bool alternateSigns) {
  if (repeats == 0)
    return fault("'{}' is repeated 0 times when it should be at least once",
                 sequence.name);
  if (repeats == 1)
    return sequence;
  if (std::uint64_t(sequence.size()) * repeats > MostPulses)
    return fault("{} pulses of '{}', {} times, are more than {}",
                 sequence.size(), sequence.name, repeats, MostPulses);

  Sequence result;
  result.name = fmt::format("{} x{}{}", sequence.name, repeats,
                            alternateSigns ? " alternating" : "");
  result.anchor = sequence.anchor;
  result.phases.reserve(sequence.size() * repeats);
  result.instants.reserve(sequence.size() * repeats);
  for (unsigned block = 0; block < repeats; ++block)
    for (size_t i = 0; i < sequence.size(); ++i) {
      llvm::Expected<Instant> instant =
          placeInBlock(sequence.instants[i], block, repeats);
      if (!instant)
        return instant.takeError();
      result.instants.push_back(*instant);
      Fraction phase = sequence.phases[i];
      if (alternateSigns && block % 2 == 1) {
        llvm::Expected<Fraction> turned = opposite(phase);
        if (!turned)
          return turned.takeError();
        phase = *turned;
      }
      result.phases.push_back(phase);
    }
  return result;
}

std::string lull::spellPhase(Fraction phase) {
  if (phase.denominator() > 2)
    return phase.str();
  static const char *const axes[] = {"X", "Y", "-X", "-Y"};
  Fraction turn = phase.modulo(2);
  return axes[turn.numerator() * (2 / turn.denominator())];
}

std::string lull::spellWord(const Sequence &sequence) {
  return llvm::join(llvm::map_range(sequence.phases, spellPhase), " ");
}
