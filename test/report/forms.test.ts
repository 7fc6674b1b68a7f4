import { describe, expect, it } from 'vitest';
import type { Plan } from '../../src/plan/index.ts';
import { asText, planBlocks, planDocument, planFiles, writingOf } from '../../src/report/index.ts';
import { planFixture } from './plan-fixture.ts';

const files = (plan: Plan): Map<string, string> => new Map(planFiles(plan, undefined, { ladder: [{ rung: 'poiseuille-pipe', tables: [{ id: 'shape', title: 't', columns: [{ id: 'radius', name: 'r', unit: '1' }], rows: [[0], [1]] }, { id: 'velocity', title: 't', columns: [{ id: 'u', name: 'u', unit: 'm/s' }], rows: [[0.8]] }] as never }], properties: 'temperature [K]\n300' }).map(({ name, text }) => [name, text]));
const plan = planFixture();
const written = files(plan);
const evil = `<script>alert(1)</script><img src=x onerror=y> | *b* [l](javascript:z) & "q" \u001b[2J`;
const hostile = ((): Plan => {
  const base = planFixture();
  return {
    ...base,
    case: { ...base.case, title: evil, file: evil },
    targets: [{ id: 'targets.0', quantity: evil, place: evil, within: evil, computed: false }],
    effects: [{ ...(base.effects[0] as Plan['effects'][number]), because: evil, title: evil, sources: [evil] }],
    contradictions: [{ code: 'c', path: evil, says: evil, effect: evil, cure: evil }],
    sections: { ...base.sections, mesh: { lines: [{ text: evil, quantities: [] }], tables: [{ title: evil, columns: [evil], rows: [[evil]] }] } },
    checklist: [{ id: 'x', stage: evil, text: evil, where: evil }],
    quantities: { ...base.quantities, regime: { ...(base.quantities['regime'] as Plan['quantities'][string]), value: evil, source: evil } },
  };
})();

describe('the plan as text', () => {
  const text = asText(planBlocks(plan, writingOf(plan.quantities)));
  it('keeps to 80 columns and leaves no brace', () => {
    for (const line of text.split('\n')) expect(line.length, line).toBeLessThanOrEqual(80);
    expect(text).not.toMatch(/\{[A-Za-z]|undefined|NaN|\[object/);
  });
  it('fills numbers in with unit and spread, and says what is not known', () => {
    expect(text).toContain('- The first cell is 42.0 um +/- 5 % high; not known is open.');
    expect(text).toContain('the flow is turbulent at Re 22600 +/- 5 %');
  });
  it('wraps cells between words', () => {
    expect(text).toMatch(/^core {4}1\.02 mm {2}along the flow/m);
    expect(text.replaceAll(/\s+/g, ' ')).toContain('and not a step further than that');
  });
  it('holds every decision with what would flip it, and every number with formula and source', () => {
    const flat = text.replaceAll(/\s+/g, ' ');
    expect(flat).toContain('Becomes leave-out at inlet.temperature = 310 K.');
    expect(flat).toContain('Settled by giving wall.sandGrain or wall.Ra.');
    expect(flat).toContain('Not judged by this program, to be judged by hand: soret.');
    const rows = (written.get('plan.md') ?? '').split('\n');
    for (const [id, { source }] of Object.entries(plan.quantities)) expect(rows.some((row) => row.startsWith(`| ${id} |`) && row.includes(source)), id).toBe(true);
  });
});

describe('the files', () => {
  it('are these', () => {
    expect([...written.keys()]).toEqual(['plan.md', 'plan.html', 'plan.json', 'checklist.md', 'near-wall.csv', 'properties.csv', 'ladder/poiseuille-pipe.csv', 'ladder/poiseuille-pipe-velocity.csv']);
    for (const text of written.values()) expect(text.endsWith('\n')).toBe(true);
    expect([...files(planFixture())]).toEqual([...written]);
  });

  it('hold a checklist to tick, with limits and stable ids', () => {
    expect(written.get('checklist.md')).toContain('## after the run\n\n- [ ] y+ of the first node; limit: at most 1; where: wall; id: mesh.yplus\n');
  });

  it('hold a near-wall table with a row for each wall and station', () => {
    const [head, ...rows] = (written.get('near-wall.csv') ?? '').trimEnd().split('\n').map((line) => line.split(','));
    expect(head?.slice(0, 5)).toEqual(['wall', 'station', 'wallShear [Pa]', 'wallShear low [Pa]', 'wallShear high [Pa]']);
    expect(rows.map((row) => row.slice(0, 3))).toEqual([['', '', '0.5123'], ['wall', 'inlet', '0.61'], ['wall', 'worst', '0.5123']]);
    expect(rows.every((row) => row.length === head?.length)).toBe(true);
  });

  it('hold tables in Markdown whose rows have as many cells as their head', () => {
    for (const block of (written.get('plan.md') ?? '').split('\n\n').filter((b) => b.startsWith('|'))) {
      const counts = block.trimEnd().split('\n').map((row) => row.replaceAll(/\\./g, '').split('|').length);
      expect(new Set(counts).size).toBe(1);
    }
  });

  it('pass on no script, tag, link or escape sequence', () => {
    const out = files(hostile);
    const page = out.get('plan.html') ?? '';
    expect(page).not.toMatch(/<script|<img|<a href="(?!#)/i);
    expect(page).toContain('&lt;script&gt;');
    expect(page).toContain("default-src 'none'");
    expect(page).not.toMatch(/https?:/);
    for (const name of ['plan.md', 'checklist.md']) {
      const text = out.get(name) ?? '';
      expect(text).not.toMatch(/<[a-z]/i);
      expect(text).not.toMatch(/(?<!\\)\[l(?<!\\)\]\(/);
    }
    for (const text of out.values()) expect(text).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u007f-\u009f]/);
  });

  it('hold a page whose tags all close', () => {
    const open: string[] = [];
    for (const [, slash, tag] of (written.get('plan.html') ?? '').replace(/<style>[^<]*<\/style>/, '').matchAll(/<(\/?)([a-z][a-z0-9]*)[^>]*>/g)) {
      if (tag === 'meta') continue;
      if (slash === '') open.push(tag as string);
      else expect(open.pop()).toBe(tag);
    }
    expect(open).toEqual([]);
  });
});

describe('the document', () => {
  it('is the plan with its numbers put in, and nothing absent', () => {
    const document = planDocument({ ...plan, targets: [{ ...(plan.targets[0] as Plan['targets'][number]), place: undefined as never }] }, writingOf(plan.quantities));
    expect(Object.keys(document.targets[0] ?? {})).not.toContain('place');
    expect(document.sections.mesh.lines[0]).toEqual({ text: 'The first cell is 42.0 um +/- 5 % high; not known is open.', quantities: ['firstCellHeight'] });
    expect(document.sections.mesh.tables[0]?.rows[0]?.[1]).toEqual({ id: 'coreCellSize' });
    expect(document.quantities).toEqual(plan.quantities);
    expect(JSON.parse(written.get('plan.json') ?? '')).toEqual(JSON.parse(JSON.stringify(planDocument(plan, writingOf(plan.quantities)))));
  });
});
