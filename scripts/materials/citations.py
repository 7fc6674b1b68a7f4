"""Citations from the bibliography that CoolProp carries: authors, journal, volume, year, page."""
import functools
import os
import re

import CoolProp

CARRIED = 'constants as carried by CoolProp 8.0.0 (MIT licence)'
LATEX = {r'{\"u}': 'ue', r'\"u': 'ue', r'{\"o}': 'oe', r'\"o': 'oe', r'{\"a}': 'ae', r'\"a': 'ae', r"\'e": 'e', r"\'o": 'o', r"\'a": 'a', r"\'i": 'i', r'\~n': 'n', r'\`e': 'e', r'\v{c}': 'c', r'\c{C}': 'C', r'\ss': 'ss', r'\&': 'and', '--': '-'}


def plain(text):
    for code, letter in LATEX.items():
        text = text.replace(code, letter)
    return re.sub(r'\s+', ' ', re.sub(r'[{}\\]', '', text)).strip()


@functools.cache
def library():
    with open(os.path.join(os.path.dirname(CoolProp.__file__), 'CoolPropBibTeXLibrary.bib'), encoding='latin-1') as file:
        text = file.read()
    found = {}
    for kind, key, body in re.findall(r'@(\w+)\{([^,\s]+),(.*?)\n\}', text, re.S):
        fields = dict((k.lower(), plain(v)) for k, v in re.findall(r'(\w+)\s*=\s*[{"](.*?)[}"],?\s*(?=\n|$)', body, re.S))
        found[key] = (kind, fields)
    return found


def surname(author):
    author = author.strip()
    if ',' in author:
        return author.split(',')[0]
    words = author.split(' ')
    return ' '.join(words[-2:]) if len(words) > 2 and words[-2] in ('de', 'Le', 'van', 'der') else words[-1]


def citation(keys):
    """Authors, place (year) of one or several comma-separated keys."""
    out = []
    for key in keys.split(','):
        entry = library().get(key.strip())
        if entry is None:
            out.append(key.strip())
            continue
        _, f = entry
        names = [surname(a) for a in re.split(r'\s+and\s+', f.get('author', '')) if a]
        who = ', '.join(names[:-1]) + ' and ' + names[-1] if 1 < len(names) <= 5 else names[0] + ' and others' if len(names) > 5 else (names or ['?'])[0]
        year = re.sub(r'\D', '', f.get('year', ''))[:4]
        place = f.get('journal') or f.get('booktitle') or f.get('publisher') or f.get('institution') or f.get('school') or f.get('title', '')
        volume = f.get('volume')
        page = re.split(r'[-,]', f.get('pages', ''))[0]
        out.append(f"{who}, {place} {volume + ' ' if volume else ''}({year}){' ' + page if page else ''}".strip())
    return '; '.join(out)


if __name__ == '__main__':
    import sys
    for one in sys.argv[1:]:
        print(one, '->', citation(one))
