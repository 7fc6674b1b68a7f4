import type { Ground } from '../ground.ts';
import type { Cell } from '../types.ts';
import { chosen, keeps } from '../when.ts';

/** What a target hangs on where turbulence is modelled, the heaviest first. */
type Feature = 'buoyancy' | 'separation' | 'corner' | 'heat' | 'shear';

/** What each family is known to do to each feature: published magnitudes. */
const known: Readonly<Record<string, { readonly source: string; readonly does: Readonly<Partial<Record<Feature, string>>>; readonly else: string }>> = {
  'k-epsilon': { source: 'Launder and Spalding 1974; Thangam and Speziale, AIAA J. 30 (1992) 1314', does: { separation: 'reattachment 15 to 25 % short', corner: 'no secondary flow, heat in corners too low', heat: 'hides the sublayer: heat only as good as its wall law, up to twice too high where a stream strikes', buoyancy: 'heat of a buoyant layer 20 to 50 % off with wall laws' }, else: 'a few per cent in attached flow' },
  'k-epsilon-variant': { source: 'Yakhot et al. 1992; Shih et al. 1995', does: { separation: 'reattachment 5 to 15 % short', corner: 'no secondary flow', heat: 'hides the sublayer: heat only as good as its wall law' }, else: 'a few per cent in attached flow' },
  'k-epsilon-low-re': { source: 'Launder and Sharma 1974; Durbin 1991', does: { heat: 'heat within 10 to 20 %', buoyancy: 'heat within 10 to 20 %, late onset of turbulence', separation: 'heat behind reattachment up to twice too high without a length correction', corner: 'no secondary flow' }, else: 'shear within 5 %' },
  'k-omega': { source: 'Wilcox 1988, 2006', does: { separation: 'reattachment within 10 %', heat: 'heat within 15 %', corner: 'no secondary flow' }, else: 'shear within 5 %; it feels the omega of the free stream' },
  sst: { source: 'Menter, AIAA J. 32 (1994) 1598', does: { separation: 'reattachment 0 to 10 % late', corner: 'no secondary flow, heat in corners too low', heat: 'heat within 15 %', buoyancy: 'heat of a buoyant layer within 20 %' }, else: 'shear within 5 %' },
  'one-equation': { source: 'Spalart and Allmaras 1992', does: { separation: 'large separated regions 10 to 30 % off', corner: 'no secondary flow', heat: 'heat within 15 %' }, else: 'shear within 5 % in attached layers' },
  'reynolds-stress': { source: 'Launder, Reece and Rodi 1975; Speziale, Sarkar and Gatski 1991', does: { corner: 'secondary flow of the right sense, within a third', separation: 'reattachment within 10 to 15 %', buoyancy: 'within 5 to 15 % where stratification rules', heat: 'heat within 10 to 15 %' }, else: 'within 5 to 15 %' },
  transition: { source: 'Langtry and Menter, AIAA J. 47 (2009) 2894', does: {}, else: 'place of transition within 30 %, and as good as the inlet turbulence' },
};

/** What the target of this case hangs on. */
function featureOf(on: Ground): Feature {
  if (keeps(on, 'turbulence-buoyancy') || on.word('imposedFlow') === 'no') return 'buoyancy';
  if (on.word('separated') === 'yes') return 'separation';
  if (on.word('targetHeat') === 'yes') return keeps(on, 'secondary-flow') ? 'corner' : 'heat';
  return keeps(on, 'secondary-flow') ? 'corner' : 'shear';
}
const about: Readonly<Record<Feature, string>> = { buoyancy: 'buoyant turbulence', separation: 'separation and reattachment', corner: 'secondary flow in corners', heat: 'heat through a wall layer', shear: 'shear of an attached layer' };

/** The feature in words. */
export const featureWords = (on: Ground): string => about[featureOf(on)];

/** The known weakness of a closure for the target of this case. */
export function weakness(on: Ground, closure: string): string {
  const k = known[closure];
  return k === undefined ? 'not known here' : (k.does[featureOf(on)] ?? k.else);
}

/** Every family held against what the target hangs on. */
export function scorecard(on: Ground): Cell[][] {
  const [first, second] = [chosen(on, 'closure'), chosen(on, 'second-closure')];
  return Object.entries(known).map(([id, k]) => [id, weakness(on, id), k.source, id === first ? 'first' : id === second ? 'second' : '']);
}
