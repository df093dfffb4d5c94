/** Of a caption's letters, a little more than their usual width, so that nothing is overlapped. */
const letterPx = 6.6;
const fewestLetters = 5;

/** A name as far as it fits beside its number: whole words, or nothing where it would be a mere beginning. */
export function shortName(name: string, roomPx: number): string | null {
  const letters = Math.floor(roomPx / letterPx);
  if (name.length <= letters) return name;
  // One letter's room for the dots.
  const cut = name.slice(0, Math.max(0, letters - 1));
  const words = cut.slice(0, Math.max(0, cut.lastIndexOf(' ')));
  return words.length >= fewestLetters ? `${words} …` : null;
}
