"""Liquid water at 0.1 MPa after IAPWS SR6-08(2011); saturation pressure after IAPWS SR1-86(1992).

Independent of the Java code. Without a word it prints the rows of the water table, the density moved from 0.1 MPa to 101325 Pa
by the compressibility of the release (at most 7e-7 of it); with 'reference' the rows of water-reference.csv, half-way between
those of the table; with 'check' the values at the check temperatures of the release.
"""
import sys
from mpmath import mp, mpf, log, sqrt, exp

mp.dps = 30
R, TR, P0 = mpf("461.51805"), mpf(10), mpf(100000)
A = {1: "-1.661470539e5", 2: "2.708781640e6", 3: "-1.557191544e8", 5: "1.93763157e-2", 6: "6.74458446e3",
     7: "-2.22521604e5", 8: "1.00231247e8", 9: "-1.63552118e9", 10: "8.32299658e9", 11: "-7.5245878e-6",
     12: "-1.3767418e-2", 13: "1.0627293e1", 14: "-2.0457795e2", 15: "1.2037414e3"}
B = {1: "-8.237426256e-1", 2: "1.908956353", 3: "-2.017597384", 4: "8.546361348e-1", 5: "5.78545292e-3",
     6: "-1.53195665e-2", 7: "3.11337859e-2", 8: "-4.23546241e-2", 9: "3.38713507e-2", 10: "-1.19946761e-2",
     11: "-3.1091470e-6", 12: "2.8964919e-5", 13: "-1.3112763e-4", 14: "3.0410453e-4", 15: "-3.9034594e-4",
     16: "2.3403117e-4", 17: "-4.8510101e-5"}
C3 = mpf("-8.983025854")
N = {1: 4, 2: 5, 3: 7, 6: 4, 7: 5, 8: 7, 9: 8, 10: 9, 11: 1, 12: 3, 13: 5, 14: 6, 15: 7}
M = {1: 2, 2: 3, 3: 4, 4: 5, 5: 1, 6: 2, 7: 3, 8: 4, 9: 5, 10: 6, 11: 1, 12: 3, 13: 4, 14: 5, 15: 6, 16: 7, 17: 9}
A = {k: mpf(v) for k, v in A.items()}
B = {k: mpf(v) for k, v in B.items()}


def series(ka, kb, t, order):
    """Sum of a alpha^n and b beta^m over the index ranges, differentiated order times by T, times (-1)^... as written out."""
    alpha, beta = TR / (593 - t), TR / (t - 232)
    s = mpf(0)
    for i in ka:
        n = N[i]
        s += A[i] * alpha ** n * [1, n * alpha / TR, n * (n + 1) * (alpha / TR) ** 2][order]
    for i in kb:
        m = M[i]
        s += B[i] * beta ** m * [1, -m * beta / TR, m * (m + 1) * (beta / TR) ** 2][order]
    return s


def water(t):
    t = mpf(t)
    f = R * TR / P0
    v = f * (A[5] + series(range(6, 11), range(5, 11), t, 0))
    vt = f * series(range(6, 11), range(5, 11), t, 1)
    vp = R * TR / P0 ** 2 * series(range(11, 16), range(11, 18), t, 0)
    # g0 = R TR (c1 + c2 tau + c3 tau ln tau + ...), cp = -T g0''
    g2 = R * TR * (C3 / (TR * t) + series(range(1, 4), range(1, 5), t, 2))
    cp = -t * g2
    w = v * sqrt(-1 / (vp + t * vt ** 2 / cp))
    s = t / 300
    mu = (280.68 * s ** mpf("-1.9") + 511.45 * s ** mpf("-7.7") + 61.131 * s ** mpf("-19.6")
          + mpf("0.45903") * s ** -40) * mpf("1e-6")
    return 1 / v, mu, w, -vp / v


def saturation(t):
    t = mpf(t)
    th = 1 - t / mpf("647.096")
    a = [("-7.85951783", 1), ("1.84408259", 1.5), ("-11.7866497", 3), ("22.6807411", 3.5), ("-15.9618719", 4),
         ("1.80122502", 7.5)]
    return mpf("22.064e6") * exp(mpf("647.096") / t * sum(mpf(c) * th ** mpf(e) for c, e in a))


def vapour_viscosity(t):
    """Viscosity of thin vapour, IAPWS R12-08 eq 11 [Pa s]."""
    r = mpf(t) / mpf("647.096")
    h = ["1.67752", "2.20462", "0.6366564", "-0.241605"]
    return mpf("1e-4") * sqrt(r) / sum(mpf(x) / r ** i for i, x in enumerate(h))


def line(celsius, digits):
    t = mpf(celsius) + mpf("273.15")
    rho, mu, w, kappa = water(t)
    rho = rho * (1 + kappa * 1325)
    return "%s,%s,%s,%s,%s" % (celsius, mp.nstr(rho, digits), mp.nstr(mu, digits - 1), mp.nstr(w, digits - 1),
                               mp.nstr(saturation(t), digits - 1))


if sys.argv[1:] == ["reference"]:
    print("# Liquid water at 101325 Pa: IAPWS SR6-08(2011), saturation pressure IAPWS SR1-86(1992). Made with mpmath, 30 digits,")
    print("# by iapws_water.py. Not made by this project's Java code.")
    print("temperature_degC,density_kg_m3,viscosity_Pa_s,sound_speed_m_s,saturation_pressure_Pa")
    for i in range(0, 99):
        print(line(str(i) + ".5", 12))
elif sys.argv[1:] == ["check"]:
    for t in ("260", "298.15", "375"):
        print(t, *[mp.nstr(x, 12) for x in water(t)])
    for t in ("273.15", "293.15", "373.15"):
        print(t, mp.nstr(vapour_viscosity(t), 12))
else:
    for i in range(0, 101):
        print(line(str(i), 9))
