// Cyclic codes and their shortened relatives: all multiples of a generator polynomial.
#include "recheck/polynomial.hpp"
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
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
  if (!shortened && !circle_quotient(*field, *generator, length))
    return Failure{at, "the generator does not divide x^n - 1", ""};
  return Built{field, polynomial_multiples(*field, *generator, length), {}};
}

}  // namespace assize::recheck
