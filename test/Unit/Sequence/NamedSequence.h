//===- NamedSequence.h - Catalogue members for tests ------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_UNIT_SEQUENCE_NAMEDSEQUENCE_H
#define LULL_TEST_UNIT_SEQUENCE_NAMEDSEQUENCE_H

#include "lull/Sequence/Catalogue.h"

#include "gtest/gtest.h"

namespace lull::test {

inline constexpr double Pi = 3.14159265358979323846;

inline Fraction over(std::int64_t numerator, std::int64_t denominator) {
  return Fraction::of(numerator, denominator);
}

/// numerators / denominator.
inline std::vector<Fraction> fractions(const std::vector<int> &numerators,
                                       int denominator) {
  std::vector<Fraction> result;
  for (int numerator : numerators)
    result.push_back(over(numerator, denominator));
  return result;
}

/// A catalogue member that must exist.
inline Sequence named(llvm::StringRef name) {
  llvm::Expected<Sequence> sequence = findSequence(name);
  if (sequence)
    return *sequence;
  ADD_FAILURE() << llvm::toString(sequence.takeError());
  return {};
}

/// All instants, which must be exact.
inline std::vector<Fraction> exactInstants(const Sequence &sequence) {
  std::vector<Fraction> result;
  for (const Instant &instant : sequence.instants) {
    EXPECT_TRUE(instant.exact.has_value()) << sequence.name;
    result.push_back(instant.exact.value_or(Fraction(-1)));
  }
  return result;
}

} // namespace lull::test

#endif // LULL_TEST_UNIT_SEQUENCE_NAMEDSEQUENCE_H
