// What people and programs see: the page, the JSON document, the command line and the file reader.
#include <gtest/gtest.h>
#include <sys/stat.h>
#include <unistd.h>

#include <filesystem>
#include <fstream>

#include "builder.hpp"
#include "recheck/command_line.hpp"
#include "recheck/json.hpp"

namespace assize::recheck::test {
namespace {

Report golay_report(Draft draft = golay()) {
  state_everything(draft, 6);
  return recheck(draft.bytes(), {});
}

TEST(Page, BeginsWithTheVerdictAndEndsWithTheLimitsOfTheClaim) {
  Draft draft = golay();
  draft.cautions = {"the channel model is not part of this certificate"};
  const std::string page = to_text(golay_report(draft));
  EXPECT_TRUE(page.starts_with("PROVEN  [23,12] over GF(2): minimum distance exactly 7")) << page;
  const std::size_t caution = page.find("the channel model is not part");
  const std::size_t disclaimer = page.find("not that a system using it is safe");
  EXPECT_NE(caution, std::string::npos);
  EXPECT_LT(caution, disclaimer);
  EXPECT_NE(disclaimer, std::string::npos);
  EXPECT_TRUE(page.ends_with("standard.\n"));
}

TEST(Page, RejectedSaysWhatAndWhere) {
  const std::string page = to_text(recheck("{}\n", {}));
  EXPECT_TRUE(page.starts_with("REJECTED  format: ")) << page;
}

TEST(Page, NothingFromACertificateMovesTheCursor) {
  Report report = golay_report();
  report.title =
      "a\x1b[2J\nPROVEN\x7f\xc2\x9b"
      "31m\xe2\x80\xaegnal \xe2\x82\xac \xc3\xa9";
  report.cautions = {"x\ry"};
  const std::string page = to_text(report);
  EXPECT_EQ(page.find('\x1b'), std::string::npos);
  EXPECT_EQ(page.find('\r'), std::string::npos);
  EXPECT_EQ(page.find("\xc2\x9b"), std::string::npos);
  EXPECT_EQ(page.find("\xe2\x80\xae"), std::string::npos);
  EXPECT_EQ(page.find("\nPROVEN"), std::string::npos);
  EXPECT_NE(page.find("\xe2\x82\xac \xc3\xa9"), std::string::npos);
}

TEST(JsonReport, IsOneDocument) {
  const std::string document = to_json(golay_report());
  const auto parsed = parse(document);
  ASSERT_TRUE(parsed.has_value());
  std::vector<std::string> keys;
  for (const Member& member : *parsed->object()) keys.push_back(member.key);
  EXPECT_EQ(keys, (std::vector<std::string>{"verdict", "reason", "title", "order", "length", "dimension",
                                            "description_digest", "sheet_digest", "findings", "depth", "seed", "shards",
                                            "catch_probability", "ended_early", "cautions"}));
  EXPECT_EQ(*(*parsed->object())[0].value.text(), "PROVEN");
}

TEST(CommandLine, ReadsFlags) {
  const auto line = read_command_line(
      {"--depth", "spot", "a.json", "--seed=7", "--threads", "4", "--within", "10m", "--json", "--quiet"});
  ASSERT_TRUE(line.has_value());
  EXPECT_EQ(line->certificate, "a.json");
  EXPECT_EQ(line->options.depth, Depth::spot);
  EXPECT_EQ(line->options.seed, 7U);
  EXPECT_EQ(line->options.threads, 4U);
  EXPECT_EQ(line->options.budget_seconds, 600.0);
  EXPECT_TRUE(line->json);
  EXPECT_TRUE(line->quiet);
  EXPECT_EQ(read_command_line({"--", "--help"})->certificate, "--help");
  EXPECT_TRUE(read_command_line({"--help"})->help);
}

TEST(CommandLine, RefusesEverythingElse) {
  const std::vector<std::vector<std::string>> wrong{{},
                                                    {"a", "b"},
                                                    {"a", "--depth"},
                                                    {"a", "--depth", "deep"},
                                                    {"a", "--seed", "-1"},
                                                    {"a", "--seed", "1x"},
                                                    {"a", "--seed="},
                                                    {"a", "--threads", "0"},
                                                    {"a", "--threads", "257"},
                                                    {"a", "--within", "10"},
                                                    {"a", "--within", "0s"},
                                                    {"a", "--within", "1.5h"},
                                                    {"a", "--within", "s"},
                                                    {"a", "--within", ""},
                                                    {"a", "--for", "12"},
                                                    {"a", "--jsn"},
                                                    {"a", "--json=1"},
                                                    {"a", "-q"}};
  for (const auto& arguments : wrong) {
    const auto line = read_command_line(arguments);
    ASSERT_FALSE(line.has_value());
    EXPECT_FALSE(line.error().cure.empty());
  }
}

TEST(CommandLine, HelpHasExamples) {
  EXPECT_NE(help_page().find("cabin-telegram.certificate.json"), std::string_view::npos);
}

TEST(File, OnlyRegularFilesOfLegalSize) {
  const std::filesystem::path folder = std::filesystem::temp_directory_path() / ("recheck." + std::to_string(getpid()));
  std::filesystem::create_directory(folder);
  const std::string path = folder / "cabin-telegram.certificate.json";
  EXPECT_NE(read_certificate_file(path).error().what.find("no such file"), std::string::npos);
  EXPECT_NE(read_certificate_file(folder).error().what.find("folder"), std::string::npos);
  std::ofstream(path) << "abc";
  EXPECT_EQ(*read_certificate_file(path), "abc");
  std::filesystem::resize_file(path, (16U << 20) + 1);
  EXPECT_NE(read_certificate_file(path).error().what.find("16 MiB"), std::string::npos);
  std::filesystem::resize_file(path, 16U << 20);
  EXPECT_EQ(read_certificate_file(path)->size(), 16U << 20);
  const std::string pipe = folder / "pipe";
  ASSERT_EQ(mkfifo(pipe.c_str(), 0600), 0);
  EXPECT_NE(read_certificate_file(pipe).error().what.find("regular"), std::string::npos);
  std::filesystem::remove_all(folder);
}

}  // namespace
}  // namespace assize::recheck::test
