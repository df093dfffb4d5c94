import type { TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import type { HeardChoice } from '../components/HearRow';
import { shuffled, type HeardPlace } from '../hearing';
import { shortPosition, type LengthUnit } from '../positionWords';
import { placeName } from '../rows';

/** What can be heard, by its position or, while nobody knows which is which, by a letter. */
export function useBlindChoice(tryOut: TryOutResponse, heard: readonly HeardPlace[], lengthUnit: LengthUnit) {
  const [order, setOrder] = useState<readonly string[] | null>(null);
  const played = heard.map(({ placeId }) => placeId);
  // A take that is taken out, or that comes meanwhile, makes another order.
  const isCurrent = order?.length === played.length && order.every((id) => played.includes(id));
  const hiddenOrder = isCurrent ? order : null;
  const placeIds = hiddenOrder ?? played;
  const choices = placeIds.flatMap((placeId, index): HeardChoice[] => {
    const place = tryOut.places.find(({ id }) => id === placeId);
    if (!place?.take) return [];
    if (hiddenOrder) return [{ placeId, word: letter(index), label: letter(index) }];
    const word = shortPosition(place, tryOut.unit, lengthUnit) ?? String(place.take.number);
    return [{ placeId, word, label: `take ${place.take.number}, ${placeName(place, tryOut, lengthUnit)}` }];
  });
  return {
    hidden: hiddenOrder !== null,
    placeIds,
    choices,
    hide: (hiding: boolean) => setOrder(hiding ? shuffled(played, Math.random) : null),
    /** "shuffle and hide the heights" */
    hideWords: tryOut.subject === 'overhead-height' ? 'the heights' : 'which is which',
  };
}

const letter = (index: number) => String.fromCharCode('A'.charCodeAt(0) + index);
