"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

A frustum's mass by the handbook; rejection with first-order slip by adaptive quadrature. Medium as the program prints it.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, quad

mp.dps = 25
L, d0, d1, rho_h = mpf("830e-6"), mpf("64e-6"), mpf("38e-6"), mpf(2200)
rho, mu, T, p, M = mpf("0.0584231990279"), mpf("1.8448e-5"), mpf("298.15"), mpf(5000), mpf("0.0289655")


def radius(z):
    return (d0 + (d1 - d0) * z / L) / 2


def rejection(f):
    w, nu = 2 * pi * f, mu / rho
    free = mu / p * sqrt(pi * mpf("8.314462618") * T / (2 * M))
    k = sqrt(mpc(0, w) / nu)

    def gamma(a):
        lam, slip = a * k, free / a
        k0, k1 = besselk(0, lam), besselk(1, lam)
        return 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))

    still = quad(lambda z: pi * radius(z) ** 2 * z, [0, L])
    past = quad(lambda z: pi * radius(z) ** 2 * z * gamma(radius(z)) * (1 - exp(-k * z)), [0, L / 2, L])
    return 20 * log10(fabs(rho_h * still + rho * past) / fabs(rho * (still + past)))


rows = [("mass_kg", "", rho_h * pi * L * (d0**2 + d0 * d1 + d1**2) / 12, "1e-10")]
rows += [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (20, 200)]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
