// barley: five superconducting-style qubits on a line (invented).

lull.device @barley clock 2/9 ns step 8 dt {
  lull.site 0 t1 131 us ramsey 34 us echo 99 us error 1.8e-4
  lull.site 1 t1 99 us ramsey 59 us echo 105 us error 2.6e-4
  lull.site 2 t1 97 us ramsey 57 us echo 110 us error 1.8e-4
  lull.site 3 t1 101 us ramsey 52 us echo 118 us error 1.8e-4
  lull.site 4 t1 120 us ramsey 30 us echo 105 us error 3.1e-4

  lull.coupler 0, 1 zz 38.0
  lull.coupler 1, 2 zz 52.5
  lull.coupler 2, 3 zz 44.0
  lull.coupler 3, 4 zz 61.5

  // Pulses and frame changes.
  lull.operation x for 160 dt native plays rotation(1 pi, 0 pi) error 2.4e-4
  lull.operation sx for 160 dt native plays rotation(1/2 pi, 0 pi) error 2.4e-4
  lull.operation rz for 0 dt native plays frame

  // Gates that are made of those further down.
  lull.operation id for 160 dt
  lull.operation h for 160 dt
  lull.operation y for 160 dt
  lull.operation ry for 320 dt
  lull.operation rx for 320 dt
  lull.operation u2 for 160 dt
  lull.operation u3 for 320 dt
  lull.operation z for 0 dt
  lull.operation s for 0 dt
  lull.operation sdg for 0 dt
  lull.operation t for 0 dt
  lull.operation tdg for 0 dt
  lull.operation p for 0 dt

  // Two-qubit gates flip their control half way.
  lull.operation cx on (0, 1) for 1584 dt native error 6.1e-3 echo 1/2
  lull.operation cx on (1, 2) for 1696 dt native error 8.8e-3 echo 1/2
  lull.operation cx on (2, 3) for 1504 dt native error 6.1e-3 echo 1/2
  lull.operation cx on (3, 4) for 1824 dt native error 6.1e-3 echo 1/2
  lull.operation cx on (1, 0) for 1744 dt error 9.1e-3 echo 1/2
  lull.operation cx on (2, 1) for 1856 dt error 9.1e-3 echo 1/2
  lull.operation cx on (3, 2) for 1664 dt error 9.1e-3 echo 1/2
  lull.operation cx on (4, 3) for 1984 dt error 6.4e-3 echo 1/2
  lull.operation cz on (0, 1) symmetric for 1904 dt error 9.5e-3
  lull.operation cz on (1, 2) symmetric for 2016 dt error 9.5e-3
  lull.operation cz on (2, 3) symmetric for 1824 dt error 8.3e-3
  lull.operation cz on (3, 4) symmetric for 2144 dt error 6.8e-3

  lull.operation measure for 4000 dt native error 1.2e-2
  lull.operation reset for 4800 dt native
}
