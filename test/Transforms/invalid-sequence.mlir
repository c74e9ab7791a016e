// RUN: lull-opt %s --lull-assign --split-input-file --verify-diagnostics

// Constraints U8 to U10 of docs/Spec.md, which lull-assign checks for every
// lull.sequence of the module.

// U8: an unknown formula
// expected-error@below {{unknown instants 'middle': known are centred, trailing, spread, uhrig}}
lull.sequence @mine phases [0, 0] at middle

// -----

// U9: two pulses that leave a frame rotation
// expected-error@below {{sequence @leaves multiplies to a rotation about z by pi when it should be the identity (a sequence with an odd number of pulses may be 'closed')}}
lull.sequence @leaves phases [0, 1/2] at centred

// -----

// U9: an odd number of pulses
// expected-error@below {{sequence @odd multiplies to a pi pulse of phase 0 when it should be the identity (a sequence with an odd number of pulses may be 'closed')}}
lull.sequence @odd phases [0, 0, 0] at uhrig

// -----

// U9: one pulse in a module with a good sequence
lull.sequence @good phases [0, 1/2, 0, 1/2] at [1/8, 3/8, 5/8, 7/8]
// expected-error@below {{sequence @odd multiplies to a pi pulse of phase 1/3 pi when it should be the identity (a sequence with an odd number of pulses may be 'closed')}}
lull.sequence @odd phases [1/3] at [1/2]

// -----

// U10: no pulse undoes what an even number of pulses leaves
// expected-error@below {{the 2 pulses of '@leaves' leave a rotation about z by 2/3 pi, which no further pulse undoes}}
lull.sequence @leaves phases [0, 1/3] at centred closed
