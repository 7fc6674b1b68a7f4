import { atoms } from './atoms.ts';
import { definitions, type Definition } from './definitions.ts';
import { baseProduct, type Dimension } from './dimension.ts';

/** One named unit with its prefix worked in. */
export interface Atom {
  readonly factor: number;
  readonly offset: number;
  readonly dimension: Dimension;
  readonly counts?: Definition['counts'];
  readonly assumed?: string;
}

// Greater and smaller prefixes are left out: PA and Pm are slips of the shift key far more often than petaamperes.
const short = 'T:1e12 G:1e9 M:1e6 k:1e3 h:1e2 da:1e1 d:1e-1 c:1e-2 m:1e-3 u:1e-6 n:1e-9 p:1e-12';
const long = 'tera:1e12 giga:1e9 mega:1e6 kilo:1e3 hecto:1e2 deca:1e1 deci:1e-1 centi:1e-2 milli:1e-3 micro:1e-6 nano:1e-9 pico:1e-12';
const pairs = (text: string): readonly (readonly [string, number])[] => text.split(' ').map((pair) => [pair.split(':')[0] as string, Number(pair.split(':')[1])]);
const shortPrefixes = pairs(short);
const longPrefixes = pairs(long);

/** Names that take the short prefixes (mPa, kbar), and those spelt out that take the long ones (kilopascal). */
const takesShort = new Set('m g s A K mol cd N Pa J W V ohm S T Wb H coulomb farad lm lx Hz L l t bar torr Torr cal cal_th cal_IT cal(th) cal(IT) P St eV Wh VA Bq kat rad sr B gauss Gal dyn darcy Da'.split(' '));
const takesLong = new Set('meter meters metre metres gram grams second seconds ampere amperes kelvin mole moles newton newtons pascal pascals joule joules watt watts volt volts ohms hertz litre litres liter liters tonne tonnes poise stokes calorie calories byte bytes tesla farads henry'.split(' '));

/** Other spellings of names in the table. */
const spellings = 'L=l liter=l liters=l metre=m metres=m Torr=torr hr=h hrs=h sec=s secs=s mins=min yr=year wk=week day=d º=deg °=deg °C=degC °F=degF °R=degR ºC=degC ºF=degF degc=degC degf=degF Celsius=degC Fahrenheit=degF Rankine=degR Kelvin=K Ω=ohm Ohm=ohm Å=angstrom ‰=permil ΔK=dK micron=um microns=um cps=cP';

const spelling = new Map(spellings.split(' ').map((pair) => [pair.split('=')[0] as string, pair.split('=')[1] as string]));

type Row = Omit<Definition, 'source' | 'names'>;
let table: Map<string, Row> | undefined;

function rows(): Map<string, Row> {
  if (table === undefined) {
    table = new Map();
    for (const [names, factor, product, counts] of atoms) for (const name of names.split(' ')) table.set(name, counts === undefined ? { factor, product } : { factor, product, counts });
    for (const one of definitions) for (const name of one.names.split(' ')) table.set(name, one);
    table.set('month', { ...(table.get('month') as Row), assumed: 'the month is 1/12 of a year of 365.25 days' });
    table.set('year', { ...(table.get('year') as Row), assumed: 'the year has 365.25 days' });
    table.set('ppt', { ...(table.get('ppt') as Row), assumed: 'ppt is parts per trillion, 1e-12' });
  }
  return table;
}

function made(row: Row, times: number): Atom {
  return {
    factor: times < 1 ? row.factor / Math.round(1 / times) : row.factor * times,
    offset: row.offset ?? 0,
    dimension: baseProduct(row.product),
    ...(row.counts === undefined ? {} : { counts: row.counts }),
    ...(row.assumed === undefined ? {} : { assumed: row.assumed }),
  };
}

/**
 * A unit name with or without prefix. Names win over prefixed names: `min` is the minute, `dK` a difference, `Pa` the pascal.
 *
 * @param name  one name, without exponent
 * @returns     factor and dimension, or undefined where there is none of that name
 */
export function findAtom(name: string): Atom | undefined {
  const plain = spelling.get(name) ?? name;
  const own = rows().get(plain);
  if (own !== undefined) return made(own, 1);
  for (const [prefixes, allowed] of [[shortPrefixes, takesShort], [longPrefixes, takesLong]] as const) {
    for (const [prefix, times] of prefixes) {
      const rest = plain.slice(prefix.length);
      if (!plain.startsWith(prefix) || !allowed.has(rest)) continue;
      const row = rows().get(spelling.get(rest) ?? rest);
      if (row !== undefined) return made(row, times);
    }
  }
  return undefined;
}

/** Names for a suggestion: all of the table and the prefixed ones in daily use. */
export function knownNames(): readonly string[] {
  return [...rows().keys(), ...spelling.keys(), ...'um nm kJ MJ kN MN kPa MPa hPa mbar mPa uPa cP mN kmol mmol kcal kHz MHz mT mV kV mA mW kW MW kg mg ug ms us ns GB MB TB kB mL uL hL cSt dm'.split(' ')];
}
