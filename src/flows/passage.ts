import { blendRegimes, colebrook, dittusBoelter, gnielinski, haaland, mckeonFriction, notterSleicher, petukhovFriction, turbulentEntranceLength } from '../quantities/index.ts';
import { ways, type Definition, type Way } from '../workings/index.ts';

type Of = Readonly<Record<string, number>>;
const n = (of: Of, id: string): number => of[id] as number;
const gnielinskiSource = 'Gnielinski, Int. Chem. Eng. 16 (1976) 359, with the friction of Petukhov, Adv. Heat Transfer 6 (1970) 503';

/** What one kind of straight passage has of its own; the rest is the same on the hydraulic diameter. */
export interface PassageLaws {
  /** Further needs of the laws below, such as the aspect. */
  readonly needs: readonly string[];
  readonly frictionReynolds: { readonly value: (of: Of) => number; readonly formula: string; readonly source: string };
  /** Diameter that goes into the circular friction law over the hydraulic diameter. */
  readonly frictionDiameter?: { readonly value: (of: Of) => number; readonly formula: string; readonly source: string };
  /** Reynolds number on the hydraulic diameter over the group of the regime limits, 1 unless said. */
  readonly limitScale?: number;
  readonly turbulentScatter: { readonly friction: number; readonly heat: number };
  readonly nusselt: { readonly temperature: (of: Of) => number; readonly flux: (of: Of) => number; readonly formula: { readonly temperature: string; readonly flux: string }; readonly source: string; readonly scatter?: number };
  /** Thermal entrance length over Re Pr D_h. */
  readonly thermalEntrance: { readonly temperature: (of: Of) => number; readonly flux: (of: Of) => number; readonly source: string; readonly scatter: number };
}

const heated = { temperature: ['temperature', 'coefficient', 'adiabatic'], flux: ['flux'] } as const;
const kinds = ['temperature', 'flux'] as const;

/**
 * Friction, heat transfer and thermal entrance of a straight passage in the three regimes, at the bulk state.
 *
 * @param laws  what the section has of its own
 * @returns     ways for the branch quantities
 */
export function passageDefinitions(laws: PassageLaws): Definition[] {
  const ratio = (of: Of): number => laws.frictionDiameter?.value(of) ?? 1;
  const smooth = (reynolds: number): number => colebrook({ reynolds, relativeRoughness: 0 });
  const laminarAt = (of: Of, re: number): number => laws.frictionReynolds.value(of) / re;
  const turbulentAt = (of: Of, re: number): number => smooth(re * ratio(of));
  const limits = ['regimeLow', 'regimeHigh'];
  const limit = (of: Of, which: 'regimeLow' | 'regimeHigh'): number => (laws.limitScale ?? 1) * n(of, which);
  const onLength = laws.frictionDiameter === undefined ? '' : `, Re on D_L, ${laws.frictionDiameter.formula}`;
  const and = laws.frictionDiameter === undefined ? '' : `; ${laws.frictionDiameter.source}`;
  const between = (of: Of, re: number, laminar: number, turbulent: number): number => blendRegimes({ reynolds: re, low: limit(of, 'regimeLow'), high: limit(of, 'regimeHigh'), laminar, turbulent });
  return [
    ways('frictionLaminar', [{ needs: ['reynoldsBulk', ...laws.needs], value: (of) => laminarAt(of, n(of, 'reynoldsBulk')), formula: laws.frictionReynolds.formula, source: laws.frictionReynolds.source }]),
    ways('frictionTurbulent', [
      { needs: ['reynoldsBulk', ...laws.needs], range: { reynoldsBulk: [4e3, 1e8] }, scatter: laws.turbulentScatter.friction, value: (of) => turbulentAt(of, n(of, 'reynoldsBulk')), formula: `1/sqrt(f) = -2 log10(2.51/(Re sqrt(f)))${onLength}`, source: `Colebrook, J. Inst. Civ. Eng. 11 (1939) 133, smooth${and}` },
    ]),
    ways('frictionBetween', [
      { needs: ['reynoldsBulk', ...limits, ...laws.needs], scatter: 0.35, value: (of) => between(of, n(of, 'reynoldsBulk'), laminarAt(of, limit(of, 'regimeLow')), turbulentAt(of, limit(of, 'regimeHigh'))), formula: 'f straight in Re from laminar at Re_lo to Colebrook at Re_hi', source: 'interpolation as for heat by Gnielinski, Int. J. Heat Mass Transfer 63 (2013) 134; common practice for friction', note: 'flow between the regimes comes and goes: the laminar and the turbulent value bracket it' },
    ]),
    ways('frictionSecond', second(laws, ratio)),
    ways('nusseltLaminar', kinds.map((k): Way => ({ needs: laws.needs, when: { wallKind: heated[k] }, ...(laws.nusselt.scatter === undefined ? {} : { scatter: laws.nusselt.scatter }), value: laws.nusselt[k], formula: laws.nusselt.formula[k], source: laws.nusselt.source, ...(k === 'temperature' ? { note: 'a wall with a given coefficient lies between this and the value at uniform flux' } : {}) }))),
    ways('nusseltTurbulent', [
      { needs: ['reynoldsBulk', 'prandtlBulk'], range: { reynoldsBulk: [3e3, 5e6], prandtlBulk: [0.5, 2000] }, scatter: laws.turbulentScatter.heat, value: (of) => turbulentHeat(n(of, 'reynoldsBulk'), n(of, 'prandtlBulk')), formula: 'Nu = (f/8)(Re - 1000) Pr/(1 + 12.7 sqrt(f/8)(Pr^(2/3) - 1)), f = (0.790 ln Re - 1.64)^-2', source: gnielinskiSource },
      ...kinds.map((k): Way => ({ needs: ['reynoldsBulk', 'prandtlBulk'], when: { wallKind: heated[k] }, range: { reynoldsBulk: [1e4, 1e6], prandtlBulk: [0.004, 0.1] }, scatter: 0.2, value: (of) => notterSleicher({ reynolds: n(of, 'reynoldsBulk'), prandtl: n(of, 'prandtlBulk'), wall: k }), formula: k === 'flux' ? 'Nu = 6.3 + 0.0167 Re^0.85 Pr^0.93' : 'Nu = 4.8 + 0.0156 Re^0.85 Pr^0.93', source: 'Notter and Sleicher, Chem. Eng. Sci. 27 (1972) 2073' })),
    ]),
    ways('nusseltBetween', [
      { needs: ['reynoldsBulk', 'prandtlBulk', 'nusseltLaminar', ...limits], range: { prandtlBulk: [0.5, 2000] }, scatter: 0.3, value: (of) => between(of, n(of, 'reynoldsBulk'), n(of, 'nusseltLaminar'), turbulentHeat(limit(of, 'regimeHigh'), n(of, 'prandtlBulk'))), formula: 'Nu straight in Re from laminar at Re_lo to turbulent at Re_hi', source: 'Gnielinski, Int. J. Heat Mass Transfer 63 (2013) 134' },
      ...kinds.map((k): Way => ({ needs: ['reynoldsBulk', 'prandtlBulk', 'nusseltLaminar', ...limits], when: { wallKind: heated[k] }, range: { prandtlBulk: [0.004, 0.1] }, scatter: 0.3, value: (of) => between(of, n(of, 'reynoldsBulk'), n(of, 'nusseltLaminar'), notterSleicher({ reynolds: limit(of, 'regimeHigh'), prandtl: n(of, 'prandtlBulk'), wall: k })), formula: 'Nu straight in Re from laminar at Re_lo to that of a liquid metal at Re_hi', source: 'as for other fluids; Notter and Sleicher, Chem. Eng. Sci. 27 (1972) 2073, below its range of Re' })),
    ]),
    ways('nusseltSecond', (['heating', 'cooling'] as const).map((d): Way => ({ needs: ['reynoldsBulk', 'prandtlBulk'], when: { regime: 'turbulent', heatDirection: d }, range: { reynoldsBulk: [1e4, 1.2e5], prandtlBulk: [0.7, 160] }, scatter: 0.25, value: (of) => dittusBoelter({ reynolds: n(of, 'reynoldsBulk'), prandtl: n(of, 'prandtlBulk'), exponent: d === 'heating' ? 0.4 : 0.3 }), formula: `Nu = 0.023 Re^0.8 Pr^${d === 'heating' ? 0.4 : 0.3}`, source: 'Dittus and Boelter, Univ. Calif. Publ. Eng. 2 (1930) 443, constants as McAdams 1942' }))),
    ways('entranceLengthThermal', [
      ...kinds.map((k): Way => ({ needs: ['reynoldsBulk', 'prandtlBulk', 'hydraulicDiameter', ...laws.needs], when: { regime: ['laminar', 'transitional'], wallKind: heated[k] }, scatter: laws.thermalEntrance.scatter, value: (of) => laws.thermalEntrance[k](of) * n(of, 'reynoldsBulk') * n(of, 'prandtlBulk') * n(of, 'hydraulicDiameter'), formula: `L_t = c Re Pr D_h, local Nu within 5 % (${k === 'flux' ? 'uniform flux' : 'uniform wall temperature'})`, source: laws.thermalEntrance.source })),
      turbulentLength,
    ]),
  ];
}

function turbulentHeat(reynolds: number, prandtl: number): number {
  return gnielinski({ reynolds, prandtl, friction: petukhovFriction({ reynolds }) });
}

/** Turbulent entrance of any straight passage, for the profile and for heat. */
export const turbulentLength: Way = {
  needs: ['reynoldsBulk', 'hydraulicDiameter'], when: { regime: 'turbulent' }, scatter: 0.4,
  value: (of) => turbulentEntranceLength({ reynolds: n(of, 'reynoldsBulk') }).first * n(of, 'hydraulicDiameter'),
  formula: 'L_e = 1.359 Re^(1/4) D_h', source: 'Bhatti and Shah, in Handbook of Single-Phase Convective Heat Transfer (1987)', note: 'another law in use, 4.4 Re^(1/6) D_h, lies up to 40 % above',
};

/** Independent laws of turbulent friction on the same Reynolds number. */
function second(laws: PassageLaws, ratio: (of: Of) => number): Way[] {
  const one = (range: readonly [number, number], law: (of: { reynolds: number }) => number, formula: string, source: string): Way => ({ needs: ['reynoldsBulk', ...laws.needs], when: { regime: 'turbulent' }, range: { reynoldsBulk: range }, value: (of) => law({ reynolds: n(of, 'reynoldsBulk') * ratio(of) }), formula, source });
  return [
    one([3e5, 3.5e7], mckeonFriction, '1/sqrt(f) = 1.930 log10(Re sqrt(f)) - 0.537', 'McKeon, Zagarola and Smits, J. Fluid Mech. 538 (2005) 429'),
    one([4e3, 3e5], ({ reynolds }) => haaland({ reynolds, relativeRoughness: 0 }), '1/sqrt(f) = -1.8 log10(6.9/Re)', 'Haaland, J. Fluids Eng. 105 (1983) 89, smooth'),
  ];
}
