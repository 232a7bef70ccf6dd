#!/usr/bin/env bash
# Runs the benchmarks in src/bench/java by JMH, and writes src/build/bench-results/: jmh.json and, with the machine, jmh.md.
# Usage: src/build/bench.sh [PATTERN]     (a regular expression over benchmark names; with one, nothing is written)
set -euo pipefail

top=$(cd "$(dirname "$0")/../.." && pwd)
results=$top/src/build/bench-results
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
mvn -q -f "$top/pom.xml" -Pbench test-compile dependency:build-classpath -Dmdep.outputFile="$work/classpath"
classpath=$top/target/test-classes:$top/target/classes:$(cat "$work/classpath")
if [ $# -gt 0 ]; then
    exec java -cp "$classpath" org.openjdk.jmh.Main "$@"
fi

java -cp "$classpath" org.openjdk.jmh.Main -rf json -rff "$work/jmh.json" | tee "$work/log"
mkdir -p "$results"
# The paths of this machine do not belong into the results.
sed -e '/"jvm" :/d' -e '/"jvmArgs" : \[/,/\],/d' "$work/jmh.json" >"$results/jmh.json"
{
    echo "# Benchmarks of the engine"
    echo
    echo "By \`src/build/bench.sh\`; average time per operation, after warm-up, nothing remembered in between."
    echo "The machine: $(lscpu | sed -n 's/^Model name: *//p'), $(nproc) cores, $(java -version 2>&1 | sed -n 2p)."
    echo "Load average at the end: $(cut -d' ' -f1 /proc/loadavg)."
    echo
    echo "| benchmark | µs | error (99.9%) |"
    echo "|---|---:|---:|"
    awk '$2 == "avgt" { print "| " $1 " | " $4 " | " $6 " |" }' "$work/log"
} >"$results/jmh.md"
