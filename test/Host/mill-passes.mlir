// Each pass alone on mill, on the text that the pass before it leaves.
// RUN: split-file %s %t
// RUN: lull-host-opt %t/durations.mlir --lull-set-durations | FileCheck %t/durations.mlir
// RUN: lull-host-opt %t/durations.mlir --lull-set-durations=replace=true | FileCheck %t/durations.mlir --check-prefix=REPLACE
// RUN: lull-host-opt %t/schedule.mlir --lull-schedule | FileCheck %t/schedule.mlir
// RUN: lull-host-opt %t/schedule.mlir --lull-schedule=policy=alap | FileCheck %t/schedule.mlir --check-prefix=ALAP
// RUN: lull-host-opt %t/assign.mlir --lull-assign=sequence=hahn | FileCheck %t/assign.mlir
// RUN: lull-host-opt %t/emit.mlir --lull-emit | FileCheck %t/emit.mlir
// RUN: lull-host-opt %t/emit.mlir --lull-emit=native=true | FileCheck %t/emit.mlir --check-prefix=NATIVE
// RUN: lull-host-opt %t/native.mlir --lull-native | FileCheck %t/native.mlir

//--- durations.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  lull.operation h for 20 dt
  lull.operation x for 30 dt
  lull.operation cx on (0, 1) for 300 dt
  lull.operation cx on (1, 0) for 400 dt
  lull.operation measure for 900 dt
  lull.operation reset for 800 dt
}
// CHECK: mill.h %0 takes 20
// CHECK-NEXT: mill.x %0 takes 25
// CHECK-NEXT: mill.cnot %1 if %0 takes 300
// CHECK-NEXT: mill.cnot %0 if %1 takes 400
// CHECK-NEXT: mill.wait %0 takes 7
// CHECK-NEXT: mill.sync %0, %1
// CHECK-NEXT: mill.read %0 takes 900
// CHECK-NEXT: mill.prep %1 takes 800
// REPLACE: mill.x %0 takes 30
// REPLACE: mill.wait %0 takes 7
func.func @f() attributes {lull.device = @bench} {
  %a = mill.qubit 0
  %b = mill.qubit 1
  mill.h %a
  mill.x %a takes 25
  mill.cnot %b if %a
  mill.cnot %a if %b
  mill.wait %a takes 7
  mill.sync %a, %b
  %m = mill.read %a
  mill.prep %b
  return
}

//--- schedule.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
}
// The wish goes along with the idle that ends at its operation.
// CHECK: mill.h %0 takes 20
// CHECK-NEXT: mill.x %1 takes 500
// CHECK-NEXT: mill.slack %0 takes 480 {lull.state = #lull.state<live>}
// CHECK-NEXT: mill.cnot %1 if %0 takes 300 {lull.protect = "hahn"}
// CHECK-NEXT: return
// ALAP: mill.slack %0 takes 480 {lull.state = #lull.state<basis>}
// ALAP-NEXT: mill.h %0 takes 20
// ALAP-NEXT: mill.x %1 takes 500
// ALAP-NEXT: mill.cnot
func.func @f() attributes {lull.device = @bench} {
  %a = mill.qubit 0
  %b = mill.qubit 1
  mill.h %a takes 20
  mill.x %b takes 500
  mill.cnot %b if %a takes 300 {lull.protect = "hahn"}
  return
}

//--- assign.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
}
// An idle without a state counts as live.
// CHECK: mill.slack %0 takes 100 {lull.plan = #lull.plan<"hahn">}
// CHECK-NEXT: mill.slack %0 takes 200 {lull.state = #lull.state<basis>}
// CHECK-NEXT: mill.slack %0 takes 300 {lull.plan = #lull.plan<"xy4">}
func.func @f() attributes {lull.device = @bench} {
  %a = mill.qubit 0
  mill.slack %a takes 100
  mill.slack %a takes 200 {lull.state = #lull.state<basis>}
  mill.slack %a takes 300 {lull.plan = #lull.plan<"xy4">}
  return
}

//--- emit.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
}
// Two pulses of 20 dt centred at 1/4 and 3/4 of 200 dt. Only the pulses, which
// no host has, are Lull's.
// CHECK: mill.wait %0 takes 40
// CHECK-NEXT: lull.pulse %0 : !mill.qubit about 0 pi for 20 dt
// CHECK-NEXT: mill.wait %0 takes 80
// CHECK-NEXT: lull.pulse %0 : !mill.qubit about 0 pi for 20 dt last
// CHECK-NEXT: mill.wait %0 takes 40
// CHECK-NEXT: mill.slack %0 takes 100
// CHECK-NEXT: return
// NATIVE: mill.wait %0 takes 40
// NATIVE-NEXT: mill.x %0 takes 20
// NATIVE-NEXT: mill.wait %0 takes 80
// NATIVE-NEXT: mill.x %0 takes 20
// NATIVE-NEXT: mill.wait %0 takes 40
// NATIVE-NEXT: mill.slack %0 takes 100
func.func @f() attributes {lull.device = @bench} {
  %a = mill.qubit 0
  mill.slack %a takes 200 {lull.plan = #lull.plan<"cpmg-2">}
  mill.slack %a takes 100
  return
}

//--- native.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}
// A frame that is left open is closed before the next operation.
// CHECK: mill.rz(-1.5707963267948966) %0 takes 0
// CHECK-NEXT: mill.x %0 takes 20
// CHECK-NEXT: mill.wait %0 takes 5
// CHECK-NEXT: mill.rz(1.5707963267948966) %0 takes 0
// CHECK-NEXT: mill.h %0 takes 20
// CHECK-NEXT: return
func.func @f() attributes {lull.device = @bench} {
  %a = mill.qubit 0
  lull.pulse %a : !mill.qubit about 1/2 pi for 20 dt
  mill.wait %a takes 5
  mill.h %a takes 20
  return
}
