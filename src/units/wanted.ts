import { type Dimension, dimensionText, sameDimension } from './dimension.ts';
import { type Unit, unit } from './unit-text.ts';

export type QuantityKind = 'temperature' | 'temperatureDifference' | 'pressure' | 'pressureDifference' | 'fraction' | 'volumeFlow' | 'plain';

/** What the place where a quantity stands expects. */
export interface Wanted {
  /** A unit as text (`Pa s`) or a dimension. */
  readonly unit?: string;
  readonly dimension?: Dimension;
  /** Where left out: a temperature for the dimension K, else plain. */
  readonly kind?: QuantityKind;
  /** The trade's word for it, for messages: `dynamic viscosity`. */
  readonly name?: string;
  /** The number for n in `Pa s^n`. */
  readonly exponentN?: number;
  /** A share of the quantity (`5 %`, `5 % of change`) may stand in its place. */
  readonly orShare?: boolean;
}

/** The wanted unit, looked up. */
export interface WantedUnit extends Pick<Unit, 'dimension' | 'angle' | 'cycle' | 'byte'> {
  readonly kind: QuantityKind;
  readonly name: string;
  /** For a message; worked out only when there is one. */
  readonly examples: () => string;
}

const kelvin: Dimension = [0, 0, 0, 1, 0, 0, 0];
const examples: Readonly<Record<string, string>> = {
  m: '25 mm, 0.5 m, 2 in',
  'm^2': '4 cm^2, 0.1 m^2',
  'm^3': '2 L, 0.1 m^3',
  s: '0.5 s, 20 min',
  kg: '2 kg, 5 g',
  'm s^-1': '0.4 m/s, 5 ft/s',
  'm s^-2': '9.81 m/s^2',
  'm^3 s^-1': '12 L/min, 400 m^3/h, 30 m^3/h normal',
  'm^2 s^-1': '1e-6 m^2/s, 1 cSt',
  'kg s^-1': '0.3 kg/s, 20 kg/h',
  'kg m^-3': '998 kg/m^3, 1 g/cm^3',
  'kg m^-1 s^-1': '1e-3 Pa s, 1 mPa s, 1 cP',
  'kg m^-1 s^-2': '5 Pa, 0.2 bar',
  'kg m^2 s^-3': '2 kW, 900 W',
  'kg s^-3': '5 W/m^2, 2 kW/m^2',
  'kg s^-3 K^-1': '6 W/(m^2 K)',
  'kg m s^-3 K^-1': '0.6 W/(m K)',
  'm^2 s^-2 K^-1': '4.18 kJ/(kg K)',
  'm^2 s^-2': '2257 kJ/kg',
  'K^-1': '2e-4 1/K',
  's^-1': '10 1/s, 50 Hz, 1500 rpm',
  'kg s^-2': '0.072 N/m, 72 mN/m',
  'kg mol^-1': '18.02 g/mol',
};
const byKind: Partial<Record<QuantityKind, string>> = {
  temperature: '20 degC, 293.15 K',
  temperatureDifference: '5 K, 9 degF, 5 K difference',
  pressure: '1 bar abs, 2 bar gauge, 1 atm',
  fraction: '45 %, 0.45',
};
const names: Partial<Record<QuantityKind, string>> = { temperature: 'temperature', temperatureDifference: 'temperature difference', pressure: 'pressure', pressureDifference: 'pressure difference', fraction: 'share', volumeFlow: 'volume flow' };

/** What is wanted, with its unit looked up and examples for a message. */
export function wantedUnit(want: Wanted): WantedUnit {
  const found = want.unit === undefined ? undefined : unit(want.unit, want.exponentN ?? 1);
  const dimension = found?.dimension ?? want.dimension ?? [0, 0, 0, 0, 0, 0, 0];
  const kind = want.kind ?? (sameDimension(dimension, kelvin) ? (found?.difference ? 'temperatureDifference' : 'temperature') : 'plain');
  const text = (): string => dimensionText(dimension);
  const counts = (): string | undefined => (found?.byte ? '64 GB, 500 MB' : text() === '1' ? (found?.angle ? '30 deg, 0.5 rad' : '0.45, 45 %') : undefined);
  return {
    dimension,
    angle: found?.angle ?? 0,
    cycle: found?.cycle ?? 0,
    byte: found?.byte ?? 0,
    kind,
    name: want.name ?? names[kind] ?? `quantity in ${want.unit === undefined || want.unit === '' ? text() : want.unit}`,
    examples: () => byKind[kind] ?? counts() ?? examples[text()] ?? `1 ${want.unit ?? text()}`,
  };
}
