// RUN: lull-opt %s --canonicalize --cse --symbol-dce | FileCheck %s
// RUN: lull-opt %s --pass-pipeline="builtin.module(func.func(sccp,loop-invariant-code-motion,control-flow-sink,mem2reg,canonicalize,cse))" | FileCheck %s

// Timed operations have effects on their qubits: nothing generic drops,
// merges or moves them. Handles are pure and may be merged.

// CHECK-LABEL: func.func @order
// CHECK-NEXT: %q0 = lull.qubit 0
// CHECK-NEXT: %q1 = lull.qubit 1
// CHECK-NEXT: lull.gate x %q0
// CHECK-NEXT: lull.gate x %q0
// CHECK-NEXT: lull.gate x %q1
// CHECK-NEXT: lull.gate x %q0
// CHECK-NEXT: lull.gate id %q0 for 0 dt
// CHECK-NEXT: lull.gate id %q0 for 0 dt
// CHECK-NEXT: lull.barrier %q0
// CHECK-NEXT: lull.barrier %q0
// CHECK-NEXT: lull.delay %q0 for 0 dt
// CHECK-NEXT: lull.delay %q1, %q0 for 5 dt
// CHECK-NEXT: lull.delay %q1, %q0 for 5 dt
// CHECK-NEXT: lull.idle %q0 for 0 dt live
// CHECK-NEXT: lull.idle %q0 for 5 dt live
// CHECK-NEXT: lull.idle %q0 for 5 dt live
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 5 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 5 dt
// CHECK-NEXT: lull.reset %q1
// CHECK-NEXT: lull.reset %q1
// CHECK-NEXT: lull.measure %q0
// CHECK-NEXT: lull.measure %q0
// CHECK-NEXT: lull.reset %q1
// CHECK-NEXT: return
func.func @order() {
  %q0 = lull.qubit 0
  %unused = lull.qubit 5
  %q1 = lull.qubit 1
  %again = lull.qubit 0
  lull.gate x %q0
  lull.gate x %q0
  lull.gate x %q1
  lull.gate x %again
  lull.gate id %q0 for 0 dt
  lull.gate id %q0 for 0 dt
  lull.barrier %q0
  lull.barrier %q0
  lull.delay %q0 for 0 dt
  lull.delay %q1, %again for 5 dt
  lull.delay %q1, %again for 5 dt
  lull.idle %q0 for 0 dt live
  lull.idle %q0 for 5 dt live
  lull.idle %q0 for 5 dt live
  lull.pulse %q0 about 0 pi for 5 dt
  lull.pulse %q0 about 0 pi for 5 dt
  lull.reset %q1
  lull.reset %q1
  %m = lull.measure %q0
  %n = lull.measure %again
  lull.reset %q1
  return
}

// What a loop or a branch holds stays in it, in its order.
// CHECK-LABEL: func.func @regions
// CHECK-NEXT: %q0 = lull.qubit 0
// CHECK-NEXT: lull.gate h %q0
// CHECK-NEXT: scf.for
// CHECK-NEXT:   lull.gate x %q0
// CHECK-NEXT: }
// CHECK-NEXT: lull.measure %q0
// CHECK-NEXT: scf.if
// CHECK-NEXT:   lull.gate x %q0
// CHECK-NEXT: }
// CHECK-NEXT: lull.gate h %q0
// CHECK-NEXT: return
func.func @regions(%count: index, %zero: index, %one: index) {
  %q0 = lull.qubit 0
  lull.gate h %q0
  scf.for %i = %zero to %count step %one {
    lull.gate x %q0
  }
  %m = lull.measure %q0
  scf.if %m {
    lull.gate x %q0
  }
  lull.gate h %q0
  return
}

// Carried on, an operation stays too, even where nobody uses the result.
// CHECK-LABEL: func.func @carried
// CHECK-NEXT: lull.idle
// CHECK-NEXT: lull.delay
// CHECK-NEXT: lull.pulse
// CHECK-NEXT: return
func.func @carried(%v: i32) {
  %a = lull.idle %v : i32 -> i32 for 5 dt live
  %b = lull.delay %a : i32 -> i32 for 5 dt
  %c = lull.pulse %b : i32 -> i32 about 0 pi for 5 dt
  return
}
