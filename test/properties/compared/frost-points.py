"""Writes frost-points.csv: dew and frost points of humid air from an independent reference, held to the declared uncertainty.

Run with:  python3 test/properties/compared/frost-points.py   (needs CoolProp 8.0.0)
The share of a row is the relative humidity over liquid water. Each row names its reference:
  rp-1485    dew or frost point of humid air by ASHRAE RP-1485 (Herrmann, Kretzschmar and Gatley 2009; ice by IAPWS R10-06), evaluated by CoolProp
"""
from CoolProp.HumidAirProp import HAPropsSI

from table import Table

table = Table('frost-points')
for p in (50e3, 101325, 300e3, 800e3):
    for T in (273.2, 278.15, 283.15, 293.15, 303.15, 323.15):
        for humidity in (0.01, 0.05, 0.1, 0.2, 0.3, 0.5, 0.8, 1):
            table.add('humid air', 'saturationTemperature', T, humidity, HAPropsSI('Tdp', 'T', T, 'P', p, 'R', humidity), 'rp-1485', p)
table.write()
