import { reference, type Reference } from './define.ts';
import { entryAtFlux, entryAtTemperature, entryLength, entryPlaces, type Section } from './graetz-series.ts';

/** A section and its words; `lengthName` says what the hydraulic diameter is there. */
interface Entry {
  readonly flow: string;
  readonly section: Section;
  readonly where: string;
  /** Chapter of Shah and London (1978). */
  readonly chapter: string;
  readonly on: string;
  readonly lengthName: string;
  readonly formulas: { readonly local: string; readonly bulk: string; readonly flux: string };
}

/**
 * Thermal entry of developed laminar flow.
 *
 * @param entry  section, series and words
 * @returns      the reference `graetz-<flow>`
 */
export const graetzEntry = ({ flow, section, where, chapter, on, lengthName, formulas }: Entry): Reference => reference(`graetz-${flow}`, {
  title: `Thermal entry of developed laminar flow ${where}`,
  kind: 'exact',
  assumes: ['laminar', 'velocity developed', 'temperature uniform at the inlet', 'constant properties', 'no axial conduction', 'no heat from friction'],
  verifies: ['advection of heat', 'wall heat flux in a growing thermal layer', 'bulk temperature'],
  source: `Graetz 1883; eigenvalues of Kummer functions; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter ${chapter}`,
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'velocity developed from the inlet on; bulk temperature weighted with the flow; cells across the thermal layer near the inlet; axial conduction switched off or Pe large',
  notes: [
    'Distance counts from where the wall starts to be heated or cooled, x* = x/(D_h Re Pr) = 1/Gz.',
    'Axial conduction is not contained: below Pe of about 100 a run that solves it sends heat upstream and differs near the inlet.',
    'A wall heat rate answers with the mean Nusselt number, a wall temperature or flux at one place with the local one.',
  ],
  flows: [flow],
  needs: [
    { id: 'graetz', unit: '1', name: 'Graetz number Re Pr D_h/L', range: [1e-3, 1e8] },
    { id: 'peclet', unit: '1', name: `Peclet number Re Pr on ${on}`, range: [100, 1e12] },
    { id: 'length', unit: 'm', name: lengthName },
    { id: 'inletTemperature', unit: 'K', name: 'inlet temperature' },
    { id: 'wallTemperature', unit: 'K', name: 'wall temperature' },
  ],
  values: [
    { id: 'nusselt', name: 'Nusselt number, mean over the length, wall temperature uniform', unit: '1', formula: 'Nu_m = -ln(theta_b)/(4 x*)', value: (g) => entryAtTemperature(section, 1 / g.graetz).mean },
    { id: 'nusseltLocal', name: 'Nusselt number at the end of the length, wall temperature uniform', unit: '1', formula: formulas.local, value: (g) => entryAtTemperature(section, 1 / g.graetz).local },
    { id: 'bulkTemperatureRatio', name: 'bulk minus wall temperature at the end over that at the inlet', unit: '1', formula: formulas.bulk, value: (g) => entryAtTemperature(section, 1 / g.graetz).bulk },
    { id: 'nusseltLocalFlux', name: 'Nusselt number at the end of the length, wall flux uniform', unit: '1', formula: formulas.flux, value: (g) => entryAtFlux(section, 1 / g.graetz), uncertainty: (g) => (g.graetz > 1e4 ? 2e-4 : 0) },
    { id: 'outletTemperature', name: 'bulk temperature at the end of the length', unit: 'K', formula: 'T = T_w + (T_in - T_w) theta_b', value: (g) => g.wallTemperature + (g.inletTemperature - g.wallTemperature) * entryAtTemperature(section, 1 / g.graetz).bulk },
    { id: 'entranceLengthThermal', name: 'length until the local Nusselt number is within 5 % of the developed one', unit: 'm', formula: 'L_t = x*(Nu = 1.05 Nu_developed) Pe D_h', value: (g) => entryLength(section) * g.peclet * g.length },
  ],
  tables: [
    {
      id: 'alongTemperature',
      title: 'Nusselt number and bulk temperature along the flow, wall temperature uniform',
      columns: [
        { id: 'distance', name: 'x/D_h', unit: '1' },
        { id: 'nusseltLocal', name: 'Nu local', unit: '1' },
        { id: 'nusselt', name: 'Nu mean from the inlet', unit: '1' },
        { id: 'bulkTemperatureRatio', name: '(T_b - T_w)/(T_in - T_w)', unit: '1' },
      ],
      rows: ({ graetz, peclet }) => entryPlaces(graetz).map((x) => {
        const { local, mean, bulk } = entryAtTemperature(section, x);
        return [x * peclet, local, mean, bulk];
      }),
    },
    {
      id: 'alongFlux',
      title: 'Nusselt number along the flow, wall flux uniform',
      columns: [{ id: 'distance', name: 'x/D_h', unit: '1' }, { id: 'nusseltLocalFlux', name: 'Nu local', unit: '1' }],
      rows: ({ graetz, peclet }) => entryPlaces(graetz).map((x) => [x * peclet, entryAtFlux(section, x)]),
    },
  ],
});
