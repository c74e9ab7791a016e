// One circuit in three dialects has one timeline, before and after protection:
// timeline.py reads each output by itself, from the text, and compares.
// RUN: split-file %s %t
// RUN: lull-host-opt %t/lull.mlir --lull-protect=device=barley -o %t/lull.out
// RUN: lull-host-opt %t/mill.mlir --lull-protect=device=barley -o %t/mill.out
// RUN: lull-host-opt %t/weave.mlir --lull-protect=device=barley -o %t/weave.out
// RUN: %python %S/timeline.py %t/lull.out %t/mill.out %t/weave.out | FileCheck %s

// RUN: lull-host-opt %t/lull.mlir --lull-protect="device=barley policy=alap sequence=cpmg-2 repeats=2" -o %t/lull.alap
// RUN: lull-host-opt %t/mill.mlir --lull-protect="device=barley policy=alap sequence=cpmg-2 repeats=2" -o %t/mill.alap
// RUN: lull-host-opt %t/weave.mlir --lull-protect="device=barley policy=alap sequence=cpmg-2 repeats=2" -o %t/weave.alap
// RUN: %python %S/timeline.py %t/lull.alap %t/mill.alap %t/weave.alap | FileCheck %s --check-prefix=ALAP

// The comparison sees a difference of one dt.
// RUN: sed -e 's/takes 96/takes 97/' %t/mill.out > %t/mill.late
// RUN: not %python %S/timeline.py %t/lull.out %t/mill.late | FileCheck %s --check-prefix=LATE

// The remarks tell the same windows, states, reasons and protection.
// RUN: lull-host-opt %t/lull.mlir --lull-protect=device=barley --remarks-filter=lull-.* -o /dev/null 2>&1 | grep -o 'remark: .*' > %t/lull.remarks
// RUN: lull-host-opt %t/mill.mlir --lull-protect=device=barley --remarks-filter=lull-.* -o /dev/null 2>&1 | grep -o 'remark: .*' > %t/mill.remarks
// RUN: lull-host-opt %t/weave.mlir --lull-protect=device=barley --remarks-filter=lull-.* -o /dev/null 2>&1 | grep -o 'remark: .*' > %t/weave.remarks
// RUN: diff %t/lull.remarks %t/mill.remarks
// RUN: diff %t/lull.remarks %t/weave.remarks
// RUN: FileCheck %s --check-prefix=REMARKS < %t/lull.remarks

// From the device by hand: h 160, cx (0, 1) 1584, cx (2, 1) 1856, measure 4000,
// reset 4800, one after another on site 1.
// CHECK: site 0: h@0+160 cx@160+1584
// CHECK: site 1: idle@0+160 cx@160+1584 cx@1744+1856 measure@3600+4000 barrier@7600+0 reset@7600+4800
// CHECK: site 2: idle@0+1744 cx@1744+1856 delay@3600+96 idle@3696+8704
// CHECK: 3 programs agree
// ALAP: site 0: h@0+160 cx@160+1584 delay@1744+{{.*}} x@
// ALAP: site 2: idle@0+1744 cx@1744+1856 idle@3600+8704 delay@12304+96
// ALAP: 3 programs agree
// LATE: differ
// REMARKS: window of 5856 dt {{.*}} on site 0 protected by xy4

//--- lull.mlir
func.func @parity() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.gate h %q0
  lull.gate rz(0.5) %q1
  lull.gate cx %q0, %q1
  lull.gate cx %q2, %q1
  lull.delay %q2 for 96 dt
  %m = lull.measure %q1
  lull.barrier %q0, %q1
  lull.gate x %q0
  lull.reset %q1
  return
}

//--- mill.mlir
func.func @parity() {
  %q0 = mill.qubit 0
  %q1 = mill.qubit 1
  %q2 = mill.qubit 2
  mill.h %q0
  mill.rz(0.5) %q1
  mill.cnot %q1 if %q0
  mill.cnot %q1 if %q2
  mill.wait %q2 takes 96
  %m = mill.read %q1
  mill.sync %q0, %q1
  mill.x %q0
  mill.prep %q1
  return
}

//--- weave.mlir
func.func @parity() {
  %a0 = weave.spin 0
  %b0 = weave.spin 1
  %c0 = weave.spin 2
  %half = arith.constant 0.5 : f64
  %a1 = weave.apply "h"(%a0) : (!weave.strand) -> !weave.strand
  %b1 = weave.apply "rz"(%half, %b0) : (f64, !weave.strand) -> !weave.strand
  %a2, %b2 = weave.apply "cx"(%a1, %half, %b1)
      : (!weave.strand, f64, !weave.strand) -> (!weave.strand, !weave.strand)
  %c1, %b3 = weave.apply "cx"(%c0, %b2)
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  %c2 = lull.delay %c1 : !weave.strand -> !weave.strand for 96 dt
  %m, %b4 = weave.look %b3
  %a3, %b5 = weave.knot %a2, %b4
      : (!weave.strand, !weave.strand) -> (!weave.strand, !weave.strand)
  %a4 = weave.apply "x"(%a3) : (!weave.strand) -> !weave.strand
  %b6 = weave.fresh %b5
  return
}
