// orchard: 27 superconducting-style qubits on a sparse lattice (invented).

lull.device @orchard clock 2/9 ns step 8 dt {
  lull.site 0 t1 98 us ramsey 22 us echo 69 us error 2.5e-4
  lull.site 1 t1 123 us ramsey 29 us echo 128 us error 1.6e-4
  lull.site 2 t1 143 us ramsey 39 us echo 92 us error 1.6e-4
  lull.site 3 t1 144 us ramsey 56 us echo 110 us error 2.5e-4
  lull.site 4 t1 82 us ramsey 55 us echo 93 us error 4.4e-4
  lull.site 5 t1 77 us ramsey 59 us echo 115 us error 3.2e-4
  lull.site 6 t1 157 us ramsey 54 us echo 138 us error 2.5e-4
  lull.site 7 t1 129 us ramsey 57 us echo 145 us error 2.5e-4
  lull.site 8 t1 108 us ramsey 35 us echo 88 us error 2.0e-4
  lull.site 9 t1 80 us ramsey 56 us echo 124 us error 4.4e-4
  lull.site 10 t1 133 us ramsey 41 us echo 128 us error 2.5e-4
  lull.site 11 t1 147 us ramsey 24 us echo 69 us error 4.4e-4
  lull.site 12 t1 123 us ramsey 30 us echo 103 us error 2.0e-4
  lull.site 13 t1 132 us ramsey 46 us echo 81 us error 1.6e-4
  lull.site 14 t1 167 us ramsey 55 us echo 125 us error 2.5e-4
  lull.site 15 t1 158 us ramsey 42 us echo 135 us error 4.4e-4
  lull.site 16 t1 172 us ramsey 49 us echo 87 us error 1.6e-4
  lull.site 17 t1 104 us ramsey 50 us echo 88 us error 1.6e-4
  lull.site 18 t1 163 us ramsey 64 us echo 133 us error 4.4e-4
  lull.site 19 t1 157 us ramsey 48 us echo 114 us error 3.2e-4
  lull.site 20 t1 155 us ramsey 42 us echo 74 us error 3.2e-4
  lull.site 21 t1 115 us ramsey 30 us echo 74 us error 3.2e-4
  lull.site 22 t1 77 us ramsey 33 us echo 99 us error 2.0e-4
  lull.site 23 t1 164 us ramsey 35 us echo 115 us error 3.2e-4
  lull.site 24 t1 133 us ramsey 25 us echo 76 us error 3.2e-4
  lull.site 25 t1 121 us ramsey 55 us echo 120 us error 2.0e-4
  lull.site 26 t1 174 us ramsey 47 us echo 147 us error 2.5e-4

  lull.coupler 0, 1 zz 78.0
  lull.coupler 1, 2 zz 70.5
  lull.coupler 2, 3 zz 73.5
  lull.coupler 3, 4 zz 54.5
  lull.coupler 4, 5 zz 44.0
  lull.coupler 5, 6 zz 35.5
  lull.coupler 9, 10 zz 47.5
  lull.coupler 10, 11 zz 44.0
  lull.coupler 11, 12 zz 54.5
  lull.coupler 12, 13 zz 54.5
  lull.coupler 13, 14 zz 26.5
  lull.coupler 14, 15 zz 87.0
  lull.coupler 20, 21 zz 48.0
  lull.coupler 21, 22 zz 58.5
  lull.coupler 22, 23 zz 61.0
  lull.coupler 23, 24 zz 25.5
  lull.coupler 24, 25 zz 43.5
  lull.coupler 25, 26 zz 78.5
  lull.coupler 0, 7 zz 72.0
  lull.coupler 7, 9 zz 65.5
  lull.coupler 4, 8 zz 41.0
  lull.coupler 8, 13 zz 31.5
  lull.coupler 2, 16 zz 83.0
  lull.coupler 16, 11 zz 75.0
  lull.coupler 11, 17 zz 75.5
  lull.coupler 17, 22 zz 76.0
  lull.coupler 15, 18 zz 75.0
  lull.coupler 18, 26 zz 38.0
  lull.coupler 9, 19 zz 86.5
  lull.coupler 19, 20 zz 76.0

  // Pulses and frame changes.
  lull.operation x for 160 dt native plays rotation(1 pi, 0 pi)
  lull.operation sx for 160 dt native plays rotation(1/2 pi, 0 pi)
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
  lull.operation cx on (0, 1) for 1328 dt native error 7.4e-3 echo 1/2
  lull.operation cx on (1, 0) for 1488 dt error 7.8e-3 echo 1/2
  lull.operation cx on (1, 2) for 1344 dt native error 7.6e-3 echo 1/2
  lull.operation cx on (2, 1) for 1504 dt error 8.0e-3 echo 1/2
  lull.operation cx on (2, 3) for 1728 dt native error 7.0e-3 echo 1/2
  lull.operation cx on (3, 2) for 1888 dt error 7.4e-3 echo 1/2
  lull.operation cx on (3, 4) for 1392 dt native error 9.3e-3 echo 1/2
  lull.operation cx on (4, 3) for 1552 dt error 9.7e-3 echo 1/2
  lull.operation cx on (4, 5) for 1888 dt native error 5.6e-3 echo 1/2
  lull.operation cx on (5, 4) for 2048 dt error 6.0e-3 echo 1/2
  lull.operation cx on (5, 6) for 1376 dt native error 5.0e-3 echo 1/2
  lull.operation cx on (6, 5) for 1536 dt error 5.4e-3 echo 1/2
  lull.operation cx on (9, 10) for 1856 dt native error 6.9e-3 echo 1/2
  lull.operation cx on (10, 9) for 2016 dt error 7.3e-3 echo 1/2
  lull.operation cx on (10, 11) for 1824 dt native error 6.2e-3 echo 1/2
  lull.operation cx on (11, 10) for 1984 dt error 6.6e-3 echo 1/2
  lull.operation cx on (11, 12) for 1648 dt native error 12.8e-3 echo 1/2
  lull.operation cx on (12, 11) for 1808 dt error 13.2e-3 echo 1/2
  lull.operation cx on (12, 13) for 1296 dt native error 5.9e-3 echo 1/2
  lull.operation cx on (13, 12) for 1456 dt error 6.3e-3 echo 1/2
  lull.operation cx on (13, 14) for 2160 dt native error 7.6e-3 echo 1/2
  lull.operation cx on (14, 13) for 2320 dt error 8.0e-3 echo 1/2
  lull.operation cx on (14, 15) for 1904 dt native error 9.8e-3 echo 1/2
  lull.operation cx on (15, 14) for 2064 dt error 10.2e-3 echo 1/2
  lull.operation cx on (20, 21) for 1424 dt native error 8.2e-3 echo 1/2
  lull.operation cx on (21, 20) for 1584 dt error 8.6e-3 echo 1/2
  lull.operation cx on (21, 22) for 1632 dt native error 12.7e-3 echo 1/2
  lull.operation cx on (22, 21) for 1792 dt error 13.1e-3 echo 1/2
  lull.operation cx on (22, 23) for 1648 dt native error 11.0e-3 echo 1/2
  lull.operation cx on (23, 22) for 1808 dt error 11.4e-3 echo 1/2
  lull.operation cx on (23, 24) for 1392 dt native error 6.4e-3 echo 1/2
  lull.operation cx on (24, 23) for 1552 dt error 6.8e-3 echo 1/2
  lull.operation cx on (24, 25) for 2144 dt native error 11.2e-3 echo 1/2
  lull.operation cx on (25, 24) for 2304 dt error 11.6e-3 echo 1/2
  lull.operation cx on (25, 26) for 1744 dt native error 11.1e-3 echo 1/2
  lull.operation cx on (26, 25) for 1904 dt error 11.5e-3 echo 1/2
  lull.operation cx on (0, 7) for 1760 dt native error 8.9e-3 echo 1/2
  lull.operation cx on (7, 0) for 1920 dt error 9.3e-3 echo 1/2
  lull.operation cx on (7, 9) for 1360 dt native error 6.8e-3 echo 1/2
  lull.operation cx on (9, 7) for 1520 dt error 7.2e-3 echo 1/2
  lull.operation cx on (4, 8) for 1376 dt native error 9.3e-3 echo 1/2
  lull.operation cx on (8, 4) for 1536 dt error 9.7e-3 echo 1/2
  lull.operation cx on (8, 13) for 2032 dt native error 8.3e-3 echo 1/2
  lull.operation cx on (13, 8) for 2192 dt error 8.7e-3 echo 1/2
  lull.operation cx on (2, 16) for 1760 dt native error 7.0e-3 echo 1/2
  lull.operation cx on (16, 2) for 1920 dt error 7.4e-3 echo 1/2
  lull.operation cx on (16, 11) for 1808 dt native error 5.2e-3 echo 1/2
  lull.operation cx on (11, 16) for 1968 dt error 5.6e-3 echo 1/2
  lull.operation cx on (11, 17) for 1488 dt native error 11.7e-3 echo 1/2
  lull.operation cx on (17, 11) for 1648 dt error 12.1e-3 echo 1/2
  lull.operation cx on (17, 22) for 1648 dt native error 6.8e-3 echo 1/2
  lull.operation cx on (22, 17) for 1808 dt error 7.2e-3 echo 1/2
  lull.operation cx on (15, 18) for 1984 dt native error 11.9e-3 echo 1/2
  lull.operation cx on (18, 15) for 2144 dt error 12.3e-3 echo 1/2
  lull.operation cx on (18, 26) for 2208 dt native error 5.3e-3 echo 1/2
  lull.operation cx on (26, 18) for 2368 dt error 5.7e-3 echo 1/2
  lull.operation cx on (9, 19) for 2048 dt native error 11.7e-3 echo 1/2
  lull.operation cx on (19, 9) for 2208 dt error 12.1e-3 echo 1/2
  lull.operation cx on (19, 20) for 1584 dt native error 6.1e-3 echo 1/2
  lull.operation cx on (20, 19) for 1744 dt error 6.5e-3 echo 1/2

  lull.operation measure for 4400 dt native error 1.5e-2
  lull.operation reset for 5200 dt native
}
