import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed, nameOf, sentence } from '../say.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { chosen, firstSaid, keeps, said } from '../when.ts';

/** How much of the world is computed: its ends, cuts, what may be left out of the geometry, and the run that tests the ends. */
export function domain(on: Ground): StageResult {
  const { flow } = on.assembled;
  return {
    lines: [
      ...lines(extentLine(on), inletRun(on), ...outletLines(on), blockage(on)),
      ...lines(`The least region that can show this flow: ${flow.leastRegion}`, cutLine(on)),
      ...lines(
        said(on, 'A step, gap or bead lower than {featureLimit} may leave the geometry; all that is larger stays or is argued for. The smallest width must be right within {geometryTolerance}.'),
        surroundings(on),
        scaleLine(on),
      ),
      ...largerLines(on),
    ],
    tables: [...extents(on), ...cuts(on)],
    checklist: checks(on),
  };
}

const factorOf = (end: string): string => end.charAt(0).toUpperCase() + end.slice(1);
const ends = (on: Ground): Ground['assembled']['flow']['domain'] => on.assembled.flow.domain.filter((e) => on.has(e.id));

function extentLine(on: Ground): string {
  const { flow } = on.assembled;
  if (flow.domain.length === 0) return `The region is the closed space itself: its walls are its ends, and no end has to be placed.`;
  const placed = ends(on).filter((e) => on.number(e.id) !== 0).map((e) => `{${e.id}} ${e.side === 'sides' ? 'to each side' : e.side} ({domain${factorOf(e.side)}Ratio} times the ${short(flow.lengthIs)})`);
  const none = ends(on).filter((e) => on.number(e.id) === 0).map((e) => e.side);
  return `The region ends ${placed.length === 0 ? 'where the part ends' : listed(placed)}${none.length === 0 ? '' : `; nothing is added ${listed(none)}`}.`;
}
const short = (text: string): string => (text.split(/[;,]/)[0] as string).replace(/^the /, '');

function inletRun(on: Ground): string | false {
  if (on.word('flowClass') === 'continuum') return said(on, 'Free space of {domainUpstream} ahead of the bed lets the stream even out before it meets the particles.');
  if (on.word('flowClass') !== 'internal') return on.word('imposedFlow') === 'no' ? said(on, 'Still fluid is drawn in from at least {domainUpstream} away.') : said(on, 'The stream reaches the body undisturbed {domainUpstream} away from it.');
  const effect = said(on, 'Against a developed profile it makes the heat transfer {entranceFactorNusselt} times and the pressure drop {entranceFactorFriction} times as large.') || said(on, 'Against a developed profile it makes the pressure drop {entranceFactorFriction} times as large.') || '';
  if (on.word('inletProfile') === 'developed') return firstSaid(on, 'The profile is given developed at the inlet, so that no run goes ahead; to compute it instead, {entranceLength} of passage would have to be added, or a slice with repeating ends run first.', 'The profile is given developed at the inlet: no run goes ahead.');
  if (on.word('inletProfile') === 'uniform') return firstSaid(on, `An even stream enters and develops inside the region, over {entranceLength} of the {flowLength} that count. ${effect}`, `An even stream enters and develops inside the region. ${effect}`);
  return firstSaid(on, 'The given profile enters as measured; to know what it does, repeat with the developed one, which takes {entranceLength} to form.', 'The given profile enters as measured.');
}

function outletLines(on: Ground): (string | false)[] {
  if (on.assembled.flow.domain.length === 0 || on.number('domainDownstream') === undefined) return [];
  if (on.word('imposedFlow') === 'no') return [said(on, 'The end above, where the plume leaves, stands {domainDownstream} away.'), 'Test of the open ends after the run: no eddy stands on them and the fluid far away keeps its temperature.'];
  const behind = on.word('flowClass') === 'body' ? 'the body' : on.word('separated') === 'yes' ? 'the step' : 'the stretch that counts';
  const ahead = on.word('separated') === 'yes' && on.word('imposedFlow') === 'yes'
    ? firstSaid(on, `The outlet stands {domainDownstream} behind ${behind}, where the closed eddy ends {reattachmentLength} behind it.`, `The outlet stands {domainDownstream} behind ${behind}, beyond the wake of about {wakeLength}.`, `The outlet stands {domainDownstream} behind ${behind}.`)
    : said(on, `The outlet stands {domainDownstream} behind ${behind}, so that its even pressure does not reach back.`);
  return [ahead, firstSaid(on, 'Test of the outlet after the run: no more than {returningFlow} comes back through it, and contours of pressure do not bend over the last {hydraulicDiameter}.', 'Test of the outlet after the run: no fluid comes back through it near the body, and contours of pressure do not follow its shape.')];
}

function blockage(on: Ground): string | false {
  if (on.word('flowClass') !== 'body') return false;
  if (on.has('blockageRatio')) return said(on, 'Walls stand beside the body: it takes {blockageRatio} of the section. That is part of the case and not an error, as long as the walls are in the mesh.');
  return firstSaid(on,
    'The body takes {domainBlockage} of the height of the region, where 3 % counts as free. The sides then add {domainErrorDrag} to the drag, and {domainErrorDragLarger} with sides 1.5 times as far.',
    'The body takes {domainBlockage} of the height of the region, where 3 % counts as free.',
  );
}

function cutLine(on: Ground): string {
  const word = chosen(on, 'dimension-and-cuts');
  if (word === 'none' || word === 'three-dimensional') return firstSaid(on, 'No cut is taken: the whole is computed in three directions, {cellCount} cells.', 'No cut is taken: the whole is computed in three directions.') as string;
  return `Taken: ${listed(word.split('+').map((w) => w.replaceAll('-', ' ')))}.${word.includes('periodic-along-span') ? '' : said(on, ' That meshes {cutShare} of the whole in {meshDimension} directions.') || ''} ${sentence(on.choice('dimension-and-cuts')?.because)}`.trim();
}

function surroundings(on: Ground): string | false {
  if (on.word('flowClass') === 'internal') return said(on, 'A bend, valve or pump closer than {calmLength} ahead of the inlet still turns the stream: then it belongs into the region, or its profile is measured.');
  if (on.word('flowClass') === 'body' && on.word('imposedFlow') === 'yes') return said(on, 'A neighbour within {domainSides} beside or {domainUpstream} ahead of the body belongs into the region.');
  return false;
}

function scaleLine(on: Ground): string {
  const parts = [said(on, 'the volume is {regionVolumeCheck}'), said(on, 'the wetted area {wallArea}'), said(on, 'the section {flowArea}'), said(on, 'the length scale {length}')].filter((p) => p !== false);
  const gravity = on.word('axis') === undefined ? 'gravity points as drawn' : `the axis is ${on.word('axis') as string}${on.word('ascent') === 'none' || on.word('ascent') === undefined ? '' : `, the main direction goes ${on.word('ascent') as string}`}`;
  return `Before meshing, read off the geometry as imported: ${listed([...parts, gravity])}.`;
}

function largerLines(on: Ground): Line[] {
  const moved = ends(on).filter((e) => (on.number(e.id) ?? 0) > 0);
  const target = on.assembled.targets.find((t) => t.computed && on.has(`${t.id}.domain`));
  if (moved.length === 0) return [];
  return lines(`One run with the larger region on the medium mesh: ${listed(moved.map((e) => `{domain${factorOf(e.side)}Larger} ${e.side === 'sides' ? 'to each side' : e.side}`))}, cells alike in what both have. ${target === undefined ? 'Ends are far enough when no target moves by a tenth of its accuracy' : `Ends are far enough when the ${nameOf(on, target.quantity)} moves by less than {${target.id}.domain}`}.`);
}

function extents(on: Ground): Table[] {
  const rows = ends(on).map((e): Cell[] => [e.side, { id: e.id }, { id: `domain${factorOf(e.side)}Ratio` }, e.source, { id: `domain${factorOf(e.side)}Larger` }]);
  return rows.length === 0 ? [] : [table('Ends of the region', ['side', 'distance', `in ${short(on.assembled.flow.lengthIs)}`, 'rests on', 'in the larger run'], rows)];
}

/** Effects that break a cut. */
const breaks: Readonly<Record<string, readonly string[]>> = {
  'two-dimensional': ['three-dimensionality', 'secondary-flow', 'swirl'],
  axisymmetric: ['buoyancy', 'swirl', 'secondary-flow', 'three-dimensionality'],
  'mirror-left-right': ['unsteadiness', 'swirl'],
  'mirror-top-bottom': ['buoyancy', 'buoyancy-driven', 'unsteadiness', 'swirl'],
  'periodic-along-flow': ['entrance-effects', 'variable-viscosity', 'variable-density'],
};

function cuts(on: Ground): Table[] {
  const word = chosen(on, 'dimension-and-cuts').split('+');
  const rows = on.assembled.flow.cuts.map(({ option, holdsIf }) => {
    const against = (breaks[option] ?? []).filter((e) => keeps(on, e));
    const checked = (breaks[option] ?? []).filter((e) => on.effect(e)?.applies !== false).map((e) => `${e}: ${on.effect(e)?.verdict ?? 'not judged'}`);
    return [option.replaceAll('-', ' '), holdsIf, checked.length === 0 ? 'no effect of this case breaks it' : checked.join('; '), word.includes(option) ? 'taken' : against.length > 0 ? `not taken: ${listed(against)}` : 'not taken'];
  });
  return rows.length === 0 ? [] : [table('Smaller regions, and what they rest on', ['cut', 'holds if', 'verdicts it rests on', 'here'], rows)];
}

function checks(on: Ground): Check[] {
  const moved = ends(on).some((e) => (on.number(e.id) ?? 0) > 0);
  const cut = chosen(on, 'dimension-and-cuts');
  return [
    { id: 'domain-scale', stage: 'domain', text: scaleLine(on), where: 'geometry as imported' },
    ...(moved ? [{ id: 'domain-larger', stage: 'domain', text: 'the run with the ends 1.5 times as far moves the target by less than its share', ...(on.has('targets.0.domain') ? { limit: '{targets.0.domain}' } : {}), where: 'medium mesh' }] : []),
    ...(cut.includes('mirror') ? [{ id: 'domain-mirror', stage: 'domain', text: 'a pair of probes across the plane of the mirror, in one run of the whole on the coarse mesh, reads alike', where: 'coarse mesh, both sides' }] : []),
  ];
}
