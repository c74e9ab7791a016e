// One round of parity checks on a line of five qubits. The data qubits (sites 0,
// 2 and 4) hold a state; the check qubits (sites 1 and 3) compare the neighbours
// and are read out. Meanwhile the data qubits wait, and dephase.

func.func @parity_round() -> (i1, i1) {
  %data0 = lull.qubit 0
  %check1 = lull.qubit 1
  %data2 = lull.qubit 2
  %check3 = lull.qubit 3
  %data4 = lull.qubit 4

  lull.gate h %data0
  lull.gate h %data2
  lull.gate h %data4

  lull.gate cx %data0, %check1
  lull.gate cx %data4, %check3
  lull.gate cx %data2, %check1
  lull.gate cx %data2, %check3

  %left = lull.measure %check1
  %right = lull.measure %check3

  // The next round begins for all of them together.
  lull.barrier %data0, %check1, %data2, %check3, %data4
  return %left, %right : i1, i1
}
