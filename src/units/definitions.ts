/** One unit of ours: names, factor to SI, product of SI base units, year and source of the definition, and what else it brings. */
export interface Definition {
  readonly names: string;
  readonly factor: number;
  readonly product: string;
  readonly source: string;
  /** Added after the factor: the zero of a temperature scale [K]. */
  readonly offset?: number;
  /** The name allows other readings; this says which one is taken. */
  readonly assumed?: string;
  /** `angle` counts radians, `cycle` turns, `byte` bytes, `difference` a temperature difference. */
  readonly counts?: 'angle' | 'cycle' | 'byte' | 'difference';
}

const si = 'SI Brochure, 9th ed. (BIPM 2019)';
const sp811 = 'NIST SP 811 (2008), appendix B';
const yard = 'yard and pound agreement of 1959: 1 yd = 0.9144 m, 1 lb = 0.45359237 kg';
const gallon = 'US liquid gallon of 231 in3 (1836, with the inch of 1959)';
const imperial = 'UK Weights and Measures Act 1985: 4.54609 L';
const steamTables = 'International Steam Table conference, London 1956: 1 kcal/kg = 4186.8 J/kg; the Btu follows with 1 lb and 5/9 K';
const millimetres = 'conventional mercury of 13 595.1 kg/m3 under 9.80665 m/s2 (ISO 80000-4; NIST SP 811)';

const inch = 0.0254;
const foot = 0.3048;
const pound = 0.45359237;
const gravity = 9.80665;
const usGallon = 231 * inch ** 3;
const ukGallon = 0.00454609;
const poundForce = pound * gravity;
const btu = 4186.8 * pound * (5 / 9);
const calorie = 4.184;
const mercury = 133.322387415;
const water = gravity;
const turn = 2 * Math.PI;

const force = 'kg m s-2';
const pressure = 'kg m-1 s-2';
const energy = 'kg m2 s-2';
const power = 'kg m2 s-3';

const row = (names: string, factor: number, product: string, source: string, more: Partial<Definition> = {}): Definition => ({ names, factor, product, source, ...more });

/** Units that convert-units lacks, or has with a factor that is off by more than 1e-12. Constants follow from their definitions. */
export const definitions: readonly Definition[] = [
  // SI units and what is used with them
  row('K kelvin kelvins', 1, 'K', si),
  row('mol mole moles', 1, 'mol', si),
  row('cd candela', 1, 'cd', si),
  row('sr', 1, '', si),
  row('N newton newtons', 1, force, si),
  row('ohm ohms', 1, 'kg m2 s-3 A-2', si),
  row('S siemens', 1, 'kg-1 m-2 s3 A2', si),
  row('T tesla', 1, 'kg s-2 A-1', si),
  row('Wb weber', 1, 'kg m2 s-2 A-1', si),
  row('H henry', 1, 'kg m2 s-2 A-2', si),
  row('coulomb coulombs', 1, 's A', si),
  row('farad farads', 1, 'kg-1 m-2 s4 A2', si),
  row('lm lumen', 1, 'cd', si),
  row('Bq becquerel', 1, 's-1', si),
  row('kat katal', 1, 's-1 mol', si),
  row('t tonne tonnes', 1000, 'kg', si, { assumed: 't is the tonne of 1000 kg' }),
  row('Da dalton', 1.66053906660e-27, 'kg', 'CODATA 2018'),
  row('eV', 1.602176634e-19, energy, si),
  row('angstrom', 1e-10, 'm', si),
  row('cc', 1e-6, 'm3', 'cubic centimetre'),
  row('gn', gravity, 'm s-2', 'standard acceleration of free fall, CGPM 1901'),
  // temperature
  row('degC celsius', 1, 'K', si, { offset: 273.15 }),
  row('degF fahrenheit', 5 / 9, 'K', sp811, { offset: (459.67 * 5) / 9 }),
  row('degR rankine', 5 / 9, 'K', sp811),
  row('dK ddegC delta_K delta_degC', 1, 'K', si, { counts: 'difference' }),
  row('ddegF ddegR delta_degF delta_degR', 5 / 9, 'K', sp811, { counts: 'difference' }),
  // shares, angles, turns, bytes
  row('% percent', 0.01, '', 'ISO 80000-1'),
  row('permil', 0.001, '', 'ISO 80000-1'),
  row('rev turn revolution revolutions', turn, '', 'ISO 80000-3: one revolution is 2 pi rad', { counts: 'angle' }),
  row('rpm', turn / 60, 's-1', 'ISO 80000-3: one revolution is 2 pi rad', { counts: 'angle' }),
  row('rps', turn, 's-1', 'ISO 80000-3: one revolution is 2 pi rad', { counts: 'angle' }),
  row('cycle cycles', 1, '', 'ISO 80000-3', { counts: 'cycle' }),
  row('B byte bytes', 1, '', 'IEC 80000-13', { counts: 'byte' }),
  row('KiB', 1024, '', 'IEC 80000-13', { counts: 'byte' }),
  row('MiB', 1024 ** 2, '', 'IEC 80000-13', { counts: 'byte' }),
  row('GiB', 1024 ** 3, '', 'IEC 80000-13', { counts: 'byte' }),
  row('TiB', 1024 ** 4, '', 'IEC 80000-13', { counts: 'byte' }),
  // length, area, volume
  row('in inch inches', inch, 'm', yard),
  row('ft foot feet', foot, 'm', yard),
  row('yd yard yards', 3 * foot, 'm', yard),
  row('mi mile miles', 5280 * foot, 'm', yard, { assumed: 'the mile is the international mile of 1609.344 m' }),
  row('mil mils thou', inch / 1000, 'm', yard),
  row('fathom fathoms', 6 * foot, 'm', yard, { assumed: 'the fathom is 6 international feet' }),
  row('ft(US_survey)', 1200 / 3937, 'm', 'Mendenhall order of 1893: 1 m = 39.37 in, withdrawn 2022'),
  row('nmi nMi', 1852, 'm', 'International Hydrographic Conference, Monaco 1929'),
  row('ac acre acres', 4840 * (3 * foot) ** 2, 'm2', yard, { assumed: 'the acre is the international one of 4840 yd2' }),
  row('gal(US) usgal', usGallon, 'm3', gallon),
  row('gal gallon gallons', usGallon, 'm3', gallon, { assumed: 'the gallon is the US liquid gallon; write "UK gal" for the imperial one' }),
  row('gal(UK) igal', ukGallon, 'm3', imperial),
  row('qt quart quarts', usGallon / 4, 'm3', gallon, { assumed: 'the quart is the US liquid quart' }),
  row('pt pnt pint pints', usGallon / 8, 'm3', gallon, { assumed: 'the pint is the US liquid pint' }),
  row('cup cups', usGallon / 16, 'm3', gallon, { assumed: 'the cup is the US cup of 8 fl oz' }),
  row('fl_oz floz', usGallon / 128, 'm3', gallon, { assumed: 'the fluid ounce is the US one' }),
  row('fl_oz(US)', usGallon / 128, 'm3', gallon),
  row('fl_oz(UK)', ukGallon / 160, 'm3', imperial),
  row('Tbs tbsp tablespoon tablespoons', usGallon / 256, 'm3', gallon, { assumed: 'the tablespoon is the US one' }),
  row('tsp teaspoon teaspoons', usGallon / 768, 'm3', gallon, { assumed: 'the teaspoon is the US one' }),
  row('bbl barrel barrels', 42 * usGallon, 'm3', 'petroleum barrel of 42 US gallons (API)', { assumed: 'the barrel is the petroleum barrel of 42 US gallons' }),
  // speed and volume flow in short form
  row('mph', (5280 * foot) / 3600, 'm s-1', yard),
  row('kn knot knots', 1852 / 3600, 'm s-1', 'International Hydrographic Conference, Monaco 1929'),
  row('cfm', foot ** 3 / 60, 'm3 s-1', yard),
  row('gpm', usGallon / 60, 'm3 s-1', gallon, { assumed: 'the gallon is the US liquid gallon; write "UK gal/min" for the imperial one' }),
  // mass
  row('lb lbm pound pounds lbs', pound, 'kg', yard),
  row('oz ounce ounces', pound / 16, 'kg', yard, { assumed: 'the ounce is the avoirdupois ounce, a mass; "fl oz" is the volume' }),
  row('gr grain grains', pound / 7000, 'kg', yard),
  row('slug slugs', poundForce / foot, 'kg', sp811),
  row('ton(short)', 2000 * pound, 'kg', yard),
  row('ton tons', 2000 * pound, 'kg', yard, { assumed: 'the ton is the short ton of 2000 lb; write "tonne" or "long ton" for the others' }),
  row('ton(long)', 2240 * pound, 'kg', yard),
  row('lbmol', 1000 * pound, 'mol', sp811),
  // force and pressure
  row('lbf', poundForce, force, 'yard and pound agreement of 1959 with the standard free fall of 1901'),
  row('kip', 1000 * poundForce, force, sp811),
  row('pdl poundal', pound * foot, force, sp811),
  row('kgf kp', gravity, force, 'standard acceleration of free fall, CGPM 1901'),
  row('dyn dyne', 1e-5, force, sp811),
  row('psi', poundForce / inch ** 2, pressure, sp811),
  row('ksi', (1000 * poundForce) / inch ** 2, pressure, sp811),
  row('psf', poundForce / foot ** 2, pressure, sp811),
  row('atm atmosphere atmospheres', 101325, pressure, 'standard atmosphere, CGPM 1954'),
  row('at', gravity * 1e4, pressure, sp811, { assumed: 'at is the technical atmosphere of 98 066.5 Pa; atm is the standard one' }),
  row('mmHg mmHg(conventional)', mercury, pressure, millimetres),
  row('cmHg', 10 * mercury, pressure, millimetres),
  row('inHg inHg(conventional)', 25.4 * mercury, pressure, millimetres, { assumed: 'inHg is the conventional column' }),
  row('mmH2O', water, pressure, 'conventional water of 1000 kg/m3 (NIST SP 811)', { assumed: 'a water column of 1000 kg/m3 under standard gravity' }),
  row('cmH2O', 10 * water, pressure, 'conventional water of 1000 kg/m3 (NIST SP 811)', { assumed: 'a water column of 1000 kg/m3 under standard gravity' }),
  row('mH2O mWC', 1000 * water, pressure, 'conventional water of 1000 kg/m3 (NIST SP 811)', { assumed: 'a water column of 1000 kg/m3 under standard gravity' }),
  row('inH2O', 25.4 * water, pressure, 'conventional water of 1000 kg/m3 (NIST SP 811)', { assumed: 'a water column of 1000 kg/m3 under standard gravity' }),
  row('ftH2O', 304.8 * water, pressure, 'conventional water of 1000 kg/m3 (NIST SP 811)', { assumed: 'a water column of 1000 kg/m3 under standard gravity' }),
  // energy and power
  row('Btu BTU btu', btu, energy, steamTables, { assumed: 'the Btu is the International Table one, 1055.056 J' }),
  row('Btu(IT) Btu_IT', btu, energy, steamTables),
  row('Btu(th) Btu_th', calorie * 1000 * pound * (5 / 9), energy, 'NIST SP 811: thermochemical calorie of 4.184 J'),
  row('kBtu kBTU', 1000 * btu, energy, steamTables, { assumed: 'the Btu is the International Table one, 1055.056 J' }),
  row('MMBtu MMBTU', 1e6 * btu, energy, steamTables, { assumed: 'the Btu is the International Table one, 1055.056 J; MM is a million' }),
  row('therm', 1e5 * btu, energy, steamTables, { assumed: 'the therm is 100 000 Btu of the International Table' }),
  row('cal calorie calories', calorie, energy, 'NIST SP 811: thermochemical calorie of 4.184 J', { assumed: 'the calorie is the thermochemical one of 4.184 J; write cal_IT for 4.1868 J' }),
  row('cal(th) cal_th', calorie, energy, 'NIST SP 811: thermochemical calorie of 4.184 J'),
  row('cal(IT) cal_IT', 4.1868, energy, steamTables),
  row('erg', 1e-7, energy, sp811),
  row('hp horsepower', 550 * foot * poundForce, power, sp811, { assumed: 'the horsepower is the mechanical one of 550 ft lbf/s; write "hp (metric)" for 735.499 W' }),
  row('hp(mechanical)', 550 * foot * poundForce, power, sp811),
  row('hp(metric) PS', 75 * gravity, power, sp811),
  row('hp(electric)', 746, power, sp811),
  row('hp(boiler)', 9809.5, power, sp811),
  row('tonref', (12000 * btu) / 3600, power, '12 000 Btu/h, International Table'),
  // transport properties and others
  row('P poise', 0.1, 'kg m-1 s-1', 'cgs unit, NIST SP 811'),
  row('St stokes', 1e-4, 'm2 s-1', 'cgs unit, NIST SP 811'),
  row('reyn', poundForce / inch ** 2, 'kg m-1 s-1', 'lbf s/in2, NIST SP 811'),
  row('darcy', 1e-7 / 101325, 'm2', 'by its definition: 1 cP times 1 cm/s per 1 atm/cm'),
  row('clo', 0.155, 's3 K kg-1', 'ISO 9920: 0.155 m2 K/W'),
  row('gauss', 1e-4, 'kg s-2 A-1', 'cgs unit, NIST SP 811'),
  row('Gal', 0.01, 'm s-2', 'cgs unit, NIST SP 811', { assumed: 'Gal is the galileo of 1 cm/s2' }),
  row('footcandle', 1 / foot ** 2, 'cd m-2', 'lumen per square foot, NIST SP 811'),
];
