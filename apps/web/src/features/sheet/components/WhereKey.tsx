import { Box, Flex, chakra } from '@chakra-ui/react';
import { thirdOctaveLevels, type Choice, type PairSpectrum } from '@thudline/dsp';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { missing, signed } from '../../../lib/format';
import { ink } from '../pictures/ink';
import { KeyEntry } from './HitTrace';

type Props = { spectrum: PairSpectrum; asRecorded: Choice; chosen: Choice & { label: string } };

/** The key under "where it helps", and the same figures as a table. */
export function WhereKey({ spectrum, asRecorded, chosen }: Props) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Flex
        fontSize="caption"
        color="ink.muted"
        columnGap="22px"
        rowGap="4px"
        wrap="wrap"
        marginTop="10px"
        alignItems="center"
      >
        <KeyEntry
          mark={
            <>
              <path d="M8 6h11m-4-3.5 4 3.5-4 3.5" stroke={ink.ink} strokeWidth="1.6" fill="none" />
              <circle cx="4.5" cy="6" r="3.4" fill={ink.sheet} stroke={ink.ink} strokeWidth="1.6" />
              <circle cx="22" cy="6" r="4" fill={ink.ink} />
            </>
          }
        >
          as recorded{chosen.label === 'as recorded' ? '' : `, then ${chosen.label}`}
        </KeyEntry>
        <KeyEntry mark={<rect x="3" width="20" height="12" fill={ink.target} />}>
          low end: what the verdict counts
        </KeyEntry>
        <TextButton marginLeft={{ lg: 'auto' }} aria-expanded={open} onClick={() => setOpen(!open)}>
          {open ? 'hide the table' : 'as a table'}
        </TextButton>
      </Flex>
      {open && <ThirdOctaveTable {...{ spectrum, asRecorded, chosen }} />}
    </>
  );
}

const level = (db: number | null) => (db === null ? missing : signed(db));

function ThirdOctaveTable({ spectrum, asRecorded, chosen }: Props) {
  const recorded = thirdOctaveLevels(spectrum, asRecorded);
  return (
    <Box overflowX="auto" marginTop="10px">
      <chakra.table
        fontSize="small"
        width="100%"
        maxWidth="460px"
        css={{ '& th, & td': { textAlign: 'right', padding: '3px 0' } }}
      >
        <chakra.caption textAlign="left" color="ink.muted" fontSize="caption" captionSide="top">
          Third-octaves (IEC 61260-1) of the two added, dB against no help and no harm
        </chakra.caption>
        <chakra.thead borderBottom="1px solid" borderColor="rule">
          <tr>
            <th scope="col">Hz</th>
            <th scope="col">as recorded</th>
            <th scope="col">{chosen.label === 'as recorded' ? 'chosen' : chosen.label}</th>
          </tr>
        </chakra.thead>
        <tbody>
          {thirdOctaveLevels(spectrum, chosen).map((band, i) => (
            <tr key={band.centreHz}>
              <th scope="row">{band.nominal}</th>
              <td>{level(recorded[i].levelDb)}</td>
              <td>{level(band.levelDb)}</td>
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
