// The sizes beyond which nothing is read or built, so that no certificate can exhaust the machine that checks it.
//
// They are part of the format (sections 1 and 4); a certificate beyond them is not a certificate.
#pragma once
#include <cstdint>
#include <string>

#include "base/result.hpp"

namespace assize::recheck {

inline constexpr std::uint64_t max_bytes = std::uint64_t{16} << 20;
inline constexpr std::uint64_t max_levels = 16;
inline constexpr std::uint64_t max_values = std::uint64_t{1} << 21;
inline constexpr std::uint64_t max_integer = (std::uint64_t{1} << 53) - 1;
inline constexpr std::uint64_t max_length = std::uint64_t{1} << 20;
inline constexpr std::uint64_t max_symbols = std::uint64_t{1} << 27;
inline constexpr std::uint64_t max_evidence_items = 64;
inline constexpr std::uint64_t max_enumerated_words = std::uint64_t{1} << 24;  ///< of a component code of a theorem

/// A matrix of `rows` x `columns` may be built; both numbers must be below 2^53.
inline Result<void> matrix_fits(std::uint64_t rows, std::uint64_t columns, const std::string& where) {
  if (columns > max_length) return Failure{where, "the code is longer than 2^20", "see the limits of section 4"};
  if (rows > max_symbols || rows * columns > max_symbols)
    return Failure{where, "a matrix has more than 2^27 symbols", "see the limits of section 4"};
  return {};
}

}  // namespace assize::recheck
