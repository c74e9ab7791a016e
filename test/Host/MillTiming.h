//===- MillTiming.h - Lull's interfaces for mill ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_TEST_HOST_MILLTIMING_H
#define LULL_TEST_HOST_MILLTIMING_H

namespace mlir {
class DialectRegistry;
} // namespace mlir

namespace mill {

/// Lets Lull's passes run on mill: attaches the interfaces to its operations
/// when the dialect is loaded.
void registerTiming(mlir::DialectRegistry &registry);

} // namespace mill

#endif // LULL_TEST_HOST_MILLTIMING_H
