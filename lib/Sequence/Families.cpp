//===- Families.cpp - How catalogue members are made ----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Families.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/bit.h"

#include <tuple>

using namespace lull;

//===----------------------------------------------------------------------===//
// Orders
//===----------------------------------------------------------------------===//

llvm::Error lull::tooManyPulses(llvm::StringRef name) {
  return fault("'{}' has more than {} pulses", name.str(), MostPulses);
}

/// Any number from 1, or an even number from a given one.
enum class Parity { Any, Even };

static llvm::Error checkOrders(llvm::StringRef stem, Orders orders,
                               size_t count, unsigned least = 1,
                               Parity parity = Parity::Any) {
  if (orders.size() != count)
    return fault("number of orders of '{}' is {} when it should be {}",
                 stem.str(), orders.size(), count);
  for (unsigned order : orders)
    if (order < least || (parity == Parity::Even && order % 2 != 0))
      return fault("order {} of '{}' is out of range: it takes {} number from "
                   "{}",
                   order, stem.str(), parity == Parity::Even ? "an even" : "a",
                   least);
  return llvm::Error::success();
}

//===----------------------------------------------------------------------===//
// Words and formulas of instants
//===----------------------------------------------------------------------===//

static constexpr Fraction PhaseX = 0;
static Fraction phaseY() { return Fraction::of(1, 2); }

/// Puts instants to a name and phases.
static llvm::Expected<Sequence> assemble(std::string name,
                                         std::vector<Fraction> phases,
                                         llvm::StringRef formula) {
  llvm::Expected<std::vector<Instant>> instants =
      instantsByFormula(formula, phases.size());
  if (!instants)
    return instants.takeError();
  Anchor anchor = anchorOf(*instants);
  return Sequence{std::move(name), std::move(phases), std::move(*instants),
                  anchor};
}

llvm::Expected<Sequence> lull::fixedWord(llvm::StringRef stem, Orders orders,
                                         llvm::StringRef word,
                                         llvm::StringRef formula) {
  if (llvm::Error error = checkOrders(stem, orders, 0))
    return std::move(error);
  std::vector<Fraction> phases;
  for (llvm::StringRef rest = word, letter; !rest.empty();) {
    std::tie(letter, rest) = rest.split(' ');
    Fraction phase = letter.ends_with("Y") ? phaseY() : PhaseX;
    if (letter.starts_with("-"))
      phase = Fraction::of(phase.numerator() + phase.denominator(),
                           phase.denominator());
    phases.push_back(phase);
  }
  return assemble(stem.str(), std::move(phases), formula);
}

llvm::Expected<Sequence> lull::uniform(llvm::StringRef stem, Orders orders,
                                       llvm::StringRef formula) {
  if (llvm::Error error = checkOrders(stem, orders, 1))
    return std::move(error);
  std::string name = fmt::format("{}-{}", stem.str(), orders[0]);
  if (orders[0] > MostPulses)
    return tooManyPulses(name);
  return assemble(name, std::vector<Fraction>(orders[0], PhaseX), formula);
}

/// A word five pulses long, for phases 0, pi/2, 0, pi/2 (in units of pi/6).
llvm::Expected<Sequence> lull::knillTwenty(Orders orders) {
  if (llvm::Error error = checkOrders("kdd-20", orders, 0))
    return std::move(error);
  std::vector<Fraction> phases;
  for (unsigned shift : {0, 3, 0, 3})
    for (unsigned phase : {1, 0, 3, 0, 1})
      phases.push_back(Fraction::of(shift + phase, 6));
  return assemble("kdd-20", std::move(phases), "centred");
}

/// phi_k = (k-1)(k-2)/2 Phi + (k-1) phi_2. With phi_2 = Phi, which makes the
/// word a palindrome, this is k(k-1)/2 Phi.
llvm::Expected<Sequence> lull::universallyRobust(Orders orders) {
  if (llvm::Error error = checkOrders("ur", orders, 1, 4, Parity::Even))
    return std::move(error);
  std::uint64_t n = orders[0];
  std::string name = fmt::format("ur-{}", n);
  if (n > MostPulses)
    return tooManyPulses(name);
  // Phi = 1/m for n = 4m, and 2m/(2m+1) for n = 4m+2 = 2(2m+1).
  std::uint64_t numerator = n % 4 == 0 ? 1 : n / 2 - 1;
  std::uint64_t denominator = n % 4 == 0 ? n / 4 : n / 2;
  std::vector<Fraction> phases;
  for (std::uint64_t k = 1; k <= n; ++k)
    phases.push_back(Fraction::of(
        k * (k - 1) / 2 * numerator % (2 * denominator), denominator));
  return assemble(name, std::move(phases), "centred");
}

//===----------------------------------------------------------------------===//
// Nested instants
//===----------------------------------------------------------------------===//

/// Appends a pulse at slot / slots of the window.
static void addAtSlot(Sequence &sequence, Fraction phase, std::uint64_t slot,
                      std::uint64_t slots) {
  sequence.phases.push_back(phase);
  sequence.instants.push_back(Instant::at(Fraction::of(slot, slots)));
}

/// C_l = C_{l-1} X C_{l-1} Y C_{l-1} X C_{l-1} Y, with C_0 a free interval.
/// Where blocks end together their pulses coincide: the innermost acts first,
/// equal ones cancel, and a Y with an X makes a Z, which must be played: a
/// frame change instead of it would decouple nothing.
llvm::Expected<Sequence> lull::concatenated(Orders orders) {
  if (llvm::Error error = checkOrders("cdd", orders, 1))
    return std::move(error);
  unsigned level = orders[0];
  Sequence result{fmt::format("cdd-{}", level), {}, {}, Anchor::Centre};
  // Level 7 has 4^7 slots, 15 of 16 with a pulse.
  if (level > 6)
    return tooManyPulses(result.name);
  std::uint64_t slots = std::uint64_t(1) << (2 * level);
  for (std::uint64_t slot = 1; slot <= slots; ++slot) {
    // After the quarters 1, 2, 3, 4 of a block come X, Y, X, Y; quarter 4 also
    // ends a quarter of the next larger block.
    bool hasX = false, hasY = false;
    std::uint64_t quarter = slot;
    for (unsigned i = 0; i < level; ++i, quarter /= 4) {
      bool &has = quarter % 2 == 1 ? hasX : hasY;
      has = !has;
      if (quarter % 4 != 0)
        break;
    }
    if (hasY)
      addAtSlot(result, phaseY(), slot, slots);
    if (hasX)
      addAtSlot(result, PhaseX, slot, slots);
  }
  result.anchor = anchorOf(result.instants);
  return result;
}

/// The flips of the Thue-Morse function: between slots k - 1 and k (counted
/// from 0) if the numbers of ones in k - 1 and in k differ by an odd number,
/// that is, if k has an even number of trailing zeros.
llvm::Expected<Sequence> lull::concatenatedOneAxis(Orders orders) {
  if (llvm::Error error = checkOrders("cdd-axis", orders, 1))
    return std::move(error);
  unsigned level = orders[0];
  Sequence result{fmt::format("cdd-axis-{}", level), {}, {}, Anchor::Centre};
  // Two of three slots begin with a flip: 2/3 2^14 is too many.
  if (level > 13)
    return tooManyPulses(result.name);
  std::uint64_t slots = std::uint64_t(1) << level;
  for (std::uint64_t slot = 1; slot < slots; ++slot)
    if (llvm::countr_zero(slot) % 2 == 0)
      addAtSlot(result, PhaseX, slot, slots);
  return result;
}

/// lower + (upper - lower) inner, exactly where all three are exact.
static Instant nest(const Instant &lower, const Instant &upper,
                    const Instant &inner) {
  if (lower.exact && upper.exact && inner.exact)
    if (std::optional<Fraction> span = upper.exact->minus(*lower.exact))
      if (std::optional<Fraction> offset = span->times(*inner.exact))
        if (std::optional<Fraction> sum = lower.exact->plus(*offset))
          return Instant::at(*sum);
  return Instant::at(lower.value + (upper.value - lower.value) * inner.value);
}

/// 1 - instant.
static Instant mirrored(const Instant &instant) {
  if (instant.exact)
    if (std::optional<Fraction> rest = Fraction(1).minus(*instant.exact))
      return Instant::at(*rest);
  return Instant::at(1 - instant.value);
}

/// Uhrig's instants of X, and in each interval between them Uhrig's instants
/// of Y. Odd orders would need pulses at the ends of intervals as well.
llvm::Expected<Sequence> lull::quadratic(Orders orders) {
  if (llvm::Error error = checkOrders("qdd", orders, 2, 2, Parity::Even))
    return std::move(error);
  std::uint64_t inner = orders[0], outer = orders[1];
  Sequence result{
      fmt::format("qdd-{}-{}", inner, outer), {}, {}, Anchor::Centre};
  if (inner * (outer + 1) + outer > MostPulses)
    return tooManyPulses(result.name);
  llvm::Expected<std::vector<Instant>> innerInstants =
      instantsByFormula("uhrig", inner);
  if (!innerInstants)
    return innerInstants.takeError();
  llvm::Expected<std::vector<Instant>> outerInstants =
      instantsByFormula("uhrig", outer);
  if (!outerInstants)
    return outerInstants.takeError();

  outerInstants->push_back(Instant::at(Fraction(1)));
  Instant lower = Instant::at(Fraction(0));
  for (const Instant &upper : *outerInstants) {
    for (const Instant &instant : *innerInstants) {
      result.phases.push_back(phaseY());
      result.instants.push_back(nest(lower, upper, instant));
    }
    result.phases.push_back(PhaseX);
    result.instants.push_back(upper);
    lower = upper;
  }
  // The end of the window closes the last interval without a pulse.
  result.phases.pop_back();
  result.instants.pop_back();
  // Rounding must not break the mirror symmetry that placement relies on.
  for (size_t i = 0; i < result.size() / 2; ++i)
    result.instants[result.size() - 1 - i] = mirrored(result.instants[i]);
  return result;
}

/// Hayes et al. 2011, by sequency s: the product of the Rademacher functions
/// that the bits of the Paley index s xor (s >> 1) name, lowest bit first.
llvm::Expected<Sequence> lull::walsh(Orders orders) {
  if (llvm::Error error = checkOrders("walsh", orders, 1))
    return std::move(error);
  std::uint64_t sequency = orders[0];
  Sequence result{fmt::format("walsh-{}", sequency), {}, {}, Anchor::Centre};
  if (sequency > MostPulses)
    return tooManyPulses(result.name);
  std::uint64_t paley = sequency ^ (sequency >> 1);
  unsigned bits = llvm::bit_width(sequency);
  std::uint64_t slots = std::uint64_t(1) << bits;
  for (std::uint64_t slot = 1; slot < slots; ++slot) {
    // Bit i of the Paley index names the function that changes sign where bit
    // (bits - 1 - i) of the slot does.
    std::uint64_t changed = slot ^ (slot - 1);
    bool flips = false;
    for (unsigned i = 0; i < bits; ++i)
      flips ^= (paley >> i) & (changed >> (bits - 1 - i)) & 1;
    if (flips)
      addAtSlot(result, PhaseX, slot, slots);
  }
  // An odd number of flips leaves an X, undone at the end of the window.
  if (sequency % 2 == 1)
    addAtSlot(result, PhaseX, slots, slots);
  result.anchor = anchorOf(result.instants);
  return result;
}
