import type { Plan } from '../plan/index.ts';
import type { Writing } from './writing.ts';

/**
 * The Plan as a document for other programs: exactly its data, with the ids in the lines' text replaced by their numbers, and nothing absent.
 *
 * @param plan     the plan
 * @param writing  how its numbers are written
 * @returns        the document
 */
export function planDocument(plan: Plan, writing: Writing): Plan {
  const sections = Object.fromEntries(Object.entries(plan.sections).map(([name, { lines, tables }]) => [name, {
    lines: lines.map((line) => ({ text: writing.fill(line.text), quantities: line.quantities })),
    tables: tables.map((table) => ({ ...table, rows: table.rows.map((row) => row.map((cell) => (typeof cell === 'string' ? writing.fill(cell) : cell))) })),
  }])) as unknown as Plan['sections'];
  const checklist = plan.checklist.map((check) => ({ ...check, text: writing.fill(check.text), ...(check.limit === undefined ? {} : { limit: writing.fill(check.limit) }), ...(check.where === undefined ? {} : { where: writing.fill(check.where) }) }));
  const targets = plan.targets.map((target) => ({ ...target, near: undefined })); // what may be meant is for the screen
  return withoutAbsent({ ...plan, targets, sections, checklist }) as Plan;
}

/** A copy without keys that hold nothing. */
function withoutAbsent(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withoutAbsent);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).filter(([, one]) => one !== undefined).map(([key, one]) => [key, withoutAbsent(one)]));
}
