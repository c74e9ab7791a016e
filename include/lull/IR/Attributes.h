//===- Attributes.h - Attributes of the lull dialect ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_IR_ATTRIBUTES_H
#define LULL_IR_ATTRIBUTES_H

#include "lull/IR/Angle.h"
#include "lull/Timing/Device.h"
#include "lull/Timing/Time.h"

#include "mlir/IR/Attributes.h"
#include "mlir/IR/BuiltinAttributes.h"

#include "lull/IR/LullEnums.h.inc"

namespace lull {

inline bool operator==(const Action &a, const Action &b) {
  return a.kind == b.kind && a.turn == b.turn && a.phase == b.phase;
}
inline llvm::hash_code hash_value(const Action &a) {
  return llvm::hash_combine(unsigned(a.kind), a.turn, a.phase);
}

} // namespace lull

#define GET_ATTRDEF_CLASSES
#include "lull/IR/LullAttrs.h.inc"

#endif // LULL_IR_ATTRIBUTES_H
