"""Records of gas mixtures by composition.

Run with:  python3 scripts/materials/generate-gases.py   (standard library only)
The composition of a record is its usual one; the case or the command line may give another. Everything else follows from the
records of the components.
"""
import os

from record import FOLDER, write

MASS = {'nitrogen': 28.01348, 'oxygen': 31.9988, 'carbon-dioxide': 44.0098, 'water': 18.015268, 'argon': 39.948, 'methane': 16.0428, 'ethane': 30.06904, 'propane': 44.09562}


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
        'model': 'gas-mixture', 'range': ranges,
        'uncertainty': {'density': [{'p': ['0 Pa', '200 kPa'], 'value': uncertainty['density'][0]}, {'value': uncertainty['density'][1]}], 'specificHeatCapacity': [{'p': ['0 Pa', '200 kPa'], 'value': uncertainty['heat'][0]}, {'value': uncertainty['heat'][1]}],
                        'thermalExpansion': [{'p': ['0 Pa', '200 kPa'], 'value': '1 %'}, {'value': '5 %'}], 'speedOfSound': [{'value': '1 %'}], 'enthalpy': [{'value': '2 %'}], 'isentropicExponent': [{'value': '1.5 %'}]},
        'source': f'ideal mixture of the records of its components; {typical_of}', 'constants': {'shares': shares}}
    record['viscosity'] = {'model': 'mixture-viscosity', 'range': ranges, 'uncertainty': uncertainty['viscosity'], 'source': 'Wilke, J. Chem. Phys. 18 (1950) 517, with the thin gases of the components', 'constants': {}}
    record['thermalConductivity'] = {'model': 'mixture-conductivity', 'range': ranges, 'uncertainty': uncertainty['conductivity'], 'source': 'Mason and Saxena, Phys. Fluids 1 (1958) 361 (Wassiljewa\'s form), with the thin gases of the components', 'notes': 'other mixing rules (mixture-averaged, GRI-Mech 3.0) read up to 7 % more', 'constants': {}}
    if 'water' in shares or not shares:
        record['saturationTemperature'] = {'model': 'dew-point', 'range': ranges, 'uncertainty': '0.3 %', 'source': 'partial pressure of the water against IAPWS R7-97, without acids', 'constants': {}}
    write(record, 'generate-gases.py')


USUAL = {'density': ('0.5 %', '3 %'), 'heat': ('1 %', '3 %'), 'viscosity': '3 %', 'conductivity': '7 %'}
HOT, PRESSURES = ['273.15 K', '1500 K'], ['1 kPa', '1 MPa']
mixture('flue gas', ['exhaust gas', 'combustion gas', 'stack gas'], 'the usual one of natural gas with 10 % excess air, without trace gases; acids raise its dew point', {'nitrogen': 0.716, 'carbon-dioxide': 0.087, 'water': 0.172, 'oxygen': 0.017, 'argon': 0.008}, HOT, PRESSURES, USUAL, 'composition by the balance of methane burnt with 1.1 times its air')
mixture('coal flue gas', ['flue gas of coal'], 'the usual one of hard coal with 25 % excess air, without sulphur dioxide and dust; acids raise its dew point', {'nitrogen': 0.745, 'carbon-dioxide': 0.140, 'water': 0.065, 'oxygen': 0.041, 'argon': 0.009}, HOT, PRESSURES, USUAL, 'composition by the balance of hard coal, common practice')
mixture('exhaled air', ['expired air', 'breath'], 'what people breathe out, saturated at about 34 degC', {'nitrogen': 0.746, 'oxygen': 0.155, 'carbon-dioxide': 0.040, 'water': 0.050, 'argon': 0.009}, ['273.15 K', '323.15 K'], ['50 kPa', '200 kPa'], USUAL, 'composition of alveolar and dead-space air, physiology textbooks, from memory')
COMBUSTIBLE = {'density': ('0.8 %', '4 %'), 'heat': ('1.5 %', '5 %'), 'viscosity': '4 %', 'conductivity': '8 %'}
mixture('natural gas', ['town gas', 'fuel gas', 'NG', 'pipeline gas'], 'the usual one of pipelines, rich in methane; above 10 bar it is no ideal gas any more', {'methane': 0.93, 'ethane': 0.04, 'propane': 0.01, 'nitrogen': 0.01, 'carbon-dioxide': 0.01}, ['250 K', '600 K'], PRESSURES, COMBUSTIBLE, 'composition common practice', ('flammable', 'inert'))
mixture('biogas', ['digester gas', 'sewage gas'], '60 % methane and 36 % carbon dioxide, moist, without hydrogen sulphide, which raw biogas holds', {'methane': 0.60, 'carbon-dioxide': 0.36, 'water': 0.03, 'nitrogen': 0.01}, ['273.15 K', '600 K'], PRESSURES, COMBUSTIBLE, 'composition common practice', ('flammable', 'toxic', 'carbonDioxide'))
mixture('gas mixture', ['mixture of gases', 'mixed gas', 'mixed gases'], 'gases by components, which have to be given', {}, ['200 K', '1500 K'], PRESSURES, {'density': ('1 %', '5 %'), 'heat': ('1.5 %', '4 %'), 'viscosity': '4 %', 'conductivity': '7 %'}, 'composition as given')
