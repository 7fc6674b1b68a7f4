import { reference } from './define.ts';
import { entryAtFlux, entryAtTemperature, entryLength, entryPlaces, channelSection as section } from './graetz-series.ts';

export const graetzChannel = reference('graetz-channel', {
  title: 'Thermal entry of developed laminar flow between parallel plates',
  kind: 'exact',
  assumes: ['laminar', 'velocity developed', 'temperature uniform at the inlet', 'constant properties', 'no axial conduction', 'no heat from friction'],
  verifies: ['advection of heat', 'wall heat flux in a growing thermal layer', 'bulk temperature'],
  source: 'Graetz 1883; eigenvalues of Kummer functions; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VI',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'velocity developed from the inlet on; bulk temperature weighted with the flow; cells across the thermal layer near the inlet; axial conduction switched off or Pe large',
  notes: [
    'Distance counts from where the wall starts to be heated or cooled, x* = x/(D_h Re Pr) = 1/Gz.',
    'Axial conduction is not contained: below Pe of about 100 a run that solves it sends heat upstream and differs near the inlet.',
    'A wall heat rate answers with the mean Nusselt number, a wall temperature or flux at one place with the local one.',
  ],
  flows: ['channel'],
  needs: [
    { id: 'graetz', unit: '1', name: 'Graetz number Re Pr D_h/L', range: [1e-3, 1e8] },
    { id: 'peclet', unit: '1', name: 'Peclet number Re Pr on twice the gap', range: [100, 1e12] },
    { id: 'length', unit: 'm', name: 'twice the gap' },
    { id: 'inletTemperature', unit: 'K', name: 'inlet temperature' },
    { id: 'wallTemperature', unit: 'K', name: 'wall temperature' },
  ],
  values: [
    { id: 'nusselt', name: 'Nusselt number, mean over the length, wall temperature uniform', unit: '1', formula: 'Nu_m = -ln(theta_b)/(4 x*)', value: (g) => entryAtTemperature(section, 1 / g.graetz).mean },
    { id: 'nusseltLocal', name: 'Nusselt number at the end of the length, wall temperature uniform', unit: '1', formula: 'Nu = (8/3) sum G_n e_n/sum G_n/lambda_n^2 e_n, e_n = exp(-(32/3) lambda_n^2 x*)', value: (g) => entryAtTemperature(section, 1 / g.graetz).local },
    { id: 'bulkTemperatureRatio', name: 'bulk minus wall temperature at the end over that at the inlet', unit: '1', formula: 'theta_b = 3 sum G_n/lambda_n^2 exp(-(32/3) lambda_n^2 x*)', value: (g) => entryAtTemperature(section, 1 / g.graetz).bulk },
    { id: 'nusseltLocalFlux', name: 'Nusselt number at the end of the length, wall flux uniform', unit: '1', formula: 'Nu = 4/[17/35 + sum b_n exp(-(32/3) beta_n^2 x*)]', value: (g) => entryAtFlux(section, 1 / g.graetz), uncertainty: (g) => (g.graetz > 1e4 ? 2e-4 : 0) },
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
