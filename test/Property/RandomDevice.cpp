//===- RandomDevice.cpp - Devices that nobody has built ---------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "RandomDevice.h"

#include "llvm/ADT/STLExtras.h"

#include <fmt/format.h>

using namespace lull;
using namespace lull::property;

Fraction property::turned(Fraction a, Fraction b) {
  return a.plus(b).value().modulo(2);
}

Fraction property::turnedBack(Fraction a, Fraction b) {
  return a.minus(b).value().modulo(2);
}

//===----------------------------------------------------------------------===//
// Look-ups
//===----------------------------------------------------------------------===//

static bool covers(const Entry &entry, const std::vector<int> &on) {
  for (const std::vector<int> &tuple : entry.on)
    if (tuple == on || (entry.symmetric && on.size() == 2 &&
                        tuple == std::vector<int>{on[1], on[0]}))
      return true;
  return false;
}

const Entry *RandomDevice::find(llvm::StringRef label,
                                const std::vector<int> &on) const {
  const Entry *general = nullptr;
  for (const Entry &entry : entries) {
    if (entry.name != label || entry.arity != on.size())
      continue;
    if (entry.on.empty())
      general = &entry;
    else if (covers(entry, on))
      return &entry;
  }
  return general;
}

std::optional<std::int64_t> RandomDevice::pulseWidth(int site,
                                                     Fraction phase) const {
  std::optional<std::int64_t> same, equatorial, any, half, anyHalf;
  bool framed = false;
  auto offer = [](std::optional<std::int64_t> &slot, std::int64_t width) {
    slot = std::min(slot.value_or(width), width);
  };
  for (const Entry &entry : entries) {
    if (!entry.native || find(entry.name, {site}) != &entry)
      continue;
    if (entry.plays == Entry::Plays::Frame)
      framed = true;
    if (entry.plays == Entry::Plays::Equatorial)
      offer(equatorial, entry.duration);
    if (entry.plays != Entry::Plays::Rotation)
      continue;
    // To the hardware two half turns are two pulses.
    std::int64_t twice = aligned(entry.duration + gap) + entry.duration;
    bool fits = entry.axis() == phase.modulo(2);
    offer(entry.isHalf() ? anyHalf : any,
          entry.isHalf() ? twice : entry.duration);
    if (fits)
      offer(entry.isHalf() ? half : same,
            entry.isHalf() ? twice : entry.duration);
  }
  for (const auto &choice : {same, equatorial, framed ? any : std::nullopt,
                             half, framed ? anyHalf : std::nullopt})
    if (choice)
      return choice;
  return std::nullopt;
}

bool RandomDevice::playsEverywhere(Fraction phase) const {
  return llvm::all_of(
      sites, [&](int site) { return pulseWidth(site, phase).has_value(); });
}

//===----------------------------------------------------------------------===//
// Text
//===----------------------------------------------------------------------===//

static std::string spellOn(const Entry &entry) {
  if (entry.on.empty())
    return entry.arity == 1   ? ""
           : entry.arity == 2 ? " on any pair"
                              : fmt::format(" on any {}", entry.arity);
  std::vector<std::string> tuples;
  for (const std::vector<int> &tuple : entry.on)
    tuples.push_back(tuple.size() == 1
                         ? std::to_string(tuple[0])
                         : fmt::format("({})", fmt::join(tuple, ", ")));
  return fmt::format(" on {}{}", fmt::join(tuples, ", "),
                     entry.symmetric ? " symmetric" : "");
}

static std::string spellPlays(const Entry &entry) {
  switch (entry.plays) {
  case Entry::Plays::Nothing:
    return "";
  case Entry::Plays::Rotation:
    return fmt::format(" plays rotation({} pi, {} pi)", entry.turn.str(),
                       entry.phase.str());
  case Entry::Plays::Equatorial:
    return " plays equatorial";
  case Entry::Plays::Frame:
    return " plays frame";
  }
  return "";
}

std::string RandomDevice::text() const {
  std::string out =
      fmt::format("lull.device @{} clock {} {}", name, dt.str(), unit);
  if (step != 1)
    out += fmt::format(" step {} dt", step);
  if (gap != 0)
    out += fmt::format(" gap {} dt", gap);
  out += " {\n";
  for (int site : sites)
    out += fmt::format("  lull.site {}\n", site);
  for (auto [first, second] : couplers)
    out += fmt::format("  lull.coupler {}, {}\n", first, second);
  for (const Entry &entry : entries)
    out += fmt::format("  lull.operation {}{} for {} dt{}{}\n", entry.name,
                       spellOn(entry), entry.duration,
                       entry.native ? " native" : "", spellPlays(entry));
  return out + "}\n";
}

//===----------------------------------------------------------------------===//
// Invention
//===----------------------------------------------------------------------===//

namespace {

class Inventor {
public:
  Inventor(Random &random, RandomDevice &device)
      : random(random), device(device) {}

  void clock();
  void topology();
  void pulses(Means means);
  void gates();

private:
  std::int64_t width() {
    if (random.chance(6))
      return 0;
    std::int64_t ticks = random.within(1, 120);
    return random.chance(50) ? device.aligned(ticks) : ticks;
  }
  Entry &add(std::string name, std::int64_t duration, bool native = false) {
    Entry entry;
    entry.name = std::move(name);
    entry.duration = duration;
    entry.native = native;
    device.entries.push_back(entry);
    return device.entries.back();
  }
  Entry &rotation(std::string name, std::int64_t duration, Fraction turn,
                  Fraction phase) {
    Entry &entry = add(std::move(name), duration, /*native=*/true);
    entry.plays = Entry::Plays::Rotation;
    entry.turn = turn;
    entry.phase = phase;
    return entry;
  }
  void frame() { add("rz", 0, /*native=*/true).plays = Entry::Plays::Frame; }
  void equatorial(std::int64_t duration) {
    add("r", duration, /*native=*/true).plays = Entry::Plays::Equatorial;
  }

  Random &random;
  RandomDevice &device;
};

} // namespace

void Inventor::clock() {
  device.dt = random.of<Fraction>({1, Fraction::of(2, 9), Fraction::of(1, 2),
                                   Fraction::of(5, 7), 10, Fraction::of(4, 3)});
  device.unit = random.of<std::string>({"ns", "ns", "us"});
  device.step = random.of<std::int64_t>({1, 2, 4, 5, 8, 12, 16, 32});
  device.gap = random.chance(50) ? 0 : random.within(1, 40);
}

void Inventor::topology() {
  int site = int(random.within(0, 2));
  for (std::int64_t i = 0, e = random.within(2, 7); i != e; ++i) {
    device.sites.push_back(site);
    site += int(random.within(1, 3));
  }
  // A tree, and some more.
  for (size_t i = 1; i < device.sites.size(); ++i) {
    size_t other = random.within(0, std::int64_t(i) - 1);
    device.couplers.emplace_back(device.sites[i], device.sites[other]);
    if (i >= 2 && random.chance(30))
      device.couplers.emplace_back(device.sites[i],
                                   device.sites[other == 0 ? 1 : other - 1]);
  }
}

void Inventor::pulses(Means means) {
  std::int64_t first = width(), second = width();
  Fraction half = Fraction::of(1, 2);
  switch (means) {
  case Means::XFrame:
    rotation("x", first, 1, 0);
    frame();
    break;
  case Means::HalfFrame:
    rotation("sx", first, half, 0);
    frame();
    break;
  case Means::XY:
    rotation("x", first, 1, 0);
    rotation("y", random.chance(50) ? first : second, 1, half);
    break;
  case Means::Signed:
    rotation("x", first, 1, 0);
    rotation("mx", first, -1, 0);
    rotation("y", second, 1, half);
    rotation("my", second, -1, half);
    break;
  case Means::Equatorial:
    equatorial(first);
    break;
  case Means::EquatorialFrame:
    equatorial(first);
    frame();
    break;
  case Means::XEquatorial:
    equatorial(first);
    rotation("x", second, 1, 0);
    break;
  case Means::XYFrame:
    rotation("y", first, 1, half);
    rotation("x", second, 1, 0);
    frame();
    break;
  case Means::Halves:
    rotation("sx", first, half, 0);
    rotation("sy", second, half, half);
    break;
  case Means::NegativeHalfFrame:
    rotation("sxdg", first, Fraction::of(-1, 2), 0);
    frame();
    break;
  case Means::SiteWidths:
    rotation("x", first, 1, 0);
    rotation("x", second, 1, 0).on = {{device.sites[0]}, {device.sites[1]}};
    frame();
    break;
  case Means::TiltedFrame:
    rotation("v", first, 1, Fraction::of(1, 3));
    frame();
    break;
  }
  // What is not native must not be played, however short it is.
  Entry &decoy = rotation("quick", 0, 1, 0);
  decoy.native = false;
  random.shuffle(device.entries);
  std::int64_t widest = 0;
  for (const Entry &entry : device.entries)
    widest = std::max(widest, entry.isHalf() ? 2 * entry.duration + device.step
                                             : entry.duration);
  device.pulseScale = widest + device.gap + device.step;
}

void Inventor::gates() {
  std::int64_t scale = device.pulseScale;
  add("h", random.within(1, 100));
  add("t", 0);
  add("u3", random.within(1, 300));
  add("id", random.within(0, 50));
  add("measure", random.within(5 * scale, 60 * scale), /*native=*/true);
  add("reset", random.within(5 * scale, 30 * scale), /*native=*/true);
  add("ccx", random.within(8 * scale, 70 * scale)).arity = 3;
  for (auto [first, second] : device.couplers) {
    if (random.chance(50))
      std::swap(first, second);
    auto length = [&] { return random.within(2 * scale, 30 * scale); };
    auto pair = [&](const char *name, std::vector<int> on) {
      Entry &entry = add(name, length());
      entry.arity = 2;
      entry.on = {std::move(on)};
      return &entry;
    };
    pair("cx", {first, second});
    if (random.chance(40))
      pair("cx", {second, first});
    pair("cz", {first, second})->symmetric = true;
  }
  if (random.chance(50))
    add("swap", random.within(scale, 9 * scale)).arity = 2;
}

RandomDevice property::makeDevice(Random &random, Means means,
                                  std::string name) {
  RandomDevice device;
  device.name = std::move(name);
  Inventor inventor(random, device);
  inventor.clock();
  inventor.topology();
  inventor.pulses(means);
  inventor.gates();
  return device;
}
