#!/usr/bin/env bash
# Runs the benchmarks in src/bench/java by JMH, and writes src/build/bench-results/jmh.md with the machine.
# Usage: src/build/bench.sh [PATTERN]     (a regular expression over benchmark names; with one, nothing is written)
set -euo pipefail

top=$(cd "$(dirname "$0")/../.." && pwd)
results=$top/src/build/bench-results
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
mvn -q -o -f "$top/pom.xml" -Pbench test-compile dependency:build-classpath -Dmdep.outputFile="$work/classpath"
classpath=$top/target/test-classes:$top/target/classes:$(cat "$work/classpath")
if [ $# -gt 0 ]; then
    exec java -cp "$classpath" org.openjdk.jmh.Main "$@"
fi

java -cp "$classpath" org.openjdk.jmh.Main | tee "$work/log"
mkdir -p "$results"
{
    echo "# Benchmarks of the engine"
    echo
    echo "By \`src/build/bench.sh\`: times of single calls after warm-up, nothing remembered in between. Where the load is above"
    echo "the cores, the median is close to that of an idle machine all the same, but not the 99th percentile."
    echo
    echo "The machine: $(lscpu | sed -n 's/^Model name: *//p'), $(nproc) cores, $(java -version 2>&1 | sed -n 2p)."
    echo "Load average at the end: $(cut -d' ' -f1 /proc/loadavg)."
    echo
    echo "| benchmark | median µs | 99th percentile µs |"
    echo "|---|---:|---:|"
    awk '$2 == "sample" && $1 ~ /p0.50$/ { median = $3 }
        $2 == "sample" && $1 ~ /p0.99$/ { sub(/:.*/, "", $1); sub(/.*Benchmark\./, "", $1); print "| " $1 " | " median " | " $3 " |" }' \
        "$work/log"
} >"$results/jmh.md"
