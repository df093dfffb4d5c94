import { chakra } from '@chakra-ui/react';
import { bandName, tailText } from '../calculatorWords';
import type { BandEstimate } from '../tailEstimate';

const cell = { textAlign: 'right', paddingY: '3px', paddingLeft: '14px', whiteSpace: 'nowrap' } as const;

/** The same as numbers: both formulas, seconds per 60 dB. */
export function TailTable({ bands, short }: { bands: readonly BandEstimate[]; short: string }) {
  const heads = ['Norris–Eyring now', `with the ${short}`, 'Sabine now', `with the ${short}`];
  return (
    <chakra.details marginTop="4px" fontSize="small">
      <chakra.summary cursor="pointer" color="ink.muted" width="fit-content" paddingY="8px">
        as a table
      </chakra.summary>
      <chakra.div overflowX="auto" tabIndex={0} role="group" aria-label="Seconds until it is 60 dB quieter">
        <chakra.table marginTop="4px">
          <chakra.caption textAlign="left" fontSize="caption" color="ink.muted">
            Seconds until it is 60 dB quieter.
          </chakra.caption>
          <thead>
            <chakra.tr borderBottom="1px solid" borderColor="rule" color="ink.muted" fontSize="caption">
              <chakra.th scope="col" textAlign="left" fontWeight={400}>
                Octave
              </chakra.th>
              {heads.map((head, i) => (
                <chakra.th key={i} scope="col" fontWeight={400} {...cell}>
                  {head}
                </chakra.th>
              ))}
            </chakra.tr>
          </thead>
          <tbody>
            {bands.map(({ centreHz, before, after }) => (
              <chakra.tr key={centreHz} borderBottom="1px solid" borderColor="rule">
                <chakra.th scope="row" textAlign="left" fontWeight={400}>
                  {bandName(centreHz)}
                </chakra.th>
                {[before.eyringS, after.eyringS, before.sabineS, after.sabineS].map((seconds, i) => (
                  <chakra.td key={i} {...cell}>
                    {tailText(seconds)}
                  </chakra.td>
                ))}
              </chakra.tr>
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
    </chakra.details>
  );
}
