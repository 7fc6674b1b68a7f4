import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan, type Plan, type SectionName } from '../../src/plan/index.ts';

/** The plan of a case given as text. */
export const planOf = (text: string): Promise<Plan> => plan(readCase(text, 'test.case.yaml', vocabulary), { version: 'test' });

/** Texts of a section. */
export const linesOf = (p: Plan, section: SectionName): string[] => p.sections[section].lines.map((l) => l.text);

/** Ids named in a section that the plan does not hold. */
export const unknownIds = (p: Plan, section: SectionName): string[] => {
  const { lines, tables } = p.sections[section];
  const ids = [...lines.flatMap((l) => [...l.text.matchAll(/\{([^{}]*)\}/g)].map((m) => m[1] as string)), ...tables.flatMap((t) => t.rows.flatMap((row) => row.flatMap((cell) => (typeof cell === 'string' ? [] : [cell.id]))))];
  return ids.filter((id) => p.quantities[id] === undefined);
};
