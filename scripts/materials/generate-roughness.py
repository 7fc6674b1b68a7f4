"""Writes surfaces/roughness.csv: equivalent sand grain by surface.

Run with:  python3 scripts/materials/generate-roughness.py   (needs fluids 1.3.1, MIT licence)
The figures are those of Idelchik's handbook and of Farshad and Rieke as fluids carries them; the names of the surfaces are ours.
Where a source gives two ends, the value is their geometric mean; a lone value gets half and twice as its ends.
"""
import csv
import math
import os

from fluids.friction import HHR_roughness, _Farshad_roughness

IDELCHIK = 'Idelchik and Ginevskii, Handbook of Hydraulic Resistance, 4th ed. (2007)'
FARSHAD = 'Farshad, Rieke and Garber, J. Pet. Sci. Eng. 29 (2001) 163'
MOODY = 'Moody, Trans. ASME 66 (1944) 671'
PRACTICE = 'common practice'
ROWS = []


def row(name, aliases, low, value, high, source):
    ROWS.append([name, '|'.join(aliases), *(f'{1e6 * x:.4g}' for x in (low, value, high)), source])


def idelchik(name, aliases, key, source=IDELCHIK):
    low, high, mean = HHR_roughness[key]
    if low is None or high is None:
        value = mean or low or high
        low, high = value / 2, value * 2
    else:
        value = mean if mean and low <= mean <= high else math.sqrt(low * high)
    row(name, aliases, low, value, high, source)


row('drawn tubing', ['drawn tube', 'drawn copper tube', 'drawn brass tube', 'smooth tube', 'plastic pipe', 'glass tube', 'copper tube', 'polyethylene pipe', 'pvc pipe'], 1e-6, 1.5e-6, 1e-5, f'{MOODY}, 1.5 um; {IDELCHIK}, 1.5 to 10 um')
row('commercial steel', ['commercial steel pipe', 'welded steel pipe', 'new steel pipe', 'wrought iron'], 2e-5, 4.6e-5, 1e-4, f'{MOODY}, 46 um; {IDELCHIK}, 20 to 100 um')
row('galvanised steel', ['galvanized steel', 'galvanised iron', 'galvanized iron', 'galvanised pipe'], 7e-5, 1.5e-4, 2e-4, f'{MOODY}, 150 um; {IDELCHIK}, 70 to 150 um')
row('cast iron', ['new cast iron', 'cast iron pipe'], 2e-4, 2.6e-4, 1e-3, f'{MOODY}, 260 um; {IDELCHIK}, 250 to 1000 um')
row('asphalted cast iron', ['asphalt-coated cast iron'], 1e-4, 1.2e-4, 3e-4, f'{MOODY}, 120 um; {IDELCHIK}, 120 to 300 um')
row('concrete', ['concrete pipe'], 3e-4, 1e-3, 3e-3, f'{MOODY}, 300 to 3000 um')
row('riveted steel', ['riveted steel pipe'], 9e-4, 3e-3, 9e-3, f'{MOODY}, 900 to 9000 um')
row('wood stave', ['wood stave pipe'], 1.8e-4, 4e-4, 9e-4, f'{MOODY}, 180 to 900 um')
for name, aliases, key in (
    ('seamless steel', ['seamless steel pipe', 'new seamless steel'], 'Seamless steel tubes, New and unused'),
    ('bituminised steel', ['bitumen-lined steel'], 'Welded steel tubes, New and covered with bitumen'),
    ('rusted steel', ['rusty steel', 'corroded steel', 'used steel pipe'], 'Welded steel tubes, Used, suffering general corrosion'),
    ('moderately corroded steel', [], 'Seamless steel tubes, Corroded, moderately'),
    ('scaled steel', ['steel with scale', 'heavily corroded steel', 'encrusted steel'], 'Welded steel tubes, Appreciable deposits'),
    ('steam pipe', ['steam line'], 'Seamless steel tubes, Heating systems, saturated steam ducts or water pipes (with minor water leakage < 0.5%, and balance water deaerated)'),
    ('compressed air pipe', ['compressed air line'], 'Seamless steel tubes, Compressed air piping'),
    ('condensate pipe', ['condensate line'], 'Seamless steel tubes, Condensate pipes in open systems or periodically operated steam pipelines'),
    ('oil pipeline', ['crude oil pipeline'], 'Seamless steel tubes, Oil pipelines, intermediate operating conditions'),
    ('gas pipeline', ['gas pipe after a year'], 'Seamless steel tubes, Following one year as a gas pipeline'),
    ('old water pipe', ['used water pipe'], 'Seamless steel tubes, Used water piping'),
    ('sheet metal duct', ['galvanised sheet', 'galvanized sheet', 'galvanised duct', 'ventilation duct'], 'Galvanized sheet steel, New'),
    ('enamelled steel', ['enamel', 'glass-lined steel'], 'Steel tubes, Glass enamel coat'),
    ('corroded cast iron', ['rusty cast iron', 'used cast iron'], 'Cast-iron tubes, Used and corroded'),
    ('encrusted cast iron', ['cast iron with deposits'], 'Cast-iron tubes, Substantial deposits'),
    ('smooth concrete', ['trowelled concrete', 'finished concrete'], 'Concrete water conduits, no finish, New, very well manufactured, hand smoothed, prime-coated joints'),
    ('shuttered concrete', ['concrete from steel forms'], 'Concrete water conduits, no finish, Used, no deposits, moderately smooth, steel or wooden casing, joints prime coated but not smoothed'),
    ('sprayed concrete', ['shotcrete', 'gunite'], 'Concrete water conduits, no finish, Non-smoothed air-placed, either sprayed concrete or concrete on more concrete'),
    ('reinforced concrete pipe', [], 'Reinforced concrete tubes, New'), ('fibre cement', ['asbestos cement', 'fibre-cement pipe'], 'Asbestos cement tubes, New'), ('cement pipe', ['rough cement'], 'Cement tubes, Non processed'), ('smoothed cement', ['cement plaster', 'cement mortar lining'], 'Cement-mortar plaster channels, Plaster, cement, smoothed joints and protrusions, and a casing'),
    ('glazed clay', ['salt-glazed clay', 'vitrified clay', 'clay pipe'], 'Other, Salt-glazed ceramic'), ('planed wood', ['planed boards', 'smooth wood'], 'Wood tubes, Boards, thoroughly dressed'), ('rough-sawn wood', ['rough wood', 'sawn timber'], 'Wood tubes, Boards, undressed'), ('plywood', ['plywood duct'], 'Plywood tubes, Birch plywood, transverse grain, good quality'),
    ('blasted rock', ['rock tunnel', 'unlined tunnel'], 'Rough channels in rock, Blast-hewed, little jointing'),
):
    idelchik(name, aliases, key)
for name, aliases, key in (('plastic-coated steel', ['epoxy-coated steel', 'internally coated pipe'], 'Plastic coated'), ('honed carbon steel', [], 'Carbon steel, honed bare'), ('cement-lined steel', [], 'Cement lining'), ('glass-fibre lining', ['fibreglass lining', 'GRP pipe'], 'Fiberglass lining'), ('13 % chromium steel', ['13Cr tubing'], 'Cr13, bare')):
    value = _Farshad_roughness[key][0]
    row(name, aliases, value / 1.6, value, value * 1.6, FARSHAD)
for name, aliases, low, value, high in (
    ('electropolished stainless steel', ['electropolished steel', 'hygienic tube'], 3e-7, 1e-6, 3e-6), ('stainless steel pipe', ['stainless tube', 'stainless steel', 'pickled stainless steel'], 5e-6, 1.5e-5, 4.5e-5), ('machined metal', ['milled metal', 'turned metal', 'machined surface'], 2e-6, 6e-6, 2e-5), ('ground metal', ['ground surface', 'polished metal'], 5e-7, 2e-6, 6e-6), ('as-built printed metal', ['additive metal', 'laser-sintered metal', '3d-printed metal'], 3e-5, 8e-5, 2e-4), ('printed plastic', ['3d-printed plastic'], 5e-5, 1.5e-4, 4e-4),
    ('rubber hose', ['smooth rubber hose', 'rubber lining'], 1e-5, 3e-5, 8e-5), ('brickwork', ['brick duct', 'brick channel'], 1e-3, 3e-3, 8e-3), ('flexible duct', ['corrugated duct', 'flexible metal duct'], 6e-4, 2e-3, 5e-3), ('painted steel hull', ['ship hull', 'new ship hull'], 3e-5, 1.5e-4, 3e-4), ('fouled hull', ['ship hull with slime'], 3e-4, 1e-3, 3e-3), ('painted metal', ['sprayed paint', 'aircraft paint'], 3e-6, 1e-5, 3e-5), ('rubbled bed', ['gravel bed'], 5e-3, 2e-2, 8e-2),
):
    row(name, aliases, low, value, high, PRACTICE)

folder = os.path.join(os.path.dirname(os.path.abspath(__file__)), '..', '..', 'surfaces')
with open(os.path.join(folder, 'roughness.csv'), 'w', newline='') as out:
    writer = csv.writer(out, lineterminator='\n')
    writer.writerow(['surface', 'aliases', 'low [um]', 'value [um]', 'high [um]', 'source'])
    writer.writerows(ROWS)
print(len(ROWS))
