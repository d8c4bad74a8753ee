#!/usr/bin/env python3
"""Writes rows of steam nozzles, ten columns: steam_rows.py ROWS > FILE.

Inlet 2 to 40 bar(a), 2 to 250 K of superheat, 5 to 60 m/s; exit pressure 0.1 to 0.9 of the inlet's: many exits are wet, many throats choked.
The same rows every time: additive recurrences, no random numbers.
"""
import sys

GOLDEN, PLASTIC, THIRD, FOURTH, FIFTH = 0.6180339887498949, 0.7548776662466927, 0.5698402909980532, 0.8191725133961645, 0.6710436067037893


def main(rows):
    out = sys.stdout
    out.write("tag,device,fluid,inlet.p [bar(a)],inlet.superheat [K],inlet.V [m/s],exit.p [bar(a)],efficiency [%],flow [kg/s],remark\n")
    for i in range(1, rows + 1):
        p = 2 + 38 * (i * GOLDEN % 1)
        superheat = 2 + 248 * (i * PLASTIC % 1)
        velocity = 5 + 55 * (i * THIRD % 1)
        ratio = 0.1 + 0.8 * (i * FOURTH % 1)
        efficiency = 85 + 14 * (i * FIFTH % 1)
        out.write(f"N-{i:08d},nozzle,steam,{p:.3f},{superheat:.2f},{velocity:.1f},{p * ratio:.4f},{efficiency:.1f},{0.5 + i % 40 / 10:.2f},unit {i % 7}\n")


main(int(sys.argv[1]))
