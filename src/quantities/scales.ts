import { loop, quantity, way, type Definition } from '../workings/index.ts';

const continuity = 'conservation of mass';

/** Sizes, speeds and streams that every flow has; the flow says what its length, area and speed are. */
export const scales: Definition[] = [
  quantity('gravity', { symbol: 'g', name: 'acceleration of gravity', unit: 'm/s^2' }, [
    way({ needs: [], as: 'assumed', value: () => 9.80665, formula: 'g = 9.80665 m/s^2', source: '3rd General Conference on Weights and Measures 1901, standard gravity', dimensional: 'a constant with unit' }),
  ]),
  quantity('inclination', { symbol: 'theta', name: 'angle of the axis above the level', unit: '1', signed: true }),
  quantity('length', { symbol: 'L', name: 'length scale of the flow', unit: 'm' }),
  quantity('speed', { symbol: 'U', name: 'speed scale of the flow', unit: 'm/s' }, [
    way({ needs: ['inlet.speed'], value: (of) => of['inlet.speed'], formula: 'U as given at the inlet', source: 'the case' }),
    way({ needs: ['volumeFlow', 'flowArea', 'parallelPassages'], value: ({ volumeFlow, flowArea, parallelPassages }) => volumeFlow / (flowArea * parallelPassages), formula: 'U = Q/(n A)', source: continuity }),
    way({ needs: ['inlet.massFlow', 'density', 'flowArea', 'parallelPassages'], value: (of) => of['inlet.massFlow'] / (of.density * of.flowArea * of.parallelPassages), formula: 'U = m/(n rho A)', source: continuity }),
    loop({ needs: ['drive.pressureDrop', 'density', 'hydraulicDiameter', 'flowLength'], when: { flowClass: 'internal' }, start: (of) => Math.sqrt((2 * of['drive.pressureDrop']) / (of.density * (0.02 * (of.flowLength / of.hydraulicDiameter) + 1.5))), closes: 'speedNext', formula: 'U so that dp = dp_given', source: 'pressure drop of the passage against the one given' }),
  ]),
  quantity('speedNext', { symbol: 'U', name: 'speed that the given pressure drop drives', unit: 'm/s' }, [
    way({ needs: ['speed', 'drive.pressureDrop', 'pressureDrop'], value: (of) => of.speed * Math.sqrt(of['drive.pressureDrop'] / of.pressureDrop), formula: 'U sqrt(dp_given/dp)', source: 'pressure drop of the passage against the one given' }),
  ]),
  quantity('flowArea', { symbol: 'A', name: 'cross-section of one passage', unit: 'm^2' }),
  quantity('wettedPerimeter', { symbol: 'P', name: 'wetted perimeter of one passage', unit: 'm' }),
  quantity('hydraulicDiameter', { symbol: 'D_h', name: 'hydraulic diameter', unit: 'm' }, [
    way({ needs: ['flowArea', 'wettedPerimeter'], value: ({ flowArea, wettedPerimeter }) => (4 * flowArea) / wettedPerimeter, formula: 'D_h = 4 A/P', source: 'definition' }),
  ]),
  quantity('flowLength', { symbol: 'L_x', name: 'length along the flow', unit: 'm' }),
  quantity('span', { symbol: 'L_z', name: 'extent in the third direction', unit: 'm' }),
  quantity('gap', { symbol: 'H', name: 'smallest width between walls', unit: 'm' }),
  quantity('passageHeight', { symbol: 'H_g', name: 'extent along gravity', unit: 'm' }, [
    way({ needs: ['length'], when: { flowClass: 'body' }, as: 'assumed', value: ({ length }) => length, formula: 'H_g = L, at most', source: 'the setting of the body against gravity is not given' }),
  ]),
  quantity('parallelPassages', { symbol: 'n', name: 'number of equal passages', unit: '1' }, [
    way({ needs: [], as: 'assumed', value: () => 1, formula: 'n = 1', source: 'one passage unless the case says otherwise' }),
  ]),
  quantity('speedBulk', { symbol: 'U_b', name: 'mean speed at the bulk state', unit: 'm/s' }, [
    way({ needs: ['speed', 'density', 'densityBulk'], value: ({ speed, density, densityBulk }) => (speed * density) / densityBulk, formula: 'U_b = U rho/rho_b', source: continuity }),
  ]),
  quantity('pressure', { symbol: 'p', name: 'absolute pressure at the state of the plain numbers', unit: 'Pa' }),
  quantity('outletPressure', { symbol: 'p_out', name: 'absolute pressure at the outlet', unit: 'Pa' }, [
    way({ needs: ['pressure', 'pressureDropPlain', 'columnWeight'], value: ({ pressure, pressureDropPlain, columnWeight }) => pressure - pressureDropPlain - columnWeight, formula: 'p_out = p - dp - rho g dz', source: 'definition' }),
    way({ needs: ['pressure', 'pressureDropPlain'], value: ({ pressure, pressureDropPlain }) => pressure - pressureDropPlain, formula: 'p_out = p - dp', source: 'definition' }),
  ]),
  quantity('columnWeight', { symbol: 'rho g dz', name: 'pressure that the weight of the fluid takes from inlet to outlet', unit: 'Pa', signed: true }, ['densityBulk', 'density'].map((rho) =>
    way({ needs: [rho, 'gravity', 'flowLength', 'inclination'], when: { flowClass: ['internal', 'continuum'] }, value: (of) => (of[rho] as number) * (of['gravity'] as number) * (of['flowLength'] as number) * Math.sin(of['inclination'] as number), formula: 'rho g L_x sin(theta)', source: 'hydrostatics; below zero where it runs down' }))),
  quantity('lowestPressure', { symbol: 'p_min', name: 'lowest static pressure of the case', unit: 'Pa' }, [
    way({ needs: ['pressure', 'pressureDropPlain', 'columnWeight'], value: ({ pressure, pressureDropPlain, columnWeight }) => pressure - Math.max(0, pressureDropPlain + columnWeight), formula: 'p_min = p - max(0, dp + rho g dz): at the inlet or at the outlet', source: 'definition' }),
    way({ needs: ['pressure', 'pressureDropPlain'], value: ({ pressure, pressureDropPlain }) => pressure - Math.max(0, pressureDropPlain), formula: 'p_min = p - dp', source: 'definition' }),
    way({ needs: ['pressure'], value: ({ pressure }) => pressure, formula: 'p_min = p', source: 'no pressure drop known' }),
  ]),
];
