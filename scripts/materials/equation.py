"""Parts of an equation of state as CoolProp carries them, brought into the form of the records: ideal and residual terms, lines along saturation and melting."""
import math

import CoolProp.CoolProp as CP
import numpy as np


def ideal(terms, Tc):
    """The ideal part as factors of ln tau, powers, Einstein terms; offsets of enthalpy and entropy are left out."""
    log, power, vibration, mixed = 0.0, [], [], []
    for one in terms:
        kind = one['type'].replace('IdealGasHelmholtz', '').replace('IdealHelmholtz', '')
        if kind in ('Lead', 'EnthalpyEntropyOffset'):
            continue
        if kind == 'LogTau':
            log += one['a']
        elif kind == 'Power':
            power += [[n, t] for n, t in zip(one['n'], one['t'])]
        elif kind == 'PlanckEinstein':
            vibration += [[n, t] for n, t in zip(one['n'], one['t'])]
        elif kind == 'PlanckEinsteinFunctionT':
            vibration += [[n, v / one['Tcrit']] for n, v in zip(one['n'], one['v'])]
        elif kind == 'CP0Constant':
            log += one['cp_over_R']
        elif kind == 'CP0PolyT':
            for c, t in zip(one['c'], one['t']):
                if t == 0:
                    log += c
                elif t == -1:
                    raise ValueError('a power of -1')
                else:
                    power.append([-c * one['Tc'] ** t / (t * (t + 1)), -t])
        elif kind == 'CP0AlyLee':
            a, b, c, d, e = one['c']
            log += a
            if b:
                vibration.append([b, 2 * c / one['Tc']])
            if d:
                mixed.append([-d, 2 * e / one['Tc'], 1])
        else:
            raise ValueError(kind)
    return {'log': log, **({'power': power} if power else {}), **({'vibration': vibration} if vibration else {}), **({'mixed': mixed} if mixed else {})}


def residual(terms):
    power, gaussian, decaying, associating, critical = [], [], [], [], []
    for one in terms:
        kind = one['type'].replace('ResidualHelmholtz', '')
        if kind == 'Power':
            for n, d, t, l in zip(one['n'], one['d'], one['t'], one['l']):
                if d == int(d) and l == int(l):
                    power.append([n, int(d), t, int(l)])
                else:
                    decaying.append([n, d, t, 1 if l else 0, l, 0, 0])
        elif kind == 'Gaussian':
            gaussian += [list(row) for row in zip(one['n'], one['d'], one['t'], one['eta'], one['beta'], one['gamma'], one['epsilon'])]
        elif kind == 'Exponential':
            decaying += [[n, d, t, g, l, 0, 0] for n, d, t, g, l in zip(one['n'], one['d'], one['t'], one['g'], one['l'])]
        elif kind == 'DoubleExponential':
            decaying += [list(row) for row in zip(one['n'], one['d'], one['t'], one['gd'], one['ld'], one['gt'], one['lt'])]
        elif kind == 'Lemmon2005':
            for n, d, t, l, m in zip(one['n'], one['d'], one['t'], one['l'], one['m']):
                if m:
                    decaying.append([n, d, t, 1 if l else 0, l, 1, m])
                else:
                    power.append([n, int(d), t, int(l)])
        elif kind == 'GaoB':
            associating += [list(row) for row in zip(one['n'], one['d'], one['t'], one['eta'], one['beta'], one['gamma'], one['epsilon'], one['b'])]
        elif kind == 'NonAnalytic':
            critical += [list(row) for row in zip(one['n'], one['a'], one['b'], one['B'], one['C'], one['D'], one['A'], one['beta'])]
        else:
            raise ValueError(kind)
    out = {'power': power}
    for key, rows in (('gaussian', gaussian), ('critical', critical), ('decaying', decaying), ('associating', associating)):
        if rows:
            out[key] = rows
    return out


def ancillary(one, factor):
    form = 'sum' if one['type'] == 'rhoLnoexp' else 'exp-tau' if one['using_tau_r'] else 'exp'
    return {'reference': one['reducing_value'] * factor, 'temperature': one['T_r'], 'form': form, 'terms': [[n, t] for n, t in zip(one['n'], one['t'])]}


def value_of(one, T):
    theta = max(0, 1 - T / one['temperature'])
    total = sum(n * theta ** t for n, t in one['terms'])
    return one['reference'] * (1 + total if one['form'] == 'sum' else math.exp(total * (one['temperature'] / T if one['form'] == 'exp-tau' else 1)))


def start_values(name, anc, M, low, end, pseudo):
    """Lines that the search for both phases starts from; fitted to the equation's own saturation where the carried ones err too much for that."""
    out = {'liquid': ancillary(anc['rhoL'], M), 'vapour': ancillary(anc['rhoV'], M)}
    if pseudo:
        out.update(bubble=ancillary(anc['pL'], 1), dew=ancillary(anc['pV'], 1))
    else:
        out['pressure'] = ancillary(anc['pS'], 1)
    kinds = {'liquid': ('Dmass', 0, 0.004, [0.34, 0.7, 1.1, 1.6, 2.4, 4, 7]), 'vapour': ('Dmass', 1, 0.02, [0.37, 0.8, 1.2, 2, 3, 5, 9]), 'pressure': ('P', 0, 0.01, [1, 1.5, 2, 2.5, 3.5, 5, 8])}
    for key, (what, quality, limit, exponents) in kinds.items():
        if key not in out:
            continue
        points = []
        for i in range(120):
            T = low + (0.997 * end - low) * (1 - (1 - i / 119) ** 1.6)
            try:
                points.append((T, CP.PropsSI(what, 'T', T, 'Q', quality, name)))
            except ValueError:
                pass
        worst = max(abs(value_of(out[key], T) / y - 1) for T, y in points if T < 0.985 * end)
        if worst <= limit:
            continue
        one = out[key]
        reference, temperature = one['reference'], end
        theta = np.array([1 - T / temperature for T, _ in points])
        tau = np.array([temperature / T for T, _ in points])
        y = np.array([value for _, value in points]) / reference
        form = 'sum' if key == 'liquid' else 'exp-tau'
        aim = y - 1 if form == 'sum' else np.log(y) / tau
        weight = 1 / y if form == 'sum' else tau
        matrix = np.array([theta ** e for e in exponents]).T
        fit, *_ = np.linalg.lstsq(matrix * weight[:, None], aim * weight, rcond=None)
        fitted = {'reference': reference, 'temperature': temperature, 'form': form, 'terms': [[float(f'{n:.9g}'), e] for n, e in zip(fit, exponents)]}
        left = max(abs(value_of(fitted, T) / y - 1) for T, y in points if T < 0.985 * end)
        print(f'  {key}: {100 * worst:.2g} % off, fitted to {100 * left:.2g} %')
        if left < worst:
            out[key] = fitted
    return out


def melting(fluid, line, low, high):
    """The melting line up to the highest pressure, or the triple point alone."""
    pieces = []
    for part in line['parts']:
        if part['T_max'] <= part['T_min']:
            return None
        rows = [[a, t] for a, t in zip(part['a'], part['t'])] if isinstance(part['a'], list) else [[part['a'], part['c']]]
        # Both polynomial kinds give the pressure over that at the start of the piece.
        scale = 1 if line['type'] == 'Simon' else part['p_0']
        shifted = {'shifted': 'true'} if line['type'] == 'polynomial_in_Theta' else {}
        pieces.append({'from': max(low, part['T_min']), 'to': part['T_max'], 'temperature': part['T_0'], 'pressure': part['p_0'], 'terms': [[a * scale, t] for a, t in rows], **shifted})
    return pieces
