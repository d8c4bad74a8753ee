"""The same states by flowduct and by the general-purpose library python3-iapws (Debian); the greatest deviations, a failure beyond the limits."""
import json
import math
import subprocess
import sys

from iapws import IAPWS97
from iapws.humidAir import Air

flowduct = sys.argv[1]

# Relative, of h to max(|h|, 1 kJ/kg) and of s to max(|s|, 0.01 kJ/(kg.K)). Its conductivity is not compared: near the critical point the two
# cap the enhancement differently.
LIMIT = 1e-10
PROPERTIES = {
    "h": (lambda s: s.h * 1e3, 1e3), "s": (lambda s: s.s * 1e3, 10), "rho": (lambda s: s.rho, 0), "cp": (lambda s: s.cp * 1e3, 0),
    "cv": (lambda s: s.cv * 1e3, 0), "w": (lambda s: s.w, 0), "mu": (lambda s: s.mu, 0),
}


def answer(at, *fluid):
    run = subprocess.run([flowduct, "state", "--fluid", *(fluid or ["water"]), "--at", at, "--format", "json"], capture_output=True, text=True)
    if run.returncode != 0:
        sys.exit(f"wrong: {at}: status {run.returncode}: {run.stderr}")
    return json.loads(run.stdout)["stations"]["at"]


def grid():
    for p in (0.001, 0.01, 0.1, 0.7, 3, 10, 16, 20, 25, 40, 70, 100):
        for T in (274, 300, 400, 500, 600, 625, 640, 660, 700, 850, 900, 1050, 1200, 1700, 2250):
            if T <= 1073.15 or p <= 50:
                yield p, T


worst = {}
count = 0


def compare(where, region, ours, theirs):
    global count
    count += 1
    for name, (read, floor) in PROPERTIES.items():
        if ours[name] is None or (name == "mu" and region == 5):
            continue
        expected = read(theirs)
        deviation = abs(ours[name] - expected) / max(abs(expected), floor)
        if not deviation <= worst.get((region, name), (-1, ""))[0]:
            worst[region, name] = (deviation, where)


for p, T in grid():
    theirs = IAPWS97(P=p, T=T)
    compare(f"p={p} MPa T={T} K", theirs.region, answer(f"p={p} MPa, T={T} K"), theirs)
for p in (0.001, 0.1, 0.7, 3, 10, 16, 18, 21):
    for x in (0, 1):
        compare(f"p={p} MPa x={x}", 4, answer(f"p={p} MPa, x={x}"), IAPWS97(P=p, x=x))
for p, T in ((0.1, 350), (0.1, 500), (5, 450), (5, 800), (30, 600), (20, 900)):
    theirs = IAPWS97(P=p, T=T)
    for pair, value in (("h", f"{theirs.h!r} kJ/kg"), ("s", f"{theirs.s!r} kJ/(kg.K)")):
        compare(f"p={p} MPa {pair}={value}", theirs.region, answer(f"p={p} MPa, {pair}={value}"), theirs)

# Air by its reference equation: h and s have another datum there, so that both are taken against one state.
AIR = ("air", "--equation-of-state", "reference")
DATUM, OUR_DATUM = Air(P=0.1, T=300), answer("p=0.1 MPa, T=300 K", *AIR)
for p, T in ((0.1, 300), (0.1, 90), (1, 140), (5, 135), (10, 130), (10, 150), (20, 300), (50, 250), (100, 500), (1, 1000), (10, 1800)):
    theirs, ours = Air(P=p, T=T), answer(f"p={p} MPa, T={T} K", *AIR)
    count += 1
    pairs = {name: (ours[name], PROPERTIES[name][0](theirs), 0) for name in ("rho", "cp", "cv", "w")}
    for name, floor in (("h", 1e3), ("s", 10)):
        read = PROPERTIES[name][0]
        pairs[name] = (ours[name] - OUR_DATUM[name], read(theirs) - read(DATUM), floor)
    for name, (mine, expected, floor) in pairs.items():
        deviation = abs(mine - expected) / max(abs(expected), floor)
        if not deviation <= worst.get(("air", name), (-1, ""))[0]:
            worst["air", name] = (deviation, f"p={p} MPa T={T} K")

wrong = 0
for (region, name), (deviation, where) in sorted(worst.items(), key=str):
    bad = not deviation <= LIMIT or math.isnan(deviation)
    wrong += bad
    print(f"{'wrong' if bad else 'ok'}: {region if region == 'air' else f'region {region}'} {name:4} greatest relative deviation {deviation:.1e} at {where}")
print(f"{count} states compared")
sys.exit(1 if wrong or count < 161 else 0)
