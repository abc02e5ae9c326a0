// Reads a certificate file: regular files only, never more than the format allows.
#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <cerrno>
#include <cstring>

#include "recheck/limits.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck {
namespace {

class Descriptor {
 public:
  explicit Descriptor(int number) : number_(number) {}
  ~Descriptor() {
    if (number_ >= 0) ::close(number_);
  }
  Descriptor(const Descriptor&) = delete;
  Descriptor& operator=(const Descriptor&) = delete;
  [[nodiscard]] int number() const noexcept { return number_; }

 private:
  int number_;
};

Failure cannot_open(const std::string& path, int error) {
  if (error == ENOENT) return Failure{path, "there is no such file", "check the spelling of the path"};
  if (error == EACCES) return Failure{path, "the file may not be read", "ask for permission to read it"};
  return Failure{path, std::string("the file cannot be opened: ") + std::strerror(error), ""};
}

}  // namespace

Result<std::string> read_certificate_file(const std::string& path) {
  const Descriptor file(::open(path.c_str(), O_RDONLY | O_CLOEXEC | O_NONBLOCK));  // does not wait for a pipe
  if (file.number() < 0) return cannot_open(path, errno);
  struct stat status {};
  if (::fstat(file.number(), &status) != 0) return cannot_open(path, errno);
  if (S_ISDIR(status.st_mode)) return Failure{path, "this is a folder", "name the certificate file in it"};
  if (!S_ISREG(status.st_mode)) return Failure{path, "this is not a regular file", "name a certificate file"};
  if (static_cast<std::uint64_t>(status.st_size) > max_bytes)
    return Failure{path, "the file is larger than 16 MiB, so it is no certificate", "name a certificate file"};
  std::string bytes;
  std::string buffer(std::size_t{1} << 16, '\0');
  while (bytes.size() <= max_bytes) {
    const ssize_t got = ::read(file.number(), buffer.data(), buffer.size());
    if (got == 0) return bytes;
    if (got > 0)
      bytes.append(buffer, 0, static_cast<std::size_t>(got));
    else if (errno != EINTR)
      return Failure{path, std::string("the file cannot be read: ") + std::strerror(errno), ""};
  }
  return Failure{path, "the file is larger than 16 MiB, so it is no certificate", "name a certificate file"};
}

}  // namespace assize::recheck
