// The run over the chosen shards.  Workers take them in order; after a wrong shard only earlier ones are still awaited,
// so that the report names the first wrong shard whatever the number of threads.
#include "recheck/reexecution.hpp"

#include <algorithm>
#include <atomic>
#include <mutex>
#include <system_error>
#include <thread>

#include "recheck/coset_walk.hpp"
#include "recheck/draw.hpp"

namespace assize::recheck {
namespace {

/// The tables that all shards of one enumeration share.
struct Prepared {
  Matrix rows;
  std::unique_ptr<CosetWalk> walk;
};

class Run {
 public:
  Run(const std::vector<Item>& items, std::vector<ShardRef> chosen, const Options& options, const Brake& brake)
      : items_(items), chosen_(std::move(chosen)), options_(options), brake_(brake), wrong_(chosen_.size()) {
    prepared_.resize(items.size());
    for (const ShardRef& ref : chosen_) {
      Prepared& prepared = prepared_[ref.item];
      if (prepared.walk) continue;
      const ShardForms& forms = *items[ref.item].enumeration->forms;
      prepared.rows = forms.free_rows();
      prepared.walk = make_coset_walk(forms.field(), prepared.rows);
    }
    for (const ShardRef& ref : chosen_) total_ += shard_words(ref);
  }

  Rerun execute() {
    std::vector<std::size_t> right(items_.size(), 0);
    right_ = &right;
    {
      std::vector<std::jthread> helpers;
      try {
        while (helpers.size() + 1 < std::min<std::size_t>(options_.threads, chosen_.size()))
          helpers.emplace_back([this] { work(); });
      } catch (const std::system_error&) {
        // Fewer helpers than wished; the shards get done all the same.
      }
      work();
    }
    Rerun rerun;
    rerun.done = std::move(right);
    rerun.executed = finished_;
    if (out_of_memory_) throw std::bad_alloc();
    const std::size_t wrong = wrong_.load();
    if (wrong < chosen_.size()) {
      rerun.executed = wrong + 1;
      rerun.wrong =
          Failure{place(chosen_[wrong]) + ".counts",
                  "executing shard " + to_decimal(shard(chosen_[wrong]).number) + " again gives other counts", ""};
    } else {
      rerun.ended_early = finished_ < chosen_.size();
    }
    return rerun;
  }

 private:
  [[nodiscard]] const Shard& shard(const ShardRef& ref) const {
    return items_[ref.item].enumeration->shards[ref.shard];
  }
  [[nodiscard]] static std::string place(const ShardRef& ref) {
    return "evidence[" + std::to_string(ref.item) + "].shards[" + std::to_string(ref.shard) + "]";
  }
  [[nodiscard]] std::uint64_t shard_words(const ShardRef& ref) const {
    return static_cast<std::uint64_t>(items_[ref.item].enumeration->forms->size(shard(ref).number));
  }

  void work() noexcept {
    try {
      while (true) {
        const std::size_t index = next_.fetch_add(1);
        if (index >= chosen_.size() || !execute_one(index)) return;
      }
    } catch (...) {
      out_of_memory_ = true;  // nothing else is thrown by this work
    }
  }

  /// False if this worker should end.
  bool execute_one(std::size_t index) {
    const auto stopped = [&] { return brake_.pulled() || index > wrong_.load() || out_of_memory_.load(); };
    if (stopped()) return false;
    const ShardRef& ref = chosen_[index];
    const ShardForms& forms = *items_[ref.item].enumeration->forms;
    const Prepared& prepared = prepared_[ref.item];
    const Shard& claimed = shard(ref);
    std::vector<std::uint64_t> counts(forms.length() + 1, 0);
    const bool ended = claimed.number == 0
                           ? count_normalised(*prepared.walk, prepared.rows, counts, stopped)
                           : prepared.walk->count(forms.offset(claimed.number), forms.free(), counts, stopped);
    if (!ended) return false;
    Counts found;
    for (std::size_t weight = 0; weight < counts.size(); ++weight)
      if (counts[weight] != 0) found.emplace_hint(found.end(), weight, counts[weight]);
    if (found != claimed.counts) {
      std::size_t earlier = wrong_.load();
      while (index < earlier && !wrong_.compare_exchange_weak(earlier, index)) {
      }
      return true;  // shards before this one may still be wrong
    }
    report(ref);
    return true;
  }

  void report(const ShardRef& ref) {
    const std::lock_guard lock(mutex_);
    ++(*right_)[ref.item];
    ++finished_;
    words_ += shard_words(ref);
    if (options_.progress == nullptr) return;
    ProgressState state;
    state.task = "executing shards again";
    state.done = words_;
    state.total = total_;
    state.elapsed_seconds = brake_.elapsed();
    options_.progress->update(state);
  }

  const std::vector<Item>& items_;
  std::vector<ShardRef> chosen_;
  const Options& options_;
  const Brake& brake_;
  std::vector<Prepared> prepared_;
  std::uint64_t total_ = 0;
  std::atomic<std::size_t> next_{0};
  std::atomic<std::size_t> wrong_;
  std::atomic<bool> out_of_memory_{false};
  std::mutex mutex_;
  std::vector<std::size_t>* right_ = nullptr;
  std::uint64_t finished_ = 0;
  std::uint64_t words_ = 0;
};

}  // namespace

Rerun reexecute(const std::vector<Item>& items, std::string_view closing_digest, const Options& options,
                const Brake& brake) {
  Rerun idle;
  idle.done.assign(items.size(), 0);
  const std::vector<ShardRef> all = all_shards(items);
  std::vector<ShardRef> chosen;
  switch (options.depth) {
    case Depth::quick:
      break;
    case Depth::spot:
      for (const std::size_t index : draw(all.size(), spot_size(all.size()), options.seed, closing_digest))
        chosen.push_back(all[index]);
      break;
    case Depth::full:
      chosen = all;
      break;
  }
  if (chosen.empty()) return idle;
  constexpr std::uint64_t day = 24 * 3600;
  constexpr std::uint64_t lifetime = std::uint64_t{1} << 31;  // in seconds; also keeps all counts below 2^62
  const BigInteger seconds = forecast_seconds(items, chosen, std::max(1U, options.threads));
  const bool hopeless = forecast_seconds(items, chosen, 1) > lifetime;
  if (hopeless || (seconds > day && !(options.budget_seconds > 0))) {
    idle.not_started = "executing the shards again is forecast to take " + grouped_decimal(seconds / 3600) +
                       " hours, so it was not begun" + (hopeless ? "" : "; give a time budget to begin it");
    idle.ended_early = true;
    return idle;
  }
  return Run(items, std::move(chosen), options, brake).execute();
}

}  // namespace assize::recheck
