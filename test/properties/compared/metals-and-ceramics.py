"""Writes metals-and-ceramics.csv: states of metals, alloys, ceramics, glasses and refractories from independent references.

Run with:  python3 test/properties/compared/metals-and-ceramics.py
(needs cantera 3.2.0, chemicals 1.5.2, ht 1.2.0, mendeleev 1.3.0, pymatgen-core 2026.10.16, spacemat 0.3.0, cryopy 0.0.80, thermoprop 2.1.2, PyYAML)

Functions and tables over temperature; states beyond the record's own range are left out. A reference marked (from memory) is a published
table or formula written down here without the publication at hand.
  nasa               condensed species of McBride and Gordon (NASA polynomials), evaluated as Cantera carries them
  nasa mix           the same by mass fractions of the oxides (Kopp), for bricks
  perry              Perry's Chemical Engineers' Handbook, 7th ed., table 2-151, heat capacities of solids, as in chemicals
  crc                CRC Handbook, as in chemicals (densities and melting points of inorganics, heat capacity at 298.15 K) and mendeleev
  kaye-laby          values of elements near 293 K that pymatgen carries (James and Lord; Kaye and Laby; Samsonov)
  nist-cryo          NIST cryogenic material properties, curve fits, as in spacemat and cryopy
  ho-1978            Ho et al., J. Phys. Chem. Ref. Data 7 (1978) 959, 60Cu-40Ni, as fitted in cryopy
  data-sheet         tables of thermoprop: MMPDS (7075, 6061, 304), Special Metals (625, 718), NASA and BSSA (316)
  iso-10456          ISO 10456:2007, one value near room temperature, as in ht
  grueneisen         density and expansion of those packages near 298 K, carried on in proportion to the heat capacity of nasa
  janaf              NIST-JANAF Thermochemical Tables, 4th ed. (1998), as in chemicals
  en-1993-1-2        formulae of EN 1993-1-2:2005, 3.4.1 (carbon steel) and annex C (stainless steel)
  en-1999-1-2        formulae of EN 1999-1-2:2007, 3.3 (aluminium alloys; its conductivity of a whole series of alloys is left out)
  en-10088-1         EN 10088-1, annex A, physical properties of stainless steels
  cda                Copper Development Association, data sheets of the alloys at 293 K
  mills              Mills, Recommended Values of Thermophysical Properties for Selected Commercial Alloys (2002)
  asm                ASM Handbook, vols. 1 and 2, and the standards of the alloys
  makers             data of makers, dense technical ceramics and alloys
  perry bricks       Perry and Bergman et al., tables of refractories
  cindas             Ho, Powell and Liley, J. Phys. Chem. Ref. Data 1 (1972) 279, as CRC Handbook prints it by temperature: the same assessment
                     as that of the records, so it checks digits and what lies between the rows, not the assessment
"""
import csv
import gzip
import importlib.util
import json
import os
from math import exp

import chemicals
import mendeleev
import yaml
from ht.insulation import building_materials

from solid_states import CP, EXP, HERE, K, MELT, NASA, PERRY, RECORDS, RHO, add, cryopy, fitted, nasa, over, perry, points, slope, write

MEMORY = ' (from memory)'

SPECIES = {
    'aluminium': 'AL(cr)', 'beryllium': 'Be(a)', 'chromium': 'Cr(cr)', 'copper': 'Cu(cr)', 'iron': 'Fe(a)', 'magnesium': 'Mg(cr)', 'molybdenum': 'Mo(cr)', 'niobium': 'Nb(cr)', 'nickel': 'Ni(cr)',
    'solid lead': 'Pb(cr)', 'silicon': 'Si(cr)', 'tantalum': 'Ta(cr)', 'titanium': 'Ti(a)', 'vanadium': 'V(cr)', 'zinc': 'Zn(cr)', 'zirconium': 'Zr(a)', 'graphite': 'C(gr)', 'alumina': 'AL2O3(a)',
    'silicon carbide': 'SiC(b)', 'silicon nitride': 'Si3N4(a)', 'zirconium dioxide': 'ZrO2(a)', 'aluminium nitride': 'ALN(s)', 'beryllium oxide': 'BeO(a)', 'titanium dioxide': 'TiO2(ru)', 'magnesium oxide': 'MgO(s)', 'rock salt': 'NaCL(s)',
}
for material, species in SPECIES.items():
    law, low, high = nasa(species)
    over(material, CP, low, high, law, 'nasa')

# Bricks: mass fractions of oxides of the class (usual compositions).
BRICKS = {
    'corundum brick 99': {'AL2O3(a)': 1}, 'corundum brick 90': {'AL2O3(a)': 0.9, 'silica': 0.1}, 'mullite brick': {'AL2O3(a)': 0.72, 'silica': 0.28}, 'sillimanite brick': {'AL2O3(a)': 0.62, 'silica': 0.38}, 'fireclay brick': {'AL2O3(a)': 0.38, 'silica': 0.62},
    'high-duty fireclay brick': {'AL2O3(a)': 0.44, 'silica': 0.56}, 'bauxite brick': {'AL2O3(a)': 0.85, 'silica': 0.15}, 'magnesia brick': {'MgO(s)': 0.96, 'silica': 0.04}, 'magnesia-chrome brick': {'MgO(s)': 0.65, 'Cr2O3(s)': 0.2, 'AL2O3(a)': 0.15}, 'dolomite brick': {'MgO(s)': 0.4, 'CaO(s)': 0.6},
    'zircon brick': {'zirconia': 0.66, 'silica': 0.34}, 'zirconia brick': {'zirconia': 0.95, 'CaO(s)': 0.05}, 'fused-cast AZS 33': {'AL2O3(a)': 0.5, 'zirconia': 0.33, 'silica': 0.17}, 'silicon carbide brick': {'SiC(b)': 0.9, 'silica': 0.1}, 'graphite brick': {'C(gr)': 1}, 'carbon brick': {'C(gr)': 1},
    'insulating fire brick 1260': {'AL2O3(a)': 0.38, 'silica': 0.62}, 'insulating fire brick 1540': {'AL2O3(a)': 0.65, 'silica': 0.35},
}
# Below its transition at 847 K quartz peaks, which the glass and the cristobalite of a brick do not: cristobalite of Perry stands for silica.
CRISTOBALITE = perry('SiO2', 'cristobalite, β')
PARTS = {name: nasa(name)[0] for brick in BRICKS.values() for name in brick if name in NASA} | {'silica': lambda T: CRISTOBALITE[0](T) / 0.060084, 'zirconia': nasa('ZrO2(a)')[0]}
for brick, shares in BRICKS.items():
    # Zirconia turns tetragonal at 1478 K; the stabilised one does not, and the curve of the monoclinic form is carried to the end of the record.
    over(brick, CP, 673.15, 1473.15, lambda T: sum(w * PARTS[name](T) for name, w in shares.items()), 'nasa mix')
over('silica brick', CP, 673.15, 1473.15, PARTS['silica'], 'perry')
GLASS = [x for x in PERRY if x['Formula'] == 'SiO2' and x['Const'] == 12.8][0]
for material in ('quartz glass', 'fused silica brick'):
    over(material, CP, 273, 1973, lambda T: 4.184 / 0.060084 * (GLASS['Const'] + GLASS['Lin'] * T + GLASS['Quadinv'] / T ** 2), 'perry')

for material, formula in (('silver', 'Ag'), ('gold', 'Au'), ('platinum', 'Pt'), ('palladium', 'Pd'), ('tin', 'Sn'), ('cadmium', 'Cd'), ('solid bismuth', 'Bi'), ('uranium', 'U')):
    law, low, high = perry(formula)
    mass = mendeleev.element(formula).atomic_weight / 1000
    over(material, CP, low, high, lambda T: law(T) / mass, 'perry')
with open(os.path.join(os.path.dirname(chemicals.__file__), 'Heat Capacity', 'JANAF_1998_solid_Cp.json')) as file:
    JANAF = json.load(file)
points('cobalt', CP, [(T, cp / 58.9332 * 1000) for T, cp in zip(*JANAF['7440-48-4'])], 'janaf')

# Elements near room temperature.
ELEMENTS = {
    'aluminium': 'Al', 'beryllium': 'Be', 'chromium': 'Cr', 'cobalt': 'Co', 'copper': 'Cu', 'iron': 'Fe', 'magnesium': 'Mg', 'molybdenum': 'Mo', 'nickel': 'Ni', 'niobium': 'Nb', 'silicon': 'Si', 'germanium': 'Ge', 'tantalum': 'Ta', 'titanium': 'Ti', 'tungsten': 'W', 'vanadium': 'V', 'zinc': 'Zn', 'zirconium': 'Zr',
    'solid lead': 'Pb', 'silver': 'Ag', 'gold': 'Au', 'platinum': 'Pt', 'palladium': 'Pd', 'cadmium': 'Cd', 'tin': 'Sn', 'solid bismuth': 'Bi', 'uranium': 'U',
}
spec = importlib.util.find_spec('pymatgen')
PERIODIC = json.load(gzip.open(os.path.join(list(spec.submodule_search_locations)[0], 'core', 'periodic_table.json.gz')))
for material, symbol in ELEMENTS.items():
    element, other = mendeleev.element(symbol), PERIODIC[symbol]
    # The allotropes that the packages list there are other ones: grey tin, and a conductivity of boron's row.
    if material != 'tin':
        add(material, RHO, 298.15, element.density * 1000, 'crc')
    add(material, K, 298.15, element.thermal_conductivity, 'crc')
    add(material, CP, 298.15, element.specific_heat_capacity * 1000, 'crc')
    add(material, MELT, 298.15, element.melting_point, 'crc')
    add(material, RHO, 293.15, float(other['Density of solid']), 'kaye-laby')
    add(material, K, 300, float(other['Thermal conductivity']), 'kaye-laby')
    # Its 8.2e-6 of magnesium is a misprint: every table of that metal has 25e-6 to 26e-6.
    if 'Coefficient of linear thermal expansion' in other and symbol != 'Mg':
        add(material, EXP, 298.15, 3 * float(other['Coefficient of linear thermal expansion']), 'kaye-laby')
    add(material, MELT, 298.15, float(other['Melting point']), 'kaye-laby')
    if 'fusionHeat' in RECORDS[material]:
        add(material, 'fusionHeat', 298.15, element.fusion_heat / element.atomic_weight * 1e6, 'crc')

# Expansion grows with the heat capacity (Grueneisen): the coefficient at 298 K times cp(T)/cp(298 K), and what the density of 298 K becomes by it.
for material, species in SPECIES.items():
    symbol = ELEMENTS.get(material)
    if symbol is None or 'Coefficient of linear thermal expansion' not in PERIODIC[symbol] or symbol in ('Mg', 'Cr', 'Fe', 'Ni'):
        continue
    law, low, high = nasa(species)
    first, rho = 3 * float(PERIODIC[symbol]['Coefficient of linear thermal expansion']), mendeleev.element(symbol).density * 1000
    growth = lambda T: first * law(T) / law(298.15)
    over(material, EXP, max(low, 250), high, growth, 'grueneisen')
    over(material, RHO, max(low, 200), high, lambda T: rho * exp(-sum(growth(298.15 + (i + 0.5) * (T - 298.15) / 40) for i in range(40)) * (T - 298.15) / 40), 'grueneisen')

# Compounds at room temperature: densities and melting points of the CRC Handbook.
with open(os.path.join(os.path.dirname(chemicals.__file__), 'Misc', 'Physical Constants of Inorganic Compounds.csv')) as file:
    COMPOUNDS = {row['CAS']: row for row in csv.DictReader(file, delimiter='\t')}
for material, cas in (('alumina', '1344-28-1'), ('silicon carbide', '409-21-2'), ('silicon nitride', '12033-89-5'), ('zirconium dioxide', '1314-23-4'), ('aluminium nitride', '24304-00-5'), ('beryllium oxide', '1304-56-9'), ('titanium dioxide', '1317-80-2'), ('magnesium oxide', '1309-48-4'), ('rock salt', '7647-14-5'), ('graphite', '7782-42-5')):
    row = COMPOUNDS.get(cas)
    # Ceramics are porous, so only the melting point and dense crystals compare; aluminium nitride melts under pressure and decomposes before.
    if row and row['Tm'] and material not in ('graphite', 'aluminium nitride'):
        add(material, MELT, 298.15, float(row['Tm']), 'crc')
    if row and row['rho'] and material in ('alumina', 'silicon carbide', 'aluminium nitride', 'titanium dioxide', 'rock salt'):
        add(material, RHO, 300, float(row['rho']), 'crc')

# The refractoriness of a pure brick is near the melting point of its oxide.
for brick, cas in (('corundum brick 99', '1344-28-1'), ('magnesia brick', '1309-48-4'), ('zirconia brick', '1314-23-4'), ('silica brick', '14464-46-1'), ('fused silica brick', '60676-86-0'), ('mullite brick', '1302-93-8')):
    add(brick, MELT, 298.15, float(COMPOUNDS[cas]['Tm']), 'crc')
add('galvanised steel', MELT, 298.15, mendeleev.element('Zn').melting_point, 'crc')  # that of its coat
add('quartz glass', RHO, 293.15, float(COMPOUNDS['60676-86-0']['rho']), 'crc')

# Alloys at low temperatures: NIST.
spec = importlib.util.find_spec('spacemat')
with open(os.path.join(list(spec.submodule_search_locations)[0], 'data', 'nist_fits.json')) as file:
    FITS = json.load(file)['fits']


for material, theirs in (('stainless steel', 'Stainless Steel 304L'), ('stainless steel 316', 'Stainless Steel 316'), ('aluminium alloy 6061', 'Aluminum 6061-T6'), ('nickel alloy 718', 'Inconel 718'), ('titanium alloy Ti-6Al-4V', 'Ti-6Al-4V'), ('invar', 'Invar 36')):
    fits = FITS[theirs]
    for prop, key in ((K, 'thermal_conductivity_w_mk'), (CP, 'specific_heat_j_kgk')):
        if key in fits and fits[key]['t_max'] > 100:
            over(material, prop, *fits[key]['data_range'], fitted(fits[key]), 'nist-cryo')
    expansion = fitted(fits['thermal_contraction_pct'])
    over(material, EXP, 100, 299, lambda T: 3e-5 * slope(expansion, T), 'nist-cryo')


for material, name, prop, function, low, high in (
    ('beryllium', 'Be', CP, 'mass_specific_heat', 14, 284), ('copper', 'Cu_OFHC', K, 'thermal_conductivity', 4, 300), ('copper', 'Cu_OFHC', CP, 'mass_specific_heat', 4, 300),
):
    over(material, prop, low, high, getattr(cryopy(name), function), 'nist-cryo')
over('constantan', K, 4, 1000, cryopy('Cu60Ni40').thermal_conductivity, 'ho-1978')

# The package takes the natural logarithm where NIST's fit of 5083 has the decimal one; its digits are those of NIST.
for prop, terms in (
    (K, (-0.90933, 5.751, -11.112, 13.612, -9.3977, 3.6873, -0.77295, 0.067336)),
    (CP, (46.6467, -314.292, 866.662, -1298.3, 1162.27, -637.795, 210.351, -38.3094, 2.96344)),
):
    over('aluminium alloy 5083', prop, 4, 300, fitted({'form': 'log10poly', 'coeffs': dict(zip('abcdefghi', terms))}), 'nist-cryo')

# Alloys above room temperature: data sheets. Left out of the package: its 304 and 7075 heat capacities and its 304 conductivity (misread
# plots: 297 J/(kg K) at 299 K, 1 J/(kg K) at 278 K), 1045 (input of a model of hardening, not measured) and graphite's (read off a plot).
# Mean linear expansions from room temperature belong to the middle of their span.
spec = importlib.util.find_spec('thermoprop')
with open(os.path.join(list(spec.submodule_search_locations)[0], 'data', 'material_data.json')) as file:
    SHEETS = json.load(file)
for material, theirs, props in (
    ('aluminium alloy 7075', 'Aluminum 7075', (RHO, K)), ('nickel alloy 625', 'Inconel 625', (RHO, K, CP, MELT)), ('nickel alloy 718', 'Inconel 718', (RHO, K, CP, MELT)), ('stainless steel 316', 'Stainless Steel 316', (RHO, K, CP, MELT)), ('graphite', 'Graphite', (RHO, K)),
    ('aluminium alloy 6061', 'Aluminum 6061', (RHO, MELT)), ('copper', 'Copper C101', (RHO, MELT)),
):
    for prop, key in ((RHO, 'density'), (K, 'thermal_conductivity'), (CP, 'specific_heat'), (MELT, 'melting_point')):
        if prop in props:
            one = SHEETS[theirs]['properties'][key]
            points(material, prop, zip(one['temperature'], one['value']), 'data-sheet')
for material, theirs in (('aluminium alloy 7075', 'Aluminum 7075'), ('aluminium alloy 6061', 'Aluminum 6061'), ('nickel alloy 718', 'Inconel 718'), ('stainless steel', 'Stainless Steel 304'), ('stainless steel 316', 'Stainless Steel 316'), ('carbon steel', '1018 Carbon Steel')):
    one = SHEETS[theirs]['properties']['coefficient_of_thermal_expansion']
    points(material, EXP, [((T + 294) / 2, 3 * value) for T, value in zip(one['temperature'], one['value']) if T > 300], 'data-sheet')

for material, theirs in (('cartridge brass', 'Metals, brass'), ('gear bronze', 'Metals, bronze'), ('copper', 'Metals, copper'), ('solid lead', 'Metals, lead'), ('carbon steel', 'Metals, steel'), ('stainless steel', 'Metals, stainless steel'), ('zinc', 'Metals, zinc'), ('soda-lime glass', 'Glass, soda lime (including "float glass")')):
    if theirs not in building_materials:
        (theirs,) = [key for key in building_materials if key.startswith('Glass, soda lime')]
    rho, k, cp = building_materials[theirs]
    for prop, value in ((RHO, rho), (K, k), (CP, cp)):
        if (material, prop) != ('copper', K):  # sheets and pipes hold phosphorus, and conduct less than the pure copper of the record
            add(material, prop, 300, value, 'iso-10456')

# Structural Eurocodes: t in degC.
C = 273.15
carbon_cp = lambda t: 425 + 0.773 * t - 1.69e-3 * t ** 2 + 2.22e-6 * t ** 3 if t <= 600 else 666 + 13002 / (738 - t)
for material in ('carbon steel', 'carbon steel 1010', 'galvanised steel', 'chromium-molybdenum steel'):
    # Structural steels hold more carbon and manganese than 1010, and 13CrMo4-5 is another steel.
    if material in ('carbon steel', 'galvanised steel'):
        over(material, K, 293.15, 1073.15, lambda T: 54 - 0.0333 * (T - C), 'en-1993-1-2')
    if material != 'chromium-molybdenum steel':
        over(material, CP, 293.15, 1008, lambda T: carbon_cp(T - C), 'en-1993-1-2')
    over(material, EXP, 293.15, 1000, lambda T: 3 * (1.2e-5 + 0.8e-8 * (T - C)), 'en-1993-1-2')
    over(material, RHO, 293.15, 1000, lambda T: 7850 / (1 + 1.2e-5 * (T - C) + 0.4e-8 * (T - C) ** 2 - 2.416e-4) ** 3, 'en-1993-1-2')
for material, rho in (('stainless steel', 7900), ('stainless steel 302', 7900), ('stainless steel 316', 8000), ('stainless steel 347', 7900)):
    over(material, K, 293.15, 1473.15, lambda T: 14.6 + 1.27e-2 * (T - C), 'en-1993-1-2')
    over(material, CP, 293.15, 1473.15, lambda T: 450 + 0.28 * (T - C) - 2.91e-4 * (T - C) ** 2 + 1.34e-7 * (T - C) ** 3, 'en-1993-1-2')
    length = lambda t: (16 + 4.79e-3 * t - 1.243e-6 * t ** 2) * (t - 20) * 1e-6
    over(material, EXP, 293.15, 1473.15, lambda T: 3 * slope(length, T - C), 'en-1993-1-2')
    over(material, RHO, 293.15, 1473.15, lambda T: rho / (1 + length(T - C)) ** 3, 'en-10088-1')
    add(material, K, 293.15, 15, 'en-10088-1')
    add(material, CP, 293.15, 500, 'en-10088-1')
for prop, value in ((RHO, 7800), (K, 15), (CP, 500), (EXP, 39e-6)):
    add('duplex steel 2205', prop, 300, value, 'en-10088-1')
points('duplex steel 2205', K, [(373.15, 16), (473.15, 17)], 'en-10088-1')
points('duplex steel 2205', CP, [(373.15, 530), (473.15, 560)], 'en-10088-1')
for material, rho in (('aluminium alloy 2024', 2780), ('aluminium alloy 5083', 2660), ('aluminium alloy 6061', 2700), ('aluminium alloy 7075', 2800), ('cast alloy AlSi10Mg', 2650), ('cast aluminium alloy 195', 2800)):
    over(material, CP, 273.15, 773.15, lambda T: 903 + 0.41 * (T - C), 'en-1999-1-2')
    over(material, EXP, 273.15, 773.15, lambda T: 3 * (22.5e-6 + 0.2e-7 * (T - C)), 'en-1999-1-2')
    over(material, RHO, 293.15, 773.15, lambda T: rho / (1 + 22.5e-6 * (T - C) + 1e-8 * (T - C) ** 2 - 4.54e-4) ** 3, 'en-1999-1-2')

with open(os.path.join(HERE, 'metals-and-ceramics.yaml')) as file:
    for reference, materials in yaml.safe_load(file).items():
        for material, properties in materials.items():
            for prop, pairs in properties.items():
                points(material, prop, [(pair[0], float(pair[1])) if isinstance(pair, list) else (300, float(pair)) for pair in (pairs if isinstance(pairs, list) else [pairs])], reference + MEMORY)

# Formulae of the literature, from memory.
for material, prop, low, high, law, source in (
    ('tungsten', K, 300, 3695, lambda T: 149.441 - 45.466e-3 * T + 13.193e-6 * T ** 2 - 1.484e-9 * T ** 3 + 3.866e6 / T ** 2, 'Tolias 2017'),
    ('tungsten', CP, 300, 3080, lambda T: (21.868372 + 8.068661e-3 * T - 3.756196e-6 * T ** 2 + 1.075862e-9 * T ** 3 + 1.406637e4 / T ** 2) / 0.18384, 'White and Minges 1997'),
    ('beryllium', K, 300, 1560, lambda T: 148.8912 - 76.378e-3 * T + 12.0174e-6 * T ** 2 + 6.5407e6 / T ** 2, 'Tolias 2022'),
    ('copper', K, 300, 1300, lambda T: 420.75 - 6.8493e-2 * T, 'linear fit of copper'),
    ('zirconium', K, 300, 1100, lambda T: 8.8527 + 7.082e-3 * T + 2.5329e-6 * T ** 2 + 2991.8 / T, 'Fink and Leibowitz 1995'),
    ('uranium', K, 293, 941, lambda T: 22 + 0.023 * (T - C), 'IAEA-TECDOC-1496'),
    ('uranium', CP, 293, 941, lambda T: 104.82 + 5.3686e-3 * T + 10.1823e-5 * T ** 2, 'IAEA-TECDOC-1496'),
    ('uranium', RHO, 273, 941, lambda T: 19360 - 1.03347 * T, 'IAEA-TECDOC-1496'),
    ('germanium', CP, 298, 1200, lambda T: (23.35 + 3.9e-3 * T - 1.05e5 / T ** 2) / 0.07263, 'Kubaschewski 1993'),
    ('alumina', K, 293, 1700, lambda T: 5.85 + 15360 * exp(-0.002 * (T - C)) / (T - C + 516), 'Munro 1997'),
    ('alumina', EXP, 293, 1700, lambda T: 3 * slope(lambda t: t * (7.419e-6 + 6.43e-10 * t - 3.211e-6 * exp(-2.59e-3 * t)), T - C), 'Munro 1997'),
    ('silicon carbide', K, 293, 1700, lambda T: 52000 * exp(-1.24e-5 * (T - C)) / (T - C + 437), 'Munro 1997'),
    ('glass ceramic', K, 298, 1025, lambda T: 2.332 + 515.1 / T, 'BCR-724'),
    ('graphite', K, 300, 1600, lambda T: 134 - 0.1074 * (T - C) + 3.719e-5 * (T - C) ** 2, 'isotropic graphite H-451'),
):
    over(material, prop, low, high, law, source + MEMORY)

write('metals-and-ceramics.csv')
