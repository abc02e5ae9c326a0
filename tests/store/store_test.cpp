// Files are read whole or refused, and written whole or not at all.
#include <gtest/gtest.h>
#include <sys/resource.h>
#include <sys/stat.h>
#include <unistd.h>

#include <csignal>
#include <filesystem>
#include <fstream>

#include "store/atomic_write.hpp"
#include "store/read_file.hpp"

namespace assize::store {
namespace {

class Store : public testing::Test {
 protected:
  void SetUp() override {
    char name[] = "/tmp/assize-store-XXXXXX";
    ASSERT_NE(mkdtemp(name), nullptr);
    folder_ = name;
  }
  void TearDown() override { std::filesystem::remove_all(folder_); }
  [[nodiscard]] std::string path(const std::string& name) const { return folder_ + "/" + name; }
  [[nodiscard]] std::size_t files() const {
    return static_cast<std::size_t>(std::distance(std::filesystem::directory_iterator(folder_), {}));
  }
  std::string folder_;
};

TEST_F(Store, ReadsBackWhatItWrote) {
  const std::string bytes("a\0b\n", 4);
  ASSERT_TRUE(write_file(path("x"), bytes, Existing::keep));
  const auto read = read_file(path("x"), 4);
  ASSERT_TRUE(read);
  EXPECT_EQ(*read, bytes);
  EXPECT_EQ(files(), 1U) << "the temporary file is gone";
}

TEST_F(Store, RefusesWhatIsNoSmallRegularFile) {
  EXPECT_EQ(read_file(path("missing"), 10).error().what, "there is no such file");
  EXPECT_EQ(read_file(folder_, 10).error().what, "this is a folder");
  ASSERT_EQ(mkfifo(path("pipe").c_str(), 0600), 0);
  EXPECT_EQ(read_file(path("pipe"), 10).error().what, "this is not a regular file");
  EXPECT_EQ(read_file("/dev/zero", 10).error().what, "this is not a regular file");
  ASSERT_TRUE(write_file(path("big"), std::string(11, 'x'), Existing::keep));
  EXPECT_FALSE(read_file(path("big"), 10));
  EXPECT_TRUE(read_file(path("big"), 11));
}

TEST_F(Store, KeepsATakenName) {
  ASSERT_TRUE(write_file(path("x"), "old", Existing::keep));
  const auto second = write_file(path("x"), "new", Existing::keep);
  ASSERT_FALSE(second);
  EXPECT_EQ(second.error().what, "the name is taken");
  EXPECT_EQ(*read_file(path("x"), 10), "old");
  ASSERT_TRUE(write_file(path("x"), "new", Existing::replace));
  EXPECT_EQ(*read_file(path("x"), 10), "new");
  EXPECT_EQ(files(), 1U);
}

TEST_F(Store, AFolderThatIsNotThereIsAClearError) {
  const auto written = write_file(path("no/such/x"), "x", Existing::keep);
  ASSERT_FALSE(written);
  EXPECT_NE(written.error().cure.find("folder that exists"), std::string::npos);
}

// A limit on the size of files stands in for a full disk: the write fails half-way in both cases.
TEST_F(Store, AFailedWriteLeavesTheOldFileAndNothingElse) {
  ASSERT_TRUE(write_file(path("x"), "old", Existing::keep));
  rlimit before{};
  ASSERT_EQ(getrlimit(RLIMIT_FSIZE, &before), 0);
  const auto handler = std::signal(SIGXFSZ, SIG_IGN);
  const rlimit tight{1000, before.rlim_max};
  ASSERT_EQ(setrlimit(RLIMIT_FSIZE, &tight), 0);
  const auto written = write_file(path("x"), std::string(100000, 'n'), Existing::replace);
  setrlimit(RLIMIT_FSIZE, &before);
  std::signal(SIGXFSZ, handler);
  ASSERT_FALSE(written);
  EXPECT_EQ(*read_file(path("x"), 10), "old");
  EXPECT_EQ(files(), 1U);
}

TEST_F(Store, LeftoversOfAKilledRunDoNotStandInTheWay) {
  std::ofstream(path("x.part-" + std::to_string(getpid()) + "-0")) << "half";
  EXPECT_TRUE(write_file(path("x"), "whole", Existing::keep));
  EXPECT_EQ(*read_file(path("x"), 10), "whole");
}

}  // namespace
}  // namespace assize::store
