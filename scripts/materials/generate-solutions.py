"""Records of aqueous solutions and of liquids whose fits CoolProp carries.

Run with:  python3 scripts/materials/generate-solutions.py   (needs CoolProp 8.0.0 and chemicals 1.5.2)
Sources: the incompressible fluids of CoolProp (MIT licence), whose coefficients go back to the works named in each record;
chemicals (MIT licence) for the constants that Laliberte published for aqueous electrolytes.
"""
import csv
import glob
import json
import os

import chemicals
import CoolProp

import strong_acid
from record import K, disputed, write

HERE = 'generate-solutions.py from the coefficients of CoolProp 8.0.0 (incompressible fluids, MIT licence)'
LALIBERTE_BY = 'generate-solutions.py from the constants in chemicals 1.5.2 (MIT licence)'


def incompressible():
    """The table of incompressible fluids, as JSON inside the library."""
    for path in glob.glob(os.path.join(os.path.dirname(CoolProp.__file__), 'CoolProp*.so')):
        data = open(path, 'rb').read()
        start = data.find(b'[{"T_freeze"')
        if start >= 0:
            return {e['name']: e for e in json.loads(data[start:data.find(b'\0', start)])}
    raise SystemExit('this build of CoolProp does not carry its coefficients as text')


TABLE = incompressible()
NAMES = (('density', 'density', 'kg/m^3'), ('viscosity', 'viscosity', 'Pa s'), ('conductivity', 'thermalConductivity', 'W/(m K)'), ('specific_heat', 'specificHeatCapacity', 'J/(kg K)'))
MELINDER = 'Melinder, Properties of Secondary Working Fluids for Indirect Systems, IIR (2010); coefficients as fitted by CoolProp 8.0.0 (MIT licence)'


def trimmed(rows):
    while len(rows) > 1 and all(c == 0 for c in rows[-1]):
        rows = rows[:-1]
    return rows


def solution(key, head, T, x, uncertainty, source, without=(), checks={}):
    """A record by share: polynomials in temperature and share about their middle."""
    e = TABLE[key]
    record = {**head, 'kind': 'fluid', 'phases': ['liquid'], 'takes': ['composition']}
    share = [f'{100 * x[0]:g} %', f'{100 * x[1]:g} %']
    base = {'origin': e['Tbase'], 'share': e['xbase']}
    for theirs, ours, unit in NAMES:
        fit = e[theirs]
        if ours in without or all(c == 0 for row in fit['coeffs'] for c in row):
            continue
        record[ours] = {'model': 'mixture-polynomial', 'range': {'T': K(*T), 'p': ['0 Pa', '2 MPa'], 'composition': share}, 'uncertainty': uncertainty[ours], 'source': source,
                        'constants': {**base, **({'of': 'logarithm'} if fit['type'] == 'exppolynomial' else {}), 'gives': unit, 'rows': trimmed(fit['coeffs'])}}
        if ours in checks:
            record[ours]['checks'] = checks[ours]
    freeze = e['T_freeze']
    if freeze['type'] in ('polynomial', 'exppolynomial'):
        record['meltingTemperature'] = {'model': 'mixture-polynomial', 'range': {'p': ['0 Pa', '2 MPa'], 'composition': share}, 'uncertainty': '0.5 %', 'source': f'{source}, first crystals',
                                        'constants': {**base, **({'of': 'logarithm'} if freeze['type'] == 'exppolynomial' else {}), 'gives': 'K', 'rows': trimmed(freeze['coeffs'])}}
    return record


# Where another work lies farther off than is usual: test/properties/compared/aqueous.py.
DISPUTED = {
    'potassium formate brine': {'viscosity': ('15 %', 'at 288 K and 47 % 2.82 mPa s, Laliberte (2009) 2.47')},
    'lithium chloride brine': {'viscosity': ('15 %', 'at 274 K and 23.5 % 4.11 mPa s, Conde (2004) 4.83')},
    'ethanol-water': {'thermalConductivity': ('7 %', 'at 276 K and 59 % 0.280 W/(m K), the rule of Filippov (1955) 0.262')},
    'glycerol-water': {'thermalConductivity': ('8 %', 'at 312 K and 45 % 0.450 W/(m K), the rule of Filippov (1955) 0.418')},
    'methanol-water': {'meltingTemperature': ('1.2 %', 'at 15.4 % 262.3 K, VDI Heat Atlas 259.3'), 'viscosity': ('12 %', 'at 266 K and 21 % 4.42 mPa s, VDI Heat Atlas 4.98'), 'thermalConductivity': ('10 %', 'at 233 K and 44 % 0.346 W/(m K), VDI Heat Atlas 0.380'), 'specificHeatCapacity': ('12 %', 'at 233 K and 44 % 3077 J/(kg K), VDI Heat Atlas 3471')},
    'caustic soda': {'density': ('1.6 %', 'at 373 K and 49 % 1481 kg/m^3, Olsson et al. (1997) 1459'), 'specificHeatCapacity': ('5.5 %', 'at 277 K and 10 % 3720 J/(kg K), Olsson et al. (1997) 3927'), 'viscosity': ('11 %', 'at 286 K and 12 % 2.65 mPa s, Alexandrov (2004) 2.39')},
    'magnesium chloride brine': {'meltingTemperature': ('1.4 %', 'at 20 % 244.4 K, VDI Heat Atlas 241.3')},
    'calcium chloride brine': {'meltingTemperature': ('1 %', 'at 17.1 % 259.4 K, VDI Heat Atlas 261.9'), 'viscosity': ('16 %', 'at 373 K and 10 % 0.404 mPa s, Conde (2004) 0.348')},
}
def ideal_vapour(mass, particles, xmax, uncertainty, notes, checks=()):
    return {'model': 'ideal-vapour-pressure', 'range': {'T': ['273.16 K', '433.15 K'], 'composition': ['0 %', f'{100 * xmax:g} %']}, 'uncertainty': uncertainty,
            'source': 'Raoult\'s law of ideal solutions with the vapour pressure of water of IAPWS R7-97', 'notes': notes, **({'checks': list(checks)} if checks else {}), 'constants': {'molarMass': f'{mass:g} g/mol', 'particles': particles}}


COMMON = {'density': '0.5 %', 'viscosity': '6 %', 'thermalConductivity': '4 %', 'specificHeatCapacity': '3 %'}
handbook = lambda T, x, mu: {'at': {'T': T, 'composition': x}, 'expect': f'{mu} mPa s', 'within': '5 %', 'source': 'handbook tables of aqueous ethanol, from memory'}
for key, name, aliases, solute, T, xmax, other, checks in (
    ('MEA', 'ethanol-water', ['aqueous ethanol', 'ethyl alcohol-water'], 'ethanol', (233.15, 313.15), 0.6, {}, {'viscosity': [handbook('0 degC', 0.3, 6.94), handbook('20 degC', 0.4, 2.91), handbook('40 degC', 0.2, 1.16)]}),
    ('MMA', 'methanol-water', ['aqueous methanol', 'methyl alcohol-water'], 'methanol', (233.15, 313.15), 0.6, {}, {}),
    ('MAM', 'ammonia-water', ['aqueous ammonia', 'ammonia solution'], 'ammonia', (233.15, 303.15), 0.3, {'viscosity': '9 %', 'specificHeatCapacity': '5 %'}, {}),
    ('MKC', 'potassium carbonate brine', ['K2CO3 brine'], 'potassium carbonate', (243.15, 313.15), 0.39, {'density': '0.7 %', 'viscosity': '8 %'}, {}),
    ('MLI', 'lithium chloride brine', ['LiCl brine'], 'lithium chloride', (213.15, 313.15), 0.24, {'specificHeatCapacity': '6 %'}, {}),
    # Its viscosity polynomial runs away beyond 20 % (at 25 % and 20 degC it gives 11 mPa s where 4.3 mPa s is right).
    ('MMG', 'magnesium chloride brine', ['MgCl2 brine'], 'magnesium chloride', (243.15, 313.15), 0.2, {'viscosity': '17 %'}, {}),
    ('MKF', 'potassium formate brine', [], 'potassium formate', (233.15, 313.15), 0.48, {}, {}),
    ('MKA', 'potassium acetate brine', [], 'potassium acetate', (233.15, 313.15), 0.45, {}, {}),
):
    xmax = min(xmax, TABLE[key]['xmax'])
    record = solution(key, {'name': name, 'aliases': aliases, 'about': f'the composition is the share of {solute} by mass'}, T, (0, xmax), {**COMMON, **other}, MELINDER, checks=checks)
    write(disputed(record, DISPUTED.get(name, {})), HERE)

# Glycerol: the viscosity law holds from water to glycerol; the other properties to 60 %.
glycerol = solution('MGL', {'name': 'glycerol-water', 'aliases': ['aqueous glycerol', 'glycerine-water', 'glycerin-water'], 'about': 'the composition is the share of glycerol by mass'}, (263.15, 313.15), (0, 0.6), COMMON, MELINDER, without=('viscosity',))
glycerol['viscosity'] = {
    'model': 'glycerol-viscosity', 'range': {'T': ['273.15 K', '373.15 K'], 'p': ['0 Pa', '2 MPa'], 'composition': ['0 %', '100 %']}, 'uncertainty': '6 %',
    'source': 'Cheng, Ind. Eng. Chem. Res. 47 (2008) 3285', 'constants': {},
    'checks': [
        {'at': {'T': '20 degC', 'composition': 0.6}, 'expect': '10.8 mPa s', 'within': '6 %', 'source': 'Segur and Oberstar, Ind. Eng. Chem. 43 (1951) 2117'},
        {'at': {'T': '40 degC', 'composition': 1}, 'expect': '284 mPa s', 'within': '6 %', 'source': 'Segur and Oberstar, Ind. Eng. Chem. 43 (1951) 2117'},
    ]}
glycerol['vapourPressure'] = ideal_vapour(92.094, 1, 0.6, '8 %', 'boiling points at 1 atm that producers print, from memory, lie within 2 K, 6 % of the pressure')
write(disputed(glycerol, DISPUTED['glycerol-water']), HERE)

# Electrolytes: constants as printed by Laliberte; ranges as printed.
with open(os.path.join(os.path.dirname(chemicals.__file__), 'Electrolytes', 'Laliberte2009.tsv')) as file:
    lines = list(csv.reader(file, delimiter='\t'))
# The columns of the range stand three times under the same name: density, viscosity, heat capacity.
SEEN = {}
TITLES = [title if SEEN.setdefault(title, 0) == 0 and not SEEN.update({title: 1}) else f'{title}.{SEEN.update({title: SEEN[title] + 1}) or SEEN[title] - 1}' for title in lines[0]]
ROWS = {row[TITLES.index('CASRN')]: dict(zip(TITLES, row)) for row in lines[1:]}
LALIBERTE = 'Laliberte, J. Chem. Eng. Data 54 (2009) 1725'
RIEDEL = 'Riedel, Chem. Ing. Tech. 23 (1951) 59; contributions of the ions as in Poling, Prausnitz and O\'Connell, 5th ed. (2001), table 10-11, from memory'
# Contributions of ions to the conductivity, 1e-3 W/(m K) per mol/L.
ION = {'H': -9.07, 'Na': 0.0, 'K': -7.56, 'NH4': -11.63, 'Ca': -0.58, 'Mg': -9.30, 'Cl': -5.47, 'OH': 20.93, 'SO4': 1.16, 'NO3': -6.98, 'PO4': -20.93, 'CO3': -7.56}


def electrolyte(cas, name, formula, aliases, ions, about, uncertainty, freezing=None, typical=None, limits=None, extra=None, conducts=None, expansion=None, marks=None, vapour=None, saturated=None, strong=None):
    row = ROWS[cas]
    number = lambda key: float(row[key])
    record = {'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], 'takes': ['composition'], **({'marks': marks} if marks else {}), **({'typical': typical} if typical else {}), **({'saturated': saturated} if saturated else {}), 'about': about}
    where = lambda suffix: {'T': [f'{273.15 + number("Min T" + suffix):g} K', f'{273.15 + min(number("Max T" + suffix), 100):g} K'], 'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', f'{int(1000 * number("Max w" + suffix)) / 10:g} %']}
    record['density'] = {'model': 'aqueous-density', 'range': where(''), 'uncertainty': uncertainty['density'], 'source': f'{LALIBERTE}, {name}, {row["No of points in corr"]} points', 'constants': {'terms': [number(f'c{i}') for i in range(5)]}}
    record['viscosity'] = {'model': 'aqueous-viscosity', 'range': where('.1'), 'uncertainty': uncertainty['viscosity'], 'source': f'{LALIBERTE}, {name}', 'constants': {'terms': [number(f'v{i}') for i in range(1, 7)]}}
    if row['a1']:
        record['specificHeatCapacity'] = {'model': 'aqueous-heat-capacity', 'range': where('.2'), 'uncertainty': uncertainty['specificHeatCapacity'], 'source': f'{LALIBERTE}, {name}', 'constants': {'terms': [number(f'a{i}') for i in range(1, 7)]}}
    if ions:
        sigma = sum(n * ION[ion] for ion, n in ions.items())
        record['thermalConductivity'] = {'model': 'aqueous-conductivity', 'range': {'T': ['273.15 K', '373.15 K'], 'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', f'{int(100 * (conducts or number("Max w")))} %']}, 'uncertainty': uncertainty['thermalConductivity'], 'source': RIEDEL, 'constants': {'contribution': round(sigma * 1e-3, 8), 'molarMass': f'{row["MW"]} g/mol'}}
    if freezing:
        e = TABLE[freezing]
        record['meltingTemperature'] = {'model': 'mixture-polynomial', 'range': {'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', f'{100 * e["xmax"]:g} %']}, 'uncertainty': '0.5 %', 'source': f'{MELINDER}, first crystals', 'constants': {'origin': e['Tbase'], 'share': e['xbase'], 'gives': 'K', 'rows': trimmed(e['T_freeze']['coeffs'])}}
    if freezing:
        # Below the printed range of the constants, the fit of the other work carries on to the first crystals.
        cold = solution(freezing, {}, (TABLE_COLD[freezing], 313.15), (0, e['xmax']), {key: record[key]['uncertainty'] for key in ('density', 'viscosity', 'specificHeatCapacity', 'thermalConductivity')}, MELINDER)
        for key in ('density', 'viscosity', 'specificHeatCapacity'):
            record[key] = [record[key], cold[key]]
        record['thermalConductivity'] = [cold['thermalConductivity'], record['thermalConductivity']]
    for key, entry in (strong or {}).items():
        # The printed range of the weaker law ends where the stronger begins.
        record[key]['range']['composition'][1] = entry['range']['composition'][0]
        record[key] = [record[key], entry]
    if expansion:
        record['thermalExpansion'] = expansion
    if vapour:
        record['vapourPressure'] = vapour
    for key, checks in (extra or {}).items():
        record[key]['checks'] = checks
    write(disputed(record, DISPUTED.get(name, {})), LALIBERTE_BY)


# Lowest temperatures at which the brines are used [K].
TABLE_COLD = {'MNA': 252.15, 'MCA': 223.15}
FINE = {'density': '0.3 %', 'viscosity': '4 %', 'specificHeatCapacity': '2 %', 'thermalConductivity': '5 %'}
COARSE = {'density': '1 %', 'viscosity': '10 %', 'specificHeatCapacity': '5 %', 'thermalConductivity': '8 %'}
# The rule of Riedel holds for salts; for strong lyes it rises where conductivity stays, for phosphoric acid it falls through zero.
# Expansion of caustic soda from the densities at 0 and 40 degC and three shares, a parabola in the share.
LYE = {'model': 'mixture-polynomial', 'range': {'T': ['273.15 K', '323.15 K'], 'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', '50 %']}, 'uncertainty': [{'composition': ['15 %', '50 %'], 'value': '28 %'}, {'value': '40 %'}],
       'source': "densities of Perry's Chemical Engineers' Handbook, 8th ed. (2007), at 0 and 40 degC (20 %: 1229.6 and 1207.9 kg/m^3, 50 %: 1540.0 and 1510.9 kg/m^3), from memory",
       'constants': {'origin': 293.15, 'share': 0, 'gives': '1/K', 'rows': [[2.07e-4, 1.619e-3, -2.147e-3]]}}
ROBINSON = 'osmotic coefficient of Robinson and Stokes, Electrolyte Solutions, 2nd ed. (1959), from memory'
ACID = ['corrosive']
if __name__ == '__main__':
    electrolyte('7647-14-5', 'sodium chloride brine', 'NaCl', ['NaCl brine', 'salt water', 'brine', 'aqueous sodium chloride'], {'Na': 1, 'Cl': 1}, 'the composition is the share of sodium chloride by mass', FINE, 'MNA', typical='20 %', saturated=[['0 degC', '26.3 %'], ['25 degC', '26.4 %'], ['60 degC', '27.1 %'], ['100 degC', '28.1 %']], vapour=ideal_vapour(58.443, 2, 0.2, '5 %', 'stronger brines bind more water than the law says', [{'at': {'T': '25 degC', 'composition': 0.2}, 'expect': '2.660 kPa', 'within': '4 %', 'source': ROBINSON + ' (1.137 at 4.28 mol/kg)'}]))
    electrolyte('10043-52-4', 'calcium chloride brine', 'CaCl2', ['CaCl2 brine', 'aqueous calcium chloride'], {'Ca': 1, 'Cl': 2}, 'the composition is the share of calcium chloride by mass', COARSE, 'MCA')
    electrolyte('7447-40-7', 'potassium chloride brine', 'KCl', ['KCl brine', 'aqueous potassium chloride'], {'K': 1, 'Cl': 1}, 'the composition is the share of potassium chloride by mass', FINE, saturated=[['0 degC', '21.9 %'], ['20 degC', '25.5 %'], ['40 degC', '28.6 %'], ['60 degC', '31.4 %'], ['100 degC', '36 %']], vapour=ideal_vapour(74.551, 2, 0.24, '5 %', 'the salt does not boil off', [{'at': {'T': '25 degC', 'composition': 0.2}, 'expect': '2.828 kPa', 'within': '2 %', 'source': ROBINSON + ' (0.944 at 3.35 mol/kg)'}]))
    electrolyte('7664-93-9', 'sulphuric acid', 'H2SO4', ['sulfuric acid', 'H2SO4', 'battery acid', 'aqueous sulphuric acid'], {'H': 2, 'SO4': 1}, 'in water; the composition is the share of sulphuric acid by mass', COARSE, marks=ACID, strong=strong_acid.ENTRIES)
    electrolyte('1310-73-2', 'caustic soda', 'NaOH', ['sodium hydroxide', 'NaOH', 'lye', 'aqueous sodium hydroxide'], {'Na': 1, 'OH': 1}, 'in water; the composition is the share of sodium hydroxide by mass', COARSE, conducts=0.1, expansion=LYE, marks=ACID)
    electrolyte('1310-58-3', 'caustic potash', 'KOH', ['potassium hydroxide', 'KOH'], {'K': 1, 'OH': 1}, 'in water; the composition is the share of potassium hydroxide by mass', COARSE, conducts=0.15, marks=ACID)
    electrolyte('7647-01-0', 'hydrochloric acid', 'HCl', ['muriatic acid', 'aqueous hydrogen chloride'], {'H': 1, 'Cl': 1}, 'in water; the composition is the share of hydrogen chloride by mass', COARSE, marks=ACID)
    electrolyte('7697-37-2', 'nitric acid', 'HNO3', ['HNO3', 'aqueous nitric acid'], {'H': 1, 'NO3': 1}, 'in water; the composition is the share of nitric acid by mass', COARSE, marks=ACID)
    electrolyte('7664-38-2', 'phosphoric acid', 'H3PO4', ['H3PO4', 'aqueous phosphoric acid'], {'H': 3, 'PO4': 1}, 'in water; the composition is the share of phosphoric acid by mass', COARSE, conducts=0.15, marks=ACID)
    electrolyte('7783-20-2', 'ammonium sulphate solution', '(NH4)2SO4', ['ammonium sulfate solution'], {'NH4': 2, 'SO4': 1}, 'the composition is the share of ammonium sulphate by mass', COARSE)
    electrolyte('7757-82-6', 'sodium sulphate solution', 'Na2SO4', ['sodium sulfate solution', 'glauber salt solution'], {'Na': 2, 'SO4': 1}, 'the composition is the share of sodium sulphate by mass', COARSE)
    electrolyte('497-19-8', 'sodium carbonate solution', 'Na2CO3', ['soda solution'], {'Na': 2, 'CO3': 1}, 'the composition is the share of sodium carbonate by mass', COARSE)
    electrolyte('6484-52-2', 'ammonium nitrate solution', 'NH4NO3', [], {'NH4': 1, 'NO3': 1}, 'the composition is the share of ammonium nitrate by mass', COARSE)
