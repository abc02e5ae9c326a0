// Strict reading of JSON: the tokens come from nlohmann-json's event interface, the tree and every refusal are ours.
//
// The event parser keeps no call stack, so deep nesting cannot exhaust memory before the level check refuses it.
#include <algorithm>
#include <nlohmann/json.hpp>

#include "recheck/json.hpp"
#include "recheck/limits.hpp"

namespace assize::recheck {
namespace {

using Event = nlohmann::json;

class TreeBuilder final : public nlohmann::json_sax<Event> {
 public:
  bool null() override { return refuse("null does not occur in a certificate"); }
  bool boolean(bool flag) override { return add(Json{flag}); }
  bool number_integer(number_integer_t) override { return refuse("numbers have no sign"); }
  bool number_unsigned(number_unsigned_t number) override {
    if (number > max_integer) return refuse("an integer is above 2^53 - 1");
    return add(Json{static_cast<std::uint64_t>(number)});
  }
  bool number_float(number_float_t, const string_t&) override {
    return refuse("only integers from 0 to 2^53 - 1 occur");
  }
  bool string(string_t& text) override { return add(Json{std::move(text)}); }
  bool binary(binary_t&) override { return refuse("binary values do not occur"); }
  bool start_object(std::size_t) override { return open(Json{Json::Object{}}); }
  bool start_array(std::size_t) override { return open(Json{Json::Array{}}); }
  bool key(string_t& text) override {
    if (std::any_of(text.begin(), text.end(), [](char c) { return static_cast<unsigned char>(c) >= 0x80; }))
      return refuse("a key is not ASCII");
    open_.back().key = std::move(text);
    return true;
  }
  bool end_object() override {
    std::vector<std::string_view> keys;
    for (const Member& member : *std::get_if<Json::Object>(&open_.back().value.value)) keys.push_back(member.key);
    std::sort(keys.begin(), keys.end());
    const auto twice = std::adjacent_find(keys.begin(), keys.end());
    if (twice != keys.end()) return refuse("the key \"" + std::string(*twice) + "\" occurs twice");
    return close();
  }
  bool end_array() override { return close(); }
  bool parse_error(std::size_t position, const std::string&, const nlohmann::detail::exception&) override {
    failure_ = Failure{"byte " + std::to_string(position == 0 ? 0 : position - 1), "this is not JSON in UTF-8", ""};
    return false;
  }

  [[nodiscard]] const std::optional<Failure>& failure() const noexcept { return failure_; }
  [[nodiscard]] Json take() { return std::move(root_); }

 private:
  struct Level {
    Json value;
    std::string key;  // of the member being read, for objects
  };

  [[nodiscard]] std::string place() const {
    std::string path;
    for (const Level& level : open_)
      if (const auto* array = level.value.array())
        path += "[" + std::to_string(array->size()) + "]";
      else
        path += (path.empty() ? "" : ".") + level.key;
    return path.empty() ? "the top value" : path;
  }
  bool refuse(std::string what) {
    failure_ = Failure{place(), std::move(what), ""};
    return false;
  }
  bool add(Json value) {
    if (++values_ > max_values) return refuse("there are more than 2^21 values");
    if (open_.empty()) {
      root_ = std::move(value);
    } else if (auto* array = std::get_if<Json::Array>(&open_.back().value.value)) {
      array->push_back(std::move(value));
    } else if (auto* object = std::get_if<Json::Object>(&open_.back().value.value)) {
      object->push_back(Member{std::move(open_.back().key), std::move(value)});
      open_.back().key.clear();
    }
    return true;
  }
  bool open(Json value) {
    if (open_.size() >= max_levels) return refuse("values are nested deeper than 16 levels");
    open_.push_back(Level{std::move(value), {}});
    return true;
  }
  bool close() {
    Json value = std::move(open_.back().value);
    open_.pop_back();
    return add(std::move(value));
  }

  Json root_;
  std::vector<Level> open_;
  std::uint64_t values_ = 0;
  std::optional<Failure> failure_;
};

}  // namespace

Result<Json> parse(std::string_view bytes) {
  if (bytes.empty()) return Failure{"byte 0", "the certificate is empty", ""};
  if (bytes.size() > max_bytes) return Failure{"", "a certificate is at most 16 MiB long", ""};
  if (bytes.starts_with("\xef\xbb\xbf")) return Failure{"byte 0", "a certificate has no byte order mark", ""};
  TreeBuilder builder;
  if (!Event::sax_parse(bytes.begin(), bytes.end(), &builder)) {
    if (builder.failure()) return *builder.failure();
    return Failure{"", "this is not JSON in UTF-8", ""};
  }
  return builder.take();
}

}  // namespace assize::recheck
