import { propertyNames, propertyUnits, type Sampled } from '../properties/index.ts';
import { escaped } from './as-html.ts';

/** A property along a range. */
type Curve = Pick<Sampled, 'property' | 'x' | 'y'>;

const [width, height] = [60, 12];
const short = (x: number): string => String(Number(x.toPrecision(4)));

function scales({ x, y }: Curve): { readonly low: number; readonly high: number; readonly from: number; readonly to: number } {
  const [low, high] = [Math.min(...y), Math.max(...y)];
  const room = high > low ? 0 : Math.abs(low) * 0.05 || 1;
  return { low: low - room, high: high + room, from: x[0] as number, to: x.at(-1) as number };
}

/**
 * Curves for a terminal, one below the other, in plain characters.
 *
 * @param title   material and range
 * @param curves  samples, x rising
 * @param axis    name and unit of x
 * @returns       text without a last newline, at most 80 columns wide
 */
export function plotText(title: string, curves: readonly Curve[], axis: string): string {
  return [title, ...curves.flatMap((curve) => ['', ...drawn(curve, axis)])].join('\n');
}

function drawn(curve: Curve, axis: string): string[] {
  const { low, high, from, to } = scales(curve);
  const grid = Array.from({ length: height }, () => Array.from({ length: width }, () => ' '));
  for (let column = 0; column < width; column++) {
    const at = from + ((to - from) * column) / (width - 1);
    const row = Math.round(((high - valueAt(curve, at)) / (high - low)) * (height - 1));
    (grid[Math.min(height - 1, Math.max(0, row))] as string[])[column] = '*';
  }
  const label = (row: number): string => (row === 0 ? short(high) : row === height - 1 ? short(low) : '').padStart(12);
  const ends = `${short(from)}${short(to).padStart(width - short(from).length)}`;
  return [`  ${propertyNames[curve.property]} [${propertyUnits[curve.property]}]`, ...grid.map((cells, row) => `${label(row)} |${cells.join('').trimEnd()}`), `${' '.repeat(12)} +${'-'.repeat(width)}`, `${' '.repeat(14)}${ends}`, `${' '.repeat(14)}${axis}`];
}

function valueAt({ x, y }: Curve, at: number): number {
  let i = 1;
  while (i < x.length - 1 && at > (x[i] as number)) i++;
  const [x0, x1, y0, y1] = [x[i - 1], x[i], y[i - 1], y[i]] as [number, number, number, number];
  return y0 + ((y1 - y0) * (at - x0)) / (x1 - x0);
}

const panel = { width: 360, height: 240, left: 76, right: 16, top: 34, bottom: 44 } as const;

/**
 * The same curves as a drawing, two panels in a row.
 *
 * @param title   material and range
 * @param curves  samples, x rising
 * @param axis    name and unit of x
 * @returns       an SVG document
 */
export function plotSvg(title: string, curves: readonly Curve[], axis: string): string {
  const columns = Math.min(2, curves.length);
  const total = { width: columns * panel.width, height: Math.ceil(curves.length / columns) * panel.height + 30 };
  const panels = curves.map((curve, i) => panelOf(curve, axis, (i % columns) * panel.width, 30 + Math.floor(i / columns) * panel.height));
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${total.width}" height="${total.height}" viewBox="0 0 ${total.width} ${total.height}" font-family="sans-serif" font-size="11" fill="#222">`,
    `<rect width="100%" height="100%" fill="#fff"/><text x="12" y="20" font-size="13">${escaped(title)}</text>`,
    ...panels,
    '</svg>',
    '',
  ].join('\n');
}

function panelOf(curve: Curve, axis: string, x0: number, y0: number): string {
  const { low, high, from, to } = scales(curve);
  const [w, h] = [panel.width - panel.left - panel.right, panel.height - panel.top - panel.bottom];
  const px = (x: number): string => (x0 + panel.left + (w * (x - from)) / (to - from)).toFixed(1);
  const py = (y: number): string => (y0 + panel.top + (h * (high - y)) / (high - low)).toFixed(1);
  const points = curve.x.map((x, i) => `${px(x)},${py(curve.y[i] as number)}`).join(' ');
  const ticks = [0, 0.25, 0.5, 0.75, 1];
  return [
    `<text x="${x0 + 12}" y="${y0 + 18}">${escaped(`${propertyNames[curve.property]} [${propertyUnits[curve.property]}]`)}</text>`,
    ...ticks.map((t) => low + (high - low) * t).map((y) => `<line x1="${px(from)}" x2="${px(to)}" y1="${py(y)}" y2="${py(y)}" stroke="#ddd"/><text x="${x0 + panel.left - 6}" y="${py(y)}" dy="4" text-anchor="end">${short(y)}</text>`),
    ...ticks.map((t) => from + (to - from) * t).map((x) => `<text x="${px(x)}" y="${y0 + panel.height - panel.bottom + 16}" text-anchor="middle">${short(x)}</text>`),
    `<text x="${px((from + to) / 2)}" y="${y0 + panel.height - panel.bottom + 32}" text-anchor="middle">${escaped(axis)}</text>`,
    `<polyline points="${points}" fill="none" stroke="#0a5" stroke-width="1.6"/>`,
  ].join('\n');
}
