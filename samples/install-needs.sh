#!/usr/bin/env bash
# Installs with apt the Debian packages that are missing. usage: install-needs.sh build|tests|sample ...
set -euo pipefail

declare -A packages=(
  [build]="g++ cmake ninja-build python3 libboost-dev libreoffice-dev libreoffice-calc"
  [tests]="libgtest-dev libgmock-dev python3-uno python3-numpy python3-scipy python3-iapws python3-gsw libreoffice-l10n-de"
  [sample]="libreoffice-calc python3-uno poppler-utils fonts-liberation"
)

missing=()
for purpose in "$@"; do
  for package in ${packages[$purpose]}; do
    dpkg-query -W -f='${Status}' "$package" 2>/dev/null | grep -q '^install ok installed' || missing+=("$package")
  done
done
[ ${#missing[@]} -eq 0 ] && exit 0

as_root=()
[ "$(id -u)" -eq 0 ] || as_root=(sudo)
echo "Installing: ${missing[*]}"
"${as_root[@]}" apt-get update -qq
"${as_root[@]}" env DEBIAN_FRONTEND=noninteractive apt-get install -y -qq --no-install-recommends "${missing[@]}"
