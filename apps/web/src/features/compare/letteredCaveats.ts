import type { ComparisonCaveat } from '@thudline/contracts';

export interface LetteredCaveat extends ComparisonCaveat {
  letter: string;
}

/** Cautions lettered from top to bottom: about the flip first, about figures after them. */
export function letteredCaveats(caveats: readonly ComparisonCaveat[]) {
  const isOfFlip = ({ about }: ComparisonCaveat) => about === 'the flip';
  const ordered = [...caveats.filter(isOfFlip), ...caveats.filter((caveat) => !isOfFlip(caveat))];
  const lettered = ordered.map((caveat, index): LetteredCaveat => ({ ...caveat, letter: letter(index) }));
  return {
    ofFlip: lettered.filter(isOfFlip),
    ofFigures: lettered.filter((caveat) => !isOfFlip(caveat)),
  };
}

export const lettersOf = (caveats: readonly LetteredCaveat[]) => caveats.map((caveat) => caveat.letter);

const letter = (index: number) => String.fromCharCode('a'.charCodeAt(0) + index);
