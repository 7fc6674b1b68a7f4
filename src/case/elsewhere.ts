import { type Field, type Fields, own, type Vocabulary } from './vocabulary.ts';

/** Maps of the vocabulary that have a key of this name, for a key that stands in the wrong place. */
export function elsewhere(vocabulary: Vocabulary, flow: string | undefined, key: string): readonly string[] {
  const found: string[] = [];
  const look = (fields: Fields, path: string): void => {
    if (Object.hasOwn(fields, key) && path !== '') found.push(path);
    for (const [name, field] of Object.entries(fields)) within(field, path === '' ? name : `${path}.${name}`);
  };
  const within = (field: Field, path: string): void => {
    if (field.kind === 'map') look(field.keys, path);
    if (field.kind === 'list') look(field.item.keys, path);
    if (field.kind === 'sizes') look((flow === undefined ? undefined : own(vocabulary.flows, flow)?.sizes) ?? {}, path);
  };
  if (Object.hasOwn(vocabulary.keys, key)) found.push('the case itself');
  look(vocabulary.keys, '');
  return found.slice(0, 6);
}
