"""Writes cas-numbers.yaml, and its numbers and the names of more-names.yaml into the heads of the records in materials/.

Run with:  python3 scripts/materials/name-records.py   (needs chemicals 1.5.2, MIT licence, and PyYAML)
A number is looked up for every record with a formula, by its name, and for the substances that more-names.yaml lists.
"""
import glob
import os
import re

import yaml
from chemicals import CAS_from_any

import names_of_records
from record import flow

HERE = os.path.dirname(os.path.abspath(__file__))
NUMBER = re.compile(r'\b\d{2,7}-\d\d-\d\b')
FILES = sorted(glob.glob(os.path.join(HERE, '..', '..', 'materials', '*.yaml')))


def head_of(path):
    with open(path) as file:
        return file.read().split('\n\n', 1)[0]


known = set()
numbers = dict(names_of_records.NUMBERS)
for path in FILES:
    known.update(NUMBER.findall(head_of(path)))
for path in FILES:
    head = yaml.safe_load(head_of(path))
    name = names_of_records.MORE['substances'].get(head['name']) or (head['name'] if 'formula' in head else None)
    if name is None or NUMBER.search(head_of(path)):
        continue
    try:
        number = CAS_from_any(name)
    except ValueError:
        print('no number for', name)
        continue
    if number not in known:
        numbers[head['name']] = number
        known.add(number)

with open(os.path.join(HERE, 'cas-numbers.yaml'), 'w') as out:
    out.write('# Made by name-records.py from the lists of chemicals 1.5.2 (MIT licence)\n')
    for name in sorted(numbers):
        out.write(f"{name}: '{numbers[name]}'\n")
names_of_records.NUMBERS = numbers

for path in FILES:
    with open(path) as file:
        text = file.read()
    head = text.split('\n\n', 1)[0]
    record = yaml.safe_load(head)
    named = names_of_records.also_named(record)
    changed = head
    for key, after in (('aliases', 'formula' if 'formula' in record else 'name'), ('sharedNames', 'aliases')):
        if key not in named or named[key] == record.get(key):
            continue
        line = f'{key}: {flow(named[key])}'
        if re.search(rf'^{key}:', changed, re.M):
            changed = re.sub(rf'^{key}:.*$', lambda _: line, changed, count=1, flags=re.M)
        else:
            changed = re.sub(rf'^({after}:.*)$', lambda found: f'{found[1]}\n{line}', changed, count=1, flags=re.M)
    if changed != head:
        with open(path, 'w') as file:
            file.write(changed + text[len(head):])
        print(os.path.basename(path))
