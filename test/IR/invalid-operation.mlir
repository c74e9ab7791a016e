// RUN: lull-opt %s --split-input-file --verify-diagnostics

// Constraints D16 to D32 of docs/Spec.md.

// D16: an operation without a name
lull.device @nameless clock 1 ns {
  // expected-error@below {{'lull.operation' op has an empty name}}
  lull.operation "" for 160 dt
}

// -----

// D17: an operation on no qubit
lull.device @none clock 1 ns {
  // expected-error@below {{'lull.operation' op is for 0 qubits when it should be for 1 to 1000}}
  lull.operation x on any 0 for 160 dt
}

// -----

// D17: an operation on fewer
lull.device @none clock 1 ns {
  // expected-error@below {{'lull.operation' op is for -1 qubits when it should be for 1 to 1000}}
  lull.operation x on any -1 for 160 dt
}

// -----

// D18: tuples of two lengths
lull.device @uneven clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  // expected-error@below {{custom op 'lull.operation' found 1 site when the first tuple has 2}}
  lull.operation cx on (0, 1), 0 for 160 dt
}

// -----

// D18: half a pair in the generic form
lull.device @uneven clock 1 ns {
  // expected-error@below {{'lull.operation' op lists 3 sites, which is no multiple of its 2 qubits}}
  "lull.operation"() <{label = "cx", on = array<i64: 0, 1, 2>, arity = 2 : i64, duration = #lull.duration<5 dt>}> : () -> ()
}

// -----

// D19: one qubit has no other order
lull.device @single clock 1 ns {
  // expected-error@below {{'lull.operation' op is symmetric with 1 qubits when only pairs can be}}
  lull.operation x symmetric for 160 dt
}

// -----

// D20: a listed site is not there
lull.device @absent clock 1 ns {
  lull.site 0
  lull.site 2
  // expected-error@below {{operation 'x' is listed for site 1, but there is no site 1 (sites are 0, 2)}}
  lull.operation x on 0, 1 for 160 dt
}

// -----

// D21: a tuple with a site twice
lull.device @same clock 1 ns {
  lull.site 0
  // expected-error@below {{operation 'cx' is listed for (0, 0) with site 0 twice}}
  lull.operation cx on (0, 0) for 160 dt
}

// -----

// D22: a listed pair has no coupler
lull.device @apart clock 1 ns {
  lull.site 0
  lull.site 1
  // expected-error@below {{operation 'cx' is listed for (0, 1), but sites 0 and 1 are not coupled}}
  lull.operation cx on (0, 1) for 160 dt
}

// -----

// D23: one name for one and for two qubits
lull.device @mixed clock 1 ns {
  lull.operation x for 160 dt
  // expected-error@below {{operation 'x' is listed with 1 qubit and with 2}}
  lull.operation x on any pair for 160 dt
}

// -----

// D24: twice for any site
lull.device @twice clock 1 ns {
  lull.operation x for 160 dt
  // expected-error@below {{operation 'x' is listed twice for any site}}
  lull.operation x for 170 dt
}

// -----

// D24: twice for one site in one line
lull.device @twice clock 1 ns {
  lull.site 0
  // expected-error@below {{operation 'x' is listed twice for site 0}}
  lull.operation x on 0, 0 for 160 dt
}

// -----

// D24: twice for one site in two lines
lull.device @twice clock 1 ns {
  lull.site 0
  lull.site 1
  lull.operation x on 0 for 160 dt
  // expected-error@below {{operation 'x' is listed twice for site 0}}
  lull.operation x on 1, 0 for 170 dt
}

// -----

// D24: a symmetric pair and its reverse
lull.device @twice clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  lull.operation cz on (0, 1) symmetric for 160 dt
  // expected-error@below {{operation 'cz' is listed twice for (1, 0)}}
  lull.operation cz on (1, 0) for 170 dt
}

// -----

// D25: a step off the clock
// expected-error@below {{1 ns is not a whole number of dt (2/9 ns): it is 4.5 dt, between 4 dt (0.889 ns) and 5 dt (1.111 ns)}}
lull.device @off clock 2/9 ns step 1 ns {
}

// -----

// D25: a gap off the clock
// expected-error@below {{0.5 ns is not a whole number of dt (2/9 ns): it is 2.25 dt, between 2 dt (0.444 ns) and 3 dt (0.667 ns)}}
lull.device @off clock 2/9 ns gap 0.5 ns {
}

// -----

// D25: an operation off the clock
lull.device @off clock 2/9 ns {
  // expected-error@below {{35.5 ns is not a whole number of dt (2/9 ns): it is 159.75 dt, between 159 dt (35.333 ns) and 160 dt (35.556 ns)}}
  lull.operation x for 35.5 ns
}

// -----

// D25: an operation that runs backward
lull.device @backward clock 2/9 ns {
  // expected-error@below {{duration -160 dt is negative}}
  lull.operation x for -160 dt
}

// -----

// D26: a frame change that takes time
lull.device @slow clock 1 ns {
  // expected-error@below {{operation 'rz' is a frame change but takes 10 dt when it should take 0 dt}}
  lull.operation rz for 10 dt plays frame
}

// -----

// D27: a pulse on two qubits
lull.device @both clock 1 ns {
  // expected-error@below {{plays a pulse on 2 qubits when it should be on 1}}
  lull.operation xx on any pair for 160 dt plays rotation(1 pi, 0 pi)
}

// -----

// D28: an echo at the start
lull.device @early clock 1 ns {
  // expected-error@below {{echo at 0 is outside the operation, 0 to 1}}
  lull.operation cx on any pair for 160 dt echo 0
}

// -----

// D28: an echo after the end
lull.device @late clock 1 ns {
  // expected-error@below {{echo at 3/2 is outside the operation, 0 to 1}}
  lull.operation cx on any pair for 160 dt echo 3/2
}

// -----

// D29: an echo in a gate of one qubit
lull.device @lone clock 1 ns {
  // expected-error@below {{has an echo with 1 qubits when only pairs have}}
  lull.operation x for 160 dt echo 1/2
}

// -----

// D30: more than half a turn
lull.device @far clock 1 ns {
  // expected-error@below {{custom op 'lull.operation' turn is 3/2 pi when it should be in [-1, 1] pi and not 0}}
  lull.operation x for 160 dt plays rotation(3/2 pi, 0 pi)
}

// -----

// D30: no turn
lull.device @still clock 1 ns {
  // expected-error@below {{custom op 'lull.operation' turn is 0 pi when it should be in [-1, 1] pi and not 0}}
  lull.operation id for 160 dt plays rotation(0 pi, 0 pi)
}

// -----

// D30: in an attribute
// expected-error@below {{turn is -2 pi when it should be in [-1, 1] pi and not 0}}
func.func @attribute() attributes {plays = #lull.action<rotation(-2 pi, 0 pi)>} {
  return
}

// -----

// D31: an unknown action
lull.device @odd clock 1 ns {
  // expected-error@below {{custom op 'lull.operation' expected rotation(TURN, PHASE), equatorial or frame}}
  lull.operation x for 160 dt plays flip
}

// -----

// D32: an operation without a duration
lull.device @timeless clock 1 ns {
  // expected-error@below {{custom op 'lull.operation' expected 'for'}}
  lull.operation x native
}

// -----

// D32: in the generic form
lull.device @timeless clock 1 ns {
  // expected-error@below {{'lull.operation' op requires attribute 'duration'}}
  "lull.operation"() <{label = "x", on = array<i64>, arity = 1 : i64}> : () -> ()
}

// -----

// D17: a number of qubits that 32 bits would make 0
lull.device @wide clock 1 ns {
  // expected-error@below {{'lull.operation' op is for 4294967296 qubits when it should be for 1 to 1000}}
  lull.operation x on any 4294967296 for 5 dt
}

// -----

// A function is verified with its device in no fixed order: lines that are yet
// to be refused must not be read.
module {
  // expected-error@below {{'lull.device' op requires attribute 'clock'}}
  "lull.device"() <{sym_name = "bare"}> ({
  ^bb0:
  }) : () -> ()
  func.func @f() attributes {lull.device = @bare} {
    %q0 = lull.qubit 0
    lull.gate x %q0
    return
  }
}

// -----

module {
  lull.device @lines clock 1 ns {
    // expected-error@below {{'lull.site' op requires attribute 'site'}}
    "lull.site"() : () -> ()
  }
  func.func @f() attributes {lull.device = @lines} {
    %q0 = lull.qubit 0
    lull.gate x %q0
    return
  }
}
