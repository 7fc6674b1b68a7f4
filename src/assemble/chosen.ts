import type { Case } from '../case/index.ts';

const schemes: Readonly<Record<string, string>> = { '1 upwind-biased': 'upwind-1', '2 upwind-biased': 'upwind-2', '3 upwind-biased': 'upwind-3', '2 central': 'central-2', '4 central': 'central-4' };
const choiceKeys: Readonly<Record<string, string>> = { turbulence: 'turbulence-treatment', closure: 'closure', wallTreatment: 'near-wall-treatment', densityVariesWith: 'density-law', run: 'run-character', timeScheme: 'time-scheme', precision: 'precision' };

/** Choices the case states, in the option words of the plan. */
export function chosenOf(on: Case): Record<string, string> {
  const out: Record<string, string> = {};
  for (const [key, id] of Object.entries(choiceKeys)) {
    const word = on.word(`choices.${key}`);
    if (word !== undefined) out[id] = word;
  }
  const cuts = on.get('choices.cuts')?.value;
  if (Array.isArray(cuts) && cuts.length > 0) out['dimension-and-cuts'] = cuts.join('+');
  const character = on.word('choices.convection.character');
  const order = on.number('choices.convection.order');
  if (character === 'blended') out['convection-scheme'] = 'blended';
  else if (character !== undefined || order !== undefined) out['convection-scheme'] = schemes[`${order ?? 2} ${character ?? 'upwind-biased'}`] ?? 'limited';
  const prandtl = on.word('choices.turbulentPrandtl') ?? (on.number('choices.turbulentPrandtl') === undefined ? undefined : 'constant');
  if (prandtl !== undefined) out['turbulent-prandtl'] = prandtl;
  return out;
}
