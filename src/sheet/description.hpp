// What a sheet describes, as a plain value: the field, a family with its parameters, the steps after it.
//
// Everything that a sheet leaves open is filled in by the reader, so a description has one meaning and one canonical
// JSON spelling (canonical.hpp).  Values that later rooms may have to refuse keep the line on which they stand.
#pragma once
#include <cstdint>
#include <memory>
#include <optional>
#include <string>
#include <utility>
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
  std::string file;                  ///< the matrix file as the sheet names it; empty if the sheet holds the rows
  std::string file_layout;           ///< what the file was read as
  std::vector<std::string> notices;  ///< about the file
};

struct Cyclic {
  bool shortened = false;
  Located<std::uint64_t> codeword_length;
  Located<field::Polynomial> generator;
  std::string generator_as_written;  ///< for people; the coefficients are what counts
};

/// Zeros beta^b .. beta^(b + designed_distance - 2), beta of order n in the root field.
struct Bch {
  Located<std::uint64_t> codeword_length;
  Located<std::uint64_t> designed_distance;
  Located<std::uint64_t> first_exponent;
  Located<field::Polynomial> root_modulus;  ///< over GF(p), degree m t; line 0: the least primitive one, filled in
};

struct QuadraticResidue {
  Located<std::uint64_t> prime;
  field::Polynomial generator;  ///< the lesser of the two
};

/// Circulant blocks by their first rows, or a parity-check matrix by shift exponents.
struct QuasiCyclic {
  enum class Form { blocks, double_circulant, bordered, exponents };
  Form form = Form::blocks;
  bool right = true;                              ///< direction in which each row is moved against the one above
  std::vector<std::vector<Elements>> first_rows;  ///< the grid; one word for double_circulant and bordered
  Element corner = 0;
  Element border = 0;
  std::uint64_t lifting = 0;
  std::vector<std::vector<std::optional<std::uint32_t>>> shifts;  ///< nothing: the zero block
  int line = 0;
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
  std::vector<SubDescription> inner;  ///< one, or one for each outer position
  bool by_position = false;
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

/// A code made of two others over the same field.
struct Pair {
  enum class Kind { product, direct_sum, plotkin_sum };
  Kind kind = Kind::product;
  SubDescription first;
  SubDescription second;
  int second_line = 0;
};

struct RandomLinear {
  Located<std::uint64_t> codeword_length;
  Located<std::uint64_t> dimension;
  Located<std::uint64_t> seed;
};

using Family = std::variant<MatrixRows, Cyclic, Bch, QuadraticResidue, QuasiCyclic, ReedMuller, ReedSolomonByPoints,
                            ReedSolomonByRoots, Concatenated, Justesen, Pair, RandomLinear>;

struct Extend {};
struct Dual {};
struct Expurgate {};
struct Augment {};
struct Puncture {
  std::vector<std::uint32_t> positions;  ///< ascending
};
struct Shorten {
  std::vector<std::uint32_t> positions;  ///< ascending
};
struct Permute {
  std::vector<std::uint32_t> order;  ///< new position i takes the symbol of old position order[i]
};
struct Repeat {
  std::uint64_t times = 1;
};
struct SubfieldSubcode {
  field::Field field;  ///< GF(r)
};
struct BinaryImage {
  Elements basis;          ///< m elements of GF(2^m)
  std::string as_written;  ///< for people
};

struct Step {
  std::variant<Extend, Dual, Puncture, Shorten, Expurgate, Augment, BinaryImage, SubfieldSubcode, Permute, Repeat> what;
  int line = 0;
};

/// Names and values of [transmission]: start value, inversion, reflections.  No distance depends on them.
using Transmission = std::vector<std::pair<std::string, std::string>>;

/// A monomial map that the sheet says is a symmetry; verified where the code is built.
struct StatedSymmetry {
  std::vector<std::uint32_t> permutation;  ///< new position i takes the old position permutation[i]
  Elements multipliers;                    ///< empty: all 1
  int line = 0;
};

struct Description {
  std::string title;                            ///< free text, not part of the canonical spelling
  std::string source;                           ///< name of the sheet, for messages
  field::Field field = field::Field::binary();  ///< [field]; of a code made of others, that of its words
  int field_line = 0;
  bool field_stated = false;  ///< false: GF(2) was filled in
  int code_line = 0;
  Family family;
  std::vector<Step> steps;
  std::vector<StatedSymmetry> symmetries;  ///< not part of the canonical spelling: they say nothing new of the code
  Transmission transmission;               ///< echoed only, not part of the canonical spelling

  [[nodiscard]] std::string place(int line) const { return source + ":" + std::to_string(line > 0 ? line : code_line); }
};

/// The field of the words after all steps; and after a step, given the field before it.
field::Field word_field(const Description& description);
field::Field field_after(const Step& step, const field::Field& before);

}  // namespace assize::sheet
