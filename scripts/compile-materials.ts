// Compiles materials/*.yaml into dist/materials: an index of names and one small file per material.
import { mkdirSync, writeFileSync } from 'node:fs';
import { compileMaterials, storedMaterials } from '../src/properties/index.ts';

mkdirSync('dist/materials', { recursive: true });
for (const { file, text } of storedMaterials(compileMaterials('materials'))) writeFileSync(`dist/materials/${file}`, text);
