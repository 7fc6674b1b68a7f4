"""Sulphuric acid beyond the laws of Laliberte: polynomials through printed tables, all from memory.

Densities and heat capacities at 20 degC of Perry's Chemical Engineers' Handbook, 8th ed. (2007), tables 2-107 and 2-184 (Socolik); conductivity at 30 degC there for 60 % and 90 %;
viscosity at 25 degC by Rhodes and Barbour, Ind. Eng. Chem. 15 (1923) 850, and its fall to 100 degC by producers of 98 % acid.
"""
import numpy

from record import K

MIDDLE = 0.9
DENSITY = ((78, 1704.3), (80, 1727.2), (82, 1749.1), (84, 1769.3), (85, 1778.6), (86, 1787.2), (88, 1802.2), (90, 1814.4), (92, 1824.0), (94, 1831.2), (95, 1833.7), (96, 1835.5), (97, 1836.4), (98, 1836.1), (99, 1834.2))
CALORIES = ((84.48, 0.4408), (85.48, 0.4346), (89.36, 0.4016), (91.81, 0.3787), (94.82, 0.3554), (97.44, 0.3404), (100, 0.3352))
VISCOSITY = ((78, 15.3), (80, 16.7), (82, 18.0), (84, 18.9), (86, 19.2), (88, 19.0), (90, 18.7), (92, 18.6), (94, 19.0), (96, 20.2), (98, 22.3), (100, 24.5))


def in_share(table, degree, change=lambda y: y):
    return [float(f'{c:.7g}') for c in numpy.polyfit([x / 100 - MIDDLE for x, _ in table], [change(y) for _, y in table], degree)[::-1]]


def entry(low, T, uncertainty, source, origin, gives, rows, checks, **more):
    return {'model': 'mixture-polynomial', 'range': {'T': K(*T), 'p': ['0 Pa', '5 MPa'], 'composition': [low, '98.5 %']}, 'uncertainty': uncertainty, 'source': f'{source}, from memory', **({'checks': checks} if checks else {}),
            'constants': {'origin': origin, 'share': MIDDLE, **more, 'gives': gives, 'rows': rows}}


def check(t, x, value, within, source):
    return {'at': {'T': f'{t} degC', 'composition': x}, 'expect': value, 'within': within, 'source': f'{source}, from memory'}


ENTRIES = {
    'density': entry('78.2 %', (283.15, 373.15), '0.6 %', "Perry's Chemical Engineers' Handbook, 8th ed. (2007), table 2-107, at 20 degC; slope with temperature 1.03 kg/(m^3 K)", 293.15, 'kg/m^3', [in_share(DENSITY, 5), [-1.03]],
                     [check(15, 0.93, '1833.2 kg/m^3', '0.6 %', 'Ferguson and Talbot, Baume table of sulphuric acid (1904), 66 degrees Be')]),
    'viscosity': entry('78.2 %', (283.15, 373.15), [{'T': ['283.15 K', '333.15 K'], 'value': '15 %'}, {'value': '20 %'}], 'Rhodes and Barbour, Ind. Eng. Chem. 15 (1923) 850, at 25 degC; its fall with temperature by producers of 98 % acid', 298.15, 'Pa s', [in_share(VISCOSITY, 5, lambda y: float(numpy.log(1e-3 * y))), [-0.03677], [1.61e-4]],
                       [check(25, 0.98, '23 mPa s', '15 %', 'handbooks of sulphuric acid'), check(20, 0.95, '23.5 mPa s', '15 %', 'Bright, Hutchinson and Smith, J. Soc. Chem. Ind. 65 (1946) 385')], of='logarithm'),
    'specificHeatCapacity': entry('88 %', (283.15, 373.15), '5 %', "Socolik, table 2-184 of Perry's Chemical Engineers' Handbook, 8th ed. (2007), at 20 degC; slope with temperature that of the pure acid", 293.15, 'J/(kg K)', [in_share(CALORIES, 4, lambda y: 4186.8 * y), [2.0]],
                                  [{'at': {'T': '25 degC', 'composition': 0.985}, 'expect': '1416 J/(kg K)', 'within': '5 %', 'source': 'CRC Handbook of Chemistry and Physics, the pure acid, 138.9 J/(mol K), as chemicals 1.5.2 carries it'}]),
    'thermalConductivity': entry('78 %', (283.15, 373.15), '12 %', "Perry's Chemical Engineers' Handbook, 8th ed. (2007), 0.433 W/(m K) at 60 % and 0.363 W/(m K) at 90 % and 30 degC, which the slope carries on to 98 %; slope with temperature that of weaker acid", 303.15, 'W/(m K)', [[0.363, -0.18], [0.0006]], []),
}
