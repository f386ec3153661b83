"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

The club is cut into stalk, cosine shoulder and straight head; sealed, the torque per acceleration is -(rho_h - rho) P[1], and at 5 Hz the
response is that over the stiffness, the rest below 0.3 %. Density of the oil straight between the rows of the user's table.
"""
import csv
from mpmath import mp, mpf, cos, sqrt, pi, quad

mp.dps = 30
L, rs, ls, sh, rh, rho_h = (mpf(x) for x in ("950e-6", "35e-6", "450e-6", "60e-6", "95e-6", "8900"))
S, plate = mpf("420e-9"), mpf("2e-15")


def shoulder(z):
    return rs + (rh - rs) / 2 * (1 - cos(pi * (z - ls) / sh))


z1 = ls + sh
volume = pi * rs**2 * ls + quad(lambda z: pi * shoulder(z) ** 2, [ls, z1]) + pi * rh**2 * (L - z1)
first = pi * rs**2 * ls**2 / 2 + quad(lambda z: pi * shoulder(z) ** 2 * z, [ls, z1]) + pi * rh**2 * (L**2 - z1**2) / 2
second = (pi * rs**2 * ls**3 / 3 + pi * rs**4 / 4 * ls
          + quad(lambda z: pi * shoulder(z) ** 2 * z**2 + pi * shoulder(z) ** 4 / 4, [ls, z1])
          + pi * rh**2 * (L**3 - z1**3) / 3 + pi * rh**4 / 4 * (L - z1))
rho = (mpf(910) + mpf(902)) / 2
g = mpf("9.80665")
rows = [
    ("mass_kg", "", rho_h * volume, "1e-10"),
    ("vacuum_resonance_hz", "", sqrt((S - rho_h * first * g) / (rho_h * second + plate)) / (2 * pi), "1e-10"),
    ("motion_rad_per_m_s2", 5, (rho_h - rho) * first / (S - (rho_h - rho) * first * g), "3e-3"),
]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
