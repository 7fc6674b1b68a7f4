// Compiles rules/<topic>/*.json into one file.
import { writeFileSync } from 'node:fs';
import { compileRules } from '../src/decide/index.ts';
import { textsUnder } from './texts.ts';

writeFileSync('dist/rules.json', JSON.stringify(compileRules(textsUnder('rules', '.json'))));
