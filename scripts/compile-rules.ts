// Compiles rules/<topic>/*.json into one file, every id in them checked.
import { writeFileSync } from 'node:fs';
import { compileFiles } from '../src/plan/index.ts';
import { textsUnder } from './texts.ts';

// Examples are text within the text: a start does not read them, `rules` does.
writeFileSync('dist/rules.json', JSON.stringify(compileFiles(textsUnder('rules', '.json')), (key, value: unknown) => (key === 'examples' ? JSON.stringify(value) : value)));
