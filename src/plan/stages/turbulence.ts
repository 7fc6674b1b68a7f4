import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed } from '../say.ts';
import type { Check, Line, Table } from '../types.ts';
import { numberTable } from './number-table.ts';
import { featureWords, scorecard, weakness } from './turbulence-closures.ts';

/** Treatment, closure and its second, the wall with its first cell, sublayers, and what is checked after the run. */
export function turbulence(on: Ground): StageResult {
  const treated = on.choice('turbulence-treatment');
  const modelled = treated.chosen === 'rans' || treated.chosen === 'hybrid';
  return {
    lines: treated.chosen === 'none' ? laminarLines(on) : [...treatmentLines(on, modelled), ...wallLines(on), ...sublayerLines(on), ...transitionLines(on), ...scaleLines(on, modelled)],
    tables: [...(treated.chosen === 'none' ? [] : closureTable(on)), ...numberTable(on, treated.chosen === 'none' ? 'Wall cell of laminar layers' : 'First cell at the wall', ['frictionReynolds', 'viscousLength', 'yPlusTarget', 'firstNodeDistance', 'firstCellHeight', 'firstNodeYPlus', 'thinnestLayer', 'cellsAcrossLayer', 'cellsBelow5', 'cellsBelow30', 'thermalSublayer', 'speciesSublayer']), ...(modelled ? inletTable(on) : [])],
    checklist: checks(on, treated.chosen),
  };
}

function laminarLines(on: Ground): Line[] {
  const treated = on.choice('turbulence-treatment');
  return lines(
    `No turbulence model: ${treated.because}${on.has('regimeGroup') && on.has('regimeLow') ? ' ({regimeGroup} against {regimeLow})' : ''}.`,
    on.has('thinnestLayer') && on.has('cellsAcrossLayer') && `No y+ applies. {cellsAcrossLayer} cells across the thinnest layer {thinnestLayer} make the cell at the wall {firstCellHeight} high, its node {firstNodeDistance} from the wall (${on.word('storage') ?? 'cell-centred'} storage); a gradient from the first cell alone then errs by {wallError}.`,
  );
}

function treatmentLines(on: Ground, modelled: boolean): Line[] {
  const [treated, closure, second, prandtl, inlet] = ['turbulence-treatment', 'closure', 'second-closure', 'turbulent-prandtl', 'inlet-turbulence'].map((id) => on.choice(id));
  return lines(
    `Treatment ${treated?.chosen}: ${treated?.because}.`,
    modelled && `Closure ${closure?.chosen}: ${closure?.because}. For ${featureWords(on)} its known weakness is: ${weakness(on, closure?.chosen ?? '')}.`,
    modelled && second?.chosen !== 'none' && `Second closure ${second?.chosen}: ${second?.because}. The difference of the two answers is the least model error to state; it is no bound.`,
    prandtl?.applies === true && `Turbulent Prandtl number ${prandtl.chosen}: ${prandtl.because}.`,
    inlet?.applies === true && `Inlet turbulence ${inlet.chosen}: ${inlet.because}.`,
  );
}

function closureTable(on: Ground): Table[] {
  return on.choice('closure').applies === false ? [] : [table(`Closures for ${featureWords(on)}`, ['closure', 'known weakness', 'source', 'here'], scorecard(on))];
}

function wallLines(on: Ground): Line[] {
  const wall = on.choice('near-wall-treatment');
  if (wall.applies === false) return lines(`Near-wall treatment: none, ${wall.because}.`);
  if (!on.has('firstCellHeight')) return lines(`Near-wall treatment ${wall.chosen}: ${wall.because}. No first cell can be given: the friction at the wall is not known.`);
  const law = wall.chosen === 'law-of-the-wall' || wall.chosen === 'rough-law';
  const y = on.number('yPlusTarget') ?? 1;
  const log = (on.number('frictionReynolds') ?? 0) * 0.2;
  return lines(
    `Near-wall treatment ${wall.chosen}: ${wall.because}.`,
    `At the highest shear the friction law gives a viscous length of {viscousLength}; y+ = {yPlusTarget} puts the first node {firstNodeDistance} from the wall, and the cell there is {firstCellHeight} high in full, for the unknowns stand ${on.word('storage') === 'node-centred' ? 'in the nodes' : 'in the middle of the cell'}.`,
    law
      ? `Allowed band 30 to ${on.has('frictionReynolds') ? `a fifth of delta+ = {frictionReynolds}${log < 60 ? ', which leaves hardly a logarithmic layer' : ''}` : '300'}, never 5 to 30. With y+ = {yPlusTarget} at the highest shear the band holds down to ${Math.round(100 * (30 / y) ** 2)} % of it. No law of the wall holds where the flow separates, near stagnation, or where weight bends the profile.`
      : `Allowed after the run up to twice that. An error of a fifth in the friction moves y+ by a tenth only${on.has('cellsBelow30') ? '; {cellsBelow5} whole cells lie below y+ = 5 and {cellsBelow30} below 30' : ''}.`,
    on.has('frictionReynolds') && !law && `A law of the wall would need delta+ above 1000 and no heat, separation or weight at the wall: here delta+ = {frictionReynolds}.`,
  );
}

function sublayerLines(on: Ground): Line[] {
  return lines(
    on.has('thermalSublayer') && `Heat has a sublayer of {thermalSublayer} (Pr = {prandtl})${(on.number('prandtl') ?? 1) > 1 && on.word('targetHeat') === 'yes' ? ', thinner than that of momentum, so the first node was moved closer' : ''}.`,
    on.has('speciesSublayer') && 'The species has a sublayer of {speciesSublayer} (Sc = {schmidt}); where it cannot be meshed, take a wall law for mass and say so.',
  );
}

function transitionLines(on: Ground): Line[] {
  return lines(
    on.has('laminarShare') && (on.number('laminarShare') ?? 0) > 0.01 && `The laminar share of the target surface is {laminarShare}: ${on.kept('transition') ? 'the onset must be modelled or fixed, and bracketed by runs laminar and turbulent from the edge' : 'small enough to be taken as turbulent throughout'}.`,
    on.kept('roughness') && on.has('roughnessReynolds') && 'Roughness: k_s+ = {roughnessReynolds}; the first node stays above the grains.',
  );
}

function scaleLines(on: Ground, modelled: boolean): Line[] {
  if (!on.has('kolmogorovLength')) return [];
  return lines(modelled ? `The smallest eddies measure {kolmogorovLength} and live {kolmogorovTime}: core cells of {coreCellSize} average over them.` : `The smallest eddies measure {kolmogorovLength} and live {kolmogorovTime}; cells of {coreCellSize} inside, {viscousLength} being the unit at the wall, must hold 80 % of the fluctuation energy. Start from an averaged field with added fluctuations.`);
}

function inletTable(on: Ground): Table[] {
  return numberTable(on, 'Turbulence that flows in', ['turbulenceIntensity', 'turbulenceLength', 'turbulentKineticEnergy', 'dissipationRate', 'specificDissipationRate', 'viscosityRatio']);
}

function checks(on: Ground, treated: string): Check[] {
  if (!on.has('firstCellHeight') || !on.has('yPlusTarget')) return [];
  const law = ['law-of-the-wall', 'rough-law'].includes(on.choice('near-wall-treatment').chosen);
  const walls = on.assembled.flow.walls.length === 0 ? 'the wall' : listed(on.assembled.flow.walls);
  return [
    { id: 'turbulence-y-plus', stage: 'turbulence', text: law ? 'map of y+: less than 5 % of the wall below 30 or above the band, else move the first node by the ratio' : 'map of y+: 95 % of the wall below twice the aim, else scale the cell by the ratio', limit: law ? '30 to a fifth of delta+' : 'twice the aim', where: walls },
    ...(treated === 'rans' || treated === 'hybrid' ? [] : [{ id: 'turbulence-resolved', stage: 'turbulence', text: 'share of the fluctuation energy that is resolved', limit: 'at least 80 %', where: 'away from walls' }]),
  ];
}
