//===- LullPlugin.cpp - Lull in a stock mlir-opt ----------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// Loaded with --load-dialect-plugin and --load-pass-plugin. MLIR checks no
// version of its own: a host with another MLIR would crash or misread IR, so
// the plugin refuses one itself.
//
//===----------------------------------------------------------------------===//

#include "lull/Registration/Registration.h"

#include "mlir/Tools/Plugins/DialectPlugin.h"
#include "mlir/Tools/Plugins/PassPlugin.h"
#include "llvm/Config/llvm-config.h"

#include <cstdio>
#include <cstring>
#include <link.h>

namespace {

/// What the loader's list of objects says of the host.
struct Host {
  /// The plugin itself has been seen; what follows it came because of it.
  bool pastPlugin = false;
  /// The MLIR library that the plugin is built against was there before.
  bool hasOurs = false;
};

/// Whether an object of the process is the one that holds this code. Its name
/// does not tell: a plugin may be loaded by any.
bool isThisPlugin(const dl_phdr_info &info) {
  auto here = reinterpret_cast<ElfW(Addr)>(&isThisPlugin);
  for (int i = 0; i < info.dlpi_phnum; ++i) {
    const ElfW(Phdr) &segment = info.dlpi_phdr[i];
    ElfW(Addr) begin = info.dlpi_addr + segment.p_vaddr;
    if (segment.p_type == PT_LOAD && here >= begin &&
        here - begin < segment.p_memsz)
      return true;
  }
  return false;
}

int visitObject(dl_phdr_info *info, size_t, void *data) {
  Host &host = *static_cast<Host *>(data);
  const char *slash = std::strrchr(info->dlpi_name, '/');
  const char *name = slash ? slash + 1 : info->dlpi_name;
  if (isThisPlugin(*info))
    host.pastPlugin = true;
  else if (!host.pastPlugin &&
           std::strcmp(name, "libMLIR.so." LULL_MLIR_SOVERSION) == 0)
    host.hasOurs = true;
  return 0;
}

/// The plugin API version if this host runs the MLIR that the plugin is built
/// against, else 0, which makes it ignore the plugin.
uint32_t versionFor(uint32_t version) {
  Host host;
  dl_iterate_phdr(visitObject, &host);
  if (host.hasOurs)
    return version;
  std::fprintf(stderr,
               "error: the Lull plugin is built for libMLIR.so.%s and this "
               "program does not run on it: use a program that does, such as "
               "the mlir-opt of LLVM %s, or lull-opt\n",
               LULL_MLIR_SOVERSION, LLVM_VERSION_STRING);
  return 0;
}

} // namespace

extern "C" LLVM_ATTRIBUTE_WEAK ::mlir::DialectPluginLibraryInfo
mlirGetDialectPluginInfo() {
  return {versionFor(MLIR_PLUGIN_API_VERSION), "Lull", LULL_VERSION,
          [](mlir::DialectRegistry *registry) {
            lull::registerDialects(*registry);
          }};
}

extern "C" LLVM_ATTRIBUTE_WEAK ::mlir::PassPluginLibraryInfo
mlirGetPassPluginInfo() {
  return {versionFor(MLIR_PLUGIN_API_VERSION), "Lull", LULL_VERSION,
          [] { lull::registerPasses(); }};
}
