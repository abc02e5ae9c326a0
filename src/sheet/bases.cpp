// Normal bases b, b^2, b^4, ... and dual bases: Tr(b_i c_j) = 1 for i = j and 0 otherwise.
#include "sheet/bases.hpp"

#include "field/matrix.hpp"
#include "sheet/elements.hpp"
#include "sheet/table_reader.hpp"

namespace assize::sheet {

namespace {

/// a + a^2 + a^4 + ..., an element of GF(2).
Element trace(const field::Field& field, Element a) {
  Element sum = 0;
  for (std::uint32_t i = 0; i < field.degree(); ++i, a = field.multiply(a, a)) sum = field.add(sum, a);
  return sum;
}

/// The dual basis, or nothing if the elements depend on one another.  With T_ij = Tr(b_i x^j), the coordinates of c_j
/// in the polynomial basis are column j of the inverse of T.
std::optional<Elements> dual_basis(const field::Field& field, const Elements& basis) {
  const std::uint32_t m = field.degree();
  field::Matrix system(m, 2 * m);
  for (std::uint32_t i = 0; i < m; ++i) {
    for (std::uint32_t j = 0; j < m; ++j)
      system.at(i, j) = trace(field, field.multiply(basis[i], static_cast<Element>(1U << j)));
    system.at(i, m + i) = 1;
  }
  const auto pivots = field::reduce_rows(field::Field::binary(), system);
  if (pivots.size() != m || pivots.back() != m - 1) return std::nullopt;
  Elements dual(m, 0);
  for (std::uint32_t j = 0; j < m; ++j)
    for (std::uint32_t i = 0; i < m; ++i)
      if (system.at(i, m + j) != 0) dual[j] = static_cast<Element>(dual[j] | (1U << i));
  return dual;
}

}  // namespace

Result<BinaryImage> read_basis(const Node& node, const field::Field& words, const std::string& source) {
  const std::string where = source + ":" + std::to_string(node.line);
  BinaryImage image;
  if (const auto* text = std::get_if<std::string>(&node.value); text != nullptr && *text == "polynomial") {
    for (std::uint32_t i = 0; i < words.degree(); ++i) image.basis.push_back(static_cast<Element>(1U << i));
    image.as_written = "polynomial";
    return image;
  }
  if (const auto* text = std::get_if<std::string>(&node.value); text != nullptr && *text == "normal")
    return Failure{where, "there are many normal bases, and they give different weights",
                   "name the element: basis = { normal = \"x\" }"};
  if (const auto* entries = std::get_if<Table>(&node.value)) {
    TableReader table(*entries, source, node.line, "basis");
    if (const Node* of = table.optional("dual_of")) {
      const auto basis = read_basis(*of, words, source);
      if (!basis) return basis.error();
      if (const auto done = table.finish(); !done) return done.error();
      auto dual = dual_basis(words, basis->basis);
      if (!dual)
        return Failure{where, "the basis whose dual is wanted is none: its elements depend on one another",
                       "name another"};
      return BinaryImage{*std::move(dual), "dual of " + basis->as_written};
    }
    const auto normal = table.required("normal", "basis = { normal = \"x\" }");
    if (!normal) return normal.error();
    auto element = read_element(**normal, words, source, "normal");
    if (!element) return element.error();
    if (const auto done = table.finish(); !done) return done.error();
    image.as_written = "normal, of " + std::to_string(*element);
    for (std::uint32_t i = 0; i < words.degree(); ++i) {
      image.basis.push_back(*element);
      *element = words.multiply(*element, *element);
    }
    return image;
  }
  auto elements = read_elements(node, words, source, "basis");
  if (!elements) return elements.error();
  if (elements->size() != words.degree())
    return Failure{where,
                   "a basis of GF(" + std::to_string(words.order()) + ") over GF(2) has " +
                       std::to_string(words.degree()) + " elements, not " + std::to_string(elements->size()),
                   "write basis = \"polynomial\" or list the elements"};
  return BinaryImage{*std::move(elements), "as listed"};
}

}  // namespace assize::sheet
