"""Ice, snow, rocks, soils, beds: states from other works than those of the records."""
import math

import gsw
from burnman.minerals import HP_2011_ds62 as minerals
from fluids.packed_bed import packed_beds_correlations, voidage_Benyahia_Oneil
from ht.insulation import building_materials

from everyday_states import BETA, CP, K, RHO, add, between, waples



def ground():
    # Ice and snow. Mass of the air in snow is nothing: its heat capacity is that of ice.
    for T in between(173.15, 273.15, 21):
        t = T - 273.15
        for prop, value in ((RHO, gsw.rho_ice(t, 0)), (CP, gsw.cp_ice(t, 0)), (BETA, gsw.alpha_wrt_t_ice(t, 0))):
            if prop != BETA or T > 203:
                add('ice', prop, T, value, 'iapws-06')
        add('ice', K, T, 1.16 * (1.91 - 8.66e-3 * t + 2.97e-5 * t ** 2), 'fukusako 1990')
        add('ice', K, T, 9.828 * math.exp(-0.0057 * T), 'yen 1981')
    for name, rho in (('fresh snow', 0.1), ('settled snow', 0.2), ('packed snow', 0.5)):
        for T in between(233.15, 273.15, 9):
            add(name, CP, T, gsw.cp_ice(T - 273.15, 0), 'iapws-06')
        add(name, K, 258.15, 2.22362 * rho ** 1.885, 'yen 1981')
        add(name, K, 258.6, 0.138 - 1.01 * rho + 3.233 * rho ** 2 if rho >= 0.156 else 0.023 + 0.234 * rho, 'sturm 1997')
        add(name, K, 271, 0.024 - 0.123 * rho + 2.5 * rho ** 2, 'calonne 2011')

    add('ice', 'meltingTemperature', 270, 273.15 + gsw.t_freezing(0, 0, 0), 'iapws-06')
    for name in ('fresh snow', 'settled snow', 'packed snow'):
        add(name, 'meltingTemperature', 270, 273.15 + gsw.t_freezing(0, 0, 0), 'iapws-06')

    # Rocks: their minerals, by mass; the rock itself may hold pores, so that only heat capacity and expansion of all of them, and the density of the dense ones, count.
    DENSE = {'marble', 'quartzite', 'rock salt', 'granite', 'basalt'}
    for name, shares in (('marble', {'cc': 1}), ('limestone', {'cc': 0.9, 'q': 0.1}), ('quartzite', {'q': 1}), ('sandstone', {'q': 0.85, 'mic': 0.15}), ('granite', {'q': 0.3, 'ab': 0.3, 'an': 0.05, 'mic': 0.35}), ('basalt', {'an': 0.3, 'ab': 0.2, 'di': 0.5}), ('rock salt', {'hlt': 1}), ('slate', {'q': 0.35, 'mu': 0.45, 'clin': 0.2})):
        for T in between(273.15, 333.15, 7):
            volume = heat = growth = 0
            for key, share in shares.items():
                grain = getattr(minerals, key)()
                grain.set_state(1e5, T)
                volume += share / grain.density
                heat += share * grain.molar_heat_capacity_p / grain.molar_mass
                growth += share / grain.density * grain.alpha
            add(name, CP, T, heat, 'holland-powell')
            if name in DENSE:
                add(name, RHO, T, 1 / volume, 'holland-powell')
            if name in ('granite', 'sandstone', 'rock salt', 'marble', 'limestone'):
                add(name, BETA, T, growth / volume, 'holland-powell')
    for T in between(274, 333.15, 5):
        add('plasterboard', CP, T, (91.38 + 0.318 * T) / 0.17217, 'gypsum of kelley 1960 (from memory)')
    for T in between(273.15, 372.9, 6):
        grain = minerals.q()
        grain.set_state(1e5, T)
        for name in ('fine sand', 'dry sand'):
            add(name, CP, T, grain.molar_heat_capacity_p / grain.molar_mass, 'holland-powell')
        for name in ('gravel', 'rock bed'):
            add(name, CP, T, 790 * waples(T) / waples(293.15), 'waples-waples 2004')
    # Conductivity at 20 degC of Cermak and Rybach, in Landolt-Boernstein V/1a (1982), or Clauser and Huenges 1995, with the change with temperature of Vosteen and Schellschmidt 2003.
    for name, mean, a, b in (('granite', 3.05, 0.0030, 0.0042), ('basalt', 1.95, 0.0030, 0.0042), ('marble', 2.8, 0.0030, 0.0042), ('quartzite', 5.0, 0.0030, 0.0042), ('limestone', 2.3, 0.0034, 0.0039), ('sandstone', 2.5, 0.0034, 0.0039), ('slate', 2.1, 0.0034, 0.0039)):
        for T in between(273.15, 333.15, 7):
            fall = lambda t: 0.99 + t * (a - b / (mean * (0.99 + 20 * a)))
            add(name, K, T, mean * fall(20) / fall(T - 273.15), 'cermak-rybach with vosteen-schellschmidt')

    # Soils: Johansen 1975 and Cote and Konrad 2005 with solids of 2700 kg/m^3, Kersten 1949 (silt and clay, sand); heat capacities add (de Vries 1963).
    GRAIN, WATER, FROZEN = 2700, 1000, 917


    def soil(name, T, rho, pore, frost=False):
        n = 1 - rho / GRAIN if pore is None else (GRAIN - rho) / (GRAIN - pore)
        for q in (0.2, 0.4, 0.6):
            solids = 7.7 ** q * 2.0 ** (1 - q)
            dry = (0.135 * GRAIN * (1 - n) + 64.7) / (GRAIN - 0.947 * GRAIN * (1 - n))
            add(name, K, T, dry if pore is None else solids ** (1 - n) * (2.2 if frost else 0.57) ** n, 'johansen 1975')
        heat = 2.0e6 * (1 - n) + (0 if pore is None else n * pore * (2050 if frost else 4190))
        add(name, CP, T, heat / rho, 'de vries 1963')
        if pore is None:
            add(name, K, T, 0.75 * 10 ** (-1.2 * n), 'cote-konrad 2005')


    for T in (275.15, 293.15, 313.15):
        soil('dry soil', T, 1500, None)
        soil('wet soil', T, 2000, WATER)
    for T in (243.15, 263.15):
        soil('frozen soil', T, 1950, FROZEN, True)
    for moist, dry in ((10, 1.6), (15, 1.6), (20, 1.6)):
        add('soil', K, 277.15, 0.1442 * (0.9 * math.log10(moist) - 0.2) * 10 ** (0.6243 * dry), 'kersten 1949')
    add('wet sand', K, 277.15, 0.1442 * (0.7 * math.log10(25) + 0.4) * 10 ** (0.6243 * 1.58), 'kersten 1949')
    add('wet sand', RHO, 293.15, 2650 * 0.6 + 1000 * 0.4, 'grains and voids')
    add('wet sand', CP, 293.15, (1580 * 745 + 400 * 4182) / 1980, 'de vries 1963')
    add('fine sand', K, 293.15, 0.75 * 10 ** (-1.2 * 0.415), 'cote-konrad 2005')
    add('dry sand', K, 293.15, 0.75 * 10 ** (-1.2 * 0.43), 'cote-konrad 2005')
    # Peat of 90 % pores filled with water: organic matter of 1300 kg/m^3, 1920 J/(kg K), 0.25 W/(m K).
    add('peat', K, 283.15, 0.25 ** 0.1 * 0.57 ** 0.9, 'cote-konrad 2005')
    add('peat', CP, 283.15, (130 * 1920 + 900 * 4190) / 1030, 'de vries 1963')
    add('peat', RHO, 283.15, 1030, 'de vries 1963')

    # Beds in air: the cell of Zehner, Bauer and Schluender for the conductivity, laws of packed beds at creeping flow for the permeability.
    ROUND = {'packed glass spheres': 1.0}
    SLOW = ('Ergun', 'Brauer', 'KTA', 'Fahien & Schriver', 'Idelchik', 'Erdim, Akgiray & Demir', 'Harrison, Brunner & Hecker', 'Montillet, Akkari & Comiti', 'Kuo & Nydegger')
    # Rings: what the voids of Billet and Schultes 1999 leave of steel and of stoneware; heat capacity of steel in ISO 10456.
    for name, grains, void in (('Pall rings', 7900, 0.954), ('Raschig rings', 2300, 0.68)):
        add(name, RHO, 293.15, grains * (1 - void), 'grains and voids of billet-schultes 1999')
    add('Pall rings', CP, 283.15, building_materials['Metals, stainless steel'][2], 'iso 10456')
    add('Raschig rings', CP, 283.15, building_materials['Tiles, ceramic or porcelain'][2], 'iso 10456')
    add('dry sand', RHO, 293.15, 2650 * (1 - voidage_Benyahia_Oneil(1e-3, 0.05, 0.9)), 'grains packed by benyahia-oneill 2005')
    # Open foam: Lemlich 1978, a third of the solid conducts along each axis.
    add('metal foam', K, 293.15, 0.92 * 0.0257 + 0.08 / 3 * 190, 'lemlich 1978')
    for name, rho, k, cp, void, d in (('packed glass spheres', 2500, 1.05, 750, 0.39, 3e-3), ('gravel', 2650, 2.8, 800, 0.38, 8e-3), ('rock bed', 2700, 2.5, 850, 0.42, 0.03), ('fine sand', 2650, 5.0, 745, 0.42, 1.5e-4), ('wet sand', 2650, 5.0, None, 0.40, 3e-4)):
        if cp is not None:
            add(name, RHO, 293.15, rho * (1 - voidage_Benyahia_Oneil(d, 50 * d, ROUND.get(name, 0.9))), 'grains packed by benyahia-oneill 2005')
            # Zehner, Bauer and Schluender of the VDI Heat Atlas: radiation between grains of emissivity 0.9, flattened contacts of 0.77 % of their section.
            air, flat = 0.0257, 0.0077 if name == 'packed glass spheres' else 0.001
            B, ratio, glow = 1.25 * ((1 - void) / void) ** (10 / 9), k / air, 4 * 5.67e-8 / (2 / 0.9 - 1) * 293.15 ** 3 * d / air
            N = 1 + (glow - B) / ratio
            core = 2 / N * (B / N ** 2 * (ratio + glow - 1) / ratio * math.log((ratio + glow) / B) + (B + 1) / (2 * B) * (glow - B) - (B - 1) / N)
            add(name, K, 293.15, air * ((1 - math.sqrt(1 - void)) * (1 + void * glow) + math.sqrt(1 - void) * (flat * ratio + (1 - flat) * core)), 'zehner-bauer-schluender (VDI Heat Atlas)')
        add(name, 'voidFraction', 293.15, voidage_Benyahia_Oneil(d, 50 * d, ROUND.get(name, 0.9)), 'benyahia-oneill 2005')
        for law in SLOW:
            drop = packed_beds_correlations[law][0](dp=d, voidage=void, vs=1e-9, rho=1.2, mu=1.8e-5, L=1.0)
            add(name, 'permeability', 293.15, 1.8e-5 * 1e-9 / drop, law.split(',')[0].lower())
        add(name, 'permeability', 293.15, d ** 2 * void ** 5.5 / 5.6, 'rumpf-gupte 1971')
