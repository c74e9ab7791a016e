// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints A1 to A9 of docs/Spec.md: attributes of the dialect on other
// operations.

// A1: the device as a string
// expected-error@below {{'lull.device' must be a symbol such as @barley but is "plain"}}
func.func @device() attributes {lull.device = "plain"} {
  return
}

// -----

// A1: the device as a nested symbol
// expected-error@below {{'lull.device' must be a symbol such as @barley but is @lab::@plain}}
func.func @device() attributes {lull.device = @lab::@plain} {
  return
}

// -----

// A3: a symbol that is no device
// expected-note@below {{it is this operation}}
func.func private @helper()
// expected-error@below {{@helper is not a device}}
func.func @device() attributes {lull.device = @helper} {
  return
}

// -----

// A3: a sequence is no device either
lull.sequence @mine phases [0, 0] at centred
// expected-error@below {{@mine is not a device}}
module attributes {lull.device = @mine} {
  // expected-note@below {{it is this operation}}
  lull.sequence @mine phases [0, 0] at centred
}

// -----

// A4: a state as a string
func.func @state() {
  // expected-error@below {{'lull.state' must be a #lull.state but is "live"}}
  %zero = arith.constant {lull.state = "live"} 0 : i64
  return
}

// -----

// A5: a plan as a string
func.func @plan() {
  // expected-error@below {{'lull.plan' must be a #lull.plan but is "xy8"}}
  %zero = arith.constant {lull.plan = "xy8"} 0 : i64
  return
}

// -----

// A6: a wish as a number
func.func @wish() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.protect' must be the name of a sequence, its symbol, a #lull.plan or "none" but is 8 : i64}}
  lull.gate x %q0 {lull.protect = 8 : i64}
  return
}

// -----

// A6: a wish as a nested symbol
func.func @wish() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.protect' must be the name of a sequence, its symbol, a #lull.plan or "none" but is @lab::@mine}}
  lull.gate x %q0 {lull.protect = @lab::@mine}
  return
}

// -----

// A7: an unknown attribute on an operation
func.func @unknown() {
  %q0 = lull.qubit 0
  // expected-error@below {{unknown attribute 'lull.protection': on operations there are lull.device, lull.protect, lull.state and lull.plan}}
  lull.gate x %q0 {lull.protection = "xy8"}
  return
}

// -----

// A7: a site belongs on arguments
// expected-error@below {{unknown attribute 'lull.site': on operations there are lull.device, lull.protect, lull.state and lull.plan}}
func.func @unknown() attributes {lull.site = 3 : i64} {
  return
}

// -----

// A8: a site as a string
// expected-error@below {{'lull.site' must be a number of a site such as 3 : i64 but is "3"}}
func.func @site(%q: !lull.qubit {lull.site = "3"}) {
  return
}

// -----

// A8: a site of 32 bits
// expected-error@below {{'lull.site' must be a number of a site such as 3 : i64 but is 3 : i32}}
func.func @site(%q: !lull.qubit {lull.site = 3 : i32}) {
  return
}

// -----

// A8: a negative site
// expected-error@below {{'lull.site' must be a number of a site such as 3 : i64 but is -3 : i64}}
func.func @site(%q: !lull.qubit {lull.site = -3 : i64}) {
  return
}

// -----

// A9: an unknown attribute on an argument
// expected-error@below {{unknown attribute 'lull.device' on argument 1: there is lull.site}}
func.func @unknown(%c: i1, %q: !lull.qubit {lull.device = @plain}) {
  return
}

// -----

// A10: a wish where no wait ends
// expected-error@below {{'lull.protect' has no effect here: it is for timed operations and for the end of a function}}
func.func @wish() attributes {lull.protect = "xy8"} {
  return
}

// -----

// A11: a plan besides that of an idle
func.func @plan() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.plan' has no effect here: it is for idles of other dialects}}
  lull.idle %q0 for 8 dt live {lull.plan = #lull.plan<"xy8">}
  return
}

// -----

// A11: a state on a gate
func.func @state() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.state' has no effect here: it is for idles of other dialects}}
  lull.gate x %q0 {lull.state = #lull.state<live>}
  return
}
