#!/usr/bin/env bash
# Builds everything and runs all tests; the last line reads "N passed, N failed". The tests in a browser use the Chromium of Debian.
# With --coverage a table before that line tells how much of src the tests executed, but for those in a browser and of the command line.
set -euo pipefail
cd "$(dirname "$0")/.."
export DOTNET_NOLOGO=1 DOTNET_CLI_TELEMETRY_OPTOUT=1

command -v chromium >/dev/null || {
  apt-get update -qq
  DEBIAN_FRONTEND=noninteractive apt-get install -y -qq --no-install-recommends chromium fonts-dejavu-core >/dev/null
}

dotnet build auditor.sln -c Release -v quiet

export work=$(mktemp -d) coverage=${1:-}
trap 'rm -rf "$work"' EXIT

# Runs the tests of one project. Those in a browser, and those that start the program hundreds of times, are not slowed down by counting lines.
run() {
  local name=$1 options=()
  case "$coverage $name" in
    "--coverage Auditor.Browser.Tests" | "--coverage Auditor.Cli.Tests") ;;
    --coverage*)
      options=(--coverlet --coverlet-output-format json --coverlet-single-hit
        --coverlet-include '[Auditor.*]*' --coverlet-include '[auditor]*' --results-directory "$work/$name") ;;
  esac
  "tests/$name/bin/Release/net10.0/$name" --no-ansi --no-progress "${options[@]}" > "$work/$name.log" 2>&1 || touch "$work/$name.failed"
  cat "$work/$name.log"
}
export -f run

# Two projects at a time, those that take longest first.
others=$(cd tests && ls -d Auditor.*.Tests | grep -v -e Browser -e Cli)
printf '%s\n' Auditor.Browser.Tests Auditor.Cli.Tests $others | xargs -P 2 -I{} bash -c 'run {}'

count() { sed -n "s/^ *$1: \([0-9][0-9]*\).*/\1/p" "$work"/*.log | awk '{ sum += $1 } END { print sum + 0 }'; }
broken=$(find "$work" -name '*.failed' | wc -l)
passed=$(count succeeded)
failed=$(count failed)
[ "$failed" -gt 0 ] || failed=$broken
[ "$coverage" != "--coverage" ] || tests/Auditor.Coverage/bin/Release/net10.0/Auditor.Coverage src "$work" || broken=1
echo "$passed passed, $failed failed"
[ "$broken" -eq 0 ] && [ "$passed" -gt 0 ] && [ "$failed" -eq 0 ]
