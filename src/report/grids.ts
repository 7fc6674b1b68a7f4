import type { GridResult, GridVerdict } from '../results/index.ts';
import { wrapped } from './wrap.ts';

/**
 * The screen of `grids`: the family on one line, then each target with what it says and what speaks against it.
 *
 * @param result  the verdicts
 * @returns       text without a last newline, at most 80 columns wide
 */
export function gridsText(result: GridResult): string {
  const [what, sizes] = result.by === 'step' ? ['steps', 'steps'] : ['meshes', 'sizes'];
  const head = `${result.marks.length} ${what}, ratios of ${sizes} ${result.ratios.map((ratio) => ratio.toFixed(2)).join(', ')} from the finest on`;
  const family = [wrapped(head, ''), ...result.cautions.map((caution) => wrapped(caution, '    ', '  - '))].join('\n');
  return [family, ...result.targets.map(targetText)].join('\n\n');
}

function targetText(target: GridVerdict): string {
  const outcome = target.outcome === undefined ? '' : `: ${target.outcome}`;
  return [`${target.name}${outcome} (${target.kind})`, wrapped(target.says, '  '), ...target.cautions.map((caution) => wrapped(caution, '    ', '  - '))].join('\n');
}

/**
 * The document of `grids --json`: the keys of the first target; with several targets the worst outcome, the words of all, and
 * `targets` with each of them.
 *
 * @param result  the verdicts
 * @returns       the document, numbers in SI
 */
export function gridsDocument(result: GridResult): object {
  const [first, ...others] = result.targets;
  const family = { by: result.by, ratios: result.ratios };
  if (others.length === 0) return { ...first, ...family, cautions: [...result.cautions, ...first.cautions] };
  const says = result.targets.map((target) => `${target.name}: ${target.says}`).join(' ');
  return { ...first, ...(result.outcome === undefined ? {} : { outcome: result.outcome }), says, ...family, cautions: result.cautions, targets: result.targets };
}
