"""Writes reference-balances.json: 200 random mass balances solved with mpmath (a general-purpose multiprecision library) to 40 digits.

Run: python3 tests/equilibrium/reference-balances.py > tests/equilibrium/reference-balances.json
Each system: components, species as [ln K, nu of each component], totals, and ln of each free amount. mpmath works on the balances themselves by its
multidimensional Newton method (findroot, 'mdnewton') from the answer of scipy's trust-region method (hybr); it shares no code with the project.
"""

import json
import random

import mpmath
import numpy
from scipy.optimize import root

mpmath.mp.dps = 40
random.seed(20260718)


def random_system():
    components = random.randint(2, 6)
    species = [[0.0, [int(i == j) for j in range(components)]] for i in range(components)]
    for _ in range(random.randint(components, 4 * components)):
        nu = [0] * components
        for i in random.sample(range(components), random.randint(1, min(3, components))):
            nu[i] = random.choice([1, 1, 1, 2, 3])
        if sum(nu) > 1:
            species.append([random.uniform(-8, 16), nu])
    totals = [10 ** random.uniform(-4, 1) for _ in range(components)]
    return components, species, totals


def log_balances(x, components, species, totals, log, exp):
    sums = [0] * components
    for ln, nu in species:
        amount = exp(ln + sum(n * x[i] for i, n in enumerate(nu)))
        for i, n in enumerate(nu):
            sums[i] = sums[i] + n * amount
    return [log(sums[i] / totals[i]) for i in range(components)]


def solve(components, species, totals):
    def coarse(x):
        return log_balances(numpy.clip(x, -80, 20), components, species, totals, numpy.log, numpy.exp)

    for _ in range(200):
        start = [numpy.log(total) - random.uniform(0, 12) for total in totals]
        found = root(coarse, start, method="hybr", tol=1e-12)
        if found.success and max(abs(value) for value in coarse(found.x)) < 1e-8:
            break
    else:
        return None
    fine = mpmath.findroot(
        lambda *x: log_balances(x, components, species, totals, mpmath.log, mpmath.exp),
        [mpmath.mpf(value) for value in found.x],
        solver="mdnewton",
        tol=mpmath.mpf(10) ** -60,
        maxsteps=60,
        verify=False,
    )
    values = list(fine)
    worst = max(abs(v) for v in log_balances(values, components, species, totals, mpmath.log, mpmath.exp))
    return values if worst < mpmath.mpf(10) ** -28 else None


systems = []
while len(systems) < 200:
    components, species, totals = random_system()
    answer = solve(components, species, totals)
    if answer is not None:
        systems.append({"species": species, "totals": totals, "ln": [float(v) for v in answer]})
print(json.dumps(systems, separators=(",", ":")))
