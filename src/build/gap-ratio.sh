#!/usr/bin/env bash
# Times one table of 300 typical products of irreps, over all types of simple Lie algebras, with GAP's
# DecomposeTensorProduct and with the engine, both warmed up, three times each in turns. Processor times, so that a busy
# machine favours neither; nothing is remembered between products. Prints both (medians) and the ratio; exits with 1 below
# the bar (20 times).
# Usage: src/build/gap-ratio.sh
set -euo pipefail

top=$(cd "$(dirname "$0")/../.." && pwd)
bar=20
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
mvn -q -o -f "$top/pom.xml" -Pbench test-compile dependency:build-classpath -Dmdep.outputFile="$work/classpath"
table() { java -cp "$top/target/test-classes:$top/target/classes:$(cat "$work/classpath")" irreproof.engine.lie.ProductTable "$@"; }

table gap >"$work/table.g"
for _ in 1 2 3; do
    gap -q -A "$work/table.g" </dev/null >>"$work/gap"
    table time >>"$work/ours"
done
cut -d' ' -f1 "$work/gap" "$work/ours" | sort -u >"$work/terms"
[ "$(wc -l <"$work/terms")" -eq 1 ] || { echo "the numbers of terms differ: $(cat "$work/terms")"; exit 1; }

median() { cut -d' ' -f2 "$1" | sort -g | sed -n 2p; }
awk -v g="$(median "$work/gap")" -v o="$(median "$work/ours")" -v t="$(cat "$work/terms")" -v bar="$bar" 'BEGIN {
    printf "300 products with %d different terms\n", t
    printf "GAP    %10.1f ms\n", g / 1000
    printf "ours   %10.1f ms\n", o / 1000
    printf "ratio  %10.1f     (bar: at least %d)\n", g / o, bar
    exit g / o < bar
}'
