import { Problem, type ProblemData } from '../problems/index.ts';
import { readQuantity } from '../units/index.ts';
import type { Need, Reference } from './define.ts';
import { unknownInputs } from './evaluate.ts';

const form = 'inputs as "peclet = 1000, length = 25 mm"';

/**
 * Inputs of a known answer from text: `peclet = 1000, graetz = 20, length = 25 mm`.
 *
 * @param ref   the reference
 * @param text  names and quantities, separated by commas
 * @returns     SI numbers by id, and what was assumed in reading them
 * @throws      {Problem} unreadable-input, unknown-input, duplicate-input, not-one-number, and what the units say; all of them at once
 */
export function readGiven(ref: Reference, text: string): { readonly given: Readonly<Record<string, number>>; readonly assumed: readonly string[] } {
  const problems: ProblemData[] = [];
  const given: Record<string, number> = {};
  const assumed: string[] = [];
  for (const part of text.split(',')) {
    if (part.trim() === '' && text.trim() !== '') {
      problems.push({ code: 'unreadable-input', message: `an input is missing between the commas of "${text}"`, expected: form });
      continue;
    }
    const sign = part.indexOf('=');
    const id = part.slice(0, Math.max(0, sign)).trim(), quantity = part.slice(sign + 1).trim();
    if (id === '' || quantity === '') {
      problems.push({ code: 'unreadable-input', message: `"${part.trim()}" is not a name with a quantity`, expected: form });
      continue;
    }
    const need = ref.needs.find((one) => one.id === id);
    if (!need) problems.push(...unknownInputs(ref, [id]));
    else if (Object.hasOwn(given, id)) problems.push({ code: 'duplicate-input', message: `${id} is given twice`, expected: 'every input once' });
    else {
      try {
        const read = one(need, quantity);
        given[id] = read.value;
        assumed.push(...read.assumed);
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        problems.push(...error.list.map(({ code, message, expected, nearest }) => ({ code, message: `${id}: ${message}`, ...(expected === undefined ? {} : { expected }), ...(nearest === undefined ? {} : { nearest }) })));
      }
    }
  }
  if (problems.length > 0) throw new Problem(problems);
  return { given, assumed };
}

function one(need: Need, text: string): { value: number; assumed: readonly string[] } {
  const read = readQuantity(text, { unit: need.unit, name: need.name, ...(need.unit === 'K' ? { kind: need.id.endsWith('Difference') ? ('temperatureDifference' as const) : ('temperature' as const) } : {}) });
  if (read.range ?? read.spread) throw new Problem({ code: 'not-one-number', message: `"${text}" is not one number`, expected: 'a single value: a known answer has no spread of its inputs' });
  return { value: read.value, assumed: read.assumed };
}
