"""Writes wave-layers.csv: integrals of exp(-x z) over a thickness h at x = kappa, and their divided differences up to
q = sqrt(kappa^2 + i beta), 60 digits. Run: python3 wave_layers.py > wave-layers.csv"""
import mpmath as mp

mp.mp.dps = 60


def layer(x, h):
    e = (1 - mp.exp(-x * h)) / x
    return e, mp.exp(-x * h), 2 * (h - e) / x


print("# E = (1 - exp(-x h))/x, P = exp(-x h), S = 2 (h - E)/x at x = kappa, and (f(q) - f(kappa))/(q - kappa).")
print("# Made with mpmath %s, 60 digits, by wave_layers.py. Not made by this project's Java code." % mp.__version__)
print("kappa,h,beta,e,de_re,de_im,p,dp_re,dp_im,s,ds_re,ds_im")
for kappa in ("0.01", "0.3", "4", "200"):
    for h in ("0.02", "0.5", "8"):
        for beta in ("1e-7", "0.02", "3", "800"):
            k, t, b = mp.mpf(float(kappa)), mp.mpf(float(h)), mp.mpf(float(beta))
            q = mp.sqrt(k * k + mp.mpc(0, b))
            low, high = layer(k, t), layer(q, t)
            cells = [kappa, h, beta]
            for a, c in zip(low, high):
                d = (c - a) / (q - k)
                cells += [mp.nstr(a, 17), mp.nstr(d.real, 17), mp.nstr(d.imag, 17)]
            print(",".join(cells))
