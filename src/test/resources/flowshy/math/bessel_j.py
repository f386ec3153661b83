"""Writes bessel-j.csv: J0 and J1 at 40 digits. Run: python3 bessel_j.py > bessel-j.csv"""
import mpmath as mp

mp.mp.dps = 40
print("# J0 and J1 of a real argument. Made with mpmath %s, 40 digits, by bessel_j.py." % mp.__version__)
print("# Not made by this project's Java code.")
print("x,j0,j1")
points = [mp.mpf(0)] + [mp.mpf(2) ** (mp.mpf(n) / 2) for n in range(-10, 26)] + [mp.mpf("24.75"), mp.mpf("24.9999"), mp.mpf(25)]
for x in points:
    x = mp.mpf(float(x))
    print("%s,%s,%s" % (repr(float(x)), mp.nstr(mp.besselj(0, x), 20), mp.nstr(mp.besselj(1, x), 20)))
