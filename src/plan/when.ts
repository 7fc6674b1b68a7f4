import type { Conditions } from '../flows/index.ts';
import type { When } from '../workings/index.ts';
import { idsIn, type Ground } from './ground.ts';

/** Whether the words of the case are those wanted. */
export function holds(on: Ground, when: When | undefined): boolean {
  return Object.entries(when ?? {}).every(([id, wanted]) => { const at = on.word(id); return at !== undefined && (typeof wanted === 'string' ? [wanted] : wanted).includes(at); });
}

/** Whether every quantity that a text names has a number or a word. */
export function known(on: Ground, text: string): boolean {
  return idsIn(text).every((id) => on.has(id) || on.word(id) !== undefined);
}

/** The text where its quantities are known, else nothing: for lines. */
export const said = (on: Ground, text: string): string | false => known(on, text) && text;

/** The first of several texts whose quantities are known. */
export const firstSaid = (on: Ground, ...texts: readonly string[]): string | false => texts.find((text) => known(on, text)) ?? false;

/** The sentence that counts here for one variable at a boundary. */
export function conditionOf(on: Ground, conditions: Conditions): string {
  const list = typeof conditions === 'string' ? [{ says: conditions }] : conditions;
  const fits = list.find((c) => holds(on, c.when) && (!('kept' in c) || c.kept === undefined || keeps(on, c.kept)) && known(on, c.says));
  return fits?.says ?? 'to be stated: the case does not give it';
}

/** Whether the model carries an effect; one that is not judged is not carried. */
export function keeps(on: Ground, effect: string): boolean {
  const e = on.effect(effect);
  return e !== undefined && e.applies !== false && on.kept(effect);
}

/** The option taken for a choice, `none` where there is none. */
export const chosen = (on: Ground, id: string): string => on.word(`choice.${id}`) ?? on.choice(id)?.chosen ?? 'none';

/** The group that says how weight stands against the stream: by temperature, or where one temperature holds by composition. */
export const weightGroup = (on: Ground): 'richardson' | 'richardsonMass' => ((on.number('richardson') ?? 0) === 0 && on.has('richardsonMass') ? 'richardsonMass' : 'richardson');
