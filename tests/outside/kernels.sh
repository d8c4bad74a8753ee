#!/bin/bash
# The checked-in kernels are what the kernel writers make of the coefficient tables.
set -eu
cd "$(dirname "$0")/../.."
dotnet run build/WriteKernels.cs -- --check
dotnet run build/WriteEquations.cs -- --check
echo 'ok: kernels match their tables'
