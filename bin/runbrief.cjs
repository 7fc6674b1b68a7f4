#!/usr/bin/env node
'use strict';
// Starts the command line from its one bundled file. Compiling that file takes longer than most commands do, so the
// compiled code is kept beside it; a missing, old or broken copy only costs that time again.
const fs = require('node:fs');
const Module = require('node:module');
const path = require('node:path');
const vm = require('node:vm');

// Most commands end before optimised code would pay for its making: it begins later than usual, that of patterns too, and a long scan still gets it.
// Other switches stay alone: what the collector of garbage is told after the start brings the runtime down. The documented way to
// the switch, node:v8, loads all of the runtime's streams first, a tenth of a plan; so it comes second.
function setSwitches(text) {
  const { noDeprecation } = process;
  process.noDeprecation = true;
  try {
    process.binding('v8').setFlagsFromString(text);
  } catch {
    require('node:v8').setFlagsFromString(text);
  } finally {
    process.noDeprecation = noDeprecation;
  }
}
setSwitches('--interrupt-budget=2000000 --regexp-tier-up-ticks=40');

const file = path.join(__dirname, '..', 'dist', 'main.cjs');

function load() {
  if (Module.enableCompileCache) {
    Module.enableCompileCache(path.join(path.dirname(file), '.compiled'));
    return require(file);
  }
  const kept = `${file}.${process.version}-${process.arch}.cache`;
  let cachedData;
  try {
    cachedData = fs.readFileSync(kept);
  } catch {} // not made yet
  const script = new vm.Script(Module.wrap(fs.readFileSync(file, 'latin1')), {
    filename: file,
    cachedData,
    importModuleDynamically: vm.constants.USE_MAIN_CONTEXT_DEFAULT_LOADER,
  });
  const loaded = new Module(file, module);
  loaded.filename = file;
  loaded.paths = Module._nodeModulePaths(path.dirname(file));
  script.runInThisContext().call(loaded.exports, loaded.exports, Module.createRequire(file), loaded, file, path.dirname(file));
  if (cachedData === undefined || script.cachedDataRejected) {
    process.once('exit', () => {
      const mine = `${kept}.${process.pid}`;
      try {
        fs.writeFileSync(mine, script.createCachedData());
        fs.renameSync(mine, kept); // in one step: another start may be reading
      } catch {} // a folder that cannot be written: next time again
    });
  }
  return loaded.exports;
}

void load().start();
