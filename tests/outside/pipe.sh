#!/bin/bash
# A closed pipe ends quietly, a full disk is status 4, a file is whole or not there.
set -u
cd "$(dirname "$0")/../.."
flowduct=artifacts/native/flowduct
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
wrong=0

check() {
    if [ "$2" == "$3" ]; then
        echo "ok: $1"
    else
        echo "wrong: $1: $2, expected $3"
        wrong=$((wrong + 1))
    fi
}

for i in $(seq 20); do
    "$flowduct" units 2>"$work/err" | head -1 >/dev/null
    states=("${PIPESTATUS[@]}")
    [ "${states[0]}" -eq 0 ] && [ ! -s "$work/err" ] || break
done
check 'head -1 is quiet' "${states[0]} $(wc -c <"$work/err")" '0 0'

{ sleep 0.2; "$flowduct" units 2>"$work/err"; echo $? >"$work/status"; } | true
check 'a reader that has gone is no failure' "$(cat "$work/status") $(wc -c <"$work/err")" '0 0'

"$flowduct" units >/dev/full 2>"$work/err"
check 'a full disk is status 4' "$? $(grep -c 'could not be written' "$work/err")" '4 1'

"$flowduct" state --fluid air --at 'p=1 bar, T=300 K' --output "$work/missing/answer.txt" 2>/dev/null
check 'a folder that is missing is status 4' "$? $(ls "$work" | grep -c part)" '4 0'

{ "$flowduct" --version; "$flowduct" --version; } >"$work/two"
check 'two commands share one redirected file' "$(wc -l <"$work/two")" 2

[ "$wrong" -eq 0 ]
