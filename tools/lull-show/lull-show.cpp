//===- lull-show.cpp - The catalogue and the built-in devices ---*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Answers from the tables of the library itself, so that what a user reads is
// what the passes do. The few arguments are read by hand: the option parser of
// LLVM would list the options of everything that is linked.
//
//===----------------------------------------------------------------------===//

#include "lull/Sequence/Catalogue.h"
#include "lull/Sequence/FirstOrder.h"
#include "lull/Sequence/Net.h"
#include "lull/Sequence/Placement.h"
#include "lull/Timing/Fault.h"
#include "lull/Transforms/DemoDevices.h"

#include "llvm/ADT/STLExtras.h"
#include "llvm/ADT/StringExtras.h"
#include "llvm/Support/raw_ostream.h"

#include <fmt/format.h>

#include <cmath>
#include <limits>

using namespace lull;
using llvm::StringRef;

static constexpr StringRef Usage =
    R"(usage: lull-show sequences [--width DT [--step DT] [--gap DT]]
       lull-show sequence NAME
       lull-show devices
       lull-show device NAME

  sequences      the catalogue in a table
    --width DT   give the least window in dt, for pulses of this width
    --step DT    pulses start on multiples of this (default 1)
    --gap DT     least time between pulses (default 0)
  sequence NAME  one sequence in full, such as xy8 or udd-4
  devices        the built-in devices
  device NAME    the text of one, to copy and to change
)";

//===----------------------------------------------------------------------===//
// What is said of a sequence
//===----------------------------------------------------------------------===//

namespace {

/// A sequence and what follows from it.
struct Entry {
  /// As the catalogue has it, and as it is played.
  Sequence open, played;
  Net net;
  FirstOrder order;

  bool isClosed() const { return played.size() != open.size(); }
};

} // namespace

static llvm::Expected<Entry> makeEntry(StringRef name) {
  Entry entry;
  llvm::Expected<Sequence> open = findSequence(name);
  if (!open)
    return open.takeError();
  llvm::Expected<Net> net = netBySum(open->phases);
  if (!net)
    return net.takeError();
  llvm::Expected<Sequence> played = close(*open);
  if (!played)
    return played.takeError();
  entry.net = *net;
  entry.order = firstOrder(*played);
  entry.open = std::move(*open);
  entry.played = std::move(*played);
  return std::move(entry);
}

/// `sx sz`, or `nothing`.
static std::string spellAxes(const std::array<bool, 3> &axes) {
  static const char *const names[] = {"sx", "sy", "sz"};
  std::string text;
  for (size_t i = 0; i < 3; ++i)
    if (axes[i])
      text += (text.empty() ? "" : " ") + std::string(names[i]);
  return text.empty() ? "nothing" : text;
}

/// `x.z`: the same in a column.
static std::string markAxes(const std::array<bool, 3> &axes) {
  std::string text = "...";
  for (size_t i = 0; i < 3; ++i)
    if (axes[i])
      text[i] = "xyz"[i];
  return text;
}

/// `0`, or `(0, 2, 1.41)`.
static std::string spellVector(const std::array<double, 3> &vector) {
  std::array<double, 3> shown = vector;
  for (double &x : shown)
    // What is left of a cancellation in floating point is none.
    x = std::abs(x) < 1e-9 ? 0 : x;
  if (shown == std::array<double, 3>{})
    return "0";
  return fmt::format("({:.3g}, {:.3g}, {:.3g})", shown[0], shown[1], shown[2]);
}

/// The family of a name that the catalogue knows.
static const Family &familyOf(StringRef name) {
  const Family *found = nullptr;
  for (const Family &family : catalogue()) {
    StringRef rest = name;
    if (rest.consume_front(family.stem) &&
        (rest.empty() || rest.starts_with("-")) &&
        (!found || found->stem.size() < family.stem.size()))
      found = &family;
  }
  return *found;
}

//===----------------------------------------------------------------------===//
// sequences
//===----------------------------------------------------------------------===//

namespace {

/// Pulse width and grid, if the user gave them.
struct Grid {
  std::optional<Ticks> width, step, gap;
};

} // namespace

static std::string spellLeastWindow(const Sequence &sequence,
                                    const Grid &grid) {
  if (!grid.width)
    return fmt::format("{} widths", sequence.size());
  std::vector<Ticks> widths(sequence.size(), *grid.width);
  Ticks least =
      leastWindow(widths, {0, 0, grid.step.value_or(1), grid.gap.value_or(0)});
  if (least == std::numeric_limits<Ticks>::max())
    return "beyond 64 bits";
  return fmt::format("{} dt", least);
}

/// The first words of a long one.
static std::string shorten(const std::string &word) {
  constexpr size_t most = 24;
  if (word.size() <= most)
    return word;
  return StringRef(word).take_front(most).rsplit(' ').first.str() + " ...";
}

static llvm::Error showSequences(const Grid &grid) {
  constexpr const char *row =
      "{:<14}{:<8}{:<13}{:<7}{:<7}{:<15}{:<18}{:<15}{}\n";
  llvm::raw_ostream &out = llvm::outs();
  out << fmt::format(row, "name", "pulses", "net", "ideal", "width",
                     "over-rotation", "detuning", "least window", "phases");
  for (const Family &family : catalogue())
    for (StringRef name : family.examples) {
      llvm::Expected<Entry> entry = makeEntry(name);
      if (!entry)
        return entry.takeError();
      std::string closing =
          entry->isClosed() ? spellPhase(entry->played.phases.back()) : "";
      out << fmt::format(row, name.str(), entry->open.size(),
                         closing.empty() ? "identity" : "closed by " + closing,
                         markAxes(entry->order.removed),
                         markAxes(entry->order.removedFiniteWidth),
                         spellVector(entry->order.overRotation),
                         spellVector(entry->order.detuningInPulse),
                         spellLeastWindow(entry->played, grid),
                         shorten(spellWord(entry->open)));
    }
  out << R"(
net            closed by: the pulse at the end that makes it the identity, which
               the columns from ideal to least window count too
ideal          which of sx, sy, sz ideal pulses remove to first order
width          the same for pulses that take time
over-rotation  sum of the toggled pulse axes: 0 if over-rotations cancel
detuning       toggled sz during pulses, in pulse widths: 0 if it cancels

)";
  for (const Family &family : catalogue()) {
    out << family.stem << ": " << family.source;
    if (!family.remark.empty())
      out << "; " << family.remark;
    out << '\n';
  }
  return llvm::Error::success();
}

//===----------------------------------------------------------------------===//
// sequence NAME
//===----------------------------------------------------------------------===//

static llvm::Error showSequence(StringRef name) {
  llvm::Expected<Entry> entry = makeEntry(name);
  if (!entry)
    return entry.takeError();
  const Sequence &played = entry->played;
  const Family &family = familyOf(name);
  llvm::raw_ostream &out = llvm::outs();
  auto line = [&](StringRef key, const std::string &value) {
    if (!value.empty())
      out << fmt::format("  {:<22}{}\n", key.str(), value);
  };
  out << entry->open.name << '\n';
  line("pulses", std::to_string(entry->open.size()));
  line("net", entry->net.str() +
                  (entry->isClosed() ? ", closed by a pulse at the end" : ""));
  line("anchor", played.anchor == Anchor::Centre
                     ? "the centre of a pulse lies on its instant"
                     : "the end of a pulse lies on its instant");
  line("removes, ideal pulses", spellAxes(entry->order.removed));
  line("removes, with width", spellAxes(entry->order.removedFiniteWidth));
  line("over-rotation", spellVector(entry->order.overRotation));
  line("detuning in pulses", spellVector(entry->order.detuningInPulse));
  line("least window", spellLeastWindow(played, {}));
  line("source", family.source.str());
  line("remark", family.remark.str());

  constexpr const char *row = "  {:>5}  {:<8}{:<6}{:<10}{}\n";
  out << '\n'
      << fmt::format(row, "pulse", "phase", "axis", "instant", "decimal");
  for (size_t i = 0; i < played.size(); ++i) {
    const Instant &instant = played.instants[i];
    std::string exact = instant.exact ? instant.exact->str() : "";
    std::string decimal = fmt::format("{:.6f}", instant.value);
    if (i >= entry->open.size())
      decimal += "  closes";
    std::string axis = spellPhase(played.phases[i]);
    std::string phase = played.phases[i].str();
    out << fmt::format(row, i + 1, phase, axis == phase ? "" : axis, exact,
                       decimal);
  }
  out << "\nphases are in units of pi, instants in window lengths\n";
  return llvm::Error::success();
}

//===----------------------------------------------------------------------===//
// devices
//===----------------------------------------------------------------------===//

static void showDevices() {
  for (const DemoDevice &device : demoDevices()) {
    StringRef summary = device.summary;
    summary.consume_front(device.name.str() + ": ");
    summary.consume_back(".");
    llvm::outs() << fmt::format("{:<10}{}\n", device.name.str(), summary.str());
  }
}

static llvm::Error showDevice(StringRef name) {
  const DemoDevice *device = findDemoDevice(name);
  if (!device)
    return fault(
        "unknown device '{}': known are {}", name.str(),
        llvm::join(llvm::map_range(demoDevices(),
                                   [](const DemoDevice &d) { return d.name; }),
                   ", "));
  llvm::outs() << device->text;
  return llvm::Error::success();
}

//===----------------------------------------------------------------------===//
// The command line
//===----------------------------------------------------------------------===//

using Arguments = llvm::ArrayRef<const char *>;

static llvm::Expected<Grid> parseGrid(Arguments arguments) {
  Grid grid;
  while (!arguments.empty()) {
    // `--width 160` and `--width=160`.
    auto [option, text] = StringRef(arguments.front()).split('=');
    bool joined = StringRef(arguments.front()).contains('=');
    arguments = arguments.drop_front();
    std::optional<Ticks> *slot = option == "--width"  ? &grid.width
                                 : option == "--step" ? &grid.step
                                 : option == "--gap"  ? &grid.gap
                                                      : nullptr;
    if (!slot)
      return fault("unknown argument '{}' of 'sequences'", option.str());
    if (!joined) {
      if (arguments.empty())
        return fault("option '{}' has no value", option.str());
      text = arguments.front();
      arguments = arguments.drop_front();
    }
    Ticks least = option == "--gap" ? 0 : 1;
    Ticks value = 0;
    if (text.getAsInteger(10, value) || value < least)
      return fault("option '{}' is '{}' when it should be a number of dt from "
                   "{}",
                   option.str(), text.str(), least);
    *slot = value;
  }
  if (!grid.width && (grid.step || grid.gap))
    return fault("options '--step' and '--gap' need '--width'");
  return grid;
}

static llvm::Error run(StringRef command, Arguments arguments) {
  if (command == "sequences") {
    llvm::Expected<Grid> grid = parseGrid(arguments);
    return grid ? showSequences(*grid) : grid.takeError();
  }
  size_t expected = command == "sequence" || command == "device" ? 1 : 0;
  if (expected == 0 && command != "devices")
    return fault("unknown command '{}': known are sequences, sequence, "
                 "devices, device",
                 command.str());
  if (arguments.size() != expected)
    return fault("number of arguments of '{}' is {} when it should be {}",
                 command.str(), arguments.size(), expected);
  if (command == "sequence")
    return showSequence(arguments.front());
  if (command == "device")
    return showDevice(arguments.front());
  showDevices();
  return llvm::Error::success();
}

int main(int argc, char **argv) {
  Arguments arguments(argv + 1, argv + argc);
  if (arguments.empty()) {
    llvm::errs() << Usage;
    return 1;
  }
  if (llvm::any_of(arguments, [](StringRef argument) {
        return argument == "--help" || argument == "-h";
      })) {
    llvm::outs() << Usage;
    return 0;
  }
  if (llvm::Error error = run(arguments.front(), arguments.drop_front())) {
    llvm::errs() << "lull-show: error: " << llvm::toString(std::move(error))
                 << '\n';
    return 1;
  }
  return 0;
}
