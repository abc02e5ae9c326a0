// Which builds there are, and which of them run on this machine.  The name is all that a user sees of a build.
#include "kernel/kernel_set.hpp"

#include <array>

#include "kernel/reference.hpp"

namespace assize::kernel {

const KernelSet& reference() {
  static constexpr KernelSet set{"reference", &reference_binary_walk, &reference_symbol_walk};
  return set;
}

std::span<const std::string_view> compiled_names() {
  static constexpr std::array<std::string_view, 1> names{"reference"};
  return names;
}

std::vector<const KernelSet*> runnable_here() { return {&reference()}; }

const KernelSet* find(std::string_view name) {
  for (const KernelSet* set : runnable_here())
    if (set->name == name) return set;
  return nullptr;
}

}  // namespace assize::kernel
