//===- Expectation.h - What must become of a window -------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_PROPERTY_EXPECTATION_H
#define LULL_TEST_PROPERTY_EXPECTATION_H

#include "Window.h"

#include "lull/Transforms/Passes.h"

namespace lull::property {

/// The options of a run.
struct Options {
  std::string sequence;
  unsigned repeats = 1;
  bool alternating = false;
  /// In ticks; zero for none.
  std::int64_t spacing = 0;
  std::int64_t leastWindow = 0;
  bool alsoBasis = false;
  bool alsoSpent = false;
  bool spentAtEnd = false;
  SchedulePolicy policy = SchedulePolicy::ASAP;

  void apply(ProtectOptions &options) const;
  std::string str() const;
};

/// What is played in a window.
struct Played {
  std::vector<Fraction> phases;
  /// The integral of the switching function with flips at the instants, in a
  /// window of length 1.
  double imbalance = 0;
};

/// A sequence of the module's own.
struct UserSequence {
  /// With the `@`.
  std::string name;
  std::string text;
  /// Closed.
  Played played;
};

/// phi_1 - phi_2 + phi_3 ..., in [0, 2).
Fraction alternatingSum(llvm::ArrayRef<Fraction> phases);

/// A sequence that the device can play.
UserSequence inventSequence(Random &random, const RandomDevice &device,
                            std::string name);

/// A sequence of the catalogue with the phases that are listed there.
Played catalogued(llvm::StringRef name);

/// Random options for a sequence. Nothing if the device cannot play it.
std::optional<Options> inventOptions(Random &random, const RandomDevice &device,
                                     std::string name,
                                     llvm::ArrayRef<UserSequence> own);

class Expectation {
public:
  Expectation(const RandomDevice &device, const Options &options,
              llvm::ArrayRef<UserSequence> own)
      : device(device), options(options), own(own) {}

  /// The pulses that a window must get; none if it must stay as it is.
  Played pulses(const Window &window, llvm::StringRef state,
                const Wish &wish) const;

private:
  Played played(const Window &window, const Wish &wish) const;

  const RandomDevice &device;
  const Options &options;
  llvm::ArrayRef<UserSequence> own;
};

} // namespace lull::property

#endif // LULL_TEST_PROPERTY_EXPECTATION_H
