// The list of builds: none may vanish unnoticed, and a name either runs or is unknown.
#include "kernel/kernel_set.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <iostream>

namespace assize::kernel {
namespace {

TEST(KernelSet, TheProgramContainsTheBuildsItShould) {
  const auto names = compiled_names();
  EXPECT_EQ(std::vector<std::string_view>(names.begin(), names.end()), (std::vector<std::string_view>{"reference"}));
}

TEST(KernelSet, RunnableBuildsAreCompiledAndEndWithTheReference) {
  const auto sets = runnable_here();
  ASSERT_FALSE(sets.empty());
  EXPECT_EQ(sets.back()->name, "reference");
  for (const KernelSet* set : sets) {
    std::cout << "[ runs here ] " << set->name << '\n';
    EXPECT_EQ(std::ranges::count(compiled_names(), set->name), 1);
    ASSERT_NE(find(set->name), nullptr);
    EXPECT_EQ(find(set->name)->binary_walk, set->binary_walk);
    EXPECT_NE(set->binary_walk, nullptr);
    EXPECT_NE(set->symbol_walk, nullptr);
  }
}

TEST(KernelSet, AnUnknownNameIsNotReplacedByAnother) {
  for (const std::string_view name : {"", "Reference", "reference ", "fastest"}) EXPECT_EQ(find(name), nullptr) << name;
}

}  // namespace
}  // namespace assize::kernel
