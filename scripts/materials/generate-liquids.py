"""Records of liquids by grade or class: oils, fuels, silicone oils, thermal oils, liquid metals, molten salts, liquid food.

Run with:  python3 scripts/materials/generate-liquids.py   (needs CoolProp 8.0.0 for the thermal oils, chemicals 1.5.2 for molten densities)
Petroleum: ASTM D341 for the viscosity, the volume correction of API MPMS 11.1 for the density, Cragoe (NBS Misc. Publ. 97, 1929) for
heat capacity and conductivity. What is written here by hand states its source; 'from memory' where no second source was at hand.
"""
import csv
import math
import os
from importlib import import_module

import chemicals

import syrup
from record import K, disputed, write

BY = 'generate-liquids.py'
solutions = import_module('generate-solutions')
TABLE, trimmed, LALIBERTE, ROWS = solutions.TABLE, solutions.trimmed, solutions.LALIBERTE, solutions.ROWS
BERGMAN = 'Bergman, Lavine, Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 7th ed. (2011)'


def entry(model, T, uncertainty, source, constants, p='5 MPa', **more):
    return {'model': model, 'range': {'T': K(*T), 'p': ['0 Pa', p]}, 'uncertainty': uncertainty, 'source': source, **more, 'constants': constants}


def constant(value, T, uncertainty, source, p='5 MPa', **more):
    return entry('constant', T, uncertainty, source, {'value': value}, p, **more)


def melting(value, source, uncertainty='0.5 %'):
    return {'model': 'constant', 'range': {'p': ['0 Pa', '5 MPa']}, 'uncertainty': uncertainty, 'source': source, 'constants': {'value': value}}


def r(x, n=5):
    return float(f'{x:.{n}g}')


# Thermal expansion of petroleum at 15 degC, alpha = K0/rho^2 + K1/rho (API MPMS 11.1).
KINDS = {'crude': (613.9723, 0), 'petrol': (346.4228, 0.4388), 'kerosene': (594.5418, 0), 'diesel': (186.9696, 0.4862), 'lubricant': (0, 0.6278)}


def petroleum(name, aliases, about, rho15, kind, viscosities, T, spread, source, marks, density_spread='2 %', extra=None, others=None):
    k0, k1 = KINDS[kind]
    a = k0 / rho15 ** 2 + k1 / rho15
    s = rho15 / 999.0
    (t1, nu1), (t2, nu2) = viscosities
    record = {'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], 'marks': marks, 'about': about,
              'density': entry('polynomial', T, density_spread, f'{source[0]}; slope after API MPMS 11.1', {'gives': 'kg/m^3', 'argument': 'degC', 'origin': 15, 'terms': [rho15, r(-a * rho15), r(-0.3 * a * a * rho15)]}),
              'viscosity': entry('walther', T, spread, f'{source[1]}; law of ASTM D341', {'T1': f'{t1} degC', 'nu1': f'{nu1:.4g} mm^2/s', 'T2': f'{t2} degC', 'nu2': f'{nu2:.4g} mm^2/s'}),
              'thermalConductivity': entry('polynomial', T, '12 %', f'petroleum liquids after Cragoe, NBS Misc. Publ. 97 (1929), k = 0.1172 (1 - 0.00054 t)/s with s = {s:.3f}', {'gives': 'W/(m K)', 'argument': 'degC', 'terms': [r(0.1172 / s), r(-0.1172 * 0.00054 / s)]}),
              'specificHeatCapacity': entry('polynomial', T, '5 %', f'petroleum liquids after Cragoe, NBS Misc. Publ. 97 (1929), c = (1.685 + 0.0034 t)/sqrt(s) kJ/(kg K) with s = {s:.3f}', {'gives': 'J/(kg K)', 'argument': 'degC', 'terms': [r(1685 / math.sqrt(s)), r(3.4 / math.sqrt(s))]})}
    record.update(extra or {})
    write(disputed(record, others or {}), BY)


# The rule of Cragoe conducts 17 % to 24 % too well for light fuels: another rule, in the temperature alone.
def light(T, cragoe):
    return {'thermalConductivity': entry('polynomial', T, '15 %', f'API Technical Data Book, procedure 12A3.1, 0.164 - 1.277e-4 T, from memory; Cragoe, NBS Misc. Publ. 97 (1929), gives {cragoe}', {'gives': 'W/(m K)', 'terms': [0.164, -1.277e-4]})}


# Single grades of SAE J300 by their viscosity at 100 degC.
SAE = ((32, 10), (68, 20), (100, 30), (150, 40), (220, 50))
# ISO 3448: the grade is the viscosity at 40 degC within 10 %; at 100 degC that of a viscosity index of about 97.
for grade, at100, rho15 in ((10, 2.6, 850), (15, 3.3, 855), (22, 4.2, 862), (32, 5.3, 868), (46, 6.7, 874), (68, 8.7, 879), (100, 11.2, 883), (150, 14.6, 887), (220, 18.9, 892), (320, 24.2, 896), (460, 30.6, 900), (680, 39.0, 907)):
    petroleum(f'lubricating oil ISO VG {grade}', [f'ISO VG {grade}', f'VG {grade}', f'VG{grade}', f'oil VG {grade}', *([f'hydraulic oil {grade}', f'HLP {grade}'] if grade <= 68 else []), *([f'gear oil {grade}'] if grade >= 100 else []), *[f'{lead}{sae}{tail}' for vg, sae in SAE if vg == grade for lead, tail in (('SAE ', ''), ('SAE', ''), ('SAE ', ' oil'))]],
              'a grade of mineral oil with a viscosity index of about 97; multigrade and synthetic oils thin less when warm', rho15, 'lubricant', ((40, grade), (100, at100)), (263.15, 403.15),
              [{'T': ['308.15 K', '318.15 K'], 'value': '12 %'}, {'T': ['288.15 K', '403.15 K'], 'value': '20 %'}, {'value': '40 %'}], ('common practice for solvent-refined mineral oils', 'ISO 3448 grade at 40 degC, viscosity index of 97 by ISO 2909'), ['oil'], others={'thermalConductivity': ('14 %', 'at 403 K API procedure 12A3.1 gives 0.1125 W/(m K)')} if grade <= 22 else None)

petroleum('diesel', ['diesel fuel', 'diesel oil', 'DERV'], 'road diesel of EN 590; give the properties of the fuel at hand where they are known', 835, 'diesel', ((40, 2.8), (100, 1.15)), (253.15, 423.15), '35 %', ('EN 590, 820 to 845 kg/m^3 at 15 degC', 'EN 590, 2.0 to 4.5 mm^2/s at 40 degC'), ['flammable', 'oil'], extra=light((253.15, 423.15), '0.137 W/(m K) at 313 K, here 0.124'))
petroleum('kerosene', ['paraffin oil', 'jet fuel', 'Jet A-1', 'lamp oil'], 'a class; aviation kerosene', 803, 'kerosene', ((-20, 4.2), (40, 1.25)), (233.15, 423.15), '25 %', ('ASTM D1655, 775 to 840 kg/m^3 at 15 degC', 'ASTM D1655, at most 8 mm^2/s at -20 degC, usual values, from memory'), ['flammable'], '4 %', extra=light((233.15, 423.15), '0.143 W/(m K) at 313 K, here 0.124'))
petroleum('petrol', ['gasoline', 'motor spirit'], 'motor petrol of EN 228, a class; it boils from about 35 degC on', 745, 'petrol', ((-20, 0.95), (40, 0.50)), (243.15, 318.15), '25 %', ('EN 228, 720 to 775 kg/m^3 at 15 degC', 'usual values of motor petrol, from memory'), ['flammable'], '4 %', extra=light((243.15, 318.15), '0.154 W/(m K) at 313 K, here 0.124'))
petroleum('heavy fuel oil', ['residual fuel oil', 'bunker oil', 'HFO 380', 'fuel oil no 6'], 'RMG 380 of ISO 8217, a class', 985, 'diesel', ((50, 380), (100, 35)), (313.15, 423.15), '40 %', ('ISO 8217, RMG, at most 991 kg/m^3 at 15 degC', 'ISO 8217, 380 mm^2/s at 50 degC'), ['flammable', 'oil', 'toxic'])
petroleum('transformer oil', ['insulating oil', 'mineral transformer oil'], 'uninhibited mineral oil of IEC 60296, a class', 875, 'lubricant', ((40, 9.5), (100, 2.4)), (243.15, 383.15), '30 %', ('IEC 60296, at most 895 kg/m^3 at 20 degC', 'IEC 60296, at most 12 mm^2/s at 40 degC, usual values, from memory'), ['oil'], others={'specificHeatCapacity': ('6 %', 'at 243 K 1691 J/(kg K), Kesler and Lee 1607')})
petroleum('white oil', ['paraffinum liquidum', 'liquid paraffin'], 'medicinal white oil, a class of about 68 mm^2/s at 40 degC', 868, 'lubricant', ((40, 68), (100, 8.6)), (273.15, 403.15), '25 %', ('common practice', 'common practice for a technical white oil of grade 68'), ['oil'], others={'specificHeatCapacity': ('6 %', 'at 403 K 2282 J/(kg K), Kesler and Lee 2410')})


def beggs_robinson(api, T):
    """Dead crude oil, mPa s (Beggs and Robinson, J. Pet. Technol. 27 (1975) 1140)."""
    fahrenheit = (T - 273.15) * 1.8 + 32
    return 10 ** (10 ** (3.0324 - 0.02023 * api) * fahrenheit ** -1.163) - 1


def glaso(api, T):
    """Dead crude oil, mPa s (Glaso, J. Pet. Technol. 32 (1980) 785)."""
    fahrenheit = (T - 273.15) * 1.8 + 32
    return 3.141e10 * fahrenheit ** -3.444 * math.log10(api) ** (10.313 * math.log10(fahrenheit) - 36.447)


for word, api in (('light', 38), ('medium', 28), ('heavy', 18)):
    rho15 = r(141.5 / (api + 131.5) * 999.016, 4)
    density = lambda T: rho15 * math.exp(-(613.9723 / rho15 ** 2) * (T - 288.15))
    ends = [(t, 1e3 * math.sqrt(beggs_robinson(api, 273.15 + t) * glaso(api, 273.15 + t)) / density(273.15 + t)) for t in (25, 95)]
    petroleum(f'{word} crude oil', [f'{word} crude', *(['crude oil', 'crude'] if word == 'medium' else [])], f'dead crude of {api} degrees API ({rho15:g} kg/m^3 at 15 degC), a class by density; crudes of one density differ by factors in viscosity', rho15, 'crude', ends, (293.15, 403.15), '165 %', (f'{api} degrees API', f'dead oil, geometric mean of Beggs and Robinson, J. Pet. Technol. 27 (1975) 1140, and Glaso, J. Pet. Technol. 32 (1980) 785, from memory, at 25 and 95 degC: {beggs_robinson(api, 298.15):.3g} and {glaso(api, 298.15):.3g} mPa s at 25 degC'), ['flammable', 'toxic', 'oil'], '1.8 %', others={'thermalConductivity': ('17 %', 'at 403 K API procedure 12A3.1 gives 0.1125 W/(m K)')} if api == 38 else None)

# Silicone oil: all grades thin alike, log10(nu) = log10(nu25) + 763.1/T - 2.559 for grades from 20 mm^2/s on.
for grade, rho25, k in ((20, 950, 0.142), (50, 960, 0.15), (100, 965, 0.155), (350, 970, 0.159), (500, 971, 0.159), (1000, 971, 0.16), (5000, 973, 0.16), (12500, 974, 0.16)):
    T = (253.15, 473.15)
    a = math.log(grade) - 2.559 * math.log(10)
    write({'name': f'silicone oil {grade}', 'aliases': [f'silicone oil {grade} cSt', f'PDMS {grade}', f'polydimethylsiloxane {grade}'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['oil'],
           'about': f'polydimethylsiloxane of {grade} mm^2/s at 25 degC{"; at high shear it thins" if grade >= 1000 else ""}',
           'density': entry('polynomial', T, '1 %', 'data sheets of polydimethylsiloxane, expansion 9.4e-4 to 9.6e-4 1/K, from memory', {'gives': 'kg/m^3', 'argument': 'degC', 'origin': 25, 'terms': [rho25, r(-9.5e-4 * rho25), r(9.5e-4 ** 2 * rho25)]}),
           'viscosity': entry('kinematic-vogel', T, [{'T': ['288.15 K', '308.15 K'], 'value': '8 %'}, {'T': ['273.15 K', '423.15 K'], 'value': '15 %'}, {'value': '30 %'}], 'log10(nu/nu25) = 763.1/T - 2.559, polydimethylsiloxane from 20 mm^2/s on, after Barry, J. Appl. Phys. 17 (1946) 1020, from memory', {'A': r(a, 8), 'B': r(763.1 * math.log(10), 8), 'C': 0, 'gives': 'mm^2/s'}),
           'thermalConductivity': constant(f'{k} W/(m K)', T, '8 %', 'data sheets of polydimethylsiloxane, from memory'),
           'specificHeatCapacity': entry('polynomial', T, '6 %', 'data sheets of polydimethylsiloxane, from memory', {'gives': 'J/(kg K)', 'argument': 'degC', 'terms': [1470, 1.6]}),
           'surfaceTension': {'model': 'polynomial', 'range': {'T': K(*T)}, 'uncertainty': '6 %', 'source': 'polydimethylsiloxane, 21 mN/m at 25 degC, slope of polymer melts, from memory', 'constants': {'gives': 'mN/m', 'argument': 'degC', 'terms': [22.6, -0.06]}}}, BY)

# Thermal oils as classes: polynomials about their middle, from data sheets as CoolProp fits them.
NAMES = solutions.NAMES


def fitted(key, name, aliases, about, T, marks, source, uncertainty, **more):
    e = TABLE[key]
    record = {'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], 'marks': marks, 'about': about}
    for theirs, ours, unit in (*NAMES, ('saturation_pressure', 'vapourPressure', 'Pa')):
        fit = e[theirs]
        if fit['type'] == 'notdefined':
            continue
        c = fit['coeffs']
        if fit['type'] == 'exponential':
            model, constants = 'vogel', {'A': -c[2], 'B': c[0], 'C': -c[1], 'gives': unit}
        elif fit['type'] in ('polynomial', 'exppolynomial'):
            model, constants = 'mixture-polynomial', {'origin': e['Tbase'], 'share': 0, **({'of': 'logarithm'} if fit['type'] == 'exppolynomial' else {}), 'gives': unit, 'rows': trimmed(c)}
        else:
            raise SystemExit(f'{key} {theirs}: {fit["type"]}')
        Tv = (max(T[0], e['TminPsat']) if ours == 'vapourPressure' else T[0], T[1])
        if Tv[0] >= Tv[1]:
            continue
        ranges = {'T': K(*Tv)} if ours == 'vapourPressure' else {'T': K(*Tv), 'p': ['0 Pa', '2 MPa']}
        record[ours] = {'model': model, 'range': ranges, 'uncertainty': uncertainty[ours], 'source': source, 'constants': constants}
    record.update(more)
    write(record, f'{BY} from the coefficients of CoolProp 8.0.0 (incompressible fluids, MIT licence)')


SHEET = 'data sheet of a maker as fitted in CoolProp 8.0.0'
USUAL = {'density': '1 %', 'viscosity': '10 %', 'thermalConductivity': '5 %', 'specificHeatCapacity': '3 %', 'vapourPressure': '10 %'}
fitted('TVP1', 'diphenyl oxide-biphenyl', ['diphenyl-diphenyl oxide', 'biphenyl-diphenyl oxide', 'eutectic thermal oil'], '73.5 % diphenyl oxide and 26.5 % biphenyl by mass, the heat-transfer eutectic', (293.15, 668.15), ['flammable', 'toxic', 'oil'], f'{SHEET} (TVP1)', {'density': [{'T': ['293.15 K', '540 K'], 'value': '1 %'}, {'value': '2.5 %'}], 'viscosity': '10 %', 'thermalConductivity': '5 %', 'specificHeatCapacity': '3 %', 'vapourPressure': [{'T': ['293.15 K', '480 K'], 'value': '36 %'}, {'value': '10 %'}]}, meltingTemperature=melting('285.15 K', 'data sheet of a maker, crystallises at 12 degC'))
fitted('T66', 'hydrogenated terphenyl', ['partially hydrogenated terphenyl', 'terphenyl thermal oil'], 'a class of synthetic thermal oils for use to 345 degC without pressure', (273.15, 648.15), ['flammable', 'oil'], f'{SHEET} (T66)', {**USUAL, 'viscosity': '15 %'})
fitted('DEB', 'diethylbenzene thermal oil', ['alkylated aromatic thermal oil', 'diethylbenzene'], 'a mixture of alkylated aromatics for low temperatures', (193.15, 373.15), ['flammable', 'toxic', 'oil'], 'Melinder, Properties of Secondary Working Fluids for Indirect Systems, IIR (2010); coefficients as fitted by CoolProp 8.0.0 (MIT licence); at 193 K 8.5 mPa s, the sheet of a maker 9.95', {**USUAL, 'viscosity': '15 %'})
fitted('PHE', 'paraffinic thermal oil', ['mineral thermal oil', 'paraffinic mineral heat-transfer oil'], 'a class of mineral thermal oils for use to 315 degC without pressure', (293.15, 588.15), ['oil', 'flammable'], f'{SHEET} (PHE); API procedure 12A3.1 conducts 11 % less at 420 K, Kesler and Lee store 6 % more heat at 464 K', {**USUAL, 'density': '2 %', 'thermalConductivity': '12 %', 'specificHeatCapacity': '7 %', 'viscosity': '20 %', 'vapourPressure': '50 %'})
fitted('S800', 'silicone thermal oil', ['polydimethylsiloxane thermal oil'], 'a class of stabilised polydimethylsiloxane for use to 400 degC under pressure', (233.15, 653.15), ['flammable', 'oil'], f'{SHEET} (S800)', {**USUAL, 'vapourPressure': '20 %'})
fitted('XLT', 'low-temperature silicone oil', ['cold silicone oil', 'polydimethylsiloxane for low temperatures'], 'a class of thin polydimethylsiloxane for cooling to -100 degC', (173.15, 523.15), ['flammable', 'oil'], f'{SHEET} (XLT)', {**USUAL, 'vapourPressure': '20 %'})

# Vegetable oil and biodiesel.
T = (273.15, 453.15)
write({'name': 'vegetable oil', 'aliases': ['rapeseed oil', 'sunflower oil', 'olive oil', 'cooking oil', 'canola oil', 'soybean oil'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['oil', 'hygiene'], 'about': 'a class of unsaturated edible oils',
       'density': entry('polynomial', T, '1.5 %', 'Noureddini, Teoh and Clements, J. Am. Oil Chem. Soc. 69 (1992) 1184, from memory', {'gives': 'kg/m^3', 'argument': 'degC', 'terms': [931, -0.665]}),
       'viscosity': entry('walther', T, '20 %', 'Noureddini, Teoh and Clements, J. Am. Oil Chem. Soc. 69 (1992) 1189, from memory; law of ASTM D341', {'T1': '40 degC', 'nu1': '34.5 mm^2/s', 'T2': '100 degC', 'nu2': '8.1 mm^2/s'}),
       'thermalConductivity': entry('polynomial', T, '8 %', 'Choi and Okos (1986), fat', {'gives': 'W/(m K)', 'argument': 'degC', 'terms': [0.18071, -2.7604e-4, -1.7749e-7]}),
       'specificHeatCapacity': entry('polynomial', T, '6 %', 'Choi and Okos (1986), fat', {'gives': 'J/(kg K)', 'argument': 'degC', 'terms': [1984.2, 1.4733, -4.8008e-3]}),
       'surfaceTension': {'model': 'polynomial', 'range': {'T': ['283.15 K', '403.15 K']}, 'uncertainty': '8 %', 'source': 'edible oils, 33 mN/m at 20 degC, from memory', 'constants': {'gives': 'mN/m', 'argument': 'degC', 'terms': [34.5, -0.075]}}}, BY)
petroleum('biodiesel', ['FAME', 'rapeseed methyl ester', 'fatty acid methyl ester'], 'fatty acid methyl ester of EN 14214', 882, 'diesel', ((40, 4.5), (100, 1.75)), (268.15, 423.15), '20 %', ('EN 14214, 860 to 900 kg/m^3 at 15 degC', 'EN 14214, 3.5 to 5.0 mm^2/s at 40 degC'), ['flammable', 'oil'], extra={'specificHeatCapacity': entry('polynomial', (268.15, 423.15), '11 %', 'middle of Cragoe, NBS Misc. Publ. 97 (1929), 1885 J/(kg K) at 300 K, and methyl oleate of Huber et al., Energy Fuels 23 (2009) 3790, 2245', {'gives': 'J/(kg K)', 'origin': 300, 'terms': [2065, 2.6]})})


# Liquid metals: tables as printed.
def table(rows, T, uncertainty, source, unit, **more):
    return entry('table', T, uncertainty, source, {'gives': unit, 'rows': rows, **more})


def liquid_metal(name, aliases, rows, marks, mp, about=None, others=None):
    """Rows of T, density, heat capacity [kJ/(kg K)], kinematic viscosity [1e-7 m2/s], conductivity of table A.7."""
    source = f'{BERGMAN}, table A.7'
    T = (rows[0][0], rows[-1][0])
    with_k = [row for row in rows if row[4] is not None]
    write(disputed({'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], 'marks': marks, **({'about': about} if about else {}),
           'density': table([[row[0], row[1]] for row in rows], T, '2 %', source, 'kg/m^3'),
           'viscosity': table([[row[0], r(row[3] * 1e-4 * row[1], 4)] for row in rows], T, '10 %', f'{source}, from the kinematic viscosity', 'mPa s', interpolate='logarithm'),
           'thermalConductivity': table([[row[0], row[4]] for row in with_k], (with_k[0][0], with_k[-1][0]), '8 %', source, 'W/(m K)'),
           'specificHeatCapacity': table([[row[0], row[2]] for row in rows], T, '4 %', source, 'kJ/(kg K)'),
           'electricalConductivity': {'model': 'wiedemann-franz', 'range': {'T': K(with_k[0][0], with_k[-1][0]), 'p': ['0 Pa', '5 MPa']}, 'uncertainty': '12 %', 'source': 'law of Wiedemann and Franz from the conductivity', 'constants': {'lorenz': 2.4e-8}},
           'meltingTemperature': melting(f'{mp} K', source)}, others or {}), BY)


liquid_metal('potassium', ['K', 'liquid potassium'], [(422, 807.3, 0.80, 4.608, 45.0), (700, 741.7, 0.75, 2.397, 39.5), (977, 674.4, 0.75, 1.905, 33.1)], ['liquidMetal', 'flammable', 'toxic'], 337, others={
    'viscosity': ('12 %', 'Viswanath and Natarajan (1989) 0.198 mPa s at 708 K, here 0.176'),
    'thermalConductivity': ('17 %', 'at 422 K 45.0 W/(m K) here, 49.9 by Foust (1972), 53.9 by the resistivity; from 600 K on Foust is within 5 %'),
    'specificHeatCapacity': ('5 %', 'McBride, Zehe and Gordon (2002) 782 J/(kg K) at 977 K, here 750'),
    'electricalConductivity': ('20 %', 'at 422 K 4.44e6 S/m here, 5.23e6 by resistivities from memory')})
liquid_metal('sodium-potassium 22-78', ['NaK', 'NaK-78', 'eutectic NaK', 'sodium-potassium eutectic', 'NaK (22 %/78 %)'], [(366, 849.0, 0.946, 5.797, 24.4), (672, 775.3, 0.879, 2.666, 26.7), (1033, 690.4, 0.883, 2.118, None)], ['liquidMetal', 'flammable', 'toxic'], 262, '22 % sodium and 78 % potassium by mass, the eutectic', {'viscosity': ('12 %', 'at 666 K 0.210 mPa s, Foust (1972) 0.237, from memory')})
# The table heads its column 45 % and 55 %; density and heat capacity are those of 55 % sodium (887 kg/m^3 against 880 of the parts, 866 with 45 %), and so is the melting point.
liquid_metal('sodium-potassium 55-45', ['NaK-45', 'NaK-44', 'NaK (45 %/55 %)'], [(366, 887.4, 1.130, 6.522, 25.6), (644, 821.7, 1.055, 2.871, 27.5), (977, 740.1, 1.043, 2.174, 28.9)], ['liquidMetal', 'flammable', 'toxic'], 292, '55 % sodium and 45 % potassium by mass; the source heads its column 45 %/55 %')
# Bismuth: table A.7 lies 27 % higher in conductivity at 589 K and 24 % in heat capacity at 1000 K than the handbook and others.
NEA = 'OECD/NEA, Handbook on Lead-bismuth Eutectic Alloy and Lead Properties (2015)'
T = (544.6, 1033)
write({'name': 'bismuth', 'aliases': ['Bi', 'liquid bismuth'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['liquidMetal'],
       'density': entry('polynomial', T, '1 %', f'{NEA}, Imbeni et al. (1998)', {'gives': 'kg/m^3', 'terms': [10725, -1.22]}),
       'viscosity': entry('vogel', T, '10 %', f'{NEA}, Lucas (1984), 4.456e-4 exp(780/T); Bergman, table A.7, falls faster, 0.79 mPa s at 1033 K against 0.95', {'A': r(math.log(4.456e-4), 8), 'B': 780, 'C': 0, 'gives': 'Pa s'}),
       'thermalConductivity': entry('polynomial', T, '22 %', f'{NEA}, Touloukian (1970); at 589 K 12.9 W/(m K), 10.9 by the resistivity, 16.4 in Bergman, table A.7', {'gives': 'W/(m K)', 'terms': [7.34, 9.5e-3]}),
       'specificHeatCapacity': entry('powers', T, '5 %', f'{NEA}, Imbeni et al. (1998); Bergman, table A.7, rises instead, 164.5 J/(kg K) at 1033 K against 131', {'gives': 'J/(kg K)', 'terms': [[118.2, 0], [5.934e-3, 1], [71.83e5, -2]]}),
       'electricalConductivity': {'model': 'reciprocal-polynomial', 'range': {'T': K(*T)}, 'uncertainty': '5 %', 'source': f'{NEA}, resistivity', 'constants': {'value': 1, 'gives': 'S/m', 'terms': [98.96e-8, 5.54e-10]}},
       'surfaceTension': {'model': 'polynomial', 'range': {'T': K(*T)}, 'uncertainty': '6 %', 'source': NEA, 'constants': {'gives': 'mN/m', 'terms': [420.8, -0.081]}},
       'meltingTemperature': melting('544.6 K', NEA)}, BY)


def molten(name, aliases, mp, rho, visc, k, cp, T, marks=('liquidMetal',), about=None, sigma=None):
    """Reference densities and viscosities of Assael and others: rho = c1 - c2 (T - T0), log10(eta/(1 mPa s)) = -a1 + a2/T."""
    (c1, c2, T0, where, u1), (a1, a2, vwhere, u2) = rho, visc
    write({'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], 'marks': list(marks), **({'about': about} if about else {}),
           'density': entry('polynomial', T, u1, where, {'gives': 'kg/m^3', 'origin': T0, 'terms': [c1, -c2]}),
           'viscosity': entry('vogel', T, u2, vwhere, {'A': r(-a1 * math.log(10), 7), 'B': r(a2 * math.log(10), 7), 'C': 0, 'gives': 'mPa s'}),
           'thermalConductivity': entry('polynomial', T, k[1], k[2], {'gives': 'W/(m K)', 'origin': mp, 'terms': k[0]}),
           'specificHeatCapacity': constant(f'{cp[0]} J/(kg K)', T, cp[1], cp[2]),
           **({'surfaceTension': {'model': 'polynomial', 'range': {'T': K(*T)}, 'uncertainty': sigma[3] if len(sigma) > 3 else '8 %', 'source': sigma[2], 'constants': {'gives': 'mN/m', 'origin': mp, 'terms': [sigma[0], sigma[1]]}}} if sigma else {}),
           'electricalConductivity': {'model': 'wiedemann-franz', 'range': {'T': K(*T), 'p': ['0 Pa', '5 MPa']}, 'uncertainty': '15 %', 'source': 'law of Wiedemann and Franz from the conductivity', 'constants': {'lorenz': 2.44e-8}},
           'meltingTemperature': melting(f'{mp} K', where)}, BY)


A06 = 'Assael et al., J. Phys. Chem. Ref. Data 35 (2006) 285, from memory'
A10 = 'Assael et al., J. Phys. Chem. Ref. Data 39 (2010) 033105, from memory'
A12 = 'Assael et al., J. Phys. Chem. Ref. Data 41 (2012) 033101, from memory'
IG = 'Iida and Guthrie, The Physical Properties of Liquid Metals (1988), from memory'
molten('molten aluminium', ['liquid aluminium', 'liquid aluminum', 'molten aluminum', 'aluminium melt'], 933.47, (2377.23, 0.311, 933.47, A06, '2 %'), (0.7324, 803.49, A06, '15 %'), ([91, 0.04], '12 %', IG), (1180, '5 %', IG), (933.47, 1190), sigma=(1000, -0.2, IG + '; a melt under its oxide 871 mN/m, Keene (1993), a clean one 1050', '15 %'))
molten('molten iron', ['liquid iron', 'iron melt'], 1811, (7034.96, 0.926, 1811, A06, '3 %'), (0.7209, 2694.95, A06, '25 %'), ([36, 0.006], '15 %', IG), (825, '5 %', IG), (1811, 2480), sigma=(1870, -0.45, IG))
molten('molten steel', ['liquid steel', 'steel melt'], 1790, (6980, 0.80, 1811, 'low-alloy steel as iron with 0.5 % carbon, common practice', '3 %'), (0.7209, 2694.95, 'as iron, ' + A06, '30 %'), ([31, 0.006], '20 %', 'casting practice, from memory'), (780, '8 %', 'casting practice, from memory'), (1790, 2000), about='low-alloy steel above its liquidus; grades differ by some 60 K in the liquidus', sigma=(1600, -0.4, 'common practice; sulphur and oxygen lower it'))
molten('molten tin', ['liquid tin', 'tin melt', 'solder bath'], 505.08, (6979, 0.652, 505.08, A10, '1 %'), (0.408, 343.4, A10, '8 %'), ([27, 0.022], '12 %', 'between ' + IG + ', and the resistivity with the law of Wiedemann and Franz'), (245, '6 %', IG), (505.08, 1300), sigma=(550, -0.07, IG))
molten('molten zinc', ['liquid zinc', 'zinc bath', 'zinc melt'], 692.68, (6559, 0.884, 692.68, A12, '1.5 %'), (0.3291, 631.12, A12, '10 %'), ([49.5, 0.03], '15 %', IG), (481, '5 %', IG), (692.68, 1000), sigma=(782, -0.17, IG))
molten('molten copper', ['liquid copper', 'copper melt'], 1357.77, (7997, 0.819, 1357.77, A10, '2 %'), (0.422, 1393.4, A10, '12 %'), ([163, 0.03], '12 %', IG), (495, '5 %', IG), (1357.77, 1950), sigma=(1285, -0.13, IG))

# Molten salts.
SOHAL = 'Sohal, Ebner, Sabharwall and Sharpe, INL/EXT-10-18297 (2010), from memory'
T = (423.15, 773.15)
write({'name': 'nitrate-nitrite salt', 'aliases': ['heat transfer salt', 'ternary nitrate salt', 'HTS', 'nitrite salt'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['moltenSalt'], 'about': '53 % potassium nitrate, 40 % sodium nitrite and 7 % sodium nitrate by mass',
       'density': entry('polynomial', T, '2 %', SOHAL, {'gives': 'kg/m^3', 'argument': 'degC', 'origin': 200, 'terms': [1938, -0.732]}),
       'viscosity': entry('power', T, '20 %', f'{SOHAL}: exp(-4.343 - 2.0143 (ln t - 5.011)), t in degC', {'gives': 'Pa s', 'argument': 'degC', 'value': r(math.exp(-4.343 + 2.0143 * 5.011), 8), 'exponent': -2.0143}),
       'thermalConductivity': constant('0.48 W/(m K)', T, '25 %', f'{SOHAL}; published values run from 0.33 to 0.6 W/(m K)'),
       'specificHeatCapacity': constant('1560 J/(kg K)', T, '5 %', SOHAL), 'meltingTemperature': melting('415 K', SOHAL, '1 %')}, BY)
T = (773.15, 1170)
write({'name': 'FLiNaK', 'aliases': ['lithium sodium potassium fluoride'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['moltenSalt', 'toxic'], 'about': '46.5 % lithium, 11.5 % sodium and 42 % potassium fluoride by mole',
       'density': entry('polynomial', T, '3.5 %', 'Romatoski and Hu, Ann. Nucl. Energy 109 (2017) 635, from memory; at 773 K 2097 kg/m^3, Vriesema (1979) 2165', {'gives': 'kg/m^3', 'terms': [2579.3, -0.6237]}),
       'viscosity': entry('vogel', T, '24 %', 'Romatoski and Hu, Ann. Nucl. Energy 109 (2017) 635, from memory: 4.0e-5 exp(4170/T); at 1170 K 1.41 mPa s, Tobias 1.14', {'A': r(math.log(4e-5), 8), 'B': 4170, 'C': 0, 'gives': 'Pa s'}),
       'thermalConductivity': entry('polynomial', T, '15 %', 'Romatoski and Hu, Ann. Nucl. Energy 109 (2017) 635, from memory', {'gives': 'W/(m K)', 'terms': [0.36, 5.6e-4]}),
       'specificHeatCapacity': constant('1884 J/(kg K)', T, '10 %', 'Romatoski and Hu, Ann. Nucl. Energy 109 (2017) 635, from memory'), 'meltingTemperature': melting('727 K', 'Romatoski and Hu, Ann. Nucl. Energy 109 (2017) 635, from memory')}, BY)

# Liquid food and body fluids: composition after Choi and Okos.
CHOI = 'Choi and Okos, in Food Engineering and Process Applications (1986), polynomials of the ASHRAE Handbook, Refrigeration (2006), chapter 9'
FOODS = 'usual composition, USDA food composition tables, from memory'


# Sugar in solution stores more heat when warm than the polynomials for dry carbohydrate say.
def sweet(T, uncertainty, most='50 %'):
    return {'model': 'mixture-polynomial', 'range': {'T': K(*T), 'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', most]}, 'uncertainty': [{'T': ['300 K', '363.15 K'], 'composition': ['30 %', most], 'value': '11 %'}, {'value': uncertainty}],
            'source': 'Hugot, Handbook of Cane Sugar Engineering, 4187 (1 - x (0.6 - 0.0018 t)), from memory; Choi and Okos (1986) give 10 % less at 363 K and 48 %',
            'constants': {'origin': 273.15, 'share': 0, 'gives': 'J/(kg K)', 'rows': [[4187, -2512.2], [0, 7.5366]]}}


def food(name, aliases, parts, T, viscosity, solids=None, about=None, marks=('hygiene',), spread=('1.5 %', '8 %', '4 %'), typical=None, density=None, others=None, heat=None):
    ranges = {'T': K(*T), 'p': ['0 Pa', '5 MPa'], **({'composition': solids} if solids else {})}
    write(disputed({'name': name, 'aliases': aliases, 'kind': 'fluid', 'phases': ['liquid'], **({'takes': ['composition']} if solids else {}), **({'typical': typical} if typical else {}), 'marks': list(marks), **({'about': about} if about else {}),
           'density': density or {'model': 'food-density', 'range': ranges, 'uncertainty': spread[0], 'source': f'{CHOI}; {FOODS}', 'constants': parts},
           **({'viscosity': {**viscosity, 'range': {**ranges, **viscosity.get('range', {})}}} if viscosity else {}),
           'thermalConductivity': {'model': 'food-conductivity', 'range': ranges, 'uncertainty': spread[1], 'source': f'{CHOI}; {FOODS}', 'constants': parts},
           'specificHeatCapacity': heat or {'model': 'food-heat-capacity', 'range': ranges, 'uncertainty': spread[2], 'source': f'{CHOI}; {FOODS}', 'constants': parts}}, others or {}), BY)


def seen(rows, uncertainty, source):
    return {'model': 'table', 'uncertainty': uncertainty, 'source': source, 'constants': {'gives': 'mPa s', 'argument': 'degC', 'interpolate': 'logarithm', 'rows': rows}}


DAIRY = 'Kessler, Food and Bio Process Engineering: Dairy Technology (2002), from memory'
food('milk', ['whole milk', 'cow milk'], {'water': 0.876, 'protein': 0.033, 'fat': 0.036, 'carbohydrate': 0.048, 'ash': 0.007}, (275.15, 363.15), seen([[5, 3.25], [20, 2.0], [40, 1.2], [60, 0.80], [80, 0.60], [90, 0.53]], '15 %', DAIRY), about='whole cow milk of 3.6 % fat, homogenised')
food('skim milk', ['skimmed milk'], {'water': 0.908, 'protein': 0.034, 'fat': 0.001, 'carbohydrate': 0.049, 'ash': 0.008}, (275.15, 363.15), seen([[5, 2.6], [20, 1.7], [40, 1.04], [60, 0.71], [80, 0.54], [90, 0.48]], '15 %', DAIRY), about='cow milk of at most 0.1 % fat')
food('cream', ['whipping cream'], {'water': 0.635, 'protein': 0.024, 'fat': 0.30, 'carbohydrate': 0.036, 'ash': 0.005}, (278.15, 353.15), seen([[5, 24], [20, 11], [40, 5.3], [60, 3.2], [80, 2.2]], '40 %', DAIRY), about='cream of 30 % fat, nearly Newtonian above 40 degC')
sucrose = [float(ROWS['57-50-1'][f'v{i}']) for i in range(1, 7)]
juice = {'model': 'aqueous-viscosity', 'range': {'T': ['278.15 K', '338.15 K']}, 'uncertainty': '25 %', 'source': f'sucrose solution of the same share, {LALIBERTE}; clear juices follow it', 'constants': {'terms': sucrose}}
food('fruit juice', ['juice', 'apple juice', 'orange juice', 'grape juice'], {'carbohydrate': 0.96, 'protein': 0.015, 'ash': 0.025}, (275.15, 363.15), juice, ['0 %', '50 %'], 'clear juice; the composition is the share of soluble solids by mass (degrees Brix); cloudy juice and concentrate are thicker and thin with shear', typical='11.5 %', heat=sweet((275.15, 363.15), '6 %'), others={'thermalConductivity': ('10 %', 'at 363 K and 48 % 0.537 W/(m K), Riedel 0.490')})
density = [float(ROWS['57-50-1'][f'c{i}']) for i in range(5)]
share = {'p': ['0 Pa', '5 MPa'], 'composition': ['0 %', '75 %']}
thin = {**share, 'composition': ['0 %', '50 %']}
write({'name': 'sucrose solution', 'aliases': ['sugar solution', 'sugar water', 'sucrose-water', 'syrup'], 'kind': 'fluid', 'phases': ['liquid'], 'takes': ['composition'], 'marks': ['hygiene'], 'about': 'the composition is the share of sucrose by mass (degrees Brix); above 67 % at 20 degC it is supersaturated and may crystallize',
       'density': [{'model': 'aqueous-density', 'range': {'T': ['288.15 K', '328.15 K'], **thin}, 'uncertainty': '0.2 %', 'source': f'{LALIBERTE}, sucrose', 'checks': [{'at': {'T': '20 degC', 'composition': 0.4}, 'expect': '1176.4 kg/m^3', 'within': '0.2 %', 'source': 'ICUMSA tables of sucrose density, from memory'}], 'constants': {'terms': density}}, syrup.DENSITY],
       'viscosity': [{'model': 'aqueous-viscosity', 'range': {'T': ['288.15 K', '328.15 K'], **thin}, 'uncertainty': '6 %', 'source': f'{LALIBERTE}, sucrose', 'checks': [{'at': {'T': '20 degC', 'composition': 0.4}, 'expect': '6.167 mPa s', 'within': '6 %', 'source': 'NBS Circular 440 (1942), from memory'}, {'at': {'T': '20 degC', 'composition': 0.2}, 'expect': '1.945 mPa s', 'within': '6 %', 'source': 'NBS Circular 440 (1942), from memory'}], 'constants': {'terms': sucrose}}, syrup.VISCOSITY],
       'thermalConductivity': {'model': 'food-conductivity', 'range': {'T': ['273.15 K', '363.15 K'], **share}, 'uncertainty': '10 %', 'source': f'{CHOI}; at 363 K and 48 % 0.536 W/(m K), Riedel 0.490', 'constants': {'carbohydrate': 1}},
       'specificHeatCapacity': sweet((273.15, 363.15), '5 %', '75 %'),
       'vapourPressure': solutions.ideal_vapour(342.297, 1, 0.5, '4 %', 'boiling points at 1 atm of the sugar tables, from memory, lie within 1 K; stronger syrups boil higher than the law says')}, BY)
food('beer', [], {'water': 0.915, 'protein': 0.005, 'carbohydrate': 0.078, 'ash': 0.002}, (273.15, 343.15), seen([[0, 2.9], [20, 1.55], [40, 1.0], [60, 0.7]], '12 %', 'brewing handbooks, from memory'), about='lager of 5 % alcohol by volume, degassed; the alcohol is counted as carbohydrate', density={'model': 'constant', 'range': {'T': K(273.15, 313.15), 'p': ['0 Pa', '5 MPa']}, 'uncertainty': '1 %', 'source': 'lager at 20 degC, brewing handbooks, from memory', 'constants': {'value': '1008 kg/m^3'}})
T = (303.15, 315.15)
write({'name': 'blood plasma', 'aliases': ['plasma', 'human plasma'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['medical'], 'about': 'human plasma near body temperature',
       'density': constant('1025 kg/m^3', T, '1 %', 'Kenner, Basic Res. Cardiol. 84 (1989) 111, from memory', p='1 MPa'), 'viscosity': constant('1.24 mPa s', T, '12 %', 'Kesmarky, Kenyeres, Rabai and Toth, Clin. Hemorheol. Microcirc. 39 (2008) 243, 1.10 to 1.35 mPa s at 37 degC, from memory', p='1 MPa'),
       'thermalConductivity': constant('0.58 W/(m K)', T, '6 %', 'Duck, Physical Properties of Tissue (1990), from memory', p='1 MPa'), 'specificHeatCapacity': constant('3930 J/(kg K)', T, '4 %', 'Duck, Physical Properties of Tissue (1990), from memory', p='1 MPa')}, BY)

# Liquefied natural gas: density and heat capacity of the mixture by GERG-2008, transport from that of boiling methane.
import CoolProp
from CoolProp.CoolProp import PropsSI

lng = CoolProp.AbstractState('HEOS', 'Methane&Ethane&Propane&Nitrogen')
lng.set_mole_fractions([0.92, 0.06, 0.015, 0.005])
lng.specify_phase(CoolProp.iphase_liquid)
temperatures = [105, 110, 115, 120, 125, 130]
rows = {'density': [], 'cp': [], 'mu': [], 'k': []}
for t in temperatures:
    lng.update(CoolProp.PT_INPUTS, 1e6, t)
    rows['density'].append([t, r(lng.rhomass())])
    rows['cp'].append([t, r(lng.cpmass(), 4)])
    rows['mu'].append([t, r(1.10 * 1e6 * PropsSI('V', 'T', t, 'Q', 0, 'Methane'), 4)])
    rows['k'].append([t, r(0.97 * PropsSI('L', 'T', t, 'Q', 0, 'Methane'), 4)])
T = (105, 130)
GERG = 'Kunz and Wagner, J. Chem. Eng. Data 57 (2012) 3032 (GERG-2008), evaluated by CoolProp 8.0.0 at 10 bar'
METHANE = 'boiling methane, Quinones-Cisneros et al. 2011 and Friend et al. 1989 as in CoolProp 8.0.0'
write({'name': 'LNG', 'aliases': ['liquefied natural gas', 'liquid natural gas'], 'kind': 'fluid', 'phases': ['liquid'], 'marks': ['flammable', 'cryogen', 'inert'], 'about': '92 % methane, 6 % ethane, 1.5 % propane and 0.5 % nitrogen by mole; it boils near 113 K at 1 atm, so that pressure is needed above',
       'density': table(rows['density'], T, '2 %', GERG, 'kg/m^3'), 'specificHeatCapacity': table(rows['cp'], T, '3 %', GERG, 'J/(kg K)'),
       'viscosity': table(rows['mu'], T, '12 %', f'1.10 times {METHANE}; the heavier parts thicken it by 5 % to 15 %', 'uPa s', interpolate='logarithm'), 'thermalConductivity': table(rows['k'], T, '8 %', f'0.97 times {METHANE}', 'W/(m K)'),
       'vapourPressure': {'model': 'vogel', 'range': {'T': ['100 K', '140 K']}, 'uncertainty': '25 %', 'source': 'boiling methane with 0.5 % nitrogen, Raoult; nitrogen moves it by 10 % to 30 %', 'constants': {'A': r(math.log(1.12) + math.log(101325) + 988.5 / 111.67, 8), 'B': -988.5, 'C': 0, 'gives': 'Pa'}}}, BY)
