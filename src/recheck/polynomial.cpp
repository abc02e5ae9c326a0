// Schoolbook products and divisions, and the multiples of a polynomial by a shift register.
#include "recheck/polynomial.hpp"

#include <algorithm>

namespace assize::recheck {

Polynomial multiply(const Field& field, const Polynomial& a, const Polynomial& b) {
  Polynomial product(a.size() + b.size() - 1, 0);
  for (std::size_t i = 0; i < a.size(); ++i) add_multiple(field, std::span(product).subspan(i, b.size()), a[i], b);
  return product;
}

std::optional<Polynomial> circle_quotient(const Field& field, const Polynomial& divisor, std::size_t length) {
  Polynomial rest(length + 1, 0);
  rest[0] = field.negate(1);
  rest[length] = 1;
  Polynomial quotient(length + 2 - divisor.size(), 0);
  const Symbol scale = field.inverse(divisor.back());
  for (std::size_t shift = quotient.size(); shift-- > 0;) {
    quotient[shift] = field.multiply(rest[shift + divisor.size() - 1], scale);
    add_multiple(field, std::span(rest).subspan(shift, divisor.size()), field.negate(quotient[shift]), divisor);
  }
  if (std::any_of(rest.begin(), rest.end(), [](Symbol symbol) { return symbol != 0; })) return std::nullopt;
  return quotient;
}

Matrix polynomial_multiples(const Field& field, const Polynomial& generator, std::size_t length) {
  const std::size_t degree = generator.size() - 1;
  Polynomial feedback(degree);  // x^degree modulo the generator
  const Symbol scale = field.inverse(generator.back());
  for (std::size_t c = 0; c < degree; ++c) feedback[c] = field.negate(field.multiply(generator[c], scale));

  Matrix rows(length - degree, length);
  Polynomial remainder = feedback;
  for (std::size_t r = rows.rows; r-- > 0;) {  // the remainder of x^(length-1-r)
    rows.row(r)[r] = 1;
    for (std::size_t c = 0; c < degree; ++c) rows.row(r)[length - 1 - c] = field.negate(remainder[c]);
    if (degree == 0) continue;
    const Symbol lead = remainder.back();  // times x
    std::shift_right(remainder.begin(), remainder.end(), 1);
    remainder.front() = 0;
    add_multiple(field, remainder, lead, feedback);
  }
  return rows;
}

}  // namespace assize::recheck
