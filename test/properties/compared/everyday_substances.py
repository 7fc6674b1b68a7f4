"""Food, tissue, phase-change materials, catalysts: states from other works than those of the records."""
import json
import os

import chemicals
from burnman.minerals import HP_2011_ds62 as minerals
from thermo import HeatCapacityLiquid, HeatCapacitySolid, ThermalConductivityLiquid, ViscosityLiquid, VolumeLiquid

from everyday_points import COMPOSITIONS, TISSUES
from everyday_states import BETA, CP, K, RHO, add, between



def substances():
    # Food: Siebel and Chen for the heat capacity, Sweat (fruit and vegetables 1974, meat 1975) and Riedel 1949 for the conductivity.
    for name, water, meat, low, high in COMPOSITIONS:
        for T in between(low, high, 6):
            t, dry = T - 273.15, 1 - water
            add(name, CP, T, 4190 - 2300 * dry - 628 * dry ** 3, 'chen 1985')
            if meat is None:
                continue
            add(name, CP, T, 837 + 3349 * water, 'siebel 1892')
            if meat:
                if t <= 60:
                    add(name, K, T, 0.08 + 0.52 * water, 'sweat 1975')
            else:
                if 288 < T < 305:
                    add(name, K, T, 0.148 + 0.493 * water, 'sweat 1974')
                if name != 'apple':
                    add(name, K, T, (326.58 + 1.0412 * t - 0.00337 * t ** 2) * (0.796 + 0.9346 * water) / 1000, 'riedel 1949')

    # Tissue at 37 degC: Cooper and Trezek 1971 from the water, protein and fat of the ICRP, Spells 1960 from the water; Valvano, Cochran and Diller 1985 (37 degC and 3 K about it).
    for name, water, protein, fat in TISSUES:
        rho = 1000 / (water + 0.649 * protein + 1.227 * fat)
        for prop, value in ((RHO, rho), (K, rho / 1000 * (0.628 * water + 0.117 * protein + 0.231 * fat)), (CP, 4200 * water + 1090 * protein + 2300 * fat)):
            if name != 'lung tissue' or prop == CP:
                add(name, prop, 310.15, value, 'cooper-trezek 1971')
        if name != 'lung tissue':
            add(name, K, 310.15, 0.054 + 0.573 * water, 'spells 1960')
    for name, a, b in (('liver tissue', 0.4692, 0.001161), ('kidney tissue', 0.4989, 0.001288), ('brain tissue', 0.5043, 0.000296), ('lung tissue', 0.4071, 0.001176)):
        for T in between(304.15, 319.15, 4):
            add(name, K, T, a + b * (T - 273.15), 'valvano 1985')

    # Phase-change materials, as packages carry them.
    DATA = os.path.dirname(chemicals.__file__)
    for name, cas, liquid in (('octadecane', '593-45-3', (305, 370)), ('hexadecane', '544-76-3', (295, 370)), ('lauric acid', '143-07-7', (322, 370)), ('sodium nitrate', '7631-99-4', None)):
        mass = chemicals.MW(cas) / 1000
        add(name, 'meltingTemperature', 300, chemicals.Tm(cas), 'crc')
        add(name, 'fusionHeat', 300, chemicals.Hfus(cas) / mass, 'crc')
        for method in ('CRCSTD', 'PERRY151'):
            engine = HeatCapacitySolid(CASRN=cas)
            if method in engine.all_methods and (method == 'PERRY151') == (liquid is None):
                for T in (298.15,) if liquid else (510, 530):
                    add(name, CP, T, engine.calculate(T, method) / mass, method[:3].lower().replace('per', 'perry'))
        if liquid is not None and 'VDI_PPDS' in VolumeLiquid(CASRN=cas).all_methods:
            for T in between(*liquid, 5):
                volume = lambda t: VolumeLiquid(CASRN=cas).calculate(t, 'VDI_PPDS')
                add(name, BETA, T, (volume(T + 1) - volume(T - 1)) / 2 / volume(T), 'vdi')
        for prop, cls, methods in ((RHO, VolumeLiquid, ('VDI_PPDS', 'DIPPR_PERRY_8E')), ('viscosity', ViscosityLiquid, ('VDI_PPDS', 'DIPPR_PERRY_8E', 'VISWANATH_NATARAJAN_3')), (K, ThermalConductivityLiquid, ('VDI_PPDS', 'DIPPR_PERRY_8E', 'Fit 2023')), (CP, HeatCapacityLiquid, ('ZABRANSKY_QUASIPOLYNOMIAL', 'ZABRANSKY_QUASIPOLYNOMIAL_C'))):
            engine = cls(CASRN=cas)
            for method in methods:
                if liquid is None or method not in engine.all_methods:
                    continue
                for T in between(*liquid, 7):
                    value = engine.calculate(T, method)
                    add(name, prop, T, mass / value if prop == RHO else value / mass if prop == CP else value, {'V': 'vdi', 'D': 'perry', 'Z': 'zabransky', 'F': 'thermo fit 2023'}[method[0]] if method[:3] != 'VIS' else 'viswanath')

    for name, cas in (('sodium acetate trihydrate', '6131-90-4'), ('rock salt', '7647-14-5')):
        add(name, 'meltingTemperature', 300, chemicals.Tm(cas), 'crc')

    # Catalysts and supports: heat capacity and density of what they are made of (JANAF), with the void fraction of the record.
    with open(os.path.join(DATA, 'Heat Capacity', 'JANAF_1998_solid_Cp.json')) as file:
        JANAF = json.load(file)
    for name, cas, mass, high in (('silica gel', '14808-60-7', 60.084, 800), ('activated carbon', '7440-44-0', 12.011, 873.15), ('iron catalyst', '1309-38-2', 231.533, 800)):
        for T, cp in zip(*JANAF[cas]):
            if 273.15 <= T <= high and T % 100 == 0:
                add(name, CP, T, cp / mass * 1000, 'janaf')
    corundum = minerals.cor()
    for T in between(300, 870, 7):
        corundum.set_state(1e5, T)
        for name in ('alumina catalyst support', 'nickel catalyst'):
            add(name, CP, T, corundum.molar_heat_capacity_p / corundum.molar_mass, 'holland-powell')
    # Skeletal densities, from memory: gamma-alumina 3300, amorphous silica 2200, carbon 2150, alpha-alumina 3900; the void fraction is that of the record.
    for name, grains, void in (('alumina catalyst support', 3300, 0.60), ('silica gel', 2200, 0.48), ('activated carbon', 2150, 0.65), ('nickel catalyst', 3900, 0.45)):
        add(name, RHO, 293.15, grains * (1 - void), 'grains and voids')
