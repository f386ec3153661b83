"""One-dimensional spectra of the model energy spectrum, by adaptive quadrature at 40 digits.

    E(k) = k^4 (1 + k^2)^(-17/6) exp(-5.2 {[(k r)^4 + 0.4^4]^(1/4) - 0.4}),  k = kappa/kappa_e,  r = kappa_e eta
    along  = (3/2)/Int E * Int_k1^inf E/k (1 - k1^2/k^2) dk        across = (3/4)/Int E * Int_k1^inf E/k (1 + k1^2/k^2) dk

so that each integrates over k1 > 0 to 1.    Run: python3 energy_spectrum.py > energy-spectrum.csv   (mpmath 1.2.1)
"""
from mpmath import mp, mpf, quad, exp, log, inf

mp.dps = 40


def spectra(r, k1s):
    r = mpf(r)
    energy = lambda k: k**4 * (1 + k * k) ** (-mpf(17) / 6) * exp(-mpf('5.2') * (((k * r)**4 + mpf('0.4')**4) ** mpf('0.25') - mpf('0.4')))

    def integral(g, low):
        # in ln k, in pieces of about one unit, up to k r = 60
        top, pieces = log(60 / r), [log(low)]
        while pieces[-1] + mpf('0.7') < top:
            pieces.append(pieces[-1] + mpf('0.7'))
        # the exponential end in smaller pieces
        pieces = [p for p in pieces if p < log(1 / r)] + [log(x / r) for x in range(1, 61, 2) if log(x / r) > log(low)]
        pieces = sorted(set([log(low)] + pieces))
        return quad(lambda t: g(exp(t)) * exp(t), pieces)

    total = integral(energy, mpf('1e-12'))
    for k1 in k1s:
        k1 = mpf(k1)
        a = integral(lambda k: energy(k) / k, k1)
        b = integral(lambda k: energy(k) / k**3, k1)
        yield k1, mpf('1.5') / total * (a - k1**2 * b), mpf('0.75') / total * (a + k1**2 * b)


print("# Spectra along and across of the model energy spectrum, normalised to 1; r = kappa_e eta, k1 = kappa_1/kappa_e. Made with mpmath at 40 digits")
print("# by energy_spectrum.py. Not made by this project's Java code.")
print("r,k1,along,across")
for r, k1s in (("0.001", ("0.01", "0.5", "1", "10", "100", "1000", "4000")), ("0.02", ("0.001", "0.3", "2", "20", "100", "300")),
               ("0.4", ("0.1", "1", "3", "10", "25"))):
    for k1, along, across in spectra(r, k1s):
        print("%s,%s,%s,%s" % (r, mp.nstr(k1, 6), mp.nstr(along, 17), mp.nstr(across, 17)))
