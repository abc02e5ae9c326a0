// Whether the statements follow from the evidence they list, and what that makes of the certificate.
#pragma once
#include <optional>
#include <vector>

#include "recheck/claim.hpp"
#include "recheck/evidence.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck {

/// Two items that cannot both be true, if there are such.
std::optional<Failure> contradiction(const std::vector<Item>& items);

/// Judges one statement by its evidence alone; executed[i] tells how many shards of item i were executed again.
Finding judge(const Statement& statement, const std::vector<Item>& items, const std::vector<std::size_t>& executed);

/// Rejected if any finding is, else consistent unless all are proven.
Outcome outcome_of(const std::vector<Finding>& findings);

}  // namespace assize::recheck
