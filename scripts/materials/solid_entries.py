"""Entries of records of solids: one value, a table by temperature, melting point, expansion, emissivity by surface."""
from record import K

BERGMAN = 'Bergman, Lavine, Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 7th ed. (2011)'
VDI = 'VDI Heat Atlas, 2nd ed. (2010), refractories, as in ht 1.2.0 (MIT licence)'


def constant(value, T, uncertainty, source, **more):
    return {'model': 'constant', 'range': {'T': K(*T)}, 'uncertainty': uncertainty, 'source': source, **more, 'constants': {'value': value}}


def table(rows, uncertainty, source, unit, **more):
    return {'model': 'table', 'range': {'T': K(rows[0][0], rows[-1][0])}, 'uncertainty': uncertainty, 'source': source, **more, 'constants': {'gives': unit, 'rows': rows}}


def melting(value, source, uncertainty='0.5 %'):
    return {'model': 'constant', 'range': {'p': ['0 Pa', '10 MPa']}, 'uncertainty': uncertainty, 'source': source, 'constants': {'value': f'{value} K'}}


def expansion(linear, T, source='linear expansion of handbooks times three, from memory', uncertainty='12 %'):
    """From the linear coefficient [1e-6 1/K]."""
    return constant(f'{3 * linear:.4g}e-6 1/K', T, uncertainty, source)


def emissivity(surfaces, source):
    """Rows of surface, temperatures, value, relative half-width in percent."""
    return [{'model': 'constant', 'surface': s, 'range': {'T': K(*T)}, 'uncertainty': f'{u} %', 'source': source, 'constants': {'value': e}} for s, T, e, u in surfaces]
