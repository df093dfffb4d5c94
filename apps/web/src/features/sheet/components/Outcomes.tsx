import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse } from '@thudline/contracts';
import { StatusMark } from '../../../components/StatusMark';
import { TextLink } from '../../../components/TextLink';

/** What became of the actions that were ticked before this take. */
export function Outcomes({ take, report }: { take: TakeResponse; report: ReportResponse }) {
  if (report.outcomes.length === 0) return null;
  return (
    <Box as="section" aria-labelledby="outcomes-head" marginTop="18px">
      <chakra.h2 id="outcomes-head" fontWeight={600} paddingBottom="7px">
        Since <BeforeTake take={take} />
      </chakra.h2>
      <chakra.ul listStyleType="none" borderTop="1px solid" borderColor="rule">
        {report.outcomes.map((outcome) => (
          <chakra.li
            key={outcome.actionId}
            borderBottom="1px solid"
            borderColor="rule"
            paddingY={{ base: '8px', _print: '5px' }}
          >
            <Flex gap="12px" alignItems="flex-start">
              <Box paddingTop="2px" lineHeight={0}>
                <StatusMark status={outcome.status} />
              </Box>
              <span>
                <b>{outcome.strong}</b> {outcome.rest}
              </span>
            </Flex>
          </chakra.li>
        ))}
      </chakra.ul>
    </Box>
  );
}

/** The take before, led to where the reader may open it. */
function BeforeTake({ take }: { take: TakeResponse }) {
  if (!take.follows) return <>the take before</>;
  return <TextLink to={`/takes/${take.follows.id}`}>take {take.follows.number}</TextLink>;
}
