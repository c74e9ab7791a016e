//===- Passes.td - The passes ------------------------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_PASSES
#define LULL_TRANSFORMS_PASSES

include "mlir/Pass/PassBase.td"

// All passes run on the module: they share its devices, and MLIR's remark
// engine must hear from one thread only. Functions are processed in parallel
// where the context allows it; remarks come in program order all the same.

class Lull_Pass<string argument> : Pass<argument, "::mlir::ModuleOp"> {
  let dependentDialects = ["::lull::LullDialect"];
}

def LullUseDevice : Lull_Pass<"lull-use-device"> {
  let summary = "Link a device into the module";
  let description = [{
    Takes the device from a file (which must hold exactly one `lull.device`) or
    one of the built-in demo devices by name, puts it into the module, and lets
    every function with timed operations that names no device run on it. A
    device of that name that is already there must be the same.

    This is the only pass that reads a file; later ones read the module only.
  }];
  let options = [
    Option<"file", "file", "std::string", "\"\"",
           "File that holds the device">,
    Option<"name", "name", "std::string", "\"\"",
           "Name of a built-in demo device, or of the device in the module">,
  ];
}

def LullSetDurations : Lull_Pass<"lull-set-durations"> {
  let summary = "Give every operation its duration on the device";
  let description = [{
    Gates, measurements and resets without a duration take that of the device's
    entry for their name and sites. One that the device does not list is an
    error. A duration that the program states stays, unless `replace` is set;
    delays and idles always keep theirs.
  }];
  let options = [
    Option<"replace", "replace", "bool", "false",
           "Replace durations that the program states">,
  ];
}

def LullSchedule : Lull_Pass<"lull-schedule"> {
  let summary = "Write every wait as an idle with its state";
  let description = [{
    Schedules each function and makes it tight: wherever a qubit waits, an idle
    of that length is written, so that start times follow from the text alone.
    The order and the total length never change. Idles that are there already
    are kept; a tight function does not change.

    Each idle says what the qubit holds: `basis` (a computational basis state),
    `spent` (only measured or reset from here on) or `live`. A remark per idle
    says what the qubit waits for.
  }];
  let options = [
    Option<"policy", "policy", "::lull::SchedulePolicy",
           "::lull::SchedulePolicy::ASAP", "When operations start",
           [{::llvm::cl::values(
             clEnumValN(::lull::SchedulePolicy::ASAP, "asap",
                        "as soon as possible"),
             clEnumValN(::lull::SchedulePolicy::ALAP, "alap",
                        "as late as possible"))}]>,
    Option<"liveAtStart", "live-at-start", "bool", "false",
           "Qubits hold states that matter when the function starts">,
    Option<"spentAtEnd", "spent-at-end", "bool", "false",
           "Qubits are not used after the function ends">,
  ];
}

def LullAssign : Lull_Pass<"lull-assign"> {
  let summary = "Put a plan on each window";
  let description = [{
    Decides for each idle: leave it, or a sequence with its repeats. A plan that
    is on an idle stays; next goes the user's wish (`lull.protect` on the idle
    or on the operation that ends it; on
    the terminator, for the waits that last to the end); then the sequence of the option, for
    windows that are live, long enough and hold its pulses on the grid. A remark
    says why a window is left.

    Every `lull.sequence` of the module is checked to be the identity.
  }];
  let options = [
    Option<"sequence", "sequence", "std::string", "\"\"",
           "Sequence for the windows: a name such as xy8, or @symbol">,
    Option<"repeats", "repeats", "unsigned", "1",
           "How often the sequence is repeated in a window">,
    Option<"spacing", "spacing", "std::string", "\"\"",
           "Repeat as often as pulses stay this far apart on average">,
    Option<"alternating", "alternating", "bool", "false",
           "Flip the signs of all pulses in every second repeat">,
    Option<"leastWindow", "least-window", "std::string", "\"\"",
           "Leave shorter windows, such as '500 ns'">,
    Option<"alsoBasis", "also-basis", "bool", "false",
           "Protect windows in a basis state too">,
    Option<"alsoSpent", "also-spent", "bool", "false",
           "Protect windows of spent qubits too">,
  ];
}

def LullEmit : Lull_Pass<"lull-emit"> {
  let summary = "Turn plans into pulses and delays on the grid";
  let description = [{
    Replaces each idle that has a plan by pulses (`lull.pulse`) on the device's
    start grid and delays between them that add up to the window exactly. Among
    the placements on the grid it takes the one whose residual is nearest to the
    sequence's own (zero for a balanced one), then of least displacement
    (docs/Spec.md). A plan that does not fit its window is an
    error. A remark per window gives the sequence, pulses and residual.

    With `native` the pulses are written in the device's operations at once, as
    `lull-native` would: the same result without the step between.
  }];
  let options = [
    Option<"native", "native", "bool", "false",
           "Write the pulses in the operations of the device">,
  ];
}

def LullNative : Lull_Pass<"lull-native"> {
  let summary = "Play pulses with the operations of the device";
  let description = [{
    Replaces each `lull.pulse` by native operations of its device: the rotation
    itself where there is one, else another pulse between frame changes, else
    two half turns. Frame changes within a window are merged and sum to zero. A
    pulse that the device cannot play is an error that says what is missing.
  }];
}

def LullPrintTimeline : Lull_Pass<"lull-print-timeline"> {
  let summary = "Print when operations start and how far they can float";
  let description = [{
    For each function a table of its timed operations: start, end and total
    slack in dt (how much later it can start without moving the end of the
    program; `critical` for those on the critical path), what it is and the
    sites it acts on; then the length in dt and seconds. The module does not
    change.
  }];
}

#endif // LULL_TRANSFORMS_PASSES
