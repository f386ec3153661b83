"""Helmholtz equations of state of three gases, to see what the gas law cut after the second virial coefficient loses.

Sulfur hexafluoride: Guder & Wagner 2009, J. Phys. Chem. Ref. Data 38:33. Carbon dioxide: Span & Wagner 1996, 25:1509, without its three
terms at the critical point, which are below 1e-9 in the gas here. Nitrogen: Span et al. 2000, 29:1361, with the viscosity of
Lemmon & Jacobsen 2004. Coefficients read in an open property library. Independent of the Java code; prints
gas-pressure-reference.csv.
"""
from math import exp, log, sqrt

E = exp

GASES = {
    "sulfur hexafluoride": dict(
        tc=318.7232, rc=5082.317411198119, r=8.314472, m=0.1460554192,
        ideal=[(3.66118232, 1.617282065), (7.87885103, 2.747115139), (3.45981679, 4.232907175)], log=3, powers=[],
        n=[0.54958259132835, -0.87905033269396, -0.84656969731452, 0.27692381593529, -4.9864958372345, 4.8879127058055,
           0.036917081634281, 0.00037030130305087, 0.039389132911585, 0.00042477413690006, -0.02415001386389,
           0.059447650642255, -0.38302880142267, 0.32606800951983, -0.029955940562031, -0.086579186671173,
           4.1600684707562, -4.1398128855814, -0.55842159922714, 0.56531382776891, 0.0082612463415545,
           -0.01020099533808],
        d=[1, 1, 1, 2, 2, 2, 3, 3, 4, 6, 1, 2, 2, 2, 3, 6, 2, 2, 4, 4, 2, 2],
        t=[0.125, 1.25, 1.875, 0.125, 1.5, 1.625, 1.5, 5.625, 0.625, 0.25, 6, 0.25, 4.75, 5.375, 5.875, 2, 5.875, 6,
           5.625, 5.75, 0, 0.5],
        l=[0] * 10 + [1] * 6 + [2] * 4 + [3] * 2,
        g=[(-0.021662523861406, 1, 4, 10, 0.85, 150, 1.13), (0.034650943893908, 3, 1, 10, 0.85, 150, 1.13),
           (-0.028694281385812, 4, 3, 10, 0.85, 150, 1.13), (0.0084007238998053, 1, 2, 10, 0.85, 150, 1.16),
           (-0.26969359922498, 1, 4, 11, 1, 225, 1.19), (9.0415215646344, 4, 3, 25, 1, 300, 1.19),
           (-3.7233103557977, 3, 4, 30, 1, 350, 1.16), (-2752.4670823704, 4, 1, 30, 1, 350, 1.16),
           (5771.1861697319, 4, 2, 30, 1, 350, 1.16), (-3023.4003119748, 4, 3, 30, 1, 350, 1.16),
           (2225277.843536, 1, 3, 30, 1, 400, 1.22), (-2305606.5559032, 1, 4, 30, 1, 400, 1.22),
           (6391885.2944475, 3, 3, 30, 1, 400, 1.22), (-6079209.1415592, 3, 4, 30, 1, 400, 1.22)]),
    "carbon dioxide": dict(
        tc=304.1282, rc=10624.9063, r=8.31451, m=0.0440098,
        ideal=[(1.99427042, 3.15163), (0.62105248, 6.1119), (0.41195293, 6.77708), (1.04028922, 11.32384),
               (0.08327678, 27.08792)], log=2.5, powers=[],
        n=[0.388568232032, 2.93854759427, -5.5867188535, -0.767531995925, 0.317290055804, 0.548033158978, 0.122794112203,
           2.16589615432, 1.58417351097, -0.231327054055, 0.0581169164314, -0.553691372054, 0.489466159094,
           -0.0242757398435, 0.0624947905017, -0.121758602252, -0.370556852701, -0.0167758797004, -0.11960736638,
           -0.0456193625088, 0.0356127892703, -0.00744277271321, -0.00173957049024, -0.0218101212895, 0.0243321665592,
           -0.0374401334235, 0.143387157569, -0.134919690833, -0.0231512250535, 0.0123631254929, 0.00210583219729,
           -0.000339585190264, 0.00559936517716, -0.000303351180556],
        d=[1, 1, 1, 1, 2, 2, 3, 1, 2, 4, 5, 5, 5, 6, 6, 6, 1, 1, 4, 4, 4, 7, 8, 2, 3, 3, 5, 5, 6, 7, 8, 10, 4, 8],
        t=[0, 0.75, 1, 2, 0.75, 2, 0.75, 1.5, 1.5, 2.5, 0, 1.5, 2, 0, 1, 2, 3, 6, 3, 6, 8, 6, 0, 7, 12, 16, 22, 24, 16, 24,
           8, 2, 28, 14],
        l=[0] * 7 + [1] * 9 + [2] * 7 + [3] * 3 + [4] * 6 + [5, 6],
        g=[(-213.654886883, 2, 1, 25, 1, 325, 1.16), (26641.5691493, 2, 0, 25, 1, 300, 1.19),
           (-24027.2122046, 2, 1, 25, 1, 300, 1.19), (-283.41603424, 3, 3, 15, 1, 275, 1.25),
           (212.472844002, 3, 3, 20, 1, 275, 1.22)]),
    "nitrogen": dict(
        tc=126.192, rc=11183.901464580624, r=8.31451, m=0.02801348,
        ideal=[(1.012941, 3364.011 / 126.192)], log=2.5, powers=[(-0.0001934819, -1), (-1.247742e-05, -2),
                                                                 (6.678326e-08, -3)],
        n=[0.924803575275, -0.492448489428, 0.661883336938, -1.92902649201, -0.0622469309629, 0.349943957581,
           0.564857472498, -1.61720005987, -0.481395031883, 0.421150636384, -0.0161962230825, 0.172100994165,
           0.00735448924933, 0.0168077305479, -0.00107626664179, -0.0137318088513, 0.000635466899859,
           0.00304432279419, -0.0435762336045, -0.0723174889316, 0.0389644315272, -0.021220136391,
           0.00408822981509, -5.51990017984e-05, -0.0462016716479, -0.00300311716011, 0.0368825891208,
           -0.0025585684622, 0.00896915264558, -0.0044151337035, 0.00133722924858, 0.000264832491957],
        d=[1, 1, 2, 2, 3, 3, 1, 1, 1, 3, 3, 4, 6, 6, 7, 7, 8, 8, 1, 2, 3, 4, 5, 8, 4, 5, 5, 8, 3, 5, 6, 9],
        t=[0.25, 0.875, 0.5, 0.875, 0.375, 0.75, 0.5, 0.75, 2, 1.25, 3.5, 1, 0.5, 3, 0, 2.75, 0.75, 2.5, 4, 6, 6, 3, 3, 6,
           16, 11, 15, 12, 12, 7, 4, 16],
        l=[0] * 6 + [1] * 12 + [2] * 6 + [3] * 4 + [4] * 4,
        g=[(19.6688194015, 1, 0, 20, 1, 325, 1.16), (-20.911560073, 1, 1, 20, 1, 325, 1.16),
           (0.0167788306989, 3, 2, 15, 1, 300, 1.13), (2627.67566274, 2, 3, 25, 1, 275, 1.25)]),
}


def residual(gas, tau, delta):
    """alpha_r and its derivatives: delta a_d, delta^2 a_dd, tau a_t, tau^2 a_tt, delta tau a_dt."""
    a = ad = add = at = att = adt = 0.0
    for n, d, t, l in zip(gas["n"], gas["d"], gas["t"], gas["l"]):
        x = delta ** l if l else 0.0
        v = n * delta ** d * tau ** t * E(-x)
        k = d - l * x
        a += v
        ad += v * k
        add += v * (k * (k - 1) - l * l * x)
        at += v * t
        att += v * t * (t - 1)
        adt += v * t * k
    for n, d, t, eta, eps, beta, gam in gas["g"]:
        v = n * delta ** d * tau ** t * E(-eta * (delta - eps) ** 2 - beta * (tau - gam) ** 2)
        k = d - 2 * eta * delta * (delta - eps)
        m = t - 2 * beta * tau * (tau - gam)
        a += v
        ad += v * k
        add += v * (k * k - d - 2 * eta * delta * delta)
        at += v * m
        att += v * (m * m - t - 2 * beta * tau * tau)
        adt += v * k * m
    return ad, add, at, att, adt


def ideal_tt(gas, tau):
    """tau^2 times the second derivative of the ideal part; minus cv/R."""
    s = -gas["log"]
    for n, t in gas["ideal"]:
        x = t * tau
        s -= n * x * x * E(x) / (E(x) - 1) ** 2
    for n, t in gas["powers"]:
        s += n * t * (t - 1) * tau ** t
    return s


def state(gas, temperature, pressure):
    """Molar density [mol/m3], density [kg/m3] and sound speed [m/s] of the gas."""
    tau = gas["tc"] / temperature
    rt = gas["r"] * temperature
    rho = pressure / rt
    for _ in range(100):
        ad, add, _, _, _ = residual(gas, tau, rho / gas["rc"])
        f = rho * rt * (1 + ad) - pressure
        step = f / (rt * (1 + 2 * ad + add))
        rho -= step
        if abs(step) < 1e-14 * rho:
            break
    ad, add, at, att, adt = residual(gas, tau, rho / gas["rc"])
    cv = -(ideal_tt(gas, tau) + att)
    w2 = rt / gas["m"] * (1 + 2 * ad + add + (1 + ad - adt) ** 2 / cv)
    return rho, rho * gas["m"], sqrt(w2)


def nitrogen_viscosity(t, rho):
    """Lemmon & Jacobsen 2004 [Pa s]."""
    x = log(t / 98.94)
    omega = E(0.431 - 0.4623 * x + 0.08406 * x * x + 0.005341 * x ** 3 - 0.00331 * x ** 4)
    dilute = 0.0266958 * sqrt(28.01348 * t) / (0.3656 ** 2 * omega)
    tau, delta = 126.192 / t, rho / 11183.9
    s = 0.0
    for n, tt, d, l in [(10.72, 0.1, 2, 0), (0.03989, 0.25, 10, 1), (0.001208, 3.2, 12, 1), (-7.402, 0.9, 2, 2),
                        (4.620, 0.3, 1, 3)]:
        s += n * tau ** tt * delta ** d * (E(-delta ** l) if l else 1.0)
    return 1e-6 * (dilute + s)


def saturation(name, t):
    """Vapour pressure [Pa]; over the solid below the triple point of carbon dioxide."""
    if name == "carbon dioxide":
        if t < 216.592:
            th = 1 - t / 216.592
            return 517950 * E(216.592 / t * (-14.740846 * th + 2.4327015 * th ** 1.9 - 5.3061778 * th ** 2.9))
        th = 1 - t / 304.1282
        return 7377300 * E(304.1282 / t * (-7.0602087 * th + 1.9391218 * th ** 1.5 - 1.6463597 * th ** 2 - 3.2995634 * th ** 4))
    if name == "sulfur hexafluoride":
        th = 1 - t / 318.7232
        return 3754983 * E(318.7232 / t * (-7.09634642 * th + 1.676662 * th ** 1.5 - 2.3921599 * th ** 2.5
                                           + 5.86078302 * th ** 4 - 9.02978735 * th ** 4.5))
    return float("inf")


if __name__ == "__main__":
    print("# Gases at pressures away from the table, by their Helmholtz equations of state. Made by equations_of_state.py.")
    print("# Not made by this project's Java code.")
    print("gas,temperature_degC,pressure_Pa,density_kg_m3,sound_speed_m_s,viscosity_Pa_s")
    for name, gas in GASES.items():
        for celsius in (-50, -30, -10, 20, 50, 100, 150):
            for pressure in (1e3, 3e4, 3e5, 6e5, 1e6):
                t = celsius + 273.15
                if name != "nitrogen" and t < {"carbon dioxide": 304.1, "sulfur hexafluoride": 318.7}[name]:
                    if pressure > 0.99 * saturation(name, t):
                        continue
                n, rho, w = state(gas, t, pressure)
                mu = "%.9g" % nitrogen_viscosity(t, n) if name == "nitrogen" else ""
                print("%s,%d,%g,%.9g,%.8g,%s" % (name, celsius, pressure, rho, w, mu))
