//===- Expectation.cpp - What must become of a window -----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Expectation.h"

#include "lull/Sequence/Catalogue.h"

#include <cmath>
#include <fmt/format.h>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

void Options::apply(ProtectOptions &to) const {
  to.sequence = sequence;
  to.repeats = repeats;
  to.alternating = alternating;
  if (spacing)
    to.spacing = fmt::format("{} dt", spacing);
  if (leastWindow)
    to.leastWindow = fmt::format("{} dt", leastWindow);
  to.alsoBasis = alsoBasis;
  to.alsoSpent = alsoSpent;
  to.spentAtEnd = spentAtEnd;
  to.policy = policy;
}

std::string Options::str() const {
  return fmt::format("sequence={} repeats={} alternating={} spacing={} "
                     "least-window={} also-basis={} also-spent={} "
                     "spent-at-end={} policy={}",
                     sequence, repeats, alternating, spacing, leastWindow,
                     alsoBasis, alsoSpent, spentAtEnd,
                     policy == SchedulePolicy::ASAP ? "asap" : "alap");
}

//===----------------------------------------------------------------------===//
// Sequences
//===----------------------------------------------------------------------===//

Fraction property::alternatingSum(llvm::ArrayRef<Fraction> phases) {
  Fraction sum = 0;
  for (auto [index, phase] : llvm::enumerate(phases))
    sum = index % 2 ? turnedBack(sum, phase) : turned(sum, phase);
  return sum;
}

/// With the one pulse that makes an odd number of pulses the identity: their
/// product is a pi pulse of the alternating sum of the phases.
static std::vector<Fraction> closed(std::vector<Fraction> phases) {
  if (phases.size() % 2)
    phases.push_back(alternatingSum(phases));
  return phases;
}

Played property::catalogued(llvm::StringRef name) {
  Played played;
  llvm::Expected<Sequence> found = findSequence(name);
  if (found)
    played.phases = found->phases;
  else
    ADD_FAILURE() << llvm::toString(found.takeError());
  // Of equal intervals, an odd number leaves one. All other families refocus
  // static detuning by definition.
  unsigned pulses = 0;
  if (name.consume_front("pdd-") && !name.getAsInteger(10, pulses) &&
      pulses % 2 == 0)
    played.imbalance = 1.0 / (pulses + 1);
  return played;
}

static double imbalanceOf(llvm::ArrayRef<double> instants) {
  double integral = 0, sign = 1, last = 0;
  for (double instant : instants) {
    integral += sign * (instant - last);
    sign = -sign;
    last = instant;
  }
  return integral + sign * (1 - last);
}

static Played withRepeats(const Played &base, unsigned repeats,
                          bool alternating) {
  std::vector<Fraction> phases;
  for (unsigned block = 0; block < repeats; ++block)
    for (Fraction phase : base.phases)
      phases.push_back(turned(phase, alternating && block % 2 ? 1 : 0));
  // After an even number of pulses every repeat starts with plus and adds its
  // share; after an odd number they take turns. What closes the whole is at the
  // end and adds nothing.
  double imbalance = base.imbalance;
  if (base.phases.size() % 2)
    imbalance = repeats % 2 ? imbalance / repeats : 0;
  return {closed(std::move(phases)), imbalance};
}

static std::vector<double> byFormula(llvm::StringRef formula, int count) {
  std::vector<double> instants;
  for (int k = 1; k <= count; ++k)
    if (formula == "centred")
      instants.push_back((k - 0.5) / count);
    else if (formula == "trailing")
      instants.push_back(double(k) / count);
    else if (formula == "spread")
      instants.push_back(double(k) / (count + 1));
    else
      instants.push_back(std::pow(std::sin(M_PI * k / (2 * count + 2)), 2));
  return instants;
}

UserSequence property::inventSequence(Random &random,
                                      const RandomDevice &device,
                                      std::string name) {
  std::vector<Fraction> pool;
  for (Fraction phase :
       {Fraction(0), Fraction::of(1, 2), Fraction(1), Fraction::of(3, 2),
        Fraction::of(1, 3), Fraction::of(5, 6), Fraction::of(12, 7)})
    if (device.playsEverywhere(phase))
      pool.push_back(phase);
  bool odd = random.chance(30);
  std::vector<Fraction> phases;
  std::int64_t pairs = random.within(1, 6);
  // Pairs of equal phases cancel wherever one stands at an odd place and one at
  // an even one: so do shuffled odd and even places.
  std::vector<Fraction> first, second;
  for (std::int64_t i = 0; i != pairs; ++i)
    first.push_back(random.of(pool));
  second = first;
  random.shuffle(second);
  for (std::int64_t i = 0; i != pairs; ++i) {
    phases.push_back(first[i]);
    phases.push_back(second[i]);
  }
  if (odd)
    phases.pop_back();
  std::string at = random.of<std::string>(
      {"centred", "trailing", "spread", "uhrig", "fractions"});
  std::vector<double> instants;
  if (at != "fractions") {
    instants = byFormula(at, int(phases.size()));
  } else {
    std::vector<std::int64_t> places;
    for (size_t i = 0; i != phases.size(); ++i)
      places.push_back(random.within(0, 60));
    llvm::sort(places);
    for (std::int64_t place : places)
      instants.push_back(double(place) / 60);
    at = fmt::format("[{}/60]", fmt::join(places, "/60, "));
  }
  std::vector<std::string> spelled;
  for (Fraction phase : phases)
    spelled.push_back(phase.str());
  UserSequence sequence;
  sequence.text =
      fmt::format("lull.sequence {} phases [{}] at {}{}\n", name,
                  fmt::join(spelled, ", "), at, odd ? " closed" : "");
  sequence.name = std::move(name);
  // It is closed when its repeats are known.
  sequence.played = {std::move(phases), imbalanceOf(instants)};
  return sequence;
}

static Played baseOf(llvm::StringRef name, llvm::ArrayRef<UserSequence> own) {
  if (!name.starts_with("@"))
    return catalogued(name);
  for (const UserSequence &sequence : own)
    if (sequence.name == name)
      return sequence.played;
  ADD_FAILURE() << "no sequence " << name.str();
  return {};
}

std::optional<Options>
property::inventOptions(Random &random, const RandomDevice &device,
                        std::string name, llvm::ArrayRef<UserSequence> own) {
  std::vector<Fraction> base = baseOf(name, own).phases;
  Options options;
  options.sequence = std::move(name);
  // Wishes may bring X of either sign.
  options.alternating = random.chance(30) && device.playsEverywhere(1);
  for (bool negative : {false, true})
    for (Fraction phase : closed(base))
      if ((!negative || options.alternating) &&
          !device.playsEverywhere(turned(phase, negative ? 1 : 0)))
        return std::nullopt;
  if (random.chance(20))
    options.spacing =
        random.within(device.pulseScale / 2 + 1, 6 * device.pulseScale);
  else if (random.chance(40))
    options.repeats = unsigned(random.within(2, 4));
  if (random.chance(15))
    options.leastWindow = random.within(1, 12 * device.pulseScale);
  options.alsoBasis = random.chance(15);
  options.alsoSpent = random.chance(15);
  options.spentAtEnd = random.chance(15);
  if (random.chance(50))
    options.policy = SchedulePolicy::ALAP;
  return options;
}

//===----------------------------------------------------------------------===//
// Windows
//===----------------------------------------------------------------------===//

Played Expectation::played(const Window &window, const Wish &wish) const {
  const std::string &name =
      wish.sequence.empty() ? options.sequence : wish.sequence;
  Played base = baseOf(name, own);
  if (wish.repeats)
    return withRepeats(base, wish.repeats, wish.alternating);
  std::int64_t repeats = options.repeats;
  if (options.spacing) {
    // As often as leaves every pulse, the closing one too, its share.
    auto pulses = [&](std::int64_t times) {
      std::int64_t count = times * std::int64_t(base.phases.size());
      return count % 2 ? count + 1 : count;
    };
    repeats = 0;
    while (pulses(repeats + 1) * options.spacing <= window.length)
      ++repeats;
    if (repeats == 0)
      return {};
  }
  return withRepeats(base, unsigned(repeats), options.alternating);
}

Played Expectation::pulses(const Window &window, llvm::StringRef state,
                           const Wish &wish) const {
  if (wish.sequence == "none" ||
      (wish.sequence.empty() && options.sequence == "none"))
    return {};
  if (wish.sequence.empty() && ((state == "basis" && !options.alsoBasis) ||
                                (state == "spent" && !options.alsoSpent) ||
                                window.length < options.leastWindow))
    return {};
  Played expected = played(window, wish);
  if (expected.phases.empty())
    return {};
  std::vector<std::int64_t> widths;
  for (Fraction phase : expected.phases)
    widths.push_back(device.pulseWidth(window.site, phase).value());
  if (leastLength(window.start, widths, device) > window.length)
    return {};
  return expected;
}
