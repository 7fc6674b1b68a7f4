"""Writes aqueous.csv: states of aqueous solutions from independent works, held to the declared uncertainties.

Run with:  python3 test/properties/compared/aqueous.py   (needs CoolProp 8.0.0, chemicals 1.5.2, thermo 0.6.1, absorptionlib 1.1.0, PyYAML)
A work counts as independent where the record does not rest on it; what stands here by hand is from memory and says so.
  laliberte     Laliberte, J. Chem. Eng. Data 54 (2009) 1725, evaluated by thermo 0.6.1
  magomedov     Magomedov, High Temp. 39 (2001) 221, conductivity, evaluated by thermo 0.6.1 on that of water by CoolProp 8.0.0
  olsson        Olsson, Jernqvist and Aly, Int. J. Thermophys. 18 (1997) 779, caustic soda, evaluated by absorptionlib 1.1.0
  alexandrov    Alexandrov (2004), caustic soda, evaluated by absorptionlib 1.1.0
  conde         Conde, Int. J. Therm. Sci. 43 (2004) 367, calcium and lithium chloride, evaluated by absorptionlib 1.1.0
  vdi           Preisegger et al. 2010 (VDI heat atlas), as CoolProp 8.0.0 fits it
  ashrae        ASHRAE handbook 2001 (glycols), as CoolProp 8.0.0 fits it
  melinder      Melinder 2010, as CoolProp 8.0.0 fits it
  volk-kaehler  Volk and Kaehler, Exp. Fluids 59 (2018) 75, density of glycerol-water from 15 to 30 degC (from memory)
  riedel ions   Riedel (1951), contributions of the ions, lithium -3.49 and chloride -5.47 (from memory)
  filippov      Filippov (1955), conductivity of two liquids, on water and ethanol of CoolProp 8.0.0, glycerol of VDI (Heat Atlas, 2nd ed.)
  parts added   heat capacities of water by CoolProp 8.0.0 and glycerol by Zabransky, by mass
  ict           International Critical Tables (1928), as Perry's handbook prints them, densities at 20 degC (from memory)
"""
import math
import os
import sys
import warnings

from absorptionlib import CaCl2, LiCl, NaOH
from CoolProp.CoolProp import PropsSI
from thermo import electrochem

from table import HERE, Table, between, declared, record

sys.path.insert(0, os.path.join(HERE, '..', '..', '..', 'scripts', 'materials'))
from handbook import law as handbook  # noqa: E402

warnings.simplefilter('ignore')
table = Table('aqueous')
LETTERS = {'density': 'D', 'viscosity': 'V', 'thermalConductivity': 'L', 'specificHeatCapacity': 'C'}
LALIBERTE = {'density': (electrochem.Laliberte_density, ''), 'viscosity': (electrochem.Laliberte_viscosity, '.1'), 'specificHeatCapacity': (electrochem.Laliberte_heat_capacity, '.2')}


def share(text):
    return float(text.split()[0]) / 100


def corner(material, prop):
    """Declared temperatures and the lowest of the highest shares."""
    entries = record(material)[prop]
    entries = entries if isinstance(entries, list) else [entries]
    return (*declared(material, prop), min(share(entry['range']['composition'][1]) for entry in entries))


def grid(material, prop, reference, law, low=0, high=1e4, most=1.0, least=0.03, nT=7, nx=5):
    """Even states over what the record declares and the reference covers."""
    cold, hot, top = corner(material, prop)
    cold, hot, top = max(cold, low), min(hot, high), min(top, most)
    for T in between(cold + 1e-3 * (hot - cold), hot - 1e-3 * (hot - cold), nT):
        for x in between(least, top * 0.98, nx):
            try:
                value = law(T, x)
            except ValueError:
                continue
            if value == value:
                table.add(material, prop, T, x, value, reference)


for material, cas, properties in (('potassium acetate brine', '127-08-2', LALIBERTE), ('potassium formate brine', '590-29-4', LALIBERTE)):
    data = electrochem.Laliberte_data.loc[cas]
    for prop in properties:
        law, suffix = LALIBERTE[prop]
        if data[f'Max w{suffix}'] > 0:
            grid(material, prop, 'laliberte', lambda T, x, f=law: f(T, [x], [cas]), 273.15 + data[f'Min T{suffix}'], 273.15 + data[f'Max T{suffix}'], data[f'Max w{suffix}'])

water = lambda T: PropsSI('L', 'T', T, 'P', 101325, 'Water')
for material, cas, least in (
    ('sodium chloride brine', '7647-14-5', 0.03), ('potassium chloride brine', '7447-40-7', 0.03), ('calcium chloride brine', '10043-52-4', 0.03), ('magnesium chloride brine', '7786-30-3', 0.03), ('lithium chloride brine', '7447-41-8', 0.03), ('potassium carbonate brine', '584-08-7', 0.03),
    ('sodium sulphate solution', '7757-82-6', 0.03), ('sodium carbonate solution', '497-19-8', 0.03), ('sulphuric acid', '7664-93-9', 0.03), ('hydrochloric acid', '7647-01-0', 0.03), ('nitric acid', '7697-37-2', 0.03), ('phosphoric acid', '7664-38-2', 0.03), ('caustic potash', '1310-58-3', 0.03), ('caustic soda', '1310-73-2', 0.03), ('ammonium sulphate solution', '7783-20-2', 0.03), ('ammonium nitrate solution', '6484-52-2', 0.03),
):
    if cas in electrochem.Magomedovk_thermal_cond.index:
        grid(material, 'thermalConductivity', 'magomedov', lambda T, x, c=cas: electrochem.thermal_conductivity_Magomedov(T, 1e5, [x], [c], water(T)), 274, 373, 0.25, least)

celsius = lambda f: lambda T, x: f(x, T - 273.15, prevent_errors=True)
under = lambda f: lambda T, x: f(x, T - 273.15, 101325, prevent_errors=True)
kilo = lambda law: lambda T, x: 1000 * law(T, x)
grid('caustic soda', 'density', 'olsson', celsius(NaOH.density), 274, most=0.5)
# At 16 % the heat capacity of Alexandrov lies 10 % below the slope of Olsson's enthalpy and of the record: to 10 %.
grid('caustic soda', 'specificHeatCapacity', 'alexandrov', kilo(celsius(NaOH.specific_heat_capacity)), 274, most=0.1)
slope = celsius(NaOH.enthalpy)
grid('caustic soda', 'specificHeatCapacity', 'olsson', lambda T, x: 250 * (slope(T + 2, x) - slope(T - 2, x)), 277, 371)
grid('caustic soda', 'viscosity', 'alexandrov', under(NaOH.dynamic_viscosity), 274, most=0.12)
grid('caustic soda', 'thermalConductivity', 'alexandrov', under(NaOH.thermal_conductivity), 274, 372, most=0.2)
for material, salt in (('calcium chloride brine', CaCl2), ('lithium chloride brine', LiCl)):
    grid(material, 'density', 'conde', celsius(salt.density), 274)
    grid(material, 'specificHeatCapacity', 'conde', kilo(celsius(salt.specific_heat_capacity)), 274)
    grid(material, 'viscosity', 'conde', celsius(salt.dynamic_viscosity), 274)


def fitted(material, key, reference, properties, low, high, most, least=0.03):
    for prop in properties:
        grid(material, prop, reference, lambda T, x, c=LETTERS[prop]: PropsSI(c, 'T', T, 'P', 101325, f'INCOMP::{key}[{x}]'), low, high, most, least)


for prop in LETTERS:
    unfrozen = lambda T, x, c=LETTERS[prop]: math.nan if T < PropsSI('T_FREEZE', 'T', 300, 'P', 101325, f'INCOMP::MMA[{x}]') + 1 else PropsSI(c, 'T', T, 'P', 101325, f'INCOMP::VMA[{x}]')
    grid('methanol-water', prop, 'vdi', unfrozen, 233.2, 273, 0.45, 0.12, 10, 7)
fitted('magnesium chloride brine', 'VMG', 'vdi', LETTERS, 255, 293, 0.2, 0.08)
# That of potassium carbonate gives 1231 kg/m^3 at 20 % and 20 degC, where the International Critical Tables print 1190: left out.
# The glycols of this work are shares of volume: densities at 20 degC of the glycols and of water.
for material, key, pure in (('ethylene glycol-water', 'AEG', 1113.0), ('propylene glycol-water', 'APG', 1036.0)):
    for prop in LETTERS:
        grid(material, prop, 'ashrae', lambda T, w, c=LETTERS[prop]: PropsSI(c, 'T', T, 'P', 101325, f'INCOMP::{key}[{w / pure / (w / pure + (1 - w) / 998.2)}]'), 255, 373, 0.59, 0.2)
fitted('glycerol-water', 'MGL', 'melinder', ('viscosity',), 274, 312, 0.6)


def volk_kaehler(T, w):
    t = T - 273.15
    glycerol, pure = 1273.3 - 0.6121 * t, 1000 * (1 - abs((t - 3.98) / 615) ** 1.71)
    swell = 1 + (1.78e-6 * t ** 2 - 1.82e-4 * t + 1.41e-2) * math.sin(w ** 1.31 * math.pi) ** 0.81
    return swell * (pure + (glycerol - pure) / (1 + glycerol / pure * (1 / w - 1)))


grid('glycerol-water', 'density', 'volk-kaehler', volk_kaehler, 288.2, 303)

# Riedel: 1e-3 W/(m K) per mol/L at 20 degC, carried as water.
def riedel(T, x):
    mol = x * electrochem.Laliberte_density(293.15, [x], ['7447-41-8']) / 42.394
    return water(T) / water(293.15) * (water(293.15) - (3.489 + 5.466) * 1e-3 * mol)


grid('lithium chloride brine', 'thermalConductivity', 'riedel ions', riedel, 274, 313)
glycerol = handbook('thermalConductivity', 'liquid', 'vdi', '56-81-5', 0.09209)[2]
PURE = {'ethanol-water': lambda T: PropsSI('L', 'T', T, 'P', 1e6, 'Ethanol'), 'glycerol-water': glycerol}
for material in ('ethanol-water', 'glycerol-water'):
    grid(material, 'thermalConductivity', 'filippov', lambda T, w, k=PURE[material]: (1 - w) * water(T) + w * k(T) - 0.72 * w * (1 - w) * abs(k(T) - water(T)), 276, 312)
zabransky = handbook('specificHeatCapacity', 'liquid', 'zabransky', '56-81-5', 0.09209)
grid('glycerol-water', 'specificHeatCapacity', 'parts added', lambda T, w: (1 - w) * PropsSI('C', 'T', T, 'P', 101325, 'Water') + w * zabransky[2](T), max(276, zabransky[3] or 0), 312)

for material, rows in (
    ('potassium chloride brine', ((0.04, 1023.9), (0.08, 1050.0), (0.12, 1076.8), (0.16, 1104.3), (0.2, 1132.8), (0.24, 1162.3))),
    ('sulphuric acid', ((0.1, 1066.1), (0.2, 1139.4), (0.3, 1218.5), (0.4, 1302.8), (0.5, 1395.1), (0.6, 1498.3), (0.7, 1610.5))),
    ('nitric acid', ((0.1, 1054.3), (0.2, 1115.0), (0.3, 1180.0), (0.4, 1246.3), (0.5, 1310.0), (0.6, 1366.7), (0.7, 1413.4))),
    ('hydrochloric acid', ((0.1, 1047.4), (0.2, 1098.0), (0.3, 1149.2), (0.36, 1178.9))),
    ('phosphoric acid', ((0.1, 1053.2), (0.2, 1113.4), (0.3, 1180.5), (0.4, 1254.0), (0.5, 1335.0), (0.6, 1426.0), (0.7, 1526.0), (0.8, 1633.0))),
    ('caustic soda', ((0.1, 1108.9), (0.2, 1219.1), (0.3, 1327.9), (0.4, 1430.0), (0.5, 1525.3))),
    ('caustic potash', ((0.1, 1091.8), (0.2, 1188.4), (0.3, 1290.5), (0.4, 1399.1), (0.5, 1514.3))),
    ('ammonium sulphate solution', ((0.1, 1057.4), (0.2, 1115.4), (0.3, 1172.1), (0.4, 1227.7))),
    ('potassium carbonate brine', ((0.1, 1090.4), (0.2, 1189.8), (0.3, 1297.9))),
    ('sodium carbonate solution', ((0.04, 1039.8), (0.08, 1081.6), (0.12, 1124.4))),
    ('sodium sulphate solution', ((0.04, 1034.8), (0.08, 1072.4), (0.12, 1110.9), (0.2, 1191.5))),
):
    for x, rho in rows:
        table.add(material, 'density', 288.15 if material == 'caustic potash' else 293.15, x, rho, 'ict')
table.write()
