// RUN: lull-opt %s --symbol-dce | FileCheck %s

// Private devices and sequences stay as long as something names them, be it
// from inside a plan; others go.

// CHECK: lull.device @used
// CHECK-NOT: lull.device @unused
lull.device @used clock 1 ns attributes {sym_visibility = "private"} {
  lull.site 0
}
lull.device @unused clock 1 ns attributes {sym_visibility = "private"} {
}

// CHECK: lull.sequence @planned
// CHECK-NEXT: lull.sequence @wished
// CHECK-NEXT: lull.sequence @attached
// CHECK-NEXT: func.func @program
lull.sequence @planned phases [0, 0] at centred {sym_visibility = "private"}
lull.sequence @wished phases [0, 0] at centred {sym_visibility = "private"}
lull.sequence @attached phases [0, 0] at centred {sym_visibility = "private"}
lull.sequence @idle phases [0, 0] at centred {sym_visibility = "private"}

func.func @program() attributes {lull.device = @used} {
  %q0 = lull.qubit 0
  lull.idle %q0 for 500 dt live plan @planned repeats 2
  lull.gate x %q0 for 5 dt {lull.protect = @wished}
  %c = arith.constant {lull.plan = #lull.plan<@attached alternating>} 0 : i64
  return
}
