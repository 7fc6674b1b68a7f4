"""Writes a material record as the YAML that materials/ holds: short maps in one line, lists of rows in one line."""
import os

import yaml

from names_of_records import also_named
from solution_bounds import bounded

FOLDER = os.path.join(os.path.dirname(os.path.abspath(__file__)), '..', '..', 'materials')
BARE = set('abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789 ._-/()^*%+')

with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'across-melting.yaml')) as file:
    ACROSS = yaml.safe_load(file)


def scalar(x):
    if isinstance(x, bool):
        return 'true' if x else 'false'
    if isinstance(x, float):
        return repr(int(x)) if x == int(x) and abs(x) < 1e15 else repr(x)
    if isinstance(x, int):
        return str(x)
    # A number of the CAS registry may look like a date.
    plain = all(c in BARE for c in x) and set(x) - set('0123456789-') and x[:1] not in '-%*' and not x.endswith(' ')
    return x if plain else "'" + x.replace("'", "''") + "'"


def flow(x):
    if isinstance(x, dict):
        return '{ ' + ', '.join(f'{k}: {flow(v)}' for k, v in x.items()) + ' }' if x else '{}'
    if isinstance(x, (list, tuple)):
        return '[' + ', '.join(flow(v) for v in x) + ']'
    return scalar(x)


def text_of(value):
    """A sentence for the end of a line: quoted where YAML would read it as something else."""
    return "'" + value.replace("'", "''") + "'" if ': ' in value or ' #' in value or value[:1] in "'\"[{&*!|>%@`#-" else value


def entry(e, indent):
    pad = ' ' * indent
    lines = []
    for key in ('model', 'phase', 'surface', 'range', 'uncertainty', 'source', 'notes', 'checks', 'constants'):
        if key not in e:
            continue
        v = e[key]
        if key in ('source', 'notes'):
            lines.append(f'{pad}{key}: {text_of(v)}')
        elif key == 'checks' or (key in ('uncertainty', 'range') and isinstance(v, list)):
            lines.append(f'{pad}{key}:')
            lines += [f'{pad}  - {flow(one)}' for one in v]
        elif key == 'uncertainty' and isinstance(v, dict):
            lines.append(f'{pad}{key}:')
            for name, bands in v.items():
                lines.append(f'{pad}  {name}:')
                lines += [f'{pad}    - {flow(one)}' for one in bands]
        else:
            lines.append(f'{pad}{key}: {flow(v)}')
    return lines


HEAD = ('name', 'formula', 'aliases', 'sharedNames', 'kind', 'phases', 'acrossMelting', 'takes', 'typical', 'saturated', 'molarMass', 'about', 'marks')


def write(record, made_by):
    """Writes one record; `made_by` names the script and its data in the first line."""
    record = bounded(record)
    lines = [f'# Made by scripts/materials/{made_by}']
    record = also_named(record)
    if record['name'] in ACROSS:
        record = {**record, 'acrossMelting': ACROSS[record['name']]}
    for key in HEAD:
        if key in record:
            lines.append(f'{key}: {text_of(record[key]) if key == "about" else flow(record[key])}')
    for key, e in record.items():
        if key in HEAD:
            continue
        lines += ['', f'{key}:']
        if isinstance(e, list):
            for one in e:
                body = entry(one, 4)
                lines.append('  - ' + body[0].strip())
                lines += body[1:]
        else:
            lines += entry(e, 2)
    name = record['name'].replace(' ', '-').replace('/', '-').replace('(', '').replace(')', '') + '.yaml'
    with open(os.path.join(FOLDER, name), 'w') as out:
        out.write('\n'.join(lines) + '\n')
    return name


def K(low, high):
    return [f'{low:g} K' if low % 1 else f'{int(low)} K', f'{high:g} K' if high % 1 else f'{int(high)} K']


def disputed(record, others):
    """Uncertainty of a property, and what other works give, where they lie farther apart than a work of its kind is good for."""
    for key, (uncertainty, what) in others.items():
        for entry in record[key] if isinstance(record[key], list) else [record[key]]:
            entry['uncertainty'] = uncertainty
            entry['source'] += f'; {what}'
    return record
