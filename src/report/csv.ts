/**
 * Rows as CSV after RFC 4180. A text that a spreadsheet would run as a formula is marked as text.
 *
 * @param head  column titles, `name [unit]`
 * @param rows  cells; a missing one is empty
 * @returns     text with a last newline
 */
export function csvText(head: readonly string[], rows: readonly (readonly (string | number | undefined)[])[]): string {
  return `${[head, ...rows].map((row) => row.map(cell).join(',')).join('\n')}\n`;
}

function cell(value: string | number | undefined): string {
  if (value === undefined) return '';
  if (typeof value === 'number') return String(Number(value.toPrecision(8)));
  const text = /^[=+@\t-]/.test(value) ? `'${value}` : value;
  return /[",\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
