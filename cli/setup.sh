# shellcheck shell=bash
# Set-up shared by cli/quickstart.sh and tests/run.sh: which Debian packages the program and its
# tests need, how to install the missing ones, how to build. To be sourced.
# shellcheck disable=SC2034  # the lists are used by the scripts that source this one

ringward_root="$(cd -- "$(dirname -- "${BASH_SOURCE[0]}")/.." && pwd -P)"

# What CMakeLists.txt asks for.
build_packages=(
  build-essential cmake ninja-build
  libeigen3-dev libsundials-dev libsuitesparse-dev
  libcli11-dev libtomlplusplus-dev nlohmann-json3-dev libfmt-dev libssl-dev
  libtbb-dev libboost-dev libglib2.0-dev pkg-config
)
# What the program runs for pictures and for PDF; without it results are complete but have none.
recommended_packages=(gnuplot-nox weasyprint)
# What only the tests use: the test framework, readers of XML, HTML and PDF to check files with, a
# numerical library for an independent solution, and a browser to look at pages.
test_packages=(
  catch2 libxml2-utils tidy poppler-utils qpdf python3-scipy
  chromium chromium-driver
)

say() { printf '%s\n' "-- $*" >&2; }

# Prints those of the given packages that are not installed, one a line.
missing_packages() {
  local package status
  for package in "$@"; do
    status="$(dpkg-query --show --showformat='${db:Status-Status}' "$package" 2>/dev/null || true)"
    [[ "$status" == installed ]] || printf '%s\n' "$package"
  done
}

as_root() {
  if [[ "$(id -u)" -eq 0 ]]; then
    "$@"
  elif command -v sudo >/dev/null; then
    sudo "$@"
  else
    say "this needs root and sudo is not installed: $*"
    return 1
  fi
}

# Installs the given packages with apt, skipping those that are there.
install_packages() {
  if ! command -v apt-get >/dev/null || ! command -v dpkg-query >/dev/null; then
    say "no apt here; going on in the hope that these are installed: $*"
    return 0
  fi
  local -a missing
  mapfile -t missing < <(missing_packages "$@")
  if [[ "${#missing[@]}" -eq 0 ]]; then
    say "packages: all $# are installed"
    return 0
  fi
  say "packages: installing with apt (a few minutes on a bare system): ${missing[*]}"
  local log status=0
  log="$(mktemp)"
  run_apt "${missing[@]}" >"$log" 2>&1 || status=$?
  if [[ "$status" -ne 0 ]]; then
    cat -- "$log" >&2
    say "apt failed; its messages are above"
  fi
  rm -f -- "$log"
  return "$status"
}

run_apt() {
  local -a apt=(env DEBIAN_FRONTEND=noninteractive apt-get -q -o DPkg::Lock::Timeout=300)
  as_root "${apt[@]}" update && as_root "${apt[@]}" install --yes --no-install-recommends "$@"
}

# As many jobs as cores, but no more than memory allows (a compiler takes up to 1.5 GB).
job_count() {
  local cores memory_kB by_memory
  cores="$(nproc)"
  memory_kB="$(awk '/^MemAvailable:/ {print $2}' /proc/meminfo 2>/dev/null || true)"
  by_memory=$((${memory_kB:-1500000} / 1500000))
  ((by_memory >= 1)) || by_memory=1
  printf '%d\n' "$((cores < by_memory ? cores : by_memory))"
}

# configure_tree FOLDER CMAKE_OPTION...: configures a build folder below the root. A folder that
# was configured elsewhere (a moved or copied clone) is made anew.
configure_tree() {
  local tree="$ringward_root/$1" cache home
  shift
  cache="$tree/CMakeCache.txt"
  if [[ -f "$cache" ]]; then
    home="$(sed -n 's/^CMAKE_HOME_DIRECTORY:INTERNAL=//p' "$cache")"
    if [[ "$home" != "$ringward_root" ]]; then
      say "$tree was configured for $home: starting it afresh"
      rm -rf -- "$tree"
    fi
  fi
  local -a generator=()
  if [[ ! -f "$cache" ]] && command -v ninja >/dev/null; then
    generator=(-G Ninja)
  fi
  say "configuring $tree"
  cmake -S "$ringward_root" -B "$tree" "${generator[@]}" "$@" >&2
}

# build_tree FOLDER [TARGET]
build_tree() {
  local -a target=()
  [[ $# -lt 2 ]] || target=(--target "$2")
  say "building in $ringward_root/$1, $(job_count) jobs"
  cmake --build "$ringward_root/$1" --parallel "$(job_count)" "${target[@]}" >&2
}

# require_sanitizers BINARY...: fails when one was built without them. A misspelt build option
# would otherwise leave the build uninstrumented and every test green.
require_sanitizers() {
  local binary symbols symbol
  for binary in "$@"; do
    symbols="$(nm -- "$binary")"
    for symbol in __asan_init __ubsan_handle; do
      if [[ "$symbols" != *"$symbol"* ]]; then
        say "$binary holds no $symbol: the sanitizers are not in the build"
        return 1
      fi
    done
  done
  say "sanitizers found in $# binaries"
}
