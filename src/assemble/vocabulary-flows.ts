import type { Fields, FlowWords, QuantityField } from '../case/index.ts';
import { angle, count, length, meanings, number, quantity, word } from './vocabulary-define.ts';

const must = { required: true } as const;
const endless = meanings({ infinite: 'without end: the third direction is not computed' });
const sides = ['left', 'right', 'top', 'bottom'] as const;

/** A size that the flow needs, one that it may do without, and one that may be `infinite`. */
const need = (doc: string, example: string): QuantityField => length(doc, example, must);
const may = (doc: string, example: string): QuantityField => length(doc, example);
const open = (doc: string, example: string): QuantityField => length(doc, example, { words: endless });

const stream = ['inlet.speed', 'inlet.temperature'] as const;
const flow = (title: string, sizes: Fields, walls: readonly string[] = [], needs: readonly string[] = stream): FlowWords => ({ title, sizes, walls, needs });

const standing: Fields = {
  channelHeight: may('height of the channel around the body', '300 mm'),
  channelWidth: may('width of the channel around the body', '300 mm'),
  pitchAlong: may('distance to the next body along the stream, in an array', '80 mm'),
  pitchAcross: may('distance to the next body across the stream, in an array', '80 mm'),
};

const fittingSizes: Fields = {
  shape: word('shape of the fitting', 'bend', {
    bend: 'takes diameter, bendRadius, angle',
    orifice: 'takes diameter, orificeDiameter, plateThickness, edge',
    expansion: 'takes diameter, outletDiameter, length',
    contraction: 'takes diameter, outletDiameter, length',
    diffuser: 'takes diameter, outletDiameter, length',
    valve: 'takes diameter, lossCoefficient',
  }, must),
  diameter: need('inner diameter of the pipe before it', '50 mm'),
  bendRadius: may('radius of the centre line of a bend', '75 mm'),
  angle: angle('angle a bend turns by', '90 deg', { above: 0 }),
  orificeDiameter: may('diameter of the hole of an orifice', '30 mm'),
  plateThickness: may('thickness of the plate of an orifice', '3 mm'),
  edge: word('edge of an orifice', 'sharp', { sharp: 'square edge towards the flow', rounded: 'rounded edge towards the flow' }),
  outletDiameter: may('diameter behind an expansion, contraction or diffuser', '80 mm'),
  length: may('length of the fitting along its axis', '200 mm'),
  lossCoefficient: number('loss over the dynamic pressure, of a valve', '2.5'),
};

const solidSizes: Fields = {
  shape: word('shape of the body', 'slab', { slab: 'a plane layer, thickness', cylinder: 'a long cylinder, diameter', sphere: 'a ball, diameter', fin: 'a fin, thickness and length' }),
  thickness: may('thickness of a slab or fin', '40 mm'),
  diameter: may('diameter of a cylinder or sphere', '60 mm'),
  length: may('length of a cylinder or fin', '100 mm'),
};

const drops = (what: string): FlowWords => flow(`A single ${what}, or many of them`, { diameter: need(`diameter of the ${what}`, '3 mm'), ...standing });

/** Flow, sizes, walls, as the case format lists them. */
export const flows: Readonly<Record<string, FlowWords>> = {
  pipe: flow('Straight round pipe', { diameter: need('inner diameter', '25 mm'), length: may('length along the flow', '8 m') }),
  duct: flow('Rectangular duct', { width: need('inner width', '60 mm'), height: need('inner height', '30 mm'), length: may('length along the flow', '2 m') }, sides),
  annulus: flow('Gap between two pipes', { innerDiameter: need('outer diameter of the inner pipe', '12 mm'), outerDiameter: need('inner diameter of the outer pipe', '30 mm'), length: may('length along the flow', '1.2 m'), eccentricity: number('offset of the axes over the concentric gap', '0.1', { atLeast: 0, atMost: 1 }) }, ['inner', 'outer']),
  channel: flow('Gap between two plates', { gap: need('distance of the plates', '5 mm'), length: may('length along the flow', '0.5 m'), width: open('width of the plates', '200 mm') }, ['bottom', 'top']),
  coil: flow('Curved pipe or helical coil', { diameter: need('inner diameter of the pipe', '20 mm'), coilDiameter: need('diameter of the coil, axis to axis', '300 mm'), pitch: may('rise per turn', '40 mm'), length: may('length along the pipe', '6 m') }),
  fitting: flow('Bend, orifice, expansion, contraction, diffuser or valve', fittingSizes),
  'backward-step': flow('Sudden step in a channel', { inletHeight: need('height of the channel before the step', '20 mm'), stepHeight: need('height of the step', '10 mm'), width: open('width of the channel', '200 mm'), length: may('length behind the step', '400 mm') }, ['top', 'bottom']),
  nozzle: flow('Converging or converging-diverging nozzle', { inletDiameter: need('diameter at the inlet', '40 mm'), throatDiameter: need('smallest diameter', '12 mm'), throatLength: length('length of constant smallest diameter', '5 mm', { atLeast: 0 }), outletDiameter: may('diameter at the outlet', '20 mm'), length: may('length from inlet to outlet', '120 mm'), throatCurvature: may('radius of curvature of the wall at the throat', '24 mm') }, [], ['inlet.totalPressure', 'inlet.totalTemperature', 'outlet.pressure']),
  'mixing-tee': flow('Two streams that meet in a tee', { mainDiameter: need('inner diameter of the main pipe', '150 mm'), branchDiameter: need('inner diameter of the branch', '50 mm'), length: may('length behind the tee', '3 m'), branchAngle: angle('angle between branch and main pipe', '90 deg', { above: 0 }) }, [], ['inlets.main.speed', 'inlets.main.temperature', 'inlets.branch.speed', 'inlets.branch.temperature']),
  'packed-bed': flow('Bed of particles in a tube', { particleDiameter: need('diameter of the particles', '4 mm'), bedDiameter: need('inner diameter of the tube', '25 mm'), length: may('length of the bed', '3 m') }),
  'porous-layer': flow('Layer of porous matter', { thickness: need('thickness of the layer', '100 mm'), length: may('length of the layer', '1 m') }, sides),
  'tube-bank': flow('Flow across rows of tubes', { diameter: need('outer diameter of the tubes', '25 mm'), pitchAlong: need('distance of the rows', '40 mm'), pitchAcross: need('distance of the tubes in a row', '50 mm'), rows: count('number of rows', '8', must), arrangement: word('arrangement of the tubes', 'staggered', { 'in-line': 'tubes behind each other', staggered: 'each row shifted by half a pitch' }) }),
  plate: flow('Flat plate along the stream, or in still fluid', { length: need('length along the stream, or upwards', '0.5 m'), width: open('width across the stream', '0.3 m'), unheatedStart: may('length before the heating begins', '0.1 m'), ...standing }),
  cylinder: flow('Round cylinder across the stream, or in still fluid', { diameter: need('outer diameter', '40 mm'), span: open('length of the cylinder', '500 mm'), ...standing }),
  sphere: flow('Ball in a stream, or in still fluid', { diameter: need('diameter', '10 mm'), ...standing }),
  building: flow('Building in the wind', { height: need('height', '12 m'), width: need('width across the wind', '30 m'), depth: may('depth along the wind', '20 m'), ...standing }),
  'bluff-body': flow('Block on the ground or clear of it', { height: need('height', '1.4 m'), width: need('width across the stream', '1.8 m'), length: may('length along the stream', '4 m'), clearance: length('distance from the ground', '150 mm', { atLeast: 0 }), ...standing }),
  aerofoil: flow('Wing section or slender body', { chord: need('length of the section', '0.6 m'), thickness: may('largest thickness', '72 mm'), span: open('length of the wing', '3 m'), ...standing }),
  'side-heated-cavity': flow('Closed box heated from the side', { height: need('height', '300 mm'), width: need('distance of the hot and the cold wall', '100 mm'), depth: open('third direction', '200 mm') }, sides, ['walls.left.temperature', 'walls.right.temperature']),
  'bottom-heated-cavity': flow('Closed box heated from below', { height: need('height of the layer', '50 mm'), width: may('width of the layer', '500 mm'), depth: open('third direction', '500 mm') }, sides, ['walls.bottom.temperature', 'walls.top.temperature']),
  'open-cavity': flow('Heated box with one open side', { height: need('height of the opening', '300 mm'), depth: may('depth from the opening to the back', '300 mm'), width: open('third direction', '1 m') }, ['left', 'right', 'top', 'bottom'], ['wall.temperature', 'surroundings.temperature']),
  'lid-driven-cavity': flow('Box driven by its sliding lid', { height: need('height', '100 mm'), width: need('width, along the lid', '100 mm'), depth: open('third direction', '100 mm') }, sides, ['walls.top.speed', 'fluid.temperature']),
  room: flow('Ventilated room', { length: need('length of the room', '8 m'), width: need('width of the room', '5 m'), height: need('height of the room', '2.8 m'), supplyWidth: may('width of the supply opening', '1 m'), supplyHeight: need('height of the supply opening', '0.2 m') }, sides),
  'free-jet': flow('Jet into free fluid', { nozzleDiameter: may('diameter of a round nozzle', '20 mm'), slotWidth: may('width of a slot, in place of a round nozzle', '5 mm'), distance: may('distance looked at', '1 m') }, [], ['sizes.nozzleDiameter', ...stream]),
  'impinging-jet': flow('Jet onto a wall', { nozzleDiameter: may('diameter of a round nozzle', '10 mm'), slotWidth: may('width of a slot, in place of a round nozzle', '5 mm'), standoff: need('distance from nozzle to wall', '60 mm'), pitch: may('distance of the nozzles in an array', '80 mm') }, [], ['sizes.nozzleDiameter', ...stream, 'wall.temperature']),
  plume: flow('Buoyant plume above a source', { sourceDiameter: need('diameter of the source', '0.5 m'), height: may('height looked at', '4 m') }, [], ['drive.heatRelease', 'surroundings.temperature']),
  'rotating-cylinders': flow('Gap between turning cylinders', { innerDiameter: need('diameter of the inner cylinder', '80 mm'), outerDiameter: need('diameter of the outer cylinder', '100 mm'), height: may('height of the gap', '200 mm') }, ['inner', 'outer', 'top', 'bottom'], ['walls.inner.rotation', 'fluid.temperature']),
  'rotating-disk': flow('Disk turning in still fluid or in a casing', { diameter: need('diameter of the disk', '300 mm'), casingGap: may('distance of the casing', '6 mm') }, ['inner', 'outer'], ['drive.rotation', 'fluid.temperature']),
  'stirred-tank': flow('Stirred tank', { tankDiameter: need('inner diameter of the tank', '2 m'), impellerDiameter: need('diameter of the impeller', '0.7 m'), liquidDepth: may('depth of the liquid', '2.2 m') }, ['outer', 'bottom', 'top'], ['drive.rotation', 'fluid.temperature', 'impeller.powerNumber']),
  'open-channel': flow('Channel with a free surface', { depth: need('depth of the water', '1.2 m'), width: length('width of the channel', '8 m', { words: endless }), length: may('length along the flow', '200 m'), bedSlope: number('fall of the bed over its length', '0.001', { atLeast: 0 }) }, ['bottom', 'left', 'right']),
  'sloshing-tank': flow('Tank with a moving free surface', { length: need('length in the direction of motion', '6 m'), width: open('width', '2 m'), height: may('height of the tank', '2 m'), fillDepth: need('depth of the liquid at rest', '1 m') }, sides, ['motion.acceleration', 'motion.period', 'fluid.temperature', 'otherFluid.material']),
  'column-collapse': flow('Collapsing column of liquid', { width: need('width of the column', '150 mm'), height: need('height of the column', '300 mm'), depth: open('third direction', '150 mm') }, sides, ['fluid.temperature', 'otherFluid.material']),
  drop: drops('drop'),
  bubble: drops('bubble'),
  pellet: flow('Porous catalyst pellet', { diameter: need('diameter of the pellet', '4 mm') }, [], ['fluid.temperature', 'reactions.0.of', 'reactions.0.rateConstant', 'species.feed.inlet']),
  flame: flow('Premixed flame at a burner', { burnerDiameter: need('diameter of the burner', '60 mm') }, [], ['inlet.speed', 'inlet.temperature', 'burning.fuel', 'burning.equivalenceRatio', 'burning.flameSpeed']),
  'shock-tube': flow('Bursting diaphragm in a tube', { length: need('length of the tube', '1 m'), diameter: may('inner diameter of the tube', '50 mm') }, [], ['initial.left.pressure', 'initial.left.temperature', 'initial.right.pressure', 'initial.right.temperature']),
  'storage-tank': flow('Stratified storage tank', { height: need('height of the tank', '2 m'), diameter: need('diameter of the tank', '0.8 m'), portDiameter: may('diameter of the ports', '50 mm') }, ['outer', 'top', 'bottom']),
  solid: flow('Conduction in a body at rest', solidSizes, ['left', 'right', 'top', 'bottom', 'inner', 'outer'], ['sizes.shape', 'sizes.thickness', 'wall.temperature', 'initial.temperature']),
  general: flow('Any other flow, by a length and a speed', { length: need('length over which the speed changes most', '100 mm'), volume: quantity('volume to be computed', 'm^3', '2 L', { name: 'volume', above: 0 }) }),
};

/** Names that stand for several walls. */
export const wallGroups: Readonly<Record<string, readonly string[]>> = { sides: ['left', 'right', 'outer'] };
