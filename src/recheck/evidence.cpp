// Hands every evidence item to the check of its kind; unknown kinds and versions prove nothing and are left alone.
#include "recheck/evidence.hpp"

namespace assize::recheck {
namespace {

Result<Item> check_item(const Json& json, const std::string& path, const Subject& subject, const Brake& brake,
                        ComponentDistances& known) {
  brake.poll();
  Item item;
  Keys keys(json, path);
  item.kind = keys.text("kind");
  const std::uint64_t version = keys.integer("version");
  item.evidence_class = keys.text("class");
  if (!keys.ok()) return keys.failure();

  const auto expect_class = [&](std::string_view wanted) {
    item.known = true;
    if (item.evidence_class != wanted) keys.refuse("class", "\"" + std::string(wanted) + "\" is expected here");
  };
  Result<void> checked;
  if (version == 1 && item.kind == "witness") {
    expect_class("witness");
    checked = check_witness(keys, subject, item);
  } else if (version == 1 && item.kind == "maximum-distance-separable") {
    expect_class("theorem");
    checked = check_maximum_distance_separable(keys, subject, item);
  } else if (version == 1 && item.kind == "concatenation") {
    expect_class("theorem");
    checked = check_concatenation(keys, subject, brake, known, item);
  } else if (version == 1 && item.kind == "enumeration") {
    expect_class("re-run");
    checked = check_enumeration(keys, subject, brake, item);
  } else {
    item.done = "version " + std::to_string(version) + " of this kind is unknown to this checker";
  }
  if (!checked) return checked.error();
  return item;
}

}  // namespace

Result<std::vector<Item>> check_evidence(const Json::Array& evidence, const Subject& subject, const Brake& brake) {
  std::vector<Item> items;
  ComponentDistances known;
  if (evidence.size() > max_evidence_items) return Failure{"evidence", "there are more than 64 items", ""};
  for (std::size_t i = 0; i < evidence.size(); ++i) {
    auto item = check_item(evidence[i], "evidence[" + std::to_string(i) + "]", subject, brake, known);
    if (!item) return item.error();
    items.push_back(std::move(*item));
  }
  return items;
}

}  // namespace assize::recheck
