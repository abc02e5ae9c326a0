// assize field Q
#include "cli/commands.hpp"

namespace assize::cli {

api::Answer<api::Reply> run_field(const Arguments& arguments) {
  for (const char* other : {"--json", "--quiet"})
    if (arguments.has("--csv") && arguments.has(other))
      return api::Problem{"command line", "--csv and " + std::string(other) + " exclude each other",
                          "leave one of them out", false};
  api::FieldRequest request;
  request.order = arguments.argument;
  request.modulus = arguments.value("--modulus").value_or("");
  if (arguments.has("--modulus") && request.modulus.empty())
    return api::Problem{"--modulus", "the modulus is empty", "write a polynomial such as \"x^3 + x + 1\"", false};
  request.table = arguments.has("--table");
  request.csv = arguments.has("--csv");
  return api::field(request);
}

}  // namespace assize::cli
