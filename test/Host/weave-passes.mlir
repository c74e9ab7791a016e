// Each pass alone on weave, on the text that the pass before it leaves.
// RUN: split-file %s %t
// RUN: lull-host-opt %t/durations.mlir --lull-set-durations | FileCheck %t/durations.mlir
// RUN: lull-host-opt %t/schedule.mlir --lull-schedule | FileCheck %t/schedule.mlir
// RUN: lull-host-opt %t/schedule.mlir --lull-schedule=policy=alap | FileCheck %t/schedule.mlir --check-prefix=ALAP
// RUN: lull-host-opt %t/assign.mlir --lull-assign=sequence=hahn | FileCheck %t/assign.mlir
// RUN: lull-host-opt %t/emit.mlir --lull-emit | FileCheck %t/emit.mlir
// RUN: lull-host-opt %t/native.mlir --lull-native | FileCheck %t/native.mlir

//--- durations.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
  lull.operation h for 20 dt
  lull.operation cx on (0, 1) for 300 dt
  lull.operation cx on (1, 0) for 400 dt
  lull.operation measure for 900 dt
  lull.operation reset for 800 dt
}
// Which pair it is follows the values through: the second cx has them swapped.
// CHECK: weave.apply "h"(%0) lasts <20 dt>
// CHECK: weave.apply "cx"(%arg0, %arg0, %{{.*}}, %arg0, %{{.*}}) lasts <300 dt>
// CHECK: weave.apply "cx"(%{{.*}}#1, %arg0, %{{.*}}#0) lasts <400 dt>
// CHECK: weave.look %{{.*}}#0 lasts <900 dt>
// CHECK: weave.fresh %{{.*}}#1 lasts <800 dt>
func.func @f(%x: f64) attributes {lull.device = @bench} {
  %a = weave.spin 0
  %b = weave.spin 1
  %a1 = weave.apply "h"(%a) : (!weave.strand) -> !weave.strand
  %0:2 = weave.apply "cx"(%x, %x, %a1, %x, %b)
      : (f64, f64, !weave.strand, f64, !weave.strand) -> (!weave.strand, !weave.strand)
  %1:2 = weave.apply "cx"(%0#1, %x, %0#0)
      : (!weave.strand, f64, !weave.strand) -> (!weave.strand, !weave.strand)
  %m, %c = weave.look %1#0
  %d = weave.fresh %1#1
  return
}

//--- schedule.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.site 1
  lull.coupler 0, 1
}
// CHECK: func.func @f(%[[A:.*]]: !weave.strand {{.*}}, %[[B:.*]]: !weave.strand
// CHECK: %[[A1:.*]] = weave.apply "h"(%[[A]])
// CHECK: %[[B1:.*]] = weave.apply "x"(%[[B]])
// CHECK: %[[A2:.*]] = lull.idle %[[A1]] : !weave.strand -> !weave.strand for 480 dt live
// CHECK: %[[AB:.*]]:2 = weave.apply "cx"(%[[A2]], %[[B1]])
// CHECK: %[[B2:.*]] = weave.apply "h"(%[[AB]]#1)
// CHECK: %[[A3:.*]] = lull.idle %[[AB]]#0 : !weave.strand -> !weave.strand for 20 dt live
// CHECK-NEXT: return %[[B2]], %[[A3]] :
// ALAP: func.func @f(%[[A:.*]]: !weave.strand {{.*}}, %[[B:.*]]: !weave.strand
// ALAP: %[[A1:.*]] = lull.idle %[[A]] : !weave.strand -> !weave.strand for 480 dt live
// ALAP: %[[A2:.*]] = weave.apply "h"(%[[A1]])
// ALAP: %[[B1:.*]] = weave.apply "x"(%[[B]])
// ALAP: weave.apply "cx"(%[[A2]], %[[B1]])
func.func @f(%a: !weave.strand {lull.site = 0 : i64},
             %b: !weave.strand {lull.site = 1 : i64})
    -> (!weave.strand, !weave.strand) attributes {lull.device = @bench} {
  %a1 = weave.apply "h"(%a) lasts <20 dt> : (!weave.strand) -> !weave.strand
  %b1 = weave.apply "x"(%b) lasts <500 dt> : (!weave.strand) -> !weave.strand
  %0:2 = weave.apply "cx"(%a1, %b1) lasts <300 dt> {lull.protect = "hahn"}
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  %b2 = weave.apply "h"(%0#1) lasts <20 dt> : (!weave.strand) -> !weave.strand
  return %b2, %0#0 : !weave.strand, !weave.strand
}

//--- assign.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
}
// CHECK: %[[A1:.*]] = lull.idle %arg0 : !weave.strand -> !weave.strand for 100 dt live plan "hahn"
// CHECK: %[[A2:.*]] = lull.idle %[[A1]] : !weave.strand -> !weave.strand for 200 dt basis{{$}}
// CHECK: return %[[A2]]
func.func @f(%a: !weave.strand {lull.site = 0 : i64}) -> !weave.strand
    attributes {lull.device = @bench} {
  %a1 = lull.idle %a : !weave.strand -> !weave.strand for 100 dt live
  %a2 = lull.idle %a1 : !weave.strand -> !weave.strand for 200 dt basis
  return %a2 : !weave.strand
}

//--- emit.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
}
// CHECK: %[[A1:.*]] = lull.delay %arg0 : !weave.strand -> !weave.strand for 40 dt
// CHECK-NEXT: %[[A2:.*]] = lull.pulse %[[A1]] : !weave.strand -> !weave.strand about 0 pi for 20 dt{{$}}
// CHECK-NEXT: %[[A3:.*]] = lull.delay %[[A2]] : !weave.strand -> !weave.strand for 80 dt
// CHECK-NEXT: %[[A4:.*]] = lull.pulse %[[A3]] : !weave.strand -> !weave.strand about 0 pi for 20 dt last
// CHECK-NEXT: %[[A5:.*]] = lull.delay %[[A4]] : !weave.strand -> !weave.strand for 40 dt
// CHECK-NEXT: %[[A6:.*]] = weave.apply "h"(%[[A5]])
// CHECK-NEXT: return %[[A6]]
func.func @f(%a: !weave.strand {lull.site = 0 : i64}) -> !weave.strand
    attributes {lull.device = @bench} {
  %a1 = lull.idle %a : !weave.strand -> !weave.strand for 200 dt live plan "cpmg-2"
  %a2 = weave.apply "h"(%a1) lasts <20 dt> : (!weave.strand) -> !weave.strand
  return %a2 : !weave.strand
}

//--- native.mlir
lull.device @bench clock 1 ns {
  lull.site 0
  lull.operation x for 20 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}
// A frame that is left open is closed before the next operation, on the value
// that this operation takes.
// CHECK: %[[DOWN:.*]] = arith.constant -1.5707963267948966 : f64
// CHECK-NEXT: %[[A1:.*]] = weave.apply "rz"(%[[DOWN]], %arg0) lasts <0 dt>
// CHECK-NEXT: %[[A2:.*]] = weave.apply "x"(%[[A1]]) lasts <20 dt>
// CHECK-NEXT: %[[A3:.*]] = lull.delay %[[A2]] :
// CHECK-NEXT: %[[A4:.*]] = weave.apply "x"(%[[A3]]) lasts <20 dt>
// CHECK-NEXT: %[[UP:.*]] = arith.constant 1.5707963267948966 : f64
// CHECK-NEXT: %[[A5:.*]] = weave.apply "rz"(%[[UP]], %[[A4]]) lasts <0 dt>
// CHECK-NEXT: %[[A6:.*]] = weave.apply "h"(%[[A5]])
// CHECK-NEXT: return %[[A6]]
func.func @f(%a: !weave.strand {lull.site = 0 : i64}) -> !weave.strand
    attributes {lull.device = @bench} {
  %a1 = lull.pulse %a : !weave.strand -> !weave.strand about 1/2 pi for 20 dt
  %a2 = lull.delay %a1 : !weave.strand -> !weave.strand for 5 dt
  %a3 = lull.pulse %a2 : !weave.strand -> !weave.strand about 1/2 pi for 20 dt
  %a4 = weave.apply "h"(%a3) lasts <20 dt> : (!weave.strand) -> !weave.strand
  return %a4 : !weave.strand
}
