"""Syrups of 50 % to 75 % sucrose, from memory: polynomials through two published laws.

Density: Emmerich, Zuckerindustrie 119 (1994) 120, the law that ICUMSA adopted. Viscosity: Mathlouthi and Genotelle, in Sucrose: Properties and Applications (1995), from 0 to 80 degC.
"""
import math

import numpy

PRESSURES = ['0 Pa', '5 MPa']
ORIGIN, MIDDLE = 293.15, 0.6
TABLE = 'NBS Circular 440 (1942), from memory'


def emmerich(t, w):
    """Density [kg/m^3] at t degC; the terms of second order in temperature beyond the first two are left out."""
    water = ((((((-2.8054253e-10 * t + 1.0556302e-7) * t - 4.6170461e-5) * t - 0.0079870401) * t + 16.945176) * t + 999.83952) / (1 + 0.01687985 * t))
    u = (t - 20) / 100
    of_share = (385.1761, 135.3705, 40.9299, -3.9643, 13.4853, -17.2890)
    of_heat = (-46.2720, -7.1720, 1.1597, 5.1126, 17.5254)
    return water + sum(b * w ** (i + 1) for i, b in enumerate(of_share)) + u * sum(c * w ** (i + 1) for i, c in enumerate(of_heat)) + u * u * (59.7712 * w + 7.2491 * w * w)


def genotelle(t, w):
    """Viscosity [Pa s] at t degC."""
    n = 100 * w / (1900 - 1800 * w)
    return 1e-3 * 10 ** (22.46 * n - 0.114 + (30 - t) / (91 + t) * (1.1 + 43.1 * n ** 1.25))


def fitted(law, high, orders):
    """Coefficients by powers of temperature and share, and the largest relative misfit (of the logarithm: the misfit itself)."""
    points = [(t, w, law(t, w)) for t in numpy.linspace(10, high, 36) for w in numpy.linspace(0.5, 0.75, 26)]
    powers = [(i, j) for i in range(orders[0]) for j in range(orders[1])]
    matrix = numpy.array([[(t - 20) ** i * (w - MIDDLE) ** j for i, j in powers] for t, w, _ in points])
    wanted = numpy.array([y for _, _, y in points])
    found = numpy.linalg.lstsq(matrix, wanted, rcond=None)[0]
    rows = [[float(f'{found[powers.index((i, j))]:.7g}') for j in range(orders[1])] for i in range(orders[0])]
    return rows, float(numpy.max(numpy.abs(matrix @ found - wanted)))


def entry(low, high, uncertainty, source, rows, gives, checks, **more):
    return {'model': 'mixture-polynomial', 'range': {'T': ['283.15 K', high], 'p': PRESSURES, 'composition': [low, '75 %']}, 'uncertainty': uncertainty, 'source': source, 'checks': checks,
            'constants': {'origin': ORIGIN, 'share': MIDDLE, **more, 'gives': gives, 'rows': rows}}


def check(x, value, within):
    return {'at': {'T': '20 degC', 'composition': x}, 'expect': value, 'within': within, 'source': TABLE}


thick, misfit = fitted(lambda t, w: math.log(genotelle(t, w)), 80, (5, 6))
assert misfit < 0.01, misfit
heavy, offset = fitted(emmerich, 80, (4, 4))
assert offset < 0.3, offset
DENSITY = entry('50 %', '353.15 K', '0.3 %', 'Emmerich, Zuckerindustrie 119 (1994) 120, adopted by ICUMSA, from memory, as a polynomial', heavy, 'kg/m^3', [check(0.6, '1286.46 kg/m^3', '0.2 %'), check(0.75, '1378.97 kg/m^3', '0.2 %')])
VISCOSITY = entry('50 %', '353.15 K', '10 %', 'Mathlouthi and Genotelle, in Sucrose: Properties and Applications (1995), from memory, as a polynomial within 1 %', thick, 'Pa s', [check(0.6, '58.49 mPa s', '6 %'), check(0.7, '481.6 mPa s', '8 %'), check(0.75, '2328 mPa s', '10 %')], of='logarithm')
