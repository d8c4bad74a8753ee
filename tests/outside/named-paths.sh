#!/bin/bash
# Every path that the handbooks name in `backticks` exists: prose about files that are gone is worse than none.
set -euo pipefail
cd "$(dirname "$0")/../.."

# named FILE: the words in backticks that hold a slash or end like a file of this repository.
named() {
    # Blocks between fences are commands; a pattern, an option or a unit of flow is no path.
    awk '/^```/ { fenced = !fenced; next } !fenced' "$1" | grep -oE '`[^`]+`' | tr -d '`' |
        grep -E '^[A-Za-z0-9._/-]+$' | grep -E '^\.?[A-Za-z]+.*/|\.(md|sln|props|json|editorconfig)$' | grep -vE '^J/|^[A-Za-z0-9]{1,3}/(s|h|min)$' | sort -u || true
}

checked=0
missing=0
for document in README.md DEVELOPERS.md docs/*.md; do
    [ -f "$document" ] || continue
    while read -r path; do
        checked=$((checked + 1))
        if [ ! -e "$path" ]; then
            missing=$((missing + 1))
            echo "$document names $path, which does not exist"
        fi
    done < <(named "$document")
done

echo "$checked paths named, $missing missing"
[ "$checked" -gt 0 ] && [ "$missing" -eq 0 ]
