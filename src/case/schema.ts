import { own, type Field, type Fields, type Meaning, type Vocabulary } from './vocabulary.ts';
import { wallNames } from './names.ts';

type Schema = Readonly<Record<string, unknown>>;

/**
 * The case file as a JSON Schema (draft 2020-12), for editors. It knows keys, words and sizes of each flow; units and
 * physics are checked by the reader alone.
 *
 * @param vocabulary  the keys there are
 * @returns           the schema
 */
export function jsonSchema(vocabulary: Vocabulary): Schema {
  const flows = Object.entries(vocabulary.flows).map(([id, words]) => {
    const walls = { items: { properties: { name: { enum: wallNames(vocabulary, id) } } } };
    const inCase = { properties: { sizes: { ...object(words.sizes), title: `sizes of ${id}` }, walls } };
    // oxlint-disable-next-line unicorn/no-thenable -- the word of the standard, in a document that nothing awaits
    return { if: { properties: { flow: { const: id } }, required: ['flow'] }, then: inCase };
  });
  const root = object(vocabulary.keys);
  return { $schema: 'https://json-schema.org/draft/2020-12/schema', title: 'A case for runbrief', description: 'A flow, heat or species problem before its simulation', ...root, allOf: flows };
}

function object(fields: Fields, named?: 'required' | 'optional'): Schema {
  const required = Object.keys(fields).filter((key) => own(fields, key)?.required === true || (named === 'required' && key === 'name'));
  return { type: 'object', properties: Object.fromEntries(Object.entries(fields).map(([key, field]) => [key, schemaOf(field)])), ...(required.length === 0 ? {} : { required }), additionalProperties: false };
}

function schemaOf(field: Field): Schema {
  const about = { description: description(field) };
  const single = { ...about, examples: [field.example] };
  switch (field.kind) {
    case 'quantity':
      return { type: field.unit === '1' ? ['number', 'string'] : 'string', ...single, ...(field.words === undefined ? {} : { examples: [...Object.keys(field.words), field.example] }) };
    case 'tolerance':
      return { type: ['string', 'number'], ...single };
    case 'word':
      return { ...about, oneOf: constants(field.words) };
    case 'words':
      return { ...about, anyOf: [{ oneOf: constants(field.words) }, { type: 'array', items: { oneOf: constants(field.words) }, uniqueItems: true }] };
    case 'text':
      return { type: ['string', 'number'], ...single };
    case 'flag':
      return { type: 'boolean', ...about };
    case 'paths':
      return { type: 'array', items: { type: 'array', items: { type: 'string' }, minItems: 2 }, ...about };
    case 'open-map': {
      const names = { type: 'object', additionalProperties: schemaOf(field.item) };
      return field.alone === undefined ? { ...names, ...about } : { ...about, anyOf: [names, schemaOf(field.alone)] };
    }
    case 'map':
      return { ...object(field.keys), ...about };
    case 'sizes':
      return { type: 'object', ...about };
    default:
      return { type: 'array', items: object(field.item.keys, field.names === undefined ? undefined : field.names === 'optional' ? 'optional' : 'required'), ...about };
  }
}

function constants(words: Readonly<Record<string, Meaning>>): Schema[] {
  return Object.entries(words).map(([word, { doc }]) => ({ const: word, description: doc }));
}

function description(field: Field): string {
  const unit = field.kind === 'quantity' && field.unit !== '1' ? ` [${[field.unit, ...(field.orUnits ?? [])].join(' or ')}]` : '';
  return `${field.doc}${unit}`;
}
