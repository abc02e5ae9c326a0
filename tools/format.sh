#!/usr/bin/env bash
# Formats the C++ files of src and tests with clang-format 14, the version of Debian 12 (others format differently):
#
#   tools/format.sh           rewrites them
#   tools/format.sh --check   changes nothing, names each file that is not formatted, and ends with exit code 1
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/.."
case "$*" in
  "") how=(-i) ;;
  --check) how=(--dry-run --Werror --ferror-limit=1) ;;
  *)
    echo "usage: tools/format.sh [--check]" >&2
    exit 2
    ;;
esac

formatter=$(command -v clang-format-14 || command -v clang-format || true)
version=$([[ -z "$formatter" ]] || "$formatter" --version)
if [[ ! "$version" =~ version\ 14\. ]]; then
  echo "format: clang-format 14 is needed (tools/install-packages.sh test); found: ${version:-none}" >&2
  exit 2
fi

mapfile -d '' files < <(find src tests \( -name '*.cpp' -o -name '*.hpp' \) -print0 | sort --zero-terminated)
((${#files[@]})) || exit 0
if ! "$formatter" --style=file "${how[@]}" "${files[@]}"; then
  echo "format: run tools/format.sh, which mends the files named above" >&2
  exit 1
fi
