import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ComparedPolarity, ReportResponse } from '@thudline/contracts';
import type { PairSpectrum } from '@thudline/dsp';
import { useMemo, useState } from 'react';
import { TextButton } from '../../../components/Button';
import { missing, signed } from '../../../lib/format';
import { PictureTitle } from '../../sheet/components/SheetSection';
import { usePairSpectrum } from '../../sheet/hooks/usePairSpectrum';
import { LowEndLine } from '../../sheet/pictures/LowEndLine';
import { ThirdOctavesOfBoth } from '../pictures/ThirdOctavesOfBoth';
import { bandPairs, type BandPair } from '../pictures/thirdOctavesLayout';

interface BothSpectraProps {
  reports: readonly [ReportResponse, ReportResponse];
  names: readonly [string, string];
  polarity: ComparedPolarity;
}

/** How the two microphones add up in both takes: the low end from ring to disc, then every third-octave. */
export function BothSpectra({ reports, names, polarity }: BothSpectraProps) {
  const [before, after] = [usePairSpectrum(reports[0]), usePairSpectrum(reports[1])];
  const { beforeDb, afterDb, expectedDb } = polarity;
  const failed = before.error ? before : after.error ? after : null;
  return (
    <>
      {beforeDb !== null && afterDb !== null && (
        <>
          <PictureTitle>Low end of the two added</PictureTitle>
          <LowEndLine
            recordedDb={beforeDb}
            recordedLabel={names[0]}
            chosen={{ levelDb: afterDb, label: names[1] }}
            others={expectedDb === null ? [] : [{ levelDb: expectedDb, label: 'expected' }]}
          />
        </>
      )}
      <PictureTitle>From low to high, in third-octaves</PictureTitle>
      {failed ? (
        <Box role="alert" minHeight="200px" paddingTop="10px">
          This picture could not be loaded. {failed.error?.message}{' '}
          <TextButton fontWeight={600} onClick={failed.retry}>
            Try again
          </TextButton>
        </Box>
      ) : before.spectrum && after.spectrum ? (
        <LoadedBands
          names={names}
          spectra={[before.spectrum, after.spectrum]}
          gainsDb={[reports[0].agreement.matchGainDb ?? 0, reports[1].agreement.matchGainDb ?? 0]}
        />
      ) : reports.every(({ pairSpectrum }) => pairSpectrum) ? (
        <Box height="210px" role="status" aria-label="Loading the third-octaves" />
      ) : (
        <Box fontSize="small">No kick hit was found in one of the takes, so there is nothing to add up.</Box>
      )}
    </>
  );
}

interface BandsProps {
  names: readonly [string, string];
  spectra: readonly [PairSpectrum, PairSpectrum];
  /** How much louder the overhead is played in each. */
  gainsDb: readonly [number, number];
}

function LoadedBands({ names, spectra: [before, after], gainsDb: [beforeGainDb, afterGainDb] }: BandsProps) {
  const [open, setOpen] = useState(false);
  const bands = useMemo(
    () =>
      bandPairs(
        { spectrum: before, overheadGainDb: beforeGainDb },
        { spectrum: after, overheadGainDb: afterGainDb },
      ),
    [before, after, beforeGainDb, afterGainDb],
  );
  return (
    <>
      <ThirdOctavesOfBoth {...{ bands, names }} />
      <Flex fontSize="caption" color="ink.muted" columnGap="20px" wrap="wrap" marginTop="4px">
        <span>
          rings: {names[0]}, discs: {names[1]}; shaded: the low end
        </span>
        <TextButton marginLeft={{ lg: 'auto' }} aria-expanded={open} onClick={() => setOpen(!open)}>
          {open ? 'hide the table' : 'as a table'}
        </TextButton>
      </Flex>
      {open && <BandTable {...{ bands, names }} />}
    </>
  );
}

const level = (db: number | null) => (db === null ? missing : signed(db));

function BandTable({ bands, names }: { bands: BandPair[]; names: readonly [string, string] }) {
  return (
    <chakra.table
      fontSize="small"
      width="100%"
      maxWidth="460px"
      marginTop="10px"
      css={{ '& th, & td': { textAlign: 'right', padding: '3px 0' } }}
    >
      <chakra.caption textAlign="left" color="ink.muted" fontSize="caption" captionSide="top">
        Third-octaves (IEC 61260-1) of the two added as recorded, levels matched, dB against no help and no
        harm
      </chakra.caption>
      <chakra.thead borderBottom="1px solid" borderColor="rule">
        <tr>
          <th scope="col">Hz</th>
          <th scope="col">{names[0]}</th>
          <th scope="col">{names[1]}</th>
        </tr>
      </chakra.thead>
      <tbody>
        {bands.map((band) => (
          <tr key={band.nominal}>
            <th scope="row">{band.nominal}</th>
            <td>{level(band.beforeDb)}</td>
            <td>{level(band.afterDb)}</td>
          </tr>
        ))}
      </tbody>
    </chakra.table>
  );
}
