#!/usr/bin/env bash
# Time a layout of `ringward compare` against single runs of `ringward rate`, in one run on one
# machine: invented round columns that differ in bars, cover, load and strength.
#   tests/bench/compare_speed.sh BINARY [LAYOUTS]
# The machine should have nothing else to do. Prints times and ratios.
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

TIMEFORMAT='%R %U %S' # seconds: wall clock, user, system

singles() {
  tail -n +2 columns.csv | while IFS=, read -r _ bar axis load strength; do
    "$binary" rate column.toml --quiet --set "bars[0].diameter_mm=$bar" \
      --set "bars[0].axis_mm=$axis" --set "load.axial_kN=$load" \
      --set "core.strength_MPa=$strength" || [[ $? -eq 1 ]]
  done
}
study() { "$binary" compare study.toml -o "out$1" --jobs "$1" --quiet; }

{ time singles; } 2>single
{ time study 1; } 2>one
{ time study 2; } 2>two
cmp out1/results.jsonl out2/results.jsonl
cat single one two | awk -v n="$count" '
  { wall[NR] = 1000 * $1 / n; cpu[NR] = 1000 * ($2 + $3) / n }
  END {
    printf "%d layouts, ms a layout:     wall clock   processor\n", n
    printf "  rate, one by one        %10.1f  %10.1f\n", wall[1], cpu[1]
    printf "  compare, one thread     %10.1f  %10.1f\n", wall[2], cpu[2]
    printf "  compare, two threads    %10.1f  %10.1f\n", wall[3], cpu[3]
    printf "compare is %.2f times faster a layout on one thread, %.2f on two\n", wall[1] / wall[2], wall[1] / wall[3]
    printf "two threads are %.2f times one\n", wall[2] / wall[3]
  }'
