//===- Device.cpp - The plain model of a device ---------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Device.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/STLExtras.h"

#include <algorithm>
#include <limits>
#include <map>

using namespace lull;

using SitePair = std::pair<SiteId, SiteId>;
using SiteTuple = llvm::SmallVector<SiteId, 2>;

/// How many names or tuples a message lists before it only counts them.
static constexpr size_t fewEnough = 12;

//===----------------------------------------------------------------------===//
// Entries by sites
//===----------------------------------------------------------------------===//

/// One table for each arity, of which only that of `arity` has entries. The
/// hash tables are never asked for a number that hasSite() does not know, as
/// they reserve some for themselves.
struct Device::NamedEntries {
  unsigned arity = 0;
  /// The entry for any sites.
  const OperationEntry *any = nullptr;
  llvm::DenseMap<SiteId, const OperationEntry *> single;
  llvm::DenseMap<SitePair, const OperationEntry *> pairs;
  std::map<std::vector<SiteId>, const OperationEntry *> tuples;

  /// The entry that lists these known sites.
  const OperationEntry *listed(llvm::ArrayRef<SiteId> sites) const {
    if (sites.size() == 1)
      return single.lookup(sites[0]);
    if (sites.size() == 2)
      return pairs.lookup({sites[0], sites[1]});
    auto found = tuples.find(sites.vec());
    return found == tuples.end() ? nullptr : found->second;
  }

  void list(llvm::ArrayRef<SiteId> sites, const OperationEntry *entry) {
    if (sites.size() == 1)
      single[sites[0]] = entry;
    else if (sites.size() == 2)
      pairs[{sites[0], sites[1]}] = entry;
    else
      tuples[sites.vec()] = entry;
  }

  std::vector<SiteTuple> listedTuples() const {
    std::vector<SiteTuple> result;
    for (const auto &[site, entry] : single)
      result.push_back({site});
    for (const auto &[pair, entry] : pairs)
      result.push_back({pair.first, pair.second});
    for (const auto &[tuple, entry] : tuples)
      result.emplace_back(tuple.begin(), tuple.end());
    llvm::sort(result);
    return result;
  }
};

//===----------------------------------------------------------------------===//
// Words
//===----------------------------------------------------------------------===//

/// `site 3`, `(0, 1)`.
static std::string spellSites(llvm::ArrayRef<SiteId> sites) {
  if (sites.size() == 1)
    return fmt::format("site {}", sites[0]);
  return fmt::format("({})", fmt::join(sites.begin(), sites.end(), ", "));
}

static std::string spellCount(size_t count, const char *noun) {
  return fmt::format("{} {}{}", count, noun, count == 1 ? "" : "s");
}

/// What an entry without a list is for.
static std::string spellAny(unsigned arity) {
  if (arity == 1)
    return "any site";
  return arity == 2 ? "any coupled pair" : fmt::format("any {} sites", arity);
}

/// `sites are 0 to 4`, `sites are 0, 2, 5`.
static std::string spellKnown(llvm::ArrayRef<Site> sites) {
  if (sites.empty())
    return "there are none";
  std::vector<SiteId> numbers;
  for (const Site &site : sites)
    numbers.push_back(site.number);
  llvm::sort(numbers);
  if (numbers.size() == 1)
    return fmt::format("the only one is {}", numbers[0]);
  if (numbers.back() - numbers.front() == SiteId(numbers.size()) - 1)
    return fmt::format("sites are {} to {}", numbers.front(), numbers.back());
  if (numbers.size() <= fewEnough)
    return fmt::format("sites are {}", fmt::join(numbers, ", "));
  return fmt::format("there are {} between {} and {}", numbers.size(),
                     numbers.front(), numbers.back());
}

static std::optional<SiteId> findRepeated(llvm::ArrayRef<SiteId> sites) {
  SiteTuple sorted(sites.begin(), sites.end());
  llvm::sort(sorted);
  auto repeated = std::adjacent_find(sorted.begin(), sorted.end());
  if (repeated == sorted.end())
    return std::nullopt;
  return *repeated;
}

//===----------------------------------------------------------------------===//
// Action
//===----------------------------------------------------------------------===//

Action Action::rotation(Fraction turn, Fraction phase) {
  // All of this up to a global phase, which is what makes a turn by 2 nothing.
  Fraction rest = turn.modulo(2);
  bool opposite = false;
  if (!rest.isZero() && turn < Fraction(0)) {
    rest = *Fraction(2).minus(rest);
    opposite = true;
  }
  if (rest > Fraction(1)) {
    rest = *Fraction(2).minus(rest);
    opposite = !opposite;
  }
  if (rest.isZero())
    return {};
  Fraction axis = phase.modulo(2);
  if (opposite)
    axis = axis < Fraction(1) ? *axis.plus(1) : *axis.minus(1);
  return {Kind::Rotation, rest, axis};
}

//===----------------------------------------------------------------------===//
// Building
//===----------------------------------------------------------------------===//

Device::Device(std::string name, Clock clock)
    : label(std::move(name)), tick(clock) {}
Device::Device(Device &&) = default;
Device &Device::operator=(Device &&) = default;
Device::~Device() = default;

llvm::Error Device::setGrid(Ticks step, Ticks leastGap) {
  // D6: a step.
  if (step < 1)
    return fault("step is {} dt when it should be at least 1 dt", step);
  // D7: a gap.
  if (leastGap < 0)
    return fault("least gap is {} dt when it should not be negative", leastGap);
  startStep = step;
  gap = leastGap;
  return llvm::Error::success();
}

llvm::Error Device::addSite(Site site) {
  constexpr SiteId most = std::numeric_limits<std::uint32_t>::max();
  // D8: a number.
  if (site.number < 0 || site.number > most)
    return fault("site number is {} when it should be 0 to {}", site.number,
                 most);
  // D9: once.
  if (!siteIndex.try_emplace(site.number, siteList.size()).second)
    return fault("site {} is listed twice", site.number);
  siteList.push_back(std::move(site));
  return llvm::Error::success();
}

llvm::Error Device::addCoupler(Coupler coupler) {
  for (SiteId number : {coupler.first, coupler.second})
    // D12: between sites.
    if (!hasSite(number))
      return fault("coupler ({}, {}) needs site {}, which is not there ({})",
                   coupler.first, coupler.second, number, spellKnown(siteList));
  // D13: two of them.
  if (coupler.first == coupler.second)
    return fault("coupler ({}, {}) joins a site to itself", coupler.first,
                 coupler.second);
  SitePair key = std::minmax(coupler.first, coupler.second);
  // D14: once.
  if (!couplerIndex.try_emplace(key, couplerList.size()).second)
    return fault("coupler ({}, {}) is listed twice", coupler.first,
                 coupler.second);
  couplerList.push_back(std::move(coupler));
  return llvm::Error::success();
}

/// Whether the sites that an entry lists are there, and as many as it takes.
llvm::Error Device::checkSites(const OperationEntry &entry) const {
  for (const SiteTuple &sites : entry.on) {
    if (sites.size() != entry.arity)
      return fault("operation '{}' takes {}, but is listed for {} of them",
                   entry.name, spellCount(entry.arity, "qubit"), sites.size());
    for (SiteId number : sites)
      // D20: on sites.
      if (!hasSite(number))
        return fault("operation '{}' is listed for {}, but there is no site {} "
                     "({})",
                     entry.name, spellSites(sites), number,
                     spellKnown(siteList));
    // D21: on different ones.
    if (std::optional<SiteId> number = findRepeated(sites))
      return fault("operation '{}' is listed for {} with site {} twice",
                   entry.name, spellSites(sites), *number);
    // D22: on coupled ones.
    if (sites.size() == 2 && !coupled(sites[0], sites[1]))
      return fault("operation '{}' is listed for {}, but sites {} and {} are "
                   "not coupled",
                   entry.name, spellSites(sites), sites[0], sites[1]);
  }
  return llvm::Error::success();
}

llvm::Error Device::addOperation(OperationEntry entry) {
  // D16: a name.
  if (entry.name.empty())
    return fault("an operation has no name");
  // D17: a qubit.
  if (entry.arity == 0)
    return fault("operation '{}' takes no qubits", entry.name);
  if (entry.duration < 0)
    return fault("operation '{}' takes {} dt, which is negative", entry.name,
                 entry.duration);
  // D26: frames take no time.
  if (entry.plays.kind == Action::Kind::Frame && entry.duration != 0)
    return fault("operation '{}' is a frame change but takes {} dt when it "
                 "should take 0 dt",
                 entry.name, entry.duration);
  // D19: only a pair has another order.
  if (entry.symmetric && entry.arity != 2)
    return fault("operation '{}' is symmetric, which is for 2 qubits, but "
                 "takes {}",
                 entry.name, entry.arity);
  if (llvm::Error error = checkSites(entry))
    return error;

  auto known = byName.find(entry.name);
  NamedEntries *named = known == byName.end() ? nullptr : known->second.get();
  // D23: one number of qubits.
  if (named && named->arity != entry.arity)
    return fault("operation '{}' is listed with {} and with {}", entry.name,
                 spellCount(named->arity, "qubit"), entry.arity);
  // D24: one line for any sites, and one for each tuple.
  if (named && named->any && entry.on.empty())
    return fault("operation '{}' is listed twice for {}", entry.name,
                 spellAny(entry.arity));

  std::vector<SiteTuple> tuples(entry.on);
  if (entry.symmetric)
    for (const SiteTuple &pair : entry.on)
      tuples.push_back({pair[1], pair[0]});
  std::vector<SiteTuple> sorted(tuples);
  llvm::sort(sorted);
  auto twice = std::adjacent_find(sorted.begin(), sorted.end());
  if (twice == sorted.end() && named)
    twice = llvm::find_if(sorted, [&](const SiteTuple &sites) {
      return named->listed(sites) != nullptr;
    });
  if (twice != sorted.end())
    return fault("operation '{}' is listed twice for {}", entry.name,
                 spellSites(*twice));

  // Only now, so that an entry that is refused leaves no trace.
  if (!named) {
    auto made = std::make_unique<NamedEntries>();
    named = made.get();
    named->arity = entry.arity;
    byName[entry.name] = std::move(made);
  }
  entries.push_back(std::make_unique<OperationEntry>(std::move(entry)));
  const OperationEntry *stored = entries.back().get();
  if (stored->arity == 1 && stored->plays.kind != Action::Kind::None &&
      !llvm::is_contained(playingNames, named))
    playingNames.push_back(named);
  if (tuples.empty())
    named->any = stored;
  for (const SiteTuple &sites : tuples)
    named->list(sites, stored);
  return llvm::Error::success();
}

//===----------------------------------------------------------------------===//
// Reading
//===----------------------------------------------------------------------===//

const Site *Device::site(SiteId number) const {
  // The hash table reserves the largest numbers for itself.
  if (number < 0 || number > SiteId(std::numeric_limits<std::uint32_t>::max()))
    return nullptr;
  auto found = siteIndex.find(number);
  return found == siteIndex.end() ? nullptr : &siteList[found->second];
}

bool Device::coupled(SiteId a, SiteId b) const {
  return hasSite(a) && hasSite(b) &&
         couplerIndex.count(SitePair(std::minmax(a, b)));
}

const Device::NamedEntries *Device::named(llvm::StringRef name) const {
  auto found = byName.find(name);
  return found == byName.end() ? nullptr : found->second.get();
}

const OperationEntry *Device::find(const NamedEntries *named,
                                   llvm::ArrayRef<SiteId> sites) const {
  if (!named || sites.size() != named->arity ||
      !llvm::all_of(sites, [&](SiteId number) { return hasSite(number); }))
    return nullptr;
  if (const OperationEntry *entry = named->listed(sites))
    return entry;
  if (!named->any || (sites.size() == 2 && !coupled(sites[0], sites[1])) ||
      (sites.size() > 2 && findRepeated(sites)))
    return nullptr;
  return named->any;
}

/// Why find() has nothing for these sites.
std::string Device::explainMissing(const NamedEntries &named,
                                   llvm::ArrayRef<SiteId> sites) const {
  if (sites.size() != named.arity)
    return fmt::format("it takes {}, not {}", spellCount(named.arity, "qubit"),
                       sites.size());
  for (SiteId number : sites)
    if (!hasSite(number))
      return fmt::format("there is no site {} ({})", number,
                         spellKnown(siteList));
  if (std::optional<SiteId> number = findRepeated(sites))
    return fmt::format("site {} is named twice", *number);
  if (sites.size() == 2 && !coupled(sites[0], sites[1]))
    return fmt::format("sites {} and {} are not coupled", sites[0], sites[1]);
  if (sites.size() == 2 && named.listed({sites[1], sites[0]}))
    return fmt::format("it is listed for ({}, {}) only in that order", sites[1],
                       sites[0]);
  std::vector<SiteTuple> listed = named.listedTuples();
  if (listed.size() > fewEnough)
    return fmt::format("it is listed for {} others", listed.size());
  std::vector<std::string> words;
  for (const SiteTuple &tuple : listed)
    words.push_back(spellSites(tuple));
  return fmt::format("it is listed for {}", fmt::join(words, ", "));
}

llvm::Expected<const OperationEntry *>
Device::require(llvm::StringRef name, llvm::ArrayRef<SiteId> sites) const {
  const NamedEntries *entries = named(name);
  if (const OperationEntry *entry = find(entries, sites))
    return entry;
  if (entries)
    return fault("device '{}' has no '{}' on {}: {}", label, name.str(),
                 spellSites(sites), explainMissing(*entries, sites));
  if (byName.empty() || byName.size() > fewEnough)
    return fault("device '{}' has no operation '{}' ({} others)", label,
                 name.str(), byName.size());
  std::vector<std::string> names;
  for (llvm::StringRef known : byName.keys())
    names.push_back(known.str());
  llvm::sort(names);
  return fault("device '{}' has no operation '{}' (it has {})", label,
               name.str(), fmt::join(names, ", "));
}
