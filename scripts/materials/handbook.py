"""Correlations of Perry's Handbook and the VDI Heat Atlas, as the package chemicals carries them, for saturated liquids and dilute gases."""
import csv
import functools
import math
import os

import chemicals

from emit import number

CARRIED = 'constants as carried by chemicals 1.5.2 (MIT licence)'
PERRY = "Perry's Chemical Engineers' Handbook, 8th ed. (2007)"
VDI = 'VDI Heat Atlas, 2nd ed. (2010), D3.1'
R = 8.31446261815324
ROOT = os.path.dirname(chemicals.__file__)

TABLES = {
    ('viscosity', 'vapour', 'perry'): ('Viscosity/Table 2-312 Vapor Viscosity of Inorganic and Organic Substances.tsv', 'table 2-312'),
    ('viscosity', 'liquid', 'perry'): ('Viscosity/Table 2-313 Viscosity of Inorganic and Organic Liquids.tsv', 'table 2-313'),
    ('viscosity', 'vapour', 'vdi'): ('Viscosity/VDI PPDS Dynamic viscosity of gases polynomials.tsv', 'table 8'),
    ('viscosity', 'liquid', 'vdi'): ('Viscosity/VDI PPDS Dynamic viscosity of saturated liquids polynomials.tsv', 'table 7'),
    ('thermalConductivity', 'vapour', 'perry'): ('Thermal Conductivity/Table 2-314 Vapor Thermal Conductivity of Inorganic and Organic Substances.tsv', 'table 2-314'),
    ('thermalConductivity', 'liquid', 'perry'): ('Thermal Conductivity/Table 2-315 Thermal Conductivity of Inorganic and Organic Liquids.tsv', 'table 2-315'),
    ('thermalConductivity', 'vapour', 'vdi'): ('Thermal Conductivity/VDI PPDS Thermal conductivity of gases.tsv', 'table 10'),
    ('thermalConductivity', 'liquid', 'vdi'): ('Thermal Conductivity/VDI PPDS Thermal conductivity of saturated liquids.tsv', 'table 9'),
    ('density', 'liquid', 'perry'): ('Density/Perry Parameters 105.tsv', 'table 2-32'),
    ('density', 'liquid', 'vdi'): ('Density/VDI PPDS Density of Saturated Liquids.tsv', 'table 2'),
    ('surfaceTension', 'liquid', 'vdi'): ('Interface/VDI PPDS surface tensions.tsv', 'table 11'),
    ('surfaceTension', 'liquid', 'jasper'): ('Interface/Jasper-Lange.tsv', ''),
    ('latentHeat', 'liquid', 'perry'): ('Phase Change/Table 2-150 Heats of Vaporization of Inorganic and Organic Liquids.tsv', 'table 2-150'),
    ('latentHeat', 'liquid', 'vdi'): ('Phase Change/VDI PPDS Enthalpies of vaporization.tsv', 'table 4'),
    ('vapourPressure', 'liquid', 'perry'): ('Vapor Pressure/Table 2-8 Vapor Pressure of Inorganic and Organic Liquids.tsv', 'table 2-8'),
    ('vapourPressure', 'liquid', 'vdi'): ('Vapor Pressure/VDI PPDS Boiling temperatures at different pressures.tsv', 'table 3'),
    ('specificHeatCapacity', 'liquid', 'perry'): ('Heat Capacity/Perry_Table_2-153_DIPPR_100.tsv', 'table 2-153'),
    ('specificHeatCapacity', 'liquid', 'zabransky'): ('Heat Capacity/Zabransky.tsv', ''),
    ('vapourPressure', 'liquid', 'landolt'): ('Vapor Pressure/Landolt_antoine_V20.tsv', ''),
    ('specificHeatCapacity', 'vapour', 'poling'): ('Heat Capacity/PolingDatabank.tsv', ''),
}
WORKS = {'perry': "Perry's Handbook", 'vdi': 'the VDI Heat Atlas', 'jasper': 'Jasper (1972)', 'zabransky': 'Zabransky and others (2010)', 'bergman': 'Bergman and others (2011)', 'cheng': 'Cheng (2008)', 'landolt': 'Landolt-Boernstein IV/20'}
# What such correlations are good for at best, 95 %.
FLOORS = {('viscosity', 'vapour'): 5, ('viscosity', 'liquid'): 8, ('thermalConductivity', 'vapour'): 8, ('thermalConductivity', 'liquid'): 6, ('density', 'liquid'): 1, ('surfaceTension', 'liquid'): 5, ('latentHeat', 'liquid'): 4, ('vapourPressure', 'liquid'): 3, ('specificHeatCapacity', 'liquid'): 3}


# Bergman, Lavine, Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 7th ed. (2011), table A.5: ethylene glycol and glycerin.
BERGMAN = {
    '107-21-1': {
        'density': [[273, 1130.8], [280, 1125.8], [290, 1118.8], [300, 1114.4], [310, 1103.7], [320, 1096.2], [330, 1089.5], [340, 1083.8], [350, 1079.0], [360, 1074.0], [370, 1066.7], [373, 1058.5]],
        'viscosity': [[273, 0.0651], [280, 0.042], [290, 0.0247], [300, 0.0157], [310, 0.0107], [320, 0.00757], [330, 0.00561], [340, 0.00431], [350, 0.00342], [360, 0.00278], [370, 0.00228], [373, 0.00215]],
        'thermalConductivity': [[273, 0.242], [280, 0.244], [290, 0.248], [300, 0.252], [310, 0.255], [320, 0.258], [330, 0.26], [340, 0.261], [350, 0.261], [360, 0.261], [370, 0.262], [373, 0.263]],
        'specificHeatCapacity': [[273, 2294.0], [280, 2323.0], [290, 2368.0], [300, 2415.0], [310, 2460.0], [320, 2505.0], [330, 2549.0], [340, 2592.0], [350, 2637.0], [360, 2682.0], [370, 2728.0], [373, 2742.0]],
    },
    '56-81-5': {
        'density': [[273, 1276.0], [280, 1271.9], [290, 1265.8], [300, 1259.9], [310, 1253.9], [320, 1247.2]],
        'specificHeatCapacity': [[273, 2261], [280, 2298], [290, 2367], [300, 2427], [310, 2490], [320, 2564]],
        'viscosity': [[273, 10.6], [280, 5.34], [290, 1.85], [300, 0.799], [310, 0.352], [320, 0.21]],
        'thermalConductivity': [[273, 0.282], [280, 0.284], [290, 0.286], [300, 0.286], [310, 0.286], [320, 0.287]],
    },
}
UNITS = {'density': 'kg/m^3', 'specificHeatCapacity': 'J/(kg K)', 'viscosity': 'Pa s', 'thermalConductivity': 'W/(m K)'}


def bergman(key, cas):
    rows = BERGMAN.get(cas, {}).get(key)
    if rows is None:
        return None

    def value(T):
        (a, x), (b, y) = next(pair for pair in zip(rows, rows[1:]) if T <= pair[1][0])
        share = (T - a) / (b - a)
        return x * (y / x) ** share if key == 'viscosity' else x + (y - x) * share
    return 'table', {'gives': UNITS[key], **({'interpolate': 'logarithm'} if key == 'viscosity' else {}), 'rows': rows}, value, rows[0][0], rows[-1][0]


def cheng(key, cas):
    """Glycerol after Cheng, Ind. Eng. Chem. Res. 47 (2008) 3285; 0 to 100 degC."""
    if cas != '56-81-5' or key not in ('density', 'viscosity'):
        return None

    def value(T):
        t = T - 273.15
        return 1277 - 0.654 * t if key == 'density' else 12.1 * math.exp((-1233 + t) * t / (9900 + 70 * t))
    return 'compared only', {}, value, 273.15, 373.15


@functools.cache
def table(file):
    with open(os.path.join(ROOT, file), encoding='utf-8') as source:
        lines = list(csv.reader(source, delimiter='\t'))
    return lines[0], {line[0]: line for line in reversed(lines[1:]) if line}, lines[1:]


def row(key, side, work, cas):
    """Numbers of one substance by column name; None where the work has none."""
    place = TABLES.get((key, side, work))
    if place is None:
        return None
    head, by_cas, _ = table(place[0])
    line = by_cas.get(cas)
    if line is None:
        return None
    out = {}
    for name, text in zip(head, line):
        try:
            out[name] = float(text)
        except ValueError:
            pass
    return out


def eq101(c, T):
    return math.exp(c['C1'] + c['C2'] / T + c['C3'] * math.log(T) + (c['C4'] * T ** c['C5'] if c['C4'] else 0))


def law(key, side, work, cas, M):
    """Model, constants, value as a function of T in SI, temperature limits where stated."""
    if work in ('bergman', 'cheng'):
        return {'bergman': bergman, 'cheng': cheng}[work](key, cas)
    c = row(key, side, work, cas)
    if c is None:
        return None
    low, high = c.get('Tmin'), c.get('Tmax')
    if key in ('viscosity', 'thermalConductivity'):
        if work == 'vdi' and key == 'viscosity' and side == 'liquid':
            keys = {k: c[k] for k in 'ABCDE'}
            low, high = c['D'] + 1, c['C']

            def value(T):
                x = (c['C'] - T) / (T - c['D'])
                return c['E'] * math.exp(math.copysign(abs(x) ** (1 / 3), x) * (c['A'] + c['B'] * x))
            return 'liquid-viscosity', {**keys, 'gives': 'Pa s'}, value, low, high
        if work == 'vdi':
            terms = [c[k] for k in 'ABCDE']
            while terms and terms[-1] == 0:
                terms.pop()
            return 'polynomial', {'gives': 'Pa s' if key == 'viscosity' else 'W/(m K)', 'terms': terms}, lambda T: sum(a * T ** i for i, a in enumerate(terms)), None, None
        if side == 'vapour':
            keys = {'A': c['C1'], 'B': c['C2'], 'C': c['C3'], 'D': c['C4']}
            return 'gas-powers', {**keys, 'gives': 'Pa s' if key == 'viscosity' else 'W/(m K)'}, lambda T: c['C1'] * T ** c['C2'] / (1 + c['C3'] / T + c['C4'] / T ** 2), low, high
        if key == 'viscosity':
            terms = [[c['C1'], 0], [c['C2'], -1], *([[c['C4'], c['C5']]] if c['C4'] else [])]
            return 'log-powers', {'gives': 'Pa s', 'terms': terms, **({'log': c['C3']} if c['C3'] else {})}, lambda T: eq101(c, T), low, high
        terms = [c[f'C{i}'] for i in range(1, 6)]
        while terms[-1] == 0:
            terms.pop()
        return 'polynomial', {'gives': 'W/(m K)', 'terms': terms}, lambda T: sum(a * T ** i for i, a in enumerate(terms)), low, high
    if key == 'density':
        if work == 'perry':
            A, B, C, D = c['C1'] * M, c['C2'], c['C3'], c['C4']
            return 'rackett', {'A': A, 'B': B, 'C': f'{number(C)} K', 'D': D}, lambda T: A / B ** (1 + max(0, 1 - T / C) ** D), low, high
        terms = [[c[k], e] for k, e in zip('ABCD', (0.35, 2 / 3, 1, 4 / 3))]
        return 'critical-powers', {'critical': f"{number(c['Tc'])} K", 'base': c['rhoc'], 'gives': 'kg/m^3', 'terms': terms}, lambda T: c['rhoc'] + sum(n * max(0, 1 - T / c['Tc']) ** e for n, e in terms), None, None
    if key == 'surfaceTension':
        if work == 'jasper':
            return 'polynomial', {'gives': 'mN/m', 'argument': 'degC', 'terms': [c['a'], -c['b']]}, lambda T: 1e-3 * (c['a'] - c['b'] * (T - 273.15)), low, high
        terms = [c[k] for k in 'BCDE']
        return 'reduced-power', {'critical': f"{number(c['Tc'])} K", 'A': c['A'], 'terms': terms, 'gives': 'N/m'}, lambda T: c['A'] * max(0, 1 - T / c['Tc']) ** sum(t * (T / c['Tc']) ** i for i, t in enumerate(terms)), c['Tm'], c['Tc']
    if key == 'latentHeat':
        if work == 'perry':
            terms = [c['C2'], c['C3'], c['C4'], 0]
            A = c['C1'] / M
            return 'reduced-power', {'critical': f"{number(c['Tc'])} K", 'A': A, 'terms': terms, 'gives': 'J/kg'}, lambda T: A * max(0, 1 - T / c['Tc']) ** sum(t * (T / c['Tc']) ** i for i, t in enumerate(terms)), low, high
        terms = [[R * c['Tc'] * c[k] / M, e] for k, e in zip('ABCDE', (1 / 3, 2 / 3, 1, 2, 6))]
        return 'critical-powers', {'critical': f"{number(c['Tc'])} K", 'gives': 'J/kg', 'terms': terms}, lambda T: sum(n * max(0, 1 - T / c['Tc']) ** e for n, e in terms), None, None
    if key == 'vapourPressure':
        if work == 'landolt':
            return 'log-antoine', {}, lambda T: math.exp(c['A'] - c['B'] / (T + c['C'])), low, high
        if work == 'perry':
            terms = [[c['C1'], 0], [c['C2'], -1], *([[c['C4'], c['C5']]] if c['C4'] else [])]
            return 'log-powers', {'gives': 'Pa', 'terms': terms, 'log': c['C3']}, lambda T: eq101(c, T), low, high
        terms = [[c[k], e] for k, e in zip('ABCD', (1, 1.5, 2.5, 5))]
        return 'saturation-powers', {'temperature': f"{number(c['Tc'])} K", 'pressure': f"{number(c['Pc'])} Pa", 'terms': terms}, lambda T: c['Pc'] * math.exp(c['Tc'] / T * sum(n * max(0, 1 - T / c['Tc']) ** e for n, e in terms)), c['Tm'], c['Tc']
    if key == 'specificHeatCapacity' and work == 'perry':
        terms = [c[k] / (1000 * M) for k in 'ABCDE']
        while terms[-1] == 0:
            terms.pop()
        return 'polynomial', {'gives': 'J/(kg K)', 'terms': terms}, lambda T: sum(a * T ** i for i, a in enumerate(terms)), low, high
    if key == 'specificHeatCapacity' and work == 'zabransky':
        head, _, lines = table(TABLES[(key, side, work)][0])
        best = None
        for line in lines:
            if line[0] != cas or not any(float(x or 0) for x in line[6:10]):
                continue
            given = dict(zip(head, line))
            low, high = float(given['Tmin']), float(given['Tmax'])
            if best is None or high - low > best[1] - best[0]:
                best = (low, high, [float(given[f'A{i}-spline']) * R / M for i in range(1, 5)])
        if best is None:
            return None
        low, high, terms = best
        return 'polynomial', {'gives': 'J/(kg K)', 'scale': '100 K', 'terms': terms}, lambda T: sum(a * (T / 100) ** i for i, a in enumerate(terms)), low, high
    raise ValueError((key, work))


def source(key, side, work):
    works = {'perry': PERRY, 'vdi': VDI, 'jasper': 'Jasper, J. Phys. Chem. Ref. Data 1 (1972) 841', 'zabransky': 'Zabransky, Kolska, Ruzicka and Domalski, J. Phys. Chem. Ref. Data 39 (2010) 013103'}
    if work == 'bergman':
        return 'Bergman, Lavine, Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 7th ed. (2011), table A.5'
    place = TABLES[(key, side, work)][1]
    return f"{works[work]}{', ' + place if place and work == 'perry' else ''}; {CARRIED}"


def spread(one, other, low, high):
    """Largest relative difference of two laws over a range, in per cent; None where they share none."""
    low, high = max(low, other[3] or low), min(high, other[4] or high)
    if not high > low:
        return None
    worst = 0
    for i in range(25):
        T = low + (high - low) * i / 24
        a, b = one[2](T), other[2](T)
        if not (a > 0 and b > 0):
            return None
        worst = max(worst, abs(a / b - 1))
    return 100 * worst


def agreeing(first, second, low, high, floor):
    """The longest stretch, of twelve equal ones, over which two works agree within the floor and a half, and how closely [per cent]."""
    edges = [low + (high - low) * i / 12 for i in range(13)]
    apart = [spread(first, second, a, b) for a, b in zip(edges, edges[1:])]
    best = (0, 0)
    for i in range(12):
        j = i
        while j < 12 and apart[j] is not None and apart[j] <= 1.5 * floor:
            j += 1
        best = max(best, (i, j), key=lambda pair: pair[1] - pair[0])
    i, j = best
    if j - i < 3:
        return None
    return edges[i], edges[j], max(floor, math.ceil(1.1 * max(apart[i:j])))


def entry(key, side, cas, M, low, high, pressure, works, phase=True):
    """The first work's correlation between two temperatures; uncertainty from the second work, not below the floor."""
    laws = [(work, law(key, side, work, cas, M)) for work in works]
    laws = [(work, one) for work, one in laws if one is not None]
    if not laws:
        return None
    work, first = laws[0]
    low, high = max(low, first[3] or low), min(high, first[4] or high)
    if not high > low + 5:
        return None
    floor = FLOORS[(key, side)]
    second = laws[1] if len(laws) > 1 else None
    apart = spread(first, second[1], low, high) if second else None
    # Where the works part at the ends of the range, the range is cut until they agree within four floors.
    while apart is not None and apart > 4 * floor and high - low > 40:
        apart_low, apart_high = spread(first, second[1], low + 5, high), spread(first, second[1], low, high - 5)
        if apart_low is None or apart_high is None:
            break
        if apart_low < apart_high:
            low, apart = low + 5, apart_low
        else:
            high, apart = high - 5, apart_high
    value = floor * 1.6 if apart is None else max(floor, math.ceil(1.1 * apart))
    said = f'; uncertainty at least the difference from {WORKS[second[0]]} over the range' if apart is not None else '; not held against a second work: the uncertainty is from memory of such correlations'
    uncertainty = f'{number(float(value))} %'
    inner = agreeing(first, second[1], low, high, floor) if second and value > 1.5 * floor else None
    if inner is not None and inner[2] < value:
        a, b, close = inner
        uncertainty = [{'T': [f'{number(round(a, 2))} K', f'{number(round(b, 2))} K'], 'value': f'{number(float(close))} %'}, {'value': uncertainty}]
    out = {'model': first[0], **({'phase': side} if phase else {}), 'range': {'T': [f'{number(round(low, 2))} K', f'{number(round(high, 2))} K'], **({'p': ['0 Pa', f'{number(pressure)} Pa']} if pressure else {})}, 'uncertainty': uncertainty, 'source': source(key, side, work) + said, 'constants': first[1]}
    return out


def transport(key, cas, f):
    """Entries of the saturated liquid and the dilute gas of a fluid with an equation of state."""
    liquid_high = 0.9 * f['Tc']
    import CoolProp.CoolProp as CP
    top = max(2e6, 1.05 * CP.PropsSI('P', 'T', liquid_high, 'Q', 0, f['name']))
    pairs = [entry(key, 'liquid', cas, f['M'], f['low'], liquid_high, float(f'{top:.2g}'), ('perry', 'vdi')), entry(key, 'vapour', cas, f['M'], f['low'], min(1000, max(f['high'], 1.5 * f['Tc'])), float(f"{max(0.04 * f['pc'], 2e5):.2g}"), ('perry', 'vdi'))]
    found = [one for one in pairs if one is not None]
    return found + ([dense(key, found[-1], f)] if found and found[-1]['phase'] == 'vapour' else [])


# What pressure adds, beside the thin gas [%]: colder than 1.15 T_c to half the critical pressure, warmer, from 2 T_c on. Each lies above the largest
# difference of the method from the reference correlations of eighteen other fluids (test/properties/dense-gas.test.ts).
PRESSED = {'viscosity': ('dense-gas-viscosity', 'Dean and Stiel, AIChE J. 11 (1965) 526', (15, 20, 9)), 'thermalConductivity': ('dense-gas-conductivity', 'Stiel and Thodos, AIChE J. 10 (1964) 26', (12, 22, 12))}


def dense(key, thin, f):
    """The gas under pressure: the thin gas with what its density adds; the surroundings of the critical point are left out."""
    model, source, (cold, warm, hot) = PRESSED[key]
    low, high = (float(text.split()[0]) for text in thin['range']['T'])
    start = float(thin['range']['p'][1].split()[0])
    high = min(high, f['high'])
    Tc, pc = f['Tc'], f['pc']
    # Gases of quanta are denser than the method was held against below three times their critical temperature.
    edge = 3 * Tc if Tc < 50 else 1.15 * Tc
    T = lambda value: f'{number(round(value, 2))} K'
    boxes = [{'T': [T(a), T(b)], 'p': [f'{number(start)} Pa', f'{number(p)} Pa']} for a, b, p in ((max(low, 0.7 * Tc), min(high, 1.15 * Tc), float(f'{0.5 * pc:.3g}')), (max(low, edge), high, 1e7)) if b > a + 5 and p > start]
    known = thin['uncertainty'] if isinstance(thin['uncertainty'], str) else thin['uncertainty'][-1]['value']
    own = float(known.split()[0])
    total = lambda more: f'{math.ceil(math.hypot(own, more))} %'
    bands = [*([{'T': [T(2 * Tc), T(high)], 'value': total(hot)}] if high > 2 * Tc else []), {'T': [T(min(low, Tc)), T(1.15 * Tc - 0.01)], 'value': total(cold)}, {'value': total(warm)}]
    return {'model': model, 'phase': 'vapour', 'range': boxes, 'uncertainty': bands, 'source': f'{source}, on the thin gas of the handbook; held against other fluids, not against this one', 'constants': {}}


def tension(cas, low, high):
    return entry('surfaceTension', 'liquid', cas, 1, low, high * 0.98, None, ('vdi', 'jasper'), phase=False)
