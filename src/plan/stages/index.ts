import type { Stage } from '../ground.ts';
import { sectionNames, type SectionName } from '../types.ts';

const empty: Stage = () => ({ lines: [], tables: [] });

/** The stages of the plan by the section they write. */
export const stages: Readonly<Record<SectionName, Stage>> = Object.fromEntries(sectionNames.map((n) => [n, empty])) as Record<SectionName, Stage>;
