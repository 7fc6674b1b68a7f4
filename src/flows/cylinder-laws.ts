import { churchillBernstein, churchillChuCylinder, churchillChuLaminar, churchillChuPlate, confinedOnset, cylinderBubble, cylinderDrag, cylinderStrouhal, hilpert, laminarStrouhal, morgan, planeBlockage, thinUprightCylinder, uprightSimilar, whiteCylinderDrag, zukauskas } from '../quantities/index.ts';
import { quantity, way, ways, type Definition } from '../workings/index.ts';

const stream = { imposedFlow: 'yes' };
const still = { imposedFlow: 'no' };
const upright = { imposedFlow: 'no', axis: 'upright' };
const lying = { imposedFlow: 'no', axis: ['level', 'inclined'] };
const definition = 'definition';
const practice = 'common practice';
const fey = 'Fey, Koenig and Eckelmann, Phys. Fluids 10 (1998) 1547';
const bernstein = 'Churchill and Bernstein, J. Heat Transfer 99 (1977) 300';

const limits = (id: string, symbol: string, moving: number, resting: number, source: string): Definition => ways(id, [
  way({ needs: [], when: stream, scatter: 0.1, value: () => moving, formula: `${symbol} = ${moving}`, source }),
  way({ needs: [], when: still, scatter: 0.5, value: () => resting, formula: `${symbol} = ${resting}`, source: practice }),
]);
const regime: Definition[] = [
  ways('regimeGroup', [
    way({ needs: ['reynolds'], when: stream, value: ({ reynolds }) => reynolds, symbol: 'Re', formula: 'Re on D', source: definition }),
    way({ needs: ['rayleighHeight'], when: upright, value: ({ rayleighHeight }) => rayleighHeight, symbol: 'Ra', formula: 'Ra on the height', source: definition }),
    way({ needs: ['rayleigh'], when: lying, value: ({ rayleigh }) => rayleigh, symbol: 'Ra', formula: 'Ra on D', source: definition }),
  ]),
  limits('regimeLow', 'x_lo', 190, 1e9, 'Williamson, Annu. Rev. Fluid Mech. 28 (1996) 477: the wake turns three-dimensional'),
  limits('regimeHigh', 'x_hi', 300, 1e10, 'Williamson, Annu. Rev. Fluid Mech. 28 (1996) 477: turbulent wake; the layer on the cylinder stays laminar to 2e5'),
  ways('unsteadyGroup', [
    way({ needs: ['reynolds', 'cylinderPeakRatio'], when: stream, value: ({ reynolds, cylinderPeakRatio }) => reynolds * cylinderPeakRatio, symbol: 'Re', formula: 'Re on D and the peak speed of the stream', source: definition }),
    way({ needs: ['regimeGroup'], when: still, value: ({ regimeGroup }) => regimeGroup, formula: 'group of the regime', source: definition }),
  ]),
  ways('unsteadyFrom', [
    way({ needs: ['blockageRatio'], when: stream, range: { blockageRatio: [0.001, 0.5] }, scatter: 0.05, value: ({ blockageRatio }) => confinedOnset({ ratio: blockageRatio }), formula: 'Re_on over D/H: 47, 51, 69, 94, 124 at 0, 0.1, 0.2, 0.3, 0.5, peak speed', source: 'Chen, Pritchard and Tavener, J. Fluid Mech. 284 (1995) 23; Sahin and Owens, Phys. Fluids 16 (2004) 1305; from memory of these works' }),
    way({ needs: [], when: stream, scatter: 0.03, value: () => 47, formula: 'Re_on = 47', source: 'Provansal, Mathis and Boyer, J. Fluid Mech. 182 (1987) 1' }),
    way({ needs: [], when: upright, scatter: 0.5, value: () => 1e9, formula: 'Ra_on = 1e9', source: practice }),
    way({ needs: [], when: lying, scatter: 1, value: () => 1e6, formula: 'Ra_on = 1e6: the plume sways', source: practice }),
  ]),
  ways('laminarShare', [
    way({ needs: ['reynolds'], when: stream, value: ({ reynolds }) => Math.min(1, 2e5 / reynolds), formula: 's = 2e5/Re, at most 1', source: 'onset of the drag crisis; below it the layer on the cylinder is laminar' }),
    way({ needs: ['regimeGroup', 'regimeLow'], when: still, value: ({ regimeGroup, regimeLow }) => Math.min(1, (regimeLow / regimeGroup) ** (1 / 3)), formula: 's = (1e9/Ra)^(1/3), at most 1', source: 'Ra grows with the cube of the length' }),
  ]),
];

const crisis = 'drag crisis: turbulence of the stream, roughness and end plates move it; a factor of 2 either way, not one number';
const drag: Definition[] = [
  quantity('cylinderPeakRatio', { symbol: 'u_0/U', name: 'speed of the stream on the cylinder axis over its mean', unit: '1' }, [
    way({ needs: ['sizes.channelHeight'], when: { inletProfile: 'developed' }, value: () => 1.5, formula: 'u_0/U = 1.5', source: 'laminar channel, developed; the turbulent one 1.1 to 1.2' }),
    way({ needs: [], value: () => 1, formula: 'u_0/U = 1', source: 'even stream' }),
  ]),
  quantity('cylinderReynolds', { symbol: 'Re_0', name: 'Reynolds number on the diameter and the speed on the axis', unit: '1' }, [way({ needs: ['reynolds', 'cylinderPeakRatio'], value: ({ reynolds, cylinderPeakRatio }) => reynolds * cylinderPeakRatio, formula: 'Re_0 = Re u_0/U', source: definition })]),
  quantity('cylinderDragFree', { symbol: 'C_D,free', name: 'drag coefficient on the speed on the axis, without walls', unit: '1' }, [
    way({ needs: ['cylinderReynolds'], when: stream, range: { cylinderReynolds: [1e-4, 2e5] }, scatter: 0.1, value: ({ cylinderReynolds }) => cylinderDrag({ reynolds: cylinderReynolds }), formula: 'C_D = 1.18 + 6.8 Re^(-0.89) + 1.96 Re^(-1/2) - 0.0004 Re/(1 + 3.64e-7 Re^2); benchmarks from 20 to 200; creeping below 0.3', source: 'Sucker and Brauer, Waerme- und Stoffuebertrag. 8 (1975) 149; Dennis and Chang, J. Fluid Mech. 42 (1970) 471; Kaplun 1957' }),
    way({ needs: ['cylinderReynolds'], when: stream, range: { cylinderReynolds: [2e5, 4e5] }, scatter: 1, value: ({ cylinderReynolds }) => 1.2 * (0.3 / 1.2) ** (Math.log(cylinderReynolds / 2e5) / Math.LN2), formula: 'C_D falls from 1.2 to 0.3 between 2e5 and 4e5', source: 'Wieselsberger 1921, as in Schlichting, Boundary-Layer Theory', note: crisis }),
    way({ needs: ['cylinderReynolds'], when: stream, range: { cylinderReynolds: [4e5, 3.5e6] }, scatter: 0.55, value: () => 0.46, formula: 'C_D between 0.3 and 0.7', source: 'Roshko, J. Fluid Mech. 10 (1961) 345; Achenbach, J. Fluid Mech. 34 (1968) 625', note: crisis }),
    way({ needs: ['cylinderReynolds'], when: stream, range: { cylinderReynolds: [3.5e6, 1e8] }, scatter: 0.3, value: () => 0.65, formula: 'C_D = 0.65', source: 'Roshko, J. Fluid Mech. 10 (1961) 345, measured near 8e6; from memory of this work' }),
  ]),
  ways('dragCoefficientPlain', [way({ needs: ['cylinderDragFree', 'cylinderPeakRatio'], when: stream, value: ({ cylinderDragFree, cylinderPeakRatio }) => cylinderDragFree * cylinderPeakRatio ** 2, formula: 'C_D,0 = C_D,free (u_0/U)^2', source: 'dynamic pressure on the axis' })]),
  ways('dragCoefficientSecond', [way({ needs: ['cylinderReynolds', 'cylinderPeakRatio'], when: stream, range: { cylinderReynolds: [1, 2e5] }, value: ({ cylinderReynolds, cylinderPeakRatio }) => whiteCylinderDrag({ reynolds: cylinderReynolds }) * cylinderPeakRatio ** 2, formula: 'C_D = 1 + 10 Re^(-2/3)', source: 'White, Viscous Fluid Flow, 3rd ed. (2006)' })]),
  ways('dragCoefficient', [
    way({ needs: ['dragCoefficientPlain', 'blockageFactorDrag', 'blockageRatio'], when: stream, range: { blockageRatio: [0, 0.3] }, scatter: ({ blockageRatio }) => Math.max(1e-3, blockageRatio), value: ({ dragCoefficientPlain, blockageFactorDrag }) => dragCoefficientPlain * blockageFactorDrag, formula: 'C_D = C_D,0 F_block', source: 'Allen and Vincenti, NACA Report 782 (1944)' }),
    way({ needs: ['dragCoefficientPlain', 'blockageFactorDrag'], when: stream, value: ({ dragCoefficientPlain, blockageFactorDrag }) => dragCoefficientPlain * blockageFactorDrag, formula: 'C_D = C_D,0 F_block', source: definition }),
  ]),
  ways('blockageRatio', [way({ needs: ['sizes.diameter', 'sizes.channelHeight'], when: stream, value: (of) => of['sizes.diameter'] / of['sizes.channelHeight'], formula: 'D/H', source: 'geometry' })]),
  ways('blockageSpeedRatio', [way({ needs: ['cylinderDragFree', 'blockageRatio'], when: stream, range: { blockageRatio: [0, 0.3] }, value: ({ cylinderDragFree, blockageRatio }) => planeBlockage({ drag: cylinderDragFree, ratio: blockageRatio }), formula: 'U_c/U = 1 + C_D (D/H)/4 + 0.82 (D/H)^2', source: 'Allen and Vincenti, NACA Report 782 (1944)' })]),
  ways('blockageFactorDrag', [way({ needs: ['blockageSpeedRatio'], when: stream, value: ({ blockageSpeedRatio }) => blockageSpeedRatio ** 2, formula: 'F = (U_c/U)^2', source: 'dynamic pressure' })]),
  ways('frontalArea', [way({ needs: ['sizes.diameter', 'cylinderSpan'], value: (of) => of['sizes.diameter'] * of.cylinderSpan, formula: 'A_f = D span', source: 'geometry' })]),
];

const wake: Definition[] = [
  ways('strouhal', [
    way({ needs: ['cylinderReynolds', 'cylinderPeakRatio', 'blockageSpeedRatio'], when: stream, range: { cylinderReynolds: [47, 2e5] }, scatter: ({ cylinderReynolds }) => (cylinderReynolds < 1e3 ? 0.03 : 0.05), value: ({ cylinderReynolds, cylinderPeakRatio, blockageSpeedRatio }) => cylinderStrouhal({ reynolds: cylinderReynolds }) * cylinderPeakRatio * blockageSpeedRatio, formula: 'St = (a + b Re_0^(-1/2)) (u_0/U)(U_c/U), a and b by range: 0.2684, -1.0356 from 47 to 180; 0.1776, 2.2023 beyond 5000', source: fey }),
    way({ needs: ['cylinderReynolds', 'cylinderPeakRatio'], when: stream, range: { cylinderReynolds: [2e5, 1e8] }, scatter: 0.35, value: ({ cylinderPeakRatio }) => 0.33 * cylinderPeakRatio, formula: 'St between 0.25 and 0.45', source: 'Roshko, J. Fluid Mech. 10 (1961) 345; Achenbach and Heinecke, J. Fluid Mech. 109 (1981) 239', note: crisis }),
  ]),
  quantity('cylinderStrouhalSecond', { symbol: 'St_2', name: 'Strouhal number by a second law', unit: '1' }, [
    way({ needs: ['cylinderReynolds', 'cylinderPeakRatio', 'blockageSpeedRatio'], when: stream, range: { cylinderReynolds: [50, 180] }, value: ({ cylinderReynolds, cylinderPeakRatio, blockageSpeedRatio }) => laminarStrouhal({ reynolds: cylinderReynolds }).williamson * cylinderPeakRatio * blockageSpeedRatio, formula: 'St = -3.3265/Re + 0.1816 + 1.6e-4 Re', source: 'Williamson, Phys. Fluids 31 (1988) 2742' }),
    way({ needs: ['cylinderReynolds'], when: stream, range: { cylinderReynolds: [180, 2e5] }, value: ({ cylinderReynolds }) => 0.212 * (1 - 21.2 / cylinderReynolds), formula: 'St = 0.212 (1 - 21.2/Re)', source: 'Roshko, NACA Report 1191 (1954), short form' }),
  ]),
  quantity('cylinderBubbleLength', { symbol: 'L_r', name: 'length of the closed steady wake', unit: 'm' }, [
    way({ needs: ['cylinderReynolds', 'sizes.diameter'], when: stream, range: { cylinderReynolds: [7, 47] }, scatter: 0.08, value: (of) => cylinderBubble({ reynolds: of.cylinderReynolds }) * of['sizes.diameter'], formula: 'L_r = 0.068 (Re - 6.3) D to 20, 0.060 (Re - 4.5) D beyond', source: 'Coutanceau and Bouard, J. Fluid Mech. 79 (1977) 231' }),
  ]),
  ways('reattachmentLength', [way({ needs: ['cylinderBubbleLength'], value: ({ cylinderBubbleLength }) => cylinderBubbleLength, formula: 'L_r behind the rear point', source: definition })]),
  ways('wakeLength', [way({ needs: ['sizes.diameter'], when: stream, scatter: 0.5, value: (of) => 10 * of['sizes.diameter'], formula: 'L_w = 10 D', source: practice })]),
  ways('peakOverMean', [way({ needs: ['cylinderPeakRatio', 'blockageSpeedRatio'], when: stream, scatter: 0.15, value: ({ cylinderPeakRatio, blockageSpeedRatio }) => 1.5 * cylinderPeakRatio * blockageSpeedRatio, formula: 'u_max/U = 1.5 (u_0/U)(U_c/U)', source: 'common practice; 2 in potential flow' })]),
];

const temperatureKinds = ['temperature', 'coefficient', 'adiabatic'];
const heat: Definition[] = [
  ways('nusseltPlain', [
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'cylinderPeakRatio', 'peclet'], when: stream, range: { reynoldsFilm: [1e-2, 1e7], peclet: [0.2, 1e10] }, scatter: 0.2, value: ({ reynoldsFilm, prandtlFilm, cylinderPeakRatio }) => churchillBernstein({ reynolds: reynoldsFilm * cylinderPeakRatio, prandtl: prandtlFilm }), formula: 'Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3)/(1 + (0.4/Pr)^(2/3))^(1/4) (1 + (Re/282000)^(5/8))^(4/5), film', source: bernstein }),
    way({ needs: ['rayleigh', 'prandtl'], when: lying, range: { rayleigh: [1e-5, 1e12] }, scatter: 0.15, value: ({ rayleigh, prandtl }) => churchillChuCylinder({ rayleigh, prandtl }), formula: 'Nu = (0.60 + 0.387 Ra^(1/6)/(1 + (0.559/Pr)^(9/16))^(8/27))^2, film', source: 'Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1049' }),
    ...(['temperature', 'flux'] as const).flatMap((wall) => (['laminar', 'other'] as const).map((layer) => way({
      needs: ['rayleighHeight', 'prandtl', 'sizes.diameter', 'cylinderSpan'], when: { ...upright, wallKind: wall === 'flux' ? 'flux' : temperatureKinds, regime: layer === 'laminar' ? 'laminar' : ['transitional', 'turbulent'] }, range: { rayleighHeight: [1, layer === 'laminar' ? 1e9 : 1e12] }, scatter: 0.15,
      value: (of) => {
        const [rayleigh, prandtl, slender] = [of.rayleighHeight, of.prandtl, of.cylinderSpan / of['sizes.diameter']];
        const plane = layer === 'laminar' ? churchillChuLaminar({ rayleigh, prandtl, wall }) : churchillChuPlate({ rayleigh, prandtl, wall });
        return (plane * thinUprightCylinder({ grashof: rayleigh / prandtl, prandtl, heightOverDiameter: slender })) / slender;
      },
      formula: 'Nu = Nu_plate(Ra_H) (D/H) times the curvature of LeFevre and Ede, film',
      source: 'Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323; LeFevre and Ede, 9th Int. Congr. Appl. Mech., Brussels 4 (1956) 175',
    }))),
  ]),
  ways('nusseltSecond', [
    way({ needs: ['reynolds', 'prandtl', 'prandtlWall', 'thermalConductivity', 'thermalConductivityFilm', 'cylinderPeakRatio'], when: stream, range: { reynolds: [1, 1e6], prandtl: [0.69, 500] }, scatter: 0.2, value: (of) => (zukauskas({ reynolds: of.reynolds * of.cylinderPeakRatio, prandtl: of.prandtl, prandtlWall: of.prandtlWall }) * of.thermalConductivity) / of.thermalConductivityFilm, formula: 'Nu = C Re^m Pr^n (Pr/Pr_w)^(1/4) k/k_f, stream', source: 'Zukauskas, Adv. Heat Transfer 8 (1972) 93' }),
    way({ needs: ['rayleigh'], when: lying, range: { rayleigh: [1e-10, 1e12] }, scatter: 0.25, value: ({ rayleigh }) => morgan({ rayleigh }), formula: 'Nu = C Ra^n, film', source: 'Morgan, Adv. Heat Transfer 11 (1975) 199' }),
  ]),
  quantity('cylinderNusseltHilpert', { symbol: 'Nu_H', name: 'Nusselt number by the law of Hilpert, gases', unit: '1' }, [
    way({ needs: ['reynoldsFilm', 'prandtlFilm', 'cylinderPeakRatio'], when: { ...stream, medium: 'gas' }, range: { reynoldsFilm: [0.4, 4e5] }, scatter: 0.2, value: ({ reynoldsFilm, prandtlFilm, cylinderPeakRatio }) => hilpert({ reynolds: reynoldsFilm * cylinderPeakRatio, prandtl: prandtlFilm }), formula: 'Nu = C Re^m Pr^(1/3), film', source: 'Hilpert, Forsch. Ingenieurwes. 4 (1933) 215' }),
  ]),
];

const quarter = Math.PI / 2;
const layers: Definition[] = [
  quantity('cylinderLayerGrashof', { symbol: 'Gr_s', name: 'Grashof number along the surface', unit: '1' }, [
    way({ needs: ['rayleighHeight', 'prandtl'], when: upright, value: ({ rayleighHeight, prandtl }) => rayleighHeight / prandtl, formula: 'Gr on the height', source: definition }),
    way({ needs: ['grashof'], when: lying, value: ({ grashof }) => grashof * quarter ** 3, formula: 'Gr on pi D/2', source: practice }),
  ]),
  quantity('cylinderLayerRun', { symbol: 'x_s', name: 'way of the fluid along the surface', unit: 'm' }, [
    way({ needs: ['cylinderSpan'], when: upright, value: ({ cylinderSpan }) => cylinderSpan, formula: 'x = H', source: definition }),
    way({ needs: ['sizes.diameter'], when: lying, value: (of) => quarter * of['sizes.diameter'], formula: 'x = pi D/2', source: practice }),
  ]),
  ways('wallShearPlain', [
    way({ needs: ['cylinderReynolds', 'cylinderPeakRatio', 'density', 'speed'], when: stream, range: { cylinderReynolds: [5, 300] }, scatter: 0.2, value: (of) => (3.19 * of.density * (of.speed * of.cylinderPeakRatio) ** 2) / Math.sqrt(of.cylinderReynolds), formula: 'tau_w = 6.38 Re^(-1/2) rho u_0^2/2, 58 degrees from the front', source: 'laminar layer under the potential speed, momentum integral of Thwaites 1949' }),
    way({ needs: ['cylinderReynolds', 'cylinderPeakRatio', 'density', 'speed'], when: stream, range: { cylinderReynolds: [300, 2e5] }, scatter: 0.2, value: (of) => (2.5 * of.density * (of.speed * of.cylinderPeakRatio) ** 2) / Math.sqrt(of.cylinderReynolds), formula: 'tau_w = 5 Re^(-1/2) rho u_0^2/2', source: 'measured below the drag crisis, Achenbach, J. Fluid Mech. 34 (1968) 625' }),
    way({ needs: ['cylinderLayerGrashof', 'cylinderLayerRun', 'prandtl', 'viscosity', 'kinematicViscosity'], when: still, range: { prandtl: [0.01, 1000] }, scatter: 0.4, value: (of) => ((2 * of.viscosity * of.kinematicViscosity) / of.cylinderLayerRun ** 2) * Math.sqrt(of.cylinderLayerGrashof) * uprightSimilar({ prandtl: of.prandtl, which: 'shear' }) * (of.cylinderLayerGrashof / 4) ** 0.25, formula: 'as an upright plate of the height x_s', source: practice }),
  ]),
  ways('wallShear', [way({ needs: ['wallShearPlain', 'viscosityFactorFriction', 'blockageSpeedRatio'], value: ({ wallShearPlain, viscosityFactorFriction, blockageSpeedRatio }) => wallShearPlain * viscosityFactorFriction * blockageSpeedRatio ** 1.5, formula: 'tau_w = tau_0 F_visc (U_c/U)^(3/2), largest on the surface', source: 'laminar layer' })]),
  ways('frictionReynolds', [way({ needs: ['frictionVelocityPlain', 'boundaryLayerThickness', 'kinematicViscosity'], value: (of) => (of.frictionVelocityPlain * of.boundaryLayerThickness) / of.kinematicViscosity, formula: 'delta+ = u_tau delta/nu', source: definition })]),
  ways('boundaryLayerThickness', [
    way({ needs: ['sizes.diameter', 'cylinderReynolds'], when: stream, range: { cylinderReynolds: [5, 2e5] }, scatter: 0.2, value: (of) => (1.8 * of['sizes.diameter']) / Math.sqrt(of.cylinderReynolds), formula: 'delta = 1.8 D Re^(-1/2) at the shoulder; 1.25 at the front', source: 'momentum integral of Thwaites 1949 under the potential speed' }),
    way({ needs: ['sizes.diameter', 'rayleigh'], when: lying, scatter: 0.5, value: (of) => 4 * of['sizes.diameter'] * of.rayleigh ** -0.25, formula: 'delta = 4 D Ra^(-1/4)', source: practice }),
    standing('velocity'),
  ]),
  ways('thermalLayerThickness', [
    way({ needs: ['boundaryLayerThickness', 'prandtl'], when: stream, range: { prandtl: [0.6, 1e5] }, scatter: 0.2, value: ({ boundaryLayerThickness, prandtl }) => boundaryLayerThickness * prandtl ** (-1 / 3), formula: 'delta_T = delta Pr^(-1/3)', source: 'laminar layer' }),
    way({ needs: ['sizes.diameter', 'rayleigh'], when: lying, scatter: 0.5, value: (of) => 4 * of['sizes.diameter'] * of.rayleigh ** -0.25, formula: 'delta_T = 4 D Ra^(-1/4)', source: practice }),
    standing('thermal'),
  ]),
];

function standing(which: 'velocity' | 'thermal'): ReturnType<typeof way> {
  return way({ needs: ['cylinderLayerGrashof', 'cylinderLayerRun', 'prandtl'], when: upright, range: { prandtl: [0.01, 1000] }, scatter: 0.3, value: (of) => (uprightSimilar({ prandtl: of.prandtl, which }) * of.cylinderLayerRun) / (of.cylinderLayerGrashof / 4) ** 0.25, formula: 'delta = eta H (4/Gr)^(1/4), as an upright plate', source: 'Ostrach, NACA Report 1111 (1953), solved anew' });
}

/** Drag, wake, heat transfer and layers of a round cylinder. */
export const cylinderLaws: Definition[] = [...regime, ...drag, ...wake, ...heat, ...layers];
