"""Writes more.csv: saturation of the commonest fluids, freezing points and vapour pressures of solutions, transport and tension of fluids of one handbook.

Run with:  python3 test/properties/compared/more.py   (needs CoolProp 8.0.0, thermo 0.6.1, chemicals 1.5.2, gsw 3.6.23, absorptionlib 1.1.0, PyYAML)
  teos-10         Gibbs function of sea water, IOC, SCOR and IAPSO 2010, evaluated by gsw 3.6.23: freezing, and vapour pressure from the chemical potential of the water
  unifac          UNIFAC of Fredenslund et al. (1975), activity of water by groups, evaluated by thermo 0.6.1, vapour pressure of water by CoolProp 8.0.0
  norrish         Norrish, J. Food Technol. 1 (1966) 25, activity of water over sucrose and glycerol, vapour pressure of water by CoolProp 8.0.0 (from memory)
  pitzer          Pitzer and Mayorga, J. Phys. Chem. 77 (1973) 2300, osmotic coefficients at 25 degC, vapour pressure of water by CoolProp 8.0.0 (from memory)
  emmerich        Emmerich, Zuckerindustrie 119 (1994) 120, density of sucrose solutions (from memory)
  mulero          Mulero, Cachadina and Parra, J. Phys. Chem. Ref. Data 41 (2012) 043105, surface tensions, as chemicals 1.5.2 carries it
  somayajulu      Somayajulu, Int. J. Thermophys. 9 (1988) 559, surface tensions to the critical point, as chemicals 1.5.2 carries it
  jasper fits     Jasper, J. Phys. Chem. Ref. Data 1 (1972) 841, surface tensions, as chemicals 1.5.2 carries it
  lucas           Lucas, rule of corresponding states for the viscosity of gases, evaluated by chemicals 1.5.2
  eucken          modified Eucken rule, conductivity of gases from the viscosity by Lucas and the heat capacity by Poling et al., evaluated by chemicals and thermo
  hydrogen scaled viscosity of hydrogen times the root of two, conductivity over it, by CoolProp 8.0.0
  zabransky sat   Zabransky et al., critical compilation of heat capacities, as thermo 0.6.1 evaluates it
  dew line        water at its share of the pressure, by CoolProp 8.0.0
  sobolev         Sobolev (2007), viscosity of lead-bismuth (from memory)
  beret-prausnitz Beret and Prausnitz (1975), volume of polydimethylsiloxane, 1.0079 exp(9.121e-4 t) cm^3/g (from memory)
"""
import math
import os
import sys
import warnings

import chemicals
import gsw
from absorptionlib import NaOH
from chemicals import interface
from chemicals.viscosity import Lucas_gas
from chemicals.thermal_conductivity import Eucken_modified
from CoolProp.CoolProp import PropsSI
from thermo import HeatCapacityGas, HeatCapacityLiquid
from thermo.unifac import UNIFAC

from table import HERE, Table, between, declared, record

sys.path.insert(0, os.path.join(HERE, '..', '..', '..', 'scripts', 'materials'))
from syrup import emmerich  # noqa: E402

warnings.simplefilter('ignore')
table = Table('more')
pw = lambda T: PropsSI('P', 'T', T, 'Q', 0, 'Water')
LETTERS = {'density': 'D', 'thermalConductivity': 'L', 'specificHeatCapacity': 'C'}


def grid(material, prop, reference, law, low, high, least, most, nT=7, nx=5, p=None):
    for T in between(low, high, nT):
        for x in between(least, most, nx):
            value = law(T, x)
            if value == value:
                table.add(material, prop, T, x, value, reference, p)


def percents(material, prop):
    box = record(material)[prop]['range']['composition']
    return [float(end.split()[0]) / 100 for end in box]


# The saturation line, by another program of the same equation.
for material, name in (('water', 'Water'), ('argon', 'Argon'), ('nitrogen', 'Nitrogen'), ('oxygen', 'Oxygen'), ('carbon dioxide', 'CarbonDioxide')):
    Tt, Tc = PropsSI('Ttriple', name), PropsSI('Tcrit', name)
    for T in between(Tt + 0.02 * (Tc - Tt), Tt + 0.93 * (Tc - Tt), 32):
        p = 1.05 * PropsSI('P', 'T', T, 'Q', 0, name)
        heat = PropsSI('Hmass', 'T', T, 'Q', 1, name) - PropsSI('Hmass', 'T', T, 'Q', 0, name)
        for prop, value in (('vapourPressure', p / 1.05), ('latentHeat', heat), ('surfaceTension', PropsSI('I', 'T', T, 'Q', 0, name))):
            table.add(material, prop, T, None, value, 'CoolProp 8.0.0', p)
for material in ('R-410A', 'R-404A', 'R-507A'):
    name = material.replace('-', '')
    for T in between(215, 0.93 * PropsSI('Tcrit', name), 32):
        heat = PropsSI('Hmass', 'T', T, 'Q', 1, name) - PropsSI('Hmass', 'T', T, 'Q', 0, name)
        table.add(material, 'latentHeat', T, None, heat, 'CoolProp 8.0.0', 1.1 * PropsSI('P', 'T', T, 'Q', 0, name))

# Freezing: the state is a warm one, the temperature does not enter.
for x in between(0.002, 0.042, 32):
    table.add('sea water', 'meltingTemperature', 285, x, 273.15 + gsw.t_freezing(1000 * x, 0, 0), 'teos-10')
for material, key, name, least, most in (('sodium chloride brine', 'VNA', 'vdi', 0.09, 0.22), ('calcium chloride brine', 'VCA', 'vdi', 0.15, 0.28), ('magnesium chloride brine', 'VMG', 'vdi', 0.09, 0.2), ('methanol-water', 'VMA', 'vdi', 0.11, 0.45)):
    for x in between(least, most, 32):
        table.add(material, 'meltingTemperature', 293, x, PropsSI('T_FREEZE', 'T', 270, 'P', 101325, f'INCOMP::{key}[{x}]'), name)
for material, key, pure in (('ethylene glycol-water', 'AEG', 1113.0), ('propylene glycol-water', 'APG', 1036.0)):
    for w in between(0.12, 0.55, 32):
        table.add(material, 'meltingTemperature', 293, w, PropsSI('T_FREEZE', 'T', 300, 'P', 101325, f'INCOMP::{key}[{w / pure / (w / pure + (1 - w) / 998.2)}]'), 'ashrae')

# Vapour pressure over solutions.
for T in between(274, 313, 7):
    for x in between(0.005, 0.041, 5):
        drop = gsw.chem_potential_water_t_exact(1000 * x, T - 273.15, 0) - gsw.chem_potential_water_t_exact(0, T - 273.15, 0)
        table.add('sea water', 'vapourPressure', T, x, pw(T) * math.exp(drop / (0.46152 * T)), 'teos-10')
# Of the glycols UNIFAC knows ethylene glycol as a group of its own; from the groups of other alcohols it gives too much.


def unifac(T, w):
    water = (1 - w) / 18.0153 / ((1 - w) / 18.0153 + w / 62.068)
    return water * UNIFAC.from_subgroups(T=T, xs=[water, 1 - water], chemgroups=[{16: 1}, {62: 1}], version=0).gammas()[0] * pw(T)


def norrish_glycerol(T, w):
    glycerol = w / 92.094 / (w / 92.094 + (1 - w) / 18.0153)
    return (1 - glycerol) * math.exp(-1.16 * glycerol * glycerol) * pw(T)


grid('ethylene glycol-water', 'vapourPressure', 'unifac', unifac, 280, 400, 0.05, 0.58, p=1e6)
grid('glycerol-water', 'vapourPressure', 'norrish', norrish_glycerol, 280, 400, 0.05, 0.58, p=1e6)


def norrish(T, w):
    sugar = w / 342.297 / (w / 342.297 + (1 - w) / 18.0153)
    return (1 - sugar) * math.exp(-6.47 * sugar * sugar) * pw(T)


grid('sucrose solution', 'vapourPressure', 'norrish', norrish, 280, 375, 0.05, 0.48, p=1e6)
for material, M, most, (b0, b1, c) in (('sodium chloride brine', 58.443, 0.198, (0.0765, 0.2664, 0.00127)), ('potassium chloride brine', 74.551, 0.235, (0.04835, 0.2122, -0.00084))):
    for w in between(0.005, most, 32):
        m = 1000 * w / (1 - w) / M
        phi = 1 - 0.3915 * math.sqrt(m) / (1 + 1.2 * math.sqrt(m)) + m * (b0 + b1 * math.exp(-2 * math.sqrt(m))) + m * m * c
        table.add(material, 'vapourPressure', 298.15, w, pw(298.15) * math.exp(-2 * phi * m * 0.0180153), 'pitzer')

grid('sucrose solution', 'density', 'emmerich', lambda T, w: emmerich(T - 273.15, w), 288.3, 328, 0.03, 0.49)
for material, key, T, shares in (('sodium chloride brine', 'VNA', (273.5, 293), (0.08, 0.22)), ('calcium chloride brine', 'VCA', (273.5, 293), (0.15, 0.26))):
    grid(material, 'thermalConductivity', 'vdi', lambda t, x: PropsSI('L', 'T', t, 'P', 101325, f'INCOMP::{key}[{x}]'), *T, *shares, 6, 6)
lye = lambda T, x: NaOH.density(x, T - 273.15, prevent_errors=True)
grid('caustic soda', 'thermalExpansion', 'olsson', lambda T, x: (lye(T - 2, x) - lye(T + 2, x)) / 4 / lye(T, x), 277, 321, 0.05, 0.48)

# Surface tension of fluids that one handbook gives.
for material, cas in (('chlorine', '7782-50-5'), ('ethylene oxide', '75-21-8'), ('hydrogen chloride', '7647-01-0'), ('styrene', '100-42-5'), ('glycerol', '56-81-5')):
    mulero, soma, jasper = interface.sigma_data_Mulero_Cachadina, interface.sigma_data_Somayajulu, interface.sigma_data_Jasper_Lange
    if cas in mulero.index:
        r = mulero.loc[cas]
        table.curve(material, 'surfaceTension', 'mulero', lambda T: interface.REFPROP_sigma(T, r['Tc'], r['sigma0'], r['n0'], r['sigma1'], r['n1'], r['sigma2'], r['n2']), r['Tmin'], min(r['Tmax'], 0.9 * r['Tc']), p=1.5e7)
    if cas in soma.index:
        s = soma.loc[cas]
        table.curve(material, 'surfaceTension', 'somayajulu', lambda T: interface.Somayajulu(T, s['Tc'], s['A'], s['B'], s['C']), s['Tt'], 0.9 * s['Tc'], p=1.5e7)
    if cas in jasper.index:
        j = jasper.loc[cas]
        table.curve(material, 'surfaceTension', 'jasper fits', lambda T: 1e-3 * (j['a'] - j['b'] * (T - 273.15)), j['Tmin'], j['Tmax'], p=1.5e7)

# Thin gases that one handbook gives.
for material, cas in (('carbonyl sulphide', '463-58-1'), ('isobutene', '115-11-7'), ('neopentane', '463-82-1'), ('tetrahydrofuran', '109-99-9')):
    Tc, Pc, Zc, M, dipole = chemicals.Tc(cas), chemicals.Pc(cas), chemicals.Zc(cas), chemicals.MW(cas), chemicals.dipole_moment(cas) or 0
    lucas = lambda T: Lucas_gas(T, Tc, Pc, Zc, M, dipole, CASRN=cas)
    heat = HeatCapacityGas(CASRN=cas, MW=M)
    cold = max(0.75 * Tc, 290)
    table.curve(material, 'viscosity', 'lucas', lucas, cold, 625, phase='vapour', p=1e4)
    table.curve(material, 'thermalConductivity', 'eucken', lambda T: Eucken_modified(M, heat(T) - 8.314462, lucas(T)), max(cold, 340), 620, phase='vapour', p=1e4)
table.curve('deuterium', 'viscosity', 'hydrogen scaled', lambda T: math.sqrt(2) * PropsSI('V', 'T', T, 'P', 1e4, 'Hydrogen'), 150, 470, p=1e4)
table.curve('deuterium', 'thermalConductivity', 'hydrogen scaled', lambda T: PropsSI('L', 'T', T, 'P', 1e4, 'Hydrogen') / math.sqrt(2), 240, 590, p=1e4)

for material, cas in (('2-propanol', '67-63-0'), ('acetic acid', '64-19-7'), ('carbon tetrachloride', '56-23-5'), ('chloroform', '67-66-3'), ('n-butanol', '71-36-3'), ('styrene', '100-42-5')):
    heat = HeatCapacityLiquid(CASRN=cas, MW=chemicals.MW(cas))
    method = next((m for m in sorted(heat.all_methods) if 'ZABRANSKY' in m), None)
    if method is not None:
        heat.method = method
        low, high = heat.T_limits[method]
        table.curve(material, 'specificHeatCapacity', 'zabransky sat', lambda T: heat(T) / chemicals.MW(cas) * 1000, low, high, p=1e6)

for material, share in (('biogas', 0.03), ('flue gas', 0.172), ('coal flue gas', 0.065), ('exhaled air', 0.05)):
    shares = record(material)['thermodynamics']['constants']['shares']
    for p in between(0.5e5, 1.2e5 if material == 'exhaled air' else 3e5, 32):
        T = PropsSI('T', 'P', p * shares['water'] / sum(shares.values()), 'Q', 1, 'Water') if p * shares['water'] > 900 else None
        if T is not None:
            table.add(material, 'saturationTemperature', 320 if material == 'exhaled air' else 480, None, T, 'dew line', p)
table.curve('lead-bismuth eutectic', 'viscosity', 'sobolev', lambda T: 4.456e-4 * math.exp(780 / T))
# The volume of long chains: shorter ones are lighter.
for grade in (100, 350, 500, 1000, 5000, 12500):
    table.curve(f'silicone oil {grade}', 'density', 'beret-prausnitz', lambda T: 1000 / (1.0079 * math.exp(9.121e-4 * (T - 273.15))), 273.15, 423.15)
table.write()
