import type { Stage } from '../ground.ts';
import type { SectionName } from '../types.ts';
import { afterRun } from './after-run.ts';
import { boundaries } from './boundaries.ts';
import { cautions } from './cautions.ts';
import { cost } from './cost.ts';
import { coupling } from './coupling.ts';
import { documentation } from './documentation.ts';
import { domain } from './domain.ts';
import { ladder } from './ladder.ts';
import { mesh } from './mesh.ts';
import { numerics } from './numerics.ts';
import { physics } from './physics.ts';
import { properties } from './properties.ts';
import { question } from './question.ts';
import { time } from './time.ts';
import { turbulence } from './turbulence.ts';
import { verification } from './verification.ts';
import { watch } from './watch.ts';

/** The stages of the plan by the section they write. */
export const stages: Readonly<Record<SectionName, Stage>> = {
  question,
  physics,
  properties,
  domain,
  boundaries,
  turbulence,
  mesh,
  time,
  numerics,
  coupling,
  cost,
  verification,
  ladder,
  watch,
  afterRun,
  documentation,
  cautions,
};
