#!/usr/bin/env bash
# From a fresh copy of the sources to a checked certificate, in one command:
#
#   tools/quickstart.sh [SHEET]
#
# Installs what building needs (Debian 12), builds the release programs, certifies SHEET (certs/cabin-telegram.toml if
# left out), and has the stand-alone checker judge the certificate.  May be run again at any time and from any folder.
# The exit code is that of the first of these steps that did not end with 0.
set -euo pipefail

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
if (($# > 1)) || [[ "${1:-}" == -* ]]; then
  echo "usage: tools/quickstart.sh [SHEET]" >&2
  exit 2
fi
sheet=$(realpath --canonicalize-missing -- "${1:-$root/certs/cabin-telegram.toml}")
if [[ ! -f "$sheet" ]]; then
  echo "quickstart: no file $sheet" >&2
  exit 2
fi

"$root/tools/install-packages.sh" build

cd "$root"
cmake --preset release -DASSIZE_TESTS=OFF
cmake --build --preset release

# Certificates are left in a folder of their own, so that neither sources nor other people's files are touched.
bin=$root/build/release/bin
mkdir -p "$root/build/quickstart"
cd "$root/build/quickstart"
stem=$(basename "$sheet" .toml)
certificate=$stem.certificate.json

echo
echo "== assize certify $(basename "$sheet")"
code=0
"$bin/assize" certify "$sheet" || code=$?
# 1 (the answer is no) and 3 (undecided) leave a certificate too; anything else has none to check.
if [[ $code != [013] ]]; then
  echo "quickstart: certify ended with exit code $code" >&2
  exit "$code"
fi

echo
echo "== assize-recheck $certificate"
recheck_code=0
"$bin/assize-recheck" "$certificate" || recheck_code=$?
((code)) || code=$recheck_code

cat <<END

The certificate is build/quickstart/$certificate. Next steps, from the folder that holds build:
  build/release/bin/assize-recheck build/quickstart/$certificate
  build/release/bin/assize --help
  tools/quickstart.sh YOUR_SHEET.toml
END
exit "$code"
