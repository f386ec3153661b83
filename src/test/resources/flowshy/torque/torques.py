"""Reference torques on hairs: python3 torques.py > torques.csv (mpmath 1.2.1, some minutes).

Integrates the force per length of Stokes's cylinder, with slip where a mean free path is given, over each profile by
tanh-sinh quadrature with 25 digits, in pieces between the profile's own breaks and at multiples of the Stokes layer.
Time factor exp(+i w t).
"""
from mpmath import mp, mpc, mpf, besselk, cos, exp, nstr, pi, quad, sqrt

mp.dps = 25


def gamma(a, s, rho, mu, mfp):
    """Gamma = 1 + 4 K1 (1+2l) / (x (K0 + l (x K1 + 2 K0))), x = a sqrt(s rho/mu), l = mfp/a."""
    x = a * sqrt(s * rho / mu)
    ratio = besselk(1, x) / besselk(0, x)
    l = mfp / a
    return 1 + 4 * ratio * (1 + 2 * l) / (x * (1 + l * (x * ratio + 2)))


def cylinder(length, a):
    return lambda z: a, [mpf(0), length]


def taper(length, base, tip):
    return lambda z: base + (tip - base) * z / length, [mpf(0), length]


def club(length, stalk, stalk_length, shoulder, head, rounded):
    def radius(z):
        if z < stalk_length:
            return stalk
        if z < stalk_length + shoulder:
            return stalk + (head - stalk) * (1 - cos(pi * (z - stalk_length) / shoulder)) / 2
        into = z - (length - head)
        return head if not rounded or into < 0 else sqrt((head - into) * (head + into))

    breaks = [mpf(0), stalk_length]
    if shoulder > 0:
        breaks.append(stalk_length + shoulder)
    if rounded:
        breaks.append(length - head)
    return radius, breaks + [length]


def measured(points):
    def radius(z):
        for (z0, a0), (z1, a1) in zip(points, points[1:]):
            if z <= z1:
                return a0 + (a1 - a0) * (z - z0) / (z1 - z0)

    return radius, [z for z, _ in points]


def f(text):
    return mpf(float(text))  # the doubles that a study would hold


AIR = (f("1.204"), f("1.825e-5"), mpf(0))
HELIUM = (f("0.1663"), f("1.962e-5"), f("1.9e-7"))
WATER = (f("998.2"), f("1.0016e-3"), mpf(0))
OIL = (f("960.0"), f("0.34"), mpf(0))

CASES = [
    ("cylinder", cylinder(f("8e-4"), f("4e-5")), AIR, f("1180.0"), f("0.0")),
    ("pointed taper", taper(f("7.2e-4"), f("4.4e-5"), mpf(0)), AIR, f("1210.0"), f("0.0")),
    ("narrow foot", taper(f("5.5e-4"), f("2e-6"), f("3.1e-5")), AIR, f("1390.0"), f("1.2e-5")),
    (
        "club, round",
        club(f("9e-4"), f("2e-5"), f("4e-4"), f("1e-4"), f("6e-5"), True),
        HELIUM,
        f("1180.0"),
        f("0.0"),
    ),
    ("club, step", club(f("6.6e-4"), f("1.4e-5"), f("3.7e-4"), mpf(0), f("5.2e-5"), False), OIL, f("2330.0"), f("3e-6")),
    (
        "measured",
        measured(
            [
                (f("0.0"), f("5.1e-5")),
                (f("1.1e-4"), f("3.3e-5")),
                (f("3.9e-4"), f("2.6e-5")),
                (f("5.2e-4"), f("3.8e-5")),
                (f("7.4e-4"), f("0.0")),
            ]
        ),
        WATER,
        f("1060.0"),
        f("5e-6"),
    ),
]
FREQUENCIES = ["0.5", "12.0", "150.0", "2200.0", "40000.0"]
# free swings: growth rates s, real and imaginary part
SWINGS = [("-120.0", "900.0"), ("-2500.0", "2600.0")]


def integrals(profile, medium, density, depth, s, layer):
    radius, breaks = profile
    rho, mu, mfp = medium
    known = {}

    def law(z):
        if z not in known:
            a = radius(z)
            known[z] = (gamma(a, s, rho, mu, mfp) * pi * a * a, pi * a * a) if a > 0 else (mpc(0), mpf(0))
        return known[z]

    k = sqrt(s * rho / mu)
    cuts = set(breaks)
    if layer is not None:
        cuts |= {m * layer for m in (mpf("0.3"), 1, 2, 4, 8, 16, 32) if m * layer < breaks[-1]}
    cuts = sorted(cuts)
    first = quad(lambda z: law(z)[1] * (z + depth), cuts)
    sheared = quad(lambda z: law(z)[0] * (1 - exp(-k * z)) * (z + depth), cuts)
    turning = quad(lambda z: law(z)[0] * (z + depth) ** 2, cuts)
    return first, sheared, rho * turning


def main():
    print("# Torques per unit acceleration about the pivot, and the fluid's inertia on the hair's own turning:")
    print("# flow = rho P[1 + Gamma s], open = -P[rho_h + rho Gamma s], carried = -(rho_h - rho) P[1], inertia = rho int pi a^2 Gamma l^2 dz.")
    print("# Where growth_re is not 0 the time factor is exp(s t), and only the inertia is given.")
    print("# Made with mpmath 1.2.1, 25 digits, by torques.py. Not made by this project's Java code.")
    print("case,growth_re,growth_im,flow_re,flow_im,open_re,open_im,carried,inertia_re,inertia_im")
    for name, profile, medium, density, depth in CASES:
        rho, mu, _ = medium
        for frequency in FREQUENCIES:
            omega = 2 * pi * f(frequency)
            layer = sqrt(2 * mu / rho / omega)
            first, sheared, turning = integrals(profile, medium, density, depth, mpc(0, omega), layer)
            flow = rho * (first + sheared)
            opened = -(density * first + rho * sheared)
            carried = -(density - rho) * first
            values = [flow.real, flow.imag, opened.real, opened.imag, carried, turning.real, turning.imag]
            row = [name.replace(",", ""), "0", nstr(omega, 17)] + [nstr(v, 18) for v in values]
            print(",".join(row), flush=True)
        for re, im in SWINGS:
            _, _, turning = integrals(profile, medium, density, depth, mpc(f(re), f(im)), None)
            row = [name.replace(",", ""), re, im] + [""] * 5 + [nstr(turning.real, 18), nstr(turning.imag, 18)]
            print(",".join(row), flush=True)


if __name__ == "__main__":
    main()
