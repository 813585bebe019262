#!/usr/bin/env bash
# Builds the extension, opens the sample ledger in a headless office with a profile of its own, recalculates everything,
# prints the ledger as a table, and writes it as PDF and PNG under build/.
set -euo pipefail
cd "$(dirname "$0")/.."
bash samples/install-needs.sh build sample
if [ ! -f build/CMakeCache.txt ]; then
  cmake -S . -B build -G Ninja -DCMAKE_BUILD_TYPE=Release -DENTROPY_LEDGER_TESTS=OFF
fi
cmake --build build --target oxt
/usr/bin/python3 -B samples/audit.py build/extension/unpacked samples/dairy-ledger.ods build/audit
