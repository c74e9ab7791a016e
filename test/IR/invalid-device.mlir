// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints D1 to D15 of docs/Spec.md.

// D1: a foreign operation in a device
// expected-note@below {{the device}}
lull.device @foreign clock 1 ns {
  lull.site 0
  // expected-error@below {{'arith.constant' op has no place in a device: there are lull.site, lull.coupler and lull.operation}}
  %zero = arith.constant 0 : i64
}

// -----

// D2: a site outside a device
// expected-error@below {{'lull.site' op expects parent op 'lull.device'}}
lull.site 0

// -----

// D2: a coupler in a function
func.func @inside() {
  // expected-error@below {{'lull.coupler' op expects parent op 'lull.device'}}
  lull.coupler 0, 1
  return
}

// -----

// D2: an operation outside a device
// expected-error@below {{'lull.operation' op expects parent op 'lull.device'}}
lull.operation x for 160 dt

// -----

// D3: dt is zero
// expected-error@below {{custom op 'lull.device' dt is 0 ns when it should be positive}}
lull.device @still clock 0 ns {
}

// -----

// D3: dt is negative
// expected-error@below {{custom op 'lull.device' dt is -2/9 ns when it should be positive}}
lull.device @backward clock -2/9 ns {
}

// -----

// D3: in an attribute
// expected-error@below {{dt is 0 us when it should be positive}}
func.func @attribute() attributes {clock = #lull.clock<0/5 us>} {
  return
}

// -----

// D4: dt in dt
// expected-error@below {{custom op 'lull.device' dt is given in 'dt' when it should be in ns, us, ms or s}}
lull.device @circular clock 2/9 dt {
}

// -----

// D4: an unknown unit
// expected-error@below {{custom op 'lull.device' unknown unit 'min': expected ns, us, ms or s}}
lull.device @slow clock 1 min {
}

// -----

// D4: an unknown unit in an attribute
// expected-error@below {{unknown unit 'min': expected ns, us, ms or s}}
func.func @attribute() attributes {clock = #lull.clock<1 min>} {
  return
}

// -----

// D5: dt in seconds beyond 64 bits
// expected-error@below {{custom op 'lull.device' dt of 1/9223372036854775807 ns is not a fraction of 64 bits in seconds}}
lull.device @fine clock 1/9223372036854775807 ns {
}

// -----

// D5: a zero below the line
// expected-error@below {{custom op 'lull.device' fraction 1/0 has no value}}
lull.device @none clock 1/0 ns {
}

// -----

// D6: a step of nothing
// expected-error@below {{step is 0 dt when it should be at least 1 dt}}
lull.device @dense clock 1 ns step 0 dt {
}

// -----

// D6: a negative step
// expected-error@below {{duration -8 dt is negative}}
lull.device @dense clock 1 ns step -8 dt {
}

// -----

// D7: a negative gap
// expected-error@below {{duration -1 ns is negative}}
lull.device @early clock 1 ns gap -1 ns {
}

// -----

// D8: a negative site
lull.device @below clock 1 ns {
  // expected-error@below {{site number is -1 when it should be 0 to 4294967295}}
  lull.site -1
}

// -----

// D8: a site beyond 32 bits
lull.device @beyond clock 1 ns {
  lull.site 4294967295
  // expected-error@below {{site number is 4294967296 when it should be 0 to 4294967295}}
  lull.site 4294967296
}

// -----

// D9: a site twice
lull.device @twice clock 1 ns {
  lull.site 0
  lull.site 1
  // expected-error@below {{site 0 is listed twice}}
  lull.site 0
}

// -----

// D10: a calibration time of nothing
lull.device @instant clock 1 ns {
  // expected-error@below {{calibration time 0 us is not positive}}
  lull.site 0 t1 0 us
}

// -----

// D10: a negative calibration time
lull.device @instant clock 1 ns {
  // expected-error@below {{calibration time -40 us is not positive}}
  lull.site 0 t1 80 us ramsey -40 us
}

// -----

// D11: an error above one
lull.device @wrong clock 1 ns {
  // expected-error@below {{error 1.5 is no probability, 0 to 1}}
  lull.site 0 error 1.5
}

// -----

// D11: a negative error of an operation
lull.device @wrong clock 1 ns {
  // expected-error@below {{error -0.001 is no probability, 0 to 1}}
  lull.operation x for 160 dt error -1.0e-3
}

// -----

// D11: an error that is not a number
lull.device @wrong clock 1 ns {
  // expected-error@below {{error nan is no probability, 0 to 1}}
  "lull.site"() <{site = 0 : i64, error = 0x7FF8000000000000 : f64}> : () -> ()
}

// -----

// D12: a coupler to a site that is not there
lull.device @half clock 1 ns {
  lull.site 0
  lull.site 1
  // expected-error@below {{coupler (0, 5) needs site 5, which is not there (sites are 0 to 1)}}
  lull.coupler 0, 5
}

// -----

// D12: a coupler without sites
lull.device @half clock 1 ns {
  // expected-error@below {{coupler (0, 1) needs site 0, which is not there (there are none)}}
  lull.coupler 0, 1
}

// -----

// D13: a coupler of a site with itself
lull.device @loop clock 1 ns {
  lull.site 3
  // expected-error@below {{coupler (3, 3) joins a site to itself}}
  lull.coupler 3, 3
}

// -----

// D14: a coupler twice, the second time the other way round
lull.device @twice clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  // expected-error@below {{coupler (1, 0) is listed twice}}
  lull.coupler 1, 0
}

// -----

// D15: a coupling that is not finite
lull.device @strong clock 1 ns {
  lull.site 0
  lull.site 1
  // expected-error@below {{zz inf is not a finite number}}
  lull.coupler 0, 1 zz 1.0e999
}
