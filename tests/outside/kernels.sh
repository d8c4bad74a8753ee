#!/bin/bash
# The checked-in water kernels are what the kernel writer makes of the coefficient tables.
set -eu
cd "$(dirname "$0")/../.."
dotnet run build/WriteKernels.cs -- --check
echo 'ok: kernels match their tables'
