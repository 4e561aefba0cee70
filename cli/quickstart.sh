#!/usr/bin/env bash
# From a bare Debian 12 to a first result: installs what is missing, builds the program, rates an
# example column and writes its dossier. Safe to run again. The result goes to stdout, all else to stderr.
set -euo pipefail
# shellcheck source=cli/setup.sh
source "$(dirname -- "${BASH_SOURCE[0]}")/setup.sh"

install_packages "${build_packages[@]}" "${recommended_packages[@]}"
configure_tree build -DCMAKE_BUILD_TYPE=Release -DRINGWARD_SANITIZE=OFF -DRINGWARD_TESTS=OFF
build_tree build ringward

say "the program is $ringward_root/build/ringward"
say "rating an invented example: ringward rate docs/examples/atrium-column.toml"
# Exit status 1 is an answer (the required rating is not met), not a fault of this script.
status=0
"$ringward_root/build/ringward" rate "$ringward_root/docs/examples/atrium-column.toml" || status=$?
if [[ "$status" -eq 1 ]]; then
  say "exit status 1: computed, the required rating is not met"
elif [[ "$status" -ne 0 ]]; then
  exit "$status"
fi

dossier="$ringward_root/build/atrium-dossier"
say "writing its dossier for code review: ringward dossier docs/examples/atrium-column.toml"
status=0
"$ringward_root/build/ringward" dossier "$ringward_root/docs/examples/atrium-column.toml" \
  -o "$dossier.html" --pdf "$dossier.pdf" --quiet || status=$?
# Exit status 5: the page is there, but no PDF.
if [[ "$status" -gt 1 && "$status" -ne 5 ]]; then
  exit "$status"
fi
say "the dossier is $dossier.html"
if [[ "$status" -ne 5 ]]; then say "and, on A4, $dossier.pdf"; fi
