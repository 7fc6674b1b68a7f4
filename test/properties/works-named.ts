import { readdirSync, readFileSync } from 'node:fs';

/**
 * The references of the tables in compared/, as the head of each script names them: lines `  name   what it is`.
 *
 * @returns  short name and what stands for it, without what is named twice
 */
export function worksNamed(): (readonly [string, string])[] {
  const folder = new URL('./compared/', import.meta.url);
  const scripts = readdirSync(folder).filter((name) => name.endsWith('.py')).toSorted();
  const found = scripts.flatMap((script) => {
    const [, head = ''] = readFileSync(new URL(script, folder), 'utf8').split('"""');
    return [...head.matchAll(/^ {2}(\S.*?) {2,}(\S.*)$/gm)].map(([, name = '', what = '']) => [name, what] as const);
  });
  return found.filter(([name], i) => found.findIndex(([other]) => other === name) === i);
}
