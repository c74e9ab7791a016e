// RUN: lull-opt %s --split-input-file | FileCheck %s
// RUN: lull-opt %s --split-input-file | lull-opt --split-input-file \
// RUN:   | FileCheck %s
// RUN: lull-opt %s --split-input-file --mlir-print-op-generic \
// RUN:   | lull-opt --split-input-file | FileCheck %s
// RUN: lull-opt %s --split-input-file --verify-roundtrip -o /dev/null

// Devices and sequences in every form of their assembly.

// CHECK: lull.device @empty clock 1 ns {
// CHECK-NEXT: }
lull.device @empty clock 1 ns {
}

// -----

// CHECK: lull.device @grid clock 2/9 ns step 8 dt gap 0.002 us
lull.device @grid clock 4/18 ns step 8 dt gap 0.002 us attributes {note = "x"} {
}

// -----

// A grid in other units; the fraction is kept in lowest terms.
// CHECK: lull.device @units clock 1/2 us step 1.5 us gap 2 us
lull.device @units clock 50/100 us step 1.5 us gap 2.0 us {
  // CHECK-NEXT: lull.site 0{{$}}
  lull.site 0
  // CHECK-NEXT: lull.site 4294967295 t1 80 us
  lull.site 4294967295 t1 80 us
  // CHECK-NEXT: lull.site 2 ramsey 40.5 us
  lull.site 2 ramsey 40.5 us
  // CHECK-NEXT: lull.site 3 echo 90 us
  lull.site 3 echo 90 us
  // CHECK-NEXT: lull.site 4 error 1.0e-05
  lull.site 4 error 1.0e-5
  // CHECK-NEXT: lull.site 5 t1 1 s ramsey 2 ms echo 3 us error 0.0
  lull.site 5 t1 1 s ramsey 2 ms echo 3 us error 0.0
  // CHECK-NEXT: lull.coupler 5, 4{{$}}
  lull.coupler 5, 4
  // CHECK-NEXT: lull.coupler 4, 3 zz 45.0
  lull.coupler 4, 3 zz 45.0
  // CHECK-NEXT: lull.coupler 2, 3 zz -0.5
  lull.coupler 2, 3 zz -0.5
  // CHECK-NEXT: lull.operation h for 1 us
  lull.operation h for 1 us
  // CHECK-NEXT: lull.operation x for 2 dt native plays rotation(1 pi, 0 pi) error 0.0001
  lull.operation x for 2 dt native plays rotation(1 pi, 0 pi) error 1.0e-4
  // A turn the other way round is the same about the opposite axis.
  // CHECK-NEXT: lull.operation minus for 2 dt plays rotation(1 pi, 1 pi)
  lull.operation minus for 2 dt plays rotation(-1 pi, 0 pi)
  // CHECK-NEXT: lull.operation sy for 2 dt native plays rotation(1/2 pi, 1/2 pi)
  lull.operation sy for 2 dt native plays rotation(1/2 pi, 5/2 pi)
  // CHECK-NEXT: lull.operation r for 2 dt native plays equatorial
  lull.operation r for 2 dt native plays equatorial
  // CHECK-NEXT: lull.operation rz for 0 dt native plays frame
  lull.operation rz for 0 dt native plays frame
  // CHECK-NEXT: lull.operation "my op" on 0, 2 for 4 dt
  lull.operation "my op" on 0, (2) for 4 dt
  // CHECK-NEXT: lull.operation swap on any pair for 5 us
  lull.operation swap on any pair for 5 us
  // CHECK-NEXT: lull.operation iswap on any pair for 5 us
  lull.operation iswap on any 2 for 5 us
  // CHECK-NEXT: lull.operation ccz on any 3 for 6 us
  lull.operation ccz on any 3 for 6 us
  // CHECK-NEXT: lull.operation id for 1 dt
  lull.operation id on any 1 for 1 dt
  // CHECK-NEXT: lull.operation cx on (5, 4), (4, 3) for 5 us error 0.007 echo 1/2
  lull.operation cx on (5, 4), (4, 3) for 5 us error 7.0e-3 echo 2/4
  // CHECK-NEXT: lull.operation cz on (4, 3) symmetric for 5 us native echo 1/3
  lull.operation cz on (4, 3) symmetric for 5 us native echo 1/3
  // CHECK-NEXT: lull.operation ccx on (2, 3, 4) for 7 us
  lull.operation ccx on (2, 3, 4) for 7 us
}

// -----

// CHECK: lull.sequence @mine phases [0, 1/2, 0, 1/2] at [1/8, 3/8, 5/8, 7/8]
lull.sequence @mine phases [0, 1/2, 0/3, 2/4] at [1/8, 3/8, 5/8, 7/8]
// Phases are kept as they were written, instants may be equal.
// CHECK-NEXT: lull.sequence @equal phases [-1/2, 7/2] at [0, 0]
lull.sequence @equal phases [-1/2, 7/2] at [0, 0]
// CHECK-NEXT: lull.sequence @odd phases [0, 0, 0] at uhrig closed
lull.sequence @odd phases [0, 0, 0] at uhrig closed
// CHECK-NEXT: lull.sequence @hidden phases [0, 0] at trailing {sym_visibility = "private"}
lull.sequence @hidden phases [0, 0] at trailing {sym_visibility = "private"}

// -----

// The dialect's attributes anywhere.
// CHECK: #lull.action<equatorial>
// CHECK-SAME: #lull.action<frame>
// CHECK-SAME: #lull.action<rotation(1/2 pi, 3/2 pi)>
// CHECK-SAME: #lull.clock<2/9 ns>
// CHECK-SAME: #lull.duration<35.5 ns>
// CHECK-SAME: #lull.fraction<-1/2>
// CHECK-SAME: #lull.plan<"xy8" repeats 2>
// CHECK-SAME: #lull.state<basis>
func.func private @attributes() attributes {
  a = #lull.action<equatorial>, b = #lull.action<frame>,
  c = #lull.action<rotation(-1/2 pi, 1/2 pi)>, d = #lull.clock<2/9 ns>,
  e = #lull.duration<35.50 ns>, f = #lull.fraction<-2/4>,
  g = #lull.plan<"xy8" repeats 2>, h = #lull.state<basis>
}
