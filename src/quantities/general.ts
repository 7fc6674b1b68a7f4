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
import { species } from './species.ts';
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
import { nearWall } from './near-wall.ts';
import { hazards } from './hazards.ts';
import { phase } from './phase.ts';
import { properties } from './property-states.ts';
import { results } from './results.ts';
import { scales } from './scales.ts';
import { temperatures } from './temperatures.ts';
import { terms } from './terms.ts';
import { traps } from './traps.ts';
import { turbulence } from './turbulence.ts';
import { wallTemperatures } from './walls.ts';
import { words } from './words.ts';

/** Every definition that all cases share, one file a topic. */
export const generalDefinitions: Definition[] = [
  ...words,
  ...scales,
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
  ...terms,
  ...hazards,
  ...traps,
  ...conduction,
  ...entrance,
  ...roughness,
  ...species,
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
];
