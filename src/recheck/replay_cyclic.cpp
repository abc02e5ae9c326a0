// Cyclic codes and their shortened relatives: all multiples of a generator polynomial.
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

/// The polynomial divides x^length - 1.
bool divides_circle(const Field& field, const std::vector<Symbol>& divisor, std::size_t length) {
  std::vector<Symbol> rest(length + 1, 0);
  rest[0] = field.negate(1);
  rest[length] = 1;
  const Symbol scale = field.inverse(divisor.back());
  for (std::size_t top = length + 1; top-- >= divisor.size();) {
    const Symbol factor = field.negate(field.multiply(rest[top], scale));
    add_multiple(field, std::span(rest).subspan(top + 1 - divisor.size(), divisor.size()), factor, divisor);
  }
  for (const Symbol symbol : rest)
    if (symbol != 0) return false;
  return true;
}

}  // namespace

Matrix polynomial_multiples(const std::vector<Symbol>& generator, std::size_t length) {
  const std::size_t degree = generator.size() - 1;
  Matrix rows(length - degree, length);
  for (std::size_t r = 0; r < rows.rows; ++r)
    for (std::size_t c = 0; c <= degree; ++c) rows.row(r)[length - 1 - (r + c)] = generator[c];
  return rows;
}

Result<Built> build_cyclic(Keys& code, const FieldPtr& field, bool shortened) {
  const std::uint64_t length = code.integer("codeword_length", 1, max_length);
  const std::string text = code.text("generator");
  if (auto end = code.end(); !end) return end.error();
  const std::string at = code.at("generator");
  const auto generator = read_polynomial(text, field->order(), at);
  if (!generator) return generator.error();
  const std::uint64_t degree = generator->size() - 1;
  if (degree > length || (shortened && degree == length))
    return Failure{at, "the degree of the generator is too large for the length", ""};
  if (auto fits = matrix_fits(length - degree, length, code.path()); !fits) return fits.error();
  if (shortened && generator->front() == 0) return Failure{at, "the generator is divisible by x", ""};
  if (!shortened && !divides_circle(*field, *generator, length))
    return Failure{at, "the generator does not divide x^n - 1", ""};
  return Built{field, polynomial_multiples(*generator, length), {}};
}

}  // namespace assize::recheck
