import { reference } from './define.ts';
import { conductivity, length, prandtl, reynolds } from './inputs.ts';
import { plateHeat } from './similarity.ts';

let known: { readonly prandtl: number; readonly heat: number } | undefined;

/** The last one is kept: four numbers ask for it. */
function heatAt(prandtl: number): number {
  if (known?.prandtl !== prandtl) known = { prandtl, heat: plateHeat(prandtl) };
  return known.heat;
}

export const pohlhausenPlate = reference('pohlhausen-plate', {
  title: 'Laminar thermal boundary layer on a flat plate at one temperature',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'wall temperature uniform from the leading edge on', 'no heat from friction', 'boundary-layer equations'],
  verifies: ['wall heat flux', 'advection against diffusion of heat'],
  source: 'Pohlhausen 1921: 1/Nu is the integral of [f\'\'/f\'\'(0)]^Pr with f of Blasius',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'heated from the leading edge; cells inside the thermal layer, which is Pr^(-1/3) of the other; leave out the first 5 % of the plate',
  flows: ['plate'],
  needs: [{ ...reynolds, name: 'Reynolds number on the length from the leading edge', range: [1e4, 3e6] }, { ...prandtl, range: [1e-4, 1e5] }, { ...length, name: 'length from the leading edge' }, conductivity],
  values: [
    { id: 'heatSimilar', name: 'local Nusselt number over the root of the Reynolds number', unit: '1', formula: "Nu_x/Re_x^(1/2) = 1/integral [f''/f''(0)]^Pr d eta", value: (g) => heatAt(g.prandtl) },
    { id: 'nusselt', name: 'Nusselt number, mean over the length', unit: '1', formula: 'Nu = 2 Nu_x', value: (g) => 2 * heatAt(g.prandtl) * Math.sqrt(g.reynolds) },
    { id: 'nusseltLocal', name: 'Nusselt number at the length', unit: '1', formula: "Nu_x = Re_x^(1/2)/integral [f''/f''(0)]^Pr d eta", value: (g) => heatAt(g.prandtl) * Math.sqrt(g.reynolds) },
    { id: 'heatTransferCoefficient', name: 'heat transfer coefficient, mean over the length', unit: 'W/(m^2 K)', formula: 'h = Nu k/L', value: (g) => (2 * heatAt(g.prandtl) * Math.sqrt(g.reynolds) * g.thermalConductivity) / g.length },
  ],
});
