lull.device @pear clock 1/2 ns step 4 dt {
  lull.site 0
  lull.site 3
  lull.coupler 0, 3
  lull.operation h for 20 ns
  lull.operation cz on (3, 0) symmetric for 120.5 ns
  lull.operation cx on any pair for 300 dt
  lull.operation cx on (0, 3) for 280 dt
  lull.operation measure for 1 us
  lull.operation measure on 3 for 1.2 us
  lull.operation reset for 2 us
  lull.operation rz for 0 dt native plays frame
}
