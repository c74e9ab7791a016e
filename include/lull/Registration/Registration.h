//===- Registration.h - Everything of Lull, for a tool ----------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#ifndef LULL_REGISTRATION_REGISTRATION_H
#define LULL_REGISTRATION_REGISTRATION_H

namespace mlir {
class DialectRegistry;
} // namespace mlir

namespace lull {

/// Adds Lull's dialect to a registry. Every tool and plugin calls this.
void registerDialects(mlir::DialectRegistry &registry);

/// Registers Lull's passes and pipelines with MLIR's global registry.
void registerPasses();

} // namespace lull

#endif // LULL_REGISTRATION_REGISTRATION_H
