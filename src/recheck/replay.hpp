// From a description (format text, section 4) to the code: one builder for each family, then the steps.
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "recheck/brake.hpp"
#include "recheck/json.hpp"
#include "recheck/keys.hpp"
#include "recheck/reduction.hpp"
#include "recheck/small_field.hpp"

namespace assize::recheck {

/// What the concatenation theorem needs to know about a concatenated or Justesen code.
struct Parts {
  FieldPtr outer_field;
  Reduced outer;
  bool outer_is_reed_solomon = false;  ///< family reed-solomon without steps
  FieldPtr inner_field;
  std::vector<Matrix> inner;  ///< independent rows; one matrix for all outer positions or one for each
};

/// A code as its family gives it: rows that span it, perhaps dependent.
struct Built {
  FieldPtr field;
  Matrix rows;
  std::optional<Parts> parts;
};

/// A code after all steps.
struct Replayed {
  FieldPtr field;
  Reduced reduced;
  std::string family;
  bool has_steps = false;
  std::optional<Matrix> as_written;  ///< family generator-matrix without steps
  std::optional<Parts> parts;        ///< families concatenated and justesen without steps
};

Result<Replayed> replay_description(const Json& description, const std::string& path, const Brake& brake);

// One builder for each family: reads its keys from `code`, whose key `family` has been read.
Result<Built> build_generator_matrix(Keys& code, const FieldPtr& field);
Result<Built> build_parity_check_matrix(Keys& code, const FieldPtr& field, const Brake& brake);
Result<Built> build_cyclic(Keys& code, const FieldPtr& field, bool shortened);
Result<Built> build_reed_muller(Keys& code, const FieldPtr& field);
Result<Built> build_reed_solomon(Keys& code, const FieldPtr& field);
Result<Built> build_concatenated(Keys& code, const FieldPtr& field, const Brake& brake);
Result<Built> build_justesen(Keys& code, const FieldPtr& field, const Brake& brake);
Result<Built> build_random_linear(Keys& code, const FieldPtr& field);

/// Applies one step of `then` to a code.
Result<Built> apply_step(const Json& step, const std::string& path, const FieldPtr& field, const Reduced& code);

/// All multiples of a polynomial of degree < length; position i carries the coefficient of x^(length-1-i).
Matrix polynomial_multiples(const std::vector<Symbol>& generator, std::size_t length);

/// Row j holds the j-th powers of the points.
Matrix powers_of_points(const Field& field, const std::vector<Symbol>& points, std::size_t dimension);

}  // namespace assize::recheck
