// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints P8 to P11 of docs/Spec.md.

// P8: an empty name
func.func @name() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op has an empty name}}
  lull.gate "" %q0
  return
}

// -----

// P9: an unknown state
func.func @state() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' unknown state 'dead': expected basis, live or spent}}
  lull.idle %q0 for 160 dt dead
  return
}

// -----

// P9: no state
func.func @state() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' expected what the qubit holds: basis, live or spent}}
  lull.idle %q0 for 160 dt {}
  return
}

// -----

// P10: a plan without a sequence
func.func @plan() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' expected a sequence: a name such as "xy8" or a symbol}}
  lull.idle %q0 for 160 dt live plan repeats 2
  return
}

// -----

// P10: a plan with a bare word
func.func @plan() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' expected a sequence: a name such as "xy8" or a symbol}}
  lull.idle %q0 for 160 dt live plan xy8
  return
}

// -----

// P11: no repeats
func.func @repeats() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' a plan repeats its sequence 0 times when it should be 1 to 10000}}
  lull.idle %q0 for 160 dt live plan "xy8" repeats 0
  return
}

// -----

// P11: repeats beyond 32 bits
func.func @repeats() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.idle' a plan repeats its sequence 4294967296 times when it should be 1 to 10000}}
  lull.idle %q0 for 160 dt live plan "xy8" repeats 4294967296
  return
}

// -----

// P11: in an attribute of a foreign operation
// expected-error@below {{a plan repeats its sequence 0 times when it should be 1 to 10000}}
func.func @repeats() attributes {lull.plan = #lull.plan<"xy8" repeats 0>} {
  return
}
