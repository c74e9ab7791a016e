// RUN: lull-opt %s --lull-schedule --split-input-file --verify-diagnostics

// Constraints of docs/Spec.md on a program that is to be timed.

// Q4: a site twice among three qubits
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
func.func @twice() attributes {lull.device = @line} {
  %a = lull.qubit 0
  %b = lull.qubit 1
  %c = lull.qubit 0
  // expected-error@below {{acts twice on site 0}}
  lull.barrier %a, %b, %c
  return
}

// -----

// Q7: an argument without a site
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
func.func @unknown(%c: i1, %q: !lull.qubit) attributes {lull.device = @line} {
  // expected-error@below {{the site of qubit argument 1 is unknown: give it the attribute 'lull.site'}}
  lull.gate x %q for 40 dt
  return
}

// -----

// Q7: a qubit from nowhere
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
func.func @unknown(%q: !lull.qubit {lull.site = 0 : i64}) attributes {lull.device = @line} {
  // expected-note@below {{the qubit comes from here}}
  %r = builtin.unrealized_conversion_cast to !lull.qubit
  // expected-error@below {{the site of a qubit that it takes is unknown}}
  lull.gate x %r for 40 dt
  return
}

// -----

// Q7: a wait for something that is no qubit
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
func.func @unknown(%v: i32) attributes {lull.device = @line} {
  // expected-error@below {{takes a value of type 'i32' as a qubit, which no host dialect says it is}}
  lull.idle %v : i32 for 40 dt live
  return
}

// -----

// S3: a value is used again after it was carried on
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
func.func @again() attributes {lull.device = @line} {
  %q = lull.qubit 0
  %r = lull.idle %q : !lull.qubit -> !lull.qubit for 40 dt live
  // expected-error@below {{takes a qubit value that an earlier operation has carried on}}
  lull.gate x %q for 40 dt
  return
}

// -----

// T9: the end of the second delay is beyond 64 bits
lull.device @fine clock 1/1000000000 ns {
  lull.site 0
}
func.func @long() attributes {lull.device = @fine} {
  %q = lull.qubit 0
  lull.delay %q for 9 s
  // expected-error@below {{'delay' starts at 9000000000000000000 dt and takes 1000000000000000000 dt: its end does not fit in 64 bits}}
  lull.delay %q for 1 s
  return
}

// -----

// T3: on the device that the module names
module attributes {lull.device = @ninths} {
  lull.device @ninths clock 2/9 ns {
    lull.site 0
  }
  func.func @off() {
    %q = lull.qubit 0
    // expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
    lull.delay %q for 1 ns
    return
  }
}

// -----

// Q3: on the device that the module names
module attributes {lull.device = @ninths} {
  lull.device @ninths clock 2/9 ns {
    lull.site 0
  }
  func.func @off() {
    %q = lull.qubit 1
    // expected-error@below {{site 1 is not on device 'ninths', which has 1 site}}
    lull.delay %q for 2 ns
    return
  }
}

// -----

// W1: a function runs on no device
// expected-error@below {{runs on no device: name one by the attribute 'lull.device' or with lull-use-device}}
func.func @nowhere() {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  return
}

// -----

// W2: two blocks
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
// expected-error@below {{has 2 blocks: unstructured control flow cannot be scheduled}}
func.func @blocks() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  cf.br ^next
^next:
  lull.gate x %q for 40 dt
  return
}

// -----

// W3: a timed operation in a region
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
func.func @region(%c: i1) attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{operations on qubits in a region cannot be scheduled yet}}
  scf.if %c {
    // expected-note@below {{an operation on a qubit is here}}
    lull.gate x %q for 40 dt
  }
  return
}

// -----

// W4: something unknown happens to a qubit
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
func.func private @rotate(!lull.qubit)
func.func @unknown() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  // expected-error@below {{acts on a qubit but is no timed operation: what it does and how long it takes is unknown}}
  func.call @rotate(%q) : (!lull.qubit) -> ()
  return
}

// -----

// W5: a gate without a duration
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
func.func @unset() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{'x' has no duration: state one, or run lull-set-durations first}}
  lull.gate x %q
  return
}

// -----

// W5: a measurement without a duration
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
func.func @unset() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{'measure' has no duration: state one, or run lull-set-durations first}}
  %m = lull.measure %q
  return
}

// -----

// W7: no timed operation is a warning: wrong nesting is easily overlooked
// expected-warning@below {{lull-schedule found no function with timed operations here}}
module {
  func.func @empty() {
    return
  }
}

// -----

// W31: timed operations that are in no function
module {
  %q = lull.qubit 0
  // expected-error@below {{is a timed operation outside of any function}}
  lull.gate x %q for 40 dt
}

// -----

// A2: a device that is not there
// expected-error@below {{unknown device @plain}}
func.func @device() attributes {lull.device = @plain} {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  return
}

// -----

// W3: a qubit that something else takes in a region
lull.device @line clock 1 ns {
  lull.site 0
}
func.func private @unknown(!lull.qubit)
func.func @region(%c: i1) attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  // expected-error@below {{operations on qubits in a region cannot be scheduled yet}}
  scf.if %c {
    // expected-note@below {{an operation on a qubit is here}}
    func.call @unknown(%q) : (!lull.qubit) -> ()
  }
  return
}

// -----

// W30: a call that takes time, behind another function
lull.device @line clock 1 ns {
  lull.site 0
}
func.func @inner() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-note@below {{a timed operation is here}}
  lull.gate x %q for 40 dt
  return
}
func.func @between() {
  func.call @inner() : () -> ()
  return
}
func.func @outer() attributes {lull.device = @line} {
  %q = lull.qubit 0
  lull.gate x %q for 40 dt
  // expected-error@below {{calls a function with timed operations, which cannot be scheduled yet}}
  func.call @between() : () -> ()
  return
}
