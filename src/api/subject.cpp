// From a path to a code.  Files that a sheet names are looked for relative to the sheet.
#include "api/subject.hpp"

#include <filesystem>

#include "base/digest.hpp"
#include "code/construct.hpp"
#include "sheet/matrix_file.hpp"
#include "sheet/read_sheet.hpp"
#include "store/read_file.hpp"

namespace assize::api {

namespace {

Result<sheet::Fetched> fetch_file(const std::string& name, const std::string& from) {
  const std::filesystem::path path = std::filesystem::path(from).parent_path() / name;
  auto bytes = store::read_file(path.string(), sheet::largest_matrix_file);
  if (!bytes) return bytes.error();
  return sheet::Fetched{path.string(), *std::move(bytes)};
}

Result<sheet::Fetched> fetch_nothing(const std::string& name, const std::string&) {
  return Failure{name, "files cannot be named here", "write what it holds into the sheet"};
}

Result<Subject> build(sheet::Description description, std::string sheet_digest) {
  auto code = code::construct(description);
  if (!code) return code.error();
  std::filesystem::path name = std::filesystem::path(description.source).filename();
  if (name.extension() == ".toml") name = name.stem();
  return Subject{name.string(), std::move(sheet_digest), std::move(description), *std::move(code)};
}

}  // namespace

Result<ReadSheet> read_sheet_file(const std::string& path) {
  const auto bytes = store::read_file(path, sheet::largest_sheet);
  if (!bytes) return bytes.error();
  auto description = sheet::read_sheet(*bytes, path, fetch_file);
  if (!description) return description.error();
  return ReadSheet{digest_hex(*bytes), *std::move(description)};
}

Result<Subject> load(const std::string& path) {
  auto read = read_sheet_file(path);
  if (!read) return read.error();
  return build(std::move(read->description), std::move(read->bytes_digest));
}

Result<Subject> load_text(std::string_view text, const std::string& name) {
  auto description = sheet::read_sheet(text, name, fetch_nothing);
  if (!description) return description.error();
  return build(*std::move(description), digest_hex(text));
}

}  // namespace assize::api
