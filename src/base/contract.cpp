// Where a broken promise ends: one message on stderr, then an exit code of its own.
#include "base/contract.hpp"

#include <cstdio>
#include <cstdlib>

namespace assize {

void broken_contract(std::string_view promise, std::source_location where) noexcept {
  std::fprintf(stderr,
               "assize: self-check failed: %.*s (%s:%u)\n"
               "This is a defect of the program or of the machine it runs on; no result is given.\n",
               static_cast<int>(promise.size()), promise.data(), where.file_name(), where.line());
  std::fflush(stderr);
  std::_Exit(exit_self_check_failed);
}

}  // namespace assize
