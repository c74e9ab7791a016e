// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints U1 to U7 of docs/Spec.md; U8 to U10 are in
// test/Transforms/invalid-sequence.mlir.

// U1: no pulses
// expected-error@below {{'lull.sequence' op has no pulses}}
lull.sequence @none phases [] at centred

// -----

// U2: neither instants nor a formula
// expected-error@below {{'lull.sequence' op has its instants either as fractions or by a formula}}
"lull.sequence"() <{sym_name = "neither", phases = [#lull.fraction<0>, #lull.fraction<0>]}> : () -> ()

// -----

// U2: both instants and a formula
// expected-error@below {{'lull.sequence' op has its instants either as fractions or by a formula}}
"lull.sequence"() <{sym_name = "both", phases = [#lull.fraction<0>], instants = [#lull.fraction<1/2>], formula = "centred"}> : () -> ()

// -----

// U3: a phase with a denominator beyond 1000000
// expected-error@below {{'lull.sequence' op phase 1/1000001 of pulse 4 goes beyond 1000000}}
lull.sequence @fine phases [0, 1/1000000, 0, 1/1000001] at centred

// -----

// U3: a phase beyond 1000000
// expected-error@below {{'lull.sequence' op phase 1000001 of pulse 3 goes beyond 1000000}}
lull.sequence @large phases [0, 1000001/2, 1000001] at centred

// -----

// U3: a phase below -1000000
// expected-error@below {{'lull.sequence' op phase -1000001 of pulse 1 goes beyond 1000000}}
lull.sequence @large phases [-1000001] at centred

// -----

// U4: fewer instants than phases
// expected-error@below {{'lull.sequence' op has 3 phases and 2 instants}}
lull.sequence @few phases [0, 1/2, 0] at [1/4, 3/4]

// -----

// U4: more instants than phases
// expected-error@below {{'lull.sequence' op has 2 phases and 3 instants}}
lull.sequence @many phases [0, 0] at [1/4, 1/2, 3/4]

// -----

// U5: an instant with a denominator beyond 1000000
// expected-error@below {{'lull.sequence' op instant 1/1000001 of pulse 1 goes beyond 1/1000000}}
lull.sequence @fine phases [0, 0] at [1/1000001, 3/4]

// -----

// U6: an instant after the window
// expected-error@below {{'lull.sequence' op instant 5/4 of pulse 2 is outside the window, 0 to 1}}
lull.sequence @after phases [0, 0] at [1/4, 5/4]

// -----

// U6: an instant before the window
// expected-error@below {{'lull.sequence' op instant -1/4 of pulse 1 is outside the window, 0 to 1}}
lull.sequence @before phases [0, 0] at [-1/4, 1/4]

// -----

// U7: instants run backward
// expected-error@below {{'lull.sequence' op instant 3/8 of pulse 4 is before 1/2, the one of pulse 3}}
lull.sequence @backward phases [0, 1/2, 0, 1/2] at [1/8, 1/8, 1/2, 3/8]

// -----

// U11: a formula that is not a word
// expected-error@below {{'lull.sequence' op formula 'a b' is not a word}}
"lull.sequence"() <{sym_name = "mine", phases = [#lull.fraction<0>], formula = "a b"}> : () -> ()
