//===- TruncationTest.cpp - Programs cut off and spoilt -------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

#include <random>

using namespace lull::qasm;

namespace {

/// Every kind of statement, expression and token.
constexpr llvm::StringLiteral Modern = R"(/* head */
OPENQASM 3.2;
include "stdgates.inc"; // gates
pragma lull.device barley
const int[32] n = 0x1F ** 2 - ~3;
input angle[32] θ;
output bit[2] result;
qubit[4] q;
bit[4] c = "0101";
duration d = 1.5 µs + 2 * durationof({x $0; box { nop $1; }});
stretch g;
let pair = q[0:1] ++ q[{2, -1}];
gate entangle(a, b) r, s {
  ctrl(1) @ inv @ pow(1/2) @ U(a, b, 0) r, s;
  gphase(-a / 2);
}
@lull.keep reason
entangle(pi, sin(θ))[100ns] q[0], q[1];
barrier q;
box[2us] { delay[g] q[0]; x[20dt] q[1]; }
c[0] = measure q[0];
measure q -> c;
if (c[0] == 1 && !c[1]) { x q[2]; } else if (int[4](c) < 3) y q[2]; else reset q;
for uint i in [0:2:3] { rz(mod(i, 2) << 1) q[i]; }
for int j in {1, 3,} x q[j];
n += 1_000;
cal { anything }
def f(qubit a) -> bit { return measure a; }
while (n > 0) { n -= 1; }
)";

constexpr llvm::StringLiteral Old = R"(OPENQASM 2.0;
include "qelib1.inc";
qreg q[3];
creg c[3];
opaque idle(t) a;
gate u9(x, y) a, b { U(x^2, -y, pi/2) a; CX a, b; barrier a, b; }
u9(0.5*(-3), 1e-3) q[0], q[1];
measure q[0] -> c[0];
if(c==12345678901234567890123) x q[1];
reset q;
)";

/// Whatever the text: the parser ends, and what it says is in order.
Reading checked(llvm::StringRef text) {
  Reading reading(text);
  EXPECT_LE(reading.errors(), Reporter::MostErrors);
  print(reading.result.program);
  Lines sorted = reading.messages();
  std::sort(sorted.begin(), sorted.end());
  EXPECT_EQ(std::unique(sorted.begin(), sorted.end()), sorted.end())
      << text.str();
  for (llvm::StringRef line : reading.messages()) {
    llvm::StringRef what = line.split(": ").second.split(": ").second;
    EXPECT_FALSE(what.empty());
    EXPECT_FALSE(what.front() >= 'A' && what.front() <= 'Z') << what.str();
    EXPECT_FALSE(what.ends_with(".")) << what.str();
  }
  return reading;
}

TEST(TruncationTest, Whole) {
  EXPECT_EQ(checked(Old).messages(), Lines());
  // The three constructs at its end.
  EXPECT_EQ(checked(Modern).errors(), 3u);
}

TEST(TruncationTest, CutOffAtEveryByte) {
  for (llvm::StringRef whole :
       {llvm::StringRef(Modern), llvm::StringRef(Old)}) {
    for (size_t length = 0; length < whole.size(); ++length) {
      llvm::StringRef text = whole.take_front(length);
      Reading reading(text);
      // One cause, besides the constructs that are not supported.
      size_t others = 0;
      for (llvm::StringRef line : reading.messages())
        others += line.contains("error") && !line.contains("not supported");
      EXPECT_LE(others, 1u) << text.str();
      // A text without an error ends with a whole statement.
      llvm::StringRef rest = text.rtrim();
      bool ends = rest.empty() || rest.ends_with(";") || rest.ends_with("}") ||
                  rest.rsplit('\n').second.contains("//") ||
                  rest.ends_with("*/") ||
                  rest.rsplit('\n').second.starts_with("pragma");
      EXPECT_TRUE(ends || reading.errors() > 0) << text.str();
      checked(text);
    }
  }
}

TEST(TruncationTest, WithoutAnyOneByte) {
  for (llvm::StringRef whole : {llvm::StringRef(Modern), llvm::StringRef(Old)})
    for (size_t i = 0; i < whole.size(); ++i)
      checked((whole.take_front(i) + whole.drop_front(i + 1)).str());
}

TEST(TruncationTest, WithOtherBytes) {
  std::mt19937 random(7);
  for (llvm::StringRef whole :
       {llvm::StringRef(Modern), llvm::StringRef(Old)}) {
    for (int round = 0; round < 3000; ++round) {
      std::string text = whole.str();
      for (unsigned changes = 1 + random() % 4; changes > 0; --changes) {
        static constexpr llvm::StringLiteral likely = "(){}[];,@\"/*-=$1a\n";
        text[random() % text.size()] =
            random() % 4 ? likely[random() % likely.size()] : char(random());
      }
      checked(text);
    }
  }
}

} // namespace
