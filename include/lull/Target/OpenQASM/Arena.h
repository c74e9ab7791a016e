//===- Arena.h - Where the trees of programs live ---------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TARGET_OPENQASM_ARENA_H
#define LULL_TARGET_OPENQASM_ARENA_H

#include "llvm/ADT/ArrayRef.h"
#include "llvm/Support/Allocator.h"

#include <memory>
#include <type_traits>

namespace lull::qasm {

/// Owns the nodes of trees. Nothing in it is destroyed one by one.
class Arena {
public:
  template <typename T> T *make(const T &node) {
    static_assert(std::is_trivially_destructible_v<T>);
    return new (memory.Allocate<T>()) T(node);
  }
  template <typename List>
  llvm::ArrayRef<typename List::value_type> copy(const List &list) {
    using T = typename List::value_type;
    static_assert(std::is_trivially_destructible_v<T>);
    T *place = memory.Allocate<T>(list.size());
    std::uninitialized_copy(list.begin(), list.end(), place);
    return llvm::ArrayRef<T>(place, list.size());
  }

private:
  llvm::BumpPtrAllocator memory;
};

} // namespace lull::qasm

#endif // LULL_TARGET_OPENQASM_ARENA_H
