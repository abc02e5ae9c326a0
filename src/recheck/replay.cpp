// Reads a description: its field, its family, its steps.
#include "recheck/replay.hpp"

#include "recheck/word.hpp"

namespace assize::recheck {

Result<FieldPtr> read_field(const Json& json, const std::string& path) {
  Keys keys(json, path);
  const std::uint64_t order = keys.integer("order", 2, 65536);
  std::vector<Symbol> modulus;
  if (keys.ok() && keys.next_is("modulus")) {
    std::uint32_t p = 2;
    while (order % p != 0) ++p;
    auto read = read_polynomial(keys.text("modulus"), p, keys.at("modulus"));
    if (!read) return read.error();
    modulus = std::move(*read);
  }
  if (auto end = keys.end(); !end) return end.error();
  return Field::make(order, std::move(modulus), path);
}

namespace {

Result<Built> build_family(Keys& code, const std::string& family, const FieldPtr& field, const Brake& brake) {
  if (family == "generator-matrix") return build_generator_matrix(code, field);
  if (family == "parity-check-matrix") return build_parity_check_matrix(code, field, brake);
  if (family == "cyclic") return build_cyclic(code, field, false);
  if (family == "shortened-cyclic") return build_cyclic(code, field, true);
  if (family == "reed-muller") return build_reed_muller(code, field);
  if (family == "reed-solomon") return build_reed_solomon(code, field);
  if (family == "concatenated") return build_concatenated(code, field, brake);
  if (family == "justesen") return build_justesen(code, field, brake);
  if (family == "random-linear") return build_random_linear(code, field);
  if (family == "bch") return build_bch(code, field, brake);
  if (family == "quadratic-residue") return build_quadratic_residue(code, field);
  if (family == "quasi-cyclic") return build_quasi_cyclic(code, field, brake);
  if (family == "product" || family == "direct-sum" || family == "plotkin-sum")
    return build_of_two(code, family, field, brake);
  code.refuse("family", "the family \"" + family + "\" is unknown");
  return code.failure();
}

}  // namespace

Result<Replayed> replay_description(const Json& description, const std::string& path, const Brake& brake) {
  brake.poll();
  Keys keys(description, path);
  const Json& field_json = keys.object("field");
  const Json& code_json = keys.object("code");
  const bool has_steps = keys.next_is("then");
  const Json::Array no_steps;
  const Json::Array& steps = has_steps ? keys.array("then") : no_steps;
  if (auto end = keys.end(); !end) return end.error();
  if (has_steps && steps.empty()) return Failure{keys.at("then"), "a list of steps is not empty", "leave the key out"};

  const auto field = read_field(field_json, keys.at("field"));
  if (!field) return field.error();
  Keys code(code_json, keys.at("code"));
  Replayed result;
  result.family = code.text("family");
  result.has_steps = has_steps;
  if (!code.ok()) return code.failure();
  auto built = build_family(code, result.family, *field, brake);
  if (!built) return built.error();

  if (!has_steps) {
    if (result.family == "generator-matrix") result.as_written = built->rows;
    result.parts = std::move(built->parts);
  }
  result.field = built->field;
  result.reduced = reduce(*result.field, std::move(built->rows), brake);
  for (std::size_t i = 0; i < steps.size(); ++i) {
    brake.poll();
    const std::string at = keys.at("then") + "[" + std::to_string(i) + "]";
    auto next = apply_step(steps[i], at, result.field, result.reduced, brake);
    if (!next) return next.error();
    result.field = next->field;
    result.reduced = reduce(*result.field, std::move(next->rows), brake);
  }
  if (result.reduced.pivots.empty()) return Failure{path, "the code has dimension 0", ""};
  return result;
}

}  // namespace assize::recheck
