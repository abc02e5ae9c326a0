// Which shards are executed, and whether that ends within a day.
#include "recheck/coset_walk.hpp"
#include "recheck/reexecution.hpp"

namespace assize::recheck {

std::vector<ShardRef> all_shards(const std::vector<Item>& items) {
  std::vector<ShardRef> all;
  for (std::size_t i = 0; i < items.size(); ++i)
    if (items[i].enumeration)
      for (std::size_t s = 0; s < items[i].enumeration->shards.size(); ++s) all.push_back({i, s});
  return all;
}

BigInteger forecast_seconds(const std::vector<Item>& items, const std::vector<ShardRef>& chosen, unsigned threads) {
  BigInteger picoseconds = 0;
  for (const ShardRef& ref : chosen) {
    const Enumeration& enumeration = *items[ref.item].enumeration;
    const ShardForms& forms = *enumeration.forms;
    const std::uint64_t preparation = std::uint64_t{forms.length()} * (forms.prefix_rows() + 8) * 4000;
    picoseconds +=
        forms.size(enumeration.shards[ref.shard].number) * word_cost_picoseconds(forms.field(), forms.length()) +
        preparation;
  }
  return picoseconds / threads / 1'000'000'000'000U;
}

}  // namespace assize::recheck
