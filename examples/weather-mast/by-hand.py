"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

The club is cut into stalk, cosine shoulder, straight head and half sphere; moments by quadrature and, for the half sphere, by the handbook solid.
In vacuum the upright hair swings at sqrt((S - m g z_c)/J)/2 pi.
"""
import csv
from mpmath import mp, mpf, cos, sqrt, pi, quad

mp.dps = 30
L, rs, ls, sh, rh, rho_h = (mpf(x) for x in ("900e-6", "30e-6", "420e-6", "80e-6", "75e-6", "2330"))
S = mpf("25e-9")


def shoulder(z):
    return rs + (rh - rs) / 2 * (1 - cos(pi * (z - ls) / sh))


z1, z2 = ls + sh, L - rh
ball = 2 * pi * rh**3 / 3
ball_centre = z2 + 3 * rh / 8
ball_own = ball * rh**2 * 83 / 320  # half sphere about a transverse axis through its centre of mass, per density
volume = pi * rs**2 * ls + quad(lambda z: pi * shoulder(z) ** 2, [ls, z1]) + pi * rh**2 * (z2 - z1) + ball
first = (pi * rs**2 * ls**2 / 2 + quad(lambda z: pi * shoulder(z) ** 2 * z, [ls, z1]) + pi * rh**2 * (z2**2 - z1**2) / 2
         + ball * ball_centre)
second = (pi * rs**2 * ls**3 / 3 + pi * rs**4 / 4 * ls
          + quad(lambda z: pi * shoulder(z) ** 2 * z**2 + pi * shoulder(z) ** 4 / 4, [ls, z1])
          + pi * rh**2 * (z2**3 - z1**3) / 3 + pi * rh**4 / 4 * (z2 - z1) + ball_own + ball * ball_centre**2)
rows = [
    ("mass_kg", "", rho_h * volume, "1e-10"),
    ("inertial_torque_n_m_per_m_s2", "", rho_h * first, "1e-10"),
    ("inertia_kg_m2", "", rho_h * second, "1e-10"),
    ("vacuum_resonance_hz", "", sqrt((S - rho_h * first * mpf("9.80665")) / (rho_h * second)) / (2 * pi), "1e-10"),
]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
