//===- DeviceBuilder.cpp - From device op to device -------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/DeviceBuilder.h"

#include "mlir/IR/SymbolTable.h"

#include <cmath>

using namespace lull;
using namespace mlir;

namespace {

/// Converts line by line, so that an error stands at its line.
class Converter {
public:
  Converter(DeviceOp op, bool quiet) : op(op), quiet(quiet) {}

  FailureOr<Device> run();

private:
  LogicalResult grid(Device &device);
  LogicalResult site(Device &device, SiteOp line);
  LogicalResult coupler(Device &device, CouplerOp line);
  LogicalResult operation(Device &device, OperationOp line);

  /// Reports an error of the plain device at a line.
  LogicalResult take(Operation *line, llvm::Error error);
  LogicalResult fail(Operation *line, const Twine &message);
  /// Ticks of a duration; the default where there is none.
  FailureOr<Ticks> ticks(Operation *line, const Device &device,
                         DurationAttr duration, StringRef what,
                         Ticks otherwise = 0);
  /// A probability of error, if stated.
  FailureOr<std::optional<double>> rate(Operation *line,
                                        std::optional<APFloat> value);

  DeviceOp op;
  bool quiet;
};

} // namespace

LogicalResult Converter::fail(Operation *line, const Twine &message) {
  if (!quiet)
    line->emitError(message);
  return failure();
}

LogicalResult Converter::take(Operation *line, llvm::Error error) {
  if (!error)
    return success();
  return fail(line, llvm::toString(std::move(error)));
}

FailureOr<Ticks> Converter::ticks(Operation *line, const Device &device,
                                  DurationAttr duration, StringRef what,
                                  Ticks otherwise) {
  if (!duration)
    return otherwise;
  // D25: on the clock, as in a program.
  llvm::Expected<Ticks> value = device.clock().toTicks(duration.getValue());
  if (!value)
    return fail(line, what + ": " + llvm::toString(value.takeError()));
  return *value;
}

FailureOr<std::optional<double>> Converter::rate(Operation *line,
                                                 std::optional<APFloat> value) {
  if (!value)
    return std::optional<double>();
  double number = value->convertToDouble();
  // D11: a probability.
  if (!(number >= 0 && number <= 1))
    return fail(line,
                "error " + spellReal(number) + " is no probability, 0 to 1");
  return std::optional<double>(number);
}

LogicalResult Converter::grid(Device &device) {
  FailureOr<Ticks> step = ticks(op, device, op.getStepAttr(), "step", 1);
  FailureOr<Ticks> gap = ticks(op, device, op.getGapAttr(), "gap");
  if (failed(step) || failed(gap))
    return failure();
  // D6, D7: a grid that moves forward.
  return take(op, device.setGrid(*step, *gap));
}

LogicalResult Converter::site(Device &device, SiteOp line) {
  Site site;
  site.number = line.getSite();
  for (auto [attribute, slot] : {std::pair(line.getT1Attr(), &site.t1),
                                 std::pair(line.getRamseyAttr(), &site.ramsey),
                                 std::pair(line.getEchoAttr(), &site.echo)}) {
    if (!attribute)
      continue;
    // D10: a calibration time is positive.
    if (attribute.getValue().amount() <= 0)
      return fail(line, "calibration time " + attribute.getValue().str() +
                            " is not positive");
    *slot = attribute.getValue();
  }
  FailureOr<std::optional<double>> error = rate(line, line.getError());
  if (failed(error))
    return failure();
  site.pulseError = *error;
  return take(line, device.addSite(std::move(site)));
}

LogicalResult Converter::coupler(Device &device, CouplerOp line) {
  Coupler coupler;
  coupler.first = line.getFirst();
  coupler.second = line.getSecond();
  if (std::optional<APFloat> zz = line.getZz()) {
    coupler.zzKilohertz = zz->convertToDouble();
    // D15: a finite coupling.
    if (!std::isfinite(*coupler.zzKilohertz))
      return fail(line, "zz " + spellReal(*coupler.zzKilohertz) +
                            " is not a finite number");
  }
  return take(line, device.addCoupler(coupler));
}

LogicalResult Converter::operation(Device &device, OperationOp line) {
  OperationEntry entry;
  entry.name = line.getLabel().str();
  entry.arity = line.getArity();
  ArrayRef<int64_t> sites = line.getOn();
  // The line's own verifier may not have run, or has had its say.
  if (line.getArity() < 1 || line.getArity() > OperationOp::mostQubits ||
      sites.size() % entry.arity)
    return failure();
  for (size_t i = 0; i < sites.size(); i += entry.arity)
    entry.on.emplace_back(sites.begin() + i, sites.begin() + i + entry.arity);
  entry.symmetric = line.getSymmetric();
  entry.native = line.getNative();
  if (ActionAttr plays = line.getPlaysAttr()) {
    entry.plays = plays.getValue();
    // D27: a pulse is on one qubit.
    if (entry.arity != 1)
      return fail(line, "plays a pulse on " + Twine(entry.arity) +
                            " qubits when it should be on 1");
  }
  if (FractionAttr echo = line.getEchoAttr()) {
    entry.echo = echo.getValue();
    // D28: inside the operation.
    if (*entry.echo <= Fraction(0) || *entry.echo >= Fraction(1))
      return fail(line, "echo at " + entry.echo->str() +
                            " is outside the operation, 0 to 1");
    // D29: of two qubits.
    if (entry.arity != 2)
      return fail(line, "has an echo with " + Twine(entry.arity) +
                            " qubits when only pairs have");
  }
  FailureOr<Ticks> length =
      ticks(line, device, line.getDurationAttr(), entry.name);
  FailureOr<std::optional<double>> error = rate(line, line.getError());
  if (failed(length) || failed(error))
    return failure();
  entry.duration = *length;
  entry.error = *error;
  return take(line, device.addOperation(std::move(entry)));
}

/// Whether a line has what its kind cannot be read without. A function is
/// verified against its device in no fixed order with the device itself, so
/// this may see lines that are yet to be refused.
static bool isComplete(Operation *line) {
  if (auto site = dyn_cast<SiteOp>(line))
    return bool(site.getSiteAttr());
  if (auto coupler = dyn_cast<CouplerOp>(line))
    return coupler.getFirstAttr() && coupler.getSecondAttr();
  if (auto operation = dyn_cast<OperationOp>(line))
    return operation.getLabelAttr() && operation.getOnAttr() &&
           operation.getArityAttr() && operation.getDurationAttr();
  return true;
}

FailureOr<Device> Converter::run() {
  if (!op.getClockAttr() || !op.getSymNameAttr() || op.getBody().empty() ||
      !llvm::all_of(op.getBody().front(),
                    [](Operation &line) { return isComplete(&line); }))
    return failure();
  llvm::Expected<Clock> clock =
      Clock::make(op.getClock().getDt(), op.getClock().getUnit());
  if (!clock)
    return take(op, clock.takeError());
  Device device(op.getSymName().str(), *clock);
  if (failed(grid(device)))
    return failure();
  // Couplers refer to sites and operations to couplers, in whatever order the
  // lines stand.
  Block &body = op.getBody().front();
  for (SiteOp line : body.getOps<SiteOp>())
    if (failed(site(device, line)))
      return failure();
  for (CouplerOp line : body.getOps<CouplerOp>())
    if (failed(coupler(device, line)))
      return failure();
  for (OperationOp line : body.getOps<OperationOp>())
    if (failed(operation(device, line)))
      return failure();
  return device;
}

FailureOr<Device> lull::buildDevice(DeviceOp op, bool quiet) {
  return Converter(op, quiet).run();
}

Operation *lull::deviceHolder(Operation *op, FlatSymbolRefAttr &symbol) {
  for (Operation *at = op; at; at = at->getParentOp())
    if ((symbol =
             at->getAttrOfType<FlatSymbolRefAttr>(LullDialect::deviceAttrName)))
      return at;
  return nullptr;
}

DeviceOp lull::resolveDevice(Operation *holder, FlatSymbolRefAttr symbol) {
  for (Operation *table = SymbolTable::getNearestSymbolTable(holder); table;
       table = table->getParentOp()
                   ? SymbolTable::getNearestSymbolTable(table->getParentOp())
                   : nullptr)
    if (Operation *found = SymbolTable::lookupSymbolIn(table, symbol.getAttr()))
      return dyn_cast<DeviceOp>(found);
  return {};
}
