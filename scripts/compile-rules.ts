// Compiles rules/<topic>/*.json into one file, every id in them checked.
import { writeFileSync } from 'node:fs';
import { compileFiles } from '../src/plan/index.ts';
import { textsUnder } from './texts.ts';

writeFileSync('dist/rules.json', JSON.stringify(compileFiles(textsUnder('rules', '.json'))));
