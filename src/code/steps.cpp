// Steps on codes: each takes a reduced generator and leaves one.
#include "code/steps.hpp"

#include <algorithm>

#include "code/coordinates.hpp"
#include "code/families.hpp"
#include "field/polynomial.hpp"

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

LinearCode select(const LinearCode& code, const std::vector<std::uint32_t>& columns) {
  const Matrix full = code.generator();
  Matrix out(full.rows(), columns.size());
  for (std::size_t i = 0; i < full.rows(); ++i)
    for (std::size_t j = 0; j < columns.size(); ++j) out.at(i, j) = full.at(i, columns[j]);
  return {code.field(), reduce(code.field(), std::move(out))};
}

std::vector<std::uint32_t> all_but(std::uint32_t length, const std::vector<std::uint32_t>& positions) {
  std::vector<std::uint32_t> out;
  for (std::uint32_t i = 0; i < length; ++i)
    if (!std::ranges::binary_search(positions, i)) out.push_back(i);
  return out;
}

/// Words that are zero in the first `count` columns of `generator`, without those columns.
LinearCode vanishing(const field::Field& field, Matrix generator, std::size_t count) {
  const std::size_t length = generator.columns() - count;
  const auto pivots = field::reduce_rows(field, generator);
  const auto first = static_cast<std::size_t>(std::ranges::lower_bound(pivots, count) - pivots.begin());
  Matrix out(pivots.size() - first, length);
  for (std::size_t i = 0; i < out.rows(); ++i)
    std::ranges::copy(generator.row(first + i).subspan(count), out.row(i).begin());
  return {field, reduce(field, std::move(out))};
}

LinearCode shorten(const LinearCode& code, const std::vector<std::uint32_t>& positions) {
  std::vector<std::uint32_t> order = positions;
  for (const std::uint32_t other : all_but(code.length(), positions)) order.push_back(other);
  const Matrix full = code.generator();
  Matrix moved(full.rows(), full.columns());
  for (std::size_t i = 0; i < full.rows(); ++i)
    for (std::size_t j = 0; j < order.size(); ++j) moved.at(i, j) = full.at(i, order[j]);
  return vanishing(code.field(), std::move(moved), positions.size());
}

/// The symbol sum is put in front; the words wanted are zero there.
LinearCode expurgate(const LinearCode& code) {
  const Matrix full = code.generator();
  Matrix with_sum(full.rows(), full.columns() + 1);
  for (std::size_t i = 0; i < full.rows(); ++i) {
    Element sum = 0;
    for (const Element symbol : full.row(i)) sum = code.field().add(sum, symbol);
    with_sum.at(i, 0) = sum;
    std::ranges::copy(full.row(i), with_sum.row(i).begin() + 1);
  }
  return vanishing(code.field(), std::move(with_sum), 1);
}

LinearCode augment(const LinearCode& code) {
  Matrix rows = code.generator();
  rows.resize_rows(rows.rows() + 1);
  std::ranges::fill(rows.row(rows.rows() - 1), Element{1});
  return {code.field(), reduce(code.field(), std::move(rows))};
}

LinearCode repeat(const LinearCode& code, std::uint64_t times) {
  std::vector<std::uint32_t> columns;
  for (std::uint64_t t = 0; t < times; ++t)
    for (std::uint32_t i = 0; i < code.length(); ++i) columns.push_back(i);
  return select(code, columns);
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

/// The image of GF(r)'s x: the least root of its modulus in the large field.
Element least_root(const field::Field& small, const field::Field& large) {
  if (small.degree() == 1) return 1;
  const field::Polynomial modulus(small.modulus().begin(), small.modulus().end());
  for (std::uint32_t a = 0; a < large.order(); ++a)
    if (field::evaluate(large, modulus, static_cast<Element>(a)) == 0) return static_cast<Element>(a);
  contract(false, "a subfield's modulus has a root in the large field");
  return 0;
}

/// A word over GF(r) is orthogonal to a row over GF(q) if it is orthogonal to each of the row's coordinates over GF(r).
LinearCode subfield_subcode(const LinearCode& code, const field::Field& small) {
  const field::Field& large = code.field();
  const std::uint32_t m = large.degree() / small.degree();
  std::vector<Element> basis;  // 1, g, g^2, ... for a primitive g
  for (Element power = 1; basis.size() < m; power = large.multiply(power, large.least_primitive_element()))
    basis.push_back(power);
  const auto coordinates = Coordinates::create(small, large, least_root(small, large), basis);
  contract(coordinates.has_value(), "powers of a primitive element are a basis over every subfield");
  const Matrix check = code.parity_check();
  Matrix expanded(check.rows() * m, check.columns());
  for (std::size_t i = 0; i < check.rows(); ++i)
    for (std::size_t j = 0; j < check.columns(); ++j) {
      const auto parts = coordinates->of(check.at(i, j));
      for (std::uint32_t l = 0; l < m; ++l) expanded.at(i * m + l, j) = parts[l];
    }
  return dual(LinearCode(small, reduce(small, std::move(expanded))));
}

/// Applies one step; sizes and positions are checked before anything is built.
struct Application {
  const LinearCode& code;
  const sheet::Description& in;
  int line;

  [[nodiscard]] Result<void> fits(std::uint64_t rows, std::uint64_t columns) const {
    return check_size(in, line, rows, columns);
  }
  [[nodiscard]] Result<void> positions_exist(const std::vector<std::uint32_t>& positions) const {
    if (positions.back() >= code.length())
      return Failure{in.place(line), "there is no position " + std::to_string(positions.back()),
                     "the words have " + std::to_string(code.length()) + " symbols, counted from 0"};
    if (positions.size() == code.length())
      return Failure{in.place(line), "no position would be left", "name fewer positions"};
    return {};
  }

  Result<LinearCode> operator()(const sheet::Extend&) const {
    if (const auto fine = fits(code.dimension(), code.length() + 1ULL); !fine) return fine.error();
    return extend(code);
  }
  Result<LinearCode> operator()(const sheet::Dual&) const {
    if (const auto fine = fits(code.redundancy(), code.length()); !fine) return fine.error();
    return dual(code);
  }
  Result<LinearCode> operator()(const sheet::Puncture& step) const {
    if (const auto fine = positions_exist(step.positions); !fine) return fine.error();
    return select(code, all_but(code.length(), step.positions));
  }
  Result<LinearCode> operator()(const sheet::Shorten& step) const {
    if (const auto fine = positions_exist(step.positions); !fine) return fine.error();
    return shorten(code, step.positions);
  }
  Result<LinearCode> operator()(const sheet::Expurgate&) const { return expurgate(code); }
  Result<LinearCode> operator()(const sheet::Augment&) const {
    if (const auto fine = fits(code.dimension() + 1ULL, code.length()); !fine) return fine.error();
    return augment(code);
  }
  Result<LinearCode> operator()(const sheet::BinaryImage& image) const {
    const std::uint64_t m = code.field().degree();
    if (const auto fine = fits(m * code.dimension(), m * code.length()); !fine) return fine.error();
    return binary_image(code, image, in.place(line));
  }
  Result<LinearCode> operator()(const sheet::SubfieldSubcode& step) const {
    const std::uint64_t m = code.field().degree() / step.field.degree();
    if (const auto fine = fits(std::max<std::uint64_t>(m * code.redundancy(), code.length()), code.length()); !fine)
      return fine.error();
    return subfield_subcode(code, step.field);
  }
  Result<LinearCode> operator()(const sheet::Permute& step) const {
    if (step.order.size() != code.length() || *std::ranges::max_element(step.order) >= code.length())
      return Failure{in.place(line),
                     "the order does not name each of the " + std::to_string(code.length()) + " positions once",
                     "list all positions from 0 to " + std::to_string(code.length() - 1)};
    return select(code, step.order);
  }
  Result<LinearCode> operator()(const sheet::Repeat& step) const {
    if (const auto fine = fits(code.dimension(), code.length() * step.times); !fine) return fine.error();
    return repeat(code, step.times);
  }
};

}  // namespace

Result<LinearCode> apply(const sheet::Step& step, const LinearCode& code, const sheet::Description& in) {
  auto result = std::visit(Application{code, in, step.line}, step.what);
  if (result) result->structure.notices = code.structure.notices;
  return result;
}

}  // namespace assize::code
