"""Reference rows for a cylinder in a coaxial enclosure: python3 confined_cylinder.py > confined-cylinder.csv (mpmath 1.2.1).

Stream function A/r + B r + C K1(zr) + D I1(zr), z = sqrt(i) Wo, radii in units of the cylinder's. The four conditions
psi(1) = psi'(1) = 1, psi(q) = psi'(q) = 0 are solved by Gaussian elimination as they stand; Gamma = 2 A - 1. Takes some minutes.
"""
from mpmath import mp, mpc, mpf, matrix, lu_solve, besselk, besseli, nstr, sqrt

mp.dps = 110
print("# Gamma = 2 A - 1 for a cylinder oscillating across a still coaxial enclosure of ratio = b/a; numbers exact binary.")
print("# Made with mpmath 1.2.1, 110 digits, by confined_cylinder.py. Not made by this project's Java code.")
print("ratio,womersley,gamma_re,gamma_im")
RATIOS = [1.01, 1.05, 1.3, 2.0, 3.0, 5.0, 20.0, 50.0, 300.0, 1e4]
WOMERSLEY = [1e-6, 1e-4, 0.01, 0.1, 0.3, 1.0, 2.0, 3.0, 7.0, 25.0, 150.0, 1e3, 1e4]
for ratio in RATIOS:
    for wo in WOMERSLEY:
        z = sqrt(mpc(0, 1)) * mpf(wo)
        q = mpf(ratio)
        a, b = z, z * q
        # I is scaled by its value at the enclosure, K at the cylinder: no entry is huge
        k = lambda n, x: besselk(n, x) / besselk(1, a)
        i = lambda n, x: besseli(n, x) / besseli(1, b)
        slope_k = lambda x: -(k(0, x) + k(1, x) / x) * z
        slope_i = lambda x: (i(0, x) - i(1, x) / x) * z
        system = matrix([[1, 1, k(1, a), i(1, a)],
                         [-1, 1, slope_k(a), slope_i(a)],
                         [1 / q, q, k(1, b), i(1, b)],
                         [-1 / q ** 2, 1, slope_k(b), slope_i(b)]])
        gamma = 2 * lu_solve(system, matrix([1, 1, 0, 0]))[0] - 1
        print(",".join([repr(ratio), repr(wo), nstr(gamma.real, 18), nstr(gamma.imag, 18)]))
