// Enumeration evidence without executing it: the plan, the digests, the sums and the closed forms of every shard.
#include "base/digest.hpp"
#include "recheck/evidence.hpp"

namespace assize::recheck {
namespace {

struct Plan {
  std::string reduced_generator_digest;
  std::uint64_t free_rows = 0;
  BigInteger shards;
};

Result<Plan> read_plan(const Json& json, const std::string& path, const Subject& subject) {
  Plan plan;
  Keys keys(json, path);
  plan.reduced_generator_digest = keys.digest("reduced_generator_digest");
  plan.free_rows = keys.integer("free_rows", 0, subject.dimension());
  plan.shards = keys.count("shards");
  if (auto end = keys.end(); !end) return end.error();
  if (plan.reduced_generator_digest != subject.reduced_generator_digest)
    return Failure{keys.at("reduced_generator_digest"), "the plan is for another code", ""};
  const std::uint64_t q = subject.code.field->order();
  if (!ShardForms::expressible(q, plan.free_rows) || !ShardForms::expressible(q, subject.dimension() - plan.free_rows))
    return Failure{path, "the numbers of this plan need more than 4096 digits", ""};
  return plan;
}

/// The digest of the first three members of a shard.
std::string shard_digest(const Json& json) {
  const Json::Object& all = *json.object();
  return digest_hex(spell(Json{Json::Object{all[0], all[1], all[2]}}));
}

Result<Moments> read_moments(const Json::Array& json, const std::string& path) {
  Moments moments;
  if (json.size() != 2) return Failure{path, "an array of two counts is expected here", ""};
  for (std::size_t i = 0; i < 2; ++i) {
    const auto count = json[i].text() != nullptr ? parse_big_decimal(*json[i].text()) : std::nullopt;
    if (!count) return Failure{path + "[" + std::to_string(i) + "]", "a count is expected here", ""};
    (i == 0 ? moments.first : moments.second) = *count;
  }
  return moments;
}

Result<Shard> check_shard(const Json& json, const std::string& path, const ShardForms& forms) {
  Shard shard;
  Keys keys(json, path);
  shard.number = keys.count("number");
  const Json& counts_json = keys.object("counts");
  const Json::Array& moments_json = keys.array("moments");
  const std::string digest = keys.digest("digest");
  if (auto end = keys.end(); !end) return end.error();
  if (shard_digest(json) != digest) return Failure{keys.at("digest"), "the digest is not that of the shard", ""};
  if (shard.number >= forms.shards()) return Failure{keys.at("number"), "the plan has no shard of this number", ""};
  auto counts = read_counts(counts_json, keys.at("counts"), 1, forms.length());
  if (!counts) return counts.error();
  shard.counts = std::move(*counts);
  const auto claimed = read_moments(moments_json, keys.at("moments"));
  if (!claimed) return claimed.error();

  BigInteger words = 0;
  Moments found;
  for (const auto& [weight, count] : shard.counts) {
    words += count;
    found.first += weight * count;
    found.second += weight * weight * count;
  }
  if (words != forms.size(shard.number))
    return Failure{keys.at("counts"), "the counts do not add up to the size of the shard", ""};
  if (found.first != claimed->first || found.second != claimed->second)
    return Failure{keys.at("moments"), "the moments do not follow from the counts", ""};
  const Moments form = forms.moments(shard.number, forms.offset(shard.number));
  if (found.first != form.first || found.second != form.second)
    return Failure{keys.at("counts"), "the moments of these counts differ from their closed forms", ""};
  return shard;
}

void draw_conclusions(const Subject& subject, Item& item) {
  Enumeration& enumeration = *item.enumeration;
  enumeration.complete = enumeration.shards.size() == enumeration.forms->shards();
  if (!enumeration.complete) return;
  const std::uint64_t scalars = subject.code.field->order() - 1;
  for (const Shard& shard : enumeration.shards)
    for (const auto& [weight, count] : shard.counts) enumeration.distribution[weight] += count * scalars;
  item.at_least = item.at_most = enumeration.distribution.begin()->first;
  enumeration.distribution[0] = 1;
}

}  // namespace

Result<void> check_enumeration(Keys& keys, const Subject& subject, const Brake& brake, Item& item) {
  const Json& plan_json = keys.object("plan");
  const std::string plan_digest = keys.digest("plan_digest");
  const Json::Array& shards = keys.array("shards");
  if (auto end = keys.end(); !end) return end.error();
  const auto plan = read_plan(plan_json, keys.at("plan"), subject);
  if (!plan) return plan.error();
  if (digest_hex(spell(plan_json)) != plan_digest)
    return Failure{keys.at("plan_digest"), "the digest is not that of the plan", ""};

  Enumeration& enumeration = item.enumeration.emplace();
  enumeration.forms = std::make_shared<const ShardForms>(subject.code.field, subject.code.reduced, plan->free_rows);
  if (plan->shards != enumeration.forms->shards())
    return Failure{keys.at("plan.shards"), "a plan with these free rows has another number of shards", ""};
  for (std::size_t i = 0; i < shards.size(); ++i) {
    brake.poll();
    const std::string path = keys.at("shards") + "[" + std::to_string(i) + "]";
    auto shard = check_shard(shards[i], path, *enumeration.forms);
    if (!shard) return shard.error();
    if (i > 0 && shard->number <= enumeration.shards.back().number)
      return Failure{path + ".number", "the shard numbers do not ascend", ""};
    enumeration.shards.push_back(std::move(*shard));
  }
  draw_conclusions(subject, item);
  return {};
}

}  // namespace assize::recheck
