//===- Dialect.cpp - The lull dialect ---------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Dialect.h"

#include "lull/IR/DeviceBuilder.h"
#include "lull/IR/Ops.h"

#include "mlir/IR/Builders.h"
#include "mlir/IR/DialectImplementation.h"
#include "mlir/Interfaces/FunctionInterfaces.h"
#include "llvm/ADT/TypeSwitch.h"

using namespace lull;
using namespace mlir;

#include "lull/IR/LullDialect.cpp.inc"
#define GET_TYPEDEF_CLASSES
#include "lull/IR/LullTypes.cpp.inc"

namespace {

/// Bytecode of another version is refused unless this code can read it. Version
/// 1 is the first; a later one bumps it when a property changes its form.
struct BytecodeInterface : public BytecodeDialectInterface {
  BytecodeInterface(Dialect *dialect) : BytecodeDialectInterface(dialect) {}

  static constexpr uint64_t currentVersion = 1;
  struct Version : public DialectVersion {
    uint64_t number = currentVersion;
  };

  void writeVersion(DialectBytecodeWriter &writer) const override {
    writer.writeVarInt(currentVersion);
  }

  std::unique_ptr<DialectVersion>
  readVersion(DialectBytecodeReader &reader) const override {
    auto version = std::make_unique<Version>();
    if (failed(reader.readVarInt(version->number)))
      return nullptr;
    // P12: a version that this code knows.
    if (version->number != currentVersion) {
      reader.emitError() << "lull bytecode version is " << version->number
                         << " when it should be " << currentVersion;
      return nullptr;
    }
    return version;
  }
};

/// The dialect as its own first host: reference semantics.
struct OwnHost : public HostInterface {
  using HostInterface::HostInterface;

  bool isQubit(Type type) const override { return isa<QubitType>(type); }

  std::optional<SiteId> getSite(Value qubit) const override {
    if (auto op = qubit.getDefiningOp<QubitOp>())
      return op.getSite();
    return std::nullopt;
  }

  Value buildGate(OpBuilder &builder, Location loc, StringAttr name,
                  ArrayRef<Angle> angles, Value qubit,
                  Duration duration) const override {
    GateOp::create(builder, loc, name, angles, ValueRange(qubit), duration);
    return qubit;
  }
};

} // namespace

void LullDialect::initialize() {
  addTypes<
#define GET_TYPEDEF_LIST
#include "lull/IR/LullTypes.cpp.inc"
      >();
  registerAttributes();
  addOperations<
#define GET_OP_LIST
#include "lull/IR/LullOps.cpp.inc"
      ,
#define GET_OP_LIST
#include "lull/IR/LullDeviceOps.cpp.inc"
      >();
  addInterfaces<BytecodeInterface, OwnHost>();
}

//===----------------------------------------------------------------------===//
// Attributes on other operations
//===----------------------------------------------------------------------===//

/// Checks `lull.device`. Whether the symbol is there is for the passes to ask:
/// a program may name a device that lull-use-device is yet to bring. What the
/// program does on the device is checked once for all functions, with the
/// device (DeviceOp::verifyRegions).
static LogicalResult verifyDeviceUse(Operation *op, Attribute value) {
  // A1: a symbol.
  auto symbol = dyn_cast<FlatSymbolRefAttr>(value);
  if (!symbol)
    return op->emitError("'lull.device' must be a symbol such as @barley but "
                         "is ")
           << value;
  Operation *found = SymbolTable::lookupNearestSymbolFrom(op, symbol);
  // A3: of a device, if of anything.
  if (!found || isa<DeviceOp>(found))
    return success();
  InFlightDiagnostic diag = op->emitError() << symbol << " is not a device";
  diag.attachNote(found->getLoc()) << "it is this operation";
  return diag;
}

/// A10: only what ends a wait, or the end of a function, can have a wish.
static bool mayHaveWish(Operation *op) {
  return isa<TimedOpInterface>(op) || op->hasTrait<OpTrait::IsTerminator>() ||
         !op->isRegistered();
}

/// A11: of timed operations only a foreign idle keeps its state and plan so.
static LogicalResult verifyForeignIdle(Operation *op, StringRef name) {
  auto timed = dyn_cast<TimedOpInterface>(op);
  if (!timed ||
      (!isa<IdleOp>(op) && timed.getOperationKind() == OperationKind::Idle))
    return success();
  return op->emitError("'")
         << name << "' has no effect here: it is for idles of other dialects";
}

LogicalResult LullDialect::verifyOperationAttribute(Operation *op,
                                                    NamedAttribute attribute) {
  StringRef name = attribute.getName();
  Attribute value = attribute.getValue();
  if (name == deviceAttrName)
    return verifyDeviceUse(op, value);
  if (name == stateAttrName) {
    // A4: a state.
    if (!isa<WindowStateAttr>(value))
      return op->emitError("'lull.state' must be a #lull.state but is ")
             << value;
    return verifyForeignIdle(op, name);
  }
  if (name == planAttrName) {
    // A5: a plan.
    if (!isa<PlanAttr>(value))
      return op->emitError("'lull.plan' must be a #lull.plan but is ") << value;
    return verifyForeignIdle(op, name);
  }
  if (name == protectAttrName) {
    // A6: a name, a symbol or a plan.
    if (!isa<StringAttr, FlatSymbolRefAttr, PlanAttr>(value))
      return op->emitError("'lull.protect' must be the name of a sequence, its "
                           "symbol, a #lull.plan or \"none\" but is ")
             << value;
    if (!mayHaveWish(op))
      return op->emitError("'lull.protect' has no effect here: it is for timed "
                           "operations and for the end of a function");
    return success();
  }
  // A7: nothing else.
  return op->emitError("unknown attribute '")
         << name
         << "': on operations there are lull.device, lull.protect, lull.state "
            "and lull.plan";
}

LogicalResult LullDialect::verifyRegionArgAttribute(Operation *op,
                                                    unsigned region,
                                                    unsigned argument,
                                                    NamedAttribute attribute) {
  // A9: nothing but a site.
  if (attribute.getName() != siteAttrName)
    return op->emitError("unknown attribute '")
           << attribute.getName().getValue() << "' on argument " << argument
           << ": there is lull.site";
  auto site = dyn_cast<IntegerAttr>(attribute.getValue());
  // A8: a number that a site can have.
  if (!site || !site.getType().isSignlessInteger(64) || site.getInt() < 0)
    return op->emitError("'lull.site' must be a number of a site such as 3 : "
                         "i64 but is ")
           << attribute.getValue();
  return success();
}
