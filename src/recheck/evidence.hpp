// The evidence items of a certificate (format text, section 5) and what each of them yields.
#pragma once
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "recheck/counts.hpp"
#include "recheck/replay.hpp"
#include "recheck/shard_forms.hpp"

namespace assize::recheck {

struct Shard {
  BigInteger number;
  Counts counts;
};

/// Enumeration evidence whose spelling, digests, sums and moments are right; its shards may still be wrong.
struct Enumeration {
  std::shared_ptr<const ShardForms> forms;
  std::vector<Shard> shards;
  bool complete = false;
  Counts distribution;  ///< if complete: of all words, the zero word included
};

/// One evidence item after its checks.
struct Item {
  std::string kind;
  std::string evidence_class;
  bool known = false;
  std::optional<std::uint64_t> at_least;  ///< yields: distance at least
  std::optional<std::uint64_t> at_most;   ///< yields: distance at most
  std::optional<Enumeration> enumeration;
  std::string done;  ///< what was re-derived, for people
};

/// The code that the evidence is about.
struct Subject {
  const Replayed& code;
  std::string reduced_generator_digest;
  [[nodiscard]] std::size_t length() const { return code.reduced.generator.columns; }
  [[nodiscard]] std::size_t dimension() const { return code.reduced.generator.rows; }
};

/// Distances of the component codes, so that repeated items do not repeat the work.
struct ComponentDistances {
  std::optional<std::uint64_t> outer;
  std::optional<std::vector<std::uint64_t>> inner;
};

Result<std::vector<Item>> check_evidence(const Json::Array& evidence, const Subject& subject, const Brake& brake);

// One check for each kind; `kind`, `version` and `class` have been read from `keys`.
Result<void> check_witness(Keys& keys, const Subject& subject, Item& item);
Result<void> check_maximum_distance_separable(Keys& keys, const Subject& subject, Item& item);
Result<void> check_concatenation(Keys& keys, const Subject& subject, const Brake& brake, ComponentDistances& known,
                                 Item& item);
Result<void> check_enumeration(Keys& keys, const Subject& subject, const Brake& brake, Item& item);

}  // namespace assize::recheck
