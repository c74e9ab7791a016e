// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints S1 and S2 of docs/Spec.md; S3 is in
// test/Transforms/invalid-structure.mlir.

// S1: an idle carries its qubit on as another type
func.func @type(%v: i32) {
  // expected-error@below {{'lull.idle' op carries qubit 0 on as 'i64' when it should be 'i32'}}
  %x = lull.idle %v : i32 -> i64 for 5 dt live
  return
}

// -----

// S1: a pulse carries its qubit on as another type
func.func @type(%v: i32) {
  // expected-error@below {{'lull.pulse' op carries qubit 0 on as '!lull.qubit' when it should be 'i32'}}
  %x = lull.pulse %v : i32 -> !lull.qubit about 1/2 pi for 5 dt
  return
}

// -----

// S1: a delay carries its second qubit on as another type
func.func @type(%v: i32, %w: i64) {
  // expected-error@below {{'lull.delay' op carries qubit 1 on as 'i32' when it should be 'i64'}}
  %x:2 = lull.delay %v, %w : i32, i64 -> i32, i32 for 5 dt
  return
}

// -----

// S2: a delay carries one of two qubits on
func.func @count(%v: i32, %w: i32) {
  // expected-error@below {{'lull.delay' op carries 1 qubits on when it takes 2}}
  %x = lull.delay %v, %w : i32, i32 -> i32 for 5 dt
  return
}

// -----

// S2: a delay carries more on than it takes
func.func @count(%v: i32) {
  // expected-error@below {{'lull.delay' op carries 2 qubits on when it takes 1}}
  %x:2 = lull.delay %v : i32 -> i32, i32 for 5 dt
  return
}
