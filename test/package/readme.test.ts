import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { runbrief } from '../commands/harness.ts';

const readme = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');
const example = 'examples/rinse-line.case.yaml';

it('the README shows the example as it stands', () => {
  expect(readme).toContain(`\`\`\`yaml\n${readFileSync(new URL(`../../${example}`, import.meta.url), 'utf8').trim()}\n\`\`\``);
});

it('the README shows the plan as it is printed; where it changed, paste the output of `npm start -s -- plan examples/rinse-line.case.yaml`', async () => {
  const { stdout } = await runbrief(['plan', example]);
  expect(readme).toContain(`\`\`\`\n${stdout.trim()}\n\`\`\``);
});
