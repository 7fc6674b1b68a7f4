import { readdirSync, readFileSync } from 'node:fs';
import { runInNewContext } from 'node:vm';
import { describe, expect, it } from 'vitest';

const src = new URL('../../src/', import.meta.url);
const files = readdirSync(src, { recursive: true, encoding: 'utf8' }).map((f) => f.replaceAll('\\', '/')).filter((f) => f.endsWith('.ts')).sort();

interface Documented { readonly file: string; readonly name: string; readonly doc: string; readonly signature: string }

/** Exported functions with their comment and the text between the parentheses. */
const documented: Documented[] = files.flatMap((file) => {
  const text = readFileSync(new URL(file, src), 'utf8');
  return [...text.matchAll(/\/\*\*((?:(?!\*\/)[\s\S])*)\*\/\s*export (?:async )?function (\w+)(?:<(?:[^<>]|<[^<>]*>)*>)?\(/g)].map((m) => {
    const start = m.index + m[0].length;
    let depth = 1, end = start;
    for (; depth > 0 && end < text.length; end++) depth += text[end] === '(' ? 1 : text[end] === ')' ? -1 : 0;
    return { file, name: m[2] as string, doc: m[1] as string, signature: text.slice(start, end - 1) };
  });
});

/** Top-level parts of a list of parameters or of the members of a pattern. */
function parts(list: string): string[] {
  const out = [''];
  let depth = 0;
  for (const c of list.replaceAll('=>', '')) {
    if ('({[<'.includes(c)) depth++;
    if (')}]>'.includes(c)) depth--;
    if (c === ',' && depth === 0) out.push('');
    else out[out.length - 1] += c;
  }
  return out.map((part) => part.trim()).filter((part) => part !== '');
}
/** Names a parameter goes by: its own, or those of the members it is taken apart into. */
const namesOf = (parameter: string): string[] => {
  const pattern = /^\{([\s\S]*?)\}/.exec(parameter);
  if (pattern !== null) return parts(pattern[1] as string).map((member) => (/^(?:\.\.\.)?(\w+)/.exec(member) as RegExpExecArray)[1] as string);
  return [(/^(?:\.\.\.)?(\w+)/.exec(parameter)?.[1] ?? parameter)];
};

describe('comments of exported functions', () => {
  it.each(documented.filter(({ doc }) => doc.includes('@param')))('$file $name: parameters are those of the signature', ({ doc, signature }) => {
    const named = [...doc.matchAll(/@param\s+(\w+)/g)].map((m) => m[1] as string);
    // Members of a pattern may be told under the one name of the whole.
    const parameters = parts(signature);
    const known = parameters.flatMap(namesOf);
    const whole = parameters.some((p) => p.startsWith('{'));
    expect(named.filter((name) => !known.includes(name) && !whole)).toEqual([]);
    expect(parameters.filter((p) => !p.startsWith('{')).flatMap(namesOf).filter((name) => !name.startsWith('_') && !named.includes(name))).toEqual([]);
  });

  const examples = documented.flatMap(({ file, name, doc }) => [...doc.matchAll(/@example\s+(\S.*?) \/\/ (.+)$/gm)].map((m) => ({ file, name, call: m[1] as string, printed: (m[2] as string).trim() })));
  it('have examples', () => expect(examples.length).toBeGreaterThan(100));
  it.each(examples)('$file: $call gives $printed', async ({ file, name, call, printed }) => {
    const module = (await import(new URL(file, src).href)) as Record<string, unknown>;
    const value: unknown = runInNewContext(call, { [name]: module[name] });
    const number = Number(printed);
    if (Number.isNaN(number)) expect(value).toBe(printed.replaceAll("'", ''));
    else {
      const decimals = (printed.split(/e/i)[0] as string).split('.')[1]?.length ?? 0;
      const power = Number(printed.split(/e/i)[1] ?? 0);
      expect(Math.abs(Number(value) - number)).toBeLessThanOrEqual(0.51 * 10 ** (power - decimals)); // half the last digit printed
    }
  });
});
