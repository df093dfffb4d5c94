import { Flex, chakra } from '@chakra-ui/react';
import type { Target } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { InlineNumber, parseNumber } from '../../../components/InlineNumber';
import { number } from '../../../lib/format';
import { gripStepDb, moveGrip, targetLimits, usualTarget, type Grip } from '../targetGrips';

/** Full scale is 0: whoever types 12 means −12. */
const readDbfs = (text: string) => {
  const value = parseNumber(text);
  return value === null ? null : -Math.abs(value);
};

const digitsOf = (dbfs: number) => (Number.isInteger(dbfs) ? 0 : 1);
const bare = (dbfs: number) => number(dbfs, digitsOf(dbfs));

/** "The hardest hit belongs between **−12** and **−6 dBFS**; aim for **−9**", each to be typed over. */
export function TargetSentence({ target, onSet }: { target: Target; onSet: (target: Target) => void }) {
  const [refused, setRefused] = useState(false);
  const { lowestDbfs, highestDbfs } = targetLimits;
  const field = (grip: Grip, label: string, unit?: string) => (
    <InlineNumber
      {...{ label, unit }}
      value={target[grip]}
      digits={digitsOf(target[grip])}
      step={gripStepDb}
      min={lowestDbfs}
      max={highestDbfs}
      whenLeft
      read={readDbfs}
      onRefused={() => setRefused(true)}
      onChange={(dbfs) => {
        setRefused(false);
        onSet(moveGrip(target, grip, dbfs));
      }}
    />
  );
  return (
    <>
      <Flex wrap="wrap" justifyContent="space-between" alignItems="baseline" columnGap="24px" rowGap="6px">
        <chakra.span lineHeight={{ base: '40px', lg: '34px' }}>
          The hardest hit belongs between {field('lowDbfs', 'Lower end of the target, dBFS')} and{' '}
          {field('highDbfs', 'Upper end of the target', 'dBFS')} ; aim for {field('aimDbfs', 'Aim, dBFS')}
        </chakra.span>
        <TextButton fontSize="16px" color="ink.muted" minHeight="26px" onClick={() => onSet(usualTarget)}>
          back to {bare(usualTarget.lowDbfs)}, {bare(usualTarget.highDbfs)}, {bare(usualTarget.aimDbfs)}
        </TextButton>
      </Flex>
      {refused && (
        <FieldError>
          Write a number between {bare(lowestDbfs)} and {bare(highestDbfs)}.
        </FieldError>
      )}
    </>
  );
}
