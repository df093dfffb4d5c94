import { useState } from 'react';
import type { ChosenTake } from '../chosenTakes';

/** Takes that were chosen; they stay so while one turns the page or changes the sentence. */
export function useChosenTakes() {
  const [chosen, setChosen] = useState<readonly ChosenTake[]>([]);
  return {
    chosen,
    isChosen: (take: ChosenTake) => chosen.some(({ id }) => id === take.id),
    choose: ({ id, number, recordedAt, deletedAt }: ChosenTake, on: boolean) =>
      setChosen((now) =>
        on ? [...now, { id, number, recordedAt, deletedAt }] : now.filter((take) => take.id !== id),
      ),
    clear: () => setChosen([]),
  };
}
