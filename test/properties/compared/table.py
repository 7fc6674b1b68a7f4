"""What the scripts of this folder share: the declared ranges of a record, and the writing of its table."""
import csv
import os

import yaml

HERE = os.path.dirname(os.path.abspath(__file__))
MATERIALS = os.path.join(HERE, '..', '..', '..', 'materials')


def kelvin(text):
    value, unit = text.split()
    return float(value) + (273.15 if unit == 'degC' else 0)


def record(material):
    with open(os.path.join(MATERIALS, material.replace(' ', '-') + '.yaml')) as file:
        return yaml.safe_load(file)


def declared(material, prop, phase=None):
    """Lowest and highest temperature [K] that the record declares."""
    entries = record(material)[prop]
    entries = entries if isinstance(entries, list) else [entries]
    boxes = [box for entry in entries if phase is None or entry.get('phase') == phase for box in (entry['range'] if isinstance(entry['range'], list) else [entry['range']])]
    ends = [kelvin(end) for box in boxes for end in box['T']]
    return min(ends), max(ends)


def between(low, high, n):
    return [low + (high - low) * i / (n - 1) for i in range(n)]


class Table:
    """Rows: material, property, T [K], p [Pa], share by mass, value [SI], reference."""

    def __init__(self, name, p=101325):
        self.name, self.p, self.rows = name, p, []

    def add(self, material, prop, T, x, value, reference, p=None):
        self.rows.append([material, prop, f'{T:.6g}', f'{p or self.p:.7g}', f'{x:.5g}' if x is not None else '', f'{value:.6g}', reference])

    def curve(self, material, prop, reference, law, low=0, high=1e4, n=32, phase=None, p=None):
        """Even states over what the record declares and the reference covers, a hair inside the ends."""
        ends = declared(material, prop, phase)
        cold, hot = max(ends[0], low), min(ends[1], high)
        if cold >= hot:
            raise ValueError(f'{material} {prop}: {reference} covers none of {ends}')
        hair = 1e-4 * (hot - cold)
        for T in between(cold + hair, hot - hair, n):
            self.add(material, prop, T, None, law(T), reference, p)

    def write(self):
        with open(os.path.join(HERE, self.name + '.csv'), 'w', newline='') as out:
            writer = csv.writer(out, lineterminator='\n')
            writer.writerow(['material', 'property', 'T [K]', 'p [Pa]', 'share', 'value [SI]', 'reference'])
            writer.writerows(self.rows)
        print(self.name, len(self.rows))
