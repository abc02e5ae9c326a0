# Finds the libraries that the rooms use; which room uses which is said in src/CMakeLists.txt.
find_package(PkgConfig REQUIRED)
pkg_check_modules(sodium REQUIRED IMPORTED_TARGET libsodium>=1.0.18)
# As the packaged shared library: the package's own flags switch the header-only mode off, which compiles much faster.
pkg_check_modules(tomlplusplus REQUIRED IMPORTED_TARGET tomlplusplus>=3.3)
find_package(Boost 1.74 REQUIRED)
find_package(nlohmann_json 3.11 REQUIRED)
find_package(CLI11 2.1 REQUIRED)
if(ASSIZE_RUNNER STREQUAL "openmp")
  find_package(OpenMP REQUIRED COMPONENTS CXX)
else()
  find_package(Threads REQUIRED)
endif()
