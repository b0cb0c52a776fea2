#!/usr/bin/env bash
# Writes the committed reports of every example, or with --check tells which of them are stale.
set -euo pipefail
cd "$(dirname "$0")/.."
auditor=${AUDITOR_PROGRAM:-$PWD/src/Auditor.Cli/bin/Release/net10.0/auditor}
out=examples
if [ "${1:-}" = "--check" ]; then
  out=$(mktemp -d)
  trap 'rm -rf "$out"' EXIT
  cp -r examples/. "$out"
fi

root=$PWD
cd "$out/.."
folder=$(basename "$out")
"$auditor" audit "$folder" --as-of 2026-12-01 --quiet \
  --write '{name}.findings.json' --write '{name}.report.md' --write '{name}.report.txt' || [ $? -eq 1 ]

if [ "${1:-}" = "--check" ]; then
  diff -r "$root/examples" "$out" || { echo "run tests/reports.sh and review what it changed" >&2; exit 1; }
  echo "reports of the examples are up to date"
fi
