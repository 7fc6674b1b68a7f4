import { channelB, channelBeta, channelG, channelLambda, pipeB, pipeBeta, pipeG, pipeLambda } from './graetz-constants.ts';
import { at, brent } from './kernels/index.ts';

/** What the series of one section are made of. */
export interface Section {
  readonly lambda: readonly number[];
  readonly g: readonly number[];
  readonly beta: readonly number[];
  readonly b: readonly number[];
  /** lambda_n tends to 4 n + offset + lambdaTail lambda^(-4/3). */
  readonly offset: number;
  readonly lambdaTail: number;
  /** G_n tends to 1.012787288 lambda^(-1/3) (1 + gTail lambda^(-4/3)). */
  readonly gTail: number;
  /** beta_n tends to 4 n + fluxOffset + betaTail beta^(-2/3) + betaTail2 beta^(-4/3), b_n to -(bLead + bTail beta^(-2/3)) beta^(-5/3); n from 1. */
  readonly fluxOffset: number;
  readonly betaTail: number;
  readonly betaTail2: number;
  readonly bLead: number;
  readonly bTail: number;
  /** Decay per mode: exp(-decay lambda^2 x*). */
  readonly decay: number;
  /** theta_b = bulk sum of G/lambda^2. */
  readonly bulk: number;
  /** Wall minus bulk in the developed part, k (T_w - T_b)/(q scale), and factor of the sum: Nu = 1/(developed + share sum). */
  readonly developed: number;
  readonly share: number;
}

export const pipeSection: Section = {
  lambda: pipeLambda, g: pipeG, beta: pipeBeta, b: pipeB,
  offset: 8 / 3, lambdaTail: 0.1591549, gTail: 0.14645, fluxOffset: 4 / 3, betaTail: -0.7203215, betaTail2: -0.2342506, bLead: 2.400806, bTail: 1.580187,
  decay: 2, bulk: 8, developed: 11 / 48, share: 0.5,
};
export const channelSection: Section = {
  lambda: channelLambda, g: channelG, beta: channelBeta, b: channelB,
  offset: 5 / 3, lambdaTail: 0.032554, gTail: 0.02975, fluxOffset: 1 / 3, betaTail: -0.1200511, betaTail2: -0.0064928, bLead: 2.400965, bTail: 0.263761,
  decay: 32 / 3, bulk: 3, developed: 17 / 140, share: 0.25,
};

/**
 * Thermal entry at uniform wall temperature in developed laminar flow.
 *
 * @param section   pipe or channel
 * @param distance  x* = x/(D_h Re Pr), dimensionless, > 0
 * @returns         bulk temperature (T_b - T_w)/(T_in - T_w), local and mean Nusselt number on the hydraulic diameter
 * @range           x* from 1e-8; below, the sum stops before it has converged
 * @source          Graetz 1883; modes beyond the 60th by their asymptotes (Newman, J. Heat Transfer 91 (1969) 177-178)
 */
export function entryAtTemperature(section: Section, distance: number): { bulk: number; local: number; mean: number } {
  const far = section.decay * distance;
  let gradient = 0, content = 0;
  for (let n = 0; ; n++) {
    const lambda = n < section.lambda.length ? at(section.lambda, n) : asymptote(4 * n + section.offset, 0, section.lambdaTail);
    const g = n < section.g.length ? at(section.g, n) : 1.012787288 * lambda ** (-1 / 3) * (1 + section.gTail * lambda ** (-4 / 3));
    // The first mode is taken out, so that far down the pipe both sums stay finite.
    const weight = g * Math.exp(-far * (lambda ** 2 - at(section.lambda, 0) ** 2));
    gradient += weight;
    content += weight / lambda ** 2;
    if (far * (lambda ** 2 - at(section.lambda, 0) ** 2) > 40 || n > 20_000) break;
  }
  const first = far * at(section.lambda, 0) ** 2;
  // The heat balance turns the decay of the bulk temperature into the mean: 4 x* Nu_m = -ln theta_b.
  return { bulk: section.bulk * content * Math.exp(-first), local: (section.decay * gradient) / (4 * content), mean: (first - Math.log(section.bulk * content)) / (4 * distance) };
}

/**
 * Local Nusselt number of the thermal entry at uniform wall flux in developed laminar flow.
 *
 * @param section   pipe or channel
 * @param distance  x* = x/(D_h Re Pr), dimensionless, > 0
 * @returns         Nusselt number on the hydraulic diameter
 * @range           x* from 1e-5
 * @source          Siegel, Sparrow and Hallman 1958; Cess and Shaffer 1959
 */
export function entryAtFlux(section: Section, distance: number): number {
  const far = section.decay * distance;
  let sum = 0;
  for (let n = 1; n < 20_000; n++) {
    const known = n <= section.beta.length;
    const beta = known ? at(section.beta, n - 1) : asymptote(4 * n + section.fluxOffset, section.betaTail, section.betaTail2);
    const b = known ? at(section.b, n - 1) : -(section.bLead + section.bTail * beta ** (-2 / 3)) * beta ** (-5 / 3);
    const decay = far * beta ** 2;
    sum += b * Math.exp(-decay);
    if (decay > 40) break;
  }
  return 1 / (section.developed + section.share * sum);
}

/** Root of x = lead + first x^(-2/3) + second x^(-4/3), by two substitutions: the corrections are small. */
function asymptote(lead: number, first: number, second: number): number {
  const next = (x: number): number => lead + first * x ** (-2 / 3) + second * x ** (-4 / 3);
  return next(next(lead));
}

/**
 * Distance at which the local Nusselt number at uniform wall temperature has come within 5 % of its developed value.
 *
 * @param section  pipe or channel
 * @returns        x* = x/(D_h Re Pr)
 */
export function entryLength(section: Section): number {
  const developed = (section.decay * at(section.lambda, 0) ** 2) / 4;
  return brent((x) => entryAtTemperature(section, x).local / developed - 1.05, 1e-4, 1);
}

/**
 * Places of an entry table, closer together towards the inlet.
 *
 * @param graetz  Graetz number of the whole length, D_h Re Pr/L
 * @returns       x* up to 1/graetz, 21 of them over two decades
 */
export function entryPlaces(graetz: number): number[] {
  return Array.from({ length: 21 }, (_, i) => 10 ** ((i - 20) / 10) / graetz);
}
