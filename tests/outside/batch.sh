#!/bin/bash
# Sheets on the native binary: a reader that goes away, interrupts, a full disk, a run that is killed and goes on, memory that stays flat.
# usage: tests/outside/batch.sh [NATIVE BINARY]
# needs: python3 time
set -u
here=$(realpath "$(dirname "$0")/../..")
flowduct=$(realpath "${1:-$here/artifacts/native/flowduct}")
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

rows=$here/tests/FlowDuct.Benchmarks/steam_rows.py
python3 "$rows" 20000 >"$work/few.csv"
python3 "$rows" 400000 >"$work/many.csv"

"$flowduct" run "$work/many.csv" 2>"$work/err" | head -1 >/dev/null
states=("${PIPESTATUS[@]}")
check 'head -1 stops the work quietly' "${states[0]} $(wc -c <"$work/err")" '0 0'

"$flowduct" run "$work/few.csv" >/dev/full 2>"$work/err"
check 'a full disk is status 4' "$? $(grep -c 'could not be written' "$work/err")" '4 1'

"$flowduct" run "$work/few.csv" --jobs 1 >"$work/one.csv"
"$flowduct" run "$work/few.csv" --jobs 3 >"$work/three.csv"
"$flowduct" run - <"$work/few.csv" >"$work/stdin.csv"
(cd "$work" && LC_ALL=de_DE.UTF-8 TZ=Asia/Tokyo "$flowduct" run few.csv >german.csv)
check 'workers, standard input, locale and time zone change no byte' \
    "$(md5sum <"$work/one.csv" | cut -d' ' -f1) $(md5sum <"$work/one.csv" | cut -d' ' -f1) $(md5sum <"$work/one.csv" | cut -d' ' -f1)" \
    "$(md5sum <"$work/three.csv" | cut -d' ' -f1) $(md5sum <"$work/stdin.csv" | cut -d' ' -f1) $(md5sum <"$work/german.csv" | cut -d' ' -f1)"

for i in 1 2 3; do "$flowduct" run "$work/few.csv" --shard "$i/3" --output "$work/share$i.csv"; done
{ head -1 "$work/share1.csv"; tail -qn +2 "$work"/share?.csv | sort; } >"$work/merged.csv"
check 'shares merge to the whole by their row' "$(md5sum <"$work/merged.csv")" "$(md5sum <"$work/one.csv")"

# The sheet never ends, so only the signal can end the run.
for signal in INT:130 TERM:143; do
    mkfifo "$work/endless"
    set -m
    "$flowduct" run "$work/endless" --output "$work/stopped.csv" 2>"$work/err" &
    run=$!
    set +m
    exec 3>"$work/endless"
    cat "$work/few.csv" >&3
    sleep 0.3
    kill -"${signal%:*}" "$run"
    wait "$run"
    check "SIG${signal%:*} stops a run" "$? $(test -e "$work/stopped.csv" || echo none)" "${signal#*:} none"
    exec 3>&-
    rm -f "$work/endless" "$work"/stopped.csv.part*
done

# Killed once a mark stands, as by a lost node; the rows that were marked are not solved again.
"$flowduct" run "$work/many.csv" --jobs 2 >"$work/whole.csv"
"$flowduct" run "$work/many.csv" --jobs 1 --output "$work/killed.csv" 2>/dev/null &
run=$!
for _ in $(seq 300); do
    [ -s "$work/killed.csv.part.marks" ] && break
    sleep 0.05
done
kill -KILL "$run"
wait "$run" 2>/dev/null
check 'a killed run leaves no file under its name' "$(test -e "$work/killed.csv" || echo none) $(test -s "$work/killed.csv.part.marks" && echo marked)" 'none marked'
"$flowduct" run "$work/many.csv" --output "$work/killed.csv" --resume
check 'it goes on to the same bytes' "$? $(md5sum <"$work/killed.csv") $(ls "$work" | grep -c part)" "0 $(md5sum <"$work/whole.csv") 0"

peak() { /usr/bin/time -f %M "$flowduct" run "$1" --jobs 2 2>&1 >/dev/null | tail -1; }
head -100001 "$work/many.csv" >"$work/some.csv"
some=$(peak "$work/some.csv")
most=$(peak "$work/many.csv")
check "memory stays flat and under 100 MB ($some kB, $most kB)" "$([ "$most" -lt 100000 ] && [ "$most" -lt $((some * 5 / 4)) ] && echo yes)" yes

[ "$wrong" -eq 0 ]
