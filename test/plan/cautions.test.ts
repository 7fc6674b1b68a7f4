import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { linesOf, planOf, unknownIds } from './harness.ts';

const line = (more: { fluid?: string; inlet?: string; wall?: string; title?: string; sizes?: string } = {}): string => `
format: 1
title: ${more.title ?? 'A straight line'}
purpose: What pressure drop does the line take?
targets: [{ quantity: pressureDrop, place: inlet to outlet, mean: area, within: 20 % }]
flow: pipe
sizes: ${more.sizes ?? '{ diameter: 50 mm, length: 6 m }'}
inclination: horizontal
fluid: ${more.fluid ?? '{ material: water, pressure: 1.2 bar abs }'}
inlet: ${more.inlet ?? '{ speed: 0.5 m/s, temperature: 20 degC, profile: developed }'}
${more.wall === undefined ? '' : `wall: ${more.wall}`}
`;
const hazardsOf = async (text: string): Promise<string[]> => (await planOf(text)).checklist.filter((c) => c.id.startsWith('hazard-')).map((c) => c.id.slice(7));

const body = (title: string, target = 'dragForce', more = 'inlet: { speed: 25 m/s, temperature: 10 degC }'): string => `
format: 1
title: ${title}
targets: [{ quantity: ${target} }]
flow: cylinder
sizes: { diameter: 1.2 m, span: 20 m }
fluid: { material: air, pressure: 1 atm }
${more}
`;

/** Triggers from both sides; limits of the hazard classes, common practice. */
const rows: readonly { what: string; text: string; hazards: readonly string[] }[] = [
  { what: 'cold water at low pressure', text: line(), hazards: [] },
  { what: 'water at 47 degC', text: line({ inlet: '{ speed: 0.5 m/s, temperature: 47 degC }' }), hazards: [] },
  { what: 'water at 49 degC', text: line({ inlet: '{ speed: 0.5 m/s, temperature: 49 degC }' }), hazards: ['hot'] },
  { what: 'a wall at 49 degC', text: line({ wall: '{ temperature: 49 degC }' }), hazards: ['hot'] },
  { what: 'a glycol is not the gas it is named for', text: line({ fluid: '{ material: propylene glycol-water, composition: { propylene glycol: 40 % mass }, pressure: 1.2 bar abs }' }), hazards: [] },
  { what: 'propylene itself', text: line({ fluid: '{ material: propylene, pressure: 1.2 bar abs }' }), hazards: ['flammable'] },
  { what: 'air 0.4 bar above ambient', text: line({ fluid: '{ material: air, pressure: 1.41 bar abs }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: [] },
  { what: 'air 0.6 bar above ambient', text: line({ fluid: '{ material: air, pressure: 1.62 bar abs }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: ['pressure'] },
  { what: 'cold water 8 bar above ambient', text: line({ fluid: '{ material: water, pressure: 9 bar abs }' }), hazards: [] },
  { what: 'cold water 11 bar above ambient', text: line({ fluid: '{ material: water, pressure: 12.1 bar abs }' }), hazards: ['pressure'] },
  { what: 'water at 130 degC under pressure flashes where it leaks', text: line({ fluid: '{ material: water, pressure: 5 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 130 degC }' }), hazards: ['pressure', 'steam', 'hot'] },
  { what: 'flue gas: its dew point makes it no steam', text: line({ fluid: '{ material: flue gas, pressure: 1 atm }', inlet: '{ speed: 5 m/s, temperature: 350 degC }' }), hazards: ['hot'] },
  { what: 'cold lye', text: line({ fluid: '{ material: caustic soda, pressure: 1.2 bar abs, composition: { sodium hydroxide: 20 % mass } }' }), hazards: ['corrosive'] },
  { what: 'air at 0.4 bar', text: line({ fluid: '{ material: air, pressure: 0.4 bar abs }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: ['vacuum'] },
  { what: 'air at -60 degC', text: line({ fluid: '{ material: air, pressure: 1 atm }', inlet: '{ speed: 5 m/s, temperature: -60 degC }' }), hazards: ['cold'] },
  { what: 'nitrogen at room temperature', text: line({ fluid: '{ material: nitrogen, pressure: 1 atm }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: ['asphyxiation'] },
  { what: 'carbon dioxide', text: line({ fluid: '{ material: carbon dioxide, pressure: 1 atm }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: ['carbon-dioxide', 'asphyxiation'] },
  { what: 'sodium', text: line({ fluid: '{ material: sodium, pressure: 1.2 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 300 degC }' }), hazards: ['hot', 'liquid-metal'] },
  { what: 'steam', text: line({ fluid: '{ material: steam, pressure: 1.2 bar abs }', inlet: '{ speed: 5 m/s, temperature: 130 degC }' }), hazards: ['steam', 'hot'] },
  // Marks of the record, whatever name the material is asked by; flash points of NFPA 325: acetone -20 degC, n-dodecane 74 degC.
  { what: 'acetone at room temperature, above its flash point', text: line({ fluid: '{ material: propanone, pressure: 1.2 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 20 degC }' }), hazards: ['flammable'] },
  { what: 'dodecane far below its flash point', text: line({ fluid: '{ material: n-dodecane, pressure: 1.2 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 20 degC }' }), hazards: [] },
  { what: 'liquid propane', text: line({ fluid: '{ material: R-290, pressure: 12 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 20 degC }' }), hazards: ['flammable', 'pressure', 'steam'] },
  { what: 'chloroform', text: line({ fluid: '{ material: trichloromethane, pressure: 1.2 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 20 degC }' }), hazards: ['toxic'] },
  { what: 'liquid oxygen', text: line({ fluid: '{ material: LOX, pressure: 1.5 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: -185 degC }' }), hazards: ['oxygen', 'cold'] },
  { what: 'nitrous oxide feeds a fire', text: line({ fluid: '{ material: N2O, pressure: 1 atm }', inlet: '{ speed: 5 m/s, temperature: 20 degC }' }), hazards: ['asphyxiation', 'oxygen'] },
  { what: 'engine oil that is only warm', text: line({ fluid: '{ material: engine oil, pressure: 1.2 bar abs }', inlet: '{ speed: 0.5 m/s, temperature: 80 degC }' }), hazards: ['hot'] },
  { what: 'a word that only looks like one of the list', text: line({ title: 'Cooling of the drug-free co-current lining of a cartridge' }), hazards: ['medical'] },
  { what: 'a fire named where no heat is set free', text: line({ title: 'Feed line of a fire hydrant' }), hazards: [] },
  { what: 'wind on a chimney, by its drag', text: body('Wind load on a chimney'), hazards: ['structure'] },
  { what: 'wind on a mast, by its wake', text: body('A mast in a gale', 'sheddingFrequency'), hazards: ['structure'] },
  { what: 'wind on a body without a name', text: body('Drag of a round body in wind'), hazards: ['structure'] },
  { what: 'a cylinder in a wind tunnel', text: body('A cylinder in the wind tunnel'), hazards: [] },
  { what: 'wind that cools, without a load', text: body('Wind cools a chimney', 'heatRate', 'inlet: { speed: 25 m/s, temperature: 10 degC }\nwall: { temperature: 30 degC }'), hazards: [] },
  { what: 'a chimney effect is no release', text: line({ title: 'Chimney effect in a tube', fluid: '{ material: air, pressure: 1 atm }', inlet: '{ speed: 1 m/s, temperature: 20 degC }' }), hazards: [] },
  { what: 'effluent', text: line({ title: 'Effluent line' }), hazards: ['release'] },
  { what: 'blood in the title', text: line({ title: 'Test loop with a fluid like blood' }), hazards: ['medical'] },
];

describe('cautions', () => {
  it.each(rows)('$what: $hazards', async ({ text, hazards }) => {
    expect(await hazardsOf(text)).toEqual(hazards);
  });

  it('are set off by a number or a word of the case, and say which', async () => {
    for (const { text, hazards } of rows) {
      const p = await planOf(text);
      const said = linesOf(p, 'cautions').slice(1);
      for (const title of p.checklist.filter((c) => c.id.startsWith('hazard-')).map((c) => (c.text.split(':')[0] as string).toLowerCase())) {
        const own = said.find((l) => l.toLowerCase().startsWith(`${title}:`));
        expect(own).toMatch(/\{[A-Za-z.]+\}|the case names/);
      }
      expect(unknownIds(p, 'cautions')).toEqual([]);
      expect(said.length === 0 || hazards.length > 0 || p.checklist.some((c) => c.id.startsWith('trap-'))).toBe(true);
    }
  });

  it('stay away from a benign case but for the opening, which holds its number', async () => {
    const said = linesOf(await planOf(line()), 'cautions');
    expect(said).toHaveLength(1);
    expect(said[0]).toContain('{pressureDrop}');
  });

  it('name a law outside its range with range and value', async () => {
    const p = await planOf(line({ wall: '{ temperature: -5 degC }' }));
    expect(linesOf(p, 'cautions').join('\n')).toMatch(/dynamic viscosity at the wall, \{viscosityWall\}, comes from a law outside its range .* is -5 degC where it holds from 0 degC to 160 degC/);
  });

  it('see only the hot water in the rinse line', async () => {
    const p = await planOf(readFileSync('examples/rinse-line.case.yaml', 'utf8'));
    expect(p.checklist.filter((c) => c.id.startsWith('hazard-')).map((c) => c.id)).toEqual(['hazard-hot']);
    expect(linesOf(p, 'cautions')[1]).toMatch(/^First of all: Burns; /);
  });
});

const bed = (more: string, material = 'material: air, '): string => `
format: 1
title: Air through beads
targets: [{ quantity: pressureDrop, within: 20 % }]
flow: packed-bed
sizes: { particleDiameter: 10 mm, bedDiameter: 300 mm, length: 1 m }
fluid: { ${material}pressure: 1 bar abs }
inlet: { speed: 1 m/s, temperature: 20 degC }
${more}
`;
const idleOf = async (text: string): Promise<string[]> => linesOf(await planOf(text), 'cautions').filter((l) => l.startsWith('Given and without effect'));

describe('a number that nothing follows from', () => {
  it('is named among the cautions, so that it is not lost without a word', async () => {
    expect(await idleOf(bed('motion: { period: 1 s, amplitude: 2 mm }'))).toEqual([expect.stringContaining('motion.amplitude')]);
  });
  it('is not the void fraction of a bed, under either key', async () => {
    for (const key of ['porous', 'packing']) {
      const plan = await planOf(bed(`${key}: { voidFraction: 0.45 }`));
      expect(plan.quantities['packedBedVoidFraction']?.value).toBe(0.45);
    }
    expect(await idleOf(bed('porous: { voidFraction: 0.45 }'))).toEqual([]);
  });
  it('is not a composition that the material takes', async () => {
    expect(await idleOf(bed('', 'material: flue gas, composition: { nitrogen: 75 % mol, carbon dioxide: 15 % mol, water: 10 % mol }, '))).toEqual([]);
  });
});

describe('flue gas in a duct', () => {
  const flue = (composition: string): string => `
format: 1
title: Hot gas in a duct
targets: [{ quantity: heatRate, within: 10 % }]
flow: pipe
sizes: { diameter: 500 mm, length: 4 m }
fluid: { material: flue gas, composition: ${composition}, pressure: 1 bar abs }
inlet: { speed: 6 m/s, temperature: 700 degC }
wall: { temperature: 300 degC }
`;
  it('radiates by its water vapour and carbon dioxide: p_a = 0.22 bar over L_m = 0.45 m', async () => {
    const plan = await planOf(flue('{ nitrogen: 73 % mol, carbon dioxide: 12 % mol, water: 10 % mol, oxygen: 5 % mol }'));
    expect(plan.quantities['absorbingPressure']?.value).toBeCloseTo(22000, 6);
    expect(plan.effects.find((e) => e.id === 'participating-radiation')).toMatchObject({ applies: true, verdict: 'include' });
  });
  it('does not where neither is in it', async () => {
    const plan = await planOf(flue('{ nitrogen: 80 % mol, oxygen: 20 % mol }'));
    expect(plan.effects.find((e) => e.id === 'participating-radiation')?.applies).toBe(false);
  });
});
