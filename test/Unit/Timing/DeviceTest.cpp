//===- DeviceTest.cpp - The plain model of a device -----------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Timing/Device.h"

#include "gtest/gtest.h"

#include <cstdlib>
#include <limits>

using namespace lull;

namespace {

using Tuples = std::vector<llvm::SmallVector<SiteId, 2>>;

constexpr SiteId Most = std::numeric_limits<SiteId>::max();

template <typename T> std::string failure(llvm::Expected<T> result) {
  return result ? "none" : llvm::toString(result.takeError());
}
std::string failure(llvm::Error error) {
  return error ? llvm::toString(std::move(error)) : "none";
}

OperationEntry entry(std::string name, unsigned arity, Ticks duration,
                     Tuples on = {}, bool symmetric = false) {
  OperationEntry result;
  result.name = std::move(name);
  result.arity = arity;
  result.duration = duration;
  result.on = std::move(on);
  result.symmetric = symmetric;
  return result;
}

/// Five sites in a line, invented.
Device line() {
  Device device("barley", Clock());
  for (SiteId number = 0; number < 5; ++number)
    llvm::cantFail(device.addSite({number, {}, {}, {}, {}}));
  for (SiteId number = 0; number < 4; ++number)
    llvm::cantFail(device.addCoupler({number, number + 1, {}}));
  return device;
}

Ticks durationOf(const Device &device, llvm::StringRef name,
                 llvm::ArrayRef<SiteId> sites) {
  const OperationEntry *found = device.find(device.named(name), sites);
  return found ? found->duration : -1;
}

TEST(ActionTest, RotationIsBroughtToItsRange) {
  struct {
    Fraction turn, phase, turnOut, phaseOut;
  } cases[] = {
      {1, 0, 1, 0},
      {1, Fraction::of(1, 2), 1, Fraction::of(1, 2)},
      {-1, 0, 1, 1},
      {-1, 1, 1, 0},
      {Fraction::of(-1, 2), Fraction::of(1, 2), Fraction::of(1, 2),
       Fraction::of(3, 2)},
      // Three quarters to the right is one quarter to the left.
      {Fraction::of(3, 2), 0, Fraction::of(1, 2), 1},
      {Fraction::of(-3, 2), 0, Fraction::of(1, 2), 0},
      {Fraction::of(5, 2), 3, Fraction::of(1, 2), 1},
      {Fraction::of(1, 2), Fraction::of(-1, 2), Fraction::of(1, 2),
       Fraction::of(3, 2)},
  };
  for (const auto &c : cases) {
    Action action = Action::rotation(c.turn, c.phase);
    EXPECT_EQ(action.kind, Action::Kind::Rotation);
    EXPECT_EQ(action.turn.str(), c.turnOut.str()) << c.turn.str();
    EXPECT_EQ(action.phase.str(), c.phaseOut.str()) << c.turn.str();
  }
  for (Fraction nothing : {Fraction(0), Fraction(2), Fraction(-4)})
    EXPECT_EQ(Action::rotation(nothing, 0).kind, Action::Kind::None);
}

TEST(DeviceTest, Grid) {
  Device device = line();
  EXPECT_EQ(device.step(), 1);
  EXPECT_EQ(device.leastGap(), 0);
  EXPECT_EQ(failure(device.setGrid(16, 4)), "none");
  EXPECT_EQ(failure(device.setGrid(0, 4)),
            "step is 0 dt when it should be at least 1 dt");
  EXPECT_EQ(failure(device.setGrid(1, -1)),
            "least gap is -1 dt when it should not be negative");
  EXPECT_EQ(device.step(), 16);
  EXPECT_EQ(device.leastGap(), 4);
}

TEST(DeviceTest, Sites) {
  Device device("gaps", Clock());
  llvm::cantFail(device.addSite({7, {}, {}, {}, 0.5}));
  llvm::cantFail(device.addSite({2, {}, {}, {}, 0.25}));
  EXPECT_EQ(device.site(7)->pulseError, 0.5);
  EXPECT_EQ(device.site(2)->pulseError, 0.25);
  // The last three are what hash tables keep for themselves.
  for (SiteId other : {SiteId(3), SiteId(-1), Most, Most - 1, -Most - 1}) {
    EXPECT_FALSE(device.hasSite(other));
    EXPECT_EQ(device.site(other), nullptr);
    EXPECT_FALSE(device.coupled(other, other));
  }
  EXPECT_EQ(failure(device.addSite({7, {}, {}, {}, {}})),
            "site 7 is listed twice");
  EXPECT_EQ(failure(device.addSite({-1, {}, {}, {}, {}})),
            "site number is -1 when it should be 0 to 4294967295");
  EXPECT_EQ(failure(device.addSite({Most, {}, {}, {}, {}})),
            "site number is 9223372036854775807 when it should be 0 to "
            "4294967295");
  EXPECT_EQ(device.sites().size(), 2u);
}

TEST(DeviceTest, Couplers) {
  Device device = line();
  EXPECT_TRUE(device.coupled(0, 1));
  EXPECT_TRUE(device.coupled(1, 0));
  EXPECT_FALSE(device.coupled(0, 2));
  EXPECT_FALSE(device.coupled(0, 0));
  EXPECT_FALSE(device.coupled(4, 5));
  EXPECT_EQ(failure(device.addCoupler({1, 0, {}})),
            "coupler (1, 0) is listed twice");
  EXPECT_EQ(failure(device.addCoupler({3, 3, {}})),
            "coupler (3, 3) joins a site to itself");
  EXPECT_EQ(failure(device.addCoupler({3, 9, {}})),
            "coupler (3, 9) needs site 9, which is not there (sites are 0 to "
            "4)");
  EXPECT_EQ(device.couplers().size(), 4u);
}

TEST(DeviceTest, AddOperationRefuses) {
  Device device = line();
  llvm::cantFail(device.addOperation(entry("x", 1, 10)));
  llvm::cantFail(device.addOperation(entry("x", 1, 11, {{2}})));
  llvm::cantFail(device.addOperation(entry("cx", 2, 40, {{0, 1}, {2, 1}})));
  llvm::cantFail(device.addOperation(entry("cz", 2, 30, {{0, 1}}, true)));
  OperationEntry frame = entry("rz", 1, 5);
  frame.plays = Action::frame();
  std::pair<OperationEntry, const char *> cases[] = {
      {entry("", 1, 1), "an operation has no name"},
      {entry("y", 0, 1), "operation 'y' takes no qubits"},
      {entry("y", 1, -5), "operation 'y' takes -5 dt, which is negative"},
      {frame, "operation 'rz' is a frame change but takes 5 dt when it should "
              "take 0 dt"},
      {entry("y", 1, 1, {{0}}, true),
       "operation 'y' is symmetric, which is for 2 qubits, but takes 1"},
      {entry("y", 1, 1, {{0, 1}}),
       "operation 'y' takes 1 qubit, but is listed for 2 of them"},
      {entry("y", 1, 1, {{9}}),
       "operation 'y' is listed for site 9, but there is no site 9 (sites are "
       "0 to 4)"},
      {entry("ecr", 2, 1, {{3, 3}}),
       "operation 'ecr' is listed for (3, 3) with site 3 twice"},
      {entry("ecr", 2, 1, {{0, 2}}),
       "operation 'ecr' is listed for (0, 2), but sites 0 and 2 are not "
       "coupled"},
      {entry("x", 1, 1), "operation 'x' is listed twice for any site"},
      {entry("x", 1, 1, {{0}, {2}}),
       "operation 'x' is listed twice for site 2"},
      {entry("cx", 2, 1, {{1, 2}, {0, 1}}),
       "operation 'cx' is listed twice for (0, 1)"},
      {entry("cx", 2, 1, {{1, 0}}, true),
       "operation 'cx' is listed twice for (0, 1)"},
      {entry("cz", 2, 1, {{1, 0}}),
       "operation 'cz' is listed twice for (1, 0)"},
      {entry("ecr", 2, 1, {{0, 1}, {1, 0}}, true),
       "operation 'ecr' is listed twice for (0, 1)"},
      {entry("cx", 1, 1), "operation 'cx' is listed with 2 qubits and with 1"},
      {entry("x", 2, 1), "operation 'x' is listed with 1 qubit and with 2"},
  };
  for (auto &[refused, message] : cases)
    EXPECT_EQ(failure(device.addOperation(refused)), message);
  // None of them left a trace.
  EXPECT_EQ(device.operations().size(), 4u);
  EXPECT_EQ(device.named("ecr"), nullptr);
  EXPECT_EQ(device.named("y"), nullptr);
  EXPECT_EQ(durationOf(device, "cx", {1, 2}), -1);
  EXPECT_EQ(durationOf(device, "x", {0}), 10);
}

/// What find() should say, by going through the list: an entry that lists the
/// sites, else one without a list that suits them.
Ticks searchList(const Device &device, llvm::StringRef name,
                 llvm::ArrayRef<SiteId> sites) {
  Ticks any = -1;
  for (const auto &e : device.operations()) {
    if (e->name != name || e->arity != sites.size())
      continue;
    for (const auto &on : e->on)
      if (llvm::ArrayRef<SiteId>(on) == sites ||
          (e->symmetric && on[0] == sites[1] && on[1] == sites[0]))
        return e->duration;
    bool suits = e->on.empty();
    for (size_t i = 0; i < sites.size(); ++i) {
      suits &= sites[i] >= 0 && sites[i] < 5;
      for (size_t j = 0; j < i; ++j)
        suits &= sites[i] != sites[j];
    }
    if (sites.size() == 2) // the device is a line
      suits = suits && std::abs(sites[0] - sites[1]) == 1;
    if (suits)
      any = e->duration;
  }
  return any;
}

TEST(DeviceTest, FindsWhatASearchFinds) {
  Device device = line();
  for (OperationEntry &e : std::vector<OperationEntry>{
           entry("x", 1, 1), entry("x", 1, 2, {{1}, {4}}),
           entry("x", 1, 3, {{0}}), entry("y", 1, 4, {{3}}),
           entry("cx", 2, 5, {{0, 1}, {2, 1}}), entry("cx", 2, 6, {{1, 0}}),
           entry("cz", 2, 7, {{1, 2}}, true), entry("cz", 2, 8),
           entry("swap", 2, 9, {{3, 4}, {3, 2}}, true),
           entry("ccx", 3, 10, {{0, 1, 2}, {2, 1, 0}}), entry("ccx", 3, 11),
           entry("ccz", 3, 12, {{4, 2, 0}})})
    llvm::cantFail(device.addOperation(e));
  Device moved = std::move(device);

  unsigned found = 0;
  const SiteId numbers[] = {-1, 0, 1, 2, 3, 4, 5, Most, -Most - 1};
  for (const char *name : {"x", "y", "cx", "cz", "swap", "ccx", "ccz", "z"}) {
    auto compare = [&](llvm::ArrayRef<SiteId> sites) {
      Ticks expected = searchList(moved, name, sites);
      EXPECT_EQ(durationOf(moved, name, sites), expected) << name;
      llvm::Expected<const OperationEntry *> required =
          moved.require(name, sites);
      EXPECT_EQ(bool(required), expected != -1);
      if (required) {
        EXPECT_EQ((*required)->duration, expected);
      } else {
        llvm::consumeError(required.takeError());
      }
      found += expected != -1;
    };
    compare({});
    for (SiteId a : numbers) {
      compare({a});
      for (SiteId b : numbers) {
        compare({a, b});
        for (SiteId c : numbers)
          compare({a, b, c});
      }
    }
  }
  // x 5, y 1, cx 3, cz 8 (each coupler both ways), swap 4, ccx 5 * 4 * 3,
  // ccz 1.
  EXPECT_EQ(found, 5u + 1 + 3 + 8 + 4 + 60 + 1);
}

TEST(DeviceTest, RequireSaysWhatIsMissing) {
  Device device = line();
  for (OperationEntry &e : std::vector<OperationEntry>{
           entry("x", 1, 10), entry("y", 1, 10, {{0}, {2}}),
           entry("cx", 2, 40, {{2, 1}, {0, 1}}), entry("cz", 2, 40)})
    llvm::cantFail(device.addOperation(e));
  auto require = [&](llvm::StringRef name, llvm::ArrayRef<SiteId> sites) {
    return failure(device.require(name, sites));
  };
  EXPECT_EQ(require("foo", {0}),
            "device 'barley' has no operation 'foo' (it has cx, cz, x, y)");
  EXPECT_EQ(require("cx", {0, 2}),
            "device 'barley' has no 'cx' on (0, 2): sites 0 and 2 are not "
            "coupled");
  EXPECT_EQ(require("cx", {1, 0}),
            "device 'barley' has no 'cx' on (1, 0): it is listed for (0, 1) "
            "only in that order");
  EXPECT_EQ(require("cx", {3, 4}),
            "device 'barley' has no 'cx' on (3, 4): it is listed for (0, 1), "
            "(2, 1)");
  EXPECT_EQ(require("cz", {3, 3}),
            "device 'barley' has no 'cz' on (3, 3): site 3 is named twice");
  EXPECT_EQ(require("cz", {0, 7}),
            "device 'barley' has no 'cz' on (0, 7): there is no site 7 (sites "
            "are 0 to 4)");
  EXPECT_EQ(require("cz", {0, 1, 2}),
            "device 'barley' has no 'cz' on (0, 1, 2): it takes 2 qubits, not "
            "3");
  EXPECT_EQ(require("x", {7}),
            "device 'barley' has no 'x' on site 7: there is no site 7 (sites "
            "are 0 to 4)");
  EXPECT_EQ(require("y", {1}),
            "device 'barley' has no 'y' on site 1: it is listed for site 0, "
            "site 2");
  EXPECT_EQ(require("x", {0, 1}),
            "device 'barley' has no 'x' on (0, 1): it takes 1 qubit, not 2");
}

TEST(DeviceTest, RequireOnOtherDevices) {
  EXPECT_EQ(failure(Device("bare", Clock()).require("x", {0})),
            "device 'bare' has no operation 'x' (0 others)");

  Device gaps("gaps", Clock());
  for (SiteId number : {5, 0, 2})
    llvm::cantFail(gaps.addSite({number, {}, {}, {}, {}}));
  llvm::cantFail(gaps.addOperation(entry("x", 1, 10)));
  EXPECT_EQ(failure(gaps.require("x", {1})),
            "device 'gaps' has no 'x' on site 1: there is no site 1 (sites are "
            "0, 2, 5)");

  Device many("many", Clock());
  for (SiteId number = 0; number < 40; number += 2)
    llvm::cantFail(many.addSite({number, {}, {}, {}, {}}));
  for (int i = 0; i < 13; ++i)
    llvm::cantFail(many.addOperation(entry("g" + std::to_string(i), 1, 1)));
  Tuples on;
  for (SiteId number = 2; number < 40; number += 2)
    on.push_back({number});
  llvm::cantFail(many.addOperation(entry("x", 1, 10, on)));
  EXPECT_EQ(failure(many.require("y", {0})),
            "device 'many' has no operation 'y' (14 others)");
  EXPECT_EQ(failure(many.require("x", {1})),
            "device 'many' has no 'x' on site 1: there is no site 1 (there are "
            "20 between 0 and 38)");
  EXPECT_EQ(failure(many.require("x", {0})),
            "device 'many' has no 'x' on site 0: it is listed for 19 others");
}

} // namespace
