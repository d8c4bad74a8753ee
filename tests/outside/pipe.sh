#!/bin/bash
# A closed pipe ends quietly, a full disk is status 4, a file is whole or not there.
# usage: tests/outside/pipe.sh [NATIVE BINARY]
set -u
flowduct=$(realpath "${1:-$(dirname "$0")/../../artifacts/native/flowduct}")
[ -x "$flowduct" ] || { echo "no binary at $flowduct"; exit 1; }
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

# A rename over a pipe (or, for root, over a device) would destroy it; only things in a folder of our own are tried here.
mkfifo "$work/pipe"
timeout 20 cat "$work/pipe" >"$work/read" &
reader=$!
timeout 20 "$flowduct" state --fluid air --at 'p=1 bar, T=300 K' --output "$work/pipe"
status=$?
wait "$reader"
"$flowduct" state --fluid air --at 'p=1 bar, T=300 K' >"$work/straight"
check 'a pipe as output is written into and stays a pipe' \
    "$status $(stat -c %F "$work/pipe") $(cmp -s "$work/read" "$work/straight" && echo same)" '0 fifo same'

# A writer that waits for its reader can be interrupted; the shell sees 128 plus the number of the signal.
for signal in INT:130 TERM:143; do
    # A job of a script ignores SIGINT unless it is started with job control.
    set -m
    "$flowduct" state --fluid air --at 'p=1 bar, T=300 K' --output "$work/pipe" 2>"$work/err" &
    writer=$!
    set +m
    sleep 0.3
    kill -"${signal%:*}" "$writer"
    wait "$writer" 2>/dev/null
    check "SIG${signal%:*} ends it" "$? $(wc -c <"$work/err")" "${signal#*:} 0"
done

{ "$flowduct" --version; "$flowduct" --version; } >"$work/two"
check 'two commands share one redirected file' "$(wc -l <"$work/two")" 2

[ "$wrong" -eq 0 ]
