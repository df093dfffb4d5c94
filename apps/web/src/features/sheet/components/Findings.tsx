import { Box, Flex } from '@chakra-ui/react';
import type { Finding } from '@thudline/contracts';
import { Fragment } from 'react';
import { StatusMark } from '../../../components/StatusMark';
import { NotePlace } from '../notePlaces';
import { SectionText } from './SheetSection';

/**
 * The sentences of a section: the most pressing finding first, with its reason; others that ask for something each with
 * their mark; what is good folds to its sentences.
 */
export function Findings({ findings }: { findings: Finding[] }) {
  const [first, ...others] = findings;
  if (!first) return null;
  const asking = others.filter((finding) => finding.status !== 'good');
  const good = others.filter((finding) => finding.status === 'good');
  return (
    <>
      <SectionText>
        {first.sentence}
        <NoteMarks finding={first} /> {first.status !== 'good' && first.why}
      </SectionText>
      {asking.map((finding) => (
        <Flex key={finding.topic} gap="10px" marginTop="8px" alignItems="flex-start">
          <Box paddingTop="3px">
            <StatusMark status={finding.status} sizePx={18} />
          </Box>
          <Box>
            {finding.sentence}
            <NoteMarks finding={finding} />
          </Box>
        </Flex>
      ))}
      {good.length > 0 && (
        <Box color="ink.muted" fontSize="small" lineHeight="22px" marginTop="8px">
          {good.map((finding) => (
            <Fragment key={finding.topic}>
              {finding.sentence}
              <NoteMarks finding={finding} />{' '}
            </Fragment>
          ))}
        </Box>
      )}
    </>
  );
}

/** Letters of the notes that speak of a finding stand behind its sentence. */
const NoteMarks = ({ finding: { topic } }: { finding: Finding }) => (
  <NotePlace as="span" name={`mark:${topic}`} />
);
