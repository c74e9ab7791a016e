// RUN: lull-opt %s --lull-print-timeline -o /dev/null | FileCheck %s

lull.device @line clock 1/2 ns {
  lull.site 0
  lull.site 1
  lull.site 2
  lull.coupler 0, 1
}

// CHECK-LABEL: @three: 60 dt (30 ns) on device line
// CHECK-NEXT: start end slack operation sites
// CHECK-NEXT: 0 10 0 critical h 0
// CHECK-NEXT: 0 4 6 x 1
// CHECK-NEXT: 10 50 0 critical cx 0, 1
// CHECK-NEXT: 0 20 40 delay 2
// CHECK-NEXT: 50 60 0 critical h 1
// CHECK-NEXT: 50 50 10 rz 0
func.func @three() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.gate h %q0 for 5 ns
  lull.gate x %q1 for 2 ns
  lull.gate cx %q0, %q1 for 20 ns
  lull.delay %q2 for 10 ns
  lull.gate h %q1 for 5 ns
  lull.gate rz(0.1) %q0 for 0 dt
  return
}
