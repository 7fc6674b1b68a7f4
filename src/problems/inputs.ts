/**
 * Missing inputs in words: `sizes.length and (wall.sandGrain or wall.Ra)`.
 *
 * @param paths  paths, each one or alternatives joined by `|`; all of them are wanted
 * @returns      the words; alternatives in brackets where others stand beside them
 */
export function inputsInWords(paths: readonly string[]): string {
  return paths.map((path) => {
    const words = path.replaceAll('|', ' or ');
    return paths.length > 1 && words !== path ? `(${words})` : words;
  }).join(' and ');
}
