import type { CommandClass } from './base.ts';

/** A command's line in the overview, and its file, which is loaded only when the command runs. */
export interface Entry {
  readonly summary: string;
  readonly load: () => Promise<{ default: CommandClass }>;
}

/** The commands in the order of a day's work, which is the order of the overview. */
export const COMMANDS: Readonly<Record<string, Entry>> = {
  ask: { summary: 'an interview that asks what still matters and writes a case file', load: () => import('./ask.ts') },
  plan: { summary: 'the plan of a case: on one screen, in full, as JSON, or as files', load: () => import('./plan.ts') },
  trace: { summary: 'where a number of a plan comes from, down to inputs and sources', load: () => import('./trace.ts') },
  compare: { summary: 'a result held against a known answer for the numbers of a case', load: () => import('./compare.ts') },
  grids: { summary: 'grid or step convergence of a table of results: order, value at size zero, band', load: () => import('./grids.ts') },
  rules: { summary: 'the decisions with their limits and sources; --check DIR checks a rule pack', load: () => import('./rules.ts') },
  reference: { summary: 'known solutions, evaluated for given inputs', load: () => import('./reference.ts') },
  groups: { summary: 'independent dimensionless groups of named quantities', load: () => import('./groups.ts') },
  convert: { summary: 'a quantity in another unit', load: () => import('./convert.ts') },
  template: { summary: 'a commented case file to fill in', load: () => import('./template.ts') },
  schema: { summary: 'JSON Schema of the case file, for editors', load: () => import('./schema.ts') },
  material: { summary: 'properties of a material with source, range and uncertainty', load: () => import('./material.ts') },
};
