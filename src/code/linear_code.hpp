// A linear code as later rooms see it: a field, a reduced generator, and what is known of the structure.
//
// Only the k x (n - k) part of the reduced generator outside the pivots is stored.  Generator and parity-check matrix
// are both read off it, so that a frame check of 32 bits at 12,144 costs no more than its parity-check matrix.
#pragma once
#include <cstdint>
#include <optional>
#include <span>
#include <string>
#include <vector>

#include "field/field.hpp"
#include "field/matrix.hpp"

namespace assize::code {

/// The generator matrix in reduced row echelon form, pivots leftmost: unit vectors at `pivots`, `tail` elsewhere.
struct ReducedGenerator {
  std::uint32_t length = 0;           ///< n
  std::vector<std::uint32_t> pivots;  ///< k positions, ascending, counted from 0
  std::vector<std::uint32_t> others;  ///< the other n - k positions, ascending
  field::Matrix tail;                 ///< k x (n - k): row i outside the pivots
};

/// Puts any k x n generator into reduced form; rows that depend on others disappear.
ReducedGenerator reduce(const field::Field& field, field::Matrix generator);

/// New position i takes multiplier[i] times the symbol of old position permutation[i].
struct MonomialMap {
  std::string name;                         ///< for people: "cyclic shift"
  std::vector<std::uint32_t> permutation;   ///< each position once
  std::vector<field::Element> multipliers;  ///< none is 0; empty: all 1
};

/// What a theorem may use: the code is a Reed-Solomon code, all of it, without later steps.
struct Structure {
  bool reed_solomon = false;
  std::vector<MonomialMap> symmetries;  ///< verified on the code
  std::vector<std::string> notices;     ///< what a user should know: rank deficiency, zero or repeated columns
};

class LinearCode {
 public:
  LinearCode(field::Field field, ReducedGenerator reduced) : field_(std::move(field)), reduced_(std::move(reduced)) {}

  [[nodiscard]] const field::Field& field() const noexcept { return field_; }
  [[nodiscard]] std::uint32_t order() const noexcept { return field_.order(); }
  [[nodiscard]] std::uint32_t length() const noexcept { return reduced_.length; }
  [[nodiscard]] std::uint32_t dimension() const noexcept { return static_cast<std::uint32_t>(reduced_.pivots.size()); }
  [[nodiscard]] std::uint32_t redundancy() const noexcept { return length() - dimension(); }
  [[nodiscard]] const ReducedGenerator& reduced() const noexcept { return reduced_; }

  /// Row i of the reduced generator, n symbols.
  [[nodiscard]] std::vector<field::Element> row(std::uint32_t i) const;
  /// The k x n reduced generator written out; and an (n - k) x n parity-check matrix.
  [[nodiscard]] field::Matrix generator() const;
  [[nodiscard]] field::Matrix parity_check() const;
  /// The word of a message of k symbols, one for each row of the reduced generator.
  [[nodiscard]] std::vector<field::Element> encode(std::span<const field::Element> message) const;
  [[nodiscard]] bool contains(std::span<const field::Element> word) const;

  /// Digest of the reduced generator as certs/FORMAT.md section 3 spells it.
  [[nodiscard]] std::string reduced_generator_digest() const;

  Structure structure;

 private:
  field::Field field_;
  ReducedGenerator reduced_;
};

/// Number of non-zero symbols.
std::uint32_t weight(std::span<const field::Element> word) noexcept;

/// The code of all words orthogonal to every word of `code`.
LinearCode dual(const LinearCode& code);

}  // namespace assize::code
