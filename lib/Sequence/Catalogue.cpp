//===- Catalogue.cpp - The published sequences ----------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Families.h"

#include "lull/Timing/Fault.h"

#include "llvm/ADT/SmallVector.h"
#include "llvm/ADT/StringExtras.h"

using namespace lull;

//===----------------------------------------------------------------------===//
// The table
//===----------------------------------------------------------------------===//

namespace {

using Name = llvm::StringRef;

constexpr Name HahnNames[] = {"hahn"};
constexpr Name CpNames[] = {"cp-2", "cp-3", "cp-4"};
constexpr Name CpmgNames[] = {"cpmg-1", "cpmg-2", "cpmg-4", "cpmg-8"};
constexpr Name SignedX4Names[] = {"signed-x4"};
constexpr Name PddNames[] = {"pdd-2", "pdd-3", "pdd-4", "pdd-5"};
constexpr Name Xy4Names[] = {"xy4"};
constexpr Name Xy4TrailingNames[] = {"xy4-trailing"};
constexpr Name Xy4SignedNames[] = {"xy4-signed"};
constexpr Name Xy8Names[] = {"xy8"};
constexpr Name EddNames[] = {"edd"};
constexpr Name Xy16Names[] = {"xy16"};
constexpr Name CddNames[] = {"cdd-1", "cdd-2", "cdd-3"};
constexpr Name CddAxisNames[] = {"cdd-axis-1", "cdd-axis-2", "cdd-axis-3",
                                 "cdd-axis-4"};
constexpr Name UddNames[] = {"udd-2", "udd-3", "udd-4", "udd-6", "udd-8"};
constexpr Name QddNames[] = {"qdd-2-2", "qdd-2-4", "qdd-4-4"};
constexpr Name KddNames[] = {"kdd-20"};
constexpr Name UrNames[] = {"ur-4",  "ur-6",  "ur-8",  "ur-10", "ur-12",
                            "ur-14", "ur-16", "ur-18", "ur-20"};
constexpr Name WalshNames[] = {"walsh-1", "walsh-2", "walsh-3", "walsh-4",
                               "walsh-5", "walsh-6", "walsh-10"};

} // namespace

static constexpr llvm::StringLiteral Any = "a number from 1";

static const Family Table[] = {
    {"hahn", 0, "", "Hahn 1950",
     "one pulse, so a second one closes it at the end of the window", HahnNames,
     [](Orders orders) { return fixedWord("hahn", orders, "X", "centred"); }},
    {"cp", 1, Any, "Carr and Purcell 1954",
     "the pulses of cpmg: the names differ in the stored state only (cp: "
     "perpendicular to the pulse axis, cpmg: along it); over-rotations add up",
     CpNames, [](Orders orders) { return uniform("cp", orders, "centred"); }},
    {"cpmg", 1, Any, "Meiboom and Gill 1958",
     "the pulses of cp: the names differ in the stored state only (cpmg: along "
     "the pulse axis, cp: perpendicular to it); over-rotations add up on other "
     "states",
     CpmgNames,
     [](Orders orders) { return uniform("cpmg", orders, "centred"); }},
    {"signed-x4", 0, "", "Genov, Schraft, Vitanov and Halfmann 2017",
     "the word of ur-4: signs that cancel over-rotation and detuning during "
     "pulses, as the alternation X -X X -X does not",
     SignedX4Names,
     [](Orders orders) {
       return fixedWord("signed-x4", orders, "X -X -X X", "centred");
     }},
    {"pdd", 1, Any, "Viola and Lloyd 1998",
     "an even number of pulses does not refocus static detuning; an odd one "
     "needs a closing pulse",
     PddNames, [](Orders orders) { return uniform("pdd", orders, "spread"); }},
    {"xy4", 0, "", "Maudsley 1986",
     "the width of its pulses leaves couplings to sx and sy: xy8 removes them",
     Xy4Names,
     [](Orders orders) {
       return fixedWord("xy4", orders, "X Y X Y", "centred");
     }},
    {"xy4-trailing", 0, "", "Viola, Knill and Lloyd 1999",
     "ends with a pulse at the end of the window; otherwise as xy4",
     Xy4TrailingNames,
     [](Orders orders) {
       return fixedWord("xy4-trailing", orders, "X Y X Y", "trailing");
     }},
    {"xy4-signed", 0, "", "no publication: listed as a warning",
     "a trap: the signs cancel neither over-rotation nor detuning during "
     "pulses; choose xy4, xy8, signed-x4 or ur-N",
     Xy4SignedNames,
     [](Orders orders) {
       return fixedWord("xy4-signed", orders, "X Y -X -Y", "centred");
     }},
    {"xy8", 0, "", "Gullion, Baker and Conradi 1990", "", Xy8Names,
     [](Orders orders) {
       return fixedWord("xy8", orders, "X Y X Y Y X Y X", "centred");
     }},
    {"edd", 0, "", "Viola and Knill 2003",
     "ends with a pulse at the end of the window", EddNames,
     [](Orders orders) {
       return fixedWord("edd", orders, "X Y X Y Y X Y X", "trailing");
     }},
    {"xy16", 0, "", "Gullion, Baker and Conradi 1990", "", Xy16Names,
     [](Orders orders) {
       return fixedWord("xy16", orders,
                        "X Y X Y Y X Y X -X -Y -X -Y -Y -X -Y -X", "centred");
     }},
    {"cdd", 1, Any, "Khodjasteh and Lidar 2005",
     "where blocks end together an X and a Y are played back to back as a Z: a "
     "frame change in their place would decouple nothing; the instants do not "
     "make up for the width of such a pair",
     CddNames, concatenated},
    {"cdd-axis", 1, Any, "Khodjasteh and Lidar 2005, Cywinski et al. 2008",
     "for dephasing only; an odd level has an odd number of pulses and needs a "
     "closing pulse; over-rotations add up",
     CddAxisNames, concatenatedOneAxis},
    {"udd", 1, Any, "Uhrig 2007",
     "made for noise with a hard cutoff; over-rotations add up; an odd number "
     "of pulses needs a closing pulse",
     UddNames, [](Orders orders) { return uniform("udd", orders, "uhrig"); }},
    {"qdd", 2, "an even number from 2", "West, Fong and Lidar 2010",
     "orders: inner pulses (Y) first, then outer pulses (X); over-rotations "
     "add up",
     QddNames, quadratic},
    {"kdd-20", 0, "", "Souza, Alvarez and Suter 2011",
     "phases in steps of pi/6; the width of its pulses leaves couplings to sx "
     "and sy",
     KddNames, knillTwenty},
    {"ur", 1, "an even number from 4",
     "Genov, Schraft, Vitanov and Halfmann 2017",
     "removes sz only, from ur-6 on; phases other than X, Y, -X, -Y except for "
     "ur-4 and ur-8",
     UrNames, universallyRobust},
    {"walsh", 1, Any, "Hayes et al. 2011",
     "the order is the sequency; an odd one ends with a pulse at the end of "
     "the window; over-rotations add up",
     WalshNames, walsh},
};

llvm::ArrayRef<Family> lull::catalogue() { return Table; }

//===----------------------------------------------------------------------===//
// Names
//===----------------------------------------------------------------------===//

/// `xy8`, `udd-N`, `qdd-N-M`.
static std::string spellFamily(const Family &family) {
  static const char *const orders[] = {"", "-N", "-N-M"};
  return family.stem.str() + orders[family.orders];
}

/// The family with the longest stem that `name` starts with, and the text of
/// the orders after it.
static const Family *findFamily(llvm::StringRef name, llvm::StringRef &orders) {
  const Family *found = nullptr;
  for (const Family &family : Table) {
    llvm::StringRef rest = name;
    if (!rest.consume_front(family.stem) ||
        !(rest.empty() || rest.starts_with("-")) ||
        (found && found->stem.size() > family.stem.size()))
      continue;
    found = &family;
    orders = rest;
  }
  return found;
}

llvm::Expected<Sequence> lull::findSequence(llvm::StringRef name) {
  llvm::StringRef rest;
  const Family *family = findFamily(name, rest);
  if (!family)
    return fault("unknown sequence '{}': known are {}", name.str(),
                 llvm::join(llvm::map_range(Table, spellFamily), ", "));

  llvm::SmallVector<llvm::StringRef, 2> texts;
  if (rest.consume_front("-"))
    rest.split(texts, '-');
  if (texts.size() != family->orders)
    return fault(
        "number of orders in '{}' is {} when it should be {}, as in '{}'",
        name.str(), texts.size(), family->orders,
        family->examples.front().str());

  llvm::SmallVector<unsigned, 2> orders;
  for (llvm::StringRef text : texts) {
    if (text.empty() || !llvm::all_of(text, llvm::isDigit))
      return fault("order '{}' of '{}' is not a whole number", text.str(),
                   family->stem.str());
    // One spelling for each member.
    if (text.size() > 1 && text.front() == '0')
      return fault("order '{}' of '{}' has a leading zero", text.str(),
                   family->stem.str());
    // Each order adds at least one pulse.
    unsigned order = 0;
    if (text.getAsInteger(10, order) || order > MostPulses)
      return tooManyPulses(name);
    orders.push_back(order);
  }
  return family->make(orders);
}
