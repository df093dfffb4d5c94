import { Flex } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { StatusMark } from '../../../components/StatusMark';
import { NotePlace } from '../notePlaces';
import { findingsOf } from './sectionWords';
import { SectionText } from './SheetSection';

/** What a reader must know about the files before anything else: lengths that differ, a file that was cut short. */
export function FilesFindings({ report }: { report: ReportResponse }) {
  return (
    <>
      {findingsOf(report, ['files']).map((finding) => (
        <Flex key={finding.sentence} gap="12px" marginTop="16px" alignItems="flex-start">
          <StatusMark status={finding.status} sizePx={24} />
          <SectionText marginTop="-2px">
            {finding.sentence}
            <NotePlace as="span" name="mark:files" /> {finding.why} {finding.next}
          </SectionText>
        </Flex>
      ))}
    </>
  );
}
