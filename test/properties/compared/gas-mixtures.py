"""Writes gas-mixtures.csv: states of gases by composition from independent references, held to the declared uncertainties.

Run with:  python3 test/properties/compared/gas-mixtures.py   (needs CoolProp 8.0.0 and cantera 3.2.0)
A material is a record, or `record of component share + component share` by mole. Each row names its reference:
  heos       multi-fluid Helmholtz energies of CoolProp (GERG-2008 of Kunz and Wagner 2012 and its kin): the thin gases are of the same works
             as those of the records, the departure under pressure is theirs alone
  pure       transport correlation of the pure fluid in CoolProp: one gas that goes through the rules of the mixtures
  lge        Lee, Gonzalez and Eakin, J. Pet. Technol. 18 (1966) 997: viscosity of natural gases, measured from 7 to 550 bar
  multi      multicomponent conductivity, viscosity (mixed by the same rule of Wilke, of other pure gases) and heat capacities of GRI-Mech 3.0,
             evaluated by Cantera 3.2.0
  rp-1485    dew point of compressed air by ASHRAE RP-1485, evaluated by CoolProp
"""
import csv
import math
import os

import cantera
import CoolProp.CoolProp as CP

HERE = os.path.dirname(os.path.abspath(__file__))
ROWS = []
NAMES = {'methane': 'Methane', 'ethane': 'Ethane', 'propane': 'n-Propane', 'n-butane': 'n-Butane', 'ethylene': 'Ethylene', 'nitrogen': 'Nitrogen', 'oxygen': 'Oxygen', 'argon': 'Argon', 'helium': 'Helium', 'hydrogen': 'Hydrogen', 'carbon monoxide': 'CarbonMonoxide', 'carbon dioxide': 'CarbonDioxide', 'water': 'Water', 'hydrogen sulphide': 'HydrogenSulfide', 'sulphur hexafluoride': 'SulfurHexafluoride'}
PRESSURES = (1e5, 1e6, 3e6, 6e6, 1e7)


def add(material, prop, T, p, value, reference):
    ROWS.append([material, prop, f'{T:.6g}', f'{p:.7g}', '', f'{value:.7g}', reference])


def between(low, high, n):
    return [low + (high - low) * i / (n - 1) for i in range(n)]


def named(shares):
    return 'gas mixture of ' + ' + '.join(f'{name} {100 * x:g} %' for name, x in shares.items())


def heos(material, shares, low, high, pressures=PRESSURES, n=7):
    state = CP.AbstractState('HEOS', '&'.join(NAMES[name] for name in shares))
    if len(shares) > 1:
        state.set_mole_fractions(list(shares.values()))
    state.specify_phase(CP.iphase_gas)
    for p in pressures:
        for T in between(low, high, n):
            state.update(CP.PT_INPUTS, p, T)
            for prop, value in (('density', state.rhomass()), ('specificHeatCapacity', state.cpmass()), ('speedOfSound', state.speed_sound()), ('thermalExpansion', state.isobaric_expansion_coefficient())):
                add(material, prop, T, p, value, 'heos')


# The lowest temperatures are above the dew point at every pressure of the row.
heos('natural gas', {'methane': 0.93, 'ethane': 0.04, 'propane': 0.01, 'nitrogen': 0.01, 'carbon dioxide': 0.01}, 255, 600)
heos('biogas', {'methane': 0.60, 'carbon dioxide': 0.36, 'water': 0.03, 'nitrogen': 0.01}, 440, 600)
heos('flue gas', {'nitrogen': 0.716, 'carbon dioxide': 0.087, 'water': 0.172, 'oxygen': 0.017, 'argon': 0.008}, 500, 1200)
heos('coal flue gas', {'nitrogen': 0.745, 'carbon dioxide': 0.140, 'water': 0.065, 'oxygen': 0.041, 'argon': 0.009}, 450, 1200)
heos('exhaled air', {'nitrogen': 0.746, 'oxygen': 0.155, 'carbon dioxide': 0.040, 'water': 0.050, 'argon': 0.009}, 308, 323, (1e5, 1.5e5), 15)
for shares, low, high in (
    ({'methane': 0.62, 'carbon dioxide': 0.38}, 280, 600),
    ({'methane': 0.82, 'ethane': 0.09, 'propane': 0.04, 'n-butane': 0.01, 'nitrogen': 0.02, 'carbon dioxide': 0.02}, 285, 600),
    ({'methane': 0.8, 'hydrogen sulphide': 0.2}, 320, 600),
    ({'methane': 0.6, 'ethane': 0.25, 'propane': 0.15}, 310, 600),
    ({'hydrogen': 0.2, 'methane': 0.8}, 260, 600),
    ({'hydrogen': 0.75, 'nitrogen': 0.25}, 260, 900),
    ({'hydrogen': 0.5, 'carbon dioxide': 0.5}, 300, 900),
    ({'hydrogen': 0.6, 'carbon monoxide': 0.3, 'carbon dioxide': 0.1}, 280, 500),
    ({'nitrogen': 0.7, 'carbon dioxide': 0.3}, 280, 900),
    ({'nitrogen': 0.1, 'carbon dioxide': 0.9}, 340, 900),
    ({'nitrogen': 0.781, 'oxygen': 0.21, 'argon': 0.009}, 210, 900),
    ({'helium': 0.8, 'oxygen': 0.2}, 260, 900),
    ({'argon': 0.8, 'carbon dioxide': 0.2}, 260, 900),
    ({'nitrogen': 0.7, 'ethylene': 0.3}, 290, 450),
    ({'nitrogen': 0.8, 'propane': 0.2}, 340, 600),
    ({'water': 0.4, 'nitrogen': 0.6}, 540, 1000),
    ({'methane': 1}, 230, 600), ({'carbon dioxide': 1}, 330, 900), ({'hydrogen': 1}, 260, 900), ({'helium': 1}, 260, 900), ({'nitrogen': 1}, 210, 900), ({'ethane': 1}, 340, 600),
):
    heos(named(shares), shares, low, high)

# The named records with other compositions that go by their names.
for record, shares, low in (
    ('natural gas', {'methane': 0.82, 'ethane': 0.09, 'propane': 0.04, 'n-butane': 0.01, 'nitrogen': 0.02, 'carbon dioxide': 0.02}, 285),
    ('natural gas', {'hydrogen': 0.2, 'methane': 0.8}, 260),
    ('natural gas', {'methane': 0.86, 'nitrogen': 0.14}, 255),
    ('natural gas', {'methane': 0.8, 'hydrogen sulphide': 0.2}, 320),
    ('biogas', {'methane': 0.62, 'carbon dioxide': 0.38}, 285),
    ('flue gas', {'nitrogen': 0.85, 'carbon dioxide': 0.15}, 280),
):
    heos(named(shares).replace('gas mixture', record), shares, low, 600)

for name, low, high in (('methane', 230, 600), ('nitrogen', 210, 900), ('carbon dioxide', 330, 900), ('argon', 230, 900), ('oxygen', 230, 900), ('hydrogen', 260, 900), ('helium', 260, 900), ('ethane', 340, 600), ('propane', 400, 600), ('sulphur hexafluoride', 340, 550)):
    for p in PRESSURES:
        for T in between(low, high, 7):
            for prop, letter in (('viscosity', 'V'), ('thermalConductivity', 'L')):
                add(named({name: 1}), prop, T, p, CP.PropsSI(letter, 'T', T, 'P', p, NAMES[name]), 'pure')

# At 10 bar and above 380 K this law lies more than 4 % above the reference correlation of methane itself.
GAS = {'methane': 0.93, 'ethane': 0.04, 'propane': 0.01, 'nitrogen': 0.01, 'carbon dioxide': 0.01}
state = CP.AbstractState('HEOS', '&'.join(NAMES[name] for name in GAS))
state.set_mole_fractions(list(GAS.values()))
state.specify_phase(CP.iphase_gas)
for p in (1e6, 3e6, 5e6, 7e6, 1e7):
    for T in between(300, 370, 8):
        state.update(CP.PT_INPUTS, p, T)
        M, rankine, rho = 1000 * state.molar_mass(), 1.8 * T, state.rhomass() / 1000
        X = 3.5 + 986 / rankine + 0.01 * M
        K = (9.4 + 0.02 * M) * rankine**1.5 / (209 + 19 * M + rankine)
        add('natural gas', 'viscosity', T, p, 1e-7 * K * math.exp(X * rho ** (2.4 - 0.2 * X)), 'lge')

gas = cantera.Solution('gri30.yaml')
gas.transport_model = 'multicomponent'
GRI = {'methane': 'CH4', 'ethane': 'C2H6', 'propane': 'C3H8', 'nitrogen': 'N2', 'oxygen': 'O2', 'argon': 'AR', 'hydrogen': 'H2', 'carbon monoxide': 'CO', 'carbon dioxide': 'CO2', 'water': 'H2O'}
for material, shares, low, high in (
    ('natural gas', GAS, 300, 600),
    ('biogas', {'methane': 0.60, 'carbon dioxide': 0.36, 'water': 0.03, 'nitrogen': 0.01}, 330, 600),
    (None, {'nitrogen': 0.7, 'carbon dioxide': 0.3}, 300, 1400),
    (None, {'nitrogen': 0.5, 'oxygen': 0.5}, 300, 1000),
    (None, {'argon': 0.8, 'carbon dioxide': 0.2}, 300, 1000),
    (None, {'carbon monoxide': 0.5, 'nitrogen': 0.5}, 300, 500),
    (None, {'methane': 0.5, 'nitrogen': 0.5}, 300, 680),
    (None, {'propane': 0.3, 'nitrogen': 0.7}, 300, 700),
    (None, {'ethane': 0.3, 'nitrogen': 0.7}, 300, 740),
    (None, {'hydrogen': 0.5, 'nitrogen': 0.5}, 300, 1400),
    (None, {'hydrogen': 0.3, 'carbon dioxide': 0.7}, 300, 1400),
    (None, {'hydrogen': 0.2, 'methane': 0.8}, 300, 680),
    (None, {'hydrogen': 0.5, 'carbon monoxide': 0.5}, 300, 540),
):
    for T in between(low, high, 10):
        gas.TPX = T, 101325, {GRI[name]: x for name, x in shares.items()}
        for prop, value in (('density', gas.density_mass), ('specificHeatCapacity', gas.cp_mass), ('viscosity', gas.viscosity), ('thermalConductivity', gas.thermal_conductivity)):
            add(material or named(shares), prop, T, 101325, value, 'multi')

AIR = {'nitrogen': 0.7812, 'oxygen': 0.2096, 'argon': 0.0092}
for share in (0.002, 0.01, 0.03):
    for p in (1e5, 3e5, 1e6, 2e6, 4e6, 6e6, 1e7):
        dew = CP.HAPropsSI('Tdp', 'psi_w', share, 'P', p, 'T', 450)
        if 274 < dew < 440:
            wet = {**{name: round(x * (1 - share), 6) for name, x in AIR.items()}, 'water': share}
            add(named(wet), 'saturationTemperature', 450, p, dew, 'rp-1485')

# Along the dew line, 1 K to 40 K above it.
for shares in ({'methane': 0.21, 'ethane': 0.79}, {'carbon dioxide': 0.5, 'hydrogen sulphide': 0.5}, {'carbon dioxide': 0.7, 'hydrogen sulphide': 0.3}, {'propane': 0.8, 'methane': 0.2}):
    state = CP.AbstractState('HEOS', '&'.join(NAMES[name] for name in shares))
    state.set_mole_fractions(list(shares.values()))
    for p in (7.8e5, 1.7e6, 2.66e6, 4.45e6):
        state.unspecify_phase()
        state.update(CP.PQ_INPUTS, p, 1)
        dew = state.T()
        state.specify_phase(CP.iphase_gas)
        for above in (1, 6, 15, 40) if p < 4e6 else (6, 15, 40):  # the cubic equation has its dew line within about 5 K
            state.update(CP.PT_INPUTS, p, dew + above)
            for prop, value in (('density', state.rhomass()), ('specificHeatCapacity', state.cpmass()), ('speedOfSound', state.speed_sound()), ('thermalExpansion', state.isobaric_expansion_coefficient())):
                add(named(shares), prop, dew + above, p, value, 'heos')

with open(os.path.join(HERE, 'gas-mixtures.csv'), 'w', newline='') as out:
    writer = csv.writer(out, lineterminator='\n')
    writer.writerow(['material', 'property', 'T [K]', 'p [Pa]', 'share', 'value [SI]', 'reference'])
    writer.writerows(ROWS)
print(len(ROWS))
