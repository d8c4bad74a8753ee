#!/bin/bash
# needs: locales
# Same bytes whatever the locale and time zone; no ICU library behind the binary.
# usage: tests/outside/locale.sh [NATIVE BINARY]
set -u
flowduct=$(realpath "${1:-$(dirname "$0")/../../artifacts/native/flowduct}")
[ -x "$flowduct" ] || { echo "no binary at $flowduct"; exit 1; }
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
wrong=0

localedef -i de_DE -f UTF-8 "$work/de_DE.UTF-8" 2>/dev/null || { echo 'the German locale could not be built'; exit 1; }
answer() {
    "$flowduct" nozzle --fluid steam --inlet 'p=9.5 bar, T=230.5 degC, V=25 m/s' --exit 'p=3.2 bar' --flow '1.4 kg/s' "$@" 2>&1
}
for format in text json; do
    LC_ALL=C answer --format "$format" >"$work/c"
    (export LOCPATH=$work LANG=de_DE.UTF-8 TZ=Asia/Tokyo; export LC_ALL=de_DE.UTF-8; answer --format "$format") >"$work/de"
    if [ -s "$work/c" ] && cmp "$work/c" "$work/de"; then
        echo "ok: $format is the same bytes under a German locale"
    else
        echo "wrong: $format changes with the locale"
        wrong=$((wrong + 1))
    fi
done

if ldd "$flowduct" | grep -qi icu; then
    echo 'wrong: the binary needs ICU'
    wrong=$((wrong + 1))
else
    echo 'ok: no ICU'
fi
[ "$wrong" -eq 0 ]
