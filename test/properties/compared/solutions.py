"""Writes solutions.csv: states of liquids and solids from independent references, held to the declared uncertainties.

Run with:  python3 test/properties/compared/solutions.py   (needs gsw 3.6.23, CoolProp 8.0.0, chemicals 1.5.2, thermo 0.6.1, cantera 3.2.0)
Each row names its reference. A reference counts as independent where its work is another one than that of the record:
  gsw        TEOS-10 polynomial of 75 terms (Roquet et al. 2015) and Gibbs function of the Gibbs-SeaWater toolbox
  iapws-95   pure water of CoolProp, the limit without salt
  melinder   Melinder 2010 (solutions), as CoolProp fits it
  vdi        Preisegger et al. 2010 (VDI heat atlas), as CoolProp fits it
  ashrae     ASHRAE handbook 2001 (glycols), as CoolProp fits it
  gri        mixture-averaged transport and heat capacities of GRI-Mech 3.0, evaluated by Cantera 3.2.0
  janaf      NIST-JANAF Thermochemical Tables, 4th ed. (1998)
  crc        CRC Handbook of Chemistry and Physics, densities of inorganic solids, heat capacities at 298.15 K
  laliberte  Laliberte 2009, evaluated by thermo
"""
import csv
import json
import os

import cantera
import chemicals
import gsw
from CoolProp.CoolProp import PropsSI
from thermo.electrochem import Laliberte_density, Laliberte_heat_capacity, Laliberte_viscosity

HERE = os.path.dirname(os.path.abspath(__file__))
ROWS = []


def add(material, prop, T, p, x, value, reference):
    ROWS.append([material, prop, f'{T:.6g}', f'{p:.7g}', f'{x:.5g}' if x is not None else '', f'{value:.7g}', reference])


def between(low, high, n):
    return [low + (high - low) * i / (n - 1) for i in range(n)]


for t in (0, 5, 10, 20, 30, 39):
    for dbar in (0, 1000, 4000, 8000):
        for SA in (5, 20, 35.16504, 41):
            if dbar and SA < 30:
                continue
            CT = gsw.CT_from_t(SA, t, dbar)
            state = ('sea water', 273.15 + t, 101325 + dbar * 1e4, SA / 1000)
            for prop, value in (('density', gsw.rho(SA, CT, dbar)), ('specificHeatCapacity', gsw.cp_t_exact(SA, t, dbar)), ('speedOfSound', gsw.sound_speed_t_exact(SA, t, dbar)), ('thermalExpansion', gsw.alpha_wrt_t_exact(SA, t, dbar))):
                add(state[0], prop, *state[1:], value, 'gsw')


for T in between(315, 390, 8):
    for prop, letter in (('density', 'D'), ('specificHeatCapacity', 'C'), ('speedOfSound', 'A'), ('thermalExpansion', 'isobaric_expansion_coefficient'), ('thermalConductivity', 'L'), ('viscosity', 'V')):
        add('sea water', prop, T, 5e5, 0, PropsSI(letter, 'T', T, 'P', 5e5, 'Water'), 'iapws-95')


def incompressible(material, key, temperatures, shares, reference, properties=('density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity')):
    letters = {'density': 'D', 'viscosity': 'V', 'thermalConductivity': 'L', 'specificHeatCapacity': 'C'}
    for T in temperatures:
        for x in shares:
            fluid = f'INCOMP::{key}[{x}]' if x is not None else f'INCOMP::{key}'
            for prop in properties:
                try:
                    value = PropsSI(letters[prop], 'T', T, 'P', 101325, fluid)
                except ValueError:
                    continue
                add(material, prop, T, 101325, x, value, reference)


# Beyond 40 degC the Gibbs function still tells ordinary sea water; beyond 60 degC its part for water is off by more than 0.1 %.
for t in (42, 50, 58):
    for SA in (5, 15, 25, 35.16504, 41):
        for prop, value in (('density', gsw.rho_t_exact(SA, t, 0)), ('specificHeatCapacity', gsw.cp_t_exact(SA, t, 0)), ('speedOfSound', gsw.sound_speed_t_exact(SA, t, 0)), ('thermalExpansion', gsw.alpha_wrt_t_exact(SA, t, 0))):
            add('sea water', prop, 273.15 + t, 101325, SA / 1000, value, 'gsw')
for material, key, T, shares in (
    ('sodium chloride brine', 'MNA', (279, 313), (0.02, 0.06, 0.1, 0.14, 0.18, 0.22)),
    ('calcium chloride brine', 'MCA', (299, 313), (0.05, 0.1, 0.15, 0.2, 0.25, 0.29)),
):
    # Colder, and for the conductivity, the record is that work itself.
    incompressible(material, key, between(*T, 6), shares, 'melinder', ('density', 'viscosity', 'specificHeatCapacity'))
# The viscosities of this source lie 4 % to 13 % below both other works: the literature differs, and they are left out.
incompressible('sodium chloride brine', 'VNA', between(275, 293, 4), (0.08, 0.15, 0.22), 'vdi', ('density', 'thermalConductivity', 'specificHeatCapacity'))
incompressible('calcium chloride brine', 'VCA', between(275, 293, 4), (0.15, 0.2, 0.25), 'vdi', ('density', 'thermalConductivity', 'specificHeatCapacity'))


def laliberte(material, cas, T, shares, properties):
    functions = {'density': Laliberte_density, 'viscosity': Laliberte_viscosity, 'specificHeatCapacity': Laliberte_heat_capacity}
    for temperature in between(*T, 6):
        for x in shares:
            for prop in properties:
                add(material, prop, temperature, 101325, x, functions[prop](temperature, [x], [cas]), 'laliberte')


THREE = ('density', 'viscosity', 'specificHeatCapacity')
for material, cas, T, shares, properties in (
    ('ethanol-water', '64-17-5', (274, 312), (0.05, 0.15, 0.25, 0.35, 0.45, 0.58), THREE[:1]),
    ('ammonia-water', '7664-41-7', (294, 303), (0.03, 0.08, 0.13, 0.18, 0.25), THREE),
    ('potassium carbonate brine', '584-08-7', (288, 312), (0.05, 0.1, 0.2, 0.3, 0.37), THREE[:2]),
    ('lithium chloride brine', '7447-41-8', (288, 312), (0.03, 0.08, 0.13, 0.18, 0.23), THREE),
    ('magnesium chloride brine', '7786-30-3', (288, 312), (0.03, 0.08, 0.13, 0.16, 0.2), THREE[:2]),
):
    laliberte(material, cas, T, shares, properties)

# Tin there is grey tin, another phase. Pure metals: heat capacities of the JANAF tables (1998), densities of the CRC Handbook, both as chemicals carries them.
DATA = os.path.dirname(chemicals.__file__)
with open(os.path.join(DATA, 'Heat Capacity', 'JANAF_1998_solid_Cp.json')) as file:
    JANAF = json.load(file)
with open(os.path.join(DATA, 'Density', 'CRC Solid Inorganic Constant Densities.tsv')) as file:
    CRC = {row['CAS']: row for row in csv.DictReader(file, delimiter='\t')}
with open(os.path.join(DATA, 'Heat Capacity', 'CRC Standard Thermodynamic Properties of Chemical Substances.tsv')) as file:
    STANDARD = {row['CAS']: row for row in csv.DictReader(file, delimiter='\t')}
for material, cas, mass, low, high in (
    ('aluminium', '7429-90-5', 26.9815, 200, 800), ('beryllium', '7440-41-7', 9.0122, 200, 1000), ('chromium', '7440-47-3', 51.996, 200, 1000), ('cobalt', '7440-48-4', 58.933, 200, 1000), ('copper', '7440-50-8', 63.546, 100, 1000), ('iron', '7439-89-6', 55.845, 200, 1000),
    ('magnesium', '7439-95-4', 24.305, 200, 800), ('molybdenum', '7439-98-7', 95.95, 200, 1200), ('nickel', '7440-02-0', 58.693, 200, 1000), ('niobium', '7440-03-1', 92.906, 200, 1200), ('silicon', '7440-21-3', 28.0855, 200, 1200), ('tantalum', '7440-25-7', 180.948, 200, 1000),
    ('titanium', '7440-32-6', 47.867, 200, 1000), ('tungsten', '7440-33-7', 183.84, 200, 1200), ('vanadium', '7440-62-2', 50.9415, 200, 1000), ('zinc', '7440-66-6', 65.38, 200, 600), ('zirconium', '7440-67-7', 91.224, 200, 1000), ('solid lead', '7439-92-1', 207.2, 200, 600), ('graphite', '7440-44-0', 12.011, 300, 1600), ('silver', '7440-22-4', 107.868, 200, 1200), ('gold', '7440-57-5', 196.967, 200, 1200), ('platinum', '7440-06-4', 195.084, 200, 1200), ('palladium', '7440-05-3', 106.42, 200, 1200), ('cadmium', '7440-43-9', 112.414, 200, 400), ('tin', '7440-31-5', 118.71, 200, 500),
):
    for T, cp in zip(*JANAF.get(cas, ([], []))):
        if low <= T <= high:
            add(material, 'specificHeatCapacity', T, 101325, None, cp / mass * 1000, 'janaf')
    if cas not in JANAF and material != 'tin' and STANDARD[cas]['Cps']:
        add(material, 'specificHeatCapacity', 298.15, 101325, None, float(STANDARD[cas]['Cps']) / mass * 1000, 'crc')
    if cas in CRC and material not in ('graphite', 'tin'):
        add(material, 'density', 300, 101325, None, mass / 1000 / float(CRC[cas]['Vm']), 'crc')

# Gases by components: another mixing rule on other pure gases.
gas = cantera.Solution('gri30.yaml')
gas.transport_model = 'mixture-averaged'
for material, low, high, shares in (
    ('flue gas', 350, 1490, {'N2': 0.716, 'CO2': 0.087, 'H2O': 0.172, 'O2': 0.017, 'AR': 0.008}), ('coal flue gas', 330, 1490, {'N2': 0.745, 'CO2': 0.140, 'H2O': 0.065, 'O2': 0.041, 'AR': 0.009}),
    ('natural gas', 300, 599, {'CH4': 0.93, 'C2H6': 0.04, 'C3H8': 0.01, 'N2': 0.01, 'CO2': 0.01}), ('biogas', 303, 599, {'CH4': 0.6, 'CO2': 0.36, 'H2O': 0.03, 'N2': 0.01}),
    ('exhaled air', 308, 323, {'N2': 0.746, 'O2': 0.155, 'CO2': 0.04, 'H2O': 0.05, 'AR': 0.009}),
):
    for T in between(low, high, 32):
        gas.TPX = T, 101325, shares
        for prop, value in (('density', gas.density_mass), ('specificHeatCapacity', gas.cp_mass), ('viscosity', gas.viscosity), ('thermalConductivity', gas.thermal_conductivity), ('speedOfSound', gas.sound_speed), ('thermalExpansion', gas.thermal_expansion_coeff)):
            add(material, prop, T, 101325, None, value, 'gri')

with open(os.path.join(HERE, 'solutions.csv'), 'w', newline='') as out:
    writer = csv.writer(out, lineterminator='\n')
    writer.writerow(['material', 'property', 'T [K]', 'p [Pa]', 'share', 'value [SI]', 'reference'])
    writer.writerows(ROWS)
print(len(ROWS))
