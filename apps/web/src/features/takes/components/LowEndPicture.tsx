import { chakra } from '@chakra-ui/react';
import { lowEndPercent } from '../pictureScale';
import { lowEndInWords } from '../rowWords';
import { RowPicture } from './LevelPicture';

/** Zero: the two neither help nor harm each other. */
export function LowEndZero() {
  const zero = `${lowEndPercent(0)}%`;
  return <chakra.line x1={zero} x2={zero} y1="0" y2="100%" stroke="edge" strokeWidth="1.75" />;
}

/** Low end of the two added: left of the line they pull apart, right of it they add. */
export function LowEndPicture({ lowEndDb }: { lowEndDb: number | null }) {
  return (
    <RowPicture role="img" aria-label={lowEndInWords(lowEndDb)}>
      <LowEndZero />
      <chakra.line
        x1={`${lowEndPercent(-3)}%`}
        x2={`${lowEndPercent(3)}%`}
        y1="50%"
        y2="50%"
        stroke="rule"
        strokeWidth="1"
      />
      {lowEndDb !== null && <chakra.circle cx={`${lowEndPercent(lowEndDb)}%`} cy="50%" r="5.5" fill="ink" />}
    </RowPicture>
  );
}
