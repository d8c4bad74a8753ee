#!/bin/bash
# needs: locales
# Same bytes whatever the locale and time zone; and in a bare root without ICU.
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

# A root that holds the binary and its C library, nothing else: no ICU, no locale, no time zones, no /etc.
root="$work/root"
mkdir -p "$root"
cp "$flowduct" "$root/flowduct"
ldd "$flowduct" | grep -o '/[^ ]*' | while read -r library; do
    mkdir -p "$root$(dirname "$library")"
    cp -L "$library" "$root$library"
done
bare=(chroot "$root")
[ "$(id -u)" -eq 0 ] || bare=(unshare --user --map-root-user chroot "$root")
answer() {
    "${bare[@]}" /flowduct nozzle --fluid steam --inlet 'p=9.5 bar, T=230.5 degC, V=25 m/s' --exit 'p=3.2 bar' --flow '1.4 kg/s' "$@" 2>&1
}
answer --format json >"$work/bare"
if [ -s "$work/bare" ] && cmp "$work/c" "$work/bare"; then
    echo 'ok: the same bytes in a root with nothing but the C library'
else
    echo 'wrong: the binary needs more than the C library, or answers differently without it'
    wrong=$((wrong + 1))
fi
[ "$wrong" -eq 0 ]
