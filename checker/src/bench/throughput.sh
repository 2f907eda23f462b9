#!/bin/sh
# Prints how long a check of generated plans takes as a whole process: the median of some runs, plans
# a second, and peak memory. Compare only figures of one machine, taken side by side.
#
# usage: checker/src/bench/throughput.sh [PLANS] [RUNS]
set -eu

plans=${1:-1000}
runs=${2:-5}
here=$(CDPATH='' cd -- "$(dirname -- "$0")" && pwd -P)
holdfast=$here/../../holdfast
folder=$(mktemp -d "${TMPDIR:-/tmp}/holdfast-bench.XXXXXX")
trap 'rm -rf "$folder"' EXIT INT TERM

# Three analyses a plan, of different cells; a third of the plans has claims that fail.
i=0
while [ "$i" -lt "$plans" ]; do
  sd=$((9 + i % 3))
  mkdir -p "$folder/plans/$((i / 100))"
  cat >"$folder/plans/$((i / 100))/p$i.study-plan.yaml" <<PLAN
format: holdfast-plan/1
study: { title: Generated plan $i, justification: power, participants: samples }
defaults: { alpha: 0.05, sides: two, target-power: 0.80 }
quantities:
  gain: { value: 5, unit: points, source: { kind: smallest-worthwhile, reason: generated } }
  score-sd: { value: $sd, unit: points, source: { kind: own-records, reason: generated } }
  usual: { value: 0.30, source: { kind: own-records, reason: generated } }
  new: { value: 0.45, source: { kind: own-records, reason: generated } }
  strength: { value: 0.3, source: { kind: own-records, reason: generated } }
outcomes:
  score: { role: primary, scale: continuous, unit: points }
  healed: { role: secondary, scale: binary }
analyses:
  means:
    outcome: score
    arrangement: parallel-groups
    test: student-t
    effect: { difference: gain, sd: score-sd }
    sample: { a: 64, b: 64 }
    claims: { power: { at-least: 0.80 }, total: { at-least: 128 } }
  shares:
    outcome: healed
    arrangement: parallel-groups
    test: pearson-chi-square
    effect: { shares: { a: new, b: usual } }
    sample: { a: 163, b: 163 }
    claims: { power: 0.80, total: 326 }
  correlation:
    outcome: score
    arrangement: association
    test: pearson-r
    effect: { r: strength }
    sample: { all: 84 }
    claims: { power: 0.80 }
families:
  means-first: { of: [means, correlation], control: fixed-sequence, alpha: 0.05 }
PLAN
  i=$((i + 1))
done

"$holdfast" --version
run=0
while [ "$run" -lt "$runs" ]; do
  start=$(date +%s%N)
  if [ -x /usr/bin/time ]; then
    /usr/bin/time -f '%M' -o "$folder/memory" "$holdfast" check --quiet "$folder/plans" >"$folder/out" || true
    tail -n 1 "$folder/memory" >>"$folder/memories"
  else
    "$holdfast" check --quiet "$folder/plans" >"$folder/out" || true
  fi
  end=$(date +%s%N)
  echo $(((end - start) / 1000000)) >>"$folder/times"
  run=$((run + 1))
done
tail -n 1 "$folder/out"
median=$(sort -n "$folder/times" | sed -n "$(((runs + 1) / 2))p")
echo "median of $runs runs: $median ms, $((plans * 1000 / median)) plans a second, start of the program included"
if [ -s "$folder/memories" ]; then
  echo "peak memory: $(($(sort -n "$folder/memories" | tail -n 1) / 1024)) MiB"
fi
