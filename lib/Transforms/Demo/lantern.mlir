// lantern: eight ion-style qubits, every pair coupled (invented).

lull.device @lantern clock 10 ns step 2 dt {
  lull.site 0 t1 60 s ramsey 567 ms echo 6 s error 6.0e-5
  lull.site 1 t1 40 s ramsey 664 ms echo 3 s error 8.0e-5
  lull.site 2 t1 60 s ramsey 814 ms echo 4 s error 8.0e-5
  lull.site 3 t1 40 s ramsey 499 ms echo 3 s error 6.0e-5
  lull.site 4 t1 60 s ramsey 532 ms echo 3 s error 8.0e-5
  lull.site 5 t1 50 s ramsey 664 ms echo 2 s error 4.0e-5
  lull.site 6 t1 50 s ramsey 783 ms echo 4 s error 4.0e-5
  lull.site 7 t1 60 s ramsey 652 ms echo 5 s error 8.0e-5

  lull.coupler 0, 1
  lull.coupler 0, 2
  lull.coupler 0, 3
  lull.coupler 0, 4
  lull.coupler 0, 5
  lull.coupler 0, 6
  lull.coupler 0, 7
  lull.coupler 1, 2
  lull.coupler 1, 3
  lull.coupler 1, 4
  lull.coupler 1, 5
  lull.coupler 1, 6
  lull.coupler 1, 7
  lull.coupler 2, 3
  lull.coupler 2, 4
  lull.coupler 2, 5
  lull.coupler 2, 6
  lull.coupler 2, 7
  lull.coupler 3, 4
  lull.coupler 3, 5
  lull.coupler 3, 6
  lull.coupler 3, 7
  lull.coupler 4, 5
  lull.coupler 4, 6
  lull.coupler 4, 7
  lull.coupler 5, 6
  lull.coupler 5, 7
  lull.coupler 6, 7

  // A general rotation about any axis of the equator: r(turn, phase).
  lull.operation r for 10 us native plays equatorial error 6.0e-5
  lull.operation rz for 0 dt native plays frame
  lull.operation id for 10 us
  lull.operation x for 10 us
  lull.operation y for 10 us
  lull.operation h for 10 us
  lull.operation sx for 10 us
  lull.operation rx for 10 us
  lull.operation ry for 10 us
  lull.operation u2 for 10 us
  lull.operation u3 for 20 us
  lull.operation z for 0 dt
  lull.operation s for 0 dt
  lull.operation sdg for 0 dt
  lull.operation t for 0 dt
  lull.operation tdg for 0 dt
  lull.operation p for 0 dt

  lull.operation rxx on any pair for 200 us native error 3.0e-3
  lull.operation cx on any pair for 220 us error 3.2e-3
  lull.operation cz on any pair for 220 us error 3.2e-3

  lull.operation measure for 150 us native error 2.0e-3
  lull.operation reset for 60 us native
}
