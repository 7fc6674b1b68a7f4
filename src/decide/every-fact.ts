import { vocabulary } from '../assemble/index.ts';
import { allPaths, fieldAt } from '../case/index.ts';
import { costDefinitions } from '../cost/index.ts';
import { flows } from '../flows/index.ts';
import { meshDefinitions } from '../mesh/index.ts';
import { numericsDefinitions } from '../numerics/index.ts';
import { generalDefinitions } from '../quantities/index.ts';
import { timeDefinitions } from '../time/index.ts';
import { knownFacts, type KnownFacts } from './known.ts';
import { definitionsOfVerdicts } from './words.ts';

/** Every fact that a rule may name: the quantities of all topics and flows, and the numbers of the case by their paths. */
export function everyFact(): KnownFacts {
  const known = knownFacts([...generalDefinitions, ...meshDefinitions, ...timeDefinitions, ...numericsDefinitions, ...costDefinitions, ...Object.values(flows).flatMap((flow) => flow.definitions), ...definitionsOfVerdicts()]);
  const paths = Object.keys(vocabulary.flows).flatMap((flow) => allPaths(vocabulary, flow).filter((path) => fieldAt(vocabulary, flow, path)?.field.kind === 'quantity'));
  return { ids: new Set([...known.ids, ...paths]), words: known.words };
}
