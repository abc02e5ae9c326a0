#!/usr/bin/env bash
# Installs the Debian 12 packages of the named groups, as far as they are missing:
#
#   tools/install-packages.sh build        what the programs need
#   tools/install-packages.sh build test   and what the tests need
#
# Works as root; anyone else needs sudo.  If nothing is missing, nothing is asked of either.
# ASSIZE_KEEP_PACKAGES=1 skips all of it, for systems where the libraries come another way.
set -euo pipefail

build=(g++ cmake ninja-build pkg-config libboost-dev libsodium-dev libtomlplusplus-dev nlohmann-json3-dev libcli11-dev)
test=(libgtest-dev libntl-dev libgmp-dev clang-format-14)

fail() {
  echo "install-packages: $*" >&2
  exit 2
}

wanted=()
for group in "$@"; do
  case "$group" in
    build) wanted+=("${build[@]}") ;;
    test) wanted+=("${test[@]}") ;;
    *) fail "unknown group \"$group\"; the groups are build and test" ;;
  esac
done
((${#wanted[@]})) || fail "name at least one group: build, test"
[[ "${ASSIZE_KEEP_PACKAGES:-0}" != 1 ]] || exit 0

if ! command -v apt-get >/dev/null || ! command -v dpkg-query >/dev/null; then
  fail "this system has no apt-get. Install the counterparts of these Debian 12 packages, then run again" \
    "with ASSIZE_KEEP_PACKAGES=1: ${wanted[*]}"
fi

missing=()
for package in "${wanted[@]}"; do
  # Not a pipe into grep -q: that would end dpkg-query early and count as a failure.
  status=$(dpkg-query --show --showformat '${db:Status-Status} ' "$package" 2>/dev/null || true)
  [[ " $status" == *" installed "* ]] || missing+=("$package")
done
((${#missing[@]})) || exit 0

as_root=()
if [[ $(id -u) != 0 ]]; then
  command -v sudo >/dev/null || fail "not root, and no sudo. Have an administrator run: apt-get install ${missing[*]}"
  as_root=(sudo)
fi
apt() {
  "${as_root[@]}" env DEBIAN_FRONTEND=noninteractive apt-get --quiet --yes -o Dpkg::Use-Pty=0 "$@"
}
install() {
  apt install --no-install-recommends "${missing[@]}"
}

echo "install-packages: installing ${missing[*]}"
# The lists of packages are fetched only where they are absent or too old to install from.
if ! apt-cache show "${missing[@]}" >/dev/null 2>&1 || ! install; then
  apt update
  install || fail "apt-get could not install: ${missing[*]}"
fi
