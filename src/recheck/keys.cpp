// Every refusal of a wrong, missing or unknown key is worded here, once.
#include "recheck/keys.hpp"

namespace assize::recheck {
namespace {
const Json nothing{Json::Object{}};
const Json::Array no_items{};
}  // namespace

bool is_digest(std::string_view text) noexcept {
  return text.size() == 64 && text.find_first_not_of("0123456789abcdef") == std::string_view::npos;
}

Keys::Keys(const Json& value, std::string path) : object_(value.object()), path_(std::move(path)) {
  if (object_ == nullptr) failure_ = Failure{path_, "an object is expected here", ""};
}

std::string Keys::at(std::string_view key) const {
  return path_.empty() ? std::string(key) : path_ + "." + std::string(key);
}

void Keys::refuse(std::string_view key, std::string what) {
  if (!failure_) failure_ = Failure{at(key), std::move(what), ""};
}

bool Keys::next_is(std::string_view key) const noexcept {
  return !failure_ && next_ < object_->size() && (*object_)[next_].key == key;
}

const Json* Keys::take(std::string_view key) {
  if (failure_) return nullptr;
  if (next_is(key)) return &(*object_)[next_++].value;
  if (next_ == object_->size())
    refuse(key, "this key is missing");
  else
    refuse((*object_)[next_].key, "the key \"" + std::string(key) + "\" is expected here");
  return nullptr;
}

std::uint64_t Keys::integer(std::string_view key, std::uint64_t smallest, std::uint64_t largest) {
  const Json* value = take(key);
  if (value == nullptr) return smallest;
  const std::uint64_t* number = value->integer();
  if (number != nullptr && *number >= smallest && *number <= largest) return *number;
  if (number == nullptr)
    refuse(key, "an integer is expected here");
  else if (largest >= max_integer)
    refuse(key, "the integer must be at least " + std::to_string(smallest));
  else
    refuse(key, "the integer must be from " + std::to_string(smallest) + " to " + std::to_string(largest));
  return smallest;
}

std::string Keys::text(std::string_view key) {
  const Json* value = take(key);
  if (value == nullptr) return {};
  if (value->text() != nullptr) return *value->text();
  refuse(key, "a string is expected here");
  return {};
}

std::string Keys::digest(std::string_view key) {
  std::string found = text(key);
  if (ok() && !is_digest(found)) refuse(key, "a digest of 64 lower-case hexadecimal digits is expected here");
  return found;
}

BigInteger Keys::count(std::string_view key) {
  const std::string found = text(key);
  if (!ok()) return 0;
  if (auto number = parse_big_decimal(found)) return *number;
  refuse(key, "a count (a string of at most 4096 decimal digits without leading zero) is expected here");
  return 0;
}

const Json::Array& Keys::array(std::string_view key) {
  const Json* value = take(key);
  if (value == nullptr) return no_items;
  if (value->array() != nullptr) return *value->array();
  refuse(key, "an array is expected here");
  return no_items;
}

const Json& Keys::object(std::string_view key) {
  const Json* value = take(key);
  if (value == nullptr) return nothing;
  if (value->object() != nullptr) return *value;
  refuse(key, "an object is expected here");
  return nothing;
}

Result<void> Keys::end() {
  if (!failure_ && next_ < object_->size()) refuse((*object_)[next_].key, "this key is unknown here");
  if (failure_) return *failure_;
  return {};
}

}  // namespace assize::recheck
