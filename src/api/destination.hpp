// Where a certificate goes, and what may be overwritten there.
#pragma once
#include <string>
#include <string_view>

#include "base/result.hpp"
#include "store/atomic_write.hpp"

namespace assize::api {

/// STEM.certificate.json in the working folder, unless an output was named.
std::string certificate_path(const std::string& output, const std::string& stem);

/// An unsigned certificate about the same code may be replaced; another regular file only if `replace` is set; the
/// sheet itself, links, devices and folders never.
Result<store::Existing> may_write(const std::string& path, const std::string& sheet,
                                  std::string_view description_digest, bool replace);

}  // namespace assize::api
