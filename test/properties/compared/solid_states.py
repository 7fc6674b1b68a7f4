"""What metals-and-ceramics.py collects its states with, and the functions of temperature that packages carry: NASA, Perry, NIST."""
import csv
import glob
import importlib.util
import json
import os
from math import log10

import cantera
import chemicals
import yaml

HERE = os.path.dirname(os.path.abspath(__file__))
ROOT = os.path.join(HERE, '..', '..', '..')
ROWS = []


def load(path):
    with open(path) as file:
        return yaml.safe_load(file)


RECORDS = {record['name']: record for record in map(load, sorted(glob.glob(os.path.join(ROOT, 'materials', '*.yaml')))) if record.get('kind') == 'solid'}


def spans(material, prop):
    """Temperature range(s) that the record declares [K]."""
    entry = RECORDS.get(material, {}).get(prop)
    if entry is None:
        return []
    boxes = entry['range'] if isinstance(entry['range'], list) else [entry['range']]
    return [[float(end.split()[0]) for end in box['T']] if 'T' in box else [0, 1e9] for box in boxes]


def add(material, prop, T, value, reference):
    if value is not None and any(low <= T <= high for low, high in spans(material, prop)):
        ROWS.append([material, prop, f'{T:.6g}', '101325', '', f'{value:.6g}', reference])


def over(material, prop, low, high, law, reference, n=31):
    """n states of a law over what its range [K] and the record share."""
    for a, b in spans(material, prop):
        a, b = max(a, low), min(b, high)
        if a < b:
            count = max(2, min(n, 1 + int((b - a) / 5)))  # states closer than 5 K say nothing new
            for i in range(count):
                T = a + (b - a) * i / (count - 1)
                add(material, prop, T, law(T), reference)


def points(material, prop, pairs, reference):
    for T, value in pairs:
        add(material, prop, T, value, reference)


K, CP, RHO, EXP, MELT = 'thermalConductivity', 'specificHeatCapacity', 'density', 'thermalExpansion', 'meltingTemperature'

# Heat capacities of condensed species.
NASA = {one['name']: one for one in load(os.path.join(os.path.dirname(cantera.__file__), 'data', 'nasa_condensed.yaml'))['species']}


def nasa(name):
    """cp [J/(kg K)] of a condensed species as a function of T [K], and its range."""
    one = NASA[name]
    ranges, rows = one['thermo']['temperature-ranges'], one['thermo']['data']
    mass = sum(n * cantera.Element(element).weight for element, n in one['composition'].items()) / 1000
    first = 0 if one['thermo']['model'] == 'NASA7' else -2

    def cp(T):
        i = max(0, min(len(rows) - 1, sum(T > end for end in ranges[1:-1])))
        count = 5 if first == 0 else 7
        return 8.314462618 / mass * sum(rows[i][j] * T ** (j + first) for j in range(count))
    return cp, ranges[0], ranges[-1]


with open(os.path.join(os.path.dirname(chemicals.__file__), 'Heat Capacity', 'Perrys Table 2-151.json')) as file:
    PERRY = [one for phases in json.load(file).values() for one in phases.values()]


def perry(formula, subphase=None):
    """cp [J/(mol K)] as a function of T [K]; the handbook prints cal/(mol K)."""
    (one,) = [x for x in PERRY if x['Formula'] == formula and x['Subphase'] == subphase and x['Phase'] in ('c', 'gls')]
    return (lambda T: 4.184 * (one['Const'] + one['Lin'] * T + one['Quadinv'] / T ** 2 + one['Quad'] * T ** 2)), one['Tmin'], one['Tmax']


def fitted(fit):
    """Value of a fit of NIST as a function of T [K]."""
    terms = [fit['coeffs'][letter] for letter in 'abcdefghi' if letter in fit['coeffs']]
    if fit['form'] == 'log10poly':
        return lambda T: 10 ** sum(a * log10(T) ** i for i, a in enumerate(terms))
    return lambda T: sum(a * T ** i for i, a in enumerate(terms))


def slope(law, T):
    return (law(T + 0.5) - law(T - 0.5))


def cryopy(name):
    """The module of an alloy; the package does not list those of its sandbox."""
    folder = list(importlib.util.find_spec('cryopy').submodule_search_locations)[0]
    found = importlib.util.spec_from_file_location(name, os.path.join(folder, 'material', 'sandbox', f'{name}.py'))
    module = importlib.util.module_from_spec(found)
    found.loader.exec_module(module)
    return module


def write(name):
    with open(os.path.join(HERE, name), 'w', newline='') as out:
        writer = csv.writer(out, lineterminator='\n')
        writer.writerow(['material', 'property', 'T [K]', 'p [Pa]', 'share', 'value [SI]', 'reference'])
        writer.writerows(ROWS)
    print(len(ROWS), 'states of', len({row[0] for row in ROWS}), 'materials')
