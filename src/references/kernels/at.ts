/** Entry of a list that is known to be long enough. */
export function at<T>(list: readonly T[], index: number): T {
  return list[index] as T;
}
