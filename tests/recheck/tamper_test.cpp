// Every single-bit change, every deleted byte and every truncation of a certificate is rejected.
#include <gtest/gtest.h>

#include "builder.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {
namespace {

std::string small_certificate() {
  Draft draft = small_hamming();
  draft.cautions = {"shortened for the cabin"};
  state_everything(draft, 3);
  draft.evidence.push_back(witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1}));
  return draft.bytes();
}

TEST(Tamper, EveryBit) {
  const std::string whole = small_certificate();
  ASSERT_EQ(recheck(whole, {}).outcome, Outcome::proven);
  for (std::size_t i = 0; i < whole.size(); ++i)
    for (unsigned bit = 0; bit < 8; ++bit) {
      std::string changed = whole;
      changed[i] = static_cast<char>(static_cast<unsigned char>(changed[i]) ^ (1U << bit));
      const Report report = recheck(changed, {});
      ASSERT_EQ(report.outcome, Outcome::rejected) << "byte " << i << " bit " << bit;
      ASSERT_FALSE(report.reason.empty());
    }
}

TEST(Tamper, EveryDeletion) {
  const std::string whole = small_certificate();
  for (std::size_t i = 0; i < whole.size(); ++i) {
    std::string changed = whole;
    changed.erase(i, 1);
    ASSERT_EQ(recheck(changed, {}).outcome, Outcome::rejected) << "byte " << i;
  }
}

TEST(Tamper, EveryTruncation) {
  const std::string whole = small_certificate();
  for (std::size_t size = 0; size < whole.size(); ++size)
    ASSERT_EQ(recheck(std::string_view(whole).substr(0, size), {}).outcome, Outcome::rejected) << "size " << size;
}

TEST(Tamper, Additions) {
  const std::string whole = small_certificate();
  for (const char* more : {"\n", " ", "{}", "\xef\xbb\xbf"}) {
    EXPECT_EQ(recheck(whole + more, {}).outcome, Outcome::rejected);
    EXPECT_EQ(recheck(more + whole, {}).outcome, Outcome::rejected);
  }
  EXPECT_EQ(recheck(whole + std::string(1, '\0'), {}).outcome, Outcome::rejected);
}

}  // namespace
}  // namespace assize::recheck::test
