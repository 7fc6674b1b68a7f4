import { inputsInWords } from '../problems/index.ts';
import { printNumber } from '../units/index.ts';

/** What the summary reads of a plan. */
interface Planned {
  readonly effects: readonly {
    readonly id: string;
    readonly applies: boolean | 'unknown';
    readonly judged: boolean;
    readonly verdict: string;
    readonly deciding?: { readonly margin?: number; readonly marginKind?: 'factor' | 'difference' };
    readonly missing?: readonly string[];
  }[];
  readonly targets: readonly { readonly quantity: string; readonly computed: boolean }[];
  readonly quantities: Readonly<Record<string, { readonly value: number | string; readonly unit: string; readonly low?: number; readonly high?: number }>>;
}

const heads: readonly (readonly [string, string])[] = [['include', 'include'], ['borderline', 'borderline'], ['leave-out', 'leave out'], ['undecided', 'undecided']];
const lead = 12;
const width = 80;

/**
 * What is decided so far, in few lines: verdicts with the distance from their limits, targets with their spread.
 *
 * @param made  the plan of the case as it stands
 * @returns     lines of at most 80 columns
 */
export function summaryOf(made: Planned): readonly string[] {
  const verdicts = heads.flatMap(([verdict, head]) => {
    const effects = made.effects.filter((e) => e.applies !== false && e.judged && e.verdict === verdict);
    return effects.length === 0 ? [] : rows(head, effects.map((e) => `${e.id.replaceAll('-', ' ')}${behind(e)}`));
  });
  const targets = made.targets.flatMap(({ quantity, computed }) => rows('target', [computed ? estimate(quantity, made.quantities[quantity]) : `${quantity}: no estimate yet`]));
  return [...verdicts, ...targets];
}

/** Margin, or what is missing. */
function behind({ verdict, deciding, missing }: Planned['effects'][number]): string {
  if (verdict === 'undecided') return missing === undefined || missing.length === 0 ? '' : ` (needs ${inputsInWords(missing)})`;
  if (deciding?.margin === undefined) return '';
  return deciding.marginKind === 'difference' ? ` (by ${printNumber({ value: deciding.margin, unit: '1', digits: 2 })})` : ` (x ${printNumber({ value: deciding.margin, unit: '1', digits: 2 })})`;
}

function estimate(id: string, q: Planned['quantities'][string] | undefined): string {
  if (q === undefined || typeof q.value === 'string') return `${id}: no estimate yet`;
  const toUnit = q.unit === 'K' && !/difference/i.test(id) ? { toUnit: 'degC' } : {};
  const [value, low, high] = [q.value, q.low, q.high].map((x) => (x === undefined ? undefined : printNumber({ value: x, unit: q.unit, digits: 3, ...toUnit })));
  return `${id} ${value}${low === undefined || high === undefined ? '' : ` (${low} to ${high})`}`;
}

/** Items in lines behind a head; one longer than a line goes on below, further in. */
function rows(head: string, items: readonly string[]): string[] {
  const out: string[] = [];
  let line = head.padEnd(lead);
  items.forEach((item, k) => {
    const text = `${item}${k < items.length - 1 ? ',' : ''}`;
    if (line.length > lead && line.length + 1 + text.length > width) {
      out.push(line);
      line = ' '.repeat(lead);
    }
    for (const [n, word] of text.split(' ').entries()) {
      const joint = line.trim() === '' || line.length === lead ? '' : ' ';
      if (n > 0 && line.length + 1 + word.length > width) {
        out.push(line);
        line = `${' '.repeat(lead + 2)}${word}`;
      } else line += `${joint}${word}`;
    }
  });
  return [...out, line];
}
