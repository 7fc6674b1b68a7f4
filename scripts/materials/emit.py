"""YAML text in the form of the hand-written records: one line a term, blocks for entries."""
import math
import re


class Quantity:
    """A number with its unit."""

    def __init__(self, value, unit):
        self.value, self.unit = value, unit

    def __str__(self):
        return f'{number(self.value)} {self.unit}'


def number(value):
    """Shortest text that keeps 12 significant digits."""
    if isinstance(value, int):
        return str(value)
    if not math.isfinite(value):
        raise ValueError(value)
    text = f'{value + 0.0:.12g}'  # no negative zero
    return text


def scalar(value):
    if isinstance(value, bool):
        return 'true' if value else 'false'
    if isinstance(value, (int, float)):
        return number(value)
    text = str(value)
    plain = re.fullmatch(r'[A-Za-z0-9][A-Za-z0-9 ().^/+%*-]*', text) and not re.fullmatch(r'[-+.0-9eE]+|true|false|null|no|yes|on|off|y|n', text, re.I)
    if plain and not text.endswith(' '):
        return text
    return "'" + text.replace("'", "''") + "'"


def flow(value):
    if isinstance(value, dict):
        return '{ ' + ', '.join(f'{flow(k)}: {flow(v)}' for k, v in value.items()) + ' }'
    if isinstance(value, (list, tuple)):
        return '[' + ', '.join(flow(v) for v in value) + ']'
    return scalar(value)


def short(value):
    return len(flow(value)) < 110


def block(value, indent):
    pad = '  ' * indent
    lines = []
    for key, one in value.items():
        head = f'{pad}{flow(key)}:'
        if isinstance(one, dict) and not short(one):
            lines += [head, *block(one, indent + 1)]
        elif isinstance(one, (list, tuple)) and not short(one) and all(isinstance(x, (dict, list, tuple)) for x in one):
            lines.append(head)
            for x in one:
                if isinstance(x, dict) and not short(x):
                    inner = block(x, indent + 2)
                    inner[0] = f'{pad}  - ' + inner[0].strip()
                    lines += inner
                else:
                    lines.append(f'{pad}  - {flow(x)}')
        elif isinstance(one, str) and key in ('source', 'notes', 'about'):
            lines.append(f'{head} {scalar(one)}')
        else:
            lines.append(f'{head} {flow(one)}')
    return lines


def record_text(record):
    """The text of a record; heads in flow style, entries as blocks with a blank line before each."""
    out = []
    for key, value in record.items():
        entry = isinstance(value, dict) and 'model' in value
        entries = isinstance(value, list) and value and isinstance(value[0], dict) and 'model' in value[0]
        if entry:
            out += ['', f'{key}:', *block(value, 1)]
        elif entries:
            out += ['', f'{key}:']
            for one in value:
                inner = block(one, 2)
                inner[0] = '  - ' + inner[0].strip()
                out += inner
        else:
            out.append(f'{key}: {scalar(value) if isinstance(value, str) else flow(value)}')
    return '\n'.join(out) + '\n'
