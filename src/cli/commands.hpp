// What each command does with its arguments.
#pragma once
#include <optional>
#include <string>

#include "api/assize.hpp"
#include "cli/parse.hpp"

namespace assize::cli {

api::Answer<api::Reply> run_show(const Arguments& arguments);
api::Answer<api::Reply> run_certify(const Arguments& arguments);
api::Answer<api::Reply> run_weights(const Arguments& arguments);
api::Answer<api::Reply> run_recheck(const Arguments& arguments);
api::Answer<api::Reply> run_field(const Arguments& arguments);
api::Answer<api::Reply> run_selftest(const Arguments& arguments);

/// The flags that say how a run is done: threads, kernel, method, budget.
Result<api::Run> read_run(const Arguments& arguments);
api::Problem to_problem(const Failure& failure);

}  // namespace assize::cli
