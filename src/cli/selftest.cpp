// assize selftest
#include "cli/commands.hpp"

namespace assize::cli {

api::Answer<api::Reply> run_selftest(const Arguments& arguments) {
  auto run = read_run(arguments);
  if (!run) return to_problem(run.error());
  return api::selftest(*run);
}

}  // namespace assize::cli
