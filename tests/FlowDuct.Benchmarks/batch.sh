#!/bin/bash
# Times the native flowduct run on rows of steam nozzles, ten columns in and ten results out, beside `mlr put` of ten trivial columns.
# usage: tests/FlowDuct.Benchmarks/batch.sh [ROWS] [RUNS] [ROWS FOR THE MEMORY]
#   e.g. tests/FlowDuct.Benchmarks/batch.sh 1000000 5 10000000
# Needs Debian's miller and time. Quote ratios from one run, never absolute times from two.
set -euo pipefail
cd "$(dirname "$0")/../.."

native=artifacts/native/flowduct
rows=${1:-1000000}
runs=${2:-3}
many=${3:-10000000}
result=tests/FlowDuct.Benchmarks/results/batch.csv
show="exit.T [degC], exit.x, exit.h [kJ/kg], exit.s, exit.rho, exit.V, exit.M, throat.p, throat.V, isentropic_efficiency"
trivial='$a=${inlet.p [bar(a)]}+1;$b=${inlet.superheat [K]}*2;$c=${exit.p [bar(a)]}+3;$d=${inlet.V [m/s]}*4;$e=${efficiency [%]}+5;$f=${flow [kg/s]}*6;$g=${inlet.p [bar(a)]}-7;$h=${exit.p [bar(a)]}*8;$i=${inlet.V [m/s]}+9;$j=${flow [kg/s]}-10'
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

[ -x "$native" ] || dotnet publish src/FlowDuct.Cli -c Release -r linux-x64 -o artifacts/native --nologo -v q
python3 tests/FlowDuct.Benchmarks/steam_rows.py "$rows" > "$work/rows.csv"

timed() { # name, output, command...
    local name=$1 out=$2
    shift 2
    /usr/bin/time -f "$name,%e,%U,%S,%M" -a -o "$work/times" "$@" > "$out"
}

for _ in $(seq "$runs"); do
    timed mlr /dev/null mlr --csv put "$trivial" "$work/rows.csv"
    timed "run, one worker" "$work/one.csv" "$native" run "$work/rows.csv" --jobs 1 --quiet --show "$show"
    timed "run, two workers" "$work/two.csv" "$native" run "$work/rows.csv" --jobs 2 --quiet --show "$show"
    cmp "$work/one.csv" "$work/two.csv"
done

for n in 100000 "$many"; do
    python3 tests/FlowDuct.Benchmarks/steam_rows.py "$n" > "$work/rows.csv"
    timed "memory, $n rows, two workers" /dev/null "$native" run "$work/rows.csv" --jobs 2 --quiet --show "$show"
done

python3 - "$work/times" "$rows" > "$result" <<'PY'
import collections, os, platform, statistics, sys, time

runs = collections.defaultdict(list)
for line in open(sys.argv[1]):
    name, *cells = line.strip().rsplit(",", 4)
    runs[name].append([float(cell) for cell in cells])
base, work = (statistics.median(row[0] for row in runs["mlr"]), statistics.median(row[1] + row[2] for row in runs["mlr"]))
model = next(line.split(":")[1].strip() for line in open("/proc/cpuinfo") if line.startswith("model name"))
print(f"# made: {time.strftime('%Y-%m-%d %H:%M', time.gmtime())} UTC")
print(f"# machine: {model}; {os.cpu_count()} processors; load {os.getloadavg()[0]:.1f} at the end; {platform.system()} {platform.machine()}")
print(f"# {sys.argv[2]} rows of steam nozzles, ten columns in, ten results out; medians; mlr put of ten trivial columns in the same run; on a shared machine trust processor times")
print("job,runs,wall_s,wall_to_mlr,processor_s,processor_to_mlr,peak_kB")
for name, rows in runs.items():
    wall, used, peak = (statistics.median(values) for values in zip(*((row[0], row[1] + row[2], row[3]) for row in rows)))
    ratio, share = ("", "") if name.startswith("memory") else (f"{wall / base:.3f}", f"{used / work:.3f}")
    quoted = f'"{name}"' if "," in name else name
    print(f"{quoted},{len(rows)},{wall:.2f},{ratio},{used:.2f},{share},{peak:.0f}")
PY
cat "$result"
