//===- LullProperties.td - Properties of the lull dialect --*- tablegen -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_LULLPROPERTIES
#define LULL_IR_LULLPROPERTIES

include "mlir/IR/OpBase.td"
include "mlir/IR/Properties.td"

// What differs from operation to operation is a property, not an attribute:
// uniquing a million durations costs more than everything else in a pass. A
// property that is lost on the way (a generic form without it, old bytecode)
// would silently become its default; ours become `missing`, and verifiers
// refuse it.

class Lull_Property<string storage, string desc> : Property<storage, desc> {
  let convertToAttribute = [{ return ::lull::toAttribute($_ctxt, $_storage); }];
  let convertFromAttribute =
      [{ return ::lull::fromAttribute($_storage, $_attr, $_diag); }];
  let writeToMlirBytecode =
      [{ ::lull::writeProperty($_writer, $_storage); }];
  let readFromMlirBytecode = [{
    if (::mlir::failed(::lull::readProperty($_reader, $_storage)))
      return ::mlir::failure();
  }];
}

def Lull_DurationProp : Lull_Property<"::lull::Duration", "duration">;
def Lull_AngleProp : Lull_Property<"::lull::Angle", "angle"> {
  let interfaceType = "::lull::Angle";
}
def Lull_AnglesProp : Lull_Property<"::lull::AngleList", "list of angles"> {
  let interfaceType = "const ::lull::AngleList &";
}

#endif // LULL_IR_LULLPROPERTIES
