"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Medium as the program prints it for 23 degC, 100.6 kPa, 40 % humidity (CIPM-2007 density, Wilke viscosity); everything else from the study.
Strip theory in closed form: T_flow = rho A [L^2/2 + hL + Gamma (L^2 M1 + hL M0)], T_open = -(rho_h A lever + rho A Gamma (...)).
Gamma with first-order slip, slip length = mean free path = mu/p sqrt(pi R T/(2 M)).
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs

mp.dps = 30
L, d, h, rho_h = mpf("540e-6"), mpf("105e-6"), mpf("2e-6"), mpf(1190)
rho, mu, T, p, M = mpf("1.17879555251"), mpf("1.82464238037e-5"), mpf("296.15"), mpf(100600), mpf("0.028843")


def torques(f):
    a, w = d / 2, 2 * pi * f
    nu = mu / rho
    lam = a * sqrt(mpc(0, w) / nu)
    slip = mu / p * sqrt(pi * mpf("8.314462618") * T / (2 * M)) / a
    k0, k1 = besselk(0, lam), besselk(1, lam)
    gamma = 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))
    k = sqrt(mpc(0, w) / nu)
    sheared = mp.quad(lambda z: (1 - exp(-k * z)) * (z + h), [0, L / 4, L])
    lever = L * L / 2 + h * L
    area = pi * a * a
    return rho * area * (lever + gamma * sheared), -area * (rho_h * lever + rho * gamma * sheared)


rows = []
for f in (80, 320):
    flow, motion = torques(mpf(f))
    rows.append(("rejection_db", f, 20 * log10(fabs(motion) / fabs(flow)), "1e-6"))
area = pi * d * d / 4
rows.append(("mass_kg", "", rho_h * area * L, "1e-12"))
top = L + h
rows.append(("inertia_kg_m2", "", rho_h * (area * (top**3 - h**3) / 3 + pi * (d / 2) ** 4 / 4 * L), "1e-12"))
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
