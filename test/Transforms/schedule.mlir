// RUN: lull-opt %s --lull-use-device=name=barley --lull-set-durations --lull-schedule | FileCheck %s
// RUN: lull-opt %s --lull-use-device=name=barley --lull-set-durations --lull-schedule=policy=alap | FileCheck %s --check-prefix=ALAP

// CHECK-LABEL: func.func @parity
// CHECK: lull.gate h %q0 for 160 dt
// CHECK-NEXT: lull.idle %q1 for 160 dt basis
// CHECK-NEXT: lull.gate cx %q0, %q1 for 1584 dt
// CHECK-NEXT: lull.idle %q2 for 1744 dt basis
// CHECK-NEXT: lull.gate cx %q2, %q1 for 1856 dt
// CHECK-NEXT: %m = lull.measure %q1 for 4000 dt
// CHECK-NEXT: lull.idle %q0 for 5856 dt live
// CHECK-NEXT: lull.barrier %q0, %q1
// CHECK-NEXT: lull.idle %q2 for 4000 dt basis
// CHECK-NEXT: return

// ALAP-LABEL: func.func @parity
// ALAP: lull.idle %q2 for 1744 dt basis
// ALAP: lull.idle %q0 for 5856 dt live
func.func @parity() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.gate h %q0
  lull.gate cx %q0, %q1
  lull.gate cx %q2, %q1
  %m = lull.measure %q1
  lull.barrier %q0, %q1
  return
}

// A module within sees the devices around it.
lull.device @around clock 1 ns {
  lull.site 0
  lull.site 1
}
module @inner {
  // CHECK-LABEL: func.func @within
  // CHECK: lull.idle %q1 for 40 dt basis
  func.func @within() attributes {lull.device = @around} {
    %q0 = lull.qubit 0
    %q1 = lull.qubit 1
    lull.delay %q0 for 40 ns
    lull.barrier %q0, %q1
    return
  }
}
