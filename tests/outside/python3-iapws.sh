#!/bin/bash
# needs: python3-iapws
# The same states of water, and of air by its reference equation, by an independent general-purpose library.
# usage: tests/outside/python3-iapws.sh [NATIVE BINARY]
set -u
flowduct=$(realpath "${1:-$(dirname "$0")/../../artifacts/native/flowduct}")
[ -x "$flowduct" ] || { echo "no binary at $flowduct"; exit 1; }

# Debian's interpreter has the library; one of another origin may come first on the path.
exec /usr/bin/python3 "$(dirname "$0")/python3-iapws.py" "$flowduct"
