#!/usr/bin/env bash
# Prints the time of products against the number of weights of the smaller factor, as a Markdown table with the slope.
# Usage: src/build/cost-growth.sh
set -euo pipefail

top=$(cd "$(dirname "$0")/../.." && pwd)
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
mvn -q -o -f "$top/pom.xml" -Pbench test-compile dependency:build-classpath -Dmdep.outputFile="$work/classpath"
java -cp "$top/target/test-classes:$top/target/classes:$(cat "$work/classpath")" irreproof.engine.lie.CostGrowth
