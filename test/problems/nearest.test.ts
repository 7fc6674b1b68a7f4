import { expect, it } from 'vitest';
import { nearestName } from '../../src/problems/index.ts';

const names = ['acetone', 'air', 'lead', 'lung', 'PP-H', 'water'];

it.each([['aceton', 'acetone'], ['wtaer', 'water'], ['leed', 'lead'], ['aur', 'air'], ['waetr', 'water']])('%s may mean %s', (name, meant) => expect(nearestName(name, names)).toBe(meant));

// Two edits in a short word leave little of it: lead for teak, PP-H for JP-8.
it.each([['teak'], ['JP-8']])('%s means none of them', (name) => expect(nearestName(name, names)).toBeUndefined());
