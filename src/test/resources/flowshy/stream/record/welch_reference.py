"""A made-up anemometer record and its one-sided density by scipy 1.10 (signal.welch), to compare with the project's own Welch.

The record: 0.35 m/s mean, one sine, noise from a linear congruential generator smoothed once, so that the file can be made again anywhere.
Run: python3 welch_reference.py   (writes anemometer.txt and welch-density.csv beside itself)
"""
import os
import numpy as np
from scipy import signal

here = os.path.dirname(os.path.abspath(__file__))
rate, count, segment = 200.0, 1500, 256
state, noise = 12345, []
for _ in range(count + 1):
    state = (1103515245 * state + 12345) % 2**31
    noise.append(state / 2.0**31 - 0.5)
noise = np.array(noise)
t = np.arange(count) / rate
u = 0.35 + 0.04 * np.sin(2 * np.pi * 21.0 * t) + 0.1 * (noise[1:] + noise[:-1])
u = np.round(u, 6)
with open(os.path.join(here, "anemometer.txt"), "w") as out:
    out.write("made-up record, 200 Hz\ntime in ms\tspeed in m/s\n")
    for a, b in zip(t, u):
        out.write("%.0f\t%.6f\n" % (1000 * a, b))
f, density = signal.welch(u - u.mean(), rate, window="hann", nperseg=segment, noverlap=segment // 2, detrend=False, scaling="density")
with open(os.path.join(here, "welch-density.csv"), "w") as out:
    out.write("# One-sided density of anemometer.txt, Hann window, 256 samples, half overlap, mean of the record taken off, by scipy 1.10 signal.welch\n")
    out.write("# (welch_reference.py). Not made by this project's Java code. Variance of the record: %.12g\n" % u.var())
    out.write("frequency_hz,density\n")
    for a, b in zip(f[1:], density[1:]):
        out.write("%.9g,%.12g\n" % (a, b))
print(u.var(), density.sum() * f[1])
