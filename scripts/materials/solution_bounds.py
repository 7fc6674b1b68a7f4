"""What is sure of a solution whose record does not say where it boils or freezes: it boils no lower than its most volatile part, and down
to a share no crystals form above a temperature.

A dissolved substance that does not evaporate lowers the vapour pressure of water (Raoult). Where it evaporates more readily than water, the
solution boils between the two, or at a lowest-boiling azeotrope a little below.
"""

# Solutions whose solute evaporates: the material that boils first, kelvins below it where an azeotrope boils lower, why.
VOLATILE = {
    'ethanol-water': ('ethanol', 1, 'the azeotrope boils 0.2 K below ethanol at 1 atm, within 1 K to 1 MPa'),
    'methanol-water': ('methanol', 0, 'no azeotrope'),
    'ammonia-water': ('ammonia', 0, 'no azeotrope'),
    'hydrochloric acid': ('hydrogen-chloride', 0, 'its azeotrope boils highest'),
}
ROOM = "solubilities and freezing points of the CRC Handbook of Chemistry and Physics, from memory, rounded up"
# First crystals: temperature [K] that no solution up to a share [%] reaches, by the ranges of the shares.
FIRST_CRYSTALS = {
    'hydrochloric acid': [(37.5, 273.15)],
    'nitric acid': [(70.1, 273.15)],
    'sulphuric acid': [(78.2, 273.15)],
    'phosphoric acid': [(75, 273.15), (84.9, 295.15)],
    'caustic soda': [(25, 273.15), (50.2, 289.65)],
    'caustic potash': [(45, 273.15)],
    'sodium carbonate solution': [(5.5, 273.15), (17, 293.15)],
    'sodium sulphate solution': [(3.5, 273.15), (15, 293.15)],
    'ammonium sulphate solution': [(40, 273.15)],
    'ammonium nitrate solution': [(50, 273.15)],
    'potassium chloride brine': [(21, 273.15)],
    'sucrose solution': [(50, 273.15)],
    'fruit juice': [(50, 273.15)],
}


def bounded(record):
    """The record with its bounds, where it is a solution in water."""
    if record.get('takes') != ['composition'] or 'boilingFloor' in record:
        return record
    name = record['name']
    first = record['density'] if 'density' in record else record['viscosity']
    share = (first[0] if isinstance(first, list) else first)['range']
    if isinstance(share, list):
        share = share[0]
    share = share['composition']
    if name == 'nitric acid':
        record['boilingFloor'] = {'model': 'constant', 'range': {'p': ['101 kPa', '5 MPa'], 'composition': share}, 'uncertainty': '0.5 %', 'source': 'boiling point of anhydrous nitric acid at 1 atm, CRC Handbook of Chemistry and Physics, from memory; its azeotrope boils highest', 'constants': {'value': '356 K'}}
    else:
        of, less, why = VOLATILE.get(name, ('water', 0, 'what is dissolved does not evaporate, and lowers the vapour pressure of water (Raoult)'))
        record['boilingFloor'] = {'model': 'boils-above', 'range': {'p': ['50 kPa' if of in ('hydrogen-chloride', 'ammonia') else '1 kPa', '1 MPa' if less else '5 MPa'], 'composition': share}, 'uncertainty': '0.2 %', 'source': f'saturation line of {of.replace("-", " ")}: {why}', 'constants': {'of': of, 'less': f'{less} K'}}
    steps = FIRST_CRYSTALS.get(name)
    if steps and 'meltingTemperature' not in record:
        record['freezingCeiling'] = [{'model': 'constant', 'range': {'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', f'{to:g} %']}, 'uncertainty': '0.4 %', 'source': ROOM, 'constants': {'value': f'{T:g} K'}} for to, T in steps]
    return record
