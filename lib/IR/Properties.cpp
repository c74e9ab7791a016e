//===- Properties.cpp - Durations and angles as properties ------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/IR/Properties.h"

#include "mlir/IR/BuiltinAttributes.h"

#include <cmath>

using namespace lull;
using namespace mlir;

/// What a lost property is written as where an attribute must stand.
static constexpr llvm::StringLiteral missingText = "missing";

/// Reads "3/4 pi", the exact angles of the generic form.
static std::optional<Angle> parseExactAngle(StringRef text) {
  if (!text.consume_back(" pi"))
    return std::nullopt;
  auto [numerator, denominator] = text.split('/');
  int64_t num = 0, den = 1;
  if (numerator.getAsInteger(10, num) ||
      (!denominator.empty() && denominator.getAsInteger(10, den)))
    return std::nullopt;
  llvm::Expected<Fraction> fraction = Fraction::make(num, den);
  if (!fraction) {
    llvm::consumeError(fraction.takeError());
    return std::nullopt;
  }
  return Angle::ofPi(*fraction);
}

//===----------------------------------------------------------------------===//
// Generic form
//===----------------------------------------------------------------------===//

Attribute lull::toAttribute(MLIRContext *context, const Duration &value) {
  return StringAttr::get(context,
                         value.isMissing() ? missingText.str() : value.str());
}

LogicalResult lull::fromAttribute(Duration &value, Attribute attribute,
                                  EmitError emitError) {
  auto text = dyn_cast<StringAttr>(attribute);
  // P3: a string.
  if (!text)
    return emitError() << "expected a duration as a string such as \"35.5 ns\" "
                          "but found "
                       << attribute;
  if (text.getValue() == missingText) {
    value = Duration();
    return success();
  }
  // T4, T5, T6, T7: as in the custom form.
  llvm::Expected<Duration> parsed = Duration::parse(text.getValue());
  if (!parsed)
    return emitError() << llvm::toString(parsed.takeError());
  value = *parsed;
  return success();
}

Attribute lull::toAttribute(MLIRContext *context, const Angle &value) {
  if (value.isMissing() || value.isExact())
    return StringAttr::get(context, value.str());
  return FloatAttr::get(Float64Type::get(context), value.value());
}

LogicalResult lull::fromAttribute(Angle &value, Attribute attribute,
                                  EmitError emitError) {
  if (auto real = dyn_cast<FloatAttr>(attribute)) {
    if (!real.getType().isF64())
      return emitError() << "expected an angle of type f64 but found "
                         << attribute;
    value = Angle::radians(real.getValueAsDouble());
    return success();
  }
  auto text = dyn_cast<StringAttr>(attribute);
  if (text && text.getValue() == missingText) {
    value = Angle();
    return success();
  }
  std::optional<Angle> exact =
      text ? parseExactAngle(text.getValue()) : std::nullopt;
  // P3: a float or a fraction of pi.
  if (!exact)
    return emitError() << "expected an angle as a float or a string such as "
                          "\"1/2 pi\" but found "
                       << attribute;
  value = *exact;
  return success();
}

Attribute lull::toAttribute(MLIRContext *context, const AngleList &value) {
  if (!value.stated)
    return StringAttr::get(context, missingText);
  SmallVector<Attribute> angles;
  for (const Angle &angle : value.angles)
    angles.push_back(toAttribute(context, angle));
  return ArrayAttr::get(context, angles);
}

LogicalResult lull::fromAttribute(AngleList &value, Attribute attribute,
                                  EmitError emitError) {
  value = AngleList();
  if (auto text = dyn_cast<StringAttr>(attribute))
    if (text.getValue() == missingText)
      return success();
  auto array = dyn_cast<ArrayAttr>(attribute);
  // P3: an array.
  if (!array)
    return emitError() << "expected an array of angles but found " << attribute;
  value.stated = true;
  for (Attribute element : array)
    if (failed(fromAttribute(value.angles.emplace_back(), element, emitError)))
      return failure();
  return success();
}

//===----------------------------------------------------------------------===//
// Bytecode
//===----------------------------------------------------------------------===//

void lull::writeProperty(DialectBytecodeWriter &writer, const Duration &value) {
  writer.writeVarInt(uint64_t(value.unit()) | uint64_t(value.decimals()) << 4);
  writer.writeSignedVarInt(value.amount());
}

LogicalResult lull::readProperty(DialectBytecodeReader &reader,
                                 Duration &value) {
  uint64_t form = 0;
  int64_t amount = 0;
  if (failed(reader.readVarInt(form)) ||
      failed(reader.readSignedVarInt(amount)))
    return failure();
  llvm::Expected<Duration> made =
      (form & 15) > uint64_t(TimeUnit::s) || form >> 4 > 18
          ? llvm::Expected<Duration>(
                llvm::createStringError("form %" PRIu64, form))
          : Duration::make(amount, unsigned(form >> 4), TimeUnit(form & 15));
  // P13: a duration that was written.
  if (!made)
    return reader.emitError("invalid duration in bytecode: ")
           << llvm::toString(made.takeError());
  value = *made;
  return success();
}

void lull::writeProperty(DialectBytecodeWriter &writer, const Angle &value) {
  // A form, then what it needs: 0 missing, 1 radians, 2 a multiple of pi.
  if (value.isMissing())
    return writer.writeVarInt(0);
  if (!value.isExact()) {
    writer.writeVarInt(1);
    return writer.writeAPFloatWithKnownSemantics(APFloat(value.value()));
  }
  writer.writeVarInt(2);
  writer.writeSignedVarInt(value.multiple().numerator());
  writer.writeSignedVarInt(value.multiple().denominator());
}

LogicalResult lull::readProperty(DialectBytecodeReader &reader, Angle &value) {
  uint64_t form = 0;
  if (failed(reader.readVarInt(form)))
    return failure();
  if (form == 0) {
    value = Angle();
    return success();
  }
  if (form == 1) {
    FailureOr<APFloat> real =
        reader.readAPFloatWithKnownSemantics(APFloat::IEEEdouble());
    if (failed(real))
      return failure();
    value = Angle::radians(real->convertToDouble());
    return success();
  }
  int64_t numerator = 0, denominator = 0;
  if (form != 2 || failed(reader.readSignedVarInt(numerator)) ||
      failed(reader.readSignedVarInt(denominator)))
    return reader.emitError("invalid angle in bytecode");
  llvm::Expected<Fraction> multiple = Fraction::make(numerator, denominator);
  // P13: an angle that was written.
  if (!multiple)
    return reader.emitError("invalid angle in bytecode: ")
           << llvm::toString(multiple.takeError());
  value = Angle::ofPi(*multiple);
  return success();
}

void lull::writeProperty(DialectBytecodeWriter &writer,
                         const AngleList &value) {
  // The count plus one, so that a lost list stays a lost list.
  writer.writeVarInt(value.stated ? value.angles.size() + 1 : 0);
  for (const Angle &angle : value.angles)
    writeProperty(writer, angle);
}

LogicalResult lull::readProperty(DialectBytecodeReader &reader,
                                 AngleList &value) {
  value = AngleList();
  uint64_t count = 0;
  if (failed(reader.readVarInt(count)))
    return failure();
  if (count == 0)
    return success();
  value.stated = true;
  // Grows as it reads: a forged count must not allocate by itself.
  for (uint64_t i = 1; i < count; ++i)
    if (failed(readProperty(reader, value.angles.emplace_back())))
      return failure();
  return success();
}
