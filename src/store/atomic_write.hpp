// Writing a file whole or not at all.
#pragma once
#include <string>
#include <string_view>

#include "base/result.hpp"

namespace assize::store {

enum class Existing { keep, replace };  ///< what to do with a file that already has the name

/// Whether a file could be written in the folder of `path`, as far as that can be known beforehand.
Result<void> may_write_beside(const std::string& path);

/// Writes `bytes` under a temporary name beside `path`, flushes them to the disk, and gives them the name in one step;
/// then flushes the folder.  On any failure the temporary file is removed and whatever had the name is untouched. With
/// Existing::keep the name must be free, also against another run that takes it at the same moment.
Result<void> write_file(const std::string& path, std::string_view bytes, Existing existing);

}  // namespace assize::store
