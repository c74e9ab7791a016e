//===- Program.cpp - Programs as the test knows them ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Program.h"

#include "lull/IR/Ops.h"

#include "llvm/ADT/TypeSwitch.h"

#include <fmt/format.h>
#include <gtest/gtest.h>

using namespace lull;
using namespace lull::property;

//===----------------------------------------------------------------------===//
// The timing rule, forwards and backwards
//===----------------------------------------------------------------------===//

std::vector<std::int64_t> Invented::asap() const {
  std::map<int, std::int64_t> clock;
  std::vector<std::int64_t> starts;
  for (const InventedOp &op : ops) {
    std::int64_t start = 0;
    for (int site : op.sites)
      start = std::max(start, clock[site]);
    for (int site : op.sites)
      clock[site] = start + op.duration;
    starts.push_back(start);
  }
  return starts;
}

std::int64_t Invented::makespan() const {
  std::vector<std::int64_t> starts = asap();
  std::int64_t end = 0;
  for (size_t i = 0; i < ops.size(); ++i)
    end = std::max(end, starts[i] + ops[i].duration);
  return end;
}

std::vector<std::int64_t> Invented::alap() const {
  std::map<int, std::int64_t> left;
  std::vector<std::int64_t> starts(ops.size());
  std::int64_t end = makespan();
  for (size_t i = ops.size(); i-- > 0;) {
    // How much is left to do from here on.
    std::int64_t most = 0;
    for (int site : ops[i].sites)
      most = std::max(most, left[site]);
    for (int site : ops[i].sites)
      left[site] = most + ops[i].duration;
    starts[i] = end - most - ops[i].duration;
  }
  return starts;
}

//===----------------------------------------------------------------------===//
// Invention
//===----------------------------------------------------------------------===//

namespace {

class Inventor {
public:
  Inventor(Random &random, const RandomDevice &device, std::string name)
      : random(random), device(device) {
    program.name = std::move(name);
  }

  Invented run();

private:
  void choose();
  void add(InventedOp op, llvm::StringRef angles = "");
  void gate(llvm::StringRef name, std::vector<int> on,
            llvm::StringRef angles = "");
  void listed(llvm::StringRef kind, int site);
  void wait(llvm::StringRef kind, std::vector<int> on);
  std::vector<int> some(size_t least, size_t most);
  std::string stated(std::int64_t ticks);
  std::string handle(int site) {
    bool second = aliased == site && random.chance(50);
    return fmt::format("%{}{}", second ? "again" : "q", site);
  }

  Random &random;
  const RandomDevice &device;
  Invented program;
  std::string body;
  std::vector<int> sites;
  int aliased = -1;
};

} // namespace

/// In dt, or in units of time where that is a plain decimal.
std::string Inventor::stated(std::int64_t ticks) {
  std::int64_t parts = device.dt.denominator();
  if (random.chance(40) && ticks % parts == 0)
    return fmt::format("{} {}", ticks / parts * device.dt.numerator(),
                       device.unit);
  return fmt::format("{} dt", ticks);
}

std::vector<int> Inventor::some(size_t least, size_t most) {
  std::vector<int> chosen = sites;
  random.shuffle(chosen);
  most = std::min(most, chosen.size());
  chosen.resize(
      random.within(std::int64_t(std::min(least, most)), std::int64_t(most)));
  return chosen;
}

void Inventor::add(InventedOp op, llvm::StringRef angles) {
  std::vector<std::string> handles;
  for (int site : op.sites)
    handles.push_back(handle(site));
  size_t tag = program.ops.size();
  std::string attributes = fmt::format("tag = {} : i64", tag);
  if (random.chance(5))
    op.wish = random.of<Wish>({{"none"}, {"cpmg-2"}, {"cp-4", 2}, {"hahn"}});
  if (op.wish.repeats)
    attributes += fmt::format(", lull.protect = #lull.plan<\"{}\" repeats {}>",
                              op.wish.sequence, op.wish.repeats);
  else if (!op.wish.sequence.empty())
    attributes += fmt::format(", lull.protect = \"{}\"", op.wish.sequence);
  body += fmt::format(
      "  {}lull.{}{}{} {}{}{} {{{}}}\n",
      op.kind == "measure" ? fmt::format("%m{} = ", tag) : "", op.kind,
      op.name.empty() || op.kind != "gate" ? "" : " " + op.name, angles.str(),
      fmt::join(handles, ", "), op.stated.empty() ? "" : " for " + op.stated,
      op.kind == "idle" ? " live" : "", attributes);
  program.ops.push_back(std::move(op));
}

void Inventor::gate(llvm::StringRef name, std::vector<int> on,
                    llvm::StringRef angles) {
  const Entry *entry = device.find(name, on);
  if (!entry)
    return;
  InventedOp op{"gate", name.str(), std::move(on), entry->duration, "", {}};
  // Some programs know better than the device.
  if (op.duration > 0 && random.chance(10)) {
    op.duration = random.within(0, 2 * op.duration);
    op.stated = stated(op.duration);
  }
  add(std::move(op), angles);
}

void Inventor::listed(llvm::StringRef kind, int site) {
  const Entry *entry = device.find(kind, {site});
  add({kind.str(), kind.str(), {site}, entry->duration, "", {}});
}

void Inventor::wait(llvm::StringRef kind, std::vector<int> on) {
  InventedOp op{kind.str(), "", std::move(on), 0, "", {}};
  if (kind != "barrier") {
    op.duration = random.within(0, 20 * device.pulseScale) /
                  device.dt.denominator() * device.dt.denominator();
    if (kind == "idle")
      op.duration += device.dt.denominator();
    op.stated = stated(op.duration);
  }
  add(std::move(op));
}

void Inventor::choose() {
  int site = random.of(sites);
  switch (random.within(0, 15)) {
  case 0:
    return gate("h", {site});
  case 1:
    return gate("t", {site});
  case 2:
    return gate("u3", {site}, "(0.25, 1/3 pi, -0.5)");
  case 3:
    if (random.chance(50))
      return gate("rz", {site}, "(3/7 pi)");
    return gate(random.of<std::string>({"id", "x"}), {site});
  case 4:
  case 5:
    return wait("barrier", some(1, sites.size()));
  case 6:
    return wait("delay", some(1, 3));
  case 7:
    return listed(random.chance(50) ? "measure" : "reset", site);
  case 8:
    if (random.chance(40))
      return wait("idle", {site});
    if (sites.size() >= 3)
      return gate("ccx", some(3, 3));
    return gate("h", {site});
  default: {
    std::pair<int, int> on = random.of(device.couplers);
    if (random.chance(50))
      std::swap(on.first, on.second);
    if (llvm::is_contained(sites, on.first) &&
        llvm::is_contained(sites, on.second))
      gate(random.of<std::string>({"cx", "cx", "cz", "swap"}),
           {on.first, on.second});
  }
  }
}

Invented Inventor::run() {
  sites = device.sites;
  random.shuffle(sites);
  sites.resize(random.within(2, std::int64_t(sites.size())));
  if (random.chance(30))
    aliased = random.of(sites);
  std::vector<std::string> arguments;
  std::string handles;
  for (int site : sites) {
    if (random.chance(20))
      arguments.push_back(
          fmt::format("%q{0}: !lull.qubit {{lull.site = {0} : i64}}", site));
    else
      handles += fmt::format("  %q{0} = lull.qubit {0}\n", site);
  }
  if (aliased >= 0)
    handles += fmt::format("  %again{0} = lull.qubit {0}\n", aliased);
  for (int site : sites)
    if (random.chance(85))
      gate("h", {site});
  std::int64_t count = random.within(6, 28);
  for (std::int64_t i = 0; i != count; ++i)
    choose();
  if (random.chance(30))
    wait("barrier", sites);
  if (random.chance(30))
    for (int site : sites)
      listed("measure", site);
  program.text = fmt::format(
      "func.func @{}({}) attributes {{lull.device = @{}}} {{\n{}{}  return\n"
      "}}\n",
      program.name, fmt::join(arguments, ", "), device.name, handles, body);
  return std::move(program);
}

Invented property::inventProgram(Random &random, const RandomDevice &device,
                                 std::string name) {
  return Inventor(random, device, std::move(name)).run();
}

//===----------------------------------------------------------------------===//
// Reading
//===----------------------------------------------------------------------===//

static int siteOf(mlir::Value qubit) {
  if (auto handle = qubit.getDefiningOp<QubitOp>())
    return int(handle.getSite());
  auto argument = llvm::cast<mlir::BlockArgument>(qubit);
  auto function =
      llvm::cast<mlir::func::FuncOp>(argument.getOwner()->getParentOp());
  return int(function
                 .getArgAttrOfType<mlir::IntegerAttr>(argument.getArgNumber(),
                                                      "lull.site")
                 .getInt());
}

/// The duration that an operation states; barriers have none.
static Duration durationOf(mlir::Operation *op) {
  return llvm::TypeSwitch<mlir::Operation *, Duration>(op)
      .Case<GateOp, MeasureOp, ResetOp, DelayOp, IdleOp>(
          [](auto timed) -> Duration { return timed.getProperties().duration; })
      .Default([](mlir::Operation *) { return Duration::ticks(0); });
}

ReadProgram property::readProgram(mlir::func::FuncOp function,
                                  const Invented &invented) {
  ReadProgram program;
  for (mlir::Operation &op : function.getBody().front()) {
    llvm::StringRef kind = op.getName().getStringRef();
    if (!kind.consume_front("lull.") || kind == "qubit")
      continue;
    ReadOp read;
    read.op = &op;
    read.kind = kind;
    if (auto gate = llvm::dyn_cast<GateOp>(op))
      read.name = gate.getGate();
    if (auto tag = op.getAttrOfType<mlir::IntegerAttr>("tag"))
      read.tag = int(tag.getInt());
    for (mlir::Value qubit : op.getOperands())
      read.sites.push_back(siteOf(qubit));
    Duration duration = durationOf(&op);
    if (read.tag < 0) {
      EXPECT_EQ(duration.unit(), TimeUnit::dt) << duration.str();
      read.duration = duration.amount();
    } else {
      const InventedOp &known = invented.ops[read.tag];
      read.duration = known.duration;
      EXPECT_EQ(duration.str(), known.stated.empty()
                                    ? fmt::format("{} dt", known.duration)
                                    : known.stated)
          << "of operation " << read.tag;
    }
    for (int site : read.sites)
      read.start = std::max(read.start, program.end[site]);
    for (int site : read.sites) {
      program.end[site] = read.start + read.duration;
      program.bySite[site].push_back(program.ops.size());
    }
    program.ops.push_back(std::move(read));
  }
  return program;
}
