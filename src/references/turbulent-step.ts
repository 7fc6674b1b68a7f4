import { reference } from './define.ts';

export const turbulentStep = reference('turbulent-step', {
  title: 'Turbulent flow over a backward-facing step',
  kind: 'measured',
  assumes: ['turbulent boundary layer ahead of the step', 'small expansion ratio', 'mean flow two-dimensional', 'constant density'],
  verifies: ['turbulence closure in separated flow', 'reattachment'],
  source: 'Driver and Seegmiller, AIAA J. 23 (1985) 163-171; Le, Moin and Kim, J. Fluid Mech. 330 (1997) 349-374; Armaly, Durst, Pereira and Schonung, J. Fluid Mech. 127 (1983) 473-496',
  uncertainty: 0.016,
  passLimit: 0.1,
  ifMissed: 'boundary layer at the edge as thick as in the experiment; expansion ratio; closures of the k-epsilon kind reattach 15 to 25 % early',
  notes: ['The laminar lengths of 1983 belong to the expansion ratio 1.94 and the Reynolds number on twice the inlet height; above 400 the flow is three-dimensional and a two-dimensional run falls short.'],
  flows: ['backward-step', 'building', 'bluff-body'],
  needs: [],
  values: [
    { id: 'reattachmentOverStep', name: 'reattachment length over step height, expansion 1.125, Re_h 37 500', unit: '1', formula: 'measured', value: () => 6.26 },
    { id: 'reattachmentOverStepSimulated', name: 'reattachment length over step height, expansion 1.2, Re_h 5100', unit: '1', formula: 'direct simulation', value: () => 6.28, uncertainty: 0.02 },
  ],
  tables: [
    {
      id: 'laminarMeasured',
      title: 'Measured reattachment at expansion ratio 1.94, Reynolds number on twice the inlet height',
      columns: [{ id: 'reynolds', name: 'Re', unit: '1' }, { id: 'reattachmentOverStep', name: 'x_R/h', unit: '1' }],
      rows: () => [[100, 3], [200, 5], [800, 14.1]],
      note: 'within 12 %',
      band: 1.7,
    },
  ],
});
