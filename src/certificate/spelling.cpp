// One function for each kind of statement and of evidence.
#include "certificate/spelling.hpp"

#include "base/digest.hpp"
#include "base/overloaded.hpp"
#include "base/word.hpp"

namespace assize::certificate {

namespace {

std::string_view relation_name(evidence::Relation relation) {
  switch (relation) {
    case evidence::Relation::exactly:
      return "exactly";
    case evidence::Relation::at_least:
      return "at-least";
    case evidence::Relation::at_most:
      return "at-most";
  }
  return "";
}

/// Weight -> count, ascending.
template <class Counts>
Json counts_json(const Counts& counts) {
  Json::Object out;
  for (const auto& [weight, count] : counts) out.emplace_back(std::to_string(weight), to_decimal(BigInteger(count)));
  return out;
}

Json shard_json(const evidence::Shard& shard) {
  Json::Object out{{"number", std::to_string(shard.number)},
                   {"counts", counts_json(shard.counts)},
                   {"moments", Json::Array{to_decimal(shard.moments[0]), to_decimal(shard.moments[1])}}};
  const std::string digest = digest_hex(Json(out).text());
  out.emplace_back("digest", digest);
  return out;
}

Json::Object head(std::string_view kind, const evidence::Item& item) {
  return {{"kind", kind}, {"version", Json::integer(1)}, {"class", evidence::evidence_class(item)}};
}

Json enumeration_json(const evidence::Enumeration& enumeration, Json::Object out) {
  const Json plan = Json::Object{{"reduced_generator_digest", enumeration.plan.reduced_generator_digest},
                                 {"free_rows", Json::integer(enumeration.plan.free_rows)},
                                 {"shards", std::to_string(enumeration.plan.shards)}};
  out.emplace_back("plan", plan);
  out.emplace_back("plan_digest", digest_hex(plan.text()));
  Json::Array shards;
  for (const evidence::Shard& shard : enumeration.shards) shards.push_back(shard_json(shard));
  out.emplace_back("shards", shards);
  return out;
}

}  // namespace

Json statement_json(const evidence::Statement& statement) {
  auto out = std::visit(
      Overloaded{
          [](const evidence::MinimumDistance& claim) {
            return Json::Object{{"kind", "minimum-distance"},
                                {"relation", relation_name(claim.relation)},
                                {"value", Json::integer(claim.value)}};
          },
          [](const evidence::MinimumWords& claim) {
            return Json::Object{
                {"kind", "minimum-words"}, {"weight", Json::integer(claim.weight)}, {"count", to_decimal(claim.count)}};
          },
          [](const evidence::CompleteDistribution& claim) {
            return Json::Object{
                {"kind", "weight-distribution"}, {"extent", "complete"}, {"counts", counts_json(claim.counts)}};
          },
      },
      statement.content());
  out.emplace_back("evidence", Json::integers(statement.evidence()));
  return out;
}

Json item_json(const evidence::Item& item, std::uint32_t order) {
  return std::visit(Overloaded{
                        [&](const evidence::Witness& witness) -> Json {
                          auto out = head("witness", item);
                          out.emplace_back("weight", Json::integer(witness.weight));
                          out.emplace_back("word", spell_word(order, witness.word));
                          return out;
                        },
                        [&](const evidence::MaximumDistanceSeparable& fact) -> Json {
                          auto out = head("maximum-distance-separable", item);
                          out.emplace_back("at_least", Json::integer(fact.at_least));
                          return out;
                        },
                        [&](const evidence::Concatenation& fact) -> Json {
                          auto out = head("concatenation", item);
                          const bool separable =
                              fact.outer_reason == evidence::Concatenation::OuterReason::maximum_distance_separable;
                          out.emplace_back("outer_distance", Json::integer(fact.outer_distance));
                          out.emplace_back("outer_distance_from",
                                           separable ? "maximum-distance-separable" : "enumeration");
                          out.emplace_back("inner_distances", Json::integers(fact.inner_distances));
                          out.emplace_back("at_least", Json::integer(fact.at_least));
                          return out;
                        },
                        [&](const evidence::Enumeration& enumeration) {
                          return enumeration_json(enumeration, head("enumeration", item));
                        },
                    },
                    item);
}

}  // namespace assize::certificate
