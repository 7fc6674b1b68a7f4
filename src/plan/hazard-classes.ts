import { inputsInWords } from '../problems/index.ts';
import { inWords } from './say.ts';
import type { HazardClass, HazardView } from './hazard-view.ts';

const gas = (on: HazardView): boolean => on.word('medium') === 'gas';
const liquid = (on: HazardView): boolean => on.word('medium') === 'liquid';
/** One substance: of a mixture with other gases a part alone condenses, at its dew point. */
const pure = (on: HazardView): boolean => !(on.assembled.fluid?.record.takes ?? []).some((t) => t === 'humidity' || t === 'components');
const named = (word: string | undefined): string | undefined => (word === undefined ? undefined : `the case names ${word}`);

/** Numbers that an effect was judged on, for the sentence. */
function judged(on: HazardView, id: string, what: string): string | undefined {
  if (!on.open(id)) return undefined;
  const e = on.effect(id);
  if (e.verdict === 'undecided') return `${what} is possible: ${e.missing !== undefined && e.missing.length > 0 ? `it cannot be told before ${inputsInWords(e.missing)} is known` : 'the plan does not judge it yet'}`;
  return `${what} is ${e.verdict === 'include' ? 'expected' : 'close'}${e.deciding === undefined ? '' : `, {${e.deciding.quantity}} against its limits`}`;
}

function pressure(on: HazardView): string | undefined {
  if (gas(on) && on.atLeast('gaugePressure', 'gaugePressureLimit')) return `gas or vapour at {gaugePressure} above ambient, from {gaugePressureLimit} on a burst hurts${on.has('pressureEnergy') ? `; pressure times volume is {pressureEnergy}` : ''}`;
  if (gas(on) && on.atLeast('pressureEnergy', 'pressureEnergyLimit')) return 'the gas holds {pressureEnergy} of pressure times volume, from {pressureEnergyLimit} on codes look closer';
  if (liquid(on) && on.atLeast('gaugePressure', 'gaugePressureLimitLiquid')) return 'liquid at {gaugePressure} above ambient, from {gaugePressureLimitLiquid} on a jet or a burst hurts';
  if (liquid(on) && (on.number('flashMargin') ?? -1) > 0 && on.atLeast('gaugePressure', 'gaugePressureLimit')) return 'the liquid stands at {gaugePressure} above ambient and {flashMargin} above its boiling point at ambient pressure: a leak flashes to vapour';
  if (liquid(on) && (on.number('flashMarginMost') ?? -1) > 0 && on.atLeast('gaugePressure', 'gaugePressureLimit')) return 'the liquid stands at {gaugePressure} above ambient and {flashMarginMost} above what boils first in it at ambient pressure: a leak may flash to vapour';
  return undefined;
}

/** A liquid gives off enough vapour to light from 5 K below its flash point on. */
function aboveFlash(on: HazardView): boolean {
  const { fluid } = on.assembled;
  if (fluid?.record.marks?.includes('flammable') !== true) return false;
  const highest = on.number('highestTemperature') ?? on.number('temperature');
  // What is marked and has no flash point is a liquefied gas.
  return fluid.flashPoint === undefined || (highest !== undefined && highest > fluid.flashPoint - 5);
}

function hotOil(on: HazardView): string | undefined {
  const oil = on.mark('oil', 'fluid');
  return oil !== undefined && on.atLeast('highestTemperature', 'oilFlashLimit') ? `${oil} at {highestTemperature}; oils give off vapour that lights from {oilFlashLimit} on` : undefined;
}

function cold(on: HazardView): string | undefined {
  if (on.below('lowestTemperature', 'coldLimit')) return 'down to {lowestTemperature}, below {coldLimit}';
  return liquid(on) ? named(on.mark('cryogen', 'fluid')) : undefined;
}

function structure(on: HazardView): string | undefined {
  const flow = on.word('flow');
  if (flow === 'building' || flow === 'bluff-body' || flow === 'column-collapse') return `loads on a ${flow} in a stream of {speed}`;
  if (flow === 'sloshing-tank' && on.word('has.motion') === 'yes') return 'a tank that is shaken';
  return wind(on);
}

/** Air that streams past something built, where a load or the beat of a wake is asked for; the words alone mean a draught or a tunnel too. */
function wind(on: HazardView): string | undefined {
  if (!gas(on) || on.word('flowClass') !== 'body' || on.word('imposedFlow') !== 'yes') return undefined;
  const load = on.word('targetMomentum') === 'yes' || on.assembled.targets.some((t) => /^(?:sheddingFrequency|strouhal)/.test(t.quantity));
  const built = on.mark('built', 'text');
  if (!load || (built === undefined && (on.mark('wind', 'text') === undefined || on.mark('windTunnel', 'text') !== undefined))) return undefined;
  const most = on.assembled.ranges.find((r) => r.path === 'inlet.speed')?.to;
  return `wind at {speed}${most === undefined ? '' : `, up to ${inWords(on, 'inlet.speed', most)},`} on ${built === undefined ? 'a body' : `a ${built}`}${on.has('sheddingFrequency') ? '; its wake beats at {sheddingFrequency}, which may meet a natural frequency of the structure' : ''}`;
}

function turning(on: HazardView): string | undefined {
  const path = ['drive.rotation', 'frame.rotation', 'wall.rotation', ...on.assembled.case.list('walls').map((w) => `walls.${w}.rotation`)].find((p) => on.given(p));
  if (path !== undefined) return `a part turns at ${on.has(path) ? `{${path}}` : 'a speed that the case gives'}`;
  return on.assembled.case.has('impeller') ? 'an impeller turns' : undefined;
}

/** Classes of danger, the worst first. Each sentence defers to those who decide: local codes and licensed practice. */
export const hazardClasses: readonly HazardClass[] = [
  { id: 'flammable', title: 'Fire and explosion', why: (on) => named(on.mark('flammable', 'solute') ?? (gas(on) || (on.number('highestTemperature') !== undefined && on.atLeast('highestTemperature', 'touchLimit')) || aboveFlash(on) ? on.mark('flammable', 'fluid') : undefined) ?? on.mark('dust', 'solute', 'text')) ?? hotOil(on) ?? (on.word('has.burning') === 'yes' ? 'the case burns' : undefined), means: 'Flammable limits widen with temperature, pressure and oxygen, and a mean concentration hides rich pockets; classed areas and ignition sources are for a competent person to settle.' },
  { id: 'hydrogen', title: 'Hydrogen', why: (on) => named(on.mark('hydrogen', 'fluid', 'solute')), means: 'It leaks through the smallest gap, lights at the least spark, burns unseen, gathers under ceilings and makes metals brittle.' },
  { id: 'toxic', title: 'Poison', why: (on) => named(on.mark('toxic', 'fluid', 'solute')), means: 'Limits of exposure are law: take them from the list in force. A computed dilution is no proof that the air can be breathed.' },
  { id: 'corrosive', title: 'Acid or lye', why: (on) => named(on.mark('corrosive', 'fluid', 'solute')), means: 'It burns skin and blinds: shields, eye wash and materials that bear it follow the safety data sheet and the rules of the place.' },
  { id: 'carbon-dioxide', title: 'Carbon dioxide', why: (on) => named(on.mark('carbonDioxide', 'fluid', 'solute')), means: 'It poisons long before it displaces enough air for an oxygen alarm: have carbon dioxide itself measured.' },
  { id: 'asphyxiation', title: 'Lack of oxygen', why: (on) => (gas(on) || on.number('lowestTemperature') !== undefined && on.below('lowestTemperature', 'coldLimit') ? named(on.mark('inert', 'fluid')) : undefined) ?? (on.mark('carbonDioxide', 'solute') === undefined ? named(on.mark('inert', 'solute')) : undefined), means: 'A leak into a closed room takes the oxygen without any warning to the senses: ventilate, monitor oxygen, follow the rules for confined spaces.' },
  { id: 'oxygen', title: 'Enriched oxygen', why: (on) => named(on.mark('oxygen', 'fluid')), means: 'What only smoulders in air burns fiercely in it, oil and grease above all: materials and cleanliness follow the rules for oxygen service.' },
  { id: 'pressure', title: 'Stored pressure', why: pressure, means: 'Wall strength, relief and inspection follow the pressure-equipment code of the place and its inspectors, never this estimate.' },
  { id: 'runaway', title: 'Heat of reaction', why: (on) => judged(on, 'heat-of-reaction', 'heating by the reaction'), means: 'A runaway is not ruled out by an estimate: calorimetry and a process-safety review come before any start.' },
  { id: 'sealed', title: 'Heated closed volume', why: (on) => (on.word('flowClass') === 'enclosure' ? judged(on, 'closed-gas-pressure', 'a rise of pressure in the closed volume') : undefined) ?? named(on.mark('closedValve', 'text')), means: 'Warm what is shut in and the pressure climbs, with a full volume of liquid by bars per kelvin: provide expansion and relief.' },
  { id: 'vacuum', title: 'Vacuum', why: (on) => (on.below('lowestPressure', 'vacuumLimit') ? 'the pressure falls to {lowestPressure}, below {vacuumLimit} absolute' : undefined), means: 'What bears inner pressure can still fold under the outer one: have the external rating and the vacuum relief checked.' },
  { id: 'surge', title: 'Pressure surge', why: (on) => { const said = judged(on, 'acoustics', 'a pressure wave'); return said === undefined ? undefined : `${said}${on.has('surgePressure') ? '; a column stopped at once raises {surgePressure}' : ''}`; }, means: 'A valve or pump that acts fast can pass the design pressure: have the surge analysed before operating.' },
  { id: 'steam', title: 'Steam and boiling', why: (on) => judged(on, 'boiling', 'boiling at the wall') ?? (liquid(on) && (on.number('flashMargin') ?? -1) > 0 ? 'the hottest liquid stands {flashMargin} above its boiling point at ambient pressure' : undefined) ?? (liquid(on) && (on.number('flashMarginMost') ?? -1) > 0 ? 'the hottest liquid stands {flashMarginMost} above what boils first in it at ambient pressure: it may flash' : undefined) ?? (gas(on) && pure(on) && on.atLeast('ambientSaturation', 'touchLimit') ? 'a vapour at {highestTemperature} that condenses at {ambientSaturation} once it escapes' : undefined), means: 'Escaping steam scalds unseen, condensate hammers, a dry wall burns out; the margins here are those of single-phase flow.' },
  { id: 'cavitation', title: 'Cavitation', why: (on) => judged(on, 'cavitation', 'vapour at the lowest pressure'), means: 'Erosion, noise and loss of flow follow; a single-phase result hides them.' },
  { id: 'hot', title: 'Burns', why: (on) => (on.atLeast('highestTemperature', 'touchLimit') ? 'fluid or surfaces up to {highestTemperature}; from {touchLimit} on touch burns' : undefined), means: 'Whether anyone can touch them is not known here: guard or insulate by the local standard.' },
  { id: 'cold', title: 'Deep cold', why: cold, means: 'Cold burns, brittle steel and trapped liquid that boils off are possible: materials, relief and ventilation follow the rules for cold service.' },
  { id: 'liquid-metal', title: 'Liquid metal', why: (on) => (liquid(on) ? named(on.mark('liquidMetal', 'fluid')) : undefined) ?? (liquid(on) && (on.number('prandtl') ?? 1) < 0.1 ? 'a liquid with Pr of {prandtl}' : undefined), means: 'It reacts with water or air, or freezes and plugs; it is handled by those trained for it, and its heat-transfer laws are the least sure.' },
  { id: 'molten-salt', title: 'Molten salt', why: (on) => named(on.mark('moltenSalt', 'fluid', 'solute')), means: 'It may decompose, corrode or freeze, and feeds a fire with organics: check its limits and the margin to freezing.' },
  { id: 'fire', title: 'Fire and smoke', why: (on) => (on.word('flow') === 'flame' || (on.word('flow') === 'plume' && on.assembled.case.number('drive.heatRelease') !== undefined && on.atLeast('drive.heatRelease', 'plumeLimit')) ? 'a flame or a plume of fire size' : ['plume', 'room', 'general'].includes(on.word('flow') ?? '') || on.word('has.sources') === 'yes' ? named(on.mark('fire', 'text')) : undefined), means: 'Design fires, escape and smoke control are set by the authority in charge.' },
  { id: 'turning', title: 'Turning parts', why: turning, means: 'They draw in, burst and throw fragments: guards, speed limits and isolation follow the machinery code; critical speeds are not looked at here.' },
  { id: 'magnetic', title: 'Magnetic field', why: (on) => (on.assembled.case.number('magneticField.fluxDensity') !== undefined && on.atLeast('magneticField.fluxDensity', 'magneticLimit') ? '{magneticField.fluxDensity}, above {magneticLimit}' : undefined), means: 'It draws iron and disturbs implants; the field outside is not computed: mark and control the area by local rules.' },
  { id: 'medical', title: 'Medical use', why: (on) => named(on.mark('medical', 'fluid', 'text')), means: 'Nothing here is for diagnosis or treatment; the regulation of devices and clinical evidence decide.' },
  { id: 'nuclear', title: 'Nuclear safety', why: (on) => named(on.mark('nuclear', 'text')), means: 'Only methods that the regulator has approved carry a safety statement.' },
  { id: 'hygiene', title: 'Hygiene', why: (on) => named(on.mark('hygiene', 'text')), means: 'Lethality and hygiene are proven by the process authority and by experiment.' },
  { id: 'structure', title: 'Loads on structures', why: structure, means: 'Design loads come from the building code, wind tunnels and a licensed engineer; a steady mean misses the peaks of suction.' },
  { id: 'vehicle', title: 'Vehicles', why: (on) => (on.word('flow') === 'aerofoil' ? 'an aerofoil' : named(on.mark('vehicle', 'text'))), means: 'Certification rests on its own trials.' },
  { id: 'release', title: 'Release to the surroundings', why: (on) => named(on.mark('release', 'text')), means: 'Permits ask for models and data that the authority accepts.' },
];
