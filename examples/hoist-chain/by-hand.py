"""Figures of this example worked apart from the program, with mpmath alone (run: python3 by-hand.py).

Strip theory: Gamma = 1 + 4 K1(l)/(l K0(l)), l = a sqrt(i w/nu) (Stokes 1851); flow 1 - exp(-k z) over the wall;
T_flow = rho A int (1 + Gamma s) z dz, T_open = -A int (rho_h + rho Gamma s) z dz. Medium by density and viscosity: no slip.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, quad

mp.dps = 30
L, d, rho_h = mpf("620e-6"), mpf("92e-6"), mpf(1420)
rho, mu = mpf("1.2"), mpf("18.3e-6")


def rejection(f):
    a, w = d / 2, 2 * pi * f
    k = sqrt(mpc(0, w) * rho / mu)
    gamma = 1 + 4 * besselk(1, a * k) / (a * k * besselk(0, a * k))
    sheared = quad(lambda z: (1 - exp(-k * z)) * z, [0, L / 4, L])
    flow = rho * (L * L / 2 + gamma * sheared)
    motion = rho_h * L * L / 2 + rho * gamma * sheared  # the wall drags its layer along
    return 20 * log10(fabs(motion) / fabs(flow))


rows = [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (30, 100, 400)]
rows.append(("mass_kg", "", rho_h * pi * d * d / 4 * L, "1e-12"))
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
