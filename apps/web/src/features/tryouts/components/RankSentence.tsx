import { Box } from '@chakra-ui/react';
import { tryOutMeasures, tryOutPolarities, type TryOutMeasure } from '@thudline/contracts';
import { InlineSelect } from '../../../components/InlineSelect';
import type { RankBy } from '../hooks/useTryOutRanking';
import { measureName, polarityName, usesPolarity } from '../measureWords';

type Also = TryOutMeasure | 'nothing';

/** "Rank by low end with each take's best polarity, weighted with nothing else." */
export function RankSentence({ by, onChange }: { by: RankBy; onChange: (by: RankBy) => void }) {
  const others: Also[] = ['nothing', ...tryOutMeasures.filter((measure) => measure !== by.measure)];
  const polar = usesPolarity(by.measure) || (by.also !== null && usesPolarity(by.also));
  return (
    <Box marginTop="16px" lineHeight="36px">
      Rank by{' '}
      <InlineSelect
        label="Rank by"
        value={by.measure}
        options={tryOutMeasures}
        words={measureName}
        onChange={(measure) => onChange({ ...by, measure, also: by.also === measure ? null : by.also })}
      />
      {polar && (
        <>
          {' with '}
          <InlineSelect
            label="Polarity"
            value={by.polarity}
            options={tryOutPolarities}
            words={(polarity) => polarityName[polarity]}
            onChange={(polarity) => onChange({ ...by, polarity })}
          />
        </>
      )}
      , weighted with{' '}
      <InlineSelect
        label="Weighted with"
        value={by.also ?? 'nothing'}
        options={others}
        words={measureName}
        onChange={(also) => onChange({ ...by, also: also === 'nothing' ? null : also })}
      />
    </Box>
  );
}
