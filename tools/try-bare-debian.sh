#!/usr/bin/env bash
# Proves that a bare Debian 12 is enough: makes one, copies the tracked files into it and runs the scripts there, as root,
# without sudo, git or python3.  Steps that install something can only be judged where it is not installed already.
#
#   tools/try-bare-debian.sh [--test] [--folder DIR]
#
#   --test        also runs tools/test.sh, after tools/quickstart.sh
#   --folder DIR  keeps the pristine system, the downloaded packages and the last try in DIR, so that the next try starts
#                 sooner; each try still begins with the pristine system.  Without it everything is removed at the end.
#
# Needs root, git, debootstrap and network; packages come from where this machine's own apt fetches them.
set -euo pipefail

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
release=bookworm

fail() {
  echo "try-bare-debian: $*" >&2
  exit 2
}

scripts=(tools/quickstart.sh)
folder=
while (($#)); do
  case "$1" in
    --test) scripts+=(tools/test.sh) ;;
    --folder)
      (($# > 1)) || fail "--folder needs a name"
      folder=$2
      shift
      ;;
    *) fail "usage: tools/try-bare-debian.sh [--test] [--folder DIR]" ;;
  esac
  shift
done
[[ $(id -u) == 0 ]] || fail "must run as root"
for tool in git debootstrap unshare chroot apt-get; do
  command -v "$tool" >/dev/null || fail "needs $tool"
done

if [[ -z "$folder" ]]; then
  folder=$(mktemp -d)
  # Nothing is mounted below it here: see the private mount namespace below.
  trap 'rm -rf --one-file-system "$folder"' EXIT
fi
mkdir -p "$folder/packages/partial"
folder=$(cd "$folder" && pwd)
pristine=$folder/pristine
try=$folder/try

# --- Where this machine gets its packages from ---
origins() {
  apt-get indextargets --format "$1" 'Created-By: Packages' 'Origin: Debian' 'Component: main' |
    { grep -F "$release" || true; } | sort --unique
}
mapfile -t sources < <(origins 'deb $(REPO_URI) $(RELEASE) main')
mirror=$(origins '$(CODENAME) $(REPO_URI)' | sed -n "s/^$release //p" | head -n 1)
[[ -n "$mirror" ]] || fail "this machine's apt knows no Debian $release; run apt-get update"

variables=(PATH=/usr/sbin:/usr/bin:/sbin:/bin HOME=/root LANG=C.UTF-8)
apt_proxy=$(apt-config shell proxy Acquire::http::Proxy | sed "s/^proxy='\(.*\)'$/\1/")
if [[ -n "$apt_proxy" && -z "${http_proxy:-}" ]]; then
  export http_proxy=$apt_proxy  # debootstrap does not read apt's settings
fi
for name in http_proxy https_proxy no_proxy; do
  if [[ -n "${!name:-}" ]]; then
    variables+=("$name=${!name}")
  fi
done

# --- The pristine system ---
if [[ ! -e "$pristine/etc/debian_version" ]]; then
  extra=()
  if [[ "${sources[*]}" == *https:* ]]; then
    extra=(--include=ca-certificates)
  fi
  rm -rf --one-file-system "$folder/unfinished"
  debootstrap --variant=minbase "${extra[@]}" "$release" "$folder/unfinished" "$mirror"
  mv "$folder/unfinished" "$pristine"
fi

# --- The try ---
rm -rf --one-file-system "$try"
cp -a --reflink=auto "$pristine" "$try"
printf '%s\n' "${sources[@]}" >"$try/etc/apt/sources.list"
apt-config dump | { grep -E '^Acquire::(http|https|Check|Retries|ForceIPv)' || true; } >"$try/etc/apt/apt.conf.d/90host"
cp -L /etc/resolv.conf "$try/etc/resolv.conf"
if [[ "${sources[*]}" == *https:* ]]; then
  cp -L /etc/ssl/certs/ca-certificates.crt "$try/etc/ssl/certs/ca-certificates.crt"
fi
mkdir "$try/assize"
git -C "$root" ls-files -z | tar --create --directory "$root" --null --files-from=- |
  tar --extract --directory "$try/assize"

# Mounts and processes live in namespaces of their own, so that they end with the try, however it ends.
inside='
  set -euo pipefail
  mount -t proc proc "$TRY/proc"
  mount --bind "$PACKAGES" "$TRY/var/cache/apt/archives"
  for script in $SCRIPTS; do
    echo "== bare Debian: $script"
    env --ignore-environment "$@" chroot "$TRY" /bin/bash -euc "cd /tmp && exec /assize/$script" </dev/null
  done'
for tool in git sudo python3 g++ cmake; do
  [[ ! -e "$try/usr/bin/$tool" ]] || fail "the system in $pristine is not bare: it has $tool"
done
TRY=$try PACKAGES=$folder/packages SCRIPTS="${scripts[*]}" \
  unshare --mount --propagation private --pid --fork --kill-child \
  bash -c "$inside" bash "${variables[@]}"
echo "try-bare-debian: passed: ${scripts[*]}"
