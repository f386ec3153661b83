"""Reference rows for Stokes's cylinder: python3 oscillating_cylinder.py > oscillating-cylinder.csv (mpmath 1.2.1)."""
from mpmath import mp, mpc, mpf, besselk, nstr, sqrt

mp.dps = 60
print("# Gamma - 1 = 4 K1(z)/(z K0(z)), z = sqrt(i) Wo, and z K1(z)/K0(z); Wo read as an exact binary number.")
print("# Made with mpmath 1.2.1, 60 digits, by oscillating_cylinder.py. Not made by this project's Java code.")
print("womersley,excess_re,excess_im,times_argument_re,times_argument_im")
ROWS = 280
for i in range(ROWS):
    # 1e-8 to 1e6, evenly on a logarithmic scale, and both sides of 1/128 and 32, where the method changes
    wo = 10.0 ** (-8.0 + 14.0 * i / (ROWS - 1))
    if i == 0:
        wos = [1e-8, 0.00781249, 0.0078125, 0.00781251, 31.99999, 32.0, 32.00001]
    else:
        wos = [wo]
    for value in wos:
        z = sqrt(mpc(0, 1)) * mpf(value)
        g = z * besselk(1, z) / besselk(0, z)
        excess = 4 * g / z ** 2
        print(",".join([repr(value)] + [nstr(v, 20) for v in (excess.real, excess.imag, g.real, g.imag)]))
