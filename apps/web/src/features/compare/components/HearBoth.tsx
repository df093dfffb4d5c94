import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { Button } from '../../../components/Button';
import { Swell } from '../../../components/Swell';
import { decibels } from '../../../lib/format';
import { HitSteps } from '../../sheet/components/ChoiceRow';
import { PlayMark } from '../../sheet/components/PlayMark';
import type { SameHitChoice } from '../hooks/useSameHit';
import type { Heard, TwoTakes } from '../hooks/useTwoTakes';
import { HitRows } from '../pictures/HitRows';
import { stretchS } from '../commonTime';
import { TakeMark } from './TakeMark';

export interface HearBothProps {
  reports: readonly [ReportResponse, ReportResponse];
  /** "take 14", "take 15" */
  names: readonly [string, string];
  listening: TwoTakes;
  sameHit: SameHitChoice;
}

/** Both takes in step and equally loud: one is heard, the other is a key away. */
export function HearBoth(props: HearBothProps) {
  const { reports, names, listening, sameHit } = props;
  return (
    <Box marginTop="12px" _print={{ display: 'none' }}>
      <Flex columnGap="16px" rowGap="8px" alignItems="center" wrap="wrap">
        <PlayBoth {...props} />
        {sameHit.count > 0 && (
          <HitSteps kickHits={sameHit.places} chosenHit={sameHit.place} onChooseHit={sameHit.choose} />
        )}
        <WhichTake names={names} listening={listening} />
        <Box
          fontSize="caption"
          lineHeight="18px"
          color="ink.muted"
          marginLeft={{ lg: 'auto' }}
          textAlign={{ base: 'left', lg: 'right' }}
        >
          {loudnessText(names, listening.matchesDb)}
          <br />1 and 2 switch at the same moment
        </Box>
      </Flex>
      {listening.failure && (
        <Box role="alert" color="fix" fontSize="small" marginTop="6px">
          {listening.failure}
        </Box>
      )}
      <HitRows
        {...{ reports, names, listening }}
        chosen={sameHit.count > 0 ? sameHit.place : null}
        onChoose={sameHit.choose}
      />
      <Box fontSize="caption" color="ink.muted" marginTop="6px" lineHeight="19px">
        Heard as recorded, levels of both microphones matched. It starts quiet. Phone speakers can’t play this
        low: listen on headphones, not too loud.
        {Math.max(...reports.map(({ durationS }) => durationS)) > stretchS &&
          ` Long takes are fetched ${stretchS / 60} minutes at a time.`}
      </Box>
    </Box>
  );
}

function PlayBoth({ listening, sameHit }: HearBothProps) {
  const { state } = listening;
  const from = sameHit.count > 0 ? `from hit ${sameHit.place + 1}` : 'from the start';
  return (
    <Button
      look="outline"
      aria-pressed={state !== 'stopped'}
      onClick={() => (state === 'stopped' ? listening.play(sameHit.startS) : listening.stop())}
    >
      <PlayMark playing={state !== 'stopped'} />
      {{ stopped: `Both, ${from}`, loading: 'Loading both…', playing: 'Stop' }[state]}
    </Button>
  );
}

function WhichTake({ names, listening }: Pick<HearBothProps, 'names' | 'listening'>) {
  return (
    <Flex role="group" aria-label="Take that is heard" columnGap="20px">
      {names.map((name, i) => {
        const on = listening.heard === i;
        return (
          <chakra.button
            key={i}
            aria-pressed={on}
            position="relative"
            display="inline-flex"
            gap="8px"
            alignItems="center"
            minHeight="36px"
            cursor="pointer"
            color={on ? 'ink' : 'ink.muted'}
            fontWeight={on ? 600 : 400}
            onClick={() => listening.choose(i as Heard)}
          >
            <TakeMark which={i === 0 ? 'before' : 'after'} />
            {name}
            {on && <Swell depthPx={5.5} linePx={1.5} />}
          </chakra.button>
        );
      })}
    </Flex>
  );
}

/** Nothing is turned down without saying so. */
function loudnessText(names: readonly [string, string], matchesDb: readonly number[] | null): string {
  if (!matchesDb) return 'played equally loud';
  const louder = matchesDb[0] < matchesDb[1] ? 0 : 1;
  const downDb = Math.abs(matchesDb[louder]);
  return downDb < 0.05
    ? 'equally loud as they are'
    : `equally loud: ${names[louder]} down ${decibels(downDb)}`;
}
