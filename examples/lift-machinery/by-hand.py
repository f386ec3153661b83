"""Figures of this study and of its club, worked apart from the program with mpmath. Writes by-hand.csv.

Medium as the program prints it for 27 degC, 99.2 kPa, 35 % humidity (CIPM-2007 density, Wilke viscosity, mean free path); everything else from the study.
Strip theory; the club's integrals by adaptive quadrature over its own outline (stalk, half a cosine, head), not by the program's strips.
Gamma with first-order slip, slip length = mean free path, as the program prints it for this air.
by-hand-compare.csv: the club as it stands, and the factor on its diameters that gives it the cylinder's moment of inertia.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, log10, fabs, cos, quad, findroot

mp.dps = 40  # the quadrature stops at an absolute error, and the integrals are tiny
L, d, h, rho_h = mpf("780e-6"), mpf("88e-6"), mpf("3e-6"), mpf(1370)
rho, mu = mpf("1.14623915499"), mpf("1.84256985172e-5")
stalk, ls, shoulder, head = mpf("26e-6"), mpf("430e-6"), mpf("70e-6"), mpf("59e-6")
free_path = mpf("6.84949334939e-8")


def gamma(a, f):
    lam = a * sqrt(mpc(0, 2 * pi * f) * rho / mu)
    slip = free_path / a
    k0, k1 = besselk(0, lam), besselk(1, lam)
    return 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))


def cylinder(z):
    return d / 2


def club(z):
    if z <= ls:
        return stalk
    if z < ls + shoulder:
        return stalk + (head - stalk) / 2 * (1 - cos(pi * (z - ls) / shoulder))
    return head


def rejection(radius, cuts, f):
    k = sqrt(mpc(0, 2 * pi * f) * rho / mu)
    area = lambda z: pi * radius(z) ** 2 * (z + h)
    lever = quad(area, cuts)
    sheared = quad(lambda z: area(z) * gamma(radius(z), f) * (1 - exp(-k * z)), cuts)
    return 20 * log10(fabs(rho_h * lever + rho * sheared) / fabs(rho * (lever + sheared)))


def inertia(radius, cuts):
    return rho_h * quad(lambda z: pi * radius(z) ** 2 * (z + h) ** 2 + pi * radius(z) ** 4 / 4, cuts)


plain = [0, L / 8, L]
parts = [0, ls / 8, ls, ls + shoulder, L]
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for f in (30, 90):
        writer.writerow(["rejection_db", f, mp.nstr(rejection(cylinder, plain, mpf(f)), 12), "1e-6"])
    writer.writerow(["mass_kg", "", mp.nstr(rho_h * pi * d * d / 4 * L, 12), "1e-12"])
    writer.writerow(["inertia_kg_m2", "", mp.nstr(inertia(cylinder, plain), 12), "1e-11"])
with open("by-hand-compare.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["device", "quantity", "value", "relative_tolerance"])
    writer.writerow(["club", "rejection_db", mp.nstr(rejection(club, parts, mpf(90)), 12), "1e-6"])
    writer.writerow(["club", "rejection_from_db", mp.nstr(rejection(club, parts, mpf(30)), 12), "1e-6"])
    writer.writerow(["club", "inertia_kg_m2", mp.nstr(inertia(club, parts), 12), "1e-9"])
    wanted = inertia(cylinder, plain)
    ratio = findroot(lambda x: inertia(lambda z: x * club(z), parts) / wanted - 1, mpf("0.8"))
    writer.writerow(["club", "ratio", mp.nstr(ratio, 12), "1e-9"])
