import { inputsInWords } from '../../problems/index.ts';
import { lines, type Ground } from '../ground.ts';
import { hazardsOf } from '../hazards.ts';
import { listed } from '../say.ts';
import type { Check, Line, Table } from '../types.ts';
import { missingInputs } from './question-inputs.ts';

/** What makes a case harder to set up, and how much. */
const one = ['turbulence', 'buoyancy', 'conjugate', 'species', 'variable-density', 'imposed-unsteadiness', 'non-newtonian', 'swirl', 'rotation'];
const two = ['transition', 'participating-radiation', 'reaction', 'free-surface', 'compressibility', 'viscoelasticity', 'magnetic', 'particle-coupling', 'cavitation', 'boiling', 'condensation', 'freezing'];

/** Who should do it, from what the case holds. */
export function skillLine(on: Ground): Line[] {
  const acts = (id: string): boolean => { const e = on.effect(id); return e !== undefined && e.applies !== false && (on.kept(id) || (!e.judged && e.applies === true)); };
  const [simple, hard] = [one.filter(acts), two.filter(acts)];
  const points = simple.length + 2 * hard.length + Number(on.word('separated') === 'yes') + Number(['les', 'dns', 'hybrid', 'wall-modelled-les'].includes(on.choice('turbulence-treatment')?.chosen ?? '')) * 2;
  const parts = [...simple, ...hard, ...(on.word('separated') === 'yes' ? ['separation'] : [])];
  const danger = on.assembled.case.ifWrong === 'high' && hazardsOf(on).length > 0;
  const who = points >= 6 || danger ? `a specialist in ${listed(hard.length > 0 ? hard : parts.length > 0 ? parts : ['this flow'])} reviews it` : points >= 3 ? 'someone who has run this kind of flow before' : 'a trained user is enough';
  return lines(`Skill: ${who}${parts.length === 0 ? '; nothing in it is out of the ordinary' : `, since ${listed(parts)} ${parts.length === 1 ? 'plays' : 'play'} a part`}${danger ? ' and a wrong answer could hurt people' : ''}.`);
}

/** Points of review with what is open at each in this case. */
export function reviewTables(on: Ground): Table[] {
  const open = missingInputs(on).map((m) => inputsInWords([m.path]));
  const border = on.decisions.effects.filter((e) => e.verdict === 'borderline').map((e) => e.id);
  const rungs = on.ladder.map((r) => r.id);
  const filled = (stage: string): string => `from this plan, ${stage}`;
  return [
    {
      title: 'Points of review; the author signs none of them',
      columns: ['when', 'what is looked at', 'open now'],
      rows: [
        ['before the mesh', 'question, physics, assumptions, walls and signs at the boundaries', open.length === 0 ? 'no input is missing' : `missing: ${listed(open)}`],
        ['before the long run', 'mesh report, pilot run, cost', border.length === 0 ? 'no decision is borderline' : `to settle: ${listed(border)}`],
        ['before use', 'limits of the checklist, bands of error, the ladder, the register', rungs.length === 0 ? 'no known answer to compare with' : `to climb: ${listed(rungs)}`],
      ],
    },
    {
      title: 'Report, chapter by chapter',
      columns: ['chapter', 'filled by'],
      rows: [
        ['question and accuracy asked', filled('question')], ['hand estimates', filled('question')], ['physics decisions', filled('physics')], ['properties', filled('properties')],
        ['domain and boundaries', filled('domain and boundaries')], ['closure', filled('turbulence')], ['mesh and steps', 'this plan, then the mesh report'], ['schemes and tolerances', filled('numerics')],
        ['verification', `the mesh family${on.choice('run-character')?.chosen === 'transient' ? ' and the step family' : ''}`], ['ladder and validation', rungs.length === 0 ? 'open: no rung' : listed(rungs)],
        ['results with error bands', on.assembled.targets.length === 0 ? 'open: no target' : `the final run, ${listed(on.assembled.targets.map((t) => t.quantity))}`], ['range of validity', 'groups recomputed from the field'], ['assumptions still open', 'the register, as confirmed'], ['departures', 'the record'],
      ],
    },
  ];
}

export function reviewChecks(on: Ground): Check[] {
  const high = on.assembled.case.ifWrong === 'high';
  return [
    { id: 'review-before-mesh', stage: 'documentation', text: `${high ? 'an independent reader' : 'a colleague'} has read question, physics and boundaries and signed with the open points` },
    { id: 'review-before-use', stage: 'documentation', text: `${high ? 'an independent reader and the licensed practitioner in charge have' : 'a colleague has'} held the result against its error bands and the register` },
  ];
}
