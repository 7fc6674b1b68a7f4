import { reference } from './define.ts';

interface Step { readonly reynolds: number; readonly reattachment: number; readonly spread: number; readonly upperFrom?: number; readonly upperTo?: number }

/** Lengths in channel heights H, two step heights. */
const steps: readonly Step[] = [
  { reynolds: 100, reattachment: 1.61, spread: 0.005 },
  { reynolds: 400, reattachment: 4.326, spread: 0.005 },
  { reynolds: 800, reattachment: 6.1, spread: 0.003, upperFrom: 4.85, upperTo: 10.48 },
];
const stepAt = (reynolds: number): Step => steps.find((step) => Math.abs(reynolds / step.reynolds - 1) <= 0.005) as Step;
const spread = ({ reynoldsChannel }: { readonly reynoldsChannel: number }): number => stepAt(reynoldsChannel).spread;
const heights = (value: number | undefined): number | undefined => (value === undefined ? undefined : 2 * value);

export const laminarStep = reference('laminar-step', {
  title: 'Laminar flow over a backward-facing step, expansion ratio 2',
  kind: 'benchmark',
  assumes: ['two-dimensional', 'steady', 'constant properties', 'parabolic inflow at the edge of the step itself, with no cross velocity', 'expansion ratio 2'],
  verifies: ['pressure-velocity coupling', 'separation and reattachment', 'outflow condition'],
  source: 'Gartling, Int. J. Numer. Methods Fluids 11 (1990) 953-967 (Re 800); stream function and vorticity, 32, 48 and 64 cells a height, extrapolated (Re 100, 400)',
  uncertainty: 0.005,
  order: 2,
  passLimit: 0.02,
  ifMissed: 'inflow at the edge and not in a channel upstream; cross velocity zero there; outflow at least 15 channel heights downstream; Reynolds number on the mean inlet speed and the full height behind the step',
  notes: [
    'Reynolds number: mean speed in the inlet times the full height behind the step (two step heights) over kinematic viscosity.',
    'With a channel ahead of the edge the eddy is shorter. Holding the vorticity of the inflow in place of zero cross velocity gives 24 and 7 % less at Re 100 and 400: the inlet condition is part of the reference.',
  ],
  flows: ['backward-step'],
  needs: [{ id: 'reynoldsChannel', unit: '1', name: 'Reynolds number on mean inlet speed and full height behind the step', anchors: steps.map((step) => step.reynolds) }, { id: 'stepHeight', unit: 'm', name: 'step height' }],
  values: [
    { id: 'reattachmentOverStep', name: 'reattachment length over step height', unit: '1', formula: 'table', value: (g) => heights(stepAt(g.reynoldsChannel).reattachment), uncertainty: spread },
    { id: 'reattachmentOverChannel', name: 'reattachment length over channel height', unit: '1', formula: 'table', value: (g) => stepAt(g.reynoldsChannel).reattachment, uncertainty: spread },
    { id: 'upperEddyFromOverStep', name: 'start of the eddy on the upper wall over step height', unit: '1', formula: 'table', value: (g) => heights(stepAt(g.reynoldsChannel).upperFrom), uncertainty: spread },
    { id: 'upperEddyToOverStep', name: 'end of the eddy on the upper wall over step height', unit: '1', formula: 'table', value: (g) => heights(stepAt(g.reynoldsChannel).upperTo), uncertainty: spread },
    { id: 'reattachmentLength', name: 'reattachment length', unit: 'm', formula: 'x_R = table times h', value: (g) => 2 * stepAt(g.reynoldsChannel).reattachment * g.stepHeight, uncertainty: spread },
  ],
  tables: [
    {
      id: 'reattachment',
      title: 'Reattachment length by Reynolds number',
      columns: [{ id: 'reynoldsChannel', name: 'Re on the full height', unit: '1' }, { id: 'reattachmentOverStep', name: 'x_R/h', unit: '1' }],
      rows: () => steps.map((step) => [step.reynolds, 2 * step.reattachment]),
      band: 0.04,
    },
  ],
});
