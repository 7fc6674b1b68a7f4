import { readdirSync, readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { readRuleFolder } from '../../src/decide/index.ts';
import { compileFiles, plan, type Plan, type SectionName, type Table } from '../../src/plan/index.ts';

const rules = compileFiles(readRuleFolder('rules'));
const names = readdirSync('examples').filter((f) => f.endsWith('.case.yaml')).map((f) => f.replace('.case.yaml', ''));
const sections: readonly SectionName[] = ['domain', 'boundaries', 'turbulence', 'verification', 'ladder', 'watch', 'afterRun'];
const made: Record<string, Plan> = {};
const planned = (text: Uint8Array): Promise<Plan> => plan(readCase(text, 'x.case.yaml', vocabulary), { version: '0', rules });
beforeAll(async () => { for (const name of names) made[name] = await planned(readFileSync(`examples/${name}.case.yaml`)); }, 120_000);

const of = (name: string): Plan => made[name] as Plan;
const table = (p: Plan, section: SectionName, title: string): Table | undefined => p.sections[section].tables.find((t) => t.title.startsWith(title));
const texts = (p: Plan, section: SectionName): string[] => p.sections[section].lines.map((l) => l.text);
const idsIn = (text: string): string[] => [...text.matchAll(/\{([^{}]+)\}/g)].map((m) => m[1] as string);

describe('sections of a plan', () => {
  it.each(names)('%s: every quantity named is in the plan, no row is ragged, no check has two ids', (name) => {
    const p = of(name);
    const ids = sections.flatMap((s) => [
      ...p.sections[s].lines.flatMap((l) => l.quantities),
      ...p.sections[s].tables.flatMap((t) => t.rows.flatMap((r) => r.flatMap((c) => (typeof c === 'string' ? idsIn(c) : [c.id])))),
    ]);
    const checks = p.checklist.filter((c) => (sections as readonly string[]).includes(c.stage));
    const named = [...ids, ...checks.flatMap((c) => idsIn(`${c.text} ${c.limit ?? ''} ${c.where ?? ''}`))];
    expect([...new Set(named)].filter((id) => p.quantities[id] === undefined)).toEqual([]);
    for (const s of sections) for (const t of p.sections[s].tables) for (const row of t.rows) expect(row).toHaveLength(t.columns.length);
    expect(checks.map((c) => c.id)).toEqual([...new Set(checks.map((c) => c.id))]);
  });
  it.each(names)('%s: each boundary has a condition for each variable that is solved', (name) => {
    const p = of(name);
    const t = table(p, 'boundaries', 'What each variable has') as Table;
    expect(t.columns.slice(0, 3)).toEqual(['boundary', 'velocity', 'pressure']);
    expect(t.columns.includes('temperature') || !p.targets.some((one) => /emperature|heat/.test(one.quantity))).toBe(true);
    expect(t.rows.length).toBeGreaterThanOrEqual(3);
    for (const row of t.rows) for (const cell of row) expect(cell === '' || (typeof cell === 'string' && cell.includes('undefined'))).toBe(false);
    expect(new Set(t.rows.map((r) => r[0])).size).toBe(t.rows.length);
  });
  it('a temperature and a flux never stand at one wall, and the wall has what the case gives', () => {
    const wall = table(of('rinse-line'), 'boundaries', 'What each variable has')?.rows.find((r) => r[0] === 'wall');
    expect(wall).toContain('outer face at {outerTemperature@wall} through a resistance of {wallResistance@wall}');
    const oil = table(of('oil-gap'), 'boundaries', 'What each variable has');
    expect(oil?.rows.find((r) => r[0] === 'bottom wall')).toContain('flux {wallHeatFlux@walls.bottom} into the fluid');
    expect(table(of('lamp-step'), 'boundaries', 'What each variable has')?.columns).toEqual(['boundary', 'velocity', 'pressure']);
  });
  it('a closed box has a reference point and no outlet; a stream has one level of pressure', () => {
    const box = table(of('glazed-door'), 'boundaries', 'What each variable has')?.rows.map((r) => r[0]);
    expect(box).toContain('one point');
    expect(box).not.toContain('outlet');
    expect(table(of('glazed-door'), 'boundaries', 'Well posed')?.rows.map((r) => r[0])).toContain('closed region: a level of temperature');
    expect(table(of('glazed-door'), 'domain', 'Ends of the region')).toBeUndefined();
  });
  it('laminar flow has no closure, turbulent flow has two and a wall distance', () => {
    expect(texts(of('oil-gap'), 'turbulence').join(' ')).toMatch(/^No (closure|turbulence model)|No closure/);
    expect(table(of('oil-gap'), 'turbulence', 'Closures')).toBeUndefined();
    const rinse = texts(of('rinse-line'), 'turbulence').join(' ');
    expect(rinse).toMatch(/Closure:? \S+.*Second closure:? \S+/);
    expect(rinse).toContain('{firstCellHeight}');
  });
  it('a law of the wall is refused where the layer is too thin in viscous lengths', () => {
    const p = of('rinse-line');
    expect(p.quantities['frictionReynolds']?.value as number).toBeLessThan(500);
    expect(texts(p, 'turbulence').join(' ')).toMatch(/law of the wall (does not hold here|would need).*\{frictionReynolds\}/);
  });
  it('the ladder ends with the case itself, and every rung is on the checklist', () => {
    for (const name of names) {
      const p = of(name);
      const rows = table(p, 'ladder', 'Rungs')?.rows ?? [];
      expect(rows.slice(0, 2).map((r) => r[1])).toEqual(['groups-by-hand', 'manufactured-solution']);
      expect(rows.at(-1)?.[1]).toBe('this case');
      expect(p.ladder.every((r) => p.checklist.some((c) => c.id === `rung-${r.id}`))).toBe(true);
    }
  });
  it('the limits move with the accuracy asked', async () => {
    const text = readFileSync('examples/rinse-line.case.yaml', 'utf8');
    const finer = await planned(new TextEncoder().encode(text.replace('within: 1 K', 'within: 0.2 K')));
    const value = (p: Plan, id: string): number => p.quantities[id]?.value as number;
    expect(value(finer, 'targets.0.mesh') / value(of('rinse-line'), 'targets.0.mesh')).toBeCloseTo(0.2, 9);
    expect(texts(finer, 'ladder').join(' ')).toContain('It cannot show what is asked');
    expect(texts(of('rinse-line'), 'ladder').join(' ')).toContain('It is worth its price');
  });
  it('what must be seen belongs to the case', () => {
    const rinse = texts(of('rinse-line'), 'watch').filter((t) => t.startsWith('Must show'));
    expect(rinse.some((t) => t.includes('turbulent:'))).toBe(true);
    expect(rinse.some((t) => t.startsWith('Must show: laminar:'))).toBe(false);
  });
});
