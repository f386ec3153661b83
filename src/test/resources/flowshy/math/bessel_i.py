"""Reference rows for I0 and I1 of complex argument: python3 bessel_i.py > bessel-i.csv (mpmath 1.2.1)."""
import math
from mpmath import mp, mpc, besseli, exp, nstr

mp.dps = 60
print("# exp(-z) I0(z) and exp(-z) I1(z) at z = re + i im, read as exact binary numbers.")
print("# Made with mpmath 1.2.1, 60 digits, by bessel_i.py. Not made by this project's Java code.")
print("re,im,i0_re,i0_im,i1_re,i1_im")
MODULI = [1e-7, 1e-4, 0.01, 0.3, 1.0, 1.9, 2.1, 3.3, 5.0, 8.1, 13.0, 19.9, 20.1, 30.0, 100.0, 1e4, 1e6, 1e8]
ARGUMENTS = [0.0, 20.0, 45.0, 70.0, 85.0, 90.0, -45.0, -85.0]
for modulus in MODULI:
    for degrees in ARGUMENTS:
        angle = math.radians(degrees)
        re = 0.0 if abs(degrees) == 90.0 else modulus * math.cos(angle)
        im = modulus * math.sin(angle)
        z = mpc(re, im)
        scale = exp(-z)
        i0 = besseli(0, z) * scale
        i1 = besseli(1, z) * scale
        print(",".join([repr(re), repr(im)] + [nstr(v, 20) for v in (i0.real, i0.imag, i1.real, i1.imag)]))
