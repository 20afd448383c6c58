#!/usr/bin/env python3
# SPDX-License-Identifier: MIT
"""compare_flames.py - computes the flames printed by flames.c again with Cantera (3.1.0) and compares.

Usage: flames 300 | compare_flames.py OUR-FLAMES-A-SECOND

The same polynomials and the same products go to Cantera, whose solver is another one; what is compared is
the solver and the balance. Fails when a temperature differs by more than T_LIMIT, a mole fraction above
MAJOR by more than X_LIMIT, or one above MINOR by more than MINOR_LIMIT of itself.
"""
import collections
import sys
import time

import cantera as ct

ELEMENTS = ["C", "H", "N", "O", "S", "He", "Ne", "Ar"]
T_LIMIT = 1e-4  # K: both solvers stop far below
X_LIMIT = 1e-8
MAJOR = 1e-4
MINOR = 1e-9
MINOR_LIMIT = 1e-5


def read(lines):
    species, cases = {"reactant": [], "product": []}, collections.OrderedDict()
    for line in lines:
        word = line.split()
        if word[0] == "species":
            species[word[2]].append((word[1], [int(n) for n in word[3:11]], [float(n) for n in word[11:]]))
        elif word[0] == "case":
            cases[word[1]] = {"state": [float(n) for n in word[2:]], "fuel": {}, "oxidant": {}, "product": {}}
        else:
            cases[word[1]][word[0]][word[2]] = float(word[3])
    return species, cases


def phase(name, rows):
    """An ideal gas of these species, reference pressure 1 bar."""
    text = [f"phases:\n- name: {name}\n  thermo: ideal-gas\n  elements: [{', '.join(ELEMENTS)}]",
            "  species: [" + ", ".join(f'"{row[0]}"' for row in rows) + "]\nspecies:"]
    for row in rows:
        atoms = ", ".join(f"{e}: {n}" for e, n in zip(ELEMENTS, row[1]) if n)
        text.append(f'- name: "{row[0]}"\n  composition: {{{atoms}}}\n  thermo:\n    model: NASA9\n'
                    f"    reference-pressure: 1.0e+05\n    temperature-ranges: [200.0, 1000.0, 6000.0]\n"
                    f"    data:\n    - {row[2][:9]}\n    - {row[2][9:]}")
    return ct.Solution(yaml="\n".join(text), name=name)


def reactants(gas, case):
    """Elements (kmol) and enthalpy (J) per kmol of fuel."""
    fuel_t, oxidant_t, ratio, p = case["state"][:4]
    elements, enthalpy = dict.fromkeys(ELEMENTS, 0.0), 0.0
    for kind, t, moles in (("fuel", fuel_t, 1.0), ("oxidant", oxidant_t, ratio)):
        gas.TPX = t, p, case[kind]
        enthalpy += moles * gas.enthalpy_mole
        for name, x in zip(gas.species_names, gas.X):
            for element in ELEMENTS:
                elements[element] += moles * x * gas.n_atoms(name, element)
    return elements, enthalpy


def solve(gas, case, elements, enthalpy):
    """Equilibrium from Cantera's own, far hotter one; the enthalpy is counted per mass, which both sides share.

    Its solver "gibbs" is left out: it moves scarce elements by up to a quarter of them."""
    p, ours = case["state"][3], case["state"][4]
    mass = sum(n * gas.atomic_weight(e) for e, n in elements.items())
    for start, solver in ((1.5, "vcs"), (1.0, "vcs"), (1.0, "element_potential")):
        try:
            gas.TPX = ours, p, case["product"]
            if start > 1.0:
                gas.TP = start * ours, p
                gas.equilibrate("TP", solver=solver, rtol=1e-10, max_steps=10000)
            gas.HP = enthalpy / mass, p
            gas.equilibrate("HP", solver=solver, rtol=1e-11, max_steps=10000, max_iter=1000)
            return True
        except ct.CanteraError:
            pass
    return False


def rate(gas, cases):
    """Flames a second of Cantera's default solver, each started from the answer at 0.9 of its temperature."""
    seconds, solved = 0.0, 0
    for case in cases:
        gas.TPX = case["state"][4], case["state"][3], case["product"]
        enthalpy = gas.enthalpy_mass
        gas.TP = 0.9 * case["state"][4], case["state"][3]
        gas.HP = enthalpy, case["state"][3]
        start = time.perf_counter()
        try:
            gas.equilibrate("HP")
            solved += 1
        except ct.CanteraError:
            pass
        seconds += time.perf_counter() - start
    return solved / seconds


def main():
    species, cases = read(sys.stdin)
    cold, hot = phase("reactants", species["reactant"]), phase("products", species["product"])
    worst = {"T": (0.0, ""), "major": (0.0, ""), "minor": (0.0, "")}
    unsolved, seconds = 0, 0.0
    for number, case in cases.items():
        elements, enthalpy = reactants(cold, case)
        start = time.perf_counter()
        found = solve(hot, case, elements, enthalpy)
        seconds += time.perf_counter() - start
        if not found:
            unsolved += 1
            continue
        worst["T"] = max(worst["T"], (abs(hot.T - case["state"][4]), number))
        for name, x in zip(hot.species_names, hot.X):
            difference = abs(x - case["product"].get(name, 0.0))
            worst["major"] = max(worst["major"], (difference, f"{number} {name}"))
            if MINOR < x < MAJOR:
                worst["minor"] = max(worst["minor"], (difference / x, f"{number} {name}"))
    print(f"{len(cases)} flames, {unsolved} that Cantera did not solve, {seconds / len(cases) * 1e3:.2f} ms each in Cantera")
    ours, theirs = float(sys.argv[1]), rate(hot, cases.values())
    print(f"{ours:.0f} equilibrium flames a second here, {theirs:.0f} in Cantera on the same products: {ours / theirs:.0f} times")
    for kind, (value, where) in worst.items():
        print(f"largest difference, {kind}: {value:.3g} (case {where})")
    good = worst["T"][0] <= T_LIMIT and worst["major"][0] <= X_LIMIT and worst["minor"][0] <= MINOR_LIMIT
    return 0 if good and unsolved < 0.05 * len(cases) else 1


if __name__ == "__main__":
    sys.exit(main())
