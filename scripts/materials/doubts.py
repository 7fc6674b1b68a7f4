"""Widens the uncertainties of a generated record where handbooks lie farther off: doubts-of-fluids.yaml."""
import os

import yaml

with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'doubts-of-fluids.yaml')) as file:
    DOUBTS = yaml.safe_load(file)


def share(text):
    return float(text.split()[0])


def kelvin(text):
    return float(text.split()[0])


def widened(bands, phase, low, high, value):
    """The bands, read first to last, with the part of each that the doubt covers put before it where that is wider; bands of a pressure, near the critical point, stay."""
    out = []
    for band in bands if isinstance(bands, list) else [{'value': bands}]:
        ends = [max(low, kelvin(band['T'][0])), min(high, kelvin(band['T'][1]))] if 'T' in band else [low, high]
        fits = 'p' not in band and ends[0] < ends[1] and share(value) > share(band['value']) and (phase is None or band.get('phase', phase) == phase)
        part = {**({'phase': phase or band['phase']} if phase or 'phase' in band else {}), 'T': [f'{end:g} K' for end in ends], 'value': value}
        if fits and part not in out:
            out.append(part)
        out.append(band)
    return out


def doubted(record):
    """The record with the doubts of its name."""
    for key, rows in DOUBTS.get(record['name'], {}).items():
        for kind, low, high, value, _ in rows:
            phase = None if kind == 'line' else kind
            for entry in [record['thermodynamics']] if 'thermodynamics' in record and key in record['thermodynamics']['uncertainty'] else record[key] if isinstance(record[key], list) else [record[key]]:
                if entry.get('phase', phase) != phase and phase is not None:
                    continue
                # An entry of one phase has bands without.
                inner = None if 'phase' in entry else phase
                if isinstance(entry['uncertainty'], dict):
                    entry['uncertainty'][key] = widened(entry['uncertainty'][key], inner, low, high, value)
                else:
                    entry['uncertainty'] = widened(entry['uncertainty'], inner, low, high, value)
    return record
