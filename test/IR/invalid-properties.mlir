// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints P1 to P3 of docs/Spec.md; P12 and P13 are in
// invalid-bytecode.test.

// P1: a gate without angles, in the generic form
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op the property 'angles' is missing}}
  "lull.gate"(%q0) <{gate = "x", duration = "160 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: a gate without a duration, which is not the same as an unset one
func.func @missing() {
  %q0 = lull.qubit 0
  "lull.gate"(%q0) <{gate = "x", angles = [], duration = "unset"}> : (!lull.qubit) -> ()
  // expected-error@below {{'lull.gate' op the property 'duration' is missing}}
  "lull.gate"(%q0) <{gate = "x", angles = []}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: a measurement without a duration
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.measure' op the property 'duration' is missing}}
  %m = "lull.measure"(%q0) : (!lull.qubit) -> i1
  return
}

// -----

// P1: a delay whose duration is said to be missing
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.delay' op the property 'duration' is missing}}
  "lull.delay"(%q0) <{duration = "missing"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: a pulse without a phase
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.pulse' op the property 'phase' is missing}}
  "lull.pulse"(%q0) <{duration = "160 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: an angle that is said to be missing
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op angle 0 is missing}}
  "lull.gate"(%q0) <{gate = "rz", angles = ["missing"], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: angles that are said to be missing
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op the property 'angles' is missing}}
  "lull.gate"(%q0) <{gate = "rz", angles = "missing", duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: a gate without a name
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op requires attribute 'gate'}}
  "lull.gate"(%q0) <{angles = [], duration = "160 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: an idle without a state
func.func @missing() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.idle' op requires attribute 'state'}}
  "lull.idle"(%q0) <{duration = "160 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P1: a handle without a site
func.func @missing() {
  // expected-error@below {{'lull.qubit' op requires attribute 'site'}}
  %q0 = "lull.qubit"() : () -> !lull.qubit
  return
}

// -----

// P2: a duration among the attributes of the generic form
func.func @stray() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.reset' op 'duration' is a property and has no effect among the attributes}}
  "lull.reset"(%q0) <{duration = "unset"}> {duration = "160 dt"} : (!lull.qubit) -> ()
  return
}

// -----

// P2: a duration among the attributes of the custom form
func.func @stray() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.delay' op 'duration' is a property and has no effect among the attributes}}
  lull.delay %q0 for 160 dt {duration = "320 dt"}
  return
}

// -----

// P2: angles among the attributes
func.func @stray() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.gate' op 'angles' is a property and has no effect among the attributes}}
  lull.gate rz %q0 for 0 dt {angles = [5.0e-01]}
  return
}

// -----

// P2: a phase among the attributes
func.func @stray() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.pulse' op 'phase' is a property and has no effect among the attributes}}
  lull.pulse %q0 about 0 pi for 160 dt {phase = "1/2 pi"}
  return
}

// -----

// P2: all properties among the attributes, as before properties were
func.func @stray() {
  %q0 = lull.qubit 0
  // expected-error@below {{'lull.delay' op 'duration' is a property and has no effect among the attributes}}
  "lull.delay"(%q0) {duration = "160 dt"} : (!lull.qubit) -> ()
  return
}

// -----

// P3: a duration as a number
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = 160 : i64} for op lull.delay: expected a duration as a string such as "35.5 ns" but found 160 : i64}}
  "lull.delay"(%q0) <{duration = 160 : i64}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: a duration as an attribute of the device's kind
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = #lull.duration<160 dt>} for op lull.delay: expected a duration as a string such as "35.5 ns" but found #lull.duration<160 dt>}}
  "lull.delay"(%q0) <{duration = #lull.duration<160 dt>}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: one angle in place of an array
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {angles = 5.000000e-01 : f64, duration = "0 dt", gate = "rz"} for op lull.gate: expected an array of angles but found 5.000000e-01 : f64}}
  "lull.gate"(%q0) <{gate = "rz", angles = 0.5 : f64, duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: an angle of single precision
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {angles = [5.000000e-01 : f32], duration = "0 dt", gate = "rz"} for op lull.gate: expected an angle of type f64 but found 5.000000e-01 : f32}}
  "lull.gate"(%q0) <{gate = "rz", angles = [0.5 : f32], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: an angle as a whole number
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {angles = [1], duration = "0 dt", gate = "rz"} for op lull.gate: expected an angle as a float or a string such as "1/2 pi" but found 1 : i64}}
  "lull.gate"(%q0) <{gate = "rz", angles = [1 : i64], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: an angle as text that is none
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {angles = ["0.5 pi"], duration = "0 dt", gate = "rz"} for op lull.gate: expected an angle as a float or a string such as "1/2 pi" but found "0.5 pi"}}
  "lull.gate"(%q0) <{gate = "rz", angles = ["0.5 pi"], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: an angle with a zero below the line
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {angles = ["1/0 pi"], duration = "0 dt", gate = "rz"} for op lull.gate: expected an angle as a float or a string such as "1/2 pi" but found "1/0 pi"}}
  "lull.gate"(%q0) <{gate = "rz", angles = ["1/0 pi"], duration = "0 dt"}> : (!lull.qubit) -> ()
  return
}

// -----

// P3: a phase as an array
func.func @kind() {
  %q0 = lull.qubit 0
  // expected-error@below {{invalid properties {duration = "160 dt", phase = ["1/2 pi"]} for op lull.pulse: expected an angle as a float or a string such as "1/2 pi" but found ["1/2 pi"]}}
  "lull.pulse"(%q0) <{duration = "160 dt", phase = ["1/2 pi"]}> : (!lull.qubit) -> ()
  return
}
