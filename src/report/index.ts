export { compareText } from './compare.ts';
export { gridsDocument, gridsText } from './grids.ts';
export { choiceRuleText, effectRuleText, rulesListText } from './rules.ts';
export { referenceCsv, referenceDocument, referenceList, referenceText } from './reference.ts';
export { materialCsv, materialDocument, materialTableDocument, materialTableText, materialText } from './material.ts';
export { wrapped } from './wrap.ts';
