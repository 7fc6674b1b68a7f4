import type { Definition } from '../workings/index.ts';
import { bodies } from './bodies.ts';
import { branches } from './branches.ts';
import { groups } from './groups.ts';
import { conduction } from './conduction.ts';
import { entrance } from './entrance.ts';
import { expected } from './expected.ts';
import { porous } from './porous.ts';
import { dimension } from './dimension.ts';
import { domain } from './domain.ts';
import { unsteady } from './unsteady.ts';
import { massAnalogy } from './mass-analogy.ts';
import { massTransfer } from './mass-transfer.ts';
import { reacting, reactions } from './reactions.ts';
import { composition, solutal } from './species.ts';
import { thermalDiffusion } from './thermal-diffusion.ts';
import { roughness } from './roughness.ts';
import { compressibility } from './compressibility.ts';
import { onset } from './onset.ts';
import { buoyancy } from './buoyancy.ts';
import { density } from './density.ts';
import { propertyChange } from './property-change.ts';
import { viscousHeating } from './viscous-heating.ts';
import { radiation } from './radiation.ts';
import { layers } from './layers.ts';
import { namedFields } from './named-fields.ts';
import { rheologyDefinitions } from './rheology.ts';
import { nearWall } from './near-wall.ts';
import { hazards } from './hazards.ts';
import { phase } from './phase.ts';
import { condensation } from './condensation.ts';
import { properties } from './property-states.ts';
import { results } from './results.ts';
import { referenceFlow } from './reference-flow.ts';
import { scales } from './scales.ts';
import { temperatures } from './temperatures.ts';
import { terms } from './terms.ts';
import { traps } from './traps.ts';
import { turbulence } from './turbulence.ts';
import { wallTemperatures } from './walls.ts';
import { words } from './words.ts';

/** What every case has, whether or not a species is carried; one file a topic. */
export const commonDefinitions: Definition[] = [
  ...words,
  ...scales,
  ...referenceFlow,
  ...temperatures,
  ...wallTemperatures,
  ...layers,
  ...properties,
  ...results,
  ...groups,
  ...branches,
  ...bodies,
  ...turbulence,
  ...compressibility,
  ...phase,
  ...condensation,
  ...terms,
  ...hazards,
  ...traps,
  ...conduction,
  ...entrance,
  ...roughness,
  ...unsteady,
  ...porous,
  ...dimension,
  ...domain,
  ...expected,
  ...onset,
  ...buoyancy,
  ...density,
  ...propertyChange,
  ...viscousHeating,
  ...radiation,
  ...nearWall,
  ...namedFields,
  ...rheologyDefinitions,
];

/** What a case has in addition that carries a species or lets one react. */
export const carriedDefinitions: Definition[] = [...composition, ...solutal, ...massTransfer, ...thermalDiffusion, ...reactions, ...reacting, ...massAnalogy([...branches, ...entrance])];

/** Every definition that cases share. */
export const generalDefinitions: Definition[] = [...commonDefinitions, ...carriedDefinitions];
