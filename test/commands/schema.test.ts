import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseAllDocuments } from 'yaml';
import { z } from 'zod';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { runbrief } from './harness.ts';

interface Schema {
  readonly $schema?: string;
  readonly properties: Readonly<Record<string, { readonly type?: unknown; readonly description?: string }>>;
  readonly required: readonly string[];
  readonly allOf: readonly { readonly if: { readonly properties: { readonly flow: { readonly const: string } } }; readonly then: { readonly properties: { readonly sizes: object } } }[];
}

const { stdout, code } = await runbrief(['schema']);
const schema = JSON.parse(stdout) as Schema;
const { allOf, ...general } = schema;
const cases = parseAllDocuments(readFileSync(new URL('../case/sketches.yaml', import.meta.url), 'utf8')).slice(1).map((one) => one.toJS() as { title: string; flow: string; sizes: object });

describe('schema', () => {
  it('is a JSON Schema of draft 2020-12', () => {
    expect(code).toBe(0);
    expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
    expect(schema.required).toEqual(['flow', 'sizes', 'fluid']);
    expect(Object.keys(schema.properties)).toEqual(Object.keys(vocabulary.keys));
    expect(allOf.map((one) => one.if.properties.flow.const)).toEqual(Object.keys(vocabulary.flows));
  });

  it('is the same document with --json', async () => expect(JSON.parse((await runbrief(['schema', '--json'])).stdout)).toEqual(schema));

  // Read by another program's reader of JSON Schemas; its conditions by flow are applied here, as that reader has none.
  const whole = z.fromJSONSchema(general as Parameters<typeof z.fromJSONSchema>[0]);
  const sizes = new Map(allOf.map((one) => [one.if.properties.flow.const, z.fromJSONSchema(one.then.properties.sizes as Parameters<typeof z.fromJSONSchema>[0])]));

  it.each(cases.map((one) => ({ title: one.title, one })))('takes $title', ({ one }) => {
    expect(whole.safeParse(one).error?.issues ?? []).toEqual([]);
    expect(sizes.get(one.flow)?.safeParse(one.sizes).error?.issues ?? []).toEqual([]);
  });

  it.each([
    { why: 'unknown key', change: { inclinatoin: 'horizontal' } },
    { why: 'wrong word', change: { time: { character: 'never' } } },
    { why: 'bare number with a unit wanted', change: { gravity: 9.81 } },
    { why: 'list for a map', change: { inlet: [{ speed: '1 m/s' }] } },
    { why: 'item without name', change: { species: [{ diffusivity: '1e-9 m^2/s' }] } },
    { why: 'unknown flow', change: { flow: 'pip' } },
  ])('refuses: $why', ({ change }) => expect(whole.safeParse({ ...cases[0], ...change }).success).toBe(false));

  it('refuses a size of another flow', () => expect(sizes.get('sphere')?.safeParse(cases[0]?.sizes).success).toBe(false));

  it('every key says what it holds', () => {
    expect(Object.entries(schema.properties).filter(([, one]) => (one.description ?? '') === '')).toEqual([]);
  });
});
