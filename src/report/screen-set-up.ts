import type { Plan } from '../plan/index.ts';
import type { Part } from './fit.ts';
import type { Writing } from './writing.ts';

/**
 * The parts of the screen that say what to set up: the wall, the mesh, the step, the cost.
 *
 * @param plan     the plan
 * @param writing  how its numbers are written
 * @param room     columns of an item
 * @returns        parts, those without a number left out
 */
export function setUpParts(plan: Plan, writing: Writing, room: number): Part[] {
  const has = (id: string): boolean => plan.quantities[id] !== undefined;
  const say = (words: string, id: string): string => (has(id) ? `${words} ${writing.number(id)}` : '');
  const item = (...pieces: readonly string[]): string[] => flowing(pieces.filter((piece) => piece !== ''), room);
  const meshes = ['cellCountCoarse', 'cellCountMedium', 'cellCountFine'].filter(has).map((id) => plainNumber(writing, id));
  return [
    {
      label: 'Wall',
      items: [
        ...item(say('first cell', 'firstCellHeight'), say('its node at', 'firstNodeDistance'), say('y+', 'yPlusTarget'), say('growth', 'growthRatio'), say('layers', 'layerCount'), say('stack', 'layerStackHeight'), say('boundary layer', 'boundaryLayerThickness')),
      ],
      least: 2,
      apart: true,
    },
    { label: 'Mesh', items: item(say('core cell', 'coreCellSize'), meshes.length === 0 ? say('cells', 'cellCount') : `cells ${meshes.join(' / ')}`, say('cell Peclet', 'cellPeclet')), least: 1 },
    { label: 'Time', items: item(say(marches(plan) ? 'pseudo-step' : 'step', 'timeStep'), binding(plan, writing), say('run', 'runTime'), say('steps', 'stepCount'), say('flow-through', 'flowThroughTime')), least: 1 },
    { label: 'Cost', items: [...item(run('medium', '', plan, writing), has('memory') ? `memory ${plain(writing, 'memory')}` : ''), ...item(run('fine', 'Fine', plan, writing), has('coreHoursAll') ? `all runs ${hours('coreHoursAll', writing)}` : '')], least: 2 },
  ];
}

/** Pieces packed into lines, separated by semicolons. */
function flowing(pieces: readonly string[], room: number): string[] {
  const lines: string[] = [];
  for (const [i, piece] of pieces.entries()) {
    const text = i === pieces.length - 1 ? piece : `${piece};`;
    const longer = `${lines.at(-1) ?? ''} ${text}`;
    if (lines.length > 0 && longer.length <= room) lines[lines.length - 1] = longer;
    else lines.push(text);
  }
  return lines;
}

const plainNumber = (writing: Writing, id: string): string => writing.parts(id).number;

/** One run: its mesh, core hours, time until it is done. The spread stands once, the others share it. */
function run(mesh: string, suffix: '' | 'Fine', plan: Plan, writing: Writing): string {
  if (plan.quantities[`coreHours${suffix}`] === undefined) return '';
  const { spread } = writing.parts('coreHours');
  const done = plan.quantities[`wallTime${suffix}`] === undefined ? '' : `, done in ${plain(writing, `wallTime${suffix}`)}`;
  return `${mesh} mesh ${hours(`coreHours${suffix}`, writing)}${suffix !== '' || spread === '' ? '' : ` ${spread}`}${done}`;
}

const hours = (id: string, writing: Writing): string => `${writing.parts(id).number} core hours`;

/** A number with its unit, without its spread. */
const plain = (writing: Writing, id: string): string => [writing.parts(id).number, writing.parts(id).unit].filter((part) => part !== '').join(' ');

/** A run to a steady state has no step in time but one that only drives it there. */
const marches = (plan: Plan): boolean => plan.choices.some((c) => c.id === 'run-character' && (c.chosen === 'steady' || c.chosen === 'march'));

/** The limit that the step follows from. */
function binding(plan: Plan, writing: Writing): string {
  if (plan.quantities['timeStepLimit'] !== undefined) return `${writing.number('timeStepLimit')} limit`;
  const step = plan.quantities['timeStep'];
  const limit = step?.needs.find((id) => /^timeStep[A-Z]/.test(id) && plan.quantities[id]?.value === step.value);
  return limit === undefined ? '' : `bound by ${plan.quantities[limit]?.name ?? limit}`;
}
