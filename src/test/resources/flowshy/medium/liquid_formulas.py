"""Formulas behind the tables of liquids, and reference values half-way between their rows.

Independent of the Java code. 'python3 liquid_formulas.py mercury' prints the rows of a table, 'python3 liquid_formulas.py reference'
prints liquid-reference.csv. Sources stand at each formula; where a number is from memory it says so.
"""
import sys
from math import exp, log, log10, pi, sin, sqrt

from equations_of_state import liquid, liquid_saturation

ICE = 273.15


def dippr105(t, c, molar_mass):
    """Perry's handbook, 8th ed., table 2-32 (read in an open library): mol/dm3, here mol/m3."""
    return c[0] / c[1] ** (1 + (1 - t / c[2]) ** c[3]) * molar_mass


def dippr101(t, c):
    """Perry's handbook, 8th ed., tables 2-8 and 2-313 (read in an open library)."""
    return exp(c[0] + c[1] / t + c[2] * log(t) + c[3] * t ** c[4])


VAPOUR = {
    "ethanol": (73.304, -7122.3, -7.1424, 2.8853e-6, 2),
    "methanol": (82.718, -6904.5, -8.8622, 7.4664e-6, 2),
    "2-propanol": (96.094, -8575.4, -10.292, 1.6665e-17, 6),
    "ethylene glycol": (84.09, -10411, -8.1976, 1.6536e-18, 6),
}


def propanol(t):
    return (dippr105(t, (1179.9, 0.2644, 508.3, 0.24653), 60.095e-3), dippr101(t, (-8.8918, 2357.6, -0.91376, 0, 0)),
            1140 - 3.6 * (t - 298.15), dippr101(t, VAPOUR["2-propanol"]))


def glycol(t):
    return (dippr105(t, (1315, 0.25125, 720, 0.21868), 62.068e-3),
            dippr101(t, (-20.515, 2468.5, 1.2435, 2.4998e12, -5)), 1658 - 2.1 * (t - 298.15),
            dippr101(t, VAPOUR["ethylene glycol"]))


def ethanol_viscosity(t):
    """Sotiriadou et al. 2023 eq 13 (second hand), 0.1 MPa, 159 to 351.57 K."""
    q = 273.15 / t
    return 1e-6 * exp(-0.721846 * q ** 4 + 5.91281 * q ** 3 - 15.0092 * q ** 2 + 20.9305 * q - 3.62716)


def mercury(t):
    """Beattie's expansion with 13595.0828 kg/m3 at 0 degC; Assael et al. 2012 (both second hand); c 1450 m/s at 25 degC, -0.46 from memory."""
    c = t - ICE
    rho = 13595.0828 / (1 + 1.815868e-4 * c + 5.4583e-9 * c ** 2 + 3.4980e-11 * c ** 3 + 1.5558e-14 * c ** 4)
    return rho, 1e-3 * 10 ** (-0.2561 + 132.29 / t), 1450 - 0.46 * (t - 298.15)


def fluoroketone(t):
    """McLinden et al. 2015; viscosity 0.64 mPa s at 25 degC and 1050 K from memory."""
    rho, c = liquid("fluoroketone", t)
    return rho, 0.64e-3 * exp(1050 * (1 / t - 1 / 298.15)), c, liquid_saturation("fluoroketone", t)


def perfluorohexane_saturation(t):
    """Gao et al. 2022, ancillary equation (second hand)."""
    th = 1 - t / 448.0
    s = sum(n * th ** e for n, e in ((-9.0231, 1), (5.1365, 1.5), (-4.8413, 1.9), (-5.2906, 3.75), (-2.937, 11.7)))
    return 1741600.0 * exp(448.0 / t * s)


# grade [mm2/s]: density at 25 degC, expansion [1/K], slope of log10(nu) [K], sound speed at 25 degC and its slope
SILICONE = {
    5: (916, 1.08e-3, 660, 953, -2.6), 10: (935, 1.06e-3, 700, 966, -2.6), 20: (949, 1.00e-3, 763.1, 975, -2.6),
    50: (960, 9.8e-4, 763.1, 982, -2.6), 100: (964, 9.6e-4, 763.1, 987, -2.6), 350: (969, 9.5e-4, 763.1, 990, -2.6),
    1000: (970, 9.5e-4, 763.1, 990, -2.6), 12500: (974, 9.5e-4, 763.1, 990, -2.6),
}


def silicone(grade, t):
    """Trade values (from memory, 100 mm2/s: 0.964 seen); the two shortest chains by Thol et al. 2016, 2017."""
    pure = {0.65: ("hexamethyldisiloxane", 480), 1: ("octamethyltrisiloxane", 530)}
    if grade in pure:
        name, slope = pure[grade]
        rho, c = liquid(name, t)
        p = liquid_saturation(name, t)
    else:
        rho25, beta, slope, c25, dc = SILICONE[grade]
        rho = rho25 * (1 - beta * (t - 298.15))
        c = c25 + dc * (t - 298.15)
        p = None
    return rho, 1e-6 * grade * 10 ** (slope * (1 / t - 1 / 298.15)) * rho, c, p


# ISO 3448 grade: viscosity at 100 degC of a paraffinic oil with a viscosity index of about 97, density at 15 degC (typical, from memory)
MINERAL = {10: (2.65, 852), 15: (3.4, 858), 22: (4.3, 863), 32: (5.4, 868), 46: (6.8, 874), 68: (8.7, 878), 100: (11.4, 882),
           150: (14.9, 887), 220: (19.0, 893), 320: (24.1, 898), 460: (30.6, 903)}


def mineral(grade, t):
    """ASTM D341 (Walther): log10 log10(nu + 0.7) straight in log10 T through 40 and 100 degC."""
    nu100, rho15 = MINERAL[grade]

    def w(nu):
        return log10(log10(nu + 0.7))
    slope = (w(nu100) - w(grade)) / (log10(373.15) - log10(313.15))
    nu = 10 ** (10 ** (w(grade) + slope * (log10(t) - log10(313.15)))) - 0.7
    rho = rho15 * (1 - 7.0e-4 * (t - 288.15))
    return rho, 1e-6 * nu * rho, 1460 - 3.5 * (t - 298.15)


def glycerol(w, c):
    """Cheng 2008 and Volk & Kaehler 2018 in the form of the authors' public code: density from the mass fraction."""
    mw = 0.001 * 1.790 * exp((-1230 - c) * c / (36100 + 360 * c))
    mg = 0.001 * 12100 * exp((-1233 + c) * c / (9900 + 70 * c))
    a = 0.705 - 0.0017 * c
    b = (4.9 + 0.036 * c) * a ** 2.5
    alpha = 1 - w + (a * b * w * (1 - w)) / (a * w + b * (1 - w))
    rw = 1000 * (1 - abs((c - 3.98) / 615) ** 1.71)
    rg = 1273.3 - 0.6121 * c
    k = 1 + (1.78e-6 * c * c - 1.82e-4 * c + 1.41e-2) * max(0.0, sin(w ** 1.31 * pi)) ** 0.81
    rho = k * (rw + (rg - rw) / (1 + rg / rw * (1 / w - 1))) if w > 0 else rw
    return rho, mg * exp(log(mw / mg) * alpha)


def sea(s, c):
    """EOS-80, UNESCO 1983; Sharqawy et al. 2010; Chen & Millero 1977 by Wong & Zhu 1995; written out term by term."""
    t = c * 1.00024
    rho = (999.842594 + 6.793952e-2 * t - 9.095290e-3 * t ** 2 + 1.001685e-4 * t ** 3 - 1.120083e-6 * t ** 4
           + 6.536332e-9 * t ** 5
           + s * (8.24493e-1 - 4.0899e-3 * t + 7.6438e-5 * t ** 2 - 8.2467e-7 * t ** 3 + 5.3875e-9 * t ** 4)
           + s ** 1.5 * (-5.72466e-3 + 1.0227e-4 * t - 1.6546e-6 * t ** 2) + 4.8314e-4 * s ** 2)
    w = (1402.388 + 5.03830 * c - 5.81090e-2 * c ** 2 + 3.3432e-4 * c ** 3 - 1.47797e-6 * c ** 4 + 3.1419e-9 * c ** 5
         + s * (1.389 - 1.262e-2 * c + 7.166e-5 * c ** 2 + 2.008e-6 * c ** 3 - 3.21e-8 * c ** 4)
         + s ** 1.5 * (-1.922e-2 - 4.42e-5 * c) + 1.727e-3 * s ** 2)
    k = s * 35.16504e-3 / 35
    mu = (4.2844e-5 + 1 / (0.157 * (c + 64.993) ** 2 - 91.296)) * (
        1 + (1.541 + 1.998e-2 * c - 9.52e-5 * c ** 2) * k + (7.974 - 7.561e-2 * c + 4.724e-4 * c ** 2) * k ** 2)
    return rho, mu, w


def number(x):
    return "" if x is None else "%.8g" % x


def table(name):
    plain = {"2-propanol": (propanol, -40, 80), "ethylene glycol": (glycol, -10, 100), "mercury": (mercury, 0, 100),
             "fluoroketone": (fluoroketone, 0, 45)}
    if name in plain:
        law, low, high = plain[name]
        for c in range(low, high + 1, 5):
            row = law(c + ICE)
            print(",".join([str(c)] + [number(x) for x in row]))
    elif name == "silicone oil":
        for grade in [0.65, 1] + list(SILICONE):
            for c in range(-25, 101, 5):
                print(",".join(["%g" % grade, str(c)] + [number(x) for x in silicone(grade, c + ICE)]))
    elif name == "mineral oil":
        for grade in MINERAL:
            for c in range(0, 101, 5):
                print(",".join(["%g" % grade, str(c)] + [number(x) for x in mineral(grade, c + ICE)]))
    elif name in ("ethanol", "methanol"):
        for c in range(0, 76, 5):
            print(c, number(dippr101(c + ICE, VAPOUR[name])))
    elif name == "perfluorohexane":
        for c in range(0, 46, 5):
            print(c, number(perfluorohexane_saturation(c + ICE)))


def reference():
    print("# Liquids half-way between the rows of their tables, by the formulas behind them; made by liquid_formulas.py.")
    print("# Not made by this project's Java code. parameter: grade in mm2/s, mass fraction or salinity; empty cells: no formula.")
    print("medium,parameter,temperature_degC,density_kg_m3,viscosity_Pa_s,sound_speed_m_s")

    def line(name, parameter, c, row):
        cells = [number(x) for x in (list(row) + [None] * 3)[:3]]
        print(",".join([name, parameter, "%g" % c] + cells))
    for name, law, low, high in (("2-propanol", propanol, -40, 80), ("ethylene glycol", glycol, -10, 100),
                                 ("mercury", mercury, 0, 100), ("fluoroketone", fluoroketone, 0, 45)):
        for c in range(low, high, 5):
            line(name, "", c + 2.5, law(c + 2.5 + ICE))
    for c in range(0, 75, 5):
        line("ethanol", "", c + 2.5, (None, ethanol_viscosity(c + 2.5 + ICE)))
    for grade in [0.65, 1] + list(SILICONE):
        for c in (-22.5, 2.5, 27.5, 52.5, 97.5):
            line("silicone oil", "%g" % grade, c, silicone(grade, c + ICE))
    for grade in MINERAL:
        for c in (2.5, 27.5, 52.5, 97.5):
            line("mineral oil", "%g" % grade, c, mineral(grade, c + ICE))
    for w in (0.0, 0.2, 0.5, 0.8, 0.95, 1.0):
        for c in (2.5, 20, 25, 47, 95):
            line("glycerol-water", "%g" % w, c, glycerol(w, c))
    for s in (0.0, 5, 20, 35, 40):
        for c in (0.5, 12, 25, 39):
            line("sea water", "%g" % s, c, sea(s, c))


if __name__ == "__main__":
    if sys.argv[1] == "reference":
        reference()
    else:
        table(sys.argv[1])
