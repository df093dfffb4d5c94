/**
 * At most so many of a list, from its start to its end at even steps, so that a long take costs no more than a short one.
 *
 * @param most - >= 1
 * @returns the list itself where it is short enough
 */
export function evenly<T>(list: readonly T[], most: number): readonly T[] {
  if (list.length <= most) return list;
  return Array.from({ length: most }, (_unused, i) => list[Math.floor((i * list.length) / most)]);
}
