// The plain C++ walks, declared for the table of builds only.
#pragma once
#include "kernel/kernel_set.hpp"

namespace assize::kernel {

Lightest reference_binary_walk(std::span<std::uint64_t> base, const BinaryTables& tables, std::size_t block_size,
                               std::size_t step_digits, std::span<std::uint64_t> counts) noexcept;

Lightest reference_symbol_walk(std::span<std::uint8_t> negated_base, const SymbolTables& tables, std::size_t block_size,
                               std::size_t step_digits, std::span<std::uint64_t> counts) noexcept;

}  // namespace assize::kernel
