//===- Device.h - The plain model of a device -------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// What scheduling, placement and physics know of a device: its clock and start
// grid, its sites, its couplers, and its operations with their durations. It is
// built by one converter from the `lull.device` op (lull/IR/DeviceBuilder.h)
// and knows nothing of MLIR. What the device does not list does not exist: a
// missing operation is an error of the program, never a default.
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TIMING_DEVICE_H
#define LULL_TIMING_DEVICE_H

#include "lull/Timing/Time.h"

#include "llvm/ADT/ArrayRef.h"
#include "llvm/ADT/DenseMap.h"
#include "llvm/ADT/StringMap.h"

#include <memory>
#include <optional>
#include <string>
#include <utility>
#include <vector>

namespace lull {

/// The number of a physical qubit, as the device counts them (gaps allowed).
using SiteId = std::int64_t;

/// What an operation does to one qubit, as far as pulses are concerned.
/// Conventions (lull physics): R_phi(theta) = exp(-i theta/2 (cos phi X +
/// sin phi Y)); a frame change by a is Rz(a) = exp(-i a Z/2).
struct Action {
  enum class Kind : std::uint8_t {
    /// Nothing that a decoupling pulse could be made of.
    None,
    /// A fixed rotation R_phase(turn), both in units of pi: x is (1, 0), sx is
    /// (1/2, 0), y is (1, 1/2), an x with negative amplitude is (1, 1).
    Rotation,
    /// R_phi(theta) with both angles as parameters, theta first.
    Equatorial,
    /// Rz(a) in software: no time, no error, the angle as parameter.
    Frame,
  };
  Kind kind = Kind::None;
  /// For Rotation only, in units of pi; turn in (0, 1], phase in [0, 2).
  Fraction turn = 0;
  Fraction phase = 0;

  /// The rotation by any angle in that form: a negative turn becomes a phase
  /// further by 1, whole turns (a global phase) are dropped, and a rotation by
  /// nothing is None. For denominators see Fraction::modulo.
  static Action rotation(Fraction turn, Fraction phase);
  static Action equatorial() { return {Kind::Equatorial, 0, 0}; }
  static Action frame() { return {Kind::Frame, 0, 0}; }
};

/// The calibration of one site; what the lab has not measured is empty.
struct Site {
  SiteId number = 0;
  /// Relaxation time, Ramsey 1/e time, Hahn echo 1/e time.
  std::optional<Duration> t1, ramsey, echo;
  /// Average gate error of one pi pulse (1 - average gate fidelity).
  std::optional<double> pulseError;
};

/// A pair of sites that can take part in a two-qubit gate (unordered).
struct Coupler {
  SiteId first = 0;
  SiteId second = 0;
  /// Always-on ZZ coupling zeta / 2 pi in kHz, where measured.
  std::optional<double> zzKilohertz;
};

/// One line of the device's table of operations.
struct OperationEntry {
  std::string name;
  /// The sites it is for, a tuple an element, all of one length. Empty: any
  /// site, or any coupled pair (see `arity`).
  std::vector<llvm::SmallVector<SiteId, 2>> on;
  /// The number of qubits.
  unsigned arity = 1;
  /// Whether a pair also stands for its reverse. For arity 2 only.
  bool symmetric = false;
  Ticks duration = 0;
  /// Whether the hardware plays it as it is (not decomposed further down).
  bool native = false;
  Action plays;
  std::optional<double> error;
  /// Where a two-qubit gate flips its first qubit, as a fraction of its length.
  std::optional<Fraction> echo;
};

/// A device. Build it with the add functions, then only read it; reading is
/// safe from several threads.
class Device {
public:
  Device(std::string name, Clock clock);

  llvm::StringRef name() const { return label; }
  const Clock &clock() const { return tick; }

  /// A pulse may start only on absolute multiples of this many ticks (>= 1).
  Ticks step() const { return startStep; }
  /// Least time between the end of one inserted pulse and the start of the
  /// next.
  Ticks leastGap() const { return gap; }
  /// Fails on a step below 1 and on a negative gap.
  llvm::Error setGrid(Ticks step, Ticks leastGap);

  /// Fails on a number that is negative, beyond 32 bits, or already there.
  llvm::Error addSite(Site site);
  /// Fails on an unknown site, equal sites, or a pair already there.
  llvm::Error addCoupler(Coupler coupler);
  /// Fails on unknown or repeated sites, on a number of sites other than the
  /// arity, on a pair without a coupler, on a negative duration, on a frame
  /// change that takes time, on an arity other than that of the name's earlier
  /// entries, and on sites that an entry of that name already lists. An entry
  /// for any sites may stand beside some that list theirs; a second may not.
  llvm::Error addOperation(OperationEntry entry);

  llvm::ArrayRef<Site> sites() const { return siteList; }
  llvm::ArrayRef<Coupler> couplers() const { return couplerList; }
  llvm::ArrayRef<std::unique_ptr<OperationEntry>> operations() const {
    return entries;
  }

  bool hasSite(SiteId number) const { return site(number) != nullptr; }
  const Site *site(SiteId number) const;
  bool coupled(SiteId a, SiteId b) const;

  /// All entries of one name; nullptr if the device has none. The handle makes
  /// repeated lookups cheap and stays valid as long as the device.
  struct NamedEntries;
  const NamedEntries *named(llvm::StringRef name) const;

  /// The names of one-qubit operations that play something, in the order in
  /// which the device first lists one that does.
  llvm::ArrayRef<const NamedEntries *> playing() const { return playingNames; }

  /// The entry for these sites in this order: the one that lists them, else the
  /// one for any site, any coupled pair, or any three and more distinct sites;
  /// nullptr if there is none. A lookup in hash tables.
  const OperationEntry *find(const NamedEntries *named,
                             llvm::ArrayRef<SiteId> sites) const;
  /// The same by name; fails naming what is missing: the operation, the site,
  /// the coupler, or the order (`device 'd' has no 'cx' on (1, 0): it is listed
  /// for (0, 1) only in that order`).
  llvm::Expected<const OperationEntry *>
  require(llvm::StringRef name, llvm::ArrayRef<SiteId> sites) const;

  Device(Device &&);
  Device &operator=(Device &&);
  ~Device();

private:
  llvm::Error checkSites(const OperationEntry &entry) const;
  std::string explainMissing(const NamedEntries &named,
                             llvm::ArrayRef<SiteId> sites) const;

  std::string label;
  Clock tick;
  Ticks startStep = 1;
  Ticks gap = 0;
  std::vector<Site> siteList;
  llvm::DenseMap<SiteId, unsigned> siteIndex;
  std::vector<Coupler> couplerList;
  llvm::DenseMap<std::pair<SiteId, SiteId>, unsigned> couplerIndex;
  std::vector<std::unique_ptr<OperationEntry>> entries;
  llvm::StringMap<std::unique_ptr<NamedEntries>> byName;
  std::vector<const NamedEntries *> playingNames;
};

} // namespace lull

#endif // LULL_TIMING_DEVICE_H
