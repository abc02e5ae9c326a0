// Product, direct sum and the (u | u + v) construction (M. Plotkin 1960).
#include <algorithm>

#include "code/families.hpp"

namespace assize::code {

using field::Matrix;

namespace {

/// Rows a_i (x) b_j: array i, j holds a_i down and b_j across, read row after row.
Matrix product(const field::Field& field, const LinearCode& a, const LinearCode& b) {
  Matrix out(std::size_t{a.dimension()} * b.dimension(), std::size_t{a.length()} * b.length());
  for (std::uint32_t i = 0; i < a.dimension(); ++i) {
    const auto down = a.row(i);
    for (std::uint32_t j = 0; j < b.dimension(); ++j) {
      const auto across = b.row(j);
      const auto row = out.row(std::size_t{i} * b.dimension() + j);
      for (std::uint32_t x = 0; x < a.length(); ++x)
        field::add_multiple(field, row.subspan(std::size_t{x} * b.length(), b.length()), down[x], across);
    }
  }
  return out;
}

/// (u, v) for the direct sum, (u, u + v) for Plotkin's.
Matrix sum(const LinearCode& a, const LinearCode& b, bool plotkin) {
  Matrix out(std::size_t{a.dimension()} + b.dimension(), std::size_t{a.length()} + b.length());
  for (std::uint32_t i = 0; i < a.dimension(); ++i) {
    const auto u = a.row(i);
    std::ranges::copy(u, out.row(i).begin());
    if (plotkin) std::ranges::copy(u, out.row(i).begin() + a.length());
  }
  for (std::uint32_t i = 0; i < b.dimension(); ++i)
    std::ranges::copy(b.row(i), out.row(a.dimension() + i).begin() + a.length());
  return out;
}

}  // namespace

Result<LinearCode> build(const sheet::Pair& family, const sheet::Description& in) {
  const auto a = construct(*family.first);
  if (!a) return a.error();
  const auto b = construct(*family.second);
  if (!b) return b.error();
  const std::uint64_t lengths[] = {a->length(), b->length()};
  const std::uint64_t dimensions[] = {a->dimension(), b->dimension()};
  const bool is_product = family.kind == sheet::Pair::Kind::product;
  const std::uint64_t n = is_product ? lengths[0] * lengths[1] : lengths[0] + lengths[1];
  const std::uint64_t k = is_product ? dimensions[0] * dimensions[1] : dimensions[0] + dimensions[1];
  if (const auto fits = check_size(in, family.second_line, k, n); !fits) return fits.error();
  const auto finished = [&](Matrix generator) { return LinearCode(in.field, reduce(in.field, std::move(generator))); };
  switch (family.kind) {
    case sheet::Pair::Kind::product:
      return finished(product(in.field, *a, *b));
    case sheet::Pair::Kind::direct_sum:
      return finished(sum(*a, *b, false));
    case sheet::Pair::Kind::plotkin_sum:
      if (lengths[0] != lengths[1])
        return Failure{in.place(family.second_line),
                       "the codes of a (u | u + v) construction have lengths " + std::to_string(lengths[0]) + " and " +
                           std::to_string(lengths[1]),
                       "use codes of equal length"};
      return finished(sum(*a, *b, true));
  }
  return Failure{in.place(family.second_line), "this pair has no kind", ""};
}

}  // namespace assize::code
