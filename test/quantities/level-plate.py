"""First-order effect of weight on the laminar layer of a level plate, one wall temperature: prints the slopes that level-plate.test.ts holds.

Similarity variables of Blasius, f = f0 + xi f1, theta = theta0 + xi theta1, xi = Gr_x/Re_x^(5/2): the pressure across the layer,
dp/dy = rho g beta dT theta, drives the stream along it. Needs numpy and scipy.
"""
import numpy as np
from scipy.integrate import solve_bvp


def slopes(pr):
    def rhs(e, y):
        f, fp, fpp, t, tp, above, g, gp, gpp, s, sp = y
        return np.vstack([fp, fpp, -.5 * f * fpp, tp, -.5 * pr * f * tp, -t, gp, gpp, -(.5 * f * gpp - .5 * fp * gp + fpp * g + .5 * (e * t + above)), sp, -pr * (.5 * f * sp - .5 * fp * s + tp * g)])

    def ends(a, b):
        return np.array([a[0], a[1], b[1] - 1, a[3] - 1, b[3], b[5], a[6], a[7], b[7], a[9], b[9]])

    e = max(12, 12 / np.sqrt(pr)) * np.linspace(0, 1, 400) ** 2
    y = np.zeros((11, e.size))
    y[0], y[1], y[2], y[3] = e - 1 + np.exp(-e), 1 - np.exp(-e), np.exp(-e), np.exp(-e * .5 * np.sqrt(pr))
    y[5] = y[3]
    s = solve_bvp(rhs, ends, e, y, tol=1e-6, max_nodes=40000)
    return s.y[2, 0], -s.y[4, 0], s.y[8, 0] / s.y[2, 0], s.y[10, 0] / s.y[4, 0]


for pr in (0.004, 0.0211, 0.1, 0.7, 7):
    print(pr, *(f'{v:.5g}' for v in slopes(pr)))
