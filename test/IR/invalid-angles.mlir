// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints P4 to P7 of docs/Spec.md.

// P4: a decimal multiple of pi
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' a multiple of pi is written as a fraction, such as 1/2 pi}}
  lull.gate rz(0.5 pi) %q0
  return
}

// -----

// P4: a fraction that is not said to be of pi
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' expected 'pi' after the fraction}}
  lull.gate rz(1/2) %q0
  return
}

// -----

// P4: a zero below the line
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' fraction 1/0 has no value}}
  lull.gate rz(1/0 pi) %q0
  return
}

// -----

// P4: a zero below the line of a phase
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.pulse' fraction 1/0 has no value}}
  lull.pulse %q0 about 1/0 pi for 160 dt
  return
}

// -----

// P4: a numerator beyond 64 bits
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' integer value too large}}
  lull.gate rz(99999999999999999999/2 pi) %q0
  return
}

// -----

// P4: a phase without pi
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.pulse' expected 'pi'}}
  lull.pulse %q0 about 1/2 for 160 dt
  return
}

// -----

// P4: no angle
func.func @spelling() {
  %q0 = lull.qubit 0
  // expected-error@below {{expected an angle such as 0.5 or 1/2 pi}}
  lull.gate rz(nan) %q0
  return
}

// -----

// P5: an angle beyond all doubles
func.func @finite() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op angle 1, inf, is not a finite number}}
  lull.gate u(0.5, 1.0e999, 0.5) %q0
  return
}

// -----

// P5: infinity
func.func @finite() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op angle 0, inf, is not a finite number}}
  "lull.gate"(%q0) <{gate = "rz", angles = [0x7FF0000000000000 : f64], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P5: not a number
func.func @finite() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op angle 1, nan, is not a finite number}}
  "lull.gate"(%q0) <{gate = "u2", angles = ["1/2 pi", 0x7FF8000000000000 : f64], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P6: a denominator beyond 1000000000
func.func @term() {
  %q0 = lull.qubit 0
  lull.gate rz(1/1000000000 pi) %q0
  // expected-error@below {{custom op 'lull.gate' multiple 1/1000000001 of pi goes beyond 1000000000}}
  lull.gate rz(1/1000000001 pi) %q0
  return
}

// -----

// P6: a numerator beyond 1000000000
func.func @term() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' multiple -1000000001/2 of pi goes beyond 1000000000}}
  lull.gate rz(-1000000001/2 pi) %q0
  return
}

// -----

// P6: a phase with a denominator beyond 1000000000
func.func @term() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.pulse' multiple 1/1000000001 of pi goes beyond 1000000000}}
  lull.pulse %q0 about 1/1000000001 pi for 160 dt
  return
}

// -----

// P6: in the generic form
func.func @term() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op angle 1, 1/1000000001 pi, goes beyond 1000000000}}
  "lull.gate"(%q0) <{gate = "u2", angles = [5.0e-01, "1/1000000001 pi"], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P6: a phase in the generic form
func.func @term() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.pulse' op phase 9223372036854775807/2 pi goes beyond 1000000000}}
  "lull.pulse"(%q0) <{duration = "160 dt", phase = "9223372036854775807/2 pi"}> : (!lull.qubit) -> ()
  return
}

// -----

// P7: a phase in radians
func.func @exact() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.pulse' op phase 1.57 is not an exact multiple of pi}}
  "lull.pulse"(%q0) <{duration = "160 dt", phase = 1.57 : f64}> : (!lull.qubit) -> ()
  return
}

// -----

// P5: a whole number beyond the 53 bits of a double
func.func @wide() {
  %q0 = lull.qubit 0
  // expected-error@below {{custom op 'lull.gate' angle 9007199254740993 does not fit a double exactly}}
  lull.gate rz(9007199254740993) %q0
  return
}
