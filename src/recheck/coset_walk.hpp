// Counts the weights of all words of a coset v + span(g_1..g_t), one changed row at a time.
//
// An element of GF(p^m) is m digits modulo p, so the span over GF(p^m) of t rows is the span over GF(p) of t m rows:
// the rows times 1, x, x^2, ...  A Gray code over GF(p) then adds exactly one of them per word.
#pragma once
#include <functional>
#include <memory>
#include <span>
#include <vector>

#include "recheck/reduction.hpp"

namespace assize::recheck {

/// Asked every few thousand words; true ends the walk.
using Stopped = std::function<bool()>;

class CosetWalk {
 public:
  virtual ~CosetWalk() = default;
  /// Adds to counts[w] how many words of offset + span(the last `free` of the rows) have weight w.
  /// `counts` has length + 1 entries.  False if it was stopped.
  virtual bool count(std::span<const Symbol> offset, std::size_t free, std::vector<std::uint64_t>& counts,
                     const Stopped& stopped) const = 0;
};

/// A walk over cosets of spans of the last rows of `rows`; q^rows must be below 2^62.
std::unique_ptr<CosetWalk> make_coset_walk(const Field& field, const Matrix& rows);
std::unique_ptr<CosetWalk> make_binary_walk(const Field& field, const Matrix& rows);  ///< characteristic 2
std::unique_ptr<CosetWalk> make_odd_walk(const Field& field, const Matrix& rows);     ///< odd characteristic

/// Adds the weights of all words of normalised messages over `rows`: for each row, that row plus the span of the later
/// ones.  False if it was stopped.
bool count_normalised(const CosetWalk& walk, const Matrix& rows, std::vector<std::uint64_t>& counts,
                      const Stopped& stopped);

/// Least weight of a non-zero word in the span of independent `rows`; q^rows must be at most 2^24.
std::uint64_t least_weight(const Field& field, const Matrix& rows, const Brake& brake);

/// Upper estimate of the time for one word, in picoseconds.
std::uint64_t word_cost_picoseconds(const Field& field, std::size_t length) noexcept;

}  // namespace assize::recheck
