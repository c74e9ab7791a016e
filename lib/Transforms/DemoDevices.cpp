//===- DemoDevices.cpp - Invented devices to try things on ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Transforms/DemoDevices.h"

#include "llvm/ADT/STLExtras.h"

using namespace lull;

namespace {
struct Text {
  llvm::StringRef name;
  llvm::StringRef text;
};
} // namespace

static constexpr Text texts[] = {
#include "DemoDevices.inc"
};

/// The first comment line of a device file says what it is.
static llvm::StringRef summaryOf(llvm::StringRef text) {
  text.consume_front("// ");
  return text.split('\n').first;
}

llvm::ArrayRef<DemoDevice> lull::demoDevices() {
  static const llvm::SmallVector<DemoDevice, 3> devices = [] {
    llvm::SmallVector<DemoDevice, 3> result;
    for (const Text &entry : texts)
      result.push_back({entry.name, summaryOf(entry.text), entry.text});
    return result;
  }();
  return devices;
}

const DemoDevice *lull::findDemoDevice(llvm::StringRef name) {
  const auto *found = llvm::find_if(
      demoDevices(), [&](const DemoDevice &d) { return d.name == name; });
  return found == demoDevices().end() ? nullptr : found;
}
