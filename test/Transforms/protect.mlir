// RUN: lull-opt %s --lull-protect="device=orchard sequence=xy4" -o %t.once
// RUN: FileCheck %s --input-file=%t.once

// The pipeline is its passes.
// RUN: lull-opt %s --lull-use-device=name=orchard --lull-set-durations --lull-schedule --lull-assign=sequence=xy4 --lull-emit --lull-native -o %t.passes
// RUN: diff %t.once %t.passes

// On its own output it changes nothing, as early or as late as possible.
// RUN: lull-opt %t.once --lull-protect="device=orchard sequence=xy4" -o %t.twice
// RUN: diff %t.once %t.twice
// RUN: lull-opt %s --lull-protect="device=orchard sequence=udd-6 policy=alap" -o %t.late
// RUN: lull-opt %t.late --lull-protect="device=orchard sequence=udd-6 policy=alap" | diff %t.late -

// Threads change neither the result nor the order of remarks.
// RUN: lull-opt %s --lull-protect="device=orchard sequence=xy4" --remarks-filter='.*' --mlir-disable-threading 2> %t.alone | diff %t.once -
// RUN: lull-opt %s --lull-protect="device=orchard sequence=xy4" --remarks-filter='.*' 2> %t.threads | diff %t.once -
// RUN: diff %t.alone %t.threads

// CHECK-LABEL: @ring
// CHECK: lull.idle %q1 for {{.*}} dt basis
// CHECK: lull.gate rz(-1/2 pi) %q0 for 0 dt
// CHECK-NOT: lull.pulse
// CHECK-LABEL: @pair
func.func @ring() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  %q16 = lull.qubit 16
  lull.gate h %q0
  lull.gate cx %q0, %q1
  lull.gate cx %q1, %q2
  lull.gate cx %q2, %q16
  %m = lull.measure %q16
  lull.gate h %q0
  lull.barrier %q0, %q1, %q2, %q16
  return
}

func.func @pair() {
  %q3 = lull.qubit 3
  %q4 = lull.qubit 4
  lull.gate h %q3
  lull.gate sx %q4
  lull.gate cx %q3, %q4
  %m = lull.measure %q4
  lull.gate cx %q3, %q4
  return
}
