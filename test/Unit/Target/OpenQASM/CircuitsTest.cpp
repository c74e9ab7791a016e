//===- CircuitsTest.cpp - Files that others wrote -------------------------===//
//
// Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
// See LICENSE for license information.
// SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
//
//===----------------------------------------------------------------------===//
//
// They are no part of the project: they lie in the folder that the environment
// variable LULL_CIRCUITS names, or beside the source tree.
//
//===----------------------------------------------------------------------===//

#include "Reading.h"

#include "llvm/Support/FileSystem.h"
#include "llvm/Support/Path.h"

#include <algorithm>
#include <cstdlib>

using namespace lull::qasm;

namespace {

std::string folder() {
  if (const char *named = std::getenv("LULL_CIRCUITS"))
    return named;
  llvm::SmallString<128> path(LULL_SOURCE_DIR);
  llvm::sys::path::append(path, "..", "shared", "circuits");
  return path.str().str();
}

std::vector<std::string> circuits() {
  std::vector<std::string> files;
  std::error_code failed;
  for (llvm::sys::fs::recursive_directory_iterator at(folder(), failed), end;
       !failed && at != end; at.increment(failed))
    if (llvm::sys::path::extension(at->path()) == ".qasm")
      files.push_back(at->path());
  std::sort(files.begin(), files.end());
  return files;
}

TEST(CircuitsTest, AllAreRead) {
  std::vector<std::string> files = circuits();
  if (files.empty())
    GTEST_SKIP() << "no .qasm files in " << folder()
                 << ": set LULL_CIRCUITS to a folder of circuits";
  for (const std::string &file : files) {
    auto buffer = llvm::MemoryBuffer::getFile(file);
    ASSERT_TRUE(bool(buffer)) << file;
    llvm::StringRef text = (*buffer)->getBuffer();
    Reading reading(text);
    EXPECT_EQ(reading.errors(), 0u)
        << file << ":" << ::testing::PrintToString(reading.messages());
    EXPECT_EQ(reading.result.tokens, Tokens(text).counted) << file;
    // No statement is lost: each ends in a `;` or a `}` of its own.
    size_t depth = 0, ends = 0;
    for (const Token &token : Tokens(text).tokens) {
      depth += token.is(TokenKind::LeftBrace) || token.is(TokenKind::LeftParen);
      depth -= token.is(TokenKind::RightParen);
      if (token.is(TokenKind::RightBrace))
        ends += --depth == 0;
      ends += token.is(TokenKind::Semicolon) && depth == 0;
    }
    bool hasVersion = reading.result.program.versionLoc.isValid();
    EXPECT_EQ(reading.statements().size() + hasVersion, ends) << file;
  }
}

} // namespace
