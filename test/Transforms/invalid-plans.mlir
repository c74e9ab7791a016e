// RUN: lull-opt %s --lull-assign="sequence=xy4" --split-input-file --verify-diagnostics

// Constraints W8 to W12 of docs/Spec.md: a plan can be played.

// W8: an unknown name in a wish
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @name() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence 'xy9': known are hahn, cp-N, cpmg-N, signed-x4, pdd-N, xy4, xy4-trailing, xy4-signed, xy8, edd, xy16, cdd-N, cdd-axis-N, udd-N, qdd-N-M, kdd-20, ur-N, walsh-N}}
  lull.idle %q for 4000 dt live {lull.protect = "xy9"}
  return
}

// -----

// W8: names are lower case
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @name() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence 'XY8': known are hahn, cp-N, cpmg-N, signed-x4, pdd-N, xy4, xy4-trailing, xy4-signed, xy8, edd, xy16, cdd-N, cdd-axis-N, udd-N, qdd-N-M, kdd-20, ur-N, walsh-N}}
  lull.idle %q for 4000 dt live {lull.protect = "XY8"}
  return
}

// -----

// W9: a family without its order
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @orders() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{number of orders in 'udd' is 0 when it should be 1, as in 'udd-2'}}
  lull.idle %q for 4000 dt live {lull.protect = "udd"}
  return
}

// -----

// W9: an order out of range
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @orders() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{order 3 of 'qdd' is out of range: it takes an even number from 2}}
  lull.idle %q for 4000 dt live {lull.protect = "qdd-3-2"}
  return
}

// -----

// W9: an order that is no number
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @orders() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{order 'x' of 'udd' is not a whole number}}
  lull.idle %q for 4000 dt live {lull.protect = "udd-x"}
  return
}

// -----

// W10: more pulses than a sequence may have
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @many() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{'cpmg-10001' has more than 10000 pulses}}
  lull.idle %q for 4000 dt live {lull.protect = "cpmg-10001"}
  return
}

// -----

// W10: more pulses by repeating
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @many() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{8 pulses of 'xy8', 1251 times, are more than 10000}}
  lull.idle %q for 4000 dt live {lull.protect = #lull.plan<"xy8" repeats 1251>}
  return
}

// -----

// W11: an unknown symbol
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @symbol() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence @mine}}
  lull.idle %q for 4000 dt live {lull.protect = @mine}
  return
}

// -----

// W11: a symbol that is no sequence
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @symbol() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{unknown sequence @line}}
  lull.idle %q for 4000 dt live {lull.protect = @line}
  return
}

// -----

// W12: no frame change on this site
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @pulse() attributes {lull.device = @line} {
  %q = lull.qubit 1
  // expected-error@below {{device 'line' cannot play a pi pulse of phase 1/2 pi on site 1: it has a pi pulse of phase 0 ('x') but no frame change}}
  lull.idle %q for 4000 dt live
  return
}

// -----

// W12: no pulse at all
lull.device @bare clock 1 ns {
  lull.site 0
  lull.operation rz for 0 dt native plays frame
}
func.func @pulse() attributes {lull.device = @bare} {
  %q = lull.qubit 0
  // expected-error@below {{device 'bare' cannot play a pi pulse of phase 0 on site 0: it has a frame change ('rz') but no pi pulse or half turn}}
  lull.idle %q for 4000 dt live
  return
}

// -----

// W12: a pulse that is not native
lull.device @bare clock 1 ns {
  lull.site 0
  lull.operation x for 40 dt plays rotation(1 pi, 0 pi)
}
func.func @pulse() attributes {lull.device = @bare} {
  %q = lull.qubit 0
  // expected-error@below {{device 'bare' cannot play a pi pulse of phase 0 on site 0: it has no pi pulse or half turn ('x' is not native)}}
  lull.idle %q for 4000 dt live
  return
}

// -----

// W32: the name of a symbol in quotes
lull.device @one clock 1 ns {
  lull.site 0
}
func.func @wish() attributes {lull.device = @one} {
  %q = lull.qubit 0
  // expected-error@below {{the wish "@mine" is a name: the symbol of a sequence is written without quotes}}
  lull.gate x %q for 40 dt {lull.protect = "@mine"}
  return
}
