// `weights`: the complete distribution, or what a run cut short has counted.
#include "api/assize.hpp"
#include "api/enumeration.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"

namespace assize::api {

namespace {

/// The words of the completed shards by weight, scalar multiples included; without the zero word unless complete.
evidence::WeightDistribution counted(const evidence::Enumeration& enumeration) {
  if (enumeration.complete()) return evidence::distribution(enumeration);
  evidence::WeightDistribution out;
  for (const evidence::Shard& shard : enumeration.shards)
    for (const auto& [weight, count] : shard.counts) out[weight] += BigInteger(count) * (enumeration.plan.order - 1);
  return out;
}

}  // namespace

Answer<Reply> weights(const WeightsRequest& request) {
  World world(request.run);
  if (const auto fine = settle(request.run, world); !fine) return to_problem(fine.error());
  const auto subject = load(request.sheet);
  if (!subject) return to_problem(subject.error());
  const auto plan = plan::choose(subject->code, world.goal);
  if (!plan) return to_problem(plan.error());
  if (request.plan_only) {
    const report::Document document = forecast_document(*subject, *plan, world);
    return Reply{Holds::yes, document.text, document.json};
  }
  const auto enumerated = run_enumeration(*subject, *plan, world, request.run, std::nullopt);
  if (!enumerated) return to_problem(enumerated.error());
  report::WeightsFacts facts;
  facts.code = subject->parameters();
  facts.method = plan::name(plan->method);
  facts.remark = enumerated->remark;
  evidence::WeightDistribution counts;
  bool complete = false;
  if (enumerated->outcome) {
    const evidence::Enumeration& enumeration = enumerated->outcome->enumeration;
    complete = enumeration.complete();
    counts = counted(enumeration);
    facts.shards_done = enumeration.shards.size();
    facts.shards_planned = enumeration.plan.shards;
  }
  facts.seconds = world.elapsed();
  const report::Document document = report::weights(facts, complete, counts);
  return Reply{complete ? Holds::yes : Holds::undecided, document.text, document.json};
}

}  // namespace assize::api
