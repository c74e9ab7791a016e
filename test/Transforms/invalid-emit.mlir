// RUN: lull-opt %s --lull-emit --split-input-file --verify-diagnostics

// Constraints of docs/Spec.md on a plan that is to be emitted.

// W8: an unknown name in a plan
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @name() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence 'xy9': known are hahn, cp-N, cpmg-N, signed-x4, pdd-N, xy4, xy4-trailing, xy4-signed, xy8, edd, xy16, cdd-N, cdd-axis-N, udd-N, qdd-N-M, kdd-20, ur-N, walsh-N}}
  lull.idle %q for 4000 dt live plan "xy9"
  return
}

// -----

// W11: an unknown symbol in a plan
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @symbol() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence @mine}}
  lull.idle %q for 4000 dt live plan @mine
  return
}

// -----

// U9: a sequence that is not the identity
lull.sequence @odd phases [0, 0, 0] at uhrig
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @symbol() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{sequence @odd multiplies to a pi pulse of phase 0 when it should be the identity (a sequence with an odd number of pulses may be 'closed')}}
  lull.idle %q for 4000 dt live plan @odd
  return
}

// -----

// W12: a pulse that this site cannot play
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @pulse() attributes {lull.device = @line} {
  %q = lull.qubit 1
  // expected-error@below {{device 'line' cannot play a pi pulse of phase 1/2 pi on site 1: it has a pi pulse of phase 0 ('x') but no frame change}}
  lull.idle %q for 4000 dt live plan "xy4"
  return
}

// -----

// W13: eight pulses of 40 dt with gaps of 2 dt on a step of 4 dt need 348 dt
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @fit() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.idle %q for 348 dt live plan "xy8"
  // expected-error@below {{the plan 'xy8' on site 0 does not fit: window of 347 dt is too short: 8 pulses need 348 dt on a grid of 4 dt}}
  lull.idle %q for 347 dt live plan "xy8"
  return
}

// -----

// W13: the first start on the grid counts
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @fit() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.delay %q for 1 dt
  // expected-error@below {{the plan 'xy8' on site 0 does not fit: window of 350 dt is too short: 8 pulses need 351 dt on a grid of 4 dt}}
  lull.idle %q for 350 dt live plan "xy8"
  return
}

// -----

// W14: a window beyond 2^53 dt
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @long() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.idle %q for 9007199254740992 dt live plan "xy4"
  // expected-error@below {{the plan 'xy4' on site 0 does not fit: window of 9007199254740993 dt is too long: pulses are placed in windows of at most 9007199254740992 dt}}
  lull.idle %q for 9007199254740993 dt live plan "xy4"
  return
}
