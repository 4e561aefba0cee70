#!/usr/bin/env bash
# Makes docs/validation.md and the pictures in docs/validation/ anew, all of them or none.
#   bash tests/validation/page.sh [BUILD]             from the stored study of the uncertainty
#   bash tests/validation/page.sh [BUILD] --studies   runs that study first (some ten minutes)
# BUILD is a configured build folder below the root of the project (build).
set -euo pipefail

cd -- "$(dirname -- "${BASH_SOURCE[0]}")/../.."
build=build
studies=no
for argument in "$@"; do
  case "$argument" in
    --studies) studies=yes ;;
    -*) printf 'unknown option %s\n' "$argument" >&2; exit 2 ;;
    *) build="$argument" ;;
  esac
done

cmake --build "$build" --target validation_page uncertainty_study >&2
if [[ "$studies" == yes ]]; then
  rows="$(mktemp)"
  trap 'rm -f -- "$rows"' EXIT
  "$build/tests/uncertainty_study" >"$rows"
  cp -- "$rows" tests/validation/uncertainty_study.csv
fi
"$build/tests/validation_page"
