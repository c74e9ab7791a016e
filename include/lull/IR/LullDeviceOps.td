//===- LullDeviceOps.td - Devices and sequences ------------*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLDEVICEOPS
#define LULL_IR_LULLDEVICEOPS

include "lull/IR/LullAttrs.td"
include "mlir/IR/OpAsmInterface.td"
include "mlir/IR/OpBase.td"
include "mlir/IR/RegionKindInterface.td"
include "mlir/IR/SymbolInterfaces.td"
include "mlir/Interfaces/SideEffectInterfaces.td"

def Lull_DeviceOp : Op<Lull_Dialect, "device", [
    Symbol, NoTerminator, SingleBlock, GraphRegionNoTerminator,
    IsolatedFromAbove]> {
  let summary = "a device: clock, start grid, sites, couplers, operations";
  let description = [{
    dt is an exact fraction of a second. `step`: pulses may start only on
    absolute multiples of it. `gap`: the least time between inserted pulses.
    What a device does not list does not exist on it.

    Example:
    ```mlir
    lull.device @barley clock 2/9 ns step 8 dt {
      lull.site 0 t1 80 us ramsey 40 us echo 90 us error 2.0e-4
      lull.site 1
      lull.coupler 0, 1 zz 45.0
      lull.operation x for 160 dt native plays rotation(1 pi, 0 pi)
      lull.operation rz for 0 dt native plays frame
      lull.operation cx on (0, 1) for 1600 dt error 7.0e-3 echo 1/2
      lull.operation measure for 4000 dt
    }
    ```
  }];
  let arguments = (ins SymbolNameAttr:$sym_name, Lull_ClockAttr:$clock,
                       OptionalAttr<Lull_DurationAttr>:$step,
                       OptionalAttr<Lull_DurationAttr>:$gap);
  let regions = (region SizedRegion<1>:$body);
  let assemblyFormat = [{
    $sym_name `` custom<Grid>($clock, $step, $gap) attr-dict-with-keyword $body
  }];
  let hasRegionVerifier = 1;
}

class Lull_DeviceLine<string mnemonic>
    : Op<Lull_Dialect, mnemonic, [HasParent<"DeviceOp">]>;

def Lull_SiteOp : Lull_DeviceLine<"site"> {
  let summary = "a physical qubit and its calibration";
  let description = [{
    Relaxation time, Ramsey and echo 1/e times, and the average gate error of
    one pi pulse; what was not measured is left out.
  }];
  let arguments = (ins I64Attr:$site,
                       OptionalAttr<Lull_DurationAttr>:$t1,
                       OptionalAttr<Lull_DurationAttr>:$ramsey,
                       OptionalAttr<Lull_DurationAttr>:$echo,
                       OptionalAttr<F64Attr>:$error);
  let assemblyFormat = [{
    custom<Site>($site) `` custom<Calibration>($t1, $ramsey, $echo, $error)
    attr-dict
  }];
}

def Lull_CouplerOp : Lull_DeviceLine<"coupler"> {
  let summary = "a pair of sites that can take part in a two-qubit gate";
  let description = [{
    The pair has no order. `zz`: the always-on coupling zeta / 2 pi in kHz.
  }];
  let arguments = (ins I64Attr:$first, I64Attr:$second,
                       OptionalAttr<F64Attr>:$zz);
  let assemblyFormat = [{
    custom<Site>($first) `,` custom<Site>($second) (`zz` custom<Real>($zz)^)?
    attr-dict
  }];
}

def Lull_OperationOp : Lull_DeviceLine<"operation"> {
  let summary = "one line of the device's table of operations";
  let description = [{
    Without `on` it holds on any site; `on any pair` on any coupled pair in
    either order; `on any N` on any N sites; `on 0, 1` on these sites;
    `on (0, 1), (2, 3)` on these tuples in this order, and with `symmetric` in
    either. A line that lists the sites goes before one that does not. `native`:
    the hardware plays it as it is; `plays`: what it does to one qubit, so that
    pulses can be made of it; `echo`: where a two-qubit gate flips its first
    qubit, as a fraction of its length.
  }];
  let arguments = (ins StrAttr:$label, DenseI64ArrayAttr:$on, I64Attr:$arity,
                       UnitAttr:$symmetric, Lull_DurationAttr:$duration,
                       UnitAttr:$native, OptionalAttr<Lull_ActionAttr>:$plays,
                       OptionalAttr<F64Attr>:$error,
                       OptionalAttr<Lull_FractionAttr>:$echo);
  let assemblyFormat = [{
    custom<Name>($label) `` custom<On>($on, $arity) (`symmetric` $symmetric^)?
    `for` custom<Length>($duration) (`native` $native^)?
    (`plays` custom<Plays>($plays)^)? (`error` custom<Real>($error)^)?
    (`echo` custom<Share>($echo)^)? attr-dict
  }];
  let hasVerifier = 1;
  let extraClassDeclaration = [{
    /// The most qubits that an operation of a device may be for.
    static constexpr int64_t mostQubits = 1000;
  }];
}

def Lull_SequenceOp : Op<Lull_Dialect, "sequence", [Symbol]> {
  let summary = "a decoupling sequence of the user's own";
  let description = [{
    Phases of pi pulses as exact multiples of pi in time order, and where the
    pulses are: exact fractions of the window, or a formula by name (`centred`,
    `trailing`, `spread`, `uhrig`). It must multiply to the identity; `closed`
    lets Lull add the one pulse that makes it so.

    Example:
    ```mlir
    lull.sequence @mine phases [0, 1/2, 0, 1/2] at [1/8, 3/8, 5/8, 7/8]
    lull.sequence @odd phases [0, 0, 0] at uhrig closed
    ```
  }];
  let arguments = (ins SymbolNameAttr:$sym_name,
                       TypedArrayAttrBase<Lull_FractionAttr, "phases">:$phases,
                       OptionalAttr<TypedArrayAttrBase<Lull_FractionAttr,
                           "instants">>:$instants,
                       OptionalAttr<StrAttr>:$formula,
                       UnitAttr:$closed);
  let assemblyFormat = [{
    $sym_name `phases` custom<Fractions>($phases)
    `at` custom<Instants>($instants, $formula) (`closed` $closed^)? attr-dict
  }];
  let hasVerifier = 1;
}

#endif // LULL_IR_LULLDEVICEOPS
