"""Writes food.csv: states of liquid food and of blood from independent works, held to the declared uncertainties.

Run with:  python3 test/properties/compared/food.py   (needs thermo 0.6.1, PyYAML)
  riedel          Riedel, conductivity of milk, juice and sugar solutions by water content (from memory)
  siebel          Siebel (1892), heat capacity 1675 + 25 per percent of water (from memory)
  choi-okos       Choi and Okos (1986), heat capacity of water and carbohydrate (from memory)
  genotelle       Mathlouthi and Genotelle (1995), viscosity of sucrose solutions (from memory)
  short           Short, J. Dairy Res. 22 (1955) 69, density of whole and of skim milk (from memory)
  phipps          Phipps, J. Dairy Res. 36 (1969) 417, viscosity of milk by fat from 40 to 90 degC (from memory)
  laliberte       Laliberte, J. Chem. Eng. Data 54 (2009) 1725, sucrose for juice, evaluated by thermo 0.6.1
  it'is           IT'IS database of tissue properties (from memory)
"""
from thermo.electrochem import Laliberte_density

from table import Table, between, declared

table = Table('food', 2e5)
# Share of water by mass.
WATER = {'milk': 0.876, 'skim milk': 0.908, 'cream': 0.635, 'beer': 0.915}


def riedel(T, water):
    t = T - 273.15
    return (326.8 + 1.0412 * t - 0.00337 * t * t) * (0.44 + 0.54 * water) * 1.73e-3


def by_share(material, prop, reference, value, low=0, high=1e4):
    cold, hot = declared(material, prop)
    for T in between(max(cold + 0.1, low), min(hot - 0.1, high), 7):
        for x in (0.05, 0.15, 0.25, 0.35, 0.48):
            table.add(material, prop, T, x, value(T, x), reference)


for material, water in WATER.items():
    if material != 'cream':
        table.curve(material, 'thermalConductivity', 'riedel', lambda T: riedel(T, water))
    table.curve(material, 'specificHeatCapacity', 'siebel', lambda T: 1675 + 2500 * water)
for material in ('fruit juice', 'sucrose solution'):
    by_share(material, 'thermalConductivity', 'riedel', lambda T, x: riedel(T, 1 - x))
    by_share(material, 'specificHeatCapacity', 'choi-okos', lambda T, x: 1000 * ((1 - x) * (4.1762 - 9.0864e-5 * (T - 273.15) + 5.4731e-6 * (T - 273.15) ** 2) + x * (1.5488 + 1.9625e-3 * (T - 273.15) - 5.9399e-6 * (T - 273.15) ** 2)))


def genotelle(T, w):
    x, t = w / 342.3 / (w / 342.3 + (1 - w) / 18.015), T - 273.15
    return 1e-3 * 10 ** (22.46 * x - 0.114 + (30 - t) / (91 + t) * (1.1 + 43.1 * x ** 1.25))


for material in ('fruit juice', 'sucrose solution'):
    by_share(material, 'viscosity', 'genotelle', genotelle)
by_share('fruit juice', 'density', 'laliberte', lambda T, x: Laliberte_density(T, [x], ['57-50-1']), 288, 328)
for w, rho in ((0.1, 1038.1), (0.2, 1081.0), (0.3, 1127.0), (0.4, 1176.4), (0.5, 1229.6)):
    table.add('sucrose solution', 'density', 293.15, w, rho, 'ICUMSA tables (from memory)')
for material, terms in (('milk', (1035.0, -0.358, 0.0049, -0.00010)), ('skim milk', (1036.6, -0.146, 0.0023, -0.00016))):
    table.curve(material, 'density', 'short', lambda T: sum(k * (T - 273.15) ** i for i, k in enumerate(terms)), 275, 318)
for material, fat in (('milk', 0.036), ('skim milk', 0.001), ('cream', 0.30)):
    table.curve(material, 'viscosity', 'phipps', lambda T: 1e-3 * 10 ** ((1.2876 + 11.07e-4 * (T - 273.15)) * (fat + fat ** (5 / 3)) + 768.7 / T - 2.4370), 313.15, 363)
for prop, value in (('density', 1050), ('thermalConductivity', 0.517), ('specificHeatCapacity', 3617)):
    table.add('blood', prop, 310.15, None, value, "it'is")
table.write()
