// Every example of the README is run: blocks "```toml NAME" are files, blocks "```console" are commands and what they
// print.
//
// Each line that a block shows must stand in what the command prints, in that order; lines may be left out of the
// block.
#include <iterator>

#include "cli/program.hpp"

namespace assize::cli {
namespace {

struct Example {
  std::vector<std::string> words;
  int code = 0;
  std::vector<std::string> lines;
};

std::vector<std::string> split(const std::string& line) {
  std::istringstream stream(line);
  return {std::istream_iterator<std::string>(stream), {}};
}

/// "$ assize certify x.toml    # exit code 1"
Example example_of(const std::string& line) {
  Example out;
  const std::size_t remark = line.find("    # exit code ");
  if (remark != std::string::npos) out.code = line.back() - '0';
  out.words = split(line.substr(2, remark == std::string::npos ? remark : remark - 2));
  return out;
}

class Readme : public InFolder {};

TEST_F(Readme, ExamplesDoWhatTheySay) {
  std::ifstream readme(std::string(ASSIZE_SOURCE_DIR) + "/README.md");
  std::vector<Example> examples;
  std::string line;
  std::string block;
  std::string file;
  while (std::getline(readme, line)) {
    if (line.starts_with("```")) {
      if (!file.empty() && !block.empty()) write(file, block);
      block.clear();
      file = line.starts_with("```toml ") ? line.substr(8) : line == "```console" ? "console" : "";
    } else if (file == "console") {
      if (line.starts_with("$ "))
        examples.push_back(example_of(line));
      else
        examples.back().lines.push_back(line);
    } else if (!file.empty()) {
      block += line + "\n";
    }
  }
  ASSERT_GT(examples.size(), 5U);
  for (const Example& example : examples) {
    const std::string program = example.words.front() == "assize" ? ASSIZE_PROGRAM : ASSIZE_RECHECK_PROGRAM;
    const Ran ran = run(program, {example.words.begin() + 1, example.words.end()});
    EXPECT_EQ(ran.code, example.code) << example.words[1];
    std::string rest = ran.out + ran.err;
    for (const std::string& wanted : example.lines) {
      const std::size_t found = ("\n" + rest).find("\n" + wanted + "\n");
      ASSERT_NE(found, std::string::npos) << "not printed: " << wanted << "\nin:\n" << ran.out << ran.err;
      rest = rest.substr(found + wanted.size());
    }
  }
}

}  // namespace
}  // namespace assize::cli
