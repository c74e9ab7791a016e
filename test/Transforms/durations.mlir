// RUN: lull-opt %s --lull-use-device=file=%S/Inputs/pear.mlir --lull-set-durations | FileCheck %s
// RUN: lull-opt %s --lull-use-device=file=%S/Inputs/pear.mlir --lull-set-durations=replace | FileCheck %s --check-prefix=REPLACE
// RUN: lull-opt %s --lull-use-device=file=%S/Inputs/pear.mlir | lull-opt --lull-use-device=name=pear --lull-set-durations | FileCheck %s

// The device comes first in the module, and functions that name none run on it.
// CHECK: module
// CHECK-NEXT: lull.device @pear clock 1/2 ns step 4 dt
// CHECK-LABEL: func.func @durations() attributes {lull.device = @pear}
// REPLACE-LABEL: func.func @durations
func.func @durations() {
  %a = lull.qubit 0
  %b = lull.qubit 3
  // CHECK: lull.gate h %q0 for 40 dt
  lull.gate h %a
  // A line for the sites goes before one for any pair; order counts unless the
  // line is symmetric.
  // CHECK: lull.gate cz %q0, %q3 for 241 dt
  lull.gate cz %a, %b
  // CHECK: lull.gate cx %q0, %q3 for 280 dt
  lull.gate cx %a, %b
  // CHECK: lull.gate cx %q3, %q0 for 300 dt
  lull.gate cx %b, %a
  // CHECK: lull.measure %q0 for 2000 dt
  %m0 = lull.measure %a
  // CHECK: lull.measure %q3 for 2400 dt
  %m3 = lull.measure %b
  // CHECK: lull.reset %q3 for 4000 dt
  lull.reset %b
  // CHECK: lull.gate rz(1/4 pi) %q0 for 0 dt
  lull.gate rz(1/4 pi) %a
  // What the program states stays, and delays always do.
  // CHECK: lull.gate h %q0 for 10.5 ns
  // REPLACE: lull.gate h %q0 for 40 dt
  // REPLACE: lull.gate h %q0 for 40 dt
  lull.gate h %a for 10.5 ns
  // CHECK: lull.delay %q0 for 40 ns
  // REPLACE: lull.delay %q0 for 40 ns
  lull.delay %a for 40 ns
  return
}

// A function without timed operations needs no device.
// CHECK-LABEL: func.func @classical()
// CHECK-NOT: lull.device
// CHECK: return
func.func @classical() {
  return
}
