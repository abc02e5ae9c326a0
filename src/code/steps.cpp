// Steps work on the reduced generator and leave a reduced generator.
#include "code/steps.hpp"

#include "base/overloaded.hpp"
#include "code/coordinates.hpp"
#include "code/families.hpp"

namespace assize::code {

namespace {

using field::Element;
using field::Matrix;

/// Appends minus the sum of all symbols.  A last column never moves a pivot.
LinearCode extend(const LinearCode& code) {
  const field::Field& field = code.field();
  ReducedGenerator out = code.reduced();
  out.others.push_back(out.length++);
  out.tail = Matrix(code.dimension(), out.others.size());
  for (std::uint32_t i = 0; i < code.dimension(); ++i) {
    Element sum = 1;
    for (std::size_t j = 0; j + 1 < out.others.size(); ++j) {
      out.tail.at(i, j) = code.reduced().tail.at(i, j);
      sum = field.add(sum, out.tail.at(i, j));
    }
    out.tail.at(i, out.others.size() - 1) = field.negate(sum);
  }
  return {field, std::move(out)};
}

/// Each symbol becomes its m coordinates.  Row i times basis element l has the l-th unit vector in the block of its
/// pivot, so the image of a reduced generator is reduced.
Result<LinearCode> binary_image(const LinearCode& code, const sheet::BinaryImage& image, const std::string& where) {
  const field::Field& field = code.field();
  const std::uint32_t m = field.degree();
  const auto coordinates = Coordinates::create(field::Field::binary(), field, 1, image.basis);
  if (!coordinates) return Failure{where, coordinates.error().what, coordinates.error().cure};
  ReducedGenerator out;
  out.length = code.length() * m;
  for (const std::uint32_t pivot : code.reduced().pivots)
    for (std::uint32_t l = 0; l < m; ++l) out.pivots.push_back(pivot * m + l);
  for (const std::uint32_t other : code.reduced().others)
    for (std::uint32_t l = 0; l < m; ++l) out.others.push_back(other * m + l);
  out.tail = Matrix(out.pivots.size(), out.others.size());
  for (std::uint32_t i = 0; i < code.dimension(); ++i)
    for (std::uint32_t l = 0; l < m; ++l)
      for (std::uint32_t j = 0; j < code.redundancy(); ++j) {
        const auto bits = coordinates->of(field.multiply(image.basis[l], code.reduced().tail.at(i, j)));
        for (std::uint32_t b = 0; b < m; ++b) out.tail.at(i * m + l, j * m + b) = bits[b];
      }
  return LinearCode(field::Field::binary(), std::move(out));
}

}  // namespace

Result<LinearCode> apply(const sheet::Step& step, const LinearCode& code, const sheet::Description& in) {
  auto result =
      std::visit(Overloaded{
                     [&](const sheet::Extend&) -> Result<LinearCode> {
                       if (const auto fits = check_size(in, step.line, code.dimension(), code.length() + 1ULL); !fits)
                         return fits.error();
                       return extend(code);
                     },
                     [&](const sheet::Dual&) -> Result<LinearCode> {
                       if (const auto fits = check_size(in, step.line, code.redundancy(), code.length()); !fits)
                         return fits.error();
                       return dual(code);
                     },
                     [&](const sheet::BinaryImage& image) -> Result<LinearCode> {
                       const std::uint64_t m = code.field().degree();
                       if (const auto fits = check_size(in, step.line, m * code.dimension(), m * code.length()); !fits)
                         return fits.error();
                       return binary_image(code, image, in.place(step.line));
                     },
                 },
                 step.what);
  if (result) result->structure.notices = code.structure.notices;
  return result;
}

}  // namespace assize::code
