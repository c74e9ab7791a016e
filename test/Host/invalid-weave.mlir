// RUN: lull-host-opt %s --split-input-file --verify-diagnostics --lull-protect=device=barley

// %a has been carried on as %b.
func.func @twice() -> !weave.strand {
  %a = weave.spin 0
  %b = weave.apply "h"(%a) : (!weave.strand) -> !weave.strand
  // expected-error @below {{takes a qubit value that an earlier operation has carried on}}
  %c = weave.apply "x"(%a) : (!weave.strand) -> !weave.strand
  return %b : !weave.strand
}

// -----

func.func @twiceInDelay() -> !weave.strand {
  %a = weave.spin 0
  %b = lull.delay %a : !weave.strand -> !weave.strand for 8 dt
  // expected-error @below {{takes a qubit value that an earlier operation has carried on}}
  %c = lull.delay %a : !weave.strand -> !weave.strand for 8 dt
  return %b : !weave.strand
}

// -----

func.func @noInterface() {
  %a = weave.spin 0
  %b = weave.apply "h"(%a) : (!weave.strand) -> !weave.strand
  // expected-error @below {{acts on a qubit but is no timed operation}}
  weave.peek %b
  return
}

// -----

func.func @noSite(%a: !weave.strand) {
  // expected-error @below {{the site of qubit argument 0 is unknown: give it the attribute 'lull.site'}}
  %b = weave.apply "h"(%a) : (!weave.strand) -> !weave.strand
  return
}

// -----

func.func @throughUnknown(%a: !weave.strand {lull.site = 0 : i64}) {
  // expected-note @below {{the qubit comes from here}}
  %b = builtin.unrealized_conversion_cast to !weave.strand
  // expected-error @below {{the site of a qubit that it takes is unknown}}
  %c:2 = weave.knot %a, %b
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  return
}

// -----

func.func @sameQubit() {
  %a = weave.spin 0
  // expected-error @below {{both qubits are on site 0}}
  %c:2 = weave.knot %a, %a
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  return
}

// -----

// Returned is the qubit as it was before the gate.
func.func @returnsStale() -> !weave.strand {
  %a = weave.spin 0
  %b = weave.apply "h"(%a) : (!weave.strand) -> !weave.strand
  // expected-error @below {{takes a qubit value that an earlier operation has carried on}}
  return %a : !weave.strand
}

// -----

// W28: an angle that a measurement decides is there only when it ends
func.func @feedForward() {
  %a = weave.spin 0
  %b = weave.spin 1
  %bit, %c = weave.look %a
  %angle = arith.uitofp %bit : i1 to f64
  // expected-error @below {{depends on the outcome of an operation: it cannot be scheduled yet}}
  %d = weave.apply "rz"(%angle, %b) : (f64, !weave.strand) -> !weave.strand
  return
}
