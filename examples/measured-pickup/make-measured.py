"""Makes shaker.csv and flow-tube.csv, invented for this example. Seeded.

A device whose suspension is 8 % stiffer in frequency than drawn and damped otherwise (resonance 464 Hz, quality 4.2 in vacuum), read
by 2.6 V/rad. Strip theory in closed form with first-order slip, evaluated with mpmath apart from the program; noise of 1 % and 2 % in
each part of the phasor, and one reading of the flow tube that went wrong by a third.
"""
import cmath
import math
import random
from mpmath import mp, mpf, mpc, besselk, exp, sqrt, pi, quad

mp.dps = 20
L, d, rho_h = mpf("720e-6"), mpf("92e-6"), mpf(1180)
# air at 21 degC, 99.2 kPa, 35 % humidity as the program prints it
rho, mu, free = mpf("1.17137332604"), mpf("1.81723480249e-5"), mpf("6.68259779521e-8")
g = mpf("9.80665")
a = d / 2
area = pi * a * a
lever = L * L / 2
inertia = rho_h * (area * L**3 / 3 + pi * a**4 / 4 * L)
omega0 = 2 * pi * 464
stiffness = inertia * omega0**2 + rho_h * g * area * lever  # gravity takes part of it in vacuum
damping = inertia * omega0 / mpf("4.2")
gain = 2.6


def response(f):
    w = 2 * pi * mpf(f)
    k = sqrt(mpc(0, w) * rho / mu)
    lam, slip = a * k, free / a
    k0, k1 = besselk(0, lam), besselk(1, lam)
    gamma = 1 + 4 * k1 * (1 + 2 * slip) / (lam * k0 + slip * (lam**2 * k1 + 2 * lam * k0))
    sheared = quad(lambda z: (1 - exp(-k * z)) * z, [0, L / 4, L])
    flow = rho * area * (lever + gamma * sheared)
    motion = -area * (rho_h * lever + rho * gamma * sheared)
    turning = rho * area * gamma * L**3 / 3
    below = stiffness - (rho_h - rho) * g * area * lever + mpc(0, w) * damping - w * w * (inertia + turning)
    return complex(motion / below), complex(flow / below)


def main():
    random.seed(23)
    steps = [10 ** (0.05 * i) for i in range(28, 59)]
    with open("shaker.csv", "w") as out:
        out.write("# invented for this example, see make-measured.py\n")
        out.write("frequency [Hz],amplitude [V/(m/s2)],phase [deg],uncertainty [%]\n")
        for f in steps:
            v = gain * response(f)[0] * complex(1 + random.gauss(0, 0.01), random.gauss(0, 0.01))
            out.write(f"{f:.3f},{abs(v):.5e},{math.degrees(cmath.phase(v)):.3f},1.0\n")
    with open("flow-tube.csv", "w") as out:
        out.write("# invented for this example, see make-measured.py\n")
        out.write("frequency [Hz];amplitude [mV/(mm/s)];phase [deg];uncertainty [%]\n")
        for n, f in enumerate(steps[1:-2:1]):
            v = gain * response(f)[1] * complex(0, 2 * math.pi * f) * complex(1 + random.gauss(0, 0.02), random.gauss(0, 0.02))
            v *= 1.33 if n == 17 else 1.0
            out.write(f"{f:.3f};{abs(v):.5e};{math.degrees(cmath.phase(v)):.3f};2.0\n")


main()
