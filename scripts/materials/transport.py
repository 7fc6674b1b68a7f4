"""Viscosity and conductivity of a fluid with an equation of state: the reference correlation where there is one, else handbook ones."""
import CoolProp.CoolProp as CP

import handbook
from citations import CARRIED, citation
from emit import number
from hard_coded import CONDUCTIVITY, DENSE, DILUTE, VISCOSITY

def K(value):
    return f'{number(value)} K'


def rows(*columns):
    return [list(row) for row in zip(*columns)]


def dilute(v, f):
    d = v['dilute']
    kind = d.get('type', d.get('hardcoded'))
    if 'hardcoded' in d:
        return DILUTE[kind]
    if kind == 'collision_integral':
        return {'form': 'collision-integral', 'factor': d['C'], 'molarMass': d['molar_mass'], 'epsilon': v['epsilon_over_k'], 'sigma': v['sigma_eta'] * 1e9, 'terms': rows(d['a'], d['t'])}
    if kind == 'kinetic_theory':
        return {'form': 'kinetic-theory', 'molarMass': f['M'], 'epsilon': v['epsilon_over_k'], 'sigma': v['sigma_eta'] * 1e9}
    if kind in ('powers_of_T', 'powers_of_Tr'):
        return {'form': 'powers', 'temperature': d.get('T_reducing', 1), 'terms': rows(d['a'], d['t'])}
    if kind == 'collision_integral_powers_of_Tstar':
        return {'form': 'reciprocal-powers', 'factor': d['C'], 'temperature': d['T_reducing'], 'terms': rows(d['a'], d['t'])}
    raise ValueError(kind)


def initial(v, f):
    one = v['initial_density']
    if one['type'] == 'Rainwater-Friend':
        return {'form': 'rainwater-friend', 'molarMass': f['M'], 'epsilon': v['epsilon_over_k'], 'sigma': v['sigma_eta'] * 1e9, 'terms': rows(one['b'], one['t'])}
    return {'form': 'powers', 'temperature': one['T_reducing'], 'density': one['rhomolar_reducing'] * f['M'], 'terms': rows(one['n'], one['d'], one['t'])}


def dense(v, f):
    one = v['higher_order']
    if 'hardcoded' in one:
        return DENSE[one['hardcoded']]
    if one['type'] == 'modified_Batschinski_Hildebrand':
        out = {'form': 'batschinski-hildebrand', 'temperature': one['T_reduce'], 'density': one['rhomolar_reduce'] * f['M'], 'terms': [r for r in rows(one['a'], one['d1'], one['t1'], one['gamma'], one['l']) if r[0] != 0]}
        free = [r for r in rows(one['f'], one['d2'], one['t2']) if r[0] != 0]
        if free:
            out.update({'free': free, 'closest': rows(one['g'], one['h'])})
            if one['p'] != [1] or one['q'] != [0]:
                out['closestUnder'] = rows(one['p'], one['q'])
        return out
    if one['type'] == 'friction_theory':
        names = {'Ai': ('ideal', 1), 'Aa': ('attractive', 'Na'), 'Ar': ('repulsive', 'Nr'), 'Aii': ('idealSquare', 'Nii'), 'Aaa': ('attractiveSquare', 'Naa'), 'Arr': ('repulsiveSquare', 'Nrr'), 'Adrdr': ('excessSquare', 'Nrr'), 'Aaaa': ('attractiveCube', 'Naaa'), 'Arrr': ('repulsiveCube', 'Nrrr')}
        out = {'form': 'friction-theory', 'temperature': one['T_reduce'], 'offsets': [one['c1'], one['c2']]}
        for key, (word, power) in names.items():
            if key in one:
                out[word] = [*one[key], one[power] if isinstance(power, str) else power]
        return out
    raise ValueError(one['type'])


HANDBOOK = ('polynomial', 'log-powers', 'gas-powers', 'liquid-viscosity')
REFERENCES = {'Propane': ('propane', 'n-Propane'), 'R134a': ('r-134a', 'R134a')}


def shape(one, v, f):
    """Constants of the method of corresponding states: the reference, both critical points, the density factor, the dilute gas."""
    record, name = REFERENCES[one['reference_fluid']]
    M0 = CP.PropsSI('M', name)
    psi = one['psi']
    return {'reference': record, 'molarMass': f['M'], 'critical': [f['Tc'], f['rhor']], 'referenceCritical': [CP.PropsSI('Tcrit', name), CP.PropsSI('rhocrit', name)], 'referenceMolarMass': M0, 'density': psi['rhomolar_reducing'] * f['M'], 'factor': [r for r in rows(psi['a'], psi['t']) if r[0] != 0], 'dilute': {'form': 'kinetic-theory', 'molarMass': f['M'], 'epsilon': v['epsilon_over_k'], 'sigma': v['sigma_eta'] * 1e9}}


def viscosity(fluid, data, f):
    given = data.get('TRANSPORT', {}).get('viscosity')
    v = given[fluid.get('viscosityModel', 0)] if isinstance(given, list) else given
    if v is None or v.get('type') == 'Chung':
        return None
    if v.get('type') == 'ECS':
        return {'model': 'corresponding-viscosity', 'source': f"{citation(v['BibTeX'])}; {CARRIED}", 'constants': shape(v, v, f)}
    source = f"{citation(v['BibTeX'])}; {CARRIED}"
    if 'hardcoded' in v:
        model, constants = VISCOSITY[v['hardcoded']]
        return {'model': model, 'source': citation(v['BibTeX']), 'constants': constants}
    if v.get('type') == 'rhosr-CS':
        # The factor was fitted to liquids with the molecule's size by Chung's rule; for the gas its own measured size is better by up to 10 %.
        second = next((one for one in given if 'epsilon_over_k' in one), None)
        by_rule = {'form': 'kinetic-theory', 'molarMass': f['M'], 'epsilon': f['Tr'] / 1.2593, 'sigma': 0.809 / (f['rhor'] / f['M'] / 1000) ** (1 / 3)}
        measured = by_rule if second is None else {**by_rule, 'epsilon': second['epsilon_over_k'], 'sigma': second['sigma_eta'] * 1e9}
        rest = {'scale': v['rhosr_critical'], 'factor': v['C'], 'vapour': v['c_vap'], 'liquid': v['c_liq'], 'crossover': v['x_crossover']}
        return {'model': 'entropy-scaling', 'source': source, 'constants': {'dilute': by_rule, **rest}, 'gas': {'dilute': measured, **rest}}
    constants = {'dilute': dilute(v, f)}
    if 'initial_density' in v:
        constants['initial'] = initial(v, f)
    if 'higher_order' in v:
        constants['dense'] = dense(v, f)
    return {'model': 'viscosity-of-density', 'source': source, 'constants': constants}


def conductivity(fluid, data, f):
    c = data.get('TRANSPORT', {}).get('conductivity')
    if c is None:
        return None
    if c.get('type') == 'ECS':
        given = data['TRANSPORT']['viscosity']
        v = next((one for one in (given if isinstance(given, list) else [given]) if 'epsilon_over_k' in one), None)
        if v is None:
            return None
        inner = c['f_int']
        extra = {'inner': [[a / inner['T_reducing'] ** t, t] for a, t in zip(inner['a'], inner['t'])], 'enhancement': [0.194, 0.0496, 1e9 / c.get('q_D', 2e9), 1.5 * f['Tr'], f['pr'], f['rhor'], 1.03, 1.239]}
        return {'model': 'corresponding-conductivity', 'source': f"{citation(c['BibTeX'])}; {CARRIED}", 'constants': {**shape(c, v, f), **extra}}
    if 'hardcoded' in c:
        if c['hardcoded'] not in CONDUCTIVITY:
            return None
        model, constants = CONDUCTIVITY[c['hardcoded']]
        if c['hardcoded'] == 'Methane':
            line = data['ANCILLARIES']['rhoV']
            assert line['using_tau_r']
            constants = {**constants, 'vapour': {'temperature': line['T_r'], 'density': line['reducing_value'] * f['M'], 'terms': rows(line['n'], line['t'])}}
        return {'model': model, 'source': citation(c['BibTeX']), 'constants': constants}
    d, r, k = c['dilute'], c['residual'], c.get('critical', {})
    if d.get('hardcoded') == 'Ethane':
        thin = {'form': 'eucken', 'factor': 0.276505e-3, 'temperature': 245, 'terms': [[1.7104147, 0], [-0.6936482, -1]], 'viscosity': DILUTE['Ethane']}
    else:
        thin = {'form': 'ratio', 'temperature': d['T_reducing'], 'over': rows(d['A'], d['n'])}
        if d['B'] != [1.0] or d['m'] != [0]:
            thin['under'] = rows(d['B'], d['m'])
    constants = {'dilute': thin, 'dense': {'temperature': r['T_reducing'], 'density': r['rhomass_reducing'], 'terms': rows(r['B'], r['d'], r['t'])}}
    if k.get('type') == 'simplified_Olchowy_Sengers':
        constants['critical'] = [k.get('zeta0', 1.94e-10) * 1e9, k.get('GAMMA', 0.0496), 1e9 / k.get('qD', 2e9), k.get('T_ref', 1.5 * f['Tr']), f['pr'], f['rhor'], k.get('R0', 1.03), k.get('gamma', 1.239)]
    elif k.get('hardcoded') == 'Ammonia':
        constants['criticalOf'] = 'ammonia'
    elif k.get('hardcoded') not in (None, 'None'):
        return None
    return {'model': 'conductivity-of-density', 'source': f"{citation(c['BibTeX'])}; {CARRIED}", 'constants': constants}


def bands(f, key, gas, liquid, close):
    own = f['own']
    word = 'Viscosity' if key == 'viscosity' else 'Conductivity'
    gas = own.get(key, gas)
    liquid = own.get(f'liquid{word}', own.get(key, liquid))
    close = max(close, gas, liquid, key=lambda text: float(text.split()[0]))
    near = {'T': [K(0.97 * f['Tc']), K(1.12 * f['Tc'])], 'p': [f"{number(0.7 * f['pc'])} Pa", f"{number(2 * f['pc'])} Pa"]}
    return [{**near, 'value': close}, {'phase': 'liquid', 'value': liquid}, {'value': gas}]


def from_temperature(ranges, low):
    """The ranges from a temperature on."""
    out = []
    for box in ranges if isinstance(ranges, list) else [ranges]:
        out.append({**box, 'T': [K(max(low, float(box['T'][0].split()[0]))), box['T'][1]]})
    return out if isinstance(ranges, list) else out[0]


def entries(fluid, data, f):
    """Entries viscosity and thermalConductivity, as many as there is knowledge for."""
    cas = data['INFO']['CAS']
    out = {}
    for key, make, values in (('viscosity', viscosity, ('3 %', '5 %', '10 %')), ('thermalConductivity', conductivity, ('4 %', '5 %', '20 %'))):
        found = None if key in fluid.get('handbook', []) else make(fluid, data, f)
        if found is None:
            pairs = handbook.transport(key, cas, f)
            if pairs:
                out[key] = pairs
            continue
        gas, liquid, close = values
        ranges = f['ranges']
        if found['model'] in ('entropy-scaling', 'corresponding-viscosity', 'corresponding-conductivity'):
            gas, liquid = '12 %', '12 %'
            ranges = from_temperature(ranges, 0.5 * f['Tc'])
        lowest = fluid.get('transportFrom', {}).get(key)
        if lowest is not None:
            ranges = from_temperature(ranges, float(lowest.split()[0]))
        if found['model'] == 'methane-conductivity':
            ranges = {'T': [K(f['low']), K(f['high'])], 'p': ['0 Pa', '70 MPa']}
        if found['model'] in ('methane-conductivity', 'helium-conductivity', 'heavy-water-conductivity') or (key == 'thermalConductivity' and fluid['name'] == 'ammonia'):
            close = '25 %'
        if key == 'thermalConductivity' and isinstance(out.get('viscosity'), list) and out['viscosity'][0]['model'] in HANDBOOK:
            # The enhancement asks for a viscosity that the handbook's correlations do not have near the critical point.
            wide = {'T': [K(0.9 * f['Tc']), K(1.35 * f['Tc'])], 'p': [f"{number(0.5 * f['pc'])} Pa", f"{number(8 * f['pc'])} Pa"], 'value': '30 %'}
        else:
            wide = None
        one = {'model': found['model'], 'range': ranges, 'uncertainty': [*([wide] if wide else []), *bands(f, key, gas, liquid, close)], 'source': found['source'], 'constants': found['constants']}
        out[key] = one if 'gas' not in found else [{**one, 'phase': 'liquid'}, {**one, 'phase': 'vapour', 'constants': found['gas']}]
    return out


handbook_tension = handbook.tension
