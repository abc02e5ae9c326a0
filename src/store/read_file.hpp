// Reading a whole file with a size cap, so that a wrong path or a huge file is a clear error and never an exhausted
// machine.
#pragma once
#include <cstdint>
#include <string>

#include "base/result.hpp"

namespace assize::store {

/// Bytes of a regular file of at most `largest` bytes.  Failures name the path and what is there instead.
Result<std::string> read_file(const std::string& path, std::uint64_t largest);

/// Whether something (of any kind) is at the path; and whether that is a regular file and not, say, a link or a device.
bool exists(const std::string& path);
bool is_regular_file(const std::string& path);

}  // namespace assize::store
