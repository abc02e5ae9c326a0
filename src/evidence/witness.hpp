// An explicit codeword: the whole evidence for an upper bound on the distance.
#pragma once
#include <cstdint>
#include <vector>

namespace assize::evidence {

/// A non-zero word of the code, symbol by symbol (element numbers).
struct Witness {
  std::uint32_t weight = 0;
  std::vector<std::uint16_t> word;
  friend bool operator==(const Witness&, const Witness&) = default;
};

}  // namespace assize::evidence
