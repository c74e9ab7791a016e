//===- WindowStates.cpp - What waiting qubits hold --------------*- C++ -*-===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "lull/Analysis/WindowStates.h"

#include "llvm/ADT/StringSwitch.h"

using namespace lull;
using namespace mlir;

BasisAction lull::basisAction(StringRef gate) {
  // Names of OpenQASM 3's stdgates.inc and of common extensions of it.
  return llvm::StringSwitch<BasisAction>(gate)
      .Cases({"id", "z", "s", "sdg", "t", "tdg", "rz", "p", "phase", "u1"},
             BasisAction::Diagonal)
      .Cases({"cz", "cp", "cphase", "crz", "cu1", "rzz", "cs", "ccz"},
             BasisAction::Diagonal)
      .Cases({"x", "y"}, BasisAction::Flip)
      .Cases({"cx", "CX", "cy", "ccx"}, BasisAction::ControlledFlip)
      .Cases({"swap", "iswap"}, BasisAction::Exchange)
      .Default(BasisAction::Unknown);
}

BasisAction lull::basisAction(const Action &plays) {
  if (plays.kind == Action::Kind::Frame)
    return BasisAction::Diagonal;
  if (plays.kind == Action::Kind::Rotation && plays.turn == Fraction(1))
    return BasisAction::Flip;
  return BasisAction::Unknown;
}

BasisAction WindowStates::actionOf(OpId id) const {
  StringAttr name = TimedOpInterface(program.op(id)).getListedName();
  if (!name)
    return BasisAction::Unknown;
  // What the device says that it does goes before what its name suggests.
  const Device &device = program.device();
  ArrayRef<ResourceId> qubits = program.problem().occupied(id);
  if (qubits.size() == 1)
    if (const Device::NamedEntries *named = device.named(name))
      if (const OperationEntry *entry =
              device.find(named, program.site(qubits[0])))
        if (entry->plays.kind != Action::Kind::None)
          return basisAction(entry->plays);
  return basisAction(name);
}

WindowStates::WindowStates(const TimedProgram &program, bool liveAtStart,
                           bool spentAtEnd)
    : program(program) {
  const Problem &problem = program.problem();
  first.reserve(problem.size() + 1);
  actions.reserve(problem.size());
  std::uint32_t count = 0;
  // One-qubit operations may differ by site.
  DenseMap<std::pair<StringAttr, SiteId>, BasisAction> known;
  for (OpId id = 0; id < problem.size(); ++id) {
    first.push_back(count);
    ArrayRef<ResourceId> qubits = problem.occupied(id);
    count += qubits.size();
    BasisAction action = BasisAction::Unknown;
    if (problem.kind(id) == OperationKind::Gate) {
      SiteId site = qubits.size() == 1 ? program.site(qubits[0]) : -1;
      auto [place, isNew] = known.try_emplace(
          {TimedOpInterface(program.op(id)).getListedName(), site});
      if (isNew)
        place->second = actionOf(id);
      action = place->second;
    }
    actions.push_back(action);
  }
  facts.resize(count);
  forward(liveAtStart);
  backward(spentAtEnd);
}

void WindowStates::forward(bool liveAtStart) {
  const Problem &problem = program.problem();
  std::vector<bool> basis(problem.numResources(), !liveAtStart);
  // A qubit that is handed in has a history that this function does not show.
  for (ResourceId qubit = 0; qubit < problem.numResources(); ++qubit)
    if (program.isHandedIn(qubit))
      basis[qubit] = false;
  for (OpId id = 0; id < problem.size(); ++id) {
    ArrayRef<ResourceId> qubits = problem.occupied(id);
    for (auto [index, qubit] : llvm::enumerate(qubits))
      facts[first[id] + index].basis = basis[qubit];
    switch (problem.kind(id)) {
    case OperationKind::Barrier:
    case OperationKind::Delay:
    case OperationKind::Idle:
    // A whole sequence keeps what it protects; one of its pulses takes basis
    // states to basis states.
    case OperationKind::Pulse:
      continue;
    case OperationKind::Measure:
    case OperationKind::Reset:
      for (ResourceId qubit : qubits)
        basis[qubit] = true;
      continue;
    case OperationKind::Gate:
      break;
    }
    switch (actions[id]) {
    case BasisAction::Diagonal:
    case BasisAction::Flip:
      continue;
    case BasisAction::ControlledFlip: {
      // A control in superposition entangles the target; one in a basis state
      // stays, whatever the target holds.
      bool all = llvm::all_of(qubits, [&](ResourceId q) { return basis[q]; });
      basis[qubits.back()] = all;
      // With several controls, a superposed target or control leaves the
      // others as they are only if they are in basis states: they stay so.
      continue;
    }
    case BasisAction::Exchange:
      if (qubits.size() == 2) {
        bool kept = basis[qubits[0]];
        basis[qubits[0]] = basis[qubits[1]];
        basis[qubits[1]] = kept;
        continue;
      }
      [[fallthrough]];
    case BasisAction::Unknown:
      for (ResourceId qubit : qubits)
        basis[qubit] = false;
    }
  }
  end.resize(problem.numResources());
  for (auto [qubit, known] : llvm::enumerate(basis))
    end[qubit].basis = known;
}

void WindowStates::backward(bool spentAtEnd) {
  const Problem &problem = program.problem();
  std::vector<bool> spent(problem.numResources(), spentAtEnd);
  for (Facts &fact : end)
    fact.spent = spentAtEnd;
  for (OpId id = problem.size(); id-- > 0;) {
    ArrayRef<ResourceId> qubits = problem.occupied(id);
    switch (problem.kind(id)) {
    case OperationKind::Measure:
    case OperationKind::Reset:
      for (ResourceId qubit : qubits)
        spent[qubit] = true;
      break;
    case OperationKind::Gate:
      // A Z error before a diagonal gate or a flip is one after it, on the same
      // qubit; before a controlled flip, that holds for the controls, while
      // one on the target reaches them all.
      if (actions[id] == BasisAction::Diagonal ||
          actions[id] == BasisAction::Flip)
        break;
      if (actions[id] == BasisAction::ControlledFlip) {
        bool all = llvm::all_of(qubits, [&](ResourceId q) { return spent[q]; });
        spent[qubits.back()] = all;
        break;
      }
      if (actions[id] == BasisAction::Exchange && qubits.size() == 2) {
        bool kept = spent[qubits[0]];
        spent[qubits[0]] = spent[qubits[1]];
        spent[qubits[1]] = kept;
        break;
      }
      for (ResourceId qubit : qubits)
        spent[qubit] = false;
      break;
    case OperationKind::Barrier:
    case OperationKind::Delay:
    case OperationKind::Idle:
    case OperationKind::Pulse:
      break;
    }
    for (auto [index, qubit] : llvm::enumerate(qubits))
      facts[first[id] + index].spent = spent[qubit];
  }
}

WindowState WindowStates::stateOf(Facts facts) {
  if (facts.basis)
    return WindowState::Basis;
  return facts.spent ? WindowState::Spent : WindowState::Live;
}
