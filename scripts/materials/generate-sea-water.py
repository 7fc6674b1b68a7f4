"""The record of sea water.

Run with:  python3 scripts/materials/generate-sea-water.py   (needs iapws 1.5.5, gsw 3.6.23, CoolProp 8.0.0 and numpy)
The coefficient tables of IAPWS R13-08 and SR7-09 are read from the library iapws, which prints them as the releases do: figures
only, none of its text. Viscosity and conductivity are the fits of CoolProp (MIT licence) to Sharqawy et al. 2010.
"""
import inspect
import re

import gsw
import iapws.iapws08
import numpy as np

from importlib import import_module
from record import write

TABLE = import_module('generate-solutions').TABLE


def arrays(method):
    """Lists of numbers in the source of a method, by name."""
    text = inspect.getsource(method)
    return {name: [float(x) for x in re.findall(r'[-+]?[\d.]+(?:e[-+]?\d+)?', body)] for name, body in re.findall(r'(\w+) = \[([^\]]*)\]', text)}


water = arrays(iapws.iapws08.SeaWater._waterSupp)
saline = arrays(iapws.iapws08.SeaWater.saline)
water_rows = [[int(j), int(k), g] for j, k, g in zip(water['J'], water['K'], water['G'])]
saline_rows = [[int(i), int(j), int(k), g] for i, j, k, g in zip(saline['Li'], saline['Lj'], saline['Lk'], saline['G'])]
assert (len(water_rows), len(saline_rows)) == (41, 64)

S = np.linspace(0, 0.12, 41)
freezing = np.array([273.15 + gsw.t_freezing(1000 * s, 0, 0) for s in S])
fit = np.polyfit(S, freezing, 4)
assert abs(np.polyval(fit, S) - freezing).max() < 0.02

mit = TABLE['MITSW']
transport = lambda key, gives, extra: {**extra, 'origin': mit['Tbase'], 'share': mit['xbase'], 'gives': gives, 'rows': mit[key]['coeffs']}
SALT = ['0 %', '12 %']
SHARQAWY = 'Sharqawy, Lienhard and Zubair, Desalin. Water Treat. 16 (2010) 354'
write({
    'name': 'sea water', 'aliases': ['seawater', 'ocean water', 'saline water'], 'kind': 'fluid', 'phases': ['liquid'], 'takes': ['composition'], 'typical': '3.5 %',
    'about': 'the composition is the absolute salinity, the share of sea salt by mass; 3.5 % in the open sea',
    'thermodynamics': {
        'model': 'sea-water',
        'range': [{'T': ['271.15 K', '313.15 K'], 'p': ['1 kPa', '100 MPa'], 'composition': ['0 %', '4.2 %']}, {'T': ['273.15 K', '393.15 K'], 'p': ['1 kPa', '10 MPa'], 'composition': SALT}],
        'uncertainty': {
            'density': [{'T': ['271.15 K', '313.15 K'], 'composition': ['0 %', '4.2 %'], 'p': ['0 Pa', '1 MPa'], 'value': '0.002 %'}, {'T': ['271.15 K', '313.15 K'], 'composition': ['0 %', '4.2 %'], 'value': '0.02 %'}, {'value': '0.1 %'}],
            'specificHeatCapacity': [{'T': ['271.15 K', '313.15 K'], 'composition': ['0 %', '4.2 %'], 'value': '0.05 %'}, {'value': '0.6 %'}],
            'thermalExpansion': [{'T': ['271.15 K', '313.15 K'], 'composition': ['0 %', '4.2 %'], 'value': '0.5 %', 'absolute': '1e-6 1/K'}, {'value': '9 %', 'absolute': '6e-6 1/K'}],
            'speedOfSound': [{'T': ['271.15 K', '313.15 K'], 'composition': ['0 %', '4.2 %'], 'value': '0.02 %'}, {'value': '3 %'}],
            'enthalpy': [{'value': '1 %'}],
        },
        'source': 'IAPWS R13-08(2008), saline part, with IAPWS SR7-09(2009) for liquid water (TEOS-10); above 40 degC or 4.2 % Sharqawy, Lienhard and Zubair, Desalin. Water Treat. 16 (2010) 354, as fitted in CoolProp 8.0.0',
        'notes': 'above 40 degC or 4.2 % the speed of sound is an estimate from the compressibility of water',
        'checks': [
            {'property': 'density', 'at': {'T': '25 degC', 'p': '101325 Pa', 'composition': 0.04}, 'expect': '1026.982 kg/m^3', 'within': '0.001 %', 'source': 'IOC, SCOR and IAPSO, Manuals and Guides 56 (2010), evaluated'},
            {'property': 'density', 'at': {'T': '278.1488 K', 'p': '100.101325 MPa', 'composition': 0.03516504}, 'expect': '1069.48914 kg/m^3', 'within': '0.002 %', 'source': 'Fofonoff and Millard, Unesco Tech. Pap. Mar. Sci. 44 (1983), EOS-80'},
            {'property': 'density', 'at': {'T': '298.144 K', 'p': '100.101325 MPa', 'composition': 0.03516504}, 'expect': '1062.53817 kg/m^3', 'within': '0.002 %', 'source': 'Fofonoff and Millard, Unesco Tech. Pap. Mar. Sci. 44 (1983), EOS-80'},
        ],
        'constants': {'water': water_rows, 'saline': saline_rows, 'density': transport('density', 'kg/m^3', {}), 'heatCapacity': transport('specific_heat', 'J/(kg K)', {})},
    },
    'viscosity': {'model': 'mixture-polynomial', 'range': {'T': ['273.15 K', '393.15 K'], 'p': ['0 Pa', '5 MPa'], 'composition': SALT}, 'uncertainty': '2 %', 'source': f'{SHARQAWY}, as fitted in CoolProp 8.0.0',
                  'checks': [{'at': {'T': '25 degC', 'composition': 0.05}, 'expect': '0.99252 mPa s', 'within': '1 %', 'source': f'{SHARQAWY}, eq. (22), evaluated'}],
                  'constants': transport('viscosity', 'Pa s', {'of': 'logarithm'})},
    'thermalConductivity': {'model': 'mixture-polynomial', 'range': {'T': ['273.15 K', '393.15 K'], 'p': ['0 Pa', '5 MPa'], 'composition': SALT}, 'uncertainty': '3 %', 'source': 'Jamieson and Tudhope, Desalination 8 (1970) 393, form of Sharqawy et al. (2010), as fitted in CoolProp 8.0.0',
                            'constants': transport('conductivity', 'W/(m K)', {})},
    'vapourPressure': {'model': 'lowered-vapour-pressure', 'range': {'T': ['273.16 K', '453.15 K'], 'composition': SALT}, 'uncertainty': '1 %',
                       'source': f'{SHARQAWY}, eq. (26), with the vapour pressure of water of Wagner and Pruss, J. Phys. Chem. Ref. Data 31 (2002) 387',
                       'constants': {'factor': 0.57357, 'temperature': '647.096 K', 'pressure': '22.064 MPa', 'terms': [[-7.85951783, 1], [1.84408259, 1.5], [-11.7866497, 3], [22.6807411, 3.5], [-15.9618719, 4], [1.80122502, 7.5]]}},
    'meltingTemperature': {'model': 'mixture-polynomial', 'range': {'p': ['0 Pa', '1 MPa'], 'composition': SALT}, 'uncertainty': '0.1 %', 'source': 'freezing temperature of TEOS-10 from gsw 3.6.23, air-free, fitted within 0.02 K', 
                           'constants': {'origin': 273.15, 'share': 0, 'gives': 'K', 'rows': [[float(f'{c:.7g}') for c in fit[::-1]]]}},
}, 'generate-sea-water.py from the coefficients of IAPWS R13-08 and SR7-09, gsw 3.6.23 and CoolProp 8.0.0')
