import { Box, Flex, chakra } from '@chakra-ui/react';
import type { FindingStatus } from '@thudline/contracts';
import { StatusMark } from '../../../components/StatusMark';

/** Readable from two metres: on a phone five words a screen's width, more on a larger one. */
const strongSize = 'clamp(44px, 13.2vw, 88px)';

/** One thing to do, with its pen mark; once done it steps back. */
export function BigWords({
  status,
  strong,
  detail,
  done = false,
}: {
  status: FindingStatus;
  strong: string;
  detail: string;
  done?: boolean;
}) {
  return (
    <Box as="li" listStyleType="none" color={done ? 'ink.muted' : 'ink'}>
      <chakra.h2
        fontSize={strongSize}
        lineHeight="1.06"
        fontWeight={900}
        letterSpacing="-0.018em"
        textWrap="pretty"
      >
        <Flex
          as="span"
          display="inline-flex"
          marginRight="0.22em"
          verticalAlign="0.04em"
          css={{ '& svg': { width: '0.68em', height: '0.68em' } }}
        >
          <StatusMark status={done ? 'good' : status} sizePx={34} />
        </Flex>
        {done && <chakra.span srOnly>Done: </chakra.span>}
        {strong}
      </chakra.h2>
      {detail && (
        <Box fontSize="clamp(22px, 5.6vw, 34px)" lineHeight="1.27" marginTop="8px">
          {detail}
        </Box>
      )}
    </Box>
  );
}
