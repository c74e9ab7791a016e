// The whole pipeline on a dialect with value semantics: every qubit is handed
// from operation to operation, through what Lull puts in.
// RUN: lull-host-opt %s --lull-protect=device=barley | FileCheck %s
// RUN: lull-host-opt %s --lull-protect=device=barley -o %t.once
// RUN: lull-host-opt %t.once --lull-protect=device=barley -o %t.twice
// RUN: diff %t.once %t.twice

// Each pass alone, one after the other, gives the same.
// RUN: lull-host-opt %s --lull-use-device=name=barley \
// RUN:   | lull-host-opt --lull-set-durations | lull-host-opt --lull-schedule \
// RUN:   | lull-host-opt --lull-assign=sequence=xy4 | lull-host-opt --lull-emit \
// RUN:   | lull-host-opt --lull-native -o %t.steps
// RUN: diff %t.once %t.steps

// What is left of Lull is what the default builders make.
// RUN: FileCheck %s --check-prefix=ONLY < %t.once
// ONLY: weave.spin
// ONLY-NOT: {{lull\.(gate|pulse|measure|reset|barrier|qubit)}}
// ONLY: return

// CHECK-LABEL: func.func @parity(
// CHECK-SAME: %[[SCALE:[a-z0-9]*]]: f64, %[[C0:[a-z0-9]*]]: !weave.strand {lull.site = 2 : i64})
// CHECK: %[[A0:.*]] = weave.spin 0
// CHECK: %[[B0:.*]] = weave.spin 1
// CHECK: %[[HALF:.*]] = arith.constant 5.000000e-01 : f64
// CHECK: %[[A1:.*]] = weave.apply "h"(%[[A0]]) lasts <160 dt>
// CHECK: %[[B1:.*]] = weave.apply "rz"(%[[HALF]], %[[B0]]) lasts <0 dt>
// CHECK: %[[B2:.*]] = lull.idle %[[B1]] : !weave.strand -> !weave.strand for 160 dt basis
// CHECK: %[[AB:.*]]:2 = weave.apply "cx"(%[[SCALE]], %[[A1]], %[[HALF]], %[[B2]]) lasts <1584 dt>
// CHECK: %[[TWICE:.*]] = arith.addf %[[SCALE]], %[[SCALE]] : f64
// Site 2 is handed in, so it may hold a state: its wait is protected.
// CHECK: lull.delay %[[C0]] :
// CHECK: %[[CB:.*]]:2 = weave.apply "cx"(%{{.*}}, %[[TWICE]], %[[AB]]#1) lasts <1856 dt>
// CHECK: %[[C2:.*]] = lull.delay %[[CB]]#0 : !weave.strand -> !weave.strand for 96 dt
// CHECK: %[[BIT:.*]], %[[B3:.*]] = weave.look %[[CB]]#1 lasts <4000 dt>

// The window of 5856 dt on site 0.
// CHECK-NEXT: %[[W0:.*]] = lull.delay %[[AB]]#0 :
// CHECK-NEXT: %[[W1:.*]] = weave.apply "x"(%[[W0]]) lasts <160 dt>
// CHECK-NEXT: %[[W2:.*]] = lull.delay %[[W1]] :
// CHECK-NEXT: %[[MINUS:.*]] = arith.constant -1.5707963267948966 : f64
// CHECK-NEXT: %[[W3:.*]] = weave.apply "rz"(%[[MINUS]], %[[W2]]) lasts <0 dt>
// CHECK-NEXT: %[[W4:.*]] = weave.apply "x"(%[[W3]]) lasts <160 dt>
// CHECK-NEXT: %[[W5:.*]] = lull.delay %[[W4]] :
// CHECK: %[[W6:.*]] = weave.apply "rz"({{.*}}, %[[W5]]) lasts <0 dt>
// CHECK-NEXT: %[[W7:.*]] = weave.apply "x"(%[[W6]]) lasts <160 dt>
// CHECK-NEXT: %[[W8:.*]] = lull.delay %[[W7]] :
// CHECK: %[[W9:.*]] = weave.apply "rz"({{.*}}, %[[W8]]) lasts <0 dt>
// CHECK-NEXT: %[[W10:.*]] = weave.apply "x"(%[[W9]]) lasts <160 dt>
// CHECK: %[[W11:.*]] = weave.apply "rz"({{.*}}, %[[W10]]) lasts <0 dt>
// CHECK-NEXT: %[[W12:.*]] = lull.delay %[[W11]] :
// CHECK-NEXT: %[[K:.*]]:2 = weave.knot %[[W12]], %[[B3]] :
// CHECK-NEXT: %[[A2:.*]] = weave.apply "x"(%[[K]]#0) lasts <160 dt>
// CHECK-NEXT: weave.fresh %[[K]]#1 lasts <4800 dt>

// The trailing windows stand before the terminator, which returns what comes
// out of them.
// CHECK: lull.delay %[[A2]] :
// CHECK: %[[A3:.*]] = lull.delay %{{.*}} for 496 dt
// CHECK-NEXT: lull.delay %[[C2]] :
// CHECK: return %{{.*}}, %[[BIT]], %[[A3]] : !weave.strand, i1, !weave.strand
func.func @parity(%scale: f64, %c0: !weave.strand {lull.site = 2 : i64})
    -> (!weave.strand, i1, !weave.strand) {
  %a0 = weave.spin 0
  %b0 = weave.spin 1
  %half = arith.constant 0.5 : f64
  %a1 = weave.apply "h"(%a0) : (!weave.strand) -> !weave.strand
  %b1 = weave.apply "rz"(%half, %b0) : (f64, !weave.strand) -> !weave.strand
  %a2, %b2 = weave.apply "cx"(%scale, %a1, %half, %b1)
      : (f64, !weave.strand, f64, !weave.strand) -> (!weave.strand, !weave.strand)
  %twice = arith.addf %scale, %scale : f64
  %c1, %b3 = weave.apply "cx"(%c0, %twice, %b2)
      : (!weave.strand, f64, !weave.strand) -> (!weave.strand, !weave.strand)
  %c2 = lull.delay %c1 : !weave.strand -> !weave.strand for 96 dt
  %m, %b4 = weave.look %b3
  %a3, %b5 = weave.knot %a2, %b4
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  %a4 = weave.apply "x"(%a3) : (!weave.strand) -> !weave.strand
  %b6 = weave.fresh %b5
  return %c2, %m, %a4 : !weave.strand, i1, !weave.strand
}
