// A SAX handler, because the library's own tree keeps the last of duplicate keys in silence.
#include "certificate/strict_json.hpp"

#include <nlohmann/json.hpp>
#include <unordered_set>
#include <variant>

namespace assize::certificate {

namespace {

constexpr std::size_t deepest = 16;
constexpr std::uint64_t largest_integer = (1ULL << 53) - 1;

class Builder : public nlohmann::json_sax<nlohmann::json> {
 public:
  bool null() override { return refuse("null does not occur in a certificate"); }
  bool boolean(bool value) override { return add(Json::boolean(value)); }
  bool number_integer(number_integer_t) override { return refuse("a negative number does not occur in a certificate"); }
  bool number_unsigned(number_unsigned_t value) override {
    if (value > largest_integer) return refuse("an integer is larger than 2^53 - 1");
    return add(Json::integer(value));
  }
  bool number_float(number_float_t, const string_t&) override {
    return refuse("a fraction does not occur in a certificate");
  }
  bool string(string_t& value) override { return add(Json(value)); }
  bool binary(binary_t&) override { return refuse("binary data"); }
  bool start_object(std::size_t) override { return open(Json::Object{}); }
  bool end_object() override { return close(); }
  bool start_array(std::size_t) override { return open(Json::Array{}); }
  bool end_array() override { return close(); }
  bool key(string_t& name) override {
    if (!keys_.back().seen.insert(name).second) return refuse("the key \"" + name + "\" stands twice");
    keys_.back().last = name;
    return true;
  }
  bool parse_error(std::size_t position, const std::string&, const nlohmann::detail::exception&) override {
    return refuse("this is not JSON at byte " + std::to_string(position));
  }

  [[nodiscard]] Result<Json> result() && {
    if (!problem_.empty()) return Failure{"", problem_, "name a certificate written by assize certify"};
    return std::move(whole_);
  }

 private:
  using Open = std::variant<Json::Object, Json::Array>;
  struct Keys {
    std::string last;
    std::unordered_set<std::string> seen;
  };

  bool refuse(std::string problem) {
    if (problem_.empty()) problem_ = std::move(problem);
    return false;
  }
  bool add(Json value) {
    if (open_.empty()) {
      whole_ = std::move(value);
    } else if (auto* array = std::get_if<Json::Array>(&open_.back())) {
      array->push_back(std::move(value));
    } else {
      std::get<Json::Object>(open_.back()).emplace_back(std::move(keys_.back().last), std::move(value));
    }
    return true;
  }
  bool open(Open container) {
    if (open_.size() == deepest) return refuse("nested more than 16 deep");
    open_.push_back(std::move(container));
    keys_.emplace_back();
    return true;
  }
  bool close() {
    Open done = std::move(open_.back());
    open_.pop_back();
    keys_.pop_back();
    return std::visit([this](auto& container) { return add(Json(std::move(container))); }, done);
  }

  std::vector<Open> open_;
  std::vector<Keys> keys_;  ///< of the container at the same place in open_
  Json whole_;
  std::string problem_;
};

}  // namespace

Result<Json> parse_strict_json(std::string_view text) {
  Builder builder;
  nlohmann::json::sax_parse(text.begin(), text.end(), &builder);
  return std::move(builder).result();
}

}  // namespace assize::certificate
