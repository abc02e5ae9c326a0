// Opens first and asks afterwards, so that what is checked is what is read.
#include "store/read_file.hpp"

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <cerrno>
#include <cstring>

namespace assize::store {

namespace {

/// Closes a file descriptor at the end of its scope.
struct Descriptor {
  int number;
  explicit Descriptor(int n) : number(n) {}
  Descriptor(const Descriptor&) = delete;
  Descriptor& operator=(const Descriptor&) = delete;
  ~Descriptor() {
    if (number >= 0) close(number);
  }
};

Failure system_failure(const std::string& path, const std::string& what) {
  const int error = errno;
  if (error == ENOENT) return {path, "there is no such file", "check the name and the current folder"};
  if (error == EACCES) return {path, "the file may not be read by this user", "change its permissions"};
  return {path, what + ": " + std::strerror(error), ""};
}

}  // namespace

Result<std::string> read_file(const std::string& path, std::uint64_t largest) {
  // O_NONBLOCK: opening a pipe without a writer must not hang; it is refused below.
  const Descriptor file(open(path.c_str(), O_RDONLY | O_CLOEXEC | O_NONBLOCK));
  if (file.number < 0) return system_failure(path, "cannot be opened");
  struct stat status {};
  if (fstat(file.number, &status) != 0) return system_failure(path, "cannot be examined");
  if (S_ISDIR(status.st_mode)) return Failure{path, "this is a folder", "name a file in it"};
  if (!S_ISREG(status.st_mode)) return Failure{path, "this is not a regular file", "copy the text into a file"};
  const Failure too_large{path, "the file is larger than " + std::to_string(largest) + " bytes, the most that is read",
                          "check that this is the file you meant"};
  if (static_cast<std::uint64_t>(status.st_size) > largest) return too_large;
  std::string bytes;
  bytes.reserve(static_cast<std::size_t>(status.st_size) + 1);
  char block[65536];
  while (true) {
    const ssize_t got = read(file.number, block, sizeof block);
    if (got < 0 && errno == EINTR) continue;
    if (got < 0) return system_failure(path, "cannot be read");
    if (got == 0) return bytes;
    bytes.append(block, static_cast<std::size_t>(got));
    if (bytes.size() > largest) return too_large;
  }
}

bool exists(const std::string& path) {
  struct stat status {};
  return lstat(path.c_str(), &status) == 0;
}

bool is_regular_file(const std::string& path) {
  struct stat status {};
  return lstat(path.c_str(), &status) == 0 && S_ISREG(status.st_mode);
}

}  // namespace assize::store
