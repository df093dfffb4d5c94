/** About what a letter of 13 px, half bold, takes. */
const charPx = 5.7;
/** Between a mark and its words. */
const gapPx = 13;

type Side = 'left' | 'right';

/**
 * On which side of its mark the words of each stand, outward of one another.
 *
 * @returns null where they don't fit: then they stand in rows of their own
 */
export function wordSides(
  marks: readonly { x: number; words: string }[],
  widthPx: number,
): readonly Side[] | null {
  const [first, second] = marks;
  if (!first) return [];
  const fits = ({ x, words }: { x: number; words: string }, side: Side) => {
    const neededPx = gapPx + words.length * charPx;
    return side === 'left' ? x >= neededPx : widthPx - x >= neededPx;
  };
  if (!second) return fits(first, 'right') ? ['right'] : fits(first, 'left') ? ['left'] : null;
  const sides: readonly Side[] = first.x <= second.x ? ['left', 'right'] : ['right', 'left'];
  return fits(first, sides[0]) && fits(second, sides[1]) ? sides : null;
}
