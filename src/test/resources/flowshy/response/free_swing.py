#!/usr/bin/env python3
"""Noisy records of a free swing and the least-squares answer of another implementation (MINPACK through SciPy).

Run in this folder: python3 free_swing.py. Writes free-swing-records.csv (samples) and free-swing-answers.csv.
"""
import numpy
from scipy.optimize import curve_fit

RECORDS = {  # frequency [Hz], decay time [s], amplitude, phase [rad], offset, noise rms, samples, span [s]
    "long": (243.0, 21e-3, 1.3, 0.4, 0.25, 0.02, 600, 0.08),
    "short": (512.0, 1.1e-3, 2.0, -1.1, -0.6, 0.01, 200, 0.006),
    "damped": (80.0, 4e-3, 5.0, 0.1, 0.0, 0.02, 400, 0.03),
    "sparse": (31.0, 0.4, 1.0, 2.0, 0.1, 0.05, 60, 0.8),
}


def swing(t, a, b, c, rate, omega):
    return c + numpy.exp(-rate * t) * (a * numpy.cos(omega * t) + b * numpy.sin(omega * t))


def main():
    random = numpy.random.default_rng(20260101)
    samples = ["# Records of a free swing with white noise, by free_swing.py. Not made by this project's Java code.",
               "record,time_s,signal"]
    answers = ["# scipy.optimize.curve_fit of the same records by free_swing.py; sigma from the scatter left.",
               "record,frequency_hz,decay_time_s,sigma_frequency_hz,sigma_decay_s"]
    for name, (f, tau, amplitude, phase, offset, noise, count, span) in RECORDS.items():
        t = numpy.sort(random.uniform(0.0, span, count)) if name == "sparse" else numpy.linspace(0.0, span, count)
        x = offset + amplitude * numpy.exp(-t / tau) * numpy.cos(2 * numpy.pi * f * t + phase)
        x = numpy.round(x + noise * random.standard_normal(count), 6)
        t = numpy.round(t, 9)
        start = (amplitude * numpy.cos(phase), -amplitude * numpy.sin(phase), offset, 1 / tau, 2 * numpy.pi * f)
        best, covariance = curve_fit(swing, t, x, p0=start, xtol=1e-14, ftol=1e-14, gtol=1e-14)
        sigma = numpy.sqrt(numpy.diag(covariance))
        samples += [f"{name},{ti:.9f},{xi:.6f}" for ti, xi in zip(t, x)]
        answers.append(f"{name},{best[4] / (2 * numpy.pi):.12g},{1 / best[3]:.12g},"
                       f"{sigma[4] / (2 * numpy.pi):.6g},{sigma[3] / best[3] ** 2:.6g}")
    open("free-swing-records.csv", "w").write("\n".join(samples) + "\n")
    open("free-swing-answers.csv", "w").write("\n".join(answers) + "\n")


main()
