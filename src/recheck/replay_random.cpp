// Random linear codes: a matrix drawn from a SHA-256 counter stream, so that everybody draws the same one.
#include "base/digest.hpp"
#include "recheck/replay.hpp"

namespace assize::recheck {
namespace {

void append_bytes(std::string& text, std::uint64_t number) {
  for (int i = 0; i < 8; ++i) text += static_cast<char>(static_cast<unsigned char>(number >> (8 * i) & 0xff));
}

class Stream {
 public:
  explicit Stream(std::uint64_t seed) : seed_(seed) {}
  /// The next number below 65536.
  std::uint32_t next() {
    if (used_ == block_.size()) {
      std::string text = "assize random-linear";
      append_bytes(text, seed_);
      append_bytes(text, number_++);
      block_ = Digest{}.absorb(text).raw();
      used_ = 0;
    }
    const auto low = static_cast<unsigned char>(block_[used_]);
    const auto high = static_cast<unsigned char>(block_[used_ + 1]);
    used_ += 2;
    return std::uint32_t{low} | std::uint32_t{high} << 8;
  }

 private:
  std::uint64_t seed_;
  std::uint64_t number_ = 0;
  std::string block_;
  std::size_t used_ = 0;
};

}  // namespace

Result<Built> build_random_linear(Keys& code, const FieldPtr& field) {
  const std::uint64_t length = code.integer("codeword_length", 1, max_length);
  const std::uint64_t dimension = code.integer("dimension", 1, length);
  const std::uint64_t seed = code.integer("seed");
  if (auto end = code.end(); !end) return end.error();
  if (auto fits = matrix_fits(dimension, length, code.path()); !fits) return fits.error();
  const std::uint32_t q = field->order();
  const std::uint32_t bound = 65536 / q * q;
  Stream stream(seed);
  Matrix rows(dimension, length);
  for (Symbol& symbol : rows.symbols) {
    std::uint32_t number = stream.next();
    while (number >= bound) number = stream.next();
    symbol = static_cast<Symbol>(number % q);
  }
  return Built{field, std::move(rows), {}};
}

}  // namespace assize::recheck
