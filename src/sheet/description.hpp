// What a sheet describes, as a plain value: the field, a family with its parameters, the steps after it.
//
// Everything that a sheet leaves open is filled in by the reader, so a description has one meaning and one canonical
// JSON spelling (canonical.hpp).  Values that later rooms may have to refuse keep the line on which they stand.
#pragma once
#include <cstdint>
#include <memory>
#include <optional>
#include <string>
#include <variant>
#include <vector>

#include "field/field.hpp"
#include "field/polynomial.hpp"
#include "sheet/table_reader.hpp"

namespace assize::sheet {

using field::Element;
using Elements = std::vector<Element>;

/// Longest code that is taken on, in symbols.
inline constexpr std::uint32_t largest_length = 1U << 20;

struct Description;
using SubDescription = std::shared_ptr<const Description>;

struct MatrixRows {
  bool parity_check = false;  ///< false: the rows generate the code; true: the code is orthogonal to them
  std::vector<Located<Elements>> rows;
};

struct Cyclic {
  bool shortened = false;
  Located<std::uint64_t> codeword_length;
  Located<field::Polynomial> generator;
  std::string generator_as_written;  ///< for people; the coefficients are what counts
};

struct ReedMuller {
  Located<std::uint64_t> order;
  Located<std::uint64_t> variables;
};

struct ReedSolomonByPoints {
  Located<std::uint64_t> codeword_length;
  Located<std::uint64_t> dimension;
  Located<Elements> evaluation_points;
  Located<Elements> multipliers;
};

struct ReedSolomonByRoots {
  Located<std::uint64_t> codeword_length;
  Located<std::uint64_t> dimension;
  Located<std::uint64_t> first_root;
  Located<std::uint64_t> root_step;
  Located<Element> primitive_element;
};

struct Concatenated {
  SubDescription outer;
  SubDescription inner;
  int inner_line = 0;
  /// Only where the inner field is not prime: the image of its x, and a basis, in the outer field.
  std::optional<Located<Element>> embedding;
  std::optional<Located<Elements>> symbol_basis;
};

struct Justesen {
  Located<std::uint64_t> outer_length;
  Located<std::uint64_t> outer_dimension;
  Located<Elements> evaluation_points;
  Located<Element> primitive_element;
  Located<std::uint64_t> first_exponent;
  bool bits = true;  ///< image = "bits", otherwise "symbols"
};

struct RandomLinear {
  Located<std::uint64_t> codeword_length;
  Located<std::uint64_t> dimension;
  Located<std::uint64_t> seed;
};

using Family = std::variant<MatrixRows, Cyclic, ReedMuller, ReedSolomonByPoints, ReedSolomonByRoots, Concatenated,
                            Justesen, RandomLinear>;

struct Extend {};
struct Dual {};
struct BinaryImage {
  Elements basis;          ///< m elements of GF(2^m)
  std::string as_written;  ///< for people
};

struct Step {
  std::variant<Extend, Dual, BinaryImage> what;
  int line = 0;
};

struct Description {
  std::string title;                            ///< free text, not part of the canonical spelling
  std::string source;                           ///< name of the sheet, for messages
  field::Field field = field::Field::binary();  ///< [field]; of a concatenated code, that of its words
  int field_line = 0;
  bool field_stated = false;  ///< false: GF(2) was filled in
  int code_line = 0;
  Family family;
  std::vector<Step> steps;

  [[nodiscard]] std::string place(int line) const { return source + ":" + std::to_string(line > 0 ? line : code_line); }
};

/// The field of the words after all steps.
field::Field word_field(const Description& description);

}  // namespace assize::sheet
