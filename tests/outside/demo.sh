#!/bin/bash
# The one-off checks of the invented plant end with the statuses that they name.
set -eu
cd "$(dirname "$0")/../.."
FLOWDUCT=artifacts/native/flowduct demo/one-off-checks.sh
