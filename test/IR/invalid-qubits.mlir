// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints Q1 to Q6 of docs/Spec.md.

// Q1: a gate on no qubit
func.func @none() {
  // expected-error@below {{'lull.gate' op acts on no qubit}}
  lull.gate x for 160 dt
  return
}

// -----

// Q1: a barrier on no qubit
func.func @none() {
  // expected-error@below {{'lull.barrier' op acts on no qubit}}
  "lull.barrier"() : () -> ()
  return
}

// -----

// Q1: a delay on no qubit
func.func @none() {
  // expected-error@below {{'lull.delay' op acts on no qubit}}
  "lull.delay"() <{duration = "5 dt"}> : () -> ()
  return
}

// -----

// Q2: a qubit twice in one gate
func.func @twice() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op qubit 1 is the same as qubit 0}}
  lull.gate cx %q0, %q0
  return
}

// -----

// Q2: a qubit twice among many
func.func @twice() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  // expected-error@below {{'lull.barrier' op qubit 3 is the same as qubit 1}}
  lull.barrier %q0, %q1, %q2, %q1
  return
}

// -----

// Q2: a qubit twice in a delay
func.func @twice() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  // expected-error@below {{'lull.delay' op qubit 2 is the same as qubit 0}}
  lull.delay %q1, %q0, %q1 for 40 ns
  return
}

// -----

// Q3: a site that the device lacks, said once
lull.device @pair clock 1 ns {
  lull.site 0
  lull.site 1
}
func.func @missing() attributes {lull.device = @pair} {
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  // expected-error@below {{site 2 is not on device 'pair', which has 2 sites}}
  lull.gate x %q2
  lull.gate cx %q1, %q2
  %m = lull.measure %q2
  return
}

// -----

// Q3: the largest number
lull.device @pair clock 1 ns {
  lull.site 0
  lull.site 1
}
func.func @missing() attributes {lull.device = @pair} {
  %q = lull.qubit 9223372036854775807
  // expected-error@below {{site 9223372036854775807 is not on device 'pair', which has 2 sites}}
  lull.reset %q
  return
}

// -----

// Q3: a site that an argument has
lull.device @pair clock 1 ns {
  lull.site 0
  lull.site 1
}
func.func @missing(%q: !lull.qubit {lull.site = 7 : i64})
    attributes {lull.device = @pair} {
  // expected-error@below {{site 7 is not on device 'pair', which has 2 sites}}
  lull.reset %q
  return
}

// -----

// Q4: two handles of one site in a gate
lull.device @pair clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
}
func.func @same() attributes {lull.device = @pair} {
  %a = lull.qubit 1
  %b = lull.qubit 1
  // expected-error@below {{both qubits are on site 1}}
  lull.gate cx %a, %b
  // expected-error@below {{both qubits are on site 1}}
  lull.barrier %a, %b
  return
}

// -----

// Q5: a gate on a pair without a coupler
lull.device @line clock 1 ns {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 2, 1
}
func.func @apart() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.gate cz %q0, %q1
  lull.gate cz %q1, %q0
  lull.barrier %q0, %q2
  lull.delay %q0, %q2 for 5 dt
  // expected-error@below {{sites 0 and 2 of device 'line' are not coupled}}
  lull.gate cz %q0, %q2
  return
}

// -----

// Q6: a negative site
func.func @below() {
  // expected-error@below {{'lull.qubit' op site -1 is negative}}
  %q = lull.qubit -1
  return
}
