//===- DemoDevices.h - Invented devices to try things on --------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TRANSFORMS_DEMODEVICES_H
#define LULL_TRANSFORMS_DEMODEVICES_H

#include "llvm/ADT/ArrayRef.h"
#include "llvm/ADT/StringRef.h"

namespace lull {

/// A device that comes with Lull, as text. None of them is a real machine.
struct DemoDevice {
  llvm::StringRef name;
  llvm::StringRef summary;
  llvm::StringRef text;
};

llvm::ArrayRef<DemoDevice> demoDevices();
/// Null if there is none of that name.
const DemoDevice *findDemoDevice(llvm::StringRef name);

} // namespace lull

#endif // LULL_TRANSFORMS_DEMODEVICES_H
