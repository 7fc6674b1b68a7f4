"""Records with a Helmholtz equation of state, its saturation line and reference transport correlations, from CoolProp."""
import json
import re

import chemicals
import CoolProp.CoolProp as CP

import handbook
import liquids
import transport
from citations import CARRIED, citation
from emit import number
from equation import ideal, melting, residual, start_values

# Relative uncertainties, 95 %, by grade: as the authors of such equations state them, rounded up; from memory where the paper was not at hand.
GRADES = {
    'reference': dict(density=(0.15, 0.2), cp=(1.5, 1.5), sound=(1, 1), pressure=0.3, expansion=4, heat=1.5),
    'short': dict(density=(0.4, 0.5), cp=(2.5, 2.5), sound=(2, 2), pressure=0.6, expansion=6, heat=2.5),
    'blend': dict(density=(0.3, 0.5), cp=(2, 2), sound=(1.5, 2), pressure=0.8, expansion=6, heat=3),
}
NOTE = 'uncertainties after the statements of the authors of the equation, rounded up, from memory'


def K(value):
    return f'{number(value)} K'


def Pa(value):
    return f'{number(value)} Pa'


def percent(value):
    return f'{number(float(value))} %'


def formula_of(info):
    """Formula as chemists write it; CoolProp's has braces and puts hydrogen before nitrogen and so on."""
    parts = re.findall(r'([A-Z][a-z]?)_\{(\d+)\}', info.get('FORMULA', ''))
    if any(e == 'C' for e, _ in parts):
        parts.sort(key=lambda part: (part[0] != 'C', part[0] != 'H', part[0]))
    text = ''.join(f'{e}{"" if n == "1" else n}' for e, n in parts)
    return {'H3N': 'NH3', 'H2S': 'H2S', 'O2S': 'SO2', 'F6S': 'SF6', 'CO': 'CO', 'ClH': 'HCl'}.get(text, text)


def checks(cas, name, M, lowest, Tc):
    """Density of the saturated liquid from a handbook, at two temperatures."""
    found = next(((work, one) for work, one in ((w, handbook.law('density', 'liquid', w, cas, M)) for w in ('perry', 'vdi')) if one is not None), None)
    if found is None:
        return {}
    work, one = found
    out = []
    for share in (0.55, 0.7):
        T = round(share * Tc, 2)
        if T < max(lowest, one[3] or 0) + 1:
            continue
        p = CP.PropsSI('P', 'T', T, 'Q', 0, name)
        out.append({'property': 'density', 'at': {'T': K(T), 'p': Pa(float(f'{1.001 * p + 1:.6g}'))}, 'expect': f'{number(float(f"{one[2](T):.5g}"))} kg/m^3', 'within': '2 %', 'source': handbook.source('density', 'liquid', work)})
    return {'checks': out} if out else {}


def helmholtz_record(fluid):
    name = fluid['from']
    data = json.loads(CP.get_fluid_param_string(name, 'JSON'))[0]
    eos, info, anc = data['EOS'][0], data['INFO'], data['ANCILLARIES']
    M, R = eos['molar_mass'], eos['gas_constant']
    reducing = eos['STATES']['reducing']
    critical = data['STATES']['critical']
    Tr, rhor = reducing['T'], reducing['rhomolar'] * M
    Tc, pc, rhoc = critical['T'], critical['p'], critical['rhomolar'] * M
    pseudo = eos.get('pseudo_pure', False)
    lowest = max(eos['Ttriple'], anc['rhoL']['Tmin'])
    if 'minTemperature' in fluid:
        lowest = float(fluid['minTemperature'].split()[0])
    highest = min(float(fluid.get('maxTemperature', '9999 K').split()[0]), eos['T_max'])
    p_high = min(eos['p_max'], 1e8, float(fluid.get('maxPressure', '1000 MPa').split()[0]) * 1e6)
    grade = GRADES[fluid['grade']]
    own = fluid.get('uncertainty', {})
    # The lines end where CoolProp's own critical point of the equation stands.
    end = min(Tc, Tr) if not pseudo else anc['pL']['T_r']
    p_low = Pa(CP.PropsSI('P', 'T', lowest, 'Q', 1, name))
    line = anc.get('melting_line') if fluid.get('meltingLine', True) is True else None
    pieces = melting(fluid, line, lowest, highest) if line else None
    if pieces:
        ranges = {'T': [K(lowest), K(highest)], 'p': ['0 Pa', Pa(p_high)]}
    elif fluid.get('meltingLine', True) and p_high > 1e7 and fluid['name'] != 'heavy water':
        # Without a melting line the range keeps clear of it: 0.4 K/MPa, steeper than any of these liquids.
        clear = lowest + 0.4e-6 * p_high
        ranges = [{'T': [K(lowest), K(highest)], 'p': ['0 Pa', '10 MPa']}, {'T': [K(clear), K(highest)], 'p': ['0 Pa', Pa(p_high)]}]
        if clear >= highest:
            ranges = {'T': [K(lowest), K(highest)], 'p': ['0 Pa', '10 MPa']}
    else:
        ranges = {'T': [K(lowest), K(highest)], 'p': ['0 Pa', Pa(p_high)]}
    # The densest state: along the highest pressure, where the density ends at melting.
    corner = CP.PropsSI('Dmass', 'T', lowest, 'Q', 0, name)
    for i in range(25):
        try:
            corner = max(corner, CP.PropsSI('Dmass', 'T', lowest + (highest - lowest) * (i / 24) ** 2, 'P', p_high, name))
        except ValueError:
            pass
    source = f"{citation(eos['BibTeX_EOS'])}; {CARRIED}"
    near = {'T': [K(0.94 * Tc), K(1.2 * Tc)], 'p': [Pa(0.65 * pc), Pa(2.5 * pc)]}

    def bands(key, pair, close):
        if key in own:
            pair = (float(own[key].split()[0]),) * 2
        liquid, vapour = pair
        if key == 'specificHeatCapacity' and 'liquidHeat' in own:
            liquid = float(own['liquidHeat'].split()[0])
        return [{**near, 'value': percent(close)}, {'phase': 'liquid', 'value': percent(liquid)}, {'value': percent(vapour)}] if liquid != vapour else [{**near, 'value': percent(close)}, {'value': percent(vapour)}]

    formula = fluid.get('formula') or formula_of(info) or chemicals.search_chemical(info['CAS']).formula
    aliases = list(fluid.get('aliases', []))
    aliases += [a.replace('R-', 'R') for a in [fluid['name'], *aliases] if a.startswith('R-')]
    if info['CAS'].count('-') == 2 and info['CAS'][0].isdigit():
        aliases.append(info['CAS'])
    record = {'name': fluid['name']}
    if formula != 'none':
        record['formula'] = formula
    if aliases:
        record['aliases'] = list(dict.fromkeys(aliases))
    if 'phaseNames' in fluid:
        record['phaseNames'] = fluid['phaseNames']
    record['kind'] = 'fluid'
    if fluid.get('marks'):
        record['marks'] = fluid['marks']
    record['molarMass'] = f'{number(M * 1000)} g/mol'
    if 'flammable' in fluid.get('marks', []):
        record.update(liquids.flash(info['CAS']))
    record['critical'] = {'temperature': K(Tc), 'pressure': Pa(pc), 'density': f'{number(rhoc)} kg/m^3'}
    if not pseudo and fluid['name'] != 'helium' and 'minTemperature' not in fluid:
        record['triplePoint'] = {'temperature': K(eos['Ttriple']), 'pressure': p_low}
    if 'about' in fluid:
        record['about'] = fluid['about']
    saturation = {'from': lowest, 'to': end, **start_values(name, anc, M, lowest, end, pseudo)}
    record['thermodynamics'] = {
        'model': 'helmholtz', 'range': ranges,
        'uncertainty': {
            'density': bands('density', grade['density'], 3), 'specificHeatCapacity': bands('specificHeatCapacity', grade['cp'], 12), 'thermalExpansion': bands('thermalExpansion', (grade['expansion'],) * 2, 15),
            'speedOfSound': bands('speedOfSound', grade['sound'], 5), 'enthalpy': [{'value': percent(grade['cp'][0])}], 'isentropicExponent': [{**near, 'value': '10 %'}, {'value': percent(2 * grade['sound'][0] + grade['density'][0])}],
        },
        'source': source, **checks(info['CAS'], name, M, lowest, Tc), 'notes': '; '.join([NOTE, *([fluid['notes']] if 'notes' in fluid else [])]),
        'constants': {'temperature': K(Tr), 'density': rhor, 'gasConstant': R / M, 'densest': float(f'{1.3 * corner:.3g}'), 'ideal': ideal(eos['alpha0'], Tr), 'residual': residual(eos['alphar']), 'saturation': saturation},
    }
    record.update(transport.entries(fluid, data, dict(M=M, Tc=Tc, pc=pc, Tr=Tr, rhor=rhor, pr=reducing['p'], R=R, ranges=ranges, near=near, low=lowest, high=highest, own=own, name=name)))
    pressure = own.get('vapourPressure', percent(grade['pressure']))
    equal = 'bubble line' if pseudo else 'equal Gibbs energy of both phases'
    # At the lowest temperatures the vapour pressure of heavy liquids is fractions of a pascal and known to per cents only.
    steps = [{'T': [K(lowest), K(0.5 * Tc)], 'value': percent(max(2, 5 * grade['pressure']))}, {'value': pressure}] if lowest < 0.45 * Tc else pressure
    record['vapourPressure'] = {'model': 'saturation-pressure', 'range': {'T': [K(lowest), K(end)]}, 'uncertainty': steps, 'source': f'{source}; {equal}'}
    record['saturationTemperature'] = {'model': 'saturation-temperature', 'range': {'p': [p_low, Pa(pc if not pseudo else anc['pL']['reducing_value'])]}, 'uncertainty': '0.2 %', 'source': f'{source}; {equal}'}
    if fluid['name'] != 'R-407C':
        record['latentHeat'] = {'model': 'latent-heat', 'range': {'T': [K(lowest), K(0.985 * end)]}, 'uncertainty': [{'T': [K(0.95 * end), K(end)], 'value': percent(2.5 * grade['heat'])}, {'value': percent(grade['heat'])}], 'source': f'{source}; enthalpy difference of the saturated phases'}
    tension = anc.get('surface_tension')
    if tension is not None:
        rows = [[a, n] for a, n in zip(tension['a'], tension['n'])]
        record['surfaceTension'] = {'model': 'critical-powers', 'range': {'T': [K(lowest), K(min(end, tension['Tc']))]}, 'uncertainty': [{'T': [K(lowest), K(0.9 * Tc)], 'value': own.get('surfaceTension', '5 %')}, {'value': '15 %'}], 'source': f"{citation(tension['BibTeX'])}; {CARRIED}", 'constants': {'critical': K(tension['Tc']), 'gives': 'N/m', 'terms': rows}}
    elif info['CAS'] != 'None':
        found = transport.handbook_tension(info['CAS'], lowest, end)
        if found is not None:
            record['surfaceTension'] = found
    if fluid['name'] != 'helium' and 'minTemperature' not in fluid and not pseudo:
        if pieces:
            record['meltingTemperature'] = {'model': 'melting-line', 'range': {'p': [p_low, Pa(p_high)]}, 'uncertainty': '0.5 %', 'source': f"{citation(line['BibTeX'])}; {CARRIED}", 'constants': {'pieces': pieces}}
        else:
            record['meltingTemperature'] = {'model': 'constant', 'range': {'p': [p_low, '10 MPa']}, 'uncertainty': '0.5 %', 'source': f'triple point of {source}; the rise under pressure is not covered', 'constants': {'value': K(eos['Ttriple'])}}
    return record
