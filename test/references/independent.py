"""Independent computation of known answers with numpy and scipy: python independent.py > independent.json

Other methods than those of the program wherever there is one: Chebyshev collocation against series, boundary-value solver against
shooting, library functions against own ones. Rows: kernel or reference, inputs, value, expected, relative tolerance.
"""
import json
import numpy as np
import scipy
import scipy.linalg as la
import scipy.special as sp
from scipy.integrate import solve_bvp, solve_ivp
from scipy.interpolate import PchipInterpolator
from scipy.optimize import brentq

rows, kernels = [], []


def row(ref, given, value, expected, tolerance=1e-8):
    rows.append({'reference': ref, 'given': given, 'value': value, 'expected': float(expected), 'tolerance': tolerance})


def kernel(name, args, expected, tolerance=1e-13):
    kernels.append({'kernel': name, 'args': args, 'expected': float(expected), 'tolerance': tolerance})


def cheb(n):
    x = np.cos(np.pi * np.arange(n + 1) / n)
    c = np.ones(n + 1); c[0] = c[n] = 2; c *= (-1.0) ** np.arange(n + 1)
    d = x[:, None] - x[None, :] + np.eye(n + 1)
    D = np.outer(c, 1 / c) / d
    return x, D - np.diag(D.sum(1))


def weights(n):
    x, _ = cheb(n)
    k = np.arange(n + 1)
    moments = np.where(k % 2 == 0, 2 / (1 - k.astype(float) ** 2 + (k % 2)), 0)
    return x, np.linalg.solve(np.cos(np.outer(k, np.arccos(x))), moments)


# kernels against the library
for x in (1e-9, 0.3, 1, 2.4, 2.6, 4, -1.7):
    kernel('erf', [x], sp.erf(x))
for x in (0.5, 2.4, 2.6, 5, 20):
    kernel('erfc', [x], sp.erfc(x), 1e-12)
    kernel('erfcScaled', [x], sp.erfcx(x), 1e-12)
for order in (0, 1, 2):
    for x in (0.1, 1, 3.7, 20, 150):
        kernel('besselJ', [order, x], sp.jv(order, x), 1e-11)
p = PchipInterpolator([0, 1, 2.5, 3, 5], [1, 2, 2.1, 0.3, 0.4])
for x in (0.2, 1.5, 2.7, 3.9, 4.99):
    kernel('pchip', [x], p(x))

# eigenvalue problems of the thermal entry by collocation in r (pipe: 0..1 through even extension) and y
N = 400
x, D = cheb(N)
_, w = weights(N)
half = x > 1e-12  # N even: x = 0 is a node, it is kept apart


def entry(kind, flux):
    """Right-hand side expansion on -1..1, even modes: returns decay rates lambda^2 and (mode values, weights)."""
    r = np.abs(x)
    inner = slice(1, N) if not flux else slice(0, N + 1)
    L = D @ D
    if kind == 'pipe':
        with np.errstate(divide='ignore', invalid='ignore'):
            first = D / np.where(x == 0, 1, x)[:, None]
        first[N // 2] = (D @ D)[N // 2]
        L = L + first
    B = np.diag(1 - x ** 2)
    A = -L.copy(); M = B.copy()
    if flux:
        A[0] = D[0]; A[N] = D[N]; M[0] = 0; M[N] = 0
    else:
        A = A[1:N, 1:N]; M = M[1:N, 1:N]
    val, vec = la.eig(A, M)
    good = np.isfinite(val) & (np.abs(val.imag) < 1e-6 * np.maximum(1, np.abs(val.real))) & (val.real > (1 if flux else 0)) & (val.real < 40000)
    val, vec = val.real[good], vec.real[:, good]
    order = np.argsort(val); val, vec = val[order], vec[:, order]
    if not flux:
        full = np.zeros((N + 1, len(val))); full[1:N] = vec; vec = full
    even = np.abs(vec - vec[::-1]).max(0) < 1e-5 * np.abs(vec).max(0)
    return val[even], vec[:, even], r


for kind in ('pipe', 'channel'):
    measure = lambda r: r * (1 - r ** 2) if kind == 'pipe' else (1 - r ** 2)
    decay = 2 if kind == 'pipe' else 32 / 3
    # finite-volume free integration on 0..1 with a fine Gauss rule through the polynomial
    g, gw = np.polynomial.legendre.leggauss(600); g = (g + 1) / 2; gw = gw / 2
    lag = np.array([np.polynomial.chebyshev.chebvander(g, N)[i] for i in range(len(g))]) @ np.linalg.inv(np.polynomial.chebyshev.chebvander(x, N))
    val, vec, r = entry(kind, False)
    m = measure(g) * gw
    modes = lag @ vec
    c = (m @ modes) / (m @ modes ** 2)
    content = c * (m @ modes) / m.sum()
    slope = -(D @ vec)[0] * c
    row(f'developed-heat-{kind}', {}, 'nusselt', val[0] / 2 if kind == 'pipe' else 8 / 3 * val[0])
    for xs in (1e-3, 3e-3, 0.01, 0.03, 0.1, 1):
        e = np.exp(-decay * val * xs)
        bulk = (content * e).sum()
        row(f'graetz-{kind}', {'graetz': 1 / xs}, 'bulkTemperatureRatio', bulk)
        row(f'graetz-{kind}', {'graetz': 1 / xs}, 'nusselt', -np.log(bulk) / (4 * xs))
        row(f'graetz-{kind}', {'graetz': 1 / xs}, 'nusseltLocal', (2 if kind == 'pipe' else 4) * (slope * e).sum() / bulk)
    val, vec, r = entry(kind, True)
    modes = lag @ vec
    developed = (lambda s: s ** 2 - s ** 4 / 4 - 7 / 24) if kind == 'pipe' else (lambda s: 0.75 * s ** 2 - s ** 4 / 8 - 39 / 280)
    excess = -(m * developed(g)) @ modes / (m @ modes ** 2)
    for xs in (3e-3, 0.01, 0.03, 0.1, 1):
        wall = developed(1) + (excess * vec[0] * np.exp(-decay * val * xs)).sum()
        row(f'graetz-{kind}', {'graetz': 1 / xs}, 'nusseltLocalFlux', (2 if kind == 'pipe' else 4) / wall)

row('leveque-pipe', {'graetz': 1e6}, 'sherwoodLocal', (8 / 9) ** (1 / 3) / sp.gamma(4 / 3) * 100)
row('leveque-channel', {'graetz': 1e6}, 'sherwood', 1.5 * (4 / 3) ** (1 / 3) / sp.gamma(4 / 3) * 100)


# rectangular ducts by collocation in both directions
def even(n):
    x, D = cheb(n); D2 = D @ D; m = (n + 1) // 2
    return x[1:m], D2[1:m, 1:m] + D2[1:m, n - 1:n - m:-1], 2 * weights(n)[1][1:m]


def duct(a, nx=141, ny=71):
    x, Ax, wx = even(nx); y, Ay, wy = even(ny)
    ex, Vx = la.eig(4 * Ax); ey, Vy = la.eig(4 * Ay / a ** 2)
    ex, ey, Vx, Vy = ex.real, ey.real, Vx.real, Vy.real
    ix, iy = la.inv(Vx), la.inv(Vy)
    solve = lambda f: Vx @ ((ix @ f @ iy.T) / (ex[:, None] + ey[None, :])) @ Vy.T
    W = np.outer(wx, wy) / 4
    u = solve(-np.ones((len(x), len(y)))); mean = (W * u).sum(); u = u / mean
    t, rate = np.ones_like(u), 0
    for _ in range(500):
        s = solve(-u * t); new = (W * u * t).sum() / (W * u * s).sum(); t = s / (W * u * s).sum()
        if abs(new - rate) < 1e-14 * new: break
        rate = new
    h = 2 * a / (1 + a)
    return 2 * h ** 2 / mean, rate * h ** 2 / 4, h ** 2 / (4 * (W * u * solve(-u)).sum())


for a in (1, 0.75, 0.5, 0.25, 0.1):
    f, t, q = duct(a)
    row('poiseuille-duct', {'aspectRatio': a}, 'frictionTimesReynolds', f)
    row('developed-heat-duct', {'aspectRatio': a}, 'nusseltUniformFlux', q)
    row('developed-heat-duct', {'aspectRatio': a}, 'nusselt', t, 1e-4)
for a in (0.0125, 0.0375, 0.0875, 0.3125, 0.6125, 0.9875):
    row('developed-heat-duct', {'aspectRatio': a}, 'nusselt', duct(a)[1], 1e-4)

# one-sided heating of a channel: -theta'' = rate 6 s (1 - s) theta, theta(0) = 0, theta'(1) = 0
n = 60; z, Dz = cheb(n); s = (z + 1) / 2; A = -4 * Dz @ Dz; B = np.diag(6 * s * (1 - s))
A[0] = Dz[0]; B[0] = 0; A[n] = 0; A[n, n] = 1; B[n] = 0
val = la.eig(A, B)[0]; val = np.sort(val[np.isfinite(val) & (np.abs(val.imag) < 1e-9)].real)
row('developed-heat-channel', {}, 'nusseltOneSideTemperature', 2 * val[val > 0.1][0])

# upright pipe, mixed convection: collocation on -1..1 with even fields
n = 60; z, Dz = cheb(n); D1 = Dz / np.where(z == 0, 1, z)[:, None]; D1[n // 2] = (Dz @ Dz)[n // 2]; lap = Dz @ Dz + D1; eye = np.eye(n + 1)
_, wz = weights(n)
for ratio in (-300, -100, 0, 100, 400, 1000, 2000):
    A = np.zeros((2 * n + 3, 2 * n + 3)); b = np.zeros(2 * n + 3)
    A[:n + 1, :n + 1] = lap; A[:n + 1, n + 1:2 * n + 2] = ratio / 8 * eye; A[:n + 1, -1] = 1
    A[n + 1:2 * n + 2, n + 1:2 * n + 2] = lap; A[n + 1:2 * n + 2, :n + 1] = -2 * eye
    for k in (0, n):
        A[k] = 0; A[k, k] = 1
        A[n + 1 + k] = 0; A[n + 1 + k, n + 1 + k] = 1
    A[-1, n + 1:2 * n + 2] = Dz[0]; b[-1] = 1
    y = np.linalg.solve(A, b); u, th = y[:n + 1], y[n + 1:2 * n + 2]
    poly = np.polynomial.chebyshev.Chebyshev.fit(z, u * th * np.abs(z) * 0 + u * th, n)
    gg, gv = np.polynomial.legendre.leggauss(80); gg = (gg + 1) / 2; gv = gv / 2
    bulk = 2 * (gv * gg * poly(gg)).sum()
    given = {'grashofFluxOverReynolds': ratio}
    row('mixed-convection-pipe', given, 'nusselt', -2 / bulk)
    row('mixed-convection-pipe', given, 'wallShearFactor', -(Dz @ u)[0] / 4)
    row('mixed-convection-pipe', given, 'peakOverMean', u[n // 2])

for wo in (0.1, 0.5, 1, 2, 4, 10, 20, 100):
    z = 1j ** 1.5 * wo
    v = 8 / (1j * wo ** 2) * (1 - 2 * sp.jve(1, z) / (z * sp.jve(0, z)))
    row('womersley-pipe', {'womersley': wo}, 'flowRatio', abs(v), 1e-8)
    row('womersley-pipe', {'womersley': wo}, 'phaseLag', -np.angle(v), 1e-8 if wo >= 0.5 else 1e-6)


# boundary layers
def blasius(shear, end=14.0):
    return solve_ivp(lambda x, y: [y[1], y[2], -y[0] * y[2] / 2], [0, end], [0, 0, shear], rtol=1e-13, atol=1e-15, method='DOP853', dense_output=True)


shear = brentq(lambda s: blasius(s).y[1, -1] - 1, 0.3, 0.36, xtol=1e-15)
layer = blasius(shear)
row('blasius-plate', {}, 'wallShearSimilar', shear)
row('blasius-plate', {}, 'displacementFactor', 14 - layer.y[0, -1])
row('blasius-plate', {'reynolds': 1e4, 'length': 1}, 'boundaryLayerThickness', brentq(lambda e: layer.sol(e)[1] - 0.99, 4, 6, xtol=1e-14) / 100)
for pr in (0.001, 0.01, 0.1, 0.7, 1, 7, 10, 100, 1000):
    q = solve_ivp(lambda e, y: [y[1], y[2], -y[0] * y[2] / 2, np.exp(-pr * y[4] / 2), y[0]], [0, max(12, 60 / np.sqrt(pr))], [0, 0, shear, 0, 0], rtol=1e-13, atol=1e-18, method='DOP853', max_step=1 if pr < 1 else 0.02)
    row('pohlhausen-plate', {'prandtl': pr}, 'heatSimilar', 1 / q.y[3, -1])


def wedge(beta, c=1.0, stag=None):
    L = 10
    rhs = lambda x, y: np.array([y[1], y[2], -c * y[0] * y[2] - beta * (1 - y[1] ** 2)])
    x = np.linspace(0, L, 400); k = 0.7 if beta < 0 else 1.2
    r = solve_bvp(rhs, lambda a, b: np.array([a[0], a[1], b[1] - 1]), x, np.array([x - (1 - np.exp(-k * x)) / k, 1 - np.exp(-k * x), k * np.exp(-k * x)]), tol=1e-10, max_nodes=100000)
    assert r.success
    return r.y[2, 0]


for beta in (-0.1, 0.2, 0.5, 1, 1.6, 2):
    row('falkner-skan-wedge', {'wedgeParameter': beta}, 'wallShearSimilar', wedge(beta))
row('hiemenz-stagnation', {}, 'wallShearSimilar', wedge(1))
row('homann-stagnation', {}, 'wallShearSimilar', wedge(1, 2.0), 2e-8)


def upright(pr):
    L = 20 * max(1, pr ** 0.3) if pr >= 1 else 60 * (0.01 / pr) ** 0.45 * 1.6 if pr < 0.5 else 20
    rhs = lambda s, y: L * np.array([y[1], y[2], -3 * y[0] * y[2] + 2 * y[1] ** 2 - y[3], y[4], -3 * pr * y[0] * y[4]])
    s = np.linspace(0, 1, 600) ** 1.7; e = s * L; k = 0.57 * pr ** 0.3
    y = np.array([0.5 * pr ** -0.3 * (1 - np.exp(-e)), 0.6 * pr ** -0.4 * e * np.exp(-e), 0.64 * pr ** -0.25 * (1 - e) * np.exp(-e), np.exp(-k * e), -k * np.exp(-k * e)])
    r = solve_bvp(rhs, lambda a, b: np.array([a[0], a[1], a[3] - 1, b[1], b[3]]), s, y, tol=1e-8, max_nodes=100000)
    assert r.success, pr
    return -r.y[4, 0], r.y[2, 0], r.sol(np.linspace(0, 1, 40001))[1].max()


for pr in (0.3, 0.71, 0.9, 2, 7, 30):
    heat, wall, peak = upright(pr)
    row('upright-plate-similarity', {'prandtl': pr}, 'heatSimilar', heat, 1e-4)
    row('upright-plate-similarity', {'prandtl': pr}, 'wallShearSimilar', wall, 1e-4)
    row('upright-plate-similarity', {'prandtl': pr, 'grashof': 4, 'length': 1, 'kinematicViscosity': 0.25}, 'peakSpeed', peak, 1e-4)


# bodies: roots by a scan and brentq on library Bessel functions, 200 terms
def body(shape, bi, fo, place):
    f = {'slab': lambda v: v * np.sin(v) - bi * np.cos(v), 'cylinder': lambda v: v * sp.j1(v) - bi * sp.j0(v), 'sphere': lambda v: (1 - bi) * np.sin(v) - v * np.cos(v)}[shape]
    grid = np.arange(1e-6, 200, 0.01); v = f(grid)
    roots = [brentq(f, grid[i], grid[i + 1], xtol=1e-15) for i in np.where(v[:-1] * v[1:] < 0)[0]]
    total = 0
    for q in roots:
        if shape == 'slab': c, m = 4 * np.sin(q) / (2 * q + np.sin(2 * q)), np.cos(q * place)
        elif shape == 'cylinder': c, m = 2 / q * sp.j1(q) / (sp.j0(q) ** 2 + sp.j1(q) ** 2), sp.j0(q * place)
        else: c, m = 4 * (np.sin(q) - q * np.cos(q)) / (2 * q - np.sin(2 * q)), np.sinc(q * place / np.pi)
        total += c * np.exp(-q * q * fo) * m
    return total


for shape in ('slab', 'cylinder', 'sphere'):
    for bi in (0.1, 1, 10, 300):
        for fo in (0.01, 0.2, 1):
            row(f'{shape}-transient', {'biot': bi, 'fourier': fo}, 'centreTemperatureRatio', body(shape, bi, fo, 0))
            row(f'{shape}-transient', {'biot': bi, 'fourier': fo}, 'surfaceTemperatureRatio', body(shape, bi, fo, 1))

given = {'thermalDiffusivity': 1e-6, 'time': 100, 'depth': 0.01, 'thermalConductivity': 1, 'heatTransferCoefficient': 5e4}
root = 0.01
row('half-space-step', given, 'temperatureRatio', sp.erfc(0.5))
row('half-space-step', given, 'temperatureRatioTransfer', sp.erfc(0.5) - np.exp(-0.25) * sp.erfcx(0.5 + 500))
row('half-space-step', given, 'penetrationDepth', 2 * root * sp.erfinv(0.99), 1e-7)

# smooth pipe: library root finder in another variable
for re in (4e3, 1e5, 1e6):
    row('turbulent-pipe', {'reynolds': re}, 'frictionFactorDarcy', brentq(lambda f: 1 / np.sqrt(f) + 2 * np.log10(2.51 / (re * np.sqrt(f))), 1e-3, 0.1, xtol=1e-16))
for re in (5e6, 3e7):
    row('turbulent-pipe', {'reynolds': re}, 'frictionFactorDarcy', brentq(lambda f: 1 / np.sqrt(f) - 1.93 * np.log10(re * np.sqrt(f)) + 0.537, 1e-3, 0.1, xtol=1e-16))

if __name__ == '__main__':
    one_a_line = lambda rows: '[\n' + ',\n'.join('  ' + json.dumps(r) for r in rows) + '\n ]'
    print('{\n "made": %s,\n "kernels": %s,\n "rows": %s\n}' % (json.dumps(f'independent.py, numpy {np.__version__}, scipy {scipy.__version__}'), one_a_line(kernels), one_a_line(rows)))
