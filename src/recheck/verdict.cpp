// A statement is proven if what it lists was derived again and implies it; consistent if it is implied only together
// with shards that were not executed; not checked if an unknown kind of evidence might be what implies it.
#include "recheck/verdict.hpp"

#include <algorithm>

namespace assize::recheck {
namespace {

bool derived_again(const Item& item, std::size_t executed) {
  return !item.enumeration || executed == item.enumeration->shards.size();
}

std::string describe_item(std::size_t index, const Item& item, std::size_t executed) {
  std::string text = "evidence[" + std::to_string(index) + "] (" + item.evidence_class + ", " + item.kind + "): ";
  if (!item.enumeration) return text + item.done;
  const std::size_t present = item.enumeration->shards.size();
  text += std::to_string(executed) + " of " + std::to_string(present) + " shards executed again";
  return item.enumeration->complete ? text : text + ", the enumeration is incomplete";
}

/// The listed items of a statement, split by how much they are worth.
class Listed {
 public:
  Listed(const Statement& statement, const std::vector<Item>& items, const std::vector<std::size_t>& executed) {
    for (const std::size_t index : statement.evidence) {
      const Item& item = items[index];
      because_ += (because_.empty() ? "" : "; ") + describe_item(index, item, executed[index]);
      if (!item.known) unknown_ = true;
      (derived_again(item, executed[index]) ? sure_ : claimed_).push_back(&item);
    }
  }

  template <class Implied>  // a predicate on lists of items
  [[nodiscard]] Status status(const Implied& implied) const {
    if (implied(sure_)) return Status::proven;
    std::vector<const Item*> both = sure_;
    both.insert(both.end(), claimed_.begin(), claimed_.end());
    if (implied(both)) return Status::consistent;
    return unknown_ ? Status::not_checked : Status::rejected;
  }
  [[nodiscard]] std::string because() const { return because_; }
  [[nodiscard]] std::vector<const Item*> all() const {
    std::vector<const Item*> both = sure_;
    both.insert(both.end(), claimed_.begin(), claimed_.end());
    return both;
  }

 private:
  std::vector<const Item*> sure_;
  std::vector<const Item*> claimed_;
  bool unknown_ = false;
  std::string because_;
};

/// At least 1: a non-zero word has a non-zero symbol, which needs no evidence.
std::uint64_t best_lower(const std::vector<const Item*>& items) {
  std::uint64_t best = 1;
  for (const Item* item : items)
    if (item->at_least) best = std::max(best, *item->at_least);
  return best;
}

std::optional<std::uint64_t> best_upper(const std::vector<const Item*>& items) {
  std::optional<std::uint64_t> best;
  for (const Item* item : items)
    if (item->at_most && (!best || *item->at_most < *best)) best = item->at_most;
  return best;
}

bool refuted(const Statement& statement, const std::vector<const Item*>& items) {
  const std::uint64_t lower = best_lower(items);
  const auto upper = best_upper(items);
  const bool too_high = upper && *upper < statement.value;
  const bool too_low = lower > statement.value;
  switch (statement.relation) {
    case Relation::exactly:
      return too_high || too_low;
    case Relation::at_least:
      return too_high;
    case Relation::at_most:
      return too_low;
  }
  return true;
}

bool bounds_imply(const Statement& statement, const std::vector<const Item*>& items) {
  const std::uint64_t lower = best_lower(items);
  const auto upper = best_upper(items);
  const bool from_below = lower >= statement.value;
  const bool from_above = upper && *upper <= statement.value;
  switch (statement.relation) {
    case Relation::exactly:
      return from_below && from_above;
    case Relation::at_least:
      return from_below;
    case Relation::at_most:
      return from_above;
  }
  return false;
}

bool agrees(const Statement& statement, const Counts& distribution) {
  if (statement.kind == StatementKind::weight_distribution) return statement.counts == distribution;
  const auto least = std::next(distribution.begin());  // after the zero word
  return least->first == statement.value && least->second == statement.count;
}

/// Counts come from complete enumerations only; every one that is listed must agree.
bool counts_imply(const Statement& statement, const std::vector<const Item*>& items) {
  return std::any_of(items.begin(), items.end(), [&](const Item* item) {
    return item->enumeration && item->enumeration->complete && agrees(statement, item->enumeration->distribution);
  });
}

bool counts_refute(const Statement& statement, const std::vector<const Item*>& items) {
  return std::any_of(items.begin(), items.end(), [&](const Item* item) {
    return item->enumeration && item->enumeration->complete && !agrees(statement, item->enumeration->distribution);
  });
}

/// The least weight that an item shows some word to have, whether or not it yields a bound.
std::optional<std::uint64_t> shown_weight(const Item& item) {
  std::optional<std::uint64_t> least = item.at_most;
  if (item.enumeration)
    for (const Shard& shard : item.enumeration->shards)
      if (!shard.counts.empty() && (!least || shard.counts.begin()->first < *least))
        least = shard.counts.begin()->first;
  return least;
}

}  // namespace

std::optional<Failure> contradiction(const std::vector<Item>& items) {
  for (std::size_t low = 0; low < items.size(); ++low) {
    if (!items[low].at_least) continue;
    for (std::size_t high = 0; high < items.size(); ++high) {
      const auto shown = shown_weight(items[high]);
      if (shown && *shown < *items[low].at_least)
        return Failure{"evidence[" + std::to_string(low) + "]",
                       "evidence[" + std::to_string(high) + "] has a word of weight " + std::to_string(*shown) +
                           ", below the distance that this item yields",
                       ""};
      if (items[low].enumeration && items[high].enumeration && items[high].enumeration->complete &&
          items[low].enumeration->distribution != items[high].enumeration->distribution)
        return Failure{"evidence[" + std::to_string(high) + "]", "two complete enumerations of the same code disagree",
                       ""};
    }
  }
  return std::nullopt;
}

Finding judge(const Statement& statement, const std::vector<Item>& items, const std::vector<std::size_t>& executed) {
  const Listed listed(statement, items, executed);
  const bool is_bound = statement.kind == StatementKind::minimum_distance;
  const bool wrong = is_bound ? refuted(statement, listed.all()) : counts_refute(statement, listed.all());
  Finding finding{statement.sentence(), Status::rejected, {}};
  if (wrong) {
    finding.because = statement.path + ": the listed evidence shows the contrary (" + listed.because() + ")";
    return finding;
  }
  finding.status = listed.status([&](const std::vector<const Item*>& some) {
    return is_bound ? bounds_imply(statement, some) : counts_imply(statement, some);
  });
  finding.because = listed.because();
  if (finding.status == Status::rejected)
    finding.because = statement.path + ": the listed evidence does not imply this (" + listed.because() + ")";
  return finding;
}

Outcome outcome_of(const std::vector<Finding>& findings) {
  bool all_proven = true;
  for (const Finding& finding : findings) switch (finding.status) {
      case Status::proven:
        break;
      case Status::consistent:
      case Status::not_checked:
        all_proven = false;
        break;
      case Status::rejected:
        return Outcome::rejected;
    }
  return all_proven ? Outcome::proven : Outcome::consistent;
}

}  // namespace assize::recheck
