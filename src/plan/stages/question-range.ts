import { lines, type Ground } from '../ground.ts';
import { rangesOf } from '../numbers.ts';
import { inWords, listed, nameOf } from '../say.ts';
import type { Line, Table } from '../types.ts';

/** Numbers that tell what an operating range does to a flow. */
const telling = ['regimeGroup', 'prandtl', 'richardson', 'mach', 'temperatureDifference', 'frictionVelocity', 'boundaryLayerThickness', 'entranceLength', 'nusselt', 'firstCellHeight', 'cellCount', 'timeStep', 'coreHours'];

export function rangeLines(on: Ground): Line[] {
  const { ranges } = on.assembled;
  if (ranges.length === 0) return [];
  const moved = on.decisions.effects.filter((e) => e.movedBy === 'range');
  const plain = on.decisions.effects.filter((e) => e.verdict === 'borderline' && e.movedBy !== 'range');
  return lines(
    `The plant works over ${listed(ranges.map((r) => `${r.path} from ${inWords(on, r.path, r.from)} to ${inWords(on, r.path, r.to)}`))}; the middle is planned as the nominal point, the ends are runs of their own.`,
    moved.length > 0
      ? `Decisions that differ over it: ${listed(moved.map((e) => e.id))}; each end gets a run in its own branch, and the mesh is laid out for the end with the thinnest layer.`
      : `No decision differs over it${plain.length > 0 ? `; ${listed(plain.map((e) => e.id))} ${plain.length === 1 ? 'is' : 'are'} borderline for other reasons` : ''}.`,
  );
}

/** Key numbers over the range; verdicts held at the nominal point. */
export function rangeTables(on: Ground): Table[] {
  const { ranges, workings, targets } = on.assembled;
  if (ranges.length === 0) return flipTable(on);
  const ids = [...new Set([...targets.filter((t) => t.computed).map((t) => t.quantity), ...telling])].filter((id) => on.has(id));
  const found = rangesOf(workings, ranges, ids, () => undefined);
  const rows = ids.flatMap((id) => { const r = found.get(id); return r === undefined ? [] : [[nameOf(on, id), inWords(on, id, r.from), { id }, inWords(on, id, r.to)]]; });
  return [{ title: 'Over the operating range', columns: ['number', 'least', 'nominal', 'most'], rows }, ...flipTable(on)];
}

/** Values of an input at which a decision changes, the nearest first. What is borderline by its spread alone stays so where the plain number comes to lie between the limits. */
function flipTable(on: Ground): Table[] {
  const found = on.decisions.effects.flatMap((e) => (e.flipsAt ?? []).map((f) => ({ ...f, effect: e.id, verdictNow: e.verdict, far: away(on.number(f.path), f.value) }))).filter((f) => f.verdict !== f.verdictNow);
  if (found.length === 0) return [];
  const rows = found.sort((a, b) => a.far - b.far).slice(0, 12).map((f) => [f.path, { id: f.path }, inWords(on, f.path, f.value), f.effect, `${f.verdictNow} becomes ${f.verdict}`]);
  return [{ title: 'Where decisions change, one input at a time', columns: ['input', 'now', 'changes at', 'decision', 'how'], rows }];
}

/** Distance on a logarithmic scale, for the order alone. */
const away = (now: number | undefined, then: number): number => (now === undefined || now <= 0 || then <= 0 ? Number.POSITIVE_INFINITY : Math.abs(Math.log(then / now)));
