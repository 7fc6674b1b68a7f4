"""Heat transfer of a turbulent plate at small Prandtl numbers, independent of the tool: writes low-prandtl-plate.json.

Boundary-layer equations in viscous units (U = nu = 1, so that x and y are Reynolds numbers), marched from Re_x = 1000, turbulent
from the edge. Mixing length 0.41 y (1 - exp(-y+/26)), at most 0.085 delta, 0.25 delta Re_theta^(-1/8)
where that is more (van Driest, J. Aeronaut. Sci. 23 (1956) 1007; Kays and Crawford, Convective Heat and Mass Transfer, from memory); turbulent Prandtl number 0.85 + 0.7/Pe_t (Kays, J. Heat Transfer 116
(1994) 284), and 0.85 for the bracket. Wall temperature or wall flux uniform; the means are the mean coefficient, and the flux over the mean difference.
Needs numpy and scipy.
"""
import json, os
import numpy as np
from scipy.linalg import solve_banded

prandtls = [0.004, 0.007, 0.01, 0.02, 0.04, 0.07, 0.1, 0.7]
y = np.concatenate([[0.0], np.geomspace(2.0, 3e6, 420)])
half = 0.5 * (y[1:] + y[:-1])
dy, width = np.diff(y), np.diff(half)
xs = np.geomspace(1e3, 1.2e7, 5000)
asked = [3e5, 5e5, 1e6, 2e6, 5e6, 1e7]
u = np.tanh(y / (3 * np.sqrt(1e3)))
u[0] = 0


def march(old, u_old, u_new, v, diffusivity, dx, wall, value):
    """One implicit step of d(u f)/dx + d(v f)/dy = d(D df/dy)/dy; wall value or wall slope given."""
    n = len(y)
    a, b, c, r = np.zeros(n), np.ones(n), np.zeros(n), np.zeros(n)
    conduct = diffusivity / dy
    lower, upper = conduct[:-1] + 0.5 * v[:-1], conduct[1:] - 0.5 * v[1:]
    out_low, out_up = conduct[:-1] - 0.5 * v[:-1], conduct[1:] + 0.5 * v[1:]
    a[1:-1], c[1:-1] = -lower, -upper
    b[1:-1] = u_new[1:-1] * width / dx + out_low + out_up
    r[1:-1] = u_old[1:-1] * width / dx * old[1:-1]
    r[-1] = old[-1]
    if wall == 'value':
        r[0] = value
    else:
        b[0], c[0], r[0] = 1, -1, value * dy[0]
    band = np.zeros((3, n))
    band[0, 1:], band[1], band[2, :-1] = c[:-1], b, a[1:]
    return solve_banded((1, 1), band, r)


fields = {(p, kind, law): np.zeros(len(y)) for p in prandtls for kind in ('temperature', 'flux') for law in ('kays', 'constant')}
sums = {key: 0.0 for key in fields}
rows, friction = [], []
for i in range(1, len(xs)):
    x, dx = xs[i], xs[i] - xs[i - 1]
    slope = np.diff(u) / dy
    delta = np.interp(0.99, np.maximum.accumulate(u + 1e-12 * y / y[-1]), y)
    tau = slope[0]
    middle = 0.5 * (u[1:] + u[:-1])
    momentum = np.sum(middle * (1 - middle) * dy)  # Reynolds number of the momentum thickness
    length = np.minimum(0.41 * half * (1 - np.exp(-half * np.sqrt(tau) / 26)), max(0.085, 0.25 * momentum**-0.125) * delta)
    eddy = length**2 * np.abs(slope)
    v = np.zeros(len(half))
    u_new = u
    for _ in range(3):
        v = -np.concatenate([[0.0], np.cumsum((u_new - u)[1:-1] * width)]) / dx
        u_new = march(u, u, u_new, v, 1 + eddy, dx, 'value', 0.0)
    v = -np.concatenate([[0.0], np.cumsum((u_new - u)[1:-1] * width)]) / dx
    for (p, kind, law), old in fields.items():
        turbulent = np.where(eddy > 1e-9, 0.85 + (0.7 / np.maximum(eddy * p, 1e-9) if law == 'kays' else 0.0), 1e9)
        new = march(old, u, u_new, v, 1 / p + eddy / turbulent, dx, 'value' if kind == 'temperature' else 'slope', 1.0)
        fields[(p, kind, law)] = new
        # Sum of the wall slope (temperature) or of the wall temperature at unit slope (flux).
        sums[(p, kind, law)] += ((new[0] - new[1]) / dy[0] if kind == 'temperature' else new[0]) * dx
    u = u_new
    for re in asked:
        if xs[i - 1] < re <= x:
            tau = (u[1] - u[0]) / dy[0]
            friction.append({'reynolds': x, 'friction': 2 * tau, 'schultzGrunow': 0.370 * np.log10(x) ** -2.584})
            for (p, kind, law), s in sums.items():
                mean = s if kind == 'temperature' else x * x / s
                rows.append({'reynolds': x, 'prandtl': p, 'wall': kind, 'turbulentPrandtl': law, 'nusselt': mean})
for f in friction:
    print(f"{f['reynolds']:.3g} cf {f['friction']:.5f} Schultz-Grunow {f['schultzGrunow']:.5f}")
rounded = lambda row: {k: (float(f'{v:.6g}') if isinstance(v, float) else v) for k, v in row.items()}
here = os.path.dirname(__file__)
with open(os.path.join(here, 'low-prandtl-plate.json'), 'w') as out:
    out.write('{"friction": [\n' + ',\n'.join(json.dumps(rounded(f)) for f in friction) + '\n], "rows": [\n' + ',\n'.join(json.dumps(rounded(r)) for r in rows) + '\n]}\n')
