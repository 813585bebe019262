#!/usr/bin/env bash
# Installs what is missing, builds, and runs all tests through ctest; ends with ctest's summary.
# usage: bash tests/run.sh [further arguments of ctest, such as -L unit]
set -euo pipefail
cd "$(dirname "$0")/.."
bash samples/install-needs.sh build tests
cmake -S . -B build -G Ninja -DCMAKE_BUILD_TYPE=Release -DENTROPY_LEDGER_TESTS=ON
cmake --build build
ctest --test-dir build --no-tests=error --output-on-failure -j2 "$@"
