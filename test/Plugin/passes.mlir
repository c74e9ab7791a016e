// Each pass and the pipeline in a stock mlir-opt that loads the plugin: byte for
// byte what lull-opt writes, errors and remarks included.
// UNSUPPORTED: sanitizers

// RUN: mlir-opt %plugin_flags %s -o %t.stock
// RUN: lull-opt %s -o %t.own
// RUN: diff %t.own %t.stock

// RUN: mlir-opt %plugin_flags %s --pass-pipeline='builtin.module(lull-use-device{name=barley})' -o %t.stock
// RUN: lull-opt %s --lull-use-device=name=barley -o %t.device
// RUN: diff %t.device %t.stock

// RUN: mlir-opt %plugin_flags %t.device --pass-pipeline='builtin.module(lull-set-durations)' -o %t.stock
// RUN: lull-opt %t.device --lull-set-durations -o %t.durations
// RUN: diff %t.durations %t.stock

// RUN: mlir-opt %plugin_flags %t.durations --pass-pipeline='builtin.module(lull-schedule{policy=alap})' -o %t.stock
// RUN: lull-opt %t.durations --lull-schedule=policy=alap -o %t.schedule
// RUN: diff %t.schedule %t.stock

// RUN: mlir-opt %plugin_flags %t.schedule --pass-pipeline='builtin.module(lull-assign{sequence=xy8 spacing={50 ns}})' -o %t.stock
// RUN: lull-opt %t.schedule --lull-assign="sequence=xy8 spacing={50 ns}" -o %t.assign
// RUN: diff %t.assign %t.stock
// RUN: FileCheck %s --check-prefix=ASSIGN < %t.stock

// RUN: mlir-opt %plugin_flags %t.assign --pass-pipeline='builtin.module(lull-emit)' -o %t.stock
// RUN: lull-opt %t.assign --lull-emit -o %t.emit
// RUN: diff %t.emit %t.stock

// RUN: mlir-opt %plugin_flags %t.emit --pass-pipeline='builtin.module(lull-native)' -o %t.stock
// RUN: lull-opt %t.emit --lull-native -o %t.native
// RUN: diff %t.native %t.stock

// RUN: mlir-opt %plugin_flags %s --remarks-filter='lull-.*' -o %t.stock \
// RUN:   --pass-pipeline='builtin.module(lull-protect{device=barley policy=alap sequence=xy8 spacing={50 ns}})' 2> %t.stock.remarks
// RUN: lull-opt %s --remarks-filter='lull-.*' -o %t.own \
// RUN:   --pass-pipeline='builtin.module(lull-protect{device=barley policy=alap sequence=xy8 spacing={50 ns}})' 2> %t.own.remarks
// RUN: diff %t.own %t.stock
// RUN: diff %t.own.remarks %t.stock.remarks
// RUN: FileCheck %s --check-prefix=REMARKS < %t.stock.remarks
// RUN: diff %t.native %t.own

// Bytecode written by one is read by the other.
// RUN: mlir-opt %plugin_flags %t.assign --emit-bytecode -o %t.stock.bc
// RUN: lull-opt %t.assign --emit-bytecode -o %t.own.bc
// RUN: cmp %t.stock.bc %t.own.bc
// RUN: lull-opt %t.stock.bc | diff %t.assign -
// RUN: mlir-opt %plugin_flags %t.own.bc | diff %t.assign -

// ASSIGN: lull.idle %q0 for 5856 dt live plan "xy8" repeats 3
// REMARKS: remark: {{.*}}window of 5856 dt {{.*}} protected by
func.func @parity() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  %q2 = lull.qubit 2
  lull.gate h %q0
  lull.gate rz(1/2 pi) %q1
  lull.gate cx %q0, %q1
  lull.gate cx %q2, %q1
  %m = lull.measure %q1
  lull.barrier %q0, %q1
  return
}
