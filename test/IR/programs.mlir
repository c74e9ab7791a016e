// RUN: lull-opt %s --split-input-file | FileCheck %s
// RUN: lull-opt %s --split-input-file | lull-opt --split-input-file \
// RUN:   | FileCheck %s
// RUN: lull-opt %s --split-input-file --mlir-print-op-generic \
// RUN:   | lull-opt --split-input-file | FileCheck %s
// RUN: lull-opt %s --split-input-file --verify-roundtrip -o /dev/null

// Operations of programs in every form of their assembly.

// CHECK-LABEL: func.func @handles
func.func @handles() {
  // CHECK-NEXT: %q0 = lull.qubit 0
  %a = lull.qubit 0
  // CHECK-NEXT: %q17 = lull.qubit 17
  %b = lull.qubit 0x11
  // Two handles of one site have names of their own.
  // CHECK-NEXT: %q0_0 = lull.qubit 0
  %c = lull.qubit 0
  // CHECK-NEXT: %m = lull.measure %q0
  %x = lull.measure %a
  // CHECK-NEXT: %m_1 = lull.measure %q17
  %y = lull.measure %b
  // CHECK-NEXT: lull.reset %q0_0
  lull.reset %c
  return
}

// -----

// CHECK-LABEL: func.func @durations
func.func @durations() {
  %q0 = lull.qubit 0
  // CHECK: lull.gate x %q0{{$}}
  lull.gate x %q0
  // CHECK-NEXT: lull.gate x %q0 for 160 dt
  lull.gate x %q0 for 160 dt
  // CHECK-NEXT: lull.gate x %q0 for 160 dt
  lull.gate x %q0 for 0xA0 dt
  // CHECK-NEXT: lull.gate x %q0 for 160 dt
  lull.gate x %q0 for 160dt
  // CHECK-NEXT: lull.measure %q0 for 4 us
  %m = lull.measure %q0 for 4 us
  // CHECK-NEXT: lull.reset %q0 for 1.25 ms
  lull.reset %q0 for 1.25 ms
  // Trailing zeros go; the unit stays as it was written.
  // CHECK-NEXT: lull.delay %q0 for 35.5 ns
  lull.delay %q0 for 35.500 ns
  // CHECK-NEXT: lull.delay %q0 for 1000 ns
  lull.delay %q0 for 1000 ns
  // CHECK-NEXT: lull.delay %q0 for 0 s
  lull.delay %q0 for 0.0 s
  // CHECK-NEXT: lull.delay %q0 for 0 dt
  lull.delay %q0 for 0 dt
  // Eighteen digits, before, behind and around the point.
  // CHECK-NEXT: lull.delay %q0 for 999999999999999999 dt
  lull.delay %q0 for 999999999999999999 dt
  // CHECK-NEXT: lull.delay %q0 for 0.000000000000000001 s
  lull.delay %q0 for 0.000000000000000001 s
  // CHECK-NEXT: lull.delay %q0 for 123456789.123456789 ns
  lull.delay %q0 for 123456789.123456789 ns
  // The micro sign only in the generic form, as MLIR's words are ASCII.
  // CHECK-NEXT: lull.delay %q0 for 5 us
  "lull.delay"(%q0) <{duration = "5 \C2\B5s"}> : (!lull.qubit) -> ()
  return
}

// -----

// CHECK-LABEL: func.func @gates
func.func @gates() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  // CHECK: lull.gate h %q0
  lull.gate h %q0
  // CHECK-NEXT: lull.gate cx %q1, %q0 for 1600 dt
  lull.gate cx %q1, %q0 for 1600 dt
  // CHECK-NEXT: lull.gate ccx %q2, %q0, %q1
  lull.gate ccx %q2, %q0, %q1
  // A name that is no word of MLIR is written as a string.
  // CHECK-NEXT: lull.gate x.90 %q0
  lull.gate "x.90" %q0
  // CHECK-NEXT: lull.gate "90x" %q0
  lull.gate "90x" %q0
  // CHECK-NEXT: lull.gate "my gate" %q0
  lull.gate "my gate" %q0
  // CHECK-NEXT: lull.gate "\22\\\E2\9C\93" %q0
  lull.gate "\22\\\E2\9C\93" %q0
  // Words of the assembly and of MLIR are good names.
  // CHECK-NEXT: lull.gate for %q0 for 5 dt
  lull.gate for %q0 for 5 dt
  // CHECK-NEXT: lull.gate pi(1 pi) %q0
  lull.gate pi(pi) %q0
  // CHECK-NEXT: lull.gate i32 %q0
  lull.gate i32 %q0
  // CHECK-NEXT: lull.gate true %q0
  lull.gate true %q0
  // CHECK-NEXT: lull.gate x %q0 {lull.protect = "none"}
  lull.gate x %q0 {lull.protect = "none"}
  return
}

// -----

// CHECK-LABEL: func.func @waits
func.func @waits() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  // CHECK: lull.barrier %q0{{$}}
  lull.barrier %q0
  // CHECK-NEXT: lull.barrier %q0, %q1
  lull.barrier %q0, %q1
  // CHECK-NEXT: lull.delay %q0, %q1 for 40 ns
  lull.delay %q0, %q1 for 40 ns
  // CHECK-NEXT: lull.delay %q0 for 40 ns
  lull.delay %q0 : !lull.qubit for 40 ns
  // CHECK-NEXT: lull.idle %q0 for 5 dt basis
  lull.idle %q0 for 5 dt basis
  // CHECK-NEXT: lull.idle %q0 for 5 dt live
  lull.idle %q0 for 5 dt live
  // CHECK-NEXT: lull.idle %q0 for 5 dt spent
  lull.idle %q0 for 5 dt spent
  // CHECK-NEXT: lull.idle %q0 for 4180 dt live plan "xy8"
  lull.idle %q0 for 4180 dt live plan "xy8"
  // CHECK-NEXT: lull.idle %q0 for 4180 dt live plan "xy8" repeats 2
  lull.idle %q0 for 4180 dt live plan "xy8" repeats 2
  // CHECK-NEXT: lull.idle %q0 for 4180 dt live plan @mine alternating
  lull.idle %q0 for 4180 dt live plan @mine repeats 1 alternating
  // CHECK-NEXT: lull.idle %q0 for 4180 dt live plan @mine repeats 10000 alternating {note = "x"}
  lull.idle %q0 for 4180 dt live plan @mine repeats 10000 alternating {note = "x"}
  // CHECK-NEXT: lull.idle %q0 for 5 dt live plan @"my sequence"
  lull.idle %q0 for 5 dt live plan @"my sequence"
  // CHECK-NEXT: lull.pulse %q0 about 1/2 pi for 160 dt last
  lull.pulse %q0 about 2/4 pi for 160 dt last
  // CHECK-NEXT: lull.pulse %q0 about 1 pi for 160 dt
  lull.pulse %q0 about pi for 160 dt
  // CHECK-NEXT: lull.pulse %q0 about 0 pi for 160 dt
  lull.pulse %q0 about 0 pi for 160 dt
  // CHECK-NEXT: lull.pulse %q0 about -3/2 pi for 160 dt
  lull.pulse %q0 about -3/2 pi for 160 dt
  return
}

// -----

// Foreign types, with references and with values that are carried on.
// CHECK-LABEL: func.func @foreign(
// CHECK-SAME: %[[V:.*]]: i32, %[[W:.*]]: tuple<>
func.func @foreign(%v: i32, %w: tuple<>) -> i32 {
  // CHECK-NEXT: %[[A:.*]] = lull.idle %[[V]] : i32 -> i32 for 5 dt live plan "xy4"
  %a = lull.idle %v : i32 -> i32 for 5 dt live plan "xy4"
  // CHECK-NEXT: lull.idle %[[W]] : tuple<> for 5 dt spent
  lull.idle %w : tuple<> for 5 dt spent
  // CHECK-NEXT: %[[B:.*]] = lull.pulse %[[A]] : i32 -> i32 about 1/2 pi for 160 dt
  %b = lull.pulse %a : i32 -> i32 about 1/2 pi for 160 dt
  // CHECK-NEXT: lull.pulse %[[W]] : tuple<> about 1/2 pi for 160 dt last
  lull.pulse %w : tuple<> about 1/2 pi for 160 dt last
  // CHECK-NEXT: %[[C:.*]]:2 = lull.delay %[[B]], %[[W]] : i32, tuple<> -> i32, tuple<> for 5 ns
  %c:2 = lull.delay %b, %w : i32, tuple<> -> i32, tuple<> for 5 ns
  // CHECK-NEXT: lull.delay %[[C]]#0, %[[C]]#1 : i32, tuple<> for 5 ns
  lull.delay %c#0, %c#1 : i32, tuple<> for 5 ns
  return %c#0 : i32
}

// -----

// A handle can be carried on too.
// CHECK-LABEL: func.func @carried(
// CHECK-SAME: %{{.*}}: !lull.qubit {lull.site = 3 : i64}
func.func @carried(%q: !lull.qubit {lull.site = 3 : i64}) -> !lull.qubit {
  // CHECK: lull.idle %{{.*}} : !lull.qubit -> !lull.qubit for 5 dt basis
  %r = lull.idle %q : !lull.qubit -> !lull.qubit for 5 dt basis
  return %r : !lull.qubit
}

// -----

// Attributes on other operations.
// CHECK-LABEL: func.func @attributes
func.func @attributes() {
  %q0 = lull.qubit 0
  // CHECK: lull.protect = "xy8"
  lull.gate x %q0 {lull.protect = "xy8"}
  // CHECK-NEXT: lull.protect = @mine
  lull.gate x %q0 {lull.protect = @mine}
  // CHECK-NEXT: lull.protect = #lull.plan<@mine repeats 3 alternating>
  lull.gate x %q0 {lull.protect = #lull.plan<@mine repeats 3 alternating>}
  // CHECK-NEXT: arith.constant {lull.plan = #lull.plan<"xy8">, lull.state = #lull.state<spent>}
  %c = arith.constant {lull.plan = #lull.plan<"xy8">, lull.state = #lull.state<spent>} 0 : i64
  return
}
