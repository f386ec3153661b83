"""Reference rows for K0 and K1 of complex argument: python3 bessel_k.py > bessel-k.csv (mpmath 1.2.1)."""
import math
from mpmath import mp, mpc, besselk, exp, nstr

mp.dps = 50
print("# exp(z) K0(z), exp(z) K1(z) and K1(z)/K0(z) at z = re + i im, read as exact binary numbers.")
print("# Made with mpmath 1.2.1, 50 digits, by bessel_k.py. Not made by this project's Java code.")
print("re,im,k0_re,k0_im,k1_re,k1_im,ratio_re,ratio_im")
MODULI = [1e-7, 1e-5, 1e-3, 0.01, 0.1, 0.3, 0.7, 1.0, 1.4, 1.49, 1.51, 1.8, 2.5, 3.7, 5.0, 7.5, 9.0, 12.0, 16.0, 19.9,
          20.1, 25.0, 40.0, 100.0, 1e3, 1e4, 1e5]
ARGUMENTS = [0.0, 20.0, 45.0, 70.0, 85.0, 90.0, -45.0, -85.0]
for modulus in MODULI:
    for degrees in ARGUMENTS:
        angle = math.radians(degrees)
        re = 0.0 if abs(degrees) == 90.0 else modulus * math.cos(angle)
        im = modulus * math.sin(angle)
        z = mpc(re, im)
        scale = exp(z)
        k0 = besselk(0, z) * scale
        k1 = besselk(1, z) * scale
        values = [k0.real, k0.imag, k1.real, k1.imag, (k1 / k0).real, (k1 / k0).imag]
        print(",".join([repr(re), repr(im)] + [nstr(v, 20) for v in values]))
