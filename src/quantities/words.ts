import { rheologyLaws } from './rheology.ts';
import { quantity, wordWay, type Definition, type QuantityAbout } from '../workings/index.ts';

/** What a case can name at all; absent unless its key stands in the case. */
export const features = ['species', 'reactions', 'particles', 'otherFluid', 'rheology', 'magneticField', 'frame', 'motion', 'porous', 'period', 'ramp', 'swirl', 'humidity', 'burning', 'roughness', 'layers', 'gravity', 'sources', 'wallMotion', 'partHeated', 'speciesWall', 'severalSpecies', 'fluidReaction', 'surfaceReaction', 'catalystReaction', 'filmReaction', 'reactionHeat', 'solution'] as const;

/** Configurations that a case can name. */
const flowNames = [
  'pipe', 'duct', 'annulus', 'channel', 'coil', 'fitting', 'backward-step', 'nozzle', 'mixing-tee', 'packed-bed', 'porous-layer', 'tube-bank', 'plate', 'cylinder', 'sphere', 'building', 'bluff-body', 'aerofoil',
  'side-heated-cavity', 'bottom-heated-cavity', 'open-cavity', 'lid-driven-cavity', 'room', 'free-jet', 'impinging-jet', 'plume', 'rotating-cylinders', 'rotating-disk', 'stirred-tank', 'open-channel', 'sloshing-tank',
  'column-collapse', 'drop', 'bubble', 'pellet', 'flame', 'shock-tube', 'storage-tank', 'solid', 'general',
] as const;
const degree = Math.PI / 180;
const yesNo = ['yes', 'no'] as const;
const word = (id: string, name: string, words: readonly string[], about: Partial<QuantityAbout> = {}, ways: Parameters<typeof quantity>[2] = []): Definition => quantity(id, { symbol: '', name, unit: 'word', words, ...about }, ways);

/** The closed lists of words that select ways and that rules may ask for. */
export const words: Definition[] = [
  word('flow', 'configuration', flowNames),
  word('flowClass', 'class of flow', ['internal', 'body', 'jet', 'continuum', 'enclosure', 'solid']),
  word('axis', 'axis of the flow against gravity', ['level', 'inclined', 'upright'], {}, [
    wordWay({ needs: ['inclination'], word: ({ inclination }) => (Math.abs(inclination) < 5 * degree ? 'level' : Math.abs(inclination) > 85 * degree ? 'upright' : 'inclined'), formula: 'level within 5 degrees, upright from 85 degrees', source: 'common practice' }),
  ]),
  word('ascent', 'sense of the main direction against gravity', ['up', 'down', 'none'], {}, [
    wordWay({ needs: ['inclination'], word: ({ inclination }) => (Math.abs(inclination) < 5 * degree ? 'none' : inclination > 0 ? 'up' : 'down'), formula: 'sign of the inclination', source: 'definition' }),
  ]),
  word('medium', 'state of matter of the fluid', ['gas', 'liquid', 'solid']),
  word('transparency', 'whether heat radiation passes the fluid', ['transparent', 'opaque']),
  word('imposedFlow', 'a flow is imposed', yesNo),
  word('wallBounded', 'walls bound the flow', yesNo),
  word('attached', 'the flow follows its walls', yesNo),
  word('separated', 'the flow separates', yesNo),
  word('targetHeat', 'a target is heat or mass transfer', yesNo),
  word('targetSpecies', 'a target hangs on a concentration', yesNo),
  word('targetMomentum', 'a target is a force, a shear or a pressure', yesNo),
  word('targetPeak', 'a target is a peak, an rms or a spectrum', yesNo),
  word('targetMean', 'a target is a mean over all walls', yesNo),
  word('energySolved', 'the energy equation is solved', yesNo),
  word('inletProfile', 'shape of the inlet profile', ['uniform', 'developed', 'power', 'log', 'table', 'none']),
  word('wallKind', 'thermal kind of a wall', ['temperature', 'flux', 'coefficient', 'adiabatic'], { per: ['wall'], plain: 'target' }),
  word('wallFace', 'face of the wall whose temperature is given', ['outer', 'wetted'], { per: ['wall'], plain: 'target' }),
  word('volumeFlowState', 'state at which the volume flow of the inlet counts', ['inlet', 'normal', 'standard']),
  word('inletShareBasis', 'what the share of a species at the inlet counts', ['mass', 'mole'], { per: ['species'], plain: 'target' }),
  word('wallShareBasis', 'what the share of a species at the wall counts', ['mass', 'mole'], { per: ['species'], plain: 'target' }),
  word('wallShareGiven', 'a species has a share of its own at the wall', yesNo, { per: ['species'], plain: 'target' }),
  word('lightGas', 'hydrogen or helium takes part', yesNo),
  word('reactionWhere', 'where a reaction goes on', ['fluid', 'wall', 'catalyst', 'interface'], { per: ['reaction'], plain: 'target' }),
  word('rateKind', 'what a rate constant counts on', ['volume', 'surface', 'mass'], { per: ['reaction'], plain: 'target' }),
  word('enthalpyPer', 'what an enthalpy of reaction counts on', ['mole', 'mass'], { per: ['reaction'], plain: 'target' }),
  word('character', 'nature of the problem in time', ['unknown', 'steady', 'periodic', 'transient']),
  word('fluidGiven', 'how the fluid is given', ['material', 'constants']),
  word('rheologyLaw', 'law of the viscosity over the shear', rheologyLaws),
  word('ductSection', 'section of the passage', ['round', 'rectangular', 'flat', 'other']),
  word('infiniteDepth', 'the third direction has no end', yesNo),
  word('curvedPassage', 'the passage is curved', yesNo, {}, [wordWay({ needs: [], word: () => 'no', formula: 'straight unless the flow says otherwise', source: 'definition' })]),
  word('storage', 'where the solver keeps its unknowns', ['cell-centred', 'node-centred']),
  word('heatDirection', 'what the wall does to the fluid', ['heating', 'cooling', 'none'], {}, [
    wordWay({ needs: [], when: { energySolved: 'no' }, word: () => 'none', formula: 'no energy equation', source: 'definition' }),
    wordWay({ needs: ['drivingTemperature', 'farTemperature'], word: ({ drivingTemperature, farTemperature }) => (drivingTemperature > farTemperature ? 'heating' : drivingTemperature < farTemperature ? 'cooling' : 'none'), formula: 'temperature that drives the wall against the fluid that arrives', source: 'definition' }),
    wordWay({ needs: ['wallHeatFlux'], word: ({ wallHeatFlux }) => (wallHeatFlux > 0 ? 'heating' : wallHeatFlux < 0 ? 'cooling' : 'none'), formula: 'sign of the wall heat flux', source: 'definition' }),
    wordWay({ needs: [], when: { wallKind: 'adiabatic' }, word: () => 'none', formula: 'adiabatic wall', source: 'definition' }),
  ]),
  word('regime', 'flow regime', ['laminar', 'transitional', 'turbulent'], {}, [
    wordWay({ needs: ['regimeGroup', 'regimeLow', 'regimeHigh'], word: ({ regimeGroup, regimeLow, regimeHigh }) => (regimeGroup < regimeLow ? 'laminar' : regimeGroup < regimeHigh ? 'transitional' : 'turbulent'), formula: 'group of the flow against its two limits', source: 'regime table of the flow' }),
  ]),
  ...features.map((f) => word(`has.${f}`, `the case names ${f}`, yesNo)),
];
