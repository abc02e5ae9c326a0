// The digest is libsodium's; only this file includes it for hashing.
#include "base/digest.hpp"

#include <sodium.h>

#include "base/contract.hpp"

namespace assize {

struct Digest::State {
  crypto_hash_sha256_state inner;
};

Digest::Digest() : state_(std::make_unique<State>()) {
  contract(sodium_init() >= 0, "the cryptographic library starts");
  crypto_hash_sha256_init(&state_->inner);
}
Digest::~Digest() = default;
Digest::Digest(Digest&&) noexcept = default;
Digest& Digest::operator=(Digest&&) noexcept = default;

Digest& Digest::absorb(std::string_view bytes) {
  crypto_hash_sha256_update(&state_->inner, reinterpret_cast<const unsigned char*>(bytes.data()), bytes.size());
  return *this;
}

std::string Digest::raw() {
  std::string out(crypto_hash_sha256_BYTES, '\0');
  crypto_hash_sha256_final(&state_->inner, reinterpret_cast<unsigned char*>(out.data()));
  return out;
}

std::string Digest::hex() {
  static constexpr char digits[] = "0123456789abcdef";
  std::string out;
  for (const char byte : raw()) {
    const auto value = static_cast<unsigned char>(byte);
    out += digits[value >> 4];
    out += digits[value & 15];
  }
  return out;
}

std::string digest_hex(std::string_view bytes) { return Digest{}.absorb(bytes).hex(); }

}  // namespace assize
