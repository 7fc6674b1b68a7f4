import { termIds } from '../../quantities/index.ts';
import { lines, type Ground } from '../ground.ts';
import { listed, nameOf } from '../say.ts';
import type { Line, Table } from '../types.ts';

const titles = { momentum: 'Terms of the momentum balance', heat: 'Terms of the heat balance' } as const;

/** Decades, because scales are good to a factor of a few. */
const rank = (share: number): string => (share >= 0.1 ? 'first' : share >= 0.01 ? 'second' : share >= 0.001 ? 'third' : 'fourth');

const present = (on: Ground, of: keyof typeof titles): string[] => termIds[of].filter((id) => on.has(`${id}Share`) && on.number(id) !== 0);

/** Which terms the flow is made of, and which stand too low to be seen. */
export function budgetLines(on: Ground): Line[] {
  return (Object.keys(titles) as (keyof typeof titles)[]).flatMap((of) => {
    const ids = present(on, of).sort((a, b) => (on.number(`${b}Share`) ?? 0) - (on.number(`${a}Share`) ?? 0));
    const [lead, next] = ids;
    if (lead === undefined || next === undefined) return [];
    const low = ids.filter((id) => (on.number(`${id}Share`) ?? 1) < 0.001);
    return lines(`In the ${of} balance ${nameOf(on, lead)} leads with {${lead}}, next comes ${nameOf(on, next)} at {${next}Share} of it${low.length === 0 ? '' : `; ${listed(low.map((id) => `${nameOf(on, id)} at {${id}Share}`))} ${low.length === 1 ? 'is' : 'are'} lost in it`}.`);
  });
}

export function budgetTables(on: Ground): Table[] {
  return (Object.keys(titles) as (keyof typeof titles)[]).flatMap((of) => {
    const ids = present(on, of);
    if (ids.length < 2) return [];
    const rows = ids.map((id) => [nameOf(on, id), { id }, { id: `${id}Share` }, rank(on.number(`${id}Share`) ?? 0)]);
    const apart = of === 'momentum' && on.has('termHydrostatic') && (on.number('termHydrostatic') ?? 0) > 0 ? [[nameOf(on, 'termHydrostatic'), { id: 'termHydrostatic' }, 'listed apart', '']] : [];
    return [{ title: titles[of], columns: ['term', 'size', 'of the largest', 'rank'], rows: [...rows, ...apart] }];
  });
}
