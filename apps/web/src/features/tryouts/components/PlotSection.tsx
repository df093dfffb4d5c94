import { Box, Flex } from '@chakra-ui/react';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { headline } from '../headline';
import { rankingWords, shortValue } from '../measureWords';
import { TryOutPlot, type PlotWords } from '../pictures/TryOutPlot';
import { shortPosition, unitWord, type LengthUnit } from '../positionWords';
import { plotPoints, type RankedPlace } from '../rows';
import { subjectWords } from '../subjectWords';
import { FiguresTable } from './FiguresTable';

interface PlotSectionProps {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  ranked: readonly RankedPlace[];
  lengthUnit: LengthUnit;
}

/** The plot, what its marks are, and its figures as a table. */
export function PlotSection(props: PlotSectionProps) {
  const { tryOut, ranking, ranked, lengthUnit } = props;
  const [asTable, setAsTable] = useState(false);
  const points = plotPoints(tryOut, ranked);
  const words = rankingWords(ranking);
  const { strong, rest } = headline({ tryOut, ranking, lengthUnit });
  if (points.length === 0) return null;
  return (
    <Box marginTop="14px">
      <TryOutPlot
        points={points}
        words={plotWords(props)}
        axisTitle={words.axis}
        zero={words.zero}
        from={subjectWords(tryOut).from}
        unit={unitWord(tryOut.unit, lengthUnit)}
        description={`${strong} ${rest} ${points.length} takes against their position.`}
      />
      <Flex
        wrap="wrap"
        columnGap="20px"
        justifyContent="space-between"
        marginTop="8px"
        fontSize="caption"
        color="ink.muted"
      >
        <span>{keyWords(ranked, ranking)}</span>
        <TextButton type="button" aria-expanded={asTable} onClick={() => setAsTable(!asTable)}>
          {asTable ? 'hide the table' : 'as a table'}
        </TextButton>
      </Flex>
      {asTable && <FiguresTable {...props} />}
    </Box>
  );
}

/** "ring: where it stands now, disc: the fullest, bars: 95 % interval over 16 kick hits a take". */
function keyWords(ranked: readonly RankedPlace[], ranking: TryOutRankingResponse): string {
  const best = ranked.find(({ row }) => row.standing === 'best');
  const current = ranked.find(({ isCurrent }) => isCurrent);
  const hits = ranked.map(({ row }) => row.hits);
  const [fewest, most] = [Math.min(...hits), Math.max(...hits)];
  const count = fewest === most ? String(most) : `${fewest} to ${most}`;
  return [
    current && current !== best && 'ring: where it stands now',
    best && `disc: the ${ranking.measure === 'low-end' && !ranking.also ? 'fullest' : 'best'}`,
    `bars: 95 % interval over ${count} hits a take`,
  ]
    .filter(Boolean)
    .join(', ');
}

function plotWords({ tryOut, ranking, ranked, lengthUnit }: PlotSectionProps): Record<string, PlotWords> {
  return Object.fromEntries(
    ranked.map(({ place, row, isCurrent }) => {
      const best = row.standing === 'best';
      return [
        place.id,
        {
          take: `take ${place.take.number}`,
          value: row.value === null ? '' : shortValue(row.value, ranking),
          position: shortPosition(place, tryOut.unit, lengthUnit) ?? String(place.take.number),
          below: best ? (row.word ?? 'best') : isCurrent ? 'stands here now' : '',
        },
      ];
    }),
  );
}
