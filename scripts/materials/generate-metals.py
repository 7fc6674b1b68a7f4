"""Records of metals, alloys, refractory bricks, ceramics and quartz glass.

Run with:  python3 scripts/materials/generate-metals.py   (needs ht 1.2.0)
Metals stand in metals.csv beside this file: conductivity, heat capacity and linear expansion [1e-6 1/K] by temperature. Bricks: tables
of ht (MIT licence), of the VDI Heat Atlas. Where the literature disagrees, doubts-of-metals.yaml says by how much and with whom.
"""
import csv
import os
from math import exp

import yaml
from ht.insulation import building_materials, refractories, refractory_VDI_k

from record import K, write
from solid_entries import BERGMAN, VDI, constant, emissivity, expansion, melting, table

HERE = os.path.dirname(os.path.abspath(__file__))
BY = 'generate-metals.py'
COMPARED = 'held against other tables, see the comparison of metals and ceramics'
EXPANSION = 'linear expansion of Kaye and Laby, Tables of Physical and Chemical Constants, and of data sheets, times three, from memory'

# Alloys of metals.csv that the book does not list.
SHEETS = {'galvanised steel', 'titanium alloy Ti-6Al-4V', 'nickel alloy 625', 'nickel alloy 718', 'aluminium alloy 6061', 'aluminium alloy 5083', 'aluminium alloy 7075', 'cast alloy AlSi10Mg', 'copper-nickel 90-10', 'duplex steel 2205', 'invar', 'magnesium alloy AZ91', 'aluminium bronze'}

# Heat capacity peaks where iron and nickel lose their magnetism and steel changes phase: the table does not follow them.
PEAKS = {'nickel': (550, 700), 'iron': (850, 1000), 'carbon steel 1010': (850, 973), 'chromium-molybdenum steel': (850, 973)}

# Where the table of the textbook is overtaken.
CRC = 'CRC Handbook of Chemistry and Physics, 97th ed. (2016), as in chemicals 1.5.2'
MELTS_NOW = {'chromium': f'{CRC}; the textbook has 2118 K', 'beryllium': f'{CRC}; the textbook has 1550 K', 'tantalum': f'{CRC}; the textbook has 3269 K', 'titanium': f'{CRC}; the textbook has 1953 K', 'tungsten': f'{CRC}; the textbook has 3660 K'}

with open(os.path.join(HERE, 'doubts-of-metals.yaml')) as file:
    DOUBTS = yaml.safe_load(file)
NARROWED = DOUBTS.pop('narrowed')


def doubted(record):
    """The record with the uncertainties, and the reasons for them, of doubts-of-metals.yaml; ranges end where nothing compares any more."""
    for prop, (low, high) in NARROWED.get(record['name'], {}).items():
        record[prop]['range'] = {'T': K(low, high)}
    for prop, (uncertainty, reason) in DOUBTS.get(record['name'], {}).items():
        entry = record[prop]
        peak = entry['uncertainty'] if isinstance(entry['uncertainty'], list) else None
        entry['uncertainty'] = [peak[0], {'value': uncertainty}] if peak else uncertainty
        entry['source'] += f'; {reason}'
    return record


def at(rows, x):
    """Straight line between the rows, carried on beyond them."""
    i = next((j for j in range(1, len(rows) - 1) if x <= rows[j][0]), len(rows) - 1)
    (x0, y0), (x1, y1) = rows[i - 1], rows[i]
    return y0 + (y1 - y0) * (x - x0) / (x1 - x0)


def shrunk(rho, linear, temperatures):
    """Density by temperature from that at 300 K, rho exp(-3 integral of the linear expansion)."""
    def grown(T, steps=60):
        h = (T - 300) / steps
        return sum(at(linear, 300 + (i + 0.5) * h) for i in range(steps)) * h * 1e-6
    return [[T, float(f'{rho * exp(-3 * grown(T)):.5g}')] for T in temperatures]


def metals():
    with open(os.path.join(HERE, 'metals.csv')) as file:
        for row in csv.DictReader(file):
            pairs = lambda text: [[float(T), float(v)] for T, v in (pair.split(':') for pair in text.split())]
            k, cp = pairs(row['k']), pairs(row['cp'])
            if k[0][0] == 300 == cp[0][0]:
                # Data sheets hold at 20 degC as well.
                k, cp = ([[293.0, float(f'{at(rows, 293):.4g}')] if len(rows) > 1 else None, *rows] for rows in (k, cp))
                k, cp = ([row for row in rows if row] for rows in (k, cp))
            low, high = min(k[0][0], cp[0][0]), max(k[-1][0], cp[-1][0])
            source = f'{BERGMAN}, table A.1, digits from memory; {COMPARED}' if row['name'] not in SHEETS else f'data sheets of the alloy, ASM Handbook and MIL-HDBK-5J (2003), from memory; {COMPARED}'
            between = f'{source}; rows between those of the book: Ho, Powell and Liley, J. Phys. Chem. Ref. Data 1 (1972) 279, from memory' if len(k) > 6 and row['kind'] == 'metal' else source
            alloy = row['kind'] == 'alloy'
            one = lambda rows, uncertainty, source, unit: table(rows, uncertainty, source, unit) if len(rows) > 1 else {**constant(f'{rows[0][1]:g} {unit}', (rows[0][0] - 100, rows[0][0] + 100), uncertainty, source)}
            linear = pairs(row['linear']) if ':' in row['linear'] else [[200.0, float(row['linear'])], [1000.0, float(row['linear'])]]
            steps = [T for T in (100, 200, 300, 400, 500, 600, 800, 1000, 1200) if low < T < high]
            ends = [max(273.15, linear[0][0]), *(T for T, _ in linear if 280 < T < 473), 473.15]
            record = {'name': row['name'], **({'formula': row['formula']} if row['formula'] else {}), 'aliases': [a for a in row['aliases'].split('|') if a], 'kind': 'solid', 'phases': ['solid'], **({'about': row['about']} if row['about'] else {}),
                      'density': table(shrunk(float(row['rho']), linear, [low, *steps, high]), '2 %', f'{source}; at 300 K, and by the expansion from there', 'kg/m^3'),
                      'thermalConductivity': one(k, '8 %' if alloy else '5 %', between, 'W/(m K)'), 'specificHeatCapacity': one(cp, '5 %' if alloy else '4 %', source, 'J/(kg K)'),
                      'thermalExpansion': table([[T, float(f'{3e-6 * at(linear, T):.4g}')] for T in ends], '12 %', EXPANSION, '1/K') if ':' in row['linear'] else expansion(float(row['linear']), (273.15, 473.15), EXPANSION),
                      'meltingTemperature': melting(row['mp'], MELTS_NOW.get(row['name'], source))}
            if row['name'] in PEAKS:
                usual = record['specificHeatCapacity']['uncertainty']
                record['specificHeatCapacity']['uncertainty'] = [{'T': K(*PEAKS[row['name']]), 'value': '15 %'}, {'value': usual}]
            surfaces = [(s, (float(a), float(b)), float(e), int(u)) for s, a, b, e, u in (one.split(':') for one in row['emissivity'].split('|') if one)]
            if surfaces:
                record['emissivity'] = emissivity(surfaces, f'{BERGMAN}, table A.11, and handbook tables of emissivity, from memory')
            write(doubted(record), BY + ' from metals.csv')


metals()

# Refractories. The atlas tabulates the heat capacity from 20 degC up to t, as the comparison with the enthalpies of pure alumina, mullite
# and graphite shows (within 2 %): the value at t is the slope of c(t) (t - 20).
MEANS = f'{VDI}, mean from 20 degC to t, here its slope d(c (t - 20))/dt; {COMPARED}'


def fitted(basis, ys):
    """Weights of three basis functions, given as columns, by the normal equations."""
    rows = [[*(sum(p * q for p, q in zip(one, other)) for other in basis), sum(p * y for p, y in zip(one, ys))] for one in basis]
    for i in range(3):
        rows[i] = [v / rows[i][i] for v in rows[i]]
        for j in range(3):
            if j != i:
                rows[j] = [v - rows[j][i] * w for v, w in zip(rows[j], rows[i])]
    return [row[3] for row in rows]


def at_temperature(means, temperatures, T0=293.15):
    """Heat capacities from their means from T0 to T [K]: a + b T + c/T is the mean of a + b (2 T - T0) + c T0/T^2, the form of Maier and Kelley."""
    a, b, c = fitted([[1.0] * len(means), list(temperatures), [1 / T for T in temperatures]], means)
    return [a + b * (2 * T - T0) + c * T0 / T ** 2 for T in temperatures]


# Bricks whose conductivity another table has as well.
TWO_TABLES = {'fireclay brick', 'silica brick', 'silicon carbide brick', 'insulating fire brick 1260', 'zircon brick'}
ALONE = f'{VDI}; no second table was found'
for theirs, name, aliases, mp in (
    ('Silica', 'silica brick', ['silica refractory'], 1970), ('Fireclay', 'fireclay brick', ['fireclay', 'chamotte', 'chamotte brick', 'fire brick', 'firebrick'], 1970), ('High-duty fireclay', 'high-duty fireclay brick', [], 2000),
    ('Sillimanite', 'sillimanite brick', [], 2090), ('Mullite', 'mullite brick', ['mullite'], 2120), ('Corundum 90%', 'corundum brick 90', ['high-alumina brick'], 2270), ('Corundum 99%', 'corundum brick 99', ['alumina brick'], 2300),
    ('Bauxite', 'bauxite brick', [], 2090), ('Magnesia', 'magnesia brick', ['magnesite brick'], 3000), ('Magnesite Chrome', 'magnesia-chrome brick', ['magnesite-chrome brick'], 2600), ('Dolomite P10', 'dolomite brick', [], 2600),
    ('Zirconia', 'zirconia brick', [], 2900), ('Zircon', 'zircon brick', [], 1960), ('AZS 33', 'fused-cast AZS 33', ['AZS 33', 'alumina-zirconia-silica'], 2100), ('SIC 90%', 'silicon carbide brick', ['SiC brick', 'SiC refractory'], 2500), ('L1260', 'insulating fire brick 1260', ['insulating brick', 'insulating firebrick', 'IFB 23'], 1700),
    ('L1540', 'insulating fire brick 1540', ['IFB 28'], 1950), ('Carbon, anthracite', 'carbon brick', [], 3800), ('Carbon, graphite', 'graphite brick', [], 3800), ('Fused silica', 'fused silica brick', [], 1970),
):
    rho, ks, cps = refractories[theirs]
    T = (673.15, 873.15, 1073.15, 1273.15, 1473.15)
    assert refractory_VDI_k(theirs, T[2]) == ks[2]
    write(doubted({'name': name, 'aliases': aliases, 'kind': 'solid', 'phases': ['solid'], 'about': 'porosity moves the conductivity; below 400 degC carried from there',
           'density': constant(f'{rho:g} kg/m^3', (293.15, 1473.15), '5 %', f'{VDI}; {COMPARED}' if name == 'fireclay brick' else ALONE), 'thermalConductivity': table([[t, v] for t, v in zip(T, ks)], '20 %' if name in TWO_TABLES else '25 %', f'{VDI}; {COMPARED}' if name in TWO_TABLES else ALONE, 'W/(m K)'),
           'specificHeatCapacity': table([[t, round(v)] for t, v in zip(T, at_temperature(cps, T))], '12 %' if name == 'insulating fire brick 1260' else '10 %', MEANS, 'J/(kg K)'),
           'emissivity': emissivity([('rough', (1000, 1500), 0.75, 20)], 'fireclay and other refractories, 0.6 to 0.9, handbook tables of emissivity, from memory'),
           'meltingTemperature': melting(mp, 'usual refractoriness of the class, from memory', '5 %')}), BY)

# Ceramics, glass and carbon by temperature.
A2 = f'{BERGMAN}, table A.2, digits from memory; {COMPARED}'
GRADES = f'usual values of dense technical grades, from memory; {COMPARED}'
MUNRO = f'Munro, J. Phys. Chem. Ref. Data 26 (1997) 1195, sintered alpha-SiC, k = 52000 exp(-1.24e-5 t)/(t + 437), from memory; {COMPARED}'
for name, formula, aliases, about, rho, k, cp, linear, mp, spread, source in (
    ('silicon carbide', 'SiC', ['sintered silicon carbide'], 'dense sintered ceramic; a pure crystal conducts four times as much at 300 K', 3160, [[T, float(f'{52000 * exp(-1.24e-5 * (T - 273.15)) / (T - 273.15 + 437):.4g}')] for T in (300, 400, 500, 600, 800, 1000, 1200, 1500)], [[300, 675], [400, 880], [600, 1050], [800, 1135], [1000, 1195], [1200, 1243]], 4.0, 3103, '15 %', MUNRO),
    ('silicon nitride', 'Si3N4', [], 'reaction-bonded, of 2400 kg/m^3; dense sintered grades have 3200 kg/m^3 and conduct 25 to 30 W/(m K) at 300 K', 2400, [[300, 16.0], [400, 13.9], [600, 11.3], [800, 9.88], [1000, 8.76], [1200, 8.00]], [[300, 691], [400, 778], [600, 937], [800, 1063], [1000, 1155], [1200, 1226]], 3.0, 2173, '30 %', A2),
    ('zirconium dioxide', 'ZrO2', ['zirconia', 'stabilised zirconia', 'YSZ'], 'stabilised; pure zirconia changes phase at about 1450 K and cracks', 6000, [[300, 2.2], [600, 2.1], [900, 2.1], [1200, 2.1]], [[300, 450], [600, 560], [900, 600], [1200, 630]], 10.5, 2983, '20 %', GRADES),
    ('aluminium nitride', 'AlN', ['aluminum nitride'], None, 3260, [[300, 170], [400, 130], [600, 90], [800, 67]], [[300, 740], [400, 880], [600, 1030], [800, 1110]], 4.5, 2700, '20 %', GRADES),
    ('beryllium oxide', 'BeO', ['beryllia'], None, 3000, [[300, 272], [400, 196], [600, 111], [800, 70], [1000, 47], [1200, 33]], [[300, 1030], [400, 1350], [600, 1690], [800, 1865], [1000, 1975], [1200, 2055]], 8.0, 2851, '10 %', A2),
    ('titanium dioxide', 'TiO2', ['titania', 'rutile'], None, 4157, [[300, 8.4], [400, 7.01], [600, 5.02], [800, 3.94], [1000, 3.46], [1200, 3.28]], [[300, 710], [400, 805], [600, 880], [800, 910], [1000, 930], [1200, 945]], 8.5, 2133, '15 %', A2),
    ('glass ceramic', None, ['glass-ceramic'], None, 2600, [[300, 3.98], [400, 3.64], [600, 3.28], [800, 3.08], [1000, 2.96]], [[300, 808], [400, 908], [600, 1038], [800, 1122], [1000, 1197]], 5.7, 1623, '6 %', A2),
    ('graphite', None, ['isotropic graphite', 'electrographite'], None, 1800, [[300, 105], [500, 88], [800, 66], [1200, 48], [1600, 38]], [[300, 715], [500, 1210], [800, 1640], [1200, 1900], [1600, 2030]], 4.5, 3900, '30 %', GRADES),
    ('magnesium oxide', 'MgO', ['magnesia', 'periclase'], None, 3500, [[300, 48], [400, 36], [600, 22], [800, 15.5], [1000, 11.5], [1300, 8.5]], [[300, 935], [400, 1030], [600, 1150], [800, 1200], [1000, 1230], [1300, 1280]], 12.5, 3098, '15 %', GRADES),
):
    k, cp = ([[293.0, float(f'{at(rows, 293):.4g}')], *rows] for rows in (k, cp))
    T = (293, k[-1][0])
    write(doubted({'name': name, **({'formula': formula} if formula else {}), 'aliases': aliases, 'kind': 'solid', 'phases': ['solid'], **({'about': about} if about else {}), 'density': constant(f'{rho} kg/m^3', T, '5 %', A2 if source is MUNRO else source), 'thermalConductivity': table(k, spread, source, 'W/(m K)'), 'specificHeatCapacity': table(cp, '6 %', A2 if source is MUNRO else source, 'J/(kg K)'), 'thermalExpansion': expansion(linear, (293, 600), 'linear expansion of handbooks times three, from memory', '25 %'), 'meltingTemperature': melting(mp, CRC if mp in (2851, 2983, 3103) else source, '3 %')}), BY)

check = lambda unit, value, within, source: [{'at': {'T': '300 K'}, 'expect': f'{value:g} {unit}', 'within': f'{within} %', 'source': source}]
ISO = 'ISO 10456:2007, as in ht 1.2.0 (MIT licence)'
write(doubted({'name': 'quartz glass', 'aliases': ['fused silica', 'fused quartz', 'silica glass'], 'kind': 'solid', 'phases': ['solid'],
      'density': {**constant('2200 kg/m^3', (250, 1200), '1 %', ISO), 'checks': check('kg/m^3', 2220, 1, f'{BERGMAN}, table A.2')},
      'thermalConductivity': {**table([[250, 1.29], [300, 1.38], [400, 1.51], [500, 1.63]], '6 %', A2, 'W/(m K)'), 'checks': check('W/(m K)', 1.4, 5, ISO)},
      'specificHeatCapacity': {**table([[273, 696], [300, 745], [350, 838], [400, 905], [500, 985], [600, 1040], [800, 1105], [1000, 1155], [1200, 1195]], '5 %', A2, 'J/(kg K)'), 'checks': check('J/(kg K)', 750, 5, ISO)},
      'thermalExpansion': expansion(0.52, (263.15, 333.15), f'linear expansion of handbooks times three, from memory; {COMPARED}', '25 %'), 'meltingTemperature': melting(1883, 'softening, handbooks, from memory', '2 %'),
      'emissivity': emissivity([('smooth', (280, 400), 0.93, 4)], f'{BERGMAN}, table A.11, and handbook tables of emissivity, from memory')}), BY)
rho, k, cp = building_materials['Metals, iron, cast']
write(doubted({'name': 'cast iron', 'aliases': ['grey cast iron', 'gray cast iron', 'grey iron'], 'kind': 'solid', 'phases': ['solid'], 'density': constant(f'{rho:g} kg/m^3', (250, 500), '4 %', ISO), 'thermalConductivity': constant(f'{k:g} W/(m K)', (250, 500), '20 %', ISO), 'specificHeatCapacity': constant(f'{cp:g} J/(kg K)', (250, 500), '12 %', ISO),
      'thermalExpansion': expansion(10.5, (263.15, 333.15), 'linear expansion of handbooks times three, from memory', '25 %'), 'meltingTemperature': melting(1420, 'melting, handbooks, from memory', '2 %'),
      'emissivity': emissivity([('machined', (295, 500), 0.44, 30), ('oxidised', (400, 900), 0.65, 20), ('rough, strongly oxidised', (300, 600), 0.95, 4)], f'{BERGMAN}, table A.11, and handbook tables of emissivity, from memory')}), BY)
