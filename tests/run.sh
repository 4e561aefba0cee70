#!/usr/bin/env bash
# Installs what is missing, builds and runs the whole test suite. Safe to run again.
#   tests/run.sh [--sanitize] [ctest options]
# --sanitize: a second build with the address and undefined-behaviour sanitizers.
set -euo pipefail
# shellcheck source=cli/setup.sh
source "$(dirname -- "${BASH_SOURCE[0]}")/../cli/setup.sh"

tree=build
options=(-DCMAKE_BUILD_TYPE=Release -DRINGWARD_SANITIZE=OFF)
sanitize=false
if [[ "${1:-}" == --sanitize ]]; then
  shift
  sanitize=true
  tree=build-sanitize
  # With sanitizers gcc 12 takes the insides of std::regex for uninitialised: not a warning here,
  # while the plain build keeps it.
  flags="-O1 -g1 -D_GLIBCXX_ASSERTIONS -Wno-maybe-uninitialized"
  options=(-DCMAKE_BUILD_TYPE=Debug "-DCMAKE_CXX_FLAGS_DEBUG=$flags" -DRINGWARD_SANITIZE=ON)
  export ASAN_OPTIONS="${ASAN_OPTIONS:-detect_stack_use_after_return=1:strict_string_checks=1}"
  export UBSAN_OPTIONS="${UBSAN_OPTIONS:-print_stacktrace=1}"
fi

install_packages "${build_packages[@]}" "${recommended_packages[@]}" "${test_packages[@]}"
configure_tree "$tree" "${options[@]}" -DRINGWARD_TESTS=ON
build_tree "$tree"
if "$sanitize"; then
  mapfile -d '' -t binaries < <(find "$ringward_root/$tree/tests" -maxdepth 1 -name 'test_*' \
    -type f -executable -print0)
  require_sanitizers "$ringward_root/$tree/ringward" "${binaries[@]}"
fi

log="$(mktemp)"
trap 'rm -f -- "$log"' EXIT
status=0
ctest --test-dir "$ringward_root/$tree" --output-on-failure --no-tests=error \
  --parallel "$(job_count)" "$@" | tee "$log" || status=$?
# ctest's own summary once more, so that it is the last line.
summary="$(grep -E '^[0-9]+% tests passed, ' "$log" || true)"
printf '%s\n' "${summary:-no test ran}"
exit "$status"
