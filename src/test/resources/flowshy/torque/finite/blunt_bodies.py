"""Writes blunt-bodies.csv: slow steady drag of blunt cylinders, clear of a wall and standing on one.

Collocation in real space with Blake's (1971) point force over a no-slip wall in closed form, integrated round each ring and
along each panel by graded Gauss rules. Shares neither kernel nor projection with the Java solver, which works in Hankel space
with Galerkin's averages. Two meshes; the CSV holds both, so the difference shows what the finer is worth.

Run: python3 blunt_bodies.py > blunt-bodies.csv   (numpy only, some minutes)
Lengths in radii, viscosity 1.
  rod:  free of walls, unit velocity across its axis: force / (length), torque left empty
  post: standing on the wall z = 0 in the shear u_x = z: force, and torque about the foot, int (z t_x - x t_z) dS
"""
import numpy as np

GX, GW = np.polynomial.legendre.leggauss(8)
GX, GW = 0.5 * (GX + 1), 0.5 * GW


def graded(levels=8, ratio=0.15):
    """Rule on 0..1 whose points crowd towards 0."""
    ends = [0.0] + [ratio**k for k in range(levels, -1, -1)]
    x = np.concatenate([a + (b - a) * GX for a, b in zip(ends[:-1], ends[1:])])
    w = np.concatenate([(b - a) * GW for a, b in zip(ends[:-1], ends[1:])])
    return x, w


CROWD, CROWD_W = graded()


def sizes(smallest, ratio, largest, total):
    """Panels that grow from the smallest."""
    out, h = [], smallest
    while True:
        rest = total - sum(out)
        if h >= largest:
            n = max(1, int(np.ceil(rest / largest)))
            return out + [rest / n] * n
        if rest < h * (1 + 0.5 * ratio):
            return out + [rest]
        out.append(h)
        h *= ratio


def side_and_top(length, smallest, ratio, largest, foot):
    """Panels of the top disc and the side, as pairs of (r, z)."""
    r = 1 - np.concatenate([[0], np.cumsum(sizes(smallest, ratio, 0.25, 1.0))])
    r[-1] = 0.0
    upper = sizes(smallest, ratio, largest, 0.5 * length)[::-1]
    lower = sizes(foot, ratio, largest, 0.5 * length)
    z = np.concatenate([[0], np.cumsum(lower + upper)])
    return ([((a, length), (b, length)) for a, b in zip(r[:-1], r[1:])]
            + [((1.0, a), (1.0, b)) for a, b in zip(z[:-1], z[1:])])


def kernel(x, y, z, h, force, wall):
    """Velocity at (x, y, z) relative to the foot of a point force at height h (z absolute)."""
    fx, fy, fz = force
    d = z - h
    r = np.sqrt(x * x + y * y + d * d)
    dot = (x * fx + y * fy + d * fz) / r**3
    u = [fx / r + x * dot, fy / r + y * dot, fz / r + d * dot]
    if wall:
        s = z + h
        big = np.sqrt(x * x + y * y + s * s)
        dot = (x * fx + y * fy + s * fz) / big**3
        u[0] -= fx / big + x * dot
        u[1] -= fy / big + y * dot
        u[2] -= fz / big + s * dot
        # 2h (f_1 d/dx + f_2 d/dy - f_3 d/dz) { h X_i/X^3 - delta_i3/X - X_i X_3/X^3 }
        g = (fx, fy, -fz)
        pos = (x, y, s)
        along = x * g[0] + y * g[1] + s * g[2]
        for i in range(3):
            term = h * (g[i] / big**3 - 3 * pos[i] * along / big**5)
            term = term - (g[i] * s + pos[i] * g[2]) / big**3 + 3 * pos[i] * s * along / big**5
            if i == 2:
                term = term + along / big**3
            u[i] = u[i] + 2 * h * term
    return u


def column(panel, point, azimuth, own, wall):
    """Velocity at a point from unit even, second-harmonic and axial densities on a panel."""
    (r1, z1), (r2, z2) = panel
    length = np.hypot(r2 - r1, z2 - z1)
    if own:
        s = np.concatenate([0.5 - 0.5 * CROWD, 0.5 + 0.5 * CROWD])
        w = np.concatenate([CROWD_W, CROWD_W]) * 0.5
    else:
        nearer = np.hypot(r1 - point[0], z1 - point[1]) < np.hypot(r2 - point[0], z2 - point[1])
        s, w = (CROWD if nearer else 1 - CROWD), CROWD_W
    r = (r1 + (r2 - r1) * s)[:, None]
    z = (z1 + (z2 - z1) * s)[:, None]
    out = np.zeros((3, 3))
    for side in (1, -1):
        phi = (azimuth + side * np.pi * CROWD)[None, :]
        weight = (w * length)[:, None] * r * (np.pi * CROWD_W)[None, :] / (8 * np.pi)
        x = point[0] * np.cos(azimuth) - r * np.cos(phi)
        y = point[0] * np.sin(azimuth) - r * np.sin(phi)
        one, none = np.ones_like(x), np.zeros_like(x)
        for k, force in enumerate([(one, none, none),
                                   (np.cos(2 * phi) * one, np.sin(2 * phi) * one, none),
                                   (none, none, np.cos(phi) * one)]):
            u = kernel(x, y, point[1], z, force, wall)
            out[0, k] += np.sum(weight * u[0])
            out[2, k] += np.sum(weight * u[2])
    return out


def solve(panels, wall, velocity):
    n = len(panels)
    matrix, right = np.zeros((3 * n, 3 * n)), np.zeros(3 * n)
    for i, ((r1, z1), (r2, z2)) in enumerate(panels):
        point = (0.5 * (r1 + r2), 0.5 * (z1 + z2))
        for j, panel in enumerate(panels):
            front = column(panel, point, 0.0, i == j, wall)
            flank = column(panel, point, 0.5 * np.pi, i == j, wall)
            matrix[3 * i, 3 * j:3 * j + 3] = front[0]
            matrix[3 * i + 1, 3 * j:3 * j + 3] = flank[0]
            matrix[3 * i + 2, 3 * j:3 * j + 3] = front[2]
        right[3 * i] = right[3 * i + 1] = velocity(point[1])
    density = np.linalg.solve(matrix, right)
    force = torque = 0.0
    for i, ((r1, z1), (r2, z2)) in enumerate(panels):
        area = np.pi * (r1 + r2) * np.hypot(r2 - r1, z2 - z1)
        force += area * density[3 * i]
        torque += area * density[3 * i] * 0.5 * (z1 + z2) - 0.5 * area * 0.5 * (r1 + r2) * density[3 * i + 2]
    return force, torque


def rod(slenderness, smallest, ratio, largest):
    length = 2.0 * slenderness
    half = [((a[0], a[1] - 0.5 * length), (b[0], b[1] - 0.5 * length))
            for a, b in side_and_top(length, smallest, ratio, largest, smallest)]
    bottom = [((a[0], -a[1]), (b[0], -b[1])) for a, b in half if a[1] == b[1]]
    return solve(half + bottom, False, lambda z: 1.0)[0] / length


def post(slenderness, smallest, ratio, largest):
    return solve(side_and_top(2.0 * slenderness, smallest, ratio, largest, 0.1), True, lambda z: z)


if __name__ == "__main__":
    coarse, fine = (0.08, 1.8, 1.0), (0.02, 1.4, 0.5)
    print("# Slow steady drag of blunt cylinders; lengths in radii, viscosity 1. Made by blunt_bodies.py (numpy %s),"
          % np.__version__)
    print("# collocation in real space; not made by this project's Java code.")
    print("body,slenderness,force_coarse,force,torque_coarse,torque")
    for p in (2.0, 5.0, 10.0):
        print("rod,%g,%.6f,%.6f,0,0" % (p, rod(p, *coarse), rod(p, *fine)), flush=True)
    for p in (1.0, 2.0, 5.0):
        (f1, t1), (f2, t2) = post(p, *coarse), post(p, *fine)
        print("post,%g,%.6f,%.6f,%.6f,%.6f" % (p, f1, f2, t1, t2), flush=True)
