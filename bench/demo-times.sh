#!/bin/sh
# From study file to report: wall time, peak memory, integration steps and accuracies of the demo
# studies. Works in a copy, so that nothing is reused from former runs; builds first if needed.
# Targets: at most 150 s on two cores and 2 GiB for pinned and balanced; digits at least 90 %.
set -eu

root=$(cd "$(dirname "$0")/.." && pwd)
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
cp -R "$root/datasets-synthetic/demo/." "$work/"
"$root/torqueloom" --version >/dev/null

number() { # file key: the first number after a key
  sed -n "s/.*\"$2\": *\([-0-9.e+]*\).*/\1/p" "$1" | head -n 1
}

for study in ${*:-pinned balanced digits}; do
  start=$(date +%s)
  if [ -x /usr/bin/time ]; then
    /usr/bin/time -v "$root/torqueloom" run "$work/$study.yaml" --quiet >/dev/null 2>"$work/log" || true
    peak=$(sed -n 's/.*Maximum resident set size (kbytes): //p' "$work/log")
    peak=$((peak / 1024))
  else
    "$root/torqueloom" run "$work/$study.yaml" --quiet >/dev/null 2>"$work/log" || true
    peak=unknown
  fi
  end=$(date +%s)
  run=$work/$study.run
  if [ ! -f "$run/results.json" ]; then
    cat "$work/log" >&2
    exit 1
  fi
  ideal=$(tr -d '\n' <"$run/results.json" | sed 's/.*"ideal": *{ *"accuracy": *\([0-9.]*\).*/\1/')
  echo "$study: $((end - start)) s, peak $peak MiB, $(number "$run/library.json" replicaSteps) library steps," \
    "ideal $ideal, verdict $(sed -n 's/.*"verdict": "\(.*\)".*/\1/p' "$run/results.json")"
done
