"""Onset of instability of the parallel flow in a tall slot heated from the side, conduction regime: prints Pr, Gr_c, wave number, phase speed.

Orr-Sommerfeld and energy equations on the gap, base flow W = x/24 - x^3/6 and T = x in units of g beta dT W^2/nu and dT; Chebyshev
collocation. Gr on the gap and the whole difference. A phase speed of zero means stationary cells. Needs numpy and scipy.
"""
import numpy as np
from scipy.linalg import eigvals
from scipy.optimize import brentq, minimize_scalar

N = 48
k = np.arange(N + 1)
x = np.cos(np.pi * k / N)
c = np.where((k == 0) | (k == N), 2.0, 1.0) * (-1.0) ** k
X = np.tile(x, (N + 1, 1)).T
D = np.outer(c, 1 / c) / (X - X.T + np.eye(N + 1))
D = (D - np.diag(D.sum(axis=1))) * 2
x = x / 2
D1, D2 = D, D @ D
D4 = D2 @ D2
W, Wxx = np.diag(x / 24 - x**3 / 6), np.diag(-x)
I, Z = np.eye(N + 1), np.zeros((N + 1, N + 1))


def fastest(gr, pr, a):
    lap = D2 - a * a * I
    A = np.block([[lap @ lap - 1j * a * gr * (W @ lap - Wxx), D1], [1j * a * gr * pr * I, lap - 1j * a * gr * pr * W]]).astype(complex)
    B = np.block([[-1j * a * gr * lap, Z], [Z, -1j * a * gr * pr * I]]).astype(complex)
    n = N + 1
    for row, cond in ((0, I[0]), (N, I[N]), (1, D1[0]), (N - 1, D1[N])):
        A[row], B[row] = 0, 0
        A[row, :n] = cond
    for row in (0, N):
        A[n + row], B[n + row] = 0, 0
        A[n + row, n + row] = 1
    w = eigvals(A, B)
    w = w[np.isfinite(w) & (abs(w) < 10)]
    return w[np.argmax(w.imag)]


def neutral(a, pr):
    grs = np.geomspace(100, 4e4, 25)
    g = [fastest(gr, pr, a).imag for gr in grs]
    for lo, hi, gl, gh in zip(grs, grs[1:], g, g[1:]):
        if gl < 0 <= gh:
            return brentq(lambda gr: fastest(gr, pr, a).imag, lo, hi, rtol=1e-4)
    return 1e6


for pr in (0.01, 0.71, 7, 12.3, 20, 50, 100, 1000):
    scan = [(neutral(a, pr), a) for a in np.arange(0.6, 3.6, 0.4)]
    best = min(scan)[1]
    s = minimize_scalar(lambda a: neutral(a, pr), bounds=(max(0.3, best - 0.4), best + 0.4), method='bounded', options={'xatol': 0.02})
    print(pr, round(s.fun, 1), round(s.x, 3), round(abs(fastest(s.fun, pr, s.x).real), 5), flush=True)
