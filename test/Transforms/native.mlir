// RUN: lull-opt %s --lull-native | FileCheck %s

// How each kind of device plays R_phi(pi). Signs: Rz(-phi), X, Rz(+phi) in time
// order is R_phi(pi) (McKay et al. 2017, from memory; test/Outside multiplies
// the matrices).

lull.device @frames clock 1 ns step 4 dt {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}

// Frame changes between pulses are merged; the last pulse closes the frame.
// CHECK-LABEL: @with_frames
// CHECK:      lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.delay %q0 for 100 dt
// CHECK-NEXT: lull.gate rz(-1/2 pi) %q0 for 0 dt
// CHECK-NEXT: lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.delay %q0 for 100 dt
// CHECK-NEXT: lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.gate rz(1/6 pi) %q0 for 0 dt
// CHECK-NEXT: lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.gate rz(1/3 pi) %q0 for 0 dt
// CHECK-NEXT: return
func.func @with_frames() attributes {lull.device = @frames} {
  %q0 = lull.qubit 0
  lull.pulse %q0 about 0 pi for 40 dt
  lull.delay %q0 for 100 dt
  lull.pulse %q0 about 1/2 pi for 40 dt
  lull.delay %q0 for 100 dt
  lull.pulse %q0 about 1/2 pi for 40 dt
  lull.pulse %q0 about 1/3 pi for 40 dt last
  return
}

// A frame that a hand-written pulse leaves open is closed before whatever is
// not a wait.
// CHECK-LABEL: @closed_before_gates
// CHECK:      lull.gate rz(-1/2 pi) %q0 for 0 dt
// CHECK-NEXT: lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.delay %q0 for 8 dt
// CHECK-NEXT: lull.gate x %q1 for 40 dt
// CHECK-NEXT: lull.gate rz(1/2 pi) %q0 for 0 dt
// CHECK-NEXT: lull.gate cz %q1, %q0 for 80 dt
func.func @closed_before_gates() attributes {lull.device = @frames} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  lull.pulse %q0 about 1/2 pi for 40 dt
  lull.delay %q0 for 8 dt
  lull.gate x %q1 for 40 dt
  lull.gate cz %q1, %q0 for 80 dt
  return
}

lull.device @both clock 1 ns {
  lull.site 0
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation y for 48 dt native plays rotation(1 pi, 1/2 pi)
  lull.operation xm for 40 dt native plays rotation(-1 pi, 0 pi)
}

// A device that has the pulse plays it, also with its sign as an amplitude.
// CHECK-LABEL: @direct
// CHECK:      lull.gate x %q0 for 40 dt
// CHECK-NEXT: lull.gate y %q0 for 48 dt
// CHECK-NEXT: lull.gate xm %q0 for 40 dt
func.func @direct() attributes {lull.device = @both} {
  %q0 = lull.qubit 0
  lull.pulse %q0 about 0 pi for 40 dt
  lull.pulse %q0 about 1/2 pi for 48 dt
  lull.pulse %q0 about 1 pi for 40 dt last
  return
}

lull.device @equator clock 10 ns {
  lull.site 0
  lull.operation r for 10 us native plays equatorial
}

// CHECK-LABEL: @any_phase
// CHECK:      lull.gate r(1 pi, 0 pi) %q0 for 1000 dt
// CHECK-NEXT: lull.gate r(1 pi, 7/5 pi) %q0 for 1000 dt
func.func @any_phase() attributes {lull.device = @equator} {
  %q0 = lull.qubit 0
  lull.pulse %q0 about 0 pi for 1000 dt
  lull.pulse %q0 about 7/5 pi for 1000 dt last
  return
}

lull.device @halves clock 1 ns step 16 dt {
  lull.site 0
  lull.operation sx for 36 dt native plays rotation(1/2 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}

// Two half turns; the second waits for the grid, so the pulse takes 48 + 36.
// CHECK-LABEL: @half_turns
// CHECK:      lull.gate rz(-1/2 pi) %q0 for 0 dt
// CHECK-NEXT: lull.gate sx %q0 for 36 dt
// CHECK-NEXT: lull.delay %q0 for 12 dt
// CHECK-NEXT: lull.gate sx %q0 for 36 dt
// CHECK-NEXT: lull.gate rz(1/2 pi) %q0 for 0 dt
func.func @half_turns() attributes {lull.device = @halves} {
  %q0 = lull.qubit 0
  lull.pulse %q0 about 1/2 pi for 84 dt last
  return
}

// The doubled width counts when pulses are placed.
// CHECK-LABEL: @nothing_to_do
// CHECK: lull.gate sx %q0 for 36 dt
func.func @nothing_to_do() attributes {lull.device = @halves} {
  %q0 = lull.qubit 0
  lull.gate sx %q0 for 36 dt
  return
}
