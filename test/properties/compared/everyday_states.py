"""The rows that everyday-solids.py writes, and what its parts share: names of properties, steps, the change of heat capacities with temperature."""
ROWS = []
RHO, K, CP, BETA = 'density', 'thermalConductivity', 'specificHeatCapacity', 'thermalExpansion'


def add(material, prop, T, value, reference):
    ROWS.append([material, prop, f'{T:.6g}', '101325', '', f'{value:.5g}', reference])


def between(low, high, n):
    return [low + (high - low) * i / (n - 1) for i in range(n)]


# How the heat capacity changes with temperature: rocks and what is burnt or cast of them by Waples and Waples 2004, organic solids by Van Krevelen.
def waples(T):
    t = T - 273.15
    return 0.716 + 0.00172 * t - 2.13e-6 * t ** 2 + 8.95e-10 * t ** 3


def krevelen(T):
    return 0.106 + 0.003 * T
