"""Names that records carry beside those of their own scripts: more-names.yaml, and cas-numbers.yaml made by name-records.py."""
import os

import yaml

HERE = os.path.dirname(os.path.abspath(__file__))
with open(os.path.join(HERE, 'more-names.yaml')) as file:
    MORE = yaml.safe_load(file)
NUMBERS = {}
if os.path.exists(os.path.join(HERE, 'cas-numbers.yaml')):
    with open(os.path.join(HERE, 'cas-numbers.yaml')) as file:
        NUMBERS = yaml.safe_load(file)


def also_named(record):
    """The record with its further aliases and the names that it shares with others, in the order of the heads."""
    name = record['name']
    more = MORE['aliases'].get(name, []) + ([NUMBERS[name]] if name in NUMBERS else [])
    shared = [one for one, records in MORE['sharedNames'].items() if name in records]
    out = {}
    for key, value in record.items():
        out[key] = value
        if key == 'aliases' or (key == 'name' and 'aliases' not in record):
            aliases = (value if key == 'aliases' else []) + [one for one in more if one not in record.get('aliases', [])]
            if aliases:
                out['aliases'] = aliases
            if shared:
                out['sharedNames'] = shared
    return out
