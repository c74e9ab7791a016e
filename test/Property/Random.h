//===- Random.h - Random choices that are the same everywhere ---*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_RANDOM_H
#define LULL_TEST_PROPERTY_RANDOM_H

#include <cstdint>
#include <random>
#include <vector>

namespace lull::property {

/// The engine of the standard library gives the same numbers everywhere; its
/// distributions do not, so these are our own.
class Random {
public:
  explicit Random(std::uint64_t seed) : engine(seed) {}

  std::int64_t within(std::int64_t least, std::int64_t most) {
    return least + std::int64_t(engine() % std::uint64_t(most - least + 1));
  }
  bool chance(int percent) { return within(1, 100) <= percent; }
  template <typename T> const T &of(const std::vector<T> &choices) {
    return choices[within(0, std::int64_t(choices.size()) - 1)];
  }
  template <typename T> void shuffle(std::vector<T> &list) {
    for (size_t i = list.size(); i-- > 1;)
      std::swap(list[i], list[within(0, std::int64_t(i))]);
  }

private:
  std::mt19937_64 engine;
};

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_RANDOM_H
