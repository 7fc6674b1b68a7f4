import { expect, it } from 'vitest';
import { COMMANDS } from '../../src/commands/registry.ts';
import { runbrief } from './harness.ts';

it.each(Object.keys(COMMANDS))('%s --help opens with examples', async (id) => {
  const { code, stdout, stderr } = await runbrief([id, '--help']);
  expect([code, stderr]).toEqual([0, '']);
  expect(stdout.match(/^[A-Z].*$/gm)?.[0]).toBe('Examples');
  expect(stdout).toContain(`runbrief ${id}`);
});
