"""Reference devices: python3 devices.py responses > responses.csv; python3 devices.py swings > swings.csv (mpmath 1.2.1).

theta/A = T/D, D = S + S_g + i w R - w^2 (J + J_plate + J_fluid), with the integrals of torques.py; the free swing is the root
of S + S_g + s R + s^2 (J + J_plate + J_fluid(s)) found by the secant method from several starts.
"""
import os
import sys

sys.path.insert(0, os.path.join(os.path.dirname(os.path.abspath(__file__)), "..", "torque"))
from mpmath import findroot, mp, mpc, mpf, nstr, pi, quad, sqrt
from torques import club, cylinder, f, integrals, taper

mp.dps = 22
G = mpf("9.80665")
K = mpf("1.380649e-23")
AIR = (f("1.19"), f("1.83e-5"), f("6.6e-8"))
HELIUM = (f("0.1663"), f("1.962e-5"), f("1.9e-7"))
WATER = (f("998.2"), f("1.0016e-3"), mpf(0))
# name, profile, density, medium, temperature, S, R, J_plate, h, sign of gravity stiffness
DEVICES = [
    ("cylinder in air", cylinder(f("7.6e-4"), f("4.2e-5")), f("1190.0"), AIR, f("295.0"),
     f("2.1e-9"), f("3e-13"), f("4e-17"), f("2e-6"), -1),
    ("taper in water", taper(f("7.2e-4"), f("4.4e-5"), mpf(0)), f("1210.0"), WATER, f("283.0"),
     f("4e-8"), f("1e-12"), mpf(0), mpf(0), 1),
    ("club in helium", club(f("9e-4"), f("2e-5"), f("4e-4"), f("1e-4"), f("6e-5"), True), f("1180.0"), HELIUM,
     f("310.0"), f("7e-10"), f("2e-14"), f("9e-17"), mpf(0), 0),
    ("cylinder in water, slow", cylinder(f("7.6e-4"), f("4.2e-5")), f("1190.0"), WATER, f("293.15"),
     f("2.1e-10"), mpf(0), mpf(0), mpf(0), -1),
]
FREQUENCIES = ["5.0", "60.0", "410.0", "3000.0"]


def solid(device):
    _, (radius, breaks), density, (rho, _, _), _, S, _, plate, h, sign = device
    area = lambda z: pi * radius(z) ** 2
    first = quad(lambda z: area(z) * (z + h), breaks)
    second = quad(lambda z: area(z) * (z + h) ** 2 + pi * radius(z) ** 4 / 4, breaks)
    return density * second + plate, S + sign * (density - rho) * G * first


def denominator(device, s, inertia, stiffness, layer):
    _, profile, density, medium, _, _, R, _, h, _ = device
    first, sheared, turning = integrals(profile, medium, density, h, s, layer)
    return stiffness + s * R + s * s * (inertia + turning), first, sheared, turning


def responses():
    print("# theta/A of motion (open), of flow, of motion (sealed) [rad per m/s2], thermal noise (open) [m/s2/rtHz].")
    print("# Made with mpmath 1.2.1, 22 digits, by devices.py. Not made by this project's Java code.")
    print("device,frequency_hz,motion_re,motion_im,flow_re,flow_im,sealed_re,sealed_im,noise_open")
    for device in DEVICES:
        name, _, density, (rho, mu, _), temperature, _, R, _, _, _ = device
        inertia, stiffness = solid(device)
        for text in FREQUENCIES:
            w = 2 * pi * f(text)
            D, first, sheared, turning = denominator(device, mpc(0, w), inertia, stiffness, sqrt(2 * mu / rho / w))
            opened = -(density * first + rho * sheared)
            flow = rho * (first + sheared) / D
            sealed = -(density - rho) * first / D
            noise = sqrt(4 * K * temperature * (R - w * turning.imag)) / abs(opened)
            motion = opened / D
            values = [motion.real, motion.imag, flow.real, flow.imag, sealed.real, sealed.imag, noise]
            print(",".join([name.replace(",", ""), text] + [nstr(v, 16) for v in values]), flush=True)


def swings():
    print("# resonance: Re D = 0; S/(w R_total) there; root s of the free swing and |s|/(-2 Re s).")
    print("# Made with mpmath 1.2.1, 22 digits, by devices.py. Not made by this project's Java code.")
    print("device,resonance_hz,coarse_quality,root_re,root_im,quality")
    for device in DEVICES:
        inertia, stiffness = solid(device)
        at = lambda s: denominator(device, s, inertia, stiffness, None)[0] / stiffness
        start = sqrt(stiffness / inertia)
        w = findroot(lambda w: at(mpc(0, w)).real, (start * mpf("0.3"), start), solver="anderson", tol=1e-30)
        D = at(mpc(0, w)) * stiffness
        coarse = stiffness / D.imag
        s = findroot(at, mpc(-w / 4, w / 2), tol=1e-30)
        values = [w / (2 * pi), coarse, s.real, s.imag, abs(s) / (-2 * s.real)]
        print(",".join([device[0].replace(",", "")] + [nstr(v, 16) for v in values]), flush=True)


{"responses": responses, "swings": swings}[sys.argv[1]]()
