#!/usr/bin/env python3
# SPDX-License-Identifier: MIT
"""compare_steam.py - compares the saturation line of water with the iapws package (IF97, R14-08, 1.5.4).

Usage: steam_table | compare_steam.py

IF97 is another formulation than SR1-86: both are within 0.025 % of each other below 623 K. The ice side is
the same formulation and must agree to rounding. The package's IF97 latent heat is compared within 0.05 %,
0.2 % above 500 K, where the densities of SR1-86 and IF97 part."""
import sys

from iapws import IAPWS97, _Sublimation_Pressure
from iapws.iapws97 import _PSat_T


def main():
    worst = {"liquid": 0.0, "ice": 0.0, "latent": 0.0, "latent hot": 0.0}
    count = 0
    for line in sys.stdin:
        t, p, latent = (float(word) for word in line.split())
        count += 1
        if t < 273.16:
            worst["ice"] = max(worst["ice"], abs(p / (_Sublimation_Pressure(t) * 1e6) - 1.0))
            continue
        worst["liquid"] = max(worst["liquid"], abs(p / (_PSat_T(t) * 1e6) - 1.0))
        if latent > 0.0 and t < 620.0:
            vapour, liquid = IAPWS97(T=t, x=1.0), IAPWS97(T=t, x=0.0)
            kind = "latent" if t < 500.0 else "latent hot"
            worst[kind] = max(worst[kind], abs(latent / ((vapour.h - liquid.h) * 1e3) - 1.0))
    print(f"{count} temperatures of water; largest relative differences:",
          ", ".join(f"{kind} {value:.2g}" for kind, value in worst.items()))
    good = worst["liquid"] < 2.5e-4 and worst["ice"] < 1e-9 and worst["latent"] < 5e-4 and worst["latent hot"] < 2e-3
    return 0 if good and count > 100 else 1


if __name__ == "__main__":
    sys.exit(main())
