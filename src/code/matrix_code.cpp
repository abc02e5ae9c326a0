// Families given by a matrix: written out, orthogonal to one, or drawn at random.
#include <algorithm>

#include "base/digest.hpp"
#include "code/families.hpp"

namespace assize::code {

using field::Element;
using field::Matrix;

namespace {

void notice_rank(LinearCode& code, std::size_t rank, std::size_t rows) {
  if (rank < rows)
    code.structure.notices.push_back("the " + std::to_string(rows) + " rows have rank " + std::to_string(rank) +
                                     ": dependent rows were dropped");
}

/// Draws 16-bit numbers from SHA-256 blocks (certs/FORMAT.md, random-linear).
class Stream {
 public:
  explicit Stream(std::uint64_t seed) : seed_(seed) {}
  std::uint32_t next() {
    if (used_ == block_.size()) refill();
    const auto low = static_cast<unsigned char>(block_[used_]);
    const auto high = static_cast<unsigned char>(block_[used_ + 1]);
    used_ += 2;
    return low + 256U * high;
  }

 private:
  static std::string little_endian(std::uint64_t value) {
    std::string bytes;
    for (int i = 0; i < 8; ++i) bytes += static_cast<char>((value >> (8 * i)) & 0xff);
    return bytes;
  }
  void refill() {
    block_ = Digest{}.absorb("assize random-linear").absorb(little_endian(seed_)).absorb(little_endian(count_++)).raw();
    used_ = 0;
  }
  std::uint64_t seed_;
  std::uint64_t count_ = 0;
  std::string block_;
  std::size_t used_ = 0;
};

}  // namespace

Result<LinearCode> build(const sheet::MatrixRows& family, const sheet::Description& in) {
  const std::size_t columns = family.rows.front().value.size();
  if (const auto fits = check_size(in, family.rows.front().line, family.rows.size(), columns); !fits)
    return fits.error();
  Matrix matrix(family.rows.size(), columns);
  for (std::size_t i = 0; i < matrix.rows(); ++i) std::ranges::copy(family.rows[i].value, matrix.row(i).begin());
  LinearCode code(in.field, reduce(in.field, std::move(matrix)));
  const std::size_t rank = code.dimension();
  if (family.parity_check) {
    if (const auto fits = check_size(in, family.rows.front().line, columns - rank, columns); !fits) return fits.error();
    code = dual(code);
  }
  notice_rank(code, rank, family.rows.size());
  return code;
}

Result<LinearCode> build(const sheet::RandomLinear& family, const sheet::Description& in) {
  const std::uint64_t n = family.codeword_length.value;
  const std::uint64_t k = family.dimension.value;
  if (const auto fits = check_size(in, family.dimension.line, k, n); !fits) return fits.error();
  const std::uint32_t q = in.field.order();
  const std::uint32_t limit = 65536 / q * q;
  Stream stream(family.seed.value);
  Matrix matrix(k, n);
  for (std::size_t i = 0; i < k; ++i)
    for (Element& entry : matrix.row(i)) {
      std::uint32_t number = stream.next();
      while (number >= limit) number = stream.next();
      entry = static_cast<Element>(number % q);
    }
  LinearCode code(in.field, reduce(in.field, std::move(matrix)));
  notice_rank(code, code.dimension(), k);
  return code;
}

}  // namespace assize::code
