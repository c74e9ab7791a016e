//===- QubitSites.cpp - Which site a qubit value stands for -----*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/QubitSites.h"

#include "lull/IR/Dialect.h"
#include "lull/Timing/Fault.h"

#include "mlir/Interfaces/FunctionInterfaces.h"

using namespace lull;
using namespace mlir;

std::optional<SiteId> lull::originOf(Value qubit, Operation *function) {
  // Without a host, nobody could build a wait on it, whatever an argument says.
  const HostInterface *host = hostOf(qubit.getType());
  if (!host)
    return std::nullopt;
  auto argument = dyn_cast<BlockArgument>(qubit);
  if (!argument)
    return host->getSite(qubit);
  auto callee = dyn_cast<FunctionOpInterface>(function);
  if (!callee || argument.getOwner() != &function->getRegion(0).front())
    return std::nullopt;
  auto site = callee.getArgAttrOfType<IntegerAttr>(argument.getArgNumber(),
                                                   LullDialect::siteAttrName);
  return site ? std::optional<SiteId>(site.getInt()) : std::nullopt;
}

InFlightDiagnostic lull::emitUnknownSite(Operation *user, Value qubit) {
  if (!hostOf(qubit.getType()))
    return user->emitError("takes a value of type ")
           << qubit.getType()
           << " as a qubit, which no host dialect says it is";
  if (auto argument = dyn_cast<BlockArgument>(qubit))
    return user->emitError("the site of qubit argument ")
           << argument.getArgNumber()
           << " is unknown: give it the attribute 'lull.site'";
  InFlightDiagnostic diag =
      user->emitError("the site of a qubit that it takes is unknown");
  diag.attachNote(qubit.getLoc()) << "the qubit comes from here";
  return diag;
}

InFlightDiagnostic lull::emitNoSite(Operation *at, SiteId site,
                                    const Device &device) {
  return at->emitError("site ")
         << site << " is not on device '" << device.name() << "', which has "
         << counted(device.sites().size(), "site");
}

void QubitSites::read(TimedOpInterface op,
                      SmallVectorImpl<std::optional<SiteId>> &sites) {
  sites.clear();
  operands.clear();
  op.collectQubits(operands);
  for (OpOperand *operand : operands) {
    auto [place, isNew] = known.try_emplace(operand->get());
    if (isNew)
      place->second = originOf(operand->get(), function);
    sites.push_back(place->second);
  }
  for (size_t i = 0; i < operands.size(); ++i)
    if (Value carrier = op.getCarrier(i)) {
      known.erase(operands[i]->get());
      known[carrier] = sites[i];
    }
}

LogicalResult QubitSites::read(TimedOpInterface op, const Device &device,
                               SmallVectorImpl<SiteId> &sites) {
  read(op, scratch);
  sites.clear();
  for (auto [site, operand] : llvm::zip(scratch, operands)) {
    // Q7, Q3: a known site of the device.
    if (!site)
      return emitUnknownSite(op, operand->get());
    if (!device.hasSite(*site))
      return emitNoSite(op, *site, device);
    sites.push_back(*site);
  }
  return success();
}
