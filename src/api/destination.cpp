// The rule of replacement.
#include "api/destination.hpp"

#include <filesystem>

#include "certificate/certificate.hpp"
#include "certificate/read.hpp"
#include "store/read_file.hpp"

namespace assize::api {

namespace {
constexpr std::string_view certificate_ending = ".certificate.json";

std::string signatures_path(std::string path) {
  if (path.ends_with(certificate_ending)) path.resize(path.size() - certificate_ending.size());
  return path + ".signatures.json";
}
}  // namespace

std::string certificate_path(const std::string& output, const std::string& stem) {
  return output.empty() ? stem + std::string(certificate_ending) : output;
}

Result<store::Existing> may_write(const std::string& path, const std::string& sheet,
                                  std::string_view description_digest, bool replace) {
  if (const auto possible = store::may_write_beside(path); !possible) return possible.error();
  if (!store::exists(path)) return store::Existing::keep;
  if (!store::is_regular_file(path))
    return Failure{path, "this is a folder, a link or a device", "name a file of its own with -o"};
  std::error_code ignored;
  if (std::filesystem::equivalent(path, sheet, ignored))
    return Failure{path, "this is the sheet itself", "name another file with -o"};
  const auto refused = [&path](const std::string& why) {
    return Failure{path, "the file exists and " + why, "name another file with -o, or add --replace"};
  };
  if (replace) return store::Existing::replace;
  const auto bytes = store::read_file(path, certificate::largest_certificate);
  if (!bytes) return refused("is not a certificate that can be read");
  const auto digest = certificate::description_digest_of(*bytes);
  if (!digest) return refused("is not a certificate");
  if (*digest != description_digest) return refused("is the certificate of another code");
  if (store::exists(signatures_path(path))) return refused("is signed");
  return store::Existing::replace;
}

}  // namespace assize::api
