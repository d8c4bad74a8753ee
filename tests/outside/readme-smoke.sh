#!/bin/bash
# Runs each "$ flowduct ..." line of README.md's console blocks on the native binary and compares what a reader would see.
# usage: tests/outside/readme-smoke.sh [MARKDOWN FILE]
set -euo pipefail
cd "$(dirname "$0")/../.."

document=$(realpath "${1:-README.md}")
native=$(realpath artifacts/native)
[ -x "$native/flowduct" ] || { echo "no native binary in $native; publish it first"; exit 1; }

# Commands run in a copy, so that one which writes a file leaves the tree alone.
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
for folder in demo docs; do
    if [ -d "$folder" ]; then cp -r "$folder" "$work"; fi
done
PATH="$native:$PATH"

count=0
wrong=0
inside=no
command=
expected=

run_pending() {
    local got
    [[ $command == flowduct* ]] || return 0
    count=$((count + 1))
    # A terminal shows both streams; an error example ends with its own status, which the text has to explain.
    got=$(cd "$work" && bash -c "$command" 2>&1 </dev/null) || true
    if [ "$got" == "${expected%$'\n'}" ]; then
        echo "same: $command"
    else
        wrong=$((wrong + 1))
        echo "differs: $command"
        diff -u --label "$(basename "$document")" --label 'native binary' <(printf '%s\n' "${expected%$'\n'}") <(printf '%s\n' "$got") || true
    fi
}

finish() {
    run_pending
    command=
    expected=
}

while IFS= read -r line || [ -n "$line" ]; do
    case $inside:$line in
        no:'```console') inside=output ;;
        no:*) ;;
        *:'```')
            finish
            inside=no
            ;;
        continued:*)
            command+=$'\n'$line
            [[ $line == *\\ ]] || inside=output
            ;;
        output:'$ '*)
            finish
            command=${line#'$ '}
            [[ $line != *\\ ]] || inside=continued
            ;;
        output:*) expected+=$line$'\n' ;;
    esac
done <"$document"

[ "$inside" = no ] || { echo "a console block of $document is not closed"; exit 1; }
echo "$count commands, $wrong differ"
[ "$count" -gt 0 ] || { echo "no command found, so nothing was compared"; exit 1; }
[ "$wrong" -eq 0 ]
