// SHA-256 (FIPS 180-4) over bytes, as lower-case hexadecimal: how a certificate names what it is about.
#pragma once
#include <memory>
#include <string>
#include <string_view>

namespace assize {

/// Accumulates bytes; `hex()` may be called once.
class Digest {
 public:
  Digest();
  ~Digest();
  Digest(Digest&&) noexcept;
  Digest& operator=(Digest&&) noexcept;
  Digest& absorb(std::string_view bytes);
  [[nodiscard]] std::string raw();  ///< 32 bytes
  [[nodiscard]] std::string hex();  ///< 64 lower-case hexadecimal digits

 private:
  struct State;
  std::unique_ptr<State> state_;
};

/// Digest of one piece of text, 64 lower-case hexadecimal digits.
std::string digest_hex(std::string_view bytes);

}  // namespace assize
