"""Writes melts.csv: states of liquid metals and molten salts from independent works, held to the declared uncertainties.

Run with:  python3 test/properties/compared/melts.py   (needs chemicals 1.5.2, cantera 3.2.0, lbh15 2.1.0, PyYAML)
A work counts as independent where the record does not rest on it; what stands here by hand is from memory and says so.
  crc-melts        CRC Handbook of Chemistry and Physics, densities of molten elements and salts (Janz; Steinberg; Lang), as chemicals 1.5.2 carries them
  janaf            NIST-JANAF Thermochemical Tables, 4th ed. (1998)
  nasa-9           NASA/TP-2002-211556, McBride, Zehe and Gordon, polynomials of condensed species, evaluated by Cantera 3.2.0
  viswanath        Viswanath and Natarajan, Data Book on the Viscosity of Liquids (1989), as chemicals 1.5.2 carries it
  alcock           Alcock, Itkin and Horrigan, Can. Metall. Q. 23 (1984) 309, vapour pressures of metals, as chemicals 1.5.2 carries them
  lbh15 gurvich    Gurvich and Veyts (1991), heat capacity of lead, evaluated by lbh15 2.1.0
  bergman-a7       Bergman, Lavine, Incropera and DeWitt, 7th ed. (2011), table A.7
  golden-tokar     Golden and Tokar, ANL-7323 (1967), sodium (from memory)
  foust            Foust, Sodium-NaK Engineering Handbook (1972), conductivity of potassium, conductivity and viscosity of the eutectic with sodium (from memory)
  iaea             IAEA-TECDOC-1289 (2002), conductivity of lead-bismuth, 3.9021 + 0.0123 T (from memory)
  oecd-nea 2007    the 2007 edition of the handbook, other fits for lead-bismuth (from memory)
  kubaschewski     Kubaschewski and Alcock, Metallurgical Thermochemistry (1979), heat capacities (from memory)
  jimbo-cramb      Jimbo and Cramb, Metall. Trans. B 24 (1993) 5, density of iron with carbon (from memory)
  iron             the values of molten iron above, for steel
  janz             Janz, Molten Salts Handbook (1967), viscosity of sodium nitrate and density of sodium nitrite (from memory)
  crc-elements     CRC Handbook of Chemistry and Physics, melting points and heats of fusion, as chemicals 1.5.2 carries them
  iida-guthrie     Iida and Guthrie, The Physical Properties of Liquid Metals (1988), densities (from memory)
  smithells        Smithells Metals Reference Book, 7th ed. (1992), Arrhenius laws of viscosity (from memory)
  resistivity      Smithells, resistivities of liquid metals, with the law of Wiedemann and Franz for the conductivity (from memory)
  keene            Keene, Int. Mater. Rev. 38 (1993) 157, surface tensions (from memory)
  mixed melts      volumes and heat capacities of the parts added, logarithms of viscosity by mole: crc-melts, nasa-9, smithells
  khokhlov         Khokhlov, Ignatiev and Afonichkin, J. Fluorine Chem. 130 (2009) 30, -0.34 + 5e-4 T + 32/M for molten fluorides (from memory)
  vriesema         Vriesema, TU Delft (1979), density of FLiNaK 2729 - 0.73 T (from memory)
  tobias           Tobias and others, viscosity of FLiNaK 2.487e-5 exp(4478.6/T) (from memory)
  rogers           Rogers, Yoko and Janz, J. Chem. Eng. Data 27 (1982) 366, heat capacity of FLiNaK (from memory)
  vidrio           Vidrio, Mastromarino, Still, Chapdelaine and Scarlat, J. Chem. Eng. Data 67 (2022), density of FLiBe (from memory)
"""
import csv
import json
import math
import os

import cantera
import chemicals
from lbh15 import Lead

from table import Table, declared, record

# Under 3 MPa, so that sodium is a liquid over its range.
table = Table('melts', 3e6)
DATA = os.path.dirname(chemicals.__file__)
with open(os.path.join(DATA, 'Density', 'CRC Inorganics densties of molten compounds and salts.tsv')) as file:
    MELTS = {row['CAS']: row for row in csv.DictReader(file, delimiter='\t')}
with open(os.path.join(DATA, 'Heat Capacity', 'JANAF_1998_liq_Cp.json')) as file:
    JANAF = json.load(file)
with open(os.path.join(DATA, 'Viscosity', 'Viswanath Natarajan Dynamic 3 term.tsv')) as file:
    THREE = {row['CAS']: row for row in csv.DictReader(file, delimiter='\t')}
SPECIES = {one.name: one for one in cantera.Species.list_from_file('nasa_condensed.yaml')}
CAS = {'Al': '7429-90-5', 'Cu': '7440-50-8', 'Fe': '7439-89-6', 'Pb': '7439-92-1', 'Bi': '7440-69-9', 'Sn': '7440-31-5', 'Zn': '7440-66-6', 'K': '7440-09-7', 'Na': '7440-23-5', 'Ga': '7440-55-3', 'Hg': '7439-97-6', 'NaNO3': '7631-99-4', 'KNO3': '7757-79-1', 'LiF': '7789-24-4', 'NaF': '7681-49-4', 'KF': '7789-23-3', 'BeF2': '7787-49-7'}
MASS = {name: chemicals.MW(cas) / 1000 for name, cas in CAS.items()}
MELTING = {'Al': 933.47, 'Cu': 1357.77, 'Fe': 1811, 'Pb': 600.6, 'Bi': 544.55, 'Sn': 505.08, 'Zn': 692.68, 'K': 336.65, 'Na': 370.94, 'Ga': 302.91, 'Hg': 234.32}


def crc(name):
    """Density [kg/m^3] and the highest temperature [K]."""
    row = MELTS[CAS[name]]
    rho, k, Tm, high = (float(row[key]) for key in ('rho', 'k', 'Tm', 'Tmax'))
    return (lambda T: rho - k * (T - Tm)), high


def nasa(name):
    """Heat capacity [J/(kg K)] of the liquid."""
    thermo = SPECIES[f'{name}(L)'].thermo
    return lambda T: thermo.cp(T) / 1000 / MASS[name]


def three(name):
    """Viscosity [Pa s] and its range [K]."""
    row = THREE[CAS[name]]
    a, b, c, low, high = (float(row[key]) for key in ('A', 'B', 'C', 'Tmin', 'Tmax'))
    return (lambda T: 1e-3 * 10 ** (a + b / (c - T))), low, high


# Density at the melting point [kg/m^3] and slope [kg/(m^3 K)].
DENSITY = {'Al': (2380, 0.35), 'Cu': (8000, 0.80), 'Fe': (7015, 0.883), 'Sn': (6980, 0.61), 'Zn': (6575, 1.10), 'Ga': (6100, 0.56)}
# mPa s and kJ/mol.
ARRHENIUS = {'Al': (0.1492, 16.5), 'Bi': (0.4458, 6.45), 'Cu': (0.3009, 30.5), 'Fe': (0.3699, 41.4), 'Ga': (0.4359, 4.00), 'Hg': (0.5565, 2.51), 'Pb': (0.4636, 8.61), 'Sn': (0.5380, 5.44), 'Zn': (0.4131, 12.7)}
# At the melting point and slope [1e-8 ohm m, 1e-8 ohm m/K].
RESISTIVITY = {'Al': (24.25, 0.0145), 'Bi': (129.0, 0.053), 'Cu': (20.0, 0.0102), 'Fe': (138.6, 0.033), 'Ga': (25.8, 0.020), 'K': (13.65, 0.064), 'Na': (9.64, 0.038), 'Pb': (94.85, 0.0479), 'Sn': (47.2, 0.0249), 'Zn': (37.4, -0.0017)}
# At the melting point and slope [mN/m, mN/(m K)].
TENSION = {'Al': (871, 0.155), 'Cu': (1330, 0.23), 'Fe': (1862, 0.39), 'Pb': (471, 0.156), 'Sn': (560, 0.09), 'Zn': (789, 0.21), 'Ga': (724, 0.07), 'Bi': (382, 0.08)}


def linear(table_of, name, scale=1, fall=-1):
    start, slope = table_of[name]
    return lambda T: scale * (start + fall * slope * (T - MELTING[name]))


def arrhenius(name):
    mu0, E = ARRHENIUS[name]
    return lambda T: 1e-3 * mu0 * math.exp(1000 * E / (8.314 * T))


def resistance(name):
    return linear(RESISTIVITY, name, 1e-8, 1)


for material, name in (('molten aluminium', 'Al'), ('molten copper', 'Cu'), ('molten iron', 'Fe'), ('molten tin', 'Sn'), ('molten zinc', 'Zn'), ('bismuth', 'Bi'), ('lead', 'Pb'), ('potassium', 'K'), ('sodium', 'Na'), ('gallium', 'Ga'), ('mercury', 'Hg')):
    if name in ('Bi', 'Pb', 'K', 'Na', 'Zn', 'Ga'):
        table.curve(material, 'density', 'crc-melts', crc(name)[0], high=crc(name)[1])
    if name in DENSITY:
        table.curve(material, 'density', 'iida-guthrie', linear(DENSITY, name), 690 if name == 'Ga' else 0)
    if f'{name}(L)' in SPECIES:
        table.curve(material, 'specificHeatCapacity', 'nasa-9', nasa(name))
    if CAS[name] in JANAF:
        low, high = declared(material, 'specificHeatCapacity')
        for T, cp in zip(*JANAF[CAS[name]]):
            if low <= T <= high:
                table.rows.append([material, 'specificHeatCapacity', f'{T:g}', '3000000', '', f'{cp / MASS[name]:.6g}', 'janaf'])
    # The handbook's law for bismuth is the record's own.
    if name in ARRHENIUS and name != 'Bi':
        table.curve(material, 'viscosity', 'smithells', arrhenius(name))
    if CAS[name] in THREE:
        law, low, high = three(name)
        table.curve(material, 'viscosity', 'viswanath', law, low, high)
    if name in RESISTIVITY:
        # The resistivity of alkali metals is straight only near the melting point.
        high = 500 if name in ('K', 'Na') else 1e4
        table.curve(material, 'thermalConductivity', 'resistivity', lambda T, n=name: 2.44e-8 * T / resistance(n)(T), high=high)
        table.curve(material, 'electricalConductivity', 'resistivity', lambda T, n=name: 1 / resistance(n)(T), high=high)
    if name in TENSION:
        table.curve(material, 'surfaceTension', 'keene', linear(TENSION, name, 1e-3), high=1000 if name == 'Na' else 1e4)
for material, name in (('sodium', 'Na'), ('mercury', 'Hg')):
    row = chemicals.vapor_pressure.Psat_data_Alcock_elements.loc[CAS[name]]
    table.curve(material, 'vapourPressure', 'alcock', lambda T, r=row: math.exp(r['A'] + r['B'] / T + r['C'] * math.log(T) + r['D'] * T ** r['E']), row['Tmin'], row['Tmax'])
Lead.set_correlation_to_use('cp', 'gurvich1991')
table.curve('lead', 'specificHeatCapacity', 'lbh15 gurvich', lambda T: Lead(T=T).cp)
for T, rho, cp, nu, k in ((589, 10011, 144.4, 1.617, 16.4), (811, 9739, 154.5, 1.133, 15.6), (1033, 9467, 164.5, 0.8343, 15.6)):
    for prop, value in (('density', rho), ('specificHeatCapacity', cp), ('viscosity', 1e-7 * nu * rho), ('thermalConductivity', k)):
        table.add('bismuth', prop, T, None, value, 'bergman-a7')
table.curve('bismuth', 'specificHeatCapacity', 'kubaschewski', lambda T: (20.0 + 6.15e-3 * T + 21.1e5 / T ** 2) / MASS['Bi'])
table.curve('sodium', 'viscosity', 'golden-tokar', lambda T: 0.1 * 10 ** (-1.4892 + 220.65 / T - 0.4925 * math.log10(T)), high=1150)
table.curve('sodium', 'thermalConductivity', 'golden-tokar', lambda T: 93.0 - 0.0581 * (T - 273.15) + 1.173e-5 * (T - 273.15) ** 2, high=1150)
table.curve('sodium', 'surfaceTension', 'golden-tokar', lambda T: 1e-3 * (206.7 - 0.1 * (T - 273.15)), high=1150)
table.curve('potassium', 'thermalConductivity', 'foust', lambda T: 100 * (0.438 - 2.22e-4 * (T - 273.15) + 39.5 / T))
for prop, value in (('viscosity', arrhenius('Fe')), ('specificHeatCapacity', nasa('Fe')), ('thermalConductivity', lambda T: 2.44e-8 * T / resistance('Fe')(T))):
    table.curve('molten steel', prop, 'iron', value)
table.curve('molten steel', 'density', 'jimbo-cramb', lambda T: 1000 * (7.10 - 0.0732 * 0.5 - (8.28 - 0.874 * 0.5) * 1e-4 * (T - 1823)))

# Mixtures: shares by mass; volumes and heat capacities of the parts added.


def volumes(shares):
    return lambda T: 1 / sum(w / crc(name)[0](T) for name, w in shares.items())


def heats(shares):
    return lambda T: sum(w * nasa(name)(T) for name, w in shares.items())


def by_mass(moles):
    total = sum(n * MASS[name] for name, n in moles.items())
    return {name: n * MASS[name] / total for name, n in moles.items()}


LBE = {'Pb': 0.445, 'Bi': 0.555}
table.curve('lead-bismuth eutectic', 'density', 'mixed melts', volumes(LBE), high=1073)
table.curve('lead-bismuth eutectic', 'specificHeatCapacity', 'oecd-nea 2007', lambda T: 159 - 2.72e-2 * T + 7.12e-6 * T ** 2)
table.curve('lead-bismuth eutectic', 'surfaceTension', 'oecd-nea 2007', lambda T: 1e-3 * (437.1 - 0.066 * T))
table.curve('lead-bismuth eutectic', 'electricalConductivity', 'oecd-nea 2007', lambda T: 1e8 / (86.334 + 0.0511 * T))
table.curve('lead-bismuth eutectic', 'thermalConductivity', 'iaea', lambda T: 3.9021 + 0.0123 * T)
for material, shares in (('sodium-potassium 22-78', {'Na': 0.22, 'K': 0.78}), ('sodium-potassium 55-45', {'Na': 0.55, 'K': 0.45})):
    table.curve(material, 'density', 'mixed melts', volumes(shares), high=873)
    table.curve(material, 'specificHeatCapacity', 'mixed melts', heats(shares))
# Density in g/cm^3; two branches of the viscosity, which meet near 400 degC.
nak = lambda T: volumes({'Na': 0.22, 'K': 0.78})(T) / 1000
table.curve('sodium-potassium 22-78', 'viscosity', 'foust', lambda T: 1e-3 * nak(T) ** (1 / 3) * (0.116 * math.exp(688 * nak(T) / T) if T < 673 else 0.082 * math.exp(979 * nak(T) / T)), high=1030)
table.curve('sodium-potassium 22-78', 'thermalConductivity', 'foust', lambda T: 100 * (0.214 + 2.07e-4 * (T - 273.15) - 2.2e-7 * (T - 273.15) ** 2))
FLIBE, FLINAK = by_mass({'LiF': 2, 'BeF2': 1}), by_mass({'LiF': 0.465, 'NaF': 0.115, 'KF': 0.42})
SALT, HTS = {'NaNO3': 0.6, 'KNO3': 0.4}, {'KNO3': 0.53, 'NaNO3': 0.07}
janz = lambda T: 1.041e-4 * math.exp(16260 / (8.314 * T))
with open(os.path.join(DATA, 'Viscosity', 'Viswanath Natarajan Dynamic 2 term.tsv')) as file:
    two = next(row for row in csv.DictReader(file, delimiter='\t') if row['CAS'] == CAS['KNO3'])
potassium_nitrate = lambda T: 10 ** (float(two['A']) + float(two['B']) / T)
table.curve('solar salt', 'density', 'mixed melts', volumes(SALT), 550, 730)
moles = {name: w / MASS[name] / sum(x / MASS[part] for part, x in SALT.items()) for name, w in SALT.items()}
table.curve('solar salt', 'viscosity', 'mixed melts', lambda T: math.exp(moles['NaNO3'] * math.log(janz(T)) + moles['KNO3'] * math.log(potassium_nitrate(T))), float(two['Tmin']), float(two['Tmax']))
table.curve('solar salt', 'specificHeatCapacity', 'kubaschewski', lambda T: 0.6 * 155.6 / MASS['NaNO3'] + 0.4 * 123.4 / MASS['KNO3'])
table.curve('nitrate-nitrite salt', 'density', 'mixed melts', lambda T: 1 / (sum(w / crc(name)[0](T) for name, w in HTS.items()) + 0.4 / (2226 - 0.746 * T)), 550, 730)
for prop, reference, law in (('viscosity', 'janz', janz), ('specificHeatCapacity', 'kubaschewski', lambda T: 155.6 / MASS['NaNO3'])):
    table.curve('sodium nitrate', prop, reference, law, phase='liquid', p=5e5)
table.curve('FLiNaK', 'density', 'mixed melts', volumes(FLINAK))
table.curve('FLiNaK', 'density', 'vriesema', lambda T: 2729 - 0.73 * T)
table.curve('FLiNaK', 'viscosity', 'tobias', lambda T: 2.487e-5 * math.exp(4478.62 / T))
table.curve('FLiNaK', 'specificHeatCapacity', 'rogers', lambda T: 976.78 + 1.0634 * T, high=863)
table.curve('FLiNaK', 'thermalConductivity', 'khokhlov', lambda T: -0.34 + 5e-4 * T + 32 / 41.29)
table.curve('FLiBe', 'thermalConductivity', 'khokhlov', lambda T: -0.34 + 5e-4 * T + 32 / 32.96)
table.curve('FLiBe', 'density', 'vidrio', lambda T: 2245 - 0.424 * (T - 273.15))
table.curve('FLiBe', 'density', 'mixed melts', volumes(FLIBE))
for material, name in (('molten aluminium', 'Al'), ('molten copper', 'Cu'), ('molten iron', 'Fe'), ('molten tin', 'Sn'), ('molten zinc', 'Zn'), ('bismuth', 'Bi'), ('lead', 'Pb'), ('potassium', 'K'), ('sodium', 'Na'), ('gallium', 'Ga'), ('mercury', 'Hg'), ('sodium nitrate', 'NaNO3')):
    entries, T = record(material), declared(material, 'density', 'liquid' if name == 'NaNO3' else None)[0] + 1
    if 'meltingTemperature' in entries:
        table.add(material, 'meltingTemperature', T, None, chemicals.Tm(CAS[name], 'CRC_INORG'), 'crc-elements', 5e5)
    if 'fusionHeat' in entries:
        table.add(material, 'fusionHeat', T, None, chemicals.Hfus(CAS[name]) / MASS[name], 'crc-elements', 5e5)
table.write()
