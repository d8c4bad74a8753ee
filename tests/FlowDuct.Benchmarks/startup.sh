#!/bin/bash
# Times the native flowduct against /bin/true and GNU units, process by process.
# usage: tests/FlowDuct.Benchmarks/startup.sh [COMMAND OF FLOWDUCT] [RUNS]
#   e.g. tests/FlowDuct.Benchmarks/startup.sh 'state --fluid air --at "p=5 bar, T=300 K"' 201
set -euo pipefail
cd "$(dirname "$0")/../.."

native=artifacts/native/flowduct
command=${1:---version}
runs=${2:-101}
result=tests/FlowDuct.Benchmarks/results/startup.csv

[ -x "$native" ] || dotnet publish src/FlowDuct.Cli -c Release -r linux-x64 -o artifacts/native --nologo -v q
rivals=("/bin/true")
if command -v units >/dev/null; then
    rivals+=('units -t "5 bar" Pa')
else
    echo "GNU units is not installed; timed without it" >&2
fi

# Children write to the harness's own output, which goes nowhere; the results go to the file.
dotnet run --project tests/FlowDuct.Benchmarks -c Release -- \
    startup --runs "$runs" --output "$result" "${rivals[@]}" "$native $command" >/dev/null
cat "$result"
