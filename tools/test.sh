#!/usr/bin/env bash
# All tests, the way every change has to pass them:
#
#   tools/test.sh
#
# Installs what the tests need (Debian 12), checks the formatting, builds the release preset with the tests and with
# warnings as errors, and runs everything.  The last lines are CTest's own.
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/.."
tools/install-packages.sh build test
tools/format.sh --check
cmake --preset release -DASSIZE_TESTS=ON -DASSIZE_WARNINGS_AS_ERRORS=ON
cmake --build --preset release
exec ctest --test-dir build/release --output-on-failure --no-tests=error -j2
