// Reed-Muller codes: the values of all polynomials of bounded degree in m bits (I. S. Reed, D. E. Muller, 1954).
#include <bit>

#include "code/families.hpp"

namespace assize::code {

Result<LinearCode> build(const sheet::ReedMuller& family, const sheet::Description& in) {
  const std::uint64_t r = family.order.value;
  const std::uint64_t m = family.variables.value;
  if (r > m)
    return Failure{in.place(family.order.line),
                   "the order " + std::to_string(r) + " is larger than the number of variables " + std::to_string(m),
                   "write an order from 0 to " + std::to_string(m)};
  const std::uint32_t n = 1U << m;
  std::vector<std::uint32_t> monomials;
  for (std::uint32_t set = 0; set < n; ++set)
    if (static_cast<std::uint64_t>(std::popcount(set)) <= r) monomials.push_back(set);
  if (const auto fits = check_size(in, family.variables.line, monomials.size(), n); !fits) return fits.error();
  field::Matrix generator(monomials.size(), n);
  for (std::size_t i = 0; i < monomials.size(); ++i)
    for (std::uint32_t point = 0; point < n; ++point)  // the product of the chosen bits of the point
      generator.at(i, point) = (point & monomials[i]) == monomials[i] ? 1 : 0;
  return LinearCode(in.field, reduce(in.field, std::move(generator)));
}

}  // namespace assize::code
