// The programs as a user meets them: words in, exit code and first line out.
#include <sys/stat.h>

#include "cli/program.hpp"

namespace assize::cli {
namespace {

class Commands : public InFolder {};

TEST_F(Commands, HelpIsThereForEverything) {
  EXPECT_EQ(assize({}).code, 2);
  EXPECT_EQ(assize({"--help"}).code, 0);
  EXPECT_EQ(assize({"--version"}).out, "assize 0.1.0\n");
  for (const char* command : {"show", "certify", "weights", "recheck", "selftest"}) {
    const Ran page = assize({command, "--help"});
    EXPECT_EQ(page.code, 0);
    EXPECT_NE(page.out.find("examples:"), std::string::npos) << command;
    EXPECT_NE(page.out.find("exit codes:"), std::string::npos) << command;
    EXPECT_EQ(assize({"help", command}).out, page.out);
  }
  EXPECT_EQ(checker({"--help"}).code, 0);
}

struct Wrong {
  std::vector<std::string> words;
  const char* says;  ///< part of stderr
};

TEST_F(Commands, WrongWordsAreExitCodeTwoWithOneClearLine) {
  write("g.toml", golay);
  write("empty.toml", "");
  write("binary.toml", std::string("\x7f"
                                   "ELF\0\0\1\2",
                                   8));
  write("x.json", "{}");
  const Wrong wrongs[] = {
      {{"certfy", "g.toml"}, "\"certfy\" is not a command"},
      {{"certify"}, "needs a SHEET"},
      {{"certify", "g.toml", "h.toml"}, "one word too many"},
      {{"certify", "g.toml", "--nonsense"}, "\"--nonsense\" is not a flag"},
      {{"show", "g.toml", "--at-least", "3"}, "is not a flag of assize show"},
      {{"certify", "g.toml", "--at-least"}, "--at-least"},
      {{"certify", "g.toml", "--at-least", "0"}, "not a number from 1"},
      {{"certify", "g.toml", "--at-least", "7.5"}, "not a number"},
      {{"certify", "g.toml", "--at-least", "99999999999999999999999"}, "not a number"},
      {{"certify", "g.toml", "--within", "10"}, "not a duration"},
      {{"certify", "g.toml", "--within", "-1s"}, "not a duration"},
      {{"certify", "g.toml", "--within", "0s"}, "not a duration"},
      {{"certify", "g.toml", "--threads", "0"}, "not a number from 1 to 4096"},
      {{"certify", "g.toml", "--kernel", "AVX9"}, "the kernel \"AVX9\" is not known"},
      {{"certify", "g.toml", "--method", "guess"}, "\"guess\" is not a method"},
      {{"certify", "g.toml", "--claim", "everything"}, "not something to claim"},
      {{"certify", "g.toml", "-o", "no/such/folder/x.json"}, "cannot be written"},
      {{"certify", "g.toml", "-o", "x.json"}, "the file exists and is not a certificate"},
      {{"certify", "missing.toml"}, "missing.toml: there is no such file"},
      {{"certify", "/tmp"}, "this is a folder"},
      {{"certify", "empty.toml"}, "the sheet is empty"},
      {{"certify", "binary.toml"}, "zero byte"},
      {{"certify", "/dev/zero"}, "not a regular file"},
      {{"recheck", "missing.json"}, "missing.json"},
      {{"recheck", "/tmp"}, "folder"},
      {{"recheck", "x.json", "--depth", "deep"}, "not a depth"},
      {{"recheck", "x.json", "--seed", "x"}, "not a number"},
      {{"recheck", "x.json", "--for", "missing.toml"}, "there is no such file"},
  };
  for (const Wrong& wrong : wrongs) {
    const Ran ran = assize(wrong.words);
    EXPECT_EQ(ran.code, 2) << wrong.says;
    EXPECT_EQ(ran.out, "") << wrong.says;
    EXPECT_NE(ran.err.find(wrong.says), std::string::npos) << ran.err;
    std::vector<std::string> as_json = wrong.words;
    as_json.push_back("--json");
    const Ran json = assize(as_json);
    EXPECT_EQ(json.code, 2);
    EXPECT_TRUE(json.out.starts_with("{\n\"error\":{\"what\":\"")) << json.out;
  }
  EXPECT_EQ(read("x.json"), "{}") << "a foreign file is not touched";
}

TEST_F(Commands, CertifyThenRecheck) {
  write("g.toml", golay);
  const Ran certified = assize({"certify", "g.toml"});
  EXPECT_EQ(certified.code, 0) << certified.err;
  EXPECT_EQ(certified.first_line(), "proved  [23,12] over GF(2): minimum distance exactly 7");
  EXPECT_EQ(certified.err, "") << "no progress where there is no terminal";
  const Ran full = assize({"recheck", "g.certificate.json", "--for", "g.toml"});
  EXPECT_EQ(full.code, 0);
  EXPECT_TRUE(full.out.starts_with("PROVEN  [23,12] over GF(2): minimum distance exactly 7")) << full.out;
  EXPECT_EQ(checker({"g.certificate.json"}).out, assize({"recheck", "g.certificate.json"}).out);
  EXPECT_EQ(checker({"g.certificate.json", "--depth", "quick"}).code, 3);
  EXPECT_EQ(assize({"recheck", "g.certificate.json", "--depth", "quick", "--quiet"}).out.find("CONSISTENT"), 0U);
}

TEST_F(Commands, JsonIsOneDocumentOfTheAgreedShape) {
  write("g.toml", golay);
  const Ran certified = assize({"certify", "g.toml", "--json"});
  EXPECT_EQ(certified.code, 0);
  EXPECT_TRUE(certified.out.starts_with(
      "{\n\"verdict\":\"proved\",\n\"order\":2,\n\"length\":23,\n\"dimension\":12,\n"
      "\"distance\":{\"at_least\":7,\"at_most\":7},\n\"minimum_words\":\"253\",\n\"witness\":\""))
      << certified.out;
  EXPECT_NE(certified.out.find("\"method\":\"exhaust\",\n\"evidence_class\":\"re-run\",\n\"certificate\":\"g."
                               "certificate.json\",\n\"seconds\":"),
            std::string::npos)
      << certified.out;
  EXPECT_EQ(
      assize({"weights", "g.toml", "--json"}).out,
      "{\n\"order\":2,\n\"length\":23,\n\"dimension\":12,\n\"complete\":true,\n\"counts\":{\"0\":\"1\",\"7\":\"253\","
      "\"8\":\"506\",\"11\":\"1288\",\"12\":\"1288\",\"15\":\"506\",\"16\":\"253\",\"23\":\"1\"}}\n");
}

TEST_F(Commands, AtLeastIsProvedOrRefuted) {
  write("g.toml", golay);
  EXPECT_EQ(assize({"certify", "g.toml", "--at-least", "7"}).code, 0);
  EXPECT_EQ(assize({"recheck", "g.certificate.json"}).code, 0);
  const Ran refuted = assize({"certify", "g.toml", "--at-least", "8"});
  EXPECT_EQ(refuted.code, 1);
  EXPECT_TRUE(refuted.out.starts_with("refuted  ")) << refuted.out;
  EXPECT_EQ(assize({"recheck", "g.certificate.json"}).code, 0) << "the witness is a certificate of its own";
}

TEST_F(Commands, ATheoremAloneCanProve) {
  write("rs.toml",
        "title = \"Event recorder block\"\n[field]\norder = 256\nmodulus = \"x^8 + x^4 + x^3 + x^2 + "
        "1\"\n[code]\nfamily = "
        "\"reed-solomon\"\ncodeword_length = 255\ndimension = 223\nfirst_root = 0\nroot_step = 1\nprimitive_element = "
        "2\n");
  const Ran certified = assize({"certify", "rs.toml"});
  EXPECT_EQ(certified.code, 0) << certified.err;
  EXPECT_EQ(certified.first_line(), "proved  [255,223] over GF(256): minimum distance exactly 33");
  EXPECT_EQ(assize({"recheck", "rs.certificate.json"}).code, 0) << "nothing has to be enumerated again";
  EXPECT_EQ(assize({"weights", "rs.toml"}).code, 3);
}

TEST_F(Commands, TheAbsurdIsNotStarted) {
  write("big.toml", random_binary(200, 100));
  const Ran ran = assize({"certify", "big.toml"});
  EXPECT_EQ(ran.code, 3);
  EXPECT_NE(ran.out.find("not started"), std::string::npos) << ran.out;
  EXPECT_EQ(assize({"recheck", "big.certificate.json"}).code, 0) << "the upper bound is proved by its witness";
}

TEST_F(Commands, PlanRunsNothing) {
  write("r.toml", random_binary(64, 40));
  const Ran ran = assize({"certify", "r.toml", "--plan"});
  EXPECT_EQ(ran.code, 0);
  EXPECT_NE(ran.out.find("1,099,511,627,775 messages"), std::string::npos) << ran.out;
  EXPECT_EQ(files(), 1U) << "no certificate";
}

TEST_F(Commands, ABudgetEndsARunWithWhatIsThere) {
  write("r.toml", random_binary(64, 44));
  const Ran ran = assize({"certify", "r.toml", "--within", "1s"});
  EXPECT_EQ(ran.code, 3);
  EXPECT_TRUE(ran.out.starts_with("undecided  [64,44] over GF(2): minimum distance at least 1 and at most "))
      << ran.out;
  EXPECT_EQ(assize({"recheck", "r.certificate.json", "--depth", "quick"}).code, 0) << "its only statement is a witness";
}

TEST_F(Commands, TheFirstSignalEndsTheRunInOrderASecondAtOnce) {
  // The first line of progress says that the work has begun, however slow the machine is.
  const auto wait_for_progress = [this] {
    for (int i = 0; i < 600 && read(".err").empty(); ++i) usleep(100000);
  };
  write("r.toml", random_binary(64, 40));
  for (const int signal : {SIGINT, SIGTERM}) {
    const pid_t child = start(ASSIZE_PROGRAM, {"certify", "r.toml", "--within", "10h", "--progress"});
    wait_for_progress();
    kill(child, signal);
    const Ran ran = finish(child);
    EXPECT_EQ(ran.code, 3) << ran.err;
    EXPECT_NE(ran.out.find("interrupted"), std::string::npos) << ran.out;
  }
  // A shard of a longer job takes longer than the pause between the signals.
  write("long.toml", random_binary(64, 52));
  const pid_t child = start(ASSIZE_PROGRAM, {"certify", "long.toml", "--within", "10h", "--progress"});
  wait_for_progress();
  kill(child, SIGINT);
  usleep(100000);
  kill(child, SIGINT);
  EXPECT_EQ(finish(child).code, 130);
  EXPECT_FALSE(std::filesystem::exists(path("long.certificate.json")));
}

TEST_F(Commands, AResultThatCannotBePrintedIsNotSuccess) {
  write("g.toml", golay);
  EXPECT_EQ(assize({"weights", "g.toml"}, "/dev/full").code, 2);
  EXPECT_EQ(assize({"--help"}, "/dev/full").code, 2);
}

TEST_F(Commands, OnlyAnUnsignedCertificateOfTheSameCodeIsReplaced) {
  write("g.toml", golay);
  write("h.toml", random_binary(20, 5));
  EXPECT_EQ(assize({"certify", "g.toml", "-o", "c.certificate.json"}).code, 0);
  EXPECT_EQ(assize({"certify", "g.toml", "-o", "c.certificate.json"}).code, 0);
  const Ran other = assize({"certify", "h.toml", "-o", "c.certificate.json"});
  EXPECT_EQ(other.code, 2);
  EXPECT_NE(other.err.find("another code"), std::string::npos);
  write("c.signatures.json", "{}");
  EXPECT_NE(assize({"certify", "g.toml", "-o", "c.certificate.json"}).err.find("is signed"), std::string::npos);
  EXPECT_EQ(assize({"certify", "h.toml", "-o", "c.certificate.json", "--replace"}).code, 0);
}

TEST_F(Commands, ThePlaceOfTheCertificateIsLookedAtBeforeTheWork) {
  write("long.toml", random_binary(64, 44));
  const Ran ran = assize({"certify", "long.toml", "--within", "1h", "-o", "no/such/folder/c.json"});
  EXPECT_EQ(ran.code, 2) << "at once, not after an hour";
}

TEST_F(Commands, OnlyRegularFilesAreReplacedAndNeverTheSheet) {
  write("g.toml", golay);
  ASSERT_EQ(assize({"certify", "g.toml"}).code, 0);
  std::filesystem::create_symlink("g.certificate.json", path("link.json"));
  std::filesystem::create_directory(path("folder"));
  ASSERT_EQ(mkfifo(path("pipe").c_str(), 0600), 0);
  for (const char* taken : {"link.json", "folder", "pipe", "/dev/null"}) {
    const Ran ran = assize({"certify", "g.toml", "-o", taken, "--replace"});
    EXPECT_EQ(ran.code, 2) << taken;
    EXPECT_NE(ran.err.find("a folder, a link or a device"), std::string::npos) << ran.err;
  }
  EXPECT_TRUE(std::filesystem::is_symlink(path("link.json")));
  const Ran sheet = assize({"certify", "g.toml", "-o", "g.toml", "--replace"});
  EXPECT_EQ(sheet.code, 2);
  EXPECT_EQ(read("g.toml"), golay);
}

TEST_F(Commands, AShardThatTakesTooLongIsGivenUp) {
  write("huge.toml", random_binary(80, 58));  // shards of hours
  const Ran ran = assize({"certify", "huge.toml", "--within", "1s"});
  EXPECT_EQ(ran.code, 3);
  EXPECT_NE(ran.out.find("0 of "), std::string::npos) << ran.out;
}

TEST_F(Commands, NumbersBeyondReachAreSaidShortly) {
  write("far.toml", random_binary(4000, 3000));
  const Ran ran = assize({"weights", "far.toml", "--plan"});
  EXPECT_EQ(ran.code, 0);
  EXPECT_NE(ran.out.find("about 10^903 messages"), std::string::npos) << ran.out;
  EXPECT_EQ(assize({"weights", "far.toml"}).out.find("inf"), std::string::npos);
}

TEST_F(Commands, TitlesCannotSteerTheTerminal) {
  write("t.toml", "title = \"\\u001b[31mred\\u202e\"\n" + golay.substr(golay.find('\n') + 1));
  const Ran ran = assize({"show", "t.toml"});
  EXPECT_EQ(ran.out.find('\x1b'), std::string::npos);
  EXPECT_EQ(ran.out.find("\xe2\x80\xae"), std::string::npos);
  EXPECT_NE(ran.out.find("?[31mred?"), std::string::npos) << ran.out;
}

TEST_F(Commands, SheetsThatNestWithoutEndAreRefused) {
  write("self.toml", "[code]\nfamily = \"direct-sum\"\nfirst = \"self.toml\"\nsecond = \"self.toml\"\n");
  const Ran self = assize({"show", "self.toml"});
  EXPECT_EQ(self.code, 2);
  EXPECT_NE(self.err.find("perhaps a sheet names itself"), std::string::npos) << self.err;
  write("l0.toml", "[code]\nfamily = \"generator-matrix\"\nrows = [\"1\"]\n");
  for (int level = 1; level <= 3; ++level) {
    std::string inner;
    for (int i = 0; i < 60; ++i) inner += "\"l" + std::to_string(level - 1) + ".toml\", ";
    write("l" + std::to_string(level) + ".toml",
          "[code]\nfamily = \"concatenated\"\nouter = \"l0.toml\"\ninner_by_position = [" + inner + "]\n");
  }
  const Ran wide = assize({"show", "l3.toml"});
  EXPECT_EQ(wide.code, 2);
  EXPECT_NE(wide.err.find("more than 4096 sub-sheets"), std::string::npos) << wide.err;
}

TEST_F(Commands, MatricesThatAreShownCanBeReadBack) {
  write("g.toml", golay);
  for (const char* layout : {"text", "csv", "matrix-market", "sparse-list", "npy"}) {
    write("m", assize({"show", "g.toml", "--matrix", "parity", "--layout", layout}).out);
    write("from-file.toml",
          "[code]\nfamily = \"parity-check-matrix\"\nfile = \"m\"\nlayout = \"" + std::string(layout) + "\"\n");
    const Ran ran = assize({"certify", "from-file.toml", "--quiet"});
    EXPECT_EQ(ran.out, "proved  [23,12] over GF(2): minimum distance exactly 7\n") << layout << ran.err;
  }
}

TEST_F(Commands, SelfTest) {
  const Ran ran = assize({"selftest"});
  EXPECT_EQ(ran.code, 0) << ran.err;
  EXPECT_NE(ran.out.find("kernels compiled  "), std::string::npos);
  EXPECT_EQ(ran.out.find("kernels run       \n"), std::string::npos);
}

TEST_F(Commands, SubSheetsAreFoundBesideTheSheet) {
  std::filesystem::create_directory(path("sub"));
  write("sub/inner.toml", "[code]\nfamily = \"generator-matrix\"\nrows = [\"1001\", \"0101\", \"0011\"]\n");
  write("sub/all.toml",
        "[code]\nfamily = \"concatenated\"\ninner = \"inner.toml\"\n[code.outer.field]\norder = 8\nmodulus = \"x^3 + x "
        "+ 1\"\n"
        "[code.outer.code]\nfamily = \"reed-solomon\"\ncodeword_length = 7\ndimension = 3\nfirst_root = 1\nroot_step = "
        "1\n"
        "primitive_element = 2\n");
  const Ran ran = assize({"certify", "sub/all.toml"});
  EXPECT_EQ(ran.code, 0) << ran.err;
  EXPECT_EQ(assize({"recheck", "all.certificate.json", "--for", "sub/all.toml"}).code, 0);
  const Ran shown = assize({"show", "sub/all.toml"});
  EXPECT_NE(shown.out.find("minimum distance at least 10"), std::string::npos) << shown.out;
}

}  // namespace
}  // namespace assize::cli
