"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Oil as the program prints it for 30 degC; everything else from the study. Strip theory in closed form, no slip in a liquid:
T_flow = rho A [L^2/2 + Gamma int s z dz], T_open = -A (rho_h L^2/2 + rho Gamma int s z dz).
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs

mp.dps = 30
L, d, rho_h = mpf("760e-6"), mpf("150e-6"), mpf(7850)
rho, mu = mpf("930.0445"), mpf("0.0085070725")


def rejection(f):
    a, w = d / 2, 2 * pi * f
    k = sqrt(mpc(0, w) * rho / mu)
    lam = a * k
    gamma = 1 + 4 * besselk(1, lam) / (lam * besselk(0, lam))
    sheared = mp.quad(lambda z: (1 - exp(-k * z)) * z, [0, L / 4, L])
    flow = rho * (L * L / 2 + gamma * sheared)
    motion = -(rho_h * L * L / 2 + rho * gamma * sheared)
    return 20 * log10(fabs(motion) / fabs(flow))


area = pi * d * d / 4
rows = [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (400, 1000)]
rows.append(("mass_kg", "", rho_h * area * L, "1e-12"))
rows.append(("inertia_kg_m2", "", rho_h * (area * L**3 / 3 + pi * (d / 2) ** 4 / 4 * L), "1e-12"))
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
