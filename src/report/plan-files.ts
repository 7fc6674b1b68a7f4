import type { Case } from '../case/index.ts';
import type { Plan } from '../plan/index.ts';
import type { EvaluatedTable } from '../references/index.ts';
import { asHtml } from './as-html.ts';
import { asMarkdown } from './as-markdown.ts';
import { nearWallCsv } from './near-wall-csv.ts';
import { checklistBlocks, planBlocks } from './plan-blocks.ts';
import { planDocument } from './plan-json.ts';
import { referenceCsv } from './reference.ts';
import { writingOf } from './writing.ts';

/** A file to be written into the folder the user named. */
export interface PlanFile {
  /** Path below that folder, with `/` between its parts. */
  readonly name: string;
  readonly text: string;
}

/** Tables that belong to a plan and are worked out beside it. */
export interface PlanTables {
  /** Tables of the references, by rung. */
  readonly ladder: readonly { readonly rung: string; readonly tables: readonly EvaluatedTable[] }[];
  /** Properties of the fluid over the temperatures of the case, as CSV. */
  readonly properties?: string;
  /** Its properties as functions to type in. */
  readonly fits?: string;
}

/**
 * Everything `plan --into` writes.
 *
 * @param plan    the plan
 * @param on      the case, for the units that the user wrote; SI without it
 * @param tables  ladder and property tables
 * @returns       files with their names below the folder
 */
export function planFiles(plan: Plan, on: Case | undefined, tables: PlanTables): PlanFile[] {
  const writing = writingOf(plan.quantities, on);
  const nearWall = nearWallCsv(plan);
  return [
    { name: 'plan.md', text: asMarkdown(planBlocks(plan, writing)) },
    { name: 'plan.html', text: asHtml(planBlocks(plan, writingOf(plan.quantities, on, true))) },
    { name: 'plan.json', text: `${JSON.stringify(planDocument(plan, writing), null, 2)}\n` },
    { name: 'checklist.md', text: asMarkdown(checklistBlocks(plan, writing)) },
    ...(nearWall === undefined ? [] : [{ name: 'near-wall.csv', text: nearWall }]),
    ...(tables.properties === undefined ? [] : [{ name: 'properties.csv', text: ended(tables.properties) }]),
    ...(tables.fits === undefined ? [] : [{ name: 'property-fits.txt', text: ended(tables.fits) }]),
    ...tables.ladder.flatMap(({ rung, tables: of }) => of.map((table, i) => ({ name: `ladder/${rung}${i === 0 ? '' : `-${table.id}`}.csv`, text: ended(referenceCsv(table)) }))),
  ];
}

const ended = (text: string): string => (text.endsWith('\n') ? text : `${text}\n`);
