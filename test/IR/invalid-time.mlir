// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints T1 to T8 of docs/Spec.md that the parser and the verifiers
// enforce.

// T1: a negative wait
func.func @negative() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.delay' op duration -5 dt is negative}}
  lull.delay %q0 for -5 dt
  return
}

// -----

// T1: a negative gate in seconds
func.func @negative() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op duration -35.5 ns is negative}}
  lull.gate x %q0 for -35.5 ns
  return
}

// -----

// T1: on a device, where the clock would refuse it too
lull.device @plain clock 1 ns {
  lull.site 0
}
func.func @negative() attributes {lull.device = @plain} {
  %q0 = lull.qubit 0
  // expected-error@below {{duration -1 us is negative}}
  lull.idle %q0 for -1 us live
  return
}

// -----

// T1: two minus signs make no plus
func.func @negative() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' expected a duration such as 64 dt or 35.5 ns}}
  lull.delay %q0 for - -5 dt
  return
}

// -----

// T2: a delay without a duration
func.func @unset() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.delay' op needs a duration: for 64 dt, for 35.5 ns}}
  lull.delay %q0
  return
}

// -----

// T2: an idle without a duration
func.func @unset() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.idle' op needs a duration: for 64 dt, for 35.5 ns}}
  lull.idle %q0 live
  return
}

// -----

// T2: a pulse that leaves it to the device
func.func @unset() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.pulse' op needs a duration: for 64 dt, for 35.5 ns}}
  lull.pulse %q0 about 1/2 pi last
  return
}

// -----

// T3: off the clock
lull.device @ninths clock 2/9 ns {
  lull.site 0
}
func.func @off() attributes {lull.device = @ninths} {
  %q0 = lull.qubit 0
  lull.delay %q0 for 40 ns
  // expected-error@below {{35.5 ns is not a whole number of dt (2/9 ns): it is 159.75 dt, between 159 dt (35.333 ns) and 160 dt (35.556 ns)}}
  lull.delay %q0 for 35.5 ns
  lull.gate x %q0 for 1 us
  return
}

// -----

// T3: less than one tick
lull.device @coarse clock 1 s {
  lull.site 0
}
func.func @off() attributes {lull.device = @coarse} {
  %q0 = lull.qubit 0
  // expected-error@below {{0.000000000000000001 ns is not a whole number of dt (1 s): it is about 0 dt, between 0 dt (0 s) and 1 dt (1 s)}}
  lull.reset %q0 for 0.000000000000000001 ns
  return
}

// -----

// T3: in a region, too
lull.device @ninths clock 2/9 ns {
  lull.site 0
}
func.func @off(%c: i1) attributes {lull.device = @ninths} {
  %q0 = lull.qubit 0
  scf.if %c {
    // expected-error@below {{0.1 ns is not a whole number of dt (2/9 ns): it is 0.45 dt, between 0 dt (0 ns) and 1 dt (0.222 ns)}}
    lull.delay %q0 for 0.1 ns
  }
  return
}

// -----

// T3: at most ten errors a function
lull.device @ninths clock 2/9 ns {
  lull.site 0
}
func.func @off() attributes {lull.device = @ninths} {
  %q0 = lull.qubit 0
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
  lull.delay %q0 for 1 ns
  lull.delay %q0 for 1 ns
  return
}

// -----

// T4: an unknown unit
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' unknown unit 'min': expected dt, ns, us, ms or s}}
  lull.delay %q0 for 40 min
  return
}

// -----

// T4: units are lower case
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' unknown unit 'NS': expected dt, ns, us, ms or s}}
  lull.delay %q0 for 40 NS
  return
}

// -----

// T4: a missing unit
func.func @unit() {
  %q0 = lull.qubit 0
  lull.delay %q0 for 40
  // expected-error@below {{custom op 'lull.delay' unknown unit 'return': expected dt, ns, us, ms or s}}
  return
}

// -----

// T4: a missing unit after a decimal
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' expected a unit after 35.5: dt, ns, us, ms or s}}
  lull.delay %q0 for 35.5 : !lull.qubit
  return
}

// -----

// T4: a missing unit in the generic form
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "40"} for op lull.delay: '40' has no unit (dt, ns, us, ms or s)}}
  "lull.delay"(%q0) <{duration = "40"}> : (!lull.qubit) -> ()
  return
}

// -----

// T4: an unknown unit in the generic form
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "40 min"} for op lull.delay: 'min' is not a unit of time (dt, ns, us, ms or s)}}
  "lull.delay"(%q0) <{duration = "40 min"}> : (!lull.qubit) -> ()
  return
}

// -----

// T4: an unknown unit in an attribute
// expected-error@below {{unknown unit 'min': expected dt, ns, us, ms or s}}
func.func @unit() attributes {wait = #lull.duration<40 min>} {
  return
}

// -----

// T4: no number
func.func @unit() {
  %q0 = lull.qubit 0
  // expected-error@below {{expected a duration such as 64 dt or 35.5 ns}}
  lull.delay %q0 for ns
  return
}

// -----

// T5: no exponent
func.func @exponent() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '1.0e3' is not a decimal number}}
  lull.delay %q0 for 1.0e3 ns
  return
}

// -----

// T5: no number in the generic form
func.func @number() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "1.5.5 ns"} for op lull.delay: '1.5.5' is not a decimal number}}
  "lull.delay"(%q0) <{duration = "1.5.5 ns"}> : (!lull.qubit) -> ()
  return
}

// -----

// T5: no duration at all
func.func @number() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "soon"} for op lull.delay: 'soon' is not a duration such as 35.5 ns}}
  "lull.delay"(%q0) <{duration = "soon"}> : (!lull.qubit) -> ()
  return
}

// -----

// T6: a fraction of a dt
func.func @decimal() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' '160.5 dt' is not a whole number of dt}}
  lull.gate x %q0 for 160.5 dt
  return
}

// -----

// T6: a fraction of a dt in the generic form
func.func @decimal() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "0.5 dt"} for op lull.delay: '0.5 dt' is not a whole number of dt}}
  "lull.delay"(%q0) <{duration = "0.5 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// T7: nineteen digits
func.func @digits() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '1000000000000000001' needs more than 18 digits}}
  lull.delay %q0 for 1000000000000000001 dt
  return
}

// -----

// T7: nineteen digits around the point
func.func @digits() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '123456789.0123456789' needs more than 18 digits}}
  lull.delay %q0 for 123456789.0123456789 ns
  return
}

// -----

// T7: nineteen places behind the point
func.func @digits() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '0.0000000000000000001' needs more than 18 digits}}
  lull.delay %q0 for 0.0000000000000000001 s
  return
}

// -----

// T7: far beyond 64 bits
func.func @digits() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '340282366920938463463374607431768211456' needs more than 18 digits}}
  lull.delay %q0 for 340282366920938463463374607431768211456 dt
  return
}

// -----

// T7: in hexadecimal
func.func @digits() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.delay' '18446744073709551615' needs more than 18 digits}}
  lull.delay %q0 for 0xFFFFFFFFFFFFFFFF dt
  return
}

// -----

// T8: a duration beyond 64 bits of dt
lull.device @fine clock 1/1000000000 ns {
  lull.site 0
}
func.func @long() attributes {lull.device = @fine} {
  %q0 = lull.qubit 0
  lull.delay %q0 for 9 s
  // expected-error@below {{duration 10 s does not fit in 64 bits of dt (1/1000000000 ns)}}
  lull.delay %q0 for 10 s
  return
}
