#!/usr/bin/env bash
# Measures the whole program beside an empty .NET program and a Node.js script that only parses and validates the same design.
# Usage: compare.sh [ROUNDS] [CIRCUITS...]; without arguments 5 rounds of 40, 1,000, 10,000 and 100,000 circuits.
# Prints medians in seconds, ratios, peak memory, and the exponent of growth between the two largest sizes.
# A design may state two million values, some 38,000 circuits: larger sizes are several designs of at most 25,000 circuits in one run.
# The runs of a round alternate, so that a machine that is busy for a while is so for all of them.
set -euo pipefail
cd "$(dirname "$0")"
rounds=${1:-5}
sizes=("${@:2}")
[ "${#sizes[@]}" -gt 0 ] || sizes=(40 1000 10000 100000)
root=$(git rev-parse --show-toplevel)
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

# What is committed is measured, out of the checkout, whose lock files publishing for one system would change.
mkdir "$work/checkout"
git -C "$root" archive HEAD | tar -x -C "$work/checkout"
dotnet publish "$work/checkout/src/Auditor.Cli" -c Release -r linux-x64 -p:PublishAot=true -o "$work/auditor" -v quiet >&2
mkdir "$work/empty"
cat > "$work/empty/empty.csproj" <<'X'
<Project Sdk="Microsoft.NET.Sdk">
  <PropertyGroup><OutputType>Exe</OutputType><TargetFramework>net10.0</TargetFramework><InvariantGlobalization>true</InvariantGlobalization></PropertyGroup>
</Project>
X
echo 'return 0;' > "$work/empty/Program.cs"
dotnet publish "$work/empty" -c Release -r linux-x64 --self-contained false -p:PublishReadyToRun=true -o "$work/empty/out" -v quiet >&2
cp package.json parse.mjs "$work"
npm install --prefix "$work" --no-package-lock --no-audit --no-fund --silent >&2

# Runs a command; appends its seconds and its peak memory in KB to a file. What it says and whether it finds faults does not matter.
measure() {
  local to=$1
  shift
  command time -f '%e %M' -a -o "$to" "$@" > "$work/said" 2>&1 || [ "$?" -eq 1 ] || { cat "$work/said" >&2; exit 2; }
  sed -i '/^Command exited/d' "$to"
}

median() { sort -n -k "$2" "$1" | awk -v column="$2" '{ values[NR] = $column } END { print values[int((NR + 1) / 2)] }'; }

printf '%9s %9s %9s %9s %9s %9s %11s %11s\n' circuits empty node auditor /empty /node 'node MB' 'auditor MB'
for size in "${sizes[@]}"; do
  mkdir "$work/$size"
  for ((left = size; left > 0; left -= 25000)); do
    node generate.mjs $((left < 25000 ? left : 25000)) > "$work/$size/$left.design.yaml"
  done
  for _ in $(seq "$rounds"); do
    measure "$work/empty.$size" "$work/empty/out/empty"
    measure "$work/node.$size" node "$work/parse.mjs" "$root/rules/schema/design.schema.json" "$work/$size"/*.design.yaml
    measure "$work/auditor.$size" "$work/auditor/auditor" audit "$work/$size"/*.design.yaml --quiet --write '{name}.findings.json'
  done
  a=$(median "$work/empty.$size" 1) b=$(median "$work/node.$size" 1) c=$(median "$work/auditor.$size" 1)
  awk -v n="$size" -v a="$a" -v b="$b" -v c="$c" -v mb="$(median "$work/node.$size" 2)" -v mc="$(median "$work/auditor.$size" 2)" \
    'BEGIN { printf "%9d %9.3f %9.3f %9.3f %9.1f %9.1f %11.0f %11.0f\n", n, a, b, c, c / a, c / b, mb / 1024, mc / 1024 }'
  [ -z "${before:-}" ] || exponent=$(awk -v n="$size" -v m="$before" -v c="$c" -v d="$time_before" 'BEGIN { printf "%.2f", log(c / d) / log(n / m) }')
  before=$size time_before=$c
done
echo "exponent of growth between the two largest: ${exponent:-not known}"
