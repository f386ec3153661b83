"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv.

Mass of the solid; rejection at equal accelerations by adaptive quadrature of strip theory, with first-order slip.
Density, viscosity and mean free path as the program prints them for the state of the study.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, quad

mp.dps = 25
L, d0, d1, rho_h = mpf("720e-6"), mpf("92e-6"), mpf("92e-6"), mpf(1180)
rho, mu, free = mpf("1.17137332604"), mpf("1.81723480249e-5"), mpf("6.68259779521e-8")


def radius(z):
    return (d0 + (d1 - d0) * z / L) / 2


def rejection(f):
    k = sqrt(mpc(0, 2 * pi * f) * rho / mu)

    def gamma(a):
        lam, slip = a * k, free / a
        k0, k1 = besselk(0, lam), besselk(1, lam)
        return 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))

    def share(z):
        return 1 - exp(-k * z)

    still = quad(lambda z: pi * radius(z) ** 2 * z, [0, L])
    past = quad(lambda z: pi * radius(z) ** 2 * z * gamma(radius(z)) * share(z), [0, L / 8, L / 2, L])
    return 20 * log10(fabs(rho_h * still + rho * past) / fabs(rho * (still + past)))


rows = [("mass_kg", "", rho_h * pi * L * (d0**2 + d0 * d1 + d1**2) / 12, "1e-10")]
rows += [("rejection_db", f, rejection(mpf(f)), "1e-6") for f in (50, 315)]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])
