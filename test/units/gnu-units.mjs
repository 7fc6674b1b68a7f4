// Writes test/units/gnu-units.json: factors between units, computed by GNU units 2.22 (Debian package `units`), an
// independent program with its own definitions. Run by hand: node test/units/gnu-units.mjs. Each family lists names as
// [ours, theirs] (or one text where both agree) and is converted pairwise, at most `most` pairs of it.
import { execFileSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';

const families = {
  length: ['m', 'km', 'cm', 'mm', 'um', 'nm', 'in', 'ft', 'yd', ['mile', 'mile'], 'mil', ['nmi', 'nauticalmile'], 'angstrom', 'fathom', ['US survey foot', 'US ft']],
  area: ['m^2', ['cm2', 'cm^2'], ['mm²', 'mm^2'], ['in2', 'in^2'], ['ft^2', 'ft^2'], ['acre', '4840 yd^2'], 'ha', ['yd2', 'yd^2']],
  volume: ['m^3', 'L', 'mL', ['cc', 'cm^3'], ['US gal', 'gallon'], ['UK gal', 'brgallon'], ['qt', 'quart'], ['pt', 'pint'], 'cup', ['fl oz', 'floz'], 'tbsp', 'tsp', ['ft3', 'ft^3'], ['in3', 'in^3'], ['bbl', '42 gallon'], 'hL'],
  mass: ['kg', 'g', 'mg', ['ug', 'ug'], ['t', 'tonne'], ['lb', 'lb'], ['oz', 'oz'], 'grain', 'slug', ['short ton', 'shortton'], ['long ton', 'longton'], ['Da', 'atomicmassunit']],
  time: ['s', 'ms', 'us', 'ns', 'min', ['h', 'hr'], ['d', 'day'], 'week', ['year', '365.25 day']],
  speed: ['m/s', ['km/h', 'km/hr'], 'mph', ['knot', 'knot'], 'ft/s', ['ft/min', 'ft/min'], 'in/s', 'cm/s'],
  acceleration: ['m/s^2', 'ft/s^2', 'cm/s^2', ['gn', 'gravity']],
  force: ['N', 'kN', 'mN', 'lbf', 'kgf', 'dyn', ['kip', '1000 lbf'], ['poundal', 'poundal']],
  pressure: ['Pa', 'kPa', 'MPa', 'bar', 'mbar', 'hPa', 'atm', 'torr', 'psi', ['ksi', '1000 psi'], ['psf', 'lbf/ft^2'], 'mmHg', ['inHg', 'inHg'], ['mmH2O', 'mm water'], ['inH2O', 'inch water'], ['cmH2O', 'cm water'], ['mH2O', 'm water'], ['dyn/cm2', 'dyn/cm^2'], ['at', 'kgf/cm^2'], ['N/mm^2', 'N/mm^2']],
  energy: ['J', 'kJ', 'MJ', ['kWh', 'kW hr'], ['Wh', 'W hr'], ['Btu', 'btu_IT'], ['Btu (th)', 'btu_th'], ['MMBtu', '1e6 btu_IT'], ['cal', 'cal_th'], ['cal (IT)', 'cal_IT'], ['kcal', '1000 cal_th'], 'erg', 'eV', ['ft lbf', 'ft lbf'], ['therm', '1e5 btu_IT']],
  power: ['W', 'kW', 'MW', 'mW', 'hp', ['hp (metric)', 'metrichorsepower'], ['Btu/h', 'btu_IT/hr'], ['ft lbf/s', 'ft lbf/s'], ['ton of refrigeration', '12000 btu_IT/hr'], ['kcal/h', '1000 cal_th/hr']],
  viscosity: ['Pa s', 'mPa s', 'uPa s', 'P', 'cP', ['lb/(ft s)', 'lb/(ft s)'], ['lb/(ft h)', 'lb/(ft hr)'], ['lbf s/ft^2', 'lbf s/ft^2'], ['reyn', 'lbf s/in^2'], ['kg/(m h)', 'kg/(m hr)'], ['g/(cm s)', 'g/(cm s)']],
  kinematic: ['m^2/s', ['mm2/s', 'mm^2/s'], 'St', 'cSt', ['ft2/s', 'ft^2/s'], ['ft2/h', 'ft^2/hr'], ['in^2/s', 'in^2/s'], ['cm2/s', 'cm^2/s'], ['m2/h', 'm^2/hr']],
  density: ['kg/m^3', 'g/cm^3', 'g/L', ['lb/ft3', 'lb/ft^3'], ['lb/in^3', 'lb/in^3'], ['lb/US gal', 'lb/gallon'], ['slug/ft^3', 'slug/ft^3'], ['kg·m⁻³', 'kg/m^3'], ['t/m^3', 'tonne/m^3'], ['mg/L', 'mg/L']],
  volumeFlow: ['m^3/s', ['m^3/h', 'm^3/hr'], 'L/s', 'L/min', ['US gal/min', 'gallon/min'], ['gpm', 'gallon/min'], ['UK gal/min', 'brgallon/min'], ['cfm', 'ft^3/min'], ['ft3/s', 'ft^3/s'], ['bbl/day', '42 gallon/day'], ['mL/min', 'mL/min'], ['in3/h', 'in^3/hr']],
  massFlow: ['kg/s', ['kg/h', 'kg/hr'], ['lb/h', 'lb/hr'], 'lb/s', 'lb/min', ['t/d', 'tonne/day'], ['g/s', 'g/s'], ['short ton/h', 'shortton/hr']],
  conductivity: ['W/(m K)', ['Btu/(h ft degF)', 'btu_IT/(hr ft degF)'], ['Btu in/(h ft2 degF)', 'btu_IT in/(hr ft^2 degF)'], ['cal/(s cm degC)', 'cal_th/(s cm degC)'], ['mW/(m K)', 'mW/(m K)'], ['kcal/(h m degC)', '1000 cal_th/(hr m degC)'], ['W m^-1 K^-1', 'W/(m K)']],
  coefficient: ['W/(m^2 K)', ['W m^-2 K^-1', 'W/(m^2 K)'], ['kW/(m2 K)', 'kW/(m^2 K)'], ['Btu/(h ft2 degF)', 'btu_IT/(hr ft^2 degF)'], ['kcal/(h m2 degC)', '1000 cal_th/(hr m^2 degC)'], ['cal/(s cm2 degC)', 'cal_th/(s cm^2 degC)'], ['W/(ft^2 degF)', 'W/(ft^2 degF)']],
  heatCapacity: ['J/(kg K)', 'kJ/(kg K)', ['Btu/(lb degF)', 'btu_IT/(lb degF)'], ['cal/(g degC)', 'cal_th/(g degC)'], ['kcal/(kg degC)', '1000 cal_th/(kg degC)'], ['ft lbf/(slug degR)', 'ft lbf/(slug degR)'], ['J/(g K)', 'J/(g K)']],
  heatFlux: ['W/m^2', ['kW/m²', 'kW/m^2'], ['Btu/(h ft2)', 'btu_IT/(hr ft^2)'], ['W/in^2', 'W/in^2'], ['cal/(s cm^2)', 'cal_th/(s cm^2)'], ['W/cm2', 'W/cm^2']],
  volumeSource: ['W/m^3', ['Btu/(h ft3)', 'btu_IT/(hr ft^3)'], ['kW/L', 'kW/L'], ['W/cm^3', 'W/cm^3']],
  latent: ['J/kg', 'kJ/kg', ['Btu/lb', 'btu_IT/lb'], ['cal/g', 'cal_th/g'], ['MJ/kg', 'MJ/kg'], ['m²/s²', 'm^2/s^2']],
  surfaceTension: ['N/m', 'mN/m', ['dyn/cm', 'dyn/cm'], ['lbf/ft', 'lbf/ft'], ['lbf/in', 'lbf/in'], ['J/m^2', 'J/m^2']],
  torque: ['N m', ['ft-lbf', 'ft lbf'], ['lbf in', 'lbf in'], ['kgf m', 'kgf m'], ['kN·m', 'kN m']],
  concentration: ['mol/m^3', 'mol/L', 'mmol/L', ['kmol/m3', 'kmol/m^3'], ['lb-mol/ft3', '453.59237 mol/ft^3']],
  molarMass: ['kg/mol', 'g/mol', 'kg/kmol', ['lb/lbmol', 'lb/(453.59237 mol)']],
  molarEnergy: ['J/mol', 'kJ/mol', ['kcal/mol', '1000 cal_th/mol'], ['Btu/lbmol', 'btu_IT/(453.59237 mol)'], ['J/kmol', 'J/kmol']],
  expansion: ['1/K', ['1/degF', '1/degF'], ['1/degC', '1/degC'], ['K^-1', '1/K'], ['ppm/K', '1e-6/K'], ['%/K', '0.01/K']],
  rate: ['1/s', ['1/min', '1/min'], ['1/h', '1/hr'], ['1/d', '1/day'], ['s⁻¹', '1/s']],
  permeability: ['m^2', ['darcy', 'darcy'], ['mdarcy', 'millidarcy'], ['um^2', 'um^2']],
  electric: ['V/m', ['kV/cm', 'kV/cm'], ['V/in', 'V/in']],
  magnetic: ['T', 'mT', 'gauss', ['Wb/m^2', 'Wb/m^2'], ['V s/m^2', 'V s/m^2']],
  electricConductivity: ['S/m', ['uS/cm', 'uS/cm'], ['1/(ohm m)', '1/(ohm m)'], ['mS/cm', 'mS/cm'], ['MS/m', 'MS/m']],
  pressureGradient: ['Pa/m', ['psi/ft', 'psi/ft'], ['inH2O/ft', 'inch water/ft'], ['bar/km', 'bar/km'], ['mbar/m', 'mbar/m']],
  heatCapacityFlow: ['W/K', ['Btu/(h degF)', 'btu_IT/(hr degF)'], ['kW/K', 'kW/K']],
  resistance: ['m^2 K/W', ['h ft2 degF/Btu', 'hr ft^2 degF/btu_IT'], ['clo', '0.155 m^2 K/W'], ['cm^2 K/W', 'cm^2 K/W']],
  difference: [['K', 'K'], ['delta_degF', 'degF'], ['dK', 'K'], ['degR', 'degR']],
  share: [['1', '1'], ['%', '0.01'], ['ppm', '1e-6'], ['ppb', '1e-9'], ['g/kg', 'g/kg'], ['mL/L', 'mL/L'], ['permil', '0.001']],
  angle: [['rad', 'radian'], ['deg', 'degree'], 'arcmin', 'arcsec', ['grad', 'grade'], ['rev', 'revolution']],
  angularVelocity: [['rad/s', 'radian/s'], ['rpm', 'revolution/min'], ['deg/s', 'degree/s'], ['rev/s', 'revolution/s'], ['rad/min', 'radian/min']],
};
const most = 16;

const gnu = (from, to) => Number(execFileSync('units', ['-t', '-o', '%.17g', from, to], { encoding: 'utf8' }).trim());
const version = execFileSync('units', ['--version'], { encoding: 'utf8' }).split('\n')[0];
const rows = [];
for (const names of Object.values(families)) {
  const pairs = names.flatMap((from, i) => names.flatMap((to, j) => (i === j ? [] : [[from, to, i === 0 || j === 0]])));
  // every unit against the first of its family in both directions, then a spread of the other pairs
  const others = pairs.filter(([, , first]) => !first);
  const step = Math.max(1, Math.ceil(others.length / most));
  for (const [from, to] of [...pairs.filter(([, , first]) => first), ...others.filter((_, k) => k % step === 0)]) {
    const [ours, theirs] = Array.isArray(from) ? from : [from, from];
    const [oursTo, theirsTo] = Array.isArray(to) ? to : [to, to];
    const factor = gnu(theirs, theirsTo);
    if (!Number.isFinite(factor)) throw new Error(`${theirs} to ${theirsTo}`);
    rows.push([ours, oursTo, factor]);
  }
}
writeFileSync(new URL('gnu-units.json', import.meta.url), `{ "source": ${JSON.stringify(version)}, "columns": ["from", "to", "factor"], "rows": [\n${rows.map((row) => JSON.stringify(row)).join(',\n')}\n] }\n`);
