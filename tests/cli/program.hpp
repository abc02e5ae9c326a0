// Runs a built program in a folder of its own and keeps what it said.
#pragma once
#include <fcntl.h>
#include <gtest/gtest.h>
#include <sys/wait.h>
#include <unistd.h>

#include <csignal>
#include <filesystem>
#include <fstream>
#include <sstream>
#include <string>
#include <vector>

namespace assize::cli {

struct Ran {
  int code = -1;  ///< exit code, or 128 + signal
  std::string out;
  std::string err;
  [[nodiscard]] std::string first_line() const { return out.substr(0, out.find('\n')); }
};

/// A folder that is removed at the end of the test.
class InFolder : public testing::Test {
 protected:
  void SetUp() override {
    char name[] = "/tmp/assize-cli-XXXXXX";
    ASSERT_NE(mkdtemp(name), nullptr);
    folder_ = name;
  }
  void TearDown() override { std::filesystem::remove_all(folder_); }

  [[nodiscard]] std::string path(const std::string& name) const { return folder_ + "/" + name; }
  void write(const std::string& name, const std::string& text) const {
    std::ofstream(path(name), std::ios::binary) << text;
  }
  [[nodiscard]] std::string read(const std::string& name) const {
    std::ifstream file(path(name), std::ios::binary);
    std::ostringstream text;
    text << file.rdbuf();
    return text.str();
  }
  [[nodiscard]] std::size_t files() const {
    return static_cast<std::size_t>(std::distance(std::filesystem::directory_iterator(folder_), {}));
  }

  /// Starts a program in the folder; stdout and stderr go to files there.
  pid_t start(const std::string& program, std::vector<std::string> words, const std::string& out = "") const {
    const std::string out_path = out.empty() ? path(".out") : out;
    const pid_t child = fork();
    if (child != 0) return child;
    if (chdir(folder_.c_str()) != 0) _exit(127);
    const int input = open("/dev/null", O_RDONLY);
    const int output = open(out_path.c_str(), O_WRONLY | O_CREAT | O_TRUNC, 0644);
    const int errors = open(path(".err").c_str(), O_WRONLY | O_CREAT | O_TRUNC, 0644);
    dup2(input, 0);
    dup2(output, 1);
    dup2(errors, 2);
    std::vector<char*> arguments{const_cast<char*>(program.c_str())};
    for (std::string& word : words) arguments.push_back(word.data());
    arguments.push_back(nullptr);
    execv(program.c_str(), arguments.data());
    _exit(127);
  }
  Ran finish(pid_t child) const {
    int status = 0;
    waitpid(child, &status, 0);
    Ran ran;
    ran.code = WIFEXITED(status) ? WEXITSTATUS(status) : 128 + WTERMSIG(status);
    ran.out = read(".out");
    ran.err = read(".err");
    std::filesystem::remove(path(".out"));
    std::filesystem::remove(path(".err"));
    return ran;
  }
  Ran run(const std::string& program, const std::vector<std::string>& words, const std::string& out = "") const {
    return finish(start(program, words, out));
  }
  Ran assize(const std::vector<std::string>& words, const std::string& out = "") const {
    return run(ASSIZE_PROGRAM, words, out);
  }
  Ran checker(const std::vector<std::string>& words) const { return run(ASSIZE_RECHECK_PROGRAM, words); }

  std::string folder_;
};

inline const std::string golay =
    "title = \"Cabin telegram\"\n[code]\nfamily = \"cyclic\"\ncodeword_length = 23\n"
    "generator = { algebra = \"x^11 + x^9 + x^7 + x^6 + x^5 + x + 1\" }\n";

inline std::string random_binary(int length, int dimension) {
  return "[code]\nfamily = \"random-linear\"\ncodeword_length = " + std::to_string(length) +
         "\ndimension = " + std::to_string(dimension) + "\nseed = 4\n";
}

}  // namespace assize::cli
