import { rendered, type Block, type Forms } from './blocks.ts';

/**
 * Blocks as one self-contained page: light and dark, fit for print, without script and without anything fetched from elsewhere.
 *
 * @param blocks  the report; its first heading is the title
 * @returns       the document with a last newline
 */
export function asHtml(blocks: readonly Block[]): string {
  const [first] = blocks;
  const title = first?.kind === 'heading' ? first.text : 'Plan';
  const parts = blocks.flatMap((block, i) => (block.kind === 'heading' && block.level === 2 ? [{ text: block.text, id: `part-${i}` }] : []));
  const nav = parts.map(({ id, text }) => `<li><a href="#${id}">${escaped(text)}</a></li>`).join('');
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'">
<meta name="color-scheme" content="light dark">
<title>${escaped(title)}</title>
<style>${style}</style>
</head>
<body>
<nav aria-label="Parts of the plan"><ol>${nav}</ol></nav>
<main>
${blocks.map((block, i) => rendered(block, formsAt(`part-${i}`))).join('\n')}
</main>
</body>
</html>
`;
}

const row = (cells: readonly string[]): string => `<tr>${cells.map((cell, k) => (k === 0 ? `<th scope="row">${escaped(cell)}</th>` : `<td${toned(cell)}>${escaped(cell)}</td>`)).join('')}</tr>`;

const formsAt = (id: string): Forms => ({
  heading: ({ level, text }) => `<h${level} id="${id}">${escaped(text)}</h${level}>`,
  paragraph: ({ text }) => `<p>${escaped(text)}</p>`,
  list: ({ items, boxes }) => `<ul${boxes === true ? ' class="boxes"' : ''}>${items.map((item) => `<li>${escaped(item)}</li>`).join('\n')}</ul>`,
  table: ({ title, columns, rows }) => {
    const caption = title === '' ? '' : `<caption>${escaped(title)}</caption>`;
    const head = columns.map((column) => `<th scope="col">${escaped(column)}</th>`).join('');
    return `<div class="wide" tabindex="0"><table>${caption}<thead><tr>${head}</tr></thead><tbody>\n${rows.map(row).join('\n')}\n</tbody></table></div>`;
  },
});

const tones: readonly string[] = ['include', 'leave-out', 'borderline', 'undecided'];

function toned(cell: string): string {
  return tones.includes(cell) ? ` class="verdict ${cell}"` : '';
}

/** The one place where text enters the page. */
export function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;').replaceAll("'", '&#39;');
}

const style = `
:root { --paper: #fbfaf7; --ink: #20262b; --soft: #5d676f; --line: #d9d5cb; --band: #f1eee6; --mark: #0b6477; --warm: #9a4a00; --cool: #5d676f; --red: #a3213a }
@media (prefers-color-scheme: dark) { :root { --paper: #14191c; --ink: #e3e7e8; --soft: #98a4aa; --line: #313b40; --band: #1c2327; --mark: #6cc7d6; --warm: #f0a45a; --cool: #98a4aa; --red: #f2879b } }
* { box-sizing: border-box }
body { margin: 0; display: grid; grid-template-columns: 15rem minmax(0, 62rem); column-gap: 3rem; background: var(--paper); color: var(--ink); font: 15px/1.55 "Segoe UI", Cantarell, "Noto Sans", "Helvetica Neue", sans-serif }
nav { position: sticky; top: 0; align-self: start; max-height: 100vh; overflow: auto; padding: 2.2rem 0 2rem 1.6rem; font-size: .87rem }
nav ol { list-style: none; margin: 0; padding: 0; border-left: 2px solid var(--line) }
nav a { display: block; padding: .2rem .9rem; color: var(--soft); text-decoration: none }
nav a:hover, nav a:focus { color: var(--mark); box-shadow: -2px 0 var(--mark) }
main { padding: 2rem 1.6rem 5rem 0 }
h1 { font-size: 1.75rem; line-height: 1.2; margin: 0 0 .4rem; font-weight: 650 }
h2 { font-size: 1.15rem; margin: 2.8rem 0 .7rem; padding-top: .6rem; border-top: 2px solid var(--ink); font-weight: 650 }
h3 { font-size: 1rem; margin: 1.6rem 0 .3rem; color: var(--mark); font-weight: 600 }
h1 + p { color: var(--soft); font-size: .87rem; overflow-wrap: anywhere }
p, ul { margin: .5rem 0; max-width: 50rem }
ul { padding-left: 1.15rem }
li { margin: .25rem 0; overflow-wrap: anywhere }
.boxes { list-style: none; padding-left: 0 }
.boxes li::before { content: ""; display: inline-block; width: .8em; height: .8em; margin-right: .6em; border: 1.5px solid var(--soft) }
.wide { overflow-x: auto; margin: 1rem 0 }
table { border-collapse: collapse; min-width: 100%; font-size: .87rem; font-variant-numeric: tabular-nums }
caption { text-align: left; font-weight: 600; padding: .3rem 0 }
th, td { text-align: left; vertical-align: top; padding: .35rem .9rem .35rem 0; border-bottom: 1px solid var(--line); overflow-wrap: break-word; max-width: 24rem }
thead th { color: var(--soft); font-weight: 600; border-bottom: 2px solid var(--line); white-space: nowrap }
tbody th { font-weight: 600 }
tbody tr:hover { background: var(--band) }
.verdict { font-weight: 600; white-space: nowrap }
.include { color: var(--mark) } .borderline { color: var(--warm) } .undecided { color: var(--red) } .leave-out { color: var(--cool) }
@media (max-width: 60rem) { body { display: block } nav { position: static; padding: 1rem; max-height: none } nav ol { columns: 2; border: 0 } main { padding: 0 1rem 3rem } }
@media print { body { display: block; font-size: 10pt } nav { display: none } h2, h3 { break-after: avoid } tr { break-inside: avoid } .wide { overflow: visible } }
`;
