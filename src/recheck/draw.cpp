// A shuffle cut short, fed by a SHA-256 counter stream without modulo bias.
#include "recheck/draw.hpp"

#include <algorithm>
#include <numeric>

#include "base/digest.hpp"

namespace assize::recheck {
namespace {

std::uint64_t stream_number(std::uint64_t seed, std::string_view closing_digest, std::uint64_t index) {
  std::string text = "assize-recheck spot ";
  text.append(closing_digest);
  text += " " + std::to_string(seed) + " " + std::to_string(index);
  const std::string raw = Digest{}.absorb(text).raw();
  std::uint64_t number = 0;
  for (std::size_t i = 0; i < 8; ++i) number = number << 8 | static_cast<unsigned char>(raw[i]);
  return number;
}

}  // namespace

std::size_t spot_size(std::size_t present) noexcept {
  return std::min(present, std::max<std::size_t>(12, (present + 15) / 16));
}

std::vector<std::size_t> draw(std::size_t present, std::size_t wanted, std::uint64_t seed,
                              std::string_view closing_digest) {
  std::vector<std::size_t> all(present);
  std::iota(all.begin(), all.end(), std::size_t{0});
  std::uint64_t index = 0;
  for (std::size_t i = 0; i < wanted; ++i) {
    const std::uint64_t left = present - i;
    const std::uint64_t limit = UINT64_MAX / left * left;
    std::uint64_t number = stream_number(seed, closing_digest, index++);
    while (number >= limit) number = stream_number(seed, closing_digest, index++);
    std::swap(all[i], all[i + static_cast<std::size_t>(number % left)]);
  }
  all.resize(wanted);
  std::sort(all.begin(), all.end());
  return all;
}

}  // namespace assize::recheck
