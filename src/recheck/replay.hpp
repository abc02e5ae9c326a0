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

/// Reads a field: its order and, where the order is not prime, its modulus.
Result<FieldPtr> read_field(const Json& json, const std::string& path);

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
Result<Built> build_bch(Keys& code, const FieldPtr& field, const Brake& brake);
Result<Built> build_quadratic_residue(Keys& code, const FieldPtr& field);
Result<Built> build_quasi_cyclic(Keys& code, const FieldPtr& field, const Brake& brake);
/// Families product, direct-sum and plotkin-sum.
Result<Built> build_of_two(Keys& code, const std::string& family, const FieldPtr& field, const Brake& brake);

/// Applies one step of `then` to a code.
Result<Built> apply_step(const Json& step, const std::string& path, const FieldPtr& field, const Reduced& code,
                         const Brake& brake);

// The steps by what they do; `keys` stands behind the key `step`.
Result<Built> step_on_positions(Keys& keys, const std::string& kind, const FieldPtr& field, const Reduced& code,
                                const Brake& brake);  ///< puncture, shorten, permute, repeat
Result<Built> step_to_other_words(Keys& keys, const std::string& kind, const FieldPtr& field, const Reduced& code,
                                  const Brake& brake);  ///< expurgate, augment, subfield-subcode

/// Row j holds the j-th powers of the points.
Matrix powers_of_points(const Field& field, const std::vector<Symbol>& points, std::size_t dimension);

}  // namespace assize::recheck
