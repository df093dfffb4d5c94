import { Box, Flex } from '@chakra-ui/react';
import { ink } from '../../sheet/pictures/ink';

const marks = [
  { words: 'overhead', r: 5.5, fill: ink.sheet, stroke: ink.overhead },
  { words: 'kick microphone', r: 6, fill: ink.kick, stroke: ink.kick },
  { words: 'where the beater strikes', r: 3, fill: ink.ink, stroke: ink.ink },
];

/** Beside the view from above where there is room, over it otherwise. */
export function PictureLegend() {
  return (
    <Box position="relative" aria-hidden>
      <Flex
        position={{ base: 'static', lg: 'absolute' }}
        right="0"
        top="0"
        direction={{ base: 'row', lg: 'column' }}
        alignItems={{ lg: 'flex-end' }}
        wrap={{ base: 'wrap', lg: 'nowrap' }}
        columnGap="14px"
        fontSize="caption"
        lineHeight="22px"
        color="ink.muted"
        marginBottom={{ base: '8px', lg: 0 }}
      >
        {marks.map(({ words, ...mark }) => (
          <Flex key={words} alignItems="center" gap="8px">
            {words}
            <svg width="14" height="14">
              <circle cx="7" cy="7" strokeWidth="2.4" {...mark} />
            </svg>
          </Flex>
        ))}
      </Flex>
    </Box>
  );
}
