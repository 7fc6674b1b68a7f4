// The library for other programs: the functions that the commands call. Numbers are SI, complaints are thrown as `Problem`.

// Complaints: what is wrong with what was given, as data and as text.
export { printProblem, Problem, type ProblemData } from './problems/index.ts';

// Units: text with a unit to an SI number and back.
export { convert, dimensionOf, fromSI, printNumber, readQuantity, sameDimension, type Converted, type Dimension, type Printing, type Quantity, type Wanted } from './units/index.ts';

// Cases: reading against the vocabulary of all keys, the JSON Schema, a case file to fill in.
export { caseTemplate, jsonSchema, readCase, readCaseFile, type Case, type Entry, type ReadOptions, type Vocabulary } from './case/index.ts';
export { vocabulary, type Assembled } from './assemble/index.ts';

// Plans: the whole plan, or the settled graph of a case alone, for numbers without sections.
export { plan, settleCase, type Plan, type PlanOptions, type SectionName, type Settled } from './plan/index.ts';

// The graph behind every number: where it comes from, what it still needs, how far it spreads, what it does over a range.
export { missing, spreads, sweep, trace, type Settle, type Spread, type Step, type Workings } from './workings/index.ts';

// Decisions: shipped rules and a company's own, verdicts at the point of a graph, inputs at which they turn.
export { decide, everyFact, flips, settle, withPack, type CompiledRules, type Decisions, type FlipAt, type FlipInput, type State as SettledState } from './decide/index.ts';
export { compileFiles as compileRules, shippedRules } from './plan/index.ts';

// Materials: shipped records and a company's own, all properties at a state, one property, tables, laws of temperature and pressure.
export { laws, loadMaterial, materialNames, parseRange, parseState, propertyAt, propertySheet, shippedMaterials, stateOf, tableOver, withMaterialsFrom, type Collection, type Law, type Material, type PropertySheet, type PropertyTable, type PropertyValue, type State } from './properties/index.ts';

// Known answers: the list, their values and tables for given inputs, their inputs filled from a case.
export { evaluateReference, findReference, readGiven, references, type Evaluation, type Reference } from './references/index.ts';
export { fillReference, ladderDetails, type FilledReference, type RungDetail } from './ladder/index.ts';

// Results: tables read in, held against a known answer, convergence over grids or steps.
export { compareReference, compareTable, compareValues, grids, readTable, type Comparison, type GridOptions, type GridResult, type ReferenceComparison, type Table } from './results/index.ts';

// Dimensionless groups of any quantities.
export { piGroups, type Dimensioned, type PiGroups } from './quantities/index.ts';

// The forms of a plan: data with its sentences filled in, one screen, files.
export { planDocument, planFiles, screen, writingOf, type PlanFile, type Writing } from './report/index.ts';
