"""Woods, building materials, insulations, plastics, composites: states from other works than those of the records."""
import math

import xraylib
from CoolProp.CoolProp import PropsSI
from cryopy.material.sandbox import G10norm, Kapton, Nylon, Teflon
from ht.insulation import ASHRAE, building_materials

from everyday_points import BUILDING_ASHRAE, BUILDING_ISO, NIST
from everyday_states import BETA, CP, K, RHO, add, between, krevelen, waples


CHANGES = {
    **dict.fromkeys(('concrete', 'reinforced concrete', 'common brick', 'clay tile', 'cement plaster'), (waples, 'waples-waples', (274, 333.15))),
    **dict.fromkeys(('plywood', 'particleboard', 'oriented strand board', 'medium-density fibreboard', 'extruded polystyrene', 'butyl rubber', 'silicone rubber'), (krevelen, 'van krevelen', (273.15, 323.15))),
}


def heat(name, T0, value, reference):
    if name not in CHANGES:
        add(name, CP, T0, value, reference)
        return
    change, author, (low, high) = CHANGES[name]
    for T in between(low, high, 5):
        add(name, CP, T, value * change(T) / change(T0), f'{reference} with the change of {author}')


def built():
    # Woods at 12 % moisture: the specific gravity of the Wood Handbook is dry mass over moist volume.
    MOISTURE = 12
    for name, kinds in (
        ('oak', (0.68, 0.63)), ('maple', (0.63, 0.54)), ('ash wood', (0.60,)), ('birch', (0.62, 0.55)), ('southern pine', (0.59, 0.51)), ('Douglas fir', (0.48, 0.52)), ('spruce', (0.36, 0.40)), ('red cedar', (0.32,)), ('redwood', (0.40, 0.35)),
    ):
        for G in kinds:
            add(name, RHO, 293.15, 1000 * G * (1 + MOISTURE / 100), 'wood handbook 2010')
            for T in between(273.15, 333.15, 7):
                # 2 % to 3 % for 10 K, as the handbook says.
                add(name, K, T, (G * (0.1941 + 0.004064 * MOISTURE) + 0.01864) * (1 + 0.0025 * (T - 297.15)), 'wood handbook 2010')
        for T in between(280, 333.15, 6):
            dry = 103.1 + 3.867 * T
            add(name, CP, T, (dry + 4180 * MOISTURE / 100) / (1 + MOISTURE / 100) + 1000 * MOISTURE * (-0.06191 + 2.36e-4 * T - 1.33e-4 * MOISTURE), 'wood handbook 2010')
        for T in between(273.15, 333.15, 7):
            add(name, CP, T, (1113 + 4.85 * (T - 273.15) + 4180 * MOISTURE / 100) / (1 + MOISTURE / 100), 'dunlap 1912')

    # Building materials and insulations: the table that the record is not.
    for name, key, props in BUILDING_ISO:
        for letter, prop, value in zip('rkc', (RHO, K, CP), building_materials[key]):
            if letter in props and letter == 'c':
                heat(name, 283.15, value, 'iso 10456')
            elif letter in props:
                add(name, prop, 283.15 if 'snow' not in name else 265.15, value, 'iso 10456')
    for name, keys, props in BUILDING_ASHRAE:
        for key in keys:
            rho, cp, k, R, thickness = ASHRAE[key]
            k = k if k is not None else thickness / 1000 / R if R else None
            for letter, prop, value in (('r', RHO, rho), ('k', K, k)):
                if value is not None and letter in props:
                    add(name, prop, 297.15, value, 'ashrae')
            if cp is not None and 'c' in props:
                heat(name, 297.15, cp, 'ashrae')

    # The factor of temperature of EN ISO 10456, annex A, on usual declared values at 10 degC of EN 13162 to 13171; both from memory.
    for name, k10, f in (('expanded polystyrene', 0.036, 0.0036), ('extruded polystyrene', 0.034, 0.0045), ('polyurethane foam', 0.026, 0.0055), ('glass wool', 0.035, 0.0048), ('mineral wool', 0.036, 0.0046), ('cellular glass', 0.042, 0.0037), ('expanded perlite', 0.046, 0.0033), ('cork', 0.040, 0.0027), ('cellulose insulation', 0.040, 0.0040)):
        for T in between(283.15 if name in ('polyurethane foam', 'mineral wool') else 263.15, 323.15, 7):
            add(name, K, T, k10 * math.exp(f * (T - 283.15)), 'product standard at 10 degC with the factor of EN ISO 10456 (from memory)')

    # Wools: still air, a little through the fibres, and radiation as the cube of the temperature, which takes what is left of the value of ASHRAE at 297 K.
    for name, k24, fibres, high in (('glass wool', 0.036, 0.001, 473), ('mineral wool', 0.035, 0.002, 573)):
        air = lambda T: PropsSI('L', 'T', T, 'P', 101325, 'Air')
        for T in between(283.15, high, 8):
            add(name, K, T, air(T) + fibres + (k24 - fibres - air(297.15)) * (T / 297.15) ** 3, 'ashrae with air and radiation')

    # Plastics: densities of the NIST list; heat capacity of the solid by Van Krevelen, cp(T)/cp(298 K) = 0.106 + 0.003 T on the values of the ATHAS bank.
    LIVING = {'muscle', 'fat tissue', 'skin', 'cortical bone', 'brain tissue'}
    for name, key in NIST:
        add(name, RHO, 310.15 if name in LIVING else 293.15, 1000 * xraylib.GetCompoundDataNISTByName(key)['density'], 'nist')
    for name, cp in (('polystyrene', 1220), ('polymethyl methacrylate', 1370), ('polycarbonate', 1190), ('polyvinyl chloride', 950), ('polyethylene terephthalate', 1160), ('polypropylene', 1650), ('polyamide', 1480), ('polyoxymethylene', 1390), ('polyvinylidene fluoride', 1200), ('polyether ether ketone', 1100), ('polyimide', 1090), ('acrylonitrile butadiene styrene', 1350), ('polyethylene high density', 1800), ('epoxy resin', 1200)):
        for T in between(273.15, 373.15 if name in ('polyether ether ketone', 'polyimide') else 333.15, 7):
            add(name, CP, T, cp * krevelen(T), 'athas bank with the factor of van krevelen (from memory)')
    for name, key in (('polytetrafluoroethylene', Teflon), ('polyamide', Nylon), ('polyimide', Kapton)):
        for T in between(275, 299, 4):
            add(name, K, T, key.ThermalConductivity(T), 'nist cryogenic')
    for T in between(275, 299, 4):
        add('circuit board FR-4', K, T, 10 ** sum(a * math.log10(T) ** i for i, a in enumerate((-4.1236, 13.788, -26.068, 26.272, -14.663, 4.4954, -0.6905, 0.0397))), 'nist cryogenic')
        add('circuit board FR-4', CP, T, 10 ** sum(a * math.log10(T) ** i for i, a in enumerate((-2.4083, 7.6006, -8.2982, 7.3301, -4.2386, 1.4294, -0.24396, 0.015236))), 'nist cryogenic')
    # Amorphous polymers below their glass transition: conductivity of handbooks at 293 K with the power 0.22 of the temperature, Bicerano 1996.
    for name, k in (('polystyrene', 0.142), ('polymethyl methacrylate', 0.193), ('polycarbonate', 0.193), ('polyvinyl chloride', 0.16), ('epoxy resin', 0.19), ('polyester resin', 0.17), ('phenolic resin', 0.233)):
        for T in between(273.15, 333.15, 5):
            add(name, K, T, k * (T / 293.15) ** 0.22, 'polymer handbooks with the change of bicerano (from memory)')
    for name, key in (('polyamide', Nylon), ('polytetrafluoroethylene', Teflon), ('circuit board FR-4', G10norm)):
        for T in (275, 280, 285):
            add(name, BETA, T, 3 * (key.LinearThermalExpansion(T + 5) - key.LinearThermalExpansion(T - 5)) / 10, 'nist cryogenic')
    # Composites: fibres and resin by the rule of mixtures, across the fibres by Halpin and Tsai. Share of fibres by volume, then density, conductivity, heat capacity of fibre and resin, from memory.
    for name, share, fibre, resin in (('glass-fibre plastic', 0.40, (2540, 1.05, 800), (1200, 0.20, 1200)), ('carbon-fibre plastic', 0.60, (1780, 2.4, 710), (1200, 0.20, 1200)), ('circuit board FR-4', 0.45, (2540, 1.05, 800), (1200, 0.20, 1200))):
        rho = share * fibre[0] + (1 - share) * resin[0]
        eta = (fibre[1] / resin[1] - 1) / (fibre[1] / resin[1] + 1)
        add(name, RHO, 293.15, rho, 'rule of mixtures')
        add(name, CP, 293.15, (share * fibre[0] * fibre[2] + (1 - share) * resin[0] * resin[2]) / rho, 'rule of mixtures')
        add(name, K, 293.15, resin[1] * (1 + eta * share) / (1 - eta * share), 'halpin-tsai 1969')
    # Bitumen: Cragoe, NBS Miscellaneous Publication 97 (1929), petroleum products.
    for T in between(263.15, 333.15, 8):
        add('bitumen', CP, T, (1685 + 3.39 * (T - 273.15)) / math.sqrt(1.03), 'cragoe 1929')
