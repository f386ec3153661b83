"""Fluctuation of a steady laminar layer over a plate, marched downstream.

    F''' + f F''/2 + f'' F/2 + i xi (1 - F') = xi (f' dF'/dxi - f'' dF/dxi),   F(0) = F'(0) = 0, F'(inf) = 1     (along the stream)
    G''  + f G'/2 + i xi (1 - G)             = xi f' dG/dxi,                   G(0) = 0, G(inf) = 1              (across it)

f is the Blasius function, eta = z sqrt(U/(nu x)), xi = omega x/U. Finite differences: uniform grid in eta (box scheme for F, F', F''),
Crank-Nicolson in ln(1 + 20 xi); both steps halved twice and extrapolated (Richardson, error h^2 and h^4). The two extrapolations differ by
less than the printed digits. The project's Java code solves the same equations by a power series in i xi; nothing of it is used here.

Run: python3 marched_layer.py > marched-layer.csv   (numpy 1.24, scipy 1.10; less than a minute)
"""
import numpy as np
from scipy.integrate import solve_ivp
from scipy.sparse import csc_matrix
from scipy.sparse.linalg import splu

ETA_END = 10.0
ETAS = [0.05, 0.2, 0.6, 1.0, 2.0, 4.0]
XIS = [0.0, 0.1, 0.3, 0.6, 1.0, 2.0, 3.0, 5.0, 10.0]


def blasius(eta):
    start = solve_ivp(lambda t, y: [y[1], y[2], -0.5 * y[0] * y[2]], [0, 15], [0, 0, 1.0], rtol=1e-12, atol=1e-14)
    curvature = start.y[1, -1] ** -1.5
    s = solve_ivp(lambda t, y: [y[1], y[2], -0.5 * y[0] * y[2]], [0, ETA_END], [0, 0, curvature], rtol=1e-12, atol=1e-14,
                  t_eval=eta)
    return s.y


def march(intervals, steps_per_unit):
    eta = np.linspace(0.0, ETA_END, intervals + 1)
    h = eta[1]
    f, fp, fpp = blasius(eta)
    n = intervals + 1
    fm, fpm, fppm = [(q[1:] + q[:-1]) / 2 for q in (f, fp, fpp)]
    j = np.arange(intervals)

    # y = ln(1 + 20 xi) is the marching variable: xi dF/dxi = xi 20/(1 + 20 xi) dF/dy
    y_of = lambda xi: np.log1p(20.0 * xi)
    marks = [y_of(xi) for xi in XIS]
    wanted = [int(round(e / h)) for e in ETAS]
    assert all(abs(w * h - e) < 1e-12 for w, e in zip(wanted, ETAS))

    # box: unknowns a = F, b = F', c = F'' at the nodes, order (a, b, c) blocks
    eye = np.ones(intervals)
    rows, cols, vals = [], [], []

    def put(r, c, v):
        rows.append(r)
        cols.append(c)
        vals.append(np.broadcast_to(np.asarray(v, dtype=complex), r.shape))

    def matrix(row_list, col_list, val_list, size):
        return csc_matrix((np.concatenate(val_list), (np.concatenate(row_list), np.concatenate(col_list))), shape=(size, size))

    out = {XIS[0]: (fp + 0.5 * eta * fpp, fp)}
    state = np.concatenate([f / 2 + eta * fp / 2, fp + eta * fpp / 2, 1.5 * fpp - 0.25 * eta * f * fpp]).astype(complex)
    cross = fp.astype(complex)
    for start, end, xi_end in zip(marks[:-1], marks[1:], XIS[1:]):
        steps = max(2, int(round((end - start) * steps_per_unit)))
        dy = (end - start) / steps
        for k in range(steps):
            xi = np.expm1(start + (k + 0.5) * dy) / 20.0
            g = xi * 20.0 / (1.0 + 20.0 * xi) / dy
            # momentum at the mid of the cell and of the step: new half on the left, old half on the right
            rows, cols, vals = [], [], []
            r0, r1, r2 = j, intervals + j, 2 * intervals + j
            for s, off in ((-1.0, 0), (1.0, 1)):
                put(r0, j + off, s / h)
                put(r0, n + j + off, -0.5)
                put(r1, n + j + off, s / h)
                put(r1, 2 * n + j + off, -0.5)
                put(r2, 2 * n + j + off, 0.5 * (s / h + fm / 4))
                put(r2, n + j + off, 0.5 * (-0.5j * xi) - 0.5 * g * fpm)
                put(r2, j + off, 0.5 * (fppm / 4) + 0.5 * g * fppm)
            last = 3 * intervals
            for r, c, v in ((last, 0, 1.0), (last + 1, n, 1.0), (last + 2, 2 * n - 1, 1.0)):
                rows.append(np.array([r])); cols.append(np.array([c])); vals.append(np.array([v], dtype=complex))
            left = matrix(rows, cols, vals, 3 * n)
            a, b, c = state[:n], state[n:2 * n], state[2 * n:]
            am, bm, cm = [(q[1:] + q[:-1]) / 2 for q in (a, b, c)]
            right = np.zeros(3 * n, dtype=complex)
            right[r2] = -(0.5 * (np.diff(c) / h + fm * cm / 2 + fppm * am / 2 - 1j * xi * bm)) - 1j * xi \
                - g * (fpm * bm - fppm * am)
            right[last + 2] = 1.0
            state = splu(left).solve(right)

            # across: second order, central differences at the nodes
            i = np.arange(1, n - 1)
            rows, cols, vals = [], [], []
            put(i, i - 1, 0.5 * (1 / h**2 - f[i] / (4 * h)))
            put(i, i + 1, 0.5 * (1 / h**2 + f[i] / (4 * h)))
            put(i, i, 0.5 * (-2 / h**2 - 1j * xi) - g * fp[i])
            for r in (0, n - 1):
                rows.append(np.array([r])); cols.append(np.array([r])); vals.append(np.array([1.0 + 0j]))
            left = matrix(rows, cols, vals, n)
            right = np.zeros(n, dtype=complex)
            right[i] = -0.5 * ((cross[i + 1] - 2 * cross[i] + cross[i - 1]) / h**2
                               + f[i] * (cross[i + 1] - cross[i - 1]) / (4 * h) - 1j * xi * cross[i]) \
                - 1j * xi - g * fp[i] * cross[i]
            right[n - 1] = 1.0
            cross = splu(left).solve(right)
        out[xi_end] = (state[n:2 * n].copy(), cross.copy())
    return np.array([[[out[xi][m][w] for m in (0, 1)] for w in wanted] for xi in XIS])


coarse, mid, fine = march(800, 120), march(1600, 240), march(3200, 480)
first, second = (4 * mid - coarse) / 3, (4 * fine - mid) / 3
best = (16 * second - first) / 15
print("# s along and across a laminar layer over a plate, complex, against eta and xi. Made by marched_layer.py (finite differences,")
print("# Richardson); not made by this project's Java code. Largest change from the last extrapolation: %.1e" % np.abs(best - second).max())
print("xi,eta,along_re,along_im,across_re,across_im")
for a, xi in enumerate(XIS):
    for b, eta in enumerate(ETAS):
        s, t = best[a, b]
        print("%g,%g,%.8f,%.8f,%.8f,%.8f" % (xi, eta, s.real, s.imag, t.real, t.imag))
