"""Writes independent.json: properties from two other libraries, for comparison within the declared uncertainties.

Run with:  python3 test/properties/independent.py  (needs CoolProp 8.0.0 and iapws 1.5.5)
Water: CoolProp evaluates IAPWS-95 with IAPWS R12-08 and R15-11; iapws evaluates IF97 with the same transport releases.
Air: Lemmon et al. 2000; nitrogen: Span et al. 2000; oxygen: Schmidt and Wagner 1985; argon: Tegeler et al. 1999;
carbon dioxide: Span and Wagner 1996; their transport: Lemmon and Jacobsen 2004, Laesecke and Muzny 2017, Huber et al. 2016.
Humid air: ASHRAE RP-1485 (Herrmann et al. 2009). Glycol-water: Melinder 2010.
"""
import json
import math
import os

import CoolProp
import iapws
from CoolProp.CoolProp import PropsSI
from CoolProp.HumidAirProp import HAPropsSI

KEYS = {
    'density': 'D', 'viscosity': 'V', 'thermalConductivity': 'L', 'specificHeatCapacity': 'C',
    'thermalExpansion': 'isobaric_expansion_coefficient', 'speedOfSound': 'A', 'compressibilityFactor': 'Z',
}


def digits(value):
    return float(f'{value:.9g}')


def spread(low, high, n, log=False):
    if log:
        return [low * (high / low) ** (i / (n - 1)) for i in range(n)]
    return [low + (high - low) * i / (n - 1) for i in range(n)]


rows = []


def add(library, material, T, p, values, **more):
    good = {k: digits(v) for k, v in values.items() if v is not None and math.isfinite(v)}
    if good:
        rows.append({'library': library, 'material': material, 'T': digits(T), 'p': digits(p), **more, 'values': good})


def single(material, fluid, temperatures, pressures):
    for T in temperatures:
        for p in pressures:
            values = {}
            for name, key in KEYS.items():
                try:
                    values[name] = PropsSI(key, 'T', T, 'P', p, fluid)
                except ValueError:
                    pass
            if 'density' in values and 'compressibilityFactor' in values and PropsSI('Phase', 'T', T, 'P', p, fluid) in (0.0, 3.0):
                del values['compressibilityFactor']
            add('CoolProp', material, T, p, values)


def saturation(material, fluid, temperatures):
    for T in temperatures:
        p = PropsSI('P', 'T', T, 'Q', 0, fluid)
        values = {'vapourPressure': p, 'latentHeat': PropsSI('H', 'T', T, 'Q', 1, fluid) - PropsSI('H', 'T', T, 'Q', 0, fluid)}
        try:
            values['surfaceTension'] = PropsSI('I', 'T', T, 'Q', 0, fluid)
        except ValueError:
            pass
        add('CoolProp', material, T, p * 1.0001, values)


single('water', 'Water', spread(274, 620, 9) + [690, 800, 1000, 1070], [2e3, 1.01325e5, 1e6, 5e6, 2e7, 3e7, 6e7, 1e8])
single('water', 'Water', [300, 400, 600, 900, 1200], [2e8, 4e8])
single('water', 'Water', [1100, 1200, 1270], [1e5, 1e6, 1e7, 4e7])
single('water', 'Water', [640, 645, 650, 660, 680], [2.0e7, 2.3e7, 2.6e7, 3.0e7])
single('air', 'Air', [70, 100, 125, 140, 160, 200, 250, 300, 400, 600, 1000, 1500, 1990], [1e4, 1.01325e5, 1e6, 1e7, 5e7])
single('nitrogen', 'Nitrogen', [70, 90, 110, 150, 200, 300, 500, 1000, 1900], [1e4, 1.01325e5, 1e6, 1e7, 5e7])
single('oxygen', 'Oxygen', [70, 110, 140, 180, 250, 300, 500, 900], [1e4, 1.01325e5, 1e6, 1e7, 5e7])
single('argon', 'Argon', [95, 120, 140, 180, 250, 300, 500, 900, 1900], [1e4, 1.01325e5, 1e6, 1e7, 5e7])
single('carbon dioxide', 'CarbonDioxide', [220, 250, 280, 300, 310, 330, 400, 600, 1000], [1e4, 1.01325e5, 1e6, 5e6, 1e7, 5e7])
saturation('water', 'Water', spread(274, 638, 22))
for name, fluid, low, high in (('nitrogen', 'Nitrogen', 64, 124), ('oxygen', 'Oxygen', 56, 152), ('argon', 'Argon', 85, 148), ('carbon dioxide', 'CarbonDioxide', 217, 301)):
    saturation(name, fluid, spread(low, high, 20))

for T in (275, 290, 305, 320, 335, 350, 365, 400, 450):
    for p in (6e4, 1.01325e5, 2e5):
        for RH in (0.1, 0.5, 0.95):
            if RH * PropsSI('P', 'T', T, 'Q', 0, 'Water') > 0.9 * p:
                continue
            state = ('T', T, 'P', p, 'RH', RH)
            W = HAPropsSI('W', *state)
            add('CoolProp', 'humid air', T, p, {
                'density': (1 + W) / HAPropsSI('Vda', *state), 'specificHeatCapacity': HAPropsSI('cp_ha', *state),
                'viscosity': HAPropsSI('mu', *state), 'thermalConductivity': HAPropsSI('k', *state),
                'saturationTemperature': HAPropsSI('Tdp', *state) if T < 370 and HAPropsSI('Tdp', *state) > 273.3 else None,
            }, humidity=RH)

for name, fluid in (('ethylene glycol-water', 'MEG'), ('propylene glycol-water', 'MPG')):
    for T in (270, 290, 310, 340, 370):
        for x in (0.1, 0.25, 0.4, 0.55):
            if T < PropsSI('T_FREEZE', 'T', 300, 'P', 1e5, f'INCOMP::{fluid}[{x}]') + 1:
                continue
            add('CoolProp', name, T, 1e5, {k: PropsSI(v, 'T', T, 'P', 1e5, f'INCOMP::{fluid}[{x}]') for k, v in (('density', 'D'), ('viscosity', 'V'), ('thermalConductivity', 'L'), ('specificHeatCapacity', 'C'))}, composition=x)

for T in spread(275, 1060, 12):
    for p in (0.01, 0.101325, 1.0, 10.0, 50.0):
        s = iapws.IAPWS97(T=T, P=p)
        add('iapws', 'water', T, p * 1e6, {'density': s.rho, 'specificHeatCapacity': s.cp * 1e3, 'speedOfSound': s.w, 'thermalExpansion': s.alfav, 'viscosity': s.mu, 'thermalConductivity': s.k})

document = {'libraries': {'CoolProp': CoolProp.__version__, 'iapws': iapws.__version__}, 'rows': rows}
path = os.path.join(os.path.dirname(os.path.abspath(__file__)), 'independent.json')
with open(path, 'w') as out:
    out.write('{"libraries":' + json.dumps(document['libraries']) + ',\n"rows":[\n' + ',\n'.join(json.dumps(r) for r in rows) + '\n]}\n')
print(len(rows))
