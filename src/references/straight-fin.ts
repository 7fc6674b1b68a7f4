import { reference } from './define.ts';
import { conductivity, transfer } from './inputs.ts';

const steepness = (g: { readonly heatTransferCoefficient: number; readonly perimeter: number; readonly thermalConductivity: number; readonly sectionArea: number; readonly finLength: number }): number =>
  Math.sqrt((g.heatTransferCoefficient * g.perimeter) / (g.thermalConductivity * g.sectionArea)) * (g.finLength + g.sectionArea / g.perimeter);

export const straightFin = reference('straight-fin', {
  title: 'Straight fin or pin of constant section',
  kind: 'exact',
  assumes: ['steady', 'one-dimensional in the fin', 'uniform heat transfer coefficient', 'heat from the tip counted by a longer fin'],
  verifies: ['conduction in a solid', 'surface condition'],
  source: 'Bergman, Lavine, Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 7th ed., table 3.5',
  uncertainty: 0.01,
  passLimit: 0.01,
  ifMissed: 'corrected length; perimeter and section of the same fin; Biot number across the fin below 0.1',
  flows: ['solid'],
  needs: [{ id: 'finLength', unit: 'm', name: 'length of the fin' }, { id: 'perimeter', unit: 'm', name: 'perimeter of the section' }, { id: 'sectionArea', unit: 'm^2', name: 'area of the section' }, conductivity, transfer],
  values: [
    { id: 'finParameter', name: 'm L_c', unit: '1', formula: 'm L_c = sqrt(h P/(k A)) (L + A/P)', value: steepness },
    { id: 'finEfficiency', name: 'efficiency', unit: '1', formula: 'eta = tanh(m L_c)/(m L_c)', value: (g) => Math.tanh(steepness(g)) / steepness(g) },
  ],
});
