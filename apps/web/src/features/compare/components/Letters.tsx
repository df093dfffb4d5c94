import { Lettered } from '../../../components/Lettered';

/** The letters of the notes in the margin that speak of what stands here. */
export function Letters({ letters }: { letters: readonly string[] }) {
  return letters.map((letter) => <Lettered key={letter}>{letter}</Lettered>);
}
