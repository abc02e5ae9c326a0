// Signatures of the hot loops, and one named build of them.
//
// A walk visits a coset v + span(g_0, g_1, ...) in ascending order of the message, g_0 belonging to the lowest digit.
// The span of the lowest rows is a table, the block; each of its words is added to a base word, and the base then takes
// one step, by adding a word that the caller has prepared.  Both tables lie position by position, so that a loop over
// the words of a block is a loop over neighbours in memory.
//
// Manners: spans in and integers out; no allocation, no exceptions, no threads, no globals.
#pragma once
#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>
#include <vector>

namespace assize::kernel {

/// Lightest word of a walk.
struct Lightest {
  std::uint32_t weight = UINT32_MAX;
  std::uint64_t index = 0;  ///< number of words before its first appearance: with the order above, its message
  friend bool operator==(const Lightest&, const Lightest&) = default;
};

/// The number of words for which a block table has room (its stride) is a multiple of this; kernels may read that far.
inline constexpr std::size_t binary_granule = 32;
inline constexpr std::size_t symbol_granule = 64;

/// Tables of a binary code.
///   block: machine word j of block word i is block[j * stride + i]; block word 0 is zero
///   steps: step t = 1, 2, ... adds steps[countr_zero(t)], each `words` machine words
struct BinaryTables {
  std::size_t words = 0;   ///< machine words of one word
  std::size_t stride = 0;  ///< room in the block, a multiple of binary_granule
  std::span<const std::uint64_t> block;
  std::span<const std::uint64_t> steps;
};

/// Walks 2^step_digits blocks of the first `block_size` block words.
///   base: holds v at the start, the base word of the last block afterwards
///   counts: n + 1 counters, to which the number of words of each weight is added
using BinaryWalk = Lightest (*)(std::span<std::uint64_t> base, const BinaryTables& tables, std::size_t block_size,
                                std::size_t step_digits, std::span<std::uint64_t> counts) noexcept;

/// Tables of a code over GF(q), q <= 256; symbols are bytes below q.
///   block: symbol j of block word i is block[j * stride + i]; block word 0 is zero
///   steps: counting in base q, the step that raises digit j from a to a + 1 (and resets those below) adds the
///          n symbols from steps[(j * (q - 1) + a) * n] to the *negated* base
///   sums:  a + b is sums[a * q + b]
/// A symbol of base + block word is zero exactly if the block's symbol equals that of the negated base, so no addition
/// is needed inside a block, whatever the field.
struct SymbolTables {
  std::size_t order = 0;   ///< q
  std::size_t stride = 0;  ///< room in the block, a multiple of symbol_granule
  std::span<const std::uint8_t> block;
  std::span<const std::uint8_t> steps;
  std::span<const std::uint8_t> sums;
};

/// Walks q^step_digits blocks of the first `block_size` block words; step_digits is at most 64.
///   negated_base: n symbols, holds -v at the start, minus the base word of the last block afterwards
///   counts: n + 1 counters, to which the number of words of each weight is added
using SymbolWalk = Lightest (*)(std::span<std::uint8_t> negated_base, const SymbolTables& tables,
                                std::size_t block_size, std::size_t step_digits,
                                std::span<std::uint64_t> counts) noexcept;

struct KernelSet {
  std::string_view name;  ///< goes into reports and certificates
  BinaryWalk binary_walk;
  SymbolWalk symbol_walk;
};

const KernelSet& reference();                        ///< plain C++, the yardstick
std::span<const std::string_view> compiled_names();  ///< every build in this program, best first
std::vector<const KernelSet*> runnable_here();       ///< best first, reference last
const KernelSet* find(std::string_view name);        ///< null if unknown or not runnable on this machine

}  // namespace assize::kernel
