import { lines, type Ground } from '../ground.ts';
import { hazardsOf } from '../hazards.ts';
import type { Line } from '../types.ts';

const classes = {
  low: 'rework: two meshes with safety factor 3, the two rungs nearest to the target, a check by the one who runs it',
  medium: 'money, equipment or time: three meshes with safety factor 1.25 where the order is believable, two steps, one larger domain, two closures of unlike kind, every rung, a colleague outside the team reads it',
  high: 'people or what cannot be undone: three or four meshes, each cut removed once, a scale-resolving or measured anchor, own or published data near this case, an independent reader before and after; licensed practice decides',
} as const;

/** What a wrong answer would do, and the rigour that asks for. */
export function rigour(on: Ground): Line[] {
  const stated = on.assembled.case.ifWrong as keyof typeof classes | undefined;
  const hazard = hazardsOf(on)[0];
  if (stated === undefined) return lines(`What a wrong answer would do is not stated (ifWrong): medium is taken, ${classes.medium}.`);
  if (stated === 'low' && hazard !== undefined) return lines(`A wrong answer is called ${stated} in the case, yet it touches a hazard (${hazard.title}): it is planned as medium, ${classes.medium}.`);
  return lines(`A wrong answer would do ${stated} harm: ${classes[stated]}.`);
}
