import { quantity, way, type Definition } from '../workings/index.ts';

const per = { per: ['species' as const], plain: 'target' as const };
const largest = { per: ['species' as const], plain: 'largest' as const, whole: true as const };
const sum = { per: ['species' as const], plain: 'sum' as const, whole: true as const };
const definition = 'definition';
const asGiven = 'the case';

/** Mass share from a share of the amount of substance, of a mixture of two molar masses. */
const massOfMole = (share: number, own: number, other: number): number => (share * own) / (share * own + (1 - share) * other);
/** Molar mass of a mixture of two by its mass share. */
const meanMolarMass = (y: number, own: number, other: number): number => 1 / (y / own + (1 - y) / other);

/** Composition of what the fluid carries: shares at the inlet and at the wall, by mass, and how far they stand apart. */
export const composition: Definition[] = [
  quantity('inletShare', { symbol: 'x_in', name: 'share of a species at the inlet, as given', unit: '1', ...per }),
  quantity('wallShare', { symbol: 'x_w', name: 'share of a species at the wall, as given', unit: '1', ...per }),
  quantity('speciesMolarMass', { symbol: 'M_A', name: 'molar mass of a species', unit: 'kg/mol', ...per }),
  ...(['Inlet', 'Wall'] as const).map((at) => {
    const [share, x, y] = at === 'Inlet' ? ['inletShare', 'x_in', 'Y_in'] : ['wallShare', 'x_w', 'Y_w'];
    return quantity(`massFraction${at}`, { symbol: y, name: `mass share of a species at the ${at.toLowerCase()}`, unit: '1', ...per }, [
      { needs: [share], when: { [`${share}Basis`]: 'mass' }, value: (of) => of[share] as number, formula: `${y} = ${x}`, source: asGiven },
      { needs: [share, 'speciesMolarMass', 'molarMass'], when: { [`${share}Basis`]: 'mole' }, value: (of) => massOfMole(of[share] as number, of['speciesMolarMass'] as number, of['molarMass'] as number), formula: `${y} = ${x} M_A/(${x} M_A + (1 - ${x}) M)`, source: definition, note: 'the rest is the fluid alone' },
    ]);
  }),
  quantity('massFractionMax', { symbol: 'Y_max', name: 'largest mass share of a species', unit: '1', ...largest }, [
    way({ needs: ['massFractionInlet', 'massFractionWall'], value: ({ massFractionInlet, massFractionWall }) => Math.max(massFractionInlet, massFractionWall), formula: 'max(Y_in, Y_w)', source: definition }),
    way({ needs: ['massFractionInlet'], value: ({ massFractionInlet }) => massFractionInlet, formula: 'Y_in', source: definition }),
  ]),
  quantity('massFractionDifference', { symbol: 'dY', name: 'difference of the mass share of a species over the problem', unit: '1', ...largest }, [
    way({ needs: ['massFractionInlet', 'massFractionWall'], value: ({ massFractionInlet, massFractionWall }) => Math.abs(massFractionWall - massFractionInlet), formula: 'dY = |Y_w - Y_in|', source: definition }),
    way({ needs: ['massFractionInlet'], when: { wallShareGiven: 'no' }, value: ({ massFractionInlet }) => massFractionInlet, formula: 'dY = Y_in', source: 'against fluid that is free of it' }),
  ]),
  quantity('shareDifference', { symbol: 'dx', name: 'difference of the share of a species, in the unit in which it is given', unit: '1', ...largest }, [
    ...(['mass', 'mole'] as const).map((basis) => way({ needs: ['inletShare', 'wallShare'], when: { inletShareBasis: basis, wallShareBasis: basis }, value: ({ inletShare, wallShare }) => Math.abs(wallShare - inletShare), formula: 'dx = |x_w - x_in|', source: definition })),
    way({ needs: ['inletShare'], when: { wallShareGiven: 'no' }, value: ({ inletShare }) => inletShare, formula: 'dx = x_in', source: 'against fluid that is free of it' }),
  ]),
];

const jackson = 'Jackson, Cotton and Axcell, Int. J. Heat Fluid Flow 10 (1989) 2';

/** Weight by composition against what drives the flow; the groups of heat with the density change of all species at most. */
const mixed: Definition[] = [
  quantity('grashofFluxMass', { symbol: 'Gr_j', name: 'Grashof number on the flux of species through the wall and D_h, at most', unit: '1' }, [
    way({ needs: ['gravity', 'solutalDensityBound', 'sherwoodPlain', 'length', 'kinematicViscosityBulk'], when: { 'has.speciesWall': 'yes', flowClass: 'internal' }, value: (of) => (of.gravity * of.solutalDensityBound * of.sherwoodPlain * of.length ** 3) / of.kinematicViscosityBulk ** 2, formula: 'Gr_j = Sh_0 g beta_c dc D_h^3/nu_b^2', source: definition }),
    way({ needs: ['gravity', 'solutalDensityBound', 'length', 'kinematicViscosityBulk'], when: { 'has.speciesWall': 'no', flowClass: 'internal' }, value: (of) => (of.gravity * of.solutalDensityBound * of.length ** 3) / of.kinematicViscosityBulk ** 2, formula: 'Gr_j = g beta_c dc D_h^3/nu_b^2', source: 'no species passes the wall: what differs is the fluid itself' }),
  ]),
  quantity('compositionOverReynolds', { symbol: 'Gr_j/Re', name: 'weight by composition over viscous forces in a passage, at most', unit: '1' }, [
    way({ needs: ['grashofFluxMass', 'reynoldsBulk'], value: ({ grashofFluxMass, reynoldsBulk }) => grashofFluxMass / reynoldsBulk, formula: 'Gr_j/Re_b', source: definition }),
  ]),
  quantity('compositionOverShear', { symbol: 'Bo*_m', name: 'weight by composition over turbulent shear in a passage, at most', unit: '1' }, [
    way({ needs: ['grashofFluxMass', 'reynoldsBulk', 'schmidtBulk'], value: ({ grashofFluxMass, reynoldsBulk, schmidtBulk }) => grashofFluxMass / (reynoldsBulk ** 3.425 * schmidtBulk ** 0.8), formula: 'Bo*_m = Gr_j/(Re_b^3.425 Sc_b^0.8)', source: jackson }),
  ]),
  quantity('compositionOverDrag', { symbol: 'N_K,m', name: 'weight by composition over the drag of a matrix', unit: '1' }, [
    way({ needs: ['density', 'gravity', 'solutalDensityBound', 'flowLength', 'pressureDropPlain'], when: { flowClass: 'continuum' }, value: (of) => (of.density * of.gravity * of.solutalDensityBound * of.flowLength) / of.pressureDropPlain, formula: 'rho g beta_c dc L/dp', source: definition }),
    way({ needs: ['gravity', 'solutalDensityBound', 'porous.permeability', 'kinematicViscosity', 'speed'], when: { flowClass: 'continuum' }, value: (of) => (of.gravity * of.solutalDensityBound * of['porous.permeability']) / (of.kinematicViscosity * of.speed), formula: 'g beta_c dc K/(nu U)', source: definition }),
  ]),
];

/** What a species does to the density, and the forces that follow. */
export const solutal: Definition[] = [
  quantity('solutalSlope', { symbol: 'beta_c', name: 'relative change of density per unit of share', unit: '1', signed: true, ...per }),
  quantity('solutalDensityShift', { symbol: '(drho/rho)_c', name: 'relative density where a species is strongest or at the wall, less that where it arrives', unit: '1', signed: true, ...sum }, [
    way({ needs: ['solutalSlope', 'inletShare', 'wallShare'], value: ({ solutalSlope, inletShare, wallShare }) => solutalSlope * (wallShare - inletShare), formula: 'beta_c (x_w - x_in)', source: definition }),
    way({ needs: ['solutalSlope', 'inletShare'], when: { wallShareGiven: 'no' }, value: ({ solutalSlope, inletShare }) => solutalSlope * inletShare, formula: 'beta_c x_in', source: 'against fluid that is free of it' }),
    way({ needs: ['massFractionInlet', 'massFractionWall', 'speciesMolarMass', 'molarMass'], when: { medium: 'gas' }, value: (of) => Math.log(meanMolarMass(of.massFractionWall, of.speciesMolarMass, of.molarMass) / meanMolarMass(of.massFractionInlet, of.speciesMolarMass, of.molarMass)), formula: 'ln(M_w/M_in), 1/M = Y/M_A + (1 - Y)/M_B', source: 'ideal gas of two components at one temperature and pressure' }),
    way({ needs: ['massFractionInlet', 'speciesMolarMass', 'molarMass'], when: { medium: 'gas', wallShareGiven: 'no' }, value: (of) => Math.log(meanMolarMass(of.massFractionInlet, of.speciesMolarMass, of.molarMass) / of.molarMass), formula: 'ln(M_in/M_B), 1/M = Y/M_A + (1 - Y)/M_B', source: 'ideal gas of two components at one temperature and pressure, against fluid that is free of it' }),
  ]),
  quantity('solutalDensityChange', { symbol: 'beta_c dc', name: 'relative density change that a species makes', unit: '1', ...largest }, [
    way({ needs: ['solutalDensityShift'], value: ({ solutalDensityShift }) => Math.abs(solutalDensityShift), formula: '|(drho/rho)_c|', source: definition }),
  ]),
  quantity('solutalDensityBound', { symbol: '(beta_c dc)_max', name: 'density change that the species make, at most where it is not known', unit: '1', ...sum }, [
    way({ needs: ['solutalDensityChange'], value: ({ solutalDensityChange }) => solutalDensityChange, formula: 'beta_c dc', source: definition }),
    way({ needs: ['massFractionDifference'], when: { medium: 'liquid' }, as: 'assumed', value: ({ massFractionDifference }) => massFractionDifference, formula: 'dY, beta_c at most 1', source: 'common practice: salts about 0.7, sugars 0.4, most dissolved matter below 1' }),
  ]),
  quantity('grashofMass', { symbol: 'Gr_m', name: 'Grashof number of a species', unit: '1', ...largest }, [
    way({ needs: ['gravity', 'solutalDensityChange', 'length', 'kinematicViscosity'], value: (of) => (of.gravity * of.solutalDensityChange * of.length ** 3) / of.kinematicViscosity ** 2, formula: 'Gr_m = g beta_c dc L^3/nu^2', source: definition }),
  ]),
  quantity('richardsonMass', { symbol: 'Ri_m', name: 'buoyancy by composition over inertia', unit: '1' }, [
    way({ needs: ['gravity', 'solutalDensityBound', 'length', 'speed'], value: (of) => (of.gravity * of.solutalDensityBound * of.length) / of.speed ** 2, formula: 'Ri_m = g beta_c dc L/U^2', source: definition }),
  ]),
  ...mixed,
  quantity('buoyancyRatio', { symbol: 'N_rho', name: 'buoyancy by composition over that by temperature, negative where they act against each other', unit: '1', signed: true, ...per }, [
    way({ needs: ['solutalDensityShift', 'thermalExpansion', 'wallTemperature', 'farTemperature'], value: (of) => -of.solutalDensityShift / (of.thermalExpansion * (of.wallTemperature - of.farTemperature)), formula: 'N_rho = -(drho/rho)_c/(beta (T_w - T_far))', source: definition }),
    way({ needs: ['solutalDensityChange', 'thermalExpansion', 'temperatureDifference'], value: (of) => of.solutalDensityChange / (Math.abs(of.thermalExpansion) * of.temperatureDifference), formula: '|N_rho| = beta_c dc/(|beta| dT)', source: definition, note: 'the sense is not known' }),
  ]),
  quantity('solutalBuoyancyFactor', { symbol: 'F_N', name: 'buoyancy force with the species over that of heat alone', unit: '1', signed: true, ...per }, [
    way({ needs: ['buoyancyRatio'], value: ({ buoyancyRatio }) => 1 + buoyancyRatio, formula: 'F = 1 + N_rho', source: definition }),
  ]),
  quantity('buoyancyForce', { symbol: 'f_b', name: 'buoyancy force per volume, of heat and a species', unit: 'N/m^3', signed: true, ...per }, [
    way({ needs: ['density', 'gravity', 'thermalExpansion', 'temperatureDifference', 'solutalBuoyancyFactor'], value: (of) => of.density * of.gravity * Math.abs(of.thermalExpansion) * of.temperatureDifference * of.solutalBuoyancyFactor, formula: 'f_b = rho g |beta| dT F_N', source: definition }),
  ]),
];
