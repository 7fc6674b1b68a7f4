"""What everyday-solids.py compares beside formulas: which entry of a package stands for which record, and single printed values.

Values of POINTS are from memory of the work named; their references say so.
"""
from everyday_states import BETA, CP, K, RHO

# Record, entry of ISO 10456, properties. ISO prints 1000 J/(kg K) for all stone, a rounded design value: left out where the minerals tell the heat capacity.
BUILDING_ISO = [
    ('concrete', 'Concrete, medium density 2200 kg/m^3', 'rkc'), ('concrete', 'Concrete, high density', 'rkc'), ('oak', 'Timber, 700 kg/m^3', 'rkc'), ('birch', 'Timber, 700 kg/m^3', 'rkc'), ('maple', 'Timber, 700 kg/m^3', 'rkc'), ('spruce', 'Timber, 500 kg/m^3', 'c'),
    ('granite', 'Stone, granite', 'rk'), ('marble', 'Stone, marble', 'rk'), ('limestone', 'Stone, limestone, hard', 'rk'), ('sandstone', 'Stone, sandstone (silica)', 'rk'), ('slate', 'Stone, slate', 'rk'), ('basalt', 'Stone, basalt', 'rk'),
    ('plywood', 'Wood, plywood 500 kg/m^3', 'rkc'), ('particleboard', 'Wood, particleboard, 600 kg/m^3', 'rkc'), ('medium-density fibreboard', 'Wood, fibreboard, 800 kg/m^3', 'rkc'), ('plasterboard', 'Gypsum, plasterboard', 'rk'), ('elastomeric foam', 'Sealant, elastomeric foam, flexible', 'k'),
    ('butyl rubber', 'Rubber, butyl (isobutene), solid melt', 'rkc'), ('silicone rubber', 'Sealant, silicone, pure', 'kc'), ('clay', 'Solids, clay or silt', 'c'), ('polystyrene', 'Plastics, polystyrene', 'c'), ('polymethyl methacrylate', 'Plastics, polymethylmethacrylate (PMMA)', 'c'), ('polypropylene', 'Plastics, polypropylene', 'c'), ('polyamide', 'Plastics, polyamide (nylon)', 'c'), ('polyethylene high density', 'Plastics, polyethylene / polythene, high density', 'r'),
    
    ('fresh snow', 'Water, snow, freshly fallen (<30 mm)', 'k'), ('settled snow', 'Water, snow, soft (30 mm to 70 mm)', 'k'), ('packed snow', 'Water, snow, compacted (<200 mm)', 'k'), ('silica gel', 'Sealant, silica gel (dessicant)', 'k'), ('felt of fibres', 'Floor covering, underlay, wool', 'k'),
]

# Record, entries of the ASHRAE handbook, properties. The plaster board of that table carries the heat capacity of wood boards (1880): left out.
BUILDING_ASHRAE = [
    ('packed glass spheres', ['Siding, Architectural (soda-lime float) glass'], 'c'),
    ('common brick', ['Brick, fired clay, 1920 kg/m^3'], 'rkc'), ('clay tile', ['Brick, fired clay, 2080 kg/m^3', 'Brick, fired clay, 1920 kg/m^3'], 'rkc'), ('concrete', ['Concrete, Sand and gravel or stone aggregate concretes, 2240 kg/m^3'], 'rkc'),
    ('reinforced concrete', ['Concrete, Sand and gravel or stone aggregate concretes, 2240 kg/m^3', 'Concrete, Sand and gravel or stone aggregate concretes, 2400 kg/m^3'], 'rkc'), ('asphalt', ['Asphalt (bitumen with inert fill), 1900 kg/m^3', 'Asphalt (bitumen with inert fill), 2300 kg/m^3'], 'rk'),
    ('cement plaster', ['Cement plaster, sand aggregate', 'Concrete, Cement/lime, mortar, and stucco, 1600 kg/m^3', 'Sand/cement plaster, conditioned'], 'rkc'), ('plasterboard', ['Gypsum or plaster board'], 'rk'), ('plywood', ['Plywood (douglas fir)', 'Plywood/wood panels'], 'rkc'),
    ('particleboard', ['Particleboard, low density'], 'rkc'), ('oriented strand board', ['Oriented strand board (OSB)'], 'rkc'), ('medium-density fibreboard', ['Hardboard, medium density'], 'rkc'), ('carpet', ['Pile carpet with rubber pad', 'Carpet and rubber pad, one-piece'], 'rk'), ('carpet', ['Carpet and rebounded urethane pad'], 'k'), ('slate', ['Slate'], 'k'),
    ('marble', ['Calcitic, dolomitic, limestone, marble, and granite, 2560 kg/m^3'], 'rk'), ('granite', ['Calcitic, dolomitic, limestone, marble, and granite, 2560 kg/m^3'], 'rk'), ('limestone', ['Calcitic, dolomitic, limestone, marble, and granite, 2240 kg/m^3'], 'rk'), ('sandstone', ['Quartzitic and sandstone, 2240 kg/m^3', 'Quartzitic and sandstone, 1920 kg/m^3'], 'rc'), ('sandstone', ['Quartzitic and sandstone, 2240 kg/m^3'], 'k'), ('quartzite', ['Quartzitic and sandstone, 2560 kg/m^3'], 'rk'),
    ('extruded polystyrene', ['Expanded polystyrene, extruded'], 'rkc'), ('polyurethane foam', ['Spray-applied Polyurethane foam, 40 kg/m^3', 'Polyisocyanurate, aged, unfaced'], 'kc'), ('phenolic foam', ['Phenolic foam board with facers, aged'], 'k'), ('cellular glass', ['Cellular glass'], 'rkc'), ('glass wool', ['Mineral fiber'], 'rkc'),
    ('mineral wool', ['Mineral wool, felted, 100 kg/m^3'], 'rkc'), ('mineral wool', ['Slag wool, 120 kg/m^3'], 'k'), ('expanded perlite', ['Loose fill, Perlite, expanded, 100 kg/m^3'], 'rkc'), ('expanded perlite', ['Loose fill, Perlite, expanded, 50 kg/m^3'], 'c'), ('vermiculite', ['Loose fill, Vermiculite, exfoliated, 120 kg/m^3'], 'rkc'), ('straw', ['Straw thatch'], 'k'), ('elastomeric foam', ['Expanded rubber'], 'rkc'),
]

# Record, entry of the NIST list of compounds. Its rubbers are without filler.
NIST = [
    ('polystyrene', 'Polystyrene'), ('polymethyl methacrylate', 'Polymethyl Methacralate (Lucite, Perspex)'), ('polycarbonate', 'Polycarbonate (Makrolon, Lexan)'), ('polytetrafluoroethylene', 'Polytetrafluoroethylene (Teflon)'), ('polyvinylidene fluoride', 'Polyvinylidene Fluoride'), ('polyimide', 'Kapton Polyimide Film'),
    ('polyoxymethylene', 'Polyoxymethylene'), ('polypropylene', 'Polypropylene'), ('polyethylene terephthalate', 'Polyethylene Terephthalate (Mylar)'), ('polyamide', 'Nylon, type 6 and type 6/6'), ('polyvinyl chloride', 'Polyvinyl Chloride'), ('polyethylene high density', 'Polyethylene'), ('polyethylene low density', 'Polyethylene'), ('phenolic resin', 'Bakelite'),
    ('natural rubber', 'Rubber, Natural'), ('chloroprene rubber', 'Rubber, Neoprene'), ('butyl rubber', 'Rubber, Butyl'), ('fluororubber', 'Viton Fluoroelastomer'), ('concrete', 'Concrete, Portland'), ('marble', 'Calcium Carbonate'),
    ('muscle', 'Muscle, Skeletal'), ('fat tissue', 'Adipose Tissue (ICRP)'), ('skin', 'Skin (ICRP)'), ('cortical bone', 'Bone, Cortical (ICRP)'), ('brain tissue', 'Brain (ICRP)'), ('paraffin wax', 'Paraffin Wax'),
]

# Record, share of water, meat (None: heat capacity by Chen alone), temperatures.
COMPOSITIONS = [
    ('apple', 0.839, False, 274, 343), ('potato', 0.790, False, 274, 363), ('carrot', 0.878, False, 274, 363), ('tomato', 0.938, False, 274, 363),
    ('beef', 0.716, True, 274, 343), ('chicken', 0.748, True, 274, 343), ('pork', 0.726, True, 274, 343), ('fish', 0.812, True, 274, 343), ('egg', 0.753, None, 274, 333), ('cheese', 0.367, None, 274, 313), ('bread', 0.40, None, 274, 343),
]

# Record, water, protein, fat by mass.
TISSUES = [('muscle', 0.741, 0.20, 0.04), ('fat tissue', 0.20, 0.05, 0.74), ('skin', 0.65, 0.25, 0.08), ('liver tissue', 0.72, 0.20, 0.06), ('brain tissue', 0.79, 0.10, 0.09), ('kidney tissue', 0.77, 0.17, 0.05), ('lung tissue', 0.80, 0.17, 0.02)]

MEMORY = [
    # Mark, Physical Properties of Polymers Handbook, 2nd ed. (2007); Brandrup, Polymer Handbook, 4th ed. (1999): for records that stand on another work.
    ('polymer handbooks', 293.15, [
        ('polytetrafluoroethylene', {K: 0.25, CP: 1020}), ('polyamide', {K: 0.243}), ('polypropylene', {K: 0.21}), ('polyethylene high density', {K: 0.44}), ('polyethylene low density', {K: 0.33, CP: 2100}), ('polyoxymethylene', {K: 0.29}),
        ('epoxy resin', {RHO: 1170}), ('polyester resin', {RHO: 1350}), ('polyurethane', {K: 0.21}), ('natural rubber', {K: 0.134}), ('chloroprene rubber', {K: 0.19}), ('butyl rubber', {K: 0.13, CP: 1950}), ('silicone rubber', {K: 0.18, CP: 1460}),
    ]),
    ('bergman table A.3', 300, [
        ('natural rubber', {RHO: 1100, CP: 2010}), ('hard rubber', {RHO: 1190, K: 0.16}), ('asphalt', {RHO: 2115}), ('soil', {K: 0.52}), ('plywood', {RHO: 545, K: 0.12, CP: 1215}), ('particleboard', {RHO: 590, CP: 1300}), ('plasterboard', {RHO: 800, K: 0.17}), ('clay', {RHO: 1460, K: 1.3, CP: 880}), ('cement plaster', {RHO: 1860, K: 0.72, CP: 780}), ('oak', {K: 0.16}),
        ('southern pine', {RHO: 640, K: 0.15}), ('expanded polystyrene', {CP: 1210}), ('extruded polystyrene', {RHO: 55, CP: 1210}), ('vermiculite', {RHO: 122, CP: 835}), ('expanded perlite', {RHO: 105}), ('cellulose insulation', {RHO: 45}), ('polyurethane foam', {K: 0.026, CP: 1045}),
    ]),
    ('corlew-dickson 1968', 293.15, [('asphalt', {RHO: 2240, K: 1.21, CP: 920})]), ('cragoe 1929', 293.15, [('bitumen', {K: 0.169})]), ('handbooks of bitumen', 293.15, [('bitumen', {RHO: 1030})]), ('en 13986', 283.15, [('oriented strand board', {K: 0.13}), ('plywood', {K: 0.13}), ('particleboard', {K: 0.12})]),
    ('iec 60672-3 C110', 298.15, [('porcelain', {RHO: 2200, K: 1.75, CP: 825, BETA: 16.5e-6})]), ('azar-graebner 1996', 293.15, [('circuit board FR-4', {K: 0.29})]), ('perry', 300, [('cotton', {CP: 1340}), ('paper', {CP: 1340}), ('cellulose insulation', {CP: 1340}), ('cork', {CP: 2030}), ('coal', {CP: 1300}), ('sheep wool', {CP: (1360 + 0.15 * 4190) / 1.15})]), ('en 1992-1-1 and en 1996-1-1', 293.15, [('concrete', {BETA: 30e-6}), ('reinforced concrete', {BETA: 30e-6}), ('common brick', {BETA: 18e-6})]), ('bergman table A.3', 365, [('calcium silicate', {RHO: 190})]), ('iea annex 39', 297.15, [('vacuum insulation panel', {K: 0.008})]), ('kaye and laby', 293.15, [('paraffin wax', {K: 0.25})]),
    ('robertson 1988', 293.15, [('granite', {K: 2.6}), ('basalt', {K: 1.8}), ('slate', {RHO: 2770}), ('rock salt', {K: 6.0}), ('limestone', {K: 2.4})]), ('sweat 1974', 301.15, [('apple', {RHO: 840, K: 0.422}), ('carrot', {RHO: 1040, K: 0.605}), ('potato', {RHO: 1040, K: 0.498}), ('tomato', {RHO: 1010, K: 0.571})]),
    ('ashrae refrigeration chapter 9', 277.15, [('butter', {K: 0.197}), ('fish', {K: 0.534})]), ('sweat-parmelee 1978', 293.15, [('cheese', {K: 0.33})]), ('handbooks of food', 293.15, [('beef', {RHO: 1060}), ('fish', {RHO: 1055}), ('chicken', {RHO: 1060}), ('pork', {RHO: 1060}), ('egg', {RHO: 1032}), ('butter', {RHO: 935}), ('cheese', {RHO: 1090})]),
    ('davidson-james 2000', 310.15, [('cortical bone', {K: 0.56})]), ('brown 1970', 310.15, [('tooth enamel', {K: 0.93, CP: 711})]), ('icru 44', 310.15, [('muscle', {RHO: 1050}), ('fat tissue', {RHO: 950}), ('liver tissue', {RHO: 1060}), ('kidney tissue', {RHO: 1050}), ('brain tissue', {RHO: 1040}), ('cortical bone', {RHO: 1920}), ('skin', {RHO: 1090}), ('lung tissue', {RHO: 260})]),
    ('jackson-james 1986', 293.15, [('felt of fibres', {'permeability': 2.46e-10})]),
    ('billet-schultes 1999', 293.15, [('Raschig rings', {'voidFraction': 0.68}), ('Pall rings', {'voidFraction': 0.954})]), ('hazen 1892', 293.15, [('wet sand', {'permeability': 9.2e-11})]),
    ('janz 1988', 600, [('sodium nitrate', {RHO: 2320 - 0.715 * 600, 'viscosity': 2.7e-3})]), ('janz 1988', 690, [('sodium nitrate', {RHO: 2320 - 0.715 * 690})]),
]
# Conductivity by temperature: Bergman et al., 7th ed. (2011), table A.3, insulations.
INSULATIONS = {
    'glass wool': {255: 0.032, 270: 0.033, 285: 0.036, 300: 0.039, 310: 0.040, 365: 0.053}, 'expanded perlite': {200: 0.036, 215: 0.039, 230: 0.042, 240: 0.043, 255: 0.046, 270: 0.049, 285: 0.051, 300: 0.053, 310: 0.056}, 'vermiculite': {285: 0.065, 300: 0.068, 310: 0.071},
    'cellulose insulation': {285: 0.038, 300: 0.039, 310: 0.042}, 'extruded polystyrene': {255: 0.023, 270: 0.025, 285: 0.026, 300: 0.027, 310: 0.029}, 'expanded polystyrene': {255: 0.033, 270: 0.035, 285: 0.036, 300: 0.038, 310: 0.040}, 'elastomeric foam': {270: 0.029, 285: 0.030, 300: 0.032, 310: 0.033},
    'calcium silicate': {365: 0.059, 420: 0.063, 530: 0.075, 645: 0.089, 750: 0.104}, 'ceramic fibre': {530: 0.049, 645: 0.068, 750: 0.091},
}
POINTS = [(name, prop, T, value, f'{work} (from memory)') for work, T, rows in MEMORY for name, values in rows for prop, value in values.items()]
POINTS += [(name, K, T, value, 'bergman table A.3 (from memory)') for name, rows in INSULATIONS.items() for T, value in rows.items()]
