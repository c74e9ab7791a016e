// A host that cannot build what Lull asks for says so, at the operation for
// which it was asked, and the pass fails.
// RUN: lull-host-opt %s --split-input-file --verify-diagnostics --lull-emit --lull-native
// RUN: lull-host-opt %s --split-input-file --verify-diagnostics --lull-emit=native=true --lull-native

lull.device @halves clock 1 ns {
  lull.site 0
  lull.operation sx for 20 dt native plays rotation(1/2 pi, 0 pi)
}
func.func @pulse() attributes {lull.device = @halves} {
  %a = mill.qubit 0
  // expected-error @below {{mill has no operation that plays 'sx' with 0 angles}}
  lull.pulse %a : !mill.qubit about 0 pi for 40 dt last
  return
}

// -----

lull.device @halves clock 1 ns {
  lull.site 0
  lull.operation sx for 20 dt native plays rotation(1/2 pi, 0 pi)
}
func.func @window() attributes {lull.device = @halves} {
  %a = mill.qubit 0
  // expected-error @below {{mill has no operation that plays 'sx' with 0 angles}}
  mill.slack %a takes 400 {lull.plan = #lull.plan<"cpmg-2">}
  return
}

// -----

lull.device @turned clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
  lull.operation vz for 0 dt native plays frame
}
func.func @frame() attributes {lull.device = @turned} {
  %a = mill.qubit 0
  // expected-error @below {{mill has no operation that plays 'vz' with 1 angles}}
  lull.pulse %a : !mill.qubit about 1/2 pi for 20 dt last
  return
}
