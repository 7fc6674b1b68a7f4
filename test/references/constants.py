"""Makes the tables of constants in src/references: python constants.py graetz | duct | upright > the file named below.

graetz   graetz-constants.ts      zeros of Kummer's function and its derivatives, mpmath, 40 digits
duct     duct-table.ts            Nusselt number of rectangular ducts, collocation in both directions
upright  upright-plate-table.ts   natural convection on an upright plate, boundary-value solver
Prints the numbers, one row a line; the comments of the files are written by hand.
"""
import sys


def graetz():
    import mpmath as mp
    mp.mp.dps = 40
    for kind, offset, flux_offset in (('pipe', mp.mpf(8) / 3, mp.mpf(4) / 3), ('channel', mp.mpf(5) / 3, mp.mpf(1) / 3)):
        def ab(z):
            return (mp.mpf(1) / 2 - z / 4, 1) if kind == 'pipe' else (mp.mpf(1) / 4 - z / 4, mp.mpf(1) / 2)

        def wall(z):
            a, b = ab(z)
            return mp.e ** (-z / 2) * mp.hyp1f1(a, b, z)

        def slope(z):
            a, b = ab(z)
            return mp.e ** (-z / 2) * (-z * mp.hyp1f1(a, b, z) + 2 * z * a / b * mp.hyp1f1(a + 1, b + 1, z))

        last = []
        for n in range(60):
            z = mp.findroot(wall, 4 * n + offset + (0.04 if n == 0 else 0.01 if n < 4 else 0.0001))
            print(kind, 'T', n, mp.nstr(z, 14), mp.nstr(slope(z) / (z * mp.diff(wall, z)), 12))
        for n in range(1, 61):
            z = mp.findroot(slope, 4 * n + flux_offset - 0.2 if n < 4 else 2 * last[-1] - last[-2])
            last.append(z)
            print(kind, 'q', n, mp.nstr(z, 14), mp.nstr(2 * wall(z) / (z * mp.diff(slope, z)), 12))


def duct():
    from independent import duct as solve
    for k in range(1, 41):
        print(k / 40, '%.9g' % solve(k / 40, 161, 81)[1])


def upright():
    import numpy as np
    from scipy.integrate import solve_bvp
    from scipy.optimize import brentq
    logs = np.arange(-2, 3.0001, 0.125)
    out = {}

    def run(pr, L, s, y):
        rhs = lambda s, y: L * np.array([y[1], y[2], -3 * y[0] * y[2] + 2 * y[1] ** 2 - y[3], y[4], -3 * pr * y[0] * y[4]])
        r = solve_bvp(rhs, lambda a, b: np.array([a[0], a[1], a[3] - 1, b[1], b[3]]), s, y, tol=1e-7, max_nodes=60000)
        assert r.success
        return r

    def chain(indices, last, L0):
        for i in indices:
            pr = 10 ** logs[i]
            L = max((8 * pr ** 0.25 + 4) * 2.2 if pr >= 1 else 60 * (0.01 / pr) ** 0.45 * 1.6 if pr < 0.5 else 20, 14)
            s = np.linspace(0, 1, 500) ** 1.5
            if last is None:
                e = s * L
                y = np.array([0.5 * (1 - np.exp(-e)), 0.6 * e * np.exp(-e), 0.64 * (1 - e) * np.exp(-e), np.exp(-.57 * e), -.57 * np.exp(-.57 * e)])
            else:
                y = last.sol(np.minimum(s * L / L0, 1))
            r = run(pr, L, s, y)
            fp, th = (lambda t: r.sol(t)[1]), (lambda t: r.sol(t)[3])
            e = np.linspace(0, 1, 20001); k = fp(e).argmax()
            top = brentq(lambda t: r.sol(t)[2], e[k - 1], e[k + 1]); peak = fp(top)
            out[i] = [pr, -r.y[4, 0], r.y[2, 0], peak, top * L, brentq(lambda t: th(t) - .01, 0, 1) * L, brentq(lambda t: fp(t) - .01 * peak, top, 1) * L]
            last, L0 = r, L
        return last, L0

    start = 16
    first = chain([start], None, None)
    chain(range(start + 1, len(logs)), *first)
    chain(range(start - 1, -1, -1), *first)
    for i in sorted(out):
        print(', '.join('%.9g' % v for v in out[i]))


{'graetz': graetz, 'duct': duct, 'upright': upright}[sys.argv[1]]()
