// RUN: lull-opt %s | FileCheck %s
// RUN: lull-opt %s | lull-opt | FileCheck %s
// RUN: lull-opt %s --mlir-print-op-generic | FileCheck %s --check-prefix=GENERIC
// RUN: lull-opt %s --mlir-print-op-generic | lull-opt | FileCheck %s
// RUN: lull-opt %s --emit-bytecode | lull-opt | FileCheck %s
// RUN: lull-opt %s --emit-bytecode | lull-opt --mlir-print-op-generic \
// RUN:   | FileCheck %s --check-prefix=GENERIC

// Angles read back to the bit: what is printed is the shortest decimal that
// does (compared here with the shortest decimals that Python's repr gives), and
// exact ones stay fractions.

// CHECK-LABEL: func.func @radians
func.func @radians() {
  %q0 = lull.qubit 0
  // CHECK: lull.gate a(0.1, 0.2, 0.30000000000000004, 0.3)
  // GENERIC: angles = [1.000000e-01, 2.000000e-01, 0.30000000000000004, 3.000000e-01]
  lull.gate a(0.1, 0.2, 0.30000000000000004, 0.3) %q0
  // Pi and its neighbours among the doubles.
  // CHECK-NEXT: lull.gate b(3.1415926535897927, 3.141592653589793, 3.1415926535897936)
  // GENERIC: angles = [3.1415926535897927, 3.1415926535897931, 3.1415926535897936]
  lull.gate b(3.1415926535897927, 3.141592653589793, 3.1415926535897936) %q0
  // The largest, the smallest normal, the largest and smallest below that.
  // CHECK-NEXT: lull.gate c(1.7976931348623157e+308, 2.2250738585072014e-308, 2.225073858507201e-308, 5.0e-324)
  lull.gate c(1.7976931348623157e308, 2.2250738585072014e-308, 2.225073858507201e-308, 4.9406564584124654e-324) %q0
  // CHECK-NEXT: lull.gate d(-0.0, 0.0, -0.0, 0.0)
  lull.gate d(-0.0, 0.0, -0, 0) %q0
  // Around 2^53, where doubles stop being dense, and around powers of ten.
  // CHECK-NEXT: lull.gate e(9007199254740991.0, 9007199254740992.0, 9007199254740994.0, 1.0e+16, 1.0e+23, 1.0e-05, 0.0001)
  lull.gate e(9007199254740991.0, 9007199254740992.0, 9007199254740994.0, 1.0e16, 1.0e23, 1.0e-5, 1.0e-4) %q0
  // Whole numbers are radians.
  // CHECK-NEXT: lull.gate f(3.0, -3.0, 16.0)
  lull.gate f(3, -3, 0x10) %q0
  return
}

// CHECK-LABEL: func.func @exact
func.func @exact() {
  %q0 = lull.qubit 0
  // CHECK: lull.gate a(1 pi, -1 pi, 0 pi, 1/2 pi, -1/2 pi)
  // GENERIC: angles = ["1 pi", "-1 pi", "0 pi", "1/2 pi", "-1/2 pi"]
  lull.gate a(pi, -pi, 0 pi, 2/4 pi, -2/4 pi) %q0
  // Not taken modulo anything: gates may care for whole turns.
  // CHECK-NEXT: lull.gate b(7/2 pi, 100 pi, -1000000000/999999999 pi, 1/1000000000 pi)
  lull.gate b(7/2 pi, 100 pi, -1000000000/999999999 pi, 1/1000000000 pi) %q0
  // Both kinds in one gate; a multiple of pi is not the double next to it.
  // CHECK-NEXT: lull.gate c(1/2 pi, 1.5707963267948966)
  // GENERIC: angles = ["1/2 pi", 1.5707963267948966]
  lull.gate c(1/2 pi, 1.5707963267948966) %q0
  return
}
