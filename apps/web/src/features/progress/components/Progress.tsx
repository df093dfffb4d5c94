import { Box, chakra } from '@chakra-ui/react';
import { progressFigures, type ProgressFigure, type TakeProgress } from '@thudline/contracts';
import { useState } from 'react';
import { Headline } from '../../../components/Headline';
import { InlineSelect } from '../../../components/InlineSelect';
import { figureMeaning, figureWords, pointsOf } from '../progressFigures';
import { progressHead } from '../progressHead';
import { ProgressPicture } from '../pictures/ProgressPicture';
import { ProgressTable } from './ProgressTable';

/** How somebody's playing came along, from what their takes tell: for themselves and for their teacher. */
export function Progress({ takes, openTakes }: { takes: readonly TakeProgress[]; openTakes: boolean }) {
  const [figure, setFigure] = useState<ProgressFigure>('level-spread');
  const points = pointsOf(takes, figure);
  const clipped = figure === 'headroom' ? takes.filter((take) => take.clipped) : [];
  const { strong, rest } = progressHead(points, figure);
  return (
    <>
      <Headline marginTop="4px" aria-live="polite">
        <b>{strong}</b> {rest}
      </Headline>
      <Box marginTop="18px">
        Show{' '}
        <InlineSelect
          label="Figure"
          value={figure}
          options={progressFigures}
          words={(each) => figureWords[each]}
          onChange={setFigure}
        />{' '}
        week by week
      </Box>
      {points.length === 0 ? (
        <Box marginTop="14px" color="ink.muted">
          No take tells it yet. The check take holds what it needs.
        </Box>
      ) : (
        <>
          <ProgressPicture {...{ figure, points, clipped }} />
          <Box fontSize="caption" color="ink.muted" lineHeight="18px" marginTop="4px">
            A ring is a take, the thick line the middle of its week.
            {clipped.length > 0 && ' A cross is a take that clipped.'}
          </Box>
        </>
      )}
      <chakra.details marginTop="10px" fontSize="small">
        <chakra.summary cursor="pointer" color="ink.muted" width="fit-content" paddingY="8px">
          what is this
        </chakra.summary>
        <Box maxWidth="600px">{figureMeaning[figure]}</Box>
      </chakra.details>
      {points.length > 0 && <ProgressTable points={points} openTakes={openTakes} />}
    </>
  );
}
