"""Records of solids: glass, plastics, rubbers, woods, soils, building materials, insulations,
snow, phase-change materials, catalyst supports, food, tissue, rocks, and beds.

Run with:  python3 scripts/materials/generate-solids.py   (needs ht 1.2.0)
Tables of ht (MIT licence): building materials of ISO 10456, building materials of the ASHRAE Handbook; other values state their
source. Metals, bricks and ceramics: generate-metals.py.
"""
from ht.insulation import ASHRAE, building_materials

from record import K, write
from solid_entries import BERGMAN, constant, emissivity, expansion, melting, table

BY = 'generate-solids.py'
ISO = 'ISO 10456:2007, design values, as in ht 1.2.0 (MIT licence)'
HANDBOOK = 'ASHRAE Handbook, Fundamentals (2013), chapter 26, as in ht 1.2.0 (MIT licence)'
ROOM = (263.15, 333.15)


def solid(name, aliases, rho, k, cp, T, source, spread, about=None, checks=None, more=None, kind='solid'):
    """One value each of density, conductivity, heat capacity (or its rows by temperature); spread in percent of each."""
    record = {'name': name, 'aliases': aliases, 'kind': kind, 'phases': ['solid'], **({'about': about} if about else {}),
              'density': constant(f'{rho:g} kg/m^3', T, f'{spread[0]} %', source), 'thermalConductivity': constant(f'{k:g} W/(m K)', T, f'{spread[1]} %', source)}
    if cp:
        record['specificHeatCapacity'] = table(cp, f'{spread[2]} %', source, 'J/(kg K)') if isinstance(cp, list) else constant(f'{cp:g} J/(kg K)', T, f'{spread[2]} %', source)
    for key, list_ in (checks or {}).items():
        record[key]['checks'] = list_
    record.update(more or {})
    write(record, BY)


def check(unit, value, within, source):
    return [{'at': {'T': '300 K'}, 'expect': f'{value:g} {unit}', 'within': f'{within} %', 'source': source}]


# Building materials, plastics, rubbers, woods, stone: ISO 10456, with the ASHRAE handbook as a second table where it has the material.
A3 = f'{BERGMAN}, table A.3, from memory'
BUILDING = [
    ('Asphalt', 'asphalt', ['asphalt concrete'], (12, 45, 20), {}), ('Bitumen, pure', 'bitumen', [], (5, 15, 40), {}), ('Concrete, reinforced with 1% steel', 'reinforced concrete', ['ferroconcrete'], (5, 20, 20), {}),
    ('Glass, quartz', 'quartz glass', ['fused silica', 'fused quartz', 'silica glass'], (1, 6, 6), {'thermalConductivity': check('W/(m K)', 1.38, 5, f'{BERGMAN}, table A.2'), 'density': check('kg/m^3', 2220, 1, f'{BERGMAN}, table A.2'), 'specificHeatCapacity': check('J/(kg K)', 745, 5, f'{BERGMAN}, table A.2')}),
    ('Metals, iron, cast', 'cast iron', ['grey cast iron', 'gray cast iron', 'grey iron'], (4, 20, 12), {}), ('Plastics, polycarbonates', 'polycarbonate', ['PC'], (2, 10, 10), {}), ('Plastics, polytetrafluoroethylene (PTFE)', 'polytetrafluoroethylene', ['PTFE', 'teflon'], (3, 15, 10), {'density': check('kg/m^3', 2200, 2, A3), 'thermalConductivity': check('W/(m K)', 0.25, 15, 'polymer handbooks, 0.25 W/(m K); Bergman et al., table A.3, prints 0.35')}),
    ('Plastics, Polyvinylchloride (PVC)', 'polyvinyl chloride', ['PVC', 'rigid PVC'], (8, 15, 15), {}), ('Plastics, polymethylmethacrylate (PMMA)', 'polymethyl methacrylate', ['PMMA', 'acrylic glass', 'acrylic', 'plexiglass'], (2, 10, 13), {}), ('Plastics, polyacetate', 'polyoxymethylene', ['POM', 'acetal', 'polyacetal'], (2, 12, 10), {}),
    ('Plastics, polyamide (nylon)', 'polyamide', ['nylon', 'PA 6', 'PA 66', 'PA66'], (2, 30, 12), {}), ('Plastics, polyethylene / polythene, high density', 'polyethylene high density', ['HDPE', 'PE-HD', 'polyethylene', 'PE 100'], (3, 15, 15), {}), ('Plastics, polyethylene / polythene, low density', 'polyethylene low density', ['LDPE', 'PE-LD'], (3, 12, 12), {}),
    ('Plastics, polystyrene', 'polystyrene', ['PS'], (2, 15, 12), {}), ('Plastics, polypropylene', 'polypropylene', ['PP', 'PP-H'], (2, 12, 13), {}), ('Plastics, epoxy resin', 'epoxy resin', ['epoxy'], (5, 20, 28), {}), ('Plastics, polyurethane (PU)', 'polyurethane', ['PU', 'solid polyurethane'], (5, 20, 15), {}), ('Plastics, phenolic resin', 'phenolic resin', ['bakelite'], (5, 32, 15), {}), ('Plastics, polyester resin', 'polyester resin', [], (5, 20, 15), {}),
    ('Rubber, natural', 'natural rubber', ['rubber', 'soft rubber'], (20, 15, 10), {'density': check('kg/m^3', 1100, 20, A3), 'thermalConductivity': check('W/(m K)', 0.13, 5, A3), 'specificHeatCapacity': check('J/(kg K)', 2010, 10, A3)}),
    ('Rubber, neoprene (polychloroprene)', 'chloroprene rubber', ['neoprene', 'CR rubber'], (5, 25, 15), {}), ('Rubber, ethylene propylene diene monomer (EPDM)', 'EPDM rubber', ['EPDM'], (10, 20, 25), {}), ('Rubber, butyl (isobutene), solid melt', 'butyl rubber', ['IIR'], (20, 40, 28), {}), ('Rubber, hard rubber (ebonite), solid', 'hard rubber', ['ebonite'], (5, 10, 25), {}), ('Sealant, silicone, pure', 'silicone rubber', ['VMQ', 'silicone'], (8, 45, 36), {}), ('Sealant, elastomeric foam, flexible', 'elastomeric foam', ['flexible elastomeric foam', 'FEF', 'rubber foam'], (25, 30, 15), {}),
    ('Gypsum, plasterboard', 'plasterboard', ['gypsum board', 'drywall'], (20, 35, 20), {}), ('Plasters and renders, cement sand', 'cement plaster', ['cement render', 'mortar'], (20, 30, 30), {}), ('Stone, natural pumice', 'pumice', [], (30, 30, 15), {}),
    ('Tiles, ceramic or porcelain', 'porcelain', ['ceramic tile', 'stoneware'], (5, 30, 20), {}), ('Tiles, clay', 'clay tile', ['roof tile', 'terracotta'], (10, 25, 15), {}),
    ('Wood, plywood 500 kg/m^3', 'plywood', [], (12, 35, 27), {}), ('Wood, particleboard, 600 kg/m^3', 'particleboard', ['chipboard'], (15, 25, 25), {}), ('Wood, oriented strand board', 'oriented strand board', ['OSB'], (10, 25, 18), {}), ('Wood, fibreboard, 800 kg/m^3', 'medium-density fibreboard', ['MDF', 'fibreboard'], (12, 35, 25), {}),
    ('Solids, clay or silt', 'clay', ['silt', 'clay soil'], (15, 40, 60), {'thermalConductivity': check('W/(m K)', 1.3, 20, A3)}), ('Floor covering, tiles, cork', None, [], (), {}), ('Floor covering, Linoleum', 'linoleum', [], (8, 15, 15), {}), ('Floor covering, carpet / textile flooring', 'carpet', [], (40, 55, 15), {}),
]
LINEAR = {'polycarbonate': 68, 'polytetrafluoroethylene': 130, 'polyvinyl chloride': 70, 'polymethyl methacrylate': 72, 'polyoxymethylene': 110, 'polyamide': 85, 'polyethylene high density': 130, 'polyethylene low density': 200, 'polystyrene': 75, 'polypropylene': 130, 'epoxy resin': 60, 'quartz glass': 0.55, 'cast iron': 10.5, 'porcelain': 6, 'reinforced concrete': 11, 'silicone rubber': 270, 'natural rubber': 220}
MELTS = {'polytetrafluoroethylene': 600, 'polyoxymethylene': 438, 'polyamide': 493, 'polyethylene high density': 403, 'polyethylene low density': 383, 'polypropylene': 436, 'cast iron': 1420, 'quartz glass': 1883}
# Where another table or measurements contradict ISO 10456: density, conductivity, heat capacity (None keeps that of ISO), and why.
BETWEEN = 'between ISO 10456:2007'
INSTEAD = {
    'bitumen': (None, None, 1740, 'heat capacity of petroleum asphalts, 1.67 kJ/(kg K) at 0 degC to 1.9 at 80 degC, handbooks, from memory; ISO 10456 prints 1.0'),
    'plasterboard': (750, 0.21, None, f'{BETWEEN} (900 kg/m^3, 0.25 W/(m K)) and the ASHRAE Handbook (640 kg/m^3, 0.16 W/(m K)), as in ht 1.2.0'),
    'plywood': (None, 0.12, 1500, f'conductivity and heat capacity {BETWEEN} (0.13 W/(m K), 1600 J/(kg K)), the ASHRAE Handbook (0.09 to 0.10, 1880), both as in ht 1.2.0, and {A3} (0.12, 1215)'),
    'particleboard': (None, 0.12, 1500, f'conductivity and heat capacity {BETWEEN} (0.14 W/(m K), 1700 J/(kg K)) and the ASHRAE Handbook (0.102, 1300), as in ht 1.2.0'),
    'medium-density fibreboard': (None, 0.14, 1500, f'EN 13986 (0.14 W/(m K) at 800 kg/m^3, from memory), {BETWEEN} (0.18, 1700 J/(kg K)) and the ASHRAE Handbook (hardboard, 0.105, 1300), as in ht 1.2.0'),
    'clay': (None, None, 1400, f'heat capacity with 20 % water; ISO 10456 prints 2085, {A3}, 880'),
    'natural rubber': (None, None, 1900, 'heat capacity of Wood and Bekkedahl, J. Appl. Phys. 17 (1946) 362, 1.9 kJ/(kg K), from memory; ISO 10456 prints 1.1'),
    'EPDM rubber': (None, None, 1800, 'heat capacity of filled vulcanizates, 1.7 to 2.0 kJ/(kg K), polymer handbooks, from memory; ISO 10456 prints 1.0'),
    'butyl rubber': (1100, 0.18, 1700, f'{BETWEEN} (filled: 1200 kg/m^3, 0.24 W/(m K), 1400 J/(kg K)) and the gum of polymer handbooks (920, 0.13, 1950)'),
    'silicone rubber': (None, 0.25, 1300, f'conductivity and heat capacity {BETWEEN} (0.35 W/(m K), 1000 J/(kg K)) and the gum of polymer handbooks (0.18, 1460)'),
    'elastomeric foam': (None, 0.037, None, 'conductivity of EN 14304, usual declared values, from memory; ISO 10456 prints 0.05 for a sealing strip'),
    'polyethylene high density': (955, None, None, 'density of polymer handbooks, 941 to 965 kg/m^3, from memory; ISO 10456 prints 980'),
    'polystyrene': (None, None, 1250, f'heat capacity {BETWEEN} (1300 J/(kg K)) and polymer handbooks (1220 at 298 K)'), 'polymethyl methacrylate': (None, None, 1420, f'heat capacity {BETWEEN} (1500 J/(kg K)) and polymer handbooks (1370 at 298 K)'),
    'polypropylene': (None, None, 1700, f'heat capacity {BETWEEN} (1800 J/(kg K)) and polymer handbooks (1650 at 298 K)'), 'polyamide': (None, None, 1520, f'heat capacity {BETWEEN} (1600 J/(kg K)) and polymer handbooks (1480 at 298 K)'),
}
# Amorphous plastics have no melting point: they soften at the glass transition.
GLASS = {'polycarbonate': 420, 'polyvinyl chloride': 355, 'polymethyl methacrylate': 378, 'polystyrene': 373, 'acrylonitrile butadiene styrene': 378, 'polyimide': 660}
SOFTENS = 'amorphous: it softens at its glass transition and has no melting point'


def transition(name):
    return {'glassTransitionTemperature': melting(GLASS[name], 'usual grades, polymer handbooks, from memory', '3 %')} if name in GLASS else {}


for theirs, name, aliases, spread, checks in BUILDING:
    if name is None or name in ('quartz glass', 'cast iron'):  # in generate-metals.py, with more temperatures
        continue
    own = INSTEAD.get(name, (None, None, None, None))
    rho, k, cp = (mine or theirs_ for mine, theirs_ in zip(own, building_materials[theirs]))
    more = transition(name)
    if name in LINEAR:
        more['thermalExpansion'] = expansion(LINEAR[name], ROOM, 'linear expansion of handbooks times three, from memory', '25 %')
    if name in MELTS:
        more['meltingTemperature'] = melting(MELTS[name], 'melting of usual grades, handbooks, from memory', {'polyamide': '9 %', 'polyoxymethylene': '3 %'}.get(name, '2 %'))
    if name in ('cast iron', 'porcelain', 'asphalt', 'plasterboard', 'quartz glass', 'plywood'):
        surfaces = {'cast iron': [('machined', (295, 500), 0.44, 30), ('oxidised', (400, 900), 0.65, 20), ('rough, strongly oxidised', (300, 600), 0.95, 4)], 'porcelain': [('glazed', (295, 400), 0.92, 5)], 'asphalt': [('pavement', (280, 340), 0.90, 6)], 'plasterboard': [('paper or paint', (280, 340), 0.91, 5)], 'quartz glass': [('smooth', (280, 400), 0.93, 4)], 'plywood': [('planed', (280, 350), 0.88, 8)]}[name]
        more['emissivity'] = emissivity(surfaces, f'{BERGMAN}, table A.11, and handbook tables of emissivity, from memory')
    solid(name, aliases, rho, k, cp, (250.0, 500.0) if name in ('cast iron', 'quartz glass') else ROOM, f'{ISO}; {own[3]}' if own[3] else ISO, spread, SOFTENS if name in GLASS else 'PA 6; PA 66 melts at 535 K' if name == 'polyamide' else None, checks=checks, more=more)

# Rocks, dry. ISO 10456 prints 1000 J/(kg K) for all stone, a rounded design value; measured heat capacities are a fifth lower and rise with temperature.
WAPLES = 'change with temperature of Waples and Waples, Natural Resources Research 13 (2004) 97, from memory; ISO 10456 prints 1000 J/(kg K) for all stone'
waples = lambda t: 0.716 + 0.00172 * t - 2.13e-6 * t ** 2 + 8.95e-10 * t ** 3
for name, aliases, rho, k, cp, spread, linear, emitting, source in (
    ('granite', [], 2630, 2.79, 775, (4, 20, 12), 8, ('rough', 0.90, 8), f'{A3}, Barre granite'), ('marble', [], 2680, 2.80, 830, (5, 30, 8), 9, ('polished', 0.93, 4), f'{A3}, Halston marble; ISO 10456 prints 3.5 W/(m K)'), ('limestone', [], 2320, 2.15, 810, (10, 35, 8), 8, None, f'{A3}, Salem limestone; ISO 10456 prints 0.85 to 2.3 W/(m K) from extra soft to extra hard'),
    ('sandstone', [], 2150, 2.90, 745, (20, 40, 18), 11, None, f'{A3}, Berea sandstone; the ASHRAE Handbook prints 880 J/(kg K)'), ('quartzite', [], 2640, 5.38, 745, (4, 25, 8), None, None, f'{A3}, Sioux quartzite, whose heat capacity of 1105 J/(kg K) contradicts that of quartz, 741'), ('slate', [], 2700, 1.9, 790, (15, 35, 12), None, None, f'across its layers, between ISO 10456 (2400 kg/m^3, 2.2 W/(m K)) and the ASHRAE Handbook (1.4), as in ht 1.2.0; density and heat capacity of handbooks, from memory'),
    ('basalt', [], 2850, 2.0, 840, (5, 45, 15), None, None, 'Clauser and Huenges, in Rock Physics and Phase Relations, AGU (1995), volcanic rocks of few pores, from memory; ISO 10456 prints 3.5 W/(m K), above all measured basalts'),
):
    T = (273.15, 333.15)
    rows = [[t, round(cp * waples(t - 273.15) / waples(26.85))] for t in (273.15, 303.15, 333.15)]
    solid(name, aliases, rho, k, rows, T, f'{source}; {WAPLES}', spread, more={**({'thermalExpansion': expansion(linear, T, uncertainty='30 %' if name in ('marble', 'limestone') else '25 %')} if linear else {}), **({'emissivity': emissivity([(emitting[0], (280, 350), *emitting[1:])], f'{BERGMAN}, table A.11, and handbook tables of emissivity, from memory')} if emitting else {})})

# Density, conductivity and heat capacity of woods scatter by kind: the Wood Handbook (2010) and the ASHRAE Handbook differ by this much, in percent.
WOODS = {'maple': (12, 20, 15), 'birch': (15, 25, 15), 'spruce': (12, 30, 15)}
for theirs, name, aliases, checks in (
    ('Oak', 'oak', ['oak wood', 'white oak'], {'thermalConductivity': check('W/(m K)', 0.16, 12, 'Wood Handbook, USDA FPL-GTR-190 (2010), across the grain at 12 % moisture, from memory'), 'density': check('kg/m^3', 680, 10, 'Wood Handbook, USDA FPL-GTR-190 (2010), from memory')}),
    ('Maple', 'maple', ['maple wood'], {}), ('Ash', 'ash wood', [], {}), ('Birch', 'birch', ['birch wood'], {}), ('Southern pine', 'southern pine', ['yellow pine', 'pine', 'pine wood'], {'thermalConductivity': check('W/(m K)', 0.15, 12, f'{A3}, yellow pine'), 'density': check('kg/m^3', 640, 10, f'{A3}, yellow pine')}),
    ('Douglas fir/larch', 'Douglas fir', ['larch', 'fir'], {}), ('Spruce', 'spruce', ['spruce wood', 'softwood', 'timber'], {'thermalConductivity': check('W/(m K)', 0.11, 25, 'Wood Handbook, USDA FPL-GTR-190 (2010), from memory')}), ('Western red cedar', 'red cedar', ['cedar'], {}), ('California redwood', 'redwood', [], {}),
):
    rho, cp, k = ASHRAE[theirs][:3]
    solid(name, aliases, rho, k, cp, (273.15, 333.15), HANDBOOK, WOODS.get(name, (10, 20, 15)), 'across the grain at about 12 % moisture; along the grain the conductivity is about twice as large', checks=checks, more={'emissivity': emissivity([('planed', (280, 350), 0.90, 6)], f'{BERGMAN}, table A.11, wood 0.82 to 0.92')})

# Insulations: by temperature where it matters.
CURVES = 'common practice, usual curves of data sheets'
# Where a second work tells the conductivity over a part of the range alone, twice the uncertainty stands beyond it.
COMPARED = {'cellular glass': (263, 323), 'expanded perlite': (200, 323), 'vermiculite': (283, 323), 'polyurethane foam': (278, 323), 'calcium silicate': (311, 750), 'ceramic fibre': (473, 773)}
for name, aliases, rho, rows, cp, T, source, spread, about in (
    ('expanded polystyrene', ['EPS', 'styrofoam', 'polystyrene foam'], 20, [[253, 0.0315], [283, 0.0355], [313, 0.0395], [343, 0.0435]], 1470, None, f'{HANDBOOK} at 297 K; slope of EN ISO 10456, 0.0036 1/K; Bergman et al. print 1210 J/(kg K)', (30, 12, 22), None),
    ('extruded polystyrene', ['XPS'], 35, [[253, 0.0275], [283, 0.0305], [313, 0.0335], [343, 0.0365]], 1470, None, f'{CURVES}, aged; ASHRAE prints 0.026 W/(m K) fresh, product standards 0.034 W/(m K) at 10 degC; Bergman et al. print 55 kg/m^3, 1210 J/(kg K)', (40, 25, 22), None),
    ('polyurethane foam', ['PUR foam', 'rigid polyurethane foam', 'PIR', 'polyisocyanurate foam'], 40, [[123, 0.019], [203, 0.024], [253, 0.0255], [283, 0.026], [323, 0.030], [373, 0.036]], 1300, None, f'{CURVES}, aged; ASHRAE prints 0.0235 to 0.026 W/(m K) at 297 K and 1470 J/(kg K), Bergman et al. 1045', (25, 18, 25), 'closed cells, aged; it gains by condensing blowing agents when cold'),
    ('phenolic foam', [], 40, [[283, 0.020], [313, 0.022], [373, 0.027]], 1500, None, CURVES, (25, 18, 12), None),
    ('cellular glass', ['foam glass'], 120, [[113, 0.024], [173, 0.030], [233, 0.036], [283, 0.042], [373, 0.055], [473, 0.072], [573, 0.094]], 840, None, f'{CURVES}; ASTM C552 type I', (12, 12, 15), None),
    ('glass wool', ['fibreglass', 'fiberglass', 'glass fibre wool', 'glass fiber'], 24, [[253, 0.031], [283, 0.035], [323, 0.042], [373, 0.053], [473, 0.085]], 840, None, f'{CURVES}; ASHRAE prints 0.036 to 0.043 W/(m K) at 297 K', (40, 15, 8), 'mats of 20 to 30 kg/m^3'),
    ('calcium silicate', ['calcium silicate insulation'], 230, [[311, 0.059], [366, 0.065], [422, 0.072], [477, 0.079], [533, 0.087], [589, 0.095], [644, 0.10], [922, 0.14]], 840, None, 'ASTM C533, type I, largest values, from memory; Bergman et al. print a seventh less', (25, 20, 15), 'dry'),
    ('ceramic fibre', ['ceramic fiber', 'alumina-silica fibre', 'refractory ceramic fibre', 'ceramic wool'], 128, [[473, 0.054], [673, 0.092], [873, 0.14], [1073, 0.20], [1273, 0.28], [1473, 0.37]], 1130, None, f'{CURVES}, blanket of 128 kg/m^3, a tenth less: they print 0.06 to 0.38 W/(m K), Bergman et al. a quarter less from 530 K to 750 K', (20, 35, 10), 'a blanket of 128 kg/m^3'),
    ('microporous silica', ['microporous insulation'], 240, [[373, 0.021], [473, 0.022], [673, 0.025], [873, 0.029], [1073, 0.036]], 920, None, f'{CURVES}; no second work compared', (20, 25, 12), None),
    ('aerogel blanket', ['silica aerogel', 'aerogel'], 180, [[273, 0.0195], [311, 0.021], [373, 0.023], [473, 0.028], [573, 0.036], [673, 0.048], [873, 0.089]], 1000, None, 'ASTM C1728, from memory; no second work compared', (20, 25, 12), None),
    ('expanded perlite', ['perlite', 'loose perlite'], 100, [[123, 0.026], [203, 0.036], [283, 0.045], [373, 0.060], [573, 0.10], [873, 0.19]], 1090, None, f'{CURVES}; ASHRAE prints 0.0485 W/(m K) at 297 K for 100 kg/m^3', (40, 20, 15), 'loose, at atmospheric pressure; evacuated it conducts about 0.001 to 0.002 W/(m K)'),
    ('vermiculite', ['exfoliated vermiculite'], 110, [[283, 0.066], [373, 0.085], [573, 0.14], [873, 0.23]], 1050, None, f'{CURVES}; ASHRAE prints 0.063 to 0.068 W/(m K) at 297 K and 1340 J/(kg K), Bergman et al. 835', (40, 20, 30), None),
    ('cellulose insulation', ['cellulose fibre', 'blown cellulose'], 45, [[263, 0.038], [297, 0.042], [333, 0.047]], 1380, None, HANDBOOK, (30, 12, 20), None),
    ('cork', ['corkboard', 'cork board'], 120, [[263, 0.037], [300, 0.039], [343, 0.043]], 1800, None, f'{A3}', (15, 15, 15), None),
    ('vacuum insulation panel', ['VIP'], 190, [[263, 0.0065], [297, 0.007], [333, 0.0078]], 800, None, 'common practice, fumed silica core, aged value with the edges', (15, 30, 10), 'through its thickness; a pierced one conducts 0.02 W/(m K)'),
    ('sheep wool', ['wool insulation'], 20, [[263, 0.036], [297, 0.039], [333, 0.044]], 1700, None, CURVES, (40, 15, 10), None),
    ('straw', ['straw bale'], 110, [[263, 0.055], [297, 0.060], [323, 0.066]], 2000, None, CURVES, (25, 25, 15), None),
):
    T = (rows[0][0], rows[-1][0])
    within = [{'T': K(*COMPARED[name]), 'value': f'{spread[1]} %'}, {'value': f'{2 * spread[1]} %'}] if name in COMPARED else f'{spread[1]} %'
    write({'name': name, 'aliases': aliases, 'kind': 'solid', 'phases': ['solid'], **({'about': about} if about else {}), 'density': constant(f'{rho} kg/m^3', T, f'{spread[0]} %', source), 'thermalConductivity': table(rows, within, source, 'W/(m K)'), 'specificHeatCapacity': constant(f'{cp} J/(kg K)', T, f'{spread[2]} %', source)}, BY)

# Plastics and composites that ISO 10456 does not list.
POLYMER = 'polymer handbooks, usual grades, from memory'
for name, aliases, rho, k, cp, spread, linear, mp in (
    ('polyether ether ketone', ['PEEK'], 1310, 0.27, 1200, (2, 15, 20), 50, 616), ('polyethylene terephthalate', ['PET', 'polyester'], 1380, 0.24, 1150, (3, 20, 12), 70, 528), ('acrylonitrile butadiene styrene', ['ABS'], 1050, 0.18, 1400, (3, 15, 15), 90, None), ('polyvinylidene fluoride', ['PVDF'], 1780, 0.19, 1120, (2, 12, 17), 130, 444), ('polyimide', ['PI'], 1420, 0.25, 1100, (3, 40, 18), 50, None), ('nitrile rubber', ['NBR', 'buna-n'], 1200, 0.24, 1700, (12, 20, 25), 180, None),
    ('fluororubber', ['FKM'], 1850, 0.22, 1300, (8, 20, 25), 160, None), ('glass-fibre plastic', ['GRP', 'GFRP', 'fibreglass laminate'], 1850, 0.35, 1050, (10, 25, 15), 25, None), ('carbon-fibre plastic', ['CFRP', 'carbon fibre laminate'], 1550, 0.7, 1000, (5, 40, 20), None, None), ('circuit board FR-4', ['FR-4', 'FR4', 'printed circuit board', 'PCB laminate'], 1850, 0.38, 1100, (6, 40, 20), 50, None),
):
    T = (273.15, 373.15) if name in ('polyether ether ketone', 'polyimide') else (273.15, 333.15)
    source = {'circuit board FR-4': 'through the board, between Azar and Graebner, Semi-Therm 12 (1996), 0.29 W/(m K), and the laminate G-10 of NIST, 0.6; other values of data sheets; all from memory', 'polyether ether ketone': f'{POLYMER}; heat capacity between the 1340 J/(kg K) of data sheets and 1100 of the ATHAS bank'}.get(name, POLYMER)
    solid(name, aliases, rho, k, cp, T, source, spread, SOFTENS if name in GLASS else {'carbon-fibre plastic': 'across the fibres; along them about 5 W/(m K)', 'circuit board FR-4': 'the bare laminate, across; copper layers multiply the conductivity along the board'}.get(name), more={**({'thermalExpansion': expansion(linear, T, 'linear expansion of handbooks times three, from memory', '30 %')} if linear else {}), **({'meltingTemperature': melting(mp, 'melting of usual grades, handbooks, from memory', '2 %')} if mp else {}), **transition(name)})

# Soils, rocks and things dug or fallen.
GROUND = 'Farouki, Thermal Properties of Soils, CRREL Monograph 81-1 (1981), usual values, from memory'
solid('soil', ['earth', 'ground soil'], 2050, 0.8, 1840, (273.15, 323.15), f'{A3}, which prints 0.52 W/(m K); conductivity between that and Kersten, Univ. Minnesota Bull. 28 (1949), 0.9 to 1.4 with 10 % to 20 % water', (12, 60, 30), 'moist loam; its water moves the conductivity from 0.3 (dry) to 2 W/(m K) (wet)')
solid('wet soil', ['saturated soil', 'moist ground'], 2000, 1.7, 1500, (273.15, 323.15), GROUND, (10, 35, 20), 'mineral soil, saturated', more={'permeability': constant('1e-12 m^2', (273.15, 323.15), '900 %', 'loam, Bear, Dynamics of Fluids in Porous Media (1972), from memory')})
solid('dry soil', [], 1500, 0.25, 850, (273.15, 323.15), GROUND, (10, 35, 15), 'mineral soil without water')
solid('frozen soil', ['permafrost'], 1950, 2.3, 1150, (233.15, 273.15), GROUND, (10, 35, 20), 'mineral soil, saturated and frozen')
solid('peat', [], 900, 0.45, 3300, (273.15, 323.15), GROUND, (25, 30, 25), 'wet; dry peat conducts 0.06 W/(m K)')
solid('coal', ['hard coal', 'anthracite'], 1350, 0.26, 1260, (273.15, 373.15), A3, (8, 30, 10))
solid('rock salt', ['halite', 'solid sodium chloride'], 2165, 6.1, 860, (273.15, 373.15), 'Clauser and Huenges, in Rock Physics and Phase Relations, AGU (1995), 6.1 W/(m K), from memory', (2, 12, 5), more={'thermalExpansion': expansion(40, (273.15, 373.15)), 'meltingTemperature': melting(1074, 'handbooks, from memory')})
solid('leather', [], 998, 0.159, 1500, (273.15, 323.15), A3, (15, 15, 20))
solid('paper', ['cardboard solid'], 930, 0.18, 1340, (273.15, 373.15), A3, (20, 30, 12))
solid('cotton', [], 80, 0.06, 1300, (273.15, 323.15), A3, (40, 25, 10))
# The conductivity of snow scatters at one density; heat capacity of ice.
ICE = [[t, round(152.5 + 7.122 * t)] for t in (233.15, 273.15)]
for name, aliases, theirs, k, spread in (('fresh snow', ['snow', 'new snow'], 'Water, snow, freshly fallen (<30 mm)', 0.04, 45), ('settled snow', ['soft snow'], 'Water, snow, soft (30 mm to 70 mm)', 0.10, 60), ('packed snow', ['compacted snow'], 'Water, snow, compacted (<200 mm)', 0.55, 35)):
    rho, theirs_k, _ = building_materials[theirs]
    solid(name, aliases, rho, k, ICE, (233.15, 273.15), f'{ISO}, for the density; conductivity in the middle of {theirs_k} W/(m K) there and of Yen (1981), Sturm et al. (1997), Calonne et al. (2011) at that density; heat capacity of ice, Cuffey and Paterson, The Physics of Glaciers, 4th ed. (2010)', (40, spread, 3), more={'emissivity': emissivity([('fresh', (233, 273), 0.9, 9)], f'{BERGMAN}, table A.11, snow 0.82 to 0.90; others measure 0.97 to 0.99'), 'meltingTemperature': melting(273.15, 'melting of ice', '0.01 %')})

# Beds, packings and porous bodies: void fraction and permeability belong to them.
BED = 'common practice; permeability by Ergun and Carman-Kozeny'


def bed(name, aliases, rho, k, cp, void, permeability, spread, source, about, T=(273.15, 373.15)):
    solid(name, aliases, rho, k, cp, T, source, spread[:3], about, more={'voidFraction': constant(f'{void}', T, f'{spread[3]} %', source), **({'permeability': constant(f'{permeability:.2g} m^2', T, f'{spread[4]} %', source)} if permeability else {})})


kozeny = lambda d, e: d ** 2 * e ** 3 / (180 * (1 - e) ** 2)
bed('wet sand', ['saturated sand'], 1980, 2.4, 1480, 0.40, kozeny(3e-4, 0.40), (6, 25, 10, 10, 300), 'quartz sand in water, geometric mean of 7.7 and 0.6 W/(m K); permeability of 0.3 mm grains', 'quartz sand of about 0.3 mm filled with water')
QUARTZ = [[273.15, 690], [303.15, 750], [333.15, 800], [373.15, 855]]
STONES = [[273.15, 750], [303.15, 800], [333.15, 850], [373.15, 900]]
bed('fine sand', ['fine dry sand'], 1550, 0.30, QUARTZ, 0.42, kozeny(1.5e-4, 0.42), (8, 30, 6, 13, 300), f'{BED}; grains of 0.15 mm', 'dry quartz sand of about 0.15 mm')
bed('gravel', ['pebbles', 'gravel bed'], 1600, 0.36, STONES, 0.38, kozeny(8e-3, 0.38), (10, 40, 8, 12, 300), f'{BED}; grains of 8 mm', 'dry gravel of about 8 mm')
bed('rock bed', ['rock store', 'crushed rock'], 1600, 0.45, STONES, 0.42, kozeny(0.03, 0.42), (10, 40, 8, 12, 300), f'{BED}; rocks of 30 mm', 'dry crushed rock of about 30 mm, as in a heat store')
bed('packed glass spheres', ['glass beads', 'glass spheres'], 1500, 0.20, 750, 0.39, kozeny(3e-3, 0.39), (8, 25, 12, 12, 150), f'{BED}; spheres of 3 mm in air', 'soda-lime spheres of 3 mm, poured, in air')
bed('Raschig rings', ['ceramic Raschig rings', 'ceramic rings'], 690, 0.25, 840, 0.74, None, (15, 50, 8, 10, 300), 'Perry, Chemical Engineers\' Handbook, packings, 25 mm ceramic, from memory; others print a void fraction of 0.68', 'ceramic Raschig rings of 25 mm, dumped; 190 m^2/m^3')
bed('Pall rings', ['steel Pall rings', 'metal Pall rings'], 440, 0.3, 480, 0.94, None, (25, 60, 8, 2, 300), 'Perry, Chemical Engineers\' Handbook, packings, 25 mm steel, from memory; bulk density between 480 kg/m^3 there and what is left by a void fraction of 0.954', 'steel Pall rings of 25 mm, dumped; 207 m^2/m^3')
bed('metal foam', ['aluminium foam', 'aluminum foam', 'open-cell aluminium foam'], 220, 5.5, 900, 0.92, 1.0e-7, (20, 35, 4, 2, 100), 'Calmidi and Mahajan, J. Heat Transfer 122 (2000) 557, aluminium, 10 to 20 pores per inch, from memory', 'open aluminium foam of 92 % voids, 20 pores per inch, in air')
bed('felt of fibres', ['fibre felt', 'needle felt', 'filter felt'], 120, 0.05, 1300, 0.91, 1.0e-10, (30, 30, 12, 4, 300), 'Davies, Air Filtration (1973), fibres of 20 um, from memory', 'needled polymer felt, fibres of about 20 um, in air')
for name, aliases, rho, k, cp, void, about in (
    ('alumina catalyst support', ['catalyst pellet', 'alumina pellets', 'porous alumina', 'catalyst'], 1250, 0.3, [[273.15, 710], [300, 765], [400, 940], [600, 1110], [800, 1180], [873.15, 1200]], 0.60, 'gamma-alumina pellets with pores filled with gas; the density is that of the pellet, a bed holds about 60 % of it'),
    ('silica gel', ['silica support', 'silica gel beads'], 1150, 0.16, [[273.15, 800], [300, 850], [400, 960], [600, 1060], [800, 1120], [873.15, 1140]], 0.48, 'beads of regular silica gel, dry; the density is that of the bead'),
    ('zeolite pellets', ['zeolite', 'zeolite 13X', 'molecular sieve'], 1150, 0.15, [[273.15, 800], [300, 850], [400, 960], [600, 1080], [800, 1140], [873.15, 1160]], 0.55, 'pellets of zeolite with binder, dry; the density is that of the pellet'),
    ('activated carbon', ['activated charcoal', 'carbon granules'], 780, 0.17, [[273.15, 660], [300, 750], [400, 1030], [600, 1430], [800, 1680], [873.15, 1750]], 0.65, 'granules, dry; the density is that of the granule'),
    ('nickel catalyst', ['supported nickel', 'reforming catalyst', 'nickel on alumina'], 1900, 0.4, [[273.15, 680], [300, 740], [400, 900], [600, 1070], [800, 1130], [873.15, 1150]], 0.45, 'nickel on alpha-alumina rings; the density is that of the pellet'),
    ('iron catalyst', ['ammonia catalyst', 'fused iron catalyst', 'magnetite catalyst'], 4800, 0.8, [[273.15, 620], [300, 660], [400, 750], [600, 920], [800, 1080]], 0.35, 'fused iron, reduced state porous; the density is that of the unreduced granule'),
):
    bed(name, aliases, rho, k, cp, void, None, (15, 40, 20 if name in ('silica gel', 'zeolite pellets') else 15, 15, 300), 'Satterfield, Heterogeneous Catalysis in Practice (1980), and data sheets, from memory; heat capacity of the dry oxide or carbon, of handbooks, from memory', about, (cp[0][0], cp[-1][0]))

# Phase-change materials: both phases.
def change(name, aliases, mp, heat, rho, k, cp, mu, T, source, spread, about=None, marks=(), lines=None, expands=None):
    """Solid and liquid values; heat of fusion [kJ/kg]; `lines`: what of the liquid is a line in T, [SI], with its uncertainty and source."""
    lines, liquid = lines or {}, {'T': K(mp, T[1]), 'p': ['0 Pa', '1 MPa']}

    def both(key, pair, unit, uncertainty):
        entries = [{'model': 'constant', 'phase': phase, 'range': {'T': K(*box), 'p': ['0 Pa', '1 MPa']}, 'uncertainty': uncertainty, 'source': source, 'constants': {'value': f'{value:g} {unit}'}} for phase, value, box in (('solid', pair[0], (T[0], mp)), ('liquid', pair[1], (mp, T[1])))]
        if key in lines:
            terms, uncertainty, where = lines[key]
            entries[1] = {'model': 'polynomial', 'phase': 'liquid', 'range': liquid, 'uncertainty': uncertainty, 'source': where, 'constants': {'gives': unit, 'terms': list(terms)}}
        return entries

    write({'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid', 'solid'], **({'marks': list(marks)} if marks else {}), **({'about': about} if about else {}),
           'density': both('density', rho, 'kg/m^3', spread[0]), 'viscosity': [{'model': 'vogel', 'phase': 'liquid', 'range': liquid, 'uncertainty': '35 %', 'source': source, 'constants': {'A': mu[0], 'B': mu[1], 'C': 0, 'gives': 'mPa s'}}],
           'thermalConductivity': both('thermalConductivity', k, 'W/(m K)', spread[1]), 'specificHeatCapacity': both('specificHeatCapacity', cp, 'J/(kg K)', spread[2]),
           'thermalExpansion': [{'model': 'constant', 'phase': 'liquid', 'range': {'T': K(mp, T[1])}, 'uncertainty': '30 %', 'source': source, 'constants': {'value': f'{(9e-4 if rho[1] < 1000 else 5e-4):g} 1/K'}} if expands is None else {'model': 'constant', 'phase': 'liquid', 'range': {'T': K(mp, T[1])}, 'uncertainty': expands[1], 'source': expands[2], 'constants': {'value': f'{expands[0]:g} 1/K'}}],
           'fusionHeat': {'model': 'constant', 'range': {'p': ['0 Pa', '1 MPa']}, 'uncertainty': spread[3], 'source': source, 'constants': {'value': f'{heat} kJ/kg'}}, 'meltingTemperature': {'model': 'constant', 'range': {'p': ['0 Pa', '1 MPa']}, 'uncertainty': '0.5 %', 'source': source, 'constants': {'value': f'{mp} K'}}}, BY)


CRC_LINE = 'CRC Handbook of Chemistry and Physics, 97th ed. (2016), near the melting point, from memory; slope to 350 K by the estimate of Hankinson and Thomson, as in thermo 0.6.1'
MEHLING = 'Mehling and Cabeza, Heat and Cold Storage with PCM (2008), and Zalba et al., Appl. Therm. Eng. 23 (2003) 251, from memory'
PERRY = "line through Perry's Chemical Engineers' Handbook, 8th ed. (2007), table %s; constants as carried by chemicals 1.5.2 (MIT licence)"
JANZ = 'CRC Handbook of Chemistry and Physics, densities of molten salts, 1900 - 0.715 (T - 579.65) to 643 K; constants as carried by chemicals 1.5.2 (MIT licence)'
USUAL = ('3 %', '15 %', '10 %', '8 %')


def andrade(T1, mu1, T2, mu2):
    import math
    b = math.log(mu1 / mu2) / (1 / T1 - 1 / T2)
    return round(math.log(mu1) - b / T1, 6), round(b, 3)


change('octadecane', ['n-octadecane', 'C18H38'], 301.3, 243, (865, 775), (0.36, 0.148), (1930, 2200), andrade(303, 3.9, 343, 1.95), (273.15, 373.15), MEHLING, USUAL, marks=('oil',), lines={'density': ((985.2, -0.692), '1.5 %', CRC_LINE), 'thermalConductivity': ((0.2137, -2.252e-4), '6 %', PERRY % '2-315'), 'specificHeatCapacity': ((1312.6, 3.0133), '3 %', PERRY % '2-153')})
change('hexadecane', ['n-hexadecane', 'C16H34', 'cetane'], 291.3, 236, (835, 773), (0.33, 0.145), (1800, 2220), andrade(293, 3.45, 333, 1.6), (263.15, 373.15), MEHLING, USUAL, marks=('oil',), lines={'density': ((979.0, -0.70), '1.5 %', CRC_LINE), 'thermalConductivity': ((0.20749, -2.1917e-4), '6 %', PERRY % '2-315'), 'specificHeatCapacity': ((1306.1, 3.0361), '3 %', PERRY % '2-153')})
change('paraffin wax', ['paraffin', 'wax', 'candle wax'], 331, 190, (900, 770), (0.24, 0.16), (2890, 2300), andrade(338, 5.0, 373, 2.6), (283.15, 393.15), f'{A3} for the solid; {MEHLING}', ('4 %', '20 %', '25 %', '12 %'), 'a wax that melts at 58 degC; waxes soften over some 10 K', ('oil', 'flammable'))
change('lauric acid', ['dodecanoic acid'], 317.2, 178, (1007, 862), (0.16, 0.147), (1880, 2270), andrade(323, 7.3, 353, 3.6), (273.15, 373.15), f'{MEHLING}; heat capacity of the solid between the 1760 J/(kg K) there and 2020 of the CRC Handbook', USUAL)
change('calcium chloride hexahydrate', ['CaCl2.6H2O'], 302.8, 188, (1710, 1560), (1.09, 0.54), (1400, 2200), andrade(303, 14, 333, 6), (273.15, 343.15), MEHLING, USUAL, 'it undercools by 20 K without nucleators')
change('sodium acetate trihydrate', ['sodium acetate'], 331.2, 260, (1450, 1280), (0.7, 0.45), (2790, 3000), andrade(333, 12, 363, 4.5), (283.15, 363.15), MEHLING, USUAL, 'it undercools by 80 K without nucleators')
change('erythritol', [], 391, 339, (1480, 1300), (0.73, 0.33), (1350, 2740), andrade(393, 30, 423, 12), (293.15, 433.15), MEHLING, USUAL)
change('sodium nitrate', ['NaNO3'], 580, 174, (2120, 1900), (0.6, 0.51), (1650, 1660), andrade(583, 3.0, 673, 1.9), (500, 720), f'{MEHLING}; solid density from 2260 kg/m^3 at room temperature and 10.7 % change of volume on melting', ('5 %', '20 %', '8 %', '6 %'), marks=('moltenSalt',), lines={'density': ((2314.4, -0.715), '1.5 %', JANZ), 'specificHeatCapacity': ((1660,), '10 %', f'{MEHLING}; Kubaschewski and Alcock (1979) give 1831')}, expands=(3.85e-4, '15 %', f'slope of {JANZ}'))

# Unfrozen food, by composition.
MEAT = ('beef', 'chicken', 'pork', 'fish')
CHOI = 'Choi and Okos, in Food Engineering and Process Applications (1986), polynomials of the ASHRAE Handbook, Refrigeration (2006), chapter 9; composition of the USDA tables, from memory'
for name, aliases, parts, T in (
    ('apple', ['apples'], {'water': 0.839, 'protein': 0.002, 'fat': 0.004, 'carbohydrate': 0.125, 'fibre': 0.027, 'ash': 0.003}, (273.15, 343.15)), ('potato', ['potatoes'], {'water': 0.790, 'protein': 0.021, 'fat': 0.001, 'carbohydrate': 0.163, 'fibre': 0.016, 'ash': 0.009}, (273.15, 363.15)), ('carrot', ['carrots'], {'water': 0.878, 'protein': 0.010, 'fat': 0.002, 'carbohydrate': 0.071, 'fibre': 0.030, 'ash': 0.009}, (273.15, 363.15)),
    ('beef', ['lean beef', 'meat'], {'water': 0.716, 'protein': 0.218, 'fat': 0.055, 'ash': 0.011}, (273.15, 343.15)), ('chicken', ['chicken breast', 'poultry'], {'water': 0.748, 'protein': 0.231, 'fat': 0.012, 'ash': 0.009}, (273.15, 343.15)), ('pork', ['lean pork'], {'water': 0.726, 'protein': 0.205, 'fat': 0.057, 'ash': 0.012}, (273.15, 343.15)), ('fish', ['cod', 'white fish'], {'water': 0.812, 'protein': 0.178, 'fat': 0.007, 'ash': 0.003}, (273.15, 343.15)),
    ('cheese', ['cheddar', 'hard cheese'], {'water': 0.367, 'protein': 0.249, 'fat': 0.331, 'carbohydrate': 0.013, 'ash': 0.040}, (273.15, 313.15)), ('butter', [], {'water': 0.159, 'protein': 0.009, 'fat': 0.811, 'carbohydrate': 0.001, 'ash': 0.020}, (273.15, 303.15)), ('egg', ['whole egg', 'liquid egg'], {'water': 0.753, 'protein': 0.125, 'fat': 0.100, 'carbohydrate': 0.012, 'ash': 0.010}, (273.15, 333.15)), ('tomato', ['tomatoes'], {'water': 0.938, 'protein': 0.009, 'fat': 0.003, 'carbohydrate': 0.035, 'fibre': 0.011, 'ash': 0.004}, (273.15, 363.15)),
):
    parts['ash'] = round(1 - sum(v for key, v in parts.items() if key != 'ash'), 4)
    write({'name': name, 'aliases': aliases, 'kind': 'solid', 'phases': ['solid'], 'about': 'raw, unfrozen, without air in pores; an apple has a fifth of them: 840 kg/m^3, 0.42 W/(m K)' if name == 'apple' else 'raw, unfrozen, without air in pores', **{key: {'model': model, 'range': {'T': K(*T)}, 'uncertainty': u, 'source': CHOI, 'constants': parts} for key, model, u in (('density', 'food-density', '28 %' if name == 'apple' else '5 %'), ('thermalConductivity', 'food-conductivity', {'apple': '40 %', 'potato': '15 %', 'butter': '25 %', **dict.fromkeys(MEAT, '22 %')}.get(name, '12 %')), ('specificHeatCapacity', 'food-heat-capacity', '10 %' if name in (*MEAT, 'butter', 'cheese') else '6 %'))}}, BY)
solid('bread', ['white bread'], 220, 0.07, 2800, (273.15, 373.15), 'Rask, J. Food Eng. 9 (1989) 167, crumb, from memory', (25, 40, 15), 'crumb of white bread')

# Tissue near body temperature.
DUCK = 'Duck, Physical Properties of Tissue (1990), and McIntosh and Anderson, Biophys. Rev. Lett. 5 (2010) 129, from memory'
for name, aliases, rho, k, cp in (('muscle', ['muscle tissue', 'skeletal muscle'], 1090, 0.49, 3421), ('fat tissue', ['adipose tissue', 'body fat'], 911, 0.21, 2348), ('skin', ['human skin'], 1109, 0.37, 3391), ('cortical bone', ['bone'], 1908, 0.32, 1313), ('liver tissue', ['liver'], 1079, 0.52, 3540), ('brain tissue', ['brain', 'grey matter'], 1045, 0.55, 3696), ('kidney tissue', ['kidney'], 1066, 0.53, 3763), ('lung tissue', ['lung', 'inflated lung'], 394, 0.39, 3886), ('tooth enamel', ['enamel'], 2958, 0.92, 750)):
    spread = {'lung tissue': (55, 30, 10), 'fat tissue': (5, 25, 10), 'skin': (5, 30, 10), 'cortical bone': (5, 45, 10)}.get(name, (5, 15, 10))
    solid(name, aliases, rho, k, cp, (303.15, 320.15), DUCK, spread, 'without its blood flow, which carries heat as well', more={'emissivity': emissivity([('dry', (303, 313), 0.97, 2)], 'Steketee, Phys. Med. Biol. 18 (1973) 686, 0.98 +/- 0.01; others 0.95')} if name == 'skin' else None)
