// assize show SHEET
#include "cli/commands.hpp"

namespace assize::cli {

api::Answer<api::Reply> run_show(const Arguments& arguments) {
  return api::show(
      {arguments.argument, arguments.value("--matrix").value_or(""), arguments.value("--layout").value_or("")});
}

}  // namespace assize::cli
