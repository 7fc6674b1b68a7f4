import { contradiction, without } from './contradiction.ts';
import type { Ground } from './ground.ts';
import { aFlow, inWords, listed } from './say.ts';
import type { Contradiction } from './types.ts';

/** Choices the case states, against the verdicts and the numbers of the plan. */
export function* choiceContradictions(on: Ground): Generator<Contradiction> {
  yield* density(on);
  yield* turbulence(on);
  yield* cuts(on);
  yield* wall(on);
  yield* time(on);
  yield* domain(on);
}

const chosen = (on: Ground, id: string): string | undefined => on.assembled.chosen[id];
const verdict = (on: Ground, id: string): string => { const e = on.effect(id); return e === undefined || e.applies === false ? 'leave-out' : e.verdict; };
const number = (on: Ground, id: string): string => { const q = on.effect(id)?.deciding?.quantity; return q === undefined ? '' : ` (${on.assembled.workings.slots[on.assembled.workings.index.get(q) ?? -1]?.node.about.name ?? q}: ${inWords(on, q)})`; };

function* density(on: Ground): Generator<Contradiction> {
  const law = chosen(on, 'density-law');
  if (law === undefined) return;
  const path = 'choices.densityVariesWith';
  if (law === 'constant') {
    const acts = ['buoyancy', 'buoyancy-driven', 'variable-density', 'compressibility'].filter((id) => verdict(on, id) === 'include');
    if (acts.length > 0) yield contradiction(on, 'constant-density', path, { says: `the density is held constant while ${listed(acts)} ${acts.length === 1 ? 'counts' : 'count'}${number(on, acts[0] as string)}`, effect: 'the forces or the expansion that decide this flow are switched off, and the field stays plausible', cure: 'boussinesq for small differences, temperature for large ones, temperature-and-pressure for fast gas' });
  } else if (law === 'boussinesq' && (verdict(on, 'variable-density') === 'include' || verdict(on, 'nonlinear-density') === 'include')) {
    const id = verdict(on, 'variable-density') === 'include' ? 'variable-density' : 'nonlinear-density';
    yield contradiction(on, 'linear-density', path, { says: `the density is linear in temperature while ${id} counts${number(on, id)}`, effect: 'weight and volume of the hot and the cold fluid are both wrong', cure: 'let the density follow the temperature by its record' });
  } else if (law !== 'temperature-and-pressure' && verdict(on, 'compressibility') === 'include') {
    yield contradiction(on, 'no-pressure-in-density', path, { says: `the density follows ${law === 'temperature' ? 'the temperature alone' : law} while compressibility counts${number(on, 'compressibility')}`, effect: 'no sonic limit, no shock, wrong density along the passage', cure: 'temperature-and-pressure' });
  }
}

function* turbulence(on: Ground): Generator<Contradiction> {
  const how = chosen(on, 'turbulence-treatment');
  const found = verdict(on, 'turbulence');
  const group = on.has('regimeGroup') ? `, at ${inWords(on, 'regimeGroup')} against ${inWords(on, 'regimeLow')} to ${inWords(on, 'regimeHigh')}` : '';
  if (how === 'none' && found === 'include') yield contradiction(on, 'no-closure', 'choices.turbulence', { says: `no turbulence is modelled${group}`, effect: 'friction and heat transfer come out far too low, or the run never settles', cure: 'rans for means, or a mesh and step that resolve the eddies (dns)' });
  if (how !== undefined && how !== 'none' && found === 'leave-out') yield contradiction(on, 'closure-on-laminar', 'choices.turbulence', { says: `turbulence is treated by ${how}${group}: the flow is laminar`, effect: 'eddy viscosity that is not there raises friction and heat transfer', cure: 'none' });
  const closure = chosen(on, 'closure');
  if (how === 'none' && closure !== undefined && closure !== 'none') yield contradiction(on, 'closure-without-treatment', 'choices.closure', { says: `the closure ${closure} is named and turbulence is not treated`, effect: 'one of the two is ignored', cure: 'leave the closure out, or take rans' });
}

function* cuts(on: Ground): Generator<Contradiction> {
  const cut = chosen(on, 'dimension-and-cuts')?.split('+') ?? [];
  const plane = cut.filter((c) => c === 'two-dimensional' || c === 'axisymmetric');
  if (plane.length === 2) yield contradiction(on, 'two-planes', 'choices.cuts', { says: 'two-dimensional and axisymmetric are both chosen', effect: 'a run is one or the other', cure: 'keep one' });
  const fits: readonly string[] = on.assembled.flow.cuts.map((c) => c.option);
  for (const c of cut) if (fits.length > 0 && !fits.includes(c)) yield contradiction(on, 'cut-does-not-fit', 'choices.cuts', { says: `${c} is chosen for ${aFlow(on)}`, effect: 'its shape has no such plane, axis or repeat: another body would be computed', cure: `one of ${listed(fits, 'or')}` });
  const [one] = plane;
  if (one !== undefined && verdict(on, 'three-dimensionality') === 'include') yield contradiction(on, 'flat-cut', 'choices.cuts', { says: `the cut is ${one} while the flow is three-dimensional: ${on.effect('three-dimensionality').because}`, effect: 'what happens across the plane is suppressed and the result converges to another flow', cure: 'compute the third direction, half of it where one mirror plane remains' });
  const mirrors = cut.filter((c) => c.startsWith('mirror-'));
  if (mirrors.includes('mirror-top-bottom') && on.word('axis') === 'level' && (verdict(on, 'buoyancy') === 'include' || verdict(on, 'buoyancy-driven') === 'include')) yield contradiction(on, 'mirror-across-gravity', 'choices.cuts', { says: `top and bottom are taken alike while buoyancy counts${number(on, 'buoyancy')}`, effect: 'hot fluid cannot rise through the mirror: layering and rolls are lost', cure: 'mirror left to right only' });
  const resolved = ['les', 'dns', 'wall-modelled-les', 'hybrid'].find((t) => t === chosen(on, 'turbulence-treatment'));
  if (resolved !== undefined && [...plane, ...mirrors].length > 0) yield contradiction(on, 'cut-through-eddies', 'choices.cuts', { says: `${listed([...plane, ...mirrors])} is chosen with ${resolved}`, effect: 'eddies cross planes and axes; a mirror or a plane changes their statistics', cure: 'the whole section, with repeating ends where the flow repeats' });
}

function* wall(on: Ground): Generator<Contradiction> {
  const how = chosen(on, 'near-wall-treatment');
  const yPlus = on.assembled.case.number('choices.yPlus');
  if (yPlus === undefined || how === undefined) return;
  if ((how === 'law-of-the-wall' || how === 'rough-law') && yPlus < 5) yield contradiction(on, 'wall-law-in-viscous-layer', 'choices.yPlus', { says: `a ${how.replace(/-/g, ' ')} with y+ of ${inWords(on, 'choices.yPlus')}`, effect: 'the law has no logarithmic layer to stand on: wall shear and heat follow the mesh', cure: 'y+ from 30 up, or resolve the layer' });
  else if (how === 'law-of-the-wall' && yPlus < 30) yield contradiction(on, 'wall-law-in-buffer-layer', 'choices.yPlus', { says: `a law of the wall with y+ of ${inWords(on, 'choices.yPlus')}, in the buffer layer`, effect: 'wall shear off by up to a fifth either way', cure: 'y+ from 30 up, or a blended treatment' });
  if (how === 'resolved' && yPlus > 5) yield contradiction(on, 'unresolved-wall-layer', 'choices.yPlus', { says: `the wall layer is called resolved with y+ of ${inWords(on, 'choices.yPlus')}`, effect: 'the first node stands outside the viscous layer: wall shear and heat come out low', cure: 'y+ of 1, or a blended treatment' });
  if (how === 'none' && verdict(on, 'turbulence') === 'include') yield contradiction(on, 'no-wall-treatment', 'choices.wallTreatment', { says: 'turbulent flow along walls without any wall treatment', effect: 'the wall shear has no law behind it', cure: 'resolved, blended or a law of the wall' });
}

function* time(on: Ground): Generator<Contradiction> {
  const run = chosen(on, 'run-character');
  if (run === 'steady' && verdict(on, 'unsteadiness') === 'include') yield contradiction(on, 'steady-run', 'choices.run', { says: `a steady run of a flow that is unsteady: ${on.effect('unsteadiness').because}`, effect: 'it does not settle, or settles on a state that does not exist', cure: 'a transient run, averaged' });
  if (run === 'steady' && (on.assembled.case.has('time.period') || on.assembled.case.has('time.ramp'))) yield contradiction(on, 'steady-run-of-a-course', 'choices.run', { says: 'a steady run is chosen and the case gives a course in time', effect: 'the course has no part in the answer', cure: 'a transient run, or leave the course out' });
  const step = on.assembled.case.number('choices.timeStep');
  if (step === undefined) return;
  if (run === 'steady') yield contradiction(on, 'step-of-a-steady-run', 'choices.timeStep', { says: `a time step of ${inWords(on, 'choices.timeStep')} is given for a steady run`, effect: 'nothing uses it', cure: 'leave it out, or choose a transient run' });
  const limit = without(on, 'choices.timeStep', 'timeStep');
  if (limit !== undefined && step > limit * 1.01) yield contradiction(on, 'step-above-limit', 'choices.timeStep', { says: `the time step is ${inWords(on, 'choices.timeStep')}, its limit ${inWords(on, 'timeStep', limit)}`, effect: 'an explicit scheme blows up; an implicit one damps what is asked for', cure: `a step of ${inWords(on, 'timeStep', limit)} or less` });
}

function* domain(on: Ground): Generator<Contradiction> {
  for (const [side, id] of [['upstream', 'domainUpstream'], ['downstream', 'domainDownstream'], ['sides', 'domainSides'], ['above', 'domainAbove']] as const) {
    const path = `choices.domain.${side}`;
    const given = on.assembled.case.number(path);
    const advised = given === undefined ? undefined : without(on, path, id);
    if (given !== undefined && advised !== undefined && given < 0.99 * advised) yield contradiction(on, 'domain-too-short', path, { says: `the domain ends ${inWords(on, path)} ${side === 'above' ? 'above' : side === 'sides' ? 'to each side' : side}, advised are ${inWords(on, id, advised)}`, effect: side === 'downstream' ? 'the outlet stands in the wake or in a layer that still changes and draws fluid in' : 'the far end squeezes the flow and moves the target', cure: `${inWords(on, id, advised)}, or a run with half as much again to show that the target does not move` });
  }
}
