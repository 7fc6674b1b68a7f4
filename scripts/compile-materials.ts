// Compiles materials/*.yaml into dist/materials: an index of names and one small file per material; and the tables of surfaces into one.
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { compileMaterials, readSurfaces, storedMaterials } from '../src/properties/index.ts';

mkdirSync('dist/materials', { recursive: true });
for (const { file, text } of storedMaterials(compileMaterials('materials'))) writeFileSync(`dist/materials/${file}`, text);
writeFileSync('dist/materials/surfaces.json', JSON.stringify(readSurfaces(readFileSync('surfaces/roughness.csv', 'utf8'), readFileSync('surfaces/emissivity.csv', 'utf8'))));
