// The whole pipeline on a dialect with reference semantics, unconverted.
// RUN: lull-host-opt %s --lull-protect=device=barley | FileCheck %s
// RUN: lull-host-opt %s --lull-protect=device=barley | FileCheck %s --check-prefix=ONLY
// RUN: lull-host-opt %s --lull-protect=device=barley -o %t.once
// RUN: lull-host-opt %t.once --lull-protect=device=barley -o %t.twice
// RUN: diff %t.once %t.twice

// Each pass alone, one after the other, gives the same.
// RUN: lull-host-opt %s --lull-use-device=name=barley \
// RUN:   | lull-host-opt --lull-set-durations | lull-host-opt --lull-schedule \
// RUN:   | lull-host-opt --lull-assign=sequence=xy4 | lull-host-opt --lull-emit \
// RUN:   | lull-host-opt --lull-native -o %t.steps
// RUN: diff %t.once %t.steps

// Nothing of Lull is left between the qubits and the end of the function.
// ONLY: mill.qubit
// ONLY-NOT: {{ lull\.}}
// ONLY: return

// CHECK-LABEL: func.func @parity(
// CHECK-SAME: %[[SCALE:.*]]: f64, %[[Q2:.*]]: !mill.qubit {lull.site = 2 : i64}) -> i1
// CHECK-SAME: lull.device = @barley
// CHECK: %[[Q0:.*]] = mill.qubit 0
// CHECK: %[[Q1:.*]] = mill.qubit 1
// CHECK: mill.h %[[Q0]] takes 160
// CHECK: mill.rz(5.000000e-01) %[[Q1]] takes 0
// CHECK: mill.slack %[[Q1]] takes 160 {lull.state = #lull.state<basis>}

// The control is on site 0: cx on (0, 1), then on (2, 1), as barley lists them.
// CHECK: mill.cnot %[[Q1]] if %[[Q0]] takes 1584
// CHECK: arith.addf %[[SCALE]], %[[SCALE]] : f64
// CHECK: memref.alloca() : memref<2xi1>
// Site 2 is handed in, so it may hold a state: its wait is protected.
// CHECK: mill.wait %[[Q2]] takes
// CHECK-NEXT: mill.x %[[Q2]] takes 160
// CHECK: mill.cnot %[[Q1]] if %[[Q2]] takes 1856
// CHECK: mill.wait %[[Q2]] takes 96
// CHECK: %[[BIT:.*]] = mill.read %[[Q1]] takes 4000
// CHECK: memref.store %[[BIT]]

// The window of 5856 dt on site 0: four pulses of 160 dt, the Ys from x
// between frame changes.
// CHECK-NOT: mill.slack
// CHECK: mill.wait %[[Q0]] takes
// CHECK-NEXT: mill.x %[[Q0]] takes 160
// CHECK-NEXT: mill.wait %[[Q0]] takes
// CHECK-NEXT: mill.rz(-1.5707963267948966) %[[Q0]] takes 0
// CHECK-NEXT: mill.x %[[Q0]] takes 160
// CHECK-NEXT: mill.wait %[[Q0]] takes
// CHECK-NEXT: mill.rz(1.5707963267948966) %[[Q0]] takes 0
// CHECK-NEXT: mill.x %[[Q0]] takes 160
// CHECK-NEXT: mill.wait %[[Q0]] takes
// CHECK-NEXT: mill.rz(-1.5707963267948966) %[[Q0]] takes 0
// CHECK-NEXT: mill.x %[[Q0]] takes 160
// CHECK-NEXT: mill.rz(1.5707963267948966) %[[Q0]] takes 0
// CHECK-NEXT: mill.wait %[[Q0]] takes
// CHECK-NEXT: mill.sync %[[Q0]], %[[Q1]]
// CHECK-NEXT: mill.x %[[Q0]] takes 160
// CHECK-NEXT: mill.prep %[[Q1]] takes 4800

// What waits for the end stands before the terminator.
// CHECK: mill.x %[[Q2]] takes 160
// CHECK: mill.rz(1.5707963267948966) %[[Q2]] takes 0
// CHECK: mill.rz(1.5707963267948966) %[[Q2]] takes 0
// CHECK-NEXT: mill.wait %[[Q2]] takes
// CHECK-NEXT: return %[[BIT]] : i1
func.func @parity(%scale: f64, %q2: !mill.qubit {lull.site = 2 : i64}) -> i1 {
  %q0 = mill.qubit 0
  %q1 = mill.qubit 1
  mill.h %q0
  mill.rz(0.5) %q1
  mill.cnot %q1 if %q0
  %twice = arith.addf %scale, %scale : f64
  %bits = memref.alloca() : memref<2xi1>
  %first = arith.constant 0 : index
  mill.cnot %q1 if %q2
  mill.wait %q2 takes 96
  %m = mill.read %q1
  memref.store %m, %bits[%first] : memref<2xi1>
  mill.sync %q0, %q1
  mill.x %q0
  mill.prep %q1
  return %m : i1
}
