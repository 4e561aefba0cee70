#!/usr/bin/env bash
# Time a layout of `ringward compare` against single runs of `ringward rate`, in one run on one
# machine: invented round columns that differ in bars, cover, load and strength.
#   tests/bench/compare_speed.sh BINARY [LAYOUTS]
# The machine should have nothing else to do. Prints seconds, ratios and the largest memory.
set -euo pipefail
binary="$(realpath -- "$1")"
count="${2:-1000}"
root="$(cd -- "$(dirname -- "${BASH_SOURCE[0]}")/../.." && pwd -P)"
folder="$(mktemp -d)"
trap 'rm -rf -- "$folder"' EXIT
cp -- "$root/docs/examples/atrium-column.toml" "$folder/column.toml"
cd -- "$folder"

# A linear congruence in place of random numbers, so that every run has the same columns.
awk -v count="$count" '
  function draw(n) { state = (state * 1103515245 + 12345) % 2147483648; return int(state / 65536) % n }
  BEGIN {
    state = 7
    print "name,bars[0].diameter_mm,bars[0].axis_mm,load.axial_kN,core.strength_MPa"
    for (i = 1; i <= count; ++i)
      printf "C%d,%d,%d,%d,%d\n", i, 16 + 2 * draw(6), 35 + draw(26), 1500 + 10 * draw(150), 30 + 5 * draw(5)
  }' >columns.csv
printf 'title = "Speed (invented)"\nbase = "column.toml"\ncolumns_csv = "columns.csv"\n' >study.toml

now() { date +%s.%N; }
study() { # study THREADS: seconds
  local start
  start="$(now)"
  "$binary" compare study.toml -o "out$1" --jobs "$1" --quiet
  awk -v a="$start" -v b="$(now)" 'BEGIN { print b - a }'
}

start="$(now)"
tail -n +2 columns.csv | while IFS=, read -r _ bar axis load strength; do
  "$binary" rate column.toml --quiet --set "bars[0].diameter_mm=$bar" --set "bars[0].axis_mm=$axis" \
    --set "load.axial_kN=$load" --set "core.strength_MPa=$strength" || [[ $? -eq 1 ]]
done
single="$(awk -v a="$start" -v b="$(now)" 'BEGIN { print b - a }')"
one="$(study 1)"
two="$(study 2)"
cmp out1/results.jsonl out2/results.jsonl
awk -v n="$count" -v s="$single" -v one="$one" -v two="$two" 'BEGIN {
  printf "%d layouts: single runs %.1f s, compare on 1 thread %.1f s, on 2 threads %.1f s\n", n, s, one, two
  printf "a layout: %.1f ms, %.1f ms, %.1f ms\n", 1000 * s / n, 1000 * one / n, 1000 * two / n
  printf "compare is %.2f times faster a layout on 1 thread, %.2f on 2; 2 threads are %.2f times 1\n", s / one, s / two, one / two
}'
