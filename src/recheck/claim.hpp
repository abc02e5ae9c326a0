// What a certificate says (format text, section 3), before anything is known about whether it is true.
#pragma once
#include <string>
#include <vector>

#include "recheck/counts.hpp"
#include "recheck/json.hpp"

namespace assize::recheck {

enum class StatementKind { minimum_distance, minimum_words, weight_distribution };
enum class Relation { exactly, at_least, at_most };

struct Statement {
  StatementKind kind = StatementKind::minimum_distance;
  Relation relation = Relation::exactly;  ///< of minimum_distance
  std::uint64_t value = 0;                ///< of minimum_distance; the weight of minimum_words
  BigInteger count;                       ///< of minimum_words
  Counts counts;                          ///< of weight_distribution
  std::vector<std::size_t> evidence;
  std::string path;

  /// A plain sentence: "minimum distance exactly 7".
  [[nodiscard]] std::string sentence() const;
};

struct Claim {
  const Json* description = nullptr;
  std::string description_digest;
  std::string sheet_digest;
  std::uint64_t order = 0;
  std::uint64_t length = 0;
  std::uint64_t dimension = 0;
  std::string reduced_generator_digest;
  std::vector<Statement> statements;
};

/// Reads the object `claim`; `items` is the number of evidence items.
Result<Claim> read_claim(const Json& json, std::size_t items);

}  // namespace assize::recheck
