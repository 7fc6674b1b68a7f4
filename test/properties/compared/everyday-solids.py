"""Writes everyday-solids.csv: states of non-metallic solids from independent references, held to the declared uncertainties.

Run with:  python3 test/properties/compared/everyday-solids.py   (needs gsw 3.6.23, CoolProp 8.0.0, ht 1.2.0, fluids 1.3.1, chemicals 1.5.2, thermo 0.6.1, burnman 1.1.0, xraylib 4.3.0, cryopy 0.0.80)
Published formulas and the data of packages stand in the modules everyday_*.py beside this script, single printed values in everyday_points.py.
Each row names its reference. A reference counts as independent where its work is another one than that of the record:
  iapws-06        Gibbs function of ice Ih, Feistel and Wagner 2006, as in gsw
  iso 10456, ashrae   tables of ht; a record that is one of them is held to the other
  nist            densities of the NIST compound list, as in xraylib
  nist cryogenic  fits of Marquardt, Le and Radebaugh 2000, as in cryopy
  holland-powell  thermodynamic data set of minerals, Holland and Powell 2011, as in burnman: density, heat capacity, expansion of the grains
  crc, perry, vdi, zabransky, janaf, viswanath    as carried by chemicals and thermo
  the others      formulas, each with its author; constants from memory
Where works differ and the record stands between them, each of them is a row: its difference is then that of the literature.
'grains and voids' takes the void fraction of the record, so that it tells no more than that density and voids fit.
Rubbers of NIST are without filler. The heat capacity 1000 J/(kg K) that ISO 10456 prints for all stone, and that of the plaster board of ASHRAE (of wood board), are left out.
"""
import csv
import os
import warnings

warnings.filterwarnings('ignore')

from everyday_built import built
from everyday_ground import ground
from everyday_points import POINTS
from everyday_states import ROWS, add
from everyday_substances import substances

built()
ground()
substances()
for point in POINTS:
    add(*point)

with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'everyday-solids.csv'), 'w', newline='') as out:
    writer = csv.writer(out, lineterminator='\n')
    writer.writerow(['material', 'property', 'T [K]', 'p [Pa]', 'share', 'value [SI]', 'reference'])
    writer.writerows(ROWS)
print(len(ROWS), len({row[0] for row in ROWS}))
