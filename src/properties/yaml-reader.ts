import { LineCounter, parseDocument, type Document } from 'yaml';
import { nearestName, Problem, type ProblemData } from '../problems/index.ts';
import { unit } from '../units/index.ts';

/** A YAML file being read: remembers where each value stands and collects what is wrong. */
export interface YamlReader {
  readonly value: unknown;
  complain(path: readonly (string | number)[], problem: Omit<ProblemData, 'file' | 'line' | 'column' | 'length'>): void;
  /** SI number of a text such as `1.0016 mPa s`, or of a bare number where the property has no unit. */
  quantity(path: readonly (string | number)[], text: unknown, inUnit: string): number;
  keys(path: readonly (string | number)[], given: object, allowed: readonly string[]): void;
  /** Throws all problems collected, if any. */
  finish(): void;
}

/** A number and what follows it. */
export const quantityText = /^([-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?)\s*(.*)$/;

/** A number in SI, without the last digit's dust of the conversion. */
export const scaled = (value: number, factor: number, offset: number): number => Number((value * factor + offset).toPrecision(15));

/**
 * Opens a YAML text.
 *
 * @param text  the file's content
 * @param file  its name, for messages
 * @returns     the parsed value and the means to check it
 * @throws      {Problem} unreadable-yaml with line and column
 */
export function yamlReader(text: string, file: string): YamlReader {
  const lines = new LineCounter();
  const doc = parseDocument(text, { lineCounter: lines, uniqueKeys: true });
  const problems: ProblemData[] = [...doc.errors, ...doc.warnings].map((error) => ({ code: 'unreadable-yaml', message: (error.message.split('\n')[0] ?? '').replace(/ at line .*$/, ''), file, ...place(lines, error.pos[0]) }));
  if (problems.length > 0) throw new Problem(problems);
  let value: unknown;
  try {
    value = doc.toJS({ maxAliasCount: 0 });
  } catch {
    throw new Problem({ code: 'unreadable-yaml', message: 'aliases (* and &) are not read in material records', file });
  }
  const complain: YamlReader['complain'] = (path, problem) => {
    problems.push({ ...problem, file, ...positionOf(doc, lines, path) });
  };
  return {
    value,
    complain,
    quantity(path, given, inUnit) {
      const match = quantityText.exec(shown(given));
      const expected = `a number with a unit of ${inUnit}`;
      if ((typeof given !== 'string' && typeof given !== 'number') || match === null) {
        complain(path, { code: 'wrong-quantity', message: `"${shown(given)}" is not a quantity`, expected });
        return Number.NaN;
      }
      try {
        const found = unit(match[2] ?? '');
        const wanted = unit(inUnit);
        if (found.dimension.some((e, i) => e !== wanted.dimension[i])) complain(path, { code: 'wrong-dimension', message: `"${shown(given)}" is not in a unit of ${inUnit}`, expected });
        return scaled(Number(match[1]), found.factor, found.offset);
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        complain(path, { code: 'wrong-quantity', message: `"${shown(given)}": ${error.list[0]?.message ?? ''}`, expected });
        return Number.NaN;
      }
    },
    keys(path, given, allowed) {
      for (const key of Object.keys(given)) {
        if (allowed.includes(key)) continue;
        const nearest = nearestName(key, allowed);
        complain([...path, key], { code: 'unknown-key', message: `"${key}" is not a key here`, expected: `one of ${allowed.join(', ')}`, ...(nearest === undefined ? {} : { nearest }) });
      }
    },
    finish() {
      if (problems.length > 0) throw new Problem(problems);
    },
  };
}

/** What was given, as a short text for a message. */
export const shown = (given: unknown): string => (typeof given === 'string' ? given : (JSON.stringify(given) ?? 'nothing')).slice(0, 80);

function place(lines: LineCounter, offset: number): { line: number; column: number } {
  const { line, col } = lines.linePos(offset);
  return { line, column: col };
}

/** Position of the value at a path, or of the nearest thing above it that exists. */
function positionOf(doc: Document.Parsed, lines: LineCounter, path: readonly (string | number)[]): { line?: number; column?: number } {
  for (let n = path.length; n >= 0; n--) {
    const node = (n === 0 ? doc.contents : doc.getIn(path.slice(0, n), true)) as { range?: [number, number, number] } | undefined;
    if (node?.range !== undefined && node.range !== null) return place(lines, node.range[0]);
  }
  return {};
}
