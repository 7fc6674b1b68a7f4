"""Records of gas mixtures by composition.

Run with:  python3 scripts/materials/generate-gases.py   (standard library only)
The composition of a record is its usual one; the case or the command line may give another. Everything else follows from the
records of the components.
"""
import os

from record import FOLDER, write

MASS = {'nitrogen': 28.01348, 'oxygen': 31.9988, 'carbon-dioxide': 44.0098, 'water': 18.015268, 'argon': 39.948, 'methane': 16.0428, 'ethane': 30.06904, 'propane': 44.09562}


MIXED = 'thin gases of the records of its components, departure from them by Soave, Chem. Eng. Sci. 27 (1972) 1197'
# Rows [departure up to, uncertainty in %]: the departure is repulsion and attraction in the compressibility factor, added. Each step lies above
# the largest difference from the reference equations of 27 gases and mixtures to 10 MPa; the first is that of the record where it states one.
REAL = {
    'density': [(0.01, 0.5), (0.03, 1.2), (0.06, 2), (0.1, 3), (0.2, 3.5), (0.4, 5), (0.8, 6), (None, 16)],
    # These two by what they are along the dew line, where the cubic equation is poorest.
    'specificHeatCapacity': [(0.01, 1), (0.03, 2), (0.06, 5), (0.1, 10), (0.15, 12.5), (0.2, 15), (0.4, 23), (None, 28)],
    'thermalExpansion': [(0.01, 1), (0.03, 2.3), (0.06, 6), (0.1, 8), (0.15, 10), (0.2, 12), (0.4, 18), (0.8, 22), (None, 35)],
    'speedOfSound': [(0.01, 1), (0.03, 1.2), (0.1, 3), (0.2, 3.5), (0.4, 5), (0.6, 6.5), (0.8, 12), (None, 28)],
    'enthalpy': [(0.2, 2), (0.8, 4), (None, 10)],
    'isentropicExponent': [(0.01, 1.5), (0.03, 3), (0.1, 6), (0.2, 8), (0.4, 12), (0.8, 25), (None, 60)],
}
# The named gases, with the compositions that go by their names: held by themselves.
NAMED = {
    **REAL,
    'density': [(0.01, 0.5), (0.06, 1), (0.2, 2), (0.8, 4), (1.2, 6), (None, 16)],
    'specificHeatCapacity': [(0.01, 1), (0.1, 2), (0.2, 3), (0.8, 6), (1.2, 10), (None, 20)],
    'thermalExpansion': [(0.01, 1), (0.03, 1.5), (0.2, 4), (0.8, 7), (1.2, 14), (None, 35)],
    'speedOfSound': [(0.06, 1), (0.2, 2.5), (0.4, 4), (0.8, 8), (1.2, 12), (None, 28)],
    'isentropicExponent': [(0.01, 1.5), (0.06, 2.5), (0.2, 5), (0.4, 9), (0.8, 17), (1.2, 25), (None, 60)],
}
# Transport: the first step is that of the mixing rule, the others those of the pure gases under pressure beside it.
DENSE = {'viscosity': [(0.15, 3), (0.4, 7), (0.8, 12), (None, 45)], 'thermalConductivity': [(0.15, 7), (0.4, 10), (0.8, 14), (None, 45)]}
# Heavy molecules of many atoms, such as sulphur hexafluoride, conduct up to 18 % more under pressure than the rule says.
HEAVY = [(0.05, 7), (0.15, 9), (0.4, 16), (0.8, 20), (None, 45)]


def bands(steps, first=None):
    rows = [(up, f'{max(value, float((first or "0 %")[:-2])):g} %') for up, value in steps]
    return [{'departure': up, 'value': value} if up else {'value': value} for up, value in rows]


def mixture(name, aliases, about, shares, T, p, uncertainty, typical_of, marks=()):
    missing = [id for id in shares if not os.path.exists(os.path.join(FOLDER, f'{id}.yaml'))]
    if missing:
        print(f'{name} is not written: no record of {", ".join(missing)}')
        return
    assert not shares or abs(sum(shares.values()) - 1) < 1e-9, name
    ranges = {'T': T, 'p': p}
    record = {'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['vapour'], 'takes': ['components'], **({'marks': list(marks)} if marks else {}), 'about': about}
    if shares:
        record['molarMass'] = f'{sum(x * MASS[id] for id, x in shares.items()):.6g} g/mol'
    record['thermodynamics'] = {
        'model': 'gas-mixture', 'range': ranges, 'uncertainty': {id: bands(steps, uncertainty.get(id)) for id, steps in (NAMED if shares else REAL).items()},
        'source': f'{MIXED}; {typical_of}', 'constants': {'shares': shares}}
    record['viscosity'] = {'model': 'mixture-viscosity', 'range': ranges, 'uncertainty': bands(DENSE['viscosity'], uncertainty['viscosity']), 'source': 'Wilke, J. Chem. Phys. 18 (1950) 517, with the thin gases of the components; under pressure Dean and Stiel, AIChE J. 11 (1965) 526', 'constants': {}}
    record['thermalConductivity'] = {'model': 'mixture-conductivity', 'range': ranges, 'uncertainty': bands(uncertainty.get('dense', DENSE['thermalConductivity']), uncertainty['thermalConductivity']), 'source': 'Mason and Saxena, Phys. Fluids 1 (1958) 361 (Wassiljewa\'s form), with the thin gases of the components; under pressure Stiel and Thodos, AIChE J. 10 (1964) 26', 'notes': 'other mixing rules (mixture-averaged, GRI-Mech 3.0) read up to 7 % more', 'constants': {}}
    if 'water' in shares or not shares:
        record['saturationTemperature'] = {'model': 'dew-point', 'range': ranges, 'uncertainty': [{'p': ['0 Pa', '1 MPa'], 'value': '0.3 %'}, {'value': '0.8 %'}], 'source': 'fugacity of the water by the cubic equation against IAPWS R7-97, without acids', 'constants': {}}
    write(record, 'generate-gases.py')


USUAL = {'viscosity': '3 %', 'thermalConductivity': '7 %'}
HOT, PRESSURES = ['273.15 K', '1500 K'], ['1 kPa', '10 MPa']
mixture('flue gas', ['exhaust gas', 'combustion gas', 'stack gas'], 'the usual one of natural gas with 10 % excess air, without trace gases; acids raise its dew point', {'nitrogen': 0.716, 'carbon-dioxide': 0.087, 'water': 0.172, 'oxygen': 0.017, 'argon': 0.008}, HOT, PRESSURES, USUAL, 'composition by the balance of methane burnt with 1.1 times its air')
mixture('coal flue gas', ['flue gas of coal'], 'the usual one of hard coal with 25 % excess air, without sulphur dioxide and dust; acids raise its dew point', {'nitrogen': 0.745, 'carbon-dioxide': 0.140, 'water': 0.065, 'oxygen': 0.041, 'argon': 0.009}, HOT, PRESSURES, USUAL, 'composition by the balance of hard coal, common practice')
mixture('exhaled air', ['expired air', 'breath'], 'what people breathe out, saturated at about 34 degC', {'nitrogen': 0.746, 'oxygen': 0.155, 'carbon-dioxide': 0.040, 'water': 0.050, 'argon': 0.009}, ['273.15 K', '323.15 K'], ['50 kPa', '200 kPa'], USUAL, 'composition of alveolar and dead-space air, physiology textbooks, from memory')
COMBUSTIBLE = {'specificHeatCapacity': '1.5 %', 'viscosity': '4 %', 'thermalConductivity': '8 %'}
mixture('natural gas', ['town gas', 'fuel gas', 'NG', 'pipeline gas'], 'the usual one of pipelines, rich in methane, without water', {'methane': 0.93, 'ethane': 0.04, 'propane': 0.01, 'nitrogen': 0.01, 'carbon-dioxide': 0.01}, ['250 K', '600 K'], PRESSURES, COMBUSTIBLE, 'composition common practice', ('flammable', 'inert'))
mixture('biogas', ['digester gas', 'sewage gas'], '60 % methane and 36 % carbon dioxide, moist, without hydrogen sulphide, which raw biogas holds', {'methane': 0.60, 'carbon-dioxide': 0.36, 'water': 0.03, 'nitrogen': 0.01}, ['273.15 K', '600 K'], PRESSURES, COMBUSTIBLE, 'composition common practice', ('flammable', 'toxic', 'carbonDioxide'))
mixture('gas mixture', ['mixture of gases', 'mixed gas', 'mixed gases'], 'gases by components, which have to be given', {}, ['200 K', '1500 K'], PRESSURES, {'specificHeatCapacity': '1.5 %', 'viscosity': '4 %', 'thermalConductivity': '7 %', 'dense': HEAVY}, 'composition as given')
