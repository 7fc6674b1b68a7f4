"""Records of fluids without an equation of state: liquids near saturation, gases at low pressure; and what handbooks say of danger."""
import math

import chemicals

from emit import number
from handbook import BERGMAN, CARRIED, R, entry, row


def crc_check(cas, M):
    """The heat capacity of the liquid at 25 degC from a third work."""
    data = chemicals.heat_capacity.CRC_standard_data
    value = float(data.at[cas, 'Cpl']) if cas in data.index else math.nan
    if not value > 0:
        return {}
    return {'checks': [{'at': {'T': '298.15 K', 'p': '101325 Pa'}, 'expect': f"{number(float(f'{value / M:.5g}'))} J/(kg K)", 'within': '3 %', 'source': f'CRC Handbook of Chemistry and Physics, 95th ed., standard thermodynamic properties; {CARRIED}'}]}


def flash(cas):
    """Flash point, closed cup, of what is a liquid at ambient pressure; liquefied gases always give off enough vapour."""
    value = chemicals.T_flash(cas)
    return {'flashPoint': f'{number(round(value, 2))} K'} if value is not None and chemicals.Tb(cas) > 273 else {}


def liquid_record(fluid):
    """A liquid without an equation of state: correlations near saturation."""
    cas = fluid['cas']
    M = chemicals.MW(cas) / 1000
    Tc = chemicals.Tc(cas)
    melts = float(fluid['minTemperature'].split()[0]) if 'minTemperature' in fluid else chemicals.Tm(cas)
    record = {'name': fluid['name'], 'formula': fluid['formula'], 'aliases': [*fluid.get('aliases', []), *[a.replace('R-', 'R') for a in fluid.get('aliases', []) if a.startswith('R-')], cas], 'kind': 'fluid', 'phases': ['liquid']}
    if fluid.get('marks'):
        record['marks'] = fluid['marks']
    record['molarMass'] = f'{number(M * 1000)} g/mol'
    if 'flammable' in fluid.get('marks', []):
        record.update(flash(cas))
    if 'notes' in fluid:
        record['about'] = fluid['notes']
    order = {'density': ('perry', 'vdi'), 'viscosity': ('perry', 'vdi'), 'thermalConductivity': ('perry', 'vdi'), 'specificHeatCapacity': ('perry', 'zabransky'), 'vapourPressure': ('vdi', 'perry'), 'latentHeat': ('perry', 'vdi'), 'surfaceTension': ('vdi', 'jasper')}
    high = 0.75 * Tc
    for key, works in order.items():
        pressure = None if key in ('vapourPressure', 'latentHeat', 'surfaceTension') else 5e6 if cas in BERGMAN else 2e6
        limits = fluid.get('limits', {}).get(key, [melts, 0.98 * Tc if key == 'vapourPressure' else high])
        found = entry(key, 'liquid', cas, M, *limits, pressure, fluid.get('works', {}).get(key, works), phase=False)
        if found is not None:
            if key == 'specificHeatCapacity':
                found.update(crc_check(cas, M))
            record[key] = found
    if 'minTemperature' in fluid:
        return record
    record['meltingTemperature'] = {'model': 'constant', 'range': {'p': ['0 Pa', '2 MPa']}, 'uncertainty': '0.5 %', 'source': f'CRC Handbook of Chemistry and Physics, 95th ed.; {CARRIED}', 'constants': {'value': f'{number(melts)} K'}}
    return record


def gas_record(fluid):
    """A gas without an equation of state, at low pressure: a perfect gas."""
    cas = fluid['cas']
    M = chemicals.MW(cas) / 1000
    c = row('specificHeatCapacity', 'vapour', 'poling', cas)
    low, high = 200, min(1000, c['Tmax'])
    box = {'T': [f'{low} K', f'{number(high)} K'], 'p': ['0 Pa', '500 kPa']}
    record = {'name': fluid['name'], 'formula': fluid['formula'], 'aliases': [*fluid.get('aliases', []), cas], 'kind': 'fluid', 'phases': ['vapour'], 'marks': fluid['marks'], 'molarMass': f'{number(M * 1000)} g/mol'}
    plain = 'perfect gas; the second virial coefficient changes it by less than the uncertainty'
    record['density'] = {'model': 'perfect-gas-density', 'range': box, 'uncertainty': '0.8 %', 'source': plain, 'constants': {'molarMass': f'{number(M * 1000)} g/mol'}}
    record['specificHeatCapacity'] = {'model': 'polynomial', 'range': box, 'uncertainty': '2 %', 'source': f"Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th ed. (2001), appendix A; {CARRIED}", 'constants': {'gives': 'J/(kg K)', 'terms': [c[k] * R / M for k in ('a0', 'a1', 'a2', 'a3', 'a4')]}}
    record['speedOfSound'] = {'model': 'perfect-gas-sound', 'range': box, 'uncertainty': '1.5 %', 'source': plain, 'constants': {'molarMass': f'{number(M * 1000)} g/mol'}}
    for key in ('viscosity', 'thermalConductivity'):
        record[key] = entry(key, 'vapour', cas, M, low, high, 5e5, ('perry', 'vdi'), phase=False)
    return record
