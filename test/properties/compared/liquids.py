"""Writes liquids.csv: states of oils, fuels, waxes and some gases from independent works, held to the declared uncertainties.

Run with:  python3 test/properties/compared/liquids.py   (needs CoolProp 8.0.0, chemicals 1.5.2, PyYAML)
A class has no value of its own: what is compared is how its properties follow temperature and density. What stands by hand is from memory.
  perry           Perry's Chemical Engineers' Handbook, 8th ed. (2007), as chemicals 1.5.2 carries it
  vdi liquids     VDI Heat Atlas, 2nd ed. (2010), D3.1, as chemicals 1.5.2 carries it
  zabransky       Zabransky et al., critical compilation of heat capacities, as chemicals 1.5.2 carries it
  viswanath       Viswanath and Natarajan, Data Book on the Viscosity of Liquids (1989), as chemicals 1.5.2 carries it
  crc constants   CRC Handbook of Chemistry and Physics, melting points and heats of fusion, as chemicals 1.5.2 carries them
  perry mixed     73.5 % diphenyl ether and 26.5 % biphenyl by the values of Perry: volumes, heat capacities and conductivities by mass, logarithms of viscosity by mole, Raoult
  api 12A3.1      API Technical Data Book, conductivity of petroleum 0.164 - 1.277e-4 T (from memory)
  kesler-lee      API Technical Data Book 7D2.2, Kesler and Lee, heat capacity of petroleum by density and Watson factor (from memory)
  nbs c410        NBS Circular C410 (1936), expansion of petroleum by groups, from the density of the class at 15 degC (from memory)
  roelands        Roelands (1966), another law of viscosity and temperature, through ISO 3448 at 40 degC and index 97 by ASTM D2270 (from memory)
  kartoatmodjo    Kartoatmodjo and Schmidt, Oil Gas J. 92 (1994), dead crude (from memory)
  hexadecane      n-hexadecane by Perry, as a stand-in for diesel
  dodecane        n-dodecane by CoolProp 8.0.0 (Lemmon and Huber 2004, Huber et al. 2004), as a stand-in for kerosene
  heptane and toluene  the mean of both by CoolProp 8.0.0, as a stand-in for petrol
  methyl oleate   methyl oleate by CoolProp 8.0.0 (Huber et al. 2009), as a stand-in for biodiesel
  costald         Hankinson and Thomson (1979), evaluated by chemicals 1.5.2
  bergman-a5      Bergman, Lavine, Incropera and DeWitt, 7th ed. (2011), table A.5, R-22 (from memory)
  maker           data sheet of a maker of the oil as CoolProp 8.0.0 fits it (DowJ), which Melinder may rest on
  abhat           Abhat, Sol. Energy 30 (1983) 313, and Lane (1983), heats of fusion (from memory)
  kinetic theory  Chapman and Enskog with the constants of Poling, Prausnitz and O'Connell, 5th ed. (2001), appendix B, dilute gas (from memory)
"""
import math
import os
import sys

import chemicals
from chemicals.volume import COSTALD_mixture
from CoolProp.CoolProp import PropsSI

from table import HERE, Table, declared, record

sys.path.insert(0, os.path.join(HERE, '..', '..', '..', 'scripts', 'materials'))
from handbook import law  # noqa: E402

table = Table('liquids', 2e5)
FOUR = ('density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity')


def handbook(cas, prop, work):
    found = law(prop, 'liquid', work, cas, chemicals.MW(cas) / 1000)
    return (found[2], found[3] or 0, found[4] or 1e4) if found else None


# Waxes. Conductivity and the heat capacity of the paraffins are Perry's in the record.
for material, cas in (('hexadecane', '544-76-3'), ('octadecane', '593-45-3')):
    for prop, work, name in (('density', 'perry', 'perry'), ('density', 'vdi', 'vdi liquids'), ('viscosity', 'perry', 'perry'), ('viscosity', 'vdi', 'vdi liquids'), ('thermalConductivity', 'vdi', 'vdi liquids'), ('specificHeatCapacity', 'zabransky', 'zabransky')):
        value, low, high = handbook(cas, prop, work)
        table.curve(material, prop, name, value, low, high, phase='liquid')
    rho = handbook(cas, 'density', 'vdi')[0]
    table.curve(material, 'thermalExpansion', 'vdi liquids', lambda T, f=rho: (f(T - 1) - f(T + 1)) / 2 / f(T), phase='liquid')
table.curve('lauric acid', 'viscosity', 'viswanath', lambda T: 1e-3 * 10 ** (-1.7935 - 643.12 / (78.509 - T)), 320, 440, phase='liquid')
for material, cas in (('hexadecane', '544-76-3'), ('octadecane', '593-45-3'), ('lauric acid', '143-07-7')):
    T = declared(material, 'density', 'liquid')[0] + 1
    table.add(material, 'meltingTemperature', T, None, chemicals.Tm(cas), 'crc constants')
    table.add(material, 'fusionHeat', T, None, chemicals.Hfus(cas) / chemicals.MW(cas) * 1000, 'crc constants')

# The eutectic of diphenyl ether and biphenyl.
PARTS = {'101-84-8': 0.735, '92-52-4': 0.265}
moles = {cas: w / chemicals.MW(cas) for cas, w in PARTS.items()}
moles = {cas: n / sum(moles.values()) for cas, n in moles.items()}
laws = {prop: {cas: handbook(cas, prop, 'perry') for cas in PARTS} for prop in (*FOUR, 'vapourPressure')}
mixed = {
    'density': lambda f, T: 1 / sum(w / f[cas][0](T) for cas, w in PARTS.items()),
    'viscosity': lambda f, T: math.exp(sum(n * math.log(f[cas][0](T)) for cas, n in moles.items())),
    'thermalConductivity': lambda f, T: sum(w * f[cas][0](T) for cas, w in PARTS.items()),
    'specificHeatCapacity': lambda f, T: sum(w * f[cas][0](T) for cas, w in PARTS.items()),
    'vapourPressure': lambda f, T: sum(n * f[cas][0](T) for cas, n in moles.items()),
}
for prop, rule in mixed.items():
    f = laws[prop]
    # Perry's viscosity of diphenyl ether falls to 0.114 mPa s at 613 K, where biphenyl has 0.165 and the record 0.186: to 400 K.
    table.curve('diphenyl oxide-biphenyl', prop, 'perry mixed', lambda T: rule(f, T), max(f[cas][1] for cas in PARTS), 400 if prop == 'viscosity' else min(f[cas][2] for cas in PARTS), p=1.9e6)

# Petroleum: density at 15 degC and Watson factor.
GRADES = (10, 15, 22, 32, 46, 68, 100, 150, 220, 320, 460, 680)
CLASSES = {f'lubricating oil ISO VG {grade}': 12.0 for grade in GRADES} | {'engine oil': 12.0, 'diesel': 11.8, 'light oil': 11.8, 'kerosene': 11.9, 'petrol': 12.0, 'heavy fuel oil': 11.4, 'transformer oil': 11.6, 'white oil': 12.2, 'heat-transfer oil': 11.9, 'light crude oil': 12.0, 'medium crude oil': 11.8, 'heavy crude oil': 11.5, 'paraffinic thermal oil': 12.2}


def kesler_lee(s, K):
    def value(T):
        R = 1.8 * T
        a = -1.17126 + (0.023722 + 0.024907 * s) * K + (1.14982 - 0.046535 * K) / s
        b = 1e-4 * (1 + 0.82463 * K) * (1.12172 - 0.27634 / s)
        c = -1e-8 * (1 + 0.82463 * K) * (2.9027 - 0.70958 / s)
        return 4186.8 * (a + b * R + c * R * R)
    return value


def at15(material):
    entry = record(material)['density']
    c = entry['constants']
    if 'rows' in c and 'origin' not in c:
        (T1, a), (T2, b) = c['rows'][1:3]
        return a + (b - a) * (288.15 - T1) / (T2 - T1)
    if 'rows' in c:
        return sum(row[0] * (288.15 - c['origin']) ** i for i, row in enumerate(c['rows']))
    t = (288.15 if c.get('argument') != 'degC' else 15) - c.get('origin', 0)
    return sum(k * t ** i for i, k in enumerate(c['terms']))


def expansion(rho15):
    api = 141.5 / (rho15 / 999.016) - 131.5
    return 1.8 * next(alpha for top, alpha in ((15, 3.5e-4), (35, 4e-4), (51, 5e-4), (64, 6e-4), (79, 7e-4)) if api < top)


for material, K in CLASSES.items():
    rho15 = at15(material)
    table.curve(material, 'specificHeatCapacity', 'kesler-lee', kesler_lee(rho15 / 999.016, K))
    if material not in ('diesel', 'kerosene', 'petrol', 'light oil'):
        table.curve(material, 'thermalConductivity', 'api 12A3.1', lambda T: 0.164 - 1.277e-4 * T, high=422)
    table.curve(material, 'density', 'nbs c410', lambda T: rho15 / (1 + expansion(rho15) * (T - 288.71)), high=422)

# Lowest viscosity at 100 degC of each band of ASTM D2270, with the parabolas of L and H.
D2270 = ((2.0, 1.14673, 1.7576, -0.109, 0.84155, 1.5521, -0.077), (3.8, 3.38095, -15.4952, 33.196, 0.78571, 1.6929, -0.183), (4.4, 2.5, -7.2143, 13.812, 0.82143, 1.5650, 0.119), (5.0, 0.101, 16.635, -45.469, 0.04985, 9.1613, -18.557), (6.4, 3.35714, -23.5643, 78.466, 0.22619, 7.7369, -16.656), (7.0, 0.01191, 21.475, -72.870, 0.79762, -0.7321, 14.610), (7.7, 0.41858, 16.1558, -56.040, 0.05794, 10.5156, -28.240), (9.0, 0.88779, 7.5527, -16.600, 0.26665, 6.7015, -10.810), (12, 0.76720, 10.7972, -38.180, 0.20073, 8.4658, -22.490), (15, 0.97305, 5.3135, -2.200, 0.28889, 5.9741, -4.930), (18, 0.97256, 5.25, -0.980, 0.24504, 7.4160, -16.730), (22, 0.91413, 7.4759, -21.820, 0.20323, 9.1267, -34.230), (28, 0.87031, 9.7157, -50.770, 0.18411, 10.1015, -46.750))


def index(nu40, nu100):
    row = next(row for row in reversed(D2270) if nu100 >= row[0])
    L, H = (a * nu100 ** 2 + b * nu100 + c for a, b, c in (row[1:4], row[4:7]))
    return 100 * (L - nu40) / (L - H)


def at100(nu40, wanted=97):
    low, high = 2.0, nu40 / 2
    for _ in range(60):
        middle = (low + high) / 2
        low, high = (middle, high) if index(nu40, middle) < wanted else (low, middle)
    return low


for grade in GRADES:
    material = f'lubricating oil ISO VG {grade}'
    rho = lambda T, a=at15(material): a * (1 - 6.4e-4 * (T - 288.15))
    ends = [(t, math.log10(math.log10(1e-3 * nu * rho(273.15 + t)) + 1.2)) for t, nu in ((40, grade), (100, at100(grade)))]
    slope = (ends[1][1] - ends[0][1]) / (math.log10(1 + 100 / 135) - math.log10(1 + 40 / 135))
    table.curve(material, 'viscosity', 'roelands', lambda T: 1e-3 * 10 ** (10 ** (ends[0][1] + slope * (math.log10(1 + (T - 273.15) / 135) - math.log10(1 + 40 / 135))) - 1.2))
for material, api in (('light crude oil', 38), ('medium crude oil', 28), ('heavy crude oil', 18)):
    def kartoatmodjo(T, api=api):
        F = 1.8 * (T - 273.15) + 32
        return 16e5 * F ** -2.8177 * math.log10(api) ** (5.7526 * math.log10(F) - 26.9718)
    table.curve(material, 'viscosity', 'kartoatmodjo', kartoatmodjo)
for material in ('diesel', 'light oil'):
    table.curve(material, 'viscosity', 'hexadecane', handbook('544-76-3', 'viscosity', 'perry')[0], 292)
for material, fluids, name in (('kerosene', ('n-Dodecane',), 'dodecane'), ('petrol', ('n-Heptane', 'Toluene'), 'heptane and toluene')):
    table.curve(material, 'thermalConductivity', name, lambda T: sum(PropsSI('L', 'T', T, 'P', 5e5, one) for one in fluids) / len(fluids), 264)
for material in ('diesel', 'light oil'):
    table.curve(material, 'thermalConductivity', 'hexadecane', handbook('544-76-3', 'thermalConductivity', 'perry')[0], 292)
table.curve('kerosene', 'viscosity', 'dodecane', lambda T: PropsSI('V', 'T', T, 'P', 5e5, 'n-Dodecane'), 264)
for prop, letter in (('density', 'D'), ('specificHeatCapacity', 'C')):
    table.curve('biodiesel', prop, 'methyl oleate', lambda T: PropsSI(letter, 'T', T, 'P', 2e5, 'MethylOleate'), 275)

for prop, letter in zip(FOUR, 'DVLC'):
    table.curve('diethylbenzene thermal oil', prop, 'maker', lambda T: PropsSI(letter, 'T', T, 'P', 2e5, 'INCOMP::DowJ'))
for material, heat in (('erythritol', 339.8e3), ('calcium chloride hexahydrate', 190.8e3), ('sodium acetate trihydrate', 264e3)):
    table.add(material, 'fusionHeat', declared(material, 'density', 'liquid')[0] + 1, None, heat, 'abhat')
# Two gases of one atom by kinetic theory: size [nm] and depth [K] of the force between them.
for material, M, size, depth in (('krypton', 83.798, 0.3655, 178.9), ('xenon', 131.293, 0.4047, 231.0)):
    def kinetic(T):
        s = T / depth
        omega = 1.16145 * s ** -0.14874 + 0.52487 * math.exp(-0.77320 * s) + 2.16178 * math.exp(-2.43787 * s)
        return 2.669e-8 * math.sqrt(M * T) / (size ** 2 * omega)
    table.curve(material, 'viscosity', 'kinetic theory', kinetic, 250, p=1e4)
    table.curve(material, 'thermalConductivity', 'kinetic theory', lambda T: 3.75 * 8.314462 / (M / 1000) * kinetic(T), 250, p=1e4)

# A third work for the liquid, where two programs lie 20 % apart.
table.add('R-22', 'viscosity', 230, None, 355e-6, 'bergman-a5')

# LNG of 92 % methane, 6 % ethane, 1.5 % propane, 0.5 % nitrogen by mole.
GASES = {'74-82-8': 0.92, '74-84-0': 0.06, '74-98-6': 0.015, '7727-37-9': 0.005}
data = chemicals.volume.rho_data_COSTALD
mass = sum(x * chemicals.MW(cas) for cas, x in GASES.items()) / 1000
table.curve('LNG', 'density', 'costald', lambda T: mass / COSTALD_mixture(list(GASES.values()), T, [chemicals.Tc(cas) for cas in GASES], [data.at[cas, 'Vchar'] for cas in GASES], [data.at[cas, 'omega_SRK'] for cas in GASES]), p=1e6)
table.write()
