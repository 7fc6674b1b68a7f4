import { lines, table, type Ground } from '../ground.ts';
import { listed, nameOf } from '../say.ts';
import { targetSpreads } from '../target-spread.ts';
import type { Cell, Line, Table } from '../types.ts';
import { keeps } from '../when.ts';

type Target = Ground['assembled']['targets'][number];
const compared = (on: Ground): readonly Target[] => { targetSpreads(on.assembled); return on.assembled.targets.filter((t) => t.computed && on.has(`${t.id}.visible`)); };

/** The last rung, a measurement: what it must report, how its difference is read, and what it could show at all. */
export function experimentLines(on: Ground): Line[] {
  const inputs = ['geometry as built', on.word('imposedFlow') === 'yes' && 'profile and turbulence of the stream that enters', on.word('energySolved') === 'yes' && 'temperatures of walls and streams, losses to outside (heat balance closed within 3 %)', on.word('energySolved') === 'yes' && keeps(on, 'radiation') && 'emissivity of every wall', 'properties of the very fluid', 'repeats, and the uncertainty of each'].filter((t) => typeof t === 'string');
  return [
    ...lines(`The last rung is a measurement, with the set-up frozen and the prediction laid down before: it reports ${listed(inputs)}; without these it cannot validate.`),
    ...lines(compared(on).length > 0 && 'Read as E = S - D, result less data, against u_val = sqrt(u_num^2 + u_input^2 + u_D^2), all standard uncertainties; the model error lies in E - 2 u_val to E + 2 u_val. |E| within u_val: hidden in the noise, validated to that level and no finer. To 2 u_val: cannot tell. Beyond: the model is off by E, or the set-up is wrong, beyond 3.65 u_val look for a mistake first.'),
    ...compared(on).flatMap((t) => worth(on, t)),
  ];
}

/** Whether a comparison of one target is worth its price. */
function worth(on: Ground, t: Target): Line[] {
  const [seen, asked] = [on.number(`${t.id}.visible`) as number, on.number(`${t.id}.accuracy`)];
  const parts = [['numericalPart', 'mesh and iteration: a finer mesh'], ['inputPart', `inputs: measure ${steepest(on, t)} better`], ['dataPart', 'the measurement itself: more repeats, a better instrument']] as const;
  const largest = parts.reduce((best, p) => ((on.number(`${t.id}.${p[0]}`) ?? 0) > (on.number(`${t.id}.${best[0]}`) ?? 0) ? p : best));
  return lines(`A comparison of the ${nameOf(on, t.quantity)} shows a model error from {${t.id}.visible} on, four times in five${asked === undefined ? '.' : `; asked is {${t.id}.accuracy}. ${seen <= asked ? 'It is worth its price.' : `It cannot show what is asked: the largest part is {${t.id}.${largest[0]}} from ${largest[1]}.`}`}`);
}

function steepest(on: Ground, t: Target): string {
  return targetSpreads(on.assembled).find((s) => s.id === t.id)?.from.find((f) => f.kind !== 'scatter')?.label ?? 'the boundary data';
}

/** Forecast of the comparison for every target. */
export function forecastTable(on: Ground): Table[] {
  const rows = compared(on).map((t): Cell[] => [nameOf(on, t.quantity), { id: `${t.id}.numericalPart` }, { id: `${t.id}.inputPart` }, { id: `${t.id}.dataPart` }, { id: `${t.id}.validation` }, { id: `${t.id}.visible` }]);
  return rows.length === 0 ? [] : [table('What a comparison with data could show', ['target', 'u_num', 'u_input', 'u_D', 'u_val', 'least model error seen'], rows)];
}
