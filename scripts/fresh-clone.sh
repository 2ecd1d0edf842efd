#!/usr/bin/env bash
# Rehearses what a stranger and the continuous integration do: clones what is committed
# into a temporary folder, runs .ci/run there, then starts the app from it.
set -euo pipefail
root="$(cd "$(dirname "$0")/.." && pwd)"
folder="$(mktemp -d)"
trap 'rm -rf "$folder"' EXIT

git clone --quiet "$root" "$folder/clone"
cd "$folder/clone"
outcome=0
.ci/run || outcome=$?

# A second start of a built clone: nothing to install, nothing to build.
PORT=0 STEELYARD_DATA="$folder/data" node scripts/start.mjs >"$folder/start.log" 2>&1 &
server=$!
for _ in $(seq 100); do grep -q 'ready on' "$folder/start.log" && break || sleep 0.1; done
kill -TERM "$server"
wait "$server" || outcome=1
cat "$folder/start.log"
grep -q 'ready on' "$folder/start.log" || outcome=1
exit "$outcome"
