#!/bin/bash
# One-off checks at Tarnholt works (an invented plant; see demo/README.md). Each must end with the status named before it.
set -u
flowduct=${FLOWDUCT:-flowduct}
wrong=0

# ask STATUS SENTENCE ARGUMENT...
ask() {
    local expected=$1 sentence=$2 status
    shift 2
    printf '\n### %s\n' "$sentence"
    "$flowduct" "$@"
    status=$?
    if [ "$status" -ne "$expected" ]; then
        wrong=$((wrong + 1))
        echo "### status $status, expected $expected"
    fi
}

ask 0 'NZ-1014: what leaves the motive nozzle, and what throat and exit does 310 kg/h need?' \
    nozzle --fluid steam --inlet 'p=11.2 barg, T=212 degC, V=18 m/s' --exit 'p=0.14 bar' \
    --efficiency 92% --flow '310 kg/h' --ambient 'p=0.973 bar, T=24 degC'

ask 0 'NZ-2107: the exit thermometer reads saturation, so how fast is the jet at least and at most?' \
    nozzle --fluid steam --inlet 'p=6.4 bar, T=187 degC' --exit 'p=2.1 bar, T=121.8 degC'

ask 0 'NZ-2203: water at 138 degC into an open bath: it flashes' \
    nozzle --fluid water --inlet 'p=8.5 bar, T=138 degC, V=2.4 m/s' --exit 'p=1.02 bar'

ask 0 'NZ-3302: what bore passes 0.52 kg/s at full receiver pressure, against a silencer at 0.6 of it?' \
    nozzle --fluid air --inlet 'p0=7.8 barg, T0=41 degC' --exit 'p/p0=0.6' --flow '0.52 kg/s'

ask 0 'NZ-1014 as built: throat 9.5 mm, exit 31 mm, condenser at 0.12 bar' \
    nozzle --fluid steam --inlet 'p0=11.2 barg, T0=212 degC' --throat 'd=9.5 mm' --exit 'd=31 mm' --back 'p=0.12 bar' \
    --efficiency 92% --discharge-coefficient iso9300-toroidal --ambient 'p=0.973 bar, T=24 degC'

ask 0 'NZ-1014 at start, the condenser still at ambient pressure: where does the shock stand?' \
    nozzle --fluid steam --inlet 'p0=11.2 barg, T0=212 degC' --throat 'd=9.5 mm' --exit 'd=14 mm' --back 'p=6.5 bar' --divergent-angle '9 deg' --path 15 \
    --ambient 'p=0.973 bar, T=24 degC'

ask 0 'NZ-1014: up to which back pressure stays its shock beyond 1.6 throat areas?' \
    nozzle --fluid steam --inlet 'p0=11.2 barg, T0=212 degC' --throat 'd=9.5 mm' --exit 'd=14 mm' --find back.p --target 'shock.area_ratio=1.6' \
    --ambient 'p=0.973 bar, T=24 degC'

ask 0 'NZ-2107: dry saturated steam through 14 mm, condensing late' \
    nozzle --fluid steam --inlet 'p0=6.4 bar, x=1' --throat 'd=14 mm' --back 'p=2.1 bar' --expansion supersaturated

ask 0 'NZ-1014: the same nozzle with condensation at 3.2 % equilibrium moisture' \
    nozzle --fluid steam --inlet 'p0=11.2 barg, T0=212 degC' --throat 'd=9.5 mm' --exit 'd=31 mm' --back 'p=0.12 bar' \
    --expansion supersaturated --onset 3.2% --ambient 'p=0.973 bar, T=24 degC'

ask 0 'NZ-2203: the most that the bath nozzle could pass if nothing flashed before its exit' \
    nozzle --fluid water --inlet 'p=8.5 bar, T=138 degC' --throat 'd=6 mm' --back 'p=1.02 bar' --expansion single-phase

ask 0 'NZ-3305: air dried to a frost point of -20 degC at 7 barg into the conveying line: where does its vapour turn to ice?' \
    nozzle --fluid humid-air --inlet 'p0=7 barg, T0=35 degC, dew-point=-20 degC' --throat 'd=9 mm' --exit 'd=12 mm' --back 'p=1.1 bar' \
    --divergent-angle '8 deg'

ask 0 'NZ-3302: which coefficient does a measured 0.505 kg/s imply for a bore of 18.0 mm?' \
    nozzle --fluid air --inlet 'p0=7.8 barg, T0=41 degC' --throat 'd=18.0 mm' --back 'p=1 bar' --flow '0.505 kg/s'

ask 0 'FE-3310: 64.0 mm long-radius nozzle in a 102.3 mm line of compressed air, 18.4 kPa between its taps' \
    nozzle --fluid air --inlet 'p=6.85 barg, T=38 degC, d=102.3 mm' --throat 'd=64.0 mm' --back 'dp=18.4 kPa' \
    --discharge-coefficient iso5167-long-radius --ambient 'p=0.973 bar, T=24 degC'

ask 0 'DF-4110: recovery, efficiency and loss from a measured rise and velocity' \
    diffuser --fluid air --inlet 'p=1013 mbar, T=64 degC, V=47 m/s' --exit 'rise=6.9 mbar, V=19 m/s'

ask 1 'DF-4120: the vendor quotes more recovery than the second law allows' \
    diffuser --fluid air --inlet 'p=1013 mbar, T=64 degC, V=47 m/s' --exit 'V=24 m/s' --recovery 0.86

ask 0 'DF-4130: fan outlet cone 355 to 500 mm, 1.02 m long: what comes back, and is it short of stall?' \
    diffuser --fluid air --inlet 'p=4.2 inH2O(g), T=31 degC, V=28 m/s, d=355 mm' --exit 'd=500 mm' --length '1.02 m' \
    --loss-coefficient idelchik --inlet-blockage 6% --show-in 'p=inH2O(g), dp=Pa' --ambient 'p=0.973 bar, T=24 degC'

ask 0 'DF-4140: duct transition 420x600 to 800x600 mm in 0.6 m: past stall' \
    diffuser --fluid air --inlet 'p=180 Pa(g), T=31 degC, V=17 m/s, rect=420x600 mm' --exit 'rect=800x600 mm' --length '0.6 m' \
    --loss-coefficient best-planar --inlet-blockage 8% --ambient 'p=0.973 bar, T=24 degC'

ask 0 'FE-3320: a throat of 46 mm with recovery in the same line: flow, what the reading costs, and when it chokes' \
    venturi --fluid air --inlet 'p=6.85 barg, T=38 degC, d=102.3 mm' --throat 'd=46 mm, dp=62 kPa' --exit 'd=102.3 mm' \
    --discharge-coefficient iso5167-venturi-machined --loss-coefficient idelchik --included-angle '10 deg' --ambient 'p=0.973 bar, T=24 degC'

ask 3 'NZ-2107 again: pressure and temperature on the saturation line do not name an inlet' \
    nozzle --fluid steam --inlet 'p=6.4 bar, T=161.4 degC' --exit 'p=2.1 bar'

printf '\n%s\n' "checks that ended otherwise than expected: $wrong"
[ "$wrong" -eq 0 ]
