// Certificates that the program writes: the same for any number of threads, and judged by the independent checker.
#include "cli/program.hpp"

namespace assize::cli {
namespace {

class Certificates : public InFolder {
 protected:
  /// The part of a certificate from "claim" to the end of "evidence": what must not depend on the machine.
  [[nodiscard]] std::string claim_and_evidence(const std::string& name) const {
    const std::string bytes = read(name);
    const std::size_t begin = bytes.find("\n\"claim\":");
    const std::size_t end = bytes.find("\n\"cautions\":");
    EXPECT_NE(begin, std::string::npos);
    EXPECT_NE(end, std::string::npos);
    return bytes.substr(begin, end - begin);
  }
};

const std::string gf8 = "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n";

std::vector<std::pair<std::string, std::string>> sheets() {
  std::vector<std::pair<std::string, std::string>> out = {
      {"golay", golay},
      {"golay-extended", golay + "[[then]]\nstep = \"extend\"\n"},
      {"ternary",
       "[field]\norder = 3\n[code]\nfamily = \"cyclic\"\ncodeword_length = 11\n"
       "generator = { algebra = \"x^5 + x^4 + 2*x^3 + x^2 + 2\" }\n"},
      {"hexacode",
       "[field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n[code]\nfamily = \"generator-matrix\"\n"
       "rows = [\"1 0 0 1 2 2\", \"0 1 0 2 1 2\", \"0 0 1 2 2 1\"]\n"},
      {"parity",
       "[code]\nfamily = \"parity-check-matrix\"\nrows = [\"0001111\", \"0110011\", \"1010101\", \"1111111\"]\n"},
      {"frame",
       "[code]\nfamily = \"shortened-cyclic\"\ndata_length = 12\n"
       "generator = { notation = \"full-hex\", value = \"0x107\" }\n"},
      {"frame-dual",
       "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 1016\n"
       "generator = { notation = \"full-hex\", value = \"0x11021\" }\n[[then]]\nstep = \"dual\"\n"},
      {"rm", "[code]\nfamily = \"reed-muller\"\norder = 2\nvariables = 5\n"},
      {"rs-roots", gf8 + "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 6\ndimension = 3\nfirst_root = 2\n"
                         "root_step = 3\nprimitive_element = 3\n"},
      {"rs-points",
       "[field]\norder = 9\nmodulus = \"x^2 + x + 2\"\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = 8\n"
       "dimension = 3\nevaluation_points = \"all\"\nprimitive_element = \"x\"\nmultipliers = [1,2,3,4,5,6,7,8]\n"},
      {"rs-image", gf8 +
                       "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 7\ndimension = 3\nfirst_root = 1\n"
                       "root_step = 1\nprimitive_element = 2\n[[then]]\nstep = \"binary-image\"\nbasis = [3, 5, 7]\n"},
      {"concatenated",
       "[code]\nfamily = \"concatenated\"\nembedding = \"x^5\"\nsymbol_basis = [1, 2]\n"
       "[code.inner.field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n"
       "[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"1 0 1\", \"0 1 1\"]\n"
       "[code.outer.field]\norder = 16\nmodulus = \"x^4 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
       "codeword_length = 15\ndimension = 2\nevaluation_points = \"powers\"\nprimitive_element = 2\n"},
      {"justesen",
       gf8 + "[code]\nfamily = \"justesen\"\nouter_length = 8\nouter_dimension = 3\nevaluation_points = \"all\"\n"
             "primitive_element = 5\nfirst_exponent = 2\n"},
      {"justesen-symbols", gf8 + "[code]\nfamily = \"justesen\"\nouter_length = 7\nouter_dimension = 3\n"
                                 "evaluation_points = \"powers\"\nprimitive_element = 5\nimage = \"symbols\"\n"},
      {"random-251",
       "[field]\norder = 251\n[code]\nfamily = \"random-linear\"\ncodeword_length = 9\ndimension = 2\nseed = 7\n"},
      {"random-512",
       "[field]\norder = 512\nmodulus = \"x^9 + x^4 + 1\"\n[code]\nfamily = \"random-linear\"\n"
       "codeword_length = 5\ndimension = 2\nseed = 7\n"},
      {"random-shards", random_binary(40, 23)},
      {"distance-one", "[code]\nfamily = \"generator-matrix\"\nrows = [\"100\", \"011\"]\n"},
  };
  return out;
}

TEST_F(Certificates, AreTheSameForAnyNumberOfThreadsAndProven) {
  for (const auto& [name, sheet] : sheets()) {
    write(name + ".toml", sheet);
    std::string first;
    for (const char* threads : {"1", "2", "3", "7"}) {
      const std::string file = name + "-" + threads + ".json";
      const Ran ran = assize({"certify", name + ".toml", "--threads", threads, "-o", file});
      ASSERT_EQ(ran.code, 0) << name << ": " << ran.err;
      const std::string part = claim_and_evidence(file);
      if (first.empty()) first = part;
      EXPECT_EQ(part, first) << name << " with " << threads << " threads";
    }
    const Ran checked = checker({name + "-2.json"});
    EXPECT_EQ(checked.code, 0) << name << ": " << checked.out;
    EXPECT_EQ(assize({"recheck", name + "-1.json", "--for", name + ".toml"}).code, 0) << name;
  }
}

TEST_F(Certificates, PlainAndExhaustLeaveTheSameEvidence) {
  for (const auto& [name, sheet] : sheets()) {
    if (name == "random-512" || name == "random-shards" || name == "frame-dual" || name == "rm") continue;
    write(name + ".toml", sheet);
    ASSERT_EQ(assize({"certify", name + ".toml", "--method", "plain", "-o", "a.json", "--replace"}).code, 0) << name;
    ASSERT_EQ(assize({"certify", name + ".toml", "--method", "exhaust", "-o", "b.json", "--replace"}).code, 0) << name;
    EXPECT_EQ(claim_and_evidence("a.json"), claim_and_evidence("b.json")) << name;
  }
}

TEST_F(Certificates, OneChangedDigitIsRejected) {
  write("g.toml", golay);
  ASSERT_EQ(assize({"certify", "g.toml"}).code, 0);
  const std::string bytes = read("g.certificate.json");
  std::size_t tried = 0;
  for (std::size_t i = 0; i < bytes.size(); i += 7) {
    if (bytes[i] < '0' || bytes[i] > '9') continue;
    std::string changed = bytes;
    changed[i] = changed[i] == '9' ? '0' : static_cast<char>(changed[i] + 1);
    write("changed.json", changed);
    const Ran ran = checker({"changed.json", "--depth", "quick"});
    EXPECT_EQ(ran.code, 1) << "byte " << i << "\n" << ran.out;
    ++tried;
  }
  EXPECT_GT(tried, 50U);
}

TEST_F(Certificates, TruncatedAndEmptyOnesAreRejected) {
  write("g.toml", golay);
  ASSERT_EQ(assize({"certify", "g.toml"}).code, 0);
  const std::string bytes = read("g.certificate.json");
  for (const std::size_t size : {std::size_t{0}, std::size_t{1}, bytes.size() / 2, bytes.size() - 1}) {
    write("cut.json", bytes.substr(0, size));
    EXPECT_EQ(checker({"cut.json"}).code, 1) << size;
  }
}

TEST_F(Certificates, AboutAnotherCodeIsRejected) {
  write("g.toml", golay);
  write("h.toml", golay + "[[then]]\nstep = \"extend\"\n");
  ASSERT_EQ(assize({"certify", "g.toml"}).code, 0);
  const Ran ran = assize({"recheck", "g.certificate.json", "--for", "h.toml"});
  EXPECT_EQ(ran.code, 1);
  EXPECT_TRUE(ran.out.starts_with("REJECTED")) << ran.out;
}

TEST_F(Certificates, TheTitleAndTheNotationDoNotMatterForWhichCodeItIs) {
  write("g.toml", golay);
  write("h.toml",
        "title = \"other\"\n[code]\nfamily = \"cyclic\"\ncodeword_length = 23\ngenerator = { notation = \"full-hex\", "
        "value = \"0xAE3\" }\n");
  ASSERT_EQ(assize({"certify", "g.toml"}).code, 0);
  EXPECT_EQ(assize({"recheck", "g.certificate.json", "--for", "h.toml"}).code, 0);
}

}  // namespace
}  // namespace assize::cli
