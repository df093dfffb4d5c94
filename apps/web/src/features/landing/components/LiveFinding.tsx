import { Box } from '@chakra-ui/react';
import type { Finding, ReportResponse } from '@thudline/contracts';
import { StatusMark } from '../../../components/StatusMark';
import { findingsOf } from '../../sheet/components/sectionWords';
import { SectionText } from '../../sheet/components/SheetSection';

/** The most pressing sentence about some topics, with its pen mark in the gutter. */
export function LiveFinding({
  report,
  topics,
}: {
  report: ReportResponse;
  topics: readonly Finding['topic'][];
}) {
  const [finding] = findingsOf(report, topics);
  if (!finding) return null;
  return (
    <Box position="relative" marginTop="14px" display="flex" gap="10px" alignItems="flex-start">
      <Box position={{ base: 'static', lg: 'absolute' }} left="-45px" paddingTop="4px">
        <StatusMark status={finding.status} sizePx={24} />
      </Box>
      <SectionText marginTop="0">
        {finding.sentence} {finding.status !== 'good' && finding.why}
      </SectionText>
    </Box>
  );
}
