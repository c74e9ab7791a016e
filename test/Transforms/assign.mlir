// RUN: lull-opt %s --lull-assign="sequence=xy4" | FileCheck %s
// RUN: lull-opt %s --lull-assign="sequence=xy4 repeats=2 alternating" | FileCheck %s --check-prefix=TWICE
// RUN: lull-opt %s --lull-assign="sequence=xy4 spacing='300 ns'" | FileCheck %s --check-prefix=SPACING
// RUN: lull-opt %s --lull-assign="sequence=xy4 also-basis also-spent" | FileCheck %s --check-prefix=ALSO
// RUN: lull-opt %s --lull-assign="sequence=xy4 least-window='3 us'" | FileCheck %s --check-prefix=LEAST
// RUN: lull-opt %s --lull-assign="sequence=@two" | FileCheck %s --check-prefix=USER
// RUN: lull-opt %s --lull-assign | FileCheck %s --check-prefix=WISHES
// RUN: lull-opt %s --lull-assign="sequence=xy4" --remarks-filter=lull-assign 2>&1 | FileCheck %s --check-prefix=REMARK

lull.device @line clock 1 ns step 4 dt {
  lull.site 0
  lull.site 1
  lull.operation x for 40 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}

lull.sequence @two phases [0, 1] at [1/4, 3/4]

// CHECK-LABEL: @windows
// TWICE-LABEL: @windows
// SPACING-LABEL: @windows
// ALSO-LABEL: @windows
// LEAST-LABEL: @windows
// USER-LABEL: @windows
// WISHES-LABEL: @windows
func.func @windows() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  // CHECK: lull.idle %q0 for 2000 dt live plan "xy4"{{$}}
  // TWICE: lull.idle %q0 for 2000 dt live plan "xy4" repeats 2 alternating
  // SPACING: lull.idle %q0 for 2000 dt live plan "xy4"{{$}}
  // LEAST: lull.idle %q0 for 2000 dt live{{$}}
  // USER: lull.idle %q0 for 2000 dt live plan @two
  // WISHES: lull.idle %q0 for 2000 dt live{{$}}
  lull.idle %q0 for 2000 dt live
  // 4000 / (4 x 300) is 3.33: three repeats keep pulses 333 ns apart.
  // SPACING: lull.idle %q0 for 4000 dt live plan "xy4" repeats 3
  // LEAST: lull.idle %q0 for 4000 dt live plan "xy4"
  lull.idle %q0 for 4000 dt live
  // CHECK: lull.idle %q0 for 2000 dt basis{{$}}
  // ALSO: lull.idle %q0 for 2000 dt basis plan "xy4"
  // REMARK: Left {{.*}}window of 2000 dt (2000 ns) on site 0 left: the qubit is in a basis state, which pulses would harm
  lull.idle %q0 for 2000 dt basis
  // CHECK: lull.idle %q0 for 2000 dt spent{{$}}
  // ALSO: lull.idle %q0 for 2000 dt spent plan "xy4"
  // REMARK: Left {{.*}}left: the qubit is only measured or reset from here on
  lull.idle %q0 for 2000 dt spent
  // Four pulses of 40 dt need 160 dt.
  // CHECK: lull.idle %q0 for 156 dt live{{$}}
  // REMARK: Left {{.*}}window of 156 dt (156 ns) on site 0 left: xy4 needs 160 dt (160 ns)
  lull.idle %q0 for 156 dt live
  // CHECK: lull.idle %q0 for 160 dt live plan "xy4"
  lull.idle %q0 for 160 dt live
  // Wishes and plans of the program's own go first.
  // CHECK: lull.idle %q0 for 2000 dt live {lull.protect = "none"}
  // REMARK: Left {{.*}}left: the program asks for it
  lull.idle %q0 for 2000 dt live {lull.protect = "none"}
  // CHECK: lull.idle %q0 for 2000 dt live plan "cpmg-2" {lull.protect = "cpmg-2"}
  // WISHES: lull.idle %q0 for 2000 dt live plan "cpmg-2" {lull.protect = "cpmg-2"}
  lull.idle %q0 for 2000 dt live {lull.protect = "cpmg-2"}
  // CHECK: lull.idle %q0 for 2000 dt live plan @two {lull.protect = @two}
  lull.idle %q0 for 2000 dt live {lull.protect = @two}
  // CHECK: lull.idle %q0 for 2000 dt basis plan "hahn" repeats 3
  lull.idle %q0 for 2000 dt basis {lull.protect = #lull.plan<"hahn" repeats 3>}
  // CHECK: lull.idle %q0 for 2000 dt live plan "udd-4"
  // TWICE: lull.idle %q0 for 2000 dt live plan "udd-4"{{$}}
  lull.idle %q0 for 2000 dt live plan "udd-4"
  return
}

// A spacing that one repeat cannot keep leaves the window, and so does one that
// asks for more pulses than any sequence has.
// RUN: lull-opt %s --lull-assign="sequence=cpmg-64 spacing='288230376151711744 dt'" --remarks-filter=lull-assign 2>&1 | FileCheck %s --check-prefix=FAR
// RUN: lull-opt %s --lull-assign="sequence=cpmg-1 spacing='1 dt'" --remarks-filter=lull-assign 2>&1 | FileCheck %s --check-prefix=CLOSE
// FAR: Left {{.*}}left: one repeat of cpmg-64 has its 64 pulses less than 288230376151711744 dt (288230376151711744 ns) apart on average
// CLOSE: Left {{.*}}left: a spacing of 1 dt (1 ns) asks for 17179869184 repeats of cpmg-1, more than 10000 pulses
func.func @long() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.idle %q0 for 17179869184 dt live
  return
}

// The wish on what ends a wait is for that wait, on the terminator for the waits
// that last to the end; the wish on an idle itself goes first.
// CHECK-LABEL: @ends
func.func @ends() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  // CHECK: lull.idle %q0 for 2000 dt live plan "xy4"{{$}}
  // WISHES: @ends
  // WISHES: lull.idle %q0 for 2000 dt live{{$}}
  lull.idle %q0 for 2000 dt live
  // WISHES: lull.idle %q0 for 2000 dt live plan "cpmg-2"
  lull.idle %q0 for 2000 dt live
  lull.gate x %q0 for 40 dt {lull.protect = "cpmg-2"}
  // WISHES: lull.idle %q1 for 2000 dt live plan "hahn" {lull.protect = "hahn"}
  lull.idle %q1 for 2000 dt live {lull.protect = "hahn"}
  lull.gate x %q1 for 40 dt {lull.protect = "none"}
  // WISHES: lull.idle %q1 for 2000 dt live plan @two
  lull.idle %q1 for 2000 dt live
  return {lull.protect = @two}
}
