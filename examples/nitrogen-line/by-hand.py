"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Mass and first moment of the measured profile as a stack of cone frusta; rejection by adaptive quadrature of the strip integrals.
Medium as the program prints it for nitrogen at 15 degC and 1.4 bar.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, quad

mp.dps = 25
rho_h = mpf(2330)
rho, mu, T, p, M = mpf("1.63762731668"), mpf("1.7339e-5"), mpf("288.15"), mpf(140000), mpf("0.0280134")
with open("profile.csv") as table:
    knots = [tuple(mpf(x) * mpf("1e-6") for x in line.split(",")) for line in table.read().split("\n")[1:] if line]
zs = [z for z, _ in knots]


def radius(z):
    for (z0, d0), (z1, d1) in zip(knots, knots[1:]):
        if z <= z1:
            return (d0 + (d1 - d0) * (z - z0) / (z1 - z0)) / 2
    return knots[-1][1] / 2


volume = sum(pi * (z1 - z0) * (d0**2 + d0 * d1 + d1**2) / 12 for (z0, d0), (z1, d1) in zip(knots, knots[1:]))


def rejection(f):
    w, nu = 2 * pi * f, mu / rho
    free = mu / p * sqrt(pi * mpf("8.314462618") * T / (2 * M))
    k = sqrt(mpc(0, w) / nu)

    def gamma(a):
        lam, slip = a * k, free / a
        k0, k1 = besselk(0, lam), besselk(1, lam)
        return 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))

    still = quad(lambda z: pi * radius(z) ** 2 * z, zs)
    past = quad(lambda z: pi * radius(z) ** 2 * z * gamma(radius(z)) * (1 - exp(-k * z)), zs)
    return 20 * log10(fabs(rho_h * still + rho * past) / fabs(rho * (still + past)))


rows = [("mass_kg", "", rho_h * volume, "1e-10")]
rows += [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (100, 1000)]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
