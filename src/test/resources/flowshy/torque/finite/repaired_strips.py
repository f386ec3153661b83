"""Writes repaired-strips.csv: factors of the repaired strip theory on plain strip theory, both by adaptive quadrature, 25 digits.

Gamma = 1 + 4 K1(l)/(l K0(a ke)), l = a k, k = sqrt(i w/nu), ke = [k^1.5 + (2/L)^1.5]^(2/3); at the tip the force on half a radius is
taken away: stream -1/2 a_t i w rho pi a_t^2 s(L), rocking +1/2 a_t i w rho pi a_t^2 (L + h). Plain: ke = k, no end force.
a_t: radius that stands as far below the tip as itself. Units: largest radius, density and viscosity 1. Run: python3 repaired_strips.py > repaired-strips.csv"""
import mpmath as mp

mp.mp.dps = 25


def torques(shape, length, pivot, delta, repaired):
    radius, breaks, tip = shape
    k = mp.mpc(1, 1) / delta
    far = (k**mp.mpf(1.5) + (mp.mpf(2) / length)**mp.mpf(1.5))**(mp.mpf(2) / 3) if repaired else k
    share = lambda z: 1 - mp.exp(-k * z)
    gamma = lambda a: 1 + 4 * mp.besselk(1, a * k) / (a * k * mp.besselk(0, a * far))
    stream = mp.quad(lambda z: radius(z)**2 * (1 + gamma(radius(z)) * share(z)) * (z + pivot), breaks)
    rocking = -mp.quad(lambda z: radius(z)**2 * gamma(radius(z)) * (z + pivot)**2, breaks)
    if repaired:
        end = mp.mpf(tip)**3 / 2 * (length + pivot)
        stream -= end * share(length)
        rocking += end * (length + pivot)
    return stream, rocking


print("# Factors of repaired on plain strip theory. Made with mpmath %s, 25 digits, by repaired_strips.py." % mp.__version__)
print("# Not made by this project's Java code.")
print("shape,delta,pivot,stream_re,stream_im,rocking_re,rocking_im")
cylinder = (lambda z: mp.mpf(1), [0, 1, 20], 1)
taper = (lambda z: 1 - mp.mpf(3) / 4 * z / 20, [0, 1, 20], mp.mpf(1) / 4 / (1 - mp.mpf(3) / 80))
for name, shape in (("cylinder", cylinder), ("taper", taper)):
    for delta in ("0.5", "4", "18"):
        for pivot in ("0", "2"):
            d, h = mp.mpf(delta), mp.mpf(pivot)
            plain, mended = torques(shape, 20, h, d, False), torques(shape, 20, h, d, True)
            cells = [name, delta, pivot]
            for a, b in zip(plain, mended):
                f = b / a
                cells += [mp.nstr(f.real, 15), mp.nstr(f.imag, 15)]
            print(",".join(cells))
