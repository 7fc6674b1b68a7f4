import type { Plan } from '../plan/index.ts';
import { csvText } from './csv.ts';

/** What a mesher and a reader of y+ need at each wall and station. */
const columns = ['wallShear', 'frictionVelocity', 'yPlusTarget', 'firstNodeDistance', 'firstCellHeight', 'growthRatio', 'layerCount', 'layerStackHeight'] as const;
const ends = ['low', 'high'] as const;

/**
 * The near-wall table: a row for each wall and station, the first one for the plain numbers of the plan.
 *
 * @param plan  the plan
 * @returns     CSV in SI, undefined where the plan has no near-wall number
 */
export function nearWallCsv(plan: Plan): string | undefined {
  const places = [...new Set(Object.keys(plan.quantities).filter((id) => columns.some((c) => id.startsWith(`${c}@`))).map((id) => id.slice(id.indexOf('@') + 1)))].sort();
  const at = (column: string, place: string): Plan['quantities'][string] | undefined => plan.quantities[place === '' ? column : `${column}@${place}`] ?? plan.quantities[column];
  const shown = columns.filter((c) => ['', ...places].some((place) => at(c, place) !== undefined));
  if (shown.length === 0) return undefined;
  const head = ['wall', 'station', ...shown.flatMap((c) => [`${c} [${unitOf(plan, c)}]`, ...(c === 'wallShear' || c === 'frictionVelocity' ? ends.map((end) => `${c} ${end} [${unitOf(plan, c)}]`) : [])])];
  const rows = ['', ...places].map((place) => {
    const [wall = '', station = ''] = place.split('/');
    return [wall, station, ...shown.flatMap((c) => {
      const q = at(c, place);
      return [q?.value, ...(c === 'wallShear' || c === 'frictionVelocity' ? ends.map((end) => q?.[end]) : [])];
    })];
  });
  return csvText(head, rows);
}

function unitOf(plan: Plan, column: string): string {
  return Object.entries(plan.quantities).find(([id]) => id.split('@')[0] === column)?.[1].unit ?? '1';
}
