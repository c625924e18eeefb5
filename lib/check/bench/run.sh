#!/usr/bin/env bash
# Whole-process benches, each as a ratio to its named peer in the same run.
#   start       connate's console against the plain jshell tool with the same imports: first result
#   hundred     replay of a 100-step workbook against jshell on the same file
#   example     replay of Tarn Hill against a Python script that does the same (numpy, pandas,
#               matplotlib: Debian's python3-numpy python3-pandas python3-matplotlib)
# Usage: lib/check/bench/run.sh [RUNS]     from the project's folder, after a first scripts/connate
set -euo pipefail
cd "$(dirname "${BASH_SOURCE[0]}")/../../.."
runs=${1:-5}
scratch=$(mktemp -d)
trap 'rm -rf "$scratch"' EXIT

java=${JAVA_HOME:+$JAVA_HOME/bin/}
scripts/connate --version > /dev/null
read -r build < .connate/current
read -r classes < ".connate/$build/engine.path"
sed -e '/^#/d' -e 's/^/import /' -e 's/$/;/' \
  lib/engine/src/main/resources/connate/protocol/preload.txt > "$scratch/imports.jsh"

python3 - "$scratch/hundred.jsh" <<'PY'
import sys
with open(sys.argv[1], "w") as out:
    for i in range(50):
        out.write(f"var k{i} = mD({i + 1}.5).times(1.0{i % 10});\n")
        out.write(f"var phi{i} = percent({5 + i % 20}.25).fraction() + k{i}.in(darcy);\n")
PY

millis() { # millis COMMAND...: the wall time of one run
  local began
  began=$(date +%s%N)
  "$@" > /dev/null 2>&1 < "${stdin:-/dev/null}" || true
  echo $((($(date +%s%N) - began) / 1000000))
}
median() { sort -n | sed -n "$((($1 + 1) / 2))p"; }

pair() { # pair NAME BOUND A B: runs both in turn and prints the medians and their ratio
  local name=$1 bound=$2 a b
  "$3"; "$4"
  for ((i = 0; i < runs; i++)); do "$3" >> "$scratch/$name.a"; "$4" >> "$scratch/$name.b"; done
  a=$(tail -n "$runs" "$scratch/$name.a" | median "$runs")
  b=$(tail -n "$runs" "$scratch/$name.b" | median "$runs")
  printf '%-8s  connate %5d ms   peer %6d ms   ratio %s   bound %s\n' \
    "$name" "$a" "$b" "$(python3 -c "print(round($a/$b, 3))")" "$bound"
}

printf 'mD(250).times(2)\n/exit\n' > "$scratch/first.txt"
printf 'mD(250).times(2)\nquit()\n' > "$scratch/quit.txt"
ours_start() { stdin=$scratch/quit.txt millis scripts/connate; }
shell_start() { stdin=$scratch/first.txt millis "${java}jshell" --class-path "$classes" --startup "$scratch/imports.jsh" -s; }
ours_hundred() { millis scripts/connate replay "$scratch/hundred.jsh" --out "$scratch/h.html"; }
shell_hundred() { printf '/exit\n' > "$scratch/exit.txt"; stdin=$scratch/exit.txt millis "${java}jshell" --class-path "$classes" --startup "$scratch/imports.jsh" -s "$scratch/hundred.jsh"; }
ours_example() { millis scripts/connate replay workbooks/tarn-hill/permeability.jsh -q --out "$scratch/t.html"; }
python_example() { millis /usr/bin/python3 lib/check/bench/tarn_hill.py workbooks/tarn-hill "$scratch/p.html"; }

uptime
pair start 0.5 ours_start shell_start
pair hundred 0.08 ours_hundred shell_hundred
pair example 1.2 ours_example python_example
