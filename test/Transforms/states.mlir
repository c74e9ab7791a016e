// RUN: lull-opt %s --lull-schedule | FileCheck %s
// RUN: lull-opt %s --lull-schedule=spent-at-end | FileCheck %s --check-prefix=SPENT
// RUN: lull-opt %s --lull-schedule=live-at-start | FileCheck %s --check-prefix=START

// What waiting qubits hold: a dataflow over what gates do to basis states and
// to Z errors (docs/Spec.md). Site 0 keeps the others waiting.

lull.device @line clock 1 ns {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.coupler 0, 2
}

// CHECK-LABEL: @start_and_x
// CHECK: lull.idle %q1 for 90 dt basis
func.func @start_and_x() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  lull.delay %q0 for 100 dt
  lull.gate x %q1 for 10 dt
  lull.barrier %q0, %q1
  return
}

// CHECK-LABEL: @superposition
// CHECK: lull.idle %q1 for 90 dt live
// SPENT-LABEL: @superposition
// SPENT: lull.idle %q1 for 90 dt spent
func.func @superposition() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  lull.barrier %q0, %q1
  return
}

// A control in a basis state stays in one; a target then keeps what it has.
// CHECK-LABEL: @cx_between_basis_states
// CHECK: lull.idle %q1 for 90 dt basis
// CHECK: lull.idle %q2 for 90 dt basis
func.func @cx_between_basis_states() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate cx %q1, %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}

// A control in superposition entangles its target.
// CHECK-LABEL: @cx_spreads
// CHECK: lull.idle %q1 for 80 dt live
// CHECK: lull.idle %q2 for 80 dt live
func.func @cx_spreads() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  lull.gate cx %q1, %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}

// A target in superposition leaves its control in a basis state, as cz does.
// CHECK-LABEL: @controls_stay
// CHECK: lull.idle %q1 for 70 dt basis
// CHECK: lull.idle %q2 for 70 dt live
func.func @controls_stay() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q2 for 10 dt
  lull.gate cx %q1, %q2 for 10 dt
  lull.gate cz %q2, %q1 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}

// CHECK-LABEL: @swap_exchanges
// CHECK: lull.idle %q1 for 80 dt basis
// CHECK: lull.idle %q2 for 80 dt live
func.func @swap_exchanges() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  lull.gate swap %q1, %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}

// A measured or reset qubit is in a basis state until a gate takes it out.
// CHECK-LABEL: @measured_and_reset
// CHECK: lull.idle %q1 for 70 dt basis
// CHECK: lull.idle %q2 for 70 dt live
func.func @measured_and_reset() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  %m = lull.measure %q1 for 20 dt
  lull.reset %q2 for 20 dt
  lull.gate h %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}

// Only measured from here on: dephasing cannot be seen, also through gates
// that pass Z errors on to the same qubit; not through h.
// CHECK-LABEL: @spent
// CHECK: lull.idle %q1 for 90 dt spent
// CHECK: lull.idle %q2 for 90 dt live
// CHECK: lull.barrier
func.func @spent() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  lull.gate h %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  lull.gate rz(0.5) %q1 for 0 dt
  lull.gate x %q1 for 10 dt
  %m1 = lull.measure %q1 for 20 dt
  lull.gate h %q2 for 10 dt
  %m2 = lull.measure %q2 for 20 dt
  return
}

// A Z error on the target of a cx reaches the control, which is still wanted;
// on the control it stays there, and the control is only measured.
// CHECK-LABEL: @spent_through_cx
// CHECK: lull.idle %q1 for 90 dt live
// CHECK: lull.idle %q2 for 90 dt spent
// CHECK: lull.barrier
func.func @spent_through_cx() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate h %q1 for 10 dt
  lull.gate h %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  lull.gate cx %q0, %q1 for 10 dt
  lull.gate cx %q2, %q1 for 10 dt
  %m1 = lull.measure %q1 for 20 dt
  %m2 = lull.measure %q2 for 20 dt
  return
}

// A qubit that the function receives may hold a state, until it is reset.
// CHECK-LABEL: @handed_in
// CHECK: lull.idle %arg0 for 100 dt live
func.func @handed_in(%d: !lull.qubit {lull.site = 1 : i64}) attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.delay %q0 for 100 dt
  lull.barrier %q0, %d
  return
}

// CHECK-LABEL: @handed_in_to_be_reset
// CHECK: lull.idle %arg0 for 100 dt spent
// CHECK: lull.reset
// CHECK: lull.idle %arg0 for 100 dt basis
func.func @handed_in_to_be_reset(%d: !lull.qubit {lull.site = 1 : i64}) attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.delay %q0 for 100 dt
  lull.barrier %q0, %d
  lull.reset %d for 10 dt
  lull.delay %q0 for 110 dt
  lull.barrier %q0, %d
  return
}

// What the device says that an operation plays goes before its name.
lull.device @odd clock 1 ns {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.operation x for 10 dt plays rotation(1/2 pi, 0 pi)
  lull.operation flip for 10 dt plays rotation(1 pi, 1/3 pi)
}
// CHECK-LABEL: @plays
// CHECK: lull.idle %q1 for 90 dt live
// CHECK: lull.idle %q2 for 90 dt basis
// START-LABEL: @plays
// START: lull.idle %q2 for 90 dt live
func.func @plays() attributes {lull.device = @odd} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.delay %q0 for 100 dt
  lull.gate x %q1 for 10 dt
  lull.gate flip %q2 for 10 dt
  lull.barrier %q0, %q1, %q2
  return
}
