"""Writes independent-fluids.csv: states of pure fluids from other programs and works, for comparison within the declared uncertainties.

Run with:  python3 test/properties/independent-fluids.py   (needs CoolProp 8.0.0, chemicals 1.5.2, PyYAML)
CoolProp: its own evaluation of the equation named in each record (our constants are the ones it carries, so this holds our
evaluation to account). Perry, VDI and the like: correlations of another work than the one our record uses, on the saturation
line and for the dilute gas.
One line a state: material, reference, T [K], p [Pa], then the properties of HEAD in SI, empty where the reference has none.
"""
import csv
import math
import os
import sys

import CoolProp.CoolProp as CP
import chemicals
import yaml

here = os.path.dirname(os.path.abspath(__file__))
root = os.path.join(here, '..', '..')
sys.path.insert(0, os.path.join(root, 'scripts', 'materials'))
from handbook import law  # noqa: E402

HEAD = ['density', 'specificHeatCapacity', 'speedOfSound', 'thermalExpansion', 'viscosity', 'thermalConductivity', 'vapourPressure', 'latentHeat', 'surfaceTension']
KEYS = dict(zip(HEAD, ['D', 'C', 'A', 'isobaric_expansion_coefficient', 'V', 'L', 'P', 'H', 'I']))
rows = []


def digits(value, n=7):
    return '' if value is None or not math.isfinite(value) else f'{value:.{n}g}'


def add(material, reference, T, p, values):
    cells = [digits(values.get(k)) for k in HEAD]
    if any(cells):
        rows.append([material, reference, digits(T, 9), digits(p, 9), *cells])


def si(text):
    number, unit = text.split()
    return float(number) * {'K': 1, 'Pa': 1, 'kPa': 1e3, 'MPa': 1e6}[unit]


def boxes(entry):
    given = entry['range'] if isinstance(entry['range'], list) else [entry['range']]
    return [([si(x) for x in box['T']], [si(x) for x in box['p']]) for box in given]


def get(key, fluid, *state):
    try:
        value = CP.PropsSI(key, *state, fluid)
        return value if math.isfinite(value) else None
    except ValueError:
        return None


def from_coolprop(name, fluid, record):
    """Forty states and more over the range, and thirty-four on the saturation line."""
    handbooks = ('polynomial', 'log-powers', 'gas-powers', 'liquid-viscosity')
    own = {k: None if k not in record or (isinstance(record[k], list) and record[k][0]['model'] in handbooks) else 'own' for k in ('viscosity', 'thermalConductivity')}
    critical = si(record['critical']['temperature'])
    for box, (T, p) in enumerate(boxes(record['thermodynamics'])):
        temperatures = [T[0] + (T[1] - T[0]) * x for x in (0.004, 0.05, 0.13, 0.25, 0.36, 0.48, 0.6, 0.72, 0.85, 0.99)] if box == 0 else [T[0] + (T[1] - T[0]) * x for x in (0.01, 0.2, 0.45, 0.75)]
        temperatures += [critical * 1.01, critical * 1.1] if box == 0 else []
        pressures = [1e3, 101325, 1e6, 0.4 * p[1], p[1] * 0.99] if box == 0 else [0.5 * p[1], 0.99 * p[1]]
        for t in temperatures:
            for q in pressures:
                values = {}
                for key in HEAD[:6]:
                    if own.get(key, 'x') is None:
                        continue
                    values[key] = get(KEYS[key], fluid, 'T', t, 'P', q)
                add(name, 'CoolProp', t, q, values)
    line = record['vapourPressure']['range']['T']
    low, high = si(line[0]), si(line[1])
    for i in range(34):
        t = low + (high - low) * (0.003 + 0.977 * i / 33)
        p = get('P', fluid, 'T', t, 'Q', 0)
        liquid, vapour = get('H', fluid, 'T', t, 'Q', 0), get('H', fluid, 'T', t, 'Q', 1)
        if p is None:
            continue
        tension = get('I', fluid, 'T', t, 'Q', 0) if 'surfaceTension' in record and record['surfaceTension']['model'] == 'critical-powers' else None
        pure = record.get('triplePoint') is not None or name in ('helium', 'propylene glycol')
        add(name, 'CoolProp', t, p * 1.0002, {'vapourPressure': p, 'latentHeat': vapour - liquid if pure and None not in (liquid, vapour) else None, 'surfaceTension': tension})


def second_work(record, key, side):
    """The work that a record's entry was not taken from."""
    given = record.get(key)
    entries = given if isinstance(given, list) else [given] if given else []
    used = next((e['source'] for e in entries if e.get('phase', side) == side), '')
    return [w for w in ('perry', 'vdi') if not (w == 'perry' and 'Perry' in used.split(';')[0]) and not (w == 'vdi' and 'VDI' in used.split(';')[0])]


NAMES = {'perry': 'Perry', 'vdi': 'VDI', 'jasper': 'Jasper', 'zabransky': 'Zabransky', 'cheng': 'Cheng', 'bergman': 'Bergman', 'landolt': 'Landolt-Boernstein'}


def from_handbooks(name, cas, record, saturation, low, high, critical):
    """The saturated liquid between 0.45 and 0.85 of the critical temperature, the dilute gas from 0.65 of it on, from works that the record does not use.

    Outside, the correlations of handbooks are carried rather than measured. Thirty-two temperatures where the record itself has a
    handbook's correlation, eight elsewhere.
    """
    M = float(record['molarMass'].split()[0]) / 1000
    span = {'liquid': (max(low * 1.002, 0.45 * critical), min(high, 0.85 * critical)), 'vapour': (max(low, 0.65 * critical), min(high, 900))}
    for side, (cold, hot) in span.items():
        keys = ('density', 'specificHeatCapacity', 'viscosity', 'thermalConductivity', 'vapourPressure', 'latentHeat', 'surfaceTension') if side == 'liquid' else ('viscosity', 'thermalConductivity')
        for work in ('perry', 'vdi'):
            by_count = {}
            for key in keys:
                if work not in second_work(record, key, side) or (key not in record and key not in HEAD[:2]):
                    continue
                found = law(key, side, work, cas, M)
                if found is not None:
                    by_count.setdefault(32 if isinstance(record.get(key), list) and record[key][0]['model'] != 'entropy-scaling' else 8, {})[key] = found
            for count, of in by_count.items():
                for i in range(count):
                    T = cold + (hot - cold) * i / (count - 1)
                    values = {key: found[2](T) for key, found in of.items() if (found[3] is None or T >= found[3]) and (found[4] is None or T <= found[4])}
                    if side == 'liquid':
                        p = saturation(T) * 1.002 + 5
                    else:
                        p = 1e4 if T > 0.8 * critical else min(1e4, 0.5 * saturation(T))
                    add(name, NAMES[work], T, p, {k: v for k, v in values.items() if v > 0})


with open(os.path.join(root, 'scripts', 'materials', 'fluids.yaml')) as file:
    fluids = [one for one in yaml.safe_load(file) if not one.get('skip')]
for fluid in fluids:
    name = fluid['name']
    with open(os.path.join(root, 'materials', name.replace(' ', '-') + '.yaml')) as file:
        record = yaml.safe_load(file)
    if 'from' in fluid:
        from_coolprop(name, fluid['from'], record)
        cas = CP.get_fluid_param_string(fluid['from'], 'CAS')
        if name in ('parahydrogen', 'deuterium', 'R-410A', 'R-407C', 'R-404A', 'R-507A', 'heavy water'):
            continue
        (T, p), *_ = boxes(record['thermodynamics'])
        from_handbooks(name, cas, record, lambda t: CP.PropsSI('P', 'T', t, 'Q', 0, fluid['from']), T[0], T[1], si(record['critical']['temperature']))
    elif fluid['grade'] == 'liquid':
        cas = fluid['cas']
        M = float(record['molarMass'].split()[0]) / 1000
        for key in ('density', 'specificHeatCapacity', 'viscosity', 'thermalConductivity', 'vapourPressure', 'latentHeat', 'surfaceTension'):
            entry = record.get(key)
            if entry is None:
                continue
            low, high = [si(x) for x in entry['range']['T']]
            used = entry['source'].split(';')[0]
            works = [w for w, word in NAMES.items() if word not in used]
            for work in works:
                try:
                    found = law(key, 'liquid', work, cas, M)
                except (KeyError, ValueError):
                    found = None
                if found is None:
                    continue
                cold, hot = max(low, found[3] or low), min(high, found[4] or high)
                for i in range(30 if hot > cold else 0):
                    T = cold + (hot - cold) * (0.002 + 0.996 * i / 29)
                    # Far above saturation, so that the state is a liquid whatever the record says of boiling.
                    add(name, NAMES[work], T, 8e6 if key == 'vapourPressure' else 2e6, {key: found[2](T)})
    else:
        M = float(record['molarMass'].split()[0]) / 1000
        cp = chemicals.heat_capacity.TRC_gas_data.loc[fluid['cas']]
        low, high = [si(x) for x in record['thermalConductivity']['range']['T']]
        for i in range(32):
            T = low + (high - low) * (0.002 + 0.996 * i / 31)
            c = chemicals.TRCCp(T, *[float(cp[f'a{j}']) for j in range(8)]) / M
            R = 8.31446261815324 / M
            values = {'specificHeatCapacity': c, 'speedOfSound': math.sqrt(c / (c - R) * R * T), 'density': 101325 * M / (8.31446261815324 * T)}
            for key in ('viscosity', 'thermalConductivity'):
                found = law(key, 'vapour', 'vdi', fluid['cas'], M)
                values[key] = found[2](T)
            add(name, 'TRC and VDI', T, 101325, values)

with open(os.path.join(here, 'independent-fluids.csv'), 'w', newline='') as out:
    writer = csv.writer(out, lineterminator='\n')
    writer.writerow(['material', 'reference', 'T', 'p', *HEAD])
    writer.writerows(rows)
print(len(rows))
