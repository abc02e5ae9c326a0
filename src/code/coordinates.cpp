// The table is filled by running through all q^m combinations; if they are all different, the basis is one.
#include "code/coordinates.hpp"

#include <numeric>

namespace assize::code {

using field::Element;

namespace {

/// Image of an element of GF(q) when its x goes to `embedding`.
Element embed(const field::Field& small, const field::Field& large, Element embedding, Element element) {
  Element sum = 0;
  Element power = 1;
  for (const Element digit : small.digits(element)) {
    sum = large.add(sum, large.multiply(digit, power));
    power = large.multiply(power, embedding);
  }
  return sum;
}

}  // namespace

Result<Coordinates> Coordinates::create(const field::Field& small, const field::Field& large, Element embedding,
                                        std::span<const Element> basis) {
  if (small.degree() > 1) {
    Element value = 0;
    for (auto c = small.modulus().rbegin(); c != small.modulus().rend(); ++c)
      value = large.add(large.multiply(value, embedding), *c);
    if (value != 0)
      return Failure{
          "", std::to_string(embedding) + " is not a root of the modulus of GF(" + std::to_string(small.order()) + ")",
          "the image of the small field's x must satisfy its modulus"};
  }
  Coordinates out;
  out.basis_.assign(basis.begin(), basis.end());
  const std::size_t m = basis.size();
  const std::uint64_t q = small.order();
  out.table_.assign(std::size_t{large.order()} * m, 0);
  std::vector<bool> reached(large.order(), false);
  std::vector<Element> images(q);
  for (Element a = 0; a < q; ++a) images[a] = embed(small, large, embedding, a);
  std::vector<Element> digits(m, 0);
  for (std::uint64_t combination = 0; combination < large.order(); ++combination) {
    Element sum = 0;
    for (std::size_t j = 0; j < m; ++j) sum = large.add(sum, large.multiply(images[digits[j]], basis[j]));
    if (reached[sum])
      return Failure{"",
                     "the listed elements are no basis of GF(" + std::to_string(large.order()) + ") over GF(" +
                         std::to_string(q) + "): they depend on one another",
                     "list elements that are linearly independent"};
    reached[sum] = true;
    for (std::size_t j = 0; j < m; ++j) out.table_[sum * m + j] = digits[j];
    for (std::size_t j = 0; j < m && ++digits[j] == q; ++j) digits[j] = 0;
  }
  return out;
}

Coordinates Coordinates::digits(const field::Field& large) {
  std::vector<Element> basis;
  Element power = 1;
  for (std::uint32_t j = 0; j < large.degree(); ++j) {
    basis.push_back(power);
    power = static_cast<Element>(power * large.characteristic());
  }
  Coordinates out;
  out.basis_ = std::move(basis);
  for (std::uint32_t element = 0; element < large.order(); ++element)
    for (const Element digit : large.digits(static_cast<Element>(element))) out.table_.push_back(digit);
  return out;
}

Coordinates Coordinates::identity(const field::Field& field) {
  Coordinates out;
  out.basis_ = {1};
  out.table_.resize(field.order());
  std::iota(out.table_.begin(), out.table_.end(), Element{0});
  return out;
}

}  // namespace assize::code
