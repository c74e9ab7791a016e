//===- Assign.cpp - lull-assign ---------------------------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/Devices.h"
#include "lull/Analysis/ProgramReader.h"
#include "lull/Sequence/Catalogue.h"
#include "lull/Transforms/Functions.h"
#include "lull/Transforms/Passes.h"
#include "lull/Transforms/Plans.h"

#include <fmt/format.h>

namespace lull {
#define GEN_PASS_DEF_LULLASSIGN
#include "lull/Transforms/Passes.h.inc"
} // namespace lull

using namespace lull;
using namespace mlir;

namespace {

/// What the options ask for.
struct Policy {
  /// The sequence for windows without a wish; null for none.
  Attribute sequence;
  unsigned repeats = 1;
  bool alternating = false;
  std::optional<Duration> spacing, leastWindow;
  bool alsoBasis = false;
  bool alsoSpent = false;
};

struct AssignPass : public lull::impl::LullAssignBase<AssignPass> {
  using LullAssignBase::LullAssignBase;

  LogicalResult initialize(MLIRContext *context) override;
  void runOnOperation() override;

private:
  LogicalResult checkSequences();

  Policy policy;
};

/// A window that is to be decided.
struct Window {
  TimedOpInterface op;
  SiteId site;
  Ticks start;
  Ticks length;
  /// What the program wishes for it, on the idle or on what ends it; or null.
  Attribute wish;
};

/// Decides the windows of one function.
class Decider {
public:
  Decider(const Policy &policy, Operation *function, const Device &device,
          Remarks &remarks)
      : policy(policy), function(function), device(device), remarks(remarks),
        plans(device, function),
        protectName(StringAttr::get(function->getContext(),
                                    LullDialect::protectAttrName)) {}

  LogicalResult run();

private:
  /// Turns options into ticks of this device.
  LogicalResult prepare();
  LogicalResult decide(const Window &window);
  /// Whether there is what a wish names, whether or not a wait ends there.
  LogicalResult checkWish(Operation *op, Attribute wish);
  LogicalResult decideByWish(const Window &window, Attribute wish);
  /// Puts the plan on the window if it fits.
  LogicalResult tryPlan(const Window &window, PlanAttr plan);
  /// How often the spacing lets a sequence be repeated; leaves the window and
  /// fails if not once, or more often than can be.
  FailureOr<unsigned> repeatsFor(const Window &window, const Sequence &base);
  /// A plan of `sequence` with the repeats that the options ask for; null if
  /// the window was left because they ask for too many.
  FailureOr<PlanAttr> makePlan(const Window &window, Attribute sequence);
  void leave(const Window &window, const std::string &why);
  LogicalResult fail(const Window &window, llvm::Error error) {
    return window.op->emitError(llvm::toString(std::move(error)));
  }
  std::string ticks(Ticks count) const {
    return device.clock().describe(count);
  }

  const Policy &policy;
  Operation *function;
  const Device &device;
  Remarks &remarks;
  Plans plans;
  StringAttr protectName;
  Ticks spacing = 0;
  Ticks least = 0;
};

} // namespace

//===----------------------------------------------------------------------===//
// One window
//===----------------------------------------------------------------------===//

LogicalResult Decider::prepare() {
  for (auto [option, slot] : {std::pair(&policy.spacing, &spacing),
                              std::pair(&policy.leastWindow, &least)}) {
    if (!*option)
      continue;
    // W25: on the clock.
    llvm::Expected<Ticks> value = device.clock().toTicks(**option);
    if (!value)
      return function->emitError("in an option of lull-assign: ")
             << llvm::toString(value.takeError());
    *slot = *value;
  }
  // A sequence that is not there is an error even if no window wants it.
  if (policy.sequence)
    if (auto base = plans.base(policy.sequence); !base)
      return function->emitError("in an option of lull-assign: ")
             << llvm::toString(base.takeError());
  return success();
}

void Decider::leave(const Window &window, const std::string &why) {
  if (!remarks.wanted())
    return;
  remarks.missed(window.op->getLoc(), "Left",
                 fmt::format("window of {} on site {} left: {}",
                             ticks(window.length), window.site, why),
                 {{"Site", std::to_string(window.site)},
                  {"Start", std::to_string(window.start)},
                  {"Length", std::to_string(window.length)}});
}

FailureOr<unsigned> Decider::repeatsFor(const Window &window,
                                        const Sequence &base) {
  // Pulses of so many repeats, with the one that closes an odd number.
  auto pulses = [&](Ticks repeats) {
    Ticks count = repeats * Ticks(base.size());
    return count + count % 2;
  };
  // The most repeats whose pulses are `spacing` apart on average, so that
  // length / pulses >= spacing.
  Ticks most = window.length / spacing;
  Ticks repeats = most / Ticks(base.size());
  if (pulses(repeats) > most)
    --repeats;
  if (repeats <= 0) {
    leave(window, fmt::format("one repeat of {} has its {} pulses less than {} "
                              "apart on average",
                              base.name, pulses(1), ticks(spacing)));
    return failure();
  }
  if (repeats > Ticks(PlanAttr::mostRepeats) ||
      pulses(repeats) > Ticks(MostPulses)) {
    leave(window, fmt::format("a spacing of {} asks for {} repeats of {}, more "
                              "than {} pulses",
                              ticks(spacing), repeats, base.name, MostPulses));
    return failure();
  }
  return unsigned(repeats);
}

FailureOr<PlanAttr> Decider::makePlan(const Window &window,
                                      Attribute sequence) {
  unsigned repeats = policy.repeats;
  if (policy.spacing) {
    llvm::Expected<const Sequence *> base = plans.base(sequence);
    if (!base)
      return fail(window, base.takeError());
    FailureOr<unsigned> asked = repeatsFor(window, **base);
    if (failed(asked))
      return PlanAttr();
    repeats = *asked;
  }
  return PlanAttr::get(function->getContext(), sequence, repeats,
                       policy.alternating);
}

LogicalResult Decider::tryPlan(const Window &window, PlanAttr plan) {
  llvm::Expected<Player *> player = plans.player(plan, window.site);
  if (!player)
    return fail(window, player.takeError());
  if (window.length > LongestWindow) {
    leave(window, fmt::format("pulses are placed in windows of at most {}",
                              ticks(LongestWindow)));
    return success();
  }
  GridWindow grid = plans.window(window.start, window.length);
  Ticks needed = (*player)->least(grid);
  if (needed > window.length) {
    leave(window, fmt::format("{} needs {}", (*player)->sequence().name,
                              ticks(needed)));
    return success();
  }
  TimedOpInterface(window.op).setWindowPlan(plan);
  return success();
}

LogicalResult Decider::decideByWish(const Window &window, Attribute wish) {
  if (auto name = dyn_cast<StringAttr>(wish); name && name == "none") {
    leave(window, "the program asks for it");
    return success();
  }
  PlanAttr plan = dyn_cast<PlanAttr>(wish);
  if (plan)
    return tryPlan(window, plan);
  FailureOr<PlanAttr> made = makePlan(window, wish);
  if (failed(made))
    return failure();
  return *made ? tryPlan(window, *made) : success();
}

LogicalResult Decider::decide(const Window &window) {
  TimedOpInterface op = window.op;
  if (op.getWindowPlan())
    return success();
  if (window.wish)
    return decideByWish(window, window.wish);
  WindowState state = op.getWindowState();
  if (!policy.sequence) {
    leave(window, "no sequence was asked for");
    return success();
  }
  if (state == WindowState::Basis && !policy.alsoBasis) {
    leave(window, "the qubit is in a basis state, which pulses would harm");
    return success();
  }
  if (state == WindowState::Spent && !policy.alsoSpent) {
    leave(window, "the qubit is only measured or reset from here on");
    return success();
  }
  if (window.length < least) {
    leave(window, fmt::format("the least window is {}", ticks(least)));
    return success();
  }
  FailureOr<PlanAttr> plan = makePlan(window, policy.sequence);
  if (failed(plan))
    return failure();
  return *plan ? tryPlan(window, *plan) : success();
}

LogicalResult Decider::checkWish(Operation *op, Attribute wish) {
  if (auto name = dyn_cast<StringAttr>(wish)) {
    if (name == "none")
      return success();
    if (name.getValue().starts_with("@"))
      return op->emitError("the wish ")
             << name << " is a name: the symbol of a sequence is written "
             << "without quotes";
  }
  // W32: a sequence that there is.
  auto plan = dyn_cast<PlanAttr>(wish);
  llvm::Expected<const Sequence *> known =
      plans.base(plan ? plan.getSequence() : wish);
  return known ? success() : op->emitError(llvm::toString(known.takeError()));
}

LogicalResult Decider::run() {
  ProgramReader reader(function, device);
  FailureOr<Block *> body = reader.body();
  if (failed(body) || failed(prepare()))
    return failure();
  std::vector<Window> windows;
  // The window that each qubit has been in since its last operation, or none.
  constexpr size_t none = ~size_t(0);
  std::vector<size_t> waiting;
  auto endWait = [&](ResourceId qubit, Attribute wish) {
    if (size_t &window = waiting[qubit]; window != none) {
      if (wish && !windows[window].wish)
        windows[window].wish = wish;
      window = none;
    }
  };
  for (Operation &op : **body) {
    FailureOr<bool> timed = reader.read(&op);
    if (failed(timed))
      return failure();
    waiting.resize(reader.numQubits(), none);
    Attribute wish = op.getDiscardableAttr(protectName);
    if (wish && failed(checkWish(&op, wish)))
      return failure();
    // A wish on the terminator is for the waits that last to the end.
    if (op.hasTrait<OpTrait::IsTerminator>())
      for (ResourceId qubit = 0; qubit < reader.numQubits(); ++qubit)
        endWait(qubit, wish);
    if (!*timed)
      continue;
    const ProgramReader::Step &step = reader.step();
    bool idle = step.kind == OperationKind::Idle;
    for (ResourceId qubit : step.qubits)
      endWait(qubit, idle ? Attribute() : wish);
    if (!idle)
      continue;
    ResourceId qubit = step.qubits.front();
    waiting[qubit] = windows.size();
    windows.push_back(
        {step.op, reader.site(qubit), step.start, step.duration, wish});
  }
  for (const Window &window : windows)
    if (failed(decide(window)))
      return failure();
  return success();
}

//===----------------------------------------------------------------------===//
// The pass
//===----------------------------------------------------------------------===//

LogicalResult AssignPass::initialize(MLIRContext *context) {
  Location loc = UnknownLoc::get(context);
  policy = Policy();
  policy.repeats = repeats;
  policy.alternating = alternating;
  policy.alsoBasis = alsoBasis;
  policy.alsoSpent = alsoSpent;
  StringRef name = sequence;
  if (name.consume_front("@"))
    policy.sequence = FlatSymbolRefAttr::get(context, name);
  else if (!name.empty() && name != "none") {
    if (llvm::Expected<Sequence> known = findSequence(name); !known)
      return emitError(loc)
             << "option 'sequence': " << llvm::toString(known.takeError());
    policy.sequence = StringAttr::get(context, name);
  }
  // W22: a number that a plan may have.
  if (policy.repeats == 0 || policy.repeats > PlanAttr::mostRepeats)
    return emitError(loc) << "option 'repeats' is " << policy.repeats
                          << " when it should be 1 to "
                          << PlanAttr::mostRepeats;
  // W23: one of the two.
  if (policy.repeats != 1 && !spacing.empty())
    return emitError(loc)
           << "options 'repeats' and 'spacing' exclude each other";
  for (auto [text, slot, optionName] :
       {std::tuple(&spacing, &policy.spacing, "spacing"),
        std::tuple(&leastWindow, &policy.leastWindow, "least-window")}) {
    if (text->empty())
      continue;
    llvm::Expected<Duration> parsed = Duration::parse(*text);
    // W24: a positive duration.
    if (!parsed)
      return emitError(loc) << "option '" << optionName
                            << "': " << llvm::toString(parsed.takeError());
    if (!parsed->isSet() || parsed->amount() <= 0)
      return emitError(loc) << "option '" << optionName << "' is '" << *text
                            << "' when it should be a positive duration";
    *slot = *parsed;
  }
  return success();
}

LogicalResult AssignPass::checkSequences() {
  bool anyFailed = false;
  getOperation().walk([&](SequenceOp op) {
    if (llvm::Expected<Sequence> built = buildSequence(op); !built) {
      op.emitError(llvm::toString(built.takeError()));
      anyFailed = true;
    }
  });
  return failure(anyFailed);
}

void AssignPass::runOnOperation() {
  const Devices &devices = getAnalysis<Devices>();
  if (failed(checkSequences()))
    return signalPassFailure();
  LogicalResult result = forEachTimedFunction(
      getOperation(), getAnalysisManager(), getArgument(),
      [&](Operation *function, AnalysisManager,
          Remarks &remarks) -> LogicalResult {
        const Device *device = devices.require(function);
        return failure(
            !device ||
            failed(Decider(policy, function, *device, remarks).run()));
      });
  if (failed(result))
    return signalPassFailure();
  markAnalysesPreserved<Devices>();
}
