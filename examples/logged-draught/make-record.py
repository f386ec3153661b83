"""Makes draught.csv, a record invented for this example: mean 0.32 m/s, fluctuation of a first-order process. Seeded."""
import random

random.seed(41)
speed, lines = 0.0, ["# invented for this example, see make-record.py", "t [s];u [m/s]"]
for n in range(4096):
    speed = 0.97 * speed + 0.243 * random.gauss(0.0, 1.0) * 0.06
    lines.append(f"{n / 256:.5f};{0.32 + speed:.5f}")
open("draught.csv", "w").write("\n".join(lines) + "\n")
