"""Writes half-space-kernels.csv: velocity at height z of a point force at height z' over a no-slip wall, one horizontal wavenumber,
from the boundary-value problem itself, 40 digits.

i beta u = -grad p + lap u, div u = 0, force e^{i kappa x} delta(z - z'). In the plane of the wavenumber u_L and u_z are sums of
e^{+-kappa z} and e^{+-q z}, four below the force and two above; six conditions: no slip at z = 0, both velocities continuous at z',
and the jumps of the tractions D u_L + i kappa u_z and -p + 2 D u_z by minus the force. Across the plane the same with e^{+-q z}.
Shares no formula with the Java kernels. LZ is velocity along the wavenumber from a force along z, over i; ZL the other way, over i.
Run: python3 half_space_kernels.py > half-space-kernels.csv"""
import mpmath as mp

mp.mp.dps = 40


def modes(kappa, q, beta, z):
    """u_L, u_z, their z-derivatives and p of the four modes: e^{-kz}, e^{kz}, e^{-qz}, e^{qz}."""
    out = []
    for r in (-kappa, kappa):
        # potential flow: u = grad phi, p = -i beta phi
        e = mp.exp(r * z)
        out.append((1j * kappa * e, r * e, 1j * kappa * r * e, r * r * e, -1j * beta * e))
    for r in (-q, q):
        # i kappa u_L + D u_z = 0, no pressure
        e = mp.exp(r * z)
        out.append((e, -1j * kappa / r * e, r * e, -1j * kappa * e, mp.mpf(0)))
    return out


def plane(kappa, beta, z, source, force):
    q = mp.sqrt(kappa**2 + 1j * beta)
    wall, at = modes(kappa, q, beta, mp.mpf(0)), modes(kappa, q, beta, source)
    below, above = (0, 1, 2, 3), (0, 2)
    matrix, right = mp.matrix(6, 6), mp.matrix(6, 1)

    def traction(m):
        return m[2] + 1j * kappa * m[1], -m[4] + 2 * m[3]

    for j, n in enumerate(below):
        matrix[0, j], matrix[1, j] = wall[n][0], wall[n][1]
        matrix[2, j], matrix[3, j] = -at[n][0], -at[n][1]
        matrix[4, j], matrix[5, j] = [-t for t in traction(at[n])]
    for j, n in enumerate(above):
        matrix[2, 4 + j], matrix[3, 4 + j] = at[n][0], at[n][1]
        matrix[4, 4 + j], matrix[5, 4 + j] = traction(at[n])
    right[4], right[5] = -force[0], -force[1]
    c = mp.lu_solve(matrix, right)
    here = modes(kappa, q, beta, z)
    pairs = zip(c[:4], below) if z < source else zip(c[4:], above)
    total = [mp.mpc(0), mp.mpc(0)]
    for a, n in pairs:
        total[0] += a * here[n][0]
        total[1] += a * here[n][1]
    return total


def across(kappa, beta, z, source):
    q = mp.sqrt(kappa**2 + 1j * beta)
    low, high = min(z, source), max(z, source)
    return mp.sinh(q * low) * mp.exp(-q * high) / q


print("# Velocity kernels of a point force over a no-slip wall at one wavenumber. Made with mpmath %s by half_space_kernels.py."
      % mp.__version__)
print("# Not made by this project's Java code.")
print("kappa,beta,z,source,ll_re,ll_im,tt_re,tt_im,zz_re,zz_im,lz_re,lz_im,zl_re,zl_im")
for kappa in ("0.05", "0.8", "3"):
    for beta in ("1e-4", "0.5", "50"):
        for z, source in (("1.5", "0.4"), ("2", "1.9")):
            k, b, high, low = (mp.mpf(float(x)) for x in (kappa, beta, z, source))
            along, up = plane(k, b, high, low, (1, 0)), plane(k, b, high, low, (0, 1))
            cells = [kappa, beta, z, source]
            for v in (along[0], across(k, b, high, low), up[1], up[0] / 1j, along[1] / 1j):
                v = mp.mpc(v)
                cells += [mp.nstr(v.real, 16), mp.nstr(v.imag, 16)]
            print(",".join(cells))
