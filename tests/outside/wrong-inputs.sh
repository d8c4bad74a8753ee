#!/bin/bash
# Wrong inputs on the native binary: status 2 or 3, nothing on stdout, a message of one to four lines that names the place.
# usage: tests/outside/wrong-inputs.sh [NATIVE BINARY]
set -u
flowduct=$(realpath "${1:-$(dirname "$0")/../../artifacts/native/flowduct}")
[ -x "$flowduct" ] || { echo "no binary at $flowduct"; exit 1; }
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
wrong=0

# refuse STATUS PLACE ARGUMENT...
refuse() {
    local expected=$1 place=$2 status lines
    shift 2
    "$flowduct" "$@" >"$work/out" 2>"$work/err"
    status=$?
    lines=$(wc -l <"$work/err")
    if [ "$status" -eq "$expected" ] && [ ! -s "$work/out" ] && [ "$lines" -ge 1 ] && [ "$lines" -le 4 ] \
        && grep -q "^flowduct: $place" "$work/err"; then
        echo "ok: $(head -1 "$work/err")"
    else
        echo "wrong: status $status, expected $expected: $*"
        cat "$work/err"
        wrong=$((wrong + 1))
    fi
}

for fluid in steam air; do
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=9 bar, T=200' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=9 bar, T=230,5 degC' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=NaN bar, T=230 degC' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=1e400 bar, T=230 degC' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=9 barr, T=230 degC' --exit 'p=3 bar'
    refuse 2 --exti nozzle --fluid $fluid --inlet 'p=9 bar, T=230 degC' --exti 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=9 bar, T=230 degC, s=6.8 kJ/(kg.K)' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=9 bar' --exit 'p=3 bar'
    refuse 3 --inlet nozzle --fluid $fluid --inlet 'p=9 bar, T=6800 degC' --exit 'p=3 bar'
    refuse 2 --inlet nozzle --fluid $fluid --inlet 'p=-2 bar, T=230 degC' --exit 'p=3 bar'
done
[ "$wrong" -eq 0 ]
