"""Figures of this study, worked apart from the program with mpmath. Writes by-hand.csv (own state) and by-hand-lid.csv (every state).

Oils from the rows of the two tables beside the study: its temperatures are theirs, so nothing is read between rows. Strip theory, every
integral by quadrature, no slip in a liquid. Per unit acceleration, A the hair's section:
  T_flow = rho A int (1 + Gamma s) z dz,  T_carried = -(rho_h - rho) A L^2/2,  T_motion = T_carried - T_flow (open, roofed) or T_carried (sealed)
  s = 1 - exp(-kz) over the open wall, 1 - cosh(k(z - H/2))/cosh(kH/2) under the roof
  thermal noise sqrt(4 k_B T (R - omega Im J_fluid))/|T_motion|, J_fluid = rho A Gamma L^3/3
The attenuation asked is found as the root phi of |T_carried - phi T_flow| = M phi |T_flow|, not by the closed form. The least rejection is
that of a grid of 61 frequencies. The can is filled at 20 degC; a liquid keeps its pressure, so that at a state it is that row of its table.
"""
import csv
from mpmath import mp, mpf, mpc, besselk, cosh, exp, fabs, findroot, log10, pi, quad, sqrt

mp.dps = 25
L, d, rho_h = mpf("690e-6"), mpf("165e-6"), mpf(8400)
R, gap, margin, noise_limit = mpf("1e-12"), mpf("0.9e-3"), mpf(7), mpf("1.2e-6") * mpf("9.80665")
own, states, low, high, reference = 40, (-20, 0, 40, 80), mpf(300), mpf(1500), mpf(500)
k_B = mpf("1.380649e-23")
A, a = pi * d * d / 4, d / 2


def table(name):
    with open(name) as rows:
        body = [line.split(",") for line in rows if not line.startswith("#")]
    return {int(row[0]): (mpf(row[1]), mpf(row[2])) for row in body[1:]}


gear, can = table("gear-oil.csv"), table("can-oil.csv")


def torques(oil, f, cover):
    """T_carried, T_flow under the cover, Gamma, rho."""
    rho, mu = oil
    k = sqrt(mpc(0, 2 * pi * f) * rho / mu)
    gamma = 1 + 4 * besselk(1, a * k) / (a * k * besselk(0, a * k))
    if cover == "roofed":
        share = lambda z: 1 - cosh(k * (z - gap / 2)) / cosh(k * gap / 2)
    else:
        share = lambda z: 1 - exp(-k * z)
    flow = rho * A * quad(lambda z: (1 + gamma * share(z)) * z, [0, L / 8, L / 2, L])
    return -(rho_h - rho) * A * quad(lambda z: z, [0, L]), flow, gamma, rho


def rejection(t, f, cover):
    carried, flow, _, _ = torques(gear[t], f, cover)
    return 20 * log10(fabs(carried - flow) / fabs(flow))


def least(t, cover):
    return min(rejection(t, low * (high / low) ** (mpf(n) / 60), cover) for n in range(61))


def noise(t, cover):
    carried, flow, gamma, rho = torques((can if cover == "sealed" else gear)[t], reference, cover)
    motion = carried if cover == "sealed" else carried - flow
    resistance = R - 2 * pi * reference * (rho * A * gamma * quad(lambda z: z * z, [0, L])).imag
    return sqrt(4 * k_B * (t + mpf("273.15")) * resistance) / fabs(motion)


def attenuation(t, f):
    carried, flow, _, _ = torques(gear[t], f, "open")
    level = 10 ** (margin / 20)
    if fabs(carried - flow) >= level * fabs(flow):
        return mpf(0)
    phi = findroot(lambda x: fabs(carried - x * flow) ** 2 - (level * x * fabs(flow)) ** 2, (mpf("0.01"), mpf(1)), solver="anderson")
    return -20 * log10(phi)


def named(t):
    return f"medium.temperature {t} degC"


rows = [("rejection_db", f, rejection(own, mpf(f), "open"), "1e-6") for f in (500, 1200)]
rows.append(("mass_kg", "", rho_h * A * L, "1e-12"))
rows.append(("inertia_kg_m2", "", rho_h * (A * L**3 / 3 + pi * a**4 / 4 * L), "1e-12"))
with open("by-hand.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["quantity", "frequency_hz", "value", "relative_tolerance"])
    for name, f, value, tolerance in rows:
        writer.writerow([name, f, mp.nstr(value, 12), tolerance])

lid, decisions = [], []
for n in (25, 27, 30):
    f = mpf(10) ** (mpf(n) / 10)
    worst = max(states, key=lambda t: attenuation(t, f))
    lid.append(("required", "worst_attenuation_db", mp.nstr(f, 8), attenuation(worst, f), "1e-8", named(worst)))
for cover in ("open", "roofed", "sealed"):
    kept = True
    if cover != "sealed":
        worst = min(states, key=lambda t: least(t, cover))
        lid.append((cover, "least_rejection_db", "", least(own, cover), "1e-6", "own"))
        lid.append((cover, "worst_least_rejection_db", "", least(worst, cover), "1e-6", named(worst)))
        kept = least(worst, cover) >= margin
    worst = max(states, key=lambda t: noise(t, cover))
    lid.append((cover, "thermal_noise_m_s2_per_rthz", mp.nstr(reference, 8), noise(own, cover), "1e-8", "own"))
    lid.append((cover, "noise", mp.nstr(reference, 8), noise(worst, cover), "1e-8", named(worst)))
    kept = kept and noise(worst, cover) <= noise_limit
    decisions.append((cover, "decision", "", "meets" if kept else "fails", "", ""))
with open("by-hand-lid.csv", "w", newline="") as out:
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["what", "quantity", "frequency_hz", "value", "relative_tolerance", "state"])
    for what, quantity, f, value, tolerance, state in lid:
        writer.writerow([what, quantity, f, mp.nstr(value, 14), tolerance, state])
    writer.writerows(decisions)
