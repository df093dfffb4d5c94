import { Box } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { decibels } from '../../../lib/format';
import { MarginNote } from '../../sheet/components/RuledSheet';
import { cymbalsLoudFromDb } from '../../sheet/pictures/balanceLineLayout';
import type { LengthUnit } from '../positionWords';
import { placeName, type RankedPlace } from '../rows';

/** How the takes are made equally loud, and why to listen before reading. */
export function ListeningNote({
  turnedDownDb,
  hideWords,
}: {
  turnedDownDb: number | null;
  hideWords: string;
}) {
  return (
    <MarginNote from="a Thudline" about="listening">
      {turnedDownDb === null
        ? 'Louder seems better, so the louder takes are turned down.'
        : turnedDownDb < 0.05
          ? 'All takes are as loud as they are in their files.'
          : `The loudest is turned down ${decibels(turnedDownDb)} to be as loud as the quietest.`}{' '}
      Hide {hideWords} and choose before you read the ranking.
      <Box display={{ lg: 'none' }} marginTop="6px">
        Phone speakers can’t play this low: listen on headphones, not too loud.
      </Box>
    </MarginNote>
  );
}

/** Cymbals stand beside the ranking and don't change it. */
export function CymbalsNote({
  tryOut,
  ranked,
  lengthUnit,
}: {
  tryOut: TryOutResponse;
  ranked: readonly RankedPlace[];
  lengthUnit: LengthUnit;
}) {
  const loud = ranked.filter(({ row }) => (row.cymbalsOverDrumsDb ?? -Infinity) > cymbalsLoudFromDb);
  const names = loud.map(({ place }) => placeName(place, tryOut, lengthUnit));
  const known = ranked.filter(({ row }) => row.cymbalsOverDrumsDb !== null).length;
  return (
    <MarginNote from="b Thudline" about="cymbals">
      {known > 0
        ? `Above +${cymbalsLoudFromDb} dB a single overhead can’t be put right later. ${passWords(names, { known, all: ranked.length })}`
        : 'Can’t tell how loud the cymbals are: play five drum hits and five cymbals that stand alone.'}
    </MarginNote>
  );
}

function passWords(names: string[], { known, all }: { known: number; all: number }): string {
  if (names.length === 0)
    return known < all ? 'No take passes it, as far as it can be told.' : 'No take passes it.';
  if (names.length === all) return 'Every take passes it.';
  const listed =
    names.length === 1 ? names[0] : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;
  return `At ${listed} the cymbals pass it.`;
}
