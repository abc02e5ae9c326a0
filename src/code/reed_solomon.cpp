// Reed-Solomon codes by evaluation points or by roots (I. S. Reed, G. Solomon, J. SIAM 8, 1960).
#include "code/reed_solomon.hpp"

#include <numeric>

#include "code/families.hpp"

namespace assize::code {

using field::Element;

LinearCode evaluation_code(const field::Field& field, std::uint32_t k, std::span<const Element> points,
                           std::span<const Element> multipliers) {
  const auto n = static_cast<std::uint32_t>(points.size());
  ReducedGenerator out;
  out.length = n;
  for (std::uint32_t i = 0; i < k; ++i) out.pivots.push_back(i);
  for (std::uint32_t j = k; j < n; ++j) out.others.push_back(j);
  out.tail = field::Matrix(k, n - k);
  // Lagrange: the row with a 1 at point i comes from the polynomial that vanishes at the first k points except i.
  std::vector<Element> scale(k);
  for (std::uint32_t i = 0; i < k; ++i) {
    Element product = multipliers[i];
    for (std::uint32_t m = 0; m < k; ++m)
      if (m != i) product = field.multiply(product, field.subtract(points[i], points[m]));
    scale[i] = field.inverse(product);
  }
  for (std::uint32_t j = k; j < n; ++j) {
    Element product = multipliers[j];
    for (std::uint32_t m = 0; m < k; ++m) product = field.multiply(product, field.subtract(points[j], points[m]));
    for (std::uint32_t i = 0; i < k; ++i)
      out.tail.at(i, j - k) = field.multiply(field.divide(product, field.subtract(points[j], points[i])), scale[i]);
  }
  return {field, std::move(out)};
}

Result<void> check_points(const field::Field& field, std::span<const Element> points, std::uint64_t wanted,
                          const std::string& where) {
  if (points.size() != wanted)
    return Failure{
        where,
        std::to_string(points.size()) + " evaluation points are listed, " + std::to_string(wanted) + " are needed",
        "list one point for each position"};
  std::vector<bool> seen(field.order(), false);
  for (const Element point : points) {
    if (seen[point])
      return Failure{where, "the evaluation point " + std::to_string(point) + " stands twice",
                     "evaluation points must be distinct"};
    seen[point] = true;
  }
  return {};
}

namespace {

Result<void> check_dimension(const sheet::Description& in, const sheet::Located<std::uint64_t>& n,
                             const sheet::Located<std::uint64_t>& k) {
  if (k.value > n.value)
    return Failure{in.place(k.line),
                   "the dimension " + std::to_string(k.value) + " is larger than the length " + std::to_string(n.value),
                   "write a dimension from 1 to " + std::to_string(n.value)};
  return check_size(in, k.line, k.value, n.value);
}

}  // namespace

Result<LinearCode> build(const sheet::ReedSolomonByPoints& family, const sheet::Description& in) {
  const auto points = std::span<const Element>(family.evaluation_points.value);
  const auto multipliers = std::span<const Element>(family.multipliers.value);
  if (const auto fits = check_dimension(in, family.codeword_length, family.dimension); !fits) return fits.error();
  if (const auto fine =
          check_points(in.field, points, family.codeword_length.value, in.place(family.evaluation_points.line));
      !fine)
    return fine.error();
  if (multipliers.size() != points.size())
    return Failure{in.place(family.multipliers.line),
                   std::to_string(multipliers.size()) + " multipliers are listed, " + std::to_string(points.size()) +
                       " are needed",
                   "list one multiplier for each position, or none at all"};
  for (const Element multiplier : multipliers)
    if (multiplier == 0)
      return Failure{in.place(family.multipliers.line), "a multiplier is 0", "multipliers must not be 0"};
  LinearCode code = evaluation_code(in.field, static_cast<std::uint32_t>(family.dimension.value), points, multipliers);
  code.structure.reed_solomon = true;
  return code;
}

Result<LinearCode> build(const sheet::ReedSolomonByRoots& family, const sheet::Description& in) {
  if (const auto fits = check_dimension(in, family.codeword_length, family.dimension); !fits) return fits.error();
  const field::Field& field = in.field;
  const std::uint64_t n = family.codeword_length.value;
  const std::uint64_t group = field.order() - 1;
  if (n > group)
    return Failure{in.place(family.codeword_length.line),
                   "by roots, a Reed-Solomon code over GF(" + std::to_string(field.order()) + ") has at most " +
                       std::to_string(group) + " symbols, not " + std::to_string(n),
                   "make codeword_length smaller or the field larger"};
  const Element a = family.primitive_element.value;
  if (!field.is_primitive(a))
    return Failure{in.place(family.primitive_element.line), std::to_string(a) + " is not a primitive element",
                   "the least primitive element is " + std::to_string(field.least_primitive_element())};
  if (std::gcd(family.root_step.value, group) != 1)
    return Failure{
        in.place(family.root_step.line),
        "root_step " + std::to_string(family.root_step.value) + " has a factor in common with " + std::to_string(group),
        "then the roots repeat; write a step without a common factor"};
  const Element step = field.power(a, family.root_step.value);
  field::Polynomial generator{1};
  for (std::uint64_t j = 0; j < n - family.dimension.value; ++j) {
    const Element root = field.power(step, family.first_root.value + j);
    generator = field::multiply(field, generator, {field.negate(root), 1});
  }
  LinearCode code = polynomial_code(field, static_cast<std::uint32_t>(n), generator);
  code.structure.reed_solomon = true;
  return code;
}

}  // namespace assize::code
