// RUN: lull-opt %s --lull-native --split-input-file --verify-diagnostics

// Constraints of docs/Spec.md on a pulse that is to be played.

// W1: a function runs on no device
// expected-error@below {{runs on no device: name one by the attribute 'lull.device' or with lull-use-device}}
func.func @nowhere() {
  %q = lull.qubit 0
  lull.pulse %q about 0 pi for 40 dt last
  return
}

// -----

// Q7: a site that is not known
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @unknown(%q: !lull.qubit) attributes {lull.device = @line} {
  // expected-error@below {{the site of qubit argument 0 is unknown: give it the attribute 'lull.site'}}
  lull.pulse %q about 0 pi for 40 dt last
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
  lull.pulse %q about 0 pi for 40 dt
  // expected-error@below {{device 'line' cannot play a pi pulse of phase 1/2 pi on site 1: it has a pi pulse of phase 0 ('x') but no frame change}}
  lull.pulse %q about 1/2 pi for 40 dt last
  return
}

// -----

// W15: a pulse of another length
lull.device @line clock 1 ns step 4 dt gap 2 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz on 0 for 0 dt native plays frame
}
func.func @length() attributes {lull.device = @line} {
  %q = lull.qubit 0
  // expected-error@below {{lasts 80 dt when 'x' plays it in 40 dt on site 0}}
  lull.pulse %q about 1/2 pi for 80 dt last
  return
}

// -----

// W16: two half turns beyond 64 bits
lull.device @slow clock 1/1000000000 ns {
  lull.site 0
  lull.operation sx for 5 s native plays rotation(1/2 pi, 0 pi)
}
func.func @half() attributes {lull.device = @slow} {
  %q = lull.qubit 0
  // expected-error@below {{two half turns ('sx') of 5000000000000000000 dt do not fit 64 bits}}
  lull.pulse %q about 0 pi for 9 s last
  return
}

// -----

// W26: a pulse that leaves its frame open
lull.device @frames clock 1 ns {
  lull.site 0
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}
func.func @open() attributes {lull.device = @frames} {
  %q = lull.qubit 0
  // expected-error@below {{leaves the frame of site 0 off by 3/2 pi at the end of the program: the last pulse of a window says 'last'}}
  lull.pulse %q about 1/2 pi for 40 dt
  lull.delay %q for 80 dt
  return
}

// -----

// W2: a pulse in another block
lull.device @blocks clock 1 ns {
  lull.site 0
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
}
// expected-error@below {{has 2 blocks: unstructured control flow cannot be scheduled}}
func.func @branches() attributes {lull.device = @blocks} {
  %q = lull.qubit 0
  cf.br ^next
^next:
  lull.pulse %q about 0 pi for 40 dt last
  return
}

// -----

// W29: frame changes of sound phases that do not sum to a sound one
lull.device @frames clock 1 ns {
  lull.site 0
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}
func.func @primes() attributes {lull.device = @frames} {
  %q = lull.qubit 0
  lull.pulse %q about 1/999983 pi for 40 dt
  // expected-error@below {{needs a frame change by -4/999962000357 pi, which goes beyond 1000000000}}
  lull.pulse %q about 1/999979 pi for 40 dt last
  return
}
