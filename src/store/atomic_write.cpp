// Temporary name, fsync, rename (or link, where the name must be free), fsync of the folder.
#include "store/atomic_write.hpp"

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <cerrno>
#include <cstdio>
#include <cstring>

namespace assize::store {

namespace {

Failure system_failure(const std::string& path, const std::string& what) {
  const int error = errno;
  std::string cure;
  if (error == ENOSPC || error == EDQUOT) cure = "make room on the disk, or choose another place with -o";
  if (error == EACCES || error == EROFS || error == ENOENT || error == ENOTDIR)
    cure = "choose a folder that exists and that you may write to with -o";
  return {path, what + ": " + std::strerror(error), cure};
}

bool write_all(int file, std::string_view bytes) {
  while (!bytes.empty()) {
    const ssize_t written = write(file, bytes.data(), bytes.size());
    if (written < 0 && errno == EINTR) continue;
    if (written < 0) return false;
    bytes.remove_prefix(static_cast<std::size_t>(written));
  }
  return true;
}

std::string folder_of(const std::string& path) {
  const std::size_t slash = path.rfind('/');
  if (slash == std::string::npos) return ".";
  return slash == 0 ? "/" : path.substr(0, slash);
}

/// Makes the new name itself survive a power cut.
bool sync_folder(const std::string& folder) {
  const int file = open(folder.c_str(), O_RDONLY | O_DIRECTORY | O_CLOEXEC);
  if (file < 0) return false;
  // Some file systems do not support fsync on folders and say EINVAL; there is nothing more to be done there.
  const bool done = fsync(file) == 0 || errno == EINVAL;
  close(file);
  return done;
}

/// Gives a file its name unless the name is taken (errno EEXIST).  Network file systems know only the first way, some
/// removable disks only the second.
bool rename_if_free(const char* from, const char* to) {
  if (link(from, to) == 0) {
    unlink(from);
    return true;
  }
  if (errno != EPERM && errno != EOPNOTSUPP) return false;
  return renameat2(AT_FDCWD, from, AT_FDCWD, to, RENAME_NOREPLACE) == 0;
}

}  // namespace

Result<void> may_write_beside(const std::string& path) {
  if (access(folder_of(path).c_str(), W_OK | X_OK) == 0) return {};
  return system_failure(path, "cannot be written");
}

Result<void> write_file(const std::string& path, std::string_view bytes, Existing existing) {
  std::string temporary;
  int file = -1;
  for (int attempt = 0; attempt < 100 && file < 0; ++attempt) {  // a killed run may have left its own behind
    temporary = path + ".part-" + std::to_string(getpid()) + "-" + std::to_string(attempt);
    file = open(temporary.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
    if (file < 0 && errno != EEXIST) break;
  }
  if (file < 0) return system_failure(path, "cannot be written");
  const bool flushed = write_all(file, bytes) && fsync(file) == 0;
  const Failure write_failure = flushed ? Failure{} : system_failure(path, "cannot be written");
  const bool closed = close(file) == 0;
  if (!flushed || !closed) {
    const Failure failure = flushed ? system_failure(path, "cannot be written") : write_failure;
    unlink(temporary.c_str());
    return failure;
  }
  const bool named = existing == Existing::replace ? std::rename(temporary.c_str(), path.c_str()) == 0
                                                   : rename_if_free(temporary.c_str(), path.c_str());
  if (!named) {
    const Failure failure = errno == EEXIST ? Failure{path, "the name is taken", "choose another name with -o"}
                                            : system_failure(path, "cannot be given its name");
    unlink(temporary.c_str());
    return failure;
  }
  if (!sync_folder(folder_of(path)))
    return system_failure(path, "written, but its folder cannot be flushed to the disk");
  return {};
}

}  // namespace assize::store
