// RUN: lull-host-opt %s --split-input-file --verify-diagnostics --lull-protect=device=barley

// No model is attached to mill.tune: what it does is unknown.
func.func @noInterface() {
  %a = mill.qubit 0
  mill.h %a
  // expected-error @below {{acts on a qubit but is no timed operation: what it does and how long it takes is unknown}}
  mill.tune %a
  return
}

// -----

// Operations of other dialects are left alone, but not with a qubit.
func.func private @elsewhere(!mill.qubit)
func.func @called() {
  %a = mill.qubit 0
  mill.h %a
  // expected-error @below {{acts on a qubit but is no timed operation}}
  func.call @elsewhere(%a) : (!mill.qubit) -> ()
  return
}

// -----

func.func @noSite(%a: !mill.qubit) {
  // expected-error @below {{the site of qubit argument 0 is unknown: give it the attribute 'lull.site'}}
  mill.h %a
  return
}

// -----

func.func private @source() -> !mill.qubit
func.func @fromElsewhere() {
  // expected-note @below {{the qubit comes from here}}
  %a = func.call @source() : () -> !mill.qubit
  // expected-error @below {{the site of a qubit that it takes is unknown}}
  mill.h %a
  return
}

// -----

func.func @offTheDevice() {
  %a = mill.qubit 7
  // expected-error @below {{site 7 is not on device 'barley'}}
  mill.h %a
  return
}

// -----

// The name and the order of qubits in messages are the device's.
func.func @notCoupled() {
  %a = mill.qubit 0
  %b = mill.qubit 2
  // expected-error @below {{sites 0 and 2}}
  mill.cnot %b if %a
  return
}

// -----

func.func @sameSite() {
  %a = mill.qubit 0
  %b = mill.qubit 0
  // expected-error @below {{both qubits are on site 0}}
  mill.sync %a, %b
  return
}

// -----

func.func @negative() {
  %a = mill.qubit 0
  // expected-error @below {{-5 dt}}
  mill.wait %a takes -5
  return
}

// -----

func.func @noDuration() {
  %a = mill.qubit 0
  // expected-error @below {{'delay' has no duration}}
  mill.wait %a
  return
}

// -----

func.func @badState(%a: !mill.qubit {lull.site = 0 : i64}) {
  mill.h %a
  // expected-error @below {{'lull.state' must be a #lull.state but is "live"}}
  mill.slack %a takes 8 {lull.state = "live"}
  return
}

// -----

// A type of no host cannot be a qubit, whatever its argument claims: nobody
// could build a wait on it.
func.func @noHost(%a: i32 {lull.site = 0 : i64}) {
  %b = mill.qubit 1
  mill.h %b
  // expected-error @below {{takes a value of type 'i32' as a qubit, which no host dialect says it is}}
  lull.delay %a : i32 for 8 dt
  return
}

// -----

// Q8: a window on two qubits
func.func @wideWindow() {
  %a = mill.qubit 0
  %b = mill.qubit 1
  mill.h %a
  // expected-error @below {{'idle' acts on 2 qubits when it should act on 1}}
  mill.hush %a, %b takes 800
  return
}

// -----

func.func @emptyWindow() {
  %a = mill.qubit 0
  mill.h %a
  // expected-error @below {{'idle' acts on 0 qubits when it should act on 1}}
  mill.hush takes 800
  return
}
