#!/usr/bin/env bash
# Wall time of a whole `irreproof check PATH...` beside that of an empty Java program on the same Java, in alternating
# pairs of one session. Build first. Prints medians in milliseconds, and exits with 1 beyond the bar (8 times).
# Usage: src/build/startup-bench.sh [PATH...]     (default: src/demo; PAIRS=21)
set -euo pipefail

top=$(cd "$(dirname "$0")/../.." && pwd)
pairs=${PAIRS:-21}
bar=8
[ $# -gt 0 ] || set -- "$top/src/demo"
launcher=$top/target/irreproof/bin/irreproof
java=java
for home in "${IRREPROOF_JAVA_HOME:-}" "${JAVA_HOME:-}"; do
    if [ -n "$home" ] && [ -x "$home/bin/java" ]; then
        java=$home/bin/java
        break
    fi
done

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
echo 'public class Empty { public static void main(String[] arguments) {} }' >"$work/Empty.java"
"$(dirname "$(readlink -f "$(command -v "$java")")")/javac" -d "$work" "$work/Empty.java"

# Exit code 1 (errors found in the manuscript) is a good run.
good() { "$@" >/dev/null || [ $? -eq 1 ]; }
microseconds() {
    local start=${EPOCHREALTIME/[.,]/}
    good "$@"
    local end=${EPOCHREALTIME/[.,]/}
    echo $((end - start))
}
median() { sort -g | sed -n "$(((pairs + 1) / 2))p"; }

good "$launcher" check "$@"
good "$java" -cp "$work" Empty
for ((i = 0; i < pairs; i++)); do
    echo "$(microseconds "$java" -cp "$work" Empty) $(microseconds "$launcher" check "$@")"
done >"$work/pairs"

empty=$(cut -d' ' -f1 "$work/pairs" | median)
check=$(cut -d' ' -f2 "$work/pairs" | median)
ratio=$(awk '{ print $2 / $1 }' "$work/pairs" | median)
awk -v e="$empty" -v c="$check" -v r="$ratio" -v n="$pairs" -v bar="$bar" 'BEGIN {
    printf "empty Java main  %7.1f ms  (median of %d)\n", e / 1000, n
    printf "irreproof check  %7.1f ms  (median of %d)\n", c / 1000, n
    printf "ratio of medians %7.2f     (bar: at most %d)\n", c / e, bar
    printf "median of ratios %7.2f\n", r
    exit c / e > bar
}'
