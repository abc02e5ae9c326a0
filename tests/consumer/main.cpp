// Uses the installed library the way a stranger would: understands a code sheet and prints what was understood.
#include <assize/assize.hpp>
#include <iostream>

int main(int argc, char** argv) {
  if (argc != 2) {
    std::cerr << "usage: consumer SHEET\n";
    return 2;
  }
  const auto shown = assize::api::show({argv[1], "", ""});
  if (!shown) {
    std::cerr << shown.problem().where << ": " << shown.problem().what << '\n';
    return 2;
  }
  std::cout << assize::api::program_name() << '\n' << shown->text;
  return 0;
}
