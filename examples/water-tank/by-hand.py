"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Closed-form strip theory without slip; the stiffness from the resonance that was stated in water:
S = w^2 (J + Re J_fluid) - S_g, J_fluid = rho A Gamma L^3/3, S_g = -(rho_h - rho) g A L^2/2 for an upright hair.
Medium as the program prints it for water at 18 degC.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, quad

mp.dps = 30
L, a, rho_h = mpf("1.25e-3"), mpf("90e-6"), mpf(2500)
rho, mu = mpf("998.598648"), mpf("1.0526473e-3")
area = pi * a * a


def gamma(w):
    lam = a * sqrt(mpc(0, w) * rho / mu)
    return 1 + 4 * besselk(1, lam) / (lam * besselk(0, lam))


def rejection(f):
    w = 2 * pi * f
    k = sqrt(mpc(0, w) * rho / mu)
    past = gamma(w) * quad(lambda z: (1 - exp(-k * z)) * z, [0, L / 8, L])
    return 20 * log10(fabs(rho_h * L * L / 2 + rho * past) / fabs(rho * (L * L / 2 + past)))


w0 = 2 * pi * 220
J = rho_h * (area * L**3 / 3 + pi * a**4 / 4 * L)
S = w0**2 * (J + (rho * area * gamma(w0) * L**3 / 3).real) + (rho_h - rho) * mpf("9.80665") * area * L * L / 2
rows = [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (100, 1000)]
rows.append(("stiffness_n_m_per_rad", "", S, "1e-6"))
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
