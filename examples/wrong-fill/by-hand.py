"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Handbook solid: mass rho A L, moment of inertia about the foot m L^2/3 + m d^2/16; upright in vacuum sqrt((S - m g L/2)/J)/2 pi.
"""
import csv
from mpmath import mp, mpf, sqrt, pi

mp.dps = 30
L, d, rho_h, S = mpf("800e-6"), mpf("120e-6"), mpf(1100), mpf("15e-9")
m = rho_h * pi * d**2 / 4 * L
J = m * (L**2 / 3 + d**2 / 16)
rows = [
    ("mass_kg", "", m, "1e-10"),
    ("inertia_kg_m2", "", J, "1e-10"),
    ("vacuum_resonance_hz", "", sqrt((S - m * mpf("9.80665") * L / 2) / J) / (2 * pi), "1e-10"),
]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
