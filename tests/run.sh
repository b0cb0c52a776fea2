#!/usr/bin/env bash
# Builds everything and runs all tests; the last line reads "N passed, N failed". The tests in a browser use the Chromium of Debian.
# With --coverage a table before that line tells how much of src the tests of all projects together executed.
set -euo pipefail
cd "$(dirname "$0")/.."
export DOTNET_NOLOGO=1 DOTNET_CLI_TELEMETRY_OPTOUT=1

command -v chromium >/dev/null || {
  apt-get update -qq
  DEBIAN_FRONTEND=noninteractive apt-get install -y -qq --no-install-recommends chromium fonts-dejavu-core >/dev/null
}

dotnet build auditor.sln -c Release -v quiet

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
log=$work/log
options=()
if [ "${1:-}" = "--coverage" ]; then
  options=(--coverlet --coverlet-output-format json --coverlet-single-hit
    --coverlet-include '[Auditor.*]*' --coverlet-include '[auditor]*' --results-directory "$work")
fi

status=0
dotnet test --solution auditor.sln -c Release --no-build --no-ansi --no-progress "${options[@]}" 2>&1 | tee "$log" || status=$?

count() { sed -n "s/^ *$1: \([0-9][0-9]*\).*/\1/p" "$log" | tail -n 1; }
passed=$(count succeeded)
failed=$(count failed)
[ "${#options[@]}" -eq 0 ] || tests/Auditor.Coverage/bin/Release/net10.0/Auditor.Coverage src "$work" || status=$?
echo "${passed:-0} passed, ${failed:-0} failed"
[ "$status" -eq 0 ] && [ "${passed:-0}" -gt 0 ] && [ "${failed:-0}" -eq 0 ]
