// RUN: lull-opt %s --lull-emit | FileCheck %s
// RUN: lull-opt %s --lull-emit --remarks-filter=lull-emit 2>&1 | FileCheck %s --check-prefix=REMARK
// RUN: lull-opt %s --lull-emit --lull-native -o %t.two
// RUN: lull-opt %s --lull-emit=native -o %t.one
// RUN: diff %t.two %t.one

lull.device @line clock 1 ns step 16 dt {
  lull.site 0
  lull.operation x for 32 dt native plays rotation(1 pi, 0 pi)
  lull.operation rz for 0 dt native plays frame
}

// XY8 in 1024 dt with pulses of 32 dt on a grid of 16 dt: starts 48 + 128 k, no
// residual (a window that is a multiple of twice the grid keeps its balance).
// CHECK-LABEL: @xy8
// CHECK:      lull.delay %q0 for 48 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 1/2 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 1/2 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 1/2 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 1/2 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 96 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt last
// CHECK-NEXT: lull.delay %q0 for 48 dt
// CHECK-NEXT: return
// REMARK: Protected {{.*}}window of 1024 dt (1024 ns) on site 0 protected by xy8: 8 pulses, residual 0 dt
func.func @xy8() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.idle %q0 for 1024 dt live plan "xy8"
  return
}

// An odd number of pulses is closed by one more at the end; all pulses then end
// at their instants, T/2 and T, which leaves no residual.
// CHECK-LABEL: @hahn
// CHECK:      lull.delay %q0 for 480 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt{{$}}
// CHECK-NEXT: lull.delay %q0 for 480 dt
// CHECK-NEXT: lull.pulse %q0 about 0 pi for 32 dt last
// CHECK-NEXT: return
func.func @hahn() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.idle %q0 for 1024 dt live plan "hahn"
  return
}

// The grid is absolute: behind a gate of 20 dt the first slot is 12 dt into the
// window. 1000 is no multiple of 32, so a residual of 8 dt must stay.
// CHECK-LABEL: @off_grid
// CHECK: lull.delay %q0 for [[#%d,FIRST:]] dt
// CHECK-NEXT: lull.pulse
// REMARK: protected by cpmg-2: 2 pulses, residual {{-?}}8 dt
func.func @off_grid() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.gate x %q0 for 20 dt
  lull.idle %q0 for 1000 dt live plan "cpmg-2"
  return
}

// A window without a plan stays.
// CHECK-LABEL: @left
// CHECK: lull.idle %q0 for 1000 dt live
func.func @left() attributes {lull.device = @line} {
  %q0 = lull.qubit 0
  lull.idle %q0 for 1000 dt live
  return
}
