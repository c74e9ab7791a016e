// RUN: lull-opt %s --lull-set-durations --split-input-file --verify-diagnostics

// Constraint W6 of docs/Spec.md: the device lists the operation.

// W6: an unknown operation
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @name() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{device 'line' has no operation 'h' (it has cx, measure, rz, x)}}
  lull.gate h %q
  return
}

// -----

// W6: a reset, which this device lacks
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @name() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{device 'line' has no operation 'reset' (it has cx, measure, rz, x)}}
  lull.reset %q
  return
}

// -----

// W6: a pair that is listed in the other order only
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @order() attributes {lull.device = @line} {
  %a = lull.qubit 0
  %b = lull.qubit 1
  // expected-error@below {{device 'line' has no 'cx' on (1, 0): it is listed for (0, 1) only in that order}}
  lull.gate cx %b, %a
  return
}

// -----

// W6: another pair
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @pair() attributes {lull.device = @line} {
  %a = lull.qubit 1
  %b = lull.qubit 2
  // expected-error@below {{device 'line' has no 'cx' on (1, 2): it is listed for (0, 1)}}
  lull.gate cx %a, %b
  return
}

// -----

// W6: too many qubits
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @count() attributes {lull.device = @line} {
  %a = lull.qubit 0
  %b = lull.qubit 1
  // expected-error@below {{device 'line' has no 'x' on (0, 1): it takes 1 qubit, not 2}}
  lull.gate x %a, %b
  return
}

// -----

// W6: a device without operations
lull.device @bare clock 1 ns {
  lull.site 0
}
func.func @name() attributes {lull.device = @bare} {
  %q = lull.qubit 0
  // expected-error@below {{device 'bare' has no operation 'x' (0 others)}}
  lull.gate x %q
  return
}

// -----

// W6: every one that is not listed
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @all() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{device 'line' has no operation 'h' (it has cx, measure, rz, x)}}
  lull.gate h %q
  lull.gate x %q
  // expected-error@below {{device 'line' has no operation 't' (it has cx, measure, rz, x)}}
  lull.gate t %q
  return
}

// -----

// W1: a function runs on no device
// expected-error@below {{runs on no device: name one by the attribute 'lull.device' or with lull-use-device}}
func.func @nowhere() {
  %q = lull.qubit 0
  lull.gate x %q
  return
}

// -----

// Q7: a site that is not known
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
  lull.coupler 1, 2
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
  lull.operation cx on (0, 1) for 200 dt
  lull.operation measure for 1000 dt
}
func.func @unknown(%q: !lull.qubit) attributes {lull.device = @line} {
  // expected-error@below {{the site of qubit argument 0 is unknown: give it the attribute 'lull.site'}}
  lull.gate x %q
  return
}
