// The example of docs/Plugin.md: what it prints is what is written there.
// UNSUPPORTED: sanitizers
// RUN: mlir-opt %plugin_flags --pass-pipeline='builtin.module(lull-protect{device=barley sequence=hahn})' %s | FileCheck %s --strict-whitespace
// RUN: sed -n '/^func/,/^}/p' %s > %t.program
// RUN: %python -c "import sys; doc = open(sys.argv[1]).read(); program = open(sys.argv[2]).read(); sys.exit(program not in doc)" %lull_src/docs/Plugin.md %t.program
// RUN: mlir-opt %plugin_flags --pass-pipeline='builtin.module(lull-protect{device=barley sequence=hahn})' %s | sed -n '/func.func/,/^  }/p' > %t.output
// RUN: %python -c "import sys; doc = open(sys.argv[1]).read(); output = open(sys.argv[2]).read(); sys.exit(not output or output not in doc)" %lull_src/docs/Plugin.md %t.output

// CHECK:       lull.device @barley clock 2/9 ns step 8 dt {
// CHECK:      {{^}}    lull.gate cx %q0, %q1 for 1584 dt
// CHECK-NEXT: {{^}}    %m = lull.measure %q1 for 4000 dt
func.func @parity() {
  %q0 = lull.qubit 0
  %q1 = lull.qubit 1
  lull.gate h %q0
  lull.gate cx %q0, %q1
  %m = lull.measure %q1
  lull.barrier %q0, %q1
  return
}
