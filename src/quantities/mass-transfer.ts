import { quantity, way, wordWay, type Definition } from '../workings/index.ts';
import { fullerDiffusivity, wilkeChangDiffusivity } from './correlations/index.ts';
import { noFactor } from './factor.ts';

const iso = 'ISO 80000-11';
const definition = 'definition';
const per = { per: ['species' as const], plain: 'target' as const };
const passed = { wallShareGiven: 'yes' } as const;
const sameForMass = 'analogy of heat and mass transfer';

/** Diffusivity and the groups that follow from it. */
const groups: Definition[] = [
  quantity('diffusionVolume', { symbol: 'v_A', name: 'diffusion volume of a species', unit: '1', ...per }),
  quantity('fluidDiffusionVolume', { symbol: 'v_B', name: 'diffusion volume of the gas that carries', unit: '1' }),
  quantity('boilingVolume', { symbol: 'V_A', name: 'molar volume of a species at its boiling point', unit: 'm^3/mol', ...per }),
  quantity('diffusivity', { symbol: 'D_m', name: 'molecular diffusivity of a species', unit: 'm^2/s', ...per }, [
    way({ needs: ['referenceTemperature', 'pressure', 'speciesMolarMass', 'molarMass', 'diffusionVolume', 'fluidDiffusionVolume'], when: { medium: 'gas' }, range: { pressure: [1e2, 1e6] }, scatter: 0.1, value: (of) => fullerDiffusivity({ temperature: of.referenceTemperature, pressure: of.pressure, molarMass: of.speciesMolarMass, otherMass: of.molarMass, volume: of.diffusionVolume, otherVolume: of.fluidDiffusionVolume }), formula: 'D = 1.43e-7 T^1.75/(p M_AB^(1/2) (v_A^(1/3) + v_B^(1/3))^2), bar and g/mol', source: 'Fuller, Schettler and Giddings, Ind. Eng. Chem. 58 (1966) 18', note: 'estimated from the molecules: no value is given', dimensional: 'a fit with constants that have units' }),
    way({ needs: ['referenceTemperature', 'viscosity', 'boilingVolume', 'solventMass'], when: { medium: 'liquid' }, scatter: 0.2, value: (of) => wilkeChangDiffusivity({ temperature: of.referenceTemperature, viscosity: of.viscosity, solventMass: of.solventMass, association: 2.6, boilingVolume: of.boilingVolume }), formula: 'D = 7.4e-8 (2.6 M_B)^(1/2) T/(mu V^0.6), cm^2/s, cP, cm^3/mol, in water', source: 'Wilke and Chang, AIChE J. 1 (1955) 264', note: 'estimated from the molecules: no value is given', dimensional: 'a fit with constants that have units' }),
  ]),
  quantity('solventMass', { symbol: 'M_B', name: 'molar mass of the water that dissolves', unit: 'kg/mol' }),
  ...(['', 'Bulk', 'Film', 'Wall'] as const).map((at) => {
    const i = { '': '', Bulk: '_b', Film: '_f', Wall: '_w' }[at];
    return quantity(`schmidt${at}`, { symbol: `Sc${i}`, name: `Schmidt number${{ '': '', Bulk: ' at the bulk temperature', Film: ' at the film temperature', Wall: ' at the wall' }[at]}`, unit: '1', ...per }, [
      { needs: [`kinematicViscosity${at}`, 'diffusivity'], value: (of) => (of[`kinematicViscosity${at}`] as number) / (of['diffusivity'] as number), formula: `Sc${i} = nu${i}/D_m`, source: iso },
    ]);
  }),
  quantity('lewis', { symbol: 'Le', name: 'Lewis number', unit: '1', ...per }, [
    way({ needs: ['thermalDiffusivity', 'diffusivity'], value: ({ thermalDiffusivity, diffusivity }) => thermalDiffusivity / diffusivity, formula: 'Le = alpha/D_m', source: iso }),
  ]),
  quantity('pecletMass', { symbol: 'Pe_m', name: 'Peclet number of mass transfer', unit: '1', ...per }, [
    way({ needs: ['speed', 'length', 'diffusivity'], value: ({ speed, length, diffusivity }) => (speed * length) / diffusivity, formula: 'Pe_m = U L/D_m', source: iso }),
  ]),
  quantity('graetzMass', { symbol: 'Gz_m', name: 'Graetz number of a species over the length along the flow', unit: '1', ...per }, [
    way({ needs: ['reynoldsBulk', 'schmidtBulk', 'length', 'flowLength'], value: ({ reynoldsBulk, schmidtBulk, length, flowLength }) => (reynoldsBulk * schmidtBulk * length) / flowLength, formula: 'Gz_m = Re_b Sc_b D_h/L_x', source: 'definition without the factor pi/4 that some authors put in front' }),
  ]),
  quantity('speciesLayer', { symbol: '', name: 'whether the layer of a species is thin against the passage', unit: 'word', words: ['thin', 'wide'], ...per }, [
    wordWay({ needs: ['graetzMass'], word: ({ graetzMass }) => (graetzMass >= 1e4 ? 'thin' : 'wide'), formula: 'thin from Gz_m = 1e4', source: 'Leveque, Ann. Mines 13 (1928) 201: within 3 % from there on' }),
  ]),
  quantity('pecletMassRadius', { symbol: 'Pe_R', name: 'Peclet number of mass transfer on half the gap', unit: '1', ...per }, [
    way({ needs: ['speed', 'gap', 'diffusivity'], value: ({ speed, gap, diffusivity }) => (speed * gap) / (2 * diffusivity), formula: 'Pe_R = U (gap/2)/D_m', source: 'definition' }),
  ]),
  quantity('pecletMassGap', { symbol: 'Pe_H', name: 'Peclet number of mass transfer on the gap', unit: '1', ...per }, [
    way({ needs: ['speed', 'gap', 'diffusivity'], value: ({ speed, gap, diffusivity }) => (speed * gap) / diffusivity, formula: 'Pe_H = U gap/D_m', source: 'definition' }),
  ]),
  quantity('speciesDiffusionTime', { symbol: 't_D', name: 'time in which a species diffuses across the flow', unit: 's', ...per }, [
    way({ needs: ['gap', 'diffusivity'], when: { flowClass: ['internal', 'enclosure'] }, value: ({ gap, diffusivity }) => (gap / 2) ** 2 / diffusivity, formula: 't_D = (gap/2)^2/D_m', source: 'definition' }),
    way({ needs: ['concentrationLayerThickness', 'diffusivity'], when: { flowClass: ['body', 'jet'] }, value: ({ concentrationLayerThickness, diffusivity }) => concentrationLayerThickness ** 2 / diffusivity, formula: 't_D = delta_c^2/D_m', source: 'definition' }),
  ]),
  quantity('fourierMass', { symbol: 'Fo_m', name: 'time in the passage over the time in which a species diffuses across it', unit: '1', ...per }, [
    way({ needs: ['diffusivity', 'flowLength', 'speed', 'gap'], when: { flowClass: 'internal' }, value: ({ diffusivity, flowLength, speed, gap }) => (diffusivity * flowLength) / (speed * (gap / 2) ** 2), formula: 'Fo_m = D_m L_x/(U (gap/2)^2)', source: definition }),
  ]),
];

const turbulentWall = 'Berger and Hau, Int. J. Heat Mass Transfer 20 (1977) 1185';

/** Sherwood numbers: the laws of the Nusselt number with Sc for Pr, and those that were made for mass. */
const transfer: Definition[] = [
  quantity('sherwoodLaminar', { symbol: 'Sh_lam', name: 'Sherwood number of developed laminar flow', unit: '1', ...per }),
  quantity('sherwoodTurbulent', { symbol: 'Sh_turb', name: 'Sherwood number of developed turbulent flow', unit: '1', ...per }, [
    way({ needs: ['reynoldsBulk', 'schmidtBulk'], when: { flowClass: 'internal' }, range: { reynoldsBulk: [8e3, 2e5], schmidtBulk: [1e3, 6e3] }, scatter: 0.1, value: ({ reynoldsBulk, schmidtBulk }) => 0.0165 * reynoldsBulk ** 0.86 * Math.cbrt(schmidtBulk), formula: 'Sh = 0.0165 Re^0.86 Sc^(1/3)', source: turbulentWall }),
  ]),
  quantity('sherwoodBetween', { symbol: 'Sh_tr', name: 'Sherwood number between the regimes', unit: '1', ...per }),
  quantity('sherwoodPlain', { symbol: 'Sh_0', name: 'Sherwood number, developed', unit: '1', ...per }),
  quantity('entranceFactorSherwoodLaminar', { symbol: 'F_e,lam', name: 'mean over developed Sherwood number of laminar flow', unit: '1', ...per }),
  quantity('entranceFactorSherwoodLaw', { symbol: 'F_e,Sh*', name: 'mean over developed Sherwood number, by its law', unit: '1', ...per }),
  quantity('entranceFactorSherwood', { symbol: 'F_e,Sh', name: 'mean over developed Sherwood number', unit: '1', ...per }, [
    way({ needs: ['entranceFactorSherwoodLaw'], value: ({ entranceFactorSherwoodLaw }) => entranceFactorSherwoodLaw, formula: 'F_e,Sh by its law', source: 'law of the effect' }),
    noFactor,
  ]),
  quantity('sherwood', { symbol: 'Sh', name: 'Sherwood number, mean', unit: '1', ...per }, [
    way({ needs: ['sherwoodPlain', 'entranceFactorSherwood'], value: ({ sherwoodPlain, entranceFactorSherwood }) => sherwoodPlain * entranceFactorSherwood, formula: 'Sh = Sh_0 F_e', source: 'factor of the entrance' }),
  ]),
  quantity('massTransferCoefficient', { symbol: 'k_c', name: 'mass-transfer coefficient, mean', unit: 'm/s', ...per }, [
    way({ needs: ['sherwood', 'diffusivity', 'length'], value: ({ sherwood, diffusivity, length }) => (sherwood * diffusivity) / length, formula: 'k_c = Sh D_m/L', source: definition }),
  ]),
  quantity('concentrationLayerThickness', { symbol: 'delta_c', name: 'thickness of the layer of a species at the wall', unit: 'm', per: ['species'], plain: 'smallest' as const }, [
    way({ needs: ['boundaryLayerThickness', 'schmidt'], when: { flowClass: ['body', 'jet'], regime: ['laminar', 'transitional'], imposedFlow: 'yes' }, scatter: 0.1, value: ({ boundaryLayerThickness, schmidt }) => boundaryLayerThickness * schmidt ** (-1 / 3), formula: 'delta_c = delta Sc^(-1/3)', source: sameForMass }),
    way({ needs: ['length', 'sherwood'], when: { regime: ['laminar', 'transitional'] }, scatter: 0.3, value: ({ length, sherwood }) => length / sherwood, formula: 'delta_c = L/Sh', source: 'film theory' }),
  ]),
];

/** How much passes the wall, and what is left at the outlet. */
const fluxes: Definition[] = [
  quantity('spaldingNumber', { symbol: 'B', name: 'Spalding number: share that drives the transfer over what the wall holds back', unit: '1', signed: true, ...per }, [
    way({ needs: [], when: { wallShareGiven: 'no' }, value: () => 0, formula: 'B = 0', source: 'it does not pass the wall' }),
    way({ needs: ['massFractionWall', 'massFractionInlet'], value: ({ massFractionWall, massFractionInlet }) => (massFractionWall - massFractionInlet) / (1 - massFractionWall), formula: 'B = (Y_w - Y_in)/(1 - Y_w)', source: 'Spalding, Convective Mass Transfer (1963)' }),
  ]),
  quantity('stefanFactorFlux', { symbol: 'F_B', name: 'wall flux with the flow that diffusion makes over that without', unit: '1', ...per }, [
    way({ needs: ['spaldingNumber', 'massFractionWall', 'massFractionInlet'], when: passed, value: ({ spaldingNumber: b, massFractionWall, massFractionInlet }) => (massFractionWall === massFractionInlet ? 1 / (1 - massFractionWall) : Math.log1p(b) / (massFractionWall - massFractionInlet)), formula: 'F = ln(1 + B)/(Y_w - Y_in)', source: 'film theory: Spalding 1963' }),
    way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here', note: 'also where a number for it is not known' }),
  ]),
  quantity('massTransferUnits', { symbol: 'N_m', name: 'transfer units of a species: coefficient times wall over volume flow', unit: '1', ...per }, [
    way({ needs: [], when: { wallShareGiven: 'no' }, value: () => 0, formula: 'N_m = 0', source: 'it does not pass the wall' }),
    way({ needs: ['massTransferCoefficient', 'stefanFactorFlux', 'wettedPerimeter', 'flowLength', 'parallelPassages', 'massFlow', 'densityBulk'], when: { flowClass: 'internal' }, value: (of) => (of.massTransferCoefficient * of.stefanFactorFlux * of.wettedPerimeter * of.flowLength * of.parallelPassages * of.densityBulk) / of.massFlow, formula: 'N_m = k_c F_B P L_x n rho_b/m', source: definition }),
  ]),
  quantity('outletMassFraction', { symbol: 'Y_out', name: 'mean mass share of a species at the outlet', unit: '1', ...per }, [
    way({ needs: ['massFractionInlet', 'reactionFactorOf'], when: { wallShareGiven: 'no', flowClass: ['internal', 'continuum'] }, value: ({ massFractionInlet, reactionFactorOf }) => massFractionInlet * reactionFactorOf, formula: 'Y_out = Y_in F_X', source: 'balance of the species' }),
    way({ needs: ['massFractionInlet', 'massFractionWall', 'massTransferUnits', 'damkohlerOf'], when: { ...passed, flowClass: ['internal', 'continuum'] }, value: ({ massFractionInlet, massFractionWall, massTransferUnits: n, damkohlerOf: da }) => { const end = n + da === 0 ? massFractionInlet : (n * massFractionWall) / (n + da); return end + (massFractionInlet - end) * Math.exp(-n - da); }, formula: 'Y_out = Y* + (Y_in - Y*) e^(-N_m - Da), Y* = N_m Y_w/(N_m + Da)', source: 'balance of the species along the passage, first-order reaction' }),
  ]),
  quantity('wallMassFlux', { symbol: 'm"', name: 'mass flux from the wall', unit: 'kg/(m^2 s)', signed: true, ...per }, [
    way({ needs: [], when: { wallShareGiven: 'no' }, value: () => 0, formula: 'm" = 0', source: 'it does not pass the wall' }),
    way({ needs: ['massFlow', 'outletMassFraction', 'massFractionInlet', 'wettedPerimeter', 'flowLength', 'parallelPassages'], when: { flowClass: 'internal', 'has.reactions': 'no' }, value: (of) => (of.massFlow * (of.outletMassFraction - of.massFractionInlet)) / (of.wettedPerimeter * of.flowLength * of.parallelPassages), formula: 'm" = m (Y_out - Y_in)/(n P L_x)', source: 'balance of the species along the passage' }),
    way({ needs: ['densityFilm', 'massTransferCoefficient', 'stefanFactorFlux', 'massFractionWall', 'massFractionInlet'], when: { flowClass: ['body', 'jet', 'solid'] }, value: (of) => of.densityFilm * of.massTransferCoefficient * of.stefanFactorFlux * (of.massFractionWall - of.massFractionInlet), formula: 'm" = rho_f k_c F_B (Y_w - Y_in)', source: 'film theory: Spalding 1963' }),
  ]),
  quantity('massTransferRate', { symbol: 'm_A', name: 'mass-transfer rate at the wall', unit: 'kg/s', signed: true, ...per }, [
    way({ needs: ['wallMassFlux', 'wettedPerimeter', 'flowLength', 'parallelPassages'], when: { flowClass: 'internal' }, value: ({ wallMassFlux, wettedPerimeter, flowLength, parallelPassages }) => wallMassFlux * wettedPerimeter * flowLength * parallelPassages, formula: 'm_A = n m" P L_x', source: definition }),
    way({ needs: ['wallMassFlux', 'wallArea', 'parallelPassages'], value: ({ wallMassFlux, wallArea, parallelPassages }) => wallMassFlux * wallArea * parallelPassages, formula: 'm_A = n m" A_w', source: definition }),
  ]),
];

/** Transfer of species between fluid and walls. */
export const massTransfer: Definition[] = [...groups, ...transfer, ...fluxes];
