// Holds the tree to its architecture: a room imports only rooms above it, through their index.ts; no circle inside a room;
// an index.ts only exports; nothing is exported that nobody uses. Reads the text of the imports; needs no package.
// `node scripts/check-rooms.mjs [FOLDER]`.
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

const rooms = ['problems', 'units', 'workings', 'case', 'properties', 'references', 'quantities', 'flows', 'mesh', 'time', 'numerics', 'cost', 'assemble', 'decide', 'ladder', 'interview', 'plan', 'results', 'after', 'report', 'commands'];
const entries = ['index.ts', 'main.ts']; // below all rooms: the library and the program

const filesUnder = (folder) => (existsSync(folder) ? readdirSync(folder, { withFileTypes: true }) : []).flatMap((e) => (e.isDirectory() ? filesUnder(join(folder, e.name)) : e.name.endsWith('.ts') ? [join(folder, e.name)] : []));
const withoutComments = (text) => text.replaceAll(/\/\*[\s\S]*?\*\//g, '').replaceAll(/(^|\s)\/\/.*$/gm, '$1');

/** Names and targets of every import and re-export of a file: `names` is undefined where all names are taken. */
function importsOf(text) {
  const found = [...text.matchAll(/^(?:import|export)\s+(?:type\s+)?(?:(\*(?:\s+as\s+\w+)?|[\w$]+(?:\s*,\s*\{[^}]*\})?|\{[^}]*\})\s+from\s+)?'(\.[^']*)'/gm)].map(([, clause = '', target]) => ({ target, clause }));
  const dynamic = [...text.matchAll(/(?:const\s+(\{[^}]*\})\s*=\s*await\s+)?import\('(\.[^']*)'\)/g)].map(([, clause = '*', target]) => ({ target, clause }));
  return [...found, ...dynamic].map(({ target, clause }) => ({ target, names: clause.includes('*') ? undefined : namesIn(clause) }));
}

function namesIn(clause) {
  const braces = clause.match(/\{([^}]*)\}/)?.[1] ?? '';
  const named = braces.split(',').map((part) => part.trim().replace(/^type\s+/, '').split(/\s+as\s+|:/)[0].trim()).filter((name) => name !== '');
  return /^[\w$]+/.test(clause) ? [...named, 'default'] : named;
}

/** Names a file exports itself or passes on; not the types, where its own signatures or its room's need them. */
function exportsOf(text) {
  const declared = [...text.matchAll(/^export\s+(?:async\s+)?(?:abstract\s+)?(?:const|let|function\*?|class|interface|type)\s+([\w$]+)/gm)];
  const own = declared.filter(([line, name]) => !/interface|type/.test(line) || text.split(new RegExp(`\\b${name}\\b`)).length === 2).map(([, name]) => name);
  const listed = [...text.matchAll(/^export\s+\{([^}]*)\}/gm)].flatMap(([, list]) => list.split(',')).map((part) => part.trim()).filter((part) => part !== '' && !part.startsWith('type '));
  return [...own, ...listed.map((part) => part.split(/\s+as\s+/).at(-1).trim())];
}

/**
 * @param {string} root  project folder
 * @returns {string[]} one line for every breach
 */
function checkRooms(root) {
  const src = join(root, 'src');
  const files = new Map(filesUnder(src).map((file) => [file, withoutComments(readFileSync(file, 'utf8'))]));
  const breaches = [];
  const name = (file) => relative(root, file).split(sep).join('/');
  const roomOf = (file) => relative(src, file).split(sep)[0];
  const inRoom = new Map(); // file -> files of the same room it imports
  const used = new Map(); // file -> names taken from it, or undefined for all

  const take = (target, names) => {
    if (names === undefined) used.set(target, undefined);
    else if (!used.has(target)) used.set(target, new Set(names));
    else for (const each of names) used.get(target)?.add(each);
  };

  for (const [file, text] of files) {
    const room = roomOf(file);
    if (!entries.includes(room) && !rooms.includes(room)) breaches.push(`${name(file)}: ${room} is not a room`);
    const own = [];
    for (const { target, names } of importsOf(text)) {
      const to = join(dirname(file), target);
      if (!to.startsWith(src + sep)) {
        if (!target.endsWith('.json')) breaches.push(`${name(file)}: ${target} lies outside src`);
        continue;
      }
      take(to, names);
      const other = roomOf(to);
      if (other === room) own.push(to);
      else if (entries.includes(other)) breaches.push(`${name(file)}: imports the entry ${other}`);
      else if (!entries.includes(room) && rooms.indexOf(other) > rooms.indexOf(room)) breaches.push(`${name(file)}: ${room} stands above ${other} and may not import it`);
      else if (relative(src, to) !== join(other, 'index.ts')) breaches.push(`${name(file)}: reaches past ${other}/index.ts to ${relative(src, to)}`);
    }
    inRoom.set(file, own);
    if (relative(src, file).split(sep).length === 2 && file.endsWith(`${sep}index.ts`)) {
      const rest = text.replaceAll(/^export\s+(?:type\s+)?(?:\*(?:\s+as\s+\w+)?|\{[^}]*\})\s+from\s+'[^']+';?/gm, '').trim();
      if (rest !== '') breaches.push(`${name(file)}: an index.ts only exports, this one holds: ${rest.slice(0, 60)}`);
    }
  }

  const state = new Map();
  const visit = (file, trail) => {
    if (state.get(file) === 'done') return;
    if (state.get(file) === 'open') {
      breaches.push(`circle: ${[...trail.slice(trail.indexOf(file)), file].map(name).join(' -> ')}`);
      return;
    }
    state.set(file, 'open');
    for (const next of inRoom.get(file) ?? []) visit(next, [...trail, file]);
    state.set(file, 'done');
  };
  for (const file of files.keys()) visit(file, []);

  for (const outside of ['test', 'scripts', 'bench'].flatMap((folder) => filesUnder(join(root, folder)))) {
    for (const { target, names } of importsOf(withoutComments(readFileSync(outside, 'utf8')))) take(join(dirname(outside), target), names);
  }
  for (const [file, text] of files) {
    if (entries.includes(relative(src, file)) || (used.has(file) && used.get(file) === undefined)) continue;
    const unused = exportsOf(text).filter((each) => !used.get(file)?.has(each));
    if (unused.length > 0) breaches.push(`${name(file)}: exported and used nowhere: ${unused.join(', ')}`);
  }
  return breaches;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const breaches = checkRooms(process.argv[2] ?? fileURLToPath(new URL('..', import.meta.url)));
  for (const breach of breaches) process.stdout.write(`${breach}\n`);
  process.exitCode = breaches.length === 0 ? 0 : 1;
}
