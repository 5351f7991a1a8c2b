#!/usr/bin/env bash
# All checks: installs what they need on a fresh machine, then formatting, build, tests, and the composed sample.
# Ends with a line "N passed, N failed"; exit code 0 only if nothing failed.
set -uo pipefail
cd "$(dirname "$0")/.."
export DOTNET_CLI_TELEMETRY_OPTOUT=1 DOTNET_NOLOGO=1
passed=0 failed=0

finish() { echo; echo "$passed passed, $failed failed"; [ "$failed" -eq 0 ]; exit $?; }
step() { # step NAME COMMAND...: one check that counts as one test
  local name=$1 start=$SECONDS; shift
  echo "== $name"
  if "$@"; then passed=$((passed + 1)); echo "   ok, $((SECONDS - start)) s"; return 0; fi
  failed=$((failed + 1)); echo "   FAILED: $name"; return 1
}

need() { # need PROGRAM PACKAGE: installs the distribution's package if the program is missing
  command -v "$1" >/dev/null && return
  local as_root=""; [ "$(id -u)" -eq 0 ] || as_root="sudo"
  [ -n "${apt_updated:-}" ] || { $as_root apt-get update -qq && apt_updated=1; }
  DEBIAN_FRONTEND=noninteractive $as_root apt-get install -y -qq --no-install-recommends "$2" >/dev/null
}
install_tools() {
  need chromium chromium && need pdftotext poppler-utils && need java default-jre-headless && need npm npm || return 1
  (cd tests/checkers && npm ci --ignore-scripts --no-audit --no-fund --silent)
}

test_project() { # test_project FOLDER: a line for a test project, and all it said if anything failed
  local log code green red start=$SECONDS; log=$(mktemp)
  dotnet test --project "$1" --configuration Release --no-build --no-progress --no-ansi >"$log" 2>&1
  code=$?
  green=$(awk '/^ *succeeded:/{n+=$2} END{print n+0}' "$log")
  red=$(awk '/^ *failed:/{n+=$2} END{print n+0}' "$log")
  # A test program that dies without a summary must not look green.
  [ "$code" -ne 0 ] && [ "$red" -eq 0 ] && red=1
  [ "$red" -eq 0 ] || cat "$log"
  printf '   %-28s %5d ok, %d not ok, %d s\n' "$(basename "$1")" "$green" "$red" "$((SECONDS - start))"
  passed=$((passed + green)) failed=$((failed + red)); rm -f "$log"
}

step "tools" install_tools || finish
step "restore (locked)" dotnet restore --locked-mode --verbosity quiet || finish
step "build" dotnet build --no-restore --configuration Release --verbosity quiet || finish
step "formatting" dotnet format --no-restore --verify-no-changes
step "publish" dotnet publish src/ReleaseKit.Cli --no-restore --configuration Release --output .tests/program --verbosity quiet
step "compose the sample" dotnet .tests/program/releasekit.dll compose sample-release --to .tests/site
echo "== tests"
for project in tests/*.Tests; do test_project "$project"; done
finish
